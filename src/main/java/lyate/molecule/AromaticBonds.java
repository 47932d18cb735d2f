package lyate.molecule;

import org.openscience.cdk.aromaticity.Kekulization;
import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.isomorphism.matchers.IQueryAtomContainer;

/** Molfiles may draw aromatic bonds as such (bond type 4); here they become single and double ones. Queries are left alone. */
final class AromaticBonds {

    private AromaticBonds() {}

    /**
     * Gives aromatic bonds an order and their atoms the hydrogens that follow.
     *
     * @throws MoleculeException where an atom is no element, or the hydrogens cannot be told from the drawing, as in pyrrole
     */
    static void settle(IAtomContainer molecule) throws MoleculeException {
        if (molecule instanceof IQueryAtomContainer) {
            return;
        }
        boolean any = false;
        for (IBond bond : molecule.bonds()) {
            if (bond.isAromatic() && (bond.getOrder() == null || bond.getOrder().numeric() == 0)) {
                any = true;
                bond.getBegin().setIsAromatic(true);
                bond.getEnd().setIsAromatic(true);
            }
        }
        if (!any) {
            return;
        }
        for (IAtom atom : molecule.atoms()) {
            Refusals.checkElement(atom);
            if (atom.getImplicitHydrogenCount() == null && atom.isAromatic()) {
                atom.setImplicitHydrogenCount(hydrogens(atom));
            }
        }
        try {
            Kekulization.kekulize(molecule);
        } catch (CDKException e) {
            throw new MoleculeException("the aromatic bonds cannot be given alternating single and double orders;"
                    + " draw the ring with single and double bonds");
        }
    }

    /** Hydrogens of an aromatic atom by its other bonds: only carbon carries one unless it is drawn. */
    private static int hydrogens(IAtom atom) {
        int bonds = 0;
        for (IBond bond : atom.bonds()) {
            bonds += bond.getOrder() == null ? 1 : Math.max(1, bond.getOrder().numeric());
        }
        boolean carbon = atom.getAtomicNumber() != null && atom.getAtomicNumber() == 6;
        int charge = atom.getFormalCharge() == null ? 0 : Math.abs(atom.getFormalCharge());
        return carbon ? Math.max(0, 3 - bonds - charge) : 0;
    }
}
