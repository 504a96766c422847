package distanceladder.information;

import distanceladder.text.RankFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/**
 * A merged triangle with the priors of its unknowns, solved.
 *
 * <p>The unknowns with a prior are replaced by {@code s = mean + L v}; the columns are then the free unknowns (by name)
 * and the v of each prior (in the given order). The rows of the data's triangle come first, the priors' rows
 * {@code v = 0} beneath. With the resulting R and z: {@code x = R^-1 z}; for a linear combination {@code q = k + cT x}:
 * {@code t = R^-T c}, {@code q = k + tT z}, {@code Cov(q, q') = tT t'}, gains {@code Q t}. No inverse is formed.
 *
 * <p>Rank: a free column whose diagonal element is at most {@code n eps} of the length of its original column cannot be
 * told from the columns before it; the null vector names those ({@link RankFault}).
 */
public final class Solved {
    private static final double EPSILON = 0x1p-52;

    private final Map<String, Integer> free = new HashMap<>();
    private final Map<String, int[]> known = new HashMap<>();
    private final List<String> names = new ArrayList<>();
    private final List<Prior> priors;
    private final int[] starts;
    private final int columns;
    private final double[][] r;
    private final double[][] data;
    private final double[][] beneath;
    private final double[] dataHeads;
    private final double[] beneathHeads;
    private final double chiSquare;

    private Solved(Triangle merged, List<Prior> priors) {
        this.priors = List.copyOf(priors);
        this.starts = new int[priors.size()];
        for (int k = 0; k < priors.size(); k++) {
            Prior prior = priors.get(k);
            for (int i = 0; i < prior.unknowns().size(); i++) {
                known.put(prior.unknowns().get(i), new int[] {k, i});
            }
        }
        for (String name : merged.unknowns().asList()) {
            if (!known.containsKey(name)) {
                free.put(name, free.size());
                names.add(name);
            }
        }
        int next = free.size();
        for (int k = 0; k < starts.length; k++) {
            starts[k] = next;
            next += priors.get(k).rank();
        }
        this.columns = next;
        this.r = new double[columns][columns + 1];
        this.dataHeads = new double[2 * columns];
        this.beneathHeads = new double[2 * columns];
        this.data = dataRows(merged);
        this.beneath = new double[columns - free.size()][columns + 1];
        for (int k = 0; k < beneath.length; k++) {
            beneath[k][free.size() + k] = 1;
        }
        double left = Householder.absorb(r, data, dataHeads);
        this.chiSquare = merged.chiSquare() + left + Householder.absorb(r, beneath, beneathHeads);
        testRank(merged);
    }

    /**
     * Solves.
     *
     * @param merged what all data say
     * @param priors what is known beforehand, each unknown in one prior at most; in the order of their names
     * @return the solution
     * @throws RankFault when neither data nor priors fix some unknown
     */
    public static Solved of(Triangle merged, List<Prior> priors) {
        return new Solved(merged, priors);
    }

    private double[][] dataRows(Triangle merged) {
        int p = merged.unknowns().size();
        double[][] rows = new double[p][columns + 1];
        for (int i = 0; i < p; i++) {
            double[] row = rows[i];
            row[columns] = merged.right(i);
            for (int j = i; j < p; j++) {
                row[columns] -= place(row, merged.unknowns().name(j), merged.element(i, j));
            }
        }
        return rows;
    }

    /** Adds one coefficient of a named unknown to a row of columns; returns what the unknown's mean contributes. */
    private double place(double[] row, String name, double coefficient) {
        if (coefficient == 0) {
            return 0;
        }
        Integer column = free.get(name);
        if (column != null) {
            row[column] += coefficient;
            return 0;
        }
        int[] at = known.get(name);
        if (at == null) {
            throw new IllegalArgumentException("no unknown is called " + name);
        }
        Prior prior = priors.get(at[0]);
        for (int k = 0; k < prior.rank(); k++) {
            row[starts[at[0]] + k] += coefficient * prior.root(at[1], k);
        }
        return coefficient * prior.mean(at[1]);
    }

    private void testRank(Triangle merged) {
        double limit = EPSILON * Math.max(64, merged.count() + columns);
        boolean[] deficient = new boolean[free.size()];
        int found = 0;
        for (int j = 0; j < free.size(); j++) {
            deficient[j] = !(Math.abs(r[j][j]) > limit * length(merged, j));
            found += deficient[j] ? 1 : 0;
        }
        if (found > 0) {
            throw deficient(merged, deficient, found);
        }
    }

    private double length(Triangle merged, int j) {
        return merged.length(merged.unknowns().column(names.get(j)));
    }

    private RankFault deficient(Triangle merged, boolean[] deficient, int found) {
        Set<String> together = new TreeSet<>();
        for (int j = 0; j < deficient.length; j++) {
            if (deficient[j]) {
                together.addAll(nullVector(merged, deficient, j));
            }
        }
        String list = String.join(", ", together);
        String what = together.size() == 1
                ? list + " is not determined"
                : found == 1
                        ? "only a combination is determined of: " + list
                        : "not determined, alone or but in combination: " + list;
        return new RankFault(
                what,
                "every free parameter is fixed by the data of the rungs that are solved together, or has a prior",
                "",
                "add a calibrator or an anchor, give one of them a value or a prior, or take the rung out of the set",
                List.copyOf(together));
    }

    /** The unknowns of the null vector that column j closes, other deficient columns left at zero. */
    private List<String> nullVector(Triangle merged, boolean[] deficient, int j) {
        double[] x = new double[j + 1];
        x[j] = 1;
        for (int i = j - 1; i >= 0; i--) {
            double sum = 0;
            for (int k = i + 1; k <= j; k++) {
                sum -= r[i][k] * x[k];
            }
            x[i] = deficient[i] ? 0 : sum / r[i][i];
        }
        double largest = 0;
        for (int i = 0; i <= j; i++) {
            x[i] = Math.abs(x[i] * length(merged, i));
            largest = Math.max(largest, x[i]);
        }
        List<String> out = new ArrayList<>();
        for (int i = 0; i <= j; i++) {
            if (x[i] >= 1e-6 * largest) {
                out.add(names.get(i));
            }
        }
        return out;
    }

    /**
     * The number of columns, free unknowns first.
     *
     * @return length of c and t
     */
    public int size() {
        return columns;
    }

    /**
     * How many unknowns have no prior.
     *
     * @return number of free columns
     */
    public int freeCount() {
        return free.size();
    }

    /**
     * Chi-square of data and priors at the solution.
     *
     * @return the sum of squares that is left
     */
    public double chiSquare() {
        return chiSquare;
    }

    /**
     * Whether a name is one of the unknowns here.
     *
     * @param name name of an unknown
     * @return true when it is free or has a prior here
     */
    public boolean knows(String name) {
        return free.containsKey(name) || known.containsKey(name);
    }

    /**
     * Makes a combination of unknowns ready to be solved for.
     *
     * @param unknowns the columns of the coefficients
     * @param coefficients one for each of them (a longer array's rest is not read)
     * @return the combination on this solution's columns
     */
    public Combination combination(Unknowns unknowns, double[] coefficients) {
        double[] c = new double[columns];
        double constant = 0;
        for (int j = 0; j < unknowns.size(); j++) {
            constant += place(c, unknowns.name(j), coefficients[j]);
        }
        return new Combination(constant, transposedSolve(c));
    }

    /**
     * The values of some unknowns, by one back substitution; for points of linearisation.
     *
     * @param unknowns names
     * @return their estimates
     */
    public double[] values(Unknowns unknowns) {
        double[] x = new double[columns];
        for (int i = columns - 1; i >= 0; i--) {
            double sum = r[i][columns];
            for (int j = i + 1; j < columns; j++) {
                sum -= r[i][j] * x[j];
            }
            x[i] = sum / r[i][i];
        }
        double[] out = new double[unknowns.size()];
        for (int k = 0; k < out.length; k++) {
            double[] c = new double[columns];
            out[k] = place(c, unknowns.name(k), 1);
            for (int j = 0; j < columns; j++) {
                out[k] += c[j] * x[j];
            }
        }
        return out;
    }

    private double[] transposedSolve(double[] c) {
        double[] t = c.clone();
        for (int i = 0; i < columns; i++) {
            if (t[i] == 0) {
                continue;
            }
            t[i] /= r[i][i];
            double f = t[i];
            double[] row = r[i];
            for (int j = i + 1; j < columns; j++) {
                t[j] -= f * row[j];
            }
        }
        return t;
    }

    /**
     * The value of a combination.
     *
     * @param q a combination
     * @return its estimate
     */
    public double value(Combination q) {
        double sum = q.constant();
        for (int i = 0; i < columns; i++) {
            sum += q.t(i) * r[i][columns];
        }
        return sum;
    }

    /**
     * Carries gains down to the rows of the merged triangle and to the priors.
     *
     * @param t components along this solution's rows
     * @return what each side contributes
     */
    public Gain down(double[] t) {
        double[] top = t.clone();
        double[] alongPriors = Householder.back(top, beneath, beneathHeads);
        double[] alongData = Householder.back(top, data, dataHeads);
        List<double[]> parts = new ArrayList<>();
        for (int k = 0; k < priors.size(); k++) {
            int from = starts[k] - free.size();
            parts.add(Arrays.copyOfRange(alongPriors, from, from + priors.get(k).rank()));
        }
        return new Gain(alongData, parts);
    }

    /**
     * The priors, in order.
     *
     * @return as given
     */
    public List<Prior> priors() {
        return priors;
    }

    /**
     * Gains along the merged triangle's rows, and for each prior along its independent directions.
     *
     * @param alongData components along the rows of the merged triangle
     * @param alongPriors for each prior the components along its v
     */
    public record Gain(double[] alongData, List<double[]> alongPriors) {}
}
