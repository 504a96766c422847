package distanceladder.ladder;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;

/**
 * What was computed, kept under exactly what it was computed from.
 *
 * <p>Every step of a solution is a pure function of immutable inputs. A step is looked up under its inputs, engine
 * results and definitions by identity, points and names by their bits; so a revised ladder gives what a ladder built
 * from scratch gives, bit for bit, and nothing has to be marked as out of date. A revision sees what its origin
 * computed, and holds on only to what it uses itself.
 */
final class Kept {
    /** An input of a step, with the word by which the log calls it when it is the reason for doing the step again. */
    record Part(String word, Object thing) {}

    private record Key(String step, String where, List<Part> parts) {}

    private record Place(String set, String step, String where) {}

    private final Map<Key, Object> own = new HashMap<>();
    private final Map<Place, List<Part>> last = new HashMap<>();
    private final Map<Key, Object> inherited;
    private final Map<Place, List<Part>> before;

    private Kept(Map<Key, Object> inherited, Map<Place, List<Part>> before) {
        this.inherited = inherited;
        this.before = before;
    }

    static Kept empty() {
        return new Kept(Map.of(), Map.of());
    }

    /** For a revision: what is here can be used there. */
    synchronized Kept next() {
        return new Kept(new HashMap<>(own), new HashMap<>(last));
    }

    /**
     * The result of a step.
     *
     * @param step what is done, and where
     * @param parts its inputs
     * @param log receives a line when it has to be done
     * @param make does it
     */
    @SuppressWarnings("unchecked")
    synchronized <T> T keep(Log.Step step, List<Part> parts, Log.Recorder log, Supplier<T> make) {
        Key key = new Key(step.what(), step.where(), parts);
        Place place = new Place(log.set(), step.what(), step.where());
        Object found = own.get(key);
        if (found == null) {
            found = inherited.get(key);
            if (found != null) {
                own.put(key, found);
            }
        }
        if (found == null) {
            log.done(step, why(place, parts));
            found = make.get();
            own.put(key, found);
        } else {
            log.kept(step);
        }
        last.put(place, parts);
        return (T) found;
    }

    private String why(Place place, List<Part> parts) {
        List<Part> old = last.containsKey(place) ? last.get(place) : before.get(place);
        if (old == null) {
            return "new";
        }
        List<String> words = new ArrayList<>();
        for (Part part : parts) {
            if (!old.contains(part) && !words.contains(part.word())) {
                words.add(part.word());
            }
        }
        for (Part part : old) {
            if (!parts.contains(part) && !words.contains(part.word())) {
                words.add(part.word());
            }
        }
        return words.isEmpty() ? "not kept" : String.join(", ", words) + " changed";
    }
}
