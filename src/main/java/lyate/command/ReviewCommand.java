package lyate.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import lyate.molecule.MoleculeReader;
import lyate.report.ReportContext;
import lyate.report.ResultWriter;
import lyate.review.StepReviewer;
import lyate.sheet.BatchReview;
import lyate.sheet.Conditions;
import lyate.sheet.ReviewedRow;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetException;
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
@Command(name = "review", mixinStandardHelpOptions = true, sortOptions = false, description = {
    "Reviews every step of a route sheet and writes the sheet back with its verdicts.", "",
    "Columns read: step, substrate, site, base, base_equiv, solvent, temperature_C, concentration_M, water_ppm, electrophile,"
    + " amount_mmol or amount_g, base_titrated_M, notes; reaction (reaction SMILES) may stand in place of substrate. Other columns pass through.",
    "Columns added: verdict, probability, log_k, first_site, intended_percent, other_percent, findings.",
    "A row that cannot be used is named on standard error; the others are still reviewed.", "",
    "From a reaction come the substrate, the site and, where they are drawn, base, solvent and electrophile; a column reaction adds"
    + " reaction_site and reaction_confidence.",
    "A .smi or .sdf file is a list of substrates, all set against the conditions given as options. A .rxn or .rdf file is a list of"
    + " reactions; options stand in for what a reaction and its data items leave open.", ""})
final class ReviewCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "SHEET", description = "A CSV, .smi, .sdf, .rxn or .rdf file; - reads a CSV from standard input.")
    private String sheet;

    @Option(names = {"-o", "--output"}, paramLabel = "FILE", description = "Where the result goes, .csv or .json (default: CSV on standard output).")
    private Path output;

    @Option(names = "--resume", description = "Goes on where an earlier run with the same sheet, tables and -o was stopped.")
    private boolean resume;

    @Option(names = "--report", paramLabel = "REPORT", description = "A document for reading as well, .html or .pdf.")
    private Path report;

    @Option(names = "--threads", paramLabel = "N", description = "How many rows are reviewed at a time (default: one per core).")
    private Integer threads;

    @Option(names = "--base", paramLabel = "B", defaultValue = "", description = "For .smi, .sdf, .rxn and .rdf: by name or abbreviation, for example LDA.")
    private String base;

    @Option(names = "--solvent", paramLabel = "S", defaultValue = "", description = "For .smi, .sdf, .rxn and .rdf: by name or abbreviation, for example THF.")
    private String solvent;

    @Mixin
    private ConditionOptions conditions;

    @Mixin
    private TablesOption tables;

    ReviewCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException, SheetException {
        int workers = threads == null ? Runtime.getRuntime().availableProcessors() : threads;
        Conditions asked = conditions(workers);
        TableFolders folders = tables.folders();
        Stockroom stockroom = Stockroom.load(folders);
        MoleculeReader molecules = MoleculeReader.load(folders);
        StepReviewer reviewer = StepReviewer.load(folders, stockroom);
        BatchReview batch = new BatchReview(new StepReader(molecules, stockroom), reviewer);
        try (Stop stop = Stop.onSignal();
                RowInput input = new RowInput(sheet, asked, molecules, terminal);
                ReviewResult result = result(input, folders);
                ReportFile document = ReportFile.open(Optional.ofNullable(report), spec,
                        () -> ReportContext.of(title(), ProgramVersion.text(), folders, reviewer))) {
            BatchProgress progress = new BatchProgress(terminal, input::share, result.earlier());
            batch.run(stop.until(input.rows()), workers, reviewed -> {
                write(result, reviewed);
                write(document, reviewed);
                progress.add(reviewed);
            });
            if (stop.asked()) {
                progress.stopped(result.leave());
                return Failures.SOME_INPUT_NOT_USED;
            }
            result.finish();
            document.finish();
            return progress.finish() ? 0 : Failures.SOME_INPUT_NOT_USED;
        }
    }

    /** Checks the options against each other and gives those that stand for cells of a sheet. */
    private Conditions conditions(int workers) throws IOException {
        check(workers >= 1, "--threads: found " + workers + ", expected at least 1");
        check(!resume || output != null && !ReviewResult.isJson(output), "--resume: expected -o with a name that ends in .csv");
        check(!resume || report == null, "--resume: a report needs every step; make it in a run of its own");
        check(output == null || !output.equals(report), "-o and --report: found the same file twice");
        check(output == null || !Files.exists(output) || sheet.equals("-") || !Files.exists(Path.of(sheet))
                || !Files.isSameFile(output, Path.of(sheet)), "-o: the result would take the place of the sheet; give it another name");
        Map<SheetColumn, String> cells = conditions.cells();
        cells.put(SheetColumn.BASE, base);
        cells.put(SheetColumn.SOLVENT, solvent);
        if (RowInput.Kind.of(sheet) == RowInput.Kind.SHEET) {
            check(cells.values().stream().allMatch(String::isEmpty), "conditions as options go with .smi, .sdf, .rxn and .rdf files; a sheet has them in its cells");
        } else if (RowInput.Kind.of(sheet) != RowInput.Kind.REACTIONS) {
            check(!base.isEmpty() && !solvent.isEmpty(), "a .smi or .sdf file needs --base and --solvent");
        }
        return new Conditions(cells);
    }

    private void check(boolean sound, String problem) {
        if (!sound) {
            throw new ParameterException(spec.commandLine(), problem);
        }
    }

    private ReviewResult result(RowInput input, TableFolders folders) throws IOException {
        if (resume) {
            return ReviewResult.resume(UnfinishedResult.of(output, ProgramVersion.text(), folders), input.rows());
        }
        return ReviewResult.begin(Optional.ofNullable(output), file -> UnfinishedResult.of(file, ProgramVersion.text(), folders),
                input.rows(), terminal);
    }

    private String title() {
        return sheet.equals("-") ? "Route" : Path.of(sheet).getFileName().toString().replaceFirst("\\.[^.]*$", "");
    }

    private static void write(ResultWriter<ReviewedRow> writer, ReviewedRow reviewed) {
        try {
            writer.write(reviewed);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
