package distanceladder.text;

import java.util.List;

/** Parameters that data and priors together cannot tell apart. */
public final class RankFault extends Fault {
    private static final long serialVersionUID = 1;

    /** The parameters of the null vector. */
    private final String[] parameters;

    /**
     * A refusal.
     *
     * @param what what was wrong
     * @param rule the rule that it broke
     * @param where where it is, "" for nowhere
     * @param repair how to mend it
     * @param parameters the parameters of the null vector
     */
    public RankFault(String what, String rule, String where, String repair, List<String> parameters) {
        super(what, rule, where, repair);
        this.parameters = parameters.toArray(String[]::new);
    }

    /**
     * The parameters that cannot be told apart.
     *
     * @return their names
     */
    public List<String> parameters() {
        return List.of(parameters);
    }
}
