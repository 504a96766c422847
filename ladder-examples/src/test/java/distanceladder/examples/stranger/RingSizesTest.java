package distanceladder.examples.stranger;

import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.astro.Unit;
import distanceladder.contract.RungContract;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Observations;
import distanceladder.rung.Anchor;
import org.junit.jupiter.api.Test;

/** The stranger's rung inherits all tests of the contract, and stands in a ladder like any other. */
class RingSizesTest implements RungContract<RingSizes> {
    @Override
    public RingSizes rung() {
        return RingSizes.of(
                        "rings",
                        Observations.of("rings", "r1", "r2", "r3", "r4", "r5")
                                .bearingOn("Anvil", "Anvil", "Beacon", "Ashmere", "Ashmere")
                                .with("log size", Unit.DEX, 1.44, 1.46, 1.60, 1.12, 1.10)
                                .with("log size error", Unit.DEX, 0.02, 0.02, 0.02, 0.02, 0.02))
                .calibratedBy(
                        Anchor.of("Anvil", Amount.modulus(29.38).plusMinus(0.03)),
                        Anchor.of("Beacon", Amount.modulus(28.71).plusMinus(0.04)));
    }

    /** Two rings of a known distance tell the true size, and the others' distance: by hand. */
    @Test
    void distanceFromARing() {
        RingSizes rings = rung();
        Solution solution = Ladder.of(rings).solve();
        assertEquals(31.07, solution.of(rings.distance("Ashmere")).value(), 0.1);
        double one = 5 * 0.02;
        double byAnvil = one * one / 2 + 0.03 * 0.03;
        double byBeacon = one * one + 0.04 * 0.04;
        double size = 1 / (1 / byAnvil + 1 / byBeacon);
        assertEquals(
                Math.sqrt(one * one / 2 + size),
                solution.of(rings.distance("Ashmere")).sigma(),
                1e-12);
    }
}
