package lyate.molecule;

import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;

/** The number every atom had in the input; it stays with the atom through all that follows. */
final class InputNumbers {

    private static final String PROPERTY = "lyate.inputNumber";

    private InputNumbers() {}

    /** Numbers the atoms from 1 in the order of the input. */
    static void assign(IAtomContainer read) {
        int number = 1;
        for (IAtom atom : read.atoms()) {
            atom.setProperty(PROPERTY, number++);
        }
    }

    /** 1-based number in the order of the input. */
    static int of(IAtom atom) {
        return atom.getProperty(PROPERTY);
    }

    /** Element symbol and number, as users see it. */
    static String label(IAtom atom) {
        return atom.getSymbol() + of(atom);
    }
}
