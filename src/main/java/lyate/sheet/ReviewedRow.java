package lyate.sheet;

import java.util.Optional;
import lyate.review.Review;

/**
 * A row and what became of it.
 *
 * @param row     as it was read
 * @param review  present where the row could be judged
 * @param problem in words where it could not; else empty
 */
public record ReviewedRow(SheetRow row, Optional<Review> review, String problem) {

    /** A row that could be judged. */
    public static ReviewedRow of(SheetRow row, Review review) {
        return new ReviewedRow(row, Optional.of(review), "");
    }
}
