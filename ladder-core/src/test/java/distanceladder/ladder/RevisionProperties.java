package distanceladder.ladder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Input;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.TreeSet;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;

/** A revised ladder is the ladder built from scratch, bit for bit, and the log says what ran. */
class RevisionProperties {
    @Property(tries = 60)
    void revisedIsFromScratchToTheLastBit(@ForAll long seed) {
        RandomLadder made = new RandomLadder(seed, 1);
        Solution solution = made.ladder().solve();
        Random random = new Random(seed);
        for (int step = 0; step < 4; step++) {
            solution = edit(solution, random);
            Solution scratch = Solution.of(solution.ladder());
            sameBits(scratch, solution);
            sameBits(
                    scratch.below(scratch.ladder().rung("base")),
                    solution.below(solution.ladder().rung("base")));
        }
    }

    private static Solution edit(Solution s, Random random) {
        Ladder ladder = s.ladder();
        switch (random.nextInt(6)) {
            case 0:
                SourceGroup group = (SourceGroup) ladder.inputs().get("nuisances");
                return s.with(group.at(random.nextGaussian(), 0, 0.1));
            case 1:
                SourceGroup other = (SourceGroup) ladder.inputs().get("nuisances");
                return s.with(other.withCovariance(other.covariance().scaled(0.25 + random.nextDouble())));
            case 2:
                Rung<?> base = ladder.rung("base");
                List<String> data = base.definition().data().names();
                return s.with(base.like(base.definition().without(List.of(data.get(random.nextInt(data.size() / 2))))));
            case 3:
                Rung<?> right = ladder.rung("right");
                TreeSet<String> objects =
                        new TreeSet<>(right.definition().data().objects());
                objects.remove("");
                return objects.size() < 6
                        ? s
                        : s.with(right.like(right.definition().withoutObjects(List.of(objects.last()))));
            case 4:
                return s.with(Anchor.of(
                        "host 0",
                        Amount.modulus(29.3 + 0.1 * random.nextDouble()).plusMinus(0.02)));
            default:
                return ladder.names().contains("second flow") ? s.without("second flow") : s;
        }
    }

    static void sameBits(Solution one, Solution other) {
        List<Stated> a = values(one);
        List<Stated> b = values(other);
        assertEquals(a.size(), b.size());
        for (int i = 0; i < a.size(); i++) {
            assertEquals(bits(a.get(i).value()), bits(b.get(i).value()));
            assertEquals(bits(a.get(i).variance()), bits(b.get(i).variance()));
            assertEquals(bits(a.get(0).covariance(a.get(i))), bits(b.get(0).covariance(b.get(i))));
        }
        assertEquals(bits(one.settled().chiSquare()), bits(other.settled().chiSquare()));
    }

    private static List<Stated> values(Solution s) {
        List<Stated> out = new ArrayList<>();
        for (Input input : s.ladder().inputs(s.settled().set()).values()) {
            input.unknowns().forEach(u -> out.add(s.settled().unknown(u)));
        }
        s.settled()
                .assembly()
                .joint()
                .objects()
                .forEach(o -> out.add(s.settled().distance(o)));
        return out;
    }

    private static long bits(double x) {
        return Double.doubleToRawLongBits(x);
    }

    /** In a linear ladder a changed source runs no rung: its prior and the last solve only. */
    @Property(tries = 20)
    void changedSourceRunsNoRung(@ForAll long seed) {
        Solution solution = linear(seed).solve();
        SourceGroup group = (SourceGroup) solution.ladder().inputs().get("nuisances");
        Log log = solution.with(group.at(0.5, -0.5, 0.1)).log();
        assertEquals(
                List.of(Log.SOLVE),
                log.lines().stream().map(l -> l.step().what()).toList());
        assertTrue(
                log.lines().get(0).why().contains("source nuisances"),
                log.lines().get(0).why());
        Log wider = solution.with(group.withCovariance(group.covariance().scaled(2)))
                .log();
        assertEquals(
                List.of(Log.SOLVE),
                wider.lines().stream().map(l -> l.step().what()).toList());
    }

    /** A replaced rung runs itself, its meetings and the last merge, and nothing beside or beneath. */
    @Property(tries = 20)
    void replacedRungRunsItselfItsMeetingsAndTheMerge(@ForAll long seed) {
        Solution solution = linear(seed).solve();
        Rung<?> right = solution.ladder().rung("right");
        Log log = solution.with(right.withScatter(Amount.magnitudes(0.07))).log();
        for (String step : List.of(Log.ROWS, Log.WHITENING, Log.ELIMINATION)) {
            assertEquals(List.of("right"), log.where(step), step);
        }
        assertTrue(
                !log.where(Log.MEETING).isEmpty() || !log.where(Log.COMPONENT).isEmpty());
        assertTrue(log.where(Log.MEETING).stream().allMatch(w -> w.contains("right")), log.text());
        assertEquals(List.of("whole"), log.where(Log.MERGE));
        assertEquals(List.of("whole"), log.where(Log.SOLVE));
    }

    /** A rung added on top changes no bit of what the rungs below say from below. */
    @Property(tries = 30)
    void rungOnTopChangesNothingBelow(@ForAll long seed) {
        RandomLadder made = new RandomLadder(seed, 1);
        Ladder ladder = made.ladder();
        Solution before = ladder.solve();
        Own top = made.rung("top", List.of("target 1", "target 9", "target 77"), 2, false)
                .calibratedBy(ladder.rung("left"), ladder.rung("right"));
        Solution after = before.with(top);
        for (String rung : ladder.names()) {
            if (!rung.contains("anchor")) {
                sameBits(before.below(ladder.rung(rung)), after.below(ladder.rung(rung)));
            }
        }
    }

    /** The order in which rungs are named, or data stand in a table, changes no bit. */
    @Property(tries = 30)
    void orderOfDataChangesNothing(@ForAll long seed) {
        Ladder ladder = new RandomLadder(seed, 1).ladder();
        Solution before = ladder.solve();
        Rung<?> base = ladder.rung("base");
        int n = base.definition().data().size();
        List<Integer> order = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            order.add(i);
        }
        java.util.Collections.shuffle(order, new Random(seed));
        int[] rows = order.stream().mapToInt(i -> i).toArray();
        Rung<?> shuffled = base.like(base.definition()
                .withData(
                        base.definition().data().part(rows),
                        base.definition().noise().part(rows)));
        sameBits(before, before.with(shuffled));
    }

    /** A constant on all magnitudes of a rung with a free zero point moves that zero point and no distance. */
    @Property(tries = 30)
    void constantOnMagnitudesMovesOnlyTheZeroPoint(@ForAll long seed) {
        Ladder ladder = new RandomLadder(seed, 1).ladder();
        Solution before = ladder.solve();
        Rung<?> left = ladder.rung("left");
        double[] shifted = left.definition().data().column("magnitude");
        for (int i = 0; i < shifted.length; i++) {
            shifted[i] += 0.75;
        }
        Solution after = before.with(left.like(left.definition()
                .withData(
                        left.definition().data().with("magnitude", Unit.MAGNITUDE, shifted),
                        left.definition().noise())));
        Source zeroPoint = (Source) left.definition().value("zero point");
        assertEquals(0.75, after.of(zeroPoint).value() - before.of(zeroPoint).value(), 1e-9);
        for (String object : before.settled().assembly().joint().objects()) {
            double sigma = before.settled().distance(object).sigma();
            assertEquals(
                    before.settled().distance(object).value(),
                    after.settled().distance(object).value(),
                    1e-8 * sigma,
                    object);
        }
    }

    /** A source of zero variance drops out; a free parameter is the limit of a wide prior. */
    @Property(tries = 20)
    void certainAndVeryUncertainSources(@ForAll long seed) {
        Ladder ladder = linear(seed);
        Solution solution = ladder.solve();
        Source shared = (Source) ladder.inputs().get("shared zero point");
        if (shared == null) {
            return;
        }
        Solution held = solution.with(shared.held());
        assertEquals(0, held.of(shared).sigma());
        for (String object : solution.settled().assembly().joint().objects()) {
            assertTrue(held.settled().distance(object).variance()
                    <= solution.settled().distance(object).variance() * (1 + 1e-12));
        }
        Solution wide = solution.with(shared.at(Amount.magnitudes(0.02).plusMinus(1e8)));
        Solution free = solution.with(Source.free("shared zero point", Unit.MAGNITUDE));
        for (String object : solution.settled().assembly().joint().objects()) {
            double sigma = free.settled().distance(object).sigma();
            assertEquals(sigma, wide.settled().distance(object).sigma(), 1e-6 * sigma);
        }
    }

    private static Ladder linear(long seed) {
        for (long s = seed; ; s++) {
            RandomLadder made = new RandomLadder(s, 1);
            Ladder ladder = made.ladder();
            if (!made.features().contains(RandomLadder.Feature.CURVED)) {
                return ladder;
            }
        }
    }
}
