package lyate.command;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import lyate.molecule.MoleculeReader;
import lyate.report.JsonList;
import lyate.report.ReportContext;
import lyate.report.ResultWriter;
import lyate.report.RowJson;
import lyate.report.SheetCsv;
import lyate.review.Reviewer;
import lyate.review.StepReviewer;
import lyate.sheet.BatchReview;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetException;
import lyate.sheet.SheetReader;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code lyate review}. */
@Command(name = "review", mixinStandardHelpOptions = true, description = {
    "Reviews every step of a route sheet and writes the sheet back with its verdicts.", "",
    "Columns read: step, substrate, site, base, base_equiv, solvent, temperature_C, concentration_M, water_ppm, electrophile,"
    + " notes; reaction (reaction SMILES) may stand in place of substrate. Other columns pass through.",
    "Columns added: verdict, probability, log_k, first_site, intended_percent, other_percent, findings.",
    "A row that cannot be used is named on standard error; the others are still reviewed.", ""})
final class ReviewCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "SHEET", description = "A CSV file; - reads standard input.")
    private String sheet;

    @Option(names = {"-o", "--output"}, paramLabel = "FILE", description = "Where the result goes, .csv or .json (default: CSV on standard output).")
    private Path output;

    @Option(names = "--report", paramLabel = "REPORT", description = "A document for reading as well, .html or .pdf.")
    private Path report;

    @Option(names = "--threads", paramLabel = "N", description = "How many rows are reviewed at a time (default: one per core).")
    private Integer threads;

    @Mixin
    private TablesOption tables;

    ReviewCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException, SheetException {
        int workers = threads == null ? Runtime.getRuntime().availableProcessors() : threads;
        if (workers < 1) {
            throw new ParameterException(spec.commandLine(), "--threads: found " + workers + ", expected at least 1");
        }
        TableFolders folders = tables.folders();
        Stockroom stockroom = Stockroom.load(folders);
        StepReader steps = new StepReader(MoleculeReader.load(folders), stockroom);
        Reviewer reviewer = StepReviewer.load(folders, stockroom);
        BatchReview batch = new BatchReview(steps, reviewer);
        try (BufferedReader text = sheet.equals("-") ? terminal.reader() : Files.newBufferedReader(Path.of(sheet), StandardCharsets.UTF_8);
                ResultTarget target = new ResultTarget(Optional.ofNullable(output), terminal);
                ReportFile document = ReportFile.open(Optional.ofNullable(report), terminal, spec,
                        () -> ReportContext.of(title(), ProgramVersion.text(), folders, reviewer))) {
            SheetReader rows = new SheetReader(text);
            ResultWriter<ReviewedRow> writer = writer(target, rows);
            BatchProgress progress = new BatchProgress(terminal);
            batch.run(rows, workers, reviewed -> {
                write(writer, reviewed);
                write(document, reviewed);
                progress.add(reviewed);
            });
            writer.finish();
            target.keep();
            document.finish();
            return progress.finish() ? 0 : Failures.SOME_INPUT_NOT_USED;
        }
    }

    private String title() {
        return sheet.equals("-") ? "Route" : Path.of(sheet).getFileName().toString().replaceFirst("\\.[^.]*$", "");
    }

    private ResultWriter<ReviewedRow> writer(ResultTarget target, SheetReader rows) throws IOException {
        boolean json = output != null && output.toString().toLowerCase(Locale.ROOT).endsWith(".json");
        return json ? new JsonList<>(target.writer(), RowJson::describe) : new SheetCsv(target.writer(), rows.header());
    }

    private static void write(ResultWriter<ReviewedRow> writer, ReviewedRow reviewed) {
        try {
            writer.write(reviewed);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
