package lyate.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;
import lyate.sheet.SheetColumn;
import lyate.sheet.SheetRow;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The step that {@code lyate check} judges: a substrate with base and solvent, or a reaction that may show them. */
final class CheckInput {

    private static final long MOST_BYTES = 5_000_000;

    @Spec(Spec.Target.MIXEE)
    private CommandSpec spec;

    @ArgGroup(exclusive = true, multiplicity = "1")
    private What what;

    @ArgGroup(exclusive = true, multiplicity = "0..1")
    private Reagent reagent;

    @Option(names = "--solvent", paramLabel = "S", defaultValue = "", description = "By name or abbreviation, for example THF. A reaction may show it.")
    private String solvent;

    @Mixin
    private ConditionOptions conditions;

    /** A structure or a reaction. */
    private static final class What {

        @Option(names = "--substrate", paramLabel = "X", description = "SMILES, InChI or systematic name.")
        private String substrate;

        @Option(names = "--reaction", paramLabel = "R", description = "In place of the substrate: reaction SMILES, or an .rxn or .rdf file (its first"
                + " reaction). Substrate, site and, where drawn, base, solvent and electrophile are taken from it.")
        private String reaction;
    }

    /** A base for a deprotonation or an acid for a protonation. */
    private static final class Reagent {

        @Option(names = "--base", paramLabel = "B", description = "By name or abbreviation, for example LDA. A reaction may show it.")
        private String base;

        @Option(names = "--acid", paramLabel = "A", description = "In place of a base: judges how far this acid protonates a basic site.")
        private String acid;
    }

    /** The name of the acid; null where none is named. */
    String acid() {
        return reagent == null ? null : reagent.acid;
    }

    /** The name of the base; empty where none is named. */
    String base() {
        return reagent == null || reagent.base == null ? "" : reagent.base;
    }

    /**
     * The options as the one row of a sheet, so that both are read by the same rules.
     *
     * @throws ParameterException where a substrate lacks solvent, base and acid
     */
    SheetRow row() throws IOException {
        Map<SheetColumn, String> cells = conditions.cells();
        if (what.reaction == null) {
            require(reagent != null, "(--base=B | --acid=A)");
            require(!solvent.isEmpty(), "'--solvent=S'");
            cells.put(SheetColumn.SUBSTRATE, what.substrate);
        } else {
            cells.put(SheetColumn.REACTION, reaction());
        }
        cells.put(SheetColumn.BASE, base());
        cells.put(SheetColumn.SOLVENT, solvent);
        return StepOptions.row(cells);
    }

    private void require(boolean given, String option) {
        if (!given) {
            throw new ParameterException(spec.commandLine(), "Missing required option: " + option);
        }
    }

    private String reaction() throws IOException {
        String lower = what.reaction.toLowerCase(Locale.ROOT);
        if (!lower.endsWith(".rxn") && !lower.endsWith(".rdf")) {
            return what.reaction;
        }
        Path file = Path.of(what.reaction);
        if (Files.size(file) > MOST_BYTES) {
            throw new IOException(file + " has " + Files.size(file) + " bytes; 'lyate review' reads files of more than " + MOST_BYTES);
        }
        return Files.readString(file);
    }
}
