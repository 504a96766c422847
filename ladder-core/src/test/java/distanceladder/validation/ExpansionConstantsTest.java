package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Distances;
import distanceladder.astro.Unit;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.VelocityDistance;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Constants, conversions, and the expansion of the luminosity distance, against values of astropy 5.2 and NumPy. */
@Tag("validation")
class ExpansionConstantsTest {
    private static final double Q0 = -0.55;
    private static final double J0 = 1;
    private static final double HUBBLE = 70;

    private static void assertRelative(double expected, double actual, double relative, String what) {
        assertEquals(expected, actual, relative * Math.abs(expected), what);
    }

    /** IAU 2012 Resolution B2 (au), IAU 2015 Resolution B2 (pc), SI (c); Julian year of 365.25 days of 86400 s. */
    @Test
    void constants() {
        double au = 149597870.700;
        assertRelative(3.085677581491367e19, Cosmography.MPC_KM, 1e-15, "Mpc in km");
        assertRelative(648000 / Math.PI * au * 1e6, Cosmography.MPC_KM, 1e-15, "Mpc by its definition");
        assertEquals(299792.458, Cosmography.LIGHT_KM_PER_S);
        assertEquals(31557600e9, Cosmography.GYR_S);
    }

    /** 1/H0, astropy 5.2. */
    @Test
    void hubbleTimes() {
        assertRelative(14.507302992296573, Cosmography.hubbleTime(67.4), 1e-14, "67.4");
        assertRelative(13.968460309725558, Cosmography.hubbleTime(70), 1e-14, "70");
        assertRelative(13.387078610087473, Cosmography.hubbleTime(73.04), 1e-14, "73.04");
    }

    /** f(z; -0.55, 1) = 1 + 0.775 z - 0.27375 z^2 (Visser 2004, equation 45): exact decimals. */
    @Test
    void expansionFactor() {
        double[][] table = {
            {0.01, 1.007722625, 3.480161712211045},
            {0.0233, 1.0179088838625001, 3.851885528667116},
            {0.05, 1.038065625, 4.192015517110175},
            {0.1, 1.0747625, 4.508133207798112},
            {0.15, 1.110090625, 4.6982703969241735}
        };
        for (double[] row : table) {
            double f = Cosmography.f(row[0], Q0, J0);
            assertRelative(row[1], f, 1e-15, "f at " + row[0]);
            double logarithm = StrictMath.log10(Cosmography.LIGHT_KM_PER_S * row[0] * f);
            assertRelative(row[2], logarithm, 1e-15, "log10 c z f at " + row[0]);
        }
        assertEquals(1, Cosmography.f(0, Q0, J0));
    }

    /** z, first and third order, exact; Mpc for H0 = 70, flat, matter 0.3 (q0 = -0.55, j0 = 1), without radiation. */
    private static final double[][] LUMINOSITY_DISTANCES = {
        {0.01, 42.827494, 43.15823467585175, 43.15823507193043},
        {0.02, 85.654988, 86.97326109281401, 86.9732678219642},
        {0.0233, 99.78806102, 101.57515381567126, 101.57516644809569},
        {0.03, 128.482482, 131.43804483499724, 131.4380808690901},
        {0.05, 214.13747, 222.28874663146877, 222.28905465961708},
        {0.07, 299.792458, 315.6540647381502, 315.6553612671144},
        {0.1, 428.27494, 460.29384520175006, 460.2999363904754},
        {0.15, 642.41241, 713.1359937246563, 713.1724388414237}
    };

    @Test
    void luminosityDistanceToThirdOrder() {
        for (double[] row : LUMINOSITY_DISTANCES) {
            double z = row[0];
            assertRelative(row[1], Cosmography.LIGHT_KM_PER_S * z / HUBBLE, 1e-14, "first order at " + z);
            assertRelative(row[2], Cosmography.luminosityDistance(z, HUBBLE, Q0, J0), 1e-14, "third order at " + z);
        }
    }

    /** What the documentation says of the error: below 2e-5 mag at z = 0.07 and 1.2e-4 mag at z = 0.15. */
    @Test
    void errorOfTheExpansion() {
        for (double[] row : LUMINOSITY_DISTANCES) {
            double error = Distances.modulusFromMegaparsec(Cosmography.luminosityDistance(row[0], HUBBLE, Q0, J0))
                    - Distances.modulusFromMegaparsec(row[3]);
            assertTrue(error < 0, "the expansion falls short at " + row[0]);
            assertTrue(-error < (row[0] <= 0.07 ? 2e-5 : 1.2e-4), error + " mag at " + row[0]);
        }
        double far =
                Distances.modulusFromMegaparsec(713.1359937246563) - Distances.modulusFromMegaparsec(713.1724388414237);
        assertEquals(-1.109711808924697e-4, far, 1e-12, "at z = 0.15");
    }

    /** The same table through a rung: a galaxy with a redshift and nothing else. */
    @Test
    void velocityDistanceRungGivesTheThirdOrder() {
        String[] names = new String[LUMINOSITY_DISTANCES.length];
        double[] z = new double[names.length];
        double[] errors = new double[names.length];
        for (int i = 0; i < names.length; i++) {
            names[i] = "galaxy " + i;
            z[i] = LUMINOSITY_DISTANCES[i][0];
            errors[i] = 1e-3;
        }
        VelocityDistance flow = VelocityDistance.of(
                        "flow",
                        Observations.of("flat, matter 0.3", names)
                                .with("redshift", Unit.REDSHIFT, z)
                                .with("redshift error", Unit.REDSHIFT, errors))
                .withExpansion(Q0, J0)
                .withLogHubbleConstant(Source.exact("5 log H0", Amount.magnitudes(5 * StrictMath.log10(HUBBLE))));
        for (VelocityDistance form : new VelocityDistance[] {flow, flow.inMagnitudes()}) {
            Solution solution = Ladder.of(form).solve();
            for (int i = 0; i < names.length; i++) {
                double distance =
                        solution.of(form.distance(names[i]).inMegaparsecs()).value();
                assertRelative(LUMINOSITY_DISTANCES[i][2], distance, 1e-12, names[i]);
            }
        }
    }

    /** Parallax (mas), modulus, distance (kpc), error of parallax, error of modulus to first order: NumPy 1.24. */
    @Test
    void parallaxDistanceAndModulus() {
        double[][] table = {
            {1.0, 10.0, 1.0, 0.1, 0.21714724095162594},
            {0.0203, 18.462519810433935, 49.26108374384237, 0.0005, 0.05348454210631181},
            {3.66, 7.182594573027947, 0.27322404371584696, 0.15, 0.0889947708818139},
            {0.759, 10.598791120522598, 1.3175230566534915, 0.02, 0.05721929932849167},
            {0.5, 11.505149978319906, 2.0, 0.05, 0.21714724095162594},
            {0.02016535591853196, 18.47697054145555, 49.59, 0.00022181891510385156, 0.02388619650467885}
        };
        for (double[] row : table) {
            String where = "parallax " + row[0] + " mas";
            assertRelative(row[1], Distances.modulusFromParallax(row[0]), 1e-14, where);
            assertRelative(
                    row[1],
                    Distances.modulusFromMegaparsec(Unit.KILOPARSEC.convert(row[2], Unit.MEGAPARSEC)),
                    1e-14,
                    where);
            assertRelative(row[0], Distances.parallaxFromModulus(row[1]), 1e-13, where);
            assertRelative(row[2] / 1000, Distances.megaparsecFromModulus(row[1]), 1e-13, where);
            assertRelative(row[4], Distances.modulusError(row[3] / row[0]), 1e-14, where);
        }
    }

    /**
     * Moduli of the geometric anchors: LMC 49.59 +- 0.09 +- 0.54 kpc (Pietrzynski et al. 2019), NGC 4258 7.576 +- 0.082
     * +- 0.076 Mpc (Reid, Pesce and Riess 2019), SMC 62.44 +- 0.47 +- 0.81 kpc (Graczyk et al. 2020); NumPy 1.24.
     */
    @Test
    void geometricAnchors() {
        assertRelative(18.47697054145555, Distances.modulusFromMegaparsec(0.04959), 1e-14, "LMC");
        assertRelative(0.00394096626046508, Distances.modulusError(0.09 / 49.59), 1e-13, "LMC, statistical");
        assertRelative(0.02364579756279048, Distances.modulusError(0.54 / 49.59), 1e-13, "LMC, systematic");
        assertRelative(29.39719982997608, Distances.modulusFromMegaparsec(7.576), 1e-14, "NGC 4258");
        double both = Math.sqrt(0.082 * 0.082 + 0.076 * 0.076);
        assertRelative(0.03204567000358775, Distances.modulusError(both / 7.576), 1e-13, "NGC 4258, both");
        assertRelative(18.9773144719519, Distances.modulusFromMegaparsec(0.06244), 1e-14, "SMC");
        assertRelative(0.01634516387688408, Distances.modulusError(0.47 / 62.44), 1e-13, "SMC, statistical");
        assertRelative(0.02816932497931086, Distances.modulusError(0.81 / 62.44), 1e-13, "SMC, systematic");
    }

    /** Peculiar velocity over c z as an error of the modulus: c z, dispersion (km/s), mag; NumPy 1.24. */
    @Test
    void peculiarVelocityAsAnErrorOfTheModulus() {
        double[][] table = {
            {3000, 250, 0.18095603412635494},
            {6985, 250, 0.07771912704066783},
            {1000, 300, 0.6514417228548778},
            {10000, 250, 0.05428681023790648},
            {7000, 300, 0.09306310326498253}
        };
        for (double[] row : table) {
            assertRelative(row[2], Distances.modulusError(row[1] / row[0]), 1e-13, row[0] + " km/s");
        }
    }
}
