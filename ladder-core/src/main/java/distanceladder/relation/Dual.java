package distanceladder.relation;

import distanceladder.astro.PowersOfTen;

/**
 * A number with its partial derivatives, carried forward through each operation.
 *
 * <p>For {@code w = f(u, v)}: {@code dw/dx = f_u du/dx + f_v dv/dx} (forward automatic differentiation: Wengert 1964;
 * Griewank and Walther 2008, chapter 3). The variables are those of one row of a relation: the object's distance
 * modulus and the rung's parameters. Beside the derivatives a number knows whether it depends on a variable at all and
 * whether it does so other than linearly; this is found from the operations, not from values, so a relation that is
 * linear is known to be so exactly.
 *
 * <p>Results live in a store that is used again for the next row: do not keep a number beyond the call that it was made
 * in. Not for use by several threads at once. Functions are {@link StrictMath}'s, so the bits are the same everywhere.
 */
public final class Dual {
    private static final double LN10 = StrictMath.log(10);

    /** The number depends on no variable. */
    static final int NONE = -1;
    /** The number depends on several variables, or may. */
    static final int MANY = -2;

    private final Tape tape;
    double value;
    boolean curved;
    /** The one variable that the number depends on, or one of the two above. */
    int only;
    /** The derivative by that one; most terms of a relation are one parameter times a number. */
    double slope;
    /** All derivatives, when there are many. */
    private final double[] partial;

    Dual(Tape tape, int variables) {
        this.tape = tape;
        this.partial = new double[variables];
    }

    /**
     * The number itself.
     *
     * @return its value
     */
    public double value() {
        return value;
    }

    /**
     * One partial derivative.
     *
     * @param variable index of the variable
     * @return d this / d variable
     */
    public double partial(int variable) {
        if (only == MANY) {
            return partial[variable];
        }
        return only == variable ? slope : 0;
    }

    /**
     * Whether the number depends on a variable other than linearly.
     *
     * @return true after a product of two variables or a function of one
     */
    public boolean curved() {
        return curved;
    }

    /**
     * A number that depends on nothing, for use with this one.
     *
     * @param x its value
     * @return a constant
     */
    public Dual constant(double x) {
        return tape.constant(x);
    }

    /**
     * this + v.
     *
     * @param v summand
     * @return the sum
     */
    public Dual add(Dual v) {
        return linear(value + v.value, 1, v, 1);
    }

    /**
     * this + x.
     *
     * @param x summand
     * @return the sum
     */
    public Dual add(double x) {
        return chained(value + x, 1, curved);
    }

    /**
     * this - v.
     *
     * @param v what is taken away
     * @return the difference
     */
    public Dual subtract(Dual v) {
        return linear(value - v.value, 1, v, -1);
    }

    /**
     * this - x.
     *
     * @param x what is taken away
     * @return the difference
     */
    public Dual subtract(double x) {
        return chained(value - x, 1, curved);
    }

    /**
     * - this.
     *
     * @return the opposite
     */
    public Dual negate() {
        return chained(-value, -1, curved);
    }

    /**
     * this times v.
     *
     * @param v factor
     * @return the product
     */
    public Dual multiply(Dual v) {
        Dual w = linear(value * v.value, v.value, v, value);
        w.curved |= only != NONE && v.only != NONE;
        return w;
    }

    /**
     * this times x.
     *
     * @param x factor
     * @return the product
     */
    public Dual multiply(double x) {
        return chained(value * x, x, curved);
    }

    /**
     * this over v.
     *
     * @param v divisor
     * @return the quotient
     */
    public Dual divide(Dual v) {
        double inverse = 1 / v.value;
        double q = value * inverse;
        Dual w = linear(q, inverse, v, -q * inverse);
        w.curved |= v.only != NONE;
        return w;
    }

    /**
     * this over x.
     *
     * @param x divisor
     * @return the quotient
     */
    public Dual divide(double x) {
        return chained(value / x, 1 / x, curved);
    }

    /**
     * this squared.
     *
     * @return the square
     */
    public Dual square() {
        return chained(value * value, 2 * value, true);
    }

    /**
     * The square root.
     *
     * @return its root
     */
    public Dual sqrt() {
        double root = Math.sqrt(value);
        return chained(root, 0.5 / root, true);
    }

    /**
     * The exponential.
     *
     * @return e to this
     */
    public Dual exp() {
        double e = StrictMath.exp(value);
        return chained(e, e, true);
    }

    /**
     * The natural logarithm.
     *
     * @return ln this
     */
    public Dual log() {
        return chained(StrictMath.log(value), 1 / value, true);
    }

    /**
     * The decimal logarithm.
     *
     * @return log10 this
     */
    public Dual log10() {
        return chained(StrictMath.log10(value), 1 / (value * LN10), true);
    }

    /**
     * Ten to this.
     *
     * @return 10^this
     */
    public Dual tenTo() {
        double e = PowersOfTen.tenTo(value);
        return chained(e, e * LN10, true);
    }

    /**
     * A constant power of this.
     *
     * @param exponent the power
     * @return this^exponent
     */
    public Dual power(double exponent) {
        double w = StrictMath.pow(value, exponent);
        return chained(w, exponent * StrictMath.pow(value, exponent - 1), exponent != 1);
    }

    /**
     * The sine.
     *
     * @return sin this, this in radians
     */
    public Dual sin() {
        return chained(StrictMath.sin(value), StrictMath.cos(value), true);
    }

    /**
     * The cosine.
     *
     * @return cos this, this in radians
     */
    public Dual cos() {
        return chained(StrictMath.cos(value), -StrictMath.sin(value), true);
    }

    private Dual linear(double w, double a, Dual v, double b) {
        Dual out = tape.next();
        out.value = w;
        out.curved = curved || v.curved;
        if (only != MANY && v.only != MANY && (only == v.only || only == NONE || v.only == NONE)) {
            out.only = Math.max(only, v.only);
            out.slope = a * term() + b * v.term();
            return out;
        }
        out.only = MANY;
        if (only == MANY && v.only == MANY) {
            for (int i = 0; i < partial.length; i++) {
                out.partial[i] = a * partial[i] + b * v.partial[i];
            }
        } else if (v.only == MANY) {
            out.plus(v, b, this, a);
        } else {
            out.plus(this, a, v, b);
        }
        return out;
    }

    /** The derivative by the only variable. */
    private double term() {
        return only == NONE ? 0 : slope;
    }

    /** Derivatives of a u + b v, where v has one or none. */
    private void plus(Dual u, double a, Dual v, double b) {
        if (u.only == MANY) {
            scale(u.partial, a);
        } else {
            java.util.Arrays.fill(partial, 0);
            partial[u.only] = a * u.slope;
        }
        if (v.only != NONE) {
            partial[v.only] += b * v.slope;
        }
    }

    private void scale(double[] other, double a) {
        if (a == 1) {
            System.arraycopy(other, 0, partial, 0, partial.length);
            return;
        }
        for (int i = 0; i < partial.length; i++) {
            partial[i] = a * other[i];
        }
    }

    private Dual chained(double w, double factor, boolean bends) {
        Dual out = tape.next();
        out.value = w;
        out.only = only;
        out.curved = curved || (bends && only != NONE);
        if (only == MANY) {
            out.scale(partial, factor);
        } else {
            out.slope = factor * slope;
        }
        return out;
    }

    @Override
    public String toString() {
        return Double.toString(value);
    }
}
