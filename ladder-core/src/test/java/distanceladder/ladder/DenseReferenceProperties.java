package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.relation.Input;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.lifecycle.AfterContainer;

/** A solution over any set equals one dense generalised least squares over that set's data. */
class DenseReferenceProperties {
    private static final Map<RandomLadder.Feature, Integer> COUNTS = new EnumMap<>(RandomLadder.Feature.class);

    @Property(tries = 150)
    void wholeAndPartsEqualDenseLeastSquares(@ForAll long seed) {
        double strength = StrictMath.pow(10, new java.util.Random(seed).nextInt(4) - 1);
        RandomLadder random = new RandomLadder(seed, strength);
        Ladder ladder = random.ladder();
        random.features().forEach(f -> COUNTS.merge(f, 1, Integer::sum));
        Solution whole = ladder.solve();
        compare(whole);
        for (String rung : List.of("base", "left", "right")) {
            compare(whole.below(ladder.rung(rung)));
        }
        TreeSet<String> some = new TreeSet<>(ladder.names());
        some.remove("host 0 anchor");
        compare(whole.over(some));
    }

    /** Rows used up by earlier columns left rests whose squares underflow, and not a number with them. */
    @net.jqwik.api.Example
    void restsThatUnderflow() {
        compare(new RandomLadder(-1389214789L, 1).ladder().solve());
    }

    static void compare(Solution solution) {
        Settled settled = solution.settled();
        DenseReference dense = new DenseReference(settled);
        List<String> unknowns = new ArrayList<>();
        for (Input input : solution.ladder().inputs(settled.set()).values()) {
            unknowns.addAll(input.unknowns());
        }
        List<Stated> values = new ArrayList<>();
        unknowns.forEach(u -> values.add(settled.unknown(u)));
        for (String object : settled.assembly().joint().objects()) {
            unknowns.add(Ladder.unknown(object));
            values.add(settled.distance(object));
        }
        for (int i = 0; i < values.size(); i++) {
            double sigma = Math.sqrt(dense.covariance(unknowns.get(i), unknowns.get(i)));
            assertEquals(dense.value(unknowns.get(i)), values.get(i).value(), 1e-9 * sigma, unknowns.get(i));
            for (int j = 0; j <= i; j++) {
                double scale = sigma * Math.sqrt(dense.covariance(unknowns.get(j), unknowns.get(j)));
                assertEquals(
                        dense.covariance(unknowns.get(i), unknowns.get(j)),
                        values.get(i).covariance(values.get(j)),
                        1e-9 * scale,
                        unknowns.get(i) + " with " + unknowns.get(j));
            }
            Gains gains = new Gains(values.get(i), settled);
            double sum = gains.variances().values().stream().mapToDouble(x -> x).sum()
                    + gains.joints().values().stream().mapToDouble(x -> x).sum();
            for (Input input : solution.ladder().inputs(settled.set()).values()) {
                sum += Gains.squares(gains.sources().getOrDefault(input.name(), new double[0]));
            }
            assertEquals(values.get(i).variance(), sum, 1e-12 * sum, "budget of " + unknowns.get(i));
        }
        assertEquals(dense.chiSquare(), settled.chiSquare(), 1e-8 * Math.max(1, dense.chiSquare()));
    }

    @AfterContainer
    static void everyFeatureWasMade() {
        for (RandomLadder.Feature feature : RandomLadder.Feature.values()) {
            assertTrue(COUNTS.getOrDefault(feature, 0) >= 10, feature + " was made " + COUNTS.get(feature) + " times");
        }
    }
}
