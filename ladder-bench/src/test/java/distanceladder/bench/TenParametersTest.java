package distanceladder.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.relation.Linearised;
import org.junit.jupiter.api.Test;

/** The benchmark's rivals agree before they are timed. */
class TenParametersTest {
    @Test
    void rivalsAgree() {
        TenParameters relation = new TenParameters(500);
        Linearised ours = relation.ours();
        double[][] hand = relation.byHand();
        double[][] hipparchus = relation.byHipparchus();
        for (int i = 0; i < hand.length; i++) {
            for (int j = 0; j <= 10; j++) {
                assertEquals(hand[i][j], ours.rows()[i][j], 1e-12 * Math.max(1, Math.abs(hand[i][j])));
                assertEquals(hand[i][j], hipparchus[i][j], 1e-12 * Math.max(1, Math.abs(hand[i][j])));
            }
            assertEquals(1, ours.coefficients()[i]);
        }
    }
}
