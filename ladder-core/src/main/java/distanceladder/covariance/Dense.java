package distanceladder.covariance;

import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A covariance given by all its entries.
 *
 * <p>Checked once, in the factory, relative to its own diagonal: square, finite, symmetric within 1e-10 of
 * {@code sqrt(c_ii c_jj)} (and then made exactly symmetric by averaging), a row of zeros where the variance is zero,
 * and positive semidefinite by Cholesky factorisation with complete pivoting (Higham 2002, section 10.3) of the matrix
 * scaled to unit diagonal: nothing below -10 n eps may remain. So the unit of the values does not matter.
 *
 * <p>Cost: n^2 numbers, the check n^3/3 operations.
 */
public final class Dense implements Covariance {
    private static final String KIND = "dense covariance";

    private final double[][] entries;

    private Dense(double[][] entries) {
        this.entries = entries;
    }

    /**
     * From covariances.
     *
     * @param entries n rows of n numbers
     * @return the covariance
     * @throws ValueFault if the matrix is not square, finite, symmetric and positive semidefinite; the message names
     *     the entry and gives the measured defect
     */
    public static Dense fromCovariance(double[][] entries) {
        return new Dense(DenseCheck.covariance(entries, KIND));
    }

    /**
     * From standard deviations and correlations: {@code c_ij = r_ij s_i s_j}.
     *
     * @param sigmas n standard deviations, finite, 0 or more
     * @param correlations n rows of n numbers, 1 on the diagonal
     * @return the covariance
     * @throws ValueFault if the numbers are no standard deviations, or no correlations: not square, finite, symmetric
     *     and positive semidefinite with 1 on the diagonal
     */
    public static Dense fromCorrelations(double[] sigmas, double[][] correlations) {
        double[][] product = DenseCheck.correlations(correlations, "correlations");
        if (sigmas.length != product.length) {
            throw new ValueFault(
                    sigmas.length + " standard deviations and " + product.length + " rows of correlations",
                    "both are of the same values",
                    "correlations",
                    "give one standard deviation for each row");
        }
        for (int i = 0; i < sigmas.length; i++) {
            Border.square(sigmas[i], i, "correlations");
        }
        for (int i = 0; i < sigmas.length; i++) {
            for (int j = 0; j < sigmas.length; j++) {
                product[i][j] = product[i][j] * (sigmas[i] * sigmas[j]) + 0.0;
            }
        }
        return new Dense(product);
    }

    @Override
    public int size() {
        return entries.length;
    }

    @Override
    public double entry(int i, int j) {
        Border.index(i, entries.length, KIND);
        Border.index(j, entries.length, KIND);
        return entries[i][j];
    }

    @Override
    public double[][] toArray() {
        double[][] copy = new double[entries.length][];
        for (int i = 0; i < entries.length; i++) {
            copy[i] = entries[i].clone();
        }
        return copy;
    }

    @Override
    public Dense part(int... indices) {
        Border.indices(indices, entries.length, KIND);
        return new Dense(Block.chosen(entries, indices));
    }

    @Override
    public double bilinear(double[] a, double[] b) {
        Border.lengths(a, b, entries.length, KIND);
        double sum = 0;
        for (int i = 0; i < entries.length; i++) {
            double inner = 0;
            double[] row = entries[i];
            for (int j = 0; j < row.length; j++) {
                inner += row[j] * b[j];
            }
            sum += a[i] * inner;
        }
        return sum;
    }

    @Override
    public Dense scaled(double factor) {
        Border.factor(factor, KIND);
        double[][] product = toArray();
        for (int i = 0; i < product.length; i++) {
            Border.product(product[i][i], factor, "variance " + i + " times " + factor, KIND);
            for (int j = 0; j < product.length; j++) {
                product[i][j] = product[i][j] * factor + 0.0;
            }
        }
        return new Dense(product);
    }

    @Override
    public Split split() {
        int n = entries.length;
        Groups groups = new Groups(n);
        double[] diagonal = new double[n];
        for (int i = 0; i < n; i++) {
            diagonal[i] = entries[i][i];
            for (int j = 0; j < i; j++) {
                if (entries[i][j] != 0) {
                    groups.join(i, j);
                }
            }
        }
        List<Block> blocks = new ArrayList<>();
        for (int[] group : groups.larger()) {
            blocks.add(Block.of(group, group.length == n ? entries : Block.chosen(entries, group)));
            for (int i : group) {
                diagonal[i] = 0;
            }
        }
        return new Split(diagonal, blocks, Split.noColumns(n));
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Dense that && Arrays.deepEquals(entries, that.entries);
    }

    @Override
    public int hashCode() {
        return Arrays.deepHashCode(entries);
    }

    @Override
    public String toString() {
        return "dense covariance of " + entries.length + " values";
    }
}
