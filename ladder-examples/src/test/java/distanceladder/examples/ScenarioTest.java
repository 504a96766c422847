package distanceladder.examples;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.ladder.Estimate;
import distanceladder.ladder.Solution;
import distanceladder.table.Table;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.Test;

class ScenarioTest {
    @Test
    void committedTablesAreThoseOfTheSeed() throws IOException {
        for (Map.Entry<String, String> table :
                new Scenario(Scenario.SEED).tables().entrySet()) {
            try (InputStream in = Scenario.class.getResourceAsStream(table.getKey())) {
                assertEquals(table.getValue(), new String(in.readAllBytes(), StandardCharsets.UTF_8), table.getKey());
            }
        }
    }

    @Test
    void someParallaxesAreNegative() {
        Table nearby =
                Table.parse("nearby.csv", new Scenario(Scenario.SEED).tables().get("nearby.csv"));
        int negative = 0;
        for (int i = 0; i < nearby.size(); i++) {
            negative += nearby.number(i, "parallax_mas") < 0 ? 1 : 0;
        }
        assertTrue(negative >= 3, negative + " negative parallaxes");
    }

    /** The chance that a right ladder misses its truth by more than 3.5 sigma in one of these is below 0.3 %. */
    @Test
    void theLadderFindsTheTruthOfTheScenario() {
        SkerryPoint skerry = new SkerryPoint();
        Solution solution = skerry.ladder().solve();
        within(Scenario.HUBBLE, solution.of(skerry.flow.hubbleConstant()));
        within(Scenario.ZERO_POINT, solution.of(skerry.pulsators.zeroPoint()));
        within(Scenario.SLOPE, solution.of(skerry.pulsators.slope()));
        within(Scenario.PARALLAX_OFFSET, solution.of(skerry.offset));
        within(Scenario.CAMERA, solution.of(skerry.camera));
        within(Scenario.EXPLOSION, solution.of(skerry.explosions.zeroPoint()));
    }

    private static void within(double truth, Estimate estimate) {
        assertEquals(truth, estimate.value(), 3.5 * estimate.sigma(), estimate.toString());
    }
}
