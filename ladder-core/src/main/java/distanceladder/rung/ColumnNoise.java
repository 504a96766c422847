package distanceladder.rung;

import distanceladder.covariance.Diagonal;
import distanceladder.relation.Noise;

/** Noise that a family computes from its table, told from noise that the user put in its place. */
final class ColumnNoise {
    private ColumnNoise() {}

    /** Whether the known errors are just these, to the bit. */
    static boolean is(Noise noise, double... sigmas) {
        return noise.mode() != Noise.Scatter.EXACT
                && noise.covariance().equals(Diagonal.fromStandardDeviations(sigmas));
    }

    /** Whether there are no known errors: data declared exact, or equal errors that the residuals tell. */
    static boolean isNone(Noise noise) {
        return noise.covariance()
                .equals(Diagonal.fromVariances(new double[noise.covariance().size()]));
    }

    /** Whether something in it has a size in the observable's unit beside the known errors. */
    static boolean hasMore(Noise noise) {
        return noise.scatter() > 0 || noise.joint().isPresent();
    }

    /** Other known errors, with scatter and joint noise as they were. */
    static Noise replaced(Noise old, double... sigmas) {
        Noise fresh = Noise.of(sigmas);
        Noise scattered = old.mode() == Noise.Scatter.ESTIMATED
                ? fresh.withEstimatedScatter()
                : old.scatter() > 0 ? fresh.withScatter(old.scatter()) : fresh;
        return old.joint().map(scattered::with).orElse(scattered);
    }
}
