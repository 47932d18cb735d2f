package lyate.window;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.BooleanSupplier;
import java.util.function.IntConsumer;
import javax.swing.SwingUtilities;
import lyate.report.Words;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Reviewer;
import lyate.review.Verdict;
import lyate.sheet.SheetRow;

/** The verdicts of all rows of the sheet, worked out in the background; a row that says the same is not judged again. */
final class SheetReviews implements AutoCloseable {

    /**
     * What became of a row.
     *
     * @param verdict  the verdict, where there is one
     * @param sentence probability, or what is wrong with the row
     */
    record Judged(Optional<Verdict> verdict, String sentence) {}

    private final FieldReader reader;
    private final Reviewer reviewer;
    private final IntConsumer onProgress;
    private final Background background = new Background("sheet");
    private final Map<StepText, Judged> judged = new ConcurrentHashMap<>();

    /** @param onProgress told on the event thread how many rows are still to do */
    SheetReviews(FieldReader reader, Reviewer reviewer, IntConsumer onProgress) {
        this.reader = reader;
        this.reviewer = reviewer;
        this.onProgress = onProgress;
    }

    /** The verdict of a row as far as it is known. */
    Optional<Judged> of(SheetRow row) {
        return Optional.ofNullable(judged.get(StepCells.text(row)));
    }

    /** Judges the rows that are not judged yet. */
    void update(List<SheetRow> rows) {
        Map<StepText, SheetRow> due = new LinkedHashMap<>();
        rows.forEach(row -> due.put(StepCells.text(row), row));
        judged.keySet().retainAll(due.keySet());
        due.keySet().removeAll(judged.keySet());
        onProgress.accept(due.size());
        background.start(goOn -> judge(List.copyOf(due.keySet()), goOn), left -> onProgress.accept(left), message -> onProgress.accept(0));
    }

    /** Leaves the remaining rows unjudged until the sheet changes. */
    void cancel() {
        background.cancel();
        onProgress.accept(0);
    }

    private int judge(List<StepText> due, BooleanSupplier goOn) {
        int left = due.size();
        for (StepText text : due) {
            if (!goOn.getAsBoolean()) {
                return 0;
            }
            judged.put(text, judge(text));
            int remaining = --left;
            SwingUtilities.invokeLater(() -> {
                if (goOn.getAsBoolean()) {
                    onProgress.accept(remaining);
                }
            });
        }
        return 0;
    }

    private Judged judge(StepText text) {
        try {
            StepReading reading = reader.read(text);
            if (reading.step().isEmpty()) {
                return new Judged(Optional.empty(), String.join("; ", reading.problems().values()));
            }
            Review review = reviewer.review(reading.step().get());
            return new Judged(Optional.of(review.verdict()), Words.probability(review.probability()));
        } catch (ReviewException e) {
            return new Judged(Optional.empty(), e.getMessage());
        } catch (RuntimeException e) {
            return new Judged(Optional.empty(), "this row brought the program to a fault: " + e);
        }
    }

    @Override
    public void close() {
        background.close();
    }
}
