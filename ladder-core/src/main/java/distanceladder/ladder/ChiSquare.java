package distanceladder.ladder;

import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.List;

/**
 * Chi-square of a solution, rung by rung.
 *
 * <p>A rung's chi-square is that of it and all beneath less that of all beneath, at the same points and weights; degrees
 * of freedom likewise. What the whole has beyond the rungs' sum is the <em>rejoining</em> term: how well branches that
 * meet again agree with one another, and with the priors of what they share.
 */
public final class ChiSquare implements Shown {
    private final List<Line> lines;
    private final Line rejoining;
    private final Line total;

    ChiSquare(List<Line> lines, Line rejoining, Line total) {
        this.lines = List.copyOf(lines);
        this.rejoining = rejoining;
        this.total = total;
    }

    /**
     * A part of chi-square.
     *
     * @param name the rung, or what the part is
     * @param value chi-square; NaN where the rungs beneath alone leave something undetermined
     * @param degreesOfFreedom degrees of freedom
     */
    public record Line(String name, double value, int degreesOfFreedom) {}

    /**
     * The rungs' parts.
     *
     * @return from the base up
     */
    public List<Line> rungs() {
        return lines;
    }

    /**
     * The whole less the rungs' sum.
     *
     * @return the agreement of branches
     */
    public Line rejoining() {
        return rejoining;
    }

    /**
     * The whole.
     *
     * @return chi-square of the solution
     */
    public Line total() {
        return total;
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with("rung", "chi-square", "degrees of freedom", "ratio");
        for (Line line : lines) {
            add(grid, line);
        }
        add(grid, rejoining);
        add(grid, total);
        return grid.titled("Chi-square").build().text();
    }

    private static void add(Grid.Builder grid, Line line) {
        boolean known = !Double.isNaN(line.value);
        grid.row(
                line.name,
                known ? Figures.significant(line.value, 4) : "not defined",
                line.degreesOfFreedom,
                known && line.degreesOfFreedom > 0 ? Figures.significant(line.value / line.degreesOfFreedom, 3) : "");
    }

    @Override
    public String toString() {
        return text();
    }
}
