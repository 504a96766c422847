package distanceladder.relation;

import distanceladder.astro.Unit;
import distanceladder.covariance.Covariance;
import distanceladder.covariance.Root;
import distanceladder.text.Grid;
import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.HashSet;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Several named numbers of one unit whose errors are correlated with one another, and with nothing else.
 *
 * <p>The covariance may be semidefinite: two members that are one number, or one that is exact.
 */
public final class SourceGroup implements Input {
    private final String name;
    private final Unit unit;
    private final List<String> members;
    private final double[] values;
    private final Covariance covariance;
    private final Kind kind;

    private SourceGroup(
            String name, Unit unit, List<String> members, double[] values, Covariance covariance, Kind kind) {
        this.name = name;
        this.unit = unit;
        this.members = members;
        this.values = values;
        this.covariance = covariance;
        this.kind = kind;
    }

    /**
     * A group of correlated sources.
     *
     * @param name the group's name
     * @param unit the unit of all members
     * @param members the members' names, distinct
     * @param values their values
     * @return a group without error; give it one by {@link #withCovariance}
     */
    public static SourceGroup of(String name, Unit unit, List<String> members, double... values) {
        if (new HashSet<>(members).size() != members.size()) {
            throw new NameFault(members.toString(), "members of a group have distinct names", name, "rename one");
        }
        requireLength(name, members.size(), values.length, "values");
        for (double value : values) {
            if (!Double.isFinite(value)) {
                throw new ValueFault("value = " + value, "values are finite numbers", name, "give a number");
            }
        }
        Covariance none = distanceladder.covariance.Diagonal.fromVariances(new double[values.length]);
        return new SourceGroup(name, unit, List.copyOf(members), values.clone(), none, Kind.SYSTEMATIC);
    }

    private static void requireLength(String name, int expected, int length, String what) {
        if (expected != length) {
            throw new ValueFault(
                    length + " " + what + " for " + expected + " members",
                    "a group has one value and one row of covariance for each member",
                    name,
                    "give " + expected);
        }
    }

    /**
     * The same group with a covariance.
     *
     * @param c covariance in the group's unit squared, one row for each member
     * @return the group
     */
    public SourceGroup withCovariance(Covariance c) {
        requireLength(name, members.size(), c.size(), "rows of covariance");
        return new SourceGroup(name, unit, members, values, c, kind);
    }

    /**
     * The same group at other values.
     *
     * @param others one for each member
     * @return the group
     */
    public SourceGroup at(double... others) {
        return of(name, unit, members, others).withCovariance(covariance).as(kind);
    }

    @Override
    public SourceGroup held() {
        return of(name, unit, members, values).as(kind);
    }

    /**
     * The same group counted as another kind of error.
     *
     * @param other the kind
     * @return the group
     */
    public SourceGroup as(Kind other) {
        return new SourceGroup(name, unit, members, values, covariance, other);
    }

    /**
     * The handle of one member.
     *
     * @param member its name
     * @return a value
     */
    public Member member(String member) {
        if (!members.contains(member)) {
            throw new NameFault(
                    "member \"" + member + "\"", "a member of the group is named", name, Nearest.hint(member, members));
        }
        return new Member(this, member);
    }

    @Override
    public String name() {
        return name;
    }

    /**
     * The unit of all members.
     *
     * @return unit
     */
    public Unit unit() {
        return unit;
    }

    /**
     * The covariance of the members.
     *
     * @return in the unit squared
     */
    public Covariance covariance() {
        return covariance;
    }

    @Override
    public List<String> unknowns() {
        return members.stream().map(m -> name + ": " + m).toList();
    }

    @Override
    public Value value(String unknown) {
        return member(unknown.substring(name.length() + 2));
    }

    @Override
    public boolean free() {
        return false;
    }

    @Override
    public double[] mean() {
        return IntStream.range(0, values.length)
                .mapToDouble(i -> unit.toBase(values[i]))
                .toArray();
    }

    @Override
    public double[][] root() {
        double[][] root = Root.of(covariance);
        for (double[] row : root) {
            for (int k = 0; k < row.length; k++) {
                row[k] = unit.toBase(row[k]);
            }
        }
        return root;
    }

    @Override
    public Kind kind() {
        return kind;
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with("member", "value", "sigma", "unit");
        for (int i = 0; i < values.length; i++) {
            grid.row(members.get(i), values[i], Math.sqrt(covariance.entry(i, i)), unit.symbol());
        }
        return grid.titled(name).build().text();
    }

    @Override
    public String toString() {
        return text();
    }

    /**
     * One number of a group.
     *
     * @param group the group
     * @param member the member's name
     */
    public record Member(SourceGroup group, String member) implements Value {
        @Override
        public String name() {
            return group.name + ": " + member;
        }

        @Override
        public Unit unit() {
            return group.unit;
        }
    }
}
