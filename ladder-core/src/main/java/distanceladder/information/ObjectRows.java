package distanceladder.information;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Whitened rows that may each bear on one object: {@code a_i mu_o(i) + x_i . theta = y_i + e_i}, errors independent
 * with unit variance.
 *
 * <p>Rows are kept object by object, objects in the order of their names; rows that bear on no object stand first. The
 * object's own unknown mu (its distance) is not a column: it is eliminated ({@link Elimination}).
 */
public final class ObjectRows {
    private final Unknowns unknowns;
    private final String[] objects;
    private final int[] starts;
    private final double[] coefficients;
    private final double[][] rows;
    private final boolean[] exact;

    private ObjectRows(
            Unknowns unknowns,
            String[] objects,
            int[] starts,
            double[] coefficients,
            double[][] rows,
            boolean[] exact) {
        this.exact = exact;
        this.unknowns = unknowns;
        this.objects = objects;
        this.starts = starts;
        this.coefficients = coefficients;
        this.rows = rows;
    }

    /**
     * Takes rows that are already in order; the arrays are handed over and must not change afterwards.
     *
     * @param unknowns columns of the rows
     * @param objects for each row its object's name, "" for none; equal names adjacent, names ascending
     * @param coefficients for each row the factor of its object's distance; not zero where there is an object
     * @param rows each p coefficients and the right side, whitened
     * @return the rows
     */
    public static ObjectRows of(Unknowns unknowns, String[] objects, double[] coefficients, double[][] rows) {
        return of(unknowns, objects, coefficients, rows, new boolean[rows.length]);
    }

    /**
     * As above, some of the rows without any error.
     *
     * @param unknowns columns of the rows
     * @param objects for each row its object's name, "" for none
     * @param coefficients for each row the factor of its object's distance
     * @param rows each p coefficients and the right side, whitened unless exact
     * @param exact which rows are exact; each of these has an object
     * @return the rows
     */
    public static ObjectRows of(
            Unknowns unknowns, String[] objects, double[] coefficients, double[][] rows, boolean[] exact) {
        List<String> names = new ArrayList<>();
        int[] starts = new int[rows.length + 1];
        for (int i = 0; i < rows.length; i++) {
            String name = objects[i];
            if (!name.isEmpty()
                    && (names.isEmpty() || !names.get(names.size() - 1).equals(name))) {
                starts[names.size()] = i;
                names.add(name);
            }
        }
        starts[names.size()] = rows.length;
        return new ObjectRows(
                unknowns,
                names.toArray(new String[0]),
                Arrays.copyOf(starts, names.size() + 1),
                coefficients,
                rows,
                exact);
    }

    /**
     * Puts readings of the same objects one under the other: the rows of a meeting.
     *
     * @param parts readings from several sides, in the order of the sides' names
     * @param objects the objects that meet, ascending, each present in every part
     * @return for each object one row of each part
     */
    public static ObjectRows meeting(List<Readings> parts, List<String> objects) {
        List<Unknowns> columns = new ArrayList<>();
        parts.forEach(part -> columns.add(part.unknowns()));
        Unknowns union = Unknowns.union(columns);
        int k = parts.size();
        int n = objects.size() * k;
        String[] names = new String[n];
        double[] a = new double[n];
        double[][] rows = new double[n][];
        boolean[] exact = new boolean[n];
        for (int s = 0; s < k; s++) {
            Readings part = parts.get(s);
            int[] at = part.unknowns().columnsIn(union);
            for (int o = 0; o < objects.size(); o++) {
                int i = o * k + s;
                int index = part.require(objects.get(o));
                names[i] = objects.get(o);
                a[i] = part.coefficient(index);
                exact[i] = part.exact(index);
                rows[i] = spread(part.row(index), at, union.size());
            }
        }
        return of(union, names, a, rows, exact);
    }

    static double[] spread(double[] row, int[] at, int size) {
        double[] out = new double[size + 1];
        for (int j = 0; j < at.length; j++) {
            out[at[j]] = row[j];
        }
        out[size] = row[at.length];
        return out;
    }

    /**
     * The columns.
     *
     * @return names in order
     */
    public Unknowns unknowns() {
        return unknowns;
    }

    /**
     * How many rows there are.
     *
     * @return number of rows
     */
    public int size() {
        return rows.length;
    }

    int objectCount() {
        return objects.length;
    }

    String[] objects() {
        return objects;
    }

    /** First row of an object; the number of rows for an index one past the last. */
    int start(int object) {
        return starts[object];
    }

    double coefficient(int row) {
        return coefficients[row];
    }

    boolean exact(int row) {
        return exact[row];
    }

    double[] row(int row) {
        return rows[row];
    }
}
