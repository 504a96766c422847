package distanceladder.information;

import java.util.Arrays;
import java.util.List;

/**
 * For each of some objects the one row in which a set of rows still speaks of its distance:
 * {@code a mu + x . theta = y + e}, errors independent with unit variance.
 *
 * <p>Everything else that those rows say is in the triangle that {@link Elimination} leaves beside the readings.
 */
public final class Readings {
    private final Unknowns unknowns;
    private final String[] objects;
    private final double[] coefficients;
    private final double[][] rows;
    private final boolean[] exact;

    Readings(Unknowns unknowns, String[] objects, double[] coefficients, double[][] rows, boolean[] exact) {
        this.exact = exact;
        this.unknowns = unknowns;
        this.objects = objects;
        this.coefficients = coefficients;
        this.rows = rows;
    }

    /**
     * The columns of each row.
     *
     * @return names in order
     */
    public Unknowns unknowns() {
        return unknowns;
    }

    /**
     * The objects, ascending.
     *
     * @return an unmodifiable list
     */
    public List<String> objects() {
        return List.of(objects);
    }

    /**
     * Where an object stands.
     *
     * @param object its name
     * @return index, or a negative number when it has no reading here
     */
    public int index(String object) {
        return Arrays.binarySearch(objects, object);
    }

    int require(String object) {
        int index = index(object);
        if (index < 0) {
            throw new IllegalArgumentException("no reading of " + object);
        }
        return index;
    }

    /**
     * The factor of the object's distance.
     *
     * @param index object
     * @return a, not zero; 1/|a| is the reading's own standard deviation
     */
    public double coefficient(int index) {
        return coefficients[index];
    }

    /**
     * Whether a reading has no error: the distance is then fixed by the other unknowns.
     *
     * @param index object
     * @return true for a constraint
     */
    public boolean exact(int index) {
        return exact[index];
    }

    /**
     * The other coefficients and the right side.
     *
     * @param index object
     * @return p + 1 numbers, shared: do not change them
     */
    public double[] row(int index) {
        return rows[index];
    }

    /**
     * Some of the readings with the distances kept as unknowns, as a triangle.
     *
     * @param kept the objects to take, ascending, each present here
     * @param naming gives the unknown's name for an object's distance
     * @return triangle over the columns here and those distances
     */
    public Triangle keeping(List<String> kept, java.util.function.UnaryOperator<String> naming) {
        return keepingRows(kept, naming).triangle();
    }

    /**
     * As {@link #keeping}, with the reflections; its rows are the kept objects' readings in order.
     *
     * @param kept the objects to take
     * @param naming gives the unknown's name for an object's distance
     * @return the reduction
     */
    public Reduction keepingRows(List<String> kept, java.util.function.UnaryOperator<String> naming) {
        Unknowns all = Unknowns.union(
                List.of(unknowns, Unknowns.of(kept.stream().map(naming).toList())));
        int[] at = unknowns.columnsIn(all);
        double[][] out = new double[kept.size()][];
        for (int i = 0; i < out.length; i++) {
            int index = require(kept.get(i));
            out[i] = ObjectRows.spread(rows[index], at, all.size());
            out[i][all.column(naming.apply(kept.get(i)))] = coefficients[index];
        }
        return Reduction.ofRows(all, out);
    }
}
