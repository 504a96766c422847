package distanceladder.ladder;

import distanceladder.relation.Distance;
import distanceladder.relation.Value;
import distanceladder.text.Fault;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Two solutions compared, value by value, with the uncertainty of the difference.
 *
 * <p>With gains a and b of both over the union of data and sources, matched by name, {@code Var(q' - q)} is that of
 * {@code sum b_i e'_i - a_i e_i}. Errors that both share cancel, so it is far smaller than the two variances added. What
 * the error of a changed input is in both, is said by the change ({@link Change.Meaning}). A what-if moves values
 * exactly; its size is then told in units of the value's own standard deviation.
 */
public final class Comparison implements Shown {
    /** Variances of a difference below this share of the value's own are rounding. */
    static final double ROUNDING = 1e-14;

    private final Solution before;
    private final Solution after;
    private final Map<String, Change.Meaning> meanings;

    Comparison(Solution before, Solution after, Map<String, Change.Meaning> meanings) {
        this.before = before;
        this.after = after;
        this.meanings = meanings;
    }

    /**
     * A value in both solutions.
     *
     * @param name its name
     * @param before its estimate before
     * @param after its estimate after
     * @param move after minus before
     * @param sigma standard deviation of the difference; 0 when the move is exact
     */
    public record Line(String name, Estimate before, Estimate after, double move, double sigma) {
        /**
         * Whether the move has no uncertainty of its own.
         *
         * @return true for a what-if of a linear ladder
         */
        public boolean exact() {
            return sigma == 0;
        }
    }

    /**
     * One value compared.
     *
     * @param value a handle that both solutions know
     * @return its line
     */
    public Line of(Value value) {
        Evaluation old = new Evaluation(before.settled());
        Evaluation now = new Evaluation(after.settled());
        Estimate first = old.estimate(value);
        Estimate second = now.estimate(value);
        Difference difference = new Difference(old.gains(value), now.gains(value), meanings);
        double scale = value.unit().fromBase(1);
        double variance = scale * scale * difference.variance();
        double own = Math.max(first.variance(), second.variance());
        double sigma = variance > ROUNDING * own ? Math.sqrt(variance) : 0;
        return new Line(value.name(), first, second, second.value() - first.value(), sigma);
    }

    /**
     * All parameters and derived values that both know.
     *
     * @return from the base up
     */
    public List<Line> lines() {
        Map<String, Line> lines = new LinkedHashMap<>();
        for (String rung : after.upward()) {
            for (Value value : Calibration.values(after, rung)) {
                if (!(value instanceof Distance) && !lines.containsKey(value.name())) {
                    known(value, lines);
                }
            }
        }
        return new ArrayList<>(lines.values());
    }

    private void known(Value value, Map<String, Line> lines) {
        try {
            Line line = of(value);
            if (line.before.sigma() > 0 || line.after.sigma() > 0 || line.move != 0) {
                lines.put(value.name(), line);
            }
        } catch (Fault notInBoth) {
            // A value of one solution only has nothing to be compared with.
        }
    }

    /** Whether the same data are only supposed different: same rungs, same data, no other meaning of a change. */
    private boolean supposed() {
        if (!before.rungs().equals(after.rungs())
                || meanings.values().stream().anyMatch(m -> m != Change.Meaning.WHAT_IF)) {
            return false;
        }
        return before.rungs().stream().allMatch(r -> names(before, r).equals(names(after, r)));
    }

    private static List<String> names(Solution solution, String rung) {
        return solution.ladder().rung(rung).definition().data().names();
    }

    @Override
    public String text() {
        return supposed() ? movesAlone() : movesWithErrors();
    }

    private String movesAlone() {
        Grid.Builder grid = Grid.with("value", "before", "after", "unit", "move", "in its sigma");
        for (Line line : lines()) {
            Object[] cells = cells(line);
            grid.row(cells[0], cells[1], cells[2], cells[3], cells[4], cells[5]);
        }
        return grid.titled("What moved (a what-if: the same data supposed different, so moves are exact)")
                .build()
                .text();
    }

    private String movesWithErrors() {
        Grid.Builder grid =
                Grid.with("value", "before", "after", "unit", "move", "in its sigma", "sigma of difference", "in that");
        for (Line line : lines()) {
            Object[] cells = cells(line);
            grid.row(
                    cells[0],
                    cells[1],
                    cells[2],
                    cells[3],
                    cells[4],
                    cells[5],
                    line.exact() ? "exact" : Figures.sigma(line.sigma),
                    line.exact() ? "" : Figures.fixed(line.move / line.sigma, 2));
        }
        return grid.titled("What moved").build().text();
    }

    private static Object[] cells(Line line) {
        return new Object[] {
            line.name,
            Figures.pair(line.before.value(), line.before.sigma()),
            Figures.pair(line.after.value(), line.after.sigma()),
            line.after.unit().symbol(),
            Figures.move(line.move, Math.max(line.before.sigma(), line.after.sigma())),
            line.after.sigma() == 0 ? "" : Figures.fixed(line.move / line.after.sigma(), 2)
        };
    }

    @Override
    public String toString() {
        return text();
    }
}
