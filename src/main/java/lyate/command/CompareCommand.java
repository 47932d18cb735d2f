package lyate.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import lyate.molecule.MoleculeReader;
import lyate.report.ChangeCsv;
import lyate.report.ChangeText;
import lyate.report.RowChange;
import lyate.review.StepReviewer;
import lyate.sheet.BatchReview;
import lyate.sheet.ReviewedRow;
import lyate.sheet.RouteSheet;
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

/** {@code lyate compare}. */
@Command(name = "compare", mixinStandardHelpOptions = true, sortOptions = false, description = {
    "Sets two route sheets side by side, or one sheet under two sets of tables, and says which verdicts changed and why.", "",
    "Steps of the same name belong together.", ""})
final class CompareCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Parameters(index = "0", paramLabel = "OLD", description = "A route sheet.")
    private Path before;

    @Parameters(index = "1", paramLabel = "NEW", arity = "0..1", description = "A later one; may be left out with --against.")
    private Path after;

    @Mixin
    private TablesOption tables;

    @Option(names = "--against", paramLabel = "DIR", description = "A folder of tables for the second review, in place of --tables. May be repeated.")
    private List<Path> against = List.of();

    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", description = "text or csv (default: text).")
    private Format format;

    CompareCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException, SheetException {
        check();
        TableFolders folders = tables.folders();
        List<ReviewedRow> old = reviewed(before, folders);
        List<ReviewedRow> late = reviewed(after == null ? before : after, against.isEmpty() ? folders : new TableFolders(against));
        List<RowChange> changes = RowChange.between(old, late);
        if (format == Format.CSV) {
            new ChangeCsv(terminal.outWriter()).write(changes);
        } else {
            new ChangeText(terminal.outWriter()).write(changes);
        }
        boolean used = old.stream().allMatch(row -> row.review().isPresent()) && late.stream().allMatch(row -> row.review().isPresent());
        return used ? 0 : Failures.SOME_INPUT_NOT_USED;
    }

    private void check() {
        if (after == null && against.isEmpty()) {
            throw new ParameterException(spec.commandLine(), "nothing to compare with: expected a second sheet or --against");
        }
        if (format == Format.JSON) {
            throw new ParameterException(spec.commandLine(), "--format: found 'json', expected text or csv");
        }
        for (Path folder : against) {
            if (!Files.isDirectory(folder)) {
                throw new ParameterException(spec.commandLine(), "there is no folder " + folder);
            }
        }
    }

    private List<ReviewedRow> reviewed(Path sheet, TableFolders folders) throws IOException, SheetException {
        Stockroom stockroom = Stockroom.load(folders);
        StepReader steps = new StepReader(MoleculeReader.load(folders), stockroom);
        List<ReviewedRow> rows = new ArrayList<>();
        new BatchReview(steps, StepReviewer.load(folders, stockroom)).run(RouteSheet.read(sheet).rows().iterator(),
                Runtime.getRuntime().availableProcessors(), row -> {
                    rows.add(row);
                    if (row.review().isEmpty()) {
                        terminal.tell(sheet + ": " + row.row().place() + ": " + row.problem());
                    }
                });
        return rows;
    }
}
