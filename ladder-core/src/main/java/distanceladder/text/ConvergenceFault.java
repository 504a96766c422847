package distanceladder.text;

/** An iteration that did not come to rest. */
public final class ConvergenceFault extends Fault {
    private static final long serialVersionUID = 1;

    /**
     * A refusal.
     *
     * @param what what was wrong
     * @param rule the rule that it broke
     * @param where where it is, "" for nowhere
     * @param repair how to mend it
     */
    public ConvergenceFault(String what, String rule, String where, String repair) {
        super(what, rule, where, repair);
    }
}
