package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class SumTest extends CovarianceContract {
    @Override
    Covariance covariance() {
        return Sum.of(
                Diagonal.fromVariances(1, 0, 3, 4, 0.5),
                Blocks.of(
                        Dense.fromCovariance(new double[][] {{1, 0.5}, {0.5, 1}}),
                        Dense.fromCovariance(new double[][] {{2, -0.5}, {-0.5, 2}}),
                        Diagonal.fromVariances(0)),
                LowRankUpdate.of(Diagonal.fromVariances(new double[5]), Matrices.random(5, 2, 3)));
    }

    @Test
    void entriesAreAdded() {
        Covariance c = Sum.of(Diagonal.fromVariances(1, 2), Dense.fromCovariance(new double[][] {{3, 0.5}, {0.5, 4}}));
        assertArrayEquals(new double[][] {{4, 0.5}, {0.5, 6}}, c.toArray());
    }

    @Test
    void blocksThatOverlapBecomeOne() {
        Dense pair = Dense.fromCovariance(new double[][] {{1, 0.5}, {0.5, 1}});
        Diagonal single = Diagonal.fromVariances(2);
        Split split = Sum.of(
                        Blocks.of(pair, pair, single),
                        Blocks.of(single, pair, single, single),
                        Diagonal.fromVariances(0.1, 0.1, 0.1, 0.1, 0.1))
                .split();
        assertEquals(1, split.blocks().size());
        assertArrayEquals(new int[] {0, 1, 2, 3}, split.blocks().get(0).indices());
        assertArrayEquals(new double[] {0, 0, 0, 0, 4.1}, split.diagonal());
    }

    @Test
    void blocksThatDoNotOverlapStayApart() {
        Dense pair = Dense.fromCovariance(new double[][] {{1, 0.5}, {0.5, 1}});
        Diagonal two = Diagonal.fromVariances(2, 3);
        Split split = Sum.of(Blocks.of(two, pair), Blocks.of(pair, two)).split();
        assertEquals(2, split.blocks().size());
        assertEquals(3, split.blocks().get(0).entry(0, 0));
        assertEquals(4, split.blocks().get(1).entry(1, 1));
    }

    @Test
    void refusesWhatDoesNotFit() {
        refused("no covariance", Sum::of);
        refused("part 1 of 2 values", () -> Sum.of(Diagonal.fromVariances(1), Diagonal.fromVariances(1, 2)));
    }
}
