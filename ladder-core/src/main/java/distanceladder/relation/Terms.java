package distanceladder.relation;

/** What an {@link Equation} may read for one datum. */
public interface Terms {
    /**
     * A parameter of the rung by its role.
     *
     * @param role the role under which the rung names it
     * @return its present value as a variable, in base units
     */
    Dual parameter(String role);

    /**
     * A column's number, known exactly.
     *
     * @param column name of a column
     * @return the datum's number in base units
     */
    double column(String column);

    /**
     * A column's true number where the column was measured with an error: a private unknown of the datum.
     *
     * <p>Its error is the column "{@code column} error". The relation is linearised at the joint estimate of the number
     * in the set that is solved, which is not the measured one.
     *
     * @param column name of a column
     * @return its present estimate as a variable, in base units
     */
    Dual uncertain(String column);
}
