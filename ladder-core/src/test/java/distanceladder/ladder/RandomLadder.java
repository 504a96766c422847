package distanceladder.ladder;

import distanceladder.astro.Unit;
import distanceladder.covariance.Blocks;
import distanceladder.covariance.Covariance;
import distanceladder.covariance.Dense;
import distanceladder.covariance.Diagonal;
import distanceladder.covariance.LowRankUpdate;
import distanceladder.covariance.Sum;
import distanceladder.relation.Amount;
import distanceladder.relation.JointNoise;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.rung.Anchor;
import distanceladder.rung.Own;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;

/** Random ladders of any shape, with the features that are hard to get right made on purpose and counted. */
final class RandomLadder {
    /** What a ladder was made to contain. */
    enum Feature {
        DIAMOND,
        LONG_REJOINING,
        SAME_TARGETS_TWICE_ABOVE,
        DISJOINT_TARGETS_OF_ONE_BLOCK,
        BLOCK_WITH_CALIBRATORS_AND_TARGETS,
        OBJECT_IN_TWO_BRANCHES_AND_FLOW,
        MANY_DATA_ON_AN_OBJECT,
        CORRELATED_SOURCES,
        SEMIDEFINITE_SOURCES,
        TWO_BLOCKS_ON_THE_SAME_TARGETS,
        OBJECT_WITH_TWO_ROWS_IN_A_BLOCK,
        BLOCK_OVER_TWO_RUNGS,
        CURVED
    }

    private final Random random;
    private final double strength;
    private final Set<Feature> features = EnumSet.noneOf(Feature.class);
    private final SourceGroup group;
    private final Source shared;
    private int counter;

    RandomLadder(long seed, double strength) {
        this.random = new Random(seed);
        this.strength = strength;
        this.group = group();
        this.shared = Source.normal("shared zero point", Amount.magnitudes(0.02).plusMinus(0.1 * strength));
    }

    Set<Feature> features() {
        return features;
    }

    private SourceGroup group() {
        boolean semidefinite = random.nextBoolean();
        int rank = semidefinite ? 1 : 3;
        double[][] l = new double[3][rank];
        for (double[] row : l) {
            for (int k = 0; k < rank; k++) {
                row[k] = 0.1 * strength * random.nextGaussian();
            }
        }
        features.add(semidefinite ? Feature.SEMIDEFINITE_SOURCES : Feature.CORRELATED_SOURCES);
        Covariance c = LowRankUpdate.of(Diagonal.fromVariances(0, 0, 0), l);
        return SourceGroup.of("nuisances", Unit.MAGNITUDE, List.of("one", "two", "three"), 0.01, -0.02, 0)
                .withCovariance(c);
    }

    /** Base anchors, two branches that share them, a third indicator in a longer branch, flows above. */
    Ladder ladder() {
        Rung<?> anchorA = Anchor.of("host 0", Amount.modulus(29.4).plusMinus(0.03));
        Rung<?> anchorB = random.nextBoolean()
                ? Anchor.of("host 1", Amount.modulus(30.1).plusMinus(0.05)).withSystematic(shared)
                : Anchor.of("host 1", Amount.megaparsecs(10.4).plusMinus(0.3));
        if (anchorB.definition().data().unit("distance") == Unit.MEGAPARSEC) {
            features.add(Feature.CURVED);
        }
        Own base = rung("base", hosts(0, 7), 4, false).calibratedBy(anchorA, anchorB);
        features.add(Feature.MANY_DATA_ON_AN_OBJECT);
        boolean block = random.nextBoolean();
        Own left = rung("left", with(hosts(2, 6), targets(0, 9)), 2, block).calibratedBy(base);
        if (block) {
            features.add(Feature.BLOCK_WITH_CALIBRATORS_AND_TARGETS);
        }
        Own right = rung("right", with(hosts(4, 7), targets(6, 13)), 2, false).calibratedBy(base);
        features.add(Feature.DIAMOND);
        if (random.nextInt(3) == 0) {
            JointNoise joint = joint(left, right);
            left = left.withJointNoise(joint);
            right = right.withJointNoise(joint);
            features.add(Feature.BLOCK_OVER_TWO_RUNGS);
        }
        Rung<?> top = right;
        if (random.nextBoolean()) {
            top = rung("upper", with(targets(8, 12), targets(12, 17)), 1, false).calibratedBy(right);
            features.add(Feature.LONG_REJOINING);
        }
        boolean disjoint = random.nextBoolean();
        boolean flowBlock = random.nextBoolean();
        boolean secondBlock = flowBlock && random.nextBoolean();
        List<String> flowObjects = disjoint ? targets(0, 5) : targets(1, 12);
        Own flow = rung("flow", flowObjects, 2, flowBlock).calibratedBy(left, top);
        Own second = rung("second flow", disjoint ? targets(5, 12) : targets(3, 14), 1, secondBlock)
                .calibratedBy(left, top);
        if (flowBlock) {
            features.add(Feature.OBJECT_WITH_TWO_ROWS_IN_A_BLOCK);
        }
        if (block && flowBlock || secondBlock && !disjoint) {
            features.add(Feature.TWO_BLOCKS_ON_THE_SAME_TARGETS);
        }
        features.add(disjoint && block ? Feature.DISJOINT_TARGETS_OF_ONE_BLOCK : Feature.SAME_TARGETS_TWICE_ABOVE);
        features.add(Feature.OBJECT_IN_TWO_BRANCHES_AND_FLOW);
        return random.nextBoolean() ? Ladder.of(flow, second) : Ladder.of(second, flow);
    }

    /** A dense block over some data of two rungs. */
    private JointNoise joint(Own left, Own right) {
        List<String> some = left.definition().data().names().subList(1, 9);
        List<String> others = right.definition().data().names().subList(0, 7);
        int n = some.size() + others.size();
        return JointNoise.named("survey")
                .on("left", some)
                .on("right", others)
                .with(LowRankUpdate.of(Diagonal.fromVariances(new double[n]), columns(n, 3, 0.1)));
    }

    private static List<String> hosts(int from, int to) {
        return names("host ", from, to);
    }

    private static List<String> targets(int from, int to) {
        return names("target ", from, to);
    }

    private static List<String> names(String prefix, int from, int to) {
        List<String> out = new ArrayList<>();
        for (int i = from; i < to; i++) {
            out.add(prefix + i);
        }
        return out;
    }

    private static List<String> with(List<String> a, List<String> b) {
        List<String> out = new ArrayList<>(a);
        out.addAll(b);
        return out;
    }

    /** A linear rung with a zero point, a slope, and random shares of the common sources. */
    Own rung(String name, List<String> objects, int most, boolean dense) {
        List<String> data = new ArrayList<>();
        List<String> bearing = new ArrayList<>();
        for (String object : new TreeSet<>(objects)) {
            int k = 1 + random.nextInt(most);
            for (int i = 0; i < k; i++) {
                data.add(name + " datum " + counter++);
                bearing.add(object);
            }
        }
        if (random.nextInt(3) == 0) {
            data.add(name + " datum " + counter++);
            bearing.add("");
        }
        java.util.Collections.shuffle(data, random);
        int n = data.size();
        Observations table = Observations.of(name, data)
                .bearingOn(bearing)
                .with("magnitude", Unit.MAGNITUDE, magnitudes(bearing))
                .with("magnitude error", Unit.MAGNITUDE, uniforms(n, 0.05, 0.3))
                .with("x", Unit.NONE, normals(n, 0.3, 1))
                .with("w1", Unit.NONE, normals(n, 1, 0.5))
                .with("w2", Unit.NONE, normals(n, 0, 1));
        int member = random.nextInt(3);
        boolean share = random.nextBoolean();
        Own rung = Own.of(name, table, "magnitude", (mu, s) -> {
                    var m = mu.add(s.parameter("zero point"))
                            .add(s.parameter("slope").multiply(s.column("x")))
                            .add(s.parameter("nuisance").multiply(s.column("w1")));
                    return share ? m.add(s.parameter("shared").multiply(s.column("w2"))) : m;
                })
                .withParameter("zero point", Source.free(name + " zero point", Unit.MAGNITUDE))
                .withParameter("slope", Source.free(name + " slope", Unit.MAGNITUDE));
        rung = rung.like(rung.definition()
                .parameter(
                        "nuisance", group.member(List.of("one", "two", "three").get(member))));
        if (share) {
            rung = rung.withParameter("shared", shared);
        }
        return rung.withNoise(noise(n, dense));
    }

    /** Magnitudes near a truth in which the modulus of an object follows from its name. */
    private double[] magnitudes(List<String> bearing) {
        double[] m = normals(bearing.size(), -10, 0.2);
        for (int i = 0; i < m.length; i++) {
            String object = bearing.get(i);
            if (!object.isEmpty()) {
                int number = Integer.parseInt(object.substring(object.indexOf(' ') + 1));
                m[i] += object.startsWith("host") ? 29.4 + 0.7 * number : 33 + 0.3 * number;
            }
        }
        return m;
    }

    private Noise noise(int n, boolean dense) {
        Covariance diagonal = Diagonal.fromStandardDeviations(uniforms(n, 0.05, 0.3));
        Covariance c = diagonal;
        if (dense) {
            c = Dense.fromCovariance(Sum.of(diagonal, LowRankUpdate.of(diagonal, columns(n, n, 0.1)))
                    .toArray());
        } else if (random.nextInt(3) == 0) {
            c = LowRankUpdate.of(diagonal, columns(n, 2, 0.2));
        } else if (random.nextInt(4) == 0 && n > 4) {
            Covariance first = Dense.fromCovariance(
                    LowRankUpdate.of(diagonal.part(0, 1), columns(2, 2, 0.1)).toArray());
            int[] rest = new int[n - 2];
            for (int i = 0; i < rest.length; i++) {
                rest[i] = i + 2;
            }
            c = Blocks.of(first, diagonal.part(rest));
        }
        return Noise.of(c).withScatter(random.nextBoolean() ? 0 : 0.1);
    }

    private double[][] columns(int n, int q, double size) {
        double[][] u = new double[n][];
        for (int i = 0; i < n; i++) {
            u[i] = normals(q, 0, size);
        }
        return u;
    }

    double[] normals(int n, double mean, double sigma) {
        double[] out = new double[n];
        for (int i = 0; i < n; i++) {
            out[i] = mean + sigma * random.nextGaussian();
        }
        return out;
    }

    private double[] uniforms(int n, double from, double to) {
        double[] out = new double[n];
        for (int i = 0; i < n; i++) {
            out[i] = from + (to - from) * random.nextDouble();
        }
        return out;
    }

    Random random() {
        return random;
    }
}
