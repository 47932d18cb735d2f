package lyate.molecule;

import java.util.List;
import org.openscience.cdk.CDKConstants;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.tools.manipulator.AtomContainerManipulator;

/** Hydrogens drawn as atoms become a count on the atom they are bound to. */
final class Hydrogens {

    private static final String ISOTOPES = "lyate.isotopesOfHydrogen";

    private Hydrogens() {}

    /** How many of an atom's hydrogens were drawn as deuterium or tritium. */
    static int isotopes(IAtom atom) {
        Integer count = atom.getProperty(ISOTOPES);
        return count == null ? 0 : count;
    }

    /**
     * Folds every drawn hydrogen into its heavy atom; deuterium and tritium count as hydrogen.
     *
     * @throws MoleculeException for a hydrogen with more than one bond
     */
    static void fold(IAtomContainer molecule, List<String> warnings) throws MoleculeException {
        boolean drawn = false;
        boolean isotope = false;
        for (IAtom atom : molecule.atoms()) {
            if (atom.getAtomicNumber() == 1) {
                if (atom.getBondCount() > 1) {
                    throw new MoleculeException(InputNumbers.label(atom) + " has " + atom.getBondCount()
                            + " bonds; bridging hydrogens cannot be judged", InputNumbers.of(atom));
                }
                if (atom.getMassNumber() != null && atom.getMassNumber() > 1) {
                    isotope = true;
                    atom.neighbors().forEach(heavy -> heavy.setProperty(ISOTOPES, isotopes(heavy) + 1));
                }
                atom.setMassNumber(null);
                atom.setMapIdx(0);
                drawn = true;
            }
        }
        if (isotope) {
            warnings.add("deuterium and tritium are counted as hydrogen");
        }
        if (drawn) {
            molecule.removeProperty(CDKConstants.CTAB_SGROUPS);
            AtomContainerManipulator.suppressHydrogens(molecule);
        }
    }
}
