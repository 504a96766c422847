package distanceladder.ladder;

import distanceladder.relation.Distance;
import distanceladder.relation.Input;
import distanceladder.relation.Rung;
import distanceladder.text.GraphFault;
import distanceladder.text.Grid;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.Shown;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Rungs as a directed acyclic graph: which rests on which, by name.
 *
 * <p>Branches that share a base and meet again are ordinary. Within a ladder a name means one thing: rungs refer to one
 * another by name, and so do sources, so that a replaced rung or source is seen by all that refer to it. Immutable.
 */
public final class Ladder implements Shown {
    private final TreeMap<String, Rung<?>> rungs;
    private final Map<String, Input> overrides;

    private Ladder(TreeMap<String, Rung<?>> rungs, Map<String, Input> overrides) {
        this.rungs = rungs;
        this.overrides = overrides;
        new Inspection(this).run();
    }

    /**
     * The ladder of some rungs and of all that they rest on.
     *
     * @param tops one rung or several
     * @return the ladder
     */
    public static Ladder of(Rung<?>... tops) {
        TreeMap<String, Rung<?>> found = new TreeMap<>();
        for (Rung<?> top : tops) {
            collect(top, found);
        }
        if (found.isEmpty()) {
            throw new GraphFault("no rung", "a ladder has a rung", "", "give one");
        }
        return new Ladder(found, Map.of());
    }

    private static void collect(Rung<?> rung, Map<String, Rung<?>> found) {
        Rung<?> other = found.get(rung.name());
        if (other == rung) {
            return;
        }
        if (other != null) {
            throw new NameFault(
                    "two different rungs are called \"" + rung.name() + "\"",
                    "a name means one thing within a ladder",
                    "",
                    "build the upper rungs on the same rung, rename one, or revise a solution instead");
        }
        found.put(rung.name(), rung);
        rung.definition().restsOn().forEach(beneath -> collect(beneath, found));
    }

    /** This ladder with rungs put in (or in the place of their namesakes) and others taken out. */
    Ladder edited(Collection<? extends Rung<?>> put, Collection<String> dropped) {
        TreeMap<String, Rung<?>> next = new TreeMap<>(rungs);
        for (String name : dropped) {
            require(name);
            next.remove(name);
        }
        for (Rung<?> rung : put) {
            next.put(rung.name(), rung);
        }
        for (Rung<?> rung : put) {
            addMissing(rung, next, dropped);
        }
        for (String name : dropped) {
            next.replaceAll((key, rung) -> withoutReference(rung, name));
        }
        return new Ladder(next, overrides);
    }

    private static void addMissing(Rung<?> rung, Map<String, Rung<?>> next, Collection<String> dropped) {
        for (Rung<?> beneath : rung.definition().restsOn()) {
            if (!next.containsKey(beneath.name()) && !dropped.contains(beneath.name())) {
                next.put(beneath.name(), beneath);
                addMissing(beneath, next, dropped);
            }
        }
    }

    private static Rung<?> withoutReference(Rung<?> rung, String name) {
        List<Rung<?>> left = new ArrayList<>(rung.definition().restsOn());
        if (!left.removeIf(r -> r.name().equals(name))) {
            return rung;
        }
        return rung.like(rung.definition().restingOn(left));
    }

    /** This ladder with sources in the place of their namesakes. */
    Ladder withInputs(Collection<? extends Input> inputs) {
        Map<String, Input> next = new HashMap<>(overrides);
        Map<String, Input> known = inputs();
        for (Input input : inputs) {
            Input old = known.get(input.name());
            if (old == null) {
                throw new NameFault(
                        "source \"" + input.name() + "\"",
                        "a source that is changed is part of the ladder",
                        "",
                        Nearest.hint(input.name(), known.keySet()));
            }
            if (!old.unknowns().equals(input.unknowns())) {
                throw new NameFault(
                        "source \"" + input.name() + "\" has other members than before",
                        "a source that is changed keeps its members",
                        "",
                        "replace the rungs that use it");
            }
            next.put(input.name(), input);
        }
        return new Ladder(rungs, next);
    }

    /**
     * The solution over all rungs.
     *
     * @return the solved ladder
     */
    public Solution solve() {
        return Solution.of(this);
    }

    /**
     * The names of all rungs.
     *
     * @return in ascending order
     */
    public Set<String> names() {
        return Collections.unmodifiableSet(rungs.keySet());
    }

    /**
     * A rung by name.
     *
     * @param name its name
     * @return the rung
     */
    public Rung<?> rung(String name) {
        Rung<?> rung = rungs.get(name);
        if (rung == null) {
            throw unknown(name, rungs.keySet());
        }
        return rung;
    }

    /**
     * A rung by name, typed.
     *
     * @param name its name
     * @param kind its class
     * @param <R> its class
     * @return the rung
     */
    public <R extends Rung<R>> R rung(String name, Class<R> kind) {
        Rung<?> rung = rung(name);
        if (!kind.isInstance(rung)) {
            throw new NameFault(
                    "rung \"" + name + "\" is a " + rung.getClass().getSimpleName(),
                    "it is asked for as what it is",
                    "",
                    "ask for " + rung.getClass().getSimpleName());
        }
        return kind.cast(rung);
    }

    private void require(String name) {
        if (!rungs.containsKey(name)) {
            throw unknown(name, rungs.keySet());
        }
    }

    private static NameFault unknown(String name, Set<String> known) {
        return new NameFault("rung \"" + name + "\"", "a rung of the ladder is named", "", Nearest.hint(name, known));
    }

    /** A source of this ladder in its present state. */
    Input input(Input reference) {
        return overrides.getOrDefault(reference.name(), reference);
    }

    /** The names of the rungs on which a rung rests directly. */
    List<String> restsOn(String name) {
        return rung(name).definition().restsOn().stream()
                .map(Rung::name)
                .sorted()
                .toList();
    }

    /**
     * A rung and all that it rests on.
     *
     * @param name name of a rung
     * @return names in ascending order
     */
    public TreeSet<String> downFrom(String name) {
        TreeSet<String> found = new TreeSet<>();
        List<String> open = new ArrayList<>(List.of(name));
        while (!open.isEmpty()) {
            String next = open.remove(open.size() - 1);
            if (found.add(next)) {
                open.addAll(restsOn(next));
            }
        }
        return found;
    }

    /** Names from the base up: each after all that it rests on; ties by name. */
    List<String> upward() {
        List<String> order = new ArrayList<>();
        Set<String> done = new HashSet<>();
        while (order.size() < rungs.size()) {
            for (String name : rungs.keySet()) {
                if (!done.contains(name) && done.containsAll(restsOn(name))) {
                    order.add(name);
                    done.add(name);
                }
            }
        }
        return order;
    }

    /** All sources by name, replaced ones in their present state. */
    Map<String, Input> inputs() {
        return inputs(rungs.keySet());
    }

    /** The sources of some rungs by name. */
    TreeMap<String, Input> inputs(Collection<String> set) {
        TreeMap<String, Input> found = new TreeMap<>();
        for (String name : set) {
            for (Input input : rung(name).definition().inputs()) {
                Input now = overrides.getOrDefault(input.name(), input);
                found.put(now.name(), now);
            }
        }
        return found;
    }

    /** The sources that were replaced since the rungs were built. */
    boolean overridden(String name) {
        return overrides.containsKey(name);
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with("rung", "kind", "data", "objects", "rests on");
        for (String name : upward()) {
            Rung<?> rung = rung(name);
            long objects = rung.definition().data().objects().stream()
                    .filter(o -> !o.isEmpty())
                    .distinct()
                    .count();
            grid.row(
                    name,
                    rung.getClass().getSimpleName(),
                    rung.definition().data().size(),
                    objects,
                    String.join(", ", restsOn(name)));
        }
        return grid.titled("ladder of " + rungs.size() + " rungs").build().text();
    }

    @Override
    public String toString() {
        return text();
    }

    /** The unknown that stands for an object's distance. */
    static String unknown(String object) {
        return Distance.unknown(object);
    }
}
