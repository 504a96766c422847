package distanceladder.information;

/**
 * Rows whose errors are correlated across objects, with independent readings of the same objects beside them.
 *
 * @param unknowns the columns; distances that are kept as unknowns are among them
 * @param objects for each row its object's name, "" when it bears on none or its object's distance is a column; the
 *     order of rows is the caller's, fixed by names
 * @param coefficients for each row the factor of its object's distance; 0 where there is none
 * @param rows each p coefficients and the right side; not whitened
 * @param noise covariance of the errors of the first noise.length rows, square; the rows after them are independent of
 *     all others and have unit variance, or none. Shared with the caller, who must not change it
 * @param exact which rows have no error; rows of the noise are not among them
 */
public record CoupledRows(
        Unknowns unknowns,
        String[] objects,
        double[] coefficients,
        double[][] rows,
        double[][] noise,
        boolean[] exact) {

    /**
     * The covariance of two rows' errors.
     *
     * @param i row
     * @param j row
     * @return its covariance
     */
    double covariance(int i, int j) {
        if (i < noise.length && j < noise.length) {
            return noise[i][j];
        }
        return i == j && !exact[i] ? 1 : 0;
    }
}
