package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class LowRankUpdateTest extends CovarianceContract {
    private static final double[][] COLUMNS = {{1, 2}, {0.5, 0}, {-1, 1}, {3, 0.25}};

    @Override
    Covariance covariance() {
        return LowRankUpdate.of(Diagonal.fromVariances(1, 2, 0, 4), COLUMNS, Dense.fromCovariance(new double[][] {
            {2, 0.5}, {0.5, 1}
        }));
    }

    @Test
    void addsColumnsTimesTheirTranspose() {
        Covariance c = LowRankUpdate.of(Diagonal.fromVariances(1, 2, 0, 4), COLUMNS);
        assertEquals(1 + 1 + 4, c.entry(0, 0));
        assertEquals(0.5, c.entry(0, 1));
        assertEquals(-1 + 2, c.entry(0, 2));
        assertArrayEquals(COLUMNS, c.split().columns());
    }

    @Test
    void addsColumnsTimesAKernel() {
        // U K UT by hand: (1, 2) K (-1, 1)T with K (-1, 1)T = (-1.5, 0.5)
        assertEquals(-1.5 + 1, covariance().entry(0, 2));
    }

    @Test
    void aSumThatCancelsLeavesWhatIsBeneath() {
        double[][] common = {{1e9}, {1e9}};
        Covariance c = LowRankUpdate.of(Diagonal.fromVariances(1, 1), common);
        assertEquals(2, c.quadratic(new double[] {1, -1}));
        double[][] root = Root.of(c);
        double variance = 0;
        for (int k = 0; k < root[0].length; k++) {
            double difference = root[0][k] - root[1][k];
            variance += difference * difference;
        }
        assertEquals(2, variance, 1e-15);
    }

    @Test
    void columnsWithoutEffectAreNotCarried() {
        Covariance c = LowRankUpdate.of(Diagonal.fromVariances(1, 1), new double[][] {{0, 2, 0}, {0, 3, 0}});
        assertArrayEquals(new double[][] {{2}, {3}}, c.split().columns());
        Covariance certain = LowRankUpdate.of(
                Diagonal.fromVariances(1, 1), new double[][] {{1, 2}, {1, 3}}, Diagonal.fromVariances(0, 4));
        assertArrayEquals(new double[][] {{4}, {6}}, certain.split().columns());
        assertEquals(
                0, LowRankUpdate.of(certain, new double[2][0]).part(0).split().columns()[0].length - 1);
    }

    @Test
    void updatesNest() {
        Covariance c = LowRankUpdate.of(covariance(), COLUMNS, Diagonal.fromVariances(0.5, 2));
        assertEquals(4, c.split().columnCount());
        Matrices.assertReassembles(c);
    }

    @Test
    void givenArraysAreCopied() {
        double[][] columns = {{1}, {2}};
        Covariance c = LowRankUpdate.of(Diagonal.fromVariances(0, 0), columns);
        columns[0][0] = 5;
        assertEquals(1, c.entry(0, 0));
        assertEquals(1, c.part(0).entry(0, 0));
    }

    @Test
    void refusesWhatDoesNotFit() {
        Diagonal base = Diagonal.fromVariances(1, 1);
        refused("1 rows of columns", () -> LowRankUpdate.of(base, new double[][] {{1}}));
        refused("row 1 of 2 numbers", () -> LowRankUpdate.of(base, new double[][] {{1}, {1, 2}}));
        refused(
                "there are 3 shared errors",
                () -> LowRankUpdate.of(base, new double[][] {{1}, {1}}, Diagonal.fromVariances(1, 1, 1)));
        refused("column 1 of row 0 = NaN", () -> LowRankUpdate.of(base, new double[][] {{1, Double.NaN}, {1, 2}}));
        refused("the shared variance of row 1 = Infinity", () -> LowRankUpdate.of(base, new double[][] {{1}, {1e200}}));
    }
}
