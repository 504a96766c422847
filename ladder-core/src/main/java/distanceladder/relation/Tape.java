package distanceladder.relation;

import java.util.ArrayList;
import java.util.List;

/** The store of {@link Dual} numbers that one row after the other uses again. */
final class Tape {
    private final int variables;
    private final List<Dual> store = new ArrayList<>();
    private int used;

    Tape(int variables) {
        this.variables = variables;
    }

    /** Makes all numbers free for use again. */
    void rewind() {
        used = 0;
    }

    Dual next() {
        if (used == store.size()) {
            store.add(new Dual(this, variables));
        }
        return store.get(used++);
    }

    Dual constant(double x) {
        Dual out = next();
        out.value = x;
        out.constant = true;
        out.curved = false;
        java.util.Arrays.fill(out.partial, 0);
        return out;
    }

    Dual variable(int index, double x) {
        Dual out = constant(x);
        out.constant = false;
        out.partial[index] = 1;
        return out;
    }
}
