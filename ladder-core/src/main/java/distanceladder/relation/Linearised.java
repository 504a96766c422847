package distanceladder.relation;

import distanceladder.information.Unknowns;
import java.util.List;

/**
 * A relation's rows to first order, not yet divided by any error: {@code a_i mu_i + b_i . theta = y_i}.
 *
 * @param unknowns the rung's parameters, by name
 * @param coefficients for each datum the factor of its own object's modulus
 * @param rows for each datum the factors of the parameters and the right side
 * @param ties for each datum the further objects that it bears on, mostly none; empty when no datum has any
 * @param curved whether the rows depend on the point of linearisation
 * @param extra for each datum the variance that its uncertain columns add
 * @param shifts for each datum and uncertain column the covariance of the column's error with the row's: by it the column
 *     is re-estimated from the row's residual; no column when none is uncertain
 */
public record Linearised(
        Unknowns unknowns,
        double[] coefficients,
        double[][] rows,
        List<List<Tie>> ties,
        boolean curved,
        double[] extra,
        double[][] shifts) {

    /**
     * A further object in a row that bears on several.
     *
     * @param object its name
     * @param coefficient the factor of its modulus
     */
    public record Tie(String object, double coefficient) {}

    /**
     * The ties of one datum.
     *
     * @param datum index in the table
     * @return further objects
     */
    public List<Tie> ties(int datum) {
        return ties.isEmpty() ? List.of() : ties.get(datum);
    }
}
