package distanceladder.validation;

import static distanceladder.relation.Amount.kilometresPerSecond;
import static distanceladder.relation.Amount.magnitudes;
import static distanceladder.relation.Amount.megaparsecs;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Unit;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Distance;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.SecondaryIndicator;
import distanceladder.rung.VelocityDistance;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * What everyone in the trade expects of velocity and distance (common practice, no source): 14,000 km/s is 200 Mpc for
 * 70 km/s/Mpc, the line has no intercept, what approaches has no distance from its velocity. Without expansion terms,
 * v = H0 d.
 */
@Tag("validation")
class CommonPracticeTest {
    private static final double VELOCITY_ERROR = 300;

    private static VelocityDistance flow(List<String> galaxies, double... velocities) {
        double[] errors = new double[velocities.length];
        Arrays.fill(errors, VELOCITY_ERROR);
        return VelocityDistance.of(
                        "flow",
                        Observations.of("invented galaxies", galaxies)
                                .with("velocity", Unit.KILOMETRE_PER_SECOND, velocities)
                                .with("velocity error", Unit.KILOMETRE_PER_SECOND, errors))
                .withoutExpansionTerms();
    }

    private static Source logHubble(double hubble) {
        return Source.exact("5 log H0", magnitudes(5 * StrictMath.log10(hubble)));
    }

    private static Solution atSeventy(List<String> galaxies, double... velocities) {
        return Ladder.of(flow(galaxies, velocities).withLogHubbleConstant(logHubble(70)))
                .solve();
    }

    private static Estimate megaparsec(Solution solution, String galaxy) {
        return solution.of(new Distance(galaxy).inMegaparsecs());
    }

    /** H0 from galaxies at given distances (Mpc, known to 1e-9) with given velocities (km/s). */
    private static Solution fitted(double[] distances, double[] velocities) {
        List<String> galaxies = new ArrayList<>();
        List<Anchor> anchors = new ArrayList<>();
        for (int i = 0; i < distances.length; i++) {
            galaxies.add("galaxy " + i);
            anchors.add(Anchor.of("galaxy " + i, megaparsecs(distances[i]).plusMinus(1e-9 * distances[i])));
        }
        return Ladder.of(flow(galaxies, velocities).calibratedBy(anchors.toArray(Anchor[]::new)))
                .solve();
    }

    private static double hubble(Solution solution) {
        return solution.of(
                        solution.ladder().rung("flow", VelocityDistance.class).hubbleConstant())
                .value();
    }

    @Test
    void fourteenThousandIsTwoHundredMegaparsecs() {
        Solution solution = atSeventy(List.of("far", "near"), 14000, 350);
        assertEquals(200, megaparsec(solution, "far").value(), 1e-9);
        assertEquals(5, megaparsec(solution, "near").value(), 1e-9);
        assertEquals(70, hubble(solution), 1e-12);
    }

    @Test
    void twoHundredMegaparsecsAtFourteenThousandIsSeventy() {
        assertEquals(70, hubble(fitted(new double[] {200}, new double[] {14000})), 1e-9);
        assertEquals(70, hubble(fitted(new double[] {5, 200}, new double[] {350, 14000})), 1e-6);
    }

    @Test
    void magnitudesAgreeWithVelocities() {
        VelocityDistance flow = flow(List.of("far"), 14000).inMagnitudes().withLogHubbleConstant(logHubble(70));
        Estimate far = megaparsec(Ladder.of(flow).solve(), "far");
        assertEquals(200, far.value(), 1e-9);
        assertEquals(VELOCITY_ERROR / 70, far.sigma(), 1e-9);
    }

    /** Least squares through the origin, equal velocity errors: H0 = sum v d / sum d^2. */
    @Test
    void theLineHasNoIntercept() {
        double[] distances = {10, 20, 60};
        double[] shifted = {800, 1500, 4300};
        double throughOrigin = (10 * 800 + 20 * 1500 + 60 * 4300) / (10. * 10 + 20 * 20 + 60 * 60);
        Solution solution = fitted(distances, shifted);
        assertEquals(throughOrigin, hubble(solution), 1e-6, "70 with an intercept of 100 km/s");
        assertEquals(2, solution.chiSquare().total().degreesOfFreedom(), "one parameter for three galaxies");
        double sigma = VELOCITY_ERROR / Math.sqrt(10 * 10 + 20 * 20 + 60 * 60);
        assertEquals(
                sigma,
                solution.of(solution.ladder()
                                .rung("flow", VelocityDistance.class)
                                .hubbleConstant())
                        .sigma(),
                1e-6 * sigma);
    }

    @Test
    void scalingAllDistancesScalesTheHubbleConstant() {
        double[] velocities = {800, 1350, 4300};
        double one = hubble(fitted(new double[] {10, 20, 60}, velocities));
        double twice = hubble(fitted(new double[] {20, 40, 120}, velocities));
        assertEquals(one / 2, twice, 1e-8);
    }

    @Test
    void distanceIsProportionalToVelocityDownToZero() {
        for (double velocity : new double[] {7000, 7, 7e-3, 7e-6}) {
            VelocityDistance flow = VelocityDistance.of(
                            "flow",
                            Observations.of("invented galaxies", "a")
                                    .with("velocity", Unit.KILOMETRE_PER_SECOND, velocity)
                                    .with("velocity error", Unit.KILOMETRE_PER_SECOND, 0.1 * velocity))
                    .withoutExpansionTerms()
                    .withLogHubbleConstant(logHubble(70));
            Estimate distance = megaparsec(Ladder.of(flow).solve(), "a");
            assertEquals(velocity / 70, distance.value(), 1e-10 * velocity / 70);
        }
    }

    @Test
    void whatApproachesHasNoDistanceFromItsVelocity() {
        Solution solution = atSeventy(List.of("far", "neighbour", "still"), 14000, -241, 0);
        Optional<String> reason = solution.refusal("neighbour");
        assertTrue(reason.orElse("").contains("approaches us at 241"), reason.toString());
        assertTrue(solution.refusal("still").isPresent());
        assertTrue(solution.refusal("far").isEmpty());
        ValueFault fault = assertThrows(ValueFault.class, () -> megaparsec(solution, "neighbour"));
        assertTrue(fault.getMessage().contains("approaches"), fault.getMessage());
        assertEquals(200, megaparsec(solution, "far").value(), 1e-9, "and the others keep theirs");
    }

    @Test
    void whatApproachesKeepsADistanceFromBeneathAndCounts() {
        Solution solution = fitted(new double[] {1, 20}, new double[] {-241, 1500});
        assertEquals(1, megaparsec(solution, "galaxy 0").value(), 1e-6);
        assertEquals((1 * -241 + 20 * 1500) / (1. + 20 * 20), hubble(solution), 1e-6);
    }

    /** Velocities have constant errors, magnitudes constant relative errors of the distance. */
    @Test
    void errorsOfDistanceGrowWithDistanceFromMagnitudesAndNotFromVelocities() {
        Solution byVelocity = atSeventy(List.of("far", "near"), 14000, 1400);
        assertEquals(VELOCITY_ERROR / 70, megaparsec(byVelocity, "far").sigma(), 1e-9);
        assertEquals(VELOCITY_ERROR / 70, megaparsec(byVelocity, "near").sigma(), 1e-9);
        SecondaryIndicator candles = SecondaryIndicator.of(
                        "candles",
                        Observations.of("invented candles", "far", "near")
                                .with("magnitude", Unit.MAGNITUDE, 17, 12)
                                .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1))
                .withZeroPoint(Source.exact("zero point", magnitudes(-19.5)));
        Solution byMagnitude = Ladder.of(candles).solve();
        double ratio = megaparsec(byMagnitude, "far").sigma()
                / megaparsec(byMagnitude, "near").sigma();
        assertEquals(10, ratio, 1e-9, "5 mag are a factor of 10");
    }

    @Test
    void peculiarVelocitiesAddToTheErrors() {
        VelocityDistance flow = flow(List.of("far"), 14000)
                .withPeculiarVelocity(kilometresPerSecond(400))
                .withLogHubbleConstant(logHubble(70));
        assertEquals(500. / 70, megaparsec(Ladder.of(flow).solve(), "far").sigma(), 1e-9);
    }

    @Test
    void theErrorOfTheHubbleConstantIsCommonToAllDistances() {
        Source prior = Source.normal("5 log H0", new Amount(5 * StrictMath.log10(70), 0.1, Unit.MAGNITUDE));
        Solution solution = Ladder.of(flow(List.of("one", "two"), 14000, 7000).withLogHubbleConstant(prior))
                .solve();
        assertEquals(0.01, solution.covariance(new Distance("one"), new Distance("two")), 1e-14);
    }

    /** 1 / (70 km/s/Mpc) with pc = 648000/pi au and Julian years, computed with astropy 5.2. */
    @Test
    void hubbleTimeIsCloseToFourteenBillionYears() {
        assertEquals(13.968460309726, Cosmography.hubbleTime(70), 1e-12);
        assertEquals(14, Cosmography.hubbleTime(70), 0.05);
    }
}
