package distanceladder.contract;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.relation.Tabulated;
import distanceladder.rung.Anchor;
import distanceladder.rung.Given;
import distanceladder.rung.Own;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import distanceladder.rung.SecondaryIndicator;
import distanceladder.rung.VelocityDistance;
import java.util.Map;
import org.junit.jupiter.api.Nested;

/** Every family keeps to the contract, in its plain form and with its options. */
class FamiliesContractTest {
    private static final String[] NAMES = {"s1", "s2", "s3", "s4", "s5", "s6"};

    private static Observations table() {
        return Observations.of("table", NAMES)
                .with("parallax", Unit.MILLIARCSECOND, 0.95, 0.52, 0.71, 0.33, 0.42, 0.6)
                .with("parallax error", Unit.MILLIARCSECOND, 0.02, 0.02, 0.03, 0.02, 0.02, 0.03)
                .with("magnitude", Unit.MAGNITUDE, 4.1, 5.5, 4.9, 6.4, 5.9, 5.1)
                .with("magnitude error", Unit.MAGNITUDE, 0.05, 0.06, 0.05, 0.05, 0.07, 0.05)
                .with("log period", Unit.LOG_DAY, 1.0, 0.95, 0.9, 0.85, 1.1, 1.2)
                .with("metallicity", Unit.DEX, 0.1, -0.2, 0.05, 0.2, -0.1, 0)
                .with("colour", Unit.MAGNITUDE, 0.1, -0.05, 0.02, 0.2, -0.1, 0.07)
                .with("colour error", Unit.MAGNITUDE, 0.02, 0.02, 0.03, 0.02, 0.02, 0.02)
                .with("velocity", Unit.KILOMETRE_PER_SECOND, 3100, 5200, 4100, 8000, 9100, 6000)
                .with("velocity error", Unit.KILOMETRE_PER_SECOND, 150, 150, 150, 200, 150, 150)
                .with("right ascension", Unit.DEGREE, 10, 80, 130, 200, 290, 340)
                .with("declination", Unit.DEGREE, -60, 20, 45, -10, 70, 5)
                .with("overtone", Unit.NONE, 0, 1, 0, 0, 1, 0)
                .with("latitude", Unit.DEGREE, 5, -30, 40, 10, -60, 20);
    }

    private static Anchor[] anchors(double from, double step) {
        Anchor[] out = new Anchor[NAMES.length];
        for (int i = 0; i < out.length; i++) {
            out[i] = Anchor.of(NAMES[i], Amount.modulus(from + step * i).plusMinus(0.05));
        }
        return out;
    }

    @Nested
    class ParallaxesTest implements RungContract<Parallaxes> {
        @Override
        public Parallaxes rung() {
            return Parallaxes.of("parallaxes", table())
                    .withOffset(Source.normal(
                            "offset", Amount.milliarcseconds(-0.02).plusMinus(0.01)))
                    .withOffsetTerm(
                            "latitude",
                            Source.normal(
                                    "by latitude", Amount.milliarcseconds(0).plusMinus(0.001)));
        }
    }

    @Nested
    class PeriodLuminosityTest implements RungContract<PeriodLuminosity> {
        @Override
        public PeriodLuminosity rung() {
            return PeriodLuminosity.of("pulsators", table())
                    .withMetallicity(
                            Source.normal("metals", Amount.magnitudes(-0.2).plusMinus(0.1)))
                    .withBreak(1.0, Source.normal("break", Amount.magnitudes(0).plusMinus(0.2)))
                    .withOvertones(
                            "overtone",
                            Source.normal("overtones", Amount.magnitudes(-0.4).plusMinus(0.1)))
                    .withColour(
                            "colour",
                            Source.normal("ratio", Amount.of(-0.4, Unit.NONE).plusMinus(0.05)))
                    .withCommonOffset(
                            Source.normal("camera", Amount.magnitudes(0).plusMinus(0.02)))
                    .calibratedBy(anchors(10, 0.3));
        }
    }

    @Nested
    class SecondaryIndicatorTest implements RungContract<SecondaryIndicator> {
        @Override
        public SecondaryIndicator rung() {
            return SecondaryIndicator.of("candles", table())
                    .withCovariate("log period")
                    .withUncertainCovariate(
                            "colour",
                            Source.normal("colour law", Amount.magnitudes(3).plusMinus(0.5)))
                    .calibratedBy(anchors(10, 0.3));
        }
    }

    @Nested
    class VelocitiesTest implements RungContract<VelocityDistance> {
        @Override
        public VelocityDistance rung() {
            return VelocityDistance.of("flow", table())
                    .withExpansion(
                            Source.normal("q0", Amount.of(-0.55, Unit.NONE).plusMinus(0.1)),
                            Source.exact("j0", Amount.of(1, Unit.NONE)))
                    .withBulkMotion(motion("x"), motion("y"), motion("z"))
                    .calibratedBy(anchors(33.2, 0.25));
        }

        private Source motion(String axis) {
            return Source.normal("motion " + axis, Amount.kilometresPerSecond(0).plusMinus(100));
        }
    }

    @Nested
    class FarFlowTest implements RungContract<VelocityDistance> {
        @Override
        public VelocityDistance rung() {
            return VelocityDistance.of("flow", table())
                    .inMagnitudes()
                    .withPeculiarVelocity(Amount.kilometresPerSecond(200))
                    .calibratedBy(anchors(33.2, 0.25));
        }
    }

    @Nested
    class GivenTest implements RungContract<Given> {
        @Override
        public Given rung() {
            Observations data =
                    Observations.of("published", NAMES).with("value", Unit.MAGNITUDE, 20, 20.4, 1, 20.3, 0.4, 20.9);
            Tabulated design = Tabulated.of(6)
                    .object("s1", 1, 0, -1, 1, 0, 0)
                    .object("s2", 0, 1, 1, 0, 0, 1)
                    .parameter("M", 1, 1, 0, 1, 1, 1)
                    .parameter("b", 0.1, 0.3, 0, 0.4, 0.2, -0.4);
            return Given.of(
                            "published",
                            data,
                            design,
                            Map.of(
                                    "M", Source.free("M", Unit.MAGNITUDE),
                                    "b", Source.normal("b", Amount.magnitudes(1).plusMinus(0.3))),
                            Noise.of(0.1, 0.1, 0.1, 0.1, 0.1, 0.1))
                    .calibratedBy(anchors(30, 0.4));
        }
    }

    @Nested
    class OwnTest implements RungContract<Own> {
        @Override
        public Own rung() {
            return Own.of(
                            "own",
                            table(),
                            "magnitude",
                            Equated.of((mu, s) -> mu.add(s.parameter("a"))
                                            .add(s.parameter("b")
                                                    .multiply(s.uncertain("colour")
                                                            .add(1)
                                                            .power(1.5)))
                                            .add(s.parameter("b")
                                                    .multiply(s.column("log period"))
                                                    .sin()))
                                    .withUncertain("colour"))
                    .withParameter("a", Source.free("a", Unit.MAGNITUDE).starting(-6))
                    .withParameter(
                            "b", Source.normal("b", Amount.magnitudes(0.4).plusMinus(0.1)))
                    .calibratedBy(anchors(10, 0.3));
        }
    }
}
