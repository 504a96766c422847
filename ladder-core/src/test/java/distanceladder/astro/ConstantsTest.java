package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.math.MathContext;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Definitions: c exact (SI), au 149597870700 m (IAU 2012 B2), pc = 648000/pi au (IAU 2015 B2). */
@Tag("validation")
class ConstantsTest {
    /** Pi to 50 digits: any table of constants. */
    private static final BigDecimal PI = new BigDecimal("3.1415926535897932384626433832795028841971693993751");

    @Test
    void parsecIsTheDoubleNearestToItsDefinition() {
        BigDecimal parsec =
                new BigDecimal(648000).multiply(new BigDecimal(149597870700L)).divide(PI, new MathContext(40));
        assertEquals(parsec.doubleValue(), Constants.PC_M);
        assertEquals(parsec.movePointRight(3).doubleValue(), Constants.MPC_KM);
    }

    @Test
    void exactOnes() {
        assertEquals(299792.458, Constants.C_KM_PER_S);
        assertEquals(149597870700.0, Constants.AU_M);
        assertEquals(365.25 * 86400, Constants.JULIAN_YEAR_S);
        assertEquals(Constants.C_KM_PER_S, Cosmography.LIGHT_KM_PER_S);
        assertEquals(31557600e9, Cosmography.GYR_S);
    }

    /** One au in a Julian year is 4.740470463533348 km/s, a parsec 3.2615637771674333 light years (astropy 5.2). */
    @Test
    void derivedOnes() {
        assertEquals(4.740470463533348, Constants.AU_M / 1000 / Constants.JULIAN_YEAR_S, 1e-15);
        assertEquals(3.2615637771674333, Constants.PC_M / 1000 / Constants.C_KM_PER_S / Constants.JULIAN_YEAR_S, 1e-15);
    }
}
