package distanceladder.information;

import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.TreeSet;

/**
 * The names of the columns of a system of rows, distinct and in ascending order.
 *
 * <p>The order of columns is the order of names, never the order of arrival: the same rows give the same bits whoever
 * brought them first. Names compare by UTF-16 code units ({@link String#compareTo}).
 */
public final class Unknowns {
    private static final Unknowns NONE = new Unknowns(new String[0]);

    private final String[] names;

    private Unknowns(String[] names) {
        this.names = names;
    }

    /**
     * No unknown at all.
     *
     * @return the empty set of names
     */
    public static Unknowns none() {
        return NONE;
    }

    /**
     * Sorts the names and drops repeats.
     *
     * @param names names of unknowns
     * @return the sorted, distinct names
     */
    public static Unknowns of(Collection<String> names) {
        return names.isEmpty() ? NONE : new Unknowns(new TreeSet<>(names).toArray(new String[0]));
    }

    /**
     * The union of several sets.
     *
     * @param parts sets of unknowns
     * @return all names of all parts
     */
    public static Unknowns union(Collection<Unknowns> parts) {
        TreeSet<String> all = new TreeSet<>();
        for (Unknowns part : parts) {
            all.addAll(part.asList());
        }
        return of(all);
    }

    /**
     * How many unknowns there are.
     *
     * @return number of columns
     */
    public int size() {
        return names.length;
    }

    /**
     * The name of one column.
     *
     * @param column index from 0
     * @return its name
     */
    public String name(int column) {
        return names[column];
    }

    /**
     * The column of a name.
     *
     * @param name name of an unknown
     * @return its column, or a negative number when it is not among them
     */
    public int column(String name) {
        return Arrays.binarySearch(names, name);
    }

    /**
     * All names in order.
     *
     * @return an unmodifiable view
     */
    public List<String> asList() {
        return List.of(names);
    }

    /**
     * Where each of these unknowns stands in a larger set.
     *
     * @param larger a set that holds them all
     * @return for each column here, its column there (ascending)
     */
    public int[] columnsIn(Unknowns larger) {
        int[] at = new int[names.length];
        for (int j = 0; j < names.length; j++) {
            at[j] = larger.column(names[j]);
            if (at[j] < 0) {
                throw new IllegalArgumentException(names[j] + " is not among " + larger.asList());
            }
        }
        return at;
    }

    @Override
    public boolean equals(Object other) {
        return this == other || (other instanceof Unknowns that && Arrays.equals(names, that.names));
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(names);
    }

    @Override
    public String toString() {
        return asList().toString();
    }
}
