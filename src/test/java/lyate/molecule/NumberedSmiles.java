package lyate.molecule;

import java.util.Collection;
import java.util.List;
import org.openscience.cdk.CDKConstants;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.smiles.SmiFlavor;
import org.openscience.cdk.smiles.SmilesGenerator;

/** A SMILES in which some atoms carry a number, for failure messages that can be pasted into a drawing. */
public final class NumberedSmiles {

    private NumberedSmiles() {}

    /** The first of {@code atoms} gets the number 1. */
    public static String of(Molecule molecule, Collection<Integer> atoms) {
        try {
            IAtomContainer copy = molecule.container().clone();
            int number = 0;
            for (int atom : atoms) {
                copy.getAtom(atom).setProperty(CDKConstants.ATOM_ATOM_MAPPING, ++number);
            }
            return new SmilesGenerator(SmiFlavor.AtomAtomMap | SmiFlavor.UseAromaticSymbols).create(copy);
        } catch (CDKException | CloneNotSupportedException e) {
            throw new IllegalStateException(e);
        }
    }

    /** One atom numbered. */
    public static String of(Molecule molecule, int atom) {
        return of(molecule, List.of(atom));
    }
}
