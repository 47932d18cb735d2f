package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** What a molecule tells about itself. */
class MoleculeTest {

    private final MoleculeReader reader = new MoleculeReader();

    static Stream<String> smiles() {
        return Examples.SMILES.stream();
    }

    /** Formulae and molar masses: CRC Handbook of Chemistry and Physics (from memory), rounded to 0.01 g/mol. */
    @ParameterizedTest
    @CsvSource({"O,H2O,18.015", "CCO,C2H6O,46.069", "CC(=O)O,C2H4O2,60.052", "c1ccccc1,C6H6,78.112",
        "Cn1cnc2c1c(=O)n(C)c(=O)n2C,C8H10N4O2,194.194", "ClC(Cl)Cl,CHCl3,119.377", "OS(=O)(=O)O,H2O4S,98.078"})
    void formulaAndMolarMass(String smiles, String formula, double molarMass) throws MoleculeException {
        Molecule molecule = reader.read(smiles);
        assertEquals(formula, molecule.formula());
        assertEquals(molarMass, molecule.molarMass(), 0.01);
        assertEquals(molarMass, molecule.molarMassWithCounterIons(), 0.01);
    }

    /** Potassium tert-butoxide weighs 112.21 g/mol (CRC Handbook, from memory). */
    @Test
    void whatIsWeighedIncludesTheCounterIon() throws MoleculeException {
        Molecule alkoxide = reader.read("[K+].CC(C)(C)[O-]");
        assertEquals(112.21, alkoxide.molarMassWithCounterIons(), 0.01);
        assertEquals("C4H9O-", alkoxide.formula());
    }

    @ParameterizedTest
    @MethodSource("smiles")
    void itsOwnSmilesReadsBackAsTheSame(String smiles) throws MoleculeException {
        Molecule molecule = reader.read(smiles);
        Molecule again = reader.read(molecule.smiles());
        assertEquals(molecule.smiles(), again.smiles());
        assertTrue(molecule.sameConstitution(again));
        assertEquals(molecule.stereocentres().size(), again.stereocentres().size());
    }

    @Test
    void differentConstitutionsDifferInKeyAndHash() throws MoleculeException {
        List<Molecule> all = Examples.SMILES.stream().map(this::sure).toList();
        assertEquals(all.size(), all.stream().map(Molecule::canonicalKey).distinct().count());
        assertEquals(all.size(), all.stream().map(Molecule::quickHash).distinct().count());
    }

    @Test
    void configurationIsNotPartOfTheConstitution() throws MoleculeException {
        Molecule one = reader.read("N[C@@H](C)C(=O)O");
        Molecule mirror = reader.read("N[C@H](C)C(=O)O");
        assertTrue(one.sameConstitution(mirror));
        assertNotEquals(one.smiles(), mirror.smiles());
        assertFalse(one.sameConstitution(reader.read("NCCC(=O)O")));
    }

    @Test
    void onlyTetrahedralAtomsAreStereocentres() throws MoleculeException {
        assertEquals(List.of(4), reader.read("C/C=C/C[C@H](F)Cl").stereocentres());
        assertEquals(List.of(), reader.read("CC=[C@]=CC").stereocentres());
        assertEquals("O=COO", reader.read("C(=O)[O@]O").smiles(), "an axis needs two double bonds");
    }

    @Test
    void distancesAndRings() throws MoleculeException {
        Molecule indole = reader.read("CCc1ccc2[nH]ccc2c1");
        assertEquals(0, indole.smallestRing(0));
        assertEquals(6, indole.smallestRing(3));
        assertEquals(5, indole.smallestRing(6));
        assertEquals(5, indole.smallestRing(5));
        assertEquals(3, indole.distance(0, 3));
        assertArrayEquals(new int[] {0, 1, 2, 3, 4, 5, 6, 6, 5, 4, 3}, indole.distances(0));
    }

    /** Smallest rings of cages by inspection. */
    @ParameterizedTest
    @CsvSource({"C12C3C4C1C5C2C3C45,4", "C1CC2CCC1C2,5", "C1CN2CCN1CC2,6", "C1CC1,3", "C1CCCCCCCCCCC1,12"})
    void smallestRingOfTheFirstAtom(String smiles, int size) throws MoleculeException {
        assertEquals(size, reader.read(smiles).smallestRing(0));
    }

    @Test
    void atomsAreFoundByLabelInAnyCase() throws MoleculeException {
        Molecule acetone = reader.read("CC(=O)C");
        assertEquals(3, acetone.atomLabelled("c4").getAsInt());
        assertEquals(2, acetone.atomLabelled(" O3 ").getAsInt());
        assertTrue(acetone.atomLabelled("N3").isEmpty());
        assertTrue(acetone.atomLabelled("C3").isEmpty());
    }

    @Test
    void whatIsHandedOutCannotChangeTheMolecule() throws MoleculeException {
        Molecule salt = reader.read("[Na+].CC(=O)[O-] title");
        salt.neighbours(1)[0] = 99;
        salt.distances(0)[0] = 99;
        assertArrayEquals(new int[] {0, 2, 3}, salt.neighbours(1));
        assertEquals(0, salt.distance(0, 0));
        assertThrows(UnsupportedOperationException.class, () -> salt.counterIons().clear());
        assertThrows(UnsupportedOperationException.class, () -> salt.warnings().clear());
        assertThrows(UnsupportedOperationException.class, () -> salt.stereocentres().add(1));
    }

    @Test
    void manyThreadsReadAndWriteAlike() {
        List<String> expected = Examples.SMILES.stream().map(this::sure).map(MoleculeTest::describe).toList();
        List<Molecule> shared = Examples.SMILES.stream().map(this::sure).toList();
        IntStream.range(0, 20_000).parallel().forEach(i -> {
            int k = i % expected.size();
            assertEquals(expected.get(k), describe(shared.get(k)));
            assertEquals(expected.get(k), describe(sure(Examples.SMILES.get(k))));
        });
    }

    private static String describe(Molecule molecule) {
        return molecule.smiles() + " " + molecule.canonicalKey() + " " + molecule.quickHash() + " " + molecule.molarMass();
    }

    private Molecule sure(String smiles) {
        try {
            return reader.read(smiles);
        } catch (MoleculeException e) {
            throw new IllegalStateException(e);
        }
    }
}
