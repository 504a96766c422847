package distanceladder.astro;

/**
 * Directions on the sky.
 *
 * <p>Equatorial coordinates are ICRS, in degrees. Galactic ones by the pole (192.85948, 27.12825) and the position angle
 * 122.93192 degrees of the celestial pole (ESA 1997, volume 1, section 1.5.3).
 */
public final class Sky {
    private static final double DEGREE = StrictMath.PI / 180;
    private static final double POLE_RA = 192.85948 * DEGREE;
    private static final double POLE_DEC = 27.12825 * DEGREE;
    private static final double NODE = 122.93192 * DEGREE;

    private Sky() {}

    /**
     * The angle between two directions (haversine formula, exact for small angles too).
     *
     * @param ra1 right ascension or longitude of one, degrees
     * @param dec1 declination or latitude of one, degrees
     * @param ra2 of the other
     * @param dec2 of the other
     * @return separation in degrees
     */
    public static double separation(double ra1, double dec1, double ra2, double dec2) {
        double d = StrictMath.sin((dec2 - dec1) / 2 * DEGREE);
        double a = StrictMath.sin((ra2 - ra1) / 2 * DEGREE);
        double h = d * d + StrictMath.cos(dec1 * DEGREE) * StrictMath.cos(dec2 * DEGREE) * a * a;
        return 2 * StrictMath.asin(Math.min(1, Math.sqrt(h))) / DEGREE;
    }

    /**
     * Galactic coordinates.
     *
     * @param ra right ascension, degrees
     * @param dec declination, degrees
     * @return longitude (0 to 360) and latitude, degrees
     */
    public static Galactic galactic(double ra, double dec) {
        double a = ra * DEGREE - POLE_RA;
        double d = dec * DEGREE;
        double sinB = StrictMath.sin(POLE_DEC) * StrictMath.sin(d)
                + StrictMath.cos(POLE_DEC) * StrictMath.cos(d) * StrictMath.cos(a);
        double y = StrictMath.cos(d) * StrictMath.sin(a);
        double x = StrictMath.cos(POLE_DEC) * StrictMath.sin(d)
                - StrictMath.sin(POLE_DEC) * StrictMath.cos(d) * StrictMath.cos(a);
        double l = (NODE - StrictMath.atan2(y, x)) / DEGREE;
        return new Galactic(((l % 360) + 360) % 360, StrictMath.asin(sinB) / DEGREE);
    }

    /**
     * A direction in galactic coordinates.
     *
     * @param longitude l, degrees
     * @param latitude b, degrees
     */
    public record Galactic(double longitude, double latitude) {}
}
