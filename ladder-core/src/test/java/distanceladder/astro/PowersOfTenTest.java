package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class PowersOfTenTest {
    /** The error that the documentation states. */
    @Test
    void wholePowers() {
        assertEquals(1, PowersOfTen.tenTo(0));
        for (int x = -300; x <= 300; x++) {
            double expected = Double.parseDouble("1e" + x);
            assertEquals(expected, PowersOfTen.tenTo(x), 5e-16 * (1 + Math.abs(x)) * expected, "10^" + x);
        }
    }
}
