package lyate.command;

import java.io.IOException;
import java.util.List;
import java.util.concurrent.Callable;
import lyate.molecule.MoleculeReader;
import lyate.report.RejectedText;
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
            BaseChoice choice = new BaseChoice(StepReviewer.load(folders, stockroom), stockroom);
            List<RankedBase> ranked = choice.rank(asked);
            Ranking.write(terminal, format, "base", ranked, top);
            if (format == Format.TEXT) {
                new RejectedText(terminal.outWriter()).write(BaseChoice.rejected(ranked), choice.betterSolvent(ranked));
            }
            return 0;
        } catch (RowException e) {
            terminal.tell(StepOptions.words(e));
        } catch (ReviewException e) {
            terminal.tell(e.getMessage() + "; to protonate a basic site ask 'lyate acids'");
        }
        return Failures.SOME_INPUT_NOT_USED;
    }
}
