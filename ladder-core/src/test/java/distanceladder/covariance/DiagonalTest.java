package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class DiagonalTest extends CovarianceContract {
    @Override
    Covariance covariance() {
        return Diagonal.fromStandardDeviations(0.1, 3e-8, 0, 2, 7e5);
    }

    @Test
    void standardDeviationsAreSquared() {
        assertArrayEquals(
                new double[] {4, 0, 0.25},
                Diagonal.fromStandardDeviations(2, 0, 0.5).split().diagonal());
        assertEquals(Diagonal.fromVariances(4, 0, 0.25), Diagonal.fromStandardDeviations(2, 0, 0.5));
        assertEquals(Diagonal.fromVariances(0.0), Diagonal.fromVariances(-0.0));
    }

    @Test
    void givenArraysAreCopied() {
        double[] variances = {1, 2};
        Diagonal c = Diagonal.fromVariances(variances);
        variances[0] = 5;
        assertEquals(1, c.entry(0, 0));
    }

    @Test
    void aMillionValuesStayThin() {
        int n = 1_000_000;
        double[] sigmas = new double[n];
        java.util.Arrays.fill(sigmas, 0.5);
        Covariance c = LowRankUpdate.of(Diagonal.fromStandardDeviations(sigmas), Matrices.random(n, 2, 1));
        Covariance sum = Sum.of(c, Diagonal.fromVariances(new double[n]));
        double[] last = new double[n];
        last[n - 1] = 1;
        assertEquals(c.entry(n - 1, n - 1), sum.quadratic(last), 1e-15);
        assertEquals(2, sum.split().columnCount());
        assertEquals(0.25, Blocks.of(sum, c).part(2 * n - 1, 0).split().diagonal()[0]);
    }

    @Test
    void refusesWhatIsNoError() {
        refused("standard deviation 1 = -2.0", () -> Diagonal.fromStandardDeviations(1, -2));
        refused("standard deviation 0 = NaN", () -> Diagonal.fromStandardDeviations(Double.NaN));
        refused("standard deviation 2 = Infinity", () -> Diagonal.fromStandardDeviations(1, 1, 1.0 / 0));
        refused("square of standard deviation 0 (1.0E200)", () -> Diagonal.fromStandardDeviations(1e200));
        refused("square of standard deviation 1 (1.0E-200)", () -> Diagonal.fromStandardDeviations(1, 1e-200));
        refused("variance 1 = -2.0", () -> Diagonal.fromVariances(1, -2));
        refused("variance 1 = NaN", () -> Diagonal.fromVariances(1, Double.NaN));
        refused("variance 0 = Infinity", () -> Diagonal.fromVariances(1.0 / 0));
        refused("variance 0 times 1.0E200", () -> Diagonal.fromVariances(1e200).scaled(1e200));
        refused(
                "variance 0 times 1.0E-200",
                () -> Diagonal.fromVariances(1e-200).scaled(1e-200));
    }
}
