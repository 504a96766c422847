package distanceladder.information;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A triangle together with the reflections that made it, so that a vector of gains can be carried down again.
 *
 * <p>A reduction is an orthogonal matrix Q with {@code [A | y] = Q [R | z; 0 | e]}. An estimate {@code q = cT x} has
 * {@code t = R^-T c}, the variance {@code |t|^2}, and its gains with respect to the right sides of the rows are the
 * elements of {@code Q [t; 0]}. Their squares are the rows' shares of the variance and add up to it to rounding, since
 * Q keeps lengths; nothing is read off an inverse.
 */
public final class Reduction {
    private final Triangle triangle;
    private final List<double[][]> blocks;
    private final List<double[]> heads;
    private final int[] ends;

    private Reduction(Triangle triangle, List<double[][]> blocks, List<double[]> heads, int[] ends) {
        this.triangle = triangle;
        this.blocks = blocks;
        this.heads = heads;
        this.ends = ends;
    }

    /**
     * Folds rows that the caller hands over: they are overwritten.
     *
     * @param unknowns the columns
     * @param rows each p coefficients and the right side, whitened; owned by the reduction afterwards
     * @return the reduction
     */
    public static Reduction ofRows(Unknowns unknowns, double[][] rows) {
        return fold(unknowns, rows, lengths(unknowns, rows), rows.length, new int[] {rows.length});
    }

    /**
     * Merges triangles and keeps the reflections.
     *
     * @param parts triangles, in an order that the caller fixed by names
     * @return the reduction; its rows are the parts' rows, one part after the other
     */
    public static Reduction ofTriangles(List<Triangle> parts) {
        Unknowns union = Triangle.unionOf(parts);
        List<double[][]> spread = new ArrayList<>();
        double[] squares = new double[union.size()];
        int[] ends = new int[parts.size()];
        int total = 0;
        int count = 0;
        double chiSquare = 0;
        for (int k = 0; k < parts.size(); k++) {
            Triangle part = parts.get(k);
            spread.add(part.spread(union));
            int[] at = part.unknowns().columnsIn(union);
            for (int j = 0; j < at.length; j++) {
                squares[at[j]] += part.length(j) * part.length(j);
            }
            total += part.unknowns().size();
            ends[k] = total;
            count += part.count();
            chiSquare += part.chiSquare();
        }
        double[][] rows = new double[total][];
        int next = 0;
        for (double[][] part : spread) {
            for (double[] row : part) {
                rows[next++] = row;
            }
        }
        for (int j = 0; j < squares.length; j++) {
            squares[j] = Math.sqrt(squares[j]);
        }
        Reduction folded = fold(union, rows, squares, count, ends);
        Triangle t = folded.triangle;
        Triangle sum = new Triangle(union, rowsOf(t), t.chiSquare() + chiSquare, count, squares);
        return new Reduction(sum, folded.blocks, folded.heads, ends);
    }

    private static double[][] rowsOf(Triangle t) {
        return t.spread(t.unknowns());
    }

    private static Reduction fold(Unknowns unknowns, double[][] rows, double[] lengths, int count, int[] ends) {
        int p = unknowns.size();
        double[][] top = new double[p][p + 1];
        List<double[][]> blocks = new ArrayList<>();
        List<double[]> heads = new ArrayList<>();
        double rest = 0;
        for (int from = 0; from < rows.length; from += Triangle.BLOCK) {
            double[][] block = Arrays.copyOfRange(rows, from, Math.min(rows.length, from + Triangle.BLOCK));
            double[] head = new double[2 * p];
            rest += Householder.absorb(top, block, head);
            blocks.add(block);
            heads.add(head);
        }
        return new Reduction(new Triangle(unknowns, top, rest, count, lengths), blocks, heads, ends);
    }

    private static double[] lengths(Unknowns unknowns, double[][] rows) {
        double[] sum = new double[unknowns.size()];
        for (double[] row : rows) {
            for (int j = 0; j < sum.length; j++) {
                sum[j] += row[j] * row[j];
            }
        }
        for (int j = 0; j < sum.length; j++) {
            sum[j] = Math.sqrt(sum[j]);
        }
        return sum;
    }

    /**
     * The triangle.
     *
     * @return what all rows say
     */
    public Triangle triangle() {
        return triangle;
    }

    /**
     * Carries a vector along the triangle's rows down to the original rows.
     *
     * @param t p components along the triangle's rows
     * @return components along the original rows, in their order
     */
    public double[] down(double[] t) {
        double[] top = t.clone();
        double[] out = new double[ends.length == 0 ? 0 : ends[ends.length - 1]];
        int end = out.length;
        for (int b = blocks.size() - 1; b >= 0; b--) {
            double[] part = Householder.back(top, blocks.get(b), heads.get(b));
            System.arraycopy(part, 0, out, end - part.length, part.length);
            end -= part.length;
        }
        return out;
    }

    /**
     * Carries a vector down and cuts it into the parts that were merged.
     *
     * @param t p components along the triangle's rows
     * @return for each part, the components along its rows
     */
    public List<double[]> downToParts(double[] t) {
        double[] all = down(t);
        List<double[]> parts = new ArrayList<>();
        int from = 0;
        for (int end : ends) {
            parts.add(Arrays.copyOfRange(all, from, end));
            from = end;
        }
        return parts;
    }
}
