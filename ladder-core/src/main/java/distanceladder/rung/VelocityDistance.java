package distanceladder.rung;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Frame;
import distanceladder.astro.Unit;
import distanceladder.covariance.Diagonal;
import distanceladder.relation.Amount;
import distanceladder.relation.Datum;
import distanceladder.relation.Definition;
import distanceladder.relation.Derived;
import distanceladder.relation.Equated;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Rung;
import distanceladder.relation.Source;
import distanceladder.relation.SourceGroup;
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
 * <p>The expansion is that of a flat universe to third order (Caldwell and Kamionkowski 2004; Visser 2004), as accurate
 * as {@link Cosmography} says, at the observed redshift: a peculiar velocity u shifts f too, by a further (1 - q0) z / 2 of
 * u, which is left out. Peculiar velocities are independent from galaxy to galaxy; where they are not, give {@link Noise}
 * with a covariance. The forms agree while errors are small against velocities; where they are not, an error is normal
 * in velocity and lopsided in modulus, and the velocity form is the right one.
 *
 * <p>The order in which options are set does not matter: each changes that option, and keeps the rest, the scatter and
 * the noise that was put in place of the columns' errors. What cannot be kept, because its size is in the unit of the
 * other form, is refused: {@link #inMagnitudes} comes before a scatter or noise in magnitudes.
 *
 * <p>Columns: {@code velocity}, {@code velocity error}; or {@code redshift}, {@code redshift error}; {@code offset}
 * (modulus of the datum less that of its object, mag) when present.
 */
public final class VelocityDistance implements Rung<VelocityDistance> {
    private static final double TYPICAL = 70;
    private static final double SLOWEST = 10;

    private final Definition definition;
    private final VelocityDistanceForm form;

    private VelocityDistance(Definition definition, VelocityDistanceForm form) {
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
        Observations full = data.has(VelocityDistanceForm.VELOCITY) ? data : withVelocity(data);
        full.require(VelocityDistanceForm.VELOCITY, Unit.KILOMETRE_PER_SECOND);
        if (full.has(VelocityDistanceForm.APART)) {
            full.require(VelocityDistanceForm.APART, Unit.MAGNITUDE);
        }
        double[] errors = full.errors(VelocityDistanceForm.ERROR, Unit.KILOMETRE_PER_SECOND);
        Source eta = Source.free(name + " 5 log H0", Unit.MAGNITUDE).starting(5 * StrictMath.log10(TYPICAL));
        Definition bare = Definition.of(name, full, VelocityDistanceForm.VELOCITY, Equated.of((mu, at) -> mu))
                .withNoise(Noise.of(errors))
                .parameter(VelocityDistanceForm.ETA, eta);
        return new VelocityDistance(bare, VelocityDistanceForm.PLAIN).with(VelocityDistanceForm.PLAIN);
    }

    private static Observations withVelocity(Observations data) {
        data.require("redshift", Unit.REDSHIFT);
        double[] z = data.column("redshift");
        double[] errors = data.errors("redshift error", Unit.REDSHIFT);
        for (int i = 0; i < z.length; i++) {
            z[i] *= Cosmography.LIGHT_KM_PER_S;
            errors[i] *= Cosmography.LIGHT_KM_PER_S;
        }
        return data.with(VelocityDistanceForm.VELOCITY, Unit.KILOMETRE_PER_SECOND, z)
                .with(VelocityDistanceForm.ERROR, Unit.KILOMETRE_PER_SECOND, errors);
    }

    /** The rung in another form; its columns are computed from the velocities each time. */
    private VelocityDistance with(VelocityDistanceForm next) {
        Observations data = definition.data();
        double[] f = next.factors(data);
        Observations full = data.with(VelocityDistanceForm.FACTOR, Unit.NONE, f);
        if (next.magnitudes()) {
            full = full.with(VelocityDistanceForm.MODULUS, Unit.MAGNITUDE, next.moduli(data, f));
        }
        Definition fresh = Definition.of(
                        name(), full, next.observable(), relation(next, data.has(VelocityDistanceForm.APART)))
                .restingOn(definition.restsOn())
                .withCalibrators(definition.calibrators())
                .withNoise(noise(next))
                .described(next.magnitudes() ? "5 log(c z f(z)) + 25 = mu + 5 log H0" : "c z f(z) = H0 d");
        return new VelocityDistance(withParameters(fresh, next), next);
    }

    private Definition withParameters(Definition fresh, VelocityDistanceForm next) {
        Definition out = fresh;
        for (String role : definition.parameters().keySet()) {
            if (!next.varied() && (role.equals(VelocityDistanceForm.Q0) || role.equals(VelocityDistanceForm.J0))) {
                continue;
            }
            out = definition.value(role) instanceof SourceGroup.Member member
                    ? out.parameter(role, member)
                    : out.parameter(role, (Source) definition.value(role));
        }
        return withEta(out);
    }

    private static Equated relation(VelocityDistanceForm form, boolean apart) {
        Equated relation = form.magnitudes()
                ? Equated.of(form::modulus)
                : Equated.of(form::velocity)
                        .startingAt(d -> start(d) - (apart ? d.column(VelocityDistanceForm.APART) : 0))
                        .refusing(d -> refusal(d.observed()));
        return apart ? relation.withOffsets(VelocityDistanceForm.APART) : relation;
    }

    private static double start(Datum d) {
        return 5 * StrictMath.log10(Math.max(Math.max(d.observed(), d.sigma()), SLOWEST) / TYPICAL) + 25;
    }

    /** The columns' errors in another form; noise that the user gave is kept, or refused where it cannot be. */
    private Noise noise(VelocityDistanceForm next) {
        Noise now = definition.noise();
        boolean columns = form.isNoise(now, definition.data());
        boolean none = now.covariance()
                .equals(Diagonal.fromVariances(new double[definition.data().size()]));
        boolean rescaled = next.magnitudes() != form.magnitudes();
        boolean sized = now.scatter() > 0 || now.joint().isPresent() || !(columns || none);
        if ((rescaled && sized) || (next.peculiar() != form.peculiar() && !columns)) {
            throw new ValueFault(
                    rescaled ? "noise or scatter in " + Unit.KILOMETRE_PER_SECOND.symbol() : "noise of its own",
                    rescaled
                            ? "the magnitude form has its noise in magnitudes"
                            : "a peculiar velocity is added to the errors of the columns",
                    "rung \"" + name() + "\"",
                    rescaled
                            ? "call inMagnitudes first, and give noise and scatter in mag"
                            : "call withPeculiarVelocity first, or give noise that holds it");
        }
        return columns ? now.withCovariance(Diagonal.fromStandardDeviations(next.sigmas(definition.data()))) : now;
    }

    private void requireUnit(String role, Value parameter, Unit wanted) {
        if (!parameter.unit().dimension().equals(wanted.dimension())) {
            throw new ValueFault(
                    role + " \"" + parameter.name() + "\" in "
                            + parameter.unit().symbol(),
                    "the " + role + " is a " + wanted.dimension(),
                    "rung \"" + name() + "\"",
                    "give a source in such a unit");
        }
    }

    private static Definition withEta(Definition definition) {
        return definition.highlighting(List.of(hubble(definition.value(VelocityDistanceForm.ETA))));
    }

    private static Derived hubble(Value eta) {
        return Derived.of(
                "Hubble constant",
                Unit.KILOMETRE_PER_SECOND_PER_MEGAPARSEC,
                List.of(eta),
                in -> in.get(0).divide(5).tenTo());
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
     * @return the rung
     */
    public VelocityDistance withExpansion(double q0, double j0) {
        return with(form.expanding(q0, j0, true, false));
    }

    /**
     * The same relation with the parameters of the expansion as sources, which then have their share in error budgets.
     *
     * @param q0 source of the deceleration parameter
     * @param j0 source of the jerk parameter
     * @return the rung
     */
    public VelocityDistance withExpansion(Source q0, Source j0) {
        requireUnit(VelocityDistanceForm.Q0, q0, Unit.NONE);
        requireUnit(VelocityDistanceForm.J0, j0, Unit.NONE);
        Definition d = definition.parameter(VelocityDistanceForm.Q0, q0).parameter(VelocityDistanceForm.J0, j0);
        return new VelocityDistance(d, form).with(form.expanding(q0.mean()[0], j0.mean()[0], true, true));
    }

    /**
     * The same relation with a common velocity added to all, as a diagnostic: the relation itself has no intercept.
     *
     * @param source the intercept, a velocity
     * @return the rung
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
     * @return the rung
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
        requireUnit(role, source, Unit.KILOMETRE_PER_SECOND);
        Definition d = definition
                .withData(definition.data().with(role, Unit.NONE, column), definition.noise())
                .parameter(role, source);
        return new VelocityDistance(d, form).with(form.with(role));
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
     * @return the rung
     */
    public VelocityDistance withoutExpansionTerms() {
        return with(form.expanding(0, 0, false, false));
    }

    /**
     * The same relation with a dispersion of peculiar velocities added to each column's error in quadrature.
     *
     * @param dispersion standard deviation along the line of sight, a velocity of 0 or more; it replaces an earlier one
     * @return the rung; refused when the columns' errors were replaced by other noise
     */
    public VelocityDistance withPeculiarVelocity(Amount dispersion) {
        double sigma = Unit.KILOMETRE_PER_SECOND.toBase(
                dispersion.in(Unit.KILOMETRE_PER_SECOND).value());
        if (!(sigma >= 0)) {
            throw new ValueFault(
                    "peculiar velocity = " + dispersion.text(),
                    "a dispersion is 0 or more",
                    "rung \"" + name() + "\"",
                    "give its standard deviation");
        }
        return with(form.scattered(sigma));
    }

    /**
     * The same relation in magnitudes, linear; for a far flow.
     *
     * @return the rung; refused when a velocity is not above zero, or when scatter or noise in km/s was given before
     */
    public VelocityDistance inMagnitudes() {
        return with(form.inMagnitudes());
    }

    /**
     * The same relation with another source of 5 log10 H0, to share it with another rung.
     *
     * @param source 5 log10 of the Hubble constant in km/s/Mpc, mag
     * @return the rung
     */
    public VelocityDistance withLogHubbleConstant(Source source) {
        requireUnit(VelocityDistanceForm.ETA, source, Unit.MAGNITUDE);
        return like(withEta(definition.parameter(VelocityDistanceForm.ETA, source)));
    }

    /**
     * The same relation with a member of a group as 5 log10 H0.
     *
     * @param member 5 log10 of the Hubble constant in km/s/Mpc, mag
     * @return the rung
     */
    public VelocityDistance withLogHubbleConstant(SourceGroup.Member member) {
        requireUnit(VelocityDistanceForm.ETA, member, Unit.MAGNITUDE);
        return like(withEta(definition.parameter(VelocityDistanceForm.ETA, member)));
    }

    /**
     * The Hubble constant.
     *
     * @return handle of H0 in km/s/Mpc
     */
    public Derived hubbleConstant() {
        return hubble(logHubbleConstant());
    }

    /**
     * Five times the decimal logarithm of the Hubble constant.
     *
     * @return handle of the unknown itself, mag
     */
    public Value logHubbleConstant() {
        return definition.value(VelocityDistanceForm.ETA);
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
