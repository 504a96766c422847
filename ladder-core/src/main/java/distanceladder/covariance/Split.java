package distanceladder.covariance;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A covariance as a whitened part and carried columns: {@code C = diag(d) + blocks + V VT}.
 *
 * <p>The whitened part is small in every row: a variance, or a dense block of values that are tied together. The
 * columns V are private sources of unit variance that are carried as unknowns, so a low-rank update is never formed and
 * never whitened. An index that is in a block has the diagonal 0, and the block holds all of its whitened part; blocks
 * are disjoint. A column of zeros is left out.
 *
 * <p>Cost: n (1 + q) numbers for q columns, and the blocks.
 */
public final class Split {
    private static final double[] NOTHING = {};

    private final double[] diagonal;
    private final List<Block> blocks;
    private final double[][] columns;

    /** Takes over all arrays. */
    Split(double[] diagonal, List<Block> blocks, double[][] columns) {
        this.diagonal = diagonal;
        this.blocks = blocks.stream()
                .sorted((a, b) -> Integer.compare(a.index(0), b.index(0)))
                .toList();
        this.columns = columns;
    }

    static double[][] noColumns(int rows) {
        double[][] none = new double[rows][];
        Arrays.fill(none, NOTHING);
        return none;
    }

    /** Rows of one table beside rows of another. */
    static double[][] beside(double[][] left, double[][] right) {
        if (left.length == 0 || right[0].length == 0) {
            return left;
        }
        if (left[0].length == 0) {
            return right;
        }
        double[][] joined = new double[left.length][];
        for (int i = 0; i < left.length; i++) {
            joined[i] = Arrays.copyOf(left[i], left[i].length + right[i].length);
            System.arraycopy(right[i], 0, joined[i], left[i].length, right[i].length);
        }
        return joined;
    }

    /** The split of a sum: whitened parts added, where blocks that overlap become one; columns joined. */
    static Split sum(List<Split> splits) {
        int n = splits.get(0).diagonal.length;
        double[] diagonal = new double[n];
        double[][] columns = noColumns(n);
        Groups groups = new Groups(n);
        boolean tied = false;
        for (Split split : splits) {
            for (int i = 0; i < n; i++) {
                diagonal[i] += split.diagonal[i];
            }
            columns = beside(columns, split.columns);
            for (Block block : split.blocks) {
                tied = true;
                for (int k = 1; k < block.size(); k++) {
                    groups.join(block.index(0), block.index(k));
                }
            }
        }
        List<Block> blocks = tied ? added(groups.larger(), splits, diagonal) : List.of();
        return new Split(diagonal, blocks, columns);
    }

    /** The blocks of a sum; moves the diagonal of their indices into them. */
    private static List<Block> added(List<int[]> groups, List<Split> splits, double[] diagonal) {
        int[] owner = new int[diagonal.length];
        int[] local = new int[diagonal.length];
        List<Block> blocks = new ArrayList<>();
        for (int[] group : groups) {
            double[][] entries = new double[group.length][group.length];
            for (int k = 0; k < group.length; k++) {
                owner[group[k]] = blocks.size();
                local[group[k]] = k;
                entries[k][k] = diagonal[group[k]];
                diagonal[group[k]] = 0;
            }
            blocks.add(Block.of(group, entries));
        }
        for (Split split : splits) {
            for (Block block : split.blocks) {
                add(block, blocks.get(owner[block.index(0)]).shared(), local);
            }
        }
        return blocks;
    }

    private static void add(Block block, double[][] target, int[] local) {
        double[][] from = block.shared();
        for (int i = 0; i < from.length; i++) {
            double[] row = target[local[block.index(i)]];
            for (int j = 0; j < from.length; j++) {
                row[local[block.index(j)]] += from[i][j];
            }
        }
    }

    /**
     * The variances of the values that are in no block.
     *
     * @return a fresh array of n numbers, 0 for a value that is in a block
     */
    public double[] diagonal() {
        return diagonal.clone();
    }

    /**
     * The dense blocks.
     *
     * @return disjoint, in the order of their first indices
     */
    public List<Block> blocks() {
        return blocks;
    }

    /**
     * The carried columns V.
     *
     * @return a fresh array of n rows and q columns
     */
    public double[][] columns() {
        double[][] copy = new double[columns.length][];
        for (int i = 0; i < columns.length; i++) {
            copy[i] = columns[i].length == 0 ? NOTHING : columns[i].clone();
        }
        return copy;
    }

    /**
     * How many columns are carried.
     *
     * @return q, 0 or more
     */
    public int columnCount() {
        return columns.length == 0 ? 0 : columns[0].length;
    }

    int size() {
        return diagonal.length;
    }

    double variance(int i) {
        return diagonal[i];
    }

    double[][] sharedColumns() {
        return columns;
    }

    @Override
    public String toString() {
        return "split of " + diagonal.length + " values: " + blocks.size() + " blocks, " + columnCount()
                + " carried columns";
    }
}
