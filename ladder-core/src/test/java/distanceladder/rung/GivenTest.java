package distanceladder.rung;

import static distanceladder.relation.Amount.magnitudes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;

import distanceladder.astro.Unit;
import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Tabulated;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

class GivenTest {
    private static final Observations DATA = Observations.of("published", "y1", "y2", "y3")
            .with("value", Unit.MAGNITUDE, 10, 11, 1)
            .with("value error", Unit.MAGNITUDE, 0.1, 0.2, 0.3);
    private static final Tabulated DESIGN = Tabulated.of(3)
            .object("ring", 1, 0, 1)
            .object("disc", 0, 2, -1)
            .parameter("M", 1, 1, 0)
            .parameter("b", 0.5, -0.5, 0);
    private static final Source ZERO = Source.free("M", Unit.MAGNITUDE);
    private static final Source SLOPE = Source.normal("b", magnitudes(-3).plusMinus(0.1));
    private static final Map<String, Source> SOURCES = Map.of("M", ZERO, "b", SLOPE);

    private final Given rung = Given.of("given", DATA, DESIGN, SOURCES);

    @Test
    void rowsAreTheDesigns() {
        Slopes.agree(
                rung,
                30,
                (i, mu, s) -> new double[] {1, 2, 0}[i] * mu
                        + new double[] {1, 1, 0}[i] * s.applyAsDouble("M")
                        + new double[] {0.5, -0.5, 0}[i] * s.applyAsDouble("b"));
        assertFalse(Slopes.curved(rung));
    }

    @Test
    void objectsComeFromTheDesign() {
        Definition d = rung.definition();
        assertEquals(List.of("ring", "disc", ""), d.data().objects());
        Linearised rows = d.relation().linearise(d, d.relation().start(d));
        assertEquals(List.of(new Linearised.Tie("ring", 1), new Linearised.Tie("disc", -1)), rows.ties(2));
        assertEquals(List.of(), rows.ties(0));
    }

    @Test
    void parametersAreReplacedByRole() {
        assertSame(SLOPE, rung.parameter("b"));
        Source other = Source.free("other", Unit.MAGNITUDE);
        assertSame(other, rung.withParameter("b", other).parameter("b"));
        SourceGroup group = SourceGroup.of("g", Unit.MAGNITUDE, List.of("one"), 0);
        assertEquals(
                "g: one",
                rung.withParameter("M", group.member("one")).parameter("M").name());
        assertThrows(NameFault.class, () -> rung.withParameter("c", other));
    }

    @Test
    void errorsAreTheColumnsOrGiven() {
        assertEquals(0.04, rung.definition().noise().covariance().entry(1, 1), 1e-17);
        Noise noise = Noise.of(1, 1, 1);
        assertSame(
                noise,
                Given.of("given", DATA, DESIGN, SOURCES, noise).definition().noise());
    }

    @Test
    void whatDoesNotFitIsRefused() {
        assertThrows(NameFault.class, () -> Given.of("given", DATA, DESIGN, Map.of("M", ZERO)));
        assertThrows(NameFault.class, () -> Given.of("given", DATA, DESIGN, Map.of("M", ZERO, "b", SLOPE, "c", SLOPE)));
        assertThrows(NameFault.class, () -> Given.of("given", DATA.renamed("value", "v"), DESIGN, SOURCES));
        assertThrows(NameFault.class, () -> Given.of("given", DATA.renamed("value error", "e"), DESIGN, SOURCES));
        assertThrows(
                ValueFault.class,
                () -> Given.of("given", DATA.with("value error", Unit.MAGNITUDE, 0, 1, 1), DESIGN, SOURCES));
        assertThrows(ValueFault.class, () -> Given.of("given", DATA.part(0, 1), DESIGN, SOURCES));
        assertThrows(ValueFault.class, () -> Given.of("given", DATA, DESIGN, SOURCES, Noise.of(1, 1)));
    }
}
