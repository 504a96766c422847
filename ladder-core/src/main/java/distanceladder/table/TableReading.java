package distanceladder.table;

import distanceladder.astro.Unit;
import distanceladder.relation.Observations;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/**
 * Says which column of a table is what, and in which unit.
 *
 * <p>Each call returns a new reading; no number is read before {@link #build()}. Immutable.
 */
public final class TableReading {
    private final Table table;
    private final String datumColumn;
    private final String objectColumn;
    private final List<NumberColumn> numbers;
    private final List<Integer> rows;

    private record NumberColumn(String name, Unit unit, String column, boolean positive) {}

    private TableReading(
            Table table, String datumColumn, String objectColumn, List<NumberColumn> numbers, List<Integer> rows) {
        this.table = table;
        this.datumColumn = datumColumn;
        this.objectColumn = objectColumn;
        this.numbers = numbers;
        this.rows = rows;
    }

    static TableReading of(Table table, String datumColumn) {
        table.cell(0, datumColumn);
        List<Integer> all = new ArrayList<>();
        for (int i = 0; i < table.size(); i++) {
            all.add(i);
        }
        return new TableReading(table, datumColumn, datumColumn, List.of(), List.copyOf(all));
    }

    /**
     * The data bear on the objects of another column.
     *
     * @param column the column of the objects' names; a datum with an empty cell bears on none
     * @return the reading
     * @throws NameFault when there is no such column
     */
    public TableReading object(String column) {
        table.cell(0, column);
        return new TableReading(table, datumColumn, column, numbers, rows);
    }

    /**
     * A column of numbers.
     *
     * @param name what it is called in the observations
     * @param unit its unit
     * @param column its name in the table
     * @return the reading
     * @throws NameFault when there is no such column, or the reading has this name already
     */
    public TableReading number(String name, Unit unit, String column) {
        return and(new NumberColumn(name, unit, column, false));
    }

    /**
     * A column of standard deviations, each above zero.
     *
     * @param name what it is called in the observations
     * @param unit its unit
     * @param column its name in the table
     * @return the reading
     * @throws NameFault when there is no such column, or the reading has this name already
     */
    public TableReading error(String name, Unit unit, String column) {
        return and(new NumberColumn(name, unit, column, true));
    }

    private TableReading and(NumberColumn number) {
        table.cell(0, number.column);
        if (numbers.stream().anyMatch(known -> known.name.equals(number.name))) {
            throw new NameFault(
                    "\"" + number.name + "\" is read twice",
                    "each column of the observations is read once",
                    table.label(),
                    "give column \"" + number.column + "\" another name");
        }
        List<NumberColumn> more = new ArrayList<>(numbers);
        more.add(number);
        return new TableReading(table, datumColumn, objectColumn, List.copyOf(more), rows);
    }

    /**
     * Only the rows whose cell passes a test.
     *
     * @param column name of a column
     * @param test keeps a row
     * @return the reading
     * @throws NameFault when there is no such column
     * @throws ValueFault when no row is left
     */
    public TableReading where(String column, Predicate<String> test) {
        List<Integer> left =
                rows.stream().filter(row -> test.test(table.cell(row, column))).toList();
        if (left.isEmpty()) {
            throw new ValueFault(
                    "none of " + rows.size() + " rows passes the test of column \"" + column + "\"",
                    "observations have at least one datum",
                    table.label(),
                    "choose a test that some row passes");
        }
        return new TableReading(table, datumColumn, objectColumn, numbers, left);
    }

    /**
     * Reads all cells.
     *
     * @return the observations, labelled as the table
     * @throws NameFault when a datum has no name, or two have the same
     * @throws ValueFault when a cell is not a finite number, or an error is not above zero
     */
    public Observations build() {
        List<String> objects =
                rows.stream().map(row -> table.cell(row, objectColumn)).toList();
        Observations out = Observations.of(table.label(), names()).bearingOn(objects);
        for (NumberColumn number : numbers) {
            double[] column =
                    rows.stream().mapToDouble(row -> value(row, number)).toArray();
            out = out.with(number.name, number.unit, column);
        }
        return out;
    }

    private List<String> names() {
        Map<String, Integer> seen = new LinkedHashMap<>();
        for (int row : rows) {
            String name = table.cell(row, datumColumn);
            Integer other = seen.put(name, row);
            if (name.isEmpty() || other != null) {
                throw new NameFault(
                        "datum \"" + name + "\"",
                        "each datum has a name, and no two the same",
                        table.where(row, datumColumn),
                        other == null
                                ? "give it a name"
                                : "rename it; it stands in " + table.where(other, datumColumn));
            }
        }
        return List.copyOf(seen.keySet());
    }

    private double value(int row, NumberColumn number) {
        double x = table.number(row, number.column);
        if (number.positive && !(x > 0)) {
            throw new ValueFault(
                    number.column + " = " + table.cell(row, number.column) + " " + number.unit.symbol(),
                    "a standard deviation is above zero",
                    table.where(row, number.column),
                    "give the error of the datum, or leave the row out");
        }
        return x;
    }
}
