package distanceladder.fit;

/**
 * An intrinsic scatter by restricted maximum likelihood (Patterson and Thompson 1971; Harville 1977, section 5).
 *
 * <p>For data {@code y ~ N(X b, V)}, {@code V = V0 + s^2 D} with D the indicator of some data, and {@code P = V^-1 - V^-1
 * X (XT V^-1 X)^-1 XT V^-1}, the restricted likelihood has the score {@code [yT P D P y - tr(P D)] / 2} in s^2 and the
 * expected information {@code tr(P D P D) / 2}. A step of Fisher scoring is therefore
 *
 * <pre>s^2 + (yT P D P y - tr(P D)) / tr(P D P D)</pre>
 *
 * With V0 = 0 and all data alike one step gives the residual sum of squares over n - p. At the solution the variance of
 * the estimate of s^2 is {@code 2 / tr(P D P D)}.
 */
public final class Scatter {
    private Scatter() {}

    /**
     * One step of Fisher scoring.
     *
     * @param variance present s^2
     * @param squares yT P D P y
     * @param trace tr(P D)
     * @param traceOfSquare tr(P D P D), above zero
     * @return next s^2; may be negative, when the likelihood is largest at zero
     */
    public static double next(double variance, double squares, double trace, double traceOfSquare) {
        return variance + (squares - trace) / traceOfSquare;
    }

    /**
     * The variance of the estimate of s^2.
     *
     * @param traceOfSquare tr(P D P D)
     * @return 2 over it
     */
    public static double varianceOfEstimate(double traceOfSquare) {
        return 2 / traceOfSquare;
    }
}
