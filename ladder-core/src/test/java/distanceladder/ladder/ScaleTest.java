package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Derived;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * A systematic that is degenerate with a free zero point, from 1 to 10^9 times the noise, against normal equations in
 * 60-digit arithmetic.
 */
class ScaleTest {
    private static final MathContext DIGITS = new MathContext(60);
    private static final double NOISE = 0.1;
    private static final double[] X = {0.3, -0.2, 0.5, 1.1, -0.7, 0.05};
    private static final double[] Y = {10.31, 9.87, 10.44, 11.02, 9.33, 10.11};

    @ParameterizedTest
    @ValueSource(doubles = {1, 1e3, 1e5, 1e6, 1e7, 1e9})
    void sigmasValuesAndBudgets(double ratio) {
        double size = ratio * NOISE;
        Source systematic = Source.normal("systematic", Amount.magnitudes(0.25).plusMinus(size));
        Own lower = Own.of(
                        "lower",
                        table("lower"),
                        "magnitude",
                        (mu, s) -> mu.add(s.parameter("zero point"))
                                .add(s.parameter("systematic"))
                                .add(s.parameter("slope").multiply(s.column("x"))))
                .withParameter("zero point", Source.free("zero point", Unit.MAGNITUDE))
                .withParameter("systematic", systematic)
                .withParameter("slope", Source.free("slope", Unit.MAGNITUDE))
                .calibratedBy(
                        Anchor.of("a0", Amount.modulus(30).plusMinus(NOISE)),
                        Anchor.of("a1", Amount.modulus(30).plusMinus(NOISE)),
                        Anchor.of("a2", Amount.modulus(30).plusMinus(NOISE)));
        Solution solution = Ladder.of(lower).solve();
        Source zeroPoint = (Source) lower.parameter("zero point");
        Derived sum = Derived.of(
                "sum",
                Unit.MAGNITUDE,
                List.of(zeroPoint, systematic),
                in -> in.get(0).add(in.get(1)));
        double[][] exact = reference(size);
        double close = ratio <= 1e7 ? 1e-11 : 1e-9;
        double near = ratio <= 1e6 ? 1e-7 : 1e-5;
        check(exact[0], solution.of(zeroPoint), close, near);
        check(exact[1], solution.of(systematic), close, near);
        check(exact[2], solution.of(lower.parameter("slope")), close, near);
        check(exact[3], solution.of(sum), close, near);
        check(exact[4], solution.of(lower.distance("a5")), close, near);
        for (var value : List.of(zeroPoint, sum, lower.distance("a5"))) {
            Budget budget = solution.budget(value);
            assertEquals(
                    budget.estimate().variance(),
                    budget.total(),
                    (ratio <= 1e6 ? 1e-12 : 1e-8) * budget.total(),
                    value.name());
        }
    }

    private static void check(double[] exact, Estimate estimate, double close, double near) {
        assertEquals(exact[1], estimate.sigma(), close * exact[1], estimate.name());
        assertEquals(exact[0], estimate.value(), near * exact[1], estimate.name());
    }

    private static Observations table(String name) {
        double[] m = new double[Y.length];
        double[] e = new double[Y.length];
        for (int i = 0; i < m.length; i++) {
            m[i] = Y[i] + 10;
            e[i] = NOISE;
        }
        return Observations.of(name, "d0", "d1", "d2", "d3", "d4", "d5")
                .bearingOn("a0", "a1", "a2", "a0", "a1", "a5")
                .with("magnitude", Unit.MAGNITUDE, m)
                .with("magnitude error", Unit.MAGNITUDE, e)
                .with("x", Unit.NONE, X);
    }

    /** Values and sigmas of zero point, systematic, slope, zero point + systematic, distance of a5. */
    private static double[][] reference(double size) {
        int p = 7;
        String[] objects = {"a0", "a1", "a2", "a0", "a1", "a5"};
        List<String> columns = List.of("a0", "a1", "a2", "a5");
        BigDecimal[][] n = new BigDecimal[p][2 * p + 1];
        for (BigDecimal[] row : n) {
            java.util.Arrays.fill(row, BigDecimal.ZERO);
        }
        for (int i = 0; i < objects.length; i++) {
            double[] row = new double[p];
            row[columns.indexOf(objects[i])] = 1;
            row[4] = 1;
            row[5] = 1;
            row[6] = X[i];
            add(n, row, Y[i] + 10, NOISE);
        }
        for (int k = 0; k < 3; k++) {
            double[] row = new double[p];
            row[k] = 1;
            add(n, row, 30, NOISE);
        }
        double[] prior = new double[p];
        prior[5] = 1;
        add(n, prior, 0.25, size);
        solve(n);
        double[][] out = new double[5][];
        int[] at = {4, 5, 6, -1, 3};
        for (int k = 0; k < 5; k++) {
            BigDecimal value = at[k] < 0 ? n[4][2 * p].add(n[5][2 * p]) : n[at[k]][2 * p];
            BigDecimal variance =
                    at[k] < 0 ? n[4][p + 4].add(n[5][p + 5]).add(n[4][p + 5]).add(n[5][p + 4]) : n[at[k]][p + at[k]];
            out[k] = new double[] {value.doubleValue(), variance.sqrt(DIGITS).doubleValue()};
        }
        return out;
    }

    private static void add(BigDecimal[][] n, double[] row, double y, double sigma) {
        int p = row.length;
        BigDecimal weight = BigDecimal.ONE.divide(new BigDecimal(sigma).pow(2), DIGITS);
        for (int i = 0; i < p; i++) {
            for (int j = 0; j < p; j++) {
                n[i][j] = n[i][j].add(
                        new BigDecimal(row[i]).multiply(new BigDecimal(row[j])).multiply(weight), DIGITS);
            }
            n[i][2 * p] = n[i][2 * p].add(
                    new BigDecimal(row[i]).multiply(new BigDecimal(y)).multiply(weight), DIGITS);
        }
    }

    /** Gauss-Jordan: the right half becomes the inverse, the last column the solution. */
    private static void solve(BigDecimal[][] n) {
        int p = n.length;
        for (int i = 0; i < p; i++) {
            n[i][p + i] = BigDecimal.ONE;
        }
        for (int k = 0; k < p; k++) {
            BigDecimal pivot = n[k][k];
            for (int j = 0; j < n[k].length; j++) {
                n[k][j] = n[k][j].divide(pivot, DIGITS);
            }
            for (int i = 0; i < p; i++) {
                if (i != k) {
                    BigDecimal f = n[i][k];
                    for (int j = 0; j < n[i].length; j++) {
                        n[i][j] = n[i][j].subtract(f.multiply(n[k][j]), DIGITS);
                    }
                }
            }
        }
    }
}
