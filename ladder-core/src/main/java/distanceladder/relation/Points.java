package distanceladder.relation;

import java.util.Arrays;

/**
 * Where a rung's relation is linearised: the modulus at each datum's object, its parameters, and its
 * uncertain columns.
 *
 * <p>Equal only when all numbers have the same bits.
 */
public final class Points {
    private final double[] moduli;
    private final double[] parameters;
    private final double[][] covariates;

    private Points(double[] moduli, double[] parameters, double[][] covariates) {
        this.moduli = moduli;
        this.parameters = parameters;
        this.covariates = covariates;
    }

    /**
     * A point.
     *
     * @param moduli for each datum its object's distance modulus (0 for none)
     * @param parameters values of the rung's unknowns, in the order of their names
     * @return the point
     */
    public static Points of(double[] moduli, double[] parameters) {
        return new Points(moduli.clone(), parameters.clone(), new double[moduli.length][0]);
    }

    /**
     * The same point with estimates of uncertain columns.
     *
     * @param values for each datum one number for each uncertain column
     * @return the point
     */
    public Points withCovariates(double[][] values) {
        return new Points(
                moduli, parameters, Arrays.stream(values).map(double[]::clone).toArray(double[][]::new));
    }

    /**
     * One uncertain column's estimate.
     *
     * @param datum index in the table
     * @param column index among the uncertain columns
     * @return the estimate in base units
     */
    public double covariate(int datum, int column) {
        return covariates[datum][column];
    }

    /**
     * How many uncertain columns there are.
     *
     * @return number of columns
     */
    public int covariateCount() {
        return covariates.length == 0 ? 0 : covariates[0].length;
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
                        && Arrays.equals(parameters, that.parameters)
                        && Arrays.deepEquals(covariates, that.covariates));
    }

    @Override
    public int hashCode() {
        return 31 * (31 * Arrays.hashCode(moduli) + Arrays.hashCode(parameters)) + Arrays.deepHashCode(covariates);
    }
}
