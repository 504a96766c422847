package distanceladder.rung;

import distanceladder.relation.Definition;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
import distanceladder.relation.Tabulated;
import distanceladder.relation.Value;
import java.util.Map;

/**
 * A published data vector with its design matrix and covariance.
 *
 * <pre>y = D (mu, theta) + e,   Cov(e) = C</pre>
 *
 * Columns of D are objects (their moduli, mag) or parameters; both join the rest of the ladder by name. A row may bear on
 * several objects. Linear, so its first order is exact, as far as the publication's own linearisation is.
 *
 * <p>Columns: {@code value}, whose unit is that of the published vector ({@link Observations#renamed} makes one of
 * another column), and {@code value error} where no {@link Noise} is given. Design and covariance are in base units (mas,
 * Mpc, mag, km/s).
 */
public final class Given implements Rung<Given> {
    private final Definition definition;

    private Given(Definition definition) {
        this.definition = definition;
    }

    /**
     * A rung from published material with independent errors.
     *
     * @param name name of the rung
     * @param data names of the data, and columns {@code value} and {@code value error}
     * @param design the design matrix
     * @param parameters a source for each parameter of the design, by its role there
     * @return the rung
     */
    public static Given of(String name, Observations data, Tabulated design, Map<String, Source> parameters) {
        return of(name, data, design, parameters, Noise.of(data.errors("value error", data.unit("value"))));
    }

    /**
     * A rung from published material.
     *
     * @param name name of the rung
     * @param data names of the data, and a column {@code value}
     * @param design the design matrix
     * @param parameters a source for each parameter of the design, by its role there
     * @param noise errors of the data
     * @return the rung
     */
    public static Given of(
            String name, Observations data, Tabulated design, Map<String, Source> parameters, Noise noise) {
        Definition definition = Definition.of(name, data.bearingOn(design.single()), "value", design)
                .described("y = D (mu, theta)");
        for (Map.Entry<String, Source> entry : new java.util.TreeMap<>(parameters).entrySet()) {
            definition = definition.parameter(entry.getKey(), entry.getValue());
        }
        design.requireRoles(parameters.keySet(), name);
        return new Given(definition.withNoise(noise));
    }

    /**
     * The same rung with another source for a parameter.
     *
     * @param role a role of the design
     * @param source its source
     * @return the rung
     */
    public Given withParameter(String role, Source source) {
        parameter(role);
        return like(definition.parameter(role, source));
    }

    /**
     * The same rung with a member of a group for a parameter.
     *
     * @param role a role of the design
     * @param member one number of a group of sources
     * @return the rung
     */
    public Given withParameter(String role, SourceGroup.Member member) {
        parameter(role);
        return like(definition.parameter(role, member));
    }

    /**
     * A parameter.
     *
     * @param role its role in the design
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
    public Given like(Definition other) {
        return new Given(other);
    }

    @Override
    public String toString() {
        return text();
    }
}
