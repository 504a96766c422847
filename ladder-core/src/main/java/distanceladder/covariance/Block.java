package distanceladder.covariance;

import java.util.stream.IntStream;

/**
 * A dense block of a {@link Split}: some of the values, and their covariance, which holds their whole whitened part.
 *
 * <p>Local positions count from 0 in the order of {@link #indices()}, which ascend.
 */
public final class Block {
    private final int[] indices;
    private final double[][] entries;

    private Block(int[] indices, double[][] entries) {
        this.indices = indices;
        this.entries = entries;
    }

    /** Takes over both arrays; the indices in any order. */
    static Block of(int[] indices, double[][] entries) {
        if (ascending(indices)) {
            return new Block(indices, entries);
        }
        int[] order = IntStream.range(0, indices.length)
                .boxed()
                .sorted((a, b) -> Integer.compare(indices[a], indices[b]))
                .mapToInt(Integer::intValue)
                .toArray();
        int[] sorted = IntStream.of(order).map(k -> indices[k]).toArray();
        return new Block(sorted, chosen(entries, order));
    }

    private static boolean ascending(int[] indices) {
        for (int k = 1; k < indices.length; k++) {
            if (indices[k - 1] > indices[k]) {
                return false;
            }
        }
        return true;
    }

    static double[][] chosen(double[][] entries, int[] order) {
        double[][] chosen = new double[order.length][order.length];
        for (int i = 0; i < order.length; i++) {
            double[] from = entries[order[i]];
            for (int j = 0; j < order.length; j++) {
                chosen[i][j] = from[order[j]];
            }
        }
        return chosen;
    }

    /** The same block of a larger covariance. */
    Block moved(int[] places) {
        return of(IntStream.of(indices).map(i -> places[i]).toArray(), entries);
    }

    /**
     * How many values the block ties together.
     *
     * @return 2 or more
     */
    public int size() {
        return indices.length;
    }

    /**
     * Which values the block ties together.
     *
     * @return a fresh array, ascending
     */
    public int[] indices() {
        return indices.clone();
    }

    int index(int local) {
        return indices[local];
    }

    /**
     * One entry of the block.
     *
     * @param i local row, from 0
     * @param j local column, from 0
     * @return the covariance
     * @throws distanceladder.text.ValueFault if a position is outside the block
     */
    public double entry(int i, int j) {
        Border.index(i, indices.length, "block of a covariance");
        Border.index(j, indices.length, "block of a covariance");
        return entries[i][j];
    }

    /**
     * One row of the block.
     *
     * @param i local row, from 0
     * @return a fresh array
     * @throws distanceladder.text.ValueFault if the position is outside the block
     */
    public double[] row(int i) {
        Border.index(i, indices.length, "block of a covariance");
        return entries[i].clone();
    }

    double[][] shared() {
        return entries;
    }

    @Override
    public String toString() {
        return "block of " + indices.length + " values, from " + indices[0] + " on";
    }
}
