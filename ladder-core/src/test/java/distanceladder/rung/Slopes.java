package distanceladder.rung;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import distanceladder.relation.Points;
import distanceladder.relation.Rung;
import java.util.Random;
import java.util.function.ToDoubleFunction;

/** Compares a rung's rows with central differences of its equation, written again without the library's own numbers. */
final class Slopes {
    private static final double STEP = 1e-4;
    private static final double RELATIVE = 1e-7;
    private static final double LN10 = StrictMath.log(10);

    private Slopes() {}

    /** The equation, written independently. */
    @FunctionalInterface
    interface Prediction {
        double of(int datum, double modulus, ToDoubleFunction<String> role);
    }

    static double tenTo(double x) {
        return StrictMath.exp(x * LN10);
    }

    /** Rows at ten random points; the seed is fixed, so nothing here fails by chance. */
    static void agree(Rung<?> rung, double modulus, Prediction equation) {
        Random random = new Random(20261201);
        Definition d = rung.definition();
        for (int round = 0; round < 10; round++) {
            double[] moduli =
                    random.doubles(d.data().size(), modulus - 2, modulus + 2).toArray();
            double[] theta = random.doubles(
                            d.parameters().values().stream().distinct().count(), -2, 2)
                    .toArray();
            agree(d, moduli, theta, equation);
        }
    }

    private static void agree(Definition d, double[] moduli, double[] theta, Prediction equation) {
        Linearised rows = d.relation().linearise(d, Points.of(moduli, theta));
        double[] observed = d.data().column(d.observable());
        for (int i = 0; i < moduli.length; i++) {
            int datum = i;
            double mu = moduli[i];
            double a = (equation.of(i, mu + STEP, reading(d, rows, theta, -1, 0))
                            - equation.of(i, mu - STEP, reading(d, rows, theta, -1, 0)))
                    / (2 * STEP);
            close(a, rows.coefficients()[i], "modulus of datum " + i);
            double right =
                    observed[i] - equation.of(i, mu, reading(d, rows, theta, -1, 0)) + rows.coefficients()[i] * mu;
            for (int j = 0; j < theta.length; j++) {
                double b = (equation.of(datum, mu, reading(d, rows, theta, j, STEP))
                                - equation.of(datum, mu, reading(d, rows, theta, j, -STEP)))
                        / (2 * STEP);
                close(b, rows.rows()[i][j], rows.unknowns().name(j) + " in datum " + i);
                right += rows.rows()[i][j] * theta[j];
            }
            assertEquals(right, rows.rows()[i][theta.length], 1e-9 * (1 + Math.abs(right)), "right side of datum " + i);
        }
    }

    private static ToDoubleFunction<String> reading(
            Definition d, Linearised rows, double[] theta, int moved, double step) {
        return role -> {
            int column = rows.unknowns().column(d.parameters().get(role));
            return theta[column] + (column == moved ? step : 0);
        };
    }

    private static void close(double expected, double found, String what) {
        assertEquals(expected, found, RELATIVE * Math.abs(expected) + 1e-9, what);
    }

    static boolean curved(Rung<?> rung) {
        Definition d = rung.definition();
        return d.relation().linearise(d, d.relation().start(d)).curved();
    }
}
