package distanceladder.ladder;

import distanceladder.relation.Input;
import distanceladder.relation.Rung;
import java.util.Optional;

/**
 * One change of a ladder, and what it means for the errors of what was changed.
 *
 * <p>Two solutions share most of their data; the uncertainty of their difference depends on whether a changed input is
 * the same measurement, another one, or one that contains the old.
 */
public final class Change {
    /** What a changed input is. */
    public enum Meaning {
        /** The same measurement, supposed different: its error is one and the same in both solutions. */
        WHAT_IF,
        /** Another measurement, independent of the old one. */
        REMEASURED,
        /** A better measurement that contains the old one: old = new + more noise. */
        UPDATED
    }

    private final Meaning meaning;
    private final Optional<Rung<?>> rung;
    private final Optional<Input> input;
    private final String dropped;

    private Change(Meaning meaning, Optional<Rung<?>> rung, Optional<Input> input, String dropped) {
        this.meaning = meaning;
        this.rung = rung;
        this.input = input;
        this.dropped = dropped;
    }

    /**
     * A source supposed different.
     *
     * @param source source or group under its old name
     * @return the change
     */
    public static Change whatIf(Input source) {
        return new Change(Meaning.WHAT_IF, Optional.empty(), Optional.of(source), "");
    }

    /**
     * A source measured anew, independently.
     *
     * @param source source or group under its old name
     * @return the change
     */
    public static Change remeasured(Input source) {
        return new Change(Meaning.REMEASURED, Optional.empty(), Optional.of(source), "");
    }

    /**
     * A source improved by a measurement that contains the old one.
     *
     * @param source source or group under its old name
     * @return the change
     */
    public static Change updated(Input source) {
        return new Change(Meaning.UPDATED, Optional.empty(), Optional.of(source), "");
    }

    /**
     * A rung put in the place of its namesake, its changed data supposed different; or a new rung.
     *
     * @param rung the rung
     * @return the change
     */
    public static Change whatIf(Rung<?> rung) {
        return new Change(Meaning.WHAT_IF, Optional.of(rung), Optional.empty(), "");
    }

    /**
     * A rung put in the place of its namesake, its changed data measured anew.
     *
     * @param rung the rung
     * @return the change
     */
    public static Change remeasured(Rung<?> rung) {
        return new Change(Meaning.REMEASURED, Optional.of(rung), Optional.empty(), "");
    }

    /**
     * A rung put in the place of its namesake, its changed data containing the old ones.
     *
     * @param rung the rung
     * @return the change
     */
    public static Change updated(Rung<?> rung) {
        return new Change(Meaning.UPDATED, Optional.of(rung), Optional.empty(), "");
    }

    /**
     * A rung taken out; rungs that rested on it do so no more.
     *
     * @param rung its name
     * @return the change
     */
    public static Change dropped(String rung) {
        return new Change(Meaning.WHAT_IF, Optional.empty(), Optional.empty(), rung);
    }

    /**
     * What it means for errors.
     *
     * @return the meaning
     */
    public Meaning meaning() {
        return meaning;
    }

    Optional<Rung<?>> rung() {
        return rung;
    }

    Optional<Input> input() {
        return input;
    }

    String droppedRung() {
        return dropped;
    }

    /** The name of what is changed. */
    String name() {
        return rung.map(Rung::name).orElseGet(() -> input.map(Input::name).orElse(dropped));
    }
}
