package distanceladder.rung;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.chance.Draws;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * A colour with a spread of 0.07 mag measured to 0.045 mag: 20 calibrators, 300 galaxies of the flow, a slope of 3.
 */
class UncertainCovariateTest {
    private static final double SLOPE = 3;
    private static final double ERROR = 0.045;
    private static final double SPREAD = 0.07;
    private static final double SCATTER = 0.1;
    private static final int CALIBRATORS = 20;
    private static final int TARGETS = 300;
    private static final int SIMULATIONS = 40;
    private static final double BLUER = -0.03;

    private record Made(Observations table, Observations hosts, Observations flow) {}

    private static Made simulate(long seed) {
        Draws draws = Draws.of(seed, "colours");
        List<String> names = new ArrayList<>();
        double[] m = new double[CALIBRATORS + TARGETS];
        double[] colour = new double[m.length];
        double[] error = new double[m.length];
        double[] colourError = new double[m.length];
        double[] host = new double[CALIBRATORS];
        double[] v = new double[TARGETS];
        List<String> hosts = new ArrayList<>();
        List<String> targets = new ArrayList<>();
        for (int i = 0; i < m.length; i++) {
            boolean calibrator = i < CALIBRATORS;
            String name = (calibrator ? "host " : "target ") + i;
            names.add(name);
            double mu = calibrator ? 31 + 0.05 * i : 36 + 0.004 * i;
            double truth = SPREAD * draws.normal(i, 0) + (calibrator ? BLUER : 0);
            colour[i] = truth + ERROR * draws.normal(i, 1);
            colourError[i] = ERROR;
            error[i] = SCATTER;
            m[i] = mu - 19 + SLOPE * truth + SCATTER * draws.normal(i, 2);
            if (calibrator) {
                host[i] = mu + 0.03 * draws.normal(i, 3);
                hosts.add(name);
            } else {
                v[i - CALIBRATORS] = mu + 9.25 + 0.02 * draws.normal(i, 3);
                targets.add(name);
            }
        }
        Observations table = Observations.of("table", names)
                .with("magnitude", Unit.MAGNITUDE, m)
                .with("magnitude error", Unit.MAGNITUDE, error)
                .with("colour", Unit.MAGNITUDE, colour)
                .with("colour error", Unit.MAGNITUDE, colourError);
        return new Made(table, moduli("hosts", hosts, host, 0.03), moduli("flow", targets, v, 0.02));
    }

    private static Observations moduli(String label, List<String> names, double[] values, double sigma) {
        double[] errors = new double[values.length];
        java.util.Arrays.fill(errors, sigma);
        return Observations.of(label, names).with("y", Unit.MAGNITUDE, values).with("y error", Unit.MAGNITUDE, errors);
    }

    private static Solution solve(Made made, boolean uncertain) {
        Own hosts = Own.of("hosts", made.hosts, "y", (mu, s) -> mu.add(0));
        SecondaryIndicator plain = SecondaryIndicator.of("explosions", made.table);
        SecondaryIndicator candles;
        if (uncertain) {
            candles = plain.withUncertainCovariate("colour");
        } else {
            double inflated = Math.hypot(SCATTER, SLOPE * ERROR);
            double[] sigmas = new double[made.table.size()];
            java.util.Arrays.fill(sigmas, inflated);
            candles = plain.withCovariate("colour").withNoise(Noise.of(sigmas));
        }
        Own flow = Own.of("flow", made.flow, "y", (mu, s) -> mu.add(s.parameter("eta")))
                .withParameter("eta", Source.free("eta", Unit.MAGNITUDE));
        return Ladder.of(flow.calibratedBy(candles.calibratedBy(hosts))).solve();
    }

    private static double value(Solution s, String name) {
        return s.of(Source.free(name, Unit.MAGNITUDE)).value();
    }

    @Test
    void jointEstimateFindsTheSlopeAndInflationDoesNot() {
        double joint = 0;
        double jointEta = 0;
        double inflated = 0;
        double inflatedEta = 0;
        double sigma = 0;
        for (int k = 0; k < SIMULATIONS; k++) {
            Made made = simulate(k);
            Solution right = solve(made, true);
            Solution wrong = solve(made, false);
            joint += value(right, "explosions colour coefficient") / SIMULATIONS;
            jointEta += value(right, "eta") / SIMULATIONS;
            inflated += value(wrong, "explosions colour coefficient") / SIMULATIONS;
            inflatedEta += value(wrong, "eta") / SIMULATIONS;
            sigma = right.of(Source.free("explosions colour coefficient", Unit.MAGNITUDE))
                    .sigma();
        }
        // Slope: sigma of one simulation about 0.17, so of the mean 0.027; false alarm at 4 of these below 1e-4.
        assertEquals(SLOPE, joint, 4 * sigma / Math.sqrt(SIMULATIONS), "slope, sigma " + sigma);
        double attenuated = SLOPE * SPREAD * SPREAD / (SPREAD * SPREAD + ERROR * ERROR);
        assertEquals(attenuated, inflated, 0.05, "the inflated fit is attenuated to " + attenuated);
        assertEquals(2.12, inflated, 0.06);
        // The calibrators are bluer by 0.03 mag, as hosts mostly are: the wrong slope then moves H0.
        double moved = StrictMath.pow(10, (inflatedEta - jointEta) / 5) - 1;
        assertEquals(0.011, Math.abs(moved), 0.004, "H0 moves by " + moved);
        assertTrue(Math.abs(jointEta - 9.25) < 0.02, "eta " + jointEta);
    }

    /** A covariance of colour and magnitude errors, against York et al. 2004 with correlated errors by hand. */
    @Test
    void errorCovarianceEntersTheRow() {
        double[] cov = new double[CALIBRATORS + TARGETS];
        java.util.Arrays.fill(cov, 0.5 * SCATTER * ERROR);
        Made made = simulate(3);
        Observations table = made.table.with("covariance", Unit.NONE, cov);
        SecondaryIndicator candles = SecondaryIndicator.of("explosions", table)
                .withUncertainCovariate("colour", Source.exact("slope", Amount.magnitudes(SLOPE)))
                .withErrorCovariance("colour", "magnitude", "covariance");
        Own hosts = Own.of("hosts", made.hosts, "y", (mu, s) -> mu.add(0));
        Solution solution = Ladder.of(candles.calibratedBy(hosts)).solve();
        double variance = SCATTER * SCATTER + SLOPE * SLOPE * ERROR * ERROR - 2 * SLOPE * cov[0];
        double one = Math.sqrt(variance + 0.03 * 0.03) / Math.sqrt(CALIBRATORS);
        assertEquals(one, solution.of(candles.zeroPoint()).sigma(), 1e-10);
    }
}
