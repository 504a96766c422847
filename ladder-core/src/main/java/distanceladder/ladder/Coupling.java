package distanceladder.ladder;

import distanceladder.covariance.Covariance;
import distanceladder.information.CoupledRows;
import distanceladder.information.Readings;
import distanceladder.information.Unknowns;
import java.util.ArrayList;
import java.util.List;

/** Lays out the rows of one component: the rows of its blocks, then the readings that its objects have elsewhere. */
final class Coupling {
    private final Assembly assembly;
    private final List<String> objects = new ArrayList<>();
    private final List<Double> coefficients = new ArrayList<>();
    private final List<double[]> rows = new ArrayList<>();

    Coupling(Assembly assembly) {
        this.assembly = assembly;
    }

    CoupledRows rows(List<Whitened.BlockRows> blocks, List<String> met, List<Assembly.Supply> supply) {
        Unknowns unknowns = unknowns(blocks, met);
        for (Whitened.BlockRows block : blocks) {
            addBlock(block, unknowns, supply);
        }
        double[][] noise = noise(blocks);
        boolean[] exact = new boolean[noise.length + met.size()];
        for (String object : met) {
            Readings readings = assembly.readingsOf(object);
            int index = readings.index(object);
            objects.add(object);
            coefficients.add(readings.coefficient(index));
            rows.add(spread(readings.row(index), readings.unknowns(), unknowns));
            exact[supply.size()] = readings.exact(index);
            supply.add(new Assembly.Supply("", -1, object));
        }
        return new CoupledRows(
                unknowns,
                objects.toArray(new String[0]),
                coefficients.stream().mapToDouble(x -> x).toArray(),
                rows.toArray(new double[0][]),
                noise,
                exact);
    }

    /** Each block's own noise, and the joint noise between all rows that have a part in it. */
    private double[][] noise(List<Whitened.BlockRows> blocks) {
        int size = blocks.stream().mapToInt(b -> b.data().length).sum();
        double[][] noise = new double[size][size];
        int from = 0;
        for (Whitened.BlockRows block : blocks) {
            for (int i = 0; i < block.data().length; i++) {
                System.arraycopy(block.noise()[i], 0, noise[from + i], from, block.data().length);
            }
            from += block.data().length;
        }
        int row = 0;
        for (Whitened.BlockRows block : blocks) {
            int column = 0;
            for (Whitened.BlockRows other : blocks) {
                if (!block.link().isEmpty() && block.link().equals(other.link())) {
                    addJoint(noise, row, column, block, other);
                }
                column += other.data().length;
            }
            row += block.data().length;
        }
        return noise;
    }

    private void addJoint(double[][] noise, int row, int column, Whitened.BlockRows block, Whitened.BlockRows other) {
        Whitened one = owner(block);
        Whitened two = owner(other);
        Covariance c = one.definition().noise().joint().orElseThrow().covariance();
        for (int i = 0; i < block.data().length; i++) {
            int p = one.noise().jointRow(block.data()[i]);
            for (int j = 0; p >= 0 && j < other.data().length; j++) {
                int q = two.noise().jointRow(other.data()[j]);
                if (q >= 0) {
                    noise[row + i][column + j] += c.entry(p, q);
                }
            }
        }
    }

    private Whitened owner(Whitened.BlockRows block) {
        for (Whitened white : assembly.rows().values()) {
            if (white.blocks().contains(block)) {
                return white;
            }
        }
        throw new IllegalArgumentException(block.name());
    }

    private void addBlock(Whitened.BlockRows block, Unknowns unknowns, List<Assembly.Supply> supply) {
        Whitened white = owner(block);
        for (int i = 0; i < block.data().length; i++) {
            double[] row = white.tiedRow(block.data()[i], block.rows()[i], unknowns);
            String object = block.objects()[i];
            double a = block.coefficients()[i];
            if (!object.isEmpty() && assembly.joint().held().contains(object)) {
                row[unknowns.column(Ladder.unknown(object))] += a;
                object = "";
                a = 0;
            }
            objects.add(object);
            coefficients.add(a);
            rows.add(row);
            supply.add(new Assembly.Supply(white.definition().name(), block.data()[i], object));
        }
    }

    private Unknowns unknowns(List<Whitened.BlockRows> blocks, List<String> met) {
        List<Unknowns> all = new ArrayList<>();
        List<String> distances = new ArrayList<>();
        for (Whitened.BlockRows block : blocks) {
            Whitened white = owner(block);
            all.add(white.unknowns());
            for (int i = 0; i < block.data().length; i++) {
                if (assembly.joint().held().contains(block.objects()[i])) {
                    distances.add(Ladder.unknown(block.objects()[i]));
                }
                white.linear().ties(block.data()[i]).forEach(t -> distances.add(Ladder.unknown(t.object())));
            }
        }
        for (String object : met) {
            all.add(assembly.readingsOf(object).unknowns());
        }
        all.add(Unknowns.of(distances));
        return Unknowns.union(all);
    }

    private static double[] spread(double[] row, Unknowns from, Unknowns to) {
        double[] out = new double[to.size() + 1];
        int[] at = from.columnsIn(to);
        for (int j = 0; j < at.length; j++) {
            out[at[j]] = row[j];
        }
        out[to.size()] = row[from.size()];
        return out;
    }
}
