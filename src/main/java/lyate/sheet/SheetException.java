package lyate.sheet;

/** A sheet cannot be used as a whole; the message says why in words for the person who wrote it. */
public final class SheetException extends Exception {

    private static final long serialVersionUID = 1L;

    public SheetException(String message) {
        super(message);
    }
}
