package distanceladder.ladder;

import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Which rungs of a set speak of which objects, and how their readings come together.
 *
 * <p>An object is <em>held</em> when its distance stays an unknown of the solution: a calibrator of a dense block (while
 * these are few), or one that a row shares with other objects. Other objects of a dense block belong to a
 * <em>component</em>: blocks that share such an object are one component. Of the rest, readings of one object from
 * several rungs meet; a single reading says nothing of anything but its object.
 */
final class Joint {
    /** A block keeps its calibrators as unknowns up to this many; beyond, they are eliminated like targets. */
    static final int MOST_HELD = 64;

    /** Blocks tied together by shared objects, with the objects whose distances they eliminate. */
    record Component(String name, List<String> blocks, List<String> objects) {}

    private final TreeSet<String> held = new TreeSet<>();
    private final TreeMap<String, List<String>> meetings = new TreeMap<>();
    private final Map<String, List<String>> sides = new HashMap<>();
    private final List<Component> components = new ArrayList<>();
    private final Map<String, Component> componentOf = new HashMap<>();

    /** The objects of a dense block that stand in it, with the rung that it belongs to. */
    record BlockObjects(String block, String rung, String link, Set<String> objects) {}

    Joint(
            Map<String, List<String>> readings,
            List<BlockObjects> blocks,
            Collection<String> tied,
            Set<String> exact,
            Ladder ladder) {
        Map<String, TreeSet<String>> speakers = new TreeMap<>();
        readings.forEach((rung, objects) -> objects.forEach(
                o -> speakers.computeIfAbsent(o, key -> new TreeSet<>()).add(rung)));
        held.addAll(tied);
        for (BlockObjects block : blocks) {
            holdCalibrators(block, speakers, blocks, ladder);
        }
        for (String object : tied) {
            if (exact.contains(object)) {
                throw new ValueFault(
                        "object \"" + object + "\" is exact, and a row bears on it and on others",
                        "an object of a row with several objects has a distance with an error",
                        "object \"" + object + "\"",
                        "give its exact distance an error, or take the object out of that row");
            }
        }
        held.removeAll(exact);
        components(blocks);
        TreeMap<String, List<String>> found = new TreeMap<>();
        speakers.forEach((object, rungs) -> {
            List<String> list = List.copyOf(rungs);
            sides.put(object, list);
            if (list.size() > 1 && !held.contains(object)) {
                found.computeIfAbsent(name(list), key -> new ArrayList<>()).add(object);
            }
        });
        meetings.putAll(found);
    }

    static String name(List<String> rungs) {
        return String.join(" + ", rungs);
    }

    private void holdCalibrators(
            BlockObjects block, Map<String, TreeSet<String>> speakers, List<BlockObjects> blocks, Ladder ladder) {
        TreeSet<String> beneath = ladder.downFrom(block.rung);
        beneath.remove(block.rung);
        Set<String> calibrators = new HashSet<>();
        for (String object : block.objects) {
            boolean below =
                    speakers.getOrDefault(object, new TreeSet<>()).stream().anyMatch(beneath::contains)
                            || blocks.stream().anyMatch(b -> beneath.contains(b.rung) && b.objects.contains(object));
            if (below) {
                calibrators.add(object);
            }
        }
        if (calibrators.size() <= MOST_HELD) {
            held.addAll(calibrators);
        }
    }

    private void components(List<BlockObjects> blocks) {
        int[] root = new int[blocks.size()];
        Map<String, Integer> first = new HashMap<>();
        for (int b = 0; b < root.length; b++) {
            root[b] = b;
            if (!blocks.get(b).link.isEmpty()) {
                Integer other = first.putIfAbsent("joint noise " + blocks.get(b).link, b);
                if (other != null) {
                    join(root, b, other);
                }
            }
            for (String object : blocks.get(b).objects) {
                if (!held.contains(object)) {
                    Integer other = first.putIfAbsent(object, b);
                    if (other != null) {
                        join(root, b, other);
                    }
                }
            }
        }
        Map<Integer, List<Integer>> groups = new TreeMap<>();
        for (int b = 0; b < root.length; b++) {
            groups.computeIfAbsent(find(root, b), key -> new ArrayList<>()).add(b);
        }
        for (List<Integer> group : groups.values()) {
            TreeSet<String> names = new TreeSet<>();
            TreeSet<String> objects = new TreeSet<>();
            for (int b : group) {
                names.add(blocks.get(b).block);
                objects.addAll(blocks.get(b).objects);
            }
            objects.removeAll(held);
            List<String> list = List.copyOf(names);
            Component component = new Component(name(list), list, List.copyOf(objects));
            components.add(component);
            objects.forEach(o -> componentOf.put(o, component));
        }
    }

    private static int find(int[] root, int i) {
        int at = i;
        while (root[at] != at) {
            at = root[at];
        }
        return at;
    }

    private static void join(int[] root, int a, int b) {
        int x = find(root, a);
        int y = find(root, b);
        root[Math.max(x, y)] = Math.min(x, y);
    }

    /** Objects whose distances are unknowns, ascending. */
    TreeSet<String> held() {
        return held;
    }

    /** Rungs that meet (their names joined), with the objects on which they do. */
    TreeMap<String, List<String>> meetings() {
        return meetings;
    }

    /** The rungs that have a reading of an object, ascending; empty when none has. */
    List<String> sides(String object) {
        return sides.getOrDefault(object, List.of());
    }

    List<Component> components() {
        return components;
    }

    Component componentOf(String object) {
        Component found = componentOf.get(object);
        if (found == null) {
            throw new IllegalArgumentException(object + " is in no component");
        }
        return found;
    }

    boolean inComponent(String object) {
        return componentOf.containsKey(object);
    }

    /** All objects with a distance in the set. */
    TreeSet<String> objects() {
        TreeSet<String> all = new TreeSet<>(sides.keySet());
        all.addAll(componentOf.keySet());
        all.addAll(held);
        return all;
    }
}
