package lyate.command;

import java.io.IOException;
import java.util.Map;
import java.util.concurrent.Callable;
import lyate.molecule.MoleculeReader;
import lyate.review.AcidChoice;
import lyate.review.AcidStep;
import lyate.review.ProtonationReviewer;
import lyate.review.ReviewException;
import lyate.sheet.RowException;
import lyate.sheet.SheetColumn;
import lyate.sheet.StepReader;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code lyate acids}. */
@Command(name = "acids", mixinStandardHelpOptions = true, sortOptions = false, description = {
    "Ranks the acids of the stockroom for protonating a basic site, as in choosing a salt: first those whose pKa is 3 or more"
    + " below that of the protonated site and that hurt no other group, with least against them, and then no stronger than needed.", ""})
final class AcidsCommand implements Callable<Integer> {

    private final Terminal terminal;

    @Option(names = "--substrate", required = true, paramLabel = "X", description = "SMILES, InChI or systematic name.")
    private String substrate;
    @Option(names = "--solvent", required = true, paramLabel = "S", description = "By name or abbreviation, for example acetone.")
    private String solvent;
    @Option(names = "--site", paramLabel = "N4", defaultValue = "", description = "The atom that is to take the proton (default: the most basic).")
    private String site;
    @Option(names = "--equiv", paramLabel = "N", defaultValue = "", description = "Moles of acid per mole of substrate (default: 1.0).")
    private String equivalents;
    @Option(names = "--temperature", paramLabel = "T", defaultValue = "", description = "Degrees Celsius (default: 25).")
    private String temperature;
    @Option(names = "--concentration", paramLabel = "C", defaultValue = "", description = "Substrate, mol/L (default: 0.2).")
    private String concentration;
    @Option(names = "--top", paramLabel = "N", defaultValue = "20", description = "How many are shown, 0 for all (default: 20).")
    private int top;
    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", description = "text, json or csv (default: text).")
    private Format format;

    @Mixin
    private TablesOption tables;

    AcidsCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        TableFolders folders = tables.folders();
        Stockroom stockroom = Stockroom.load(folders);
        StepReader reader = new StepReader(MoleculeReader.load(folders), stockroom);
        try {
            // Both kinds of step are read by the same rules; the base is a placeholder that every acid takes the place of.
            String placeholder = stockroom.bases().get(0).name();
            AcidStep asked = AcidStep.of(reader.read(StepOptions.row(Map.of(SheetColumn.SUBSTRATE, substrate, SheetColumn.SITE, site,
                    SheetColumn.BASE, placeholder, SheetColumn.BASE_EQUIV, equivalents, SheetColumn.SOLVENT, solvent,
                    SheetColumn.TEMPERATURE, temperature, SheetColumn.CONCENTRATION, concentration))), stockroom.acids().get(0));
            AcidChoice choice = new AcidChoice(ProtonationReviewer.load(folders, stockroom), stockroom);
            Ranking.write(terminal, format, "acid", choice.rank(asked), top);
            return 0;
        } catch (RowException e) {
            terminal.tell(StepOptions.words(e));
        } catch (ReviewException e) {
            terminal.tell(e.getMessage());
        }
        return Failures.SOME_INPUT_NOT_USED;
    }
}
