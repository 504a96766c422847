package distanceladder.ladder;

import distanceladder.information.Coupled;
import distanceladder.information.Elimination;
import distanceladder.information.Readings;
import distanceladder.information.Solved;
import distanceladder.relation.JointNoise;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * What a value owes to each datum and each source: {@code dq = sum_i g_i dy_i + sum_s h_s dv_s}.
 *
 * <p>Found by carrying t down through the reflections that made the solution: orthogonal steps, so the shares of the
 * variance add up to it whatever the scales of the sources.
 */
final class Gains {
    private final Settled settled;
    private final TreeMap<String, double[]> sources = new TreeMap<>();
    private final TreeMap<String, double[]> data = new TreeMap<>();
    private final TreeMap<String, Double> variances = new TreeMap<>();
    private final TreeMap<String, Double> joints = new TreeMap<>();
    private final TreeMap<String, double[]> jointGains = new TreeMap<>();

    Gains(Stated q, Settled settled) {
        this.settled = settled;
        new Descent(q).run();
    }

    /** For each source the gains along its independent directions (of unit variance). */
    TreeMap<String, double[]> sources() {
        return sources;
    }

    /** For each rung the gains with respect to its observables, in the order of the table. */
    TreeMap<String, double[]> data() {
        return data;
    }

    /** For each joint noise the variance by it. */
    TreeMap<String, Double> joints() {
        return joints;
    }

    /** For each joint noise the gains of its data. */
    TreeMap<String, double[]> jointGains() {
        return jointGains;
    }

    /** For each rung the variance by its own data. */
    TreeMap<String, Double> variances() {
        return variances;
    }

    Settled settled() {
        return settled;
    }

    /** One descent. */
    private final class Descent {
        private final Stated q;
        private final Assembly assembly = settled.assembly();
        private final Map<String, Double> onReadings = new TreeMap<>();
        private final Map<String, double[]> onRungReadings = new TreeMap<>();
        private final Map<String, double[]> pieces = new TreeMap<>();

        Descent(Stated q) {
            this.q = q;
        }

        void run() {
            Solved.Gain gain = settled.solved().down(q.combination().t());
            List<double[]> parts = assembly.merged().downToParts(gain.alongData());
            for (int i = 0; i < parts.size(); i++) {
                Assembly.Piece piece = assembly.pieces().get(i);
                pieces.put(piece.step() + "/" + piece.where(), parts.get(i));
            }
            for (String rung : assembly.rows().keySet()) {
                data.put(
                        rung, new double[assembly.rows(rung).definition().data().size()]);
                variances.put(rung, 0.0);
            }
            priors(gain.alongPriors());
            assembly.joint().components().forEach(this::component);
            ownErrors();
            assembly.joint().meetings().forEach(this::meeting);
            lone();
            assembly.rows().keySet().forEach(this::rung);
            joint();
        }

        /** The variance by joint noises: of all rungs that take part at once. */
        private void joint() {
            Map<String, double[]> along = new TreeMap<>();
            Map<String, JointNoise> noises = new TreeMap<>();
            assembly.rows()
                    .forEach((name, white) -> white.definition().noise().joint().ifPresent(noise -> {
                        noises.put(noise.name(), noise);
                        double[] g = along.computeIfAbsent(noise.name(), key -> new double[noise.size()]);
                        for (int i = 0; i < gains(name).length; i++) {
                            int row = white.noise().jointRow(i);
                            if (row >= 0) {
                                g[row] += gains(name)[i];
                            }
                        }
                    }));
            noises.forEach((name, noise) ->
                    joints.put(name, noise.covariance().quadratic(along.getOrDefault(name, new double[noise.size()]))));
            jointGains.putAll(along);
        }

        private double[] piece(String step, String where) {
            double[] found = pieces.get(step + "/" + where);
            return found == null ? new double[0] : found;
        }

        private void priors(List<double[]> along) {
            for (int k = 0; k < along.size(); k++) {
                String name = settled.solved().priors().get(k).name();
                String owner = owner(name);
                if (owner.isEmpty()) {
                    sources.put(name, along.get(k));
                } else {
                    add(owner, squares(along.get(k)));
                    sources.put(name, along.get(k));
                }
            }
        }

        private String owner(String prior) {
            for (Whitened white : assembly.rows().values()) {
                if (white.priors().stream().anyMatch(p -> p.name().equals(prior))) {
                    return white.definition().name();
                }
            }
            return "";
        }

        private void add(String rung, double variance) {
            variances.merge(rung, variance, Double::sum);
        }

        private void component(Joint.Component c) {
            Coupled coupled = assembly.component(c.name());
            List<Coupled.Reading> readings = new ArrayList<>();
            List<Double> weights = new ArrayList<>();
            q.distances().forEach((object, weight) -> {
                if (c.objects().contains(object)) {
                    readings.add(settled.reading(object));
                    weights.add(weight);
                }
            });
            double[] raw = coupled.down(
                    piece(Log.COMPONENT, c.name()),
                    readings,
                    weights.stream().mapToDouble(x -> x).toArray());
            List<Assembly.Supply> supply = assembly.supply(c.name());
            for (int i = 0; i < raw.length; i++) {
                if (supply.get(i).datum() < 0) {
                    onReadings.merge(supply.get(i).object(), raw[i], Double::sum);
                } else {
                    gains(supply.get(i).rung())[supply.get(i).datum()] += raw[i];
                }
            }
        }

        private double[] gains(String rung) {
            return data.computeIfAbsent(
                    rung,
                    key -> new double[assembly.rows(key).definition().data().size()]);
        }

        private void ownErrors() {
            q.distances().forEach((object, weight) -> {
                if (!assembly.joint().inComponent(object)) {
                    Readings readings = assembly.readingsOf(object);
                    double a = readings.coefficient(readings.index(object));
                    onReadings.merge(object, weight / a, Double::sum);
                }
            });
        }

        private void meeting(String name, List<String> objects) {
            Elimination meeting = assembly.meeting(name);
            double[] along = new double[objects.size()];
            for (int i = 0; i < along.length; i++) {
                along[i] = onReadings.getOrDefault(objects.get(i), 0.0);
            }
            double[] down = meeting.down(piece(Log.MEETING, name), along);
            List<String> sides = assembly.joint().sides(objects.get(0));
            for (int i = 0; i < objects.size(); i++) {
                for (int s = 0; s < sides.size(); s++) {
                    onRung(sides.get(s), objects.get(i), down[i * sides.size() + s]);
                }
            }
        }

        private void onRung(String rung, String object, double gain) {
            double[] along = alongReadings(rung);
            along[assembly.elimination(rung).readings().index(object)] += gain;
        }

        private double[] alongReadings(String rung) {
            return onRungReadings.computeIfAbsent(
                    rung,
                    key -> new double
                            [assembly.elimination(key).readings().objects().size()]);
        }

        private void lone() {
            onReadings.forEach((object, gain) -> {
                List<String> sides = assembly.joint().sides(object);
                if (sides.size() == 1) {
                    onRung(sides.get(0), object, gain);
                }
            });
        }

        private void rung(String name) {
            Whitened white = assembly.rows(name);
            Elimination elimination = assembly.elimination(name);
            double[] along = alongReadings(name);
            held(name, along);
            double[] own = piece(Log.ELIMINATION, name);
            double[] down = elimination.down(own, along);
            for (int k = 0; k < down.length; k++) {
                int datum = white.freeData()[k];
                gains(name)[datum] += down[k] / white.sigma(datum);
            }
            add(name, white.noise().exact() ? 0 : squares(down));
            if (white.tiedData().length > 0) {
                double[] tied = Assembly.tied(white).down(piece(Log.HELD + " (ties)", name));
                for (int k = 0; k < tied.length; k++) {
                    gains(name)[white.tiedData()[k]] += tied[k] / white.sigma(white.tiedData()[k]);
                }
                add(name, squares(tied));
            }
            for (Whitened.BlockRows block : white.blocks()) {
                add(name, blockVariance(block, gains(name)));
            }
        }

        private void held(String rung, double[] along) {
            List<String> objects = assembly.heldBy(rung);
            if (objects.isEmpty()) {
                return;
            }
            Readings readings = assembly.elimination(rung).readings();
            double[] down = readings.keepingRows(objects, Ladder::unknown).down(piece(Log.HELD, rung));
            for (int i = 0; i < down.length; i++) {
                along[readings.index(objects.get(i))] += down[i];
            }
        }
    }

    private static double blockVariance(Whitened.BlockRows rows, double[] gains) {
        int[] at = rows.data();
        double sum = 0;
        for (int i = 0; i < at.length; i++) {
            double line = 0;
            for (int j = 0; j < at.length; j++) {
                line += rows.noise()[i][j] * gains[at[j]];
            }
            sum += gains[at[i]] * line;
        }
        return sum;
    }

    static double squares(double[] x) {
        return Arrays.stream(x).map(v -> v * v).sum();
    }
}
