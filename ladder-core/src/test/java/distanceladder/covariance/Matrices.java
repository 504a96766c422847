package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;

/** Dense arithmetic for the tests. */
final class Matrices {
    private Matrices() {}

    static double[] ramp(int n, double slope) {
        double[] ramp = new double[n];
        for (int i = 0; i < n; i++) {
            ramp[i] = 1 + slope * i;
        }
        return ramp;
    }

    static double bilinear(double[][] c, double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            for (int j = 0; j < b.length; j++) {
                sum += a[i] * c[i][j] * b[j];
            }
        }
        return sum;
    }

    /** L LT. */
    static double[][] square(double[][] root) {
        double[][] square = new double[root.length][root.length];
        for (int i = 0; i < root.length; i++) {
            for (int j = 0; j < root.length; j++) {
                for (int k = 0; k < root[i].length; k++) {
                    square[i][j] += root[i][k] * root[j][k];
                }
            }
        }
        return square;
    }

    static double[] sigmas(double[][] c) {
        double[] sigmas = new double[c.length];
        for (int i = 0; i < c.length; i++) {
            sigmas[i] = Math.sqrt(c[i][i]);
        }
        return sigmas;
    }

    /** A table of numbers between -1 and 1. */
    static double[][] random(int rows, int columns, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        double[][] table = new double[rows][columns];
        for (double[] row : table) {
            for (int k = 0; k < columns; k++) {
                row[k] = 2 * random.nextDouble() - 1;
            }
        }
        return table;
    }

    static double[][] assembled(Split split) {
        double[][] array = square(split.columns());
        double[] diagonal = split.diagonal();
        for (int i = 0; i < diagonal.length; i++) {
            array[i][i] += diagonal[i];
        }
        for (Block block : split.blocks()) {
            int[] indices = block.indices();
            for (int i = 0; i < block.size(); i++) {
                assertEquals(0, diagonal[indices[i]], "the diagonal of an index in a block");
                for (int j = 0; j < block.size(); j++) {
                    assertEquals(block.entry(i, j), block.row(i)[j]);
                    array[indices[i]][indices[j]] += block.entry(i, j);
                }
            }
        }
        return array;
    }

    static void assertReassembles(Covariance c) {
        assertClose(c.toArray(), assembled(c.split()), 1e-14);
        assertWellFormed(c);
    }

    /** Blocks disjoint, ascending and of two values or more; no column of zeros. */
    static void assertWellFormed(Covariance c) {
        Split split = c.split();
        boolean[] seen = new boolean[c.size()];
        int first = -1;
        for (Block block : split.blocks()) {
            int[] indices = block.indices();
            assertTrue(block.size() > 1, "a block of one value");
            assertTrue(indices[0] > first, "blocks in order");
            first = indices[0];
            for (int k = 0; k < indices.length; k++) {
                assertTrue(k == 0 || indices[k - 1] < indices[k], () -> "ascending " + Arrays.toString(indices));
                assertTrue(!seen[indices[k]], "disjoint blocks");
                seen[indices[k]] = true;
            }
        }
        double[][] columns = split.columns();
        for (int q = 0; q < split.columnCount(); q++) {
            int column = q;
            assertTrue(Arrays.stream(columns).anyMatch(row -> row[column] != 0), "a column of zeros");
        }
    }

    static void assertRoot(Covariance c) {
        double[][] root = Root.of(c);
        assertEquals(c.size(), root.length);
        assertClose(c.toArray(), square(root), 4e-14);
    }

    /** Within a tolerance of sqrt(c_ii c_jj). */
    static void assertClose(double[][] expected, double[][] actual, double tolerance) {
        assertEquals(expected.length, actual.length);
        for (int i = 0; i < expected.length; i++) {
            for (int j = 0; j < expected.length; j++) {
                double scale = Math.sqrt(expected[i][i]) * Math.sqrt(expected[j][j]);
                assertEquals(expected[i][j], actual[i][j], tolerance * scale, "entry " + i + ", " + j);
            }
        }
    }

    /** Within an absolute tolerance. */
    static void assertWithin(double[][] expected, double[][] actual, double tolerance) {
        assertEquals(expected.length, actual.length);
        for (int i = 0; i < expected.length; i++) {
            assertArrayEquals(expected[i], actual[i], tolerance);
        }
    }

    /** Writes into every array that a split hands out. */
    static void spoil(Split split) {
        Arrays.fill(split.diagonal(), Double.NaN);
        for (double[] row : split.columns()) {
            Arrays.fill(row, Double.NaN);
        }
        for (Block block : split.blocks()) {
            Arrays.fill(block.indices(), -1);
            for (int i = 0; i < block.size(); i++) {
                Arrays.fill(block.row(i), Double.NaN);
            }
        }
    }
}
