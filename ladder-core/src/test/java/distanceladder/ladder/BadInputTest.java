package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.covariance.Dense;
import distanceladder.covariance.Diagonal;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Distance;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import distanceladder.rung.SecondaryIndicator;
import distanceladder.rung.VelocityDistance;
import distanceladder.text.ConvergenceFault;
import distanceladder.text.Fault;
import distanceladder.text.GraphFault;
import distanceladder.text.NameFault;
import distanceladder.text.RankFault;
import distanceladder.text.ValueFault;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

/** Bad input gets a refusal that names the culprit, the rule, the place and the repair. */
class BadInputTest {
    private static <F extends Fault> F refused(Class<F> kind, Executable what, String... words) {
        F fault = assertThrows(kind, what);
        assertTrue(
                !fault.what().isBlank()
                        && !fault.rule().isBlank()
                        && !fault.repair().isBlank(),
                fault.getMessage());
        for (String word : words) {
            assertTrue(fault.getMessage().contains(word), "\"" + word + "\" in: " + fault.getMessage());
        }
        return fault;
    }

    private static Observations stars() {
        return Observations.of("stars.csv", "A", "B", "C")
                .with("magnitude", Unit.MAGNITUDE, 10, 11, 12)
                .with("magnitude error", Unit.MAGNITUDE, 0.1, 0.1, 0.1)
                .with("log period", Unit.LOG_DAY, 1, 1.2, 0.9);
    }

    private static Anchor anchor(String object) {
        return Anchor.of(object, Amount.modulus(15).plusMinus(0.05));
    }

    private static PeriodLuminosity pulsators() {
        return PeriodLuminosity.of("pulsators", stars());
    }

    @Test
    void numbersOfATable() {
        refused(
                ValueFault.class,
                () -> stars().with("x", Unit.MAGNITUDE, 1, Double.NaN, 2),
                "NaN mag",
                "stars.csv",
                "B");
        refused(
                ValueFault.class,
                () -> stars().with("x", Unit.MAGNITUDE, 1, 2, Double.POSITIVE_INFINITY),
                "Infinity",
                "C");
        refused(ValueFault.class, () -> stars().with("x", Unit.MAGNITUDE, 1, 2), "2 numbers", "give 3");
        for (double sigma : new double[] {0, -0.1}) {
            Observations bad = stars().with("magnitude error", Unit.MAGNITUDE, 0.1, sigma, 0.1);
            refused(ValueFault.class, () -> PeriodLuminosity.of("p", bad), "magnitude error = ", "mag", "\"B\"");
        }
        refused(
                ValueFault.class,
                () -> PeriodLuminosity.of("p", stars().with("magnitude", Unit.KILOMETRE_PER_SECOND, 1, 2, 3)),
                "km/s",
                "mag");
        refused(NameFault.class, () -> PeriodLuminosity.of("p", stars().renamed("magnitude", "magnitud")), "magnitud");
    }

    @Test
    void namesOfData() {
        refused(NameFault.class, () -> Observations.of("t", "A", "B", "A"), "\"A\" stands twice");
        refused(NameFault.class, () -> Observations.of("t", "A", " "), "without a name");
        refused(ValueFault.class, () -> Observations.of("t", List.of()), "0 data");
        refused(GraphFault.class, () -> pulsators().without("A", "B", "C"), "0 data left");
        refused(NameFault.class, () -> pulsators().without("AA"), "nearest known: \"A\"");
        refused(NameFault.class, () -> pulsators().withoutObjects("D"), "\"D\"");
        refused(ValueFault.class, () -> stars().bearingOn("A"), "1 objects");
    }

    @Test
    void amountsAndUnits() {
        refused(ValueFault.class, () -> Amount.modulus(Double.NaN), "NaN mag");
        refused(ValueFault.class, () -> Amount.modulus(3).plusMinus(-1), "-1.0 mag");
        refused(ValueFault.class, () -> Amount.modulus(3).in(Unit.MEGAPARSEC), "mag", "Mpc");
        refused(NameFault.class, () -> Unit.of("parsec"), "unit \"parsec\"");
        refused(ValueFault.class, () -> Source.exact("s", Amount.modulus(1).plusMinus(1)), "exact");
        refused(ValueFault.class, () -> Anchor.of("x", Amount.modulus(30)), "above zero");
        refused(
                ValueFault.class,
                () -> Anchor.of("x", Amount.kilometresPerSecond(30).plusMinus(1)),
                "km/s");
        refused(ValueFault.class, () -> Noise.of(0.1, 0.1).withScatter(-1), "-1.0");
    }

    @Test
    void covariances() {
        refused(ValueFault.class, () -> Dense.fromCovariance(new double[][] {{1, 0.5}, {0.4, 1}}));
        refused(ValueFault.class, () -> Dense.fromCovariance(new double[][] {{1, 2}, {2, 1}}));
        refused(ValueFault.class, () -> Diagonal.fromStandardDeviations(1, -1));
        refused(ValueFault.class, () -> pulsators().withNoise(Noise.of(0.1, 0.1)), "noise of 2 data", "give 3");
        refused(
                ValueFault.class,
                () -> SourceGroup.of("g", Unit.MAGNITUDE, List.of("a", "b"), 0, 0)
                        .withCovariance(Diagonal.fromVariances(1)),
                "1 rows");
        refused(NameFault.class, () -> SourceGroup.of("g", Unit.MAGNITUDE, List.of("a", "a"), 0, 0), "distinct");
        SourceGroup group = SourceGroup.of("g", Unit.MAGNITUDE, List.of("one", "two"), 0, 0);
        refused(NameFault.class, () -> group.member("tow"), "\"two\"");
        Own bare = own("bare", "A").withNoise(Noise.of(Diagonal.fromVariances(0)));
        refused(ValueFault.class, () -> Ladder.of(bare).solve(), "standard deviation 0", "bare");
        Own dense = own("dense", "A", "B").withNoise(Noise.of(Dense.fromCovariance(new double[][] {{1, 1}, {1, 1}})));
        refused(
                ValueFault.class,
                () -> Ladder.of(dense.calibratedBy(anchor("A"), anchor("B"))).solve(),
                "positive definite",
                "dense block 1");
    }

    private static Own own(String name, String... data) {
        double[] m = new double[data.length];
        double[] e = new double[data.length];
        java.util.Arrays.fill(m, 20);
        java.util.Arrays.fill(e, 0.1);
        return Own.of(
                        name,
                        Observations.of(name, data)
                                .with("magnitude", Unit.MAGNITUDE, m)
                                .with("magnitude error", Unit.MAGNITUDE, e),
                        "magnitude",
                        (mu, s) -> mu.add(s.parameter("zero point")))
                .withParameter("zero point", Source.free(name + " zero point", Unit.MAGNITUDE));
    }

    @Test
    void twoThingsOfOneName() {
        Own low = own("rung", "A");
        Own other = own("rung", "B");
        refused(NameFault.class, () -> Ladder.of(low, other), "two different rungs are called \"rung\"");
        Own one = own("one", "A")
                .withParameter(
                        "zero point", Source.normal("z", Amount.magnitudes(1).plusMinus(1)));
        Own two = own("two", "A")
                .withParameter(
                        "zero point", Source.normal("z", Amount.magnitudes(2).plusMinus(1)));
        refused(NameFault.class, () -> Ladder.of(one, two), "\"z\"", "hand the same source to both");
        Own clash = own("three", "A").withParameter("zero point", Source.free("distance of A", Unit.MAGNITUDE));
        refused(NameFault.class, () -> Ladder.of(clash), "distance of A");
        refused(NameFault.class, () -> low.calibratedBy(anchor("A"), anchor("A")), "stands twice");
    }

    @Test
    void calibrators() {
        refused(
                GraphFault.class,
                () -> Ladder.of(pulsators().withCalibrators("B").calibratedBy(anchor("BB"), anchor("C"))),
                "calibrator \"B\"",
                "\"BB\"",
                "pulsators");
        refused(NameFault.class, () -> pulsators().withCalibrators("Z"), "\"Z\"");
        refused(
                GraphFault.class,
                () -> Ladder.of(pulsators().calibratedBy(anchor("Anvil"))),
                "none of the 3 objects",
                "\"Anvil\"");
    }

    @Test
    void cycleIsPrinted() {
        Own a = own("a", "A", "B").calibratedBy(anchor("A"));
        Own b = own("b", "B", "C").calibratedBy(a);
        Solution solution = Ladder.of(b).solve();
        Rung<?> turned = a.calibratedBy(anchor("A"), b);
        refused(GraphFault.class, () -> solution.with(turned), "cycle: a -> b -> a");
        refused(GraphFault.class, () -> Ladder.of(), "no rung");
    }

    @Test
    void whatTheDataCannotSeparate() {
        RankFault fault = refused(RankFault.class, () -> Ladder.of(pulsators()).solve(), "pulsators", "anchor");
        assertTrue(
                fault.parameters().contains("pulsators zero point"),
                fault.parameters().toString());
        Own double_ = Own.of(
                        "double",
                        stars(),
                        "magnitude",
                        (mu, s) -> mu.add(s.parameter("p")).add(s.parameter("q")))
                .withParameter("p", Source.free("p", Unit.MAGNITUDE))
                .withParameter("q", Source.free("q", Unit.MAGNITUDE));
        RankFault both = refused(
                RankFault.class,
                () -> Ladder.of(double_.calibratedBy(anchor("A"), anchor("B"))).solve());
        assertEquals(List.of("p", "q"), both.parameters());
        assertTrue(both.where().contains("solution over"), both.where());
    }

    @Test
    void iterationThatDoesNotConverge() {
        Own wild = Own.of(
                        "wild",
                        Observations.of("wild", "d")
                                .bearingOn("")
                                .with("y", Unit.NONE, 2)
                                .with("y error", Unit.NONE, 1e-9),
                        "y",
                        (mu, s) -> s.parameter("x").square().add(2.5))
                .withParameter("x", Source.free("x", Unit.NONE).starting(1));
        refused(
                ConvergenceFault.class,
                () -> Ladder.of(wild).solve(),
                "x still moves by",
                "of its error",
                "solution over whole");
    }

    @Test
    void relationsAndColumns() {
        Own role = Own.of("r", stars(), "magnitude", (mu, s) -> mu.add(s.parameter("zeropoint")))
                .withParameter("zero point", Source.free("z", Unit.MAGNITUDE));
        refused(NameFault.class, () -> Ladder.of(role).solve(), "zeropoint", "zero point", "rung \"r\"");
        Own column = Own.of("r", stars(), "magnitude", (mu, s) -> mu.add(s.column("log_period")));
        refused(NameFault.class, () -> Ladder.of(column).solve(), "log_period", "log period");
        Own uncertain = Own.of("r", stars(), "magnitude", (mu, s) -> mu.add(s.uncertain("log period")));
        refused(NameFault.class, () -> Ladder.of(uncertain).solve(), "withUncertain");
        Own infinite = Own.of("r", stars(), "magnitude", (mu, s) -> mu.divide(0));
        refused(ValueFault.class, () -> Ladder.of(infinite).solve(), "not a finite number", "\"A\"");
        refused(NameFault.class, () -> SecondaryIndicator.of("s", stars()).withCovariate("colour"), "colour");
        refused(NameFault.class, () -> pulsators().metallicityCoefficient(), "metallicity coefficient");
        Observations flow = Observations.of("flow", "near", "far")
                .with("velocity", Unit.KILOMETRE_PER_SECOND, -120, 3000)
                .with("velocity error", Unit.KILOMETRE_PER_SECOND, 10, 10);
        refused(ValueFault.class, () -> VelocityDistance.of("flow", flow).inMagnitudes(), "-120.0 km/s", "near");
        refused(
                ValueFault.class,
                () -> PeriodLuminosity.of(
                        "p",
                        Observations.of("t", "A")
                                .with("magnitude", Unit.MAGNITUDE, 1)
                                .with("magnitude error", Unit.MAGNITUDE, 1)
                                .with("period", Unit.DAY, 0)),
                "period = 0.0 d");
        refused(
                ValueFault.class,
                () -> Parallaxes.of(
                                "p",
                                Observations.of("t", "A")
                                        .with("parallax", Unit.MILLIARCSECOND, 1)
                                        .with("parallax error", Unit.MILLIARCSECOND, 0.1))
                        .withErrorInflation(0),
                "0.0");
    }

    @Test
    void questionsToASolution() {
        PeriodLuminosity rung = pulsators().calibratedBy(anchor("A"), anchor("B"));
        Solution solution = Ladder.of(rung).solve();
        refused(NameFault.class, () -> solution.of(Source.free("pulsators slop", Unit.NONE)), "pulsators slope");
        refused(NameFault.class, () -> solution.of(new Distance("D")), "object \"D\"");
        refused(NameFault.class, () -> solution.over("pulsator"), "pulsators");
        refused(NameFault.class, () -> solution.without("flow"), "flow");
        refused(NameFault.class, () -> solution.with(Source.free("unknown", Unit.NONE)), "unknown");
        refused(NameFault.class, () -> solution.ladder().rung("pulsators", Anchor.class), "PeriodLuminosity");
        refused(NameFault.class, () -> solution.over("A anchor").residuals(rung), "pulsators");
        refused(ValueFault.class, () -> solution.draw(1, 10, rung.slope()), "10 draws");
        refused(ValueFault.class, () -> rung.withoutErrors().withScatter(Amount.magnitudes(0.1)), "exact data");
        Definition d = rung.definition();
        refused(NameFault.class, () -> d.value("slop"), "\"slope\"");
    }

    @Test
    void objectsWithoutADistance() {
        Parallaxes parallaxes = Parallaxes.of(
                "parallaxes",
                Observations.of("t", "good", "bad")
                        .with("parallax", Unit.MILLIARCSECOND, 1, -0.3)
                        .with("parallax error", Unit.MILLIARCSECOND, 0.02, 0.05));
        Solution solution = Ladder.of(parallaxes).solve();
        assertTrue(solution.refusal("bad").orElse("").contains("-0.300 mas"));
        assertTrue(solution.refusal("good").isEmpty());
        refused(ValueFault.class, () -> solution.of(new Distance("bad")), "\"bad\"", "-0.300 mas");
    }
}
