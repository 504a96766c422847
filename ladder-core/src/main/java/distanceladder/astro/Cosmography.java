package distanceladder.astro;

/**
 * The luminosity distance at small redshift, expanded to third order: {@code d_L = (c z / H0) f(z)},
 *
 * <pre>f(z; q0, j0) = 1 + (1 - q0) z / 2 - (1 - q0 - 3 q0^2 + j0) z^2 / 6</pre>
 *
 * for a flat universe (Visser 2004, equation 45, without curvature; Caldwell and Kamionkowski 2004). For a flat model
 * with matter density 0.3 the error is below 2e-5 mag at z = 0.07 and 1.2e-4 mag at z = 0.15.
 */
public final class Cosmography {
    /** Speed of light in km/s, that of {@link Constants}. */
    public static final double LIGHT_KM_PER_S = Constants.C_KM_PER_S;

    /** Kilometres in a megaparsec, those of {@link Constants}. */
    public static final double MPC_KM = Constants.MPC_KM;

    /** Seconds in 10^9 Julian years of 365.25 days. */
    public static final double GYR_S = 1e9 * Constants.JULIAN_YEAR_S;

    private Cosmography() {}

    /**
     * The expansion factor f.
     *
     * @param z redshift
     * @param q0 deceleration parameter
     * @param j0 jerk parameter
     * @return f(z)
     */
    public static double f(double z, double q0, double j0) {
        return 1 + 0.5 * (1 - q0) * z - (1 - q0 - 3 * q0 * q0 + j0) * z * z / 6;
    }

    /**
     * The luminosity distance.
     *
     * @param z redshift
     * @param hubble Hubble constant, km/s/Mpc
     * @param q0 deceleration parameter
     * @param j0 jerk parameter
     * @return Mpc
     */
    public static double luminosityDistance(double z, double hubble, double q0, double j0) {
        return LIGHT_KM_PER_S * z * f(z, q0, j0) / hubble;
    }

    /**
     * The Hubble time 1/H0.
     *
     * @param hubble km/s/Mpc
     * @return 10^9 years
     */
    public static double hubbleTime(double hubble) {
        return MPC_KM / hubble / GYR_S;
    }
}
