package distanceladder.rung;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.List;
import org.junit.jupiter.api.Test;

class OwnTest {
    private static final double[] WIDTH = {2.1, 2.4};
    private static final Observations DATA = Observations.of("widths", "a", "b")
            .with("magnitude", Unit.MAGNITUDE, 12, 11)
            .with("magnitude error", Unit.MAGNITUDE, 0.2, 0.3)
            .with("width", Unit.DEX, WIDTH);
    private static final Source ZERO = Source.free("zero", Unit.MAGNITUDE);
    private static final SourceGroup GROUP = SourceGroup.of("g", Unit.MAGNITUDE, List.of("bend"), 0);

    private final Own rung = Own.of(
                    "own",
                    DATA,
                    "magnitude",
                    (mu, s) -> mu.add(s.parameter("a"))
                            .add(s.parameter("b").multiply(s.column("width")).square()))
            .withParameter("a", ZERO)
            .withParameter("b", GROUP.member("bend"));

    @Test
    void rowsAreTheEquations() {
        Slopes.agree(rung, 30, (i, mu, s) -> {
            double bent = s.applyAsDouble("b") * WIDTH[i];
            return mu + s.applyAsDouble("a") + bent * bent;
        });
        assertTrue(Slopes.curved(rung));
        assertSame(ZERO, rung.parameter("a"));
        assertEquals("g: bend", rung.parameter("b").name());
    }

    @Test
    void whatDoesNotFitIsRefused() {
        assertThrows(NameFault.class, () -> Own.of("own", DATA, "mag", (mu, s) -> mu));
        assertThrows(
                NameFault.class, () -> Own.of("own", DATA.renamed("magnitude error", "e"), "magnitude", (mu, s) -> mu));
        assertThrows(
                ValueFault.class,
                () -> Own.of("own", DATA.with("magnitude error", Unit.MAGNITUDE, 0, 1), "magnitude", (mu, s) -> mu));
        assertThrows(NameFault.class, () -> rung.parameter("c"));
        Own unnamed = Own.of("own", DATA, "magnitude", (mu, s) -> mu.add(s.parameter("a")));
        NameFault role = assertThrows(NameFault.class, () -> Slopes.curved(unnamed));
        assertEquals("rung \"own\"", role.where());
    }
}
