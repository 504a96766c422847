package distanceladder.information;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

/** A very precise row and a loose one of the same object, in either order, give the loose row's parameter cleanly. */
class EliminationScaleTest {
    @Test
    void preciseRowsDoNotSpoilLooseOnes() {
        for (double ratio : new double[] {1, 1e3, 1e6, 1e9, 1e12}) {
            assertEquals(0, error(ratio, false), 1e-13, "precise row first, ratio " + ratio);
            assertEquals(0, error(ratio, true), 1e-13, "loose row first, ratio " + ratio);
        }
    }

    /** Error of theta in mu = 33.3 (precise), mu + theta = 42.5 (sigma 1). */
    private static double error(double ratio, boolean looseFirst) {
        double[] precise = {0, 33.3 * ratio};
        double[] loose = {1, 42.5};
        double[] a = looseFirst ? new double[] {1, ratio} : new double[] {ratio, 1};
        double[][] rows = looseFirst ? new double[][] {loose, precise} : new double[][] {precise, loose};
        Unknowns theta = Unknowns.of(List.of("theta"));
        Elimination e = Elimination.of(ObjectRows.of(theta, new String[] {"o", "o"}, a, rows));
        Solved solved = Solved.of(e.own(), List.of());
        double value = solved.value(solved.combination(theta, new double[] {1}));
        return (value - (42.5 - 33.3)) / Math.sqrt(1 + 1 / (ratio * ratio));
    }
}
