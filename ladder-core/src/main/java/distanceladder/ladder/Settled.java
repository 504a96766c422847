package distanceladder.ladder;

import distanceladder.information.Combination;
import distanceladder.information.Coupled;
import distanceladder.information.Readings;
import distanceladder.information.Solved;
import distanceladder.information.Unknowns;
import distanceladder.relation.Definition;
import distanceladder.relation.Noise;
import distanceladder.relation.Points;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/** A set of rungs, solved at the points at which it was linearised; distances are read back from the readings. */
final class Settled {
    private final Ladder ladder;
    private final TreeSet<String> set;
    private final Assembly assembly;
    private final Solved solved;
    private final Map<String, Decided> decided;
    private final Map<String, Coupled.Reading> coupled = new HashMap<>();
    private final Map<String, Double> scatterVariances = new TreeMap<>();
    private final Set<String> taken;
    private final Map<String, double[]> componentWeights = new HashMap<>();

    Settled(
            Ladder ladder,
            TreeSet<String> set,
            Assembly assembly,
            Solved solved,
            Map<String, Decided> decided,
            Set<String> taken) {
        this.ladder = ladder;
        this.set = set;
        this.assembly = assembly;
        this.solved = solved;
        this.taken = Set.copyOf(taken);
        this.decided = Map.copyOf(decided);
    }

    TreeSet<String> set() {
        return set;
    }

    Assembly assembly() {
        return assembly;
    }

    Solved solved() {
        return solved;
    }

    Map<String, Decided> decided() {
        return decided;
    }

    Ladder ladder() {
        return ladder;
    }

    /** An unknown by name. */
    Stated unknown(String name) {
        Combination q = solved.combination(Unknowns.of(List.of(name)), new double[] {1});
        return new Stated(this, solved.value(q), q, Map.of());
    }

    /** The modulus of an object of the set. */
    Stated distance(String object) {
        Joint joint = assembly.joint();
        if (joint.held().contains(object)) {
            return unknown(Ladder.unknown(object));
        }
        if (joint.inComponent(object)) {
            Coupled component = assembly.component(joint.componentOf(object).name());
            Coupled.Reading reading = reading(object);
            return readBack(object, component.unknowns(), reading.coefficient(), reading.row());
        }
        Readings readings = assembly.readingsOf(object);
        int index = readings.index(object);
        return readBack(object, readings.unknowns(), readings.coefficient(index), readings.row(index));
    }

    private Stated readBack(String object, Unknowns unknowns, double a, double[] row) {
        double[] c = new double[unknowns.size()];
        for (int j = 0; j < c.length; j++) {
            c[j] = -row[j] / a;
        }
        Combination q = solved.combination(unknowns, c).shifted(row[unknowns.size()] / a);
        return new Stated(this, solved.value(q), q, Map.of(object, 1.0));
    }

    /** The present modulus, without its error. */
    double modulus(String object) {
        Joint joint = assembly.joint();
        if (joint.held().contains(object) || !joint.inComponent(object)) {
            return distance(object).value();
        }
        String name = joint.componentOf(object).name();
        Coupled component = assembly.component(name);
        return component.modulus(solved.values(component.unknowns()), weightedRows(name), object);
    }

    private synchronized double[] weightedRows(String component) {
        return componentWeights.computeIfAbsent(component, key -> {
            Coupled coupled = assembly.component(key);
            return coupled.weighted(solved.values(coupled.unknowns()));
        });
    }

    /** V^-1 times the residuals of a rung's data, in the order of its table; 0 for exact data. */
    double[] weighted(String rung) {
        Whitened white = assembly.rows(rung);
        int n = white.definition().data().size();
        double[] out = new double[n];
        if (white.noise().exact()) {
            return out;
        }
        Fit fit = new Fit(this);
        for (int i : white.freeData()) {
            out[i] = fit.residual(white, i) / white.noise().variance(i);
        }
        for (int i : white.tiedData()) {
            out[i] = fit.residual(white, i) / white.noise().variance(i);
        }
        for (Joint.Component component : assembly.joint().components()) {
            java.util.List<Assembly.Supply> supply = assembly.supply(component.name());
            double[] rows = weightedRows(component.name());
            for (int i = 0; i < rows.length; i++) {
                if (supply.get(i).rung().equals(rung)) {
                    out[supply.get(i).datum()] = rows[i];
                }
            }
        }
        return out;
    }

    synchronized Coupled.Reading reading(String object) {
        String component = assembly.joint().componentOf(object).name();
        return coupled.computeIfAbsent(
                object, key -> assembly.component(component).reading(key));
    }

    /** The standard deviation of the error that is an object's distance's own. */
    double ownError(String object) {
        if (assembly.joint().held().contains(object)) {
            return unknown(Ladder.unknown(object)).sigma();
        }
        return Math.sqrt(ownCovariance(object, object));
    }

    /** The covariance of the own errors of two distances. */
    double ownCovariance(String one, String other) {
        Joint joint = assembly.joint();
        if (joint.inComponent(one)) {
            if (!joint.inComponent(other) || !joint.componentOf(one).equals(joint.componentOf(other))) {
                return 0;
            }
            Coupled component = assembly.component(joint.componentOf(one).name());
            Coupled.Reading a = reading(one);
            Coupled.Reading b = reading(other);
            return component.covariance(a, b) / (a.coefficient() * b.coefficient());
        }
        if (!one.equals(other)) {
            return 0;
        }
        Readings readings = assembly.readingsOf(one);
        int index = readings.index(one);
        double a = readings.coefficient(index);
        return readings.exact(index) ? 0 : 1 / (a * a);
    }

    /** Why an object that only one rung speaks of has no distance. */
    Optional<String> refusal(String object) {
        Joint joint = assembly.joint();
        if (joint.held().contains(object)
                || joint.inComponent(object)
                || joint.sides(object).size() != 1) {
            return Optional.empty();
        }
        String rung = joint.sides(object).get(0);
        Whitened white = assembly.rows(rung);
        if (!white.linear().curved()) {
            return refusalBy(white, points(rung), object);
        }
        return refusalBy(white, withParameters(white, points(rung)), object);
    }

    /** Where a rung was linearised. */
    Points points(String rung) {
        Decided found = decided.get(rung);
        if (found == null) {
            throw new IllegalArgumentException(rung + " is not part of this solution");
        }
        return found.points();
    }

    private Points withParameters(Whitened white, Points at) {
        double[] parameters = new double[at.parameterCount()];
        for (int j = 0; j < parameters.length; j++) {
            parameters[j] = unknown(white.linear().unknowns().name(j)).value();
        }
        return Points.of(new double[at.size()], parameters);
    }

    private static Optional<String> refusalBy(Whitened white, Points at, String object) {
        Definition d = white.definition();
        Optional<String> reason = Optional.empty();
        for (int i = 0; i < d.data().size(); i++) {
            if (d.data().objects().get(i).equals(object)) {
                reason = d.relation().refusal(d, i, at);
                if (reason.isEmpty()) {
                    return reason;
                }
            }
        }
        return reason;
    }

    /** For each rung whose scatter was estimated here, the variance of that estimate (of the squared scatter). */
    synchronized Map<String, Double> scatterVariances() {
        if (scatterVariances.isEmpty()) {
            assembly.rows().forEach((rung, white) -> {
                if (white.definition().noise().mode() == Noise.Scatter.ESTIMATED && !taken.contains(rung)) {
                    scatterVariances.put(rung, new Restricted(this, rung).varianceOfEstimate());
                }
            });
        }
        return scatterVariances;
    }

    /** Chi-square over the set. */
    double chiSquare() {
        return solved.chiSquare();
    }

    /** Data less distances less free parameters. */
    int degreesOfFreedom() {
        int data = 0;
        for (Whitened white : assembly.rows().values()) {
            data += white.definition().data().size();
        }
        Joint joint = assembly.joint();
        long eliminated =
                joint.objects().stream().filter(o -> !joint.held().contains(o)).count();
        return data - (int) eliminated - solved.freeCount();
    }
}
