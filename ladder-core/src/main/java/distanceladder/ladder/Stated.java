package distanceladder.ladder;

import distanceladder.information.Combination;
import java.util.Map;
import java.util.TreeMap;

/**
 * A value of a settled set, ready for covariances: an affine function of the solution's unknowns, and of the own errors
 * of the distances that it contains.
 */
final class Stated {
    private final Settled settled;
    private final double value;
    private final Combination combination;
    private final TreeMap<String, Double> distances;

    Stated(Settled settled, double value, Combination combination, Map<String, Double> distances) {
        this.settled = settled;
        this.value = value;
        this.combination = combination;
        this.distances = new TreeMap<>(distances);
    }

    /** The value in base units. */
    double value() {
        return value;
    }

    Combination combination() {
        return combination;
    }

    /** Factors of the distances whose own errors enter, by object. */
    TreeMap<String, Double> distances() {
        return distances;
    }

    double covariance(Stated other) {
        double sum = combination.covariance(other.combination);
        for (Map.Entry<String, Double> mine : distances.entrySet()) {
            for (Map.Entry<String, Double> theirs : other.distances.entrySet()) {
                sum += mine.getValue() * theirs.getValue() * settled.ownCovariance(mine.getKey(), theirs.getKey());
            }
        }
        return sum;
    }

    double variance() {
        return covariance(this);
    }

    double sigma() {
        return Math.sqrt(Math.max(0, variance()));
    }
}
