package distanceladder.chance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import distanceladder.text.ValueFault;
import org.apache.commons.math3.stat.correlation.Covariance;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

class AccumulatorTest {
    private static double[][] vectors(int n, double offset) {
        Draws draws = Draws.of(11, "vectors");
        double[][] vectors = new double[n][3];
        for (int k = 0; k < n; k++) {
            draws.fillNormal(k, vectors[k]);
            vectors[k][1] += 0.5 * vectors[k][0];
            for (int i = 0; i < 3; i++) {
                vectors[k][i] += offset;
            }
        }
        return vectors;
    }

    private static Accumulator of(double[][] vectors, int from, int to) {
        Accumulator accumulator = Accumulator.of(vectors[0].length);
        for (int k = from; k < to; k++) {
            accumulator.add(vectors[k]);
        }
        return accumulator;
    }

    private static void assertClose(double[][] expected, double[][] actual, double tolerance) {
        for (int i = 0; i < expected.length; i++) {
            assertArrayEquals(expected[i], actual[i], tolerance);
        }
    }

    @Test
    void byHand() {
        Accumulator accumulator = of(new double[][] {{1, 2}, {3, 2}, {5, 8}}, 0, 3);
        assertEquals(3, accumulator.count());
        assertArrayEquals(new double[] {3, 4}, accumulator.mean(), 1e-15);
        // deviations (-2, -2), (0, -2), (2, 4)
        assertClose(new double[][] {{4, 6}, {6, 12}}, accumulator.covariance(), 1e-14);
    }

    /** Commons Math 3.6.1. */
    @Test
    void agreesWithTwoPasses() {
        double[][] vectors = vectors(500, 0);
        assertClose(
                new Covariance(vectors).getCovarianceMatrix().getData(),
                of(vectors, 0, 500).covariance(),
                1e-14);
    }

    @Test
    void aLargeMeanCostsNoDigits() {
        // offset 2^30: the vectors are rounded to 2^-22, which moves a covariance by less than 1e-6
        double[][] plain = of(vectors(500, 0), 0, 500).covariance();
        assertClose(plain, of(vectors(500, 0x1p30), 0, 500).covariance(), 1e-6);
    }

    @Test
    void mergedIsTheSameAsAdded() {
        double[][] vectors = vectors(500, 3);
        Accumulator whole = of(vectors, 0, 500);
        Accumulator merged = Accumulator.of(3);
        merged.merge(of(vectors, 0, 0));
        merged.merge(of(vectors, 0, 17));
        merged.merge(of(vectors, 17, 300));
        merged.merge(of(vectors, 300, 500));
        assertEquals(500, merged.count());
        assertArrayEquals(whole.mean(), merged.mean(), 1e-14);
        assertClose(whole.covariance(), merged.covariance(), 1e-14);
    }

    @Test
    void mergingInTheSameOrderGivesTheSameBits() {
        double[][] vectors = vectors(200, 3);
        Accumulator one = of(vectors, 0, 80);
        one.merge(of(vectors, 80, 200));
        Accumulator two = of(vectors, 0, 80);
        Accumulator rest = of(vectors, 80, 200);
        two.merge(rest);
        assertArrayEquals(one.mean(), two.mean());
        assertArrayEquals(one.covariance(), two.covariance());
        assertArrayEquals(of(vectors, 80, 200).covariance(), rest.covariance(), "the merged one stays as it is");
    }

    @Test
    void mergingWithItselfCountsTwice() {
        Accumulator twice = of(new double[][] {{1}, {3}}, 0, 2);
        twice.merge(twice);
        assertEquals(4, twice.count());
        assertEquals(2, twice.mean()[0]);
        assertEquals(4.0 / 3, twice.covariance()[0][0], 1e-15);
    }

    @Test
    void arraysAreCopiedOut() {
        Accumulator accumulator = of(new double[][] {{1}, {3}}, 0, 2);
        accumulator.mean()[0] = 9;
        accumulator.covariance()[0][0] = 9;
        assertEquals(2, accumulator.mean()[0]);
        assertEquals(2, accumulator.covariance()[0][0]);
    }

    @Test
    void refusesWhatItCannotSummarise() {
        refused("dimension = 0", () -> Accumulator.of(0));
        refused("dimension = 50000", () -> Accumulator.of(50_000));
        Accumulator one = of(new double[][] {{1, 2}}, 0, 1);
        refused("1 values", () -> one.add(new double[1]));
        refused("value 1 of vector 1 = NaN", () -> one.add(new double[] {1, Double.NaN}));
        refused("3 values", () -> one.merge(Accumulator.of(3)));
        refused("1 vectors", one::covariance);
        refused("0 vectors", () -> Accumulator.of(1).mean());
        assertEquals(1, one.count());
        assertArrayEquals(new double[] {1, 2}, one.mean());
    }

    private static void refused(String what, Executable call) {
        assertEquals(what, assertThrows(ValueFault.class, call).what());
    }
}
