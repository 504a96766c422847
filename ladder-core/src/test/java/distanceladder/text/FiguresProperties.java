package distanceladder.text;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** What is shown, read back, is the number that was meant. */
class FiguresProperties {
    /** Value to half a unit of sigma's second digit, sigma to 5 %, for any powers of ten. */
    @Property
    void pairReadsBack(
            @ForAll @DoubleRange(min = -1000, max = 1000) double inSigmas,
            @ForAll @DoubleRange(min = 1, max = 9.99) double first,
            @ForAll @IntRange(min = -300, max = 300) int power) {
        double sigma = first * Double.parseDouble("1e" + power);
        double value = inSigmas * sigma;
        double[] read = read(Figures.pair(value, sigma));
        assertEquals(sigma, read[1], 0.0501 * sigma);
        assertEquals(value, read[0], 0.0501 * sigma);
        assertEquals(value, Double.parseDouble(Figures.value(value, sigma)), 0.0501 * sigma);
    }

    @Property
    void valueAndSigmaEndAtTheSamePlace(
            @ForAll @DoubleRange(min = -1e4, max = 1e4) double value,
            @ForAll @DoubleRange(min = 1, max = 9.99) double first,
            @ForAll @IntRange(min = -6, max = 0) int power) {
        double sigma = first * Double.parseDouble("1e" + power);
        String[] parts = Figures.pair(value, sigma).replaceAll("\\(|\\).*", "").split(" ± ");
        assertEquals(decimals(parts[1]), decimals(parts[0]));
        assertFalse(parts[0].matches("-0(\\.0*)?"), parts[0]);
        assertTrue(parts[1].replace(".", "").replaceAll("^0+", "").length() == 2, parts[1]);
    }

    @Property
    void significantReadsBack(@ForAll double x, @ForAll @IntRange(min = 1, max = 17) int digits) {
        double read = Double.parseDouble(Figures.significant(x, digits));
        if (Math.abs(x) > 1e-290 && Double.isFinite(read)) {
            assertEquals(x, read, 0.50001 * Math.abs(x) * Double.parseDouble("1e" + (1 - digits)) + Math.ulp(x));
        }
    }

    private static double[] read(String pair) {
        int close = pair.indexOf(')');
        String power = close < 0 ? "" : pair.substring(close + 1);
        String[] parts = (close < 0 ? pair : pair.substring(1, close)).split(" ± ");
        return new double[] {Double.parseDouble(parts[0] + power), Double.parseDouble(parts[1] + power)};
    }

    private static int decimals(String number) {
        int point = number.indexOf('.');
        return point < 0 ? 0 : number.length() - point - 1;
    }
}
