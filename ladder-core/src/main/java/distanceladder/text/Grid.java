package distanceladder.text;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

/**
 * A table of text, its columns aligned: numbers on the decimal point, values with errors on the ± as well.
 *
 * <p>A column is one of numbers when at least half of the cells that are not empty are; other columns start at the left.
 */
public final class Grid implements Shown {
    private static final Pattern NUMBER = Pattern.compile("[+-]?\\d+(\\.\\d*)?(e[+-]?\\d+)?( %)?");
    private static final Pattern SCALED = Pattern.compile("\\([+-]?\\d+(\\.\\d*)?");
    private static final Pattern BREAK = Pattern.compile("\\R");
    private static final String GAP = "  ";

    private final String title;
    private final List<String> headings;
    private final List<List<String>> rows;

    private Grid(String title, List<String> headings, List<List<String>> rows) {
        this.title = title;
        this.headings = headings;
        this.rows = rows;
    }

    /**
     * A table to be filled.
     *
     * @param headings one for each column
     * @return a builder
     */
    public static Builder with(String... headings) {
        return new Builder(List.of(headings));
    }

    /** Collects the rows of a grid. */
    public static final class Builder {
        private final List<String> headings;
        private final List<List<String>> rows = new ArrayList<>();
        private String title = "";

        Builder(List<String> headings) {
            this.headings = headings;
        }

        /**
         * Gives the table a title.
         *
         * @param text shown above it
         * @return this builder
         */
        public Builder titled(String text) {
            title = text;
            return this;
        }

        /**
         * Adds a row.
         *
         * @param cells one for each column; a double is shown to six significant digits, a line break as a space
         * @return this builder
         */
        public Builder row(Object... cells) {
            if (cells.length != headings.size()) {
                throw new ValueFault(
                        cells.length + " cells",
                        "a row has one cell for each column",
                        headings.toString(),
                        "give " + headings.size());
            }
            List<String> row = new ArrayList<>();
            for (Object cell : cells) {
                String shown = cell instanceof Double x ? Figures.significant(x, 6) : String.valueOf(cell);
                row.add(BREAK.matcher(shown).replaceAll(" "));
            }
            rows.add(List.copyOf(row));
            return this;
        }

        /**
         * The finished table.
         *
         * @return an immutable grid
         */
        public Grid build() {
            return new Grid(title, headings, List.copyOf(rows));
        }
    }

    @Override
    public String text() {
        List<List<String>> columns = new ArrayList<>();
        for (int c = 0; c < headings.size(); c++) {
            columns.add(column(c));
        }
        StringBuilder text = new StringBuilder(title.isEmpty() ? "" : title + "\n");
        for (int line = -2; line < rows.size(); line++) {
            List<String> cells = new ArrayList<>();
            for (List<String> column : columns) {
                cells.add(column.get(line + 2));
            }
            text.append(String.join(GAP, cells).stripTrailing());
            text.append(line == rows.size() - 1 ? "" : "\n");
        }
        return text.toString();
    }

    /** Heading, rule and cells of a column, padded to one width. */
    private List<String> column(int index) {
        List<String> cells = new ArrayList<>();
        rows.forEach(row -> cells.add(row.get(index)));
        boolean numeric = isNumeric(cells);
        List<String> shaped = numeric ? aligned(cells) : cells;
        int width = Math.max(
                length(headings.get(index)),
                shaped.stream().mapToInt(Grid::length).max().orElse(0));
        List<String> out = new ArrayList<>();
        out.add(numeric ? left(headings.get(index), width) : right(headings.get(index), width));
        out.add("─".repeat(width));
        for (String cell : shaped) {
            out.add(numeric ? left(cell, width) : right(cell, width));
        }
        return out;
    }

    private static boolean isNumeric(List<String> cells) {
        long numbers = cells.stream().filter(Grid::isNumber).count();
        long filled = cells.stream().filter(cell -> !cell.isEmpty()).count();
        return numbers > 0 && 2 * numbers >= filled;
    }

    private static boolean isNumber(String cell) {
        String head = head(cell);
        return NUMBER.matcher(head).matches()
                || (head.length() < cell.length() && SCALED.matcher(head).matches());
    }

    /** Numbers padded so that points and ± stand under one another; other cells as they are. */
    private static List<String> aligned(List<String> cells) {
        int before = 0;
        int after = 0;
        int error = 0;
        for (String cell : cells) {
            if (isNumber(cell)) {
                before = Math.max(before, point(head(cell)));
                after = Math.max(after, length(head(cell)) - point(head(cell)));
                error = Math.max(error, length(tail(cell)));
            }
        }
        List<String> out = new ArrayList<>();
        for (String cell : cells) {
            if (isNumber(cell)) {
                String head = " ".repeat(before - point(head(cell))) + head(cell);
                out.add(right(right(head, before + after) + tail(cell), before + after + error));
            } else {
                out.add(right(cell, before + after + error));
            }
        }
        return out;
    }

    private static String head(String cell) {
        int at = cell.indexOf(" ± ");
        return at < 0 ? cell : cell.substring(0, at);
    }

    private static String tail(String cell) {
        int at = cell.indexOf(" ± ");
        return at < 0 ? "" : cell.substring(at);
    }

    private static int point(String number) {
        for (int i = 0; i < number.length(); i++) {
            if (".e %".indexOf(number.charAt(i)) >= 0) {
                return i;
            }
        }
        return number.length();
    }

    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }

    private static String right(String text, int width) {
        return text + " ".repeat(Math.max(0, width - length(text)));
    }

    private static String left(String text, int width) {
        return " ".repeat(Math.max(0, width - length(text))) + text;
    }

    @Override
    public String html() {
        StringBuilder html = new StringBuilder("<table>");
        if (!title.isEmpty()) {
            html.append("<caption>").append(escaped(title)).append("</caption>");
        }
        html.append("<tr>");
        headings.forEach(h -> html.append("<th>").append(escaped(h)).append("</th>"));
        html.append("</tr>");
        for (List<String> row : rows) {
            html.append("<tr>");
            row.forEach(cell -> html.append(isNumber(cell) ? "<td style=\"text-align:right\">" : "<td>")
                    .append(escaped(cell))
                    .append("</td>"));
            html.append("</tr>");
        }
        return html.append("</table>").toString();
    }

    /**
     * Text with the characters that HTML reads as its own replaced.
     *
     * @param text any text
     * @return text for HTML
     */
    static String escaped(String text) {
        return text.replace("&", "&amp;")
                .replace("<", "&lt;")
                .replace(">", "&gt;")
                .replace("\"", "&quot;");
    }

    @Override
    public String toString() {
        return text();
    }
}
