package distanceladder.validation;

import static distanceladder.relation.Amount.magnitudes;
import static distanceladder.relation.Amount.megaparsecs;
import static distanceladder.relation.Amount.modulus;
import static org.junit.jupiter.api.Assertions.assertEquals;

import distanceladder.astro.Unit;
import distanceladder.ladder.Comparison;
import distanceladder.ladder.Estimate;
import distanceladder.ladder.Ladder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Derived;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Source;
import distanceladder.relation.Tabulated;
import distanceladder.relation.Value;
import distanceladder.rung.Anchor;
import distanceladder.rung.Given;
import distanceladder.rung.Own;
import distanceladder.rung.SecondaryIndicator;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Nineteen supernova hosts on one geometric anchor: Riess et al. 2016 (ApJ 826, 56), Table 5.
 *
 * <p>The table states the hosts' Cepheid moduli for NGC 4258 at 29.387, with the errors of the Cepheids alone. Here they
 * are a published data vector of differences of two moduli, the anchor's distance is a rung of its own beneath, and the
 * intercept a_B = 0.71273 +- 0.00176 of the Hubble diagram (same paper) a datum that bears on no object.
 *
 * <p>Check values: weighted mean of M_B = (m_B + 5 a_B) - 5 a_B - mu, computed with NumPy 1.24 from the table. The
 * printed sigma of M_B is rounded to 0.001 mag; with the printed one as weight the mean is -19.25181 +- 0.03182 and
 * chi2 = 22.741, with sigma^2 + sigma_mu^2 of the table -19.25137 +- 0.03183 and 22.696, for 18 degrees of freedom.
 */
@Tag("validation")
class Hosts2016Test {
    /** Host, supernova, m_B + 5 a_B, sigma, Cepheid modulus, sigma, M_B, sigma; all mag. */
    private static final PublishedTable TABLE = PublishedTable.of("""
            M101    2011fe  13.310  0.117   29.135  0.045   -19.389 0.125
            N1015   2009ig  17.015  0.123   32.497  0.081   -19.047 0.147
            N1309   2002fk  16.756  0.116   32.523  0.055   -19.331 0.128
            N1365   2012fr  15.482  0.125   31.307  0.057   -19.390 0.137
            N1448   2001el  15.765  0.116   31.311  0.045   -19.111 0.125
            N2442   2015F   15.840  0.142   31.511  0.053   -19.236 0.152
            N3021   1995al  16.527  0.117   32.498  0.090   -19.535 0.147
            N3370   1994ae  16.476  0.115   32.072  0.049   -19.161 0.125
            N3447   2012ht  16.265  0.124   31.908  0.043   -19.207 0.131
            N3972   2011by  16.048  0.116   31.587  0.070   -19.103 0.136
            N3982   1998aq  15.795  0.115   31.737  0.069   -19.507 0.134
            N4038   2007sr  15.797  0.114   31.290  0.112   -19.058 0.160
            N4424   2012cg  15.110  0.109   31.080  0.292   -19.534 0.311
            N4536   1981B   15.177  0.124   30.906  0.053   -19.293 0.135
            N4639   1990N   15.983  0.115   31.532  0.071   -19.113 0.135
            N5584   2007af  16.265  0.115   31.786  0.046   -19.085 0.124
            N5917   2005cf  16.572  0.115   32.263  0.102   -19.255 0.154
            N7250   2013dy  15.867  0.115   31.499  0.078   -19.196 0.139
            U9391   2003du  17.034  0.114   32.919  0.063   -19.449 0.130
            """);

    private static final String ANCHOR = "N4258";
    private static final double TABLE_ANCHOR = 29.387;
    private static final double A_B = 0.71273;
    private static final double A_B_SIGMA = 0.00176;

    /** 5 / ln 10, mag. */
    private static final double POGSON = 5 / StrictMath.log(10);

    /** Humphreys et al. 2013 as used by Riess et al. 2016: 7.54 +- 0.17 (random) +- 0.10 (systematic) Mpc (memory). */
    private static final Anchor OLD =
            Anchor.of(ANCHOR, megaparsecs(7.54).plusMinus(0.17)).withSystematic(megaparsecs(0.10));

    /** 5 log10(7.54) + 25 and 5 log10(7.576 / 7.54), computed with Python. */
    private static final double OLD_MODULUS = 29.38685672934887;

    private static final double REVISION = 0.010343100627214708;

    /** The ladder of the table on an anchor, with given errors of the supernovae. */
    private record Hosts(Anchor anchor, Given cepheids, SecondaryIndicator supernovae, Own intercept) {
        static Hosts on(Anchor anchor, double[] supernovaSigmas) {
            Given cepheids = differences().calibratedBy(anchor);
            List<String> hosts = TABLE.names(0);
            double[] magnitudes = Arrays.stream(TABLE.numbers(2))
                    .map(printed -> printed - 5 * A_B)
                    .toArray();
            SecondaryIndicator supernovae = SecondaryIndicator.of(
                            "supernovae",
                            Observations.of("Riess 2016", TABLE.names(1))
                                    .bearingOn(hosts)
                                    .with("magnitude", Unit.MAGNITUDE, magnitudes)
                                    .with("magnitude error", Unit.MAGNITUDE, supernovaSigmas))
                    .calibratedBy(cepheids)
                    .withCalibrators(hosts.toArray(String[]::new));
            Own intercept = Own.of(
                            "Hubble diagram",
                            Observations.of("Riess 2016", "intercept")
                                    .bearingOn("")
                                    .with("a_B", Unit.NONE, A_B)
                                    .with("a_B error", Unit.NONE, A_B_SIGMA),
                            "a_B",
                            (mu, s) -> s.parameter("a_B"))
                    .withParameter("a_B", Source.free("a_B", Unit.NONE));
            return new Hosts(anchor, cepheids, supernovae, intercept);
        }

        /** mu_host - mu_anchor, with the errors of the Cepheids alone. */
        private static Given differences() {
            int n = TABLE.size();
            double[] anchorColumn = new double[n];
            Arrays.fill(anchorColumn, -1);
            Tabulated design = Tabulated.of(n).object(ANCHOR, anchorColumn);
            for (int i = 0; i < n; i++) {
                double[] column = new double[n];
                column[i] = 1;
                design = design.object(TABLE.names(0).get(i), column);
            }
            double[] values = Arrays.stream(TABLE.numbers(4))
                    .map(printed -> printed - TABLE_ANCHOR)
                    .toArray();
            Observations data = Observations.of("Riess 2016", TABLE.names(0)).with("value", Unit.MAGNITUDE, values);
            return Given.of("Cepheids", data, design, Map.of(), Noise.of(TABLE.numbers(5)));
        }

        Solution solve() {
            return Ladder.of(supernovae, intercept).solve();
        }

        /** log10 H0 = (M_B + 5 a_B + 25) / 5: Riess et al. 2016, equation 4 (number from memory). */
        Derived hubbleConstant() {
            return Derived.of(
                    "Hubble constant",
                    Unit.KILOMETRE_PER_SECOND_PER_MEGAPARSEC,
                    List.of(supernovae.zeroPoint(), intercept.parameter("a_B")),
                    in -> in.get(0).add(in.get(1).multiply(5)).add(25).divide(5).tenTo());
        }

        /** M_B for an anchor exactly at the table's modulus. */
        Derived atTableAnchor() {
            return Derived.of(
                    "M_B for NGC 4258 at 29.387",
                    Unit.MAGNITUDE,
                    List.of(supernovae.zeroPoint(), anchor.distance()),
                    in -> in.get(0).add(in.get(1)).subtract(TABLE_ANCHOR));
        }
    }

    /** Supernova errors with which the error of M_B is the printed one. */
    private static double[] fromPrintedSigmas() {
        double[] whole = TABLE.numbers(7);
        double[] cepheids = TABLE.numbers(5);
        double[] out = new double[whole.length];
        for (int i = 0; i < out.length; i++) {
            out[i] = Math.sqrt(whole[i] * whole[i] - cepheids[i] * cepheids[i]);
        }
        return out;
    }

    private static void assertEstimate(double value, double sigma, Estimate estimate, double tolerance) {
        assertEquals(value, estimate.value(), tolerance, estimate.name());
        assertEquals(sigma, estimate.sigma(), tolerance, "sigma of " + estimate.name());
    }

    private static double quadrature(double... parts) {
        return Math.sqrt(Arrays.stream(parts).map(x -> x * x).sum());
    }

    @Test
    void absoluteMagnitudeAndChiSquareAreTheWeightedMeansOfTheTable() {
        Hosts printed = Hosts.on(OLD, fromPrintedSigmas());
        Solution solution = printed.solve();
        assertEstimate(-19.25181, 0.03182, solution.of(printed.atTableAnchor()), 5e-6);
        assertEquals(22.741, solution.chiSquare().total().value(), 5e-4);
        assertEquals(18, solution.chiSquare().total().degreesOfFreedom());

        Hosts summed = Hosts.on(OLD, TABLE.numbers(3));
        Solution other = summed.solve();
        assertEstimate(-19.25137, 0.03183, other.of(summed.atTableAnchor()), 5e-6);
        assertEquals(22.696, other.chiSquare().total().value(), 5e-4);
    }

    @Test
    void theAnchorsErrorIsAddedOnceToTheWhole() {
        Hosts hosts = Hosts.on(OLD, fromPrintedSigmas());
        Solution solution = hosts.solve();
        double anchorSigma = POGSON * quadrature(0.17, 0.10) / 7.54;
        Estimate magnitude = solution.of(hosts.supernovae.zeroPoint());
        assertEquals(-19.25181, magnitude.value(), 2e-4, "table at 29.387, 7.54 Mpc is at 29.38686");
        assertEquals(-19.25181 + TABLE_ANCHOR - OLD_MODULUS, magnitude.value(), 5e-6);
        assertEquals(quadrature(0.03182, anchorSigma), magnitude.sigma(), 5e-6);
        assertEquals(POGSON * 0.10 / 7.54, magnitude.systematic(), 1e-9, "systematic part of M_B");
        Estimate hubble = solution.of(hosts.hubbleConstant());
        assertEquals(72.840, hubble.value(), 72.840 * 2e-4 / POGSON, "2e-4 mag");
        double relative = quadrature(0.03182, anchorSigma, 5 * A_B_SIGMA) / POGSON;
        assertEquals(relative * hubble.value(), hubble.sigma(), 1e-5 * hubble.value());
    }

    @Test
    void hubbleConstantOfTheTableWithItsOwnAnchor() {
        Hosts hosts = Hosts.on(Anchor.of(ANCHOR, modulus(TABLE_ANCHOR).plusMinus(0.0568)), fromPrintedSigmas());
        assertEquals(72.840, hosts.solve().of(hosts.hubbleConstant()).value(), 5e-4);
    }

    @Test
    void hostModuliFromBelowAreThoseOfTheTable() {
        Hosts hosts = Hosts.on(OLD, fromPrintedSigmas());
        Solution below = hosts.solve().below(hosts.cepheids);
        double anchorSigma = POGSON * quadrature(0.17, 0.10) / 7.54;
        for (int i = 0; i < TABLE.size(); i++) {
            Estimate host = below.of(hosts.cepheids.distance(TABLE.names(0).get(i)));
            assertEquals(TABLE.numbers(4)[i], host.value(), 2e-4, host.name());
            assertEquals(TABLE.numbers(4)[i] + OLD_MODULUS - TABLE_ANCHOR, host.value(), 1e-8, host.name());
            assertEquals(quadrature(TABLE.numbers(5)[i], anchorSigma), host.sigma(), 1e-9, host.name());
        }
        Value first = hosts.cepheids.distance("M101");
        Value second = hosts.cepheids.distance("U9391");
        assertEquals(anchorSigma * anchorSigma, below.covariance(first, second), 1e-12, "the anchor is shared");
    }

    /** Reid, Pesce and Riess 2019 (ApJ 886, L27): 7.576 Mpc; at first with the error as it was. */
    @Test
    void aRevisedAnchorMovesAllByTheMoveOfItsModulus() {
        Hosts hosts = Hosts.on(OLD, fromPrintedSigmas());
        Solution solution = hosts.solve();
        Solution revised = solution.with(OLD.at(megaparsecs(7.576)));
        Comparison comparison = revised.against(solution);
        assertEquals(REVISION, comparison.of(OLD.distance()).move(), 1e-8);
        for (String host : TABLE.names(0)) {
            assertEquals(REVISION, comparison.of(hosts.cepheids.distance(host)).move(), 1e-8, host);
        }
        assertEquals(-REVISION, comparison.of(hosts.supernovae.zeroPoint()).move(), 1e-8);
        double before = solution.of(hosts.hubbleConstant()).value();
        assertEquals(before * 7.54 / 7.576, revised.of(hosts.hubbleConstant()).value(), 1e-9 * before);
        assertEquals(0, comparison.of(hosts.atTableAnchor()).move(), 1e-9, "relative to the anchor nothing moves");
        assertEquals(
                solution.chiSquare().total().value(),
                revised.chiSquare().total().value(),
                1e-9);
        double errorOfMove = POGSON * quadrature(0.17, 0.10) * (1 / 7.54 - 1 / 7.576);
        assertEquals(errorOfMove, comparison.of(hosts.supernovae.zeroPoint()).sigma(), 1e-6 * errorOfMove);
    }

    /** The same, with its own errors: 7.576 +- 0.082 (stat.) +- 0.076 (sys.) Mpc, that is 29.3972 +- 0.0320 mag. */
    @Test
    void aRevisedAnchorBringsItsOwnError() {
        Hosts hosts = Hosts.on(OLD, fromPrintedSigmas());
        Anchor reid = Anchor.of(ANCHOR, megaparsecs(7.576).plusMinus(0.082)).withSystematic(megaparsecs(0.076));
        Solution revised = hosts.solve().with(reid);
        assertEstimate(29.3972, 0.03204567, revised.of(reid.distance()), 1e-6);
        Estimate magnitude = revised.of(hosts.supernovae.zeroPoint());
        assertEquals(-19.25181 + TABLE_ANCHOR - 29.39719983, magnitude.value(), 5e-6);
        assertEquals(quadrature(0.03182, 0.03204567), magnitude.sigma(), 5e-6);
    }

    @Test
    void anErrorOfTheAnchorAsAModulusGivesTheSame() {
        Hosts inMegaparsecs = Hosts.on(Anchor.of(ANCHOR, megaparsecs(7.54).plusMinus(0.17)), fromPrintedSigmas());
        Hosts inMagnitudes = Hosts.on(
                Anchor.of(ANCHOR, magnitudes(5 * StrictMath.log10(7.54) + 25).plusMinus(POGSON * 0.17 / 7.54)),
                fromPrintedSigmas());
        Estimate one = inMegaparsecs.solve().of(inMegaparsecs.hubbleConstant());
        Estimate other = inMagnitudes.solve().of(inMagnitudes.hubbleConstant());
        assertEstimate(one.value(), one.sigma(), other, 1e-9 * one.value());
    }
}
