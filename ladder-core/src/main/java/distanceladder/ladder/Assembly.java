package distanceladder.ladder;

import distanceladder.information.Coupled;
import distanceladder.information.CoupledRows;
import distanceladder.information.Elimination;
import distanceladder.information.ObjectRows;
import distanceladder.information.Readings;
import distanceladder.information.Reduction;
import distanceladder.information.Triangle;
import distanceladder.information.Unknowns;
import distanceladder.ladder.Kept.Part;
import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import distanceladder.relation.Points;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * The rows of a set of rungs at given points, brought down to one merged triangle.
 *
 * <p>Each rung's own triangle, each meeting's, each component's and the rows of held distances enter the merge exactly
 * once, in the order of their names.
 */
final class Assembly {
    /** A triangle that enters the merge. */
    record Piece(String step, String where, Triangle triangle) {}

    private final Ladder ladder;
    private final Kept kept;
    private final Log.Recorder log;
    private final TreeMap<String, Whitened> rows = new TreeMap<>();
    private final TreeMap<String, Elimination> eliminations = new TreeMap<>();
    private final TreeMap<String, Elimination> meetings = new TreeMap<>();
    private final TreeMap<String, Coupled> components = new TreeMap<>();
    private final TreeMap<String, List<Supply>> supplies = new TreeMap<>();
    private final List<Piece> pieces = new ArrayList<>();
    private final Joint joint;
    private final Reduction merged;

    /** Where a row of a component comes from: a datum of a rung, or (datum -1) the reading of an object. */
    record Supply(String rung, int datum, String object) {}

    Assembly(Ladder ladder, Map<String, Decided> decided, Kept kept, Log.Recorder log) {
        this.ladder = ladder;
        this.kept = kept;
        this.log = log;
        decided.forEach(this::addRung);
        this.joint = join();
        addOwn();
        addMeetings();
        for (Joint.Component component : joint.components()) {
            addComponent(component);
        }
        List<Part> parts = pieces.stream()
                .map(p -> new Part(p.step + " of " + p.where, p.triangle))
                .toList();
        List<Triangle> triangles = pieces.stream().map(Piece::triangle).toList();
        int width = triangles.stream().mapToInt(t -> t.unknowns().size()).sum();
        this.merged = kept.keep(
                new Log.Step(Log.MERGE, log.set(), width), parts, log, () -> Reduction.ofTriangles(triangles));
    }

    private void addRung(String name, Decided decided) {
        Points at = decided.points();
        Definition d = ladder.rung(name).definition();
        Points start = d.relation().start(d);
        Linearised linear = linearise(name, d, start);
        if (linear.curved() && !at.equals(start)) {
            linear = linearise(name, d, at);
        }
        Linearised use = linear;
        int n = d.data().size();
        Whitened white = kept.keep(
                new Log.Step(Log.WHITENING, name, n),
                List.of(new Part("its rows", use), new Part("its scatter", decided.variance())),
                log,
                () -> new Whitened(d, use, decided.scatter()));
        rows.put(name, white);
        eliminations.put(
                name,
                kept.keep(
                        new Log.Step(Log.ELIMINATION, name, white.free().size()),
                        List.of(new Part("its rows", white)),
                        log,
                        () -> Elimination.of(white.free())));
    }

    private Linearised linearise(String name, Definition d, Points at) {
        return kept.keep(
                new Log.Step(Log.ROWS, name, d.data().size()),
                List.of(new Part("its definition", d), new Part("the points of linearisation", at)),
                log,
                () -> d.relation().linearise(d, at));
    }

    private Joint join() {
        TreeMap<String, List<String>> readings = new TreeMap<>();
        List<Joint.BlockObjects> blocks = new ArrayList<>();
        TreeSet<String> tied = new TreeSet<>();
        rows.forEach((name, white) -> {
            readings.put(name, elimination(name).readings().objects());
            for (Whitened.BlockRows block : white.blocks()) {
                Set<String> objects = new HashSet<>(List.of(block.objects()));
                objects.remove("");
                blocks.add(new Joint.BlockObjects(block.name(), name, block.link(), objects));
            }
            tied.addAll(white.tiedObjects());
        });
        Set<String> exact = new HashSet<>();
        eliminations.values().forEach(e -> {
            Readings r = e.readings();
            for (int i = 0; i < r.objects().size(); i++) {
                if (r.exact(i)) {
                    exact.add(r.objects().get(i));
                }
            }
        });
        return new Joint(readings, blocks, tied, exact, ladder);
    }

    private void addOwn() {
        eliminations.forEach((name, e) -> pieces.add(new Piece(Log.ELIMINATION, name, e.own())));
        rows.forEach((name, white) -> {
            List<String> objects = heldBy(name);
            if (!objects.isEmpty()) {
                Readings readings = elimination(name).readings();
                Triangle t = kept.keep(
                        new Log.Step(Log.HELD, name, objects.size()),
                        List.of(new Part("its readings", readings), new Part("which are held", objects)),
                        log,
                        () -> readings.keeping(objects, Ladder::unknown));
                pieces.add(new Piece(Log.HELD, name, t));
            }
            if (white.tiedData().length > 0) {
                Triangle t = kept.keep(
                        new Log.Step(Log.HELD, name + " (ties)", white.tiedData().length),
                        List.of(new Part("its rows", white)),
                        log,
                        () -> tied(white).triangle());
                pieces.add(new Piece(Log.HELD + " (ties)", name, t));
            }
        });
    }

    /** Held objects of which a rung has a reading, ascending. */
    List<String> heldBy(String rung) {
        Readings readings = elimination(rung).readings();
        return joint.held().stream().filter(o -> readings.index(o) >= 0).toList();
    }

    static Reduction tied(Whitened white) {
        Unknowns wider = wider(white.unknowns(), white.tiedObjects());
        return Reduction.ofRows(wider, white.tiedRows(wider));
    }

    private static Unknowns wider(Unknowns unknowns, List<String> objects) {
        return Unknowns.union(List.of(
                unknowns, Unknowns.of(objects.stream().map(Ladder::unknown).toList())));
    }

    private void addMeetings() {
        joint.meetings().forEach((name, objects) -> {
            List<Readings> sides = joint.sides(objects.get(0)).stream()
                    .map(r -> elimination(r).readings())
                    .toList();
            List<Part> parts = new ArrayList<>();
            List<String> names = joint.sides(objects.get(0));
            for (int i = 0; i < names.size(); i++) {
                parts.add(new Part("readings of " + names.get(i), sides.get(i)));
            }
            parts.add(new Part("which objects meet", objects));
            Elimination meeting = kept.keep(
                    new Log.Step(Log.MEETING, name, objects.size() * sides.size()),
                    parts,
                    log,
                    () -> Elimination.of(ObjectRows.meeting(sides, objects)));
            meetings.put(name, meeting);
            pieces.add(new Piece(Log.MEETING, name, meeting.own()));
        });
    }

    private void addComponent(Joint.Component component) {
        List<Part> parts = new ArrayList<>();
        List<Whitened.BlockRows> blocks = new ArrayList<>();
        rows.forEach((name, white) -> {
            for (Whitened.BlockRows block : white.blocks()) {
                if (component.blocks().contains(block.name())) {
                    blocks.add(block);
                    parts.add(new Part("rows of " + name, white));
                }
            }
        });
        List<String> met = component.objects().stream()
                .filter(o -> !joint.sides(o).isEmpty())
                .toList();
        List<Double> bits = new ArrayList<>();
        for (String object : met) {
            Readings readings = readingsOf(object);
            int index = readings.index(object);
            bits.add(readings.coefficient(index));
            for (double x : readings.row(index)) {
                bits.add(x);
            }
        }
        parts.add(new Part("which objects it holds", component.objects()));
        parts.add(new Part("which distances are held", new TreeSet<>(joint.held())));
        parts.add(new Part("readings that it meets", met));
        parts.add(new Part("readings that it meets", bits));
        List<Supply> supply = new ArrayList<>();
        CoupledRows coupled = new Coupling(this).rows(blocks, met, supply);
        supplies.put(component.name(), supply);
        Coupled c = kept.keep(
                new Log.Step(Log.COMPONENT, component.name(), coupled.rows().length),
                parts,
                log,
                () -> Coupled.of(coupled, component.name()));
        components.put(component.name(), c);
        pieces.add(new Piece(Log.COMPONENT, component.name(), c.triangle()));
    }

    /** The readings in which all rungs of the set together speak of an object outside blocks. */
    Readings readingsOf(String object) {
        List<String> sides = joint.sides(object);
        return sides.size() == 1
                ? elimination(sides.get(0)).readings()
                : meeting(Joint.name(sides)).readings();
    }

    Ladder ladder() {
        return ladder;
    }

    Joint joint() {
        return joint;
    }

    Reduction merged() {
        return merged;
    }

    List<Piece> pieces() {
        return pieces;
    }

    TreeMap<String, Whitened> rows() {
        return rows;
    }

    Whitened rows(String rung) {
        return present(rows.get(rung), rung);
    }

    Elimination elimination(String rung) {
        return present(eliminations.get(rung), rung);
    }

    Elimination meeting(String name) {
        return present(meetings.get(name), name);
    }

    Coupled component(String name) {
        return present(components.get(name), name);
    }

    List<Supply> supply(String component) {
        return present(supplies.get(component), component);
    }

    private static <T> T present(@org.jspecify.annotations.Nullable T found, String name) {
        if (found == null) {
            throw new IllegalArgumentException(name + " is not part of this solution");
        }
        return found;
    }
}
