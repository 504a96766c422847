package distanceladder.relation;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;

/**
 * Things looked up by name, row after row, in an order that is mostly the same: the next name is compared by identity with
 * the one that was asked for at this place in the row before, and only otherwise looked up.
 */
final class Recall<T> {
    private final Function<String, T> find;
    private final Map<String, T> known = new HashMap<>();
    private final List<String> names = new ArrayList<>();
    private final List<T> things = new ArrayList<>();
    private int next;

    Recall(Function<String, T> find) {
        this.find = find;
    }

    /** Begins another row. */
    void rewind() {
        next = 0;
    }

    @SuppressWarnings("ReferenceEquality")
    T get(String name) {
        int at = next++;
        if (at < names.size() && names.get(at) == name) {
            return things.get(at);
        }
        T thing = known.get(name);
        if (thing == null) {
            thing = find.apply(name);
            known.put(name, thing);
        }
        if (at < names.size()) {
            names.set(at, name);
            things.set(at, thing);
        } else if (at == names.size()) {
            names.add(name);
            things.add(thing);
        }
        return thing;
    }
}
