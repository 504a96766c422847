package distanceladder.bench;

import distanceladder.astro.Unit;
import distanceladder.relation.Definition;
import distanceladder.relation.Equated;
import distanceladder.relation.Linearised;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Points;
import distanceladder.relation.Source;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.analysis.differentiation.Gradient;

/**
 * A relation of ten parameters, its rows made in three ways: by our differentiable number, by hand, by Hipparchus.
 *
 * <pre>m = mu + a + b x + c y + d x^2 + e x y + f 10^(g z) + h exp(k y) + l z</pre>
 */
final class TenParameters {
    static final String[] ROLES = {"a", "b", "c", "d", "e", "f", "g", "h", "k", "l"};
    private static final double[] VALUES = {-19, 0.2, -0.1, 0.05, 0.3, 0.1, -0.4, 0.2, 0.3, -0.15};
    private static final double LN10 = StrictMath.log(10);

    private final Definition definition;
    private final Points points;
    private final double[] x;
    private final double[] y;
    private final double[] z;
    private final double[] m;

    TenParameters(int size) {
        x = column(size, 0.001, 0.3);
        y = column(size, 0.0017, -0.5);
        z = column(size, 0.0007, 0.1);
        m = column(size, 0.0001, 15);
        double[] error = new double[size];
        java.util.Arrays.fill(error, 0.1);
        List<String> names = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            names.add("d" + i);
        }
        Observations data = Observations.of("made up", names)
                .with("m", Unit.MAGNITUDE, m)
                .with("x", Unit.NONE, x)
                .with("y", Unit.NONE, y)
                .with("z", Unit.NONE, z);
        Equated relation = Equated.of((mu, s) -> mu.add(s.parameter("a"))
                .add(s.parameter("b").multiply(s.column("x")))
                .add(s.parameter("c").multiply(s.column("y")))
                .add(s.parameter("d").multiply(s.column("x") * s.column("x")))
                .add(s.parameter("e").multiply(s.column("x") * s.column("y")))
                .add(s.parameter("f")
                        .multiply(s.parameter("g").multiply(s.column("z")).tenTo()))
                .add(s.parameter("h")
                        .multiply(s.parameter("k").multiply(s.column("y")).exp()))
                .add(s.parameter("l").multiply(s.column("z"))));
        Definition d = Definition.of("ten", data, "m", relation).withNoise(Noise.of(error));
        for (int j = 0; j < ROLES.length; j++) {
            d = d.parameter(ROLES[j], Source.free(ROLES[j], Unit.NONE).starting(VALUES[j]));
        }
        definition = d;
        double[] moduli = new double[size];
        java.util.Arrays.fill(moduli, 34);
        points = Points.of(moduli, VALUES);
    }

    private static double[] column(int size, double step, double from) {
        double[] out = new double[size];
        for (int i = 0; i < size; i++) {
            out[i] = from + step * (i % 997);
        }
        return out;
    }

    Linearised ours() {
        return definition.relation().linearise(definition, points);
    }

    /** Each row: ten partial derivatives and the right side, as {@link Linearised} holds them. */
    double[][] byHand() {
        double[][] rows = new double[x.length][];
        double[] p = VALUES;
        for (int i = 0; i < rows.length; i++) {
            double ten = StrictMath.exp(p[6] * z[i] * LN10);
            double e = StrictMath.exp(p[8] * y[i]);
            double[] row = {
                1, x[i], y[i], x[i] * x[i], x[i] * y[i], ten, p[5] * ten * LN10 * z[i], e, p[7] * e * y[i], z[i], 0
            };
            double predicted = 34
                    + p[0]
                    + p[1] * x[i]
                    + p[2] * y[i]
                    + p[3] * row[3]
                    + p[4] * row[4]
                    + p[5] * ten
                    + p[7] * e
                    + p[9] * z[i];
            row[10] = right(row, i, predicted);
            rows[i] = row;
        }
        return rows;
    }

    private double right(double[] row, int i, double predicted) {
        double right = m[i] - predicted + 34;
        for (int j = 0; j < 10; j++) {
            right += row[j] * VALUES[j];
        }
        return right;
    }

    double[][] byHipparchus() {
        double[][] rows = new double[x.length][];
        for (int i = 0; i < rows.length; i++) {
            Gradient[] p = new Gradient[10];
            for (int j = 0; j < 10; j++) {
                p[j] = Gradient.variable(11, j + 1, VALUES[j]);
            }
            Gradient g = Gradient.variable(11, 0, 34.0)
                    .add(p[0])
                    .add(p[1].multiply(x[i]))
                    .add(p[2].multiply(y[i]))
                    .add(p[3].multiply(x[i] * x[i]))
                    .add(p[4].multiply(x[i] * y[i]))
                    .add(p[5].multiply(p[6].multiply(z[i] * LN10).exp()))
                    .add(p[7].multiply(p[8].multiply(y[i]).exp()))
                    .add(p[9].multiply(z[i]));
            double[] row = new double[11];
            for (int j = 0; j < 10; j++) {
                row[j] = g.getPartialDerivative(j + 1);
            }
            row[10] = right(row, i, g.getValue());
            rows[i] = row;
        }
        return rows;
    }
}
