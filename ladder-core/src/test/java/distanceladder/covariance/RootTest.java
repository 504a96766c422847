package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RootTest {
    @Test
    void aDiagonalGivesAColumnForEachVariance() {
        assertArrayEquals(new double[][] {{2, 0}, {0, 0}, {0, 3}}, Root.of(Diagonal.fromStandardDeviations(2, 0, 3)));
    }

    @Test
    void whatIsCertainGivesNoColumn() {
        assertArrayEquals(new double[2][0], Root.of(Diagonal.fromVariances(0, 0)));
        assertArrayEquals(new double[2][0], Root.of(Dense.fromCovariance(new double[2][2])));
        assertArrayEquals(new double[0][0], Root.of(Diagonal.fromVariances()));
    }

    @Test
    void aDenseOneByHand() {
        // c = [[4, 6], [6, 25]]: correlation 0.6, so L = [[2, 0], [3, 4]]
        double[][] root = Root.of(Dense.fromCovariance(new double[][] {{4, 6}, {6, 25}}));
        Matrices.assertClose(new double[][] {{4, 6}, {6, 25}}, Matrices.square(root), 1e-15);
        assertEquals(2, root[0][0], 1e-15);
        assertEquals(0, root[0][1]);
        assertEquals(3, root[1][0], 1e-15);
        assertEquals(4, root[1][1], 1e-15);
    }

    @ParameterizedTest
    @CsvSource({"1, 1", "5, 1", "5, 2", "40, 7", "40, 40", "200, 30"})
    void hasAsManyColumnsAsTheRank(int n, int rank) {
        Dense c = Dense.fromCovariance(Matrices.square(Matrices.random(n, rank, 17)));
        assertEquals(rank, Root.of(c)[0].length);
        Matrices.assertRoot(c);
    }
}
