package distanceladder.information;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * A component of objects that dense noise ties together, its distances eliminated.
 *
 * <p>Every object with m rows gives m - 1 differences that do not hold its distance: with the pivot p, its row of the
 * largest |a| / sigma, {@code d_j = row_j - (a_j / a_p) row_p}. The differences of all objects, with the rows that hold
 * no eliminated distance, have the covariance {@code D C DT}; whitened at once by its Cholesky factor L they make the
 * component's triangle. An object with one row gives no difference: it drops out exactly, since a flat unknown of its
 * own absorbs the row.
 *
 * <p>Distances are read back conditionally: with {@code k = L^-1 D C e_p} and the whitened differences {@code w = L^-1 D
 * row}, the pivot's error given the differences is {@code kT (w_y - W x) + nu}, so
 *
 * <pre>a_p mu = (y_p - kT w_y) - (X_p - kT W) x - nu,   Cov(nu_p, nu_q) = C_pq - k_pT k_q</pre>
 *
 * and nu is independent of everything that the differences say. Whitening differences rung by rung, or a block split
 * into parts, would lose covariance; see the tests.
 */
public final class Coupled {
    private final CoupledRows source;
    private final Map<String, Integer> pivots = new TreeMap<>();
    private final int[] main;
    private final int[] pivot;
    private final double[] factor;
    private final Cholesky cholesky;
    private final double[][] white;
    private final Triangle triangle;

    private Coupled(CoupledRows source, String where) {
        this.source = source;
        Map<String, List<Integer>> groups = new TreeMap<>();
        List<Integer> mains = new ArrayList<>();
        for (int i = 0; i < source.objects().length; i++) {
            if (source.objects()[i].isEmpty()) {
                mains.add(i);
            } else {
                groups.computeIfAbsent(source.objects()[i], key -> new ArrayList<>())
                        .add(i);
            }
        }
        List<Integer> partners = new ArrayList<>();
        mains.forEach(i -> partners.add(-1));
        groups.forEach((object, members) -> difference(object, members, mains, partners));
        int n = mains.size();
        main = mains.stream().mapToInt(i -> i).toArray();
        pivot = partners.stream().mapToInt(i -> i).toArray();
        factor = new double[n];
        for (int i = 0; i < n; i++) {
            factor[i] = pivot[i] < 0 ? 0 : source.coefficients()[main[i]] / source.coefficients()[pivot[i]];
        }
        cholesky = Cholesky.of(covariance(), where);
        white = differences();
        cholesky.whiten(white);
        triangle = Triangle.of(source.unknowns(), white).withLengths(lengths());
    }

    /**
     * Eliminates the component's distances.
     *
     * @param rows the component's rows
     * @param where what the noise is, for the message of a refusal
     * @return the component
     * @throws distanceladder.text.ValueFault when the covariance of the differences is not positive definite
     */
    public static Coupled of(CoupledRows rows, String where) {
        return new Coupled(rows, where);
    }

    private void difference(String object, List<Integer> members, List<Integer> mains, List<Integer> partners) {
        int best = members.get(0);
        for (int i : members) {
            if (weight(i) > weight(best)) {
                best = i;
            }
        }
        pivots.put(object, best);
        for (int i : members) {
            if (i != best) {
                mains.add(i);
                partners.add(best);
            }
        }
    }

    private double weight(int row) {
        return Math.abs(source.coefficients()[row]) / Math.sqrt(source.covariance(row, row));
    }

    private double[][] covariance() {
        int n = main.length;
        double[][] upper = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = i; j < n; j++) {
                double sum = source.covariance(main[i], main[j]);
                if (pivot[j] >= 0) {
                    sum -= factor[j] * source.covariance(main[i], pivot[j]);
                }
                if (pivot[i] >= 0) {
                    sum -= factor[i] * withPivot(j, pivot[i]);
                }
                upper[i][j] = sum;
            }
        }
        return upper;
    }

    /** Covariance of difference j with the raw row p. */
    private double withPivot(int j, int p) {
        double sum = source.covariance(main[j], p);
        return pivot[j] < 0 ? sum : sum - factor[j] * source.covariance(pivot[j], p);
    }

    private double[][] differences() {
        double[][] out = new double[main.length][];
        for (int i = 0; i < out.length; i++) {
            out[i] = source.rows()[main[i]].clone();
            if (pivot[i] >= 0) {
                double[] row = source.rows()[pivot[i]];
                for (int k = 0; k < row.length; k++) {
                    out[i][k] -= factor[i] * row[k];
                }
            }
        }
        return out;
    }

    private double[] lengths() {
        double[] sum = new double[source.unknowns().size()];
        for (int i = 0; i < source.rows().length; i++) {
            double variance = source.covariance(i, i);
            for (int j = 0; j < sum.length; j++) {
                double x = source.rows()[i][j];
                sum[j] += variance == 0 ? 0 : x * x / variance;
            }
        }
        for (int j = 0; j < sum.length; j++) {
            sum[j] = Math.sqrt(sum[j]);
        }
        return sum;
    }

    /**
     * What the component says of everything but its objects' distances.
     *
     * @return its triangle
     */
    public Triangle triangle() {
        return triangle;
    }

    /**
     * The columns of readings.
     *
     * @return names in order
     */
    public Unknowns unknowns() {
        return source.unknowns();
    }

    /**
     * The objects whose distances were eliminated.
     *
     * @return ascending names
     */
    public List<String> objects() {
        return List.copyOf(pivots.keySet());
    }

    /**
     * The number of differences and rows without an eliminated distance.
     *
     * @return rows that were whitened
     */
    public int size() {
        return main.length;
    }

    /**
     * The reading of one object, given all other rows of the component. Cost n^2.
     *
     * @param object one of {@link #objects()}
     * @return the conditional reading
     */
    public Reading reading(String object) {
        int p = pivots.getOrDefault(object, -1);
        if (p < 0) {
            throw new IllegalArgumentException(object + " is not in this component");
        }
        double[] dc = new double[main.length];
        for (int i = 0; i < dc.length; i++) {
            dc[i] = withPivot(i, p);
        }
        double[] k = cholesky.forward(dc);
        double[] row = source.rows()[p].clone();
        double length = 0;
        for (int i = 0; i < k.length; i++) {
            length += k[i] * k[i];
            for (int j = 0; j < row.length; j++) {
                row[j] -= k[i] * white[i][j];
            }
        }
        double variance = Math.max(0, source.covariance(p, p) - length);
        return new Reading(p, source.coefficients()[p], row, k, variance);
    }

    /**
     * The covariance of two readings' own errors.
     *
     * @param one a reading of this component
     * @param other another
     * @return Cov(nu, nu')
     */
    public double covariance(Reading one, Reading other) {
        if (one.pivot == other.pivot) {
            return one.variance;
        }
        double sum = source.covariance(one.pivot, other.pivot);
        for (int i = 0; i < one.k.length; i++) {
            sum -= one.k[i] * other.k[i];
        }
        return sum;
    }

    /**
     * Residuals of the raw rows, weighted by the inverse of their covariance, distances at their best: {@code C^-1 r}.
     *
     * @param unknowns values of the component's unknowns
     * @return one number for each raw row
     */
    public double[] weighted(double[] unknowns) {
        double[] w = new double[white.length];
        for (int i = 0; i < w.length; i++) {
            w[i] = white[i][unknowns.length];
            for (int j = 0; j < unknowns.length; j++) {
                w[i] -= white[i][j] * unknowns[j];
            }
        }
        double[] raw = cholesky.backward(w);
        double[] out = new double[source.rows().length];
        for (int i = 0; i < raw.length; i++) {
            out[main[i]] += raw[i];
            if (pivot[i] >= 0) {
                out[pivot[i]] -= factor[i] * raw[i];
            }
        }
        return out;
    }

    /**
     * The modulus of one object, without its error. Cost n.
     *
     * @param values values of the component's unknowns
     * @param weighted what {@link #weighted} gives for them
     * @param object one of {@link #objects()}
     * @return its modulus at these values
     */
    public double modulus(double[] values, double[] weighted, String object) {
        int p = pivots.getOrDefault(object, -1);
        double sum = source.rows()[p][values.length];
        for (int j = 0; j < values.length; j++) {
            sum -= source.rows()[p][j] * values[j];
        }
        for (int i = 0; i < weighted.length; i++) {
            sum -= source.covariance(p, i) * weighted[i];
        }
        return sum / source.coefficients()[p];
    }

    /**
     * Carries gains down to the rows as given (not whitened).
     *
     * @param alongTriangle components along the triangle's rows
     * @param readings readings whose distance is part of the value
     * @param weights factor of each of those distances in the value
     * @return gains with respect to the raw right sides
     */
    public double[] down(double[] alongTriangle, List<Reading> readings, double[] weights) {
        double[][] rows = new double[white.length][];
        Arrays.setAll(rows, i -> white[i].clone());
        double[] g = Reduction.ofRows(source.unknowns(), rows).down(alongTriangle);
        double[] out = new double[source.rows().length];
        for (int r = 0; r < readings.size(); r++) {
            Reading reading = readings.get(r);
            double f = weights[r] / reading.coefficient;
            for (int i = 0; i < g.length; i++) {
                g[i] -= f * reading.k[i];
            }
            out[reading.pivot] += f;
        }
        double[] raw = cholesky.backward(g);
        for (int i = 0; i < raw.length; i++) {
            out[main[i]] += raw[i];
            if (pivot[i] >= 0) {
                out[pivot[i]] -= factor[i] * raw[i];
            }
        }
        return out;
    }

    /** One object's reading, conditional on the other rows of its component. */
    public static final class Reading {
        private final int pivot;
        private final double coefficient;
        private final double[] row;
        private final double[] k;
        private final double variance;

        Reading(int pivot, double coefficient, double[] row, double[] k, double variance) {
            this.pivot = pivot;
            this.coefficient = coefficient;
            this.row = row;
            this.k = k;
            this.variance = variance;
        }

        /**
         * The factor of the distance.
         *
         * @return a
         */
        public double coefficient() {
            return coefficient;
        }

        /**
         * The other coefficients and the right side.
         *
         * @return p + 1 numbers, shared: do not change them
         */
        public double[] row() {
            return row;
        }

        /**
         * The variance of its own error.
         *
         * @return Var(nu)
         */
        public double variance() {
            return variance;
        }
    }
}
