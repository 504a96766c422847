package distanceladder.text;

/** A ladder that does not hang together: a cycle, a missing rung, a rung without data, a missing calibrator. */
public final class GraphFault extends Fault {
    private static final long serialVersionUID = 1;

    /**
     * A refusal.
     *
     * @param what what was wrong
     * @param rule the rule that it broke
     * @param where where it is, "" for nowhere
     * @param repair how to mend it
     */
    public GraphFault(String what, String rule, String where, String repair) {
        super(what, rule, where, repair);
    }
}
