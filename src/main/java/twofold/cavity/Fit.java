package twofold.cavity;

/** Whether a trial's numbers make a plan. */
public enum Fit {
    /** They do. */
    FITS,
    /** Parts overlap or do not fit their leg. */
    TOO_SHORT,
    /** A mirror is met at 89° or more, or straight through. */
    GRAZING
}
