package twofold;
/** Start. */
public final class Main {
    private Main() {}
    /** Runs. */
    public static void main(String[] args) {
        System.exit(0);
    }
}
