package distanceladder.table;

import de.siegmar.fastcsv.reader.CommentStrategy;
import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import distanceladder.text.Grid;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.Shown;
import distanceladder.text.ValueFault;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * A table of comma-separated text with a header line (RFC 4180; lines that begin with # are comments).
 *
 * <p>Read strictly: column names are distinct, every row has a cell for each column, and there is at least one row.
 */
public final class Table implements Shown {
    private final String label;
    private final List<String> columns;
    private final List<List<String>> rows;
    private final List<Long> lines;

    private Table(String label, List<String> columns, List<List<String>> rows, List<Long> lines) {
        this.label = label;
        this.columns = columns;
        this.rows = rows;
        this.lines = lines;
    }

    /**
     * Reads a file in UTF-8.
     *
     * @param file the file
     * @return its table
     */
    public static Table read(Path file) {
        String name = String.valueOf(file.getFileName());
        try {
            return parse(name, Files.readString(file, StandardCharsets.UTF_8));
        } catch (NoSuchFileException missing) {
            throw new NameFault("file \"" + file + "\"", "a table that is named exists", "", "check the path");
        } catch (IOException failed) {
            throw new ValueFault(
                    "file \"" + file + "\" cannot be read: " + failed.getMessage(),
                    "a table is a readable text in UTF-8",
                    name,
                    "check the file and its encoding");
        }
    }

    /**
     * Reads text.
     *
     * @param label what the table is called in messages
     * @param text the text
     * @return its table
     */
    public static Table parse(String label, String text) {
        String clean = text.startsWith("\uFEFF") ? text.substring(1) : text;
        List<List<String>> rows = new ArrayList<>();
        List<Long> lines = new ArrayList<>();
        try (CsvReader<CsvRecord> reader = CsvReader.builder()
                .commentStrategy(CommentStrategy.SKIP)
                .ignoreDifferentFieldCount(true)
                .ofCsvRecord(clean)) {
            for (CsvRecord record : reader) {
                rows.add(record.getFields().stream().map(String::strip).toList());
                lines.add(record.getStartingLineNumber());
            }
        } catch (CsvParseException | IOException broken) {
            throw new ValueFault(
                    "the text is not a table: " + broken.getMessage(),
                    "a table is comma-separated text, quotes are closed",
                    label,
                    "check quotes and line ends");
        }
        return checked(label, rows, lines);
    }

    private static Table checked(String label, List<List<String>> rows, List<Long> lines) {
        if (rows.size() < 2) {
            throw new ValueFault(
                    Math.max(0, rows.size() - 1) + " rows",
                    "a table has a header line and at least one row",
                    label,
                    "add data");
        }
        List<String> columns = rows.get(0);
        Set<String> seen = new HashSet<>();
        for (int c = 0; c < columns.size(); c++) {
            if (columns.get(c).isEmpty() || !seen.add(columns.get(c))) {
                throw new NameFault(
                        "column " + (c + 1) + " is called \"" + columns.get(c) + "\"",
                        "columns have distinct names",
                        label + ", line " + lines.get(0),
                        "rename it");
            }
        }
        for (int r = 1; r < rows.size(); r++) {
            if (rows.get(r).size() != columns.size()) {
                throw new ValueFault(
                        rows.get(r).size() + " cells",
                        "each row has a cell for each of the " + columns.size() + " columns",
                        label + ", line " + lines.get(r),
                        "add or take away cells, or quote a cell that holds a comma");
            }
        }
        return new Table(
                label, columns, List.copyOf(rows.subList(1, rows.size())), List.copyOf(lines.subList(1, lines.size())));
    }

    /**
     * The table's name.
     *
     * @return file name or label
     */
    public String label() {
        return label;
    }

    /**
     * The columns' names.
     *
     * @return in the order of the header
     */
    public List<String> columns() {
        return columns;
    }

    /**
     * How many rows there are.
     *
     * @return rows without the header
     */
    public int size() {
        return rows.size();
    }

    /**
     * One cell.
     *
     * @param row index from 0
     * @param column name of a column
     * @return its text without surrounding blanks
     */
    public String cell(int row, String column) {
        return rows.get(row).get(index(column));
    }

    /**
     * One cell as a number.
     *
     * @param row index from 0
     * @param column name of a column
     * @return a finite number
     */
    public double number(int row, String column) {
        String cell = cell(row, column);
        try {
            double x = Double.parseDouble(cell);
            if (Double.isFinite(x) && plain(cell)) {
                return x;
            }
        } catch (NumberFormatException notANumber) {
            // Refused below, with its place.
        }
        throw new ValueFault(
                column + " = \"" + cell + "\"",
                "the cell is a finite number",
                where(row, column),
                "write a decimal number, or leave the row out");
    }

    /** Java reads "1d" and "0x1p3" as numbers; a table does not mean them so. */
    private static boolean plain(String cell) {
        return cell.chars().allMatch(c -> "0123456789+-.eE".indexOf(c) >= 0);
    }

    /**
     * Where a cell stands.
     *
     * @param row index from 0
     * @param column name of a column
     * @return file, line and column
     */
    public String where(int row, String column) {
        return label + ", line " + lines.get(row) + ", column " + (index(column) + 1) + " (" + column + ")";
    }

    private int index(String column) {
        int index = columns.indexOf(column);
        if (index < 0) {
            throw new NameFault(
                    "column \"" + column + "\"",
                    "a column that is read is in the table",
                    label,
                    Nearest.hint(column, columns));
        }
        return index;
    }

    /**
     * Begins to turn the table into observations.
     *
     * @param datumColumn the column of the data's names
     * @return a reading to which columns are added
     */
    public TableReading observations(String datumColumn) {
        return TableReading.of(this, datumColumn);
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with(columns.toArray(new String[0]));
        rows.stream().limit(12).forEach(row -> grid.row(row.toArray()));
        return grid.titled(label + ": " + size() + " rows").build().text();
    }

    @Override
    public String toString() {
        return text();
    }
}
