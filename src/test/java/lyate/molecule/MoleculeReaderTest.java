package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** One structure in every form users have one in. */
class MoleculeReaderTest {

    private final MoleculeReader reader = new MoleculeReader();

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "O=C(OCC)CC(C)=O", "CCOC(=O)CC(C)=O", "ethyl 3-oxobutanoate", "ethyl acetoacetate",
        "InChI=1S/C6H10O3/c1-3-9-6(8)4-5(2)7/h3-4H2,1-2H3", "  O=C(OCC)CC(C)=O \n",
    })
    void ethylAcetoacetateInAnyForm(String text) throws MoleculeException {
        assertEquals(reader.read("O=C(OCC)CC(=O)C").canonicalKey(), reader.read(text).canonicalKey());
    }

    @ParameterizedTest
    @ValueSource(strings = {"nitrophenol-v2000.mol", "nitrophenol-v3000.mol", "nitrophenol-aromatic.mol",
        "nitrophenol-pentavalent.mol"})
    void fourNitrophenolAsMolfile(String file) throws MoleculeException {
        Molecule molecule = reader.read(resource(file));
        assertEquals(reader.read("Oc1ccc(cc1)[N+](=O)[O-]").canonicalKey(), molecule.canonicalKey());
        assertEquals("O1", molecule.label(0));
        assertEquals(1, molecule.hydrogens(0));
    }

    @Test
    void molfileWithWindowsLineEnds() throws MoleculeException {
        String text = resource("nitrophenol-v2000.mol").replace("\n", "\r\n");
        assertEquals("C6H5NO3", reader.read(text).formula());
    }

    @Test
    void wedgesOfMolfileGiveConfiguration() throws MoleculeException {
        assertEquals(reader.read("C[C@H](N)C(=O)O").smiles(), reader.read(resource("l-alanine.mol")).smiles());
    }

    @Test
    void nameSaysWhatWasUnderstood() throws MoleculeException {
        Molecule acetone = reader.read("acetone");
        assertEquals(List.of("the name is understood as CC(=O)C, whose order numbers the atoms"), acetone.warnings());
        assertEquals("acetone", acetone.input());
        assertEquals("O3", acetone.label(2));
    }

    @Test
    void inchiKeepsItsOwnNumbers() throws MoleculeException {
        Molecule ethanol = reader.read("InChI=1S/C2H6O/c1-2-3/h3H,2H2,1H3");
        assertEquals(List.of("C1", "C2", "O3"), labels(ethanol));
        assertEquals(1, ethanol.hydrogens(2));
    }

    @ParameterizedTest
    @CsvSource({"O,2", "N,3", "C,4", "S,2", "Cl,1", "[SiH4],4", "P,3"})
    void moleculesOfOneAtom(String smiles, int hydrogens) throws MoleculeException {
        Molecule molecule = reader.read(smiles);
        assertEquals(1, molecule.atomCount());
        assertEquals(hydrogens, molecule.hydrogens(0));
    }

    @Test
    void drawnHydrogensCountInTheNumbersButNotAsAtoms() throws MoleculeException {
        Molecule methanol = reader.read("[H]C([H])([H])O[H]");
        assertEquals(List.of("C2", "O5"), labels(methanol));
        assertEquals(3, methanol.hydrogens(0));
        assertEquals(1, methanol.hydrogens(1));
    }

    @Test
    void deuteriumCountsAsHydrogen() throws MoleculeException {
        Molecule methanol = reader.read("[2H]C([2H])([2H])O[2H]");
        assertEquals(3, methanol.hydrogens(0));
        assertEquals("OC", methanol.canonicalKey());
        assertTrue(methanol.warnings().contains("deuterium and tritium are counted as hydrogen"));
        assertTrue(reader.read("[2H][C@H](C)O").stereocentres().isEmpty());
    }

    @Test
    void isotopesChangeNothingButTheSmiles() throws MoleculeException {
        Molecule marked = reader.read("[13CH3]C(=O)C");
        assertEquals(reader.read("CC(=O)C").canonicalKey(), marked.canonicalKey());
        assertEquals(marked.symmetryClass(0), marked.symmetryClass(3));
        assertTrue(marked.smiles().contains("13C"));
    }

    @Test
    void salt() throws MoleculeException {
        Molecule acetate = reader.read("[Na+].CC(=O)[O-].O");
        assertEquals(List.of("C2", "C3", "O4", "O5"), labels(acetate));
        assertEquals(List.of("[Na+]", "O"), acetate.counterIons());
        assertEquals(-1, acetate.charge(3));
    }

    @Test
    void carbonIsPreferredAsSubstrate() throws MoleculeException {
        assertEquals("CH3O-", reader.read("F[P-](F)(F)(F)(F)F.C[O-].[Na+].[Na+]").formula());
        assertEquals("C1", reader.read("CCO.OCC").label(0));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "CC[NH3+].[O-]C(=O)C(F)(F)F|C2H8N+", "OC(=O)C(F)(F)F.CCN|C2H7N", "CC(=O)[O-].CCCC[N+](CCCC)(CCCC)CCCC|C2H3O2-",
        "CO.CS(=O)(=O)O|CH4O", "[Na+].[O-]C(=O)C(F)(F)F|C2F3O2-", "C[N+](C)(C)C.[O-]C(=O)C(F)(F)F|C2F3O2-", "C[N+](C)(C)C.[Cl-]|C4H12N+",
        "O.O.CS(=O)(=O)[O-].[Na+]|CH3O3S-",
    })
    void usualCounterIonsAreSetAside(String salt, String formula) throws MoleculeException {
        assertEquals(formula, reader.read(salt).formula());
    }

    @ParameterizedTest
    @CsvSource({"[Na]OC(C)=O,O=C([O-])C", "C[Mg]Br,[CH3-]", "[Li]CCCC,[CH2-]CCC", "[K]C#C,[C-]#C"})
    void bondsOfAlkaliAndAlkalineEarthMetalsAreIonic(String smiles, String key) throws MoleculeException {
        Molecule anion = reader.read(smiles);
        assertEquals(key, anion.canonicalKey());
        assertTrue(anion.warnings().get(0).endsWith("is read as ionic"), anion.warnings().toString());
    }

    @Test
    void titleAfterSmilesIsPassedOverButSaid() throws MoleculeException {
        Molecule titled = reader.read("CCO ethanol, dry");
        assertEquals("C2H6O", titled.formula());
        assertEquals(List.of("'ethanol, dry' after the SMILES is taken as its title"), titled.warnings());
    }

    static String resource(String file) {
        try (InputStream stream = MoleculeReaderTest.class.getResourceAsStream("/molecules/" + file)) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    private static List<String> labels(Molecule molecule) {
        return IntStream.range(0, molecule.atomCount()).mapToObj(molecule::label).toList();
    }
}
