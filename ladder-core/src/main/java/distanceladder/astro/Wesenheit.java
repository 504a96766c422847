package distanceladder.astro;

import distanceladder.text.ValueFault;

/**
 * A magnitude that reddening by dust leaves as it is: {@code W = m_a - R (m_b - m_c)}, with R the ratio of the extinction
 * in band a to the reddening of the colour b - c (Madore 1982).
 *
 * <p>It holds as long as R is that of the dust on the way; R is a choice, and its error is one that all objects share.
 *
 * @param ratio R, a finite number; 1.55 for I and V - I, 0.386 for F160W and F555W - F814W (Riess et al. 2019)
 */
public record Wesenheit(double ratio) {
    /**
     * Checks the ratio.
     *
     * @param ratio R, a finite number
     */
    public Wesenheit {
        if (!Double.isFinite(ratio)) {
            throw new ValueFault(
                    "R = " + ratio, "the ratio of extinction to reddening is finite", "", "give a number such as 1.55");
        }
    }

    /**
     * The magnitude W.
     *
     * @param a magnitude in the band that is corrected
     * @param b magnitude in the bluer band of the colour
     * @param c magnitude in the redder band of the colour
     * @return mag
     */
    public double magnitude(double a, double b, double c) {
        return a - ratio * (b - c);
    }

    /**
     * Standard deviation of W, the three bands measured apart: {@code sqrt(s_a^2 + R^2 (s_b^2 + s_c^2))}.
     *
     * @param a standard deviation in band a, mag
     * @param b in band b
     * @param c in band c
     * @return mag
     */
    public double sigma(double a, double b, double c) {
        return Math.sqrt(a * a + ratio * ratio * (b * b + c * c));
    }

    /**
     * Standard deviation of W of two bands, where band a is band c too, as in {@code I - R (V - I)}: {@code sqrt((1 + R)^2
     * s_a^2 + R^2 s_b^2)}. Both places of band a err together, so this is larger than with three bands.
     *
     * @param a standard deviation in the band that is corrected, mag
     * @param b in the bluer band of the colour
     * @return mag
     */
    public double sigmaOfTwoBands(double a, double b) {
        double own = (1 + ratio) * a;
        double other = ratio * b;
        return Math.sqrt(own * own + other * other);
    }
}
