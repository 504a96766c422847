package distanceladder.rung;

import distanceladder.astro.Unit;
import distanceladder.astro.Wesenheit;
import distanceladder.relation.Definition;
import distanceladder.relation.Dual;
import distanceladder.relation.Equated;
import distanceladder.relation.Equation;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Value;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * A period-luminosity relation of pulsating stars.
 *
 * <pre>m = mu + M + b (log10 P - pivot) + g x + sum_s z_s      [mag]</pre>
 *
 * with the apparent (Wesenheit) magnitude m, the modulus mu of the star or its galaxy, the absolute magnitude M of a star
 * at the pivot period, the slope b, the period P in days, and, when asked for, the metallicity x = [O/H] with its
 * coefficient g, and common offsets z_s of the photometry (Leavitt and Pickering 1912; Wesenheit magnitudes: Madore
 * 1982). Linear, so its first order is exact, but for a colour that is measured with an error ({@link #withColour}).
 *
 * <p>Period and metallicity are taken as known exactly: an error of a period is small against the scatter, that of a
 * metallicity may not be. One slope holds for all periods and one mode of pulsation, unless {@link #withBreak} and {@link
 * #withOvertones} say otherwise. A scatter is given by {@link Rung#withScatter}.
 *
 * <p>Columns: {@code magnitude}, {@code magnitude error}; {@code log period} or {@code period}; {@code metallicity} when
 * asked for; {@code offset} (modulus of the star less that of its galaxy, mag) when present.
 */
public final class PeriodLuminosity implements Rung<PeriodLuminosity> {
    private static final String ZERO_POINT = "zero point";
    private static final String SLOPE = "slope";
    private static final String METALLICITY = "metallicity coefficient";
    private static final String RATIO = "colour ratio";
    private static final String BREAK = "break";
    private static final String OVERTONE = "overtone offset";
    private static final String COMMON = "common offset ";
    private static final String APART = "offset";

    private final Definition definition;
    private final double pivot;
    private final List<Term> terms;

    /** A term of the relation beyond zero point and slope: its parameter's role, its words, its columns with errors. */
    private record Term(String role, String words, String uncertain, Equation shape) {}

    private PeriodLuminosity(Definition definition, double pivot, List<Term> terms) {
        this.definition = definition;
        this.pivot = pivot;
        this.terms = terms;
    }

    /**
     * A relation with free zero point and slope, its pivot at 10 days.
     *
     * @param name name of the rung
     * @param data columns as said above
     * @return the rung
     */
    public static PeriodLuminosity of(String name, Observations data) {
        data.require("magnitude", Unit.MAGNITUDE);
        double[] errors = data.errors("magnitude error", Unit.MAGNITUDE);
        Observations full = data.has("log period") ? data : withLogPeriod(data);
        full.require("log period", Unit.LOG_DAY);
        if (full.has(APART)) {
            full.require(APART, Unit.MAGNITUDE);
        }
        Definition definition = Definition.of(name, full, "magnitude", Equated.of((mu, at) -> mu))
                .withNoise(Noise.of(errors))
                .parameter(ZERO_POINT, Source.free(name + " zero point", Unit.MAGNITUDE))
                .parameter(SLOPE, Source.free(name + " slope", Unit.MAGNITUDE_PER_DEX));
        return new PeriodLuminosity(definition, 1, List.of()).related();
    }

    private static Observations withLogPeriod(Observations data) {
        data.require("period", Unit.DAY);
        double[] periods = data.column("period");
        for (int i = 0; i < periods.length; i++) {
            if (!(periods[i] > 0)) {
                throw new ValueFault(
                        "period = " + periods[i] + " d",
                        "a period is above zero",
                        data.label() + ", datum \"" + data.names().get(i) + "\"",
                        "give the period in days, or column \"log period\"");
            }
            periods[i] = StrictMath.log10(periods[i]);
        }
        return data.with("log period", Unit.LOG_DAY, periods);
    }

    /**
     * The Wesenheit magnitude of three bands, {@code W = m_a - R (m_b - m_c)}, free of reddening when R is the ratio of
     * total absorption in band a to the reddening of colour b - c (Madore 1982; {@link Wesenheit} has it for single numbers).
     *
     * <p>Its variance is that of independent errors in the bands: {@code e_a^2 + R^2 (e_b^2 + e_c^2)} for three different
     * bands; a band that stands twice enters once, with its whole coefficient ({@code (1 - R)^2 e_a^2 + R^2 e_c^2} for b =
     * a).
     *
     * @param data columns of the bands, and for each band b its errors as {@code b error}
     * @param ratio R, finite
     * @param bands the names of the columns a, b and c, in this order; b and c differ
     * @return the table with columns {@code magnitude} and {@code magnitude error}
     */
    public static Observations wesenheit(Observations data, double ratio, String... bands) {
        if (bands.length != 3 || bands[1].equals(bands[2]) || !Double.isFinite(ratio)) {
            throw new ValueFault(
                    "bands " + List.of(bands) + ", ratio = " + ratio,
                    "a Wesenheit magnitude is a - R (b - c) of bands a, b and c, its colour of two different ones",
                    data.label(),
                    "name three bands and a finite ratio");
        }
        Map<String, Double> coefficients = new LinkedHashMap<>();
        coefficients.put(bands[0], 1.0);
        coefficients.merge(bands[1], -ratio, Double::sum);
        coefficients.merge(bands[2], ratio, Double::sum);
        double[] magnitudes = new double[data.size()];
        double[] variances = new double[data.size()];
        coefficients.forEach((band, factor) -> {
            data.require(band, Unit.MAGNITUDE);
            double[] numbers = data.column(band);
            double[] errors = data.errors(band + " error", Unit.MAGNITUDE);
            for (int i = 0; i < numbers.length; i++) {
                magnitudes[i] += factor * numbers[i];
                variances[i] += factor * factor * errors[i] * errors[i];
            }
        });
        return data.with("magnitude", Unit.MAGNITUDE, magnitudes)
                .with(
                        "magnitude error",
                        Unit.MAGNITUDE,
                        Arrays.stream(variances).map(Math::sqrt).toArray());
    }

    private PeriodLuminosity related() {
        double reference = pivot;
        List<Term> more = terms;
        Equated relation = Equated.of((mu, at) -> {
            Dual m = mu.add(at.parameter(ZERO_POINT))
                    .add(at.parameter(SLOPE).multiply(at.column("log period") - reference));
            for (Term term : more) {
                m = m.add(term.shape.predict(at.parameter(term.role), at));
            }
            return m;
        });
        for (Term term : terms) {
            if (!term.uncertain.isEmpty()) {
                relation = relation.withUncertain(term.uncertain);
            }
        }
        String words = "m = mu + M + b (log P - " + pivot + ")"
                + String.join("", terms.stream().map(t -> " + " + t.words).toList());
        return new PeriodLuminosity(
                definition
                        .withRelation(definition.data().has(APART) ? relation.withOffsets(APART) : relation)
                        .described(words),
                pivot,
                terms);
    }

    private PeriodLuminosity with(Term term, Definition changed) {
        List<Term> more = new ArrayList<>(terms);
        more.removeIf(t -> t.role.equals(term.role));
        more.add(term);
        return new PeriodLuminosity(changed, pivot, List.copyOf(more)).related();
    }

    private void requireUnit(String role, Value parameter, Unit... wanted) {
        List<String> dimensions = Arrays.stream(wanted).map(Unit::dimension).toList();
        if (!dimensions.contains(parameter.unit().dimension())) {
            throw new ValueFault(
                    role + " \"" + parameter.name() + "\" in "
                            + parameter.unit().symbol(),
                    "the " + role + " is a " + String.join(" or a ", dimensions),
                    "rung \"" + name() + "\"",
                    "give a source in such a unit");
        }
    }

    private void requireFinite(String what, double logPeriod) {
        if (!Double.isFinite(logPeriod)) {
            throw new ValueFault(
                    what + " = " + logPeriod + " log d",
                    "a " + what + " is a finite number",
                    "rung \"" + name() + "\"",
                    "give the decimal logarithm of a period in days");
        }
    }

    private static Term common(Value offset) {
        return new Term(COMMON + offset.name(), offset.name(), "", (z, at) -> z);
    }

    private static Term metals() {
        return new Term(METALLICITY, "g [O/H]", "", (g, at) -> g.multiply(at.column("metallicity")));
    }

    /**
     * The same relation for a magnitude in one band, made Wesenheit in the fit: {@code + R c}, with the colour c measured
     * with an error. Magnitude and colour are taken to share no error.
     *
     * @param column column of the colour; its errors stand in "{@code column} error"
     * @param ratio source of R, the ratio of extinction to reddening: exact, with an error, or free
     * @return the rung
     */
    public PeriodLuminosity withColour(String column, Source ratio) {
        return with(colour(column, ratio), definition.parameter(RATIO, ratio));
    }

    /**
     * The same relation made Wesenheit in the fit, with R as a member of a group.
     *
     * @param column column of the colour; its errors stand in "{@code column} error"
     * @param ratio R, the ratio of extinction to reddening
     * @return the rung
     */
    public PeriodLuminosity withColour(String column, SourceGroup.Member ratio) {
        return with(colour(column, ratio), definition.parameter(RATIO, ratio));
    }

    private Term colour(String column, Value ratio) {
        definition.data().errors(column + " error", Unit.MAGNITUDE);
        definition.data().require(column, Unit.MAGNITUDE);
        requireUnit(RATIO, ratio, Unit.NONE, Unit.MAGNITUDE);
        return new Term(RATIO, "R " + column, column, (r, at) -> r.multiply(at.uncertain(column)));
    }

    /**
     * The same relation with a continuous break: another slope below a period, {@code + db min(log P - at, 0)}.
     *
     * @param logPeriod decimal logarithm of the period (days) of the break
     * @param difference source of slope below less slope above, mag per dex
     * @return the rung
     */
    public PeriodLuminosity withBreak(double logPeriod, Source difference) {
        requireFinite("break", logPeriod);
        requireUnit(BREAK, difference, Unit.MAGNITUDE_PER_DEX, Unit.MAGNITUDE);
        Term term = new Term(
                BREAK,
                "db min(log P - " + logPeriod + ", 0)",
                "",
                (b, at) -> b.multiply(Math.min(at.column("log period") - logPeriod, 0)));
        return with(term, definition.parameter(BREAK, difference));
    }

    /**
     * The same relation with overtone pulsators set off by a constant.
     *
     * @param column column that is 1 for an overtone pulsator and 0 for a fundamental one
     * @param offset source of overtone less fundamental magnitude at equal period, mag
     * @return the rung
     */
    public PeriodLuminosity withOvertones(String column, Source offset) {
        definition.data().column(column);
        requireUnit(OVERTONE, offset, Unit.MAGNITUDE);
        Term term = new Term(OVERTONE, "o " + column, "", (o, at) -> o.multiply(at.column(column)));
        return with(term, definition.parameter(OVERTONE, offset));
    }

    /**
     * The same relation with another pivot.
     *
     * @param logPeriod decimal logarithm of the period (days) at which the zero point is stated, finite
     * @return the rung
     */
    public PeriodLuminosity withPivot(double logPeriod) {
        requireFinite("pivot", logPeriod);
        return new PeriodLuminosity(definition, logPeriod, terms).related();
    }

    /**
     * The same relation with another source of the zero point.
     *
     * @param source absolute magnitude at the pivot, mag
     * @return the rung
     */
    public PeriodLuminosity withZeroPoint(Source source) {
        requireUnit(ZERO_POINT, source, Unit.MAGNITUDE);
        return like(definition.parameter(ZERO_POINT, source));
    }

    /**
     * The same relation with another source of the zero point.
     *
     * @param member absolute magnitude at the pivot, mag, as a member of a group
     * @return the rung
     */
    public PeriodLuminosity withZeroPoint(SourceGroup.Member member) {
        requireUnit(ZERO_POINT, member, Unit.MAGNITUDE);
        return like(definition.parameter(ZERO_POINT, member));
    }

    /**
     * The same relation with another source of the slope.
     *
     * @param source slope, mag per dex
     * @return the rung
     */
    public PeriodLuminosity withSlope(Source source) {
        requireUnit(SLOPE, source, Unit.MAGNITUDE_PER_DEX, Unit.MAGNITUDE);
        return like(definition.parameter(SLOPE, source));
    }

    /**
     * The same relation with another source of the slope.
     *
     * @param member slope, mag per dex, as a member of a group
     * @return the rung
     */
    public PeriodLuminosity withSlope(SourceGroup.Member member) {
        requireUnit(SLOPE, member, Unit.MAGNITUDE_PER_DEX, Unit.MAGNITUDE);
        return like(definition.parameter(SLOPE, member));
    }

    /**
     * The same relation with a metallicity term; reads column {@code metallicity}.
     *
     * @param source its coefficient, mag per dex
     * @return the rung
     */
    public PeriodLuminosity withMetallicity(Source source) {
        requireMetallicity(source);
        return with(metals(), definition.parameter(METALLICITY, source));
    }

    /**
     * The same relation with a metallicity term; reads column {@code metallicity}.
     *
     * @param member its coefficient, mag per dex, as a member of a group
     * @return the rung
     */
    public PeriodLuminosity withMetallicity(SourceGroup.Member member) {
        requireMetallicity(member);
        return with(metals(), definition.parameter(METALLICITY, member));
    }

    private void requireMetallicity(Value coefficient) {
        definition.data().require("metallicity", Unit.DEX);
        requireUnit(METALLICITY, coefficient, Unit.MAGNITUDE_PER_DEX, Unit.MAGNITUDE);
    }

    /**
     * The same relation with an offset that all its magnitudes have in common (observed minus true).
     *
     * @param offset source of the offset, mag; shared with other rungs that are handed the same
     * @return the rung
     */
    public PeriodLuminosity withCommonOffset(Source offset) {
        requireUnit("common offset", offset, Unit.MAGNITUDE);
        return with(common(offset), definition.parameter(COMMON + offset.name(), offset));
    }

    /**
     * The same relation with an offset that all its magnitudes have in common (observed minus true).
     *
     * @param offset the offset, mag, as a member of a group
     * @return the rung
     */
    public PeriodLuminosity withCommonOffset(SourceGroup.Member offset) {
        requireUnit("common offset", offset, Unit.MAGNITUDE);
        return with(common(offset), definition.parameter(COMMON + offset.name(), offset));
    }

    /**
     * The zero point.
     *
     * @return handle of M, the absolute magnitude at the pivot
     */
    public Value zeroPoint() {
        return definition.value(ZERO_POINT);
    }

    /**
     * The slope.
     *
     * @return handle of b
     */
    public Value slope() {
        return definition.value(SLOPE);
    }

    /**
     * The metallicity coefficient.
     *
     * @return handle of g
     */
    public Value metallicityCoefficient() {
        return definition.value(METALLICITY);
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public PeriodLuminosity like(Definition other) {
        return new PeriodLuminosity(other, pivot, terms);
    }

    @Override
    public String toString() {
        return text();
    }
}
