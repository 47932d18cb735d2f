package lyate.command;

import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import lyate.molecule.MoleculeReader;
import lyate.report.JsonList;
import lyate.report.Placed;
import lyate.report.RankingCsv;
import lyate.report.RankingText;
import lyate.report.ResultWriter;
import lyate.review.BaseChoice;
import lyate.review.RankedBase;
import lyate.review.ReviewException;
import lyate.review.Step;
import lyate.review.StepReviewer;
import lyate.sheet.RowException;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code lyate bases}. */
@Command(name = "bases", mixinStandardHelpOptions = true, sortOptions = false, description = {
    "Ranks the bases of the stockroom for one deprotonation: first those that do it, with least against them, and then are"
    + " no stronger than needed.", ""})
final class BasesCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Mixin
    private StepOptions step;

    @Option(names = "--top", paramLabel = "N", defaultValue = "20", description = "How many are shown, 0 for all (default: 20).")
    private int top;

    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", description = "text, json or csv (default: text).")
    private Format format;

    @Mixin
    private TablesOption tables;

    BasesCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        TableFolders folders = tables.folders();
        Stockroom stockroom = Stockroom.load(folders);
        StepReader reader = new StepReader(MoleculeReader.load(folders), stockroom);
        try {
            Step asked = reader.read(step.row(stockroom.bases().get(0).name()));
            write(new BaseChoice(StepReviewer.load(folders, stockroom), stockroom).rank(asked));
            return 0;
        } catch (RowException e) {
            terminal.tell(StepOptions.words(e));
        } catch (ReviewException e) {
            terminal.tell(e.getMessage());
        }
        return Failures.SOME_INPUT_NOT_USED;
    }

    private void write(List<RankedBase> ranked) throws IOException {
        ResultWriter<Placed> writer = switch (format) {
            case TEXT -> new RankingText(terminal.outWriter());
            case CSV -> new RankingCsv(terminal.outWriter());
            case JSON -> new JsonList<>(terminal.outWriter(), Placed::describe);
        };
        for (int place = 1; place <= ranked.size() && (top <= 0 || place <= top); place++) {
            writer.write(new Placed(place, ranked.get(place - 1)));
        }
        writer.finish();
    }
}
