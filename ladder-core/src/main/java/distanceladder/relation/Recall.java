package distanceladder.relation;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.function.Function;

/**
 * Things looked up by name, row after row, in an order that is mostly the same: the next name is compared by identity with
 * the one that was asked for at this place in the row before, and only otherwise looked up.
 */
final class Recall<T> {
    private final Function<String, T> find;
    private final Map<String, T> known = new HashMap<>();
    private String[] names = new String[0];
    private Object[] things = new Object[0];
    private int next;

    Recall(Function<String, T> find) {
        this.find = find;
    }

    /** Begins another row. */
    void rewind() {
        next = 0;
    }

    @SuppressWarnings({"ReferenceEquality", "unchecked"})
    T get(String name) {
        int at = next++;
        if (at < names.length && names[at] == name) {
            return (T) things[at];
        }
        return lookedUp(name, at);
    }

    private T lookedUp(String name, int at) {
        T thing = known.computeIfAbsent(name, find);
        if (at >= names.length) {
            names = Arrays.copyOf(names, 2 * at + 8);
            things = Arrays.copyOf(things, names.length);
        }
        names[at] = name;
        things[at] = thing;
        return thing;
    }
}
