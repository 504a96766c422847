package distanceladder.ladder;

import distanceladder.relation.Input;
import distanceladder.relation.Kind;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Where the variance of a value comes from: one term for each source and for the data of each rung, adding up to it.
 *
 * <p>In the joint fit the value is {@code q = q0 + sum_s A_s (s - s0)}; the term of a source is {@code A_s C_s A_sT}. The
 * other habit of the trade is stated beside it and named as such: the fit repeated with every systematic source held at
 * its value gives a "statistical" error, and what is missing to the total is called systematic. The two differ, since
 * the joint fit weights the data with all errors in mind.
 */
public final class Budget implements Shown {
    private final Estimate estimate;
    private final List<Term> terms;
    private final double heldSigma;

    private Budget(Estimate estimate, List<Term> terms, double heldSigma) {
        this.estimate = estimate;
        this.terms = terms;
        this.heldSigma = heldSigma;
    }

    /**
     * A share of the variance.
     *
     * @param name the source, or the rung whose data it is
     * @param rung the rung, empty for a source
     * @param kind statistical or systematic
     * @param variance the share, in the value's unit squared
     */
    public record Term(String name, String rung, Kind kind, double variance) {
        /**
         * The root of the share.
         *
         * @return in the value's unit
         */
        public double sigma() {
            return Math.sqrt(variance);
        }
    }

    static Budget of(Estimate estimate, Gains gains, double heldSigma) {
        List<Term> terms = new ArrayList<>();
        double scale = estimate.unit().fromBase(1) * estimate.unit().fromBase(1);
        Settled settled = gains.settled();
        for (Input input : settled.ladder().inputs(settled.set()).values()) {
            double[] along = gains.sources().get(input.name());
            if (along != null && along.length > 0) {
                terms.add(new Term(input.name(), "", input.kind(), scale * Gains.squares(along)));
            }
        }
        gains.variances()
                .forEach((rung, variance) ->
                        terms.add(new Term("data of " + rung, rung, Kind.STATISTICAL, scale * variance)));
        gains.joints().forEach((name, variance) -> terms.add(new Term(name, "", Kind.STATISTICAL, scale * variance)));
        terms.sort(Comparator.comparingDouble(Term::variance).reversed().thenComparing(Term::name));
        return new Budget(estimate, List.copyOf(terms), heldSigma);
    }

    /**
     * The value that it is the budget of.
     *
     * @return its estimate
     */
    public Estimate estimate() {
        return estimate;
    }

    /**
     * All terms, largest first.
     *
     * @return by source and by rung
     */
    public List<Term> terms() {
        return terms;
    }

    /**
     * One term.
     *
     * @param name name of a source, or "data of " and the name of a rung
     * @return its variance, 0 when it has no term
     */
    public double variance(String name) {
        return terms.stream()
                .filter(t -> t.name().equals(name))
                .mapToDouble(Term::variance)
                .sum();
    }

    /**
     * The part of one kind, by source in the joint fit.
     *
     * @param kind statistical or systematic
     * @return the sum of its terms' variances
     */
    public double variance(Kind kind) {
        return terms.stream()
                .filter(t -> t.kind() == kind)
                .mapToDouble(Term::variance)
                .sum();
    }

    /**
     * The sum of all terms.
     *
     * @return the variance of the value
     */
    public double total() {
        return terms.stream().mapToDouble(Term::variance).sum();
    }

    /**
     * By the other habit: the standard deviation of the fit with every systematic source held at its value.
     *
     * @return in the value's unit
     */
    public double statisticalWithSystematicsHeld() {
        return heldSigma;
    }

    /**
     * By the other habit: what is missing from the fit with systematics held to the total.
     *
     * @return root of the difference of variances
     */
    public double systematicAsRemainder() {
        return Math.sqrt(Math.max(0, estimate.variance() - heldSigma * heldSigma));
    }

    @Override
    public String text() {
        String unit = estimate.unit().symbol();
        Grid.Builder grid = Grid.with("term", "kind", "sigma [" + unit + "]", "share of variance");
        double total = total();
        for (Term t : terms) {
            grid.row(
                    t.name(),
                    t.kind().name().toLowerCase(java.util.Locale.ROOT),
                    Figures.significant(t.sigma(), 3),
                    Figures.percent(total == 0 ? 0 : t.variance() / total));
        }
        grid.row("all terms", "", Figures.significant(Math.sqrt(total), 3), Figures.percent(1));
        return grid.titled("Error budget of " + estimate.name() + " = " + estimate.figures())
                        .build()
                        .text()
                + "\nby source in the joint fit: statistical "
                + Figures.sigma(Math.sqrt(variance(Kind.STATISTICAL)))
                + ", systematic " + Figures.sigma(Math.sqrt(variance(Kind.SYSTEMATIC)))
                + "\nas total minus the fit with systematics held: statistical "
                + Figures.sigma(heldSigma)
                + ", systematic " + Figures.sigma(systematicAsRemainder());
    }

    @Override
    public String toString() {
        return text();
    }
}
