package distanceladder.rung;

import distanceladder.astro.Unit;
import distanceladder.covariance.Diagonal;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Distance;
import distanceladder.relation.Dual;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Terms;
import distanceladder.relation.Value;
import distanceladder.text.Figures;
import distanceladder.text.ValueFault;
import java.util.Optional;

/**
 * A geometric distance of one object, with a statistical and a systematic part.
 *
 * <pre>mu + s = given   or   10^((mu - 25) / 5) + s = given [Mpc]   or   10^((10 - mu) / 5) + s = given [mas]</pre>
 *
 * as the distance was measured, mu in mag: a distance keeps its scale, and errors are normal in it. The standard
 * deviation of the given amount is its own, statistical error; the systematic part s (observed minus true) is a source,
 * which other rungs share when they are handed the same. A modulus is linear; distance and parallax are first order, good
 * while the error is small against the value. A parallax of zero or less is legal, and alone gives no modulus.
 */
public final class Anchor implements Rung<Anchor> {
    private static final String SYSTEMATIC = "systematic";
    private static final String GIVEN = "distance";

    private final Definition definition;
    private final String object;
    private final Amount given;

    private Anchor(Definition definition, String object, Amount given) {
        this.definition = definition;
        this.object = object;
        this.given = given;
    }

    /**
     * An anchor called by its object's name.
     *
     * @param object name of the object
     * @param given modulus, distance or parallax, with its statistical error
     * @return a rung named "{@code object} anchor"
     */
    public static Anchor of(String object, Amount given) {
        return named(object + " anchor", object, given);
    }

    /**
     * An anchor with a name of its own.
     *
     * @param name name of the rung
     * @param object name of the object
     * @param given modulus, distance or parallax, with its statistical error
     * @return the rung
     */
    public static Anchor named(String name, String object, Amount given) {
        if (!(given.sigma() > 0)) {
            throw new ValueFault(
                    "standard deviation of " + name + " = " + given.sigma() + " "
                            + given.unit().symbol(),
                    "the statistical error of an anchor is above zero",
                    "anchor \"" + name + "\"",
                    "give amount.plusMinus(error)");
        }
        Equated relation = relation(given.unit(), false, name);
        requireDistance(name, given);
        Observations data = Observations.of(name, name).bearingOn(object).with(GIVEN, given.unit(), given.value());
        Definition definition = Definition.of(name, data, GIVEN, relation)
                .described(words(given.unit()) + " = given")
                .withNoise(Noise.of(sigma(given)));
        return new Anchor(definition, object, given);
    }

    private static double sigma(Amount given) {
        return Math.abs(given.unit().toBase(given.sigma()));
    }

    private static void requireDistance(String name, Amount given) {
        if (given.unit().dimension().equals(Unit.MEGAPARSEC.dimension()) && !(given.value() > 0)) {
            throw new ValueFault(
                    "distance = " + given.text(),
                    "a distance is above zero",
                    "anchor \"" + name + "\"",
                    "give the distance, or its modulus in mag");
        }
    }

    private static String words(Unit unit) {
        return switch (unit.dimension()) {
            case "magnitude" -> "mu";
            case "length" -> "10^((mu - 25)/5) Mpc";
            default -> "10^((10 - mu)/5) mas";
        };
    }

    private static Equated relation(Unit unit, boolean systematic, String where) {
        return switch (unit.dimension()) {
            case "magnitude" -> Equated.of((mu, at) -> shifted(mu.add(0), at, systematic));
            case "length" ->
                Equated.of((mu, at) -> shifted(mu.subtract(25).divide(5).tenTo(), at, systematic))
                        .startingAt(d -> 25 + 5 * StrictMath.log10(Math.max(d.observed(), d.sigma())));
            case "parallax" ->
                Equated.of((mu, at) -> shifted(mu.negate().add(10).divide(5).tenTo(), at, systematic))
                        .startingAt(d -> 10 - 5 * StrictMath.log10(Math.max(d.observed(), d.sigma())))
                        .refusing(d -> refusal(d.observed() - (systematic ? d.parameter(SYSTEMATIC) : 0)));
            default ->
                throw new ValueFault(
                        "unit " + unit.symbol(),
                        "an anchor is a modulus, a distance or a parallax",
                        "anchor \"" + where + "\"",
                        "give it in mag, Mpc, kpc, pc, mas or µas");
        };
    }

    private static Optional<String> refusal(double corrected) {
        return corrected > 0
                ? Optional.empty()
                : Optional.of("its parallax is " + Figures.significant(corrected, 3)
                        + " mas, and no distance has a parallax of zero or less");
    }

    private static Dual shifted(Dual predicted, Terms at, boolean systematic) {
        return systematic ? predicted.add(at.parameter(SYSTEMATIC)) : predicted;
    }

    /**
     * The same anchor with a systematic error.
     *
     * @param error its size in the dimension in which the anchor is given: {@code modulus(0.03)}, or {@code
     *     modulus(0).plusMinus(0.03)}
     * @return the rung, with a source named "{@code rung} systematic" of mean 0
     */
    public Anchor withSystematic(Amount error) {
        Amount in = error.in(given.unit());
        if (in.sigma() > 0 && in.value() != 0) {
            throw new ValueFault(
                    "systematic error = " + in.text(),
                    "a systematic error has mean 0",
                    "anchor \"" + name() + "\"",
                    "give its standard deviation alone, or a source with the mean that you want");
        }
        double sigma = in.sigma() > 0 ? in.sigma() : Math.abs(in.value());
        return withSystematic(Source.normal(name() + " systematic", new Amount(0, sigma, given.unit())));
    }

    /**
     * The same anchor with a systematic error that others may share.
     *
     * @param source observed minus true, in the dimension in which the anchor is given
     * @return the rung
     */
    public Anchor withSystematic(Source source) {
        return systematic(source, definition.parameter(SYSTEMATIC, source));
    }

    /**
     * The same anchor with a systematic error that is correlated with others.
     *
     * @param member observed minus true, in the dimension in which the anchor is given, as a member of a group
     * @return the rung
     */
    public Anchor withSystematic(SourceGroup.Member member) {
        return systematic(member, definition.parameter(SYSTEMATIC, member));
    }

    private Anchor systematic(Value part, Definition changed) {
        if (!part.unit().dimension().equals(given.unit().dimension())) {
            throw new ValueFault(
                    "systematic part \"" + part.name() + "\" in " + part.unit().symbol(),
                    "the systematic part is in a unit of what is given",
                    "anchor \"" + name() + "\"",
                    "give it in " + given.unit().symbol());
        }
        return like(changed.withRelation(relation(given.unit(), true, name()))
                .described(words(given.unit()) + " + s = given"));
    }

    /**
     * The systematic part.
     *
     * @return its handle
     */
    public Value systematic() {
        return definition.value(SYSTEMATIC);
    }

    /**
     * The same anchor at another value, all else as it was.
     *
     * @param other the new amount; without a standard deviation the old one stays
     * @return the rung under the same name
     */
    public Anchor at(Amount other) {
        Amount in = other.in(given.unit());
        Amount full = in.sigma() > 0 ? in : in.plusMinus(given.sigma());
        requireDistance(name(), full);
        Observations data = definition.data().with(GIVEN, full.unit(), full.value());
        return new Anchor(definition.withData(data, noise(full)), object, full);
    }

    private Noise noise(Amount other) {
        Noise now = definition.noise();
        if (sigma(other) == sigma(given)) {
            return now;
        }
        if (!now.covariance().equals(Diagonal.fromStandardDeviations(sigma(given)))) {
            throw new ValueFault(
                    "standard deviation = " + other.sigma() + " " + other.unit().symbol(),
                    "an anchor whose noise was replaced keeps that noise",
                    "anchor \"" + name() + "\"",
                    "give the value alone, and the new noise by withNoise");
        }
        return now.withCovariance(Diagonal.fromStandardDeviations(sigma(other)));
    }

    /**
     * The anchor's object.
     *
     * @return handle of its modulus
     */
    public Distance distance() {
        return distance(object);
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public Anchor like(Definition other) {
        return new Anchor(other, object, given);
    }

    @Override
    public String toString() {
        return text();
    }
}
