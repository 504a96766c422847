package distanceladder.ladder;

import distanceladder.fit.EffectiveDegrees;
import distanceladder.information.Combination;
import distanceladder.information.Unknowns;
import distanceladder.relation.Derived;
import distanceladder.relation.Distance;
import distanceladder.relation.Input;
import distanceladder.relation.Kind;
import distanceladder.relation.Value;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/** Finds the values that handles stand for in a settled set. */
final class Evaluation {
    private final Settled settled;

    Evaluation(Settled settled) {
        this.settled = settled;
    }

    Stated stated(Value value) {
        if (value instanceof Distance distance) {
            return distance(distance.object());
        }
        if (value instanceof Derived derived) {
            return derived(derived);
        }
        return unknown(value.name());
    }

    private Stated unknown(String name) {
        if (!settled.solved().knows(name)) {
            List<String> known = new ArrayList<>();
            settled.ladder().inputs(settled.set()).values().forEach(i -> known.addAll(i.unknowns()));
            throw new NameFault(
                    "\"" + name + "\"",
                    "a value is a source or parameter of the rungs that are solved",
                    String.join(" + ", settled.set()),
                    Nearest.hint(name, known));
        }
        return settled.unknown(name);
    }

    private Stated distance(String object) {
        TreeSet<String> objects = settled.assembly().joint().objects();
        if (!objects.contains(object)) {
            throw new NameFault(
                    "object \"" + object + "\"",
                    "the rungs that are solved have data on it",
                    String.join(" + ", settled.set()),
                    Nearest.hint(object, objects));
        }
        Optional<String> reason = settled.refusal(object);
        if (reason.isPresent()) {
            throw new ValueFault(
                    "object \"" + object + "\": " + reason.get(),
                    "a distance is stated where the data fix one",
                    String.join(" + ", settled.set()),
                    "add a datum of another kind for it");
        }
        return settled.distance(object);
    }

    private Stated derived(Derived derived) {
        List<Value> inputs = derived.inputs();
        Stated[] parts = new Stated[inputs.size()];
        double[] at = new double[parts.length];
        for (int i = 0; i < parts.length; i++) {
            parts[i] = stated(inputs.get(i));
            at[i] = parts[i].value();
        }
        double[] gradient = derived.gradient(at);
        Combination sum = settled.solved().combination(Unknowns.none(), new double[0]);
        Map<String, Double> distances = new HashMap<>();
        for (int i = 0; i < parts.length; i++) {
            double f = gradient[i + 1];
            sum = sum.plus(1, parts[i].combination(), f);
            parts[i].distances().forEach((object, weight) -> distances.merge(object, f * weight, Double::sum));
        }
        return new Stated(settled, gradient[0], sum, distances);
    }

    Gains gains(Value value) {
        return new Gains(stated(value), settled);
    }

    Estimate estimate(Value value) {
        Stated q = stated(value);
        Gains gains = new Gains(q, settled);
        double systematic = 0;
        double statistical = 0;
        for (double variance : gains.variances().values()) {
            statistical += variance;
        }
        for (double variance : gains.joints().values()) {
            statistical += variance;
        }
        for (Input input : settled.ladder().inputs(settled.set()).values()) {
            double[] along = gains.sources().get(input.name());
            double variance = along == null ? 0 : Gains.squares(along);
            if (input.kind() == Kind.SYSTEMATIC) {
                systematic += variance;
            } else {
                statistical += variance;
            }
        }
        double scale = Math.abs(value.unit().fromBase(1));
        return new Estimate(
                value.name(),
                value.unit().fromBase(q.value()),
                scale * q.sigma(),
                scale * Math.sqrt(statistical),
                scale * Math.sqrt(systematic),
                degrees(q, gains),
                value.unit());
    }

    /** Effective degrees of freedom: infinite when no scatter in the set was estimated. */
    private double degrees(Stated q, Gains gains) {
        List<EffectiveDegrees.Part> parts = new ArrayList<>();
        settled.scatterVariances().forEach((rung, variance) -> {
            double[] g = gains.data().getOrDefault(rung, new double[0]);
            parts.add(new EffectiveDegrees.Part(Gains.squares(g), variance));
        });
        return EffectiveDegrees.of(q.variance(), parts);
    }
}
