package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.covariance.Dense;
import distanceladder.covariance.Diagonal;
import distanceladder.covariance.LowRankUpdate;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Own;
import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Test;

/** Data declared exact are constraints: the limit of ever smaller errors, without its rounding. */
class ExactDataTest {
    private static Own distances(String name, double shift) {
        return Own.of(
                name,
                Observations.of(name, "d0", "d1", "d2")
                        .bearingOn("a", "b", "c")
                        .with("modulus", Unit.MAGNITUDE, 30 + shift, 31 + shift, 32.5 + shift)
                        .with("modulus error", Unit.MAGNITUDE, 1, 1, 1),
                "modulus",
                (mu, s) -> mu.add(0));
    }

    private static Own line(Noise noise) {
        return Own.of(
                        "line",
                        Observations.of("line", "m0", "m1", "m2", "m3", "m4")
                                .bearingOn("a", "b", "c", "a", "t")
                                .with("magnitude", Unit.MAGNITUDE, 10.1, 11.0, 12.45, 9.95, 13.0)
                                .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1, 0.1, 0.1, 0.1)
                                .with("x", Unit.NONE, 0.5, -0.3, 0.8, 0.1, 0.2),
                        "magnitude",
                        (mu, s) -> mu.add(s.parameter("zero point"))
                                .add(s.parameter("slope").multiply(s.column("x"))))
                .withParameter("zero point", Source.free("zero point", Unit.MAGNITUDE))
                .withParameter("slope", Source.free("slope", Unit.MAGNITUDE))
                .withNoise(noise);
    }

    private static final Noise PLAIN = Noise.of(0.1, 0.1, 0.1, 0.1, 0.1);
    private static final Noise BLOCK = Noise.of(Dense.fromCovariance(LowRankUpdate.of(
                    Diagonal.fromStandardDeviations(0.1, 0.1, 0.1, 0.1, 0.1),
                    new double[][] {{0.05}, {0.1}, {0.05}, {0.1}, {-0.1}})
            .toArray()));

    @Test
    void limitOfSmallErrors() {
        for (Noise noise : new Noise[] {PLAIN, BLOCK}) {
            Own exact = distances("distances", 0).withoutErrors();
            Own line = line(noise).calibratedBy(exact);
            Solution solution = Ladder.of(line).solve();
            Solution near = solution.with(distances("distances", 0).withNoise(Noise.of(1e-6, 1e-6, 1e-6)));
            for (var value : new distanceladder.relation.Value[] {
                line.parameter("zero point"), line.parameter("slope"), line.distance("t")
            }) {
                double sigma = solution.of(value).sigma();
                assertEquals(near.of(value).value(), solution.of(value).value(), 1e-6 * sigma, value.name());
                assertEquals(near.of(value).sigma(), sigma, 1e-6 * sigma, value.name());
                Budget budget = solution.budget(value);
                assertEquals(0, budget.variance("data of distances"), 0);
                assertEquals(budget.estimate().variance(), budget.total(), 1e-12 * budget.total());
            }
            assertEquals(0, solution.of(line.distance("b")).sigma(), 0);
            assertEquals(31, solution.of(line.distance("b")).value(), 1e-12);
            assertTrue(solution.calibration(exact).text().contains("declared exact"));
        }
    }

    /** With the distances known the line is ordinary least squares: values from NumPy 1.24.2 lstsq. */
    @Test
    void zeroPointOfTheLine() {
        Solution solution = Ladder.of(
                        line(PLAIN).calibratedBy(distances("distances", 0).withoutErrors()))
                .solve();
        assertEquals(
                -20.0020000, solution.of(line(PLAIN).parameter("zero point")).value(), 1e-7);
        assertEquals(7.27272727e-03, solution.of(line(PLAIN).parameter("slope")).value(), 1e-10);
    }

    @Test
    void exactReadingsThatDisagreeAreRefused() {
        Own one = distances("one", 0).withoutErrors();
        Own same = distances("two", 0).withoutErrors();
        Own other = distances("two", 0.001).withoutErrors();
        Own line = line(PLAIN);
        Ladder.of(line.calibratedBy(one, same)).solve();
        ValueFault fault = assertThrows(
                ValueFault.class, () -> Ladder.of(line.calibratedBy(one, other)).solve());
        assertTrue(fault.what().contains("two exact readings of \"a\""), fault.what());
    }

    @Test
    void exactDatumWithoutObjectIsRefused() {
        Own none = distances("one", 0);
        Own bare = none.like(none.definition()
                        .withData(
                                none.definition().data().bearingOn("a", "", "c"),
                                none.definition().noise()))
                .withoutErrors();
        ValueFault fault = assertThrows(ValueFault.class, () -> Ladder.of(bare).solve());
        assertTrue(fault.what().contains("d1"), fault.what());
    }
}
