package lyate.command;

import java.io.IOException;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import lyate.acidity.AccuracyCheck;
import lyate.acidity.AccuracyReport;
import lyate.acidity.AcidityEstimator;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code lyate accuracy}. */
@Command(name = "accuracy", mixinStandardHelpOptions = true, description = {
    "Compares the program's pKa values with measured ones of your own.", "",
    "Columns read: smiles, solvent, pka; optionally site (for example O4) and role (acid or base).", ""})
final class AccuracyCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "FILE", description = "A CSV file of measured values.")
    private Path file;

    @Option(names = "--estimate-only", description = "Leaves the packaged measured values out, so that only estimates are compared.")
    private boolean estimateOnly;

    @Mixin
    private TablesOption tables;

    AccuracyCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        TableFolders folders = tables.folders();
        AcidityEstimator acidity = AcidityEstimator.load(folders);
        AccuracyCheck check = AccuracyCheck.of(new SiteFinder(SiteClasses.load(folders)),
                estimateOnly ? acidity.withoutMeasured() : acidity, Stockroom.load(folders));
        try (Reader csv = Files.newBufferedReader(file, StandardCharsets.UTF_8)) {
            AccuracyReport report = check.check(csv);
            terminal.outWriter().print(report.text());
            report.badRows().forEach(row -> terminal.tell("line " + row.line() + ": " + row.reason()));
            return report.badRows().isEmpty() ? 0 : Failures.SOME_INPUT_NOT_USED;
        } catch (IllegalArgumentException e) {
            throw new ParameterException(spec.commandLine(), file + ": " + e.getMessage());
        }
    }
}
