package lyate.command;

import java.io.IOException;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import lyate.molecule.MoleculeReader;
import lyate.report.DoseText;
import lyate.report.HtmlReport;
import lyate.report.JsonList;
import lyate.report.ReportContext;
import lyate.report.ResultWriter;
import lyate.report.ReviewJson;
import lyate.report.ReviewText;
import lyate.report.SheetCsv;
import lyate.review.DoseResponse;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.StepReviewer;
import lyate.sheet.ReviewedRow;
import lyate.sheet.RowException;
import lyate.sheet.SheetRow;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code lyate check}. */
@Command(name = "check", mixinStandardHelpOptions = true, sortOptions = false, description = {
    "Says what becomes of one deprotonation: which proton goes, how far, and what else the base does.", ""})
final class CheckCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Option(names = "--base", required = true, paramLabel = "B", description = "By name or abbreviation, for example LDA.")
    private String base;

    @Mixin
    private StepOptions step;

    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", converter = CheckFormat.Converter.class,
            description = "text, json, csv or html (default: text).")
    private CheckFormat format;

    @Mixin
    private TablesOption tables;

    CheckCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        TableFolders folders = tables.folders();
        Stockroom stockroom = Stockroom.load(folders);
        StepReader reader = new StepReader(MoleculeReader.load(folders), stockroom);
        SheetRow row = step.row(base);
        try {
            StepReviewer reviewer = StepReviewer.load(folders, stockroom);
            Review review = reviewer.review(reader.read(row));
            String title = review.step().base().name() + " in " + review.step().solvent().name();
            write(row, review, reviewer.doseResponse(review.step()), () -> ReportContext.of(title, ProgramVersion.text(), folders, reviewer));
            return 0;
        } catch (RowException e) {
            terminal.tell(StepOptions.words(e));
        } catch (ReviewException e) {
            terminal.tell(e.getMessage());
        }
        return Failures.SOME_INPUT_NOT_USED;
    }

    private void write(SheetRow row, Review review, DoseResponse dose, Supplier<ReportContext> context) throws IOException {
        switch (format) {
            case TEXT -> {
                new ReviewText(terminal.outWriter()).write(review);
                new DoseText(terminal.outWriter()).write(dose, review.intendedSite());
            }
            case CSV -> new SheetCsv(terminal.outWriter(), row.header()).begin().write(ReviewedRow.of(row, review));
            case JSON -> {
                ResultWriter<Review> json = new JsonList<>(terminal.outWriter(), ReviewJson::describe);
                json.write(review);
                json.finish();
            }
            case HTML -> {
                try (HtmlReport report = new HtmlReport(terminal.outWriter(), context.get())) {
                    report.write(ReviewedRow.of(row, review));
                    report.finish();
                }
            }
            default -> throw new IllegalStateException("no writer for " + format);
        }
    }
}
