package distanceladder.rung;

import distanceladder.astro.Unit;
import distanceladder.relation.Definition;
import distanceladder.relation.Dual;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Value;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.List;

/**
 * A secondary indicator: objects whose luminosity is known once it is standardised by linear terms.
 *
 * <pre>m = mu + M + sum_k c_k x_k + sum_s z_s      [mag]</pre>
 *
 * with the apparent magnitude m, the absolute magnitude M, covariates x_k (light-curve shape, colour, width, a step of
 * 0 or 1) with coefficients c_k (Tripp 1998, equation 2, for supernovae), and common offsets z_s of the photometry, such
 * as a zero point that another rung shares.
 *
 * <p>Covariates are known exactly ({@code withCovariate}: the relation is then linear, and its first order exact) or
 * measured with an error ({@code withUncertainCovariate}); an error that is not small against the spread of a covariate,
 * taken for none, pulls its coefficient towards 0. They enter as they stand in the table, not centred: M is the magnitude
 * at x_k = 0. A scatter is given by {@link Rung#withScatter}.
 *
 * <p>Columns: {@code magnitude}, {@code magnitude error}, and one for each covariate; {@code offset} (modulus of the
 * datum less that of its object, mag) when present.
 */
public final class SecondaryIndicator implements Rung<SecondaryIndicator> {
    private static final String ZERO_POINT = "zero point";
    private static final String APART = "offset";

    private final Definition definition;
    private final Terms terms;

    /** What standardises the magnitude. */
    private record Terms(
            List<String> covariates, List<String> uncertain, List<List<String>> covariances, List<String> offsets) {
        static final Terms NONE = new Terms(List.of(), List.of(), List.of(), List.of());

        Terms exact(String column) {
            List<List<String>> left = covariances.stream()
                    .filter(c -> !c.subList(0, 2).contains(column))
                    .toList();
            return new Terms(plus(covariates, column), minus(uncertain, column), left, offsets);
        }

        Terms uncertain(String column) {
            return new Terms(minus(covariates, column), plus(uncertain, column), covariances, offsets);
        }

        private static List<String> minus(List<String> list, String less) {
            return list.stream().filter(x -> !x.equals(less)).toList();
        }
    }

    private SecondaryIndicator(Definition definition, Terms terms) {
        this.definition = definition;
        this.terms = terms;
    }

    /**
     * An indicator with a free zero point and no covariate.
     *
     * @param name name of the rung
     * @param data columns as said above
     * @return the rung
     */
    public static SecondaryIndicator of(String name, Observations data) {
        data.require("magnitude", Unit.MAGNITUDE);
        if (data.has(APART)) {
            data.require(APART, Unit.MAGNITUDE);
        }
        Definition definition = Definition.of(name, data, "magnitude", Equated.of((mu, at) -> mu))
                .withNoise(Noise.of(data.errors("magnitude error", Unit.MAGNITUDE)))
                .parameter(ZERO_POINT, Source.free(name + " zero point", Unit.MAGNITUDE));
        return new SecondaryIndicator(definition, Terms.NONE).related();
    }

    private SecondaryIndicator related() {
        Terms all = terms;
        Equated relation = Equated.of((mu, at) -> {
                    Dual m = mu.add(at.parameter(ZERO_POINT));
                    for (String x : all.covariates) {
                        m = m.add(at.parameter(role(x)).multiply(at.column(x)));
                    }
                    for (String x : all.uncertain) {
                        m = m.add(at.parameter(role(x)).multiply(at.uncertain(x)));
                    }
                    for (String z : all.offsets) {
                        m = m.add(at.parameter(common(z)));
                    }
                    return m;
                })
                .withUncertain(all.uncertain.toArray(new String[0]));
        for (List<String> pair : all.covariances) {
            relation = relation.withErrorCovariance(pair.get(0), pair.get(1), pair.get(2));
        }
        List<String> covariates = new ArrayList<>(all.covariates);
        covariates.addAll(all.uncertain);
        String words = "m = mu + M"
                + String.join(
                        "", covariates.stream().map(x -> " + c(" + x + ") " + x).toList())
                + String.join("", all.offsets.stream().map(z -> " + " + z).toList());
        return new SecondaryIndicator(
                definition
                        .withRelation(definition.data().has(APART) ? relation.withOffsets(APART) : relation)
                        .described(words),
                terms);
    }

    private static String role(String covariate) {
        return covariate + " coefficient";
    }

    private static String common(String offset) {
        return "common offset " + offset;
    }

    /**
     * The same indicator standardised by a column, its coefficient free.
     *
     * @param column name of the column
     * @return the rung
     */
    public SecondaryIndicator withCovariate(String column) {
        return withCovariate(column, Source.free(definition.name() + " " + role(column), Unit.MAGNITUDE));
    }

    /**
     * The same indicator standardised by a column.
     *
     * @param column name of the column
     * @param coefficient source of its coefficient, mag for each unit of the column's dimension
     * @return the rung
     */
    public SecondaryIndicator withCovariate(String column, Source coefficient) {
        return standardised(column, definition.parameter(role(column), coefficient));
    }

    /**
     * The same indicator standardised by a column.
     *
     * @param column name of the column
     * @param coefficient its coefficient, mag for each unit of the column's dimension, as a member of a group
     * @return the rung
     */
    public SecondaryIndicator withCovariate(String column, SourceGroup.Member coefficient) {
        return standardised(column, definition.parameter(role(column), coefficient));
    }

    private SecondaryIndicator standardised(String column, Definition changed) {
        changed.data().unit(column);
        return new SecondaryIndicator(changed, terms.exact(column)).related();
    }

    /**
     * The same indicator with an offset that all its magnitudes have in common (observed minus true).
     *
     * @param offset source of the offset, mag; shared with other rungs that are handed the same
     * @return the rung
     */
    public SecondaryIndicator withCommonOffset(Source offset) {
        return shifted(offset, definition.parameter(common(offset.name()), offset));
    }

    /**
     * The same indicator with an offset that all its magnitudes have in common (observed minus true).
     *
     * @param offset the offset, mag, as a member of a group
     * @return the rung
     */
    public SecondaryIndicator withCommonOffset(SourceGroup.Member offset) {
        return shifted(offset, definition.parameter(common(offset.name()), offset));
    }

    private SecondaryIndicator shifted(Value offset, Definition changed) {
        requireMagnitude("common offset", offset);
        Terms more =
                new Terms(terms.covariates, terms.uncertain, terms.covariances, plus(terms.offsets, offset.name()));
        return new SecondaryIndicator(changed, more).related();
    }

    /**
     * The same indicator standardised by a column that was measured with an error, its coefficient free.
     *
     * <p>The true number of each datum is a private unknown, linearised at its joint estimate; errors in all variables.
     *
     * @param column name of the column; its errors stand in "{@code column} error"
     * @return the rung
     */
    public SecondaryIndicator withUncertainCovariate(String column) {
        return withUncertainCovariate(column, Source.free(definition.name() + " " + role(column), Unit.MAGNITUDE));
    }

    /**
     * The same indicator standardised by a column that was measured with an error.
     *
     * @param column name of the column; its errors stand in "{@code column} error"
     * @param coefficient source of its coefficient, mag for each unit of the column
     * @return the rung
     */
    public SecondaryIndicator withUncertainCovariate(String column, Source coefficient) {
        return measured(column, definition.parameter(role(column), coefficient));
    }

    /**
     * The same indicator standardised by a column that was measured with an error.
     *
     * @param column name of the column; its errors stand in "{@code column} error"
     * @param coefficient its coefficient, mag for each unit of the column's dimension, as a member of a group
     * @return the rung
     */
    public SecondaryIndicator withUncertainCovariate(String column, SourceGroup.Member coefficient) {
        return measured(column, definition.parameter(role(column), coefficient));
    }

    private SecondaryIndicator measured(String column, Definition changed) {
        changed.data().errors(column + " error", changed.data().unit(column));
        return new SecondaryIndicator(changed, terms.uncertain(column)).related();
    }

    /**
     * The same indicator with a covariance between the errors of an uncertain covariate and another, or the magnitude.
     *
     * @param covariate an uncertain covariate
     * @param other another, or "magnitude"
     * @param column a column of covariances in the product of both units
     * @return the rung
     */
    public SecondaryIndicator withErrorCovariance(String covariate, String other, String column) {
        List<List<String>> pairs = new ArrayList<>(terms.covariances);
        pairs.add(List.of(covariate, other, column));
        Terms more = new Terms(terms.covariates, terms.uncertain, List.copyOf(pairs), terms.offsets);
        return new SecondaryIndicator(definition, more).related();
    }

    private void requireMagnitude(String role, Value parameter) {
        if (!parameter.unit().dimension().equals(Unit.MAGNITUDE.dimension())) {
            throw new ValueFault(
                    role + " \"" + parameter.name() + "\" in "
                            + parameter.unit().symbol(),
                    "the " + role + " is in " + Unit.MAGNITUDE.symbol(),
                    "rung \"" + name() + "\"",
                    "give a source in magnitudes");
        }
    }

    private static List<String> plus(List<String> list, String more) {
        if (list.contains(more)) {
            return list;
        }
        List<String> out = new ArrayList<>(list);
        out.add(more);
        return List.copyOf(out);
    }

    /**
     * The same indicator with another source of the zero point.
     *
     * @param source absolute magnitude, mag
     * @return the rung
     */
    public SecondaryIndicator withZeroPoint(Source source) {
        requireMagnitude(ZERO_POINT, source);
        return like(definition.parameter(ZERO_POINT, source));
    }

    /**
     * The same indicator with another source of the zero point.
     *
     * @param member absolute magnitude, mag, as a member of a group
     * @return the rung
     */
    public SecondaryIndicator withZeroPoint(SourceGroup.Member member) {
        requireMagnitude(ZERO_POINT, member);
        return like(definition.parameter(ZERO_POINT, member));
    }

    /**
     * The zero point.
     *
     * @return handle of M
     */
    public Value zeroPoint() {
        return definition.value(ZERO_POINT);
    }

    /**
     * The coefficient of a covariate.
     *
     * @param column name of its column
     * @return its handle
     * @throws NameFault when the column is no covariate
     */
    public Value coefficient(String column) {
        return definition.value(role(column));
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public SecondaryIndicator like(Definition other) {
        return new SecondaryIndicator(other, terms);
    }

    @Override
    public String toString() {
        return text();
    }
}
