package distanceladder.relation;

import distanceladder.text.Figures;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.List;

/**
 * Columns of a relation that were measured with an error, and the covariances of these errors.
 *
 * <p>The true number x of each datum is a private unknown with the row {@code measured = x + e_x}. With {@code s = dg/dx}
 * at the joint estimate x0 the row of the observable becomes, x eliminated,
 *
 * <pre>y - g - s (measured - x0) = a dmu + b . dtheta + e,   e = e_y - s . e_x
 * Var(e) = Var(e_y) + s C_x s - 2 s . Cov(e_x, e_y),   Cov(e_x, e) = Cov(e_x, e_y) - C_x s</pre>
 *
 * and x is re-estimated as {@code measured - Cov(e_x, e) (V^-1 r)} from the residual r. To inflate the variance at the
 * measured x is not the same: slopes come out too flat.
 */
final class UncertainColumns {
    static final UncertainColumns NONE = new UncertainColumns(List.of(), List.of());

    private final List<String> names;
    private final List<Pair> pairs;

    private record Pair(String one, String other, String column) {}

    private UncertainColumns(List<String> names, List<Pair> pairs) {
        this.names = names;
        this.pairs = pairs;
    }

    UncertainColumns with(List<String> columns) {
        List<String> more = new ArrayList<>(names);
        columns.stream().filter(c -> !more.contains(c)).forEach(more::add);
        return new UncertainColumns(List.copyOf(more), pairs);
    }

    UncertainColumns withCovariance(String one, String other, String column) {
        List<Pair> more = new ArrayList<>(pairs);
        more.add(new Pair(one, other, column));
        return new UncertainColumns(names, List.copyOf(more));
    }

    List<String> names() {
        return names;
    }

    int size() {
        return names.size();
    }

    /** The errors of all data of a rung. */
    Errors errors(Definition definition) {
        return new Errors(definition);
    }

    /** Errors of the uncertain columns, and their covariances with one another and with the observable. */
    final class Errors {
        private final double[][] measured = new double[names.size()][];
        private final double[][][] covariance;
        private final double[][] withObservable;

        Errors(Definition definition) {
            Observations data = definition.data();
            int n = data.size();
            covariance = new double[n][names.size()][names.size()];
            withObservable = new double[n][names.size()];
            for (int k = 0; k < measured.length; k++) {
                measured[k] = data.column(names.get(k));
                double[] sigmas = data.errors(names.get(k) + " error", data.unit(names.get(k)));
                for (int i = 0; i < n; i++) {
                    covariance[i][k][k] = sigmas[i] * sigmas[i];
                }
            }
            pairs.forEach(pair -> add(definition, pair));
        }

        private void add(Definition definition, Pair pair) {
            double[] numbers = definition.data().column(pair.column);
            int k = names.indexOf(pair.one);
            int l = names.indexOf(pair.other);
            boolean observable = pair.other.equals(definition.observable());
            if (k < 0 || (l < 0 && !observable)) {
                throw new ValueFault(
                        "error covariance of \"" + pair.one + "\" and \"" + pair.other + "\"",
                        "it is between two uncertain columns, or between one and the observable",
                        "rung \"" + definition.name() + "\"",
                        "declare the columns uncertain first");
            }
            for (int i = 0; i < numbers.length; i++) {
                double other = observable ? definition.noise().covariance().entry(i, i) : covariance[i][l][l];
                if (numbers[i] * numbers[i] > covariance[i][k][k] * other * (1 + 1e-12)) {
                    throw new ValueFault(
                            pair.column + " = " + Figures.significant(numbers[i], 6),
                            "a covariance is at most the product of both standard deviations",
                            "rung \"" + definition.name() + "\", datum \""
                                    + definition.data().names().get(i) + "\"",
                            "check the covariance and the errors");
                }
                if (observable) {
                    withObservable[i][k] = numbers[i];
                } else {
                    covariance[i][k][l] = numbers[i];
                    covariance[i][l][k] = numbers[i];
                }
            }
        }

        /** What has to be taken from the right side of a datum's row. */
        double shift(int datum, double[] slopes, Points at) {
            double sum = 0;
            for (int k = 0; k < slopes.length; k++) {
                sum += slopes[k] * (measured[k][datum] - at.covariate(datum, k));
            }
            return sum;
        }

        /** The variance that the columns add to a row. */
        double extra(int datum, double[] slopes) {
            double sum = 0;
            for (int k = 0; k < slopes.length; k++) {
                sum += slopes[k] * (-covarianceWithRow(datum, slopes)[k] - withObservable[datum][k]);
            }
            return sum;
        }

        /** Cov(e_x, e) for each column. */
        double[] covarianceWithRow(int datum, double[] slopes) {
            double[] out = withObservable[datum].clone();
            for (int k = 0; k < out.length; k++) {
                for (int l = 0; l < out.length; l++) {
                    out[k] -= covariance[datum][k][l] * slopes[l];
                }
            }
            return out;
        }
    }
}
