package distanceladder.ladder;

import distanceladder.astro.Distances;
import distanceladder.astro.Unit;
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
    private static final double NEAR = 20;
    private static final double FIRST_ORDER = 1;

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

    private static String note(Line line) {
        return line.refusal.orElse(line.sigma > FIRST_ORDER ? "first order does not hold over such an error" : "");
    }

    private static String modulus(Line line) {
        return line.refusal.isPresent() ? "none" : Figures.pair(line.modulus, line.sigma);
    }

    private static String distance(Line line, Unit unit) {
        if (line.refusal.isPresent()) {
            return "none";
        }
        double d = unit.fromBase(Distances.megaparsecFromModulus(line.modulus));
        return Figures.pair(d, d * line.sigma * StrictMath.log(10) / 5);
    }

    /** All, or the first rows and those without a distance. */
    private List<Line> shown() {
        List<Line> some = new ArrayList<>();
        for (Line line : lines) {
            if (lines.size() <= SHOWN
                    || some.size() < SHOWN / 2
                    || line.refusal.isPresent()
                    || line.sigma > FIRST_ORDER) {
                some.add(line);
            }
        }
        return some;
    }

    @Override
    public String text() {
        Unit unit = lines.stream().allMatch(l -> !(l.modulus >= NEAR)) ? Unit.KILOPARSEC : Unit.MEGAPARSEC;
        List<Line> some = shown();
        boolean notes = some.stream().anyMatch(l -> !note(l).isEmpty());
        List<String> headings =
                new ArrayList<>(List.of("object", "modulus [mag]", "distance [" + unit.symbol() + "]", "data in"));
        if (notes) {
            headings.add("note");
        }
        Grid.Builder grid = Grid.with(headings.toArray(new String[0]));
        for (Line line : some) {
            List<Object> cells = new ArrayList<>(List.of(line.object, modulus(line), distance(line, unit), line.by));
            if (notes) {
                cells.add(note(line));
            }
            grid.row(cells.toArray());
        }
        String rest = some.size() < lines.size() ? "\n... and " + (lines.size() - some.size()) + " more objects" : "";
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
