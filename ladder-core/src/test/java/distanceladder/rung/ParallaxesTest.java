package distanceladder.rung;

import static distanceladder.relation.Amount.milliarcseconds;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.ladder.Ladder;
import distanceladder.relation.Definition;
import distanceladder.relation.Observations;
import distanceladder.relation.Points;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Test;

class ParallaxesTest {
    private static final Observations STARS = Observations.of("stars", "near", "far", "negative")
            .with("parallax", Unit.MILLIARCSECOND, 1.2, 0.3, -0.1)
            .with("parallax error", Unit.MILLIARCSECOND, 0.02, 0.03, 0.04);
    private static final Source OFFSET =
            Source.normal("zp", milliarcseconds(-0.017).plusMinus(0.005));
    private static final SourceGroup GROUP =
            SourceGroup.of("catalogue", Unit.MILLIARCSECOND, java.util.List.of("bright", "faint"), -0.02, -0.03);

    private final Parallaxes rung = Parallaxes.of("p", STARS).withOffset(OFFSET);

    @Test
    void rowsAreTheEquations() {
        Slopes.agree(rung, 10, (i, mu, s) -> Slopes.tenTo((10 - mu) / 5) + s.applyAsDouble("offset"));
        assertTrue(Slopes.curved(rung));
    }

    @Test
    void offsetsFromTheObjectAreAdded() {
        double[] apart = {0.01, 0, -0.3};
        Parallaxes members = Parallaxes.of("p", STARS.with("offset", Unit.MAGNITUDE, apart));
        Slopes.agree(members, 10, (i, mu, s) -> Slopes.tenTo((10 - mu - apart[i]) / 5) + s.applyAsDouble("offset"));
        double plain = start(rung).modulus(0);
        assertEquals(plain - 0.01, start(members).modulus(0), 1e-12);
    }

    @Test
    void theOffsetIsSubtractedToCorrect() {
        Source exact = Source.exact("zp", milliarcseconds(-0.017));
        double modulus = Ladder.of(Parallaxes.of("p", STARS.part(0)).withOffset(exact))
                .solve()
                .of(rung.distance("near"))
                .value();
        assertEquals(10 - 5 * StrictMath.log10(1.2 + 0.017), modulus, 1e-9);
    }

    @Test
    void noisyParallaxesStartAtTheirError() {
        Points at = start(rung);
        assertEquals(10 - 5 * StrictMath.log10(1.2), at.modulus(0), 1e-12);
        assertEquals(10 - 5 * StrictMath.log10(0.04), at.modulus(2), 1e-12);
        assertEquals(25, start(rung.withEqualUnknownErrors()).modulus(2), 1e-12); // at a microarcsecond
    }

    @Test
    void aParallaxThatIsNotAboveTheOffsetGivesNoDistance() {
        Definition d = rung.definition();
        assertTrue(d.relation().refusal(d, 0, start(rung)).isEmpty());
        assertEquals(
                "its parallax less the offset is -0.0830 mas, and no distance has a parallax of zero or less",
                d.relation().refusal(d, 2, start(rung)).orElseThrow());
        Parallaxes low = rung.withOffset(Source.exact("zp", milliarcseconds(-0.2)));
        assertTrue(low.definition()
                .relation()
                .refusal(low.definition(), 2, start(low))
                .isEmpty());
    }

    @Test
    void microarcsecondsAreMilliarcseconds() {
        Observations micro = Observations.of("stars", "near")
                .with("parallax", Unit.MICROARCSECOND, 1200)
                .with("parallax error", Unit.MICROARCSECOND, 20);
        Parallaxes small = Parallaxes.of("p", micro);
        assertEquals(start(rung).modulus(0), start(small).modulus(0), 1e-13);
        assertEquals(0.0004, small.definition().noise().covariance().entry(0, 0), 1e-18);
    }

    @Test
    void theOffsetHasATypedHandle() {
        assertSame(OFFSET, rung.offset());
        assertEquals("p offset", Parallaxes.of("p", STARS).offset().name());
        assertEquals(
                "catalogue: faint",
                assertInstanceOf(
                                SourceGroup.Member.class,
                                rung.withOffset(GROUP.member("faint")).offset())
                        .name());
        Slopes.agree(
                Parallaxes.of("p", STARS), 10, (i, mu, s) -> Slopes.tenTo((10 - mu) / 5) + s.applyAsDouble("offset"));
    }

    @Test
    void offsetsMayBeLinearInColumns() {
        double[] colour = {0.5, 1.5, -1};
        Parallaxes full = Parallaxes.of("p", STARS.with("colour", Unit.MAGNITUDE, colour))
                .withOffset(OFFSET)
                .withOffsetTerm("colour", GROUP.member("faint"));
        Slopes.agree(
                full,
                10,
                (i, mu, s) -> Slopes.tenTo((10 - mu) / 5)
                        + s.applyAsDouble("offset")
                        + s.applyAsDouble("offset by colour") * colour[i]);
        Definition d = Parallaxes.of("p", STARS.with("colour", Unit.MAGNITUDE, colour))
                .withOffsetTerm("colour", Source.exact("slope", milliarcseconds(0.2)))
                .definition();
        assertTrue(d.relation().refusal(d, 2, d.relation().start(d)).isEmpty(), "-0.1 + 0.2 is above zero");
        assertThrows(NameFault.class, () -> full.withOffsetTerm("color", OFFSET));
        assertThrows(ValueFault.class, () -> full.withOffsetTerm("colour", Source.free("x", Unit.MAGNITUDE)));
    }

    @Test
    void whatDoesNotFitIsRefused() {
        NameFault missing = assertThrows(
                NameFault.class, () -> Parallaxes.of("p", STARS.renamed("parallax error", "paralax error")));
        assertTrue(missing.repair().contains("paralax error"), missing.getMessage());
        assertThrows(NameFault.class, () -> Parallaxes.of("p", STARS.renamed("parallax", "plx")));
        assertThrows(ValueFault.class, () -> Parallaxes.of("p", STARS.with("parallax", Unit.MAGNITUDE, 1, 2, 3)));
        ValueFault zero = assertThrows(
                ValueFault.class,
                () -> Parallaxes.of("p", STARS.with("parallax error", Unit.MILLIARCSECOND, 0.1, 0, 0.1)));
        assertTrue(zero.where().contains("far"), zero.getMessage());
        assertThrows(
                ValueFault.class, () -> Parallaxes.of("p", STARS.with("offset", Unit.MILLIARCSECOND, 0, 0, -0.02)));
        ValueFault unit = assertThrows(ValueFault.class, () -> rung.withOffset(Source.free("shift", Unit.MAGNITUDE)));
        assertEquals("offset \"shift\" in mag", unit.what());
        SourceGroup wrong = SourceGroup.of("w", Unit.DEX, java.util.List.of("one"), 0);
        assertThrows(ValueFault.class, () -> rung.withOffset(wrong.member("one")));
    }

    private static Points start(Parallaxes of) {
        return of.definition().relation().start(of.definition());
    }
}
