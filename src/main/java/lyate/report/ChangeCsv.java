package lyate.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import lyate.review.Review;
import lyate.sheet.ReviewedRow;

/** Changes between two reviews of a route as CSV, one row per step. */
public final class ChangeCsv {

    private final SafeCsv csv;

    public ChangeCsv(Appendable out) {
        this.csv = new SafeCsv(out);
    }

    /** Writes the header and a row per step, unchanged ones included. */
    public void write(List<RowChange> changes) throws IOException {
        csv.row(List.of("step", "change", "old_verdict", "new_verdict", "old_probability", "new_probability", "old_log_k", "new_log_k",
                "old_first_site", "new_first_site", "findings_gained", "findings_lost", "why"));
        for (RowChange change : changes) {
            csv.row(cells(change));
        }
    }

    private static List<String> cells(RowChange change) {
        Optional<Review> before = change.before().flatMap(ReviewedRow::review);
        Optional<Review> after = change.after().flatMap(ReviewedRow::review);
        List<String> cells = new ArrayList<>(List.of(change.step(), change.kind().words(), change.verdictBefore(), change.verdictAfter()));
        for (Function<Review, String> cell : List.<Function<Review, String>>of(review -> Numbers.fixed(review.probability(), 3),
                review -> Numbers.fixed(review.logK(), 2), Review::firstSite)) {
            cells.add(before.map(cell).orElse(""));
            cells.add(after.map(cell).orElse(""));
        }
        List<String> codesBefore = before.map(ChangeReasons::codes).orElse(List.of());
        List<String> codesAfter = after.map(ChangeReasons::codes).orElse(List.of());
        cells.add(String.join(";", ChangeReasons.without(codesAfter, codesBefore)));
        cells.add(String.join(";", ChangeReasons.without(codesBefore, codesAfter)));
        cells.add(String.join("; ", change.why()).replace('\u00a0', ' '));
        return cells;
    }
}
