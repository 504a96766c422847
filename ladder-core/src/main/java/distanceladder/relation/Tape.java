package distanceladder.relation;

import java.util.Arrays;

/** The store of {@link Dual} numbers that one row after the other uses again. */
final class Tape {
    private final int variables;
    private Dual[] store;
    private int used;

    Tape(int variables) {
        this.variables = variables;
        this.store = new Dual[0];
    }

    /** Makes all numbers free for use again. */
    void rewind() {
        used = 0;
    }

    Dual next() {
        if (used == store.length) {
            grow();
        }
        return store[used++];
    }

    private void grow() {
        Dual[] more = Arrays.copyOf(store, 16 + 2 * store.length);
        for (int i = store.length; i < more.length; i++) {
            more[i] = new Dual(this, variables);
        }
        store = more;
    }

    Dual constant(double x) {
        Dual out = next();
        out.value = x;
        out.only = Dual.NONE;
        out.slope = 0;
        out.curved = false;
        return out;
    }

    Dual variable(int index, double x) {
        return set(next(), index, x);
    }

    /** A variable that stays when others are made free. */
    Dual lasting(int index, double x) {
        return set(new Dual(this, variables), index, x);
    }

    private static Dual set(Dual out, int index, double x) {
        out.value = x;
        out.only = index;
        out.slope = 1;
        out.curved = false;
        return out;
    }
}
