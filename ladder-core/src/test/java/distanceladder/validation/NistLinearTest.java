package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.information.Combination;
import distanceladder.information.Solved;
import distanceladder.information.Triangle;
import distanceladder.information.Unknowns;
import distanceladder.text.Grid;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Triangle and solution against certified regressions: how many digits of coefficients, of their standard deviations
 * and of the residual standard deviation agree.
 *
 * <p>Digits are {@code LRE = -log10(|x - c| / |c|)}, at most 15, the number of certified digits. Rows have unit errors,
 * so a standard deviation is {@code |t| s} with {@code s^2 = chi2 / (n - p)}. For comparison, a Householder
 * triangularisation in double precision by a general-purpose library (NumPy 1.24, {@code linalg.qr}) reaches 12.1, 12.2,
 * 14.7 and 10.9 digits of the coefficients.
 */
@Tag("validation")
class NistLinearTest {
    private static final int CERTIFIED = 15;

    /** Digits that must agree. */
    private record Wanted(NistDataset set, double coefficients, double sigmas, double residual) {}

    private static final List<Wanted> WANTED = List.of(
            new Wanted(NistDataset.norris(), 12.5, 13.5, 13.5),
            new Wanted(NistDataset.pontius(), 12.0, 13.5, 13.5),
            new Wanted(NistDataset.noint1(), 14.5, 14.5, 14.5),
            new Wanted(NistDataset.longley(), 13.5, 14.0, 14.5));

    /** Digits that agree: the fewest over all coefficients, over all sigmas, and of the residual sigma. */
    private record Digits(double coefficients, double sigmas, double residual) {}

    @Test
    void coefficientsAndTheirStandardDeviationsAgreeWithCertifiedOnes() {
        Grid.Builder grid = Grid.with("dataset", "rows", "unknowns", "coefficients", "sigmas", "residual sigma")
                .titled("Matching digits, certified values of NIST StRD");
        List<Digits> reached = WANTED.stream().map(w -> digits(w.set)).toList();
        for (int i = 0; i < reached.size(); i++) {
            Digits d = reached.get(i);
            NistDataset set = WANTED.get(i).set;
            grid.row(
                    set.name(),
                    set.y().length,
                    set.coefficients().length,
                    oneDecimal(d.coefficients),
                    oneDecimal(d.sigmas),
                    oneDecimal(d.residual));
        }
        System.out.println(grid.build().text());
        for (int i = 0; i < reached.size(); i++) {
            Wanted wanted = WANTED.get(i);
            atLeast(wanted.coefficients, reached.get(i).coefficients, wanted.set.name() + " coefficients");
            atLeast(wanted.sigmas, reached.get(i).sigmas, wanted.set.name() + " standard deviations");
            atLeast(wanted.residual, reached.get(i).residual, wanted.set.name() + " residual standard deviation");
        }
    }

    private static String oneDecimal(double x) {
        return String.format(java.util.Locale.ROOT, "%.1f", x);
    }

    private static void atLeast(double wanted, double reached, String what) {
        assertTrue(reached >= wanted, what + ": " + reached + " digits agree, wanted " + wanted);
    }

    private static Digits digits(NistDataset set) {
        int n = set.y().length;
        int p = set.coefficients().length;
        Unknowns unknowns =
                Unknowns.of(IntStream.range(0, p).mapToObj(j -> "b" + j).toList());
        double[][] rows = new double[n][];
        for (int i = 0; i < n; i++) {
            rows[i] = Arrays.copyOf(set.design()[i], p + 1);
            rows[i][p] = set.y()[i];
        }
        Solved solved = Solved.of(Triangle.of(unknowns, rows), List.of());
        double scatter = Math.sqrt(solved.chiSquare() / (n - p));
        double coefficients = CERTIFIED;
        double sigmas = CERTIFIED;
        for (int j = 0; j < p; j++) {
            Combination one = solved.combination(Unknowns.of(List.of("b" + j)), new double[] {1});
            double sigma = Math.sqrt(one.covariance(one)) * scatter;
            coefficients = Math.min(coefficients, matching(solved.value(one), set.coefficients()[j]));
            sigmas = Math.min(sigmas, matching(sigma, set.sigmas()[j]));
        }
        return new Digits(coefficients, sigmas, matching(scatter, set.rsd()));
    }

    private static double matching(double x, double certified) {
        return x == certified
                ? CERTIFIED
                : Math.min(CERTIFIED, -StrictMath.log10(Math.abs(x - certified) / Math.abs(certified)));
    }
}
