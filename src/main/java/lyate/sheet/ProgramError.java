package lyate.sheet;

/** A fault of the program itself costs the row it happened in and no other. */
final class ProgramError {

    private ProgramError() {}

    static String words(Throwable fault) {
        String detail = fault.getMessage() == null ? "" : ": " + fault.getMessage().lines().findFirst().orElse("");
        return "the program failed on this row, please report it (" + fault.getClass().getSimpleName() + detail + ")";
    }
}
