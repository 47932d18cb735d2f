package lyate.fuzz;

import java.io.IOException;
import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.Map;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetException;
import lyate.sheet.reaction.ReactionReader;
import lyate.stock.Stockroom;
import lyate.table.Column;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * What the coverage-guided fuzzer calls with one input after the other; the system property {@code lyate.fuzz} names the reader that has to
 * bear them. An input is read or refused in words, and what is read can be written and read again; anything else is a find.
 */
public final class HostileInput {

    private interface Bearer {
        void bear(String text) throws MoleculeException, SheetException, IOException;
    }

    private static final MoleculeReader READER = new MoleculeReader();
    private static final ReactionReader REACTIONS = new ReactionReader(READER, Stockroom.load(TableFolders.packaged()));
    private static final Molecule PHTHALIMIDE = readOrFail("O=C1NC(=O)c2ccccc12");
    private static final Map<String, Bearer> BEARERS = Map.of("structure", HostileInput::structure, "sdf", HostileInput::sdf,
            "pattern", HostileInput::pattern, "reaction", REACTIONS::read, "sheet", HostileInput::sheet, "table", HostileInput::table);
    private static final Bearer CHOSEN = BEARERS.get(System.getProperty("lyate.fuzz", "structure"));
    private static final Path FOLDER = temporary();

    private HostileInput() {}

    /** Reads the tables before the clock of the first input runs. */
    public static void fuzzerInitialize() {
        require(CHOSEN != null, "lyate.fuzz has to be one of " + BEARERS.keySet());
    }

    /** One input. */
    public static void fuzzerTestOneInput(byte[] bytes) throws IOException {
        String text = new String(bytes, StandardCharsets.UTF_8);
        try {
            CHOSEN.bear(text);
        } catch (MoleculeException | SheetException | TableException e) {
            if (e.getMessage() == null || e.getMessage().isBlank() || e.getMessage().contains("Exception") && !text.contains("Exception")) {
                throw new IllegalStateException("not refused in words: " + e.getMessage(), e);
            }
        }
    }

    private static void structure(String text) throws MoleculeException {
        Molecule molecule = READER.read(text);
        Molecule again = readOrFail(molecule.smiles());
        require(molecule.canonicalKey().equals(again.canonicalKey()), "another constitution");
        require(molecule.formula().equals(again.formula()), "another formula");
        require(molecule.smiles().equals(again.smiles()), "another SMILES: " + molecule.smiles() + " and " + again.smiles());
    }

    private static Molecule readOrFail(String smiles) {
        try {
            return READER.read(smiles);
        } catch (MoleculeException e) {
            throw new IllegalStateException("cannot read what it wrote: " + smiles, e);
        }
    }

    private static void sdf(String text) {
        require(READER.readSdf(new StringReader(text)).count() >= 0, "no stream");
    }

    private static void pattern(String text) throws MoleculeException {
        AtomPattern pattern = AtomPattern.compile(text);
        for (int atom = 0; atom < PHTHALIMIDE.atomCount(); atom++) {
            pattern.matches(PHTHALIMIDE, atom);
        }
    }

    private static void sheet(String text) throws SheetException {
        RouteSheet sheet = RouteSheet.parse(text);
        require(text.equals(sheet.text()), "the text of the sheet changed");
        RouteSheet longer = sheet.withRow(Collections.nCopies(sheet.header().names().size(), "x"));
        require(RouteSheet.parse(longer.text()).rows().size() == sheet.rows().size() + 1, "the row added was lost");
    }

    private static void table(String text) throws IOException {
        Files.writeString(FOLDER.resolve("colours.csv"), text);
        Table.read(Schema.of("colours.csv", Column.text("id"), Column.text("name"), Column.number("ph")), TableFolders.overlaidBy(FOLDER));
    }

    private static Path temporary() {
        try {
            return Files.createTempDirectory("lyate-fuzz");
        } catch (IOException e) {
            throw new IllegalStateException("no temporary folder", e);
        }
    }

    private static void require(boolean holds, String what) {
        if (!holds) {
            throw new IllegalStateException(what);
        }
    }
}
