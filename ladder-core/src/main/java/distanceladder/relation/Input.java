package distanceladder.relation;

import distanceladder.text.Shown;
import java.util.List;

/**
 * One independent input of a ladder: a {@link Source}, or a {@link SourceGroup} of correlated numbers.
 *
 * <p>Its numbers are unknowns of every solution. Free ones are fixed by the data alone; the others enter as
 * {@code s = mean + L v} with v of unit variance, so an exact one and a semidefinite covariance are ordinary cases.
 */
public sealed interface Input extends Shown permits Source, SourceGroup {
    /**
     * The name, unique within a ladder.
     *
     * @return its name
     */
    String name();

    /**
     * The names of its numbers among the unknowns.
     *
     * @return one for a source, several for a group
     */
    List<String> unknowns();

    /**
     * The handle of one of its numbers.
     *
     * @param unknown one of {@link #unknowns()}
     * @return a value that any solution can be asked for
     */
    Value value(String unknown);

    /**
     * Whether nothing is known of it beforehand.
     *
     * @return true for a free parameter
     */
    boolean free();

    /**
     * Means of its numbers, or where a free one starts.
     *
     * @return one for each unknown, in base units
     */
    double[] mean();

    /**
     * A square root L of its covariance.
     *
     * @return one row for each unknown; no columns when exact
     */
    double[][] root();

    /**
     * The same without error.
     *
     * @return an exact input at the same values
     */
    Input held();

    /**
     * Which kind of error it stands for.
     *
     * @return the kind
     */
    Kind kind();
}
