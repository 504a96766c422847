package distanceladder.astro;

/**
 * Frames of rest, each by the Sun's velocity in it: speed and galactic direction.
 *
 * <p>A velocity or redshift in the frame follows from the heliocentric one by composition, {@code (1 + z_hel) = (1 +
 * z_frame)(1 + z_sun)} with {@code 1 + z_sun = 1 / (g (1 + b cos t))}, b the Sun's speed over that of
 * light, g its Lorentz factor and t the angle to the object (special relativity, Einstein 1905, section 7); redshifts compose by product, not
 * by sum.
 */
public enum Frame {
    /** Cosmic microwave background, Planck Collaboration 2018 (I), table 3: 369.82 km/s to l 264.021, b 48.253. */
    BACKGROUND(369.82, 264.021, 48.253),
    /** Local Group, Karachentsev and Makarov 1996: 316 km/s to l 93, b -4. */
    LOCAL_GROUP(316, 93, -4),
    /** Local Group, Yahil, Tammann and Sandage 1977: 308 km/s to l 105, b -7. */
    LOCAL_GROUP_1977(308, 105, -7),
    /** Galactic centre, de Vaucouleurs et al. 1991 (RC3): 232.3 km/s to l 87.8, b 1.7. */
    GALACTIC(232.3, 87.8, 1.7);

    private final double speed;
    private final double longitude;
    private final double latitude;

    Frame(double speed, double longitude, double latitude) {
        this.speed = speed;
        this.longitude = longitude;
        this.latitude = latitude;
    }

    /**
     * The Sun's velocity in this frame towards a direction.
     *
     * @param ra right ascension, degrees
     * @param dec declination, degrees
     * @return km/s; added to a small heliocentric velocity it gives that in the frame
     */
    public double solarMotion(double ra, double dec) {
        Sky.Galactic g = Sky.galactic(ra, dec);
        double angle = Sky.separation(g.longitude(), g.latitude(), longitude, latitude);
        return speed * StrictMath.cos(angle * StrictMath.PI / 180);
    }

    /**
     * A redshift in this frame.
     *
     * @param heliocentric redshift seen from the Sun
     * @param ra right ascension, degrees
     * @param dec declination, degrees
     * @return z in the frame
     */
    public double redshift(double heliocentric, double ra, double dec) {
        double beta = speed / Cosmography.LIGHT_KM_PER_S;
        double along = solarMotion(ra, dec) / Cosmography.LIGHT_KM_PER_S;
        double sun = Math.sqrt(1 - beta * beta) / (1 + along) - 1;
        return (1 + heliocentric) / (1 + sun) - 1;
    }
}
