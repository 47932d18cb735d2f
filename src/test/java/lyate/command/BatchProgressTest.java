package lyate.command;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.concurrent.atomic.AtomicReference;
import lyate.report.FinishedRows;
import lyate.review.Review;
import lyate.review.Verdict;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetHeader;
import lyate.sheet.SheetRow;
import org.junit.jupiter.api.Test;

/** What a person who watches a long run is told. */
class BatchProgressTest {

    private final ByteArrayOutputStream err = new ByteArrayOutputStream();
    private final AtomicReference<Double> share = new AtomicReference<>(0.0);

    @Test
    void rateAndRemainingTime() {
        BatchProgress progress = progress(false, 0);
        share.set(0.25);
        assertEquals("1000 rows, 100 a second, 30 s left", progress.words(1000, 10));
        share.set(0.01);
        assertEquals("1000 rows, 100 a second, 16 min 30 s left", progress.words(1000, 10));
        share.set(0.0001);
        assertEquals("1000 rows, 100 a second, 27 h 46 min left", progress.words(1000, 10));
    }

    @Test
    void onlyTheRateWhereNobodyKnowsHowMuchIsLeft() {
        assertEquals("500 rows, 250 a second", progress(false, 0).words(500, 2));
    }

    @Test
    void rowsOfAnEarlierRunCountButNotForTheRate() {
        share.set(0.5);
        BatchProgress progress = progress(false, 5000);
        share.set(0.75);
        assertEquals("7000 rows, 100 a second, 20 s left", progress.words(2000, 20));
        assertEquals("5000 rows were finished before\n", err.toString(StandardCharsets.UTF_8).replace("\r", ""));
    }

    @Test
    void nothingIsShownWhereNobodyWatches() throws InterruptedException {
        run(progress(false, 0));
        assertEquals("", err.toString(StandardCharsets.UTF_8));
    }

    @Test
    void oneLineIsWrittenOverWhereSomebodyWatches() throws InterruptedException {
        run(progress(true, 0));
        String shown = err.toString(StandardCharsets.UTF_8);
        assertTrue(shown.contains("2 rows, "), shown);
        assertTrue(shown.endsWith("\r") && !shown.contains("\n"), shown);
    }

    private static void run(BatchProgress progress) throws InterruptedException {
        SheetRow row = new SheetRow(new SheetHeader(List.of("substrate")), 1, 2, List.of("C"), "");
        // Nobody looks into the review.
        Review review = new Review(null, Verdict.SELECTIVE, 1, Map.of(), "C1", "C1", "", 5, 100, 0, List.of(), List.of(), List.of(), List.of());
        progress.add(ReviewedRow.of(row, review));
        Thread.sleep(600);
        progress.add(ReviewedRow.of(row, review));
        progress.finish();
    }

    private BatchProgress progress(boolean watched, int earlier) {
        return new BatchProgress(Terminal.of(new ByteArrayInputStream(new byte[0]), new ByteArrayOutputStream(), err, watched), share::get,
                new FinishedRows(earlier, 0, 0));
    }
}
