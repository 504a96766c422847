package distanceladder.ladder;

import distanceladder.chance.Draws;
import distanceladder.covariance.Root;
import distanceladder.relation.Definition;
import distanceladder.relation.JointNoise;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Draws of the errors of a rung's data.
 *
 * <p>Independent errors depend on (seed, k, rung and datum name) alone; correlated ones are the known covariance's square
 * root times such numbers. An intrinsic scatter and the errors of uncertain columns have numbers of their own.
 */
final class Noises {
    private final long seed;
    private final Whitened white;
    private final Definition definition;
    private final double[][] root;
    private final Map<JointNoise, double[][]> jointRoots = new HashMap<>();

    Noises(long seed, Whitened white) {
        this.seed = seed;
        this.white = white;
        this.definition = white.definition();
        this.root = Root.of(definition.noise().covariance());
        definition.noise().joint().ifPresent(j -> jointRoots.put(j, Root.of(j.covariance())));
    }

    /** Errors of the observables in draw k. */
    double[] errors(long k) {
        int n = definition.data().size();
        double[] out = new double[n];
        if (definition.noise().mode() == Noise.Scatter.EXACT) {
            return out;
        }
        List<String> names = definition.data().names();
        boolean diagonal = definition.noise().covariance() instanceof distanceladder.covariance.Diagonal;
        double[] common = diagonal ? new double[0] : normals("errors of " + definition.name(), k, width());
        for (int i = 0; i < n; i++) {
            Draws own = Draws.of(seed, "datum " + definition.name() + " / " + names.get(i));
            if (diagonal) {
                out[i] = Math.sqrt(definition.noise().covariance().entry(i, i)) * own.normal(k, 0);
            } else {
                for (int q = 0; q < common.length; q++) {
                    out[i] += root[i][q] * common[q];
                }
            }
            out[i] += white.noise().scatter() * own.normal(k, 1);
            out[i] += joint(i, k);
        }
        return out;
    }

    private int width() {
        return root.length == 0 ? 0 : root[0].length;
    }

    private double joint(int datum, long k) {
        int row = white.noise().jointRow(datum);
        if (row < 0) {
            return 0;
        }
        JointNoise joint = definition.noise().joint().orElseThrow();
        double[][] l = jointRoots.getOrDefault(joint, new double[0][0]);
        double[] v = normals("joint noise " + joint.name(), k, l[row].length);
        double sum = 0;
        for (int q = 0; q < v.length; q++) {
            sum += l[row][q] * v[q];
        }
        return sum;
    }

    private double[] normals(String name, long k, int size) {
        double[] out = new double[size];
        Draws.of(seed, name).fillNormal(k, out);
        return out;
    }

    /** The rung's table with errors added to the observables (about other values where given) and uncertain columns. */
    Observations drawn(long k, double[] about) {
        Observations data = definition.data();
        double[] y = errors(k);
        for (int i = 0; i < y.length; i++) {
            y[i] += about[i];
        }
        Observations out = based(data, definition.observable(), y);
        for (String column : definition.relation().uncertain()) {
            double[] x = data.column(column);
            double[] sigma = data.column(column + " error");
            for (int i = 0; i < x.length; i++) {
                String name = "column " + column + " of " + definition.name() + " / "
                        + data.names().get(i);
                x[i] += sigma[i] * Draws.of(seed, name).normal(k, 0);
            }
            out = based(out, column, x);
        }
        return out;
    }

    private static Observations based(Observations data, String column, double[] base) {
        double[] numbers = base.clone();
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = data.unit(column).fromBase(numbers[i]);
        }
        return data.with(column, data.unit(column), numbers);
    }
}
