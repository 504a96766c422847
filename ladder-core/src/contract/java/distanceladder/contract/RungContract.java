package distanceladder.contract;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import distanceladder.relation.Points;
import distanceladder.relation.Rung;
import distanceladder.relation.Value;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/**
 * What every kind of rung keeps to. A test of a new kind implements this interface with a factory, and inherits all tests.
 *
 * @param <R> the kind of rung
 */
public interface RungContract<R extends Rung<R>> {
    /**
     * A rung of the kind with at least four data, resting on what makes it solvable.
     *
     * @return the rung
     */
    R rung();

    /**
     * A unit step for the derivative check of each parameter, where 1e-4 of it is too large or small.
     *
     * @return step for central differences
     */
    default double step() {
        return 1e-5;
    }

    /** The kind, the name and the definition are kept; nothing changes in place. */
    @Test
    default void likeKeepsTheKind() {
        R rung = rung();
        R other = rung.like(rung.definition());
        assertSame(rung.getClass(), other.getClass());
        assertSame(rung.definition(), other.definition());
        R less = rung.without(rung.definition().data().names().get(0));
        assertNotSame(rung, less);
        assertEquals(
                rung.definition().data().size() - 1, less.definition().data().size());
        assertEquals(rung.name(), less.name());
        assertTrue(rung.text().contains(rung.name()));
        assertFalse(rung.definition().description().isBlank());
    }

    /** The rows' coefficients are the derivatives of the prediction: central differences at several points. */
    @Test
    default void rowsAreDerivatives() {
        R rung = rung();
        Definition d = rung.definition();
        // Uncertain columns stand at their measured numbers, where a row is the plain expansion of the prediction.
        Points start = measured(
                Ladder.of(rung).solve().pointsOf(rung.name()), d.relation().start(d));
        Random random = new Random(7);
        for (int round = 0; round < 5; round++) {
            Points at = jittered(start, random);
            Linearised rows = d.relation().linearise(d, at);
            for (int i = 0; i < d.data().size(); i++) {
                double level = predicted(d, at, i);
                double slope = difference(d, at, i, -1);
                assertEquals(rows.coefficients()[i], slope, tolerance(slope, level, step()), "modulus of datum " + i);
                for (int j = 0; j < at.parameterCount(); j++) {
                    double partial = difference(d, at, i, j);
                    assertEquals(
                            rows.rows()[i][j],
                            partial,
                            tolerance(partial, level, step()),
                            rows.unknowns().name(j));
                }
            }
        }
    }

    private static double tolerance(double slope, double predicted, double step) {
        return 2e-6 * Math.max(1, Math.abs(slope)) + 1e-14 * Math.abs(predicted) / step;
    }

    private static Points measured(Points at, Points columns) {
        double[] moduli = new double[at.size()];
        double[] parameters = new double[at.parameterCount()];
        for (int i = 0; i < moduli.length; i++) {
            moduli[i] = at.modulus(i);
        }
        for (int j = 0; j < parameters.length; j++) {
            parameters[j] = at.parameter(j);
        }
        return copied(columns, moduli, parameters);
    }

    private static Points jittered(Points start, Random random) {
        double[] moduli = new double[start.size()];
        double[] parameters = new double[start.parameterCount()];
        for (int i = 0; i < moduli.length; i++) {
            moduli[i] = start.modulus(i) + 0.2 * random.nextGaussian();
        }
        for (int j = 0; j < parameters.length; j++) {
            parameters[j] = start.parameter(j) + 0.05 * random.nextGaussian();
        }
        return copied(start, moduli, parameters);
    }

    private static Points copied(Points from, double[] moduli, double[] parameters) {
        double[][] covariates = new double[from.size()][from.covariateCount()];
        for (int i = 0; i < covariates.length; i++) {
            for (int k = 0; k < covariates[i].length; k++) {
                covariates[i][k] = from.covariate(i, k);
            }
        }
        return Points.of(moduli, parameters).withCovariates(covariates);
    }

    /** Central difference of the prediction of a datum by its modulus (-1) or a parameter. */
    private double difference(Definition d, Points at, int datum, int parameter) {
        return (predicted(d, moved(at, datum, parameter, step()), datum)
                        - predicted(d, moved(at, datum, parameter, -step()), datum))
                / (2 * step());
    }

    private static Points moved(Points at, int datum, int parameter, double step) {
        double[] moduli = new double[at.size()];
        double[] parameters = new double[at.parameterCount()];
        for (int i = 0; i < moduli.length; i++) {
            moduli[i] = at.modulus(i) + (parameter < 0 && i == datum ? step : 0);
        }
        for (int j = 0; j < parameters.length; j++) {
            parameters[j] = at.parameter(j) + (j == parameter ? step : 0);
        }
        return copied(at, moduli, parameters);
    }

    /** What a row at a point says of the prediction there: the right side is observed - predicted + what is linear. */
    private static double predicted(Definition d, Points at, int datum) {
        Linearised rows = d.relation().linearise(d, at);
        double linear = rows.coefficients()[datum] * at.modulus(datum);
        for (int j = 0; j < at.parameterCount(); j++) {
            linear += rows.rows()[datum][j] * at.parameter(j);
        }
        double observed = d.data().column(d.observable())[datum];
        return observed - (rows.rows()[datum][at.parameterCount()] - linear);
    }

    /** The order of data changes no bit; units of the same dimension change nothing but rounding. */
    @Test
    default void orderOfDataChangesNothing() {
        R rung = rung();
        Definition d = rung.definition();
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < d.data().size(); i++) {
            order.add(i);
        }
        Collections.shuffle(order, new Random(3));
        int[] rows = order.stream().mapToInt(i -> i).toArray();
        Definition shuffled = d.withRelation(d.relation().part(rows))
                .withData(d.data().part(rows), d.noise().part(rows));
        Solution one = Ladder.of(rung).solve();
        Solution two = Ladder.of(rung.like(shuffled)).solve();
        for (Value value : values(rung)) {
            assertEquals(one.of(value).value(), two.of(value).value(), 0, value.name());
            assertEquals(one.of(value).sigma(), two.of(value).sigma(), 0, value.name());
        }
    }

    /** A datum dropped in a revision is the ladder built without it, bit for bit. */
    @Test
    default void droppingIsBuildingWithout() {
        R rung = rung();
        R less = rung.without(rung.definition().data().names().get(1));
        Solution revised = Ladder.of(rung).solve().with(less);
        Solution scratch = Ladder.of(less).solve();
        for (Value value : values(less)) {
            assertEquals(scratch.of(value).value(), revised.of(value).value(), 0, value.name());
            assertEquals(scratch.of(value).sigma(), revised.of(value).sigma(), 0, value.name());
        }
    }

    /** Every parameter has a handle, and budgets add up. */
    @Test
    default void parametersAreStated() {
        R rung = rung();
        Solution solution = Ladder.of(rung).solve();
        String text = solution.calibration(rung).text();
        for (Value value : values(rung)) {
            assertTrue(text.contains(value.name()), value.name() + " in\n" + text);
            var budget = solution.budget(value);
            assertEquals(budget.estimate().variance(), budget.total(), 1e-12 * budget.total() + 1e-300, value.name());
        }
        assertEquals(
                rung.definition().data().size(),
                solution.residuals(rung).lines().size());
    }

    private List<Value> values(R rung) {
        List<Value> out = new ArrayList<>();
        for (String role : new TreeSet<>(rung.definition().parameters().keySet())) {
            out.add(rung.definition().value(role));
        }
        return out;
    }
}
