package distanceladder.covariance;

import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * The covariance of independent groups of values: block-diagonal, each block a covariance of any kind.
 *
 * <p>Values of different blocks have covariance 0. Cost: what the blocks cost.
 */
public final class Blocks implements Covariance {
    private static final String KIND = "block-diagonal covariance";

    private final Covariance[] parts;
    private final int[][] places;
    private final int[] owner;
    private final int[] local;

    private Blocks(Covariance[] parts, int[][] places) {
        this.parts = parts;
        this.places = places;
        int n = 0;
        for (int[] place : places) {
            n += place.length;
        }
        owner = new int[n];
        local = new int[n];
        for (int k = 0; k < places.length; k++) {
            for (int i = 0; i < places[k].length; i++) {
                owner[places[k][i]] = k;
                local[places[k][i]] = i;
            }
        }
    }

    /**
     * Blocks one after the other.
     *
     * @param parts the blocks, in order
     * @return the covariance of all their values
     * @throws ValueFault if there are more values than an index can count
     */
    public static Blocks of(Covariance... parts) {
        long count = 0;
        for (Covariance part : parts) {
            count += part.size();
        }
        if (count > Integer.MAX_VALUE) {
            throw new ValueFault(count + " values", "a covariance has fewer than 2^31", KIND, "use fewer blocks");
        }
        int[][] places = new int[parts.length][];
        int next = 0;
        for (int k = 0; k < parts.length; k++) {
            places[k] = new int[parts[k].size()];
            for (int i = 0; i < places[k].length; i++) {
                places[k][i] = next++;
            }
        }
        return new Blocks(parts.clone(), places);
    }

    @Override
    public int size() {
        return owner.length;
    }

    @Override
    public double entry(int i, int j) {
        Border.index(i, owner.length, KIND);
        Border.index(j, owner.length, KIND);
        return owner[i] == owner[j] ? parts[owner[i]].entry(local[i], local[j]) : 0;
    }

    @Override
    public Blocks part(int... indices) {
        Border.indices(indices, owner.length, KIND);
        int[] counts = new int[parts.length];
        for (int i : indices) {
            counts[owner[i]]++;
        }
        int[][] chosen = new int[parts.length][];
        int[][] moved = new int[parts.length][];
        for (int k = 0; k < parts.length; k++) {
            chosen[k] = new int[counts[k]];
            moved[k] = new int[counts[k]];
        }
        int[] filled = new int[parts.length];
        for (int place = 0; place < indices.length; place++) {
            int k = owner[indices[place]];
            chosen[k][filled[k]] = local[indices[place]];
            moved[k][filled[k]++] = place;
        }
        List<Covariance> kept = new ArrayList<>();
        List<int[]> keptPlaces = new ArrayList<>();
        for (int k = 0; k < parts.length; k++) {
            if (counts[k] > 0) {
                kept.add(parts[k].part(chosen[k]));
                keptPlaces.add(moved[k]);
            }
        }
        return new Blocks(kept.toArray(Covariance[]::new), keptPlaces.toArray(int[][]::new));
    }

    @Override
    public double bilinear(double[] a, double[] b) {
        Border.lengths(a, b, owner.length, KIND);
        double sum = 0;
        for (int k = 0; k < parts.length; k++) {
            sum += parts[k].bilinear(gathered(a, places[k]), gathered(b, places[k]));
        }
        return sum;
    }

    private static double[] gathered(double[] vector, int[] places) {
        double[] gathered = new double[places.length];
        for (int i = 0; i < places.length; i++) {
            gathered[i] = vector[places[i]];
        }
        return gathered;
    }

    @Override
    public Blocks scaled(double factor) {
        Border.factor(factor, KIND);
        Covariance[] scaled = new Covariance[parts.length];
        for (int k = 0; k < parts.length; k++) {
            scaled[k] = parts[k].scaled(factor);
        }
        return new Blocks(scaled, places);
    }

    @Override
    public Split split() {
        double[] diagonal = new double[owner.length];
        List<Block> blocks = new ArrayList<>();
        Split[] splits = new Split[parts.length];
        int columns = 0;
        for (int k = 0; k < parts.length; k++) {
            splits[k] = parts[k].split();
            columns += splits[k].columnCount();
            for (int i = 0; i < places[k].length; i++) {
                diagonal[places[k][i]] = splits[k].variance(i);
            }
            for (Block block : splits[k].blocks()) {
                blocks.add(block.moved(places[k]));
            }
        }
        return new Split(diagonal, blocks, carried(splits, columns));
    }

    private double[][] carried(Split[] splits, int columns) {
        if (columns == 0) {
            return Split.noColumns(owner.length);
        }
        double[][] carried = new double[owner.length][columns];
        int from = 0;
        for (int k = 0; k < parts.length; k++) {
            int count = splits[k].columnCount();
            double[][] rows = splits[k].sharedColumns();
            for (int i = 0; i < rows.length; i++) {
                System.arraycopy(rows[i], 0, carried[places[k][i]], from, count);
            }
            from += count;
        }
        return carried;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Blocks that
                && Arrays.equals(parts, that.parts)
                && Arrays.deepEquals(places, that.places);
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(parts) + Arrays.deepHashCode(places);
    }

    @Override
    public String toString() {
        return "block-diagonal covariance of " + owner.length + " values in " + parts.length + " blocks";
    }
}
