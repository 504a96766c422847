package distanceladder.ladder;

import distanceladder.covariance.Covariance;
import distanceladder.relation.Definition;
import distanceladder.relation.Input;
import distanceladder.text.ValueFault;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** The variance of the difference of one value in two solutions, from the gains of both. */
final class Difference {
    private final Gains a;
    private final Gains b;
    private final Map<String, Change.Meaning> meanings;

    Difference(Gains before, Gains after, Map<String, Change.Meaning> meanings) {
        this.a = before;
        this.b = after;
        this.meanings = meanings;
    }

    double variance() {
        double sum = 0;
        Map<String, Input> old = a.settled().ladder().inputs(a.settled().set());
        Map<String, Input> now = b.settled().ladder().inputs(b.settled().set());
        Set<String> names = new TreeSet<>(old.keySet());
        names.addAll(now.keySet());
        for (String name : names) {
            double[] h = a.sources().getOrDefault(name, new double[0]);
            double[] k = b.sources().getOrDefault(name, new double[0]);
            Input before = old.get(name);
            Input after = now.get(name);
            sum += before == null || after == null ? Gains.squares(h) + Gains.squares(k) : source(before, after, h, k);
        }
        Set<String> rungs = new TreeSet<>(a.data().keySet());
        rungs.addAll(b.data().keySet());
        for (String rung : rungs) {
            sum += rung(rung);
        }
        Set<String> joints = new TreeSet<>(a.jointGains().keySet());
        joints.addAll(b.jointGains().keySet());
        for (String name : joints) {
            sum += joint(name);
        }
        return sum;
    }

    /** A joint noise that both solutions have is one and the same. */
    private double joint(String name) {
        double[] g = a.jointGains().get(name);
        double[] f = b.jointGains().get(name);
        if (g == null || f == null || g.length != f.length) {
            return a.joints().getOrDefault(name, 0.0) + b.joints().getOrDefault(name, 0.0);
        }
        return jointCovariance(name).quadratic(difference(g, f));
    }

    private Covariance jointCovariance(String name) {
        for (Whitened white : b.settled().assembly().rows().values()) {
            if (white.definition()
                    .noise()
                    .joint()
                    .filter(j -> j.name().equals(name))
                    .isPresent()) {
                return white.definition().noise().joint().orElseThrow().covariance();
            }
        }
        throw new IllegalStateException(name);
    }

    private Change.Meaning meaning(String name) {
        return meanings.getOrDefault(name, Change.Meaning.WHAT_IF);
    }

    private double source(Input before, Input after, double[] h, double[] k) {
        if (before.equals(after)) {
            return squaredDistance(h, k);
        }
        double[][] l = before.root();
        double[][] m = after.root();
        double[] gainBefore = Factor.gain(h, l);
        double[] gainAfter = Factor.gain(k, m);
        return switch (meaning(before.name())) {
            case REMEASURED -> Gains.squares(h) + Gains.squares(k);
            case UPDATED -> {
                Factor.requireSmaller(m, l, before.name());
                yield Gains.squares(h)
                        + Gains.squares(k)
                        - 2 * Factor.product(Factor.along(gainBefore, m), Factor.along(gainAfter, m));
            }
            case WHAT_IF -> squaredDistance(Factor.along(gainBefore, l), Factor.along(gainAfter, l));
        };
    }

    private static double squaredDistance(double[] h, double[] k) {
        double sum = 0;
        for (int i = 0; i < h.length; i++) {
            sum += (k[i] - h[i]) * (k[i] - h[i]);
        }
        return sum;
    }

    private double rung(String name) {
        double[] g = a.data().get(name);
        double[] f = b.data().get(name);
        if (g == null) {
            return quadratic(noise(b, name), present(f));
        }
        if (f == null) {
            return quadratic(noise(a, name), g);
        }
        Whitened before = a.settled().assembly().rows(name);
        Whitened after = b.settled().assembly().rows(name);
        if (before.definition() == after.definition()) {
            return quadratic(before.noise(), difference(g, f));
        }
        return matched(before, after, g, f);
    }

    private static double[] present(double @org.jspecify.annotations.Nullable [] f) {
        if (f == null) {
            throw new IllegalStateException("a rung of neither solution");
        }
        return f;
    }

    private static RungNoise noise(Gains gains, String rung) {
        return gains.settled().assembly().rows(rung).noise();
    }

    private static double[] difference(double[] g, double[] f) {
        double[] d = new double[g.length];
        for (int i = 0; i < d.length; i++) {
            d[i] = f[i] - g[i];
        }
        return d;
    }

    private static double quadratic(RungNoise noise, double[] g) {
        return noise.exact() ? 0 : noise.quadratic(g);
    }

    /** Data of two versions of a rung, matched by name. */
    private double matched(Whitened old, Whitened now, double[] g, double[] f) {
        Definition before = old.definition();
        Definition after = now.definition();
        Map<String, Integer> at = new HashMap<>();
        List<String> names = after.data().names();
        for (int i = 0; i < names.size(); i++) {
            at.put(names.get(i), i);
        }
        double[] shared = new double[f.length];
        double[] sharedAfter = new double[f.length];
        double[] alone = new double[g.length];
        double[] aloneAfter = f.clone();
        double updated = 0;
        for (int i = 0; i < g.length; i++) {
            Integer j = at.get(before.data().names().get(i));
            boolean same = j != null && unchanged(old, now, i, j);
            if (j != null && (same || meaning(before.name()) == Change.Meaning.WHAT_IF)) {
                shared[j] = g[i];
                sharedAfter[j] = f[j];
                aloneAfter[j] = 0;
            } else {
                alone[i] = g[i];
                if (j != null && meaning(before.name()) == Change.Meaning.UPDATED) {
                    updated += 2 * g[i] * f[j] * updatedVariance(old, now, i, j);
                }
            }
        }
        double[] moved = difference(shared, sharedAfter);
        if (isZero(alone)) {
            // Every old datum is still there: one covariance, that of the new table, holds for all.
            double[] all = new double[f.length];
            for (int j = 0; j < all.length; j++) {
                all[j] = moved[j] + aloneAfter[j];
            }
            return quadratic(now.noise(), all);
        }
        return quadratic(now.noise(), moved)
                + quadratic(old.noise(), alone)
                + quadratic(now.noise(), aloneAfter)
                - updated;
    }

    private static boolean isZero(double[] x) {
        for (double v : x) {
            if (v != 0) {
                return false;
            }
        }
        return true;
    }

    private static boolean unchanged(Whitened old, Whitened now, int i, int j) {
        Definition before = old.definition();
        Definition after = now.definition();
        return before.data().column(before.observable())[i] == after.data().column(after.observable())[j]
                && old.noise().total(i) == now.noise().total(j);
    }

    private static double updatedVariance(Whitened before, Whitened after, int i, int j) {
        double old = before.noise().total(i);
        double now = after.noise().total(j);
        if (now > old) {
            Definition d = after.definition();
            throw new ValueFault(
                    "variance of \"" + d.data().names().get(j) + "\" = " + now + ", before " + old,
                    "an update contains the old measurement, so its variance is not larger",
                    "rung \"" + d.name() + "\"",
                    "call it remeasured if it is independent of the old one");
        }
        return now;
    }
}
