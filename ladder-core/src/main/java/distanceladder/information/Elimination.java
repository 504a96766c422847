package distanceladder.information;

import distanceladder.text.ValueFault;
import java.util.Arrays;

/**
 * Eliminates each object's distance from its rows.
 *
 * <p>For an object with k rows {@code a_i mu + x_i . theta = y_i + e_i} one reflection H turns the column a into
 * {@code (alpha, 0, ..., 0)}: the leading row of {@code H [a | x | y]} is the object's <em>reading</em>, which still
 * holds mu; the other k - 1 rows hold none and go, with the rows of no object, into the <em>own triangle</em>. Since H is
 * orthogonal, reading and rows are independent and together say what the k rows said (Bierman 1977, chapter 4). With one
 * row nothing is left but the reading: a lone row says nothing of anything but its object.
 *
 * <p>The row with the largest |a| leads: under a loose one, a precise row would keep its rounding errors (row-wise
 * stability: Cox and Higham 1998). An exact row leads before all others. It is a constraint, taken out of the other rows
 * by substitution, never a large weight.
 *
 * <p>Cost: 4 k p for an object, then the triangle of all left-over rows.
 */
public final class Elimination {
    private static final double AGREEMENT = 1e-12;

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
     * @throws ValueFault when two exact rows of one object disagree
     */
    public static Elimination of(ObjectRows rows) {
        Work work = new Work(rows);
        int n = rows.objectCount();
        double[] a = new double[n];
        double[][] reading = new double[n][];
        boolean[] exact = new boolean[n];
        for (int o = 0; o < n; o++) {
            a[o] = work.alpha(o);
            reading[o] = work.turned[work.lead[o]];
            exact[o] = rows.exact(work.lead[o]);
        }
        Triangle own = work.reduce().triangle().withLengths(work.lengths);
        return new Elimination(rows, own, new Readings(rows.unknowns(), rows.objects(), a, reading, exact));
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
                ? new double[source.size() - source.objectCount()]
                : work.reduce().down(alongOwn);
        double[] out = new double[source.size()];
        int free = work.free();
        System.arraycopy(left, 0, out, 0, free);
        int next = free;
        for (int o = 0; o < source.objectCount(); o++) {
            for (int i = source.start(o); i < source.start(o + 1); i++) {
                out[i] = i == work.lead[o] ? alongReadings[o] : left[next++];
            }
            work.undo(o, out);
        }
        return out;
    }

    /** One run over the rows: turned copies, and which row leads each object. */
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
                lead[o] = leading(o);
                if (rows.exact(lead[o])) {
                    substitute(o);
                } else if (rows.start(o + 1) - rows.start(o) > 1) {
                    turn(o);
                }
            }
        }

        private int leading(int object) {
            int at = rows.start(object);
            for (int i = at; i < rows.start(object + 1); i++) {
                if (rows.exact(i)) {
                    return i;
                }
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

        /** The factor of the distance in the reading. */
        double alpha(int object) {
            double first = rows.coefficient(lead[object]);
            if (rows.exact(lead[object]) || rows.start(object + 1) - rows.start(object) == 1) {
                return first;
            }
            return first > 0 ? -norm(object) : norm(object);
        }

        private double beta(int object) {
            double s = norm(object);
            return 1 / (s * (s + Math.abs(rows.coefficient(lead[object]))));
        }

        /** Element i of the reflection's vector. */
        private double vector(int object, int i) {
            return i == lead[object] ? rows.coefficient(i) - alpha(object) : rows.coefficient(i);
        }

        private void turn(int object) {
            int from = rows.start(object);
            int to = rows.start(object + 1);
            double[] w = new double[turned[from].length];
            for (int i = from; i < to; i++) {
                double v = vector(object, i);
                for (int k = 0; k < w.length; k++) {
                    w[k] += v * turned[i][k];
                }
            }
            double beta = beta(object);
            for (int i = from; i < to; i++) {
                double v = beta * vector(object, i);
                for (int k = 0; k < w.length; k++) {
                    turned[i][k] -= v * w[k];
                }
            }
        }

        /** Takes the leading, exact row out of the object's other rows. */
        private void substitute(int object) {
            int exact = lead[object];
            for (int i = rows.start(object); i < rows.start(object + 1); i++) {
                if (i == exact) {
                    continue;
                }
                double f = rows.coefficient(i) / rows.coefficient(exact);
                double size = 0;
                double left = 0;
                for (int k = 0; k < turned[i].length; k++) {
                    size = Math.max(size, Math.abs(turned[i][k]));
                    turned[i][k] -= f * rows.row(exact)[k];
                    left = Math.max(left, Math.abs(turned[i][k]));
                }
                if (rows.exact(i)) {
                    requireAgreement(object, left, size);
                    Arrays.fill(turned[i], 0);
                }
            }
        }

        private void requireAgreement(int object, double left, double size) {
            if (left > AGREEMENT * size) {
                throw new ValueFault(
                        "two exact readings of \"" + rows.objects()[object] + "\" differ by " + left,
                        "exact readings of one object agree identically",
                        "object \"" + rows.objects()[object] + "\"",
                        "give one of them an error, or take one away");
            }
        }

        /** Gains along reading and left-over rows to gains along the object's rows, in place. */
        void undo(int object, double[] x) {
            int from = rows.start(object);
            int to = rows.start(object + 1);
            int first = lead[object];
            if (rows.exact(first)) {
                for (int i = from; i < to; i++) {
                    x[first] -= i == first ? 0 : rows.coefficient(i) / rows.coefficient(first) * x[i];
                }
            } else if (to - from > 1) {
                double w = 0;
                for (int i = from; i < to; i++) {
                    w += vector(object, i) * x[i];
                }
                w *= beta(object);
                for (int i = from; i < to; i++) {
                    x[i] -= vector(object, i) * w;
                }
            }
        }

        /** How many rows bear on no object. */
        int free() {
            return rows.objectCount() == 0 ? rows.size() : rows.start(0);
        }

        Reduction reduce() {
            double[][] left = new double[rows.size() - rows.objectCount()][];
            System.arraycopy(turned, 0, left, 0, free());
            int next = free();
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
