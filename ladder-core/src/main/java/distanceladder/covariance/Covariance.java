package distanceladder.covariance;

/**
 * A covariance matrix, kept in the structure in which it was given.
 *
 * <p>An operator C of n rows and columns, symmetric and positive semidefinite: {@code aT C a >= 0} for every vector a.
 * Its unit is the product of the units of the values that it belongs to. A variance of zero is legal and says that the
 * value is certain. No structured kind forms the dense matrix, except in {@link #toArray()}.
 *
 * <p>Immutable. Two covariances are equal when they have the same structure and the same bits.
 */
public sealed interface Covariance permits Diagonal, Dense, Blocks, LowRankUpdate, Sum {
    /**
     * The number of values.
     *
     * @return n, 0 or more
     */
    int size();

    /**
     * One entry; the same bits for (i, j) as for (j, i).
     *
     * @param i row, from 0
     * @param j column, from 0
     * @return the covariance of value i with value j
     * @throws distanceladder.text.ValueFault if an index is outside 0 to n - 1
     */
    double entry(int i, int j);

    /**
     * The dense matrix; costs n x n numbers.
     *
     * @return a fresh array, exactly symmetric
     */
    default double[][] toArray() {
        int n = size();
        double[][] array = new double[n][n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j <= i; j++) {
                double value = entry(i, j);
                array[i][j] = value;
                array[j][i] = value;
            }
        }
        return array;
    }

    /**
     * The covariance of some of the values, in the order in which they are named; the structure is kept.
     *
     * @param indices which values, each at most once
     * @return a covariance of the same kind
     * @throws distanceladder.text.ValueFault if an index is outside 0 to n - 1, or comes twice
     */
    Covariance part(int... indices);

    /**
     * The covariance of two linear combinations of the values, {@code aT C b}.
     *
     * @param a n coefficients
     * @param b n coefficients
     * @return the covariance of a times values with b times values
     * @throws distanceladder.text.ValueFault if a vector has another length than n
     */
    double bilinear(double[] a, double[] b);

    /**
     * The variance of a linear combination of the values, {@code aT C a}.
     *
     * @param a n coefficients
     * @return a number of 0 or more: what rounding leaves below 0 is given as 0
     * @throws distanceladder.text.ValueFault if the vector has another length than n
     */
    default double quadratic(double[] a) {
        return Math.max(0.0, bilinear(a, a));
    }

    /**
     * This covariance times a number.
     *
     * @param factor finite, 0 or more
     * @return a covariance of the same kind
     * @throws distanceladder.text.ValueFault if the factor is negative or not finite, or if a variance leaves the range
     *     of the numbers
     */
    Covariance scaled(double factor);

    /**
     * The part that is whitened (a diagonal and disjoint dense blocks) and the columns that are carried as unknowns.
     *
     * @return the split, with {@code C = whitened + columns columnsT}
     */
    Split split();
}
