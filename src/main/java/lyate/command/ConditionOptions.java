package lyate.command;

import java.util.EnumMap;
import java.util.Map;
import lyate.sheet.SheetColumn;
import picocli.CommandLine.Option;

/** The conditions of a step that have a usual value. */
final class ConditionOptions {

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

    /** The options as cells of a sheet, so that both are read by the same rules; empty where not given. */
    Map<SheetColumn, String> cells() {
        return new EnumMap<>(Map.of(SheetColumn.SITE, site, SheetColumn.BASE_EQUIV, equivalents, SheetColumn.TEMPERATURE, temperature,
                SheetColumn.CONCENTRATION, concentration, SheetColumn.WATER, waterPpm, SheetColumn.ELECTROPHILE, electrophile));
    }
}
