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
    GALACTIC(232.3, 87.8, 1.7),
    /** Cosmic microwave background, five years of WMAP, Hinshaw et al. 2009: 369.0 km/s to l 263.99, b 48.26. */
    BACKGROUND_2009(369.0, 263.99, 48.26),
    /** Cosmic microwave background, COBE, Fixsen et al. 1996: 371 km/s to l 264.14, b 48.26. */
    BACKGROUND_1996(371, 264.14, 48.26),
    /** Local Group by the old rule 300 sin l cos b (de Vaucouleurs et al. 1991, RC3): 300 km/s to l 90, b 0. */
    LOCAL_GROUP_RULE(300, 90, 0);

    private final double speed;
    private final double longitude;
    private final double latitude;

    Frame(double speed, double longitude, double latitude) {
        this.speed = speed;
        this.longitude = longitude;
        this.latitude = latitude;
    }

    /**
     * The Sun's speed in this frame.
     *
     * @return km/s
     */
    public double speed() {
        return speed;
    }

    /**
     * Where the Sun moves to in this frame.
     *
     * @return galactic direction
     */
    public Sky.Galactic apex() {
        return new Sky.Galactic(longitude, latitude);
    }

    /**
     * The Sun's velocity in this frame towards a galactic direction.
     *
     * @param direction where one looks
     * @return km/s
     */
    public double solarMotion(Sky.Galactic direction) {
        return Sky.along(speed, apex(), direction);
    }

    /**
     * The Sun's velocity in this frame towards a direction.
     *
     * @param ra right ascension, degrees
     * @param dec declination, degrees
     * @return km/s; added to a small heliocentric velocity it gives that in the frame
     */
    public double solarMotion(double ra, double dec) {
        return solarMotion(Sky.galactic(ra, dec));
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
        return Redshifts.without(heliocentric, solarRedshift(ra, dec));
    }

    /**
     * A redshift seen from the Sun, of one in this frame.
     *
     * @param z redshift in the frame
     * @param ra right ascension, degrees
     * @param dec declination, degrees
     * @return heliocentric z
     */
    public double heliocentric(double z, double ra, double dec) {
        return Redshifts.composed(z, solarRedshift(ra, dec));
    }

    /**
     * The redshift that the Sun's motion alone gives an object at rest in this frame.
     *
     * @param ra right ascension, degrees
     * @param dec declination, degrees
     * @return z, below zero for an object ahead
     */
    public double solarRedshift(double ra, double dec) {
        double beta = speed / Constants.C_KM_PER_S;
        return Math.sqrt(1 - beta * beta) / (1 + solarMotion(ra, dec) / Constants.C_KM_PER_S) - 1;
    }
}
