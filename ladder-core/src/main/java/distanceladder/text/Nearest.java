package distanceladder.text;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Known names that are nearest to one that is not known. */
public final class Nearest {
    private static final int MOST = 3;
    private static final int LISTED = 8;

    private Nearest() {}

    /**
     * The known names within a few edits of a name.
     *
     * @param wanted the name that was not found
     * @param known the names that exist
     * @return at most three, nearest first
     */
    public static List<String> to(String wanted, Collection<String> known) {
        int limit = Math.max(2, wanted.length() / 2);
        return known.stream()
                .distinct()
                .filter(name -> Math.abs(name.length() - wanted.length()) <= limit)
                .map(name -> new Candidate(name, distance(wanted, name)))
                .filter(candidate -> candidate.edits <= limit && candidate.sharesWith(wanted))
                .sorted(Comparator.comparingInt(Candidate::edits).thenComparing(Candidate::name))
                .limit(MOST)
                .map(Candidate::name)
                .toList();
    }

    private record Candidate(String name, int edits) {
        /** Whether a character is left over when all edits are done: "H0" is not near "zp". */
        boolean sharesWith(String wanted) {
            return edits < Math.max(name.length(), wanted.length());
        }
    }

    /**
     * A phrase for the repair of a refusal.
     *
     * @param wanted the name that was not found
     * @param known the names that exist
     * @return the nearest names, or else the first few that are known
     */
    public static String hint(String wanted, Collection<String> known) {
        List<String> near = to(wanted, known);
        if (!near.isEmpty()) {
            return "nearest known: " + quoted(near);
        }
        if (known.isEmpty()) {
            return "none are known";
        }
        List<String> sorted = known.stream().distinct().sorted().toList();
        String first = quoted(sorted.subList(0, Math.min(LISTED, sorted.size())));
        return "known: " + first + (sorted.size() > LISTED ? " and " + (sorted.size() - LISTED) + " more" : "");
    }

    private static String quoted(List<String> names) {
        return "\"" + String.join("\", \"", names) + "\"";
    }

    /**
     * Edits (insert, drop, replace, swap neighbours) between two names, upper and lower case alike (Damerau 1964; no
     * character is edited twice).
     */
    static int distance(String a, String b) {
        String x = a.toLowerCase(Locale.ROOT);
        String y = b.toLowerCase(Locale.ROOT);
        int[][] d = new int[x.length() + 1][y.length() + 1];
        for (int i = 0; i <= x.length(); i++) {
            for (int j = 0; j <= y.length(); j++) {
                d[i][j] = i == 0 ? j : j == 0 ? i : edit(d, x, y, i, j);
            }
        }
        return d[x.length()][y.length()];
    }

    private static int edit(int[][] d, String x, String y, int i, int j) {
        int replace = d[i - 1][j - 1] + (x.charAt(i - 1) == y.charAt(j - 1) ? 0 : 1);
        int least = Math.min(replace, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
        boolean swapped = i > 1 && j > 1 && x.charAt(i - 1) == y.charAt(j - 2) && x.charAt(i - 2) == y.charAt(j - 1);
        return swapped ? Math.min(least, d[i - 2][j - 2] + 1) : least;
    }
}
