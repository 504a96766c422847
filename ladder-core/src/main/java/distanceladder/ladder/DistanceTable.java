package distanceladder.ladder;

import distanceladder.astro.Distances;
import distanceladder.relation.Definition;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The distances of a rung's objects in a solution. */
public final class DistanceTable implements Shown {
    private static final int SHOWN = 20;

    private final String rung;
    private final List<Line> lines;

    private DistanceTable(String rung, List<Line> lines) {
        this.rung = rung;
        this.lines = lines;
    }

    /**
     * One object.
     *
     * @param object its name
     * @param modulus distance modulus, mag; NaN without one
     * @param sigma its standard deviation, mag
     * @param by the rungs whose data speak of it
     * @param refusal why it has no distance, empty when it has
     */
    public record Line(String object, double modulus, double sigma, String by, Optional<String> refusal) {}

    static DistanceTable of(Solution solution, String rung) {
        Settled settled = solution.settled();
        Definition d = solution.ladder().rung(rung).definition();
        List<Line> lines = new ArrayList<>();
        d.data().objects().stream()
                .filter(o -> !o.isEmpty())
                .distinct()
                .sorted()
                .forEach(object -> {
                    Optional<String> refusal = settled.refusal(object);
                    String by = String.join(", ", settled.assembly().joint().sides(object));
                    if (refusal.isPresent()) {
                        lines.add(new Line(object, Double.NaN, Double.NaN, by, refusal));
                    } else {
                        Stated modulus = settled.distance(object);
                        lines.add(new Line(object, modulus.value(), modulus.sigma(), by, refusal));
                    }
                });
        return new DistanceTable(rung, List.copyOf(lines));
    }

    /**
     * All objects.
     *
     * @return in the order of their names
     */
    public List<Line> lines() {
        return lines;
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with("object", "modulus [mag]", "distance [Mpc]", "data in");
        int shown = Math.min(SHOWN, lines.size());
        for (Line line : lines.subList(0, shown)) {
            if (line.refusal.isPresent()) {
                grid.row(line.object, "none", line.refusal.get(), line.by);
            } else {
                double d = Distances.megaparsecFromModulus(line.modulus);
                grid.row(
                        line.object,
                        Figures.pair(line.modulus, line.sigma),
                        Figures.pair(d, d * line.sigma * StrictMath.log(10) / 5),
                        line.by);
            }
        }
        String rest = shown < lines.size() ? "\n... and " + (lines.size() - shown) + " more objects" : "";
        return grid.titled("Distances of " + rung + ": " + lines.size() + " objects")
                        .build()
                        .text()
                + rest;
    }

    @Override
    public String toString() {
        return text();
    }
}
