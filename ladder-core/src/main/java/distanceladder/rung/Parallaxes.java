package distanceladder.rung;

import distanceladder.astro.AngularKernel;
import distanceladder.astro.Distances;
import distanceladder.astro.Sky;
import distanceladder.astro.Unit;
import distanceladder.covariance.Dense;
import distanceladder.covariance.Sum;
import distanceladder.relation.Amount;
import distanceladder.relation.Datum;
import distanceladder.relation.Definition;
import distanceladder.relation.Dual;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Value;
import distanceladder.text.Figures;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Trigonometric parallaxes, kept as parallaxes.
 *
 * <pre>p = 10^((10 - mu) / 5) + zp + sum_k c_k x_k     [mas]</pre>
 *
 * with the modulus mu of the star (mag) and the offset zp of the catalogue, observed minus true: about -0.017 mas in raw
 * catalogues, which measure too small (common practice); to correct a parallax it is <em>subtracted</em>.
 *
 * <p>The row is linearised at the joint estimate of the star's modulus in the set that is solved, never at the logarithm
 * of a noisy parallax; a negative parallax is a datum like any other. A star of which nothing but a parallax is known
 * has no modulus when that parallax, less the offset, is not above zero. The errors are normal in the parallax; those
 * of moduli are first order and need a parallax of some significance, or a second datum.
 *
 * <p>Columns: {@code parallax}, {@code parallax error}; {@code offset} (modulus of the star less that of its object,
 * mag) when present. The catalogue's zp is no column: it is the source given to {@link #withOffset(Source)}.
 */
public final class Parallaxes implements Rung<Parallaxes> {
    private static final String OFFSET = "offset";
    private static final String APART = "offset";
    private static final double SMALLEST = 1e-3;

    private final Definition definition;
    private final List<String> columns;

    private Parallaxes(Definition definition, List<String> columns) {
        this.definition = definition;
        this.columns = columns;
    }

    /**
     * A rung of parallaxes with an offset of exactly 0.
     *
     * @param name name of the rung
     * @param data columns {@code parallax} and {@code parallax error}
     * @return the rung
     */
    public static Parallaxes of(String name, Observations data) {
        data.require("parallax", Unit.MILLIARCSECOND);
        if (data.has(APART)) {
            data.require(APART, Unit.MAGNITUDE);
        }
        double[] errors = data.errors("parallax error", Unit.MILLIARCSECOND);
        Definition definition = Definition.of(name, data, "parallax", Equated.of((mu, at) -> mu))
                .withNoise(Noise.of(errors))
                .parameter(OFFSET, Source.exact(name + " offset", Amount.milliarcseconds(0)));
        return new Parallaxes(definition, List.of()).related();
    }

    private Parallaxes related() {
        List<String> linear = columns;
        boolean apart = definition.data().has(APART);
        Equated relation = Equated.of((modulus, at) -> {
                    Dual p = modulus.negate().add(10).divide(5).tenTo().add(at.parameter(OFFSET));
                    for (String x : linear) {
                        p = p.add(at.parameter(term(x)).multiply(at.column(x)));
                    }
                    return p;
                })
                .startingAt(d -> start(d) - (apart ? d.column(APART) : 0))
                .refusing(d -> refusal(corrected(d, linear)));
        String words = "p = 10^((10 - mu)/5) + offset"
                + String.join(
                        "", columns.stream().map(x -> " + k(" + x + ") " + x).toList())
                + ", offset observed minus true";
        Equated full = apart ? relation.withOffsets(APART) : relation;
        return new Parallaxes(definition.withRelation(full).described(words), columns);
    }

    private static double start(Datum d) {
        return Distances.modulusFromParallax(Math.max(Math.max(d.observed(), d.sigma()), SMALLEST));
    }

    private void requireParallax(String role, Value parameter) {
        if (!parameter.unit().dimension().equals(Unit.MILLIARCSECOND.dimension())) {
            throw new ValueFault(
                    role + " \"" + parameter.name() + "\" in "
                            + parameter.unit().symbol(),
                    "the " + role + " is in " + Unit.MILLIARCSECOND.symbol(),
                    "rung \"" + name() + "\"",
                    "give a source in a unit of parallax");
        }
    }

    private static String term(String column) {
        return "offset by " + column;
    }

    private static double corrected(Datum d, List<String> linear) {
        double p = d.observed() - d.parameter(OFFSET);
        for (String x : linear) {
            p -= d.parameter(term(x)) * d.column(x);
        }
        return p;
    }

    /**
     * The same rung with an offset that is linear in a column (magnitude, colour, ecliptic latitude), beside the constant
     * one.
     *
     * @param column name of the column
     * @param coefficient source of the offset for each unit of the column, a unit of parallax
     * @return the rung
     */
    public Parallaxes withOffsetTerm(String column, Source coefficient) {
        return termed(column, coefficient, definition.parameter(term(column), coefficient));
    }

    /**
     * The same rung with an offset that is linear in a column, beside the constant one.
     *
     * @param column name of the column
     * @param coefficient the offset for each unit of the column, a unit of parallax, as a member of a group
     * @return the rung
     */
    public Parallaxes withOffsetTerm(String column, SourceGroup.Member coefficient) {
        return termed(column, coefficient, definition.parameter(term(column), coefficient));
    }

    private Parallaxes termed(String column, Value coefficient, Definition changed) {
        changed.data().unit(column);
        requireParallax(term(column), coefficient);
        List<String> more = new ArrayList<>(columns);
        if (!more.contains(column)) {
            more.add(column);
        }
        return new Parallaxes(changed, List.copyOf(more)).related();
    }

    /**
     * The same rung with all known errors larger by a factor.
     *
     * @param factor above zero
     * @return the rung
     */
    public Parallaxes withErrorInflation(double factor) {
        if (!(factor > 0) || Double.isInfinite(factor)) {
            throw new ValueFault(
                    "error inflation = " + factor, "the factor is above zero", definition.name(), "give one near 1");
        }
        Noise noise = definition.noise();
        return like(definition.withNoise(noise.withCovariance(noise.covariance().scaled(factor * factor))));
    }

    /**
     * The same rung with errors in common between stars near to one another on the sky, added to the others.
     *
     * <p>{@code C_ij = s^2 k(t_ij)} with the separation t from the columns {@code right ascension} and {@code declination}
     * (degrees).
     *
     * @param sigma standard deviation s, a parallax
     * @param scale angular scale of the correlation, degrees
     * @param kernel how it falls off
     * @return the rung
     */
    public Parallaxes withAngularErrors(Amount sigma, double scale, AngularKernel kernel) {
        definition.data().require("right ascension", Unit.DEGREE);
        definition.data().require("declination", Unit.DEGREE);
        double[] ra = definition.data().column("right ascension");
        double[] dec = definition.data().column("declination");
        double s = sigma.in(Unit.MILLIARCSECOND).value();
        double[][] c = new double[ra.length][ra.length];
        for (int i = 0; i < ra.length; i++) {
            for (int j = 0; j < ra.length; j++) {
                double t = Sky.separation(ra[i], dec[i], ra[j], dec[j]);
                c[i][j] = s * s * kernel.correlation(t, scale);
            }
        }
        Noise noise = definition.noise();
        return like(definition.withNoise(noise.withCovariance(Sum.of(noise.covariance(), Dense.fromCovariance(c)))));
    }

    private static Optional<String> refusal(double corrected) {
        return corrected > 0
                ? Optional.empty()
                : Optional.of("its parallax less the offset is "
                        + Figures.significant(corrected, 3)
                        + " mas, and no distance has a parallax of zero or less");
    }

    /**
     * The same rung with another offset.
     *
     * @param offset observed minus true, in a unit of parallax
     * @return the rung
     */
    public Parallaxes withOffset(Source offset) {
        requireParallax(OFFSET, offset);
        return like(definition.parameter(OFFSET, offset));
    }

    /**
     * The same rung with another offset.
     *
     * @param offset observed minus true, in a unit of parallax, as a member of a group of sources
     * @return the rung
     */
    public Parallaxes withOffset(SourceGroup.Member offset) {
        requireParallax(OFFSET, offset);
        return like(definition.parameter(OFFSET, offset));
    }

    /**
     * The offset.
     *
     * @return its handle
     */
    public Value offset() {
        return definition.value(OFFSET);
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public Parallaxes like(Definition other) {
        return new Parallaxes(other, columns);
    }

    @Override
    public String toString() {
        return text();
    }
}
