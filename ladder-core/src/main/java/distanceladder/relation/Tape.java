package distanceladder.relation;

import java.util.Arrays;

/** The store of {@link Dual} numbers that one row after the other uses again. */
final class Tape {
    private final int variables;
    private Dual[] store = new Dual[0];
    private int used;

    Tape(int variables) {
        this.variables = variables;
    }

    /** Makes all numbers free for use again. */
    void rewind() {
        used = 0;
    }

    Dual next() {
        if (used == store.length) {
            int old = store.length;
            store = Arrays.copyOf(store, 2 * old + 16);
            for (int i = old; i < store.length; i++) {
                store[i] = new Dual(this, variables);
            }
        }
        return store[used++];
    }

    Dual constant(double x) {
        return set(next(), x);
    }

    private static Dual set(Dual out, double x) {
        out.value = x;
        out.constant = true;
        out.curved = false;
        out.from = 0;
        out.to = 0;
        return out;
    }

    Dual variable(int index, double x) {
        return varied(next(), index, x);
    }

    /** A variable with a store of its own, which no rewinding takes back. */
    Dual lasting(int index, double x) {
        return varied(new Dual(this, variables), index, x);
    }

    private static Dual varied(Dual out, int index, double x) {
        set(out, x);
        out.constant = false;
        out.from = index;
        out.to = index + 1;
        out.partial[index] = 1;
        return out;
    }
}
