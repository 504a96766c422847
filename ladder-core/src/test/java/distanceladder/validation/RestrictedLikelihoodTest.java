package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.covariance.Dense;
import distanceladder.covariance.Diagonal;
import distanceladder.covariance.LowRankUpdate;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Own;
import distanceladder.text.RankFault;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Intrinsic scatters against the restricted likelihood maximised independently: the score solved by SciPy 1.10.1 (brentq,
 * fsolve) over dense matrices of NumPy 1.24.2; the data are made up.
 */
@Tag("validation")
class RestrictedLikelihoodTest {
    private static final double[] X = {0.3, -0.2, 0.5, 1.1, -0.7, 0.05, 0.9, -1.2, 0.4, 0.75, -0.45, 0.2};
    private static final double[] Y = {10.31, 9.67, 10.64, 11.32, 9.03, 10.41, 10.62, 8.93, 10.05, 11.05, 9.71, 10.02};
    private static final double[] S = {0.1, 0.05, 0.2, 0.15, 0.1, 0.08, 0.12, 0.2, 0.1, 0.05, 0.1, 0.15};

    private static String[] names(String prefix, int n) {
        String[] out = new String[n];
        for (int i = 0; i < n; i++) {
            out[i] = prefix + i;
        }
        return out;
    }

    private static String[] none(int n) {
        String[] out = new String[n];
        java.util.Arrays.fill(out, "");
        return out;
    }

    private static Own line() {
        Observations data = Observations.of("line", names("a", 12))
                .bearingOn(none(12))
                .with("y", Unit.NONE, Y)
                .with("y error", Unit.NONE, S)
                .with("x", Unit.NONE, X);
        return Own.of(
                        "line",
                        data,
                        "y",
                        (mu, s) -> s.parameter("a").add(s.parameter("b").multiply(s.column("x"))))
                .withParameter("a", Source.free("a", Unit.NONE))
                .withParameter("b", Source.free("b", Unit.NONE))
                .withEstimatedScatter();
    }

    @Test
    void oneRungWithUnequalErrors() {
        Own line = line();
        Solution solution = Ladder.of(line).solve();
        Amount scatter = solution.scatter(line);
        assertEquals(0.23919181231597014, scatter.value(), 1e-9);
        assertEquals(0.03148578405501757 / (2 * 0.23919181231597014), scatter.sigma(), 1e-8);
        Estimate a = solution.of(line.parameter("a"));
        Estimate b = solution.of(line.parameter("b"));
        assertEquals(10.00198868, a.value(), 1e-8);
        assertEquals(0.0792428, a.sigma(), 1e-7);
        assertEquals(0.12420394, b.sigma(), 1e-8);
        assertEquals(9.981235913134695, a.degreesOfFreedom(), 1e-6);
        assertEquals(11.618390804325049, b.degreesOfFreedom(), 1e-6);
        double half = (a.interval(0.6827).upper() - a.interval(0.6827).lower()) / 2;
        assertTrue(half > a.sigma() * 1.03, "a Student interval is wider than a normal one");
    }

    /** A dense known part that is common to all data shifts only the intercept's error. */
    @Test
    void denseKnownPart() {
        double[][] common = new double[12][1];
        for (double[] row : common) {
            row[0] = Math.sqrt(0.02);
        }
        Own line = line();
        for (var covariance : new distanceladder.covariance.Covariance[] {
            LowRankUpdate.of(Diagonal.fromStandardDeviations(S), common),
            Dense.fromCovariance(
                    LowRankUpdate.of(Diagonal.fromStandardDeviations(S), common).toArray())
        }) {
            Own dense = line.withNoise(Noise.of(covariance).withEstimatedScatter());
            Solution solution = Ladder.of(dense).solve();
            assertEquals(0.2391918123159706, solution.scatter(dense).value(), 1e-9);
            assertEquals(0.16210929, solution.of(dense.parameter("a")).sigma(), 1e-8);
            assertEquals(0.12420394, solution.of(dense.parameter("b")).sigma(), 1e-8);
        }
    }

    @Test
    void twoRungsThatShareASource() {
        double[] y2 = {9.2, 10.9, 9.9, 11.8, 10.3, 12.4, 9.1, 11.0};
        double[] w = {1, 2, 0.5, 3, 1.5, 2.5, 1, 2.2};
        double[] u = {0.3, 1, 2, 1.1, 0.2, 0.7, 1.3, 0.4};
        Source z = Source.normal("z", Amount.of(0, Unit.NONE).plusMinus(0.3));
        Source a = Source.free("a", Unit.NONE);
        Own one = Own.of(
                        "line",
                        line().definition().data(),
                        "y",
                        (mu, s) -> s.parameter("a")
                                .add(s.parameter("b").multiply(s.column("x")))
                                .add(s.parameter("z")))
                .withParameter("a", a)
                .withParameter("b", Source.free("b", Unit.NONE))
                .withParameter("z", z)
                .withEstimatedScatter();
        Own two = Own.of(
                        "other",
                        Observations.of("other", names("b", 8))
                                .bearingOn(none(8))
                                .with("y", Unit.NONE, y2)
                                .with("y error", Unit.NONE, 0.2, 0.2, 0.2, 0.2, 0.2, 0.2, 0.2, 0.2)
                                .with("w", Unit.NONE, w)
                                .with("u", Unit.NONE, u),
                        "y",
                        (mu, s) -> s.parameter("a")
                                .add(s.parameter("c").multiply(s.column("w")))
                                .add(s.parameter("z").multiply(s.column("u"))))
                .withParameter("a", a)
                .withParameter("c", Source.free("c", Unit.NONE))
                .withParameter("z", z)
                .withEstimatedScatter();
        Solution solution = Ladder.of(one, two).solve();
        assertEquals(0.23951359123877464, solution.scatter(one).value(), 1e-8);
        assertEquals(0.8644148985099106, solution.scatter(two).value(), 1e-8);
        assertEquals(9.96411684, solution.of(a).value(), 1e-7);
        assertEquals(0.27806905, solution.of(a).sigma(), 1e-7);
        assertEquals(0.17232466, solution.of(two.parameter("c")).sigma(), 1e-7);
        // Each set decides for itself; a scatter can be taken over, and then is.
        Solution alone = solution.over("line");
        assertEquals(0.23919181231597014, alone.scatter(one).value(), 1e-9);
        Solution taken = alone.withScattersOf(solution);
        assertEquals(solution.scatter(one).value(), taken.scatter(one).value(), 0);
        assertTrue(Double.isInfinite(taken.of(a).degreesOfFreedom()));
        assertTrue(taken.calibration(one).text().contains("taken over"));
    }

    @Test
    void noScatterWhereErrorsExplainAll() {
        double[] wide = new double[12];
        java.util.Arrays.fill(wide, 2.0);
        Own line = line().withNoise(Noise.of(wide).withEstimatedScatter());
        assertEquals(0, Ladder.of(line).solve().scatter(line).value(), 0);
    }

    @Test
    void scatterOfDataThatNothingChecksIsRefused() {
        Own line = line();
        Own two = line.like(
                line.definition().without(line.definition().data().names().subList(2, 12)));
        RankFault fault = assertThrows(RankFault.class, () -> Ladder.of(two).solve());
        assertTrue(fault.what().contains("scatter of line"));
    }
}
