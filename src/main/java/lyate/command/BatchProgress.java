package lyate.command;

import java.util.Locale;
import java.util.function.DoubleSupplier;
import lyate.report.FinishedRows;
import lyate.sheet.ReviewedRow;

/** Counts rows, names those that could not be used, and shows rate and remaining time where a person watches. */
final class BatchProgress {

    private static final long NANOS_BETWEEN = 500_000_000L;
    private static final double NANOS = 1e9;
    private static final String CLEAR = "\r" + " ".repeat(70) + "\r";

    private final Terminal terminal;
    private final DoubleSupplier share;
    private final FinishedRows earlier;
    private final long start = System.nanoTime();
    private final double shareAtStart;
    private long shown = start;
    private int rows;
    private int refused;

    /**
     * @param share   share of the input that is read, 0 to 1; 0 where nobody knows
     * @param earlier what an earlier run has done
     */
    BatchProgress(Terminal terminal, DoubleSupplier share, FinishedRows earlier) {
        this.terminal = terminal;
        this.share = share;
        this.earlier = earlier;
        this.shareAtStart = share.getAsDouble();
        if (earlier.rows() > 0) {
            terminal.tell(earlier.rows() + " rows were finished before");
        }
    }

    void add(ReviewedRow reviewed) {
        rows++;
        if (reviewed.review().isEmpty()) {
            refused++;
            clear();
            terminal.tell(reviewed.row().place() + ": " + reviewed.problem());
        }
        long now = System.nanoTime();
        if (terminal.watched() && now - shown > NANOS_BETWEEN) {
            shown = now;
            show(CLEAR + words(rows, (now - start) / NANOS));
        }
    }

    /** For example {@code 12400 rows, 812 a second, 2 min 05 s left}. */
    String words(int done, double seconds) {
        String rate = String.format(Locale.ROOT, "%d rows, %.0f a second", earlier.rows() + done, done / seconds);
        double before = shareAtStart;
        double now = share.getAsDouble();
        return now <= before ? rate : rate + ", " + time(seconds * (1 - now) / (now - before)) + " left";
    }

    private static String time(double seconds) {
        long whole = Math.round(seconds);
        return whole < 60 ? whole + " s" : whole < 3600 ? String.format(Locale.ROOT, "%d min %02d s", whole / 60, whole % 60)
                : String.format(Locale.ROOT, "%d h %02d min", whole / 3600, whole / 60 % 60);
    }

    /** Sums up; whether every row could be used. */
    boolean finish() {
        clear();
        if (refused + earlier.refused() > 0) {
            terminal.tell(all() + " rows, " + (refused + earlier.refused()) + " of them could not be used");
        }
        return refused + earlier.refused() == 0;
    }

    /** Says that the run was stopped, and what is left of it. */
    void stopped(String where) {
        clear();
        terminal.tell("stopped after " + all() + " rows" + where);
    }

    private int all() {
        return earlier.rows() + rows;
    }

    private void clear() {
        if (terminal.watched() && shown != start) {
            show(CLEAR);
        }
    }

    private void show(String text) {
        terminal.errWriter().print(text);
        terminal.errWriter().flush();
    }
}
