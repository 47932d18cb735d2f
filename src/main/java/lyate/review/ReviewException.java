package lyate.review;

/** A step cannot be judged; the message says why in words for the person who wrote the step. */
public final class ReviewException extends Exception {

    private static final long serialVersionUID = 1L;

    public ReviewException(String message) {
        super(message);
    }
}
