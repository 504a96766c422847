package distanceladder.astro;

/** Constants of nature and of convention, each with the standard that fixes it; none has an error. */
public final class Constants {
    /** Speed of light in km/s, exact (SI, 17th General Conference on Weights and Measures 1983). */
    public static final double C_KM_PER_S = 299792.458;

    /** Astronomical unit in m, exact (IAU 2012 Resolution B2). */
    public static final double AU_M = 149597870700.0;

    /** Parsec in m, {@code 648000 / pi} astronomical units (IAU 2015 Resolution B2), rounded to a double. */
    @SuppressWarnings("FloatingPointLiteralPrecision") // Its shortest decimal differs between virtual machines.
    public static final double PC_M = 3.0856775814913672e16;

    /** Megaparsec in km, from {@link #PC_M}. */
    public static final double MPC_KM = 3.085677581491367e19;

    /** Julian year in s, exact: 365.25 days of 86400 s (IAU style manual, Wilkins 1989). */
    public static final double JULIAN_YEAR_S = 31557600.0;

    private Constants() {}
}
