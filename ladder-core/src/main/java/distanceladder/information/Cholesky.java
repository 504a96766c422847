package distanceladder.information;

import distanceladder.text.ValueFault;

/**
 * The Cholesky factor of a positive definite matrix, {@code C = L LT}, by rows of {@code U = LT} and in panels.
 *
 * <p>No absolute threshold: a pivot is refused when it is at most {@code 8 n eps} of its own diagonal element, so a
 * covariance in any unit is treated alike (the factorisation is invariant under scaling of the rows: Higham 2002,
 * section 10.1). Cost n^3/3.
 */
final class Cholesky {
    private static final int PANEL = 32;
    private static final double EPSILON = 0x1p-52;

    private final double[][] u;

    private Cholesky(double[][] u) {
        this.u = u;
    }

    /**
     * Factors in place.
     *
     * @param upper n rows of length n, of which the part from the diagonal on is read; overwritten
     * @param where what the matrix is, for the message of a refusal
     * @return the factor
     */
    static Cholesky of(double[][] upper, String where) {
        int n = upper.length;
        double[] diagonal = new double[n];
        for (int i = 0; i < n; i++) {
            diagonal[i] = upper[i][i];
        }
        for (int from = 0; from < n; from += PANEL) {
            int to = Math.min(n, from + PANEL);
            for (int k = from; k < to; k++) {
                pivot(upper, k, diagonal[k], where);
                for (int i = k + 1; i < to; i++) {
                    subtractOne(upper[i], upper[k], i);
                }
            }
            for (int i = to; i < n; i++) {
                subtract(upper, i, from, to);
            }
        }
        return new Cholesky(upper);
    }

    private static void pivot(double[][] upper, int k, double diagonal, String where) {
        double[] row = upper[k];
        double square = row[k];
        if (!(square > 8 * row.length * EPSILON * diagonal)) {
            throw new ValueFault(
                    "pivot " + k + " of a noise covariance = " + square + " (of " + diagonal + ")",
                    "noise that is whitened is positive definite",
                    where,
                    "carry an error that is common to all data as a low-rank update or as a source,"
                            + " or give each datum some variance of its own");
        }
        double root = Math.sqrt(square);
        row[k] = root;
        double inverse = 1 / root;
        for (int j = k + 1; j < row.length; j++) {
            row[j] *= inverse;
        }
    }

    private static void subtractOne(double[] target, double[] pivot, int from) {
        double f = pivot[from];
        if (f != 0) {
            for (int j = from; j < target.length; j++) {
                target[j] -= f * pivot[j];
            }
        }
    }

    private static void subtract(double[][] u, int i, int from, int to) {
        int k = from;
        for (; k + 3 < to; k += 4) {
            subtractFour(u[i], i, u[k], u[k + 1], u[k + 2], u[k + 3]);
        }
        for (; k < to; k++) {
            subtractOne(u[i], u[k], i);
        }
    }

    private static void subtractFour(double[] target, int i, double[] a, double[] b, double[] c, double[] d) {
        double fa = a[i];
        double fb = b[i];
        double fc = c[i];
        double fd = d[i];
        for (int j = i; j < target.length; j++) {
            target[j] = target[j] - fa * a[j] - fb * b[j] - fc * c[j] - fd * d[j];
        }
    }

    /** Replaces rows by L^-1 rows. */
    void whiten(double[][] rows) {
        for (int k = 0; k < u.length; k++) {
            double[] row = rows[k];
            double inverse = 1 / u[k][k];
            for (int j = 0; j < row.length; j++) {
                row[j] *= inverse;
            }
            for (int i = k + 1; i < u.length; i++) {
                double f = u[k][i];
                if (f != 0) {
                    double[] target = rows[i];
                    for (int j = 0; j < row.length; j++) {
                        target[j] -= f * row[j];
                    }
                }
            }
        }
    }

    /** L^-1 b, a fresh vector. */
    double[] forward(double[] b) {
        double[] x = b.clone();
        for (int k = 0; k < u.length; k++) {
            x[k] /= u[k][k];
            double f = x[k];
            if (f != 0) {
                for (int i = k + 1; i < u.length; i++) {
                    x[i] -= f * u[k][i];
                }
            }
        }
        return x;
    }

    /** L^-T b, a fresh vector. */
    double[] backward(double[] b) {
        double[] x = b.clone();
        for (int k = u.length - 1; k >= 0; k--) {
            double sum = x[k];
            double[] row = u[k];
            for (int i = k + 1; i < u.length; i++) {
                sum -= row[i] * x[i];
            }
            x[k] = sum / row[k];
        }
        return x;
    }
}
