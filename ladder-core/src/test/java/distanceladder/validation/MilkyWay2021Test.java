package distanceladder.validation;

import static distanceladder.relation.Amount.magnitudes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Milky Way Cepheids with parallaxes: Riess et al. 2021 (ApJ 908, L6), Table 1.
 *
 * <p>Zero point and parallax offset are fitted together, slope -3.26 and metallicity coefficient -0.17 given. Of the 74
 * stars, those flagged f (seven, without an EDR3 parallax in the table) and g (two, S Vul and SV Vul, left out of the
 * fit) go: 65 stay. Magnitude errors are those of the table with 0.06 mag in quadrature, the width of the instability
 * strip.
 *
 * <p>The offset is observed minus true. It comes out <em>positive</em>, +18 microarcseconds, because the tabulated
 * parallaxes are corrected already, by more than they should be: it is what is added to the photometric parallax.
 * (Raw catalogues measure too small.) Two check values, both recomputed from the table:
 *
 * <ul>
 *   <li>a fit in parallax space without moduli, chi-square with the photometric error carried over to the parallax
 *       (SciPy 1.10): -5.9307 +- 0.0244 mag, +18.16 +- 5.84, chi-square 64.8. It is another estimator of the same
 *       numbers, so it agrees to a small part of sigma.
 *   <li>all 65 moduli with zero point and offset in one least-squares fit, iterated (NumPy 1.24): what the rungs say.
 * </ul>
 */
@Tag("validation")
class MilkyWay2021Test {
    /** Star, flag, log10 P, Wesenheit magnitude m_H, error, [Fe/H], EDR3 parallax (mas), error. */
    private static final PublishedTable TABLE = PublishedTable.of("""
            AA-GEM           -   1.053   6.860   0.023  -0.080   0.311   0.019
            AD-PUP           -   1.133   7.011   0.024  -0.060   0.254   0.018
            AQ-CAR           -   0.990   6.373   0.011   0.013   0.361   0.017
            AQ-PUP           -   1.479   4.859   0.016   0.060   0.294   0.025
            BK-AUR           -   0.903   6.539   0.029   0.070   0.426   0.016
            BN-PUP           -   1.136   6.642   0.021   0.030   0.301   0.016
            CD-CYG           -   1.232   5.307   0.014   0.120   0.394   0.018
            CP-CEP           -   1.252   6.095   0.030   0.050   0.279   0.022
            CR-CAR           -   0.989   7.736   0.017  -0.080   0.194   0.016
            CY-AUR           f   1.141   7.334   0.027  -0.150       -       -
            DD-CAS           -   0.992   6.566   0.013   0.160   0.346   0.014
            DL-CAS           f   0.903   5.689   0.021   0.050       -       -
            DR-VEL           -   1.049   5.479   0.026   0.024   0.520   0.015
            GQ-ORI           -   0.935   6.146   0.034   0.250   0.408   0.023
            HW-CAR           -   0.964   6.350   0.009   0.060   0.397   0.013
            KK-CEN           -   1.086   7.660   0.018   0.210   0.152   0.017
            KN-CEN           -   1.532   5.076   0.013   0.550   0.251   0.020
            RW-CAM           f   1.215   4.794   0.022   0.080       -       -
            RW-CAS           -   1.170   5.944   0.024   0.280   0.334   0.021
            RY-CAS           -   1.084   6.085   0.020   0.320   0.359   0.016
            RY-SCO           -   1.308   3.685   0.012   0.010   0.764   0.035
            RY-VEL           -   1.449   4.576   0.023   0.090   0.376   0.023
            S-NOR            -   0.989   3.990   0.014   0.100   1.099   0.024
            S-VUL            g   1.839   4.043   0.011   0.090   0.237   0.022
            SS-CMA           -   1.092   6.289   0.012   0.012   0.308   0.014
            SV-PER           f   1.046   5.916   0.028   0.030       -       -
            SV-VEL           -   1.149   5.517   0.015   0.090   0.434   0.019
            SV-VUL           g   1.653   3.639   0.035   0.110   0.402   0.023
            SY-NOR           f   1.102   5.523   0.022   0.230       -       -
            SZ-CYG           -   1.179   5.329   0.012   0.150   0.445   0.014
            T-MON            -   1.432   3.298   0.024   0.040   0.745   0.057
            U-CAR            -   1.589   3.272   0.026   0.250   0.561   0.025
            UU-MUS           -   1.066   6.584   0.017   0.190   0.306   0.013
            V-339-CEN        -   0.976   5.448   0.026  -0.080   0.568   0.023
            V-340-ARA        -   1.318   6.115   0.016  -0.080   0.239   0.022
            VW-CEN           -   1.177   6.558   0.018   0.410   0.260   0.017
            VX-PER           -   1.037   5.914   0.010   0.030   0.392   0.019
            VY-CAR           -   1.276   4.513   0.007   0.080   0.565   0.018
            VZ-PUP           -   1.365   6.390   0.023  -0.010   0.220   0.016
            WX-PUP           -   0.951   6.368   0.016  -0.010   0.387   0.017
            WZ-SGR           -   1.339   4.242   0.011   0.280   0.612   0.031
            X-CYG            -   1.214   3.629   0.039   0.160   0.910   0.022
            X-PUP            -   1.414   5.069   0.012   0.020   0.397   0.022
            XX-CAR           -   1.196   6.337   0.025   0.010   0.305   0.016
            XY-CAR           -   1.095   5.904   0.008   0.012   0.390   0.015
            XZ-CAR           -   1.221   5.215   0.010   0.026   0.473   0.020
            YZ-CAR           -   1.259   5.471   0.015  -0.030   0.358   0.020
            YZ-SGR           -   0.980   4.653   0.022   0.120   0.860   0.027
            Z-LAC            -   1.037   5.417   0.021   0.070   0.510   0.023
            AG-CRU           -   0.584   6.068   0.028   0.020   0.758   0.022
            AP-PUP           -   0.706   5.177   0.028  -0.020   0.924   0.022
            AP-SGR           -   0.704   4.729   0.030   0.160   1.217   0.026
            BF-OPH           -   0.609   4.972   0.028   0.110   1.189   0.026
            BG-VEL           -   0.840   4.529   0.020   0.040   1.045   0.019
            ER-CAR           -   0.888   4.742   0.028   0.120   0.869   0.016
            R-CRU            -   0.765   4.649   0.028   0.100   1.078   0.031
            R-MUS            -   0.876   4.268   0.020  -0.110   1.076   0.019
            R-TRA            -   0.530   4.714   0.020   0.160   1.560   0.018
            RV-SCO           -   0.783   4.323   0.020   0.080   1.257   0.023
            RX-CAM           f   0.898   4.216   0.029   0.080       -       -
            RY-CMA           -   0.670   5.656   0.028   0.140   0.825   0.032
            S-CRU            h   0.671   4.516   0.033   0.080   1.342   0.026
            S-TRA            -   0.801   4.429   0.028   0.010   1.120   0.024
            SS-SCT           -   0.565   5.600   0.019   0.110   0.934   0.025
            T-VEL            -   0.667   5.419   0.020  -0.160   0.940   0.018
            TX-CYG           -   1.168   3.862   0.029   0.260   0.829   0.020
            U-AQL            f   0.847   3.636   0.030   0.140       -       -
            U-SGR            -   0.829   3.615   0.028   0.140   1.605   0.025
            V-CAR            -   0.826   5.096   0.020   0.080   0.797   0.015
            V-VEL            -   0.641   5.366   0.028       0   0.953   0.019
            V0386-CYG        -   0.721   5.192   0.028   0.170   0.894   0.014
            V0482-SCO        -   0.656   5.242   0.028   0.019   0.993   0.028
            V0636-SCO        -   0.832   4.154   0.021   0.070   1.180   0.037
            W-GEM            -   0.898   4.454   0.036  -0.010   1.006   0.031
            """);

    private static final double SLOPE = -3.26;
    private static final double METALLICITY = -0.17;
    private static final double STRIP_WIDTH = 0.06;

    private final Observations stars = unflagged();
    private final Parallaxes parallaxes =
            Parallaxes.of("parallaxes", stars).withOffset(Source.free("parallax offset", Unit.MICROARCSECOND));
    private final PeriodLuminosity pulsators = PeriodLuminosity.of("Cepheids", stars)
            .withSlope(Source.exact("slope", Amount.of(SLOPE, Unit.MAGNITUDE_PER_DEX)))
            .withMetallicity(Source.exact("metallicity coefficient", Amount.of(METALLICITY, Unit.MAGNITUDE_PER_DEX)))
            .withScatter(magnitudes(STRIP_WIDTH))
            .calibratedBy(parallaxes);
    private final Solution solution = Ladder.of(pulsators).solve();

    static Observations unflagged() {
        List<Integer> kept = new ArrayList<>();
        for (int i = 0; i < TABLE.size(); i++) {
            if (!List.of("f", "g").contains(TABLE.names(1).get(i))) {
                kept.add(i);
            }
        }
        int[] rows = kept.stream().mapToInt(i -> i).toArray();
        return Observations.of(
                        "Riess 2021",
                        Arrays.stream(rows).mapToObj(TABLE.names(0)::get).toList())
                .with("log period", Unit.LOG_DAY, numbers(2, rows))
                .with("magnitude", Unit.MAGNITUDE, numbers(3, rows))
                .with("magnitude error", Unit.MAGNITUDE, numbers(4, rows))
                .with("metallicity", Unit.DEX, numbers(5, rows))
                .with("parallax", Unit.MILLIARCSECOND, numbers(6, rows))
                .with("parallax error", Unit.MILLIARCSECOND, numbers(7, rows));
    }

    private static double[] numbers(int column, int[] rows) {
        List<String> cells = TABLE.names(column);
        return Arrays.stream(rows)
                .mapToDouble(i -> Double.parseDouble(cells.get(i)))
                .toArray();
    }

    @Test
    void sixtyFiveStarsAreUnflagged() {
        assertEquals(74, TABLE.size());
        assertEquals(65, stars.size());
    }

    @Test
    void zeroPointAndOffsetAreThoseOfTheFitInParallaxSpace() {
        Estimate zeroPoint = solution.of(pulsators.zeroPoint());
        Estimate offset = solution.of(parallaxes.offset());
        assertEquals(-5.931, zeroPoint.value(), 0.003);
        assertEquals(0.024, zeroPoint.sigma(), 0.0005);
        assertEquals(18.2, offset.value(), 0.3, "observed minus true, microarcseconds");
        assertEquals(5.8, offset.sigma(), 0.1);
        assertEquals(64.82, solution.chiSquare().total().value(), 0.1);
        assertEquals(63, solution.chiSquare().total().degreesOfFreedom());
        assertTrue(offset.value() > 0, "the tabulated parallaxes are too large");
    }

    @Test
    void everythingIsThatOfOneLeastSquaresFitOfAllModuli() {
        Estimate zeroPoint = solution.of(pulsators.zeroPoint());
        Estimate offset = solution.of(parallaxes.offset());
        assertEquals(-5.932085751544, zeroPoint.value(), 1e-9);
        assertEquals(0.024450993035, zeroPoint.sigma(), 1e-9);
        assertEquals(18.261048341, offset.value(), 1e-6);
        assertEquals(5.847388036, offset.sigma(), 1e-6);
        assertEquals(-0.854053482, solution.correlation(pulsators.zeroPoint(), parallaxes.offset()), 1e-8);
        assertEquals(64.755913225, solution.chiSquare().total().value(), 1e-7);
        star("T-MON", 10.651387722, 0.064582733);
        star("KK-CEN", 13.938059480, 0.066379520);
        star("S-CRU", 9.390473390, 0.038538890);
    }

    private void star(String name, double modulus, double sigma) {
        Estimate star = solution.of(pulsators.distance(name));
        assertEquals(modulus, star.value(), 1e-8, name);
        assertEquals(sigma, star.sigma(), 1e-8, "sigma of " + name);
    }

    /** The direction of the offset, once more without the engine: mean of observed less photometric parallax. */
    @Test
    void observedParallaxesAreLargerThanPhotometricOnesByTheOffset() {
        double sum = 0;
        double weights = 0;
        double[] observed = stars.column("parallax");
        double[] errors = stars.column("parallax error");
        for (int i = 0; i < stars.size(); i++) {
            double modulus = stars.column("magnitude")[i]
                    - solution.of(pulsators.zeroPoint()).value()
                    - SLOPE * (stars.column("log period")[i] - 1)
                    - METALLICITY * stars.column("metallicity")[i];
            double photometric = StrictMath.exp((10 - modulus) / 5 * StrictMath.log(10));
            double error = photometric * StrictMath.log(10) / 5 * STRIP_WIDTH;
            double weight = 1 / (errors[i] * errors[i] + error * error);
            sum += weight * (observed[i] - photometric);
            weights += weight;
        }
        assertEquals(solution.of(parallaxes.offset()).value(), 1000 * sum / weights, 0.3);
    }
}
