package distanceladder.ladder;

import distanceladder.fit.Scatter;
import distanceladder.relation.Definition;
import distanceladder.relation.Noise;
import distanceladder.text.RankFault;
import distanceladder.text.ValueFault;
import java.util.List;
import org.hipparchus.linear.CholeskyDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;
import org.jspecify.annotations.Nullable;

/**
 * The restricted likelihood of one rung's intrinsic scatter in a settled set.
 *
 * <p>With V the covariance of the rung's data that is whitened (variances, dense groups, scatter) and F that of their
 * fitted values, {@code P = V^-1 - V^-1 F V^-1} is the rung's part of the projection of {@link Scatter}; {@code P y = V^-1
 * residual}.
 */
final class Restricted {
    private static final double BOUNDARY = 0.1;
    private static final double NOTHING = 1e-9;

    private final Settled settled;
    private final Whitened white;
    private final double squares;
    private final double trace;
    private final double traceOfSquare;
    private final double scale;

    Restricted(Settled settled, String rung) {
        this.settled = settled;
        this.white = settled.assembly().rows(rung);
        Definition d = white.definition();
        int n = d.data().size();
        double[] weighted = settled.weighted(rung);
        double[][] p = projection(n);
        double sum = 0;
        double diagonal = 0;
        double all = 0;
        double inverse = 0;
        for (int i = 0; i < n; i++) {
            sum += weighted[i] * weighted[i];
            diagonal += p[i][i];
            inverse += 1 / white.noise().total(i);
            for (int j = 0; j < n; j++) {
                all += p[i][j] * p[i][j];
            }
        }
        if (!(diagonal > NOTHING * inverse)) {
            throw new RankFault(
                    "scatter of " + rung + " is not determined",
                    "a scatter is estimated from data that check one another",
                    "solution over " + String.join(" + ", settled.set()),
                    "give the scatter, take it over from another solution, or add data",
                    List.of("scatter of " + rung));
        }
        this.squares = sum;
        this.trace = diagonal;
        this.traceOfSquare = all;
        this.scale = n / inverse;
    }

    /** Where the variance starts: a function of the data alone, or what was taken over. */
    static double start(Definition d, @Nullable Double taken) {
        if (taken != null) {
            return taken;
        }
        Noise noise = d.noise();
        if (noise.mode() != Noise.Scatter.ESTIMATED) {
            return noise.scatter() * noise.scatter();
        }
        double mean = 0;
        int n = d.data().size();
        for (int i = 0; i < n; i++) {
            mean += noise.covariance().entry(i, i) / n;
        }
        return mean > 0 ? mean : 1;
    }

    private double[][] projection(int n) {
        Stated[] fitted = new Stated[n];
        Fit fit = new Fit(settled);
        for (int i = 0; i < n; i++) {
            fitted[i] = fit.fittedWithCarried(white, i);
        }
        RealMatrix f = MatrixUtils.createRealMatrix(n, n);
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double c = fitted[i].covariance(fitted[j]);
                f.setEntry(i, j, c);
                f.setEntry(j, i, c);
            }
        }
        RealMatrix inverse = inverse(n);
        return inverse.subtract(inverse.multiply(f).multiply(inverse)).getData();
    }

    private RealMatrix inverse(int n) {
        RealMatrix out = MatrixUtils.createRealMatrix(n, n);
        boolean[] grouped = new boolean[n];
        for (Whitened.BlockRows block : white.blocks()) {
            if (!block.link().isEmpty()) {
                throw new ValueFault(
                        "an estimated scatter with joint noise",
                        "the scatter of data with a part in a joint noise is given",
                        "rung \"" + white.definition().name() + "\"",
                        "give the scatter");
            }
            RealMatrix part = new CholeskyDecomposition(MatrixUtils.createRealMatrix(block.noise()), 1e-10, 0)
                    .getSolver()
                    .getInverse();
            for (int i = 0; i < block.data().length; i++) {
                grouped[block.data()[i]] = true;
                for (int j = 0; j < block.data().length; j++) {
                    out.setEntry(block.data()[i], block.data()[j], part.getEntry(i, j));
                }
            }
        }
        for (int i = 0; i < n; i++) {
            if (!grouped[i]) {
                out.setEntry(i, i, 1 / white.noise().variance(i));
            }
        }
        return out;
    }

    /** The next variance; on the way to zero it stays above, where data have no other error. */
    double next() {
        double scatter = white.noise().scatter();
        double variance = scatter * scatter;
        double to = Scatter.next(variance, squares, trace, traceOfSquare);
        if (to > 0) {
            return to;
        }
        boolean bare = scale <= variance * (1 + 1e-9);
        return bare ? BOUNDARY * variance : 0;
    }

    /** A typical variance of a datum. */
    double scale() {
        return scale;
    }

    /** The variance of the estimated variance. */
    double varianceOfEstimate() {
        return Scatter.varianceOfEstimate(traceOfSquare);
    }
}
