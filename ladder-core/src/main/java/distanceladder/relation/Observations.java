package distanceladder.relation;

import distanceladder.astro.Unit;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.Shown;
import distanceladder.text.ValueFault;
import java.util.Arrays;
import java.util.Collection;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;

/**
 * A table of data: each datum has a name, bears on one object or on none, and has a number in every column.
 *
 * <p>Data and objects are two things: many data may bear on one object. Numbers are kept in the base unit of their
 * column's dimension (mas, Mpc, mag, km/s, ...). Immutable.
 */
public final class Observations implements Shown {
    private final String label;
    private final List<String> names;
    private final List<String> objects;
    private final Map<String, Column> columns;

    private record Column(Unit unit, double[] base) {}

    private Observations(String label, List<String> names, List<String> objects, Map<String, Column> columns) {
        this.label = label;
        this.names = names;
        this.objects = objects;
        this.columns = columns;
    }

    /**
     * A table of data, each bearing on the object of its own name.
     *
     * @param label where the data come from, for messages
     * @param names names of the data, distinct
     * @return a table without columns
     */
    public static Observations of(String label, List<String> names) {
        if (names.isEmpty()) {
            throw new ValueFault("0 data", "a table has at least one datum", label, "add data");
        }
        Set<String> seen = new HashSet<>();
        for (String name : names) {
            if (name.isBlank()) {
                throw new NameFault("a datum without a name", "each datum has a name", label, "give it one");
            }
            if (!seen.add(name)) {
                throw new NameFault(
                        "datum \"" + name + "\" stands twice",
                        "names of data are distinct",
                        label,
                        "rename one of them");
            }
        }
        List<String> copy = List.copyOf(names);
        return new Observations(label, copy, copy, new LinkedHashMap<>());
    }

    /**
     * A table of data, each bearing on the object of its own name.
     *
     * @param label where the data come from, for messages
     * @param names names of the data, distinct
     * @return a table without columns
     */
    public static Observations of(String label, String... names) {
        return of(label, List.of(names));
    }

    /**
     * The same data bearing on other objects.
     *
     * @param others for each datum the name of its object, "" for none
     * @return the table
     */
    public Observations bearingOn(List<String> others) {
        requireLength("objects", others.size());
        return new Observations(label, names, List.copyOf(others), columns);
    }

    /**
     * The same data bearing on other objects.
     *
     * @param others for each datum the name of its object, "" for none
     * @return the table
     */
    public Observations bearingOn(String... others) {
        return bearingOn(List.of(others));
    }

    /**
     * Adds or replaces a column.
     *
     * @param column its name
     * @param unit the unit of the numbers
     * @param numbers one finite number for each datum
     * @return the table
     */
    public Observations with(String column, Unit unit, double... numbers) {
        requireLength("numbers in column \"" + column + "\"", numbers.length);
        double[] base = new double[numbers.length];
        for (int i = 0; i < base.length; i++) {
            if (!Double.isFinite(numbers[i])) {
                throw new ValueFault(
                        column + " = " + numbers[i] + " " + unit.symbol(),
                        "numbers are finite",
                        label + ", datum \"" + names.get(i) + "\"",
                        "give a number or leave the datum out");
            }
            base[i] = unit.toBase(numbers[i]);
        }
        Map<String, Column> more = new LinkedHashMap<>(columns);
        more.put(column, new Column(unit, base));
        return new Observations(label, names, objects, more);
    }

    private void requireLength(String what, int length) {
        if (length != names.size()) {
            throw new ValueFault(
                    length + " " + what,
                    "there is one for each of the " + names.size() + " data",
                    label,
                    "give " + names.size());
        }
    }

    /**
     * The same column under another name.
     *
     * @param column a column
     * @param other its new name
     * @return the table
     */
    public Observations renamed(String column, String other) {
        Column found = find(column);
        Map<String, Column> more = new LinkedHashMap<>(columns);
        more.remove(column);
        more.put(other, found);
        return new Observations(label, names, objects, more);
    }

    /**
     * Where the data come from.
     *
     * @return the label
     */
    public String label() {
        return label;
    }

    /**
     * How many data there are.
     *
     * @return rows of the table
     */
    public int size() {
        return names.size();
    }

    /**
     * The data's names.
     *
     * @return in the order of the table
     */
    public List<String> names() {
        return names;
    }

    /**
     * The objects that the data bear on.
     *
     * @return for each datum an object's name, "" for none
     */
    public List<String> objects() {
        return objects;
    }

    /**
     * The columns' names.
     *
     * @return in the order in which they were added
     */
    public List<String> columns() {
        return List.copyOf(columns.keySet());
    }

    /**
     * Whether there is a column.
     *
     * @param column its name
     * @return true when it is there
     */
    public boolean has(String column) {
        return columns.containsKey(column);
    }

    /**
     * A column's numbers in base units.
     *
     * @param column its name
     * @return a copy, one number for each datum
     */
    public double[] column(String column) {
        return find(column).base.clone();
    }

    /**
     * A column's unit.
     *
     * @param column its name
     * @return the unit in which it was given
     */
    public Unit unit(String column) {
        return find(column).unit;
    }

    /**
     * Checks that a column is there and has the dimension of a unit.
     *
     * @param column its name
     * @param like a unit of the dimension wanted
     */
    public void require(String column, Unit like) {
        Unit unit = find(column).unit;
        if (!unit.dimension().equals(like.dimension())) {
            throw new ValueFault(
                    "column \"" + column + "\" is in " + unit.symbol(),
                    "it is convertible to " + like.symbol(),
                    label,
                    "give it in " + like.symbol());
        }
    }

    /**
     * A column of standard deviations: each above zero.
     *
     * @param column its name
     * @param like a unit of the dimension wanted
     * @return a copy in base units
     */
    public double[] errors(String column, Unit like) {
        require(column, like);
        double[] base = column(column);
        for (int i = 0; i < base.length; i++) {
            if (!(base[i] > 0)) {
                Unit unit = unit(column);
                throw new ValueFault(
                        column + " = " + Figures.significant(unit.fromBase(base[i]), 6) + " " + unit.symbol(),
                        "a standard deviation is above zero",
                        label + ", datum \"" + names.get(i) + "\"",
                        "give the error of the datum, or leave the datum out");
            }
        }
        return base;
    }

    private Column find(String column) {
        Column found = columns.get(column);
        if (found == null) {
            throw new NameFault(
                    "column \"" + column + "\"",
                    "the table has the columns that its rung reads",
                    label,
                    "add or rename a column; " + Nearest.hint(column, columns.keySet()));
        }
        return found;
    }

    /**
     * Some of the data, in a given order.
     *
     * @param rows indices of data
     * @return the table of these data
     */
    public Observations part(int... rows) {
        Map<String, Column> cut = new LinkedHashMap<>();
        columns.forEach((name, column) -> cut.put(
                name,
                new Column(
                        column.unit,
                        Arrays.stream(rows).mapToDouble(i -> column.base[i]).toArray())));
        return new Observations(
                label,
                Arrays.stream(rows).mapToObj(names::get).toList(),
                Arrays.stream(rows).mapToObj(objects::get).toList(),
                cut);
    }

    /**
     * The indices of all data but some.
     *
     * @param dropped names of data to leave out, each present
     * @return the rows that stay
     */
    public int[] rowsWithout(Collection<String> dropped) {
        Map<String, Integer> at = new HashMap<>();
        for (int i = 0; i < names.size(); i++) {
            at.put(names.get(i), i);
        }
        for (String name : dropped) {
            if (!at.containsKey(name)) {
                throw new NameFault(
                        "datum \"" + name + "\"", "a datum that is dropped is there", label, Nearest.hint(name, names));
            }
        }
        Set<String> out = new HashSet<>(dropped);
        return IntStream.range(0, names.size())
                .filter(i -> !out.contains(names.get(i)))
                .toArray();
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with(java.util.stream.Stream.concat(
                        java.util.stream.Stream.of("datum", "object"),
                        columns.entrySet().stream()
                                .map(e -> e.getKey()
                                        + (e.getValue().unit.symbol().isEmpty()
                                                ? ""
                                                : " [" + e.getValue().unit.symbol() + "]")))
                .toArray(String[]::new));
        int shown = Math.min(size(), 12);
        for (int i = 0; i < shown; i++) {
            Object[] cells = new Object[columns.size() + 2];
            cells[0] = names.get(i);
            cells[1] = objects.get(i);
            int next = 2;
            for (Column column : columns.values()) {
                cells[next++] = Figures.significant(column.unit.fromBase(column.base[i]), 6);
            }
            grid.row(cells);
        }
        String rest = shown < size() ? "\n... and " + (size() - shown) + " more data" : "";
        return grid.titled(label + ": " + size() + " data").build().text() + rest;
    }

    @Override
    public String toString() {
        return text();
    }
}
