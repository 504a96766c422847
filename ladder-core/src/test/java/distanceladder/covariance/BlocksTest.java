package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class BlocksTest extends CovarianceContract {
    @Override
    Covariance covariance() {
        return Blocks.of(
                Dense.fromCovariance(new double[][] {{1, 0.5}, {0.5, 1}}),
                Diagonal.fromVariances(4, 0),
                LowRankUpdate.of(Diagonal.fromVariances(1, 2, 3), new double[][] {{0.5}, {0.25}, {0}}));
    }

    @Test
    void valuesOfDifferentBlocksAreIndependent() {
        assertEquals(0, covariance().entry(0, 2));
        assertEquals(0.125, covariance().entry(4, 5));
    }

    @Test
    void aReorderedPartInterleavesBlocks() {
        Covariance c = Blocks.of(
                Dense.fromCovariance(new double[][] {{1, 0.1, 0.2}, {0.1, 2, 0.3}, {0.2, 0.3, 3}}),
                Dense.fromCovariance(new double[][] {{4, 0.5}, {0.5, 5}}));
        Covariance part = c.part(4, 2, 3, 0);
        assertArrayEquals(
                new double[][] {{5, 0, 0.5, 0}, {0, 3, 0, 0.2}, {0.5, 0, 4, 0}, {0, 0.2, 0, 1}}, part.toArray());
        Split split = part.split();
        assertArrayEquals(new int[] {0, 2}, split.blocks().get(0).indices());
        assertArrayEquals(new int[] {1, 3}, split.blocks().get(1).indices());
        Matrices.assertReassembles(part);
        Matrices.assertReassembles(c.part(2, 0));
    }

    @Test
    void refusesWhatIsOutsideABlock() {
        Block block = covariance().split().blocks().get(0);
        refused("index = 2", () -> block.entry(0, 2));
        refused("index = -1", () -> block.row(-1));
    }

    @Test
    void refusesMoreValuesThanAnIndexCanCount() {
        Covariance large = Diagonal.fromVariances(new double[1 << 20]);
        Covariance[] many = new Covariance[1 << 11];
        java.util.Arrays.fill(many, large);
        refused("2147483648 values", () -> Blocks.of(many));
    }
}
