package distanceladder.validation;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Equated;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.rung.Own;
import distanceladder.rung.VelocityDistance;
import java.util.Arrays;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Unweighted velocity-distance fits: distances declared exact, velocities with equal unknown errors, f = 1.
 *
 * <p>Values recomputed from the published tables with NumPy 1.24.2; they agree with the published ones. Positions are rounded
 * to 1e-4 degrees here, which is 1e-6 of a sigma.
 */
@Tag("validation")
class UnweightedFlowsTest {
    /** Hubble 1929 (PNAS 15, 168), Table 1: nebula, distance (Mpc), velocity (km/s); positions J2000 (deg). */
    private static final PublishedTable NEBULAE = PublishedTable.of("""
            S.Mag.   0.032    170   13.1583  -72.8003
            L.Mag.   0.034    290   80.8942  -69.7561
            N6822    0.214   -130  296.2342  -14.7976
            N598     0.263    -70   23.4621   30.6599
            N221     0.275   -185   10.6743   40.8652
            N224     0.275   -220   10.6847   41.2687
            N5457     0.45    200  210.8024   54.3488
            N4736      0.5    290  192.7215   41.1202
            N5194      0.5    270  202.4696   47.1953
            N4449     0.63    200  187.0463   44.0936
            N4214      0.8    300  183.9132   36.3269
            N3031      0.9    -30  148.8882   69.0653
            N3627      0.9    650  170.0626   12.9913
            N4826      0.9    150  194.1821   21.6827
            N5236      0.9    500  204.2538  -29.8658
            N1068        1    920   40.6699   -0.0133
            N5055      1.1    450  198.9553   42.0294
            N7331      1.1    500  339.2671   34.4159
            N4258      1.4    500  184.7401   47.3037
            N4151      1.7    960  182.6357   39.4058
            N4382        2    500  186.3502   18.1911
            N4472        2    850  187.4450    8.0004
            N4486        2    800  187.7059   12.3911
            N4649        2   1090  190.9167   11.5526
            """);

    /** Freedman et al. 2001 (ApJ 553, 47), Tables 4 and 5: galaxy, distance (Mpc), velocity (km/s). */
    private static final PublishedTable GALAXIES = PublishedTable.of("""
            NGC0300        2    133
            NGC0925     9.16    664
            NGC1326A   16.14   1794
            NGC1365    17.95   1594
            NGC1425    21.88   1473
            NGC2403     3.22    278
            NGC2541    11.22    714
            NGC2090    11.75    882
            NGC3031     3.63     80
            NGC3198     13.8    772
            NGC3351       10    642
            NGC3368    10.52    768
            NGC3621     6.64    609
            NGC4321    15.21   1433
            NGC4414     17.7    619
            NGC4496A   14.86   1424
            NGC4548    16.22   1384
            NGC4535    15.78   1444
            NGC4536    14.93   1423
            NGC4639    21.98   1403
            NGC4725    12.36   1103
            IC4182      4.49    318
            NGC5253     3.15    232
            NGC7331    14.72    999
            """);

    private static Own distances(PublishedTable table) {
        double[] ones = new double[table.size()];
        Arrays.fill(ones, 1);
        Observations data = Observations.of("distances", table.names(0))
                .with("distance", Unit.MEGAPARSEC, table.numbers(1))
                .with("distance error", Unit.MEGAPARSEC, ones);
        Equated relation = Equated.of((mu, s) -> mu.subtract(25).divide(5).tenTo())
                .startingAt(d -> 25 + 5 * StrictMath.log10(d.observed()));
        return Own.of("distances", data, "distance", relation).withoutErrors();
    }

    private static VelocityDistance flow(PublishedTable table) {
        double[] ones = new double[table.size()];
        Arrays.fill(ones, 100);
        Observations data = Observations.of("velocities", table.names(0))
                .with("velocity", Unit.KILOMETRE_PER_SECOND, table.numbers(2))
                .with("velocity error", Unit.KILOMETRE_PER_SECOND, ones);
        if (table == NEBULAE) {
            data = data.with("right ascension", Unit.DEGREE, table.numbers(3))
                    .with("declination", Unit.DEGREE, table.numbers(4));
        }
        return VelocityDistance.of("flow", data).withoutExpansionTerms();
    }

    private static Source velocity(String name) {
        return Source.free(name, Unit.KILOMETRE_PER_SECOND);
    }

    private static Solution solve(VelocityDistance flow, PublishedTable table) {
        return Ladder.of(flow.withEqualUnknownErrors().calibratedBy(distances(table)))
                .solve();
    }

    private static void check(double value, double sigma, Estimate estimate) {
        assertEquals(value, estimate.value(), 1e-5 * sigma, estimate.name());
        assertEquals(sigma, estimate.sigma(), 1e-6 * sigma, estimate.name());
    }

    @Test
    void nebulaeThroughTheOrigin() {
        VelocityDistance flow = flow(NEBULAE);
        Solution solution = solve(flow, NEBULAE);
        Estimate h0 = solution.of(flow.hubbleConstant());
        check(423.9373232316302, 42.154143047617346, h0);
        assertEquals(23, h0.degreesOfFreedom(), 1e-9);
        assertEquals(229.02464628743652, solution.scatter(flow).value(), 1e-5);
    }

    @Test
    void nebulaeWithAnIntercept() {
        VelocityDistance flow = flow(NEBULAE).withIntercept(velocity("intercept"));
        Solution solution = solve(flow, NEBULAE);
        check(454.1584409226283, 75.23710534716908, solution.of(flow.hubbleConstant()));
        check(-40.783649095860504, 83.43886993606561, solution.of(flow.parameter("intercept")));
    }

    /** With the Sun's motion: K = 465.206; published 465 +- 50 with X, Y, Z = -65, 226, -195 for B1900 positions. */
    @Test
    void nebulaeWithSolarMotion() {
        VelocityDistance flow = flow(NEBULAE).withBulkMotion(velocity("X"), velocity("Y"), velocity("Z"));
        Solution solution = solve(flow, NEBULAE);
        check(465.2062387733895, 55.65179137815487, solution.of(flow.hubbleConstant()));
        check(-69.44759580772481, 78.8250416137149, solution.of(flow.parameter("motion x")));
        check(235.46589086304323, 151.76101630920954, solution.of(flow.parameter("motion y")));
        check(-199.91421338739818, 81.93425843978252, solution.of(flow.parameter("motion z")));
        assertEquals(465, solution.of(flow.hubbleConstant()).value(), 50);
    }

    @Test
    void galaxies() {
        VelocityDistance flow = flow(GALAXIES);
        check(76.5811720292, 3.9647939834, solve(flow, GALAXIES).of(flow.hubbleConstant()));
        VelocityDistance without = flow.without("NGC1326A", "NGC4414");
        String third = GALAXIES.names(0).get(2);
        String fifteenth = GALAXIES.names(0).get(14);
        assertTrue(third.equals("NGC1326A") && fifteenth.equals("NGC4414"), "rows 3 and 15");
        check(77.6729174606, 2.9702802241, solve(without, GALAXIES).of(flow.hubbleConstant()));
    }
}
