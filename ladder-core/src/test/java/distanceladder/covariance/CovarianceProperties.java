package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/**
 * Random structures, nested up to three deep, with variances of zero and shared errors up to 100 times the noise.
 *
 * <p>Where shared errors are themselves correlated, their effects may cancel in a value; so the tolerances are relative
 * to the largest term that enters, and to each entry only in the tests of each kind.
 */
class CovarianceProperties {
    /**
     * A structure.
     *
     * @param largest bound of the terms that add up to an entry
     */
    record Made(Covariance c, double largest) {
        private static Made of(Covariance c) {
            double largest = 0;
            for (int i = 0; i < c.size(); i++) {
                largest = Math.max(largest, c.entry(i, i));
            }
            return new Made(c, largest);
        }
    }

    @Provide
    Arbitrary<Made> covariances() {
        return Arbitraries.longs().map(seed -> {
            SplittableRandom random = new SplittableRandom(seed);
            return nested(1 + random.nextInt(12), 3, random);
        });
    }

    private static Made nested(int n, int depth, SplittableRandom random) {
        return switch (depth == 0 ? random.nextInt(2) : random.nextInt(5)) {
            case 0 ->
                Made.of(Diagonal.fromVariances(
                        random.doubles(n).map(v -> v < 0.2 ? 0 : v).toArray()));
            case 1 -> Made.of(dense(n, random));
            case 2 -> {
                int first = random.nextInt(n + 1);
                Made a = nested(first, depth - 1, random);
                Made b = nested(n - first, depth - 1, random);
                yield new Made(Blocks.of(a.c, b.c), Math.max(a.largest, b.largest));
            }
            case 3 -> {
                int k = random.nextInt(4);
                double variance = random.nextBoolean() ? 1 : 10_000;
                Made base = nested(n, depth - 1, random);
                Made kernel = nested(k, depth - 1, random);
                double[][] columns = Matrices.random(n, k, random.nextLong());
                yield new Made(
                        LowRankUpdate.of(base.c, columns, kernel.c.scaled(variance)),
                        base.largest + k * k * variance * kernel.largest);
            }
            default -> {
                Made a = nested(n, depth - 1, random);
                Made b = nested(n, depth - 1, random);
                yield new Made(Sum.of(a.c, b.c), a.largest + b.largest);
            }
        };
    }

    /** Semidefinite, in two components, some values certain. */
    private static Covariance dense(int n, SplittableRandom random) {
        double[][] root = Matrices.random(n, 1 + random.nextInt(n + 1), random.nextLong());
        for (int i = 0; i < n; i++) {
            for (int k = 0; k < root[i].length; k++) {
                root[i][k] = i % 2 == k % 2 && random.nextInt(9) > 0 ? root[i][k] : 0;
            }
        }
        return Dense.fromCovariance(Matrices.square(root));
    }

    private static double[] vector(int n, long seed) {
        return new SplittableRandom(seed).doubles(n, -1, 1).toArray();
    }

    @Property
    void positiveSemidefiniteToRounding(@ForAll("covariances") Made made) {
        double[][] array = made.c.toArray();
        for (int i = 0; i < array.length; i++) {
            array[i][i] += 1e-13 * made.largest;
        }
        Dense.fromCovariance(array);
    }

    @Property
    void theSplitReassembles(@ForAll("covariances") Made made) {
        Matrices.assertWithin(made.c.toArray(), Matrices.assembled(made.c.split()), 2e-14 * made.largest);
        Matrices.assertWellFormed(made.c);
    }

    @Property
    void theRootReassembles(@ForAll("covariances") Made made) {
        Matrices.assertWithin(made.c.toArray(), Matrices.square(Root.of(made.c)), 4e-14 * made.largest);
    }

    @Property
    void bilinearIsThatOfTheArray(@ForAll("covariances") Made made, @ForAll long seed) {
        Covariance c = made.c;
        double[] a = vector(c.size(), seed);
        double[] b = vector(c.size(), seed + 1);
        double expected = Matrices.bilinear(c.toArray(), a, b);
        assertEquals(expected, c.bilinear(a, b), 1e-14 * c.size() * c.size() * made.largest);
        assertTrue(c.quadratic(a) >= 0);
    }

    @Property
    void aPartHasTheSameBits(@ForAll("covariances") Made made, @ForAll long seed) {
        Covariance c = made.c;
        int n = c.size();
        int[] order = shuffled(n, seed);
        Covariance part = c.part(order);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                assertEquals(c.entry(order[i], order[j]), part.entry(i, j));
            }
        }
        Matrices.assertWellFormed(part);
        int half = (n + 1) / 2;
        assertEquals(
                c.part(Arrays.copyOf(order, half)),
                part.part(IntStream.range(0, half).toArray()));
    }

    private static int[] shuffled(int n, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int[] order = IntStream.range(0, n).toArray();
        for (int i = n - 1; i > 0; i--) {
            int j = random.nextInt(i + 1);
            int kept = order[i];
            order[i] = order[j];
            order[j] = kept;
        }
        return order;
    }

    @Property
    void scalingByAPowerOfTwoScalesEveryBit(@ForAll("covariances") Made made) {
        double[][] quarter = made.c.scaled(0.25).toArray();
        double[][] array = made.c.toArray();
        for (int i = 0; i < array.length; i++) {
            for (int j = 0; j < array.length; j++) {
                assertEquals(0.25 * array[i][j], quarter[i][j]);
            }
        }
    }
}
