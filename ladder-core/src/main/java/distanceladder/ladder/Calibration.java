package distanceladder.ladder;

import distanceladder.astro.Unit;
import distanceladder.relation.Definition;
import distanceladder.relation.Distance;
import distanceladder.relation.Input;
import distanceladder.relation.Value;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.List;

/** The parameters of one rung in a solution, and how well it fits. */
public final class Calibration implements Shown {
    private final String title;
    private final List<Line> lines;

    private Calibration(String title, List<Line> lines) {
        this.title = title;
        this.lines = lines;
    }

    /**
     * A parameter or derived value of the rung.
     *
     * @param role its role in the rung
     * @param estimate its estimate
     * @param how free, exact or with a prior
     */
    public record Line(String role, Estimate estimate, String how) {}

    static Calibration of(Solution solution, String rung) {
        Settled settled = solution.settled();
        Definition d = solution.ladder().rung(rung).definition();
        Evaluation evaluation = new Evaluation(settled);
        List<Line> lines = new ArrayList<>();
        for (Value value : d.highlights()) {
            lines.add(new Line("", evaluation.estimate(value), "derived"));
        }
        d.parameters().forEach((role, unknown) -> {
            Input input = solution.ladder().input(d.input(role).orElseThrow());
            Value value = input.value(unknown);
            lines.add(new Line(role, evaluation.estimate(value), how(input)));
        });
        long met = d.data().objects().stream()
                .filter(o -> !o.isEmpty())
                .distinct()
                .filter(o -> settled.assembly().joint().sides(o).size() > 1
                        || settled.assembly().joint().held().contains(o))
                .count();
        String scatter = scatter(settled.assembly().rows(rung), settled);
        long objects =
                d.data().objects().stream().filter(o -> !o.isEmpty()).distinct().count();
        String title =
                rung + " (" + d.description() + ")\n" + Figures.count(d.data().size(), "datum", "data") + " on "
                        + Figures.count(objects, "object", "objects") + ", " + met + " met in other rungs" + scatter;
        return new Calibration(title, List.copyOf(lines));
    }

    private static String scatter(Whitened white, Settled settled) {
        Definition d = white.definition();
        double variance = white.noise().scatter() * white.noise().scatter();
        Double error = settled.scatterVariances().get(d.name());
        String symbol = " " + unit(d).symbol();
        if (white.noise().exact()) {
            return "; declared exact";
        }
        if (error != null) {
            double sigma = unit(d).fromBase(white.noise().scatter());
            double half = variance == 0
                    ? Math.sqrt(unit(d).fromBase(unit(d).fromBase(Math.sqrt(error))))
                    : unit(d).fromBase(Math.sqrt(error) / (2 * white.noise().scatter()));
            return "; scatter " + Figures.pair(sigma, half) + symbol + " (estimated by this set)";
        }
        if (d.noise().mode() == distanceladder.relation.Noise.Scatter.ESTIMATED) {
            return "; scatter "
                    + Figures.significant(unit(d).fromBase(white.noise().scatter()), 3) + symbol + " (taken over)";
        }
        return variance == 0
                ? ""
                : "; scatter "
                        + Figures.significant(unit(d).fromBase(white.noise().scatter()), 3) + symbol + " (given)";
    }

    private static Unit unit(Definition d) {
        return d.data().unit(d.observable());
    }

    private static String how(Input input) {
        if (input.free()) {
            return "free";
        }
        return input.root()[0].length == 0 ? "exact" : "prior";
    }

    /**
     * The values.
     *
     * @return derived ones first, then the parameters by role
     */
    public List<Line> lines() {
        return lines;
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with("value", "estimate", "unit", "statistical", "systematic", "how");
        for (Line line : lines) {
            Estimate e = line.estimate;
            boolean certain = e.sigma() == 0;
            grid.row(
                    e.name(),
                    Figures.pair(e.value(), e.sigma()),
                    e.unit().symbol(),
                    certain ? "" : Figures.sigma(e.statistical()),
                    certain ? "" : Figures.sigma(e.systematic()),
                    line.how);
        }
        return grid.titled(title).build().text();
    }

    @Override
    public String toString() {
        return text();
    }

    /** All values that a solution states for a rung: parameters, derived values, and distances. */
    static List<Value> values(Solution solution, String rung) {
        Definition d = solution.ladder().rung(rung).definition();
        List<Value> values = new ArrayList<>(d.highlights());
        d.parameters().forEach((role, unknown) -> values.add(d.value(role)));
        d.data().objects().stream()
                .filter(o -> !o.isEmpty() && solution.refusal(o).isEmpty())
                .distinct()
                .sorted()
                .forEach(o -> values.add(new Distance(o)));
        return values;
    }
}
