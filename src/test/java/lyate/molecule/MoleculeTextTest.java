package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class MoleculeTextTest {

    @ParameterizedTest
    @ValueSource(strings = {"C[C@H](N)C(=O)O", "F/C=C/CO", "CC(=O)Nc1ccc(O)cc1", "C[N+](C)(C)CC(=O)[O-]", "[13CH3]O"})
    void whatIsWrittenIsReadBackAsTheSameMolecule(String smiles) throws MoleculeException {
        MoleculeReader reader = new MoleculeReader();
        Molecule molecule = reader.read(smiles);
        Molecule fromSmiles = reader.read(MoleculeText.smiles(molecule));
        Molecule fromMolfile = reader.read(MoleculeText.molfile(molecule));
        assertEquals(molecule.canonicalKey(), fromSmiles.canonicalKey());
        assertEquals(molecule.canonicalKey(), fromMolfile.canonicalKey());
        assertEquals(molecule.stereocentres(), fromSmiles.stereocentres());
        assertEquals(molecule.stereocentres(), fromMolfile.stereocentres());
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            assertEquals(molecule.label(atom), fromMolfile.label(atom));
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"C[C@H](N)C(=O)O", "C[C@@H](N)C(=O)O"})
    void theConfigurationIsKept(String smiles) throws MoleculeException {
        assertTrue(MoleculeText.smiles(new MoleculeReader().read(smiles)).contains(smiles.contains("@@") ? "@@" : "@H"));
    }
}
