package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class UnitTest {
    @ParameterizedTest
    @EnumSource
    void symbolsReadBack(Unit unit) {
        assertSame(unit, Unit.of(unit.symbol()));
        assertEquals(7.0, unit.fromBase(unit.toBase(7)));
        assertEquals(0.1, unit.convert(0.1, unit));
    }

    @Test
    void otherSpellings() {
        assertSame(Unit.MICROARCSECOND, Unit.of("uas"));
        assertSame(Unit.MICROARCSECOND, Unit.of("\u00B5as"));
        assertSame(Unit.MICROARCSECOND, Unit.of("\u03BCas"));
        assertSame(Unit.NONE, Unit.of("1"));
    }

    /** Whole micro- and millimagnitudes are to the bit what one would write in the larger unit. */
    @Test
    void smallUnitsAreDecimalsToTheBit() {
        for (int i = -30000; i <= 30000; i++) {
            double written = Double.parseDouble(i + "e-3");
            assertEquals(written, Unit.MICROARCSECOND.convert(i, Unit.MILLIARCSECOND));
            assertEquals(written, Unit.MILLIMAGNITUDE.toBase(i));
            assertEquals(Double.parseDouble(i + "e-6"), Unit.PARSEC.convert(i, Unit.MEGAPARSEC));
        }
    }

    @Test
    void conversions() {
        assertEquals(7576, Unit.MEGAPARSEC.convert(7.576, Unit.KILOPARSEC), 1e-12);
        assertEquals(49590, Unit.KILOPARSEC.convert(49.59, Unit.PARSEC), 1e-11);
        assertEquals(0.04959, Unit.PARSEC.convert(49590, Unit.MEGAPARSEC));
        assertEquals(-1500, Unit.KILOMETRE_PER_SECOND.convert(-1.5, Unit.METRE_PER_SECOND));
    }

    @Test
    void dimensionsDoNotMix() {
        ValueFault fault = assertThrows(ValueFault.class, () -> Unit.MILLIARCSECOND.convert(0.3, Unit.KILOPARSEC));
        assertEquals("0.3 mas", fault.what());
        assertEquals("a parallax does not convert to kpc (length)", fault.rule());
        assertEquals("give it in one of Mpc, kpc, pc", fault.repair());
    }

    @Test
    void aRedshiftIsNoVelocity() {
        ValueFault fault = assertThrows(ValueFault.class, () -> Unit.REDSHIFT.convert(0.02, Unit.KILOMETRE_PER_SECOND));
        assertEquals("give it in one of km/s, m/s, or convert it by Redshifts", fault.repair());
        assertThrows(ValueFault.class, () -> Unit.METRE_PER_SECOND.convert(2, Unit.REDSHIFT));
    }

    @Test
    void unknownUnitsNameTheNearest() {
        NameFault fault = assertThrows(NameFault.class, () -> Unit.of("Kpc/s"));
        assertTrue(fault.repair().startsWith("nearest known: "), fault.repair());
        assertTrue(fault.repair().contains("\"kpc\""), fault.repair());
    }
}
