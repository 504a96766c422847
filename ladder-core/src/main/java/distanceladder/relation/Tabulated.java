package distanceladder.relation;

import distanceladder.information.Unknowns;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * A relation given by a published design matrix: {@code y = D (mu, theta)}, linear, its columns named as objects or
 * parameters.
 *
 * <p>A row may bear on several objects (a difference of two moduli); those distances are then kept as unknowns of the
 * solution instead of being eliminated.
 */
public final class Tabulated implements Relation {
    private final Map<String, double[]> objects;
    private final Map<String, double[]> parameters;
    private final int size;

    private Tabulated(Map<String, double[]> objects, Map<String, double[]> parameters, int size) {
        this.objects = objects;
        this.parameters = parameters;
        this.size = size;
    }

    /**
     * A design with no column yet.
     *
     * @param size number of data
     * @return the relation
     */
    public static Tabulated of(int size) {
        return new Tabulated(Map.of(), Map.of(), size);
    }

    /**
     * Adds the column of an object's modulus.
     *
     * @param object its name
     * @param column one factor for each datum
     * @return the relation
     */
    public Tabulated object(String object, double... column) {
        return new Tabulated(plus(objects, object, column), parameters, size);
    }

    /**
     * Adds the column of a parameter.
     *
     * @param role its role
     * @param column one factor for each datum
     * @return the relation
     */
    public Tabulated parameter(String role, double... column) {
        return new Tabulated(objects, plus(parameters, role, column), size);
    }

    private Map<String, double[]> plus(Map<String, double[]> columns, String name, double[] column) {
        if (column.length != size) {
            throw new ValueFault(
                    column.length + " numbers in design column \"" + name + "\"",
                    "a design has one number for each of the " + size + " data",
                    "",
                    "give " + size);
        }
        for (double x : column) {
            if (!Double.isFinite(x)) {
                throw new ValueFault(
                        x + " in design column \"" + name + "\"", "a design holds finite numbers", "", "give a number");
            }
        }
        Map<String, double[]> more = new LinkedHashMap<>(columns);
        more.put(name, column.clone());
        return more;
    }

    /**
     * Checks that each parameter column has a source, and the other way round.
     *
     * @param roles roles for which there are sources
     * @param where name of the rung
     */
    public void requireRoles(Set<String> roles, String where) {
        for (String role : parameters.keySet()) {
            if (!roles.contains(role)) {
                throw new NameFault(
                        "design column \"" + role + "\"",
                        "each parameter of a design has a source",
                        where,
                        Nearest.hint(role, roles));
            }
        }
        for (String role : roles) {
            if (!parameters.containsKey(role)) {
                throw new NameFault(
                        "source for \"" + role + "\"",
                        "a source is for a column of the design",
                        where,
                        Nearest.hint(role, parameters.keySet()));
            }
        }
    }

    /**
     * The object on which each datum bears, when it is one.
     *
     * @return for each datum the object's name, "" when there is none or several
     */
    public List<String> single() {
        List<String> out = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            List<String> found = bearing(i);
            out.add(found.size() == 1 ? found.get(0) : "");
        }
        return out;
    }

    @Override
    public List<String> objects() {
        return List.copyOf(objects.keySet());
    }

    private List<String> bearing(int datum) {
        List<String> found = new ArrayList<>();
        objects.forEach((name, column) -> {
            if (column[datum] != 0) {
                found.add(name);
            }
        });
        return found;
    }

    @Override
    public Linearised linearise(Definition definition, Points at) {
        Unknowns unknowns = Equated.unknownsOf(definition);
        double[] observed = definition.data().column(definition.observable());
        double[] a = new double[size];
        double[][] rows = new double[size][unknowns.size() + 1];
        List<List<Linearised.Tie>> ties = new ArrayList<>();
        boolean tied = false;
        for (int i = 0; i < size; i++) {
            List<String> found = bearing(i);
            List<Linearised.Tie> several = new ArrayList<>();
            if (found.size() == 1) {
                a[i] = coefficient(found.get(0), i);
            } else {
                for (String object : found) {
                    several.add(new Linearised.Tie(object, coefficient(object, i)));
                }
            }
            tied |= !several.isEmpty();
            ties.add(several);
            rows[i][unknowns.size()] = observed[i];
        }
        parameters.forEach((role, column) -> {
            int j = unknowns.column(definition.parameters().getOrDefault(role, ""));
            for (int i = 0; i < size; i++) {
                rows[i][j] += column[i];
            }
        });
        return new Linearised(unknowns, a, rows, tied ? ties : List.of(), false, new double[size], new double[size][0]);
    }

    private double coefficient(String object, int datum) {
        double[] column = objects.get(object);
        return column == null ? 0 : column[datum];
    }

    @Override
    public Points start(Definition definition) {
        return Points.of(
                new double[size], new double[Equated.unknownsOf(definition).size()]);
    }

    @Override
    public Optional<String> refusal(Definition definition, int datum, Points at) {
        return Optional.empty();
    }

    @Override
    public Relation part(int... rows) {
        Tabulated out = of(rows.length);
        for (Map.Entry<String, double[]> e : objects.entrySet()) {
            out = out.object(e.getKey(), select(e.getValue(), rows));
        }
        for (Map.Entry<String, double[]> e : parameters.entrySet()) {
            out = out.parameter(e.getKey(), select(e.getValue(), rows));
        }
        return out;
    }

    private static double[] select(double[] column, int[] rows) {
        double[] out = new double[rows.length];
        for (int i = 0; i < rows.length; i++) {
            out[i] = column[rows[i]];
        }
        return out;
    }
}
