package lyate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.io.IOException;
import java.io.InputStream;
import java.io.StringReader;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.Stream;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.sheet.Conditions;
import lyate.sheet.ReactionList;
import lyate.sheet.RouteSheet;
import lyate.sheet.SheetException;
import lyate.sheet.reaction.ReactionReader;
import lyate.stock.Stockroom;
import lyate.table.Column;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Sound input damaged at random: it is read or refused in words, at once, and what is read can be written and read again.
 * Nothing else may be thrown.
 */
class HostileInputTest {

    private static final int FEW = 1_500;
    private static final int MANY = 150_000;
    /** Counts what the input costs, not what else runs on the machine. */
    private static final ThreadMXBean CLOCK = ManagementFactory.getThreadMXBean();
    private static final long LONGEST_NANOS = 5_000_000_000L;

    private static final String SMILES_LETTERS = "CNOSPFIclnosBrHLiNaMg()[]=#-+\\/@.%:*0123456789~$ {}|>&a\u00e9\u0000";
    private static final String OTHER_LETTERS = "CNOHabcdeilmnoprtuy0123456789 -,()[]'.\n\r\tVMEND/+=;\"#\u00e9\uFEFF\u0000";

    private static final List<String> SMILES = List.of("CCO", "CC(=O)CC(=O)OCC", "Cn1cnc2c1c(=O)n(C)c(=O)n2C", "C[N+](=O)[O-]",
            "N[C@@H](Cc1ccccc1)C(=O)O", "C/C=C/C(=O)OC", "[Na+].CC(=O)[O-]", "C=P(c1ccccc1)(c1ccccc1)c1ccccc1",
            "FC(F)(F)S(=O)(=O)OC1=CCCCC1", "O=c1[nH]c(=O)c2[nH]cnc2[nH]1", "C12C3C4C1C5C2C3C45", "CC[C@@H](C)O |r|", "[2H]C([2H])O",
            "CCCC[Sn](CCCC)(CCCC)C=C", "[13CH3]C#N", "C[Mg]Br");
    private static final List<String> NAMES = List.of("ethyl 3-oxobutanoate", "2,4,6-trinitrophenol", "bicyclo[2.2.1]heptan-2-one",
            "(2S)-2-aminopropanoic acid", "tert-butyl (4-bromophenyl)carbamate", "4-methoxy-N-(prop-2-yn-1-yl)benzamide");
    private static final List<String> INCHIS = List.of("InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3",
            "InChI=1S/C2H4O2.Na/c1-2(3)4;/h1H3,(H,3,4);/q;+1/p-1", "InChI=1S/C3H7NO2/c1-2(4)3(5)6/h2H,4H2,1H3,(H,5,6)/t2-/m0/s1");
    private static final List<String> PATTERNS = List.of("[CX4;!H0]C=O", "[$([CH2](C=O)C=O),$(c[nH])]", "[#6;r5]~[#7,#8;H0]",
            "[C@H](N)C", "([OH].[NH2])", "C1CC1", "[13C;+0]");
    private static final List<String> SHEETS = List.of(
            "step,substrate,site,base,solvent\nA,CCO,,NaH,THF\nB,\"C,\n\"\"C\",O1,x,y\n# c\n;;\n",
            "\uFEFFsep=;\r\nsubstrate;base\r\nCC;\"x;y\"\r\n\r\n", "reaction\tnotes\rC>N>O\t\"a\"\r");
    private static final List<String> REACTIONS = List.of("CC(C)=O>CC(C)[N-]C(C)C.[Li+].C1CCOC1>CC(=C)[O-].[Li+]",
            "[CH3:1][OH:2]>>[CH3:1][O-:2]", "Oc1ccccc1.CI.[K+].[K+].[O-]C([O-])=O>CC(C)=O>COc1ccccc1");
    private static final List<String> TABLES = List.of("# Colours.\n# version: 1\n\nid,name,ph\nmo,methyl orange,3.4\npp,\"two\nlines\",9.3\n");

    private final MoleculeReader reader = new MoleculeReader();

    /** One damaged input, thrown at the code that is to bear it. */
    private interface Bearer {
        void bear(String text) throws MoleculeException, SheetException, IOException;
    }

    @Test
    void structures() {
        batter(FEW, SMILES, SMILES_LETTERS, this::readMolecule);
        batter(FEW / 10, NAMES, OTHER_LETTERS, this::readMolecule);
        batter(FEW / 10, INCHIS, OTHER_LETTERS, this::readMolecule);
        batter(FEW, molfiles(), OTHER_LETTERS, this::readMolecule);
    }

    @Test
    void files(@TempDir Path folder) {
        batter(FEW, SHEETS, OTHER_LETTERS, HostileInputTest::readSheet);
        batter(FEW / 10, TABLES, OTHER_LETTERS, text -> readTable(folder, text));
        batter(FEW / 5, molfiles(), OTHER_LETTERS, text -> assertTrue(reader.readSdf(new StringReader(text + "\n$$$$\n" + text)).count() > 0));
    }

    @Test
    void patternsAndReactions() {
        ReactionReader reactions = new ReactionReader(reader, Stockroom.load(TableFolders.packaged()));
        batter(FEW, PATTERNS, SMILES_LETTERS, this::readPattern);
        batter(FEW, REACTIONS, SMILES_LETTERS, reactions::read);
    }

    @Test
    void textsThatFollowTheGrammar() {
        batterByGrammar(FEW);
    }

    @Test
    void reactionFiles() {
        ReactionReader reactions = new ReactionReader(reader, Stockroom.load(TableFolders.packaged()));
        batter(FEW / 5, reactionFile(), OTHER_LETTERS, reactions::read);
        batter(FEW / 5, reactionFile(), OTHER_LETTERS, HostileInputTest::readReactionList);
    }

    @Test
    @Tag("slow")
    void aMillionInputs(@TempDir Path folder) {
        ReactionReader reactions = new ReactionReader(reader, Stockroom.load(TableFolders.packaged()));
        batter(3 * MANY, SMILES, SMILES_LETTERS, this::readMolecule);
        batter(MANY, molfiles(), OTHER_LETTERS, this::readMolecule);
        batter(MANY / 30, NAMES, OTHER_LETTERS, this::readMolecule);
        batter(MANY / 10, INCHIS, OTHER_LETTERS, this::readMolecule);
        batter(MANY, SHEETS, OTHER_LETTERS, HostileInputTest::readSheet);
        batter(MANY, PATTERNS, SMILES_LETTERS, this::readPattern);
        batter(MANY / 10, REACTIONS, SMILES_LETTERS, reactions::read);
        batter(MANY / 30, reactionFile(), OTHER_LETTERS, reactions::read);
        batter(MANY / 30, reactionFile(), OTHER_LETTERS, HostileInputTest::readReactionList);
        batterByGrammar(MANY / 3);
        batter(MANY / 10, TABLES, OTHER_LETTERS, text -> readTable(folder, text));
    }

    private void batterByGrammar(int times) {
        Grammar grammar = new Grammar(20261201);
        ReactionReader reactions = new ReactionReader(reader, Stockroom.load(TableFolders.packaged()));
        batter(times, grammar::smiles, this::readMolecule);
        batter(times, grammar::pattern, this::readPattern);
        batter(times, grammar::sheet, HostileInputTest::readSheet);
        batter(times / 20, grammar::reaction, reactions::read);
        batter(times / 10, grammar::name, this::readMolecule);
    }

    private static void batter(int times, List<String> seeds, String letters, Bearer bearer) {
        batter(times, new Damage(seeds, letters, 20261201)::next, bearer);
    }

    private static void batter(int times, Supplier<String> texts, Bearer bearer) {
        for (int i = 0; i < times; i++) {
            String text = texts.get();
            long start = CLOCK.getCurrentThreadCpuTime();
            try {
                bearer.bear(text);
            } catch (MoleculeException | SheetException | TableException e) {
                assertTrue(e.getMessage() != null && !e.getMessage().isBlank(), () -> "refused without a word: " + text);
                assertFalse(e.getMessage().contains("Exception"), () -> "not in words: " + e.getMessage());
            } catch (IOException | RuntimeException | Error e) {
                fail("on " + text.replace("\u0000", "\\0"), e);
            }
            assertTrue(CLOCK.getCurrentThreadCpuTime() - start < LONGEST_NANOS, () -> "too slow: " + text);
        }
    }

    private void readMolecule(String text) throws MoleculeException {
        Molecule molecule = reader.read(text);
        molecule.molarMassWithCounterIons();
        Molecule again = reader.read(molecule.smiles());
        assertEquals(molecule.canonicalKey(), again.canonicalKey(), text);
        assertEquals(molecule.formula(), again.formula(), text);
    }

    private void readPattern(String text) throws MoleculeException {
        AtomPattern pattern = AtomPattern.compile(text);
        Molecule molecule = reader.read("O=C1NC(=O)c2ccccc12");
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            pattern.matches(molecule, atom);
        }
    }

    private static void readSheet(String text) throws SheetException {
        RouteSheet sheet = RouteSheet.parse(text);
        assertEquals(text, sheet.text());
        RouteSheet longer = sheet.withRow(Collections.nCopies(sheet.header().names().size(), "x"));
        assertEquals(sheet.rows().size() + 1, RouteSheet.parse(longer.text()).rows().size(), text);
    }

    private static void readTable(Path folder, String text) throws IOException {
        Files.writeString(folder.resolve("colours.csv"), text);
        Table.read(Schema.of("colours.csv", Column.text("id"), Column.text("name"), Column.number("ph")), TableFolders.overlaidBy(folder));
    }

    private static void readReactionList(String text) throws SheetException {
        ReactionList list = new ReactionList(new StringReader(text), new Conditions(Map.of()));
        while (list.hasNext()) {
            assertEquals(list.header().names().size(), list.next().cells().size(), text);
        }
    }

    /** Nitrophenol gives nitrophenol: what happens in it is not what is tested. */
    private static List<String> reactionFile() {
        String molfile = resource("nitrophenol-v2000.mol");
        return List.of("$RXN\n\n      drawn by hand\n\n  1  1\n$MOL\n" + molfile + "$MOL\n" + molfile);
    }

    private static List<String> molfiles() {
        return Stream.of("nitrophenol-v2000.mol", "nitrophenol-v3000.mol", "nitrophenol-aromatic.mol", "l-alanine.mol", "radical.mol",
                "atom-list.mol", "r-group.mol").map(HostileInputTest::resource).toList();
    }

    private static String resource(String file) {
        try (InputStream stream = HostileInputTest.class.getResourceAsStream("/molecules/" + file)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }
}
