package distanceladder.astro;

import distanceladder.text.ValueFault;
import org.hipparchus.analysis.integration.gauss.GaussIntegrator;
import org.hipparchus.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * The distance of a single star from its parallax alone, under an exponentially decreasing space density.
 *
 * <pre>P(r | p) ~ r^2 exp(-r / L) exp(-(p - 1/r)^2 / (2 s^2)),   r in kpc, p and s in mas</pre>
 *
 * (Bailer-Jones 2015, equation 17). The mode is a root of {@code r^3 / L - 2 r^2 + p r / s^2 - 1 / s^2 = 0}. This is a
 * statement on one star with a prior of its own; a ladder does not use it, since it keeps parallaxes as parallaxes.
 */
public final class StarDistance {
    private static final int PANELS = 400;
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(8, -1, 1);

    private final double parallax;
    private final double sigma;
    private final double length;
    private final double[] edges = new double[PANELS + 1];
    private final double[] mass = new double[PANELS + 1];

    private StarDistance(double parallax, double sigma, double length) {
        this.parallax = parallax;
        this.sigma = sigma;
        this.length = length;
        double top = 30 * length + 10 / Math.max(parallax, sigma);
        double mode = mode();
        double peak = logDensity(mode);
        for (int i = 0; i <= PANELS; i++) {
            double t = (double) i / PANELS;
            edges[i] = top * t * t * t;
        }
        for (int i = 0; i < PANELS; i++) {
            double half = (edges[i + 1] - edges[i]) / 2;
            double middle = (edges[i + 1] + edges[i]) / 2;
            mass[i + 1] = mass[i] + half * RULE.integrate(x -> StrictMath.exp(logDensity(middle + half * x) - peak));
        }
    }

    /**
     * The posterior of one star.
     *
     * @param parallax parallax less the offset, mas; may be negative
     * @param sigma its standard deviation, mas, above zero
     * @param length scale L of the density, kpc, above zero
     * @return its distance
     */
    public static StarDistance of(double parallax, double sigma, double length) {
        if (!(sigma > 0) || !(length > 0) || !Double.isFinite(parallax)) {
            throw new ValueFault(
                    "parallax = " + parallax + " ± " + sigma + " mas, scale = " + length + " kpc",
                    "error and scale are above zero",
                    "",
                    "give positive numbers");
        }
        return new StarDistance(parallax, sigma, length);
    }

    private double logDensity(double r) {
        if (r <= 0) {
            return Double.NEGATIVE_INFINITY;
        }
        double d = (parallax - 1 / r) / sigma;
        return 2 * StrictMath.log(r) - r / length - d * d / 2;
    }

    /**
     * The most probable distance.
     *
     * @return the mode, kpc; of several roots the smallest for a positive parallax
     */
    public double mode() {
        double low = 1e-9;
        double high = Math.max(3 * length, 1);
        // The slope of the logarithm, times r^2, is positive near zero; the first change of sign is the mode.
        double step = high / 4096;
        double at = low;
        while (slope(at + step) > 0 && at < 40 * length) {
            at += step;
        }
        low = at;
        high = at + step;
        for (int i = 0; i < 200; i++) {
            double middle = (low + high) / 2;
            if (slope(middle) > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    private double slope(double r) {
        return -r * r * r / length + 2 * r * r - parallax * r / (sigma * sigma) + 1 / (sigma * sigma);
    }

    /**
     * A quantile of the distance.
     *
     * @param probability between 0 and 1
     * @return kpc; 0.5 for the median
     */
    public double quantile(double probability) {
        double wanted = probability * mass[PANELS];
        int i = 0;
        while (i < PANELS - 1 && mass[i + 1] < wanted) {
            i++;
        }
        double low = edges[i];
        double high = edges[i + 1];
        double peak = logDensity(mode());
        for (int k = 0; k < 60; k++) {
            double middle = (low + high) / 2;
            double half = (middle - edges[i]) / 2;
            double centre = (middle + edges[i]) / 2;
            double part = half * RULE.integrate(x -> StrictMath.exp(logDensity(centre + half * x) - peak));
            if (mass[i] + part < wanted) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }
}
