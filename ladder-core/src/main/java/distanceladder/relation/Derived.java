package distanceladder.relation;

import distanceladder.astro.Unit;
import java.util.List;
import java.util.function.Function;

/**
 * A function of other values, propagated to first order: {@code q = f(x)}, {@code dq = sum f_i dx_i} at the estimate.
 *
 * <p>The derivatives come from {@link Dual}. First order is exact for a linear function; for a curved one it holds while
 * the function is nearly straight over a standard deviation of its inputs.
 */
public final class Derived implements Value {
    private final String name;
    private final Unit unit;
    private final List<Value> inputs;
    private final Function<List<Dual>, Dual> function;

    private Derived(String name, Unit unit, List<Value> inputs, Function<List<Dual>, Dual> function) {
        this.name = name;
        this.unit = unit;
        this.inputs = inputs;
        this.function = function;
    }

    /**
     * A derived value.
     *
     * @param name what it is called
     * @param unit unit of the result
     * @param inputs the values that it is computed from
     * @param function computes it from the inputs in their order
     * @return the handle
     */
    public static Derived of(
            String name, Unit unit, List<? extends Value> inputs, Function<List<Dual>, Dual> function) {
        return new Derived(name, unit, List.copyOf(inputs), function);
    }

    @Override
    public String name() {
        return name;
    }

    @Override
    public Unit unit() {
        return unit;
    }

    /**
     * The values that it is computed from.
     *
     * @return in order
     */
    public List<Value> inputs() {
        return inputs;
    }

    /**
     * Its value and derivatives.
     *
     * @param at the inputs' estimates
     * @return one number more than inputs: the value, then the partial derivatives
     */
    public double[] gradient(double[] at) {
        Tape tape = new Tape(at.length);
        List<Dual> arguments = new java.util.ArrayList<>();
        for (int i = 0; i < at.length; i++) {
            arguments.add(tape.variable(i, at[i]));
        }
        Dual result = function.apply(arguments);
        double[] out = new double[at.length + 1];
        out[0] = result.value();
        for (int i = 0; i < at.length; i++) {
            out[i + 1] = result.partial(i);
        }
        return out;
    }

    @Override
    public String toString() {
        return name;
    }
}
