package distanceladder.relation;

import java.util.Arrays;

/**
 * Where a rung's relation is linearised: the modulus at each datum's object, and its parameters.
 *
 * <p>Equal only when all numbers have the same bits.
 */
public final class Points {
    private final double[] moduli;
    private final double[] parameters;

    private Points(double[] moduli, double[] parameters) {
        this.moduli = moduli;
        this.parameters = parameters;
    }

    /**
     * A point.
     *
     * @param moduli for each datum its object's distance modulus (0 for none)
     * @param parameters values of the rung's unknowns, in the order of their names
     * @return the point
     */
    public static Points of(double[] moduli, double[] parameters) {
        return new Points(moduli.clone(), parameters.clone());
    }

    /**
     * The modulus at one datum.
     *
     * @param datum index in the table
     * @return mag
     */
    public double modulus(int datum) {
        return moduli[datum];
    }

    /**
     * One parameter.
     *
     * @param index in the order of the unknowns' names
     * @return its value in base units
     */
    public double parameter(int index) {
        return parameters[index];
    }

    /**
     * How many data it is for.
     *
     * @return number of moduli
     */
    public int size() {
        return moduli.length;
    }

    /**
     * How many parameters it has.
     *
     * @return number of unknowns
     */
    public int parameterCount() {
        return parameters.length;
    }

    @Override
    public boolean equals(Object other) {
        return this == other
                || (other instanceof Points that
                        && Arrays.equals(moduli, that.moduli)
                        && Arrays.equals(parameters, that.parameters));
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(moduli) + Arrays.hashCode(parameters);
    }
}
