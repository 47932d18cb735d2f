package lyate.sheet;

import java.util.Iterator;
import java.util.Optional;
import java.util.function.Consumer;
import lyate.review.ReviewException;
import lyate.review.Reviewer;

/**
 * Reviews the rows of a sheet as a stream: in order, on several threads, in memory that does not grow with the sheet.
 * A row that cannot be judged says why and stops nothing.
 *
 * @param steps    turns rows into steps
 * @param reviewer judges them
 */
public record BatchReview(StepReader steps, Reviewer reviewer) {

    /** Reviews every row and hands the results on in order, on the calling thread. */
    public void run(Iterator<SheetRow> rows, int threads, Consumer<ReviewedRow> results) {
        new OrderedWork(threads).run(rows, this::review, results);
    }

    /** Reviews one row. */
    public ReviewedRow review(SheetRow row) {
        try {
            return new ReviewedRow(row, Optional.of(reviewer.review(steps.read(row))), "");
        } catch (RowException | ReviewException e) {
            return new ReviewedRow(row, Optional.empty(), e.getMessage());
        } catch (RuntimeException | StackOverflowError e) {
            return new ReviewedRow(row, Optional.empty(), ProgramError.words(e));
        }
    }
}
