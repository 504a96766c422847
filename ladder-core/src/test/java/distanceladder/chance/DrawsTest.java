package distanceladder.chance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.text.ValueFault;
import java.util.Arrays;
import java.util.stream.LongStream;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.RealDistribution;
import org.apache.commons.math3.distribution.UniformRealDistribution;
import org.apache.commons.math3.stat.inference.KolmogorovSmirnovTest;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

class DrawsTest {
    /** Of Kolmogorov's statistic times sqrt(n): exceeded with probability 1e-4, sqrt(-log(1e-4 / 2) / 2). */
    private static final double KOLMOGOROV = 2.2252;

    /** Of a standard normal number, either side: exceeded with probability 1e-6. */
    private static final double FIVE_SIGMA = 4.8916;

    /**
     * numpy.random.Philox of NumPy 1.24.2 (Debian), random_raw(4) with the counter less one and the key given; the same
     * words as those of Salmon et al. (2011) in their file of known answers, from memory.
     */
    @Test
    @Tag("validation")
    void knownAnswersOfPhilox() {
        assertArrayEquals(
                new long[] {0x16554d9eca36314cL, 0xdb20fe9d672d0fdcL, 0xd7e772cee186176bL, 0x7e68b68aec7ba23bL},
                philox(new long[4], 0, 0));
        assertArrayEquals(
                new long[] {0x87b092c3013fe90bL, 0x438c3c67be8d0224L, 0x9cc7d7c69cd777b6L, 0xa09caebf594f0ba0L},
                philox(new long[] {-1, -1, -1, -1}, -1, -1));
        assertArrayEquals(
                new long[] {0xa528f45403e61d95L, 0x38c72dbd566e9788L, 0xa5a1610e72fd18b5L, 0x57bd43b5e52b7fe6L},
                philox(
                        new long[] {0x243f6a8885a308d3L, 0x13198a2e03707344L, 0xa4093822299f31d0L, 0x082efa98ec4e6c89L},
                        0x452821e638d01377L,
                        0xbe5466cf34e90c6cL));
    }

    private static long[] philox(long[] counter, long key0, long key1) {
        Philox.mix(counter, key0, key1);
        return counter;
    }

    /** A second program of the hash (Python 3.11) and NumPy 1.24.2 as above: seed 42, k = 7, indices 4 to 7. */
    @Test
    @Tag("validation")
    void knownAnswersOfAStream() {
        assertEquals(0x3164cbf5b8769a9fL, Draws.hash("parallax offset \u00b5"));
        Draws draws = Draws.of(42, "parallax offset \u00b5");
        long[] words = {0x83163a200b32d8c8L, 0x3e6f4db6dcc70851L, 0x84853663d7539187L, 0x297d3a216f98db80L};
        for (int i = 0; i < 4; i++) {
            assertEquals(words[i], draws.bits(7, 4 + i));
        }
        assertEquals(0x1p-53 * ((words[0] >>> 11) | 1), draws.uniform(7, 4));
    }

    @Test
    void aDrawDependsOnNothingElse() {
        Draws draws = Draws.of(5, "zero point");
        double[] inOrder =
                LongStream.range(0, 1000).mapToDouble(k -> draws.normal(k, 3)).toArray();
        double[] parallel = LongStream.range(0, 1000)
                .parallel()
                .mapToDouble(k -> Draws.of(5, "zero point").normal(k, 3))
                .toArray();
        assertArrayEquals(inOrder, parallel);
        assertEquals(inOrder[17], draws.normal(17, 3));
    }

    @Test
    void fillingGivesTheSameNumbers() {
        Draws draws = Draws.of(5, "zero point");
        double[] uniform = new double[11];
        double[] normal = new double[11];
        draws.fill(9, uniform);
        draws.fillNormal(9, normal);
        for (int i = 0; i < 11; i++) {
            assertEquals(draws.uniform(9, i), uniform[i]);
            assertEquals(draws.normal(9, i), normal[i]);
        }
    }

    @Test
    void everyArgumentMatters() {
        long bits = Draws.of(1, "a").bits(2, 3);
        long[] others = {
            Draws.of(2, "a").bits(2, 3), Draws.of(1, "b").bits(2, 3),
                    Draws.of(1, "a").bits(3, 3),
            Draws.of(1, "a").bits(2, 7), Draws.of(1, "a").bits(2, 2),
                    Draws.of(1, "").bits(2, 3)
        };
        assertEquals(
                7,
                LongStream.concat(LongStream.of(bits), Arrays.stream(others))
                        .distinct()
                        .count());
    }

    @Test
    void uniformNumbersAreInsideTheInterval() {
        assertEquals(0x1p-53, (double) ((0L >>> 11) | 1) * 0x1p-53);
        Draws draws = Draws.of(3, "edge");
        for (long k = 0; k < 100_000; k++) {
            double u = draws.uniform(k, 0);
            assertTrue(u > 0 && u < 1);
            assertEquals(1, (long) (u * 0x1p53) & 1, "an odd multiple of 2^-53");
        }
    }

    /** False-alarm rate of both together: 2e-4 per choice of seed. */
    @Test
    void uniformAndNormal() {
        Draws draws = Draws.of(20240101, "anything");
        int n = 100_000;
        assertDrawnFrom(
                new UniformRealDistribution(0, 1),
                LongStream.range(0, n).mapToDouble(k -> draws.uniform(k, 0)).toArray());
        assertDrawnFrom(
                new NormalDistribution(),
                LongStream.range(0, n).mapToDouble(k -> draws.normal(k, 1)).toArray());
    }

    static void assertDrawnFrom(RealDistribution expected, double[] draws) {
        double statistic = new KolmogorovSmirnovTest().kolmogorovSmirnovStatistic(expected, draws);
        assertTrue(statistic * Math.sqrt(draws.length) < KOLMOGOROV, () -> "Kolmogorov's statistic " + statistic);
    }

    /** False-alarm rate of the four together: 4e-6 per choice of seed. */
    @Test
    void neighboursAreNotCorrelated() {
        Draws a = Draws.of(1, "host 1");
        Draws b = Draws.of(1, "host 2");
        Draws c = Draws.of(2, "host 1");
        int n = 100_000;
        double[] sums = new double[4];
        for (long k = 0; k < n; k++) {
            double x = a.normal(k, 0);
            sums[0] += x * b.normal(k, 0);
            sums[1] += x * c.normal(k, 0);
            sums[2] += x * a.normal(k + 1, 0);
            sums[3] += x * a.normal(k, 1);
        }
        for (double sum : sums) {
            assertTrue(Math.abs(sum) / Math.sqrt(n) < FIVE_SIGMA);
        }
    }

    @Test
    void refusesANegativeIndex() {
        Draws draws = Draws.of(1, "a");
        assertEquals(
                "index = -1",
                assertThrows(ValueFault.class, () -> draws.bits(0, -1)).what());
        assertThrows(ValueFault.class, () -> draws.uniform(0, -1));
        assertThrows(ValueFault.class, () -> draws.normal(0, -1));
    }

    @Test
    void saysWhatItIs() {
        Draws draws = Draws.of(7, "a");
        assertEquals(7, draws.seed());
        assertEquals("a", draws.name());
        assertEquals("draws of a with seed 7", draws.toString());
    }
}
