package distanceladder.ladder;

import distanceladder.information.ObjectRows;
import distanceladder.information.Prior;
import distanceladder.information.Unknowns;
import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * The rows of one rung, sorted by object and datum, divided by their errors where these are independent.
 *
 * <p>Rows of dense groups stay raw; columns of a low-rank update are carried as private unknowns of unit variance; exact
 * rows are not divided.
 */
final class Whitened {
    /** Rows that share dense noise, not divided by anything; the noise is the rung's own part. */
    record BlockRows(
            String name,
            String link,
            int[] data,
            String[] objects,
            double[] coefficients,
            double[][] rows,
            double[][] noise) {}

    private final Definition definition;
    private final Linearised linear;
    private final RungNoise noise;
    private final Unknowns unknowns;
    private final ObjectRows free;
    private final int[] freeData;
    private final List<BlockRows> blocks = new ArrayList<>();
    private final int[] tied;

    Whitened(Definition definition, Linearised linear, double scatter) {
        this.definition = definition;
        this.linear = linear;
        int[] order = order();
        this.noise = new RungNoise(definition, order, linear.extra(), scatter);
        List<String> all = new ArrayList<>(linear.unknowns().asList());
        for (int q = 0; q < noise.columns(); q++) {
            all.add(privateName(q));
        }
        this.unknowns = Unknowns.of(all);
        boolean[] grouped = new boolean[order.length];
        for (RungNoise.Group group : noise.groups()) {
            Arrays.stream(group.data()).forEach(i -> grouped[i] = true);
            blocks.add(blockRows(group));
        }
        int[] alone = IntStream.of(order).filter(i -> !grouped[i]).toArray();
        for (int i : alone) {
            noise.requireError(i, !object(i).isEmpty());
        }
        freeData = IntStream.of(alone).filter(i -> linear.ties(i).isEmpty()).toArray();
        tied = IntStream.of(alone).filter(i -> !linear.ties(i).isEmpty()).toArray();
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
    double[] raw(int datum) {
        double[] from = linear.rows()[datum];
        double[] row = new double[unknowns.size() + 1];
        for (int j = 0; j < linear.unknowns().size(); j++) {
            row[unknowns.column(linear.unknowns().name(j))] = from[j];
        }
        for (int q = 0; q < noise.columns(); q++) {
            row[unknowns.column(privateName(q))] = noise.carried(datum, q);
        }
        row[unknowns.size()] = from[linear.unknowns().size()];
        return row;
    }

    private ObjectRows freeRows() {
        int n = freeData.length;
        String[] objects = new String[n];
        double[] a = new double[n];
        double[][] rows = new double[n][];
        boolean[] exact = new boolean[n];
        Arrays.fill(exact, noise.exact());
        for (int k = 0; k < n; k++) {
            int i = freeData[k];
            objects[k] = object(i);
            a[k] = linear.coefficients()[i] / sigma(i);
            rows[k] = divided(raw(i), sigma(i));
        }
        return ObjectRows.of(unknowns, objects, a, rows, exact);
    }

    private static double[] divided(double[] row, double sigma) {
        for (int j = 0; j < row.length; j++) {
            row[j] /= sigma;
        }
        return row;
    }

    private BlockRows blockRows(RungNoise.Group group) {
        int[] data = group.data();
        String[] objects = new String[data.length];
        double[] a = new double[data.length];
        double[][] rows = new double[data.length][];
        for (int k = 0; k < data.length; k++) {
            objects[k] = object(data[k]);
            a[k] = linear.coefficients()[data[k]];
            rows[k] = raw(data[k]);
        }
        String link = group.joint() ? definition.noise().joint().orElseThrow().name() : "";
        return new BlockRows(
                definition.name() + " block " + (blocks.size() + 1), link, data, objects, a, rows, group.matrix());
    }

    /** Rows with a tie, divided by their errors, on the unknowns and the distances that they bear on. */
    double[][] tiedRows(Unknowns wider) {
        double[][] out = new double[tied.length][];
        for (int k = 0; k < tied.length; k++) {
            out[k] = divided(tiedRow(tied[k], raw(tied[k]), wider), sigma(tied[k]));
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

    RungNoise noise() {
        return noise;
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

    /** The error by which a datum outside all groups was divided; 1 for an exact one. */
    double sigma(int datum) {
        return noise.exact() ? 1 : Math.sqrt(noise.variance(datum));
    }

    List<BlockRows> blocks() {
        return blocks;
    }

    /** Priors of the carried columns: independent, of unit variance. */
    List<Prior> priors() {
        List<Prior> out = new ArrayList<>();
        for (int q = 0; q < noise.columns(); q++) {
            out.add(Prior.of(privateName(q), List.of(privateName(q)), new double[1], new double[][] {{1}}));
        }
        return out;
    }
}
