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
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** What a deprotonation is described by, shared by the commands that judge one. */
final class StepOptions {

    private static final List<String> NAMES = List.of("--substrate", "--site", "--base", "--equiv", "--solvent", "--temperature",
            "--concentration", "--water-ppm", "--electrophile", "--reaction");

    @Option(names = "--substrate", required = true, paramLabel = "X", description = "SMILES, InChI or systematic name.")
    private String substrate;
    @Option(names = "--solvent", required = true, paramLabel = "S", description = "By name or abbreviation, for example THF.")
    private String solvent;
    @Mixin
    private ConditionOptions conditions;

    /** The options as the one row of a sheet, so that both are read by the same rules. */
    SheetRow row(String base) {
        Map<SheetColumn, String> cells = conditions.cells();
        cells.put(SheetColumn.SUBSTRATE, substrate);
        cells.put(SheetColumn.BASE, base);
        cells.put(SheetColumn.SOLVENT, solvent);
        return row(cells);
    }

    /** Cells as the one row of a sheet. */
    static SheetRow row(Map<SheetColumn, String> given) {
        Map<SheetColumn, String> cells = new EnumMap<>(given);
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
