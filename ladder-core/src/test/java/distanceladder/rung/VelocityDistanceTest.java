package distanceladder.rung;

import static distanceladder.relation.Amount.kilometresPerSecond;
import static distanceladder.relation.Amount.magnitudes;
import static distanceladder.relation.Amount.megaparsecs;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.covariance.Dense;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.JointNoise;
import distanceladder.relation.Linearised;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Points;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.text.NameFault;
import distanceladder.text.ValueFault;
import java.util.List;
import org.junit.jupiter.api.Test;

class VelocityDistanceTest {
    private static final double LIGHT = 299792.458;
    private static final double[] VELOCITY = {3000, 12000, 30000};
    private static final Observations GALAXIES = Observations.of("galaxies", "a", "b", "c")
            .with("velocity", Unit.KILOMETRE_PER_SECOND, VELOCITY)
            .with("velocity error", Unit.KILOMETRE_PER_SECOND, 30, 40, 50);
    private static final SourceGroup GROUP = SourceGroup.of("published", Unit.MAGNITUDE, List.of("eta"), 9.2);

    private final VelocityDistance flow = VelocityDistance.of("flow", GALAXIES);

    /** Visser 2004, equation 45, flat, written from memory. */
    private static double f(double v, double q0, double j0) {
        double z = v / LIGHT;
        return 1 + (1 - q0) * z / 2 - (1 - q0 - 3 * q0 * q0 + j0) * z * z / 6;
    }

    private static Slopes.Prediction velocity(double q0, double j0) {
        return (i, mu, s) ->
                Slopes.tenTo((s.applyAsDouble("log Hubble constant") + mu - 25) / 5) / f(VELOCITY[i], q0, j0);
    }

    @Test
    void rowsAreTheEquations() {
        Slopes.agree(flow, 34, velocity(-0.55, 1));
        Slopes.agree(flow.withExpansion(0.5, 0.9), 34, velocity(0.5, 0.9));
        Slopes.agree(
                flow.withoutExpansionTerms(),
                34,
                (i, mu, s) -> Slopes.tenTo((s.applyAsDouble("log Hubble constant") + mu - 25) / 5));
        assertTrue(Slopes.curved(flow));
    }

    @Test
    void theMagnitudeFormIsLinear() {
        VelocityDistance far = flow.inMagnitudes();
        Slopes.agree(far, 34, (i, mu, s) -> mu + s.applyAsDouble("log Hubble constant"));
        assertFalse(Slopes.curved(far));
        double[] y = far.definition().data().column(far.definition().observable());
        for (int i = 0; i < y.length; i++) {
            assertEquals(5 * StrictMath.log10(VELOCITY[i] * f(VELOCITY[i], -0.55, 1)) + 25, y[i], 1e-12);
            double sigma = 5 / StrictMath.log(10) * new double[] {30, 40, 50}[i] / VELOCITY[i];
            assertEquals(sigma, Math.sqrt(far.definition().noise().covariance().entry(i, i)), 1e-14);
        }
    }

    @Test
    void offsetsFromTheObjectAreAdded() {
        double[] apart = {0.01, 0, -0.3};
        VelocityDistance members = VelocityDistance.of("flow", GALAXIES.with("offset", Unit.MAGNITUDE, apart));
        Slopes.agree(members, 34, (i, mu, s) -> velocity(-0.55, 1).of(i, mu + apart[i], s));
        Slopes.agree(members.inMagnitudes(), 34, (i, mu, s) -> mu + apart[i] + s.applyAsDouble("log Hubble constant"));
    }

    @Test
    void formsHaveTheSameRowsWhereTheyMeet() {
        double eta = 5 * StrictMath.log10(71);
        double[] moduli = new double[3];
        for (int i = 0; i < 3; i++) {
            moduli[i] = 5 * StrictMath.log10(VELOCITY[i] * f(VELOCITY[i], -0.55, 1)) + 25 - eta;
        }
        Points at = Points.of(moduli, new double[] {eta});
        Definition near = flow.definition();
        Definition far = flow.inMagnitudes().definition();
        Linearised inVelocity = near.relation().linearise(near, at);
        Linearised inMagnitudes = far.relation().linearise(far, at);
        for (int i = 0; i < 3; i++) {
            double a = Math.sqrt(near.noise().covariance().entry(i, i));
            double b = Math.sqrt(far.noise().covariance().entry(i, i));
            assertEquals(inMagnitudes.coefficients()[i] / b, inVelocity.coefficients()[i] / a, 1e-9 / b);
            assertEquals(inMagnitudes.rows()[i][0] / b, inVelocity.rows()[i][0] / a, 1e-9 / b);
            assertEquals(inMagnitudes.rows()[i][1] / b, inVelocity.rows()[i][1] / a, 1e-9 / b);
        }
    }

    /**
     * The forms differ in second order: for relative errors e and residuals of about one sigma, by a part of about e of a
     * sigma. So a tenth of the errors makes a tenth of the difference.
     */
    @Test
    void formsAgreeWhereErrorsAreSmall() {
        double coarse = differenceInSigmas(1e-4);
        double fine = differenceInSigmas(1e-5);
        assertTrue(coarse < 1e-4, () -> "coarse " + coarse);
        assertEquals(0.1, fine / coarse, 0.002);
    }

    private static double differenceInSigmas(double relative) {
        double[] sigmas = new double[3];
        Anchor[] anchors = new Anchor[3];
        double[] residual = {1.1, -0.7, 0.4};
        for (int i = 0; i < 3; i++) {
            sigmas[i] = relative * VELOCITY[i];
            double distance = VELOCITY[i] * f(VELOCITY[i], -0.55, 1) / 71 * (1 + relative * residual[i]);
            anchors[i] =
                    Anchor.of(GALAXIES.names().get(i), megaparsecs(distance).plusMinus(relative * distance));
        }
        VelocityDistance near = VelocityDistance.of(
                        "flow", GALAXIES.with("velocity error", Unit.KILOMETRE_PER_SECOND, sigmas))
                .calibratedBy(anchors);
        VelocityDistance far = near.inMagnitudes();
        Estimate one = Ladder.of(near).solve().of(near.hubbleConstant());
        Estimate other = Ladder.of(far).solve().of(far.hubbleConstant());
        assertEquals(1, one.sigma() / other.sigma(), relative * 0.01);
        return Math.abs(one.value() - other.value()) / one.sigma();
    }

    @Test
    void redshiftsAreVelocities() {
        Observations z = Observations.of("galaxies", "a", "b", "c")
                .with("redshift", Unit.REDSHIFT, 3000 / LIGHT, 12000 / LIGHT, 30000 / LIGHT)
                .with("redshift error", Unit.REDSHIFT, 30 / LIGHT, 40 / LIGHT, 50 / LIGHT);
        Definition d = VelocityDistance.of("flow", z).definition();
        assertEquals(12000, d.data().column("velocity")[1], 1e-10);
        assertEquals(1600, d.noise().covariance().entry(1, 1), 1e-9);
        Slopes.agree(VelocityDistance.of("flow", z), 34, velocity(-0.55, 1));
    }

    @Test
    void optionsMayComeInAnyOrder() {
        VelocityDistance one = flow.withPeculiarVelocity(kilometresPerSecond(300))
                .inMagnitudes()
                .withExpansion(-0.5, 0.8);
        VelocityDistance other = flow.withExpansion(-0.5, 0.8)
                .inMagnitudes()
                .withLogHubbleConstant(GROUP.member("eta"))
                .withPeculiarVelocity(kilometresPerSecond(900))
                .withPeculiarVelocity(kilometresPerSecond(300));
        assertEquals(
                one.definition().noise().covariance(),
                other.definition().noise().covariance());
        assertEquals(
                5 / StrictMath.log(10) * Math.sqrt(30 * 30 + 300 * 300) / 3000,
                Math.sqrt(one.definition().noise().covariance().entry(0, 0)),
                1e-14);
        for (int i = 0; i < 3; i++) {
            assertEquals(
                    one.definition().data().column("expansion modulus")[i],
                    other.definition().data().column("expansion modulus")[i]);
        }
    }

    @Test
    void optionsKeepScatterNoiseAndRungsBeneath() {
        VelocityDistance kept = flow.withEstimatedScatter()
                .calibratedBy(Anchor.of("a", magnitudes(33).plusMinus(0.1)))
                .withCalibrators("a")
                .withPeculiarVelocity(kilometresPerSecond(300))
                .withoutExpansionTerms()
                .inMagnitudes()
                .withLogHubbleConstant(Source.free("eta", Unit.MAGNITUDE));
        assertEquals(Noise.Scatter.ESTIMATED, kept.definition().noise().mode());
        assertEquals(List.of("a"), kept.definition().calibrators());
        assertEquals(1, kept.definition().restsOn().size());
        assertEquals(
                50,
                flow.withScatter(kilometresPerSecond(50))
                        .withExpansion(0, 1)
                        .withPeculiarVelocity(kilometresPerSecond(10))
                        .definition()
                        .noise()
                        .scatter());
        Noise dense = Noise.of(Dense.fromCovariance(new double[][] {{9, 1, 0}, {1, 9, 0}, {0, 0, 9}}));
        assertSame(dense, flow.withNoise(dense).withExpansion(0, 1).definition().noise());
        assertEquals(
                Noise.Scatter.EXACT,
                flow.withoutErrors().inMagnitudes().definition().noise().mode());
        assertEquals(
                2,
                flow.without("b")
                        .withPeculiarVelocity(kilometresPerSecond(100))
                        .definition()
                        .noise()
                        .covariance()
                        .size());
    }

    @Test
    void jointNoiseIsKept() {
        JointNoise joint = JointNoise.named("survey")
                .on("flow", List.of("a", "b"))
                .with(Dense.fromCovariance(new double[][] {{4, 1}, {1, 4}}));
        VelocityDistance kept = flow.withJointNoise(joint).withPeculiarVelocity(kilometresPerSecond(100));
        assertSame(joint, kept.definition().noise().joint().orElseThrow());
        assertThrows(ValueFault.class, () -> flow.withJointNoise(joint).inMagnitudes());
    }

    @Test
    void noiseThatCannotFollowIsRefused() {
        Noise dense = Noise.of(Dense.fromCovariance(new double[][] {{9, 1, 0}, {1, 9, 0}, {0, 0, 9}}));
        ValueFault scatter = assertThrows(
                ValueFault.class,
                () -> flow.withScatter(kilometresPerSecond(50)).inMagnitudes());
        assertTrue(scatter.repair().contains("inMagnitudes first"), scatter.getMessage());
        assertThrows(ValueFault.class, () -> flow.withNoise(dense).inMagnitudes());
        assertThrows(ValueFault.class, () -> flow.withNoise(dense).withPeculiarVelocity(kilometresPerSecond(1)));
        assertThrows(ValueFault.class, () -> flow.withoutErrors().withPeculiarVelocity(kilometresPerSecond(1)));
        assertEquals(
                0.1,
                flow.inMagnitudes()
                        .withScatter(magnitudes(0.1))
                        .definition()
                        .noise()
                        .scatter());
    }

    @Test
    void whatApproachesHasNoDistance() {
        VelocityDistance local = VelocityDistance.of(
                "local",
                Observations.of("galaxies", "neighbour", "other")
                        .with("velocity", Unit.KILOMETRE_PER_SECOND, -220, 500)
                        .with("velocity error", Unit.KILOMETRE_PER_SECOND, 20, 20));
        Definition d = local.definition();
        Points at = d.relation().start(d);
        assertEquals(5 * StrictMath.log10(20.0 / 70) + 25, at.modulus(0), 1e-12);
        assertEquals(9.225490200071284, at.parameter(0), 1e-12); // 5 log10 70
        Points unknown = d.relation().start(local.withEqualUnknownErrors().definition());
        assertEquals(5 * StrictMath.log10(10.0 / 70) + 25, unknown.modulus(0), 1e-12); // at 10 km/s
        assertTrue(d.relation().refusal(d, 1, at).isEmpty());
        String reason = d.relation().refusal(d, 0, at).orElseThrow();
        assertTrue(reason.contains("approaches us at 220.0 km/s"), reason);
        ValueFault fault = assertThrows(ValueFault.class, local::inMagnitudes);
        assertTrue(fault.where().contains("neighbour"), fault.getMessage());
    }

    @Test
    void theHubbleConstantIsDerivedFromItsLogarithm() {
        double[] gradient = flow.hubbleConstant().gradient(new double[] {5 * StrictMath.log10(70)});
        assertEquals(70, gradient[0], 1e-12);
        assertEquals(70 * StrictMath.log(10) / 5, gradient[1], 1e-12);
        assertEquals(List.of(flow.logHubbleConstant()), flow.hubbleConstant().inputs());
        assertEquals("flow 5 log H0", flow.logHubbleConstant().name());
        VelocityDistance shared = flow.withLogHubbleConstant(GROUP.member("eta"));
        assertEquals("published: eta", shared.hubbleConstant().inputs().get(0).name());
        assertEquals(1, shared.inMagnitudes().definition().highlights().size());
    }

    @Test
    void flowsAddToVelocities() {
        double[] ra = {10, 130, 250};
        double[] dec = {-40, 5, 60};
        VelocityDistance moving = VelocityDistance.of(
                        "flow",
                        GALAXIES.with("right ascension", Unit.DEGREE, ra).with("declination", Unit.DEGREE, dec))
                .withEstimatedScatter()
                .withBulkMotion(velocitySource("x"), velocitySource("y"), velocitySource("z"))
                .withIntercept(velocitySource("all"));
        assertEquals(Noise.Scatter.ESTIMATED, moving.definition().noise().mode());
        Slopes.agree(moving, 34, (i, mu, s) -> velocity(-0.55, 1).of(i, mu, s) + motion(ra[i], dec[i], s));
        VelocityDistance far = moving.inMagnitudes();
        Slopes.agree(
                far,
                34,
                (i, mu, s) -> mu
                        + s.applyAsDouble("log Hubble constant")
                        + 5 / StrictMath.log(10) * motion(ra[i], dec[i], s) / VELOCITY[i]);
        assertFalse(Slopes.curved(far));
        assertThrows(ValueFault.class, () -> flow.withIntercept(Source.free("m", Unit.MAGNITUDE)));
    }

    private static Source velocitySource(String name) {
        return Source.normal(name, kilometresPerSecond(0).plusMinus(100));
    }

    private static double motion(double ra, double dec, java.util.function.ToDoubleFunction<String> s) {
        double a = StrictMath.toRadians(ra);
        double d = StrictMath.toRadians(dec);
        return s.applyAsDouble("intercept")
                + s.applyAsDouble("motion x") * StrictMath.cos(d) * StrictMath.cos(a)
                + s.applyAsDouble("motion y") * StrictMath.cos(d) * StrictMath.sin(a)
                + s.applyAsDouble("motion z") * StrictMath.sin(d);
    }

    @Test
    void theExpansionMayBeUncertain() {
        Source q0 = Source.normal("q0", new Amount(-0.5, 0.1, Unit.NONE));
        Source j0 = Source.normal("j0", new Amount(1, 0.3, Unit.NONE));
        VelocityDistance varied = flow.withExpansion(q0, j0);
        Slopes.agree(
                varied,
                34,
                (i, mu, s) -> velocity(s.applyAsDouble("deceleration parameter"), s.applyAsDouble("jerk parameter"))
                        .of(i, mu, s));
        Slopes.agree(
                varied.inMagnitudes(),
                34,
                (i, mu, s) -> mu
                        + s.applyAsDouble("log Hubble constant")
                        - 5
                                * StrictMath.log10(f(
                                                VELOCITY[i],
                                                s.applyAsDouble("deceleration parameter"),
                                                s.applyAsDouble("jerk parameter"))
                                        / f(VELOCITY[i], -0.5, 1)));
        assertTrue(Slopes.curved(varied.inMagnitudes()));
        assertEquals(
                List.of("log Hubble constant"),
                List.copyOf(
                        varied.withoutExpansionTerms().definition().parameters().keySet()));
        assertThrows(ValueFault.class, () -> flow.withExpansion(q0, Source.free("j", Unit.MAGNITUDE)));
    }

    @Test
    void whatDoesNotFitIsRefused() {
        assertThrows(ValueFault.class, () -> VelocityDistance.of("flow", GALAXIES.with("offset", Unit.DEX, 0, 0, 0)));
        assertThrows(NameFault.class, () -> VelocityDistance.of("flow", GALAXIES.renamed("velocity error", "error")));
        assertThrows(NameFault.class, () -> VelocityDistance.of("flow", GALAXIES.renamed("velocity", "cz")));
        assertThrows(
                ValueFault.class, () -> VelocityDistance.of("flow", GALAXIES.with("velocity", Unit.REDSHIFT, 1, 1, 1)));
        assertThrows(
                ValueFault.class,
                () -> VelocityDistance.of("flow", GALAXIES.with("velocity error", Unit.KILOMETRE_PER_SECOND, 1, 0, 1)));
        assertThrows(ValueFault.class, () -> flow.withPeculiarVelocity(kilometresPerSecond(-1)));
        assertThrows(ValueFault.class, () -> flow.withPeculiarVelocity(magnitudes(1)));
        assertThrows(
                ValueFault.class,
                () -> flow.withLogHubbleConstant(Source.free("H0", Unit.KILOMETRE_PER_SECOND_PER_MEGAPARSEC)));
        ValueFault far = assertThrows(
                ValueFault.class,
                () -> VelocityDistance.of(
                        "flow", GALAXIES.with("velocity", Unit.KILOMETRE_PER_SECOND, 1000, 2000, 5 * LIGHT)));
        assertTrue(far.where().contains("\"c\""), far.getMessage());
        assertThrows(ValueFault.class, () -> flow.withExpansion(Double.NaN, 1));
    }
}
