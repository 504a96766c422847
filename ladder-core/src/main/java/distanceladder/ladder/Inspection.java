package distanceladder.ladder;

import distanceladder.relation.Definition;
import distanceladder.relation.Input;
import distanceladder.text.GraphFault;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** Checks a ladder once, when it is built: references, cycles, names, calibrators. */
final class Inspection {
    private final Ladder ladder;

    Inspection(Ladder ladder) {
        this.ladder = ladder;
    }

    void run() {
        for (String name : ladder.names()) {
            references(name);
        }
        Set<String> clean = new HashSet<>();
        for (String name : ladder.names()) {
            descend(name, new ArrayList<>(), clean);
        }
        sources();
        for (String name : ladder.names()) {
            calibrators(name);
        }
    }

    private void references(String name) {
        for (String beneath : ladder.restsOn(name)) {
            if (!ladder.names().contains(beneath)) {
                throw new GraphFault(
                        "rung \"" + name + "\" rests on \"" + beneath + "\"",
                        "all that a rung rests on is part of the ladder",
                        name,
                        "add it; " + Nearest.hint(beneath, ladder.names()));
            }
        }
    }

    private void descend(String name, List<String> path, Set<String> clean) {
        if (clean.contains(name)) {
            return;
        }
        int at = path.indexOf(name);
        if (at >= 0) {
            List<String> cycle = new ArrayList<>(path.subList(at, path.size()));
            cycle.add(name);
            throw new GraphFault(
                    "cycle: " + String.join(" -> ", cycle),
                    "no rung rests on itself, directly or through others",
                    name,
                    "take one of these references away");
        }
        path.add(name);
        ladder.restsOn(name).forEach(beneath -> descend(beneath, path, clean));
        path.remove(path.size() - 1);
        clean.add(name);
    }

    private void sources() {
        Map<String, Input> byUnknown = new HashMap<>();
        Map<String, Input> byName = new HashMap<>();
        for (String name : ladder.names()) {
            for (Input input : ladder.rung(name).definition().inputs()) {
                if (ladder.overridden(input.name())) {
                    continue;
                }
                Input other = byName.putIfAbsent(input.name(), input);
                if (other != null && !other.equals(input)) {
                    throw clash(input.name(), name);
                }
                for (String unknown : input.unknowns()) {
                    Input holder = byUnknown.putIfAbsent(unknown, input);
                    if ((holder != null && !holder.equals(input)) || unknown.startsWith(Ladder.unknown(""))) {
                        throw clash(unknown, name);
                    }
                }
            }
        }
    }

    private static NameFault clash(String what, String where) {
        return new NameFault(
                "two different things are called \"" + what + "\"",
                "a name means one thing within a ladder",
                "rung \"" + where + "\"",
                "hand the same source to both rungs if it is one, or rename one of them");
    }

    private void calibrators(String name) {
        Definition d = ladder.rung(name).definition();
        if (d.restsOn().isEmpty() && d.calibrators().isEmpty()) {
            return;
        }
        TreeSet<String> below = ladder.downFrom(name);
        below.remove(name);
        Set<String> provided = new TreeSet<>();
        for (String rung : below) {
            provided.addAll(ladder.rung(rung).definition().data().objects());
            provided.addAll(ladder.rung(rung).definition().relation().objects());
        }
        provided.remove("");
        for (String object : d.calibrators()) {
            if (!provided.contains(object)) {
                throw new GraphFault(
                        "calibrator \"" + object + "\" has no distance from beneath",
                        "each calibrator has data in a rung beneath",
                        "rung \"" + name + "\"",
                        "check the name; " + Nearest.hint(object, provided));
            }
        }
        Set<String> own = new TreeSet<>(d.data().objects());
        own.addAll(d.relation().objects());
        own.remove("");
        boolean linked = own.stream().anyMatch(provided::contains) || sharesParameter(d, below);
        if (!d.restsOn().isEmpty() && !own.isEmpty() && !linked) {
            String first = own.iterator().next();
            throw new GraphFault(
                    "none of the " + own.size() + " objects has a distance from beneath",
                    "a rung that rests on others has an object or a parameter in common with them",
                    "rung \"" + name + "\"",
                    "check the objects' names: \"" + first + "\"; " + Nearest.hint(first, provided));
        }
    }

    /** Whether a free parameter is fixed further down too: a relation calibrated elsewhere, and applied here. */
    private boolean sharesParameter(Definition d, Set<String> below) {
        Map<String, Input> beneath = ladder.inputs(below);
        return d.inputs().stream().anyMatch(i -> i.free() && beneath.containsKey(i.name()));
    }
}
