package distanceladder.information;

/**
 * A linear combination of unknowns on the columns of one {@link Solved}: {@code q = constant + cT x}, kept as
 * {@code t = R^-T c}, whose length is the standard deviation of q.
 */
public final class Combination {
    private final double constant;
    private final double[] t;

    Combination(double constant, double[] t) {
        this.constant = constant;
        this.t = t;
    }

    double constant() {
        return constant;
    }

    double t(int i) {
        return t[i];
    }

    /**
     * The vector t.
     *
     * @return a copy
     */
    public double[] t() {
        return t.clone();
    }

    /**
     * The sum of scaled combinations.
     *
     * @param factor factor of this one
     * @param other another of the same solution
     * @param otherFactor its factor
     * @return factor this + otherFactor other
     */
    public Combination plus(double factor, Combination other, double otherFactor) {
        double[] sum = new double[t.length];
        for (int i = 0; i < sum.length; i++) {
            sum[i] = factor * t[i] + otherFactor * other.t[i];
        }
        return new Combination(factor * constant + otherFactor * other.constant, sum);
    }

    /**
     * The same with a constant added.
     *
     * @param shift what is added to the value
     * @return the shifted combination
     */
    public Combination shifted(double shift) {
        return new Combination(constant + shift, t);
    }

    /**
     * The same times a factor.
     *
     * @param factor factor
     * @return the scaled combination
     */
    public Combination times(double factor) {
        return plus(factor, this, 0);
    }

    /**
     * The covariance of two combinations.
     *
     * @param other another of the same solution
     * @return tT t'
     */
    public double covariance(Combination other) {
        double sum = 0;
        for (int i = 0; i < t.length; i++) {
            sum += t[i] * other.t[i];
        }
        return sum;
    }
}
