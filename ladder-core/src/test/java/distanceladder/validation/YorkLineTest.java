package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.astro.Unit;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Equated;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Own;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * A straight line with errors in both axes: Pearson's data of 1901 with York's weights of 1966, solved by York et al. 2004
 * (Am. J. Phys. 72, 367, Table II), as a user-defined rung with an uncertain column.
 */
@Tag("validation")
class YorkLineTest {
    private static final double[] X = {0.0, 0.9, 1.8, 2.6, 3.3, 4.4, 5.2, 6.1, 6.5, 7.4};
    private static final double[] Y = {5.9, 5.4, 4.4, 4.6, 3.5, 3.7, 2.8, 2.8, 2.4, 1.5};
    private static final double[] WX = {1000, 1000, 500, 800, 200, 80, 60, 20, 1.8, 1};
    private static final double[] WY = {1, 1.8, 4, 8, 20, 20, 70, 70, 100, 500};

    private static double[] sigmas(double[] weights) {
        double[] out = new double[weights.length];
        for (int i = 0; i < out.length; i++) {
            out[i] = 1 / Math.sqrt(weights[i]);
        }
        return out;
    }

    private static Own line(double correlation) {
        double[] sx = sigmas(WX);
        double[] sy = sigmas(WY);
        double[] cov = new double[X.length];
        for (int i = 0; i < cov.length; i++) {
            cov[i] = correlation * sx[i] * sy[i];
        }
        Observations data = Observations.of("Pearson", "1", "2", "3", "4", "5", "6", "7", "8", "9", "10")
                .bearingOn(java.util.Collections.nCopies(10, ""))
                .with("y", Unit.NONE, Y)
                .with("y error", Unit.NONE, sy)
                .with("x", Unit.NONE, X)
                .with("x error", Unit.NONE, sx)
                .with("covariance", Unit.NONE, cov);
        Equated relation = Equated.of(
                        (mu, s) -> s.parameter("a").add(s.parameter("b").multiply(s.uncertain("x"))))
                .withUncertain("x");
        if (correlation != 0) {
            relation = relation.withErrorCovariance("x", "y", "covariance");
        }
        return Own.of("line", data, "y", relation)
                .withParameter("a", Source.free("a", Unit.NONE))
                .withParameter("b", Source.free("b", Unit.NONE));
    }

    private static void check(double correlation, double[] expected) {
        Own line = line(correlation);
        Solution solution = Ladder.of(line).solve();
        Estimate a = solution.of(line.parameter("a"));
        Estimate b = solution.of(line.parameter("b"));
        assertEquals(expected[0], a.value(), 1e-10);
        assertEquals(expected[1], b.value(), 1e-10);
        assertEquals(expected[2], a.sigma(), 1e-9);
        assertEquals(expected[3], b.sigma(), 1e-9);
        assertEquals(expected[4], solution.covariance(line.parameter("a"), line.parameter("b")), 1e-10);
        assertEquals(expected[5], solution.chiSquare().total().value(), 1e-8);
        assertEquals(8, solution.chiSquare().total().degreesOfFreedom());
    }

    /** Published: a 5.47991022403286, b -0.48053340744620, sigmas 0.294970735 and 0.0579850090, S/(n - 2) 1.483294149. */
    @Test
    void publishedDigits() {
        check(0, new double[] {
            5.47991022403286, -0.48053340744620, 0.294970735, 0.0579850090, -0.016472544658115824, 8 * 1.483294149257669
        });
    }

    /** The same data with correlated errors, by York's equations in NumPy 1.24.2. */
    @Test
    void correlatedErrors() {
        check(-0.5, new double[] {
            5.358788126868161,
            -0.4540064801406045,
            0.2680813696189084,
            0.050874252583393,
            -0.013257142862289305,
            16.53395162541006
        });
        check(0.5, new double[] {
            5.534374564442235,
            -0.49288061680644635,
            0.313418026619818,
            0.06297398021621106,
            -0.01887758065341796,
            9.570265132189812
        });
    }
}
