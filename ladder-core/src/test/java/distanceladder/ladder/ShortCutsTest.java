package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.covariance.Covariance;
import distanceladder.covariance.Dense;
import distanceladder.covariance.Diagonal;
import distanceladder.covariance.LowRankUpdate;
import distanceladder.information.Prior;
import distanceladder.information.Solved;
import distanceladder.information.Triangle;
import distanceladder.relation.Amount;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * Short cuts that give wrong standard deviations: each is taken here on purpose, and differs visibly from the engine,
 * which equals one dense least squares.
 */
class ShortCutsTest {
    private final Source shared = Source.normal("shared", Amount.magnitudes(0).plusMinus(0.05));

    private Own rung(String name, List<String> objects, Noise noise) {
        int n = objects.size();
        double[] zero = new double[n];
        double[] error = new double[n];
        java.util.Arrays.fill(error, 0.1);
        List<String> data = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            data.add(name + i);
            zero[i] = 20 + 0.1 * i;
        }
        return Own.of(
                        name,
                        Observations.of(name, data)
                                .bearingOn(objects)
                                .with("magnitude", Unit.MAGNITUDE, zero)
                                .with("magnitude error", Unit.MAGNITUDE, error),
                        "magnitude",
                        (mu, s) -> mu.add(s.parameter("zero point")).add(s.parameter("shared")))
                .withParameter("zero point", Source.free(name + " zero point", Unit.MAGNITUDE))
                .withParameter("shared", shared)
                .withNoise(noise);
    }

    private static Noise independent(int n, double sigma) {
        double[] sigmas = new double[n];
        java.util.Arrays.fill(sigmas, sigma);
        return Noise.of(sigmas);
    }

    /** Base, two branches on it, a flow on both: the diamond. */
    private Ladder diamond(Noise left, Noise flow) {
        Anchor anchor = Anchor.of("h0", Amount.modulus(30).plusMinus(0.1));
        Own base = rung("base", List.of("h0", "h0", "h1", "h2", "h3"), independent(5, 0.05))
                .calibratedBy(anchor);
        Own one =
                rung("left", List.of("h1", "h2", "t0", "t1", "t2", "t3"), left).calibratedBy(base);
        Own two = rung("right", List.of("h2", "h3", "t2", "t3", "t4"), independent(5, 0.1))
                .calibratedBy(base);
        Own top = rung("flow", List.of("t0", "t1", "t2", "t3", "t4"), flow).calibratedBy(one, two);
        return Ladder.of(top);
    }

    private static double sigma(Triangle merged, Solved solved, String unknown) {
        assertTrue(merged.unknowns().column(unknown) >= 0);
        double[] c = new double[merged.unknowns().size()];
        c[merged.unknowns().column(unknown)] = 1;
        var q = solved.combination(merged.unknowns(), c);
        return Math.sqrt(q.covariance(q));
    }

    private static List<Prior> priors(Settled settled) {
        List<Prior> out = new ArrayList<>();
        for (var input : settled.ladder().inputs(settled.set()).values()) {
            if (!input.free()) {
                out.add(Prior.of(input.name(), input.unknowns(), input.mean(), input.root()));
            }
        }
        return out;
    }

    private double wrong(Settled settled, List<Triangle> triangles) {
        Triangle merged = Triangle.merge(triangles);
        return sigma(merged, Solved.of(merged, priors(settled)), "flow zero point");
    }

    private static List<Triangle> triangles(Settled settled) {
        return new ArrayList<>(settled.assembly().pieces().stream()
                .map(Assembly.Piece::triangle)
                .toList());
    }

    private static double right(Solution solution) {
        DenseReferenceProperties.compare(solution);
        return solution.settled().unknown("flow zero point").sigma();
    }

    @Test
    void sharedBaseCountedOncePerBranch() {
        Solution solution = diamond(independent(6, 0.1), independent(5, 0.1)).solve();
        double right = right(solution);
        Settled settled = solution.settled();
        assertEquals(right, wrong(settled, triangles(settled)), 1e-12 * right, "the pieces, each once");
        List<Triangle> twice = triangles(settled);
        for (Assembly.Piece piece : settled.assembly().pieces()) {
            if (!piece.where().contains("left")
                    && !piece.where().contains("right")
                    && !piece.where().contains("flow")) {
                twice.add(piece.triangle());
            }
        }
        assertTrue(wrong(settled, twice) < 0.97 * right, "counted twice, the base looks too good");
    }

    /** Objects that three rungs see: each rung's difference from the first whitened by itself. */
    @Test
    void differencesWhitenedRungByRung() {
        Solution solution = diamond(independent(6, 0.1), independent(5, 0.3)).solve();
        double right = right(solution);
        Settled settled = solution.settled();
        List<Triangle> pieces = new ArrayList<>();
        for (Assembly.Piece piece : settled.assembly().pieces()) {
            if (piece.where().equals("flow + left + right")) {
                for (String rung : List.of("left", "right")) {
                    pieces.add(differences(settled, rung, List.of("t2", "t3")));
                }
            } else {
                pieces.add(piece.triangle());
            }
        }
        assertTrue(Math.abs(wrong(settled, pieces) / right - 1) > 0.01, "the first rung's error is in each difference");
    }

    private static Triangle differences(Settled settled, String rung, List<String> objects) {
        var one = settled.assembly().elimination("flow").readings();
        var two = settled.assembly().elimination(rung).readings();
        var union = distanceladder.information.Unknowns.union(List.of(one.unknowns(), two.unknowns()));
        List<double[]> rows = new ArrayList<>();
        for (String object : objects) {
            int i = one.index(object);
            int j = two.index(object);
            double f = two.coefficient(j) / one.coefficient(i);
            double size = Math.sqrt(1 + f * f);
            double[] row = new double[union.size() + 1];
            for (int k = 0; k < two.unknowns().size(); k++) {
                row[union.column(two.unknowns().name(k))] += two.row(j)[k] / size;
            }
            for (int k = 0; k < one.unknowns().size(); k++) {
                row[union.column(one.unknowns().name(k))] -= f * one.row(i)[k] / size;
            }
            row[union.size()] = (two.row(j)[two.unknowns().size()]
                            - f * one.row(i)[one.unknowns().size()])
                    / size;
            rows.add(row);
        }
        return Triangle.of(union, rows.toArray(new double[0][]));
    }

    @Test
    void priorInsideEachRung() {
        Solution solution = diamond(independent(6, 0.1), independent(5, 0.1)).solve();
        double right = right(solution);
        Settled settled = solution.settled();
        Triangle prior =
                Triangle.of(distanceladder.information.Unknowns.of(List.of("shared")), new double[][] {{1 / 0.05, 0}});
        List<Triangle> many = triangles(settled);
        for (int i = 0; i < 3; i++) {
            many.add(prior);
        }
        assertTrue(wrong(settled, many) < 0.99 * right, "a prior per rung makes the source look too certain");
    }

    /** A dense block on targets, one of its parts taken for the whole. */
    @Test
    void blockTakenAsADiagonalOrSplit() {
        double[][] common = new double[6][1];
        for (double[] row : common) {
            row[0] = 0.2;
        }
        Covariance block = Dense.fromCovariance(
                LowRankUpdate.of(Diagonal.fromStandardDeviations(0.1, 0.1, 0.1, 0.1, 0.1, 0.1), common)
                        .toArray());
        Solution solution = diamond(Noise.of(block), independent(5, 0.1)).solve();
        double right = right(solution);
        double[] sigmas = new double[6];
        for (int i = 0; i < 6; i++) {
            sigmas[i] = Math.sqrt(block.entry(i, i));
        }
        Solution diagonal = diamond(Noise.of(sigmas), independent(5, 0.1)).solve();
        assertTrue(Math.abs(right(diagonal) / right - 1) > 0.02, "a block taken as a diagonal");
        Covariance split = distanceladder.covariance.Blocks.of(block.part(0, 1), block.part(2, 3, 4, 5));
        Solution parts = diamond(Noise.of(split), independent(5, 0.1)).solve();
        assertTrue(Math.abs(right(parts) / right - 1) > 0.02, "a block split into calibrators and targets");
    }

    /** Two blocks on the same targets; the second taken as a diagonal. */
    @Test
    void secondBlockTakenAsADiagonal() {
        double[][] common = new double[5][1];
        for (double[] row : common) {
            row[0] = 0.15;
        }
        Covariance second =
                Dense.fromCovariance(LowRankUpdate.of(Diagonal.fromStandardDeviations(0.1, 0.1, 0.1, 0.1, 0.1), common)
                        .toArray());
        Covariance first = Dense.fromCovariance(LowRankUpdate.of(
                        Diagonal.fromStandardDeviations(0.1, 0.1, 0.1, 0.1, 0.1, 0.1),
                        new double[][] {{0.1}, {0.1}, {0.1}, {-0.1}, {0.2}, {0.1}})
                .toArray());
        double right = right(diamond(Noise.of(first), Noise.of(second)).solve());
        double[] sigmas = new double[5];
        for (int i = 0; i < 5; i++) {
            sigmas[i] = Math.sqrt(second.entry(i, i));
        }
        double wrong = right(diamond(Noise.of(first), Noise.of(sigmas)).solve());
        assertTrue(Math.abs(wrong / right - 1) > 0.02);
    }
}
