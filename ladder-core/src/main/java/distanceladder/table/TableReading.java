package distanceladder.table;

import distanceladder.astro.Unit;
import distanceladder.relation.Observations;
import distanceladder.text.NameFault;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;

/** Says which column of a table is what, and in which unit. */
public final class TableReading {
    private final Table table;
    private final String datumColumn;
    private final String objectColumn;
    private final List<NumberColumn> numbers;
    private final List<Integer> rows;

    private record NumberColumn(String name, Unit unit, String column) {}

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
        return new TableReading(table, datumColumn, datumColumn, List.of(), all);
    }

    /**
     * The data bear on the objects of another column.
     *
     * @param column the column of the objects' names; an empty cell bears on none
     * @return the reading
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
     */
    public TableReading number(String name, Unit unit, String column) {
        table.cell(0, column);
        List<NumberColumn> more = new ArrayList<>(numbers);
        more.add(new NumberColumn(name, unit, column));
        return new TableReading(table, datumColumn, objectColumn, List.copyOf(more), rows);
    }

    /**
     * Only the rows whose cell passes a test.
     *
     * @param column name of a column
     * @param test keeps a row
     * @return the reading
     */
    public TableReading where(String column, Predicate<String> test) {
        List<Integer> left =
                rows.stream().filter(row -> test.test(table.cell(row, column))).toList();
        return new TableReading(table, datumColumn, objectColumn, numbers, left);
    }

    /**
     * Reads all cells.
     *
     * @return the observations
     */
    public Observations build() {
        List<String> names = new ArrayList<>();
        List<String> objects = new ArrayList<>();
        Map<String, Integer> seen = new HashMap<>();
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
            names.add(name);
            objects.add(table.cell(row, objectColumn));
        }
        Observations out = Observations.of(table.label(), names).bearingOn(objects);
        for (NumberColumn number : numbers) {
            double[] column = rows.stream()
                    .mapToDouble(row -> table.number(row, number.column))
                    .toArray();
            out = out.with(number.name, number.unit, column);
        }
        return out;
    }
}
