package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Residuals, pulls and chi-squares against the dense reference. */
class FitTest {
    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void residualsAndPulls(long seed) {
        Solution solution = new RandomLadder(seed, 1).ladder().solve();
        Settled settled = solution.settled();
        DenseReference dense = new DenseReference(settled);
        for (String rung : solution.rungs()) {
            Whitened white = settled.assembly().rows(rung);
            Definition d = white.definition();
            Linearised linear = white.linear();
            var lines = solution.residuals(solution.ladder().rung(rung)).lines();
            for (int i = 0; i < lines.size(); i++) {
                double fitted = dense.rowValue(linear, d, i);
                double residual = linear.rows()[i][linear.unknowns().size()] - fitted;
                double variance = white.noise().total(i);
                double left = variance - dense.rowVariance(linear, d, i);
                double pull = lines.get(i).pull();
                if (left > 1e-7 * variance) {
                    assertEquals(residual, lines.get(i).residual(), 1e-8 * Math.sqrt(variance));
                    assertEquals(residual / Math.sqrt(left), pull, 1e-5);
                } else {
                    assertTrue(Double.isNaN(pull) || left > 1e-10 * variance, "nothing checks " + lines.get(i));
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
    void chiSquaresAddUp(long seed) {
        Solution solution = new RandomLadder(seed, 1).ladder().solve();
        ChiSquare chi = solution.chiSquare();
        double sum = chi.rejoining().value();
        int degrees = chi.rejoining().degreesOfFreedom();
        for (ChiSquare.Line line : chi.rungs()) {
            assertTrue(line.value() >= -1e-8 * chi.total().value(), line.toString());
            sum += line.value();
            degrees += line.degreesOfFreedom();
        }
        assertEquals(chi.total().value(), sum, 1e-9 * chi.total().value());
        assertEquals(chi.total().degreesOfFreedom(), degrees);
        assertEquals(
                new DenseReference(solution.settled()).chiSquare(), chi.total().value(), 1e-8 * sum);
    }
}
