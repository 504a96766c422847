package distanceladder.ladder;

import distanceladder.covariance.Block;
import distanceladder.covariance.Split;
import distanceladder.information.ObjectRows;
import distanceladder.information.Prior;
import distanceladder.information.Unknowns;
import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The rows of one rung, sorted by object and datum, divided by their errors where these are independent.
 *
 * <p>The noise is split: variances are divided out, rows of dense blocks stay raw, columns of a low-rank update are
 * carried as private unknowns of unit variance.
 */
final class Whitened {
    /** Rows that share a dense block of noise, not divided by anything. */
    record BlockRows(String name, int[] data, String[] objects, double[] coefficients, double[][] rows, Block noise) {}

    private final Definition definition;
    private final Linearised linear;
    private final Unknowns unknowns;
    private final int columns;
    private final double[][] carried;
    private final ObjectRows free;
    private final int[] freeData;
    private final double[] sigmas;
    private final List<BlockRows> blocks = new ArrayList<>();
    private final int[] tied;

    Whitened(Definition definition, Linearised linear) {
        this.definition = definition;
        this.linear = linear;
        int[] order = order();
        Split split = definition.noise().covariance().part(order).split();
        this.columns = split.columnCount();
        List<String> all = new ArrayList<>(linear.unknowns().asList());
        for (int q = 0; q < columns; q++) {
            all.add(privateName(q));
        }
        this.unknowns = Unknowns.of(all);
        double[] variances = split.diagonal();
        double scatter = definition.noise().scatter();
        this.sigmas = new double[variances.length];
        boolean[] inBlock = new boolean[variances.length];
        double[][] columnsOf = split.columns();
        this.carried = new double[order.length][];
        for (int k = 0; k < order.length; k++) {
            sigmas[order[k]] = Math.sqrt(variances[k] + scatter * scatter);
            carried[order[k]] = columnsOf[k];
        }
        for (Block block : split.blocks()) {
            blocks.add(blockRows(block, order, inBlock));
        }
        freeData = IntStream.of(order)
                .filter(i -> !inBlock[i] && linear.ties(i).isEmpty())
                .toArray();
        tied = IntStream.of(order)
                .filter(i -> !inBlock[i] && !linear.ties(i).isEmpty())
                .toArray();
        this.free = freeRows();
    }

    private String privateName(int q) {
        return definition.name() + " common error " + (q + 1);
    }

    private int[] order() {
        List<String> names = definition.data().names();
        return IntStream.range(0, names.size())
                .boxed()
                .sorted(Comparator.comparing(this::object).thenComparing(names::get))
                .mapToInt(i -> i)
                .toArray();
    }

    private String object(int datum) {
        return linear.coefficients()[datum] == 0
                ? ""
                : definition.data().objects().get(datum);
    }

    /** A datum's parameters, carried columns and right side, on the unknowns of this rung. */
    private double[] raw(int datum) {
        double[] from = linear.rows()[datum];
        double[] row = new double[unknowns.size() + 1];
        for (int j = 0; j < linear.unknowns().size(); j++) {
            row[unknowns.column(linear.unknowns().name(j))] = from[j];
        }
        for (int q = 0; q < columns; q++) {
            row[unknowns.column(privateName(q))] = carried[datum][q];
        }
        row[unknowns.size()] = from[linear.unknowns().size()];
        return row;
    }

    private ObjectRows freeRows() {
        int n = freeData.length;
        String[] objects = new String[n];
        double[] a = new double[n];
        double[][] rows = new double[n][];
        for (int k = 0; k < n; k++) {
            int i = freeData[k];
            objects[k] = object(i);
            a[k] = linear.coefficients()[i] / sigmas[i];
            rows[k] = divided(raw(i), sigmas[i]);
        }
        return ObjectRows.of(unknowns, objects, a, rows);
    }

    private static double[] divided(double[] row, double sigma) {
        for (int j = 0; j < row.length; j++) {
            row[j] /= sigma;
        }
        return row;
    }

    private BlockRows blockRows(Block block, int[] order, boolean[] inBlock) {
        int[] data = IntStream.of(block.indices()).map(k -> order[k]).toArray();
        String[] objects = new String[data.length];
        double[] a = new double[data.length];
        double[][] rows = new double[data.length][];
        for (int k = 0; k < data.length; k++) {
            int i = data[k];
            inBlock[i] = true;
            objects[k] = object(i);
            a[k] = linear.coefficients()[i];
            rows[k] = raw(i);
        }
        return new BlockRows(definition.name() + " block " + (blocks.size() + 1), data, objects, a, rows, block);
    }

    /** Rows with a tie, divided by their errors, on the unknowns and the distances that they bear on. */
    double[][] tiedRows(Unknowns wider) {
        double[][] out = new double[tied.length][];
        for (int k = 0; k < tied.length; k++) {
            out[k] = divided(tiedRow(tied[k], raw(tied[k]), wider), sigmas[tied[k]]);
        }
        return out;
    }

    /** A raw row with its ties, on a wider set of unknowns. */
    double[] tiedRow(int datum, double[] raw, Unknowns wider) {
        double[] row = new double[wider.size() + 1];
        int[] at = unknowns.columnsIn(wider);
        for (int j = 0; j < at.length; j++) {
            row[at[j]] = raw[j];
        }
        for (Linearised.Tie tie : linear.ties(datum)) {
            row[wider.column(Ladder.unknown(tie.object()))] += tie.coefficient();
        }
        row[wider.size()] = raw[unknowns.size()];
        return row;
    }

    /** The objects that rows with several objects bear on. */
    List<String> tiedObjects() {
        return linear.ties().stream()
                .flatMap(List::stream)
                .map(Linearised.Tie::object)
                .distinct()
                .sorted()
                .toList();
    }

    int[] tiedData() {
        return tied;
    }

    Definition definition() {
        return definition;
    }

    Linearised linear() {
        return linear;
    }

    Unknowns unknowns() {
        return unknowns;
    }

    ObjectRows free() {
        return free;
    }

    int[] freeData() {
        return freeData;
    }

    /** The error by which a datum outside all blocks was divided. */
    double sigma(int datum) {
        return sigmas[datum];
    }

    List<BlockRows> blocks() {
        return blocks;
    }

    double scatter() {
        return definition.noise().scatter();
    }

    /** Priors of the carried columns: independent, of unit variance. */
    List<Prior> priors() {
        List<Prior> out = new ArrayList<>();
        for (int q = 0; q < columns; q++) {
            out.add(Prior.of(privateName(q), List.of(privateName(q)), new double[1], new double[][] {{1}}));
        }
        return out;
    }
}
