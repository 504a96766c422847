package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.astro.Frame;
import distanceladder.astro.Sky;
import distanceladder.astro.StarDistance;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Directions, frames and single stars against astropy 5.2 and quadrature by SciPy 1.10. */
@Tag("validation")
class SkyAndStarsTest {
    /** ICRS position; galactic l, b; Sun's velocity towards it in four frames (km/s): computed with astropy 5.2. */
    @ParameterizedTest
    @CsvSource({
        "187.70593, 12.39112, 283.77775595017755, 74.49115120228151, 327.83958712929916, -104.04211415667855,"
                + " -117.89184461036758, -53.04766824177288",
        "184.7396, 47.304, 138.32026651838493, 68.84201892877867, 205.45440295519109, 59.44614346631208,"
                + " 57.19704766978993, 59.71350742245137",
        "53.4016, -36.1404, 237.95610252655052, -54.5980499379938, -96.76230557810865, -131.54225553947882,"
                + " -90.08501638067374, -122.29284144547036",
        "210.8024, 54.3488, 102.03707473544311, 59.771380109971794, 120.50863535121849, 137.68746343325478,"
                + " 121.26975688333664, 119.2642931880578",
        "54.6212, -35.4507, 236.716334399502, -53.63562392625251, -92.4540673551983, -132.91375781837527,"
                + " -90.39051348197528, -123.45568591863348"
    })
    void galacticCoordinatesAndSolarMotion(
            double ra, double dec, double l, double b, double cmb, double group, double group77, double galactic) {
        Sky.Galactic g = Sky.galactic(ra, dec);
        // astropy goes through FK4 and its own rounding of the pole: alike to 1e-5 degrees.
        assertEquals(l, g.longitude(), 3e-5);
        assertEquals(b, g.latitude(), 3e-5);
        assertEquals(cmb, Frame.BACKGROUND.solarMotion(ra, dec), 3e-4);
        assertEquals(group, Frame.LOCAL_GROUP.solarMotion(ra, dec), 3e-4);
        assertEquals(group77, Frame.LOCAL_GROUP_1977.solarMotion(ra, dec), 3e-4);
        assertEquals(galactic, Frame.GALACTIC.solarMotion(ra, dec), 3e-4);
    }

    /** Redshifts compose by product: Coma, z_hel 0.0233 at (194.95, 27.98); the sum would be 2.2e-5 off. */
    @org.junit.jupiter.api.Test
    void redshiftsComposeByProduct() {
        assertEquals(0.024215091993301963, Frame.BACKGROUND.redshift(0.0233, 194.95, 27.98), 1e-9);
    }

    /** Parallax, its error (mas), scale (kpc); mode, median, 5 % and 95 % quantile (kpc) by quadrature, SciPy 1.10. */
    @ParameterizedTest
    @CsvSource({
        "1.0, 0.1, 1.35, 1.0128201250849052, 1.0347556050618127, 0.8826433913546583, 1.2507762033006375",
        "1.0, 0.3, 1.35, 1.1342989597227489, 1.581366723017427, 0.8463391428213897, 4.502281844481169",
        "1.0, 1.0, 1.35, 2.370754158358281, 3.376535281451961, 1.0695105895016652, 8.198431918172691",
        "0.5, 0.1, 1.35, 2.0406764571040563, 2.227701759000632, 1.6231883129993447, 3.494835904158061",
        "2.0, 0.02, 1.35, 0.5000815050285594, 0.5001816165104787, 0.49208330159372815, 0.5085509681147761",
        "0.3, 0.3, 1.35, 2.9188948935457812, 3.856264163189674, 1.7593405956710022, 8.42525945323509",
        "-0.2, 0.3, 1.35, 4.2412298423061365, 5.100688956645086, 2.519852490601603, 9.982619507699727",
        "-1.0, 1.0, 1.35, 3.244361764367188, 4.147127261891697, 1.6323835093272796, 9.033535134700521",
        "0.01, 0.25, 0.5, 2.3794092402758236, 2.6618604463175632, 1.637456449728144, 4.467002307224786",
        "0.2, 0.02, 1.35, 4.9203630677131205, 5.012010369496971, 4.3113134285261605, 5.975358306904932"
    })
    void starUnderAnExponentiallyDecreasingDensity(
            double parallax, double sigma, double length, double mode, double median, double low, double high) {
        StarDistance star = StarDistance.of(parallax, sigma, length);
        assertEquals(mode, star.mode(), 1e-9 * mode);
        assertEquals(median, star.quantile(0.5), 2e-6 * median);
        assertEquals(low, star.quantile(0.05), 2e-6 * low);
        assertEquals(high, star.quantile(0.95), 2e-6 * high);
    }
}
