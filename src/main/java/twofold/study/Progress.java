package twofold.study;

/** Is told how far a study has come, and can stop it. */
@FunctionalInterface
public interface Progress {
    /** Goes on to the end and says nothing. */
    Progress SILENT = share -> true;

    /**
     * How far the study has come.
     *
     * @param share from 0 to 1
     * @return whether to go on; false stops it
     */
    boolean at(double share);
}
