package distanceladder.relation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.BinaryOperator;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Each operation against central differences of fourth order. */
class DualTest {
    static Stream<Arguments> functions() {
        return Stream.of(
                Arguments.of("u + 1.7", (UnaryOperator<Dual>) u -> u.add(1.7), false),
                Arguments.of("u - 1.7", (UnaryOperator<Dual>) u -> u.subtract(1.7), false),
                Arguments.of("-u", (UnaryOperator<Dual>) Dual::negate, false),
                Arguments.of("1.7 u", (UnaryOperator<Dual>) u -> u.multiply(1.7), false),
                Arguments.of("u / 1.7", (UnaryOperator<Dual>) u -> u.divide(1.7), false),
                Arguments.of("u^1", (UnaryOperator<Dual>) u -> u.power(1), false),
                Arguments.of("u^2", (UnaryOperator<Dual>) Dual::square, true),
                Arguments.of("sqrt u", (UnaryOperator<Dual>) Dual::sqrt, true),
                Arguments.of("exp u", (UnaryOperator<Dual>) Dual::exp, true),
                Arguments.of("ln u", (UnaryOperator<Dual>) Dual::log, true),
                Arguments.of("log u", (UnaryOperator<Dual>) Dual::log10, true),
                Arguments.of("10^u", (UnaryOperator<Dual>) Dual::tenTo, true),
                Arguments.of("u^-2.3", (UnaryOperator<Dual>) u -> u.power(-2.3), true),
                Arguments.of("sin u", (UnaryOperator<Dual>) Dual::sin, true),
                Arguments.of("cos u", (UnaryOperator<Dual>) Dual::cos, true));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("functions")
    void functionsOfOneNumber(String name, UnaryOperator<Dual> f, boolean bends) {
        for (double x : new double[] {0.6, 1.3, 2.4}) {
            double h = 1e-3;
            double difference =
                    (value(f, x - 2 * h) - 8 * value(f, x - h) + 8 * value(f, x + h) - value(f, x + 2 * h)) / (12 * h);
            Dual u = new Tape(2).variable(1, x);
            Dual w = f.apply(u);
            assertEquals(difference, w.partial(1), 1e-9 * (1 + Math.abs(w.value())), name + " at " + x);
            assertEquals(0, Math.abs(w.partial(0)));
            assertEquals(bends, w.curved());
        }
        Dual constant = f.apply(new Tape(2).constant(1.3));
        assertEquals(0, Math.abs(constant.partial(1)));
        assertFalse(constant.curved(), "a function of a constant is one");
    }

    private static double value(UnaryOperator<Dual> f, double x) {
        return f.apply(new Tape(2).variable(1, x)).value();
    }

    static Stream<Arguments> operations() {
        return Stream.of(
                Arguments.of("u + v", (BinaryOperator<Dual>) Dual::add, false, false, false),
                Arguments.of("u - v", (BinaryOperator<Dual>) Dual::subtract, false, false, false),
                Arguments.of("u v", (BinaryOperator<Dual>) Dual::multiply, true, false, false),
                Arguments.of("u / v", (BinaryOperator<Dual>) Dual::divide, true, false, true));
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("operations")
    void operationsOnTwoNumbers(
            String name, BinaryOperator<Dual> f, boolean bends, boolean bendsFirst, boolean bendsSecond) {
        double h = 1e-3;
        double u = 1.3;
        double v = -0.7;
        Tape tape = new Tape(2);
        Dual w = f.apply(tape.variable(0, u), tape.variable(1, v));
        double byU = (value(f, u - 2 * h, v) - 8 * value(f, u - h, v) + 8 * value(f, u + h, v) - value(f, u + 2 * h, v))
                / (12 * h);
        double byV = (value(f, u, v - 2 * h) - 8 * value(f, u, v - h) + 8 * value(f, u, v + h) - value(f, u, v + 2 * h))
                / (12 * h);
        assertEquals(byU, w.partial(0), 1e-9, name);
        assertEquals(byV, w.partial(1), 1e-9, name);
        assertEquals(bends, w.curved());
        assertEquals(bendsFirst, f.apply(tape.variable(0, u), tape.constant(v)).curved());
        assertEquals(bendsSecond, f.apply(tape.constant(u), tape.variable(1, v)).curved());
        assertFalse(f.apply(tape.constant(u), tape.constant(v)).curved());
    }

    private static double value(BinaryOperator<Dual> f, double u, double v) {
        Tape tape = new Tape(2);
        return f.apply(tape.variable(0, u), tape.variable(1, v)).value();
    }

    @Test
    void aNumberWithItself() {
        Dual x = new Tape(1).variable(0, 3);
        assertEquals(6, x.multiply(x).partial(0));
        assertTrue(x.multiply(x).curved());
        assertEquals(0, x.divide(x).partial(0), 1e-16);
        assertEquals(2, x.add(x).partial(0));
        assertEquals(0, x.subtract(x).partial(0));
        assertFalse(x.subtract(x).curved());
    }

    @Test
    void bendingIsNotForgotten() {
        Tape tape = new Tape(2);
        Dual bent = tape.variable(0, 0.5).exp();
        for (Dual w : List.of(
                bent.add(1),
                bent.negate(),
                bent.multiply(2),
                bent.divide(3),
                bent.add(tape.variable(1, 1)),
                tape.variable(1, 1).subtract(bent),
                tape.constant(2).multiply(bent),
                bent.divide(tape.constant(2)))) {
            assertTrue(w.curved());
        }
    }
}
