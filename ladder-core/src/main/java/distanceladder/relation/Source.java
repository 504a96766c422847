package distanceladder.relation;

import distanceladder.astro.Unit;
import distanceladder.chance.Distribution;
import distanceladder.text.Figures;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.List;
import java.util.Optional;

/**
 * A named number that the ladder rests on or looks for: a zero point, a literature constant with its error, a free
 * parameter.
 *
 * <p>Independent of every other source. It is <em>free</em> (the data alone fix it), <em>exact</em>, or has a
 * distribution, of which analytic propagation takes mean and variance. A source that is handed to several rungs is
 * shared by them, and so are its errors; it is known by its name. Immutable.
 */
public final class Source implements Value, Input {
    private final String name;
    private final Unit unit;
    private final Optional<Distribution> distribution;
    private final double start;
    private final Kind kind;

    private Source(String name, Unit unit, Optional<Distribution> distribution, double start, Kind kind) {
        if (name.isBlank()) {
            throw new NameFault("a source without a name", "a source has a name", "", "give it one");
        }
        this.name = name;
        this.unit = unit;
        this.distribution = distribution;
        this.start = start;
        this.kind = kind;
    }

    /**
     * A source with a normal distribution.
     *
     * @param name its name
     * @param amount mean and standard deviation; with a standard deviation of 0 it is exact
     * @return the source, systematic
     */
    public static Source normal(String name, Amount amount) {
        return of(
                name,
                amount.sigma() == 0
                        ? new Distribution.Exact(amount.value())
                        : new Distribution.Normal(amount.value(), amount.sigma()),
                amount.unit());
    }

    /**
     * A number without error.
     *
     * @param name its name
     * @param amount the number; its standard deviation must be 0
     * @return the source
     */
    public static Source exact(String name, Amount amount) {
        if (amount.sigma() != 0) {
            throw new ValueFault(
                    name + " = " + amount.text(), "an exact source has no standard deviation", name, "use normal");
        }
        return normal(name, amount);
    }

    /**
     * A parameter that the data alone fix.
     *
     * @param name its name
     * @param unit its unit
     * @return the source, starting at 0 where a relation is not linear in it
     */
    public static Source free(String name, Unit unit) {
        return new Source(name, unit, Optional.empty(), 0, Kind.STATISTICAL);
    }

    /**
     * A source with any distribution.
     *
     * @param name its name
     * @param distribution its distribution; the analytic road takes its mean and variance
     * @param unit the unit of its numbers
     * @return the source, systematic
     */
    public static Source of(String name, Distribution distribution, Unit unit) {
        return new Source(name, unit, Optional.of(distribution), distribution.mean(), Kind.SYSTEMATIC);
    }

    /**
     * The same free parameter with another start.
     *
     * @param value where iterations start, in its unit; matters only where a relation is not linear in it
     * @return the source
     */
    public Source starting(double value) {
        return new Source(name, unit, distribution, value, kind);
    }

    /**
     * The same source counted as statistical.
     *
     * @return the source
     */
    public Source statistical() {
        return new Source(name, unit, distribution, start, Kind.STATISTICAL);
    }

    /**
     * The same source counted as systematic.
     *
     * @return the source
     */
    public Source systematic() {
        return new Source(name, unit, distribution, start, Kind.SYSTEMATIC);
    }

    /**
     * The same source at another value, with its error as it was.
     *
     * @param amount the new value; a standard deviation other than 0 replaces the old one
     * @return the source under the same name
     */
    public Source at(Amount amount) {
        Amount in = amount.in(unit);
        double sigma = in.sigma() > 0
                ? in.sigma()
                : distribution.map(d -> Math.sqrt(d.variance())).orElse(0.0);
        Source moved = normal(name, new Amount(in.value(), sigma, unit));
        return new Source(name, unit, moved.distribution, in.value(), kind);
    }

    @Override
    public Source held() {
        double value = distribution.map(Distribution::mean).orElse(start);
        return new Source(name, unit, Optional.of(new Distribution.Exact(value)), value, kind);
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public Unit unit() {
        return unit;
    }

    /**
     * Its distribution.
     *
     * @return empty for a free parameter
     */
    public Optional<Distribution> distribution() {
        return distribution;
    }

    @Override
    public List<String> unknowns() {
        return List.of(name);
    }

    @Override
    public Value value(String unknown) {
        return this;
    }

    @Override
    public boolean free() {
        return distribution.isEmpty();
    }

    @Override
    public double[] mean() {
        return new double[] {unit.toBase(distribution.map(Distribution::mean).orElse(start))};
    }

    @Override
    public double[][] root() {
        double sigma = Math.abs(unit.toBase(Math.sqrt(finiteVariance())));
        return sigma == 0 ? new double[1][0] : new double[][] {{sigma}};
    }

    private double finiteVariance() {
        double variance = distribution.map(Distribution::variance).orElse(0.0);
        if (!Double.isFinite(variance)) {
            throw new ValueFault(
                    name + ": variance = " + variance,
                    "analytic propagation needs a finite variance",
                    name,
                    "give the source a distribution with a finite variance, or propagate it by Monte Carlo");
        }
        return variance;
    }

    @Override
    public Kind kind() {
        return kind;
    }

    @Override
    public boolean equals(Object other) {
        return this == other
                || (other instanceof Source that
                        && name.equals(that.name)
                        && unit == that.unit
                        && distribution.equals(that.distribution)
                        && Double.compare(start, that.start) == 0
                        && kind == that.kind);
    }

    @Override
    public int hashCode() {
        return name.hashCode();
    }

    @Override
    public String text() {
        String symbol = unit.symbol().isEmpty() ? "" : " " + unit.symbol();
        return name + " = "
                + distribution
                        .map(d -> Figures.pair(d.mean(), Math.sqrt(d.variance())) + symbol + " (" + d.describe() + ")")
                        .orElse("free [" + unit.symbol() + "]");
    }

    @Override
    public String toString() {
        return text();
    }
}
