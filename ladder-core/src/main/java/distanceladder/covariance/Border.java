package distanceladder.covariance;

import distanceladder.text.ValueFault;
import java.util.BitSet;
import java.util.Locale;

/** The checks that all kinds share. */
final class Border {
    private Border() {}

    static void index(int i, int size, String kind) {
        if (i < 0 || i >= size) {
            throw new ValueFault(
                    "index = " + i, "indices go from 0 to " + (size - 1), kind, "give an index within the covariance");
        }
    }

    static void indices(int[] indices, int size, String kind) {
        BitSet seen = new BitSet(size);
        for (int i : indices) {
            index(i, size, kind);
            if (seen.get(i)) {
                throw new ValueFault(
                        "index " + i + " twice", "a part takes each value at most once", kind, "name it once");
            }
            seen.set(i);
        }
    }

    static void lengths(double[] a, double[] b, int size, String kind) {
        length(a, size, kind);
        length(b, size, kind);
    }

    private static void length(double[] vector, int size, String kind) {
        if (vector.length != size) {
            throw new ValueFault(
                    "a vector of " + vector.length + " numbers",
                    "the covariance is of " + size + " values",
                    kind,
                    "give one coefficient for each value");
        }
    }

    static void finite(double value, String what, String kind) {
        if (!Double.isFinite(value)) {
            throw new ValueFault(what + " = " + value, "entries are finite numbers", kind, "give a number");
        }
    }

    static double variance(double value, int i, String kind) {
        if (!(value >= 0) || Double.isInfinite(value)) {
            throw new ValueFault(
                    "variance " + i + " = " + value,
                    "a variance is finite and 0 or more",
                    kind,
                    "give a variance, or 0 for a certain value");
        }
        return value + 0.0;
    }

    /** The square of a standard deviation; one that leaves the range of the numbers is refused. */
    static double square(double sigma, int i, String kind) {
        if (!(sigma >= 0) || Double.isInfinite(sigma)) {
            throw new ValueFault(
                    "standard deviation " + i + " = " + sigma,
                    "a standard deviation is finite and 0 or more",
                    kind,
                    "give a standard deviation, or 0 for a certain value");
        }
        return product(sigma, sigma, "the square of standard deviation " + i + " (" + sigma + ")", kind);
    }

    /** A product of two numbers of 0 or more that neither overflows nor vanishes. */
    static double product(double a, double b, String what, String kind) {
        double product = a * b;
        if (Double.isInfinite(product) || (product == 0 && a != 0 && b != 0)) {
            throw new ValueFault(
                    what + " = " + product,
                    "a variance lies within the range of the numbers",
                    kind,
                    "state the values in another unit");
        }
        return product + 0.0;
    }

    static void factor(double factor, String kind) {
        if (!(factor >= 0) || Double.isInfinite(factor)) {
            throw new ValueFault(
                    "factor = " + factor,
                    "a covariance is multiplied by a finite number of 0 or more",
                    kind,
                    "give the square of the factor by which the values are multiplied");
        }
    }

    static String brief(double value) {
        return String.format(Locale.ROOT, "%.3g", value);
    }
}
