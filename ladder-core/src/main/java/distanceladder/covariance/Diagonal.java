package distanceladder.covariance;

import java.util.Arrays;
import java.util.List;

/**
 * The covariance of independent values: {@code C = diag(s_1^2, ..., s_n^2)}.
 *
 * <p>A standard deviation of 0 says that the value is certain. Every operation costs n numbers or less, except
 * {@link #toArray()}.
 */
public final class Diagonal implements Covariance {
    private final double[] variances;

    private Diagonal(double[] variances) {
        this.variances = variances;
    }

    /**
     * From standard deviations.
     *
     * @param sigmas finite, 0 or more
     * @return the covariance
     * @throws distanceladder.text.ValueFault if one is negative, infinite or not a number, or its square leaves the
     *     range of the numbers
     */
    public static Diagonal fromStandardDeviations(double... sigmas) {
        double[] variances = new double[sigmas.length];
        for (int i = 0; i < sigmas.length; i++) {
            variances[i] = Border.square(sigmas[i], i, "diagonal covariance");
        }
        return new Diagonal(variances);
    }

    /**
     * From variances.
     *
     * @param variances finite, 0 or more
     * @return the covariance
     * @throws distanceladder.text.ValueFault if one is negative, infinite or not a number
     */
    public static Diagonal fromVariances(double... variances) {
        double[] copy = new double[variances.length];
        for (int i = 0; i < variances.length; i++) {
            copy[i] = Border.variance(variances[i], i, "diagonal covariance");
        }
        return new Diagonal(copy);
    }

    @Override
    public int size() {
        return variances.length;
    }

    @Override
    public double entry(int i, int j) {
        Border.index(i, variances.length, "diagonal covariance");
        Border.index(j, variances.length, "diagonal covariance");
        return i == j ? variances[i] : 0;
    }

    @Override
    public Diagonal part(int... indices) {
        Border.indices(indices, variances.length, "diagonal covariance");
        double[] chosen = new double[indices.length];
        for (int k = 0; k < indices.length; k++) {
            chosen[k] = variances[indices[k]];
        }
        return new Diagonal(chosen);
    }

    @Override
    public double bilinear(double[] a, double[] b) {
        Border.lengths(a, b, variances.length, "diagonal covariance");
        double sum = 0;
        for (int i = 0; i < variances.length; i++) {
            sum += a[i] * variances[i] * b[i];
        }
        return sum;
    }

    @Override
    public Diagonal scaled(double factor) {
        Border.factor(factor, "diagonal covariance");
        double[] product = new double[variances.length];
        for (int i = 0; i < variances.length; i++) {
            product[i] =
                    Border.product(variances[i], factor, "variance " + i + " times " + factor, "diagonal covariance");
        }
        return new Diagonal(product);
    }

    @Override
    public Split split() {
        return new Split(variances.clone(), List.of(), Split.noColumns(variances.length));
    }

    double variance(int i) {
        return variances[i];
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Diagonal that && Arrays.equals(variances, that.variances);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(variances);
    }

    @Override
    public String toString() {
        return "diagonal covariance of " + variances.length + " values";
    }
}
