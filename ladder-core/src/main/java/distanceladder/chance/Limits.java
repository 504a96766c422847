package distanceladder.chance;

import distanceladder.text.ValueFault;

/** The checks that distributions share. */
final class Limits {
    private Limits() {}

    static void finite(double value, String what, String where) {
        if (!Double.isFinite(value)) {
            throw new ValueFault(what + " = " + value, "it is a finite number", where, "give a number");
        }
    }

    static void positive(double value, String what, String where) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new ValueFault(
                    what + " = " + value,
                    "it is finite and more than 0",
                    where,
                    "use an exact number for what has no error");
        }
    }

    static void degrees(double dof) {
        if (!(dof > 1) || Double.isInfinite(dof)) {
            throw new ValueFault(
                    "degrees of freedom = " + dof,
                    "they are finite and more than 1, since with fewer there is no mean",
                    "Student's distribution",
                    "give more degrees of freedom, or use the normal distribution for infinitely many");
        }
    }

    static void range(double lower, double upper, String where) {
        finite(lower, "lower limit", where);
        finite(upper, "upper limit", where);
        if (!(lower < upper) || Double.isInfinite(upper - lower)) {
            throw new ValueFault(
                    "limits " + lower + " and " + upper,
                    "the lower limit is below the upper one, a finite distance apart",
                    where,
                    "exchange them, or use an exact number for what has no error");
        }
    }

    static void between(double mode, double lower, double upper) {
        if (!(mode >= lower && mode <= upper)) {
            throw new ValueFault(
                    "mode = " + mode,
                    "the mode lies from " + lower + " to " + upper,
                    "triangular distribution",
                    "give a mode between the limits");
        }
    }

    static void probability(double p, Distribution where) {
        if (!(p > 0 && p < 1)) {
            throw new ValueFault(
                    "p = " + p,
                    "a quantile is asked for at a probability between 0 and 1",
                    where.describe(),
                    "give a probability above 0 and below 1");
        }
    }
}
