package distanceladder.covariance;

import java.util.Arrays;

/**
 * Cholesky factorisation with complete pivoting, {@code P A PT = L LT}, of a matrix whose diagonal is 1 (or 0, with a
 * row of zeros), stopped where the largest remaining pivot is at most 10 n eps.
 *
 * <p>Higham, Accuracy and Stability of Numerical Algorithms (2nd edition, 2002), section 10.3. Cost n r^2.
 */
final class PivotedCholesky {
    private static final double EPSILON = 0x1p-52;

    private final double[][] matrix;
    private final int[] order;
    private final double[][] rows;
    private int rank;

    private PivotedCholesky(double[][] matrix) {
        int n = matrix.length;
        this.matrix = matrix;
        this.order = new int[n];
        this.rows = new double[n][n];
        for (int i = 0; i < n; i++) {
            order[i] = i;
        }
    }

    static PivotedCholesky of(double[][] unitDiagonal) {
        PivotedCholesky factor = new PivotedCholesky(unitDiagonal);
        factor.run();
        return factor;
    }

    static double tolerance(int n) {
        return 10 * n * EPSILON;
    }

    private void run() {
        int n = matrix.length;
        double[] remaining = new double[n];
        for (int i = 0; i < n; i++) {
            remaining[i] = matrix[i][i];
        }
        double tolerance = tolerance(n);
        while (rank < n) {
            int largest = rank;
            for (int i = rank + 1; i < n; i++) {
                if (remaining[i] > remaining[largest]) {
                    largest = i;
                }
            }
            if (!(remaining[largest] > tolerance)) {
                return;
            }
            swap(rank, largest, remaining);
            column(remaining);
            rank++;
        }
    }

    private void swap(int a, int b, double[] remaining) {
        int index = order[a];
        order[a] = order[b];
        order[b] = index;
        double[] row = rows[a];
        rows[a] = rows[b];
        rows[b] = row;
        double value = remaining[a];
        remaining[a] = remaining[b];
        remaining[b] = value;
    }

    private void column(double[] remaining) {
        double[] pivotRow = rows[rank];
        double[] from = matrix[order[rank]];
        double root = Math.sqrt(remaining[rank]);
        pivotRow[rank] = root;
        for (int i = rank + 1; i < order.length; i++) {
            double value = (from[order[i]] - dot(rows[i], pivotRow)) / root;
            rows[i][rank] = value;
            remaining[i] -= value * value;
        }
    }

    /** Over the columns that are done; four sums, so that the additions do not wait for each other. */
    private double dot(double[] a, double[] b) {
        double s0 = 0;
        double s1 = 0;
        double s2 = 0;
        double s3 = 0;
        int k = 0;
        for (; k + 3 < rank; k += 4) {
            s0 += a[k] * b[k];
            s1 += a[k + 1] * b[k + 1];
            s2 += a[k + 2] * b[k + 2];
            s3 += a[k + 3] * b[k + 3];
        }
        for (; k < rank; k++) {
            s0 += a[k] * b[k];
        }
        return (s0 + s1) + (s2 + s3);
    }

    int rank() {
        return rank;
    }

    /** L, its rows in the order of the matrix, n x rank. */
    double[][] factor() {
        double[][] factor = new double[order.length][];
        for (int i = 0; i < order.length; i++) {
            factor[order[i]] = Arrays.copyOf(rows[i], rank);
        }
        return factor;
    }

    /** What is left after the last pivot, at the entry where it is least like a positive semidefinite matrix. */
    Remainder remainder() {
        Remainder worst = new Remainder(0, 0, 0);
        double[] left = new double[order.length];
        for (int i = rank; i < order.length; i++) {
            left[i] = matrix[order[i]][order[i]] - dot(rows[i], rows[i]);
            if (left[i] < worst.pivot) {
                worst = new Remainder(left[i], order[i], order[i]);
            }
            for (int j = rank; j < i; j++) {
                double cross = matrix[order[i]][order[j]] - dot(rows[i], rows[j]);
                double bound = 0.5 * (left[i] + left[j]) - Math.abs(cross);
                if (bound < worst.pivot) {
                    worst = new Remainder(bound, order[i], order[j]);
                }
            }
        }
        return worst;
    }

    /** The least pivot that is left, and the entry where it is found. */
    record Remainder(double pivot, int i, int j) {}
}
