package distanceladder.relation;

/** One datum with the present values of its rung's parameters. */
public interface Datum {
    /**
     * The datum's name.
     *
     * @return its name
     */
    String name();

    /**
     * What was observed.
     *
     * @return the observable in base units
     */
    double observed();

    /**
     * The known error of the observable.
     *
     * @return its standard deviation in base units
     */
    double sigma();

    /**
     * A column's number.
     *
     * @param column name of the column
     * @return the number in base units
     */
    double column(String column);

    /**
     * A parameter's present value.
     *
     * @param role the role under which the rung names it
     * @return its value in base units
     */
    double parameter(String role);
}
