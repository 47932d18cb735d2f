package lyate.command;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.SortedSet;
import java.util.concurrent.Callable;
import java.util.function.Consumer;
import java.util.stream.Stream;
import lyate.acidity.AcidityEstimator;
import lyate.bench.Enthalpies;
import lyate.bench.QuenchHazards;
import lyate.molecule.MoleculeReader;
import lyate.review.AcidHazards;
import lyate.review.RuleExamples;
import lyate.review.RuleTables;
import lyate.review.StepReviewer;
import lyate.site.SiteClasses;
import lyate.stock.Stockroom;
import lyate.table.NearestNames;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableListing;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** {@code lyate tables}. */
@Command(name = "tables", mixinStandardHelpOptions = true, description = {
    "Lists the tables in use, or checks a folder of your own tables.", ""})
final class TablesCommand implements Callable<Integer> {

    /** Together they read every table; those that name no other table first. */
    private static final List<Consumer<TableFolders>> READERS = Stream.of(
            Stream.<Consumer<TableFolders>>of(Stockroom::load, MoleculeReader::load, SiteClasses::load, AcidityEstimator::load, Enthalpies::load),
            RuleTables.cellChecks().stream(),
            Stream.<Consumer<TableFolders>>of(StepReviewer::load, folders -> QuenchHazards.load(folders, Stockroom.load(folders)),
                    folders -> AcidHazards.load(folders, Stockroom.load(folders)))).flatMap(readers -> readers).toList();

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Option(names = "--check", paramLabel = "DIR",
            description = "Reads the tables of this folder over the packaged ones and names every bad cell.")
    private Path checked;

    @Mixin
    private TablesOption tables;

    TablesCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        return checked == null ? list(tables.folders()) : check();
    }

    private int list(TableFolders folders) {
        for (TableListing.Copy copy : TableListing.of(folders)) {
            terminal.outWriter().print(String.format(Locale.ROOT, "%-26s %5d rows  version %-3s %s%n%26s %s%n", copy.fileName(),
                    copy.rows(), copy.version(), copy.origin(), "", copy.summary()).replace(System.lineSeparator(), "\n"));
        }
        return 0;
    }

    private int check() {
        if (!Files.isDirectory(checked)) {
            throw new ParameterException(spec.commandLine(), "there is no folder " + checked);
        }
        SortedSet<String> known = TableListing.packagedNames();
        boolean sound = true;
        for (String name : TableListing.csvFiles(checked)) {
            if (!known.contains(name)) {
                sound = false;
                terminal.tell(checked.resolve(name) + ": there is no table of this name; nearest: "
                        + String.join(", ", NearestNames.of(name, known, 3)));
            }
        }
        TableFolders folders = TableFolders.overlaidBy(checked);
        // Several readers need the same table; what is wrong with it is told once.
        Set<String> told = new LinkedHashSet<>();
        for (Consumer<TableFolders> reader : READERS) {
            try {
                reader.accept(folders);
            } catch (TableException e) {
                e.problems().forEach(problem -> told.add(problem.toString()));
            }
        }
        told.forEach(terminal::tell);
        sound &= told.isEmpty();
        if (sound) {
            List<String> examples = RuleExamples.load(folders).problemsOfOwnRows();
            examples.forEach(terminal::tell);
            sound = examples.isEmpty();
        }
        if (sound) {
            terminal.outWriter().println("every table in " + checked + " can be used");
        }
        return sound ? 0 : Failures.SOME_INPUT_NOT_USED;
    }
}
