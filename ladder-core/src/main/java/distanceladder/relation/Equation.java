package distanceladder.relation;

/**
 * The equation of a relation: what a datum's observable would be without error.
 *
 * <p>Written once; value, derivatives and draws all come from it. It is called for each datum, with the distance modulus
 * of the datum's object (a constant 0 for a datum without an object) and the terms of that datum. It has no state and
 * does not branch on anything but columns.
 */
@FunctionalInterface
public interface Equation {
    /**
     * The observable that belongs to a distance and parameters.
     *
     * @param modulus distance modulus of the datum's object, mag
     * @param at parameters and columns of the datum
     * @return the predicted observable, in the base unit of its column
     */
    Dual predict(Dual modulus, Terms at);
}
