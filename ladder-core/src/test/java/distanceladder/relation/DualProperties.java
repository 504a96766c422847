package distanceladder.relation;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import net.jqwik.api.lifecycle.AfterContainer;
import org.hipparchus.analysis.differentiation.Gradient;

/** {@link Dual} against Hipparchus, and its bent flag against the degree of the polynomial, for random expressions. */
class DualProperties {
    private static final int VARIABLES = 3;
    private static final Map<Expression.Function, Integer> FUNCTIONS = new EnumMap<>(Expression.Function.class);
    private static final Map<Expression.Operation, Integer> OPERATIONS = new EnumMap<>(Expression.Operation.class);

    @Property(tries = 2000)
    void equalsHipparchus(
            @ForAll("expressions") Expression e,
            @ForAll @Size(VARIABLES) List<@DoubleRange(min = -2, max = 2) Double> at) {
        double[] x = at.stream().mapToDouble(v -> v).toArray();
        double size = e.size(x);
        if (size > 1e6) {
            return;
        }
        count(e);
        Dual dual = e.dual(dual(x));
        Gradient gradient = e.gradient(gradient(x));
        assertEquals(gradient.getValue(), dual.value(), 1e-12 * (1 + size));
        for (int i = 0; i < VARIABLES; i++) {
            double scale = 1 + size + slopes(e, x)[i];
            assertEquals(gradient.getPartialDerivative(i), dual.partial(i), 1e-12 * scale, "by variable " + i);
            double coarse = difference(e, x, i, 1e-3);
            double fine = difference(e, x, i, 5e-4);
            double tolerance = Math.abs(coarse - fine) + 1e-10 * scale;
            assertEquals(fine, dual.partial(i), tolerance, "difference by variable " + i);
        }
    }

    /** Central, of fourth order, of the plain numbers: halving the step tells its error 15 times over. */
    private static double difference(Expression e, double[] x, int i, double h) {
        double[] g = new double[5];
        for (int k = 0; k < 5; k++) {
            double[] moved = x.clone();
            moved[i] += (k - 2) * h;
            g[k] = e.number(moved);
        }
        return (g[0] - 8 * g[1] + 8 * g[3] - g[4]) / (12 * h);
    }

    @Property(tries = 500)
    void affineIsNeverBentAndProductsAre(@ForAll("polynomials") Expression e) {
        assertEquals(e.degree() > 1, e.dual(dual(0.3, -0.7, 1.1)).curved());
    }

    @Property(tries = 1000)
    void bentExactlyWhenAnOperationBendsAVariable(@ForAll("expressions") Expression e) {
        assertEquals(e.degree() > 1, e.dual(dual(0.3, -0.7, 1.1)).curved());
    }

    @Property(tries = 300)
    void aStoreUsedAgainGivesTheSameBits(
            @ForAll("expressions") Expression e, @ForAll("expressions") Expression before) {
        double[] x = {0.4, -1.2, 0.9};
        Dual fresh = e.dual(dual(x));
        Tape tape = new Tape(VARIABLES);
        before.dual(variables(tape, new double[] {1, 2, 3}));
        tape.rewind();
        Dual again = e.dual(variables(tape, x));
        assertEquals(fresh.value(), again.value());
        assertEquals(fresh.curved(), again.curved());
        for (int i = 0; i < VARIABLES; i++) {
            assertEquals(fresh.partial(i), again.partial(i));
        }
    }

    /** Sizes of the slopes of all parts, through Hipparchus; rounding is relative to them. */
    private static double[] slopes(Expression e, double[] x) {
        double[] out = new double[VARIABLES];
        Gradient g = e.gradient(gradient(x));
        Arrays.setAll(out, i -> Math.abs(g.getPartialDerivative(i)));
        if (e instanceof Expression.Joined joined) {
            double[] left = slopes(joined.left(), x);
            double[] right = slopes(joined.right(), x);
            Arrays.setAll(out, i -> out[i] + (1 + e.size(x)) * (left[i] + right[i]));
        } else if (e instanceof Expression.Applied applied) {
            double[] inner = slopes(applied.of(), x);
            Arrays.setAll(out, i -> out[i] + (1 + e.size(x)) * inner[i]);
        }
        return out;
    }

    private static void count(Expression e) {
        if (e instanceof Expression.Joined joined) {
            OPERATIONS.merge(joined.operation(), 1, Integer::sum);
            count(joined.left());
            count(joined.right());
        } else if (e instanceof Expression.Applied applied) {
            FUNCTIONS.merge(applied.function(), 1, Integer::sum);
            count(applied.of());
        }
    }

    @AfterContainer
    static void everyOperationWasMet() {
        for (Expression.Function f : Expression.Function.values()) {
            assertEquals(true, FUNCTIONS.getOrDefault(f, 0) >= 50, f + " was met " + FUNCTIONS.get(f) + " times");
        }
        for (Expression.Operation o : Expression.Operation.values()) {
            assertEquals(true, OPERATIONS.getOrDefault(o, 0) >= 50, o + " was met " + OPERATIONS.get(o) + " times");
        }
    }

    static List<Dual> dual(double... x) {
        return variables(new Tape(x.length), x);
    }

    private static List<Dual> variables(Tape tape, double[] x) {
        Dual[] out = new Dual[x.length];
        Arrays.setAll(out, i -> tape.variable(i, x[i]));
        return List.of(out);
    }

    private static List<Gradient> gradient(double... x) {
        Gradient[] out = new Gradient[x.length];
        Arrays.setAll(out, i -> Gradient.variable(x.length, i, x[i]));
        return List.of(out);
    }

    private static Arbitrary<Expression> leaves() {
        return Arbitraries.oneOf(
                Arbitraries.integers().between(0, VARIABLES - 1).map(Expression.Variable::new),
                Arbitraries.doubles().between(0.25, 3).map(Expression.Constant::new));
    }

    @Provide
    Arbitrary<Expression> expressions() {
        return tree(4, Arbitraries.of(Expression.Function.class));
    }

    @Provide
    Arbitrary<Expression> polynomials() {
        return tree(
                3,
                Arbitraries.of(Arrays.stream(Expression.Function.values())
                        .filter(Expression.Function::affine)
                        .toList()));
    }

    private static Arbitrary<Expression> tree(int depth, Arbitrary<Expression.Function> functions) {
        if (depth == 0) {
            return leaves();
        }
        Arbitrary<Expression> smaller = Arbitraries.lazy(() -> tree(depth - 1, functions));
        Arbitrary<Double> numbers = Arbitraries.doubles().between(0.25, 3);
        return Arbitraries.frequencyOf(
                net.jqwik.api.Tuple.of(1, leaves()),
                net.jqwik.api.Tuple.of(
                        3, Combinators.combine(functions, smaller, numbers).as(Expression.Applied::new)),
                net.jqwik.api.Tuple.of(
                        3,
                        Combinators.combine(Arbitraries.of(Expression.Operation.class), smaller, smaller)
                                .as(Expression.Joined::new)));
    }
}
