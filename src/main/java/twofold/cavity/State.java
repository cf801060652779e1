package twofold.cavity;

/** Whether a plane has a mode. */
public enum State {
    /** |half trace| below 1: a beam that returns into itself. */
    STABLE("stable"),
    /** |half trace| above 1: no such beam. */
    UNSTABLE("unstable"),
    /** 1 − |half trace| is not above the rounding of the chain: neither can be said. */
    EDGE("edge");

    private final String word;

    State(String word) {
        this.word = word;
    }

    /** The word in answers. */
    public String word() {
        return word;
    }
}
