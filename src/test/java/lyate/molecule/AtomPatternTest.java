package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import lyate.site.SiteClasses;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableFolders;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smarts.SmartsPattern;

/** Patterns are anchored at their first atom. */
class AtomPatternTest {

    private final MoleculeReader reader = new MoleculeReader();

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "[OX2H1]c | Oc1ccc(CO)cc1 | O1",
        "[CX4;!H0]C=O | CC(=O)CC | C1 C4",
        "[nH] | c1c[nH]cn1 | N3",
        "[C;H2;$(C(C=O)C=O)] | CCOC(=O)CC(C)=O | C6",
        "[!#6;!#1] | CSi | ",
        "[#6;r5] | C1CCC1C2CCCC2 | C5 C6 C7 C8 C9",
        "[N;!$(N-C=O)] | NCC(=O)N | N1",
        "[#6;a;H1] | c1ccsc1 | C1 C2 C3 C5",
    })
    void firstAtomOfThePatternIsTheSite(String smarts, String smiles, String sites) throws MoleculeException {
        AtomPattern pattern = AtomPattern.compile(smarts.strip());
        Molecule molecule = reader.read(smiles.replace("CSi", "C[SiH3]").strip());
        String expected = smiles.strip().equals("CSi") ? "Si2" : sites.strip();
        assertEquals(expected, String.join(" ", IntStream.range(0, molecule.atomCount())
                .filter(atom -> pattern.matches(molecule, atom)).mapToObj(molecule::label).toList()));
    }

    @ParameterizedTest
    @ValueSource(strings = {"[*;!#6;!H0]", "[#6;!H0]", "[C,c;H1]", "[!C;!c]", "[CH3,NH2,OH]", "[$([CH2]C=O),$(c[nH])]",
        "[!$([#6])]", "[R]", "[#7,#8;H0]", "[c,n;H1]", "[!H0;!H1]", "[OX2H1][CX4]", "*~*~*~[#8]", "*1~*~*~*~*~*1", "C1CC1",
        "[#6;R2]", "[#6;R3]", "[x3]", "[r5]", "[r;!r6]", "[*;v4]", "[D3]", "[X4]", "[+1]", "[-]", "[#6]-,:[#6]=,:[#6]", "*@*!@*",
        "[C@H](N)C", "[13C]", "[OH].[NH2]", "([OH].[NH2])", "C/C=C/C", "[#6]=[#8]", "c-c", "c:c", "cc", "C=C-C=O", "[C:1][N:2]",
        "[$([#6;$([#6]-[#7;!$([#7]=*)])]-[#8]),$([#7]~[#6]~[#7])]"})
    void answersAsTheToolkitDoes(String smarts) throws MoleculeException {
        compareWithToolkit(smarts, Examples.SMILES);
    }

    @Test
    void rowsOfTheSiteClassesAnswerAsTheToolkitDoes() throws MoleculeException {
        List<String> smiles = new ArrayList<>(Examples.SMILES);
        List<Row> rows = Table.read(SiteClasses.SCHEMA, TableFolders.packaged()).rows();
        for (int i = 0; i < rows.size(); i += 5) {
            smiles.add(rows.get(i).text("hit"));
        }
        for (Row row : rows) {
            compareWithToolkit(row.text("smarts"), smiles);
        }
    }

    private void compareWithToolkit(String smarts, List<String> texts) throws MoleculeException {
        AtomPattern ours = AtomPattern.compile(smarts);
        SmartsPattern toolkit = SmartsPattern.create(smarts, SilentChemObjectBuilder.getInstance()).setPrepare(false);
        for (String smiles : texts) {
            Molecule molecule = reader.read(smiles);
            boolean[] expected = new boolean[molecule.atomCount()];
            for (int[] match : toolkit.matchAll(molecule.container())) {
                expected[match[0]] = true;
            }
            for (int atom = 0; atom < expected.length; atom++) {
                assertEquals(expected[atom], ours.matches(molecule, atom), smarts + " on " + smiles + " at " + molecule.label(atom));
            }
        }
    }

    @Test
    void aromaticAndKekuleDrawingsMatchAlike() throws MoleculeException {
        AtomPattern pattern = AtomPattern.compile("[cH]");
        Molecule kekule = reader.read("C1=CC=CC=C1");
        assertTrue(IntStream.range(0, 6).allMatch(atom -> pattern.matches(kekule, atom)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"[C;H2|Invalid atom expression|5", "C[C;X4;Z]|Invalid atom expression|8",
        "CC(|Unclosed ring, component group, or branch|3"})
    void badPatternShowsThePlace(String smarts, String reason, int column) {
        String message = assertThrows(MoleculeException.class, () -> AtomPattern.compile(smarts)).getMessage();
        assertEquals(reason + "\n" + smarts + "\n" + " ".repeat(column) + "^", message);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {"''|the pattern, or one nested in it, is empty", "[$(C),$()]|the pattern, or one nested in it, is empty",
        "C1CC1CC11|the pattern has a ring bond from an atom to itself",
        "[0@OH1]|the pattern has a configuration other than that of a tetrahedral atom or a double bond (@, @@, /, \\)"})
    void patternThatNothingCanMatchIsRefused(String smarts, String reason) {
        assertEquals(reason, assertThrows(MoleculeException.class, () -> AtomPattern.compile(smarts)).getMessage());
    }

    @Test
    void oneMoleculeAndOnePatternServeManyThreads() throws MoleculeException {
        AtomPattern pattern = AtomPattern.compile("[$([#6]~[#6;r5]~[#7]),$([#6]-[#6](=O)-[#7;!$(N-a)])]");
        Molecule molecule = reader.read("O=C1NC(=O)c2ccccc12");
        String expected = matches(pattern, molecule);
        assertTrue(Stream.generate(() -> 0).limit(20_000).parallel().allMatch(i -> matches(pattern, molecule).equals(expected)));
    }

    private static String matches(AtomPattern pattern, Molecule molecule) {
        return IntStream.range(0, molecule.atomCount()).filter(atom -> pattern.matches(molecule, atom)).boxed().toList().toString();
    }
}
