package distanceladder.information;

import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;

/**
 * All that a set of rows says of its unknowns: an upper triangular square root of their information.
 *
 * <p>For rows {@code A x = y + e} with independent errors of unit variance, a triangle holds {@code R} (p by p, upper),
 * {@code z} (p) and {@code chi2} with {@code |A x - y|^2 = |R x - z|^2 + chi2} for every x. No normal matrix is formed:
 * its condition number would be the square of that of {@code R} (square-root information filter: Bierman 1977, chapter
 * 4; tall and skinny QR: Demmel, Grigori, Hoemmen and Langou 2012). Beside them it keeps the Euclidean length of each
 * column of the original rows, by which the rank test is scaled, since elimination can reduce a column to rounding
 * errors.
 *
 * <p>Immutable. Merging is associative in exact arithmetic but not in bits; callers merge in the order of names.
 */
public final class Triangle {
    /** Rows are folded in blocks of this many, so that a block stays in the processor's cache. */
    static final int BLOCK = 192;

    private final Unknowns unknowns;
    private final double[][] rows;
    private final double chiSquare;
    private final int count;
    private final double[] lengths;

    Triangle(Unknowns unknowns, double[][] rows, double chiSquare, int count, double[] lengths) {
        this.unknowns = unknowns;
        this.rows = rows;
        this.chiSquare = chiSquare;
        this.count = count;
        this.lengths = lengths;
    }

    /**
     * The triangle that says nothing.
     *
     * @return a triangle over no unknowns
     */
    public static Triangle empty() {
        return of(Unknowns.none(), new double[0][]);
    }

    /**
     * Folds rows into a triangle.
     *
     * @param unknowns the columns
     * @param rows each p coefficients and the right side, divided by the standard deviation; left untouched
     * @return their triangle
     */
    public static Triangle of(Unknowns unknowns, double[][] rows) {
        return Reduction.ofRows(unknowns, copy(unknowns, rows)).triangle();
    }

    /**
     * Merges triangles over named unknowns, in the given order.
     *
     * @param parts triangles, in an order that the caller fixed by names
     * @return one triangle that says all that they say
     */
    public static Triangle merge(List<Triangle> parts) {
        return Reduction.ofTriangles(parts).triangle();
    }

    private static double[][] copy(Unknowns unknowns, double[][] rows) {
        double[][] own = new double[rows.length][];
        for (int i = 0; i < rows.length; i++) {
            if (rows[i].length != unknowns.size() + 1) {
                throw new ValueFault(
                        "row " + i + " has " + rows[i].length + " numbers",
                        "a row has one number for each unknown and its right side",
                        unknowns.toString(),
                        "give " + (unknowns.size() + 1) + " numbers");
            }
            own[i] = rows[i].clone();
            requireFinite(own[i], i);
        }
        return own;
    }

    private static void requireFinite(double[] row, int index) {
        for (double x : row) {
            if (!Double.isFinite(x)) {
                throw new ValueFault(
                        "row " + index + " holds " + x,
                        "rows are finite numbers",
                        "",
                        "check the data and their standard deviations");
            }
        }
    }

    /**
     * The columns.
     *
     * @return names in order
     */
    public Unknowns unknowns() {
        return unknowns;
    }

    /**
     * One element of R.
     *
     * @param i row
     * @param j column
     * @return R_ij, zero below the diagonal
     */
    public double element(int i, int j) {
        return j < i ? 0 : rows[i][j];
    }

    /**
     * One element of z.
     *
     * @param i row
     * @return z_i
     */
    public double right(int i) {
        return rows[i][unknowns.size()];
    }

    /**
     * The sum of squares that no value of the unknowns can remove.
     *
     * @return chi-square left over
     */
    public double chiSquare() {
        return chiSquare;
    }

    /**
     * How many rows were folded in.
     *
     * @return number of original rows
     */
    public int count() {
        return count;
    }

    /**
     * The length of a column of the original rows.
     *
     * @param column index
     * @return its Euclidean norm over all original rows
     */
    public double length(int column) {
        return lengths[column];
    }

    /**
     * The same triangle with its column lengths replaced by larger ones (of rows before an elimination).
     *
     * @param larger Euclidean norms, one for each column
     * @return the triangle, its rank test scaled by them
     */
    public Triangle withLengths(double[] larger) {
        return new Triangle(unknowns, rows, chiSquare, count, larger.clone());
    }

    /** The rows of this triangle on the columns of a larger set. */
    double[][] spread(Unknowns larger) {
        int p = unknowns.size();
        int[] at = unknowns.columnsIn(larger);
        double[][] out = new double[p][larger.size() + 1];
        for (int i = 0; i < p; i++) {
            for (int j = i; j < p; j++) {
                out[i][at[j]] = rows[i][j];
            }
            out[i][larger.size()] = rows[i][p];
        }
        return out;
    }

    static Unknowns unionOf(Collection<Triangle> parts) {
        List<Unknowns> all = new ArrayList<>();
        for (Triangle part : parts) {
            all.add(part.unknowns);
        }
        return Unknowns.union(all);
    }

    /**
     * Whether two triangles are the same to the last bit.
     *
     * @param that another triangle
     * @return true when every stored number has the same bits
     */
    public boolean sameBits(Triangle that) {
        if (!unknowns.equals(that.unknowns) || bits(chiSquare) != bits(that.chiSquare)) {
            return false;
        }
        for (int i = 0; i < rows.length; i++) {
            for (int j = i; j < rows[i].length; j++) {
                if (bits(rows[i][j]) != bits(that.rows[i][j])) {
                    return false;
                }
            }
        }
        return true;
    }

    private static long bits(double x) {
        return Double.doubleToRawLongBits(x);
    }
}
