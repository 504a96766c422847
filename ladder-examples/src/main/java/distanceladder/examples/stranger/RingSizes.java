package distanceladder.examples.stranger;

import distanceladder.astro.Unit;
import distanceladder.relation.Definition;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.Value;

/**
 * Angular sizes of rings that have one true size: {@code log t = log(s / 1 kpc) - (mu - 25) / 5 + log 206.265}.
 *
 * <p>t in arc seconds, s the true diameter; columns {@code log size} and {@code log size error} (dex).
 */
public final class RingSizes implements Rung<RingSizes> {
    private static final double LOG_ARCSECONDS = StrictMath.log10(206.264806);

    private final Definition definition;

    private RingSizes(Definition definition) {
        this.definition = definition;
    }

    /**
     * A rung of ring sizes with a free true size.
     *
     * @param name name of the rung
     * @param data its columns as said above
     * @return the rung
     */
    public static RingSizes of(String name, Observations data) {
        data.require("log size", Unit.DEX);
        Equated relation = Equated.of((mu, at) ->
                at.parameter("true size").subtract(mu.subtract(25).divide(5)).add(LOG_ARCSECONDS));
        return new RingSizes(Definition.of(name, data, "log size", relation)
                .described("log t = log s - (mu - 25)/5 + 2.314")
                .withNoise(Noise.of(data.errors("log size error", Unit.DEX)))
                .parameter("true size", Source.free(name + " true size", Unit.DEX)));
    }

    /**
     * The true size.
     *
     * @return handle of log10 of the diameter in kpc
     */
    public Value trueSize() {
        return definition.value("true size");
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public RingSizes like(Definition other) {
        return new RingSizes(other);
    }
}
