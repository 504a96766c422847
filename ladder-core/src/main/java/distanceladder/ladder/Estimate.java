package distanceladder.ladder;

import distanceladder.astro.Unit;
import distanceladder.chance.Distribution;
import distanceladder.text.Figures;
import distanceladder.text.Shown;

/**
 * A value with its standard deviation, and the parts of it.
 *
 * @param name what is estimated
 * @param value the estimate
 * @param sigma its standard deviation, to first order
 * @param statistical the part by data and statistical sources: root of their sum of terms
 * @param systematic the part by systematic sources: root of their sum of terms; the squares of both add up to sigma
 *     squared
 * @param degreesOfFreedom effective degrees of freedom of sigma (Satterthwaite); infinite unless a scatter was estimated
 * @param unit the unit of all four
 */
public record Estimate(
        String name,
        double value,
        double sigma,
        double statistical,
        double systematic,
        double degreesOfFreedom,
        Unit unit)
        implements Shown {
    /**
     * The variance.
     *
     * @return sigma squared
     */
    public double variance() {
        return sigma * sigma;
    }

    /**
     * The interval that covers with a given probability: Student's with the effective degrees of freedom, else normal.
     *
     * @param probability between 0 and 1, such as 0.6827
     * @return lower and upper end
     */
    public Interval interval(double probability) {
        Distribution unitWidth = Double.isInfinite(degreesOfFreedom)
                ? new Distribution.Normal(0, 1)
                : new Distribution.StudentT(0, 1, Math.max(degreesOfFreedom, 1.0000001));
        double k = sigma == 0 ? 0 : unitWidth.quantile(0.5 + probability / 2);
        return new Interval(value - k * sigma, value + k * sigma);
    }

    /**
     * An interval.
     *
     * @param lower lower end
     * @param upper upper end
     */
    public record Interval(double lower, double upper) {}

    /**
     * Value and standard deviation without the name.
     *
     * @return such as {@code 71.3 ± 1.4 km/s/Mpc}
     */
    public String figures() {
        String symbol = unit.symbol().isEmpty() ? "" : " " + unit.symbol();
        return Figures.pair(value, sigma) + symbol;
    }

    @Override
    public String text() {
        String parts = sigma == 0
                ? ""
                : " (statistical " + Figures.sigma(statistical) + ", systematic " + Figures.sigma(systematic) + ")";
        String student = Double.isInfinite(degreesOfFreedom)
                ? ""
                : "; Student, " + Figures.significant(degreesOfFreedom, 3) + " degrees of freedom";
        return name + " = " + figures() + parts + student;
    }

    @Override
    public String toString() {
        return text();
    }
}
