package lyate.command;

import java.io.IOException;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import lyate.molecule.MoleculeReader;
import lyate.report.JsonList;
import lyate.report.ResultWriter;
import lyate.report.ReviewJson;
import lyate.report.ReviewText;
import lyate.report.SheetCsv;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.StepReviewer;
import lyate.sheet.ReviewedRow;
import lyate.sheet.RowException;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetHeader;
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

    @Option(names = "--substrate", required = true, paramLabel = "X", description = "SMILES, InChI or systematic name.")
    private String substrate;
    @Option(names = "--base", required = true, paramLabel = "B", description = "By name or abbreviation, for example LDA.")
    private String base;
    @Option(names = "--solvent", required = true, paramLabel = "S", description = "By name or abbreviation, for example THF.")
    private String solvent;
    @Option(names = "--site", paramLabel = "C3", defaultValue = "", description = "The proton that is meant to go (default: the most acidic).")
    private String site;
    @Option(names = "--equiv", paramLabel = "N", defaultValue = "", description = "Moles of base per mole of substrate (default: 1.0).")
    private String equivalents;
    @Option(names = "--temperature", paramLabel = "T", defaultValue = "", description = "Degrees Celsius (default: 25).")
    private String temperature;
    @Option(names = "--concentration", paramLabel = "C", defaultValue = "", description = "Substrate, mol/L (default: 0.2).")
    private String concentration;
    @Option(names = "--water-ppm", paramLabel = "W", defaultValue = "", description = "Water in the solvent, mass ppm (default: what a well-kept bottle holds).")
    private String waterPpm;
    @Option(names = "--electrophile", paramLabel = "E", defaultValue = "", description = "Electrophile or additive in the same flask.")
    private String electrophile;
    @Option(names = "--format", paramLabel = "FORMAT", defaultValue = "text", description = "text, json or csv (default: text).")
    private Format format;

    @Mixin
    private TablesOption tables;

    CheckCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() throws IOException {
        TableFolders folders = tables.folders();
        StepReader reader = new StepReader(MoleculeReader.load(folders), Stockroom.load(folders));
        SheetRow row = row();
        try {
            write(row, StepReviewer.load(folders).review(reader.read(row)));
            return 0;
        } catch (RowException e) {
            e.problems().forEach(problem -> terminal.tell("lyate check: " + option(problem.column()) + ": " + problem.reason()));
        } catch (ReviewException e) {
            terminal.tell("lyate check: " + e.getMessage());
        }
        return Failures.SOME_INPUT_NOT_USED;
    }

    /** The options as the one row of a sheet, so that both are read by the same rules. */
    private SheetRow row() {
        Map<SheetColumn, String> cells = new EnumMap<>(Map.of(SheetColumn.SUBSTRATE, substrate, SheetColumn.SITE, site,
                SheetColumn.BASE, base, SheetColumn.BASE_EQUIV, equivalents, SheetColumn.SOLVENT, solvent,
                SheetColumn.TEMPERATURE, temperature, SheetColumn.CONCENTRATION, concentration,
                SheetColumn.WATER, waterPpm, SheetColumn.ELECTROPHILE, electrophile));
        List<String> names = cells.keySet().stream().map(SheetColumn::header).toList();
        return new SheetRow(new SheetHeader(names), 1, 1, List.copyOf(cells.values()), "");
    }

    private static String option(String column) {
        return Stream.of("--substrate", "--site", "--base", "--equiv", "--solvent", "--temperature", "--concentration",
                "--water-ppm", "--electrophile").filter(option -> sameThing(option, column)).findFirst().orElse("--" + column);
    }

    private static boolean sameThing(String option, String column) {
        String name = option.substring(2).replace('-', '_');
        return column.equals("base_equiv") ? name.equals("equiv") : column.equals(name) || column.startsWith(name + "_");
    }

    private void write(SheetRow row, Review review) throws IOException {
        switch (format) {
            case TEXT -> new ReviewText(terminal.outWriter()).write(review);
            case CSV -> new SheetCsv(terminal.outWriter(), row.header()).write(ReviewedRow.of(row, review));
            case JSON -> {
                ResultWriter<Review> json = new JsonList<>(terminal.outWriter(), ReviewJson::describe);
                json.write(review);
                json.finish();
            }
            default -> throw new IllegalStateException(format.toString());
        }
    }
}
