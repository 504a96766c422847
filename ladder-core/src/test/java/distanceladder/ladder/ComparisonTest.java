package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.Value;
import distanceladder.rung.Anchor;
import distanceladder.text.ValueFault;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;

/** Differences of solutions against variances computed from gains found by moving each datum and source. */
class ComparisonTest {
    private static final double STEP = 1e-3;

    private final Ladder ladder = linear();
    private final Solution solution = ladder.solve();
    private final Value top = ladder.rung("flow").definition().value("zero point");

    private static Ladder linear() {
        for (long seed = 1; ; seed++) {
            RandomLadder made = new RandomLadder(seed, 1);
            Ladder ladder = made.ladder();
            boolean simple = ladder.names().stream()
                    .map(n -> ladder.rung(n).definition().noise())
                    .allMatch(n -> n.covariance() instanceof distanceladder.covariance.Diagonal
                            && n.joint().isEmpty());
            if (simple
                    && !made.features().contains(RandomLadder.Feature.CURVED)
                    && ladder.inputs().containsKey("shared zero point")) {
                return ladder;
            }
        }
    }

    private static Rung<?> moved(Rung<?> rung, int datum) {
        Definition d = rung.definition();
        double[] y = d.data().column(d.observable());
        y[datum] += STEP;
        Unit base = d.data().unit(d.observable());
        return rung.like(d.withData(d.data().with(d.observable(), base, y), d.noise()));
    }

    /** d q / d y by rung and datum name, each found by solving again. */
    private static Map<String, Double> gains(Solution s, Value q) {
        Map<String, Double> out = new TreeMap<>();
        double at = s.of(q).value();
        for (String name : s.rungs()) {
            Rung<?> rung = s.ladder().rung(name);
            for (int i = 0; i < rung.definition().data().size(); i++) {
                double to = s.with(moved(rung, i)).of(q).value();
                out.put(name + "/" + rung.definition().data().names().get(i), (to - at) / STEP);
            }
        }
        return out;
    }

    private static double sourceGain(Solution s, Value q) {
        Source shared = (Source) s.ladder().inputs().get("shared zero point");
        double mean = shared.mean()[0];
        double to = s.with(shared.at(Amount.magnitudes(mean + STEP))).of(q).value();
        return (to - s.of(q).value()) / STEP;
    }

    @Test
    void gainsAreThoseOfMovedData() {
        Gains found = new Evaluation(solution.settled()).gains(top);
        Map<String, Double> moved = gains(solution, top);
        for (String rung : solution.rungs()) {
            List<String> names = ladder.rung(rung).definition().data().names();
            for (int i = 0; i < names.size(); i++) {
                assertEquals(moved.get(rung + "/" + names.get(i)), found.data().get(rung)[i], 1e-9, names.get(i));
            }
        }
        double sigma = ((Source) ladder.inputs().get("shared zero point")).root()[0][0];
        assertEquals(
                Math.abs(sourceGain(solution, top)) * sigma,
                Math.abs(found.sources().get("shared zero point")[0]),
                1e-9);
    }

    @Test
    void whatIfOfALinearLadderIsExact() {
        Source shared = (Source) ladder.inputs().get("shared zero point");
        Solution supposed = solution.with(shared.at(Amount.magnitudes(0.5)));
        Comparison.Line line = supposed.against(solution).of(top);
        assertTrue(line.exact());
        assertEquals(sourceGain(solution, top) * (0.5 - shared.mean()[0]), line.move(), 1e-10);
        assertTrue(supposed.against(solution).text().contains("exact"));
    }

    @Test
    void droppedDatumUsesItsOwnErrorAndTheChangedWeights() {
        Rung<?> base = ladder.rung("base");
        String datum = base.definition().data().names().get(3);
        Solution after = solution.with(base.like(base.definition().without(List.of(datum))));
        Map<String, Double> a = gains(solution, top);
        Map<String, Double> b = gains(after, top);
        assertEquals(
                Math.sqrt(variance(a, b, "") + sources(after)),
                after.against(solution).of(top).sigma(),
                1e-6 * after.against(solution).of(top).sigma());
    }

    /** The shares of the sources in the variance of a difference, from the engine's gains (tested above). */
    private double sources(Solution after) {
        Gains a = new Evaluation(solution.settled()).gains(top);
        Gains b = new Evaluation(after.settled()).gains(top);
        double sum = 0;
        for (String name : a.sources().keySet()) {
            double[] h = a.sources().get(name);
            double[] k = b.sources().get(name);
            for (int i = 0; i < h.length; i++) {
                sum += (k[i] - h[i]) * (k[i] - h[i]);
            }
        }
        return sum;
    }

    private double variance(Map<String, Double> a, Map<String, Double> b, String without) {
        double sum = 0;
        TreeMap<String, Double> all = new TreeMap<>(a);
        all.putAll(b);
        for (String key : all.keySet()) {
            if (key.equals(without)) {
                continue;
            }
            String rung = key.substring(0, key.indexOf('/'));
            Definition d = ladder.rung(rung).definition();
            int i = d.data().names().indexOf(key.substring(key.indexOf('/') + 1));
            double scatter = d.noise().scatter();
            double v = d.noise().covariance().entry(i, i) + scatter * scatter;
            double g = b.getOrDefault(key, 0.0) - a.getOrDefault(key, 0.0);
            sum += g * g * v;
        }
        return sum;
    }

    @Test
    void replacedAnchorByItsMeaning() {
        Anchor old = Anchor.of("host 0", Amount.modulus(29.4).plusMinus(0.03));
        Anchor fresh = old.at(Amount.modulus(29.45).plusMinus(0.02));
        String key = "host 0 anchor/host 0 anchor";
        Map<String, Double> a = gains(solution, top);
        Solution what = solution.with(Change.whatIf(fresh));
        Map<String, Double> b = gains(what, top);
        double rest = variance(a, b, key) + sources(what);
        double g = a.get(key);
        double f = b.get(key);
        check(what, Math.sqrt(rest + (f - g) * (f - g) * 0.0004));
        check(solution.with(Change.remeasured(fresh)), Math.sqrt(rest + g * g * 0.0009 + f * f * 0.0004));
        check(
                solution.with(Change.updated(fresh)),
                Math.sqrt(rest + g * g * 0.0009 + f * f * 0.0004 - 2 * g * f * 0.0004));
    }

    private void check(Solution after, double expected) {
        double sigma = after.against(solution).of(top).sigma();
        assertEquals(expected, sigma, 1e-6 * expected);
        double quadrature = Math.hypot(solution.of(top).sigma(), after.of(top).sigma());
        assertTrue(sigma < quadrature, "shared data make the difference more certain than both in quadrature");
    }

    @Test
    void updateWithLargerErrorIsRefused() {
        Anchor worse = Anchor.of("host 0", Amount.modulus(29.45).plusMinus(0.05));
        Solution after = solution.with(Change.updated(worse));
        assertThrows(ValueFault.class, () -> after.against(solution).of(top));
        Source shared = (Source) ladder.inputs().get("shared zero point");
        Solution wider =
                solution.with(Change.updated(shared.at(Amount.magnitudes(0).plusMinus(9))));
        assertThrows(ValueFault.class, () -> wider.against(solution).of(top));
    }
}
