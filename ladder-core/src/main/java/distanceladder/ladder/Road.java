package distanceladder.ladder;

/** How the draws of a Monte Carlo propagation are brought up the ladder. */
public enum Road {
    /** Each draw by the gains of the solution: exact where no relation is curved and nothing is decided. */
    GAINS("by gains, decisions held"),
    /** Each draw solved anew, relations linearised at its own points; scatters held. */
    RELINEARISED("relinearised in each draw, scatters held"),
    /** The whole procedure in each draw, scatters estimated again; data drawn about the fitted values. */
    REPEATED("the whole procedure repeated in each draw, data drawn about fitted values");

    private final String words;

    Road(String words) {
        this.words = words;
    }

    /**
     * The road in words.
     *
     * @return a phrase
     */
    public String words() {
        return words;
    }
}
