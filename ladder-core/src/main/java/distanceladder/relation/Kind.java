package distanceladder.relation;

/** The two kinds of error that the trade states apart. */
public enum Kind {
    /** Averages down with more data of the same sort. */
    STATISTICAL,
    /** Common to many data, and not made smaller by more of them. */
    SYSTEMATIC
}
