package distanceladder.validation;

import static distanceladder.relation.Amount.magnitudes;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Amount;
import distanceladder.relation.Derived;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import distanceladder.rung.Parallaxes;
import distanceladder.rung.PeriodLuminosity;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * 70 Cepheids of the Large Magellanic Cloud (Riess et al. 2019, ApJ 876, 85, Table 2: Wesenheit magnitude m_H = F160W -
 * 0.386 (F555W - F814W)) on top of the 65 Milky Way stars of {@link
 * MilkyWay2021Test}.
 *
 * <p>The ladder's own modulus of the cloud against the geometric one of Pietrzynski et al. 2019, 49.59 +- 0.09 +- 0.54 kpc,
 * as a pull of the difference. Nothing is tuned. The table's
 * magnitudes m_H hold its geometric corrections of single stars already. The metallicity of the cloud's stars is that of none of the tables; [Fe/H]
 * -0.33 is common practice, from memory, and enters with the coefficient -0.17 +- 0.06 (error from memory too).
 */
@Tag("validation")
class LargeCloud2019Test {
    /** Star, log10 P, m_H, error, geometric correction (mag). */
    private static final PublishedTable TABLE = PublishedTable.of("""
            OGL0434   1.482  10.966  0.021  0.028
            OGL0501   1.367  11.406  0.023  0.034
            OGL0510   1.566  10.787  0.045  0.027
            OGL0512   1.595  10.598  0.020  0.033
            OGL0528   1.553  10.824  0.029  0.038
            OGL0545   1.199  11.895  0.025  0.034
            OGL0590   1.502  10.895  0.039  0.025
            OGL0594   0.828  13.171  0.030  0.025
            OGL0648   1.134  12.308  0.029  0.025
            OGL0683   1.166  12.056  0.021  0.031
            OGL0712   1.316  11.552  0.040  0.016
            OGL0716   1.085  12.541  0.024  0.016
            OGL0727   1.161  12.004  0.034  0.023
            OGL0757   0.924  13.010  0.024  0.021
            OGL0770   1.035  12.566  0.030  0.013
            OGL0787   1.243  11.884  0.042  0.018
            OGL0798   1.029  12.550  0.021  0.015
            OGL0800   1.101  12.359  0.044  0.012
            OGL0812   1.086  12.369  0.025  0.015
            OGL0819   1.348  11.560  0.030  0.013
            OGL0821   1.411  11.314  0.025  0.014
            OGL0831   0.987  12.625  0.024  0.012
            OGL0844   1.235  11.791  0.035  0.014
            OGL0847   1.314  11.904  0.031  0.013
            OGL0848   1.203  12.107  0.028  0.010
            OGL0888   0.971  12.796  0.022  0.009
            OGL0915   0.868  13.027  0.022  0.010
            OGL0936   0.920  12.917  0.024  0.007
            OGL0949   1.111  12.317  0.019  0.007
            OGL0966   1.676  10.483  0.025  0.024
            OGL0969   1.104  12.347  0.029  0.007
            OGL0970   1.242  11.850  0.032  0.006
            OGL0975   1.101  12.382  0.024  0.006
            OGL0978   1.022  12.529  0.022  0.007
            OGL0986   1.492  11.053  0.045  0.009
            OGL0992   1.723  10.067  0.073  0.009
            OGL1001   1.160  12.119  0.024  0.002
            OGL1031   1.266  11.873  0.022  0.013
            OGL1058   1.482  11.060  0.022  0.006
            OGL1080   1.270  11.706  0.026  0.005
            OGL1109   1.074  12.410  0.053  0.005
            OGL1112   0.899  12.853  0.054 -0.000
            OGL1313   0.834  13.222  0.027  0.008
            OGL1374   0.838  13.240  0.031  0.005
            OGL1389   0.862  13.088  0.020  0.004
            OGL1411   0.897  13.102  0.026  0.009
            OGL1417   0.938  12.803  0.031  0.007
            OGL1424   0.830  13.310  0.031  0.003
            OGL1431   1.010  12.669  0.027  0.007
            OGL1463   0.876  13.007  0.025  0.003
            OGL1466   0.789  13.368  0.032  0.004
            OGL1490   0.912  12.872  0.024  0.003
            OGL1526   0.828  13.169  0.026  0.003
            OGL1539   1.130  12.306  0.021  0.002
            OGL1578   1.123  12.248  0.024  0.005
            OGL1587   1.334  11.491  0.034  0.003
            OGL1616   1.191  12.198  0.034 -0.001
            OGL1637   1.504  10.928  0.036 -0.003
            OGL1641   1.144  12.111  0.027 -0.003
            OGL1647   0.939  12.846  0.030  0.002
            OGL1677   1.372  11.463  0.022 -0.004
            OGL1862   1.118  12.357  0.028 -0.001
            OGL1939   0.782  13.356  0.031  0.002
            OGL1940   0.972  12.917  0.028  0.001
            OGL1941   0.832  13.193  0.030  0.003
            OGL1945   0.885  13.123  0.025  0.001
            OGL1994   0.889  12.939  0.022 -0.002
            OGL2012   0.872  13.000  0.025 -0.000
            OGL2019   1.448  11.325  0.027  0.002
            OGL2043   0.867  13.167  0.039  0.000
            """);

    private static final double METALS = -0.33;

    private static Observations cloud() {
        int n = TABLE.size();
        double[] metals = new double[n];
        Arrays.fill(metals, METALS);
        return Observations.of("Table 2", TABLE.names(0))
                .bearingOn(Collections.nCopies(n, "cloud"))
                .with("log period", Unit.LOG_DAY, TABLE.numbers(1))
                .with("magnitude", Unit.MAGNITUDE, TABLE.numbers(2))
                .with("magnitude error", Unit.MAGNITUDE, TABLE.numbers(3))
                .with("metallicity", Unit.DEX, metals);
    }

    /** Slope and zero point of the 70 stars alone, unweighted: 12.664571734396, -3.331285357473 (NumPy 1.24.2). */
    @Test
    void lineThroughTheCloud() {
        Own line = Own.of(
                        "line",
                        cloud().bearingOn(Collections.nCopies(TABLE.size(), "")),
                        "magnitude",
                        (mu, s) -> s.parameter("a").add(s.parameter("b").multiply(s.column("log period") - 1)))
                .withParameter("a", Source.free("a", Unit.MAGNITUDE))
                .withParameter("b", Source.free("b", Unit.MAGNITUDE_PER_DEX))
                .withEqualUnknownErrors();
        Solution solution = Ladder.of(line).solve();
        assertEquals(12.664571734395698, solution.of(line.parameter("a")).value(), 1e-10);
        assertEquals(-3.3312853574726002, solution.of(line.parameter("b")).value(), 1e-10);
        assertEquals(0.011551313697164674, solution.of(line.parameter("a")).sigma(), 1e-10);
        assertEquals(0.04184631211375691, solution.of(line.parameter("b")).sigma(), 1e-10);
        assertEquals(0.08480566412533319, solution.scatter(line).value(), 1e-9);
    }

    @Test
    void modulusOfTheCloud() {
        Source zeroPoint = Source.free("zero point", Unit.MAGNITUDE);
        Source slope = Source.free("slope", Unit.MAGNITUDE_PER_DEX);
        Source metals = Source.normal("metallicity coefficient", new Amount(-0.17, 0.06, Unit.MAGNITUDE_PER_DEX));
        Observations stars = MilkyWay2021Test.unflagged();
        Parallaxes parallaxes =
                Parallaxes.of("parallaxes", stars).withOffset(Source.free("parallax offset", Unit.MICROARCSECOND));
        PeriodLuminosity nearby = PeriodLuminosity.of("nearby", stars)
                .withZeroPoint(zeroPoint)
                .withSlope(slope)
                .withMetallicity(metals)
                .withScatter(magnitudes(0.06))
                .calibratedBy(parallaxes);
        PeriodLuminosity cloud = PeriodLuminosity.of("cloud", cloud())
                .withZeroPoint(zeroPoint)
                .withSlope(slope)
                .withMetallicity(metals)
                .withScatter(magnitudes(0.06))
                .calibratedBy(nearby);
        Solution own = Ladder.of(cloud).solve();
        Estimate modulus = own.of(cloud.distance("cloud"));
        double geometric = 5 * StrictMath.log10(0.04959) + 25;
        assertEquals(18.47697054145555, geometric, 1e-12);
        double error = StrictMath.hypot(0.00394096626046508, 0.02364579756279048);
        double pull = (modulus.value() - geometric) / StrictMath.hypot(modulus.sigma(), error);
        System.out.println("modulus of the cloud from Milky Way parallaxes " + modulus
                + "; geometric 18.477 +- 0.024; pull of the difference " + pull);
        // Regression: what comes out, not tuned.
        assertEquals(18.5584, modulus.value(), 5e-4);
        assertTrue(Math.abs(pull) < 3, "pull " + pull);
        // The same pull from one solution that holds both: the anchor's residual against all the rest.
        Anchor anchor = Anchor.of("cloud", Amount.of(49.59, Unit.KILOPARSEC).plusMinus(0.09))
                .withSystematic(Amount.of(0.54, Unit.KILOPARSEC));
        Solution both = Ladder.of(cloud.calibratedBy(nearby, anchor)).solve();
        double chi = both.chiSquare().total().value() - own.chiSquare().total().value();
        assertEquals(pull * pull, chi, 0.1 * pull * pull + 0.02, "one more degree of freedom");
        Derived distance = cloud.distance("cloud").inMegaparsecs();
        assertTrue(both.of(distance).sigma() < 0.00055);
        assertEquals(List.of("cloud"), List.copyOf(new java.util.TreeSet<>(cloud().objects())));
    }
}
