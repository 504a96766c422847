package distanceladder.relation;

import distanceladder.astro.Unit;

/**
 * A handle for anything that a solution can state with an uncertainty: a source, one member of a group of sources, the
 * distance modulus of an object, or a function of these.
 *
 * <p>A handle holds names, no numbers: the same handle asks any solution of any revision of the ladder.
 */
public sealed interface Value permits Source, SourceGroup.Member, Distance, Derived {
    /**
     * What the value is called.
     *
     * @return its name
     */
    String name();

    /**
     * Its unit.
     *
     * @return the unit of value and standard deviation
     */
    Unit unit();
}
