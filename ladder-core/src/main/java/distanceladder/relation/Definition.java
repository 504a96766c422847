package distanceladder.relation;

import distanceladder.astro.Unit;
import distanceladder.covariance.Diagonal;
import distanceladder.text.GraphFault;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.IntStream;

/**
 * What a rung is: its name, the rungs beneath, its data, its relation and the sources of its parameters.
 *
 * <p>Immutable; each method gives another definition. Two definitions are the same only when they are one object: the
 * engine keeps what it computed under the identity of its inputs.
 */
public final class Definition {
    private final Parts parts;

    /** The fields; changed only in a fresh copy, before it is handed to a definition. */
    private static final class Parts {
        private String name = "";
        private String description = "";
        private List<Rung<?>> restsOn = List.of();
        private Observations data;
        private String observable;
        private Relation relation;
        private Map<String, String> parameters = Map.of();
        private Map<String, Input> inputs = Map.of();
        private Noise noise;
        private List<String> calibrators = List.of();
        private List<Value> highlights = List.of();

        Parts(Observations data, String observable, Relation relation) {
            this.data = data;
            this.observable = observable;
            this.relation = relation;
            this.noise = Noise.of(Diagonal.fromVariances(new double[data.size()]));
        }

        Parts(Parts p) {
            this(p.data, p.observable, p.relation);
            name = p.name;
            description = p.description;
            restsOn = p.restsOn;
            parameters = p.parameters;
            inputs = p.inputs;
            noise = p.noise;
            calibrators = p.calibrators;
            highlights = p.highlights;
        }
    }

    private Definition(Parts parts) {
        this.parts = parts;
    }

    private Definition changed(Consumer<Parts> change) {
        Parts copy = new Parts(parts);
        change.accept(copy);
        return new Definition(copy);
    }

    /**
     * A definition without parameters.
     *
     * @param name name of the rung
     * @param data its data
     * @param observable the column that the relation predicts
     * @param relation its relation
     * @return the definition; its noise is still to be given
     */
    public static Definition of(String name, Observations data, String observable, Relation relation) {
        if (name.isBlank()) {
            throw new NameFault("a rung without a name", "a rung has a name", data.label(), "give it one");
        }
        data.column(observable);
        Parts parts = new Parts(data, observable, relation);
        parts.name = name;
        return new Definition(parts);
    }

    /**
     * Names a parameter's source.
     *
     * @param role the role by which the relation reads it
     * @param source its source
     * @return the definition
     */
    public Definition parameter(String role, Source source) {
        return parameter(role, source.name(), source);
    }

    /**
     * Names a parameter's source.
     *
     * @param role the role by which the relation reads it
     * @param member a member of a group of sources
     * @return the definition
     */
    public Definition parameter(String role, SourceGroup.Member member) {
        return parameter(role, member.name(), member.group());
    }

    private Definition parameter(String role, String unknown, Input input) {
        Map<String, String> more = new LinkedHashMap<>(parts.parameters);
        more.put(role, unknown);
        Map<String, Input> kept = new LinkedHashMap<>(parts.inputs);
        kept.put(role, input);
        return changed(p -> {
            p.parameters = more;
            p.inputs = kept;
        });
    }

    /**
     * The same with an equation in words, for display.
     *
     * @param equation one line
     * @return the definition
     */
    public Definition described(String equation) {
        return changed(p -> p.description = equation);
    }

    /**
     * The same with values that its calibration shows besides its parameters.
     *
     * @param values derived values
     * @return the definition
     */
    public Definition highlighting(List<? extends Value> values) {
        return changed(p -> p.highlights = List.copyOf(values));
    }

    /**
     * The same with another relation over the same observable.
     *
     * @param relation the relation
     * @return the definition
     */
    public Definition withRelation(Relation relation) {
        return changed(p -> p.relation = relation);
    }

    /**
     * The same resting on other rungs.
     *
     * @param beneath the rungs beneath, distinct names
     * @return the definition
     */
    public Definition restingOn(List<? extends Rung<?>> beneath) {
        Set<String> seen = new HashSet<>();
        for (Rung<?> rung : beneath) {
            if (!seen.add(rung.name())) {
                throw new NameFault(
                        "rung \"" + rung.name() + "\" stands twice",
                        "a rung rests on another once",
                        name(),
                        "drop one");
            }
        }
        return changed(p -> p.restsOn = List.copyOf(beneath));
    }

    /**
     * The same with objects that must have a distance from beneath.
     *
     * @param objects names of objects among the data
     * @return the definition
     */
    public Definition withCalibrators(List<String> objects) {
        for (String object : objects) {
            if (!parts.data.objects().contains(object)) {
                throw new NameFault(
                        "calibrator \"" + object + "\"",
                        "a calibrator has data in the rung",
                        name(),
                        Nearest.hint(object, new HashSet<>(parts.data.objects())));
            }
        }
        return changed(p -> p.calibrators = List.copyOf(objects));
    }

    /**
     * The same with other noise.
     *
     * @param noise one row for each datum
     * @return the definition
     */
    public Definition withNoise(Noise noise) {
        if (noise.covariance().size() != parts.data.size()) {
            throw new ValueFault(
                    "noise of " + noise.covariance().size() + " data",
                    "there is one row for each datum",
                    name(),
                    "give " + parts.data.size());
        }
        return changed(p -> p.noise = noise);
    }

    /**
     * The same with a given intrinsic scatter.
     *
     * @param amount standard deviation in a unit of the observable
     * @return the definition
     */
    public Definition withScatter(Amount amount) {
        Unit unit = parts.data.unit(parts.observable);
        double sigma = unit.toBase(amount.in(unit).value());
        return withNoise(parts.noise.withScatter(sigma));
    }

    /**
     * The same with other data, in the same columns.
     *
     * @param data the data
     * @param noise their noise
     * @return the definition
     */
    public Definition withData(Observations data, Noise noise) {
        return changed(p -> p.data = data).withNoise(noise);
    }

    /**
     * The same without some data.
     *
     * @param names names of data, each present
     * @return the definition
     */
    public Definition without(Collection<String> names) {
        return part(parts.data.rowsWithout(names));
    }

    /**
     * The same without the data of some objects.
     *
     * @param objects names of objects, each present
     * @return the definition
     */
    public Definition withoutObjects(Collection<String> objects) {
        List<String> all = parts.data.objects();
        for (String object : objects) {
            if (!all.contains(object)) {
                throw new NameFault(
                        "object \"" + object + "\"",
                        "an object that is dropped has data",
                        name(),
                        Nearest.hint(object, new HashSet<>(all)));
            }
        }
        Set<String> out = new HashSet<>(objects);
        return part(IntStream.range(0, all.size())
                .filter(i -> !out.contains(all.get(i)))
                .toArray());
    }

    private Definition part(int[] rows) {
        if (rows.length == 0) {
            throw new GraphFault("0 data left", "a rung has data", name(), "drop the rung instead");
        }
        List<String> left = new ArrayList<>(parts.calibrators);
        Observations data = parts.data.part(rows);
        left.retainAll(new HashSet<>(data.objects()));
        return changed(p -> {
            p.data = data;
            p.relation = p.relation.part(rows);
            p.noise = p.noise.part(rows);
            p.calibrators = List.copyOf(left);
        });
    }

    /**
     * The rung's name.
     *
     * @return its name
     */
    public String name() {
        return parts.name;
    }

    /**
     * The equation in words.
     *
     * @return one line
     */
    public String description() {
        return parts.description;
    }

    /**
     * The rungs that it rests on, as it was given them; a ladder finds them by name.
     *
     * @return the rungs beneath
     */
    public List<Rung<?>> restsOn() {
        return parts.restsOn;
    }

    /**
     * Its data.
     *
     * @return the table
     */
    public Observations data() {
        return parts.data;
    }

    /**
     * The column that the relation predicts.
     *
     * @return its name
     */
    public String observable() {
        return parts.observable;
    }

    /**
     * Its relation.
     *
     * @return the relation
     */
    public Relation relation() {
        return parts.relation;
    }

    /**
     * Its parameters.
     *
     * @return for each role the name of the unknown, in the order in which they were named
     */
    public Map<String, String> parameters() {
        return java.util.Collections.unmodifiableMap(parts.parameters);
    }

    /**
     * The handle of a parameter.
     *
     * @param role its role
     * @return a value that any solution can be asked for
     */
    public Value value(String role) {
        Input input = parts.inputs.get(role);
        String unknown = parts.parameters.get(role);
        if (input == null || unknown == null) {
            throw new NameFault(
                    "parameter \"" + role + "\"",
                    "a parameter of the rung is named",
                    name(),
                    Nearest.hint(role, parts.parameters.keySet()));
        }
        return input.value(unknown);
    }

    /**
     * The source of a parameter.
     *
     * @param role its role
     * @return source or group, empty when there is no such role
     */
    public Optional<Input> input(String role) {
        return Optional.ofNullable(parts.inputs.get(role));
    }

    /**
     * The sources of all parameters.
     *
     * @return distinct, in the order of roles
     */
    public List<Input> inputs() {
        return parts.inputs.values().stream().distinct().toList();
    }

    /**
     * Its noise.
     *
     * @return errors of the data
     */
    public Noise noise() {
        return parts.noise;
    }

    /**
     * The objects that must have a distance from beneath.
     *
     * @return names, empty when nothing was said
     */
    public List<String> calibrators() {
        return parts.calibrators;
    }

    /**
     * The values that its calibration shows besides its parameters.
     *
     * @return derived values
     */
    public List<Value> highlights() {
        return parts.highlights;
    }
}
