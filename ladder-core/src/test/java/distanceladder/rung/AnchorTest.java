package distanceladder.rung;

import static distanceladder.relation.Amount.kilometresPerSecond;
import static distanceladder.relation.Amount.megaparsecs;
import static distanceladder.relation.Amount.milliarcseconds;
import static distanceladder.relation.Amount.modulus;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Noise;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.text.ValueFault;
import java.util.List;
import org.junit.jupiter.api.Test;

class AnchorTest {
    private final Anchor inMagnitudes = Anchor.of("ring", modulus(29.4).plusMinus(0.03));
    private final Anchor inKiloparsecs = Anchor.of("ring", new Amount(7580, 80, Unit.KILOPARSEC));
    private final Anchor inMilliarcseconds =
            Anchor.of("star", milliarcseconds(0.4).plusMinus(0.02));

    @Test
    void rowsAreTheEquations() {
        Slopes.agree(inMagnitudes, 29, (i, mu, s) -> mu);
        Slopes.agree(inKiloparsecs, 29, (i, mu, s) -> Slopes.tenTo((mu - 25) / 5));
        Slopes.agree(inMilliarcseconds, 12, (i, mu, s) -> Slopes.tenTo((10 - mu) / 5));
        assertFalse(Slopes.curved(inMagnitudes));
        assertTrue(Slopes.curved(inKiloparsecs));
        assertTrue(Slopes.curved(inMilliarcseconds));
    }

    @Test
    void theSystematicPartIsAddedInItsOwnScale() {
        Slopes.agree(inMagnitudes.withSystematic(modulus(0.02)), 29, (i, mu, s) -> mu + s.applyAsDouble("systematic"));
        Slopes.agree(
                inKiloparsecs.withSystematic(megaparsecs(0.1)),
                29,
                (i, mu, s) -> Slopes.tenTo((mu - 25) / 5) + s.applyAsDouble("systematic"));
        Slopes.agree(
                inMilliarcseconds.withSystematic(milliarcseconds(0.01)),
                12,
                (i, mu, s) -> Slopes.tenTo((10 - mu) / 5) + s.applyAsDouble("systematic"));
        assertFalse(Slopes.curved(inMagnitudes.withSystematic(modulus(0.02))));
    }

    @Test
    void theSystematicPartIsASource() {
        Source own = (Source) inKiloparsecs.withSystematic(megaparsecs(0.1)).systematic();
        assertEquals("ring anchor systematic", own.name());
        assertEquals(0, own.mean()[0]);
        assertEquals(0.1, own.root()[0][0], 1e-15);
        Source same = (Source)
                inKiloparsecs.withSystematic(megaparsecs(0).plusMinus(0.1)).systematic();
        assertEquals(own, same);
        Source shared = Source.normal("common", modulus(0).plusMinus(0.05));
        assertSame(shared, inMagnitudes.withSystematic(shared).systematic());
        SourceGroup group = SourceGroup.of("g", Unit.MAGNITUDE, List.of("one"), 0);
        assertEquals(
                "g: one",
                inMagnitudes
                        .withSystematic(group.member("one"))
                        .at(modulus(29.5))
                        .systematic()
                        .name());
    }

    @Test
    void aNamedAnchorHasItsName() {
        Anchor second = Anchor.named("ring by masers", "ring", modulus(29.4).plusMinus(0.03));
        assertEquals("ring by masers", second.name());
        assertEquals("ring anchor", inMagnitudes.name());
        assertEquals(List.of("ring"), second.definition().data().objects());
        assertEquals("ring", second.distance().object());
    }

    @Test
    void movedAnchorsKeepTheRest() {
        Anchor moved = inMagnitudes.withSystematic(modulus(0.02)).at(modulus(29.5));
        assertEquals(29.5, observed(moved));
        assertEquals(0.03 * 0.03, variance(moved), 1e-18);
        assertEquals("ring anchor systematic", moved.systematic().name());
        assertEquals(0.05 * 0.05, variance(inMagnitudes.at(modulus(29.5).plusMinus(0.05))), 1e-18);
        Anchor nearer = inKiloparsecs.at(megaparsecs(7.1).plusMinus(0.05));
        assertEquals(7.1, observed(nearer), 1e-14);
        assertEquals(0.0025, variance(nearer), 1e-15);
        assertEquals(0.0025, variance(nearer.at(megaparsecs(7.2))), 1e-15);
        Anchor exact = inMagnitudes.withoutErrors().at(modulus(29.5));
        assertEquals(Noise.Scatter.EXACT, exact.definition().noise().mode());
        assertEquals(
                0.1,
                inMagnitudes
                        .withScatter(modulus(0.1))
                        .at(modulus(29.5).plusMinus(0.05))
                        .definition()
                        .noise()
                        .scatter());
        assertThrows(
                ValueFault.class,
                () -> inMagnitudes.withoutErrors().at(modulus(29.5).plusMinus(0.05)));
    }

    @Test
    void aParallaxOfZeroOrLessIsLegal() {
        Anchor noisy = Anchor.of("star", milliarcseconds(-0.01).plusMinus(0.02));
        Definition d = noisy.definition();
        assertTrue(d.relation().refusal(d, 0, d.relation().start(d)).isPresent());
        Definition shifted =
                noisy.withSystematic(Source.exact("zp", milliarcseconds(-0.05))).definition();
        assertTrue(shifted.relation()
                .refusal(shifted, 0, shifted.relation().start(shifted))
                .isEmpty());
    }

    @Test
    void whatDoesNotFitIsRefused() {
        ValueFault sharp = assertThrows(ValueFault.class, () -> Anchor.of("ring", modulus(29.4)));
        assertEquals("anchor \"ring anchor\"", sharp.where());
        assertThrows(
                ValueFault.class,
                () -> Anchor.of("ring", kilometresPerSecond(500).plusMinus(1)));
        assertThrows(ValueFault.class, () -> Anchor.of("ring", megaparsecs(-7).plusMinus(1)));
        assertThrows(ValueFault.class, () -> inKiloparsecs.at(megaparsecs(0)));
        assertThrows(ValueFault.class, () -> inMagnitudes.at(megaparsecs(7)));
        assertThrows(ValueFault.class, () -> inMagnitudes.withSystematic(megaparsecs(0.1)));
        assertThrows(
                ValueFault.class, () -> inMagnitudes.withSystematic(modulus(0.1).plusMinus(0.02)));
        assertThrows(ValueFault.class, () -> inMagnitudes.withSystematic(Source.free("s", Unit.MILLIARCSECOND)));
    }

    private static double observed(Anchor anchor) {
        return anchor.definition().data().column(anchor.definition().observable())[0];
    }

    private static double variance(Anchor anchor) {
        return anchor.definition().noise().covariance().entry(0, 0);
    }
}
