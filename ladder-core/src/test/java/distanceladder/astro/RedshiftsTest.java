package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class RedshiftsTest {
    /** z, optical and relativistic velocity (km/s), computed with astropy 5.2. */
    @Tag("validation")
    @ParameterizedTest
    @CsvSource({
        "0.001, 299.792458, 299.6425618458279",
        "0.003, 899.3773739999999, 898.0283139915688",
        "0.01, 2997.92458, 2982.9356991238064",
        "0.0233, 6985.1642714, 6903.80868837332",
        "0.05, 14989.6229, 14615.32791676576",
        "0.1, 29979.2458, 28487.066144796405",
        "0.5, 149896.229, 115304.79153846155",
        "1.0, 299792.458, 179875.4748",
        "2.0, 599584.916, 239833.96639999998"
    })
    void velocities(double z, double optical, double relativistic) {
        assertEquals(optical, Redshifts.opticalVelocity(z), 1e-15 * optical);
        // The reference itself goes through (1 + z)^2 - 1 and so loses digits at small z: 1e-16 / z.
        assertEquals(relativistic, Redshifts.relativisticVelocity(z), 5e-13 * relativistic);
        assertEquals(z, Redshifts.fromOpticalVelocity(optical), 1e-15 * z);
        assertEquals(z, Redshifts.fromRelativisticVelocity(relativistic), 5e-13 * z);
    }

    @ParameterizedTest
    @ValueSource(doubles = {-0.999, -0.3, -1e-3, -1e-12, 0, 1e-300, 1e-12, 0.02, 1, 1100})
    void thereAndBack(double z) {
        double tolerance = 4e-16 * Math.abs(z);
        assertEquals(z, Redshifts.fromOpticalVelocity(Redshifts.opticalVelocity(z)), tolerance);
        // Near the speed of light a redshift is lost in 1 - v/c: (1 + z)^2 units in the last place.
        double lost = 4e-16 * Math.max(1, (1 + z) * (1 + z)) / Math.min(1, (1 + z) * (1 + z));
        assertEquals(z, Redshifts.fromRelativisticVelocity(Redshifts.relativisticVelocity(z)), 2 * lost * Math.abs(z));
        double both = Redshifts.composed(z, 0.25);
        assertEquals(z, Redshifts.without(both, 0.25), 1e-15 * Math.max(Math.abs(z), 0.25));
    }

    /** Relativistic velocities add as their redshifts compose (Einstein 1905, section 5). */
    @Test
    void relativisticVelocitiesAddByComposition() {
        double c = Constants.C_KM_PER_S;
        double sum = (60000.0 + 90000) / (1 + 60000.0 * 90000 / (c * c));
        double composed = Redshifts.composed(
                Redshifts.fromRelativisticVelocity(60000), Redshifts.fromRelativisticVelocity(90000));
        assertEquals(sum, Redshifts.relativisticVelocity(composed), 1e-15 * sum * 4);
    }

    @Test
    void composedByProduct() {
        assertEquals(0.32, Redshifts.composed(0.1, 0.2), 1e-16);
        assertEquals(0.1, Redshifts.without(0.32, 0.2), 1e-16);
        assertEquals(3e-20, Redshifts.composed(1e-20, 2e-20), 1e-35);
        assertEquals(1e-20, Redshifts.without(3e-20, 2e-20), 1e-35);
    }

    @ParameterizedTest
    @ValueSource(doubles = {-1, -2, Double.NaN, Double.POSITIVE_INFINITY})
    void outsideOfTheDomain(double z) {
        ValueFault fault = assertThrows(ValueFault.class, () -> Redshifts.opticalVelocity(z));
        assertEquals("redshift = " + z, fault.what());
        assertThrows(ValueFault.class, () -> Redshifts.relativisticVelocity(z));
        assertThrows(ValueFault.class, () -> Redshifts.composed(z, 0));
        assertThrows(ValueFault.class, () -> Redshifts.composed(0, z));
        assertThrows(ValueFault.class, () -> Redshifts.without(z, 0));
        assertThrows(ValueFault.class, () -> Redshifts.without(0, z));
        assertThrows(ValueFault.class, () -> Redshifts.fromOpticalVelocity(z * 299792.458));
    }

    @ParameterizedTest
    @ValueSource(doubles = {299792.458, -299792.458, 4e5, Double.NaN})
    void notFasterThanLight(double velocity) {
        assertThrows(ValueFault.class, () -> Redshifts.fromRelativisticVelocity(velocity));
    }
}
