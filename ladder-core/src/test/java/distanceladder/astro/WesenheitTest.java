package distanceladder.astro;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class WesenheitTest {
    /**
     * Riess et al. 2019, table of 70 pulsators in the LMC, three rows: correction for geometry, F555W and its error, F814W
     * and its error, F160W and its error, m_H^W and its error.
     */
    private static final double[][] LMC = {
        {0.028, 13.131, 0.028, 12.208, 0.011, 11.321, 0.018, 10.966, 0.021},
        {0.034, 13.623, 0.022, 12.693, 0.012, 11.770, 0.021, 11.406, 0.023},
        {0.027, 13.457, 0.037, 12.299, 0.021, 11.232, 0.042, 10.787, 0.045}
    };

    /**
     * The printed magnitudes are corrected for geometry and by one more constant, so W less the correction differs from
     * them by the same number in all rows, to the rounding of five columns of three decimals (2 times 0.0019).
     */
    @Tag("validation")
    @Test
    void publishedMagnitudes() {
        Wesenheit w = new Wesenheit(0.386);
        double first = 0;
        for (double[] row : LMC) {
            double rest = w.magnitude(row[5], row[1], row[3]) - row[0] - row[7];
            first = first == 0 ? rest : first;
            assertEquals(first, rest, 0.0038);
            assertEquals(row[8], w.sigma(row[6], row[2], row[4]), 0.001);
        }
    }

    /** Reddening moves m_a by R E and the colour by E: W stays. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 0.1, 2})
    void reddeningLeavesItAsItIs(double reddening) {
        Wesenheit w = new Wesenheit(1.55);
        double rest = w.magnitude(14.0, 14.7, 14.0);
        double dimmed = w.magnitude(14.0 + 1.55 * reddening, 14.7 + 2.55 * reddening, 14.0 + 1.55 * reddening);
        assertEquals(rest, dimmed, 1e-14);
    }

    /** Central differences through W = I - R (V - I), the errors of both bands in quadrature. */
    @Test
    void bandsThatStandTwiceErrTogether() {
        Wesenheit w = new Wesenheit(1.55);
        double h = 0.5;
        double byI = (w.magnitude(14 + h, 15, 14 + h) - w.magnitude(14 - h, 15, 14 - h)) / (2 * h);
        double byV = (w.magnitude(14, 15 + h, 14) - w.magnitude(14, 15 - h, 14)) / (2 * h);
        double expected = Math.sqrt(byI * byI * 0.02 * 0.02 + byV * byV * 0.03 * 0.03);
        assertEquals(expected, w.sigmaOfTwoBands(0.02, 0.03), 1e-16);
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY})
    void theRatioIsANumber(double ratio) {
        assertThrows(ValueFault.class, () -> new Wesenheit(ratio));
    }
}
