package distanceladder.rung;

import distanceladder.relation.Definition;
import distanceladder.relation.Equated;
import distanceladder.relation.Equation;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Value;

/**
 * A rung with a relation of your own.
 *
 * <pre>observable = g(mu, parameters, columns) + e</pre>
 *
 * The equation is one lambda over {@link distanceladder.relation.Dual} numbers, which carry the derivatives:
 *
 * <pre>{@code
 * Own.of("widths", table, "magnitude", (mu, s) ->
 *         mu.add(s.parameter("a")).add(s.parameter("b").multiply(s.column("log width"))))
 *     .withParameter("a", Source.free("widths zero point", Unit.MAGNITUDE))
 *     .withParameter("b", Source.free("widths slope", Unit.MAGNITUDE_PER_DEX));
 * }</pre>
 *
 * Columns: the observable, and "{@code observable} error" for its standard deviation.
 */
public final class Own implements Rung<Own> {
    private final Definition definition;

    private Own(Definition definition) {
        this.definition = definition;
    }

    /**
     * A rung with an equation.
     *
     * @param name name of the rung
     * @param data its data
     * @param observable the column that the equation predicts
     * @param equation the relation
     * @return the rung; name its parameters next
     */
    public static Own of(String name, Observations data, String observable, Equation equation) {
        return of(name, data, observable, Equated.of(equation));
    }

    /**
     * A rung with an equation that says where moduli start, or which data give no distance.
     *
     * @param name name of the rung
     * @param data its data
     * @param observable the column that the equation predicts
     * @param relation the relation
     * @return the rung; name its parameters next
     */
    public static Own of(String name, Observations data, String observable, Equated relation) {
        double[] errors = data.errors(observable + " error", data.unit(observable));
        return new Own(Definition.of(name, data, observable, relation)
                .described("your own relation")
                .withNoise(Noise.of(errors)));
    }

    /**
     * The same rung with a source for a parameter.
     *
     * @param role the role by which the equation reads it
     * @param source its source; {@link Source#starting} says where a free one starts
     * @return the rung
     */
    public Own withParameter(String role, Source source) {
        return new Own(definition.parameter(role, source));
    }

    /**
     * The same rung with a member of a group for a parameter.
     *
     * @param role the role by which the equation reads it
     * @param member one number of a group of sources
     * @return the rung
     */
    public Own withParameter(String role, SourceGroup.Member member) {
        return new Own(definition.parameter(role, member));
    }

    /**
     * A parameter.
     *
     * @param role its role
     * @return its handle
     */
    public Value parameter(String role) {
        return definition.value(role);
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public Own like(Definition other) {
        return new Own(other);
    }

    @Override
    public String toString() {
        return text();
    }
}
