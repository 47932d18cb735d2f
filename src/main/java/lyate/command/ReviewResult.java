package lyate.command;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import lyate.report.FinishedRows;
import lyate.report.JsonList;
import lyate.report.ResultWriter;
import lyate.report.RowJson;
import lyate.report.SheetCsv;
import lyate.sheet.ReviewedRow;
import lyate.sheet.RowSource;

/** The reviewed sheet on its way out; each row is safe with the system before the next one is written. */
final class ReviewResult implements ResultWriter<ReviewedRow>, AutoCloseable {

    private final Optional<UnfinishedResult> file;
    private final FinishedRows earlier;
    private final ResultTarget target;
    private final ResultWriter<ReviewedRow> writer;

    private ReviewResult(Optional<UnfinishedResult> file, FinishedRows earlier, ResultTarget target, RowSource rows) throws IOException {
        this.file = file;
        this.earlier = earlier;
        this.target = target;
        this.writer = writer(rows);
    }

    /** Goes to standard output where there is no file to go to. */
    static ReviewResult begin(Optional<Path> output, Function<Path, UnfinishedResult> naming, RowSource rows, Terminal terminal)
            throws IOException {
        Optional<UnfinishedResult> file = output.map(naming);
        if (file.isEmpty()) {
            return new ReviewResult(file, new FinishedRows(0, 0, 0), ResultTarget.standardOutput(terminal), rows);
        }
        List<Path> left = file.get().all();
        if (!left.isEmpty()) {
            throw new IOException(left.get(0) + " holds what a run that was stopped has finished: continue it with --resume, or delete it");
        }
        return opened(file.get(), new FinishedRows(0, 0, 0), rows);
    }

    /** Draws the rows that an earlier run has finished, and goes on after them. */
    static ReviewResult resume(UnfinishedResult file, RowSource rows) throws IOException {
        List<Path> left = file.all();
        if (!left.isEmpty() && !file.isThere()) {
            throw new IOException(left.get(0) + " was made with other tables or another version of the program and cannot be continued;"
                    + " delete it to start again");
        }
        return opened(file, file.isThere() ? FinishedRows.read(file.part(), rows) : new FinishedRows(0, 0, 0), rows);
    }

    private static ReviewResult opened(UnfinishedResult file, FinishedRows earlier, RowSource rows) throws IOException {
        ResultTarget target = ResultTarget.growing(file.result(), file.part(), earlier.bytes());
        return new ReviewResult(Optional.of(file), earlier, target, rows);
    }

    private ResultWriter<ReviewedRow> writer(RowSource rows) throws IOException {
        if (file.isPresent() && isJson(file.get().result())) {
            return new JsonList<>(target.writer(), RowJson::describe);
        }
        SheetCsv csv = new SheetCsv(target.writer(), rows.header());
        return earlier.bytes() > 0 ? csv : csv.begin();
    }

    static boolean isJson(Path file) {
        return file.toString().toLowerCase(Locale.ROOT).endsWith(".json");
    }

    /** What was there before this run. */
    FinishedRows earlier() {
        return earlier;
    }

    @Override
    public void write(ReviewedRow row) throws IOException {
        try {
            writer.write(row);
            target.flush();
        } catch (IOException e) {
            if (file.isEmpty()) {
                throw e;
            }
            throw new IOException("the result cannot be written: " + e.getMessage() + "; finished rows" + kept(), e);
        }
    }

    /** Where finished rows are, in words; empty where they went to standard output. */
    private String kept() {
        return file.map(unfinished -> " are in " + unfinished.part() + (isJson(unfinished.result()) ? "" : ", --resume goes on from there")).orElse("");
    }

    @Override
    public void finish() throws IOException {
        writer.finish();
        target.keep();
    }

    /** Leaves what there is in order, under the name of an unfinished result; says where, in words. */
    String leave() throws IOException {
        writer.finish();
        target.flush();
        return file.isEmpty() ? "" : "; they" + kept();
    }

    @Override
    public void close() throws IOException {
        target.close();
    }
}
