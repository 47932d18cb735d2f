package lyate.command;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lyate.sheet.RowException;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetHeader;
import lyate.sheet.SheetRow;
import picocli.CommandLine.Option;

/** What a deprotonation is described by, shared by the commands that judge one. */
final class StepOptions {

    private static final List<String> NAMES = List.of("--substrate", "--site", "--base", "--equiv", "--solvent", "--temperature",
            "--concentration", "--water-ppm", "--electrophile");

    @Option(names = "--substrate", required = true, paramLabel = "X", description = "SMILES, InChI or systematic name.")
    private String substrate;
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
    @Option(names = "--electrophile", paramLabel = "E", defaultValue = "", description = "Electrophile or additive in the same flask, by name or structure.")
    private String electrophile;

    /** The options as the one row of a sheet, so that both are read by the same rules. */
    SheetRow row(String base) {
        Map<SheetColumn, String> cells = new EnumMap<>(Map.of(SheetColumn.SUBSTRATE, substrate, SheetColumn.SITE, site,
                SheetColumn.BASE, base, SheetColumn.BASE_EQUIV, equivalents, SheetColumn.SOLVENT, solvent,
                SheetColumn.TEMPERATURE, temperature, SheetColumn.CONCENTRATION, concentration,
                SheetColumn.WATER, waterPpm, SheetColumn.ELECTROPHILE, electrophile));
        List<String> names = cells.keySet().stream().map(SheetColumn::header).toList();
        return new SheetRow(new SheetHeader(names), 1, 1, List.copyOf(cells.values()), "");
    }

    /** What is wrong with them, one line for each. */
    static String words(RowException refused) {
        return refused.problems().stream().map(problem -> option(problem.column()) + ": " + problem.reason())
                .collect(Collectors.joining("\n"));
    }

    private static String option(String column) {
        return NAMES.stream().filter(option -> sameThing(option, column)).findFirst().orElse("--" + column);
    }

    private static boolean sameThing(String option, String column) {
        String name = option.substring(2).replace('-', '_');
        return Stream.of(name, name + "_C", name + "_M", "base_" + name).anyMatch(column::equals);
    }
}
