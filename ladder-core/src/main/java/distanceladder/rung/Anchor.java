package distanceladder.rung;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Dual;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.Value;
import distanceladder.text.ValueFault;

/**
 * A geometric distance of one object, with a statistical and a systematic part.
 *
 * <pre>mu + s = given   or   10^((mu - 25) / 5) + s = given [Mpc]   or   10^((10 - mu) / 5) + s = given [mas]</pre>
 *
 * as the distance was measured: a distance keeps its scale. The standard deviation of the given amount is its own,
 * statistical error; the systematic part s has mean 0 and is a source, which other rungs share when they are handed the
 * same.
 */
public final class Anchor implements Rung<Anchor> {
    private static final String SYSTEMATIC = "systematic";

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
        Observations data = Observations.of(name, name).bearingOn(object).with("distance", given.unit(), given.value());
        Definition definition = Definition.of(name, data, "distance", relation(given.unit(), false, name))
                .described(words(given.unit()) + " = given")
                .withNoise(Noise.of(Math.abs(given.unit().toBase(given.sigma()))));
        return new Anchor(definition, object, given);
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
                        .startingAt(d -> 10 - 5 * StrictMath.log10(Math.max(d.observed(), d.sigma())));
            default ->
                throw new ValueFault(
                        "unit " + unit.symbol(),
                        "an anchor is a modulus, a distance or a parallax",
                        "anchor \"" + where + "\"",
                        "give it in mag, Mpc, kpc, pc, mas or µas");
        };
    }

    private static Dual shifted(Dual predicted, distanceladder.relation.Terms at, boolean systematic) {
        return systematic ? predicted.add(at.parameter(SYSTEMATIC)) : predicted;
    }

    /**
     * The same anchor with a systematic error.
     *
     * @param error standard deviation in the dimension in which the anchor is given
     * @return the rung, with a source named "{@code rung} systematic"
     */
    public Anchor withSystematic(Amount error) {
        Amount in = error.in(given.unit());
        double sigma = in.sigma() > 0 ? in.sigma() : Math.abs(in.value());
        return withSystematic(Source.normal(definition.name() + " systematic", new Amount(0, sigma, given.unit())));
    }

    /**
     * The same anchor with a systematic error that others may share.
     *
     * @param source observed minus true, in the dimension in which the anchor is given
     * @return the rung
     */
    public Anchor withSystematic(Source source) {
        source.unit().convert(0, given.unit());
        return like(
                definition.parameter(SYSTEMATIC, source).withRelation(relation(given.unit(), true, definition.name())));
    }

    /**
     * The same anchor at another value, with its systematic part as it was.
     *
     * @param other the new amount; without a standard deviation the old one stays
     * @return the rung under the same name
     */
    public Anchor at(Amount other) {
        Amount in = other.in(given.unit());
        Amount full = in.sigma() > 0 ? in : in.plusMinus(given.sigma());
        Anchor fresh = named(definition.name(), object, full);
        return definition.input(SYSTEMATIC).isPresent()
                ? fresh.withSystematic((Source) definition.value(SYSTEMATIC))
                : fresh;
    }

    /**
     * The anchor's object.
     *
     * @return handle of its modulus
     */
    public Value distance() {
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
