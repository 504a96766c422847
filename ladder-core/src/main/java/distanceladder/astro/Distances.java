package distanceladder.astro;

import distanceladder.text.ValueFault;

/**
 * Distance modulus, distance and parallax of one another.
 *
 * <p>{@code mu = 5 log10(d / 10 pc)}: with d in Mpc {@code mu = 5 log10 d + 25}, with the parallax {@code p = 1 / d} in
 * mas {@code mu = 10 - 5 log10 p} (IAU 2015 Resolution B2 for the parsec). Their slopes are {@code dd/dmu = (ln 10 / 5)
 * d} and {@code dp/dmu = -(ln 10 / 5) p}.
 */
public final class Distances {
    private static final double SLOPE = PowersOfTen.LN10 / 5;

    private Distances() {}

    /**
     * Modulus of a distance.
     *
     * @param megaparsec distance in Mpc, above zero
     * @return mag
     */
    public static double modulusFromMegaparsec(double megaparsec) {
        requirePositive("distance", megaparsec, "Mpc");
        return 5 * StrictMath.log10(megaparsec) + 25;
    }

    /**
     * Distance of a modulus.
     *
     * @param modulus mag
     * @return Mpc
     */
    public static double megaparsecFromModulus(double modulus) {
        return PowersOfTen.tenTo((modulus - 25) / 5);
    }

    /**
     * Modulus of a parallax without error.
     *
     * @param milliarcsecond parallax in mas, above zero
     * @return mag
     */
    public static double modulusFromParallax(double milliarcsecond) {
        requirePositive("parallax", milliarcsecond, "mas");
        return 10 - 5 * StrictMath.log10(milliarcsecond);
    }

    /**
     * Parallax of a modulus.
     *
     * @param modulus mag
     * @return mas
     */
    public static double parallaxFromModulus(double modulus) {
        return PowersOfTen.tenTo((10 - modulus) / 5);
    }

    /**
     * Slope of the distance over the modulus, {@code (ln 10 / 5) d}.
     *
     * @param modulus mag
     * @return Mpc/mag
     */
    public static double megaparsecPerMagnitude(double modulus) {
        return SLOPE * megaparsecFromModulus(modulus);
    }

    /**
     * Slope of the parallax over the modulus, {@code -(ln 10 / 5) p}.
     *
     * @param modulus mag
     * @return mas/mag, below zero
     */
    public static double parallaxPerMagnitude(double modulus) {
        return -SLOPE * parallaxFromModulus(modulus);
    }

    /**
     * First-order error of a modulus from a relative error of distance or parallax: {@code (5 / ln 10) s}.
     *
     * @param relative standard deviation over value
     * @return mag
     */
    public static double modulusError(double relative) {
        return relative / SLOPE;
    }

    /**
     * First-order relative error of a distance or parallax from an error of its modulus: {@code (ln 10 / 5) s}.
     *
     * @param modulusError standard deviation, mag
     * @return standard deviation over value
     */
    public static double relativeError(double modulusError) {
        return modulusError * SLOPE;
    }

    private static void requirePositive(String what, double value, String unit) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new ValueFault(
                    what + " = " + value + " " + unit,
                    "a modulus belongs to a finite " + what + " above zero",
                    "",
                    "keep it in its own scale");
        }
    }
}
