package distanceladder.covariance;

/**
 * Whether a matrix of unit diagonal is positive definite beyond doubt: a Cholesky factorisation in the given order that
 * never meets a pivot of 10 n eps or less.
 *
 * <p>That it runs to its end proves it (Higham 2002, theorem 10.7 and its proof); when it does not, pivoting has to
 * decide. Three times faster than with pivots, since rows are subtracted four at a time.
 */
final class Definite {
    private static final int PANEL = 32;

    private Definite() {}

    /** Overwrites the part above the diagonal. */
    static boolean overwriting(double[][] upper) {
        int n = upper.length;
        double tolerance = PivotedCholesky.tolerance(n);
        for (int from = 0; from < n; from += PANEL) {
            int to = Math.min(n, from + PANEL);
            for (int k = from; k < to; k++) {
                if (!(upper[k][k] > tolerance)) {
                    return false;
                }
                divide(upper[k], k);
                for (int i = k + 1; i < to; i++) {
                    subtract(upper[i], upper[k], i);
                }
            }
            for (int i = to; i < n; i++) {
                panel(upper, i, from, to);
            }
        }
        return true;
    }

    private static void divide(double[] row, int k) {
        double inverse = 1 / Math.sqrt(row[k]);
        for (int j = k; j < row.length; j++) {
            row[j] *= inverse;
        }
    }

    private static void panel(double[][] upper, int i, int from, int to) {
        int k = from;
        for (; k + 3 < to; k += 4) {
            subtract(upper, i, k);
        }
        for (; k < to; k++) {
            subtract(upper[i], upper[k], i);
        }
    }

    private static void subtract(double[] row, double[] pivotRow, int i) {
        double factor = pivotRow[i];
        for (int j = i; j < row.length; j++) {
            row[j] -= factor * pivotRow[j];
        }
    }

    private static void subtract(double[][] upper, int i, int k) {
        double[] row = upper[i];
        double[] a = upper[k];
        double[] b = upper[k + 1];
        double[] c = upper[k + 2];
        double[] d = upper[k + 3];
        double fa = a[i];
        double fb = b[i];
        double fc = c[i];
        double fd = d[i];
        for (int j = i; j < row.length; j++) {
            row[j] = row[j] - fa * a[j] - fb * b[j] - fc * c[j] - fd * d[j];
        }
    }
}
