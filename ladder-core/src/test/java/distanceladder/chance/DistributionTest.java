package distanceladder.chance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.text.ValueFault;
import java.util.stream.LongStream;
import org.apache.commons.math3.distribution.LogNormalDistribution;
import org.apache.commons.math3.distribution.NormalDistribution;
import org.apache.commons.math3.distribution.RealDistribution;
import org.apache.commons.math3.distribution.TDistribution;
import org.apache.commons.math3.distribution.TriangularDistribution;
import org.apache.commons.math3.distribution.UniformRealDistribution;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DistributionTest {
    private static final double[] PROBABILITIES = {1e-12, 1e-6, 0.025, 0.1587, 0.4, 0.5, 0.6, 0.8413, 0.975, 0.999999};

    private static final Distribution.Normal NORMAL = new Distribution.Normal(-0.017, 0.005);
    private static final Distribution.Uniform UNIFORM = new Distribution.Uniform(-2, 5);
    private static final Distribution.Triangular TRIANGULAR = new Distribution.Triangular(-1, 0.5, 4);
    private static final Distribution.LogNormal LOG_NORMAL = new Distribution.LogNormal(0.3, 0.4);
    private static final Distribution.SplitNormal SPLIT = new Distribution.SplitNormal(3, 0.5, 1.5);
    private static final Distribution.StudentT STUDENT = new Distribution.StudentT(2, 3, 5);

    /** Commons Math 3.6.1. */
    @Test
    @Tag("validation")
    void momentsAndQuantilesAgreeWithCommonsMath() {
        agrees(new NormalDistribution(-0.017, 0.005), NORMAL);
        agrees(new UniformRealDistribution(-2, 5), UNIFORM);
        agrees(new TriangularDistribution(-1, 0.5, 4), TRIANGULAR);
        agrees(new TriangularDistribution(-1, -1, 4), new Distribution.Triangular(-1, -1, 4));
        agrees(new TriangularDistribution(-1, 4, 4), new Distribution.Triangular(-1, 4, 4));
        agrees(new LogNormalDistribution(0.3, 0.4), LOG_NORMAL);
    }

    private static void agrees(RealDistribution expected, Distribution actual) {
        assertEquals(expected.getNumericalMean(), actual.mean(), 1e-14 * (1 + Math.abs(actual.mean())));
        assertEquals(expected.getNumericalVariance(), actual.variance(), 1e-14 * actual.variance());
        for (double p : PROBABILITIES) {
            assertEquals(p, expected.cumulativeProbability(actual.quantile(p)), 1e-14, actual + " at " + p);
        }
    }

    /** mpmath 1.2 (Debian), 40 digits: the root of log ncdf(x) = log p, p the double that is written. */
    @ParameterizedTest
    @Tag("validation")
    @CsvSource({
        "1e-300, -37.047096299361199237",
        "1e-16, -8.2220822161304356152",
        "1e-6, -4.7534243088228989573",
        "0.025, -1.9599639845400542118",
        "0.3, -0.52440051270804081597",
        "0.5, 0",
        "0.8, 0.8416212335729143638",
        "0.975, 1.9599639845400538556",
        "0.999999, 4.7534243088170877657"
    })
    void normalQuantiles(double p, double expected) {
        assertEquals(expected, new Distribution.Normal(0, 1).quantile(p), 4e-16 * Math.abs(expected));
    }

    /**
     * mpmath 1.2 (Debian), 40 digits and more: up to 30 degrees of freedom the root in its incomplete beta function,
     * above in its quadrature of the density; p the double that is written.
     */
    @ParameterizedTest
    @Tag("validation")
    @CsvSource({
        "1.5, 1e-300, -5.21946942734463633e+199",
        "1.5, 1e-9, -521946.94273343724308",
        "1.5, 0.025, -6.0166631044279316927",
        "1.5, 0.4, -0.30074539256979535288",
        "1.5, 0.499999, -2.9348322153291613e-6",
        "2, 1e-9, -22360.679741456876591",
        "2, 0.025, -4.3026527297494637234",
        "2, 0.499999, -2.82842712467617101e-6",
        "4, 1e-300, -1.31607401295249245e+75",
        "4, 1e-9, -234.02761040611893336",
        "4, 0.025, -2.7764451051977943036",
        "4, 0.4, -0.270722294707597363",
        "30, 1e-300, -50178575360.5050807",
        "30, 1e-9, -8.4458627962742427757",
        "30, 0.025, -2.0422724563012382836",
        "30, 0.4, -0.25560536495191271444",
        "30, 0.499999, -2.52760022605851273e-6",
        "10000, 1e-9, -6.0033554479471416047",
        "10000, 0.025, -1.9602012398906262341",
        "10000, 0.4, -0.25335384344572679407",
        "10000, 0.499999, -2.50669094105664735e-6",
        "10000, 1e-300, -38.3563843210042407",
        "110000, 1e-9, -5.9983110537960777474",
        "110000, 0.025, -1.9599855508754141037",
        "110000, 0.4, -0.25334771588242068685"
    })
    void studentQuantiles(double dof, double p, double expected) {
        double tolerance = p < 1e-100 ? 3e-13 : 2e-14;
        Distribution student = new Distribution.StudentT(0, 1, dof);
        assertEquals(expected, student.quantile(p), tolerance * Math.abs(expected));
        if (p > 0.01) {
            assertEquals(-expected, student.quantile(1 - p), 1e-9 * Math.abs(expected) + 1e-15);
        }
    }

    @Test
    void studentMoments() {
        assertEquals(2, STUDENT.mean());
        assertEquals(15, STUDENT.variance(), 1e-14);
        assertEquals(2, STUDENT.quantile(0.5));
        assertTrue(STUDENT.hasFiniteVariance());
        assertFalse(new Distribution.StudentT(0, 1, 2).hasFiniteVariance());
        assertEquals(Double.POSITIVE_INFINITY, new Distribution.StudentT(0, 1, 1.5).variance());
    }

    /** Trapezoids over the density of John (1982): mean and variance of the split normal. */
    @Test
    void splitNormalMomentsAreThoseOfItsDensity() {
        double weight = 0;
        double first = 0;
        double second = 0;
        double step = 1.0 / 1024;
        for (double x = -12; x <= 18; x += step) {
            double z = (x - 3) / (x < 3 ? 0.5 : 1.5);
            double density = StrictMath.exp(-0.5 * z * z);
            weight += density;
            first += density * (x - 3);
            second += density * (x - 3) * (x - 3);
        }
        double mean = first / weight;
        assertEquals(3 + mean, SPLIT.mean(), 1e-6);
        assertEquals(second / weight - mean * mean, SPLIT.variance(), 1e-6);
    }

    @Test
    void splitNormalQuantiles() {
        RealDistribution below = new NormalDistribution(3, 0.5);
        RealDistribution above = new NormalDistribution(3, 1.5);
        for (double p : PROBABILITIES) {
            double x = SPLIT.quantile(p);
            // a quarter of the probability is below the mode: s1 / (s1 + s2)
            double probability =
                    x < 3 ? 0.5 * below.cumulativeProbability(x) : 0.25 + 1.5 * (above.cumulativeProbability(x) - 0.5);
            assertEquals(p, probability, 1e-14);
        }
        assertEquals(3, SPLIT.quantile(0.25));
        Distribution even = new Distribution.SplitNormal(1, 2, 2);
        assertEquals(new Distribution.Normal(1, 2).quantile(0.9), even.quantile(0.9), 1e-14);
        assertEquals(4, even.variance());
    }

    @Test
    void anExactNumberIsItself() {
        Distribution exact = new Distribution.Exact(0.25);
        assertEquals(0.25, exact.mean());
        assertEquals(0, exact.variance());
        assertEquals(0.25, exact.quantile(0.01));
        assertTrue(exact.hasFiniteVariance());
    }

    /** 20,000 draws each; false-alarm rate of the six together: 6e-4 per choice of seed. */
    @Test
    void drawsHaveTheirDistribution() {
        DrawsTest.assertDrawnFrom(new NormalDistribution(-0.017, 0.005), drawn(NORMAL));
        DrawsTest.assertDrawnFrom(new UniformRealDistribution(-2, 5), drawn(UNIFORM));
        DrawsTest.assertDrawnFrom(new TriangularDistribution(-1, 0.5, 4), drawn(TRIANGULAR));
        DrawsTest.assertDrawnFrom(new LogNormalDistribution(0.3, 0.4), drawn(LOG_NORMAL));
        DrawsTest.assertDrawnFrom(
                new TDistribution(5),
                LongStream.range(0, 20_000)
                        .mapToDouble(k -> (STUDENT.drawn(Draws.of(99, "student"), k, 0) - 2) / 3)
                        .toArray());
        double[] halves = LongStream.range(0, 20_000)
                .mapToDouble(k -> SPLIT.drawn(Draws.of(99, "split"), k, 0))
                .filter(x -> x < 3)
                .map(x -> (x - 3) / 0.5)
                .map(z -> 2 * new NormalDistribution().cumulativeProbability(z))
                .toArray();
        DrawsTest.assertDrawnFrom(new UniformRealDistribution(0, 1), halves);
    }

    private static double[] drawn(Distribution distribution) {
        Draws draws = Draws.of(20240101, distribution.describe());
        return LongStream.range(0, 20_000)
                .mapToDouble(k -> distribution.drawn(draws, k, 0))
                .toArray();
    }

    @Test
    void describesItself() {
        assertEquals("exactly 0.5", new Distribution.Exact(0.5).describe());
        assertEquals("normal, mean -0.017, sigma 0.005", NORMAL.describe());
        assertEquals("uniform from -2.0 to 5.0", UNIFORM.describe());
        assertEquals("triangular from -1.0 to 4.0, mode 0.5", TRIANGULAR.describe());
        assertEquals("split normal, mode 3.0, sigma 0.5 below and 1.5 above", SPLIT.describe());
        assertEquals("log-normal, logarithm of mean 0.3 and sigma 0.4", LOG_NORMAL.describe());
        assertEquals("Student's t, location 2.0, scale 3.0, 5.0 degrees of freedom", STUDENT.describe());
    }

    @Test
    void refusesWhatIsNoDistribution() {
        refused("value = NaN", () -> new Distribution.Exact(Double.NaN));
        refused("mean = Infinity", () -> new Distribution.Normal(1.0 / 0, 1));
        refused("sigma = 0.0", () -> new Distribution.Normal(0, 0));
        refused("sigma = NaN", () -> new Distribution.Normal(0, Double.NaN));
        refused("location = NaN", () -> new Distribution.StudentT(Double.NaN, 1, 3));
        refused("scale = -1.0", () -> new Distribution.StudentT(0, -1, 3));
        refused("degrees of freedom = 1.0", () -> new Distribution.StudentT(0, 1, 1));
        refused("degrees of freedom = Infinity", () -> new Distribution.StudentT(0, 1, 1.0 / 0));
        refused("limits 2.0 and 1.0", () -> new Distribution.Uniform(2, 1));
        refused("limits -1.0E308 and 1.0E308", () -> new Distribution.Uniform(-1e308, 1e308));
        refused("lower limit = NaN", () -> new Distribution.Uniform(Double.NaN, 1));
        refused("upper limit = Infinity", () -> new Distribution.Triangular(0, 1, 1.0 / 0));
        refused("mode = 3.0", () -> new Distribution.Triangular(0, 3, 1));
        refused("mode = NaN", () -> new Distribution.SplitNormal(Double.NaN, 1, 1));
        refused("sigma below = 0.0", () -> new Distribution.SplitNormal(0, 0, 1));
        refused("sigma above = -1.0", () -> new Distribution.SplitNormal(0, 1, -1));
        refused("mean of the logarithm = NaN", () -> new Distribution.LogNormal(Double.NaN, 1));
        refused("sigma of the logarithm = Infinity", () -> new Distribution.LogNormal(0, 1.0 / 0));
        refused("mean = Infinity", () -> new Distribution.LogNormal(0, 40));
    }

    @Test
    void refusesWhatIsNoProbability() {
        Distribution[] all = {new Distribution.Exact(1), NORMAL, UNIFORM, TRIANGULAR, LOG_NORMAL, SPLIT, STUDENT};
        for (Distribution distribution : all) {
            refused("p = 0.0", () -> distribution.quantile(0));
            refused("p = 1.0", () -> distribution.quantile(1));
            refused("p = NaN", () -> distribution.quantile(Double.NaN));
        }
    }

    private static void refused(String what, Executable call) {
        assertEquals(what, assertThrows(ValueFault.class, call).what());
    }
}
