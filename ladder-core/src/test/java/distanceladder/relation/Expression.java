package distanceladder.relation;

import java.util.List;
import org.hipparchus.analysis.differentiation.Gradient;
import org.hipparchus.util.FastMath;

/** An expression in three variables that is evaluated by {@link Dual}, by Hipparchus, and in plain numbers. */
sealed interface Expression {
    Dual dual(List<Dual> variables);

    Gradient gradient(List<Gradient> variables);

    double number(double[] variables);

    /** The degree of a polynomial, 0 for a constant; {@link #BENT} for anything else. */
    int degree();

    int BENT = 1000;

    /** The largest absolute value of any part: rounding is relative to it. */
    double size(double[] variables);

    record Variable(int index) implements Expression {
        @Override
        public Dual dual(List<Dual> variables) {
            return variables.get(index);
        }

        @Override
        public Gradient gradient(List<Gradient> variables) {
            return variables.get(index);
        }

        @Override
        public double number(double[] variables) {
            return variables[index];
        }

        @Override
        public int degree() {
            return 1;
        }

        @Override
        public double size(double[] variables) {
            return Math.abs(variables[index]);
        }
    }

    record Constant(double x) implements Expression {
        @Override
        public Dual dual(List<Dual> variables) {
            return variables.get(0).constant(x);
        }

        @Override
        public Gradient gradient(List<Gradient> variables) {
            return Gradient.constant(variables.size(), x);
        }

        @Override
        public double number(double[] variables) {
            return x;
        }

        @Override
        public int degree() {
            return 0;
        }

        @Override
        public double size(double[] variables) {
            return Math.abs(x);
        }
    }

    /** Functions of one number, kept where they are smooth. */
    enum Function {
        NEGATE,
        SQUARE,
        SQRT,
        EXP,
        LOG,
        LOG10,
        TEN_TO,
        POWER,
        SIN,
        COS,
        ADD_NUMBER,
        SUBTRACT_NUMBER,
        MULTIPLY_NUMBER,
        DIVIDE_NUMBER;

        private static final double LN10 = StrictMath.log(10);

        boolean affine() {
            return this == NEGATE || ordinal() >= ADD_NUMBER.ordinal();
        }
    }

    record Applied(Function function, Expression of, double x) implements Expression {
        /** Functions with a border are taken of 1.5 + u^2, growing ones of sin u. */
        private Expression inner() {
            return switch (function) {
                case SQRT, LOG, LOG10, POWER ->
                    new Applied(Function.ADD_NUMBER, new Applied(Function.SQUARE, of, 0), 1.5);
                case EXP, TEN_TO -> new Applied(Function.SIN, of, 0);
                default -> of;
            };
        }

        @Override
        public Dual dual(List<Dual> variables) {
            Dual u = inner().dual(variables);
            return switch (function) {
                case NEGATE -> u.negate();
                case SQUARE -> u.square();
                case SQRT -> u.sqrt();
                case EXP -> u.exp();
                case LOG -> u.log();
                case LOG10 -> u.log10();
                case TEN_TO -> u.tenTo();
                case POWER -> u.power(x);
                case SIN -> u.sin();
                case COS -> u.cos();
                case ADD_NUMBER -> u.add(x);
                case SUBTRACT_NUMBER -> u.subtract(x);
                case MULTIPLY_NUMBER -> u.multiply(x);
                case DIVIDE_NUMBER -> u.divide(x);
            };
        }

        @Override
        public Gradient gradient(List<Gradient> variables) {
            Gradient u = inner().gradient(variables);
            return switch (function) {
                case NEGATE -> u.negate();
                case SQUARE -> u.multiply(u);
                case SQRT -> u.sqrt();
                case EXP -> u.exp();
                case LOG -> u.log();
                case LOG10 -> u.log10();
                case TEN_TO -> u.multiply(Function.LN10).exp();
                case POWER -> u.pow(x);
                case SIN -> u.sin();
                case COS -> u.cos();
                case ADD_NUMBER -> u.add(x);
                case SUBTRACT_NUMBER -> u.subtract(x);
                case MULTIPLY_NUMBER -> u.multiply(x);
                case DIVIDE_NUMBER -> u.divide(x);
            };
        }

        @Override
        public double number(double[] variables) {
            double u = inner().number(variables);
            return switch (function) {
                case NEGATE -> -u;
                case SQUARE -> u * u;
                case SQRT -> FastMath.sqrt(u);
                case EXP -> FastMath.exp(u);
                case LOG -> FastMath.log(u);
                case LOG10 -> FastMath.log10(u);
                case TEN_TO -> FastMath.pow(10, u);
                case POWER -> FastMath.pow(u, x);
                case SIN -> FastMath.sin(u);
                case COS -> FastMath.cos(u);
                case ADD_NUMBER -> u + x;
                case SUBTRACT_NUMBER -> u - x;
                case MULTIPLY_NUMBER -> u * x;
                case DIVIDE_NUMBER -> u / x;
            };
        }

        @Override
        public int degree() {
            int degree = of.degree();
            return function.affine() || degree == 0 ? degree : BENT;
        }

        @Override
        public double size(double[] variables) {
            return Math.max(Math.abs(number(variables)), inner().size(variables));
        }
    }

    /** Operations on two numbers. */
    enum Operation {
        ADD,
        SUBTRACT,
        MULTIPLY,
        DIVIDE
    }

    record Joined(Operation operation, Expression left, Expression right) implements Expression {
        /** A divisor is 1.5 + v^2. */
        private Expression second() {
            return operation == Operation.DIVIDE && right.degree() > 0
                    ? new Applied(Function.ADD_NUMBER, new Applied(Function.SQUARE, right, 0), 1.5)
                    : right;
        }

        @Override
        public Dual dual(List<Dual> variables) {
            Dual u = left.dual(variables);
            Dual v = second().dual(variables);
            return switch (operation) {
                case ADD -> u.add(v);
                case SUBTRACT -> u.subtract(v);
                case MULTIPLY -> u.multiply(v);
                case DIVIDE -> u.divide(v);
            };
        }

        @Override
        public Gradient gradient(List<Gradient> variables) {
            Gradient u = left.gradient(variables);
            Gradient v = second().gradient(variables);
            return switch (operation) {
                case ADD -> u.add(v);
                case SUBTRACT -> u.subtract(v);
                case MULTIPLY -> u.multiply(v);
                case DIVIDE -> u.divide(v);
            };
        }

        @Override
        public double number(double[] variables) {
            double u = left.number(variables);
            double v = second().number(variables);
            return switch (operation) {
                case ADD -> u + v;
                case SUBTRACT -> u - v;
                case MULTIPLY -> u * v;
                case DIVIDE -> u / v;
            };
        }

        @Override
        public int degree() {
            return switch (operation) {
                case ADD, SUBTRACT -> Math.max(left.degree(), right.degree());
                case MULTIPLY -> Math.min(BENT, left.degree() + right.degree());
                case DIVIDE -> right.degree() == 0 ? left.degree() : BENT;
            };
        }

        @Override
        public double size(double[] variables) {
            return Math.max(Math.abs(number(variables)), Math.max(left.size(variables), second().size(variables)));
        }
    }
}
