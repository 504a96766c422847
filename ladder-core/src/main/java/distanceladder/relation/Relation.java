package distanceladder.relation;

import java.util.List;
import java.util.Optional;

/**
 * The link between an object's distance, a datum's observable and the rung's parameters, ready to be linearised.
 *
 * <p>Either an {@link Equated} relation, given by an equation, or a {@link Tabulated} one, given by a published design
 * matrix.
 */
public sealed interface Relation permits Equated, Tabulated {
    /**
     * Linearises the relation for all data: {@code a_i mu_i + b_i . theta = y_i} to first order about a point.
     *
     * @param definition the rung
     * @param at where to linearise
     * @return rows in the order of the table
     */
    Linearised linearise(Definition definition, Points at);

    /**
     * Where iteration starts: a function of the data alone.
     *
     * @param definition the rung
     * @return the start
     */
    Points start(Definition definition);

    /**
     * Why a datum alone gives its object no distance.
     *
     * @param definition the rung
     * @param datum index of the datum
     * @param at the present estimates
     * @return the reason, empty when it does give one
     */
    Optional<String> refusal(Definition definition, int datum, Points at);

    /**
     * Objects that the relation itself names, beside those of the table.
     *
     * @return their names; empty for an equation
     */
    default List<String> objects() {
        return List.of();
    }

    /**
     * The columns that were measured with an error.
     *
     * @return their names; mostly none
     */
    default List<String> uncertain() {
        return List.of();
    }

    /**
     * The relation of some of the data.
     *
     * @param rows indices of data
     * @return the relation for them, in that order
     */
    Relation part(int... rows);
}
