package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Directions at the places where formulas lose their digits. */
class SkyTest {
    /** The pole (ESA 1997, volume 1, section 1.5.3) has latitude 90, whatever rounding does to its sine. */
    @Test
    void theGalacticPole() {
        assertEquals(90, Sky.galactic(192.85948, 27.12825).latitude(), 1e-12);
        assertEquals(-90, Sky.galactic(12.85948, -27.12825).latitude(), 1e-12);
    }

    /** A small step from the pole is seen to twelve digits of a degree; the arc of the sine would show 1e-7 of noise. */
    @Test
    void latitudesNearThePole() {
        for (double step : new double[] {1e-3, 1e-5, 1e-7}) {
            assertEquals(90 - step, Sky.galactic(192.85948, 27.12825 + step).latitude(), 1e-12, step + " degrees");
        }
    }

    /** The celestial pole has the longitude by which the system is fixed, 122.93192 (ESA 1997). */
    @Test
    void theCelestialPole() {
        Sky.Galactic pole = Sky.galactic(0, 90);
        assertEquals(122.93192, pole.longitude(), 1e-10);
        assertEquals(27.12825, pole.latitude(), 1e-12);
    }

    @Test
    void longitudesFromZeroTo360() {
        for (int ra = -360; ra <= 720; ra += 7) {
            for (int dec = -90; dec <= 90; dec += 9) {
                Sky.Galactic g = Sky.galactic(ra, dec);
                assertTrue(g.longitude() >= 0 && g.longitude() < 360, g + "");
                assertTrue(Math.abs(g.latitude()) <= 90, g + "");
            }
        }
    }

    /** A rotation keeps angles. */
    @Test
    void separationsAreKept() {
        double[][] pairs = {{10, 20, 10.001, 20.0005}, {0, 89, 180, 89}, {187.7, 12.4, 53.4, -36.1}, {1, -1, 181, 1}};
        for (double[] p : pairs) {
            Sky.Galactic one = Sky.galactic(p[0], p[1]);
            Sky.Galactic other = Sky.galactic(p[2], p[3]);
            double before = Sky.separation(p[0], p[1], p[2], p[3]);
            double after = Sky.separation(one.longitude(), one.latitude(), other.longitude(), other.latitude());
            // The haversine is flat at 180 degrees: half the digits there.
            assertEquals(before, after, before > 179 ? 2e-6 : 1e-12 * Math.max(1, before) * 10, before + " degrees");
        }
        assertEquals(2, Sky.separation(0, 89, 180, 89), 1e-12);
        assertEquals(180, Sky.separation(1, -1, 181, 1), 1e-12);
    }

    @Test
    void alongALineOfSight() {
        Sky.Galactic apex = new Sky.Galactic(90, 0);
        assertEquals(300 * StrictMath.cos(StrictMath.PI / 3), Sky.along(300, apex, new Sky.Galactic(90, 60)), 1e-12);
        assertEquals(0, Sky.along(300, apex, new Sky.Galactic(0, 0)), 1e-13);
        assertEquals(-300, Sky.along(300, apex, new Sky.Galactic(270, 0)), 1e-12);
    }
}
