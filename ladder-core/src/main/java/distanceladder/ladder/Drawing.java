package distanceladder.ladder;

import distanceladder.chance.Draws;
import distanceladder.relation.Amount;
import distanceladder.relation.Derived;
import distanceladder.relation.Input;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Value;
import distanceladder.text.Fault;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/** Draws of values of a solution, each a function of (seed, k) and of nothing else. */
final class Drawing {
    private final Solution solution;
    private final Settled settled;
    private final long seed;
    private final Road road;
    private final List<Value> values;
    private final TreeMap<String, Noises> noises = new TreeMap<>();
    private final Map<Value, Gains> gains = new LinkedHashMap<>();
    private final TreeMap<String, double[]> about = new TreeMap<>();

    Drawing(Solution solution, long seed, Road road, List<Value> values) {
        this.solution = solution;
        this.settled = solution.settled();
        this.seed = seed;
        this.road = road;
        this.values = values;
        settled.assembly().rows().forEach((name, white) -> {
            noises.put(name, new Noises(seed, white));
            double[] y = white.definition().data().column(white.definition().observable());
            if (road == Road.REPEATED) {
                Fit fit = new Fit(settled);
                for (int i = 0; i < y.length; i++) {
                    y[i] -= fit.residual(white, i);
                }
            }
            about.put(name, y);
        });
        if (road == Road.GAINS) {
            values.forEach(this::addGains);
        }
    }

    private void addGains(Value value) {
        if (value instanceof Derived derived) {
            derived.inputs().forEach(this::addGains);
        } else {
            gains.computeIfAbsent(value, v -> new Evaluation(settled).gains(v));
        }
    }

    /** The values of draw k, in their units; NaN where a relation refuses it. */
    double[] draw(long k) {
        return road == Road.GAINS ? byGains(k) : solved(k);
    }

    private double[] byGains(long k) {
        Map<Value, Double> base = new LinkedHashMap<>();
        TreeMap<String, double[]> errors = new TreeMap<>();
        noises.forEach((name, noise) -> errors.put(name, noise.errors(k)));
        TreeMap<String, double[]> moves = new TreeMap<>();
        for (Input input : inputs()) {
            moves.put(input.name(), directions(input, k));
        }
        gains.forEach((value, gain) -> base.put(value, drawn(value, gain, errors, moves)));
        double[] out = new double[values.size()];
        for (int i = 0; i < out.length; i++) {
            out[i] = values.get(i).unit().fromBase(evaluated(values.get(i), base));
        }
        return out;
    }

    private double drawn(Value value, Gains gain, Map<String, double[]> errors, Map<String, double[]> moves) {
        double sum = new Evaluation(settled).stated(value).value();
        for (Map.Entry<String, double[]> entry : gain.data().entrySet()) {
            double[] e = errors.getOrDefault(entry.getKey(), new double[0]);
            for (int i = 0; i < e.length; i++) {
                sum += entry.getValue()[i] * e[i];
            }
        }
        for (Map.Entry<String, double[]> entry : moves.entrySet()) {
            double[] h = gain.sources().getOrDefault(entry.getKey(), new double[0]);
            for (int q = 0; q < h.length; q++) {
                sum += h[q] * entry.getValue()[q];
            }
        }
        return sum;
    }

    private double evaluated(Value value, Map<Value, Double> base) {
        if (value instanceof Derived derived) {
            double[] at = new double[derived.inputs().size()];
            for (int i = 0; i < at.length; i++) {
                at[i] = evaluated(derived.inputs().get(i), base);
            }
            return derived.gradient(at)[0];
        }
        return base.getOrDefault(value, Double.NaN);
    }

    private List<Input> inputs() {
        List<Input> out =
                new ArrayList<>(solution.ladder().inputs(settled.set()).values());
        out.removeIf(Input::free);
        return out;
    }

    /** How far a source is from its mean in draw k, along its independent directions. */
    private double[] directions(Input input, long k) {
        Draws draws = Draws.of(seed, "source " + input.name());
        double[] v = new double[input.root()[0].length];
        if (input instanceof Source source && v.length == 1) {
            double x = source.distribution().orElseThrow().drawn(draws, k, 0);
            v[0] = (source.unit().toBase(x) - source.mean()[0]) / source.root()[0][0];
        } else {
            draws.fillNormal(k, v);
        }
        return v;
    }

    private Input moved(Input input, long k) {
        double[] v = directions(input, k);
        double[] mean = input.mean();
        double[][] l = input.root();
        for (int i = 0; i < mean.length; i++) {
            for (int q = 0; q < v.length; q++) {
                mean[i] += l[i][q] * v[q];
            }
        }
        if (input instanceof SourceGroup group) {
            for (int i = 0; i < mean.length; i++) {
                mean[i] = group.unit().fromBase(mean[i]);
            }
            return group.at(mean);
        }
        Source source = (Source) input;
        return v.length == 0 ? source : source.at(Amount.of(source.unit().fromBase(mean[0]), source.unit()));
    }

    private double[] solved(long k) {
        List<Rung<?>> rungs = new ArrayList<>();
        noises.forEach((name, noise) -> {
            Rung<?> rung = solution.ladder().rung(name);
            double[] y = about.getOrDefault(name, new double[0]);
            rungs.add(rung.like(rung.definition()
                    .withData(noise.drawn(k, y), rung.definition().noise())));
        });
        double[] out = new double[values.size()];
        try {
            List<Input> inputs = new ArrayList<>();
            inputs().forEach(input -> inputs.add(moved(input, k)));
            Ladder drawn = solution.ladder().edited(rungs, List.of()).withInputs(inputs);
            Map<String, Double> held = new TreeMap<>();
            if (road == Road.RELINEARISED) {
                settled.decided().forEach((name, decided) -> held.put(name, decided.variance()));
            }
            Settled now = new Solver(drawn, new TreeSet<>(settled.set()), Kept.empty(), held).solve();
            Evaluation evaluation = new Evaluation(now);
            for (int i = 0; i < out.length; i++) {
                out[i] = values.get(i)
                        .unit()
                        .fromBase(evaluation.stated(values.get(i)).value());
            }
        } catch (Fault refused) {
            java.util.Arrays.fill(out, Double.NaN);
        }
        return out;
    }
}
