package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import org.openscience.cdk.graph.ConnectivityChecker;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.tools.manipulator.AtomContainerManipulator;

/** Turns whatever was read into the one form the program works with, and refuses in words what it cannot use. */
final class Normaliser {

    private static final String INPUT_NUMBER = "lyate.inputNumber";

    private final String input;

    Normaliser(String input) {
        this.input = input;
    }

    Molecule normalise(IAtomContainer read) throws MoleculeException {
        if (read.isEmpty()) {
            throw new MoleculeException("there is no atom in it");
        }
        for (int i = 0; i < read.getAtomCount(); i++) {
            read.getAtom(i).setProperty(INPUT_NUMBER, i + 1);
        }
        IAtomContainer substrate = null;
        List<String> counterIons = new ArrayList<>();
        for (IAtomContainer part : ConnectivityChecker.partitionIntoMolecules(AtomContainerManipulator.suppressHydrogens(read))) {
            if (substrate == null || part.getAtomCount() > substrate.getAtomCount()) {
                substrate = part;
            }
        }
        int[] inputNumbers = new int[substrate.getAtomCount()];
        for (IAtom atom : substrate.atoms()) {
            inputNumbers[atom.getIndex()] = atom.getProperty(INPUT_NUMBER);
        }
        return new Molecule(input, Perception.of(substrate, inputNumbers), counterIons, List.of());
    }
}
