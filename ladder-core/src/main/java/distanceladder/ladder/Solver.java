package distanceladder.ladder;

import distanceladder.information.Prior;
import distanceladder.information.Solved;
import distanceladder.ladder.Kept.Part;
import distanceladder.relation.Definition;
import distanceladder.relation.Input;
import distanceladder.relation.Points;
import distanceladder.text.ConvergenceFault;
import distanceladder.text.RankFault;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Solves a set of rungs: linearise, solve, and again at the solution until the points stand still.
 *
 * <p>Gauss-Newton iteration from a start that the data alone fix; nothing is taken over from another solution. A modulus
 * moves by at most {@link #LONGEST} in a step. It has converged when no modulus moves by more than {@link #CLOSE} of its
 * reading's own error and no parameter by more than that of its standard deviation; a move of {@link #ROUNDING} units in
 * the last place is none, however small the error.
 */
final class Solver {
    static final int MOST = 200;
    static final double CLOSE = 1e-10;
    static final double LONGEST = 2.5;
    static final double ROUNDING = 16;

    private final Ladder ladder;
    private final TreeSet<String> set;
    private final Kept kept;
    private final Log.Recorder log;

    Solver(Ladder ladder, TreeSet<String> set, Kept kept) {
        this.ladder = ladder;
        this.set = set;
        this.kept = kept;
        this.log = new Log.Recorder(set.equals(ladder.names()) ? "whole" : String.join(" + ", set));
    }

    Log log() {
        return log.log();
    }

    /** Decides the points by the set's own data. */
    Settled solve() {
        TreeMap<String, Points> points = new TreeMap<>();
        for (String name : set) {
            Definition d = ladder.rung(name).definition();
            points.put(name, d.relation().start(d));
        }
        String worst = "";
        double farthest = 0;
        for (int round = 0; round < MOST; round++) {
            Settled now = at(points);
            Step step = new Step(now);
            TreeMap<String, Points> next = new TreeMap<>();
            points.forEach((name, old) -> next.put(name, step.next(name, old)));
            if (step.farthest <= CLOSE) {
                return now;
            }
            worst = step.worst;
            farthest = step.farthest;
            points = next;
        }
        throw new ConvergenceFault(
                worst + " still moves by " + distanceladder.text.Figures.significant(farthest, 3) + " of its error",
                "the points of linearisation stand still within " + MOST + " rounds",
                "solution over " + log.set(),
                "check the datum, or start a parameter nearer to its value");
    }

    /** Solves at given points. */
    Settled at(Map<String, Points> points) {
        Assembly assembly = new Assembly(ladder, points, kept, log);
        List<Part> parts = new ArrayList<>();
        parts.add(new Part("the merged triangle", assembly.merged()));
        List<Input> inputs = new ArrayList<>(ladder.inputs(set).values());
        inputs.removeIf(Input::free);
        for (Input input : inputs) {
            parts.add(new Part("source " + input.name(), input));
        }
        Solved solved = kept.keep(
                new Log.Step(
                        Log.SOLVE,
                        log.set(),
                        assembly.merged().triangle().unknowns().size()),
                parts,
                log,
                () -> solve(assembly, inputs));
        return new Settled(ladder, set, assembly, solved, points);
    }

    private Solved solve(Assembly assembly, List<Input> inputs) {
        TreeMap<String, Prior> priors = new TreeMap<>();
        for (Input input : inputs) {
            priors.put(input.name(), Prior.of(input.name(), input.unknowns(), input.mean(), input.root()));
        }
        assembly.rows().values().forEach(white -> white.priors().forEach(p -> priors.put(p.name(), p)));
        try {
            return Solved.of(assembly.merged().triangle(), List.copyOf(priors.values()));
        } catch (RankFault fault) {
            throw new RankFault(
                    fault.what(), fault.rule(), "solution over " + log.set(), fault.repair(), fault.parameters());
        }
    }

    /** One step of the iteration, and how far it goes. */
    private static final class Step {
        private final Settled now;
        private double farthest;
        private String worst = "";

        Step(Settled now) {
            this.now = now;
        }

        Points next(String name, Points old) {
            Whitened white = now.assembly().rows(name);
            if (!white.linear().curved()) {
                return old;
            }
            Definition d = white.definition();
            double[] parameters = new double[old.parameterCount()];
            for (int j = 0; j < parameters.length; j++) {
                String unknown = white.linear().unknowns().name(j);
                Stated value = now.unknown(unknown);
                parameters[j] = value.value();
                double sigma = value.sigma();
                double move = parameters[j] - old.parameter(j);
                note(unknown, sigma == 0 || isRounding(move, value.value()) ? 0 : move / sigma);
            }
            double[] moduli = new double[old.size()];
            for (int i = 0; i < moduli.length; i++) {
                String object = d.data().objects().get(i);
                moduli[i] = old.modulus(i);
                if (!object.isEmpty() && now.refusal(object).isEmpty()) {
                    moduli[i] = moved(object, old.modulus(i));
                }
            }
            return Points.of(moduli, parameters);
        }

        private double moved(String object, double old) {
            double to = now.modulus(object);
            double move = Math.max(-LONGEST, Math.min(LONGEST, to - old));
            note(Ladder.unknown(object), isRounding(move, to) ? 0 : move / now.ownError(object));
            return old + move;
        }

        private static boolean isRounding(double move, double value) {
            return Math.abs(move) <= ROUNDING * Math.ulp(value);
        }

        private void note(String what, double move) {
            if (!(Math.abs(move) <= farthest)) {
                farthest = Math.abs(move);
                worst = what;
            }
        }
    }
}
