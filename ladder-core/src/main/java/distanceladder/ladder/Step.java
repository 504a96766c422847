package distanceladder.ladder;

import distanceladder.relation.Definition;
import distanceladder.relation.Noise;
import distanceladder.relation.Points;
import java.util.Set;
import java.util.TreeMap;

/**
 * One step of the iteration of a set, and how far it goes.
 *
 * <p>At rest when no modulus moves by more than {@link #CLOSE} of its reading's own error, no parameter by more than that
 * of its standard deviation, no scatter by more than that of the variance; a move of {@link #ROUNDING} units in the last
 * place is none, however small the error. A modulus moves by at most {@link #LONGEST} in a step.
 */
final class Step {
    static final double CLOSE = 1e-10;
    static final double LONGEST = 2.5;
    static final double ROUNDING = 16;
    private static final double EXACT_SCALE = 0.01;

    private final Settled now;
    private final double factor;
    private final Set<String> taken;
    private final TreeMap<String, Double> moduli = new TreeMap<>();
    private double move;
    private String worst = "";

    Step(Settled now, double factor, Set<String> taken) {
        this.now = now;
        this.factor = factor;
        this.taken = taken;
    }

    boolean atRest() {
        return Math.abs(move) <= CLOSE;
    }

    /** The largest move, with its sign, in its own unit of error. */
    double move() {
        return move;
    }

    /** What makes it. */
    String worst() {
        return worst;
    }

    Decided next(String rung, Decided old) {
        Whitened white = now.assembly().rows(rung);
        Points points = white.linear().curved() ? points(white, old.points()) : old.points();
        Definition d = white.definition();
        if (d.noise().mode() != Noise.Scatter.ESTIMATED || taken.contains(rung)) {
            return new Decided(points, old.variance());
        }
        Restricted restricted = new Restricted(now, rung);
        double to = restricted.next();
        note("scatter of " + rung, to, to - old.variance(), restricted.scale());
        return new Decided(points, old.variance() + (to > old.variance() ? factor : 1) * (to - old.variance()));
    }

    private Points points(Whitened white, Points old) {
        double[] values = now.solved().values(white.linear().unknowns());
        double[] parameters = new double[values.length];
        for (int j = 0; j < parameters.length; j++) {
            String unknown = white.linear().unknowns().name(j);
            double sigma = now.unknown(unknown).sigma();
            parameters[j] = sigma == 0 ? values[j] : old.parameter(j) + factor * (values[j] - old.parameter(j));
            note(unknown, values[j], sigma == 0 ? 0 : values[j] - old.parameter(j), sigma);
        }
        Definition d = white.definition();
        double[] next = new double[old.size()];
        for (int i = 0; i < next.length; i++) {
            String object = d.data().objects().get(i);
            next[i] = object.isEmpty() ? 0 : modulus(object, old.modulus(i));
        }
        Points points = Points.of(next, parameters);
        return old.covariateCount() == 0 ? points : points.withCovariates(covariates(white, old));
    }

    private double modulus(String object, double old) {
        if (now.refusal(object).isPresent()) {
            return old;
        }
        double to = moduli.computeIfAbsent(object, now::modulus);
        double error = now.ownError(object);
        note(Ladder.unknown(object), to, to - old, error == 0 ? EXACT_SCALE : error);
        return old + factor * Math.max(-LONGEST, Math.min(LONGEST, to - old));
    }

    /** Uncertain columns, re-estimated from the residuals of their rows. */
    private double[][] covariates(Whitened white, Points old) {
        Definition d = white.definition();
        Points measured = d.relation().start(d);
        double[] weighted = now.weighted(d.name());
        double[][] next = new double[old.size()][old.covariateCount()];
        for (int i = 0; i < next.length; i++) {
            for (int k = 0; k < next[i].length; k++) {
                double shift = white.linear().shifts()[i][k];
                double to = measured.covariate(i, k) - shift * weighted[i];
                double size = Math.abs(shift) / Math.sqrt(white.noise().total(i));
                note(d.data().names().get(i), to, size == 0 ? 0 : to - old.covariate(i, k), size);
                next[i][k] = old.covariate(i, k) + factor * (to - old.covariate(i, k));
            }
        }
        return next;
    }

    private void note(String what, double value, double difference, double error) {
        if (difference == 0 || Math.abs(difference) <= ROUNDING * Math.ulp(value)) {
            return;
        }
        double relative = difference / error;
        if (!(Math.abs(relative) <= Math.abs(move))) {
            move = relative;
            worst = what;
        }
    }
}
