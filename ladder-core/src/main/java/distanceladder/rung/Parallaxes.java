package distanceladder.rung;

import distanceladder.astro.Distances;
import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Datum;
import distanceladder.relation.Definition;
import distanceladder.relation.Equated;
import distanceladder.relation.Equation;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Value;
import distanceladder.text.Figures;
import java.util.Optional;

/**
 * Trigonometric parallaxes, kept as parallaxes.
 *
 * <pre>p = 10^((10 - mu) / 5) + zp      [mas]</pre>
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
    private static final String ERROR = "parallax error";
    private static final Equation EQUATION =
            (modulus, at) -> modulus.negate().add(10).divide(5).tenTo().add(at.parameter(OFFSET));

    private final Definition definition;

    private Parallaxes(Definition definition) {
        this.definition = definition;
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
        double[] errors = data.errors(ERROR, Unit.MILLIARCSECOND);
        boolean apart = Requirements.offsets(data);
        Equated relation = Equated.of(EQUATION)
                .startingAt(d -> start(d) - (apart ? d.column(Requirements.OFFSETS) : 0))
                .refusing(d -> refusal(d.observed() - d.parameter(OFFSET)));
        return new Parallaxes(Definition.of(
                                name, data, "parallax", apart ? relation.withOffsets(Requirements.OFFSETS) : relation)
                        .described("p = 10^((10 - mu)/5) + offset, offset observed minus true")
                        .withNoise(Noise.of(errors)))
                .withOffset(Source.exact(name + " offset", Amount.milliarcseconds(0)));
    }

    /** Noise of unknown size has no sigma yet; the column's error then keeps a negative parallax from infinity. */
    private static double start(Datum d) {
        double sigma = d.sigma() > 0 ? d.sigma() : d.column(ERROR);
        return Distances.modulusFromParallax(Math.max(d.observed(), sigma));
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
        Requirements.unit(name(), OFFSET, offset, Unit.MILLIARCSECOND);
        return new Parallaxes(definition.parameter(OFFSET, offset));
    }

    /**
     * The same rung with another offset.
     *
     * @param offset observed minus true, in a unit of parallax, as a member of a group of sources
     * @return the rung
     */
    public Parallaxes withOffset(SourceGroup.Member offset) {
        Requirements.unit(name(), OFFSET, offset, Unit.MILLIARCSECOND);
        return new Parallaxes(definition.parameter(OFFSET, offset));
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
        return new Parallaxes(other);
    }

    @Override
    public String toString() {
        return text();
    }
}
