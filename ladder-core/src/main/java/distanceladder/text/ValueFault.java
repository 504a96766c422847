package distanceladder.text;

/** A number, unit, length or cell of a table that breaks a rule. */
public final class ValueFault extends Fault {
    private static final long serialVersionUID = 1;

    /**
     * A refusal.
     *
     * @param what what was wrong
     * @param rule the rule that it broke
     * @param where where it is, "" for nowhere
     * @param repair how to mend it
     */
    public ValueFault(String what, String rule, String where, String repair) {
        super(what, rule, where, repair);
    }
}
