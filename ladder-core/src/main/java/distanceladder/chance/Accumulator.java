package distanceladder.chance;

import distanceladder.text.ValueFault;
import org.jspecify.annotations.Nullable;

/**
 * Mean and covariance of vectors that stream by, without keeping them.
 *
 * <p>With d the difference of the n-th vector from the mean before it, {@code mean += d / n} and
 * {@code S += (1 - 1/n) d dT}; two accumulators of m and n vectors, whose means differ by d, merge by
 * {@code S = S_m + S_n + d dT m n / (m + n)}; the covariance is {@code S / (n - 1)} (Welford 1962; Chan, Golub and LeVeque
 * 1983). No cancellation, whatever the mean. Merging is associative in exact arithmetic and not in bits: for the same
 * bits, cut the stream at the same places and merge in the same order.
 *
 * <p>Mutable, for one thread. Cost: l^2/2 numbers, and as many operations a vector, for vectors of length l.
 */
public final class Accumulator {
    private final double[] mean;
    private final double[] spread;
    private long count;

    private Accumulator(int dimension) {
        mean = new double[dimension];
        spread = new double[dimension * (dimension + 1) / 2];
    }

    /**
     * An empty accumulator.
     *
     * @param dimension length of the vectors, 1 to 46,000
     * @return without vectors
     * @throws ValueFault if the dimension is out of range
     */
    public static Accumulator of(int dimension) {
        if (dimension < 1 || dimension > 46_000) {
            throw new ValueFault(
                    "dimension = " + dimension,
                    "an accumulator is of 1 to 46,000 values",
                    "accumulator",
                    "summarise fewer values at once");
        }
        return new Accumulator(dimension);
    }

    /**
     * Adds one vector.
     *
     * @param vector finite numbers
     * @throws ValueFault if it has another length, or a number is not finite; nothing is added then
     */
    public void add(double[] vector) {
        length(vector.length);
        for (int i = 0; i < vector.length; i++) {
            if (!Double.isFinite(vector[i])) {
                throw new ValueFault(
                        "value " + i + " of vector " + count + " = " + vector[i],
                        "values are finite numbers",
                        "accumulator",
                        "leave out the draw, and say how many were left out");
            }
        }
        add(vector, 1, null);
    }

    /**
     * Adds all vectors of another accumulator, which stays as it is.
     *
     * @param other of the same dimension
     * @throws ValueFault if it has another dimension
     */
    public void merge(Accumulator other) {
        length(other.mean.length);
        if (other.count > 0) {
            add(other.mean.clone(), other.count, other.spread.clone());
        }
    }

    private void length(int length) {
        if (length != mean.length) {
            throw new ValueFault(
                    length + " values",
                    "this accumulator is of " + mean.length + " values",
                    "accumulator",
                    "give one number for each value");
        }
    }

    private void add(double[] otherMean, long otherCount, double @Nullable [] otherSpread) {
        double total = (double) count + otherCount;
        double share = otherCount / total;
        double weight = count * share;
        double[] difference = new double[mean.length];
        for (int i = 0; i < mean.length; i++) {
            difference[i] = otherMean[i] - mean[i];
        }
        int at = 0;
        for (int i = 0; i < mean.length; i++) {
            double scaled = difference[i] * weight;
            for (int j = 0; j <= i; j++) {
                spread[at] += scaled * difference[j] + (otherSpread == null ? 0 : otherSpread[at]);
                at++;
            }
            mean[i] += difference[i] * share;
        }
        count += otherCount;
    }

    /**
     * How many vectors were added.
     *
     * @return 0 or more
     */
    public long count() {
        return count;
    }

    /**
     * The mean.
     *
     * @return a fresh array
     * @throws ValueFault before the first vector
     */
    public double[] mean() {
        enough(1, "a mean");
        return mean.clone();
    }

    /**
     * The covariance, with the divisor n - 1.
     *
     * @return a fresh symmetric array
     * @throws ValueFault before the second vector
     */
    public double[][] covariance() {
        enough(2, "a covariance");
        double[][] covariance = new double[mean.length][mean.length];
        int at = 0;
        for (int i = 0; i < mean.length; i++) {
            for (int j = 0; j <= i; j++) {
                double value = spread[at++] / (count - 1);
                covariance[i][j] = value;
                covariance[j][i] = value;
            }
        }
        return covariance;
    }

    private void enough(int least, String what) {
        if (count < least) {
            throw new ValueFault(
                    count + " vectors", what + " needs " + least + " or more", "accumulator", "add vectors first");
        }
    }

    @Override
    public String toString() {
        return "accumulator of " + mean.length + " values, " + count + " vectors";
    }
}
