package distanceladder.covariance;

import distanceladder.text.ValueFault;
import java.util.Arrays;

/**
 * A covariance plus the effect of a few errors that many values share: {@code C = B + U K UT}.
 *
 * <p>B is the base, of n values; U has n rows and k columns, the derivative of each value by each shared error; K is
 * the covariance of the shared errors (unit variances where none is given). Neither {@code U K UT} nor C is ever
 * formed. Cost: n k numbers beside the base.
 */
public final class LowRankUpdate implements Covariance {
    private static final String KIND = "low-rank update";

    private final Covariance base;
    private final double[][] columns;
    private final Covariance kernel;

    private LowRankUpdate(Covariance base, double[][] columns, Covariance kernel) {
        this.base = base;
        this.columns = columns;
        this.kernel = kernel;
    }

    /**
     * Adds {@code U UT}: each column is the effect of one standard deviation of a shared error.
     *
     * @param base covariance of n values
     * @param columns n rows of k numbers
     * @return the covariance
     * @throws ValueFault if the rows are not n, not of one length, or not finite
     */
    public static LowRankUpdate of(Covariance base, double[][] columns) {
        double[] ones = new double[columns.length == 0 ? 0 : columns[0].length];
        Arrays.fill(ones, 1);
        return of(base, columns, Diagonal.fromVariances(ones));
    }

    /**
     * Adds {@code U K UT}.
     *
     * @param base covariance of n values
     * @param columns n rows of k numbers
     * @param k covariance of the k shared errors
     * @return the covariance
     * @throws ValueFault if the rows are not n, not of k numbers, or not finite, or if a variance leaves the range of
     *     the numbers
     */
    public static LowRankUpdate of(Covariance base, double[][] columns, Covariance k) {
        if (columns.length != base.size()) {
            throw new ValueFault(
                    columns.length + " rows of columns",
                    "the base is of " + base.size() + " values",
                    KIND,
                    "give one row for each value");
        }
        double[][] copy = new double[columns.length][];
        for (int i = 0; i < columns.length; i++) {
            copy[i] = columns[i].clone();
            if (copy[i].length != k.size()) {
                throw new ValueFault(
                        "row " + i + " of " + copy[i].length + " numbers",
                        "there are " + k.size() + " shared errors",
                        KIND,
                        "give one number for each shared error in every row");
            }
            for (int j = 0; j < copy[i].length; j++) {
                Border.finite(copy[i][j], "column " + j + " of row " + i, KIND);
            }
            Border.finite(k.bilinear(copy[i], copy[i]), "the shared variance of row " + i, KIND);
        }
        return new LowRankUpdate(base, copy, k);
    }

    @Override
    public int size() {
        return columns.length;
    }

    @Override
    public double entry(int i, int j) {
        Border.index(i, columns.length, KIND);
        Border.index(j, columns.length, KIND);
        double[] u = columns[i];
        double[] v = columns[j];
        // in an order of their own, so that neither (j, i) nor a reordered part changes a bit
        return base.entry(i, j) + (Arrays.compare(u, v) < 0 ? kernel.bilinear(u, v) : kernel.bilinear(v, u));
    }

    @Override
    public LowRankUpdate part(int... indices) {
        Border.indices(indices, columns.length, KIND);
        double[][] rows = new double[indices.length][];
        for (int i = 0; i < indices.length; i++) {
            rows[i] = columns[indices[i]];
        }
        return new LowRankUpdate(base.part(indices), rows, kernel);
    }

    @Override
    public double bilinear(double[] a, double[] b) {
        return base.bilinear(a, b) + kernel.bilinear(collected(a), collected(b));
    }

    /** UT a. */
    private double[] collected(double[] a) {
        double[] sum = new double[kernel.size()];
        for (int i = 0; i < a.length; i++) {
            for (int k = 0; k < sum.length; k++) {
                sum[k] += columns[i][k] * a[i];
            }
        }
        return sum;
    }

    @Override
    public LowRankUpdate scaled(double factor) {
        Border.factor(factor, KIND);
        return new LowRankUpdate(base.scaled(factor), columns, kernel.scaled(factor));
    }

    @Override
    public Split split() {
        Split whitened = base.split();
        double[] diagonal = new double[columns.length];
        for (int i = 0; i < diagonal.length; i++) {
            diagonal[i] = whitened.variance(i);
        }
        return new Split(
                diagonal, whitened.blocks(), Split.beside(whitened.sharedColumns(), withoutZeros(columnsTimesRoot())));
    }

    /** U L, with K = L LT. */
    private double[][] columnsTimesRoot() {
        if (columns.length == 0) {
            return columns;
        }
        double[][] root = Root.of(kernel);
        int rank = root.length == 0 ? 0 : root[0].length;
        if (rank == 0) {
            return Split.noColumns(columns.length);
        }
        double[][] product = new double[columns.length][rank];
        for (int i = 0; i < columns.length; i++) {
            for (int k = 0; k < root.length; k++) {
                double value = columns[i][k];
                if (value != 0) {
                    for (int q = 0; q < rank; q++) {
                        product[i][q] += value * root[k][q];
                    }
                }
            }
        }
        return product;
    }

    private static double[][] withoutZeros(double[][] rows) {
        if (rows.length == 0 || rows[0].length == 0) {
            return rows;
        }
        boolean[] used = new boolean[rows[0].length];
        int count = 0;
        for (double[] row : rows) {
            for (int q = 0; q < row.length; q++) {
                if (row[q] != 0 && !used[q]) {
                    used[q] = true;
                    count++;
                }
            }
        }
        if (count == used.length) {
            return rows;
        }
        double[][] kept = count == 0 ? Split.noColumns(rows.length) : new double[rows.length][count];
        int to = 0;
        for (int q = 0; q < used.length; q++) {
            if (used[q]) {
                for (int i = 0; i < rows.length; i++) {
                    kept[i][to] = rows[i][q];
                }
                to++;
            }
        }
        return kept;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof LowRankUpdate that
                && base.equals(that.base)
                && Arrays.deepEquals(columns, that.columns)
                && kernel.equals(that.kernel);
    }

    @Override
    public int hashCode() {
        return 31 * (31 * base.hashCode() + Arrays.deepHashCode(columns)) + kernel.hashCode();
    }

    @Override
    public String toString() {
        return base + ", with " + kernel.size() + " shared errors";
    }
}
