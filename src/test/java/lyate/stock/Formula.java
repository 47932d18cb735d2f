package lyate.stock;

import java.util.Map;
import java.util.TreeMap;
import org.openscience.cdk.exception.InvalidSmilesException;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.silent.SilentChemObjectBuilder;
import org.openscience.cdk.smiles.SmilesParser;
import org.openscience.cdk.tools.manipulator.AtomContainerManipulator;

/** Composition of a structure as the toolkit counts it, independent of what the tables state. */
record Formula(Map<String, Integer> atoms, int charge, double molarMass) {

    static Formula of(String smiles) {
        try {
            IAtomContainer read = new SmilesParser(SilentChemObjectBuilder.getInstance()).parseSmiles(smiles);
            Map<String, Integer> atoms = new TreeMap<>();
            int charge = 0;
            for (IAtom atom : read.atoms()) {
                atoms.merge(atom.getSymbol(), 1, Integer::sum);
                if (atom.getImplicitHydrogenCount() > 0) {
                    atoms.merge("H", atom.getImplicitHydrogenCount(), Integer::sum);
                }
                charge += atom.getFormalCharge();
            }
            return new Formula(atoms, charge, AtomContainerManipulator.getMass(read, AtomContainerManipulator.MolWeight));
        } catch (InvalidSmilesException e) {
            throw new AssertionError(smiles + ": " + e.getMessage(), e);
        }
    }

    /** The same atoms with one proton more. */
    Map<String, Integer> withOneProton() {
        Map<String, Integer> more = new TreeMap<>(atoms);
        more.merge("H", 1, Integer::sum);
        return more;
    }
}
