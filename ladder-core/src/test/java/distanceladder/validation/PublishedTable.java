package distanceladder.validation;

import java.util.ArrayList;
import java.util.List;

/** A published table as it stands in a test: one line for each row, a name first, then numbers. */
final class PublishedTable {
    private final List<String[]> rows;

    private PublishedTable(List<String[]> rows) {
        this.rows = rows;
    }

    static PublishedTable of(String text) {
        List<String[]> rows = new ArrayList<>();
        text.strip().lines().forEach(line -> {
            String[] cells = line.strip().split(" +", -1);
            if (!rows.isEmpty() && cells.length != rows.get(0).length) {
                throw new IllegalArgumentException("\"" + line + "\" has not " + rows.get(0).length + " cells");
            }
            rows.add(cells);
        });
        return new PublishedTable(rows);
    }

    int size() {
        return rows.size();
    }

    List<String> names(int column) {
        return rows.stream().map(cells -> cells[column]).toList();
    }

    double[] numbers(int column) {
        return rows.stream()
                .mapToDouble(cells -> Double.parseDouble(cells[column]))
                .toArray();
    }
}
