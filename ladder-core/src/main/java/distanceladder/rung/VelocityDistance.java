package distanceladder.rung;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Distances;
import distanceladder.astro.Frame;
import distanceladder.astro.Unit;
import distanceladder.relation.Amount;
import distanceladder.relation.Definition;
import distanceladder.relation.Derived;
import distanceladder.relation.Dual;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.Terms;
import distanceladder.relation.Value;
import distanceladder.text.Figures;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
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
    private static final String Q0 = "deceleration parameter";
    private static final String J0 = "jerk parameter";
    private static final String FACTOR = "expansion factor";
    private static final double TYPICAL = 70;
    private static final double SLOWEST = 10;

    private final Definition definition;
    private final Form form;

    /** How the rung is set up; a flow is a column whose parameter of the same name adds to the velocity. */
    private record Form(
            double q0,
            double j0,
            boolean expansion,
            boolean varied,
            double peculiar,
            boolean magnitudes,
            List<String> flows) {
        static final Form PLAIN = new Form(-0.55, 1, true, false, 0, false, List.of());

        double f(double velocity) {
            return expansion ? Cosmography.f(velocity / Cosmography.LIGHT_KM_PER_S, q0, j0) : 1;
        }

        Form expanding(double q, double j, boolean terms, boolean sources) {
            return new Form(q, j, terms, sources, peculiar, magnitudes, flows);
        }

        Form scattered(double sigma) {
            return new Form(q0, j0, expansion, varied, sigma, magnitudes, flows);
        }

        Form inMagnitudes() {
            return new Form(q0, j0, expansion, varied, peculiar, true, flows);
        }

        Form with(String flow) {
            List<String> more = new ArrayList<>(flows);
            if (!more.contains(flow)) {
                more.add(flow);
            }
            return new Form(q0, j0, expansion, varied, peculiar, magnitudes, List.copyOf(more));
        }

        /** The expansion factor of a datum: its column, or with the sources of q0 and j0. */
        Dual factor(Dual like, Terms at) {
            double fixed = at.column(FACTOR);
            if (!varied) {
                return like.constant(fixed);
            }
            double z = at.column("velocity") / Cosmography.LIGHT_KM_PER_S;
            Dual q = at.parameter(Q0);
            Dual second = q.negate().add(1).subtract(q.square().multiply(3)).add(at.parameter(J0));
            return q.negate().add(1).multiply(0.5 * z).add(1).subtract(second.multiply(z * z / 6));
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
        return new VelocityDistance(definition, Form.PLAIN).related();
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
        Observations full = data.with(FACTOR, Unit.NONE, f);
        return new VelocityDistance(
                form.magnitudes ? inMagnitudes(full, v, errors, f) : inVelocity(full, errors), form);
    }

    private Definition inVelocity(Observations full, double[] errors) {
        Form setUp = form;
        Equated relation = Equated.of((mu, at) -> {
                    Dual v = at.parameter(ETA).add(mu).subtract(25).divide(5).tenTo();
                    v = v.divide(setUp.factor(v, at));
                    for (String flow : setUp.flows) {
                        v = v.add(at.parameter(flow).multiply(at.column(flow)));
                    }
                    return v;
                })
                .startingAt(d ->
                        5 * StrictMath.log10(Math.max(Math.max(d.observed(), d.sigma()), SLOWEST) / TYPICAL) + 25)
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
            sigmas[i] = Distances.modulusError(errors[i] / v[i]);
        }
        Observations with = full.with("expansion modulus", Unit.MAGNITUDE, y);
        Form setUp = form;
        Equated relation = Equated.of((mu, at) -> {
            Dual modulus = mu.add(at.parameter(ETA));
            if (setUp.varied) {
                Dual relative = setUp.factor(modulus, at).divide(at.column(FACTOR));
                modulus = modulus.subtract(relative.log10().multiply(5));
            }
            for (String flow : setUp.flows) {
                double slope = Distances.modulusError(at.column(flow) / at.column("velocity"));
                modulus = modulus.add(at.parameter(flow).multiply(slope));
            }
            return modulus;
        });
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
        Definition out = fresh.restingOn(definition.restsOn())
                .withCalibrators(definition.calibrators())
                .described(words)
                .highlighting(List.of(hubble));
        for (Map.Entry<String, String> entry : definition.parameters().entrySet()) {
            out = out.parameter(entry.getKey(), (Source) definition.value(entry.getKey()));
        }
        return out;
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
        return new VelocityDistance(definition, form.expanding(q0, j0, true, false)).related();
    }

    /**
     * The same relation with the parameters of the expansion as sources, which then have their share in error budgets.
     *
     * @param q0 source of the deceleration parameter
     * @param j0 source of the jerk parameter
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withExpansion(Source q0, Source j0) {
        Definition d = definition.parameter(Q0, q0).parameter(J0, j0);
        return new VelocityDistance(d, form.expanding(q0.mean()[0], j0.mean()[0], true, true)).related();
    }

    /**
     * The same relation with a common velocity added to all, as a diagnostic: the relation itself has no intercept.
     *
     * @param source the intercept, a velocity
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withIntercept(Source source) {
        double[] one = new double[definition.data().size()];
        java.util.Arrays.fill(one, 1);
        return withFlow("intercept", source, one);
    }

    /**
     * The same relation with a bulk motion: velocities of all galaxies, and of the observer, along three axes.
     *
     * <p>{@code v + x cos(dec) cos(ra) + y cos(dec) sin(ra) + z sin(dec)}, from the columns {@code right ascension} and
     * {@code declination} (degrees). In magnitudes it enters to first order in velocity.
     *
     * @param x source of the velocity towards ra 0, dec 0
     * @param y source of the velocity towards ra 90, dec 0
     * @param z source of the velocity towards the north pole
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withBulkMotion(Source x, Source y, Source z) {
        definition.data().require("right ascension", Unit.DEGREE);
        definition.data().require("declination", Unit.DEGREE);
        double[] ra = definition.data().column("right ascension");
        double[] dec = definition.data().column("declination");
        double[][] n = new double[3][ra.length];
        for (int i = 0; i < ra.length; i++) {
            double a = ra[i] * StrictMath.PI / 180;
            double d = dec[i] * StrictMath.PI / 180;
            n[0][i] = StrictMath.cos(d) * StrictMath.cos(a);
            n[1][i] = StrictMath.cos(d) * StrictMath.sin(a);
            n[2][i] = StrictMath.sin(d);
        }
        return withFlow("motion x", x, n[0]).withFlow("motion y", y, n[1]).withFlow("motion z", z, n[2]);
    }

    private VelocityDistance withFlow(String role, Source source, double[] column) {
        source.unit().convert(0, Unit.KILOMETRE_PER_SECOND);
        Definition d = definition
                .withData(definition.data().with(role, Unit.NONE, column), definition.noise())
                .parameter(role, source);
        return new VelocityDistance(d, form.with(role)).related();
    }

    /**
     * A parameter by its role: "intercept", "motion x", "deceleration parameter" and so on.
     *
     * @param role its role
     * @return its handle
     */
    public Value parameter(String role) {
        return definition.value(role);
    }

    /**
     * Heliocentric redshifts brought to another frame, by composition.
     *
     * @param data columns {@code redshift} (heliocentric), {@code right ascension} and {@code declination} (degrees)
     * @param frame the frame wanted
     * @return the table with its redshifts in that frame
     */
    public static Observations inFrame(Observations data, Frame frame) {
        data.require("redshift", Unit.REDSHIFT);
        data.require("right ascension", Unit.DEGREE);
        data.require("declination", Unit.DEGREE);
        double[] z = data.column("redshift");
        double[] ra = data.column("right ascension");
        double[] dec = data.column("declination");
        for (int i = 0; i < z.length; i++) {
            z[i] = frame.redshift(z[i], ra[i], dec[i]);
        }
        return data.with("redshift", Unit.REDSHIFT, z);
    }

    /**
     * The same relation with f = 1: velocity proportional to distance.
     *
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withoutExpansionTerms() {
        return new VelocityDistance(definition, form.expanding(0, 0, false, false)).related();
    }

    /**
     * The same relation with a dispersion of peculiar velocities added to each error in quadrature.
     *
     * @param dispersion standard deviation along the line of sight, a velocity
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance withPeculiarVelocity(Amount dispersion) {
        double sigma = dispersion.in(Unit.KILOMETRE_PER_SECOND).value();
        return new VelocityDistance(definition, form.scattered(sigma)).related();
    }

    /**
     * The same relation in magnitudes, linear; for a far flow.
     *
     * @return the rung, its noise that of the columns
     */
    public VelocityDistance inMagnitudes() {
        return new VelocityDistance(definition, form.inMagnitudes()).related();
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
