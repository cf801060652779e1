package twofold.session;

/** How saving ended. */
public enum Saving {
    /** The file holds the design. */
    DONE,
    /** The document has no file yet, as a new one or a sample: it can only be saved as one. Nothing was written. */
    NEEDS_NAME,
    /** The file is no longer what was read or saved: another program changed it. Nothing was written. */
    CHANGED_ON_DISK,
    /** It could not be written; why is shown. The file holds what it held. */
    FAILED
}
