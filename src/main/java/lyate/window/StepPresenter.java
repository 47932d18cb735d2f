package lyate.window;

import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeDrawing;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Reviewer;
import lyate.review.Step;

/**
 * Reads and reviews what is typed, away from the event thread, and delivers on it. A step that is overtaken by a later one
 * is never delivered.
 */
final class StepPresenter implements AutoCloseable {

    /** Long enough to swallow key repeats, short enough not to be noticed. */
    private static final int SETTLE_MILLIS = 25;

    private final FieldReader reader;
    private final Reviewer reviewer;
    private final Consumer<Outcome> receiver;
    private final AtomicLong latest = new AtomicLong();
    private final ScheduledExecutorService worker = Executors.newSingleThreadScheduledExecutor(task -> {
        Thread thread = new Thread(task, "review");
        thread.setDaemon(true);
        return thread;
    });
    /** The last drawing, kept because the layout is the dearest part; touched by the worker alone. */
    private Drawn drawn;

    StepPresenter(FieldReader reader, Reviewer reviewer, Consumer<Outcome> receiver) {
        this.reader = reader;
        this.reviewer = reviewer;
        this.receiver = receiver;
    }

    /** Asks for a step; returns at once. */
    void submit(StepText text) {
        long ticket = latest.incrementAndGet();
        worker.schedule(() -> run(text, ticket), SETTLE_MILLIS, TimeUnit.MILLISECONDS);
    }

    @Override
    public void close() {
        worker.shutdownNow();
    }

    private void run(StepText text, long ticket) {
        if (ticket != latest.get()) {
            return;
        }
        Outcome outcome = outcome(text);
        SwingUtilities.invokeLater(() -> {
            if (ticket == latest.get()) {
                receiver.accept(outcome);
            }
        });
    }

    private Outcome outcome(StepText text) {
        try {
            StepReading reading = reader.read(text);
            if (reading.step().isEmpty()) {
                return new Outcome(text, Optional.empty(), reading.problems());
            }
            Step step = reading.step().get();
            Review review = reviewer.review(step);
            return new Outcome(text, Optional.of(new Shown(review, draw(step.substrate()))), Map.of());
        } catch (ReviewException e) {
            return new Outcome(text, Optional.empty(), Map.of(StepField.SUBSTRATE, e.getMessage()));
        } catch (RuntimeException e) {
            // The window must outlive a fault in the engine; the text says it is ours, not the user's.
            return new Outcome(text, Optional.empty(), Map.of(StepField.SUBSTRATE, "this step brought the program to a fault: " + e));
        }
    }

    private MoleculeDrawing draw(Molecule substrate) {
        if (drawn == null || !drawn.input().equals(substrate.input())) {
            drawn = new Drawn(substrate.input(), MoleculeDrawing.of(substrate));
        }
        return drawn.drawing();
    }

    private record Drawn(String input, MoleculeDrawing drawing) {}
}
