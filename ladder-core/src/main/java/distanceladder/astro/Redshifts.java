package distanceladder.astro;

import distanceladder.text.ValueFault;

/**
 * Redshifts and the velocities that stand for them.
 *
 * <p>Redshifts compose by product, {@code 1 + z = (1 + z1)(1 + z2)}. The optical velocity is {@code v = c z} by convention
 * and passes that of light at z = 1. The velocity of a source that recedes through flat space is
 *
 * <pre>v = c ((1 + z)^2 - 1) / ((1 + z)^2 + 1),   1 + z = sqrt((c + v) / (c - v))</pre>
 *
 * (special relativity, Einstein 1905, section 7). Neither is the velocity of expansion beyond the first order in z. All
 * functions keep their relative accuracy, a few units in the last place, down to z = 0.
 */
public final class Redshifts {
    private Redshifts() {}

    /**
     * The redshift of two after one another, {@code (1 + first)(1 + second) - 1}.
     *
     * @param first a redshift above -1
     * @param second another, above -1
     * @return both together
     */
    public static double composed(double first, double second) {
        require(first);
        require(second);
        return first + second + first * second;
    }

    /**
     * What is left of a redshift without one of its parts, {@code (1 + total) / (1 + part) - 1}.
     *
     * @param total a redshift above -1
     * @param part one that it holds, above -1
     * @return the other
     */
    public static double without(double total, double part) {
        require(total);
        require(part);
        return (total - part) / (1 + part);
    }

    /**
     * Optical velocity of a redshift.
     *
     * @param z redshift above -1
     * @return c z, km/s
     */
    public static double opticalVelocity(double z) {
        require(z);
        return Constants.C_KM_PER_S * z;
    }

    /**
     * Redshift of an optical velocity.
     *
     * @param velocity km/s, above minus that of light
     * @return z
     */
    public static double fromOpticalVelocity(double velocity) {
        return require(velocity / Constants.C_KM_PER_S);
    }

    /**
     * Relativistic velocity of a redshift.
     *
     * @param z redshift above -1
     * @return km/s, slower than light
     */
    public static double relativisticVelocity(double z) {
        require(z);
        double square = z * (2 + z);
        return Constants.C_KM_PER_S * (square / (square + 2));
    }

    /**
     * Redshift of a relativistic velocity.
     *
     * @param velocity km/s, slower than light
     * @return z
     */
    public static double fromRelativisticVelocity(double velocity) {
        double beta = velocity / Constants.C_KM_PER_S;
        if (!(Math.abs(beta) < 1)) {
            throw new ValueFault(
                    "velocity = " + velocity + " km/s",
                    "a relativistic velocity is slower than light",
                    "",
                    "read it as an optical velocity, c z, if it may pass that of light");
        }
        return 2 * beta / ((1 - beta) * (1 + Math.sqrt((1 + beta) / (1 - beta))));
    }

    private static double require(double z) {
        if (!(z > -1) || Double.isInfinite(z)) {
            throw new ValueFault(
                    "redshift = " + z,
                    "a redshift is finite and above -1",
                    "",
                    "give z, not a velocity, and a velocity in km/s, not in m/s");
        }
        return z;
    }
}
