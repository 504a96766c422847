package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** The Sun's motion in seven frames; values computed with astropy 5.2 and NumPy 1.24. */
@Tag("validation")
class FrameTest {
    /** Position ICRS and galactic (degrees); km/s in the order of the frames of the enum. */
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "M87, 187.70593, 12.39112, 283.77775595017755, 74.49115120228151, 327.83958712929916 -104.04211415667855"
                + " -117.89184461036758 -53.04766824177288 327.1211053028809 328.95243945217373 -77.90808444148166",
        "NGC 4258, 184.7396, 47.304, 138.32026651838493, 68.84201892877867, 205.45440295519109 59.44614346631208"
                + " 57.19704766978993 59.71350742245137 205.07289361966977 205.9949704635015 72.00401838579221",
        "NGC 1365, 53.4016, -36.1404, 237.95610252655052, -54.5980499379938, -96.76230557810865 -131.54225553947882"
                + " -90.08501638067374 -122.29284144547036 -96.55591121174648 -97.24410178394292 -147.31394353818177",
        "M101, 210.8024, 54.3488, 102.03707473544311, 59.771380109971794, 120.50863535121849 137.68746343325478"
                + " 121.26975688333664 119.2642931880578 120.3041839695178 120.85579085944349 147.71464162288157",
        "Coma, 194.95, 27.98, 58.094452687078125, 87.96029897842708, 267.86284748566635 -12.827868881938002"
                + " -30.07830345356763 14.065404631738602 267.2979224045413 268.7567700089508 9.06442858538365",
        "NGC 1399, 54.6212, -35.4507, 236.716334399502, -53.63562392625251, -92.4540673551983 -132.91375781837527"
                + " -90.39051348197528 -123.45568591863348 -92.2548293482381 -92.93098998046234 -148.6974854059113"
    })
    void solarMotion(String name, double ra, double dec, double l, double b, String motions) {
        String[] expected = motions.split(" ");
        for (Frame frame : Frame.values()) {
            double motion = Double.parseDouble(expected[frame.ordinal()]);
            // From the reference's own galactic direction: rounding alone.
            assertEquals(motion, frame.solarMotion(new Sky.Galactic(l, b)), 1e-10, frame + "");
            // From ICRS: the pole of ESA 1997 has five decimals, 5e-6 degrees; FK5 and ICRS differ by 20 mas (6e-6).
            assertEquals(motion, frame.solarMotion(ra, dec), frame.speed() * 2e-7, frame + "");
        }
    }

    /** Coma: z_hel 0.0233 at 194.95, 27.98; the Sun alone gives -8.93e-4. The sum would be 2.2e-5 off. */
    @Test
    void comaByProduct() {
        assertEquals(-0.0008934568534046949, Frame.BACKGROUND.solarRedshift(194.95, 27.98), 1e-10);
        double z = Frame.BACKGROUND.redshift(0.0233, 194.95, 27.98);
        assertEquals(0.024215091993301963, z, 1e-10);
        assertTrue(z - 0.02419349428358757 > 2.1e-5, "the sum of redshifts");
        assertTrue(z - 0.024214312700395313 > 7e-7, "the product to first order in the Sun's velocity");
    }

    @ParameterizedTest
    @EnumSource
    void thereAndBack(Frame frame) {
        for (double z : new double[] {-0.001, 0, 0.0233, 3}) {
            assertEquals(z, frame.heliocentric(frame.redshift(z, 210.8, 54.3), 210.8, 54.3), 1e-15);
        }
    }

    @ParameterizedTest
    @EnumSource
    void towardsAndAwayFromTheApex(Frame frame) {
        Sky.Galactic apex = frame.apex();
        assertEquals(frame.speed(), frame.solarMotion(apex), 1e-12);
        Sky.Galactic behind = new Sky.Galactic(apex.longitude() + 180, -apex.latitude());
        assertEquals(-frame.speed(), frame.solarMotion(behind), 1e-12);
    }

    /** Apex of the microwave background, ICRS 167.94190332672108, -6.944259977548061 (astropy 5.2). */
    @Test
    void apexOnTheSky() {
        Sky.Galactic apex = Sky.galactic(167.94190332672108, -6.944259977548061);
        assertEquals(Frame.BACKGROUND.apex().longitude(), apex.longitude(), 1.5e-5);
        assertEquals(Frame.BACKGROUND.apex().latitude(), apex.latitude(), 1.5e-5);
    }
}
