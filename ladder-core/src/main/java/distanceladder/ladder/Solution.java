package distanceladder.ladder;

import distanceladder.relation.Input;
import distanceladder.relation.Rung;
import distanceladder.relation.Value;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/**
 * A ladder solved over a set of its rungs: every value with an uncertainty that knows what is shared below.
 *
 * <p>The estimate is the generalised least-squares solution of all data of the set with the priors of their sources,
 * {@code Cov(q, q') = sum_s A_s C_s B_sT} over sources and data, for any two values. What has to be decided (points of
 * linearisation) is decided by the set's own data, so a solution is a function of its data alone. Immutable; a revision
 * is another solution, which computes again only what the change reaches.
 */
public final class Solution implements Shown {
    private final Ladder ladder;
    private final TreeSet<String> set;
    private final Kept kept;
    private final Settled settled;
    private final Log log;
    private final Map<String, Change.Meaning> meanings;
    private final Map<String, Double> scatters;

    private Solution(
            Ladder ladder,
            TreeSet<String> set,
            Kept kept,
            Map<String, Change.Meaning> meanings,
            Map<String, Double> scatters) {
        this.scatters = Map.copyOf(scatters);
        this.ladder = ladder;
        this.set = set;
        this.kept = kept;
        this.meanings = Map.copyOf(meanings);
        Solver solver = new Solver(ladder, set, kept, scatters);
        this.settled = solver.solve();
        this.log = solver.log();
    }

    private Solution(Solution same, Log log) {
        this.ladder = same.ladder;
        this.set = same.set;
        this.kept = same.kept;
        this.meanings = same.meanings;
        this.scatters = same.scatters;
        this.settled = same.settled;
        this.log = log;
    }

    static Solution of(Ladder ladder) {
        return new Solution(ladder, new TreeSet<>(ladder.names()), Kept.empty(), Map.of(), Map.of());
    }

    /**
     * The ladder that is solved.
     *
     * @return all of it, also where the solution is over a part
     */
    public Ladder ladder() {
        return ladder;
    }

    /**
     * The rungs over which it is solved.
     *
     * @return their names
     */
    public Set<String> rungs() {
        return java.util.Collections.unmodifiableSet(set);
    }

    /**
     * The solution over a rung and all that it rests on: what it says from below.
     *
     * @param rung a rung of the ladder
     * @return the solution
     */
    public Solution below(Rung<?> rung) {
        return over(ladder.downFrom(rung.name()));
    }

    /**
     * The solution over some rungs only.
     *
     * @param rungs names of rungs
     * @return the solution
     */
    public Solution over(String... rungs) {
        return over(List.of(rungs));
    }

    /**
     * The solution over some rungs only.
     *
     * @param rungs names of rungs
     * @return the solution
     */
    public Solution over(java.util.Collection<String> rungs) {
        rungs.forEach(ladder::rung);
        return new Solution(ladder, new TreeSet<>(rungs), kept, meanings, scatters);
    }

    /**
     * The same set with scatters taken over from another solution, where that has estimated or taken them: a scatter
     * learned in the flow used for distances from below.
     *
     * @param other a solution with the rungs whose scatters are taken over
     * @return the solution
     */
    public Solution withScattersOf(Solution other) {
        Map<String, Double> taken = new HashMap<>(scatters);
        for (String rung : other.set) {
            if (set.contains(rung)
                    && ladder.rung(rung).definition().noise().mode()
                            == distanceladder.relation.Noise.Scatter.ESTIMATED) {
                double scatter = other.settled.assembly().rows(rung).noise().scatter();
                taken.put(rung, scatter * scatter);
            }
        }
        return new Solution(ladder, set, kept, meanings, taken);
    }

    /**
     * The intrinsic scatter of a rung: given, estimated by this set, or taken over.
     *
     * @param rung a rung of the set
     * @return its standard deviation, with the error of an estimated one, in the unit of the rung's observable
     */
    public distanceladder.relation.Amount scatter(Rung<?> rung) {
        requireInSet(rung.name());
        Whitened white = settled.assembly().rows(rung.name());
        distanceladder.astro.Unit unit =
                white.definition().data().unit(white.definition().observable());
        double scatter = white.noise().scatter();
        double variance = settled.scatterVariances().getOrDefault(rung.name(), 0.0);
        double sigma = variance == 0 || scatter == 0 ? 0 : Math.sqrt(variance) / (2 * scatter);
        return new distanceladder.relation.Amount(unit.fromBase(scatter), Math.abs(unit.fromBase(sigma)), unit);
    }

    /**
     * The solution over all rungs of the ladder.
     *
     * @return the solution
     */
    public Solution whole() {
        return over(ladder.names());
    }

    /**
     * A value with its uncertainty and the parts of it.
     *
     * @param value a handle
     * @return the estimate
     * @throws NameFault when the set says nothing of it
     * @throws distanceladder.text.ValueFault when an object has no distance; the message has the reason
     */
    public Estimate of(Value value) {
        return new Evaluation(settled).estimate(value);
    }

    /**
     * Why an object has no distance in this solution.
     *
     * @param object its name
     * @return the reason; empty when it has one
     */
    public Optional<String> refusal(String object) {
        return settled.refusal(object);
    }

    /**
     * The covariance of any two values.
     *
     * @param one a handle
     * @param other another
     * @return in the product of their units
     */
    public double covariance(Value one, Value other) {
        Evaluation evaluation = new Evaluation(settled);
        return one.unit().fromBase(1)
                * other.unit().fromBase(1)
                * evaluation.stated(one).covariance(evaluation.stated(other));
    }

    /**
     * The correlation of any two values.
     *
     * @param one a handle
     * @param other another
     * @return between -1 and 1; NaN when one of them is certain
     */
    public double correlation(Value one, Value other) {
        Evaluation evaluation = new Evaluation(settled);
        Stated a = evaluation.stated(one);
        Stated b = evaluation.stated(other);
        return a.covariance(b) / (a.sigma() * b.sigma());
    }

    /**
     * The error budget of a value.
     *
     * @param value a handle
     * @return its terms, adding up to its variance
     */
    public Budget budget(Value value) {
        Evaluation evaluation = new Evaluation(settled);
        Settled held = heldSystematics();
        double sigma =
                value.unit().fromBase(1) * new Evaluation(held).stated(value).sigma();
        return Budget.of(evaluation.estimate(value), evaluation.gains(value), sigma);
    }

    private Settled heldSystematics() {
        List<Input> held = new ArrayList<>();
        for (Input input : ladder.inputs(set).values()) {
            if (input.kind() == distanceladder.relation.Kind.SYSTEMATIC && !input.free()) {
                held.add(input.held());
            }
        }
        return new Solver(ladder.withInputs(held), set, kept.next(), scatters).at(settled.decided());
    }

    /**
     * Values propagated by Monte Carlo: by gains where the ladder is linear and no scatter is estimated, else solved anew
     * in each draw.
     *
     * @param seed seed of the draws
     * @param count number of draws, at least 100
     * @param values handles
     * @return the draws, summarised beside the analytic estimates
     */
    public Sampled draw(long seed, int count, Value... values) {
        boolean straight = settled.assembly().rows().values().stream()
                .allMatch(
                        w -> !w.linear().curved() && settled.scatterVariances().isEmpty());
        return draw(straight ? Road.GAINS : Road.RELINEARISED, seed, count, values);
    }

    /**
     * Values propagated by Monte Carlo on a road that the user chooses.
     *
     * @param road how each draw is brought up the ladder
     * @param seed seed of the draws
     * @param count number of draws, at least 100
     * @param values handles
     * @return the draws, summarised beside the analytic estimates
     */
    public Sampled draw(Road road, long seed, int count, Value... values) {
        if (count < 100) {
            throw new distanceladder.text.ValueFault(
                    count + " draws", "a sample has at least 100 draws", "", "ask for more");
        }
        Drawing drawing = new Drawing(this, seed, road, List.of(values));
        double[][] draws = java.util.stream.IntStream.range(0, count)
                .parallel()
                .mapToObj(drawing::draw)
                .toArray(double[][]::new);
        List<Sampled.Summary> summaries = new ArrayList<>();
        for (int v = 0; v < values.length; v++) {
            int at = v;
            summaries.add(new Sampled.Summary(
                    of(values[v]),
                    java.util.Arrays.stream(draws).mapToDouble(d -> d[at]).toArray()));
        }
        int refused = (int) java.util.Arrays.stream(draws)
                .filter(d -> java.util.Arrays.stream(d).anyMatch(Double::isNaN))
                .count();
        return new Sampled(road, seed, summaries, count, refused);
    }

    /**
     * Chi-square of the whole and of each rung.
     *
     * @return the parts
     */
    public ChiSquare chiSquare() {
        return new Fit(settled).chiSquare(kept);
    }

    /**
     * Observed minus fitted for the data of a rung.
     *
     * @param rung a rung of the set
     * @return residuals and pulls
     */
    public Residuals residuals(Rung<?> rung) {
        requireInSet(rung.name());
        return new Fit(settled).residuals(rung.name());
    }

    private void requireInSet(String rung) {
        if (!set.contains(rung)) {
            throw new NameFault(
                    "rung \"" + rung + "\"", "the rung is in the set that is solved", "", Nearest.hint(rung, set));
        }
    }

    /**
     * The parameters of a rung and how well it fits.
     *
     * @param rung a rung of the set
     * @return its calibration
     */
    public Calibration calibration(Rung<?> rung) {
        requireInSet(rung.name());
        return Calibration.of(this, rung.name());
    }

    /**
     * The distances of the objects of a rung.
     *
     * @param rung a rung of the set
     * @return a table of moduli and distances
     */
    public DistanceTable distances(Rung<?> rung) {
        requireInSet(rung.name());
        return DistanceTable.of(this, rung.name());
    }

    /**
     * The same ladder with sources supposed different.
     *
     * @param sources sources or groups under their old names
     * @return the revised solution, over the same rungs
     */
    public Solution with(Input... sources) {
        return with(java.util.Arrays.stream(sources).map(Change::whatIf).toArray(Change[]::new));
    }

    /**
     * The same ladder with rungs put in, or in the place of their namesakes.
     *
     * @param rungs the rungs
     * @return the revised solution
     */
    public Solution with(Rung<?>... rungs) {
        return with(java.util.Arrays.stream(rungs).map(Change::whatIf).toArray(Change[]::new));
    }

    /**
     * The same ladder without some rungs.
     *
     * @param rungs their names
     * @return the revised solution
     */
    public Solution without(String... rungs) {
        return with(java.util.Arrays.stream(rungs).map(Change::dropped).toArray(Change[]::new));
    }

    /**
     * The same ladder with several changes at once.
     *
     * @param changes the changes
     * @return the revised solution
     */
    public Solution with(Change... changes) {
        List<Rung<?>> put = new ArrayList<>();
        List<Input> inputs = new ArrayList<>();
        List<String> dropped = new ArrayList<>();
        Map<String, Change.Meaning> next = new HashMap<>(meanings);
        for (Change change : changes) {
            change.rung().ifPresent(put::add);
            change.input().ifPresent(inputs::add);
            if (!change.droppedRung().isEmpty()) {
                dropped.add(change.droppedRung());
            }
            next.put(change.name(), change.meaning());
        }
        Ladder revised = put.isEmpty() && dropped.isEmpty() ? ladder : ladder.edited(put, dropped);
        if (!inputs.isEmpty()) {
            revised = revised.withInputs(inputs);
        }
        TreeSet<String> rungs = new TreeSet<>(revised.names());
        Set<String> left = new HashSet<>(ladder.names());
        left.removeAll(set);
        rungs.removeAll(left);
        Solution solution = new Solution(revised, rungs, kept.next(), next, scatters);
        return new Solution(solution, solution.log.with(Restatement.between(this, solution)));
    }

    /**
     * This solution compared with another.
     *
     * @param origin another solution, mostly the one that this one revises
     * @return what moved, with the uncertainty of the difference
     */
    public Comparison against(Solution origin) {
        Map<String, Change.Meaning> all = new HashMap<>(origin.meanings);
        all.putAll(meanings);
        return new Comparison(origin, this, all);
    }

    /**
     * What was computed for this solution, and what was found kept.
     *
     * @return the log
     */
    public Log log() {
        return log;
    }

    Settled settled() {
        return settled;
    }

    /** The names of the set's rungs from the base up. */
    List<String> upward() {
        return ladder.upward().stream().filter(set::contains).toList();
    }

    @Override
    public String text() {
        StringBuilder text = new StringBuilder();
        for (String name : upward()) {
            text.append(calibration(ladder.rung(name)).text()).append("\n\n");
        }
        return text.append(chiSquare().text()).toString();
    }

    @Override
    public String toString() {
        return text();
    }
}
