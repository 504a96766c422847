package distanceladder.ladder;

import distanceladder.fit.Damping;
import distanceladder.information.Prior;
import distanceladder.information.Solved;
import distanceladder.ladder.Kept.Part;
import distanceladder.relation.Definition;
import distanceladder.relation.Input;
import distanceladder.text.ConvergenceFault;
import distanceladder.text.Figures;
import distanceladder.text.RankFault;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Solves a set of rungs: linearise, solve, and again at the solution until all that is decided stands still.
 *
 * <p>Gauss-Newton iteration from a start that the data alone fix; nothing is taken over from another solution, but for
 * decisions that the user takes over by name. Steps are shortened while a value swings to and fro (data far from their
 * relation make it do so).
 */
final class Solver {
    static final int MOST = 200;

    private final Ladder ladder;
    private final TreeSet<String> set;
    private final Kept kept;
    private final Map<String, Double> scatters;
    private final Log.Recorder log;

    /**
     * A solver of one set.
     *
     * @param scatters intrinsic variances taken over, by rung
     */
    Solver(Ladder ladder, TreeSet<String> set, Kept kept, Map<String, Double> scatters) {
        this.ladder = ladder;
        this.set = set;
        this.kept = kept;
        this.scatters = scatters;
        this.log = new Log.Recorder(set.equals(ladder.names()) ? "whole" : String.join(" + ", set));
    }

    Log log() {
        return log.log();
    }

    /** Decides by the set's own data. */
    Settled solve() {
        TreeMap<String, Decided> decided = new TreeMap<>();
        for (String name : set) {
            Definition d = ladder.rung(name).definition();
            decided.put(name, new Decided(d.relation().start(d), Restricted.start(d, scatters.get(name))));
        }
        Damping damping = new Damping();
        Step step = null;
        for (int round = 0; round < MOST; round++) {
            Settled now = at(decided);
            step = new Step(now, damping.factor(), scatters.keySet());
            TreeMap<String, Decided> next = new TreeMap<>();
            for (Map.Entry<String, Decided> entry : decided.entrySet()) {
                next.put(entry.getKey(), step.next(entry.getKey(), entry.getValue()));
            }
            if (step.atRest()) {
                return now;
            }
            damping.note(step.worst(), step.move());
            decided = next;
        }
        String last = step == null ? "nothing" : step.worst();
        double move = step == null ? 0 : Math.abs(step.move());
        throw new ConvergenceFault(
                last + " still moves by " + Figures.significant(move, 3) + " of its error",
                "what is decided stands still within " + MOST + " rounds",
                "solution over " + log.set(),
                "check the datum, or start a parameter nearer to its value");
    }

    /** Solves with given decisions. */
    Settled at(Map<String, Decided> decided) {
        Assembly assembly = new Assembly(ladder, decided, kept, log);
        List<Part> parts = new ArrayList<>();
        parts.add(new Part("the merged triangle", assembly.merged()));
        List<Input> inputs = new ArrayList<>(ladder.inputs(set).values());
        inputs.removeIf(Input::free);
        for (Input input : inputs) {
            parts.add(new Part("source " + input.name(), input));
        }
        int width = assembly.merged().triangle().unknowns().size();
        Solved solved = kept.keep(new Log.Step(Log.SOLVE, log.set(), width), parts, log, () -> solve(assembly, inputs));
        return new Settled(ladder, set, assembly, solved, decided, scatters.keySet());
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
}
