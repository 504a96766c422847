package distanceladder.examples;

import static distanceladder.relation.Amount.kilometresPerSecond;
import static distanceladder.relation.Amount.magnitudes;
import static distanceladder.relation.Amount.milliarcseconds;
import static distanceladder.relation.Amount.modulus;

import distanceladder.astro.Unit;
import distanceladder.ladder.Ladder;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import distanceladder.rung.SecondaryIndicator;
import distanceladder.rung.VelocityDistance;
import distanceladder.table.Table;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The ladder of the invented Skerry Point observatory. */
final class SkerryPoint {
    final Source offset =
            Source.normal("parallax offset", milliarcseconds(-0.020).plusMinus(0.005));
    final Source camera = Source.normal("camera zero point", magnitudes(0).plusMinus(0.02));
    private final Source zeroPoint = Source.free("pulsator zero point", Unit.MAGNITUDE);
    private final Source slope = Source.free("pulsator slope", Unit.MAGNITUDE_PER_DEX);
    private final Source metals = Source.normal(
            "metallicity coefficient", magnitudes(-0.20).plusMinus(0.05).in(Unit.MAGNITUDE));

    final Parallaxes parallaxes = Parallaxes.of(
                    "parallaxes",
                    table("nearby.csv")
                            .observations("star")
                            .number("parallax", Unit.MILLIARCSECOND, "parallax_mas")
                            .error("parallax error", Unit.MILLIARCSECOND, "parallax_error_mas")
                            .build())
            .withOffset(offset);
    final Anchor anvil = anchor(0);
    final Anchor beacon = anchor(1);
    final PeriodLuminosity nearby =
            pulsators("nearby pulsators", "nearby.csv", "star").calibratedBy(parallaxes);
    final PeriodLuminosity pulsators = pulsators("host pulsators", "pulsators.csv", "galaxy")
            .withCommonOffset(camera)
            .calibratedBy(nearby, anvil, beacon);
    final SecondaryIndicator explosions = SecondaryIndicator.of(
                    "explosions",
                    table("explosions.csv")
                            .observations("event")
                            .object("galaxy")
                            .number("magnitude", Unit.MAGNITUDE, "magnitude")
                            .error("magnitude error", Unit.MAGNITUDE, "magnitude_error")
                            .number("shape", Unit.NONE, "shape")
                            .number("colour", Unit.MAGNITUDE, "colour")
                            .build())
            .withCovariate("shape")
            .withCovariate("colour")
            .withScatter(magnitudes(0.10))
            .calibratedBy(pulsators);
    final SecondaryIndicator rotators = SecondaryIndicator.of(
                    "rotators",
                    table("rotators.csv")
                            .observations("galaxy")
                            .number("magnitude", Unit.MAGNITUDE, "magnitude")
                            .error("magnitude error", Unit.MAGNITUDE, "magnitude_error")
                            .number("log width", Unit.DEX, "log_width")
                            .number("orbital camera", Unit.NONE, "orbital")
                            .build())
            .withCovariate("log width")
            .withCovariate("orbital camera", camera)
            .withScatter(magnitudes(0.30))
            .calibratedBy(pulsators);
    final VelocityDistance flow = VelocityDistance.of(
                    "flow",
                    table("flow.csv")
                            .observations("galaxy")
                            .number("velocity", Unit.KILOMETRE_PER_SECOND, "velocity_km_s")
                            .error("velocity error", Unit.KILOMETRE_PER_SECOND, "velocity_error_km_s")
                            .build())
            .withPeculiarVelocity(kilometresPerSecond(250))
            .inMagnitudes()
            .calibratedBy(explosions, rotators);

    /** All rungs; what the flow rests on comes along. */
    Ladder ladder() {
        return Ladder.of(flow);
    }

    private PeriodLuminosity pulsators(String name, String file, String object) {
        return PeriodLuminosity.of(
                        name,
                        table(file)
                                .observations("star")
                                .object(object)
                                .number("log period", Unit.LOG_DAY, "log_period")
                                .number("magnitude", Unit.MAGNITUDE, "magnitude")
                                .error("magnitude error", Unit.MAGNITUDE, "magnitude_error")
                                .number("metallicity", Unit.DEX, "metallicity")
                                .build())
                .withZeroPoint(zeroPoint)
                .withSlope(slope)
                .withMetallicity(metals)
                .withScatter(magnitudes(0.08));
    }

    private static Anchor anchor(int row) {
        Table anchors = table("anchors.csv");
        String galaxy = anchors.cell(row, "galaxy");
        return Anchor.of(galaxy, modulus(anchors.number(row, "modulus")).plusMinus(anchors.number(row, "statistical")))
                .withSystematic(magnitudes(anchors.number(row, "systematic")));
    }

    private static Table table(String file) {
        try (InputStream in = SkerryPoint.class.getResourceAsStream(file)) {
            if (in == null) {
                throw new IllegalStateException(file + " is missing");
            }
            return Table.parse(file, new String(in.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
