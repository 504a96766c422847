package distanceladder.text;

/**
 * A refusal that tells what was wrong, the rule that it broke, where, and how to mend it.
 *
 * <p>All refusals of this library are of its five kinds, none of them checked.
 */
public sealed class Fault extends RuntimeException
        permits ValueFault, NameFault, GraphFault, RankFault, ConvergenceFault {
    private static final long serialVersionUID = 1;

    /** What was wrong. */
    private final String what;

    /** The rule that it broke. */
    private final String rule;

    /** Where it is. */
    private final String where;

    /** How to mend it. */
    private final String repair;

    Fault(String what, String rule, String where, String repair) {
        super(what + "\n  rule:   " + rule + (where.isEmpty() ? "" : "\n  where:  " + where) + "\n  repair: " + repair);
        this.what = what;
        this.rule = rule;
        this.where = where;
        this.repair = repair;
    }

    /**
     * What was wrong.
     *
     * @return such as {@code parallax error = -0.02 mas}
     */
    public final String what() {
        return what;
    }

    /**
     * The rule that it broke.
     *
     * @return one sentence
     */
    public final String rule() {
        return rule;
    }

    /**
     * Where it is.
     *
     * @return rung, table, line or datum; "" when there is no place to name
     */
    public final String where() {
        return where;
    }

    /**
     * How to mend it.
     *
     * @return one sentence
     */
    public final String repair() {
        return repair;
    }
}
