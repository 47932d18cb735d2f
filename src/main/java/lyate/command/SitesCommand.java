package lyate.command;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Iterator;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.IntStream;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.MoleculeReader;
import lyate.report.JsonList;
import lyate.report.RecipeCsv;
import lyate.report.ResultWriter;
import lyate.report.SiteCsv;
import lyate.report.SiteJson;
import lyate.report.SiteText;
import lyate.sheet.OrderedWork;
import lyate.sheet.SiteSurvey;
import lyate.sheet.SiteSurvey.Answer;
import lyate.sheet.SiteSurvey.Question;
import lyate.site.SiteClasses;
import lyate.site.SiteFinder;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;
import lyate.stock.UnknownNameException;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code lyate sites}. */
@Command(name = "sites", mixinStandardHelpOptions = true, description = {
    "Lists every atom that can lose or gain a proton, what kind of site it is, and its pKa.",
    "For a base site the pKa is that of the conjugate acid.", ""})
final class SitesCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "STRUCTURE",
            description = "SMILES, InChI or systematic name; - reads one per line from standard input.")
    private List<String> structures;

    @Option(names = "--solvent", paramLabel = "S", defaultValue = "water",
            description = "The solvent whose pKa scale is meant (default: water).")
    private String solvent;

    @Option(names = "--estimate-only", description = "Leaves the table of measured values out.")
    private boolean estimateOnly;

    @Option(names = "--explain", description = {"Takes every pKa apart: contributions with kind and atoms, other ways to it, what was missing,",
        "measured relatives, and where the uncertainty comes from. JSON always holds this."})
    private boolean explain;

    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", description = "text, csv or json (default: text).")
    private Format format;

    @Mixin
    private TablesOption tables;

    SitesCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        SiteSurvey survey = survey();
        ResultWriter<Answer> writer = writer(survey.solvent());
        AtomicInteger refused = new AtomicInteger();
        int threads = terminal.interactive() ? 1 : Runtime.getRuntime().availableProcessors();
        new OrderedWork(threads).run(questions(), survey::answer, answer -> {
            write(writer, answer);
            if (answer.molecule().isEmpty()) {
                refused.incrementAndGet();
                terminal.tell("row " + answer.question().number() + ": " + answer.problem());
            }
        });
        writer.finish();
        return refused.get() == 0 ? 0 : Failures.SOME_INPUT_NOT_USED;
    }

    private SiteSurvey survey() {
        TableFolders folders = tables.folders();
        Solvent asked = solvent(folders);
        AcidityEstimator acidity = AcidityEstimator.load(folders);
        return new SiteSurvey(MoleculeReader.load(folders), new SiteFinder(SiteClasses.load(folders)),
                estimateOnly ? acidity.withoutMeasured() : acidity, asked);
    }

    private Solvent solvent(TableFolders folders) {
        try {
            return Stockroom.load(folders).solvent(solvent);
        } catch (UnknownNameException e) {
            throw new ParameterException(spec.commandLine(), "--solvent: " + e.getMessage());
        }
    }

    private ResultWriter<Answer> writer(Solvent asked) throws IOException {
        return switch (format) {
            case TEXT -> new SiteText(terminal.outWriter(), asked.name(), explain);
            case CSV -> explain ? new RecipeCsv(terminal.outWriter(), asked.id()) : new SiteCsv(terminal.outWriter(), asked.id());
            case JSON -> new JsonList<>(terminal.outWriter(), answer -> SiteJson.describe(answer, asked.id()));
        };
    }

    private void write(ResultWriter<Answer> writer, Answer answer) {
        try {
            writer.write(answer);
            if (terminal.interactive()) {
                terminal.flush();
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Iterator<Question> questions() {
        if (structures.equals(List.of("-"))) {
            AtomicInteger line = new AtomicInteger();
            return terminal.reader().lines().map(text -> new Question(line.incrementAndGet(), text))
                    .filter(question -> !question.text().isBlank()).iterator();
        }
        return IntStream.range(0, structures.size()).mapToObj(i -> new Question(i + 1, structures.get(i))).iterator();
    }
}
