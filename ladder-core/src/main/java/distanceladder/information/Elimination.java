package distanceladder.information;

import java.util.Arrays;

/**
 * Eliminates each object's distance from its rows.
 *
 * <p>For an object with k rows {@code a_i mu + x_i . theta = y_i + e_i} one reflection H turns the column a into
 * {@code (alpha, 0, ..., 0)}: the first row of {@code H [a | x | y]} is the object's <em>reading</em>, which still holds
 * mu; the other k - 1 rows hold none and go, with the rows of no object, into the <em>own triangle</em>. First stands
 * the row with the largest |a|: a precise row under a loose one would leave its rounding errors in it (row-wise
 * stability: Cox and Higham 1998). Since H is orthogonal, reading and rows are independent and together say what the k rows said (Bierman 1977, chapter 4). With
 * one row nothing is left but the reading: a lone row says nothing of anything but its object.
 *
 * <p>Cost: 4 k p for an object, then the triangle of all left-over rows.
 */
public final class Elimination {
    private final ObjectRows source;
    private final Triangle own;
    private final Readings readings;

    private Elimination(ObjectRows source, Triangle own, Readings readings) {
        this.source = source;
        this.own = own;
        this.readings = readings;
    }

    /**
     * Eliminates all distances.
     *
     * @param rows whitened rows
     * @return own triangle and readings
     */
    public static Elimination of(ObjectRows rows) {
        Work work = new Work(rows);
        int n = rows.objectCount();
        double[] a = new double[n];
        double[][] reading = new double[n][];
        for (int o = 0; o < n; o++) {
            a[o] = work.alpha(o);
            reading[o] = work.turned[work.lead[o]];
        }
        Triangle own = work.reduce().triangle().withLengths(work.lengths);
        return new Elimination(rows, own, new Readings(rows.unknowns(), rows.objects(), a, reading));
    }

    /**
     * What the rows say of everything but distances.
     *
     * @return the own triangle, its column lengths those of all rows
     */
    public Triangle own() {
        return own;
    }

    /**
     * What the rows say of distances.
     *
     * @return one reading for each object
     */
    public Readings readings() {
        return readings;
    }

    /**
     * The rows that were eliminated.
     *
     * @return the rows as given
     */
    public ObjectRows rows() {
        return source;
    }

    /**
     * Carries gains down to the rows.
     *
     * @param alongOwn components along the own triangle's rows
     * @param alongReadings components along the readings, one for each object
     * @return components along the rows
     */
    public double[] down(double[] alongOwn, double[] alongReadings) {
        Work work = new Work(source);
        double[] left = Arrays.stream(alongOwn).allMatch(x -> x == 0)
                ? new double[work.leftOver()]
                : work.reduce().down(alongOwn);
        double[] out = new double[source.size()];
        int free = source.objectCount() == 0 ? source.size() : source.start(0);
        System.arraycopy(left, 0, out, 0, free);
        int next = free;
        for (int o = 0; o < source.objectCount(); o++) {
            int from = source.start(o);
            int to = source.start(o + 1);
            for (int i = from; i < to; i++) {
                out[i] = i == work.lead[o] ? alongReadings[o] : left[next++];
            }
            if (to - from > 1) {
                work.reflect(o, out);
            }
        }
        return out;
    }

    /** One run over the rows: turned copies, and the reflections' vectors by object. */
    private static final class Work {
        private final ObjectRows rows;
        private final double[][] turned;
        private final double[] lengths;
        private final int[] lead;

        Work(ObjectRows rows) {
            this.rows = rows;
            this.turned = new double[rows.size()][];
            this.lengths = new double[rows.unknowns().size()];
            for (int i = 0; i < turned.length; i++) {
                turned[i] = rows.row(i).clone();
                for (int j = 0; j < lengths.length; j++) {
                    lengths[j] += turned[i][j] * turned[i][j];
                }
            }
            for (int j = 0; j < lengths.length; j++) {
                lengths[j] = Math.sqrt(lengths[j]);
            }
            this.lead = new int[rows.objectCount()];
            for (int o = 0; o < lead.length; o++) {
                lead[o] = largest(o);
                if (rows.start(o + 1) - rows.start(o) > 1) {
                    turn(o);
                }
            }
        }

        private int largest(int object) {
            int at = rows.start(object);
            for (int i = at + 1; i < rows.start(object + 1); i++) {
                if (Math.abs(rows.coefficient(i)) > Math.abs(rows.coefficient(at))) {
                    at = i;
                }
            }
            return at;
        }

        private double norm(int object) {
            double sum = 0;
            for (int i = rows.start(object); i < rows.start(object + 1); i++) {
                sum += rows.coefficient(i) * rows.coefficient(i);
            }
            return Math.sqrt(sum);
        }

        double alpha(int object) {
            double first = rows.coefficient(lead[object]);
            if (rows.start(object + 1) - rows.start(object) == 1) {
                return first;
            }
            return first > 0 ? -norm(object) : norm(object);
        }

        private double head(int object) {
            return rows.coefficient(lead[object]) - alpha(object);
        }

        private double beta(int object) {
            double s = norm(object);
            return 1 / (s * (s + Math.abs(rows.coefficient(lead[object]))));
        }

        private void turn(int object) {
            int from = rows.start(object);
            int to = rows.start(object + 1);
            double head = head(object);
            double beta = beta(object);
            double[] first = turned[lead[object]];
            double[] w = new double[first.length];
            for (int k = 0; k < w.length; k++) {
                w[k] = head * first[k];
            }
            for (int i = from; i < to; i++) {
                double v = i == lead[object] ? 0 : rows.coefficient(i);
                for (int k = 0; k < w.length; k++) {
                    w[k] += v * turned[i][k];
                }
            }
            for (int k = 0; k < w.length; k++) {
                w[k] *= beta;
                first[k] -= head * w[k];
            }
            for (int i = from; i < to; i++) {
                double v = i == lead[object] ? 0 : rows.coefficient(i);
                for (int k = 0; k < w.length; k++) {
                    turned[i][k] -= v * w[k];
                }
            }
        }

        /** The same reflection on one vector, in place. */
        void reflect(int object, double[] x) {
            int from = rows.start(object);
            int to = rows.start(object + 1);
            double head = head(object);
            double w = head * x[lead[object]];
            for (int i = from; i < to; i++) {
                w += i == lead[object] ? 0 : rows.coefficient(i) * x[i];
            }
            w *= beta(object);
            x[lead[object]] -= head * w;
            for (int i = from; i < to; i++) {
                x[i] -= i == lead[object] ? 0 : rows.coefficient(i) * w;
            }
        }

        int leftOver() {
            return rows.size() - rows.objectCount();
        }

        Reduction reduce() {
            double[][] left = new double[leftOver()][];
            int free = rows.objectCount() == 0 ? rows.size() : rows.start(0);
            int next = 0;
            for (int i = 0; i < free; i++) {
                left[next++] = turned[i];
            }
            for (int o = 0; o < rows.objectCount(); o++) {
                for (int i = rows.start(o); i < rows.start(o + 1); i++) {
                    if (i != lead[o]) {
                        left[next++] = turned[i];
                    }
                }
            }
            return Reduction.ofRows(rows.unknowns(), left);
        }
    }
}
