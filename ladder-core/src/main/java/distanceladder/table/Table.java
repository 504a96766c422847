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
 * A table of comma-separated text with a header line (RFC 4180), read strictly.
 *
 * <p>Lines that begin with # are comments and stand above the header; empty lines are skipped. Column names are
 * distinct and not blank, every row has a cell for each column, there is at least one row, and quotes are closed: what
 * does not fit is refused, and no row is left out silently. Cells are taken without surrounding blanks. Immutable.
 */
public final class Table implements Shown {
    private static final int SHOWN = 12;

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
     * @param file the file; a byte order mark is skipped
     * @return its table, labelled with the file's name
     * @throws NameFault when there is no such file, or a column's name is blank or stands twice
     * @throws ValueFault when the file cannot be read or its text is no table
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
     * @throws NameFault when a column's name is blank or stands twice
     * @throws ValueFault when quotes are not closed, a row is too short or too long, a comment stands under the header,
     *     or there are no rows
     */
    public static Table parse(String label, String text) {
        String clean = text.startsWith("\uFEFF") ? text.substring(1) : text;
        Quotes.check(label, clean);
        List<List<String>> rows = new ArrayList<>();
        List<Long> lines = new ArrayList<>();
        try (CsvReader<CsvRecord> reader = CsvReader.builder()
                .commentStrategy(CommentStrategy.READ)
                .acceptCharsAfterQuotes(false)
                .ignoreDifferentFieldCount(true)
                .ofCsvRecord(clean)) {
            for (CsvRecord record : reader) {
                if (!record.isComment()) {
                    rows.add(record.getFields().stream().map(String::strip).toList());
                    lines.add(record.getStartingLineNumber());
                } else if (!rows.isEmpty()) {
                    throw lateComment(label, record);
                }
            }
        } catch (CsvParseException | IOException broken) {
            throw new ValueFault(
                    "the text is not a table: " + broken.getMessage(),
                    "a table is comma-separated text of moderate cells",
                    label,
                    "check separators and line ends");
        }
        return checked(label, rows, lines);
    }

    /** Skipped, a row whose first name begins with # would be lost. */
    private static ValueFault lateComment(String label, CsvRecord record) {
        return new ValueFault(
                "the line begins with #",
                "comments stand above the header",
                label + ", line " + record.getStartingLineNumber(),
                "move the comment to the top; if it is a row, put its first cell in quotes");
    }

    private static Table checked(String label, List<List<String>> rows, List<Long> lines) {
        if (rows.size() < 2) {
            throw new ValueFault(
                    rows.isEmpty() ? "no header" : "0 rows",
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
     * @throws NameFault when there is no such column
     * @throws ValueFault when there is no such row
     */
    public String cell(int row, String column) {
        return rows.get(within(row)).get(index(column));
    }

    /**
     * The line on which a row begins.
     *
     * @param row index from 0
     * @return its number in the text, from 1; comments, empty lines and the header count
     * @throws ValueFault when there is no such row
     */
    public long line(int row) {
        return lines.get(within(row));
    }

    private int within(int row) {
        if (row < 0 || row >= size()) {
            throw new ValueFault(
                    "row " + row,
                    "rows are counted from 0 to " + (size() - 1),
                    label,
                    "ask for a row that is in the table");
        }
        return row;
    }

    /**
     * One cell as a number.
     *
     * @param row index from 0
     * @param column name of a column
     * @return a finite number
     * @throws NameFault when there is no such column
     * @throws ValueFault when there is no such row, or the cell is not a finite decimal number
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
        for (int i = 0; i < cell.length(); i++) {
            if ("0123456789+-.eE".indexOf(cell.charAt(i)) < 0) {
                return false;
            }
        }
        return true;
    }

    /**
     * Where a cell stands.
     *
     * @param row index from 0
     * @param column name of a column
     * @return file, line and column
     * @throws NameFault when there is no such column
     * @throws ValueFault when there is no such row
     */
    public String where(int row, String column) {
        return label + ", line " + line(row) + ", column " + (index(column) + 1) + " (" + column + ")";
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
     * @throws NameFault when there is no such column
     */
    public TableReading observations(String datumColumn) {
        return TableReading.of(this, datumColumn);
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with(columns.toArray(new String[0]));
        rows.stream().limit(SHOWN).forEach(row -> grid.row(row.toArray()));
        String rest = size() > SHOWN ? "\n... and " + (size() - SHOWN) + " more rows" : "";
        return grid.titled(label + ": " + size() + (size() == 1 ? " row" : " rows"))
                        .build()
                        .text()
                + rest;
    }

    @Override
    public String toString() {
        return text();
    }
}
