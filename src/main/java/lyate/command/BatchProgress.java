package lyate.command;

import java.util.Locale;
import lyate.sheet.ReviewedRow;

/** Counts rows, names those that could not be used, and shows the rate where a person watches. */
final class BatchProgress {

    private static final long NANOS_BETWEEN = 1_000_000_000L;

    private final Terminal terminal;
    private final long start = System.nanoTime();
    private long shown = start;
    private int rows;
    private int refused;

    BatchProgress(Terminal terminal) {
        this.terminal = terminal;
    }

    void add(ReviewedRow reviewed) {
        rows++;
        if (reviewed.review().isEmpty()) {
            refused++;
            terminal.tell(reviewed.row().place() + ": " + reviewed.problem());
        }
        long now = System.nanoTime();
        if (terminal.interactive() && now - shown > NANOS_BETWEEN) {
            shown = now;
            terminal.tell(String.format(Locale.ROOT, "%d rows, %.0f a second", rows, rows * 1e9 / (now - start)));
        }
    }

    /** Sums up; whether every row could be used. */
    boolean finish() {
        if (refused > 0) {
            terminal.tell(rows + " rows, " + refused + " of them could not be used");
        }
        return refused == 0;
    }
}
