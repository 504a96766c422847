package distanceladder.astro;

/** How a correlation falls off with separation on the sky. */
public enum AngularKernel {
    /** {@code exp(-t / s)}. */
    EXPONENTIAL,
    /** {@code exp(-t^2 / (2 s^2))}. */
    SQUARED_EXPONENTIAL;

    /**
     * The correlation at a separation.
     *
     * @param separation t, degrees
     * @param scale s, degrees, above zero
     * @return between 0 and 1
     */
    public double correlation(double separation, double scale) {
        double x = separation / scale;
        return StrictMath.exp(this == EXPONENTIAL ? -x : -x * x / 2);
    }
}
