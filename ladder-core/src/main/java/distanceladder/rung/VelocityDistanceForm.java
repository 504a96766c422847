package distanceladder.rung;

import distanceladder.astro.Cosmography;
import distanceladder.astro.Distances;
import distanceladder.covariance.Diagonal;
import distanceladder.relation.Dual;
import distanceladder.relation.Noise;
import distanceladder.relation.Observations;
import distanceladder.relation.Terms;
import distanceladder.text.Figures;
import distanceladder.text.ValueFault;
import java.util.ArrayList;
import java.util.List;

/**
 * How a velocity-distance rung is set up, and its equations; a flow is a column whose parameter of the same name adds to
 * the velocity.
 */
record VelocityDistanceForm(
        double q0,
        double j0,
        boolean expansion,
        boolean varied,
        double peculiar,
        boolean magnitudes,
        List<String> flows) {
    static final String ETA = "log Hubble constant";
    static final String Q0 = "deceleration parameter";
    static final String J0 = "jerk parameter";
    static final String APART = "offset";
    static final String VELOCITY = "velocity";
    static final String ERROR = "velocity error";
    static final String FACTOR = "expansion factor";
    static final String MODULUS = "expansion modulus";
    static final VelocityDistanceForm PLAIN = new VelocityDistanceForm(-0.55, 1, true, false, 0, false, List.of());

    String observable() {
        return magnitudes ? MODULUS : VELOCITY;
    }

    double[] factors(Observations data) {
        double[] f = data.column(VELOCITY);
        for (int i = 0; i < f.length; i++) {
            f[i] = expansion ? Cosmography.f(f[i] / Cosmography.LIGHT_KM_PER_S, q0, j0) : 1;
            if (!(f[i] > 0)) {
                throw fault(
                        data,
                        i,
                        "the expansion to third order has come to f(z) = " + Figures.significant(f[i], 3)
                                + " there, and means nothing",
                        "leave the datum out, or give distances computed by a cosmological model");
            }
        }
        return f;
    }

    Dual velocity(Dual mu, Terms at) {
        Dual v = at.parameter(ETA).add(mu).subtract(25).divide(5).tenTo();
        v = v.divide(factor(v, at));
        for (String flow : flows) {
            v = v.add(at.parameter(flow).multiply(at.column(flow)));
        }
        return v;
    }

    Dual modulus(Dual mu, Terms at) {
        Dual modulus = mu.add(at.parameter(ETA));
        if (varied) {
            Dual relative = factor(modulus, at).divide(at.column(FACTOR));
            modulus = modulus.subtract(relative.log10().multiply(5));
        }
        for (String flow : flows) {
            double slope = Distances.modulusError(at.column(flow) / at.column(VELOCITY));
            modulus = modulus.add(at.parameter(flow).multiply(slope));
        }
        return modulus;
    }

    /** Standard deviations of the observable that the columns tell. */
    double[] sigmas(Observations data) {
        double[] v = data.column(VELOCITY);
        double[] errors = data.column(ERROR);
        for (int i = 0; i < v.length; i++) {
            double sigma = Math.sqrt(errors[i] * errors[i] + peculiar * peculiar);
            errors[i] = magnitudes ? Distances.modulusError(sigma / v[i]) : sigma;
        }
        return errors;
    }

    double[] moduli(Observations data, double[] f) {
        double[] y = data.column(VELOCITY);
        for (int i = 0; i < y.length; i++) {
            if (!(y[i] > 0)) {
                throw fault(
                        data,
                        i,
                        "the magnitude form takes the logarithm of the velocity",
                        "use the velocity form, or leave the datum out");
            }
            y[i] = 5 * StrictMath.log10(y[i] * f[i]) + 25;
        }
        return y;
    }

    VelocityDistanceForm expanding(double q, double j, boolean terms, boolean sources) {
        return new VelocityDistanceForm(q, j, terms, sources, peculiar, magnitudes, flows);
    }

    VelocityDistanceForm scattered(double sigma) {
        return new VelocityDistanceForm(q0, j0, expansion, varied, sigma, magnitudes, flows);
    }

    VelocityDistanceForm inMagnitudes() {
        return new VelocityDistanceForm(q0, j0, expansion, varied, peculiar, true, flows);
    }

    VelocityDistanceForm with(String flow) {
        List<String> more = new ArrayList<>(flows);
        if (!more.contains(flow)) {
            more.add(flow);
        }
        return new VelocityDistanceForm(q0, j0, expansion, varied, peculiar, magnitudes, List.copyOf(more));
    }

    /** The expansion factor of a datum: its column, or with the sources of q0 and j0. */
    Dual factor(Dual like, Terms at) {
        double fixed = at.column(FACTOR);
        if (!varied) {
            return like.constant(fixed);
        }
        double z = at.column(VELOCITY) / Cosmography.LIGHT_KM_PER_S;
        Dual q = at.parameter(Q0);
        Dual second = q.negate().add(1).subtract(q.square().multiply(3)).add(at.parameter(J0));
        return q.negate().add(1).multiply(0.5 * z).add(1).subtract(second.multiply(z * z / 6));
    }

    /** Whether the known errors are just those of the columns, to the bit: else the user put others in their place. */
    boolean isNoise(Noise noise, Observations data) {
        return noise.covariance().equals(Diagonal.fromStandardDeviations(sigmas(data)));
    }

    private static ValueFault fault(Observations data, int datum, String rule, String repair) {
        return new ValueFault(
                "velocity = " + data.column(VELOCITY)[datum] + " km/s",
                rule,
                data.label() + ", datum \"" + data.names().get(datum) + "\"",
                repair);
    }
}
