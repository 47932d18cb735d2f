package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class HeavyAtomsTest {

    private final MoleculeReader reader = new MoleculeReader();

    @ParameterizedTest
    @ValueSource(strings = {"CC(=O)O", "c1ccc2[nH]ccc2c1", "ClCCBr", "C[Se]C", "c1cc[se]c1", "[13CH4]", "[2H]C([2H])([2H])S", "N[C@@H](C)C(=O)O",
        "C[Si](C)(C)C", "OB(O)c1ccccc1", "[O-][n+]1ccccc1", "C/C=C\\C", "C1%10CC1CC%10", "[H]OC", "C[As](C)C", "C[Te]C", "IC(F)(F)F"})
    void areToldFromTheText(String smiles) throws MoleculeException {
        assertEquals(HeavyAtoms.of(reader.read(smiles)), HeavyAtoms.ofSmiles(smiles).orElseThrow());
    }

    @ParameterizedTest
    @CsvSource({"CCO, COC", "C=O, CO", "CC(=O)[O-], CC(=O)O", "c1ccccc1, C1CCCCC1"})
    void areTheSameForIsomersWhateverTheirHydrogensAndCharges(String one, String other) throws MoleculeException {
        assertEquals(HeavyAtoms.of(reader.read(one)), HeavyAtoms.of(reader.read(other)));
    }

    @ParameterizedTest
    @CsvSource({"CCO, CCN", "CCO, CCCO", "C=S, C=O", "CCl, CBr"})
    void differWhereAnElementDoes(String one, String other) throws MoleculeException {
        assertNotEquals(HeavyAtoms.of(reader.read(one)), HeavyAtoms.of(reader.read(other)));
    }

    @ParameterizedTest
    @ValueSource(strings = {"CC(=O)[O-].[Na+]", "[Li]C", "C[Mg]Br", "*C", "C[Sn](C)(C)C", "CCO ethanol", "[", "[nH", "[]"})
    void areLeftToTheReaderWhereTheTextIsNotEnough(String smiles) {
        assertTrue(HeavyAtoms.ofSmiles(smiles).isEmpty());
    }
}
