package distanceladder.rung;

import static distanceladder.relation.Amount.magnitudes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
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

class SecondaryIndicatorTest {
    private static final double[] SHAPE = {0.9, 1.1, 1.0};
    private static final double[] COLOUR = {-0.05, 0.02, 0.11};
    private static final Observations EVENTS = Observations.of("events", "one", "two", "three")
            .with("magnitude", Unit.MAGNITUDE, 12.1, 13.2, 14.3)
            .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.12, 0.14)
            .with("shape", Unit.NONE, SHAPE)
            .with("colour", Unit.MAGNITUDE, COLOUR);
    private static final Source CAMERA =
            Source.normal("shape coefficient", magnitudes(0).plusMinus(0.02));
    private static final SourceGroup GROUP =
            SourceGroup.of("published", Unit.MAGNITUDE, List.of("peak", "colour", "camera"), -19, 3, 0);

    private final SecondaryIndicator rung = SecondaryIndicator.of("si", EVENTS);

    @Test
    void rowsAreTheEquations() {
        Slopes.agree(rung, 31, (i, mu, s) -> mu + s.applyAsDouble("zero point"));
        assertFalse(Slopes.curved(rung));
    }

    @Test
    void everyTermHasItsRow() {
        double[] apart = {0.02, 0, -0.01};
        SecondaryIndicator full = SecondaryIndicator.of("si", EVENTS.with("offset", Unit.MAGNITUDE, apart))
                .withCovariate("shape")
                .withCommonOffset(CAMERA)
                .withCovariate("colour", GROUP.member("colour"));
        Slopes.agree(
                full,
                31,
                (i, mu, s) -> mu
                        + apart[i]
                        + s.applyAsDouble("zero point")
                        + s.applyAsDouble("shape coefficient") * SHAPE[i]
                        + s.applyAsDouble("colour coefficient") * COLOUR[i]
                        + s.applyAsDouble("common offset shape coefficient"));
        assertFalse(Slopes.curved(full));
        assertEquals("si shape coefficient", full.coefficient("shape").name());
        assertEquals("published: colour", full.coefficient("colour").name());
    }

    @Test
    void oneSourceMayStandTwice() {
        SecondaryIndicator twice = rung.withCommonOffset(CAMERA).withCovariate("shape", CAMERA);
        Slopes.agree(
                twice,
                31,
                (i, mu, s) -> mu
                        + s.applyAsDouble("zero point")
                        + s.applyAsDouble("shape coefficient") * SHAPE[i]
                        + s.applyAsDouble("common offset shape coefficient"));
    }

    @Test
    void handlesAreTheSources() {
        Source peak = Source.normal("peak", magnitudes(-19.3).plusMinus(0.1));
        assertSame(peak, rung.withZeroPoint(peak).zeroPoint());
        assertEquals("si zero point", rung.zeroPoint().name());
        assertEquals(
                "published: peak",
                rung.withZeroPoint(GROUP.member("peak")).zeroPoint().name());
        assertSame(CAMERA, rung.withCommonOffset(CAMERA).definition().value("common offset " + CAMERA.name()));
        assertTrue(rung.withCommonOffset(GROUP.member("camera"))
                .definition()
                .parameters()
                .containsValue("published: camera"));
    }

    @Test
    void aCovariateIsExactOrUncertainNotBoth() {
        SecondaryIndicator si =
                SecondaryIndicator.of("si", EVENTS.with("colour error", Unit.MAGNITUDE, 0.01, 0.02, 0.03));
        SecondaryIndicator uncertain =
                si.withCovariate("colour").withUncertainCovariate("colour", GROUP.member("colour"));
        assertEquals(List.of("colour"), uncertain.definition().relation().uncertain());
        assertEquals("m = mu + M + c(colour) colour", uncertain.definition().description());
        SecondaryIndicator exact = uncertain.withCovariate("colour");
        assertEquals(List.of(), exact.definition().relation().uncertain());
        Slopes.agree(
                exact,
                31,
                (i, mu, s) -> mu + s.applyAsDouble("zero point") + s.applyAsDouble("colour coefficient") * COLOUR[i]);
        assertThrows(NameFault.class, () -> rung.withUncertainCovariate("colour"));
    }

    @Test
    void whatDoesNotFitIsRefused() {
        NameFault column = assertThrows(NameFault.class, () -> rung.withCovariate("color"));
        assertTrue(column.repair().contains("colour"), column.getMessage());
        assertThrows(NameFault.class, () -> rung.withCovariate("color", CAMERA));
        assertThrows(NameFault.class, () -> rung.withCovariate("shape").coefficient("colour"));
        assertThrows(NameFault.class, () -> SecondaryIndicator.of("si", EVENTS.renamed("magnitude", "m")));
        assertThrows(
                ValueFault.class,
                () -> SecondaryIndicator.of("si", EVENTS.with("magnitude", Unit.MEGAPARSEC, 1, 2, 3)));
        assertThrows(
                ValueFault.class,
                () -> SecondaryIndicator.of("si", EVENTS.with("magnitude error", Unit.MAGNITUDE, 0, 1, 1)));
        assertThrows(ValueFault.class, () -> SecondaryIndicator.of("si", EVENTS.with("offset", Unit.DEX, 0, 0, 0)));
        Source angle = Source.free("angle", Unit.MILLIARCSECOND);
        assertThrows(ValueFault.class, () -> rung.withZeroPoint(angle));
        assertThrows(ValueFault.class, () -> rung.withCommonOffset(angle));
    }
}
