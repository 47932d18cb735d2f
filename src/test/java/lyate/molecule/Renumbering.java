package lyate.molecule;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.smiles.SmiFlavor;
import org.openscience.cdk.smiles.SmilesGenerator;

/**
 * The same molecule given with its atoms in another order, for tests that nothing depends on it.
 *
 * @param molecule  read from the other order
 * @param placeThen index in {@code molecule} of every atom, by its index before
 */
public record Renumbering(Molecule molecule, int[] placeThen) {

    /** A random order, the same for the same seed. */
    public static Renumbering of(Molecule molecule, long seed) throws MoleculeException {
        try {
            IAtomContainer copy = molecule.container().clone();
            List<Integer> order = IntStream.range(0, copy.getAtomCount()).boxed().collect(Collectors.toList());
            Collections.shuffle(order, new Random(seed));
            IAtom[] shuffled = order.stream().map(copy::getAtom).toArray(IAtom[]::new);
            copy.setAtoms(shuffled);
            int[] writtenAt = new int[shuffled.length];
            String smiles = new SmilesGenerator(SmiFlavor.Stereo | SmiFlavor.AtomicMass | SmiFlavor.AtomAtomMap).create(copy, writtenAt);
            int[] placeThen = new int[shuffled.length];
            for (int i = 0; i < shuffled.length; i++) {
                placeThen[order.get(i)] = writtenAt[i];
            }
            return new Renumbering(new MoleculeReader().read(smiles), placeThen);
        } catch (CDKException | CloneNotSupportedException e) {
            throw new IllegalStateException(e);
        }
    }

    @Override
    public String toString() {
        return molecule.input() + " " + Arrays.toString(placeThen);
    }
}
