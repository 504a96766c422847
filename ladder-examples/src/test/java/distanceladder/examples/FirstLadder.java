package distanceladder.examples;

import static distanceladder.relation.Amount.magnitudes;
import static distanceladder.relation.Amount.milliarcseconds;
import static distanceladder.relation.Amount.modulus;

import distanceladder.astro.Unit;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Equated;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import distanceladder.rung.SecondaryIndicator;
import distanceladder.rung.VelocityDistance;
import java.util.ArrayList;
import java.util.List;

/** The code of the README, compiled and run; what stands between the markers is compared with it. */
final class FirstLadder {
    private FirstLadder() {}

    /** What the first ladder shows. */
    static List<Object> show() {
        List<Object> shown = new ArrayList<>();
        // begin first ladder
        var offset = Source.normal("parallax offset", milliarcseconds(-0.017).plusMinus(0.005));
        var stars = Observations.of("stars", "Tarn A", "Tarn B", "Tarn C", "Tarn D")
                .with("parallax", Unit.MILLIARCSECOND, 0.98, 0.41, 0.66, -0.02)
                .with("parallax error", Unit.MILLIARCSECOND, 0.02, 0.02, 0.03, 0.15)
                .with("magnitude", Unit.MAGNITUDE, 4.06, 5.11, 4.95, 7.62)
                .with("magnitude error", Unit.MAGNITUDE, 0.05, 0.05, 0.05, 0.05)
                .with("log period", Unit.LOG_DAY, 1.01, 1.22, 0.98, 0.85);
        var hosts = Observations.of("hosts", "a1", "a2", "b1", "b2", "c1")
                .bearingOn("Ashmere", "Ashmere", "Brindle", "Brindle", "Anvil")
                .with("magnitude", Unit.MAGNITUDE, 24.4, 24.7, 24.9, 25.3, 22.6)
                .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1, 0.1, 0.1, 0.1)
                .with("log period", Unit.LOG_DAY, 1.30, 1.22, 1.28, 1.15, 1.31);
        var events = Observations.of("events", "e1", "e2", "e3", "e4")
                .bearingOn("Ashmere", "Brindle", "Fell 1", "Fell 2")
                .with("magnitude", Unit.MAGNITUDE, 12.1, 12.5, 16.0, 16.9)
                .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1, 0.1, 0.1);
        var galaxies = Observations.of("galaxies", "Fell 1", "Fell 2")
                .with("velocity", Unit.KILOMETRE_PER_SECOND, 8100, 12000)
                .with("velocity error", Unit.KILOMETRE_PER_SECOND, 250, 250);

        var zeroPoint = Source.free("pulsator zero point", Unit.MAGNITUDE);
        var slope = Source.normal("pulsator slope", magnitudes(-3.3).plusMinus(0.05));
        var parallaxes = Parallaxes.of("parallaxes", stars).withOffset(offset);
        var nearby = PeriodLuminosity.of("nearby pulsators", stars)
                .withZeroPoint(zeroPoint)
                .withSlope(slope)
                .calibratedBy(parallaxes);
        var anchor = Anchor.of("Anvil", modulus(29.40).plusMinus(0.03));
        var pulsators = PeriodLuminosity.of("pulsators", hosts)
                .withZeroPoint(zeroPoint)
                .withSlope(slope)
                .calibratedBy(nearby, anchor);
        var explosions = SecondaryIndicator.of("explosions", events).calibratedBy(pulsators);
        var flow = VelocityDistance.of("flow", galaxies).calibratedBy(explosions);

        Solution solution = Ladder.of(flow).solve(); // what the flow rests on comes along
        var h0 = flow.hubbleConstant(); // a typed handle, not a string
        shown.add(solution.of(h0));
        shown.add(solution.below(pulsators).distances(pulsators)); // from below: without explosions and flow
        shown.add(solution.budget(h0));
        Solution revised = solution.with(offset.at(milliarcseconds(-0.030)));
        shown.add(revised.against(solution));
        // end first ladder
        return shown;
    }

    /** What the relation of one's own shows. */
    static List<Object> showOwn() {
        List<Object> shown = new ArrayList<>();
        // begin own relation
        var table = Observations.of("clusters", "K1", "K2", "K3", "K4")
                .bearingOn("Anvil", "Anvil", "Ashmere", "Ashmere")
                .with("magnitude", Unit.MAGNITUDE, 20.4, 21.1, 22.3, 23.1)
                .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1, 0.1, 0.1)
                .with("log width", Unit.DEX, 1.1, 1.0, 1.1, 0.97)
                .with("log width error", Unit.DEX, 0.01, 0.01, 0.01, 0.01);
        var clusters = Own.of(
                        "clusters",
                        table,
                        "magnitude",
                        Equated.of((mu, s) -> mu.add(s.parameter("zero point"))
                                        .add(s.parameter("slope")
                                                .multiply(
                                                        s.uncertain("log width").subtract(1))))
                                .withUncertain("log width"))
                .withParameter("zero point", Source.free("cluster zero point", Unit.MAGNITUDE))
                .withParameter("slope", Source.free("cluster slope", Unit.MAGNITUDE_PER_DEX))
                .calibratedBy(Anchor.of("Anvil", modulus(29.40).plusMinus(0.03)));
        shown.add(Ladder.of(clusters).solve().of(clusters.distance("Ashmere")));
        // end own relation
        return shown;
    }
}
