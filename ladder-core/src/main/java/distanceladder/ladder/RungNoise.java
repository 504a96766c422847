package distanceladder.ladder;

import distanceladder.covariance.Block;
import distanceladder.covariance.Split;
import distanceladder.relation.Definition;
import distanceladder.relation.JointNoise;
import distanceladder.relation.Noise;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeSet;

/**
 * The errors of one rung's data as the engine needs them: variances that are divided out, dense groups that stay
 * together, columns that are carried as private unknowns.
 *
 * <p>Variances hold the intrinsic scatter and what uncertain columns add. Data with a part in a joint noise are one group,
 * with the dense blocks of the rung's own covariance that they touch.
 */
final class RungNoise {
    /** Data whose errors are correlated; the matrix is the rung's own part, without joint noise. */
    record Group(int[] data, double[][] matrix, boolean joint) {}

    private final Definition definition;
    private final double scatter;
    private final double[] extra;
    private final double[] variances;
    private final double[][] carried;
    private final int columns;
    private final List<Group> groups = new ArrayList<>();

    /**
     * Splits the noise.
     *
     * @param order the canonical order of data
     * @param extra variances that uncertain columns add, by datum
     * @param scatter intrinsic scatter, given or decided
     */
    RungNoise(Definition definition, int[] order, double[] extra, double scatter) {
        this.definition = definition;
        this.scatter = scatter;
        this.extra = extra;
        Split split = definition.noise().covariance().part(order).split();
        int n = order.length;
        this.variances = new double[n];
        this.carried = new double[n][];
        this.columns = split.columnCount();
        double[] diagonal = split.diagonal();
        double[][] columnsOf = split.columns();
        for (int k = 0; k < n; k++) {
            variances[order[k]] = diagonal[k] + more(order[k]);
            carried[order[k]] = columnsOf[k];
        }
        List<Block> touched = new ArrayList<>();
        for (Block block : split.blocks()) {
            if (Arrays.stream(block.indices()).anyMatch(k -> jointRow(order[k]) >= 0)) {
                touched.add(block);
            } else {
                groups.add(new Group(
                        Arrays.stream(block.indices()).map(k -> order[k]).toArray(), matrix(block, order), false));
            }
        }
        jointGroup(order, touched, diagonal);
    }

    private double more(int datum) {
        return scatter * scatter + extra[datum];
    }

    private double[][] matrix(Block block, int[] order) {
        double[][] out = new double[block.size()][];
        for (int i = 0; i < out.length; i++) {
            out[i] = block.row(i);
            out[i][i] += more(order[block.indices()[i]]);
        }
        return out;
    }

    /** All data with a part in the joint noise, and the blocks that they touch, as one group. */
    private void jointGroup(int[] order, List<Block> touched, double[] diagonal) {
        TreeSet<Integer> members = new TreeSet<>();
        for (int k = 0; k < order.length; k++) {
            if (jointRow(order[k]) >= 0) {
                members.add(k);
            }
        }
        touched.forEach(block -> Arrays.stream(block.indices()).forEach(members::add));
        if (members.isEmpty()) {
            return;
        }
        int[] at = members.stream().mapToInt(k -> k).toArray();
        double[][] matrix = new double[at.length][at.length];
        for (int i = 0; i < at.length; i++) {
            matrix[i][i] = diagonal[at[i]] + more(order[at[i]]);
        }
        for (Block block : touched) {
            int[] indices = block.indices();
            for (int i = 0; i < indices.length; i++) {
                for (int j = 0; j < indices.length; j++) {
                    matrix[Arrays.binarySearch(at, indices[i])][Arrays.binarySearch(at, indices[j])] +=
                            block.entry(i, j);
                }
            }
        }
        groups.add(new Group(Arrays.stream(at).map(k -> order[k]).toArray(), matrix, true));
    }

    /** Where a datum stands in the rung's joint noise, or -1. */
    int jointRow(int datum) {
        return definition
                .noise()
                .joint()
                .map(j -> j.row(definition.name(), definition.data().names().get(datum)))
                .orElse(-1);
    }

    /** Checks that a datum outside groups has an error, or is exact and bears on an object. */
    void requireError(int datum, boolean bears) {
        boolean exact = definition.noise().mode() == Noise.Scatter.EXACT;
        if (exact ? bears : variances[datum] > 0) {
            return;
        }
        String what = "datum \"" + definition.data().names().get(datum) + "\"";
        throw exact
                ? new ValueFault(
                        what + " is exact and bears on no object",
                        "an exact datum fixes the distance of one object",
                        "rung \"" + definition.name() + "\"",
                        "declare a source exact instead, or give the datum an error")
                : new ValueFault(
                        what + " has the standard deviation 0",
                        "a datum has an error, or is declared exact",
                        "rung \"" + definition.name() + "\"",
                        "give it an error or a scatter, or declare the rung's data exact");
    }

    boolean exact() {
        return definition.noise().mode() == Noise.Scatter.EXACT;
    }

    /** Variance of a datum outside groups. */
    double variance(int datum) {
        return variances[datum];
    }

    double scatter() {
        return scatter;
    }

    double extra(int datum) {
        return extra[datum];
    }

    int columns() {
        return columns;
    }

    double carried(int datum, int column) {
        return carried[datum][column];
    }

    List<Group> groups() {
        return groups;
    }

    /** The whole variance of a datum: known, carried, joint, scatter, and by uncertain columns. */
    double total(int datum) {
        int row = jointRow(datum);
        double joint = row < 0 ? 0 : jointNoise().covariance().entry(row, row);
        return definition.noise().covariance().entry(datum, datum) + joint + more(datum);
    }

    private JointNoise jointNoise() {
        return definition.noise().joint().orElseThrow();
    }

    /** gT C g for gains on the observables, without joint noise. */
    double quadratic(double[] gains) {
        double sum = definition.noise().covariance().quadratic(gains);
        for (int i = 0; i < gains.length; i++) {
            sum += gains[i] * gains[i] * more(i);
        }
        return sum;
    }
}
