package distanceladder.ladder;

import distanceladder.relation.Definition;
import distanceladder.relation.Input;
import distanceladder.relation.JointNoise;
import distanceladder.relation.Linearised;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.CholeskyDecomposition;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;

/**
 * One dense generalised least squares over all data of a set, by Apache Commons Math: the independent reference. It
 * shares with the engine nothing but the linearised rows and the noise as the user gave it; every distance is a column,
 * and the whole noise covariance is formed.
 */
final class DenseReference {
    private final Map<String, Integer> columns = new HashMap<>();
    private final double[] values;
    private final RealMatrix covariance;
    private final Map<String, double[]> meanAndRoot = new HashMap<>();
    private final Map<String, Integer> firstDirection = new HashMap<>();
    private final double chiSquare;

    DenseReference(Settled settled) {
        List<double[]> rows = new ArrayList<>();
        List<Double> rights = new ArrayList<>();
        Map<String, Input> inputs = settled.ladder().inputs(settled.set());
        nameColumns(settled, inputs);
        int p = columns.size();
        int directions = 0;
        whiten(settled, rows, rights);
        for (Input input : inputs.values()) {
            if (!input.free()) {
                for (int k = 0; k < input.root()[0].length; k++) {
                    double[] row = new double[p];
                    row[columns.get(direction(input, k))] = 1;
                    rows.add(row);
                    rights.add(0.0);
                    directions++;
                }
            }
        }
        RealMatrix a = new Array2DRowRealMatrix(rows.toArray(new double[0][]));
        ArrayRealVector y =
                new ArrayRealVector(rights.stream().mapToDouble(x -> x).toArray());
        QRDecomposition qr = new QRDecomposition(a);
        values = qr.getSolver().solve(y).toArray();
        RealMatrix r = qr.getR().getSubMatrix(0, p - 1, 0, p - 1);
        RealMatrix inverse = new LUDecomposition(r).getSolver().getInverse();
        covariance = inverse.multiply(inverse.transpose());
        double rest = a.operate(new ArrayRealVector(values)).subtract(y).getNorm();
        chiSquare = rest * rest;
        assert directions >= 0;
    }

    private static String direction(Input input, int k) {
        return "direction " + k + " of " + input.name();
    }

    private void nameColumns(Settled settled, Map<String, Input> inputs) {
        TreeSet<String> objects = new TreeSet<>();
        for (String rung : settled.set()) {
            Definition d = settled.ladder().rung(rung).definition();
            objects.addAll(d.data().objects());
            objects.addAll(d.relation().objects());
        }
        objects.remove("");
        objects.forEach(o -> columns.put(Ladder.unknown(o), columns.size()));
        for (Input input : inputs.values()) {
            if (input.free()) {
                input.unknowns().forEach(u -> columns.put(u, columns.size()));
            } else {
                for (int k = 0; k < input.root()[0].length; k++) {
                    firstDirection.putIfAbsent(input.name(), columns.size());
                    columns.put(direction(input, k), columns.size());
                }
                for (int i = 0; i < input.unknowns().size(); i++) {
                    double[] entry = new double[input.root()[0].length + 1];
                    entry[0] = input.mean()[i];
                    System.arraycopy(input.root()[i], 0, entry, 1, entry.length - 1);
                    meanAndRoot.put(input.unknowns().get(i), entry);
                    firstDirection.putIfAbsent(input.name(), -1);
                    firstDirection.put(input.unknowns().get(i), firstDirection.get(input.name()));
                }
            }
        }
    }

    private void whiten(Settled settled, List<double[]> rows, List<Double> rights) {
        List<Whitened> owners = new ArrayList<>();
        List<Integer> data = new ArrayList<>();
        for (String rung : settled.set()) {
            Whitened white = settled.assembly().rows(rung);
            for (int i = 0; i < white.definition().data().size(); i++) {
                owners.add(white);
                data.add(i);
            }
        }
        int n = data.size();
        double[][] raw = new double[n][];
        double[][] c = new double[n][n];
        for (int i = 0; i < n; i++) {
            raw[i] = raw(owners.get(i), data.get(i));
            for (int j = 0; j < n; j++) {
                c[i][j] = covariance(owners.get(i), data.get(i), owners.get(j), data.get(j));
            }
        }
        RealMatrix l = new CholeskyDecomposition(new Array2DRowRealMatrix(c), 1e-8, 1e-30).getL();
        RealMatrix white = new LUDecomposition(l, 0).getSolver().solve(new Array2DRowRealMatrix(raw));
        for (int i = 0; i < n; i++) {
            double[] row = white.getRow(i);
            rows.add(java.util.Arrays.copyOf(row, row.length - 1));
            rights.add(row[row.length - 1]);
        }
    }

    private double[] raw(Whitened white, int i) {
        Linearised linear = white.linear();
        double[] raw = new double[columns.size() + 1];
        for (int j = 0; j < linear.unknowns().size(); j++) {
            place(raw, linear.unknowns().name(j), linear.rows()[i][j]);
        }
        raw[columns.size()] += linear.rows()[i][linear.unknowns().size()];
        String object = white.definition().data().objects().get(i);
        if (!object.isEmpty()) {
            raw[columns.get(Ladder.unknown(object))] += linear.coefficients()[i];
        }
        for (Linearised.Tie tie : linear.ties(i)) {
            raw[columns.get(Ladder.unknown(tie.object()))] += tie.coefficient();
        }
        return raw;
    }

    private static double covariance(Whitened a, int i, Whitened b, int j) {
        double sum = 0;
        if (a == b) {
            sum += a.definition().noise().covariance().entry(i, j);
            if (i == j) {
                sum += a.noise().scatter() * a.noise().scatter() + a.linear().extra()[i];
            }
        }
        JointNoise joint = a.definition().noise().joint().orElse(null);
        if (joint != null && b.definition().noise().joint().orElse(null) == joint) {
            int p = joint.row(
                    a.definition().name(), a.definition().data().names().get(i));
            int q = joint.row(
                    b.definition().name(), b.definition().data().names().get(j));
            sum += p < 0 || q < 0 ? 0 : joint.covariance().entry(p, q);
        }
        return sum;
    }

    private void place(double[] row, String unknown, double coefficient) {
        Integer column = columns.get(unknown);
        if (column != null) {
            row[column] += coefficient;
            return;
        }
        double[] entry = meanAndRoot.get(unknown);
        for (int k = 1; k < entry.length; k++) {
            row[firstDirection.get(unknown) + k - 1] += coefficient * entry[k];
        }
        row[columns.size()] -= coefficient * entry[0];
    }

    private double[] combination(String unknown) {
        double[] c = new double[columns.size() + 1];
        place(c, unknown, 1);
        c[columns.size()] = -c[columns.size()];
        return c;
    }

    double value(String unknown) {
        double[] c = combination(unknown);
        double sum = c[values.length];
        for (int j = 0; j < values.length; j++) {
            sum += c[j] * values[j];
        }
        return sum;
    }

    double covariance(String one, String other) {
        double[] a = combination(one);
        double[] b = combination(other);
        double sum = 0;
        for (int i = 0; i < values.length; i++) {
            for (int j = 0; j < values.length; j++) {
                sum += a[i] * covariance.getEntry(i, j) * b[j];
            }
        }
        return sum;
    }

    /** Left side of a datum's row at the solution. */
    double rowValue(Linearised linear, Definition d, int i) {
        double[] c = rowCombination(linear, d, i);
        double sum = -c[values.length];
        for (int j = 0; j < values.length; j++) {
            sum += c[j] * values[j];
        }
        return sum;
    }

    double rowVariance(Linearised linear, Definition d, int i) {
        double[] c = rowCombination(linear, d, i);
        double sum = 0;
        for (int j = 0; j < values.length; j++) {
            for (int k = 0; k < values.length; k++) {
                sum += c[j] * covariance.getEntry(j, k) * c[k];
            }
        }
        return sum;
    }

    private double[] rowCombination(Linearised linear, Definition d, int i) {
        double[] c = new double[columns.size() + 1];
        for (int j = 0; j < linear.unknowns().size(); j++) {
            place(c, linear.unknowns().name(j), linear.rows()[i][j]);
        }
        String object = d.data().objects().get(i);
        if (!object.isEmpty()) {
            c[columns.get(Ladder.unknown(object))] += linear.coefficients()[i];
        }
        return c;
    }

    double chiSquare() {
        return chiSquare;
    }
}
