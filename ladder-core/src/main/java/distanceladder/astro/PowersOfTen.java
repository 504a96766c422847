package distanceladder.astro;

/** Powers of ten with the same bits on every virtual machine. */
public final class PowersOfTen {
    /** The natural logarithm of 10. */
    public static final double LN10 = StrictMath.log(10);

    private PowersOfTen() {}

    /**
     * Ten to a power, as {@code exp(x ln 10)}.
     *
     * @param x the power
     * @return 10^x, with a relative error below 5e-16 (1 + |x|)
     */
    public static double tenTo(double x) {
        return StrictMath.exp(x * LN10);
    }
}
