package distanceladder.ladder;

import distanceladder.astro.Unit;
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
 * @param unit the unit of all four
 */
public record Estimate(String name, double value, double sigma, double statistical, double systematic, Unit unit)
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
        return name + " = " + figures() + parts;
    }

    @Override
    public String toString() {
        return text();
    }
}
