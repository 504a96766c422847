package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.chance.Distribution;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Road;
import distanceladder.ladder.Sampled;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Derived;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Draws against JCGM 101:2008, clause 9, and against closed forms. */
@Tag("validation")
class MonteCarloTest {
    private static final int DRAWS = 200_000;

    /** A ladder that does nothing but hold sources. */
    private static Solution holding(List<Source> sources) {
        Own carrier = Own.of(
                        "carrier",
                        Observations.of("carrier", "datum")
                                .bearingOn("")
                                .with("y", Unit.NONE, 1)
                                .with("y error", Unit.NONE, 1),
                        "y",
                        (mu, s) -> s.parameter("free"))
                .withParameter("free", Source.free("free", Unit.NONE));
        for (Source source : sources) {
            carrier = carrier.withParameter(source.name(), source);
        }
        return Ladder.of(carrier).solve();
    }

    private static Sampled.Summary sum(double... halfWidths) {
        List<Source> sources = new java.util.ArrayList<>();
        for (int i = 0; i < halfWidths.length; i++) {
            sources.add(Source.of("x" + i, new Distribution.Uniform(-halfWidths[i], halfWidths[i]), Unit.NONE));
        }
        Derived y = Derived.of(
                "y",
                Unit.NONE,
                sources,
                in -> in.get(0).add(in.get(1)).add(in.get(2)).add(in.get(3)));
        return holding(sources).draw(Road.GAINS, 1, DRAWS, y).summaries().get(0);
    }

    /** Four equal rectangular inputs (JCGM 101:2008, 9.2.3): u = 2; 95 % half-width 3.8794 exactly, 3.92 if normal. */
    @Test
    void fourRectangularInputs() {
        Sampled.Summary y = sum(Math.sqrt(3), Math.sqrt(3), Math.sqrt(3), Math.sqrt(3));
        assertEquals(2, y.analytic().sigma(), 1e-12);
        // Monte Carlo errors: of sigma 0.003, of the interval's ends 0.011; four of them, false alarm 1e-4.
        assertEquals(2, y.sigma(), 0.012);
        assertEquals(3.8794, y.interval(0.95).upper(), 0.045);
        assertEquals(-3.8794, y.interval(0.95).lower(), 0.045);
        assertEquals(3.92, y.analytic().interval(0.95).upper(), 0.001);
    }

    /** One input ten times the others (9.2.4): u = 10.149; 95 % half-width 17.0158 by exact convolution, 19.9 if normal. */
    @Test
    void oneLargeRectangularInput() {
        Sampled.Summary y = sum(Math.sqrt(3), Math.sqrt(3), Math.sqrt(3), 10 * Math.sqrt(3));
        assertEquals(10.14889156509222, y.analytic().sigma(), 1e-10);
        assertEquals(10.149, y.sigma(), 0.05);
        assertEquals(17.0158, y.interval(0.95).upper(), 0.1);
        assertEquals(19.891461950583093, y.analytic().interval(0.95).upper(), 1e-9);
        assertFalse(y.agrees(0.95, 2), "a normal interval is not good to two digits here");
    }

    /** Mass calibration (9.3): sd 0.0754798 exactly, first order 0.0539; shortest 95 % interval [1.0844, 1.3835]. */
    @Test
    void massCalibration() {
        Source mass = Source.normal("m_Rc", new Amount(100000, 0.05, Unit.NONE));
        Source correction = Source.normal("dm_Rc", new Amount(1.234, 0.02, Unit.NONE));
        Source air = Source.of("rho_a", new Distribution.Uniform(1.1, 1.3), Unit.NONE);
        Source weight = Source.of("rho_W", new Distribution.Uniform(7000, 9000), Unit.NONE);
        Source reference = Source.of("rho_R", new Distribution.Uniform(7950, 8050), Unit.NONE);
        List<Source> sources = List.of(mass, correction, air, weight, reference);
        Derived y = Derived.of(
                "dm",
                Unit.NONE,
                sources,
                in -> in.get(0)
                        .add(in.get(1).multiply(1e-3).multiply(1000))
                        .multiply(in.get(2)
                                .subtract(1.2)
                                .multiply(in.get(3).power(-1).subtract(in.get(4).power(-1)))
                                .add(1))
                        .subtract(100000));
        Sampled.Summary s =
                holding(sources).draw(Road.GAINS, 4, DRAWS, y).summaries().get(0);
        assertEquals(0.05385164807134505, s.analytic().sigma(), 1e-6);
        assertEquals(0.07547973995542308, s.sigma(), 0.0006);
        assertEquals(1.234, s.mean(), 0.0008);
        assertEquals(1.0844, s.shortest(0.95).lower(), 0.004);
        assertEquals(1.3835, s.shortest(0.95).upper(), 0.004);
        assertFalse(s.agrees(0.95, 1), "first order is not good to one digit");
    }

    private static PeriodLuminosity pulsators(Parallaxes parallaxes) {
        Observations stars = Observations.of("stars", "s1", "s2", "s3", "s4", "s5")
                .with("magnitude", Unit.MAGNITUDE, 5.1, 6.4, 4.2, 6.0, 7.4)
                .with("magnitude error", Unit.MAGNITUDE, 0.05, 0.05, 0.05, 0.05, 0.05)
                .with("log period", Unit.LOG_DAY, 1.1, 0.8, 1.3, 0.9, 0.7);
        return PeriodLuminosity.of("pulsators", stars).calibratedBy(parallaxes);
    }

    private static Parallaxes parallaxes(double relative) {
        double[] p = {0.59, 0.44, 0.66, 0.47, 0.30};
        double[] e = new double[p.length];
        for (int i = 0; i < e.length; i++) {
            e[i] = relative * p[i];
        }
        return Parallaxes.of(
                "parallaxes",
                Observations.of("stars", "s1", "s2", "s3", "s4", "s5")
                        .with("parallax", Unit.MILLIARCSECOND, p)
                        .with("parallax error", Unit.MILLIARCSECOND, e));
    }

    /** As errors vanish the draws become normal with the analytic standard deviation. */
    @Test
    void smallErrorsGiveTheAnalyticAnswer() {
        PeriodLuminosity rung = pulsators(parallaxes(0.01));
        Solution solution = Ladder.of(rung).solve();
        Sampled drawn = solution.draw(7, 2000, rung.zeroPoint());
        assertEquals(Road.RELINEARISED, drawn.road());
        Sampled.Summary s = drawn.summaries().get(0);
        assertEquals(s.analytic().sigma(), s.sigma(), 4 * s.sigma() / Math.sqrt(4000));
        assertEquals(s.analytic().value(), s.mean(), 4 * s.errorOfMean());
    }

    /** In a linear ladder draws by gains and draws solved anew are the same numbers. */
    @Test
    void gainsAndNewSolutionsAgreeDrawByDraw() {
        Source camera = Source.of("camera", new Distribution.Uniform(-0.05, 0.05), Unit.MAGNITUDE);
        Anchor anchor = Anchor.of("s1", Amount.modulus(11.2).plusMinus(0.03));
        PeriodLuminosity rung = pulsators(parallaxes(0.1)).withCommonOffset(camera);
        rung = rung.like(rung.definition().restingOn(List.of()))
                .calibratedBy(
                        anchor,
                        Anchor.of("s2", Amount.modulus(11.8).plusMinus(0.04)),
                        Anchor.of("s3", Amount.modulus(10.9).plusMinus(0.02)));
        Solution solution = Ladder.of(rung).solve();
        Sampled gains = solution.draw(3, 300, rung.zeroPoint(), rung.distance("s5"));
        Sampled solved = solution.draw(Road.RELINEARISED, 3, 300, rung.zeroPoint(), rung.distance("s5"));
        assertEquals(Road.GAINS, gains.road());
        for (int v = 0; v < 2; v++) {
            for (double p : new double[] {0.01, 0.2, 0.5, 0.7, 0.99}) {
                assertEquals(
                        solved.summaries().get(v).quantile(p),
                        gains.summaries().get(v).quantile(p),
                        1e-9);
            }
        }
    }

    /** A distance of a lognormal modulus: mean and sigma in closed form. */
    @Test
    void lognormalDistance() {
        Anchor anchor = Anchor.of("far", Amount.modulus(30).plusMinus(0.5));
        Solution solution = Ladder.of(anchor).solve();
        Derived distance = anchor.distance("far").inMegaparsecs();
        Sampled.Summary s =
                solution.draw(Road.GAINS, 11, DRAWS, distance).summaries().get(0);
        double tau = 0.5 * StrictMath.log(10) / 5;
        double mean = 10 * StrictMath.exp(tau * tau / 2);
        double sigma = mean * Math.sqrt(StrictMath.exp(tau * tau) - 1);
        assertEquals(mean, s.mean(), 4 * s.errorOfMean());
        assertEquals(sigma, s.sigma(), 0.01 * sigma);
        assertTrue(s.mean() > s.analytic().value());
    }

    /** The same draws in any order of threads: a run is a function of its seed. */
    @Test
    void sameSeedSameDraws() {
        PeriodLuminosity rung = pulsators(parallaxes(0.2));
        Solution solution = Ladder.of(rung).solve();
        double first =
                solution.draw(5, 200, rung.zeroPoint()).summaries().get(0).mean();
        double second =
                solution.draw(5, 200, rung.zeroPoint()).summaries().get(0).mean();
        assertEquals(first, second, 0);
        assertTrue(first
                != solution.draw(6, 200, rung.zeroPoint()).summaries().get(0).mean());
    }
}
