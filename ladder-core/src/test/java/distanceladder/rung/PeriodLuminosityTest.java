package distanceladder.rung;

import static distanceladder.relation.Amount.magnitudes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.astro.Wesenheit;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.List;
import org.junit.jupiter.api.Test;

class PeriodLuminosityTest {
    private static final double[] LOG_PERIOD = {0.7, 1.0, 1.6};
    private static final double[] METALLICITY = {-0.3, 0.1, 0.2};
    private static final Observations STARS = Observations.of("stars", "a", "b", "c")
            .bearingOn("host", "host", "other")
            .with("magnitude", Unit.MAGNITUDE, 22.1, 21.3, 19.9)
            .with("magnitude error", Unit.MAGNITUDE, 0.05, 0.06, 0.07)
            .with("log period", Unit.LOG_DAY, LOG_PERIOD)
            .with("metallicity", Unit.DEX, METALLICITY);
    private static final Source METALS =
            Source.normal("metals", magnitudes(-0.2).plusMinus(0.05));
    private static final SourceGroup GROUP = SourceGroup.of(
            "published", Unit.MAGNITUDE, List.of("intercept", "slope", "metals", "camera"), -5, -3, 0, 0);

    private final PeriodLuminosity rung = PeriodLuminosity.of("pl", STARS);

    @Test
    void rowsAreTheEquations() {
        Slopes.agree(
                rung,
                25,
                (i, mu, s) -> mu + s.applyAsDouble("zero point") + s.applyAsDouble("slope") * (LOG_PERIOD[i] - 1));
        assertFalse(Slopes.curved(rung));
    }

    @Test
    void everyTermHasItsRow() {
        double[] apart = {0.02, 0, -0.01};
        PeriodLuminosity full = PeriodLuminosity.of("pl", STARS.with("offset", Unit.MAGNITUDE, apart))
                .withMetallicity(METALS)
                .withPivot(0.8)
                .withCommonOffset(Source.normal("slope", magnitudes(0).plusMinus(0.02)));
        Slopes.agree(
                full,
                25,
                (i, mu, s) -> mu
                        + apart[i]
                        + s.applyAsDouble("zero point")
                        + s.applyAsDouble("slope") * (LOG_PERIOD[i] - 0.8)
                        + s.applyAsDouble("metallicity coefficient") * METALLICITY[i]
                        + s.applyAsDouble("common offset slope"));
        assertFalse(Slopes.curved(full));
        assertEquals("pl slope", full.slope().name(), "a common offset may be named like a role");
        assertEquals(
                "m = mu + M + b (log P - 0.8) + g [O/H] + slope",
                full.definition().description());
    }

    @Test
    void membersOfAGroupAreParameters() {
        PeriodLuminosity given = rung.withZeroPoint(GROUP.member("intercept"))
                .withSlope(GROUP.member("slope"))
                .withMetallicity(GROUP.member("metals"))
                .withCommonOffset(GROUP.member("camera"));
        assertEquals("published: intercept", given.zeroPoint().name());
        assertEquals("published: slope", given.slope().name());
        assertEquals("published: metals", given.metallicityCoefficient().name());
        Slopes.agree(
                given,
                25,
                (i, mu, s) -> mu
                        + s.applyAsDouble("zero point")
                        + s.applyAsDouble("slope") * (LOG_PERIOD[i] - 1)
                        + s.applyAsDouble("metallicity coefficient") * METALLICITY[i]
                        + s.applyAsDouble("common offset published: camera"));
    }

    @Test
    void periodsAreLogarithmsOfPeriods() {
        Observations days = STARS.renamed("log period", "old").with("period", Unit.DAY, 5, 10, 40);
        double[] log = PeriodLuminosity.of("pl", days).definition().data().column("log period");
        assertEquals(StrictMath.log10(5), log[0]);
        assertEquals(1, log[1], 1e-15);
        ValueFault negative = assertThrows(
                ValueFault.class, () -> PeriodLuminosity.of("pl", days.with("period", Unit.DAY, 5, -10, 40)));
        assertTrue(negative.where().contains("\"b\""), negative.getMessage());
    }

    @Test
    void handlesAreTheSources() {
        assertEquals("pl zero point", rung.zeroPoint().name());
        assertEquals("pl slope", rung.slope().name());
        assertSame(METALS, rung.withMetallicity(METALS).metallicityCoefficient());
        assertThrows(NameFault.class, rung::metallicityCoefficient);
    }

    @Test
    void optionsKeepNoiseAndRungsBeneath() {
        PeriodLuminosity changed = rung.withEstimatedScatter()
                .calibratedBy(Anchor.of("host", magnitudes(27).plusMinus(0.1)))
                .withPivot(0.5)
                .withMetallicity(METALS);
        assertEquals(Noise.Scatter.ESTIMATED, changed.definition().noise().mode());
        assertEquals(1, changed.definition().restsOn().size());
    }

    @Test
    void breaksAndOvertones() {
        double[] overtone = {1, 0, 0};
        PeriodLuminosity full = PeriodLuminosity.of("pl", STARS.with("first overtone", Unit.NONE, overtone))
                .withBreak(1.1, Source.free("steeper", Unit.MAGNITUDE_PER_DEX))
                .withOvertones("first overtone", Source.free("brighter", Unit.MAGNITUDE));
        Slopes.agree(
                full,
                25,
                (i, mu, s) -> mu
                        + s.applyAsDouble("zero point")
                        + s.applyAsDouble("slope") * (LOG_PERIOD[i] - 1)
                        + s.applyAsDouble("break") * (LOG_PERIOD[i] < 1.1 ? LOG_PERIOD[i] - 1.1 : 0)
                        + s.applyAsDouble("overtone offset") * overtone[i]);
        assertFalse(Slopes.curved(full));
        Source length = Source.free("length", Unit.MEGAPARSEC);
        assertThrows(ValueFault.class, () -> full.withBreak(1.1, length));
        assertThrows(ValueFault.class, () -> full.withBreak(Double.NaN, METALS));
        assertThrows(ValueFault.class, () -> full.withOvertones("first overtone", length));
        assertThrows(NameFault.class, () -> full.withOvertones("overtone", METALS));
    }

    @Test
    void aColourHasErrors() {
        Observations coloured = STARS.with("V - I", Unit.MAGNITUDE, 0.7, 0.8, 0.9);
        assertThrows(NameFault.class, () -> PeriodLuminosity.of("pl", coloured).withColour("V - I", METALS));
        PeriodLuminosity full = PeriodLuminosity.of(
                        "pl", coloured.with("V - I error", Unit.MAGNITUDE, 0.02, 0.02, 0.03))
                .withColour("V - I", GROUP.member("slope"));
        assertEquals(List.of("V - I"), full.definition().relation().uncertain());
        assertTrue(Slopes.curved(full));
    }

    @Test
    void whatDoesNotFitIsRefused() {
        assertThrows(NameFault.class, () -> PeriodLuminosity.of("pl", STARS.renamed("magnitude", "mag")));
        assertThrows(NameFault.class, () -> PeriodLuminosity.of("pl", STARS.renamed("log period", "logP")));
        assertThrows(ValueFault.class, () -> PeriodLuminosity.of("pl", STARS.with("log period", Unit.DAY, 5, 10, 40)));
        assertThrows(
                ValueFault.class,
                () -> PeriodLuminosity.of("pl", STARS.with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1, 0)));
        assertThrows(ValueFault.class, () -> PeriodLuminosity.of("pl", STARS.with("offset", Unit.PARSEC, 1, 2, 3)));
        assertThrows(
                NameFault.class,
                () -> PeriodLuminosity.of("pl", STARS.renamed("metallicity", "feh"))
                        .withMetallicity(METALS));
        Source length = Source.free("length", Unit.MEGAPARSEC);
        assertThrows(ValueFault.class, () -> rung.withZeroPoint(length));
        ValueFault slope = assertThrows(ValueFault.class, () -> rung.withSlope(length));
        assertEquals("the slope is a magnitude per decade or a magnitude", slope.rule());
        assertThrows(ValueFault.class, () -> rung.withMetallicity(length));
        assertThrows(ValueFault.class, () -> rung.withCommonOffset(length));
        assertThrows(ValueFault.class, () -> rung.withPivot(Double.NaN));
    }

    private static final Observations BANDS = Observations.of("bands", "a", "b")
            .with("H", Unit.MAGNITUDE, 20.0, 21.0)
            .with("H error", Unit.MILLIMAGNITUDE, 30, 40)
            .with("V", Unit.MAGNITUDE, 22.0, 23.5)
            .with("V error", Unit.MAGNITUDE, 0.05, 0.06)
            .with("I", Unit.MAGNITUDE, 21.0, 22.2)
            .with("I error", Unit.MAGNITUDE, 0.02, 0.03);

    @Test
    void wesenheitOfThreeBands() {
        Observations w = PeriodLuminosity.wesenheit(BANDS, 0.4, "H", "V", "I");
        assertEquals(20.0 - 0.4 * 1.0, w.column("magnitude")[0], 1e-13);
        assertEquals(21.0 - 0.4 * 1.3, w.column("magnitude")[1], 1e-13);
        assertEquals(0.03 * 0.03 + 0.16 * (0.05 * 0.05 + 0.02 * 0.02), square(w.column("magnitude error")[0]), 1e-16);
    }

    @Test
    void aBandThatStandsTwiceEntersOnce() {
        Observations redder = PeriodLuminosity.wesenheit(BANDS, 1.55, "I", "V", "I");
        assertEquals(21.0 - 1.55 * 1.0, redder.column("magnitude")[0], 1e-13);
        assertEquals(square(2.55 * 0.02) + square(1.55 * 0.05), square(redder.column("magnitude error")[0]), 1e-16);
        Observations bluer = PeriodLuminosity.wesenheit(BANDS, 0.4, "V", "V", "I");
        assertEquals(square(0.6 * 0.05) + square(0.4 * 0.02), square(bluer.column("magnitude error")[0]), 1e-16);
    }

    @Test
    void columnsAreWhatSingleNumbersAre() {
        Wesenheit law = new Wesenheit(0.4);
        Observations three = PeriodLuminosity.wesenheit(BANDS, 0.4, "H", "V", "I");
        assertEquals(law.magnitude(21.0, 23.5, 22.2), three.column("magnitude")[1], 1e-13);
        assertEquals(law.sigma(0.04, 0.06, 0.03), three.column("magnitude error")[1], 1e-15);
        Observations two = PeriodLuminosity.wesenheit(BANDS, 0.4, "I", "V", "I");
        assertEquals(law.sigmaOfTwoBands(0.03, 0.06), two.column("magnitude error")[1], 1e-15);
    }

    @Test
    void wesenheitRefusesWhatIsNoColour() {
        assertThrows(ValueFault.class, () -> PeriodLuminosity.wesenheit(BANDS, 0.4, "H", "V", "V"));
        assertThrows(ValueFault.class, () -> PeriodLuminosity.wesenheit(BANDS, 0.4, "H", "V"));
        assertThrows(ValueFault.class, () -> PeriodLuminosity.wesenheit(BANDS, Double.NaN, "H", "V", "I"));
        assertThrows(NameFault.class, () -> PeriodLuminosity.wesenheit(BANDS, 0.4, "H", "V", "J"));
    }

    private static double square(double x) {
        return x * x;
    }
}
