package distanceladder.information;

/**
 * Householder reflections of rows into a triangle, the one kernel of this floor.
 *
 * <p>A system of m rows {@code [A | y]} (each row p coefficients, then its right side, all divided by their standard
 * deviation) is folded into an upper triangle {@code [R | z]} by reflections {@code H = I - beta v vT}, one for each
 * column j: {@code v = (R_jj - alpha, A_1j, ..., A_mj)}, {@code alpha = -sign(R_jj) s}, {@code s = |(R_jj, A_.j)|},
 * {@code beta = 1 / (s (s + |R_jj|))}; where these would underflow, v over its first element, {@code beta = (s + |R_jj|) / s} (Householder 1958; Golub and Van Loan 2013, section 5.1). Afterwards
 * {@code |A x - y|^2 + |R x - z|^2} (old triangle) is {@code |R x - z|^2} (new triangle) plus a constant, the sum of
 * squares that is left in the right sides. The vectors stay in the columns of the rows, so that the transformation can
 * be run backwards: see {@link #back}.
 *
 * <p>The inner loops run along a row, so that they are plain sums of scaled rows ({@code a*b + c}): the same bits on
 * every virtual machine.
 */
final class Householder {
    private static final double SMALL = 1e-140;

    private Householder() {}

    /**
     * Folds rows into a triangle; the rows are overwritten by the reflection vectors and what is left of their right
     * sides.
     *
     * @param triangle p rows of length p + 1, row j is zero before column j; updated
     * @param rows m rows of length p + 1; overwritten
     * @param heads receives the first element and beta of each column, 2 p numbers
     * @return the sum of squares left in the right sides
     */
    static double absorb(double[][] triangle, double[][] rows, double[] heads) {
        int p = triangle.length;
        double[] w = new double[p + 1];
        for (int j = 0; j < p; j++) {
            double below = 0;
            double largest = 0;
            int first = rows.length;
            int last = -1;
            for (int i = 0; i < rows.length; i++) {
                double x = rows[i][j];
                if (x != 0) {
                    below += x * x;
                    largest = Math.max(largest, Math.abs(x));
                    first = Math.min(first, i);
                    last = i;
                }
            }
            if (largest == 0) {
                heads[2 * j] = 0;
                heads[2 * j + 1] = 0;
                continue;
            }
            double[] top = triangle[j];
            boolean plain = largest > SMALL;
            double s = plain ? Math.sqrt(top[j] * top[j] + below) : length(rows, j, top[j], largest);
            double alpha = top[j] > 0 ? -s : s;
            double head = top[j] - alpha;
            double beta = 1 / (s * (s + Math.abs(top[j])));
            if (!plain) {
                beta = (s + Math.abs(top[j])) / s;
                divide(rows, j, head, first, last);
                head = 1;
            }
            heads[2 * j] = head;
            heads[2 * j + 1] = beta;
            top[j] = alpha;
            for (int k = j + 1; k <= p; k++) {
                w[k] = head * top[k];
            }
            gather(w, rows, j, first, last);
            for (int k = j + 1; k <= p; k++) {
                w[k] *= beta;
                top[k] -= head * w[k];
            }
            scatter(w, rows, j, first, last);
        }
        double rest = 0;
        for (double[] row : rows) {
            rest += row[p] * row[p];
        }
        return rest;
    }

    /** The length of a column whose squares would underflow: rows used up by earlier columns leave such rests. */
    private static double length(double[][] rows, int j, double top, double largest) {
        double scale = Math.max(largest, Math.abs(top));
        double sum = top / scale * (top / scale);
        for (double[] row : rows) {
            sum += row[j] / scale * (row[j] / scale);
        }
        return scale * Math.sqrt(sum);
    }

    private static void divide(double[][] rows, int j, double head, int first, int last) {
        for (int i = first; i <= last; i++) {
            rows[i][j] /= head;
        }
    }

    /** w += sum over the rows first to last of rows[i][j] * rows[i], from column j + 1 on. */
    private static void gather(double[] w, double[][] rows, int j, int first, int last) {
        int i = first;
        for (; i + 2 < last; i += 3) {
            gatherThree(w, j + 1, rows[i], rows[i + 1], rows[i + 2]);
        }
        for (; i <= last; i++) {
            double[] row = rows[i];
            double v = row[j];
            if (v != 0) {
                for (int k = j + 1; k < w.length; k++) {
                    w[k] += v * row[k];
                }
            }
        }
    }

    private static void gatherThree(double[] w, int from, double[] a, double[] b, double[] c) {
        double va = a[from - 1];
        double vb = b[from - 1];
        double vc = c[from - 1];
        for (int k = from; k < w.length; k++) {
            w[k] = w[k] + va * a[k] + vb * b[k] + vc * c[k];
        }
    }

    /** rows[i] -= rows[i][j] * w for the rows first to last, from column j + 1 on. */
    private static void scatter(double[] w, double[][] rows, int j, int first, int last) {
        for (int i = first; i <= last; i++) {
            double[] row = rows[i];
            double v = row[j];
            if (v != 0) {
                for (int k = j + 1; k < w.length; k++) {
                    row[k] -= v * w[k];
                }
            }
        }
    }

    /**
     * Runs the reflections of {@link #absorb} backwards on a vector: from its components along the new triangle's rows
     * to those along the old triangle's rows and along the absorbed rows.
     *
     * @param top components along the new triangle's p rows; replaced by those along the old triangle's
     * @param rows the rows as absorb left them
     * @param heads as absorb left them
     * @return components along the absorbed rows
     */
    static double[] back(double[] top, double[][] rows, double[] heads) {
        double[] bottom = new double[rows.length];
        for (int j = top.length - 1; j >= 0; j--) {
            double beta = heads[2 * j + 1];
            if (beta == 0) {
                continue;
            }
            double w = heads[2 * j] * top[j];
            for (int i = 0; i < rows.length; i++) {
                w += rows[i][j] * bottom[i];
            }
            w *= beta;
            top[j] -= heads[2 * j] * w;
            for (int i = 0; i < rows.length; i++) {
                bottom[i] -= rows[i][j] * w;
            }
        }
        return bottom;
    }
}
