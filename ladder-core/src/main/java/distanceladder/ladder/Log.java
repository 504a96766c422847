package distanceladder.ladder;

import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a solution had to compute, step by step, and what it found kept from the solution that it revises.
 */
public final class Log implements Shown {
    /** Rows of a rung linearised about a point. */
    public static final String ROWS = "rows";
    /** Rows divided by their errors. */
    public static final String WHITENING = "whitening";
    /** Distances eliminated within a rung: own triangle and readings. */
    public static final String ELIMINATION = "elimination";
    /** Readings of the same objects from several rungs brought together. */
    public static final String MEETING = "meeting";
    /** Objects that dense noise ties together. */
    public static final String COMPONENT = "component";
    /** Readings whose distances stay unknowns. */
    public static final String HELD = "held distances";
    /** Triangles merged. */
    public static final String MERGE = "merge";
    /** Priors put beneath, and solved. */
    public static final String SOLVE = "solve";

    private final List<Line> lines;
    private final int found;
    private final List<Restated> restated;

    private Log(List<Line> lines, int found, List<Restated> restated) {
        this.lines = lines;
        this.found = found;
        this.restated = restated;
    }

    /**
     * A step of a solution.
     *
     * @param what one of the constants of {@link Log}
     * @param where the rung, or the rungs that meet
     * @param size how many rows or columns it works on
     */
    public record Step(String what, String where, int size) {}

    /**
     * A step that was done.
     *
     * @param step the step
     * @param times how often, in an iteration
     * @param why which of its inputs were new
     */
    public record Line(Step step, int times, String why) {}

    /**
     * A rung whose values were stated anew.
     *
     * @param rung its name
     * @param largest the value that moved most, in units of its own standard deviation
     * @param sigmas by how many
     */
    public record Restated(String rung, String largest, double sigmas) {}

    /**
     * What was done, in order.
     *
     * @return the lines
     */
    public List<Line> lines() {
        return lines;
    }

    /**
     * The places where a kind of step was done.
     *
     * @param what one of the constants
     * @return where, in order
     */
    public List<String> where(String what) {
        return lines.stream()
                .filter(l -> l.step().what().equals(what))
                .map(l -> l.step().where())
                .distinct()
                .toList();
    }

    /**
     * How many steps were found kept.
     *
     * @return their number
     */
    public int keptCount() {
        return found;
    }

    /**
     * The rungs above the change, stated anew.
     *
     * @return one for each rung; empty for a solution that revises none
     */
    public List<Restated> restated() {
        return restated;
    }

    Log with(List<Restated> moves) {
        return new Log(lines, found, List.copyOf(moves));
    }

    /** At most two reasons; the line itself holds all. */
    private static String shortened(String why) {
        String[] reasons = why.split(", ", -1);
        return reasons.length <= 2 ? why : reasons[0] + " and " + (reasons.length - 1) + " more inputs changed";
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with("step", "where", "size", "times", "why");
        for (Line line : lines) {
            grid.row(line.step().what(), line.step().where(), line.step().size(), line.times(), shortened(line.why()));
        }
        String head = lines.size() + " steps done, " + found + " found kept";
        String text = grid.titled(head).build().text();
        if (restated.isEmpty()) {
            return text;
        }
        Grid.Builder moves = Grid.with("rung stated anew", "largest move", "of its own sigma");
        for (Restated r : restated) {
            moves.row(r.rung(), r.largest(), distanceladder.text.Figures.fixed(r.sigmas(), 2));
        }
        return text + "\n\n" + moves.build().text();
    }

    @Override
    public String toString() {
        return text();
    }

    /** Collects lines while a set is solved. */
    static final class Recorder {
        private final String set;
        private final Map<Step, Line> lines = new LinkedHashMap<>();
        private int found;

        Recorder(String set) {
            this.set = set;
        }

        String set() {
            return set;
        }

        void done(Step step, String why) {
            Line old = lines.get(step);
            lines.put(step, old == null ? new Line(step, 1, why) : new Line(step, old.times() + 1, old.why()));
        }

        void kept(Step step) {
            if (!lines.containsKey(step)) {
                found++;
            }
        }

        Log log() {
            return new Log(new ArrayList<>(lines.values()), found, List.of());
        }
    }
}
