package distanceladder.rung;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Derived;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.Value;
import distanceladder.text.Figures;
import distanceladder.text.ValueFault;
import java.util.List;
import java.util.Optional;

/**
 * The velocity-distance relation.
 *
 * <pre>c z f(z; q0, j0) = H0 d,   d = 10^((mu - 25) / 5) Mpc      [km/s]</pre>
 *
 * (Hubble 1929; the expansion f to third order: {@link Cosmography#f}). The unknown is {@code eta = 5 log10 H0}, so that
 * both forms share it: in velocity {@code c z = 10^((eta + mu - 25) / 5) / f}, with errors normal in velocity; in
 * magnitudes {@code 5 log10(c z f) + 25 = mu + eta}, linear, for a far flow in which every velocity is large against
 * its error. There is no intercept: nothing recedes at no distance.
 *
 * <p>Its calibrators are galaxies with a distance from beneath; its targets have a velocity only, and get a distance from
 * it unless they approach us. Velocities are c z in the frame in which the expansion is at rest; a dispersion of peculiar
 * velocities is added to their errors by {@link #withPeculiarVelocity}.
 *
 * <p>Columns: {@code velocity}, {@code velocity error}; or {@code redshift}, {@code redshift error}.
 */
public final class VelocityDistance implements Rung<VelocityDistance> {
    private static final String ETA = "log Hubble constant";
    private static final double TYPICAL = 70;

    private final Definition definition;
    private final Form form;

    /** How the rung is set up. */
    private record Form(double q0, double j0, boolean expansion, double peculiar, boolean magnitudes) {
        double f(double velocity) {
            return expansion ? Cosmography.f(velocity / Cosmography.LIGHT_KM_PER_S, q0, j0) : 1;
        }
    }

    private VelocityDistance(Definition definition, Form form) {
        this.definition = definition;
        this.form = form;
    }

    /**
     * A relation in velocity with q0 = -0.55 and j0 = 1.
     *
     * @param name name of the rung
     * @param data columns as said above
     * @return the rung
     */
    public static VelocityDistance of(String name, Observations data) {
        Observations full = data.has("velocity") ? data : withVelocity(data);
        full.require("velocity", Unit.KILOMETRE_PER_SECOND);
        full.errors("velocity error", Unit.KILOMETRE_PER_SECOND);
        Source eta = Source.free(name + " 5 log H0", Unit.MAGNITUDE).starting(5 * StrictMath.log10(TYPICAL));
        Definition definition = Definition.of(name, full, "velocity", Equated.of((mu, at) -> mu))
                .parameter(ETA, eta);
        return new VelocityDistance(definition, new Form(-0.55, 1, true, 0, false)).related();
    }

    private static Observations withVelocity(Observations data) {
        data.require("redshift", Unit.REDSHIFT);
        double[] z = data.column("redshift");
        double[] errors = data.errors("redshift error", Unit.REDSHIFT);
        for (int i = 0; i < z.length; i++) {
            z[i] *= Cosmography.LIGHT_KM_PER_S;
            errors[i] *= Cosmography.LIGHT_KM_PER_S;
        }
        return data.with("velocity", Unit.KILOMETRE_PER_SECOND, z)
                .with("velocity error", Unit.KILOMETRE_PER_SECOND, errors);
    }

    /** The definition that belongs to the form; columns are computed from the velocities each time. */
    private VelocityDistance related() {
        Observations data = definition.data();
        double[] v = data.column("velocity");
        double[] errors = data.column("velocity error");
        double[] f = new double[v.length];
        for (int i = 0; i < v.length; i++) {
            f[i] = form.f(v[i]);
            errors[i] = Math.sqrt(errors[i] * errors[i] + form.peculiar * form.peculiar);
        }
        Observations full = data.with("expansion factor", Unit.NONE, f);
        return new VelocityDistance(
                form.magnitudes ? inMagnitudes(full, v, errors, f) : inVelocity(full, errors), form);
    }

    private Definition inVelocity(Observations full, double[] errors) {
        Equated relation = Equated.of((mu, at) ->
                        at.parameter(ETA).add(mu).subtract(25).divide(5).tenTo().divide(at.column("expansion factor")))
                .startingAt(d -> 5 * StrictMath.log10(Math.max(d.observed(), d.sigma()) / TYPICAL) + 25)
                .refusing(d -> refusal(d.observed()));
        return described(
                Definition.of(definition.name(), full, "velocity", relation).withNoise(Noise.of(errors)),
                "c z f(z) = H0 d");
    }

    private Definition inMagnitudes(Observations full, double[] v, double[] errors, double[] f) {
        double[] y = new double[v.length];
        double[] sigmas = new double[v.length];
        for (int i = 0; i < v.length; i++) {
            if (!(v[i] > 0)) {
                throw new ValueFault(
                        "velocity = " + v[i] + " km/s",
                        "the magnitude form takes the logarithm of the velocity",
                        full.label() + ", datum \"" + full.names().get(i) + "\"",
                        "use the velocity form, or leave the datum out");
            }
            y[i] = 5 * StrictMath.log10(v[i] * f[i]) + 25;
            sigmas[i] = distanceladder.astro.Distances.modulusError(errors[i] / v[i]);
        }
        Observations with = full.with("expansion modulus", Unit.MAGNITUDE, y);
        Equated relation = Equated.of((mu, at) -> mu.add(at.parameter(ETA)));
        return described(
                Definition.of(definition.name(), with, "expansion modulus", relation)
                        .withNoise(Noise.of(sigmas)),
                "5 log(c z f(z)) + 25 = mu + 5 log H0");
    }

    private Definition described(Definition fresh, String words) {
        Source eta = eta();
        Derived hubble = Derived.of(
                "Hubble constant",
                Unit.KILOMETRE_PER_SECOND_PER_MEGAPARSEC,
                List.of(eta),
                in -> in.get(0).divide(5).tenTo());
        return fresh.restingOn(definition.restsOn())
                .withCalibrators(definition.calibrators())
                .parameter(ETA, eta)
                .described(words)
                .highlighting(List.of(hubble));
    }

    private Source eta() {
        return (Source) definition.value(ETA);
    }

    private static Optional<String> refusal(double velocity) {
        return velocity > 0
                ? Optional.empty()
                : Optional.of("it approaches us at " + Figures.significant(-velocity, 4)
                        + " km/s, and the relation has a distance only for what recedes");
    }

    /**
     * The same relation with other parameters of the expansion.
     *
     * @param q0 deceleration parameter
     * @param j0 jerk parameter
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withExpansion(double q0, double j0) {
        return new VelocityDistance(definition, new Form(q0, j0, true, form.peculiar, form.magnitudes)).related();
    }

    /**
     * The same relation with f = 1: velocity proportional to distance.
     *
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withoutExpansionTerms() {
        return new VelocityDistance(definition, new Form(0, 0, false, form.peculiar, form.magnitudes)).related();
    }

    /**
     * The same relation with a dispersion of peculiar velocities added to each error in quadrature.
     *
     * @param dispersion standard deviation along the line of sight, a velocity
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withPeculiarVelocity(Amount dispersion) {
        double sigma = dispersion.in(Unit.KILOMETRE_PER_SECOND).value();
        return new VelocityDistance(definition, new Form(form.q0, form.j0, form.expansion, sigma, form.magnitudes))
                .related();
    }

    /**
     * The same relation in magnitudes, linear; for a far flow.
     *
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance inMagnitudes() {
        return new VelocityDistance(definition, new Form(form.q0, form.j0, form.expansion, form.peculiar, true))
                .related();
    }

    /**
     * The same relation with another source of 5 log10 H0, to share it with another rung.
     *
     * @param source 5 log10 of the Hubble constant in km/s/Mpc, mag
     * @return the rung
     */
    public VelocityDistance withLogHubbleConstant(Source source) {
        return new VelocityDistance(definition.parameter(ETA, source), form).related();
    }

    /**
     * The Hubble constant.
     *
     * @return handle of H0 in km/s/Mpc
     */
    public Derived hubbleConstant() {
        return (Derived) definition.highlights().get(0);
    }

    /**
     * Five times the decimal logarithm of the Hubble constant.
     *
     * @return handle of the unknown itself, mag
     */
    public Value logHubbleConstant() {
        return definition.value(ETA);
    }

    @Override
    public Definition definition() {
        return definition;
    }

    @Override
    public VelocityDistance like(Definition other) {
        return new VelocityDistance(other, form);
    }

    @Override
    public String toString() {
        return text();
    }
}
