package lyate.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The order in which atoms are given changes no answer. */
class RenumberingTest {

    private static final int ORDERS = 20;
    private final MoleculeReader reader = new MoleculeReader();

    static Stream<String> smiles() {
        return Examples.SMILES.stream();
    }

    @ParameterizedTest
    @MethodSource("smiles")
    void perceptionFollowsTheAtom(String smiles) throws MoleculeException {
        Molecule one = reader.read(smiles);
        for (int seed = 0; seed < ORDERS; seed++) {
            Renumbering other = Renumbering.of(one, seed);
            for (int atom = 0; atom < one.atomCount(); atom++) {
                int then = other.placeThen()[atom];
                assertEquals(facts(one, atom), facts(other.molecule(), then), other + " at " + one.label(atom));
            }
        }
    }

    @ParameterizedTest
    @MethodSource("smiles")
    void equivalentAtomsStayEquivalent(String smiles) throws MoleculeException {
        Molecule one = reader.read(smiles);
        for (int seed = 0; seed < ORDERS; seed++) {
            Renumbering other = Renumbering.of(one, seed);
            for (int a = 0; a < one.atomCount(); a++) {
                for (int b = 0; b < a; b++) {
                    boolean same = one.symmetryClass(a) == one.symmetryClass(b);
                    boolean sameThen = other.molecule().symmetryClass(other.placeThen()[a])
                            == other.molecule().symmetryClass(other.placeThen()[b]);
                    assertEquals(same, sameThen, other + ": " + one.label(a) + " and " + one.label(b));
                }
            }
        }
    }

    @ParameterizedTest
    @MethodSource("smiles")
    void theWholeMoleculeReadsTheSame(String smiles) throws MoleculeException {
        Molecule one = reader.read(smiles);
        for (int seed = 0; seed < ORDERS; seed++) {
            Molecule other = Renumbering.of(one, seed).molecule();
            assertEquals(one.canonicalKey(), other.canonicalKey());
            assertEquals(one.quickHash(), other.quickHash());
            assertEquals(one.formula(), other.formula());
            assertEquals(one.smiles(), other.smiles());
        }
    }

    @Test
    void bothDrawingsOfAnAntiaromaticRingAreOneConstitution() throws MoleculeException {
        for (String smiles : Examples.ANTIAROMATIC) {
            Molecule one = reader.read(smiles);
            for (int seed = 0; seed < ORDERS; seed++) {
                Renumbering other = Renumbering.of(one, seed);
                assertEquals(one.canonicalKey(), other.molecule().canonicalKey(), other.toString());
                assertTrue(one.sameConstitution(reader.read(other.molecule().smiles())));
            }
        }
    }

    private static List<Object> facts(Molecule molecule, int atom) {
        return List.of(molecule.symbol(atom), molecule.hydrogens(atom), molecule.charge(atom), molecule.aromatic(atom),
                molecule.inRing(atom), molecule.smallestRing(atom), molecule.neighbours(atom).length,
                molecule.stereocentres().contains(atom));
    }
}
