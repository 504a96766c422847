package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Slopes and domains; values stand against outside ones in the validation tests. */
class DistancesTest {
    @ParameterizedTest
    @ValueSource(doubles = {-5, 0, 10, 18.477, 29.3972, 40})
    void slopesAgainstCentralDifferences(double modulus) {
        double h = 1e-4;
        double distance =
                (Distances.megaparsecFromModulus(modulus + h) - Distances.megaparsecFromModulus(modulus - h)) / (2 * h);
        double parallax =
                (Distances.parallaxFromModulus(modulus + h) - Distances.parallaxFromModulus(modulus - h)) / (2 * h);
        // Third order: (ln 10 / 5)^2 h^2 / 6 = 3.5e-10; rounding: 1e-16 / 1e-4 times about 100.
        assertEquals(distance, Distances.megaparsecPerMagnitude(modulus), 1e-9 * Math.abs(distance));
        assertEquals(parallax, Distances.parallaxPerMagnitude(modulus), 1e-9 * Math.abs(parallax));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-5, 0, 10, 18.477, 29.3972, 40})
    void thereAndBack(double modulus) {
        double distance = Distances.megaparsecFromModulus(modulus);
        assertEquals(modulus, Distances.modulusFromMegaparsec(distance), 1e-13);
        assertEquals(modulus, Distances.modulusFromParallax(Distances.parallaxFromModulus(modulus)), 1e-13);
        assertEquals(1e-3, distance * Distances.parallaxFromModulus(modulus), 1e-16);
    }

    /** 0.1 mag are 4.6 % of a distance: ln 10 / 5 = 0.46051701859880914 (NumPy 1.24). */
    @Test
    void firstOrderErrors() {
        assertEquals(0.046051701859880914, Distances.relativeError(0.1), 1e-17);
        assertEquals(0.1, Distances.modulusError(Distances.relativeError(0.1)), 1e-16);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, -0.0, -1, Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void whatHasNoModulus(double value) {
        ValueFault fault = assertThrows(ValueFault.class, () -> Distances.modulusFromMegaparsec(value));
        assertEquals("distance = " + value + " Mpc", fault.what());
        assertThrows(ValueFault.class, () -> Distances.modulusFromParallax(value));
    }
}
