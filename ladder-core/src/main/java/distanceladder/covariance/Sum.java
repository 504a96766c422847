package distanceladder.covariance;

import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The covariance of values with several independent errors: {@code C = C_1 + C_2 + ...}.
 *
 * <p>The parts keep their structure. Their whitened parts are added only in {@link #split()}, where blocks that overlap
 * become one block. Cost: what the parts cost.
 */
public final class Sum implements Covariance {
    private static final String KIND = "sum of covariances";

    private final Covariance[] parts;

    private Sum(Covariance[] parts) {
        this.parts = parts;
    }

    /**
     * The sum of covariances of the same values.
     *
     * @param parts one or more, all of one size
     * @return the covariance
     * @throws ValueFault if there is no part, or the sizes differ
     */
    public static Sum of(Covariance... parts) {
        if (parts.length == 0) {
            throw new ValueFault("no covariance", "a sum has one part or more", KIND, "add a part");
        }
        for (int k = 1; k < parts.length; k++) {
            if (parts[k].size() != parts[0].size()) {
                throw new ValueFault(
                        "part " + k + " of " + parts[k].size() + " values",
                        "part 0 is of " + parts[0].size() + " values",
                        KIND,
                        "add covariances of the same values");
            }
        }
        return new Sum(parts.clone());
    }

    @Override
    public int size() {
        return parts[0].size();
    }

    @Override
    public double entry(int i, int j) {
        double sum = 0;
        for (Covariance part : parts) {
            sum += part.entry(i, j);
        }
        return sum;
    }

    @Override
    public Sum part(int... indices) {
        Covariance[] chosen = new Covariance[parts.length];
        for (int k = 0; k < parts.length; k++) {
            chosen[k] = parts[k].part(indices);
        }
        return new Sum(chosen);
    }

    @Override
    public double bilinear(double[] a, double[] b) {
        double sum = 0;
        for (Covariance part : parts) {
            sum += part.bilinear(a, b);
        }
        return sum;
    }

    @Override
    public Sum scaled(double factor) {
        Border.factor(factor, KIND);
        Covariance[] scaled = new Covariance[parts.length];
        for (int k = 0; k < parts.length; k++) {
            scaled[k] = parts[k].scaled(factor);
        }
        return new Sum(scaled);
    }

    @Override
    public Split split() {
        List<Split> splits = new ArrayList<>();
        for (Covariance part : parts) {
            splits.add(part.split());
        }
        return Split.sum(splits);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Sum that && Arrays.equals(parts, that.parts);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(parts);
    }

    @Override
    public String toString() {
        return "sum of " + parts.length + " covariances of " + size() + " values";
    }
}
