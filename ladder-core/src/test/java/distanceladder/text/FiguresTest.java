package distanceladder.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Two significant digits of the standard deviation (common practice), the value to the same place, half to even. */
class FiguresTest {
    @ParameterizedTest
    @CsvSource({
        "71.32, 1.44, 71.3 ± 1.4",
        "71.32, 0.0996, 71.32 ± 0.10",
        "71.32, 0.0994, 71.320 ± 0.099",
        "9.996, 0.14, 10.00 ± 0.14",
        "-0.0001, 0.14, 0.00 ± 0.14",
        "0, 1.4, 0.0 ± 1.4",
        "-19.231, 0.049, -19.231 ± 0.049",
        "12345, 1200, 12300 ± 1200",
        "12345, 12, 12345 ± 12",
        "3, 250, 0 ± 250",
        "20, 56, 20 ± 56",
        "0.125, 1.5, 0.1 ± 1.5",
        "2.5, 15, 2 ± 15",
        "3.5, 15, 4 ± 15"
    })
    void valueAndSigma(double value, double sigma, String shown) {
        assertEquals(shown, Figures.pair(value, sigma));
    }

    @ParameterizedTest
    @CsvSource({
        "7.131e-13, 1.4e-15, (7.131 ± 0.014)e-13",
        "9.9996e-13, 1.4e-14, (1.000 ± 0.014)e-12",
        "0, 1e-14, (0.0 ± 1.0)e-14",
        "0, 1e-8, (0.0 ± 1.0)e-8",
        "1.98841e30, 2.2e26, (1.98841 ± 0.00022)e30",
        "2e-9, 3e-8, (0.2 ± 3.0)e-8",
        "12345678, 120, 12345680 ± 120",
        "123456789, 1200, (1.234568 ± 0.000012)e8"
    })
    void veryLargeAndVerySmall(double value, double sigma, String shown) {
        assertEquals(shown, Figures.pair(value, sigma));
    }

    @Test
    void sigmaBelowTheDigitsOfADoubleStandsOnItsOwn() {
        assertEquals("70.000000000000000 ± 1.0e-300", Figures.pair(70, 1e-300));
        assertEquals("70.000000000000000", Figures.value(70, 1e-300));
        assertEquals("70.000000000000 ± 0.000000000010", Figures.pair(70, 1e-11));
    }

    @Test
    void withoutAnErrorSixDigits() {
        assertEquals("0.0233000", Figures.pair(0.0233, 0));
        assertEquals("0", Figures.pair(-0.0, 0));
    }

    /** Digits of a finite number beside a word are rounded ones too, so that they are alike on every machine. */
    @Test
    void wordsForWhatIsNotFinite() {
        assertEquals("71.3200 ± infinite", Figures.pair(71.32, Double.POSITIVE_INFINITY));
        assertEquals("2.00000e-10 ± not a number", Figures.pair(2.0e-10, Double.NaN));
        assertEquals("not a number ± 1.4", Figures.pair(Double.NaN, 1.44));
        assertEquals("-infinite", Figures.significant(Double.NEGATIVE_INFINITY, 3));
        assertEquals("71.3200", Figures.value(71.32, Double.POSITIVE_INFINITY));
        assertEquals("71.3200", Figures.value(71.32, Double.NaN));
        assertEquals("not a number", Figures.percent(Double.NaN));
        assertEquals("+0.0120", Figures.move(0.012, Double.POSITIVE_INFINITY));
        assertEquals("infinite", Figures.fixed(Double.POSITIVE_INFINITY, 2));
    }

    @Test
    void valueAlone() {
        assertEquals("71.3", Figures.value(71.32, 1.44));
        assertEquals("0.00", Figures.value(-0.0001, 0.14));
        assertEquals("7.131e-13", Figures.value(7.131e-13, 1.4e-15));
        assertEquals("71.3200", Figures.value(71.32, 0));
    }

    @Test
    void significantDigits() {
        assertEquals("1.4", Figures.sigma(1.44));
        assertEquals("0.10", Figures.sigma(0.0996));
        assertEquals("1200", Figures.significant(1234.5, 2));
        assertEquals("1.00", Figures.significant(0.9999, 3));
        assertEquals("0.000012", Figures.significant(0.0000123, 2));
        assertEquals("1.2e-6", Figures.significant(0.00000123, 2));
        assertEquals("1.0e8", Figures.significant(99999999, 2));
        assertEquals("0", Figures.significant(-0.0, 3));
    }

    /** The double of 0.15 is below it, that of 0.25 is exact, that of 0.45 above it: half to even at 0.25 alone. */
    @Test
    void theExactValueIsRounded() {
        assertEquals("0.1", Figures.significant(0.15, 1));
        assertEquals("0.2", Figures.significant(0.25, 1));
        assertEquals("0.5", Figures.significant(0.45, 1));
    }

    @Test
    void signsMovesAndShares() {
        assertEquals("+0.0120", Figures.signed(0.012, 3));
        assertEquals("-0.0120", Figures.signed(-0.012, 3));
        assertEquals("0", Figures.signed(-0.0, 3));
        assertEquals("0.00", Figures.fixed(-0.0001, 2));
        assertEquals("+0.01", Figures.fixed(0.0051, 2));
        assertEquals("+0.123", Figures.move(0.1234, 0.14));
        assertEquals("+12.3", Figures.move(12.34, 0));
        assertEquals("12.3 %", Figures.percent(0.1234));
        assertEquals("0.0 %", Figures.percent(-0.00001));
        assertEquals("1 datum", Figures.count(1, "datum", "data"));
        assertEquals("0 data", Figures.count(0, "datum", "data"));
    }

    @Test
    void alikeInEveryLocale() {
        Locale before = Locale.getDefault();
        try {
            for (String tag : new String[] {"de-DE", "ar-EG", "hi-IN-u-nu-deva"}) {
                Locale.setDefault(Locale.forLanguageTag(tag));
                assertEquals("71.3 ± 1.4", Figures.pair(71.32, 1.44), tag);
                assertEquals("12.3 %", Figures.percent(0.1234), tag);
            }
        } finally {
            Locale.setDefault(before);
        }
    }
}
