package distanceladder.text;

/** A name that is unknown, stands twice, or means two different things. */
public final class NameFault extends Fault {
    private static final long serialVersionUID = 1;

    /**
     * A refusal.
     *
     * @param what what was wrong
     * @param rule the rule that it broke
     * @param where where it is, "" for nowhere
     * @param repair how to mend it
     */
    public NameFault(String what, String rule, String where, String repair) {
        super(what, rule, where, repair);
    }
}
