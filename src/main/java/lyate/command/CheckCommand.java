package lyate.command;

import java.io.IOException;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import lyate.command.BenchOptions.Answers;
import lyate.molecule.MoleculeReader;
import lyate.report.DoseText;
import lyate.report.HtmlReport;
import lyate.report.JsonList;
import lyate.report.ProtonationJson;
import lyate.report.ProtonationText;
import lyate.report.ReportContext;
import lyate.report.ResultWriter;
import lyate.report.ReviewJson;
import lyate.report.ReviewText;
import lyate.report.SheetCsv;
import lyate.review.BaseChoice;
import lyate.review.DoseResponse;
import lyate.review.Protonation;
import lyate.review.ProtonationReviewer;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.SiteOrigin;
import lyate.review.StepReviewer;
import lyate.sheet.ReviewedRow;
import lyate.sheet.RowException;
import lyate.sheet.SheetRow;
import lyate.sheet.StepReader;
import lyate.stock.Acid;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** {@code lyate check}. */
@Command(name = "check", mixinStandardHelpOptions = true, sortOptions = false, description = {
    "Says what becomes of one deprotonation: which proton goes, how far, and what else the base does.",
    "With an acid in place of the base: whether it makes a salt of a basic site.",
    "From a reaction the site is worked out, and how sure that is is said beside it.", ""})
final class CheckCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Mixin
    private CheckInput input;

    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", converter = CheckFormat.Converter.class,
            description = "text, json, csv or html (default: text).")
    private CheckFormat format;

    @Mixin
    private BenchOptions bench;

    @Mixin
    private TablesOption tables;

    CheckCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        TableFolders folders = tables.folders();
        Stockroom stockroom = Stockroom.load(folders);
        MoleculeReader molecules = MoleculeReader.load(folders);
        StepReader steps = new StepReader(molecules, stockroom);
        SheetRow row = input.row();
        try {
            Optional<Acid> acid = acid(stockroom);
            Optional<SiteOrigin> drawn = steps.drawnSite(row);
            if (acid.isPresent() || input.base().isEmpty() && drawn.filter(SiteOrigin::arrives).isPresent()) {
                protonation(row, ProtonationReviewer.load(folders, stockroom).review(steps.read(row, acid)));
                drawn.filter(origin -> !origin.sure()).ifPresent(origin -> terminal.tell("--reaction: " + origin.confidence()));
            } else {
                StepReviewer reviewer = StepReviewer.load(folders, stockroom);
                Review review = reviewer.review(steps.read(row));
                Answers answers = bench.ask(review, folders, stockroom, molecules);
                String title = review.step().base().name() + " in " + review.step().solvent().name();
                Optional<Solvent> better = new BaseChoice(reviewer, stockroom).betterSolvent(review.step());
                write(row, review, answers, better, reviewer.doseResponse(review.step()),
                        () -> ReportContext.of(title, ProgramVersion.text(), folders, reviewer));
            }
            return 0;
        } catch (RowException e) {
            terminal.tell(StepOptions.words(e));
        } catch (UnknownNameException e) {
            terminal.tell("--acid: " + e.getMessage());
        } catch (ReviewException e) {
            terminal.tell(e.getMessage());
        }
        return Failures.SOME_INPUT_NOT_USED;
    }

    /** The acid named; also where an acid was named as the base and no base goes by that name. */
    private Optional<Acid> acid(Stockroom stockroom) throws UnknownNameException {
        return input.acid() != null ? Optional.of(stockroom.acid(input.acid())) : stockroom.acidNamedAsBase(input.base());
    }

    private void protonation(SheetRow row, Protonation protonation) throws IOException {
        switch (format) {
            case TEXT -> new ProtonationText(terminal.outWriter()).write(protonation);
            case CSV -> new SheetCsv(terminal.outWriter(), row.header()).begin().write(row, protonation);
            case JSON -> {
                ResultWriter<Protonation> json = new JsonList<>(terminal.outWriter(), ProtonationJson::describe);
                json.write(protonation);
                json.finish();
            }
            default -> throw new ParameterException(spec.commandLine(), "--format: a protonation can be written as text, csv or json");
        }
    }

    private void write(SheetRow row, Review review, Answers answers, Optional<Solvent> better, DoseResponse dose,
                       Supplier<ReportContext> context) throws IOException {
        switch (format) {
            case TEXT -> {
                new ReviewText(terminal.outWriter()).write(review);
                new DoseText(terminal.outWriter()).write(dose, review.intendedSite());
                better.ifPresent(solvent -> terminal.outWriter().println("  The solvent is the problem: in " + solvent.name() + " "
                        + review.step().base().name() + " would do."));
                answers.write(review, terminal.outWriter());
            }
            case CSV -> new SheetCsv(terminal.outWriter(), row.header()).begin().write(ReviewedRow.of(row, review));
            case JSON -> {
                ResultWriter<Review> json = new JsonList<>(terminal.outWriter(), asked -> {
                    Map<String, Object> object = ReviewJson.describe(asked);
                    object.putAll(answers.describe());
                    return object;
                });
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
