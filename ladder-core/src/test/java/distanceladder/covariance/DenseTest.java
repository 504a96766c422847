package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class DenseTest extends CovarianceContract {
    @Override
    Covariance covariance() {
        return Dense.fromCovariance(new double[][] {
            {4, 0, 1.2, 0, 0},
            {0, 9, 0, 0, 0},
            {1.2, 0, 1, 0, -0.3},
            {0, 0, 0, 0, 0},
            {0, 0, -0.3, 0, 16}
        });
    }

    @Test
    void correlationsAreMultipliedBySigmas() {
        Dense c = Dense.fromCorrelations(
                new double[] {2, 0, 3}, new double[][] {{1, 0.5, -1}, {0.5, 1, -0.5}, {-1, -0.5, 1}});
        assertArrayEquals(new double[][] {{4, 0, -6}, {0, 0, 0}, {-6, 0, 9}}, c.toArray());
    }

    @Test
    void exactZerosCutIt() {
        Split split = covariance().split();
        assertArrayEquals(new double[] {0, 9, 0, 0, 0}, split.diagonal());
        assertEquals(1, split.blocks().size());
        assertArrayEquals(new int[] {0, 2, 4}, split.blocks().get(0).indices());
        double[][] tiny = Diagonal.fromVariances(1, 1).toArray();
        tiny[0][1] = 1e-300;
        tiny[1][0] = 1e-300;
        assertEquals(1, Dense.fromCovariance(tiny).split().blocks().size(), "no threshold");
    }

    @Test
    void givenArraysAreCopied() {
        double[][] array = {{1, 0.5}, {0.5, 1}};
        Dense c = Dense.fromCovariance(array);
        array[0][1] = 7;
        assertEquals(0.5, c.entry(0, 1));
        double[] sigmas = {1, 1};
        Dense d = Dense.fromCorrelations(sigmas, new double[][] {{1, 0.5}, {0.5, 1}});
        sigmas[0] = 3;
        assertEquals(1, d.entry(0, 0));
    }

    @Test
    void roundingIsAveraged() {
        Dense c = Dense.fromCovariance(new double[][] {{1, 0.5}, {0.5 + 2e-11, 1}});
        assertEquals(0.5 + 1e-11, c.entry(0, 1), 1e-16);
        assertEquals(c.entry(1, 0), c.entry(0, 1));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-300, 1e-30, 1e-12, 1, 1e12, 1e300})
    void theUnitDoesNotMatter(double unit) {
        double[][] good = Matrices.square(Matrices.random(6, 3, 5));
        double[][] bad = {{1, 0.9, 0.9}, {0.9, 1, 0.5}, {0.9, 0.5, 1}};
        Covariance c = Dense.fromCovariance(times(good, unit));
        assertEquals(3, Root.of(c)[0].length);
        Matrices.assertRoot(c);
        // least pivot by hand: 1, then 1 - 0.81 = 0.19 twice with cross 0.5 - 0.81, then 0.19 - 0.31^2 / 0.19 = -0.3158
        refused("smallest pivot -0.316 of the largest, at entry (2, 2)", () -> Dense.fromCovariance(times(bad, unit)));
    }

    @Test
    void unitsMayDiffer() {
        double[][] c = Matrices.square(Matrices.random(6, 6, 8));
        for (int i = 0; i < 6; i++) {
            for (int j = 0; j < 6; j++) {
                c[i][j] = c[i][j] * Math.scalb(1.0, 40 * (i + j));
            }
        }
        Matrices.assertRoot(Dense.fromCovariance(c));
    }

    @Test
    void largeOnesAreChecked() {
        int n = 150;
        double[][] c = Matrices.square(Matrices.random(n, n + 10, 3));
        Matrices.assertRoot(Dense.fromCovariance(c));
        assertTrue(Definite.overwriting(DenseCheck.unit(c, Matrices.sigmas(c))));
        double[][] singular = Matrices.square(Matrices.random(n, 100, 3));
        Matrices.assertRoot(Dense.fromCovariance(singular));
        assertFalse(Definite.overwriting(DenseCheck.unit(singular, Matrices.sigmas(singular))));
        double excess = 1.001 * Math.sqrt(c[140][140] * c[149][149]);
        c[140][149] = excess;
        c[149][140] = excess;
        refused("smallest pivot -", () -> Dense.fromCovariance(c));
    }

    @Test
    void refusesWhatIsNoMatrix() {
        refused("row 1 of 3 numbers", () -> Dense.fromCovariance(new double[][] {{1, 0}, {0, 1, 0}}));
        refused("row 0 of 1 numbers", () -> Dense.fromCovariance(new double[][] {{1}, {0, 1}}));
        refused("entry (1, 0) = NaN", () -> Dense.fromCovariance(new double[][] {{1, 0}, {Double.NaN, 1}}));
        refused("entry (0, 1) = Infinity", () -> Dense.fromCovariance(new double[][] {{1, 1.0 / 0}, {0, 1}}));
    }

    @Test
    void refusesWhatIsNoCovariance() {
        refused(
                "entry (1, 0) = 0.4 and entry (0, 1) = 0.5",
                () -> Dense.fromCovariance(new double[][] {{1, 0.5}, {0.4, 1}}));
        refused(
                "0.100 of sqrt(c_ii c_jj) apart",
                () -> Dense.fromCovariance(new double[][] {{1e-20, 0.5e-20}, {0.4e-20, 1e-20}}));
        refused("variance 1 = -1.0", () -> Dense.fromCovariance(new double[][] {{1, 0}, {0, -1}}));
        refused(
                "entry (1, 0) = 0.1 with variance 1 = 0",
                () -> Dense.fromCovariance(new double[][] {{1, 0.1}, {0.1, 0}}));
        refused(
                "entry (1, 0) = 0.1 with variance 0 = 0",
                () -> Dense.fromCovariance(new double[][] {{0, 0.1}, {0.1, 1}}));
        // 1 - 9/4
        refused(
                "smallest pivot -1.25 of the largest, at entry (1, 1)",
                () -> Dense.fromCovariance(new double[][] {{1, 1.5}, {1.5, 1}}));
        refused(
                "variance 0 times 1.0E-200",
                () -> Dense.fromCovariance(new double[][] {{1e-200}}).scaled(1e-200));
    }

    @Test
    void refusesAnIndefiniteMatrixWhoseLastPivotsAreZero() {
        // eigenvalue -0.5 in the remainder [[0, -0.5], [-0.5, 0]], whose diagonal says nothing
        double[][] hidden = {{1, 1, 1}, {1, 1, 0.5}, {1, 0.5, 1}};
        refused("smallest pivot -0.500 of the largest", () -> Dense.fromCovariance(hidden));
    }

    @Test
    void smallDefectsAreMeasured() {
        double r = 1 + 1e-9;
        refused("smallest pivot -2.00e-09 of the largest", () -> Dense.fromCovariance(new double[][] {{1, r}, {r, 1}}));
        Dense.fromCovariance(new double[][] {{1, 1}, {1, 1}});
    }

    @Test
    void refusesWhatIsNoCorrelation() {
        double[][] good = {{1, 0.5}, {0.5, 1}};
        refused(
                "entry (1, 1) = 0.9",
                () -> Dense.fromCorrelations(new double[] {1, 1}, new double[][] {{1, 0.5}, {0.5, 0.9}}));
        refused("3 standard deviations and 2 rows", () -> Dense.fromCorrelations(new double[3], good));
        refused("standard deviation 1 = -1.0", () -> Dense.fromCorrelations(new double[] {1, -1}, good));
        refused(
                "entry (1, 0) = 0.25",
                () -> Dense.fromCorrelations(new double[] {0, 0}, new double[][] {{1, 0.5}, {0.25, 1}}));
        refused(
                "smallest pivot",
                () -> Dense.fromCorrelations(new double[] {0, 0}, new double[][] {{1, 1.5}, {1.5, 1}}));
    }

    private static double[][] times(double[][] c, double factor) {
        double[][] product = new double[c.length][c.length];
        for (int i = 0; i < c.length; i++) {
            for (int j = 0; j < c.length; j++) {
                product[i][j] = factor * c[i][j];
            }
        }
        return product;
    }
}
