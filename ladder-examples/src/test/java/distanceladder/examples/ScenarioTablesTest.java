package distanceladder.examples;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Distances;
import distanceladder.table.Table;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The tables agree with one another and with the truth that they were made from.
 *
 * <p>Written apart from the generator: each table is reduced with the true coefficients, and what is left must be as
 * large as the stated errors. Each of the four chi-squares and three means lies beyond its limit of four sigma for about
 * one seed in 10,000.
 */
class ScenarioTablesTest {
    private static final double MAGNITUDES_PER_SHARE = 5 / StrictMath.log(10);

    private final Map<String, String> text = new Scenario(Scenario.SEED).tables();
    private final Table nearby = table("nearby.csv");
    private final Table anchors = table("anchors.csv");
    private final Table pulsators = table("pulsators.csv");
    private final Table explosions = table("explosions.csv");
    private final Table rotators = table("rotators.csv");
    private final Table flow = table("flow.csv");

    private Table table(String file) {
        return Table.parse(file, text.get(file));
    }

    private static double square(double x) {
        return x * x;
    }

    private static List<String> names(Table table, String column) {
        return java.util.stream.IntStream.range(0, table.size())
                .mapToObj(i -> table.cell(i, column))
                .toList();
    }

    private static void plausible(double chiSquare, int degrees) {
        assertEquals(degrees, chiSquare, 4 * StrictMath.sqrt(2.0 * degrees));
    }

    @ParameterizedTest
    @CsvSource({
        "nearby.csv,star,60", "anchors.csv,galaxy,2", "pulsators.csv,star,0",
        "explosions.csv,event,80", "rotators.csv,galaxy,88", "flow.csv,galaxy,120"
    })
    void eachTableHasDistinctNamesAndNothingButNumbersBesides(String file, String name, int size) {
        Table table = table(file);
        assertTrue(size == 0 || table.size() == size, table.size() + " rows");
        assertEquals(table.size(), new HashSet<>(names(table, name)).size());
        for (String column : table.columns()) {
            for (int i = 0; i < table.size() && !column.equals(name) && !column.equals("galaxy"); i++) {
                double x = table.number(i, column);
                boolean error = column.contains("error") || column.endsWith("istical") || column.equals("systematic");
                assertTrue(!error || x > 0, table.where(i, column));
            }
        }
    }

    @Test
    void branchesShareABaseAndMeetInTheFlow() {
        Set<String> hosts = new HashSet<>(names(pulsators, "galaxy"));
        names(anchors, "galaxy").forEach(anchor -> assertTrue(hosts.remove(anchor), anchor));
        Set<String> far = new HashSet<>(names(flow, "galaxy"));
        Set<String> exploded = new HashSet<>(names(explosions, "galaxy"));
        Set<String> rotating = new HashSet<>(names(rotators, "galaxy"));
        assertEquals(8, hosts.size());
        assertTrue(exploded.containsAll(hosts) && rotating.containsAll(hosts));
        exploded.removeAll(hosts);
        rotating.removeAll(hosts);
        assertEquals(70, exploded.size());
        assertTrue(rotating.size() >= 50, rotating.size() + " rotators in the flow");
        Set<String> either = new HashSet<>(exploded);
        either.addAll(rotating);
        assertEquals(far, either);
        exploded.retainAll(rotating);
        assertTrue(exploded.size() >= 20, exploded.size() + " galaxies with both");
    }

    @Test
    void hostsHaveBetween38And70Pulsators() {
        Map<String, Integer> stars = new HashMap<>();
        names(pulsators, "galaxy").forEach(galaxy -> stars.merge(galaxy, 1, Integer::sum));
        stars.forEach((galaxy, n) -> assertTrue(n >= 38 && n <= 70, galaxy + ": " + n));
    }

    private static double luminosity(Table table, int row) {
        return Scenario.ZERO_POINT
                + Scenario.SLOPE * (table.number(row, "log_period") - 1)
                + Scenario.METALLICITY * table.number(row, "metallicity");
    }

    @Test
    void parallaxesAreOffAsStated() {
        double chiSquare = 0;
        for (int i = 0; i < nearby.size(); i++) {
            double sigma = StrictMath.sqrt(square(nearby.number(i, "magnitude_error")) + square(Scenario.SCATTER));
            double parallax = StrictMath.exp(
                    (10 - nearby.number(i, "magnitude") + luminosity(nearby, i)) / 5 * StrictMath.log(10));
            double pull = nearby.number(i, "parallax_mas") - parallax - Scenario.PARALLAX_OFFSET;
            chiSquare += square(pull)
                    / (square(nearby.number(i, "parallax_error_mas"))
                            + square(parallax * sigma / MAGNITUDES_PER_SHARE));
        }
        plausible(chiSquare, nearby.size());
    }

    @Test
    void pulsatorsScatterAboutEachGalaxyAsStated() {
        Map<String, double[]> sums = new HashMap<>();
        for (int i = 0; i < pulsators.size(); i++) {
            double modulus = pulsators.number(i, "magnitude") - luminosity(pulsators, i) - Scenario.CAMERA;
            double weight = 1 / (square(pulsators.number(i, "magnitude_error")) + square(Scenario.SCATTER));
            double[] sum = sums.computeIfAbsent(pulsators.cell(i, "galaxy"), galaxy -> new double[3]);
            sum[0] += weight;
            sum[1] += weight * modulus;
            sum[2] += weight * square(modulus);
        }
        double chiSquare = sums.values().stream()
                .mapToDouble(s -> s[2] - square(s[1]) / s[0])
                .sum();
        plausible(chiSquare, pulsators.size() - sums.size());
        for (int i = 0; i < anchors.size(); i++) {
            double[] s = sums.get(anchors.cell(i, "galaxy"));
            double sigma = StrictMath.sqrt(
                    1 / s[0] + square(anchors.number(i, "statistical")) + square(anchors.number(i, "systematic")));
            assertEquals(s[1] / s[0], anchors.number(i, "modulus"), 4 * sigma, anchors.cell(i, "galaxy"));
        }
    }

    /** Modulus from the velocity, and its variance. */
    private Map<String, double[]> velocityModuli() {
        Map<String, double[]> moduli = new HashMap<>();
        for (int i = 0; i < flow.size(); i++) {
            double velocity = flow.number(i, "velocity_km_s");
            assertTrue(velocity > 2500 && velocity < 25_500, flow.where(i, "velocity_km_s"));
            double z = velocity / Cosmography.LIGHT_KM_PER_S;
            double distance = Cosmography.luminosityDistance(z, Scenario.HUBBLE, Scenario.DECELERATION, Scenario.JERK);
            double variance = square(Scenario.PECULIAR) + square(flow.number(i, "velocity_error_km_s"));
            moduli.put(flow.cell(i, "galaxy"), new double[] {
                Distances.modulusFromMegaparsec(distance), variance * square(MAGNITUDES_PER_SHARE / velocity)
            });
        }
        return moduli;
    }

    private interface Standard {
        double luminosity(int row);
    }

    private void meetsTheFlow(Table table, double scatter, Standard standard) {
        Map<String, double[]> moduli = velocityModuli();
        double chiSquare = 0;
        double weights = 0;
        double sum = 0;
        int n = 0;
        for (int i = 0; i < table.size(); i++) {
            double[] modulus = moduli.get(table.cell(i, "galaxy"));
            if (modulus != null) {
                double weight = 1 / (square(table.number(i, "magnitude_error")) + square(scatter) + modulus[1]);
                double rest = table.number(i, "magnitude") - standard.luminosity(i) - modulus[0];
                chiSquare += weight * square(rest);
                weights += weight;
                sum += weight * rest;
                n++;
            }
        }
        plausible(chiSquare, n);
        assertEquals(0, sum / weights, 4 / StrictMath.sqrt(weights));
    }

    @Test
    void explosionsMeetTheFlow() {
        meetsTheFlow(
                explosions,
                Scenario.EXPLOSION_SCATTER,
                i -> Scenario.EXPLOSION
                        + Scenario.SHAPE * explosions.number(i, "shape")
                        + Scenario.COLOUR * explosions.number(i, "colour"));
    }

    @Test
    void rotatorsMeetTheFlow() {
        meetsTheFlow(
                rotators,
                Scenario.ROTATOR_SCATTER,
                i -> Scenario.ROTATOR
                        + Scenario.WIDTH * rotators.number(i, "log_width")
                        + Scenario.CAMERA * rotators.number(i, "orbital"));
    }
}
