package distanceladder.ladder;

import distanceladder.astro.Unit;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.List;

/**
 * Observed minus fitted for each datum of a rung, and the pull: the residual divided by its own standard deviation.
 *
 * <p>{@code Var(residual) = C_ii + s^2 - Var(fitted)}. A datum that alone fixes its object's distance has residual 0 and
 * no pull: nothing checks it.
 */
public final class Residuals implements Shown {
    private final String rung;
    private final Unit unit;
    private final List<Line> lines;

    Residuals(String rung, Unit unit, List<Line> lines) {
        this.rung = rung;
        this.unit = unit;
        this.lines = List.copyOf(lines);
    }

    /**
     * One datum.
     *
     * @param datum its name
     * @param object the object it bears on, "" for none
     * @param residual observed minus fitted
     * @param sigma standard deviation of the datum
     * @param pull residual over its standard deviation; NaN where nothing checks the datum
     */
    public record Line(String datum, String object, double residual, double sigma, double pull) {}

    /**
     * The residuals.
     *
     * @return in the order of the table
     */
    public List<Line> lines() {
        return lines;
    }

    /**
     * The unit of residuals.
     *
     * @return unit of the observable
     */
    public Unit unit() {
        return unit;
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with(
                "datum", "object", "residual [" + unit.symbol() + "]", "sigma [" + unit.symbol() + "]", "pull");
        for (Line line : lines) {
            grid.row(
                    line.datum,
                    line.object,
                    Figures.signed(line.residual, 3),
                    Figures.significant(line.sigma, 3),
                    Double.isNaN(line.pull) ? "unchecked" : Figures.signed(line.pull, 2));
        }
        return grid.titled("Residuals of " + rung).build().text();
    }

    @Override
    public String toString() {
        return text();
    }
}
