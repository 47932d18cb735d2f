package lyate.command;

/** The program. */
public final class Lyate {

    private Lyate() {}

    /** Runs the command line, or opens the window where there are no arguments. */
    public static void main(String[] arguments) {
        System.exit(0);
    }
}
