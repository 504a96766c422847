package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.astro.Unit;
import distanceladder.covariance.Dense;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Derived;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.relation.Tabulated;
import distanceladder.relation.Value;
import distanceladder.rung.Given;
import distanceladder.rung.Own;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Worked examples of the Guide to the Expression of Uncertainty in Measurement (JCGM 100:2008, Annex H). */
@Tag("validation")
class GumTest {
    private static final double[] V = {5.007, 4.994, 5.005, 4.99, 4.999};
    private static final double[] I = {19.663e-3, 19.639e-3, 19.64e-3, 19.685e-3, 19.678e-3};
    private static final double[] PHI = {1.0456, 1.0438, 1.0468, 1.0428, 1.0433};

    private static double mean(double[] x) {
        return java.util.Arrays.stream(x).sum() / x.length;
    }

    private static double covarianceOfMeans(double[] x, double[] y) {
        double sum = 0;
        for (int i = 0; i < x.length; i++) {
            sum += (x[i] - mean(x)) * (y[i] - mean(y));
        }
        return sum / (x.length * (x.length - 1.0));
    }

    /**
     * H.2: resistance, reactance and impedance from five simultaneous readings. The digits beyond the published ones were
     * recomputed from the readings (NumPy 1.24.2); from the rounded inputs that the guide prints they would differ.
     */
    @Test
    void correlatedReadings() {
        double[][] all = {V, I, PHI};
        double[][] c = new double[3][3];
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                c[i][j] = covarianceOfMeans(all[i], all[j]);
            }
        }
        Source v = Source.free("V", Unit.NONE);
        Source i = Source.free("I", Unit.NONE);
        Source phi = Source.free("phi", Unit.NONE);
        Given readings = Given.of(
                "readings",
                Observations.of("H.2", "V", "I", "phi").with("value", Unit.NONE, mean(V), mean(I), mean(PHI)),
                Tabulated.of(3).parameter("V", 1, 0, 0).parameter("I", 0, 1, 0).parameter("phi", 0, 0, 1),
                Map.of("V", v, "I", i, "phi", phi),
                Noise.of(Dense.fromCovariance(c)));
        List<Value> in = List.of(v, i, phi);
        Derived r = Derived.of(
                "R",
                Unit.NONE,
                in,
                x -> x.get(0).divide(x.get(1)).multiply(x.get(2).cos()));
        Derived x = Derived.of(
                "X",
                Unit.NONE,
                in,
                y -> y.get(0).divide(y.get(1)).multiply(y.get(2).sin()));
        Derived z = Derived.of("Z", Unit.NONE, in, y -> y.get(0).divide(y.get(1)));
        Solution s = Ladder.of(readings).solve();
        check(127.73216992810208, 0.07107140739699512, s.of(r), 127.732, 0.071);
        check(219.84651191263848, 0.2955816773586383, s.of(x), 219.847, 0.295);
        check(254.25970194801894, 0.23633613008237028, s.of(z), 254.260, 0.236);
        assertEquals(-0.5884297844235792, s.correlation(r, x), 1e-9);
        assertEquals(-0.48525922420999895, s.correlation(r, z), 1e-9);
        assertEquals(0.9925116489490171, s.correlation(x, z), 1e-9);
        assertEquals(-0.588, s.correlation(r, x), 6e-4);
        assertEquals(-0.485, s.correlation(r, z), 6e-4);
        assertEquals(0.993, s.correlation(x, z), 6e-4);
    }

    private static void check(double value, double sigma, Estimate e, double published, double publishedSigma) {
        assertEquals(value, e.value(), 1e-9 * value, e.name());
        assertEquals(sigma, e.sigma(), 1e-9 * sigma, e.name());
        assertEquals(published, e.value(), 6e-4);
        assertEquals(publishedSigma, e.sigma(), 6e-4);
    }

    /** H.3: a thermometer's calibration line, its correlation, and the correction predicted at 30 degrees. */
    @Test
    void calibrationLine() {
        double[] t = {21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.010, 26.511};
        double[] b = {-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.160};
        double[] ones = new double[t.length];
        java.util.Arrays.fill(ones, 1);
        Own line = Own.of(
                        "calibration",
                        Observations.of("H.3", "1", "2", "3", "4", "5", "6", "7", "8", "9", "10", "11")
                                .bearingOn(Collections.nCopies(t.length, ""))
                                .with("correction", Unit.NONE, b)
                                .with("correction error", Unit.NONE, ones)
                                .with("t", Unit.NONE, t),
                        "correction",
                        (mu, s) -> s.parameter("y1").add(s.parameter("y2").multiply(s.column("t") - 20)))
                .withParameter("y1", Source.free("y1", Unit.NONE))
                .withParameter("y2", Source.free("y2", Unit.NONE))
                .withEqualUnknownErrors();
        Solution s = Ladder.of(line).solve();
        Value y1 = line.parameter("y1");
        Value y2 = line.parameter("y2");
        assertEquals(-0.17120379013134995, s.of(y1).value(), 1e-12);
        assertEquals(0.002877597835159958, s.of(y1).sigma(), 1e-11);
        assertEquals(0.002182697739887277, s.of(y2).value(), 1e-12);
        assertEquals(0.0006679387732278328, s.of(y2).sigma(), 1e-11);
        assertEquals(-0.9304296030934459, s.correlation(y1, y2), 1e-9);
        assertEquals(0.0034975639635052903, s.scatter(line).value(), 1e-11);
        assertEquals(9, s.of(y1).degreesOfFreedom(), 1e-6);
        Derived at30 = Derived.of(
                "correction at 30",
                Unit.NONE,
                List.of(y1, y2),
                in -> in.get(0).add(in.get(1).multiply(10)));
        assertEquals(-0.1493768127324772, s.of(at30).value(), 1e-12);
        assertEquals(0.004138595752854954, s.of(at30).sigma(), 1e-11);
        // Published: -0.1712(29), 0.00218(67), r -0.930, s 0.0035, -0.1494(41).
        assertEquals(-0.1494, s.of(at30).value(), 6e-5);
        assertEquals(0.0041, s.of(at30).sigma(), 6e-5);
    }
}
