package distanceladder.covariance;

import java.util.ArrayList;
import java.util.List;

/**
 * A square root of a covariance: L with {@code C = L LT}.
 *
 * <p>L has one row for each value and one column for each independent direction. A diagonal gives one column for each
 * variance other than zero; a certain covariance gives none. A dense block gives the pivoted Cholesky factor (Higham
 * 2002, section 10.3) of the block scaled to unit diagonal, as many columns as its numerical rank at 10 n eps, correct
 * to about n eps of {@code sqrt(c_ii c_jj)}. Shared errors of a low-rank update keep their own columns: what is small
 * beside them is not lost, however large they are.
 *
 * <p>Cost: n x rank numbers, n rank^2 operations.
 */
public final class Root {
    private Root() {}

    /**
     * The square root.
     *
     * @param c a covariance
     * @return a fresh array of n rows, all of one length
     */
    public static double[][] of(Covariance c) {
        Split split = c.split();
        int n = split.size();
        List<double[][]> factors = new ArrayList<>();
        int columns = split.columnCount();
        for (Block block : split.blocks()) {
            double[][] factor = factor(block.shared());
            factors.add(factor);
            columns += factor[0].length;
        }
        for (int i = 0; i < n; i++) {
            columns += split.variance(i) > 0 ? 1 : 0;
        }
        double[][] root = new double[n][columns];
        int next = 0;
        for (int i = 0; i < n; i++) {
            if (split.variance(i) > 0) {
                root[i][next++] = Math.sqrt(split.variance(i));
            }
        }
        for (int k = 0; k < factors.size(); k++) {
            next = placed(factors.get(k), split.blocks().get(k), root, next);
        }
        for (int i = 0; i < n; i++) {
            System.arraycopy(split.sharedColumns()[i], 0, root[i], next, split.columnCount());
        }
        return root;
    }

    private static int placed(double[][] factor, Block block, double[][] root, int from) {
        for (int i = 0; i < factor.length; i++) {
            System.arraycopy(factor[i], 0, root[block.index(i)], from, factor[i].length);
        }
        return from + factor[0].length;
    }

    private static double[][] factor(double[][] entries) {
        double[] sigmas = new double[entries.length];
        for (int i = 0; i < sigmas.length; i++) {
            sigmas[i] = Math.sqrt(entries[i][i]);
        }
        double[][] factor = PivotedCholesky.of(DenseCheck.unit(entries, sigmas)).factor();
        for (int i = 0; i < sigmas.length; i++) {
            for (int k = 0; k < factor[i].length; k++) {
                factor[i][k] *= sigmas[i];
            }
        }
        return factor;
    }
}
