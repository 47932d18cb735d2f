package lyate.molecule;

import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.interfaces.IPseudoAtom;
import org.openscience.cdk.isomorphism.matchers.IQueryAtom;
import org.openscience.cdk.isomorphism.matchers.IQueryBond;

/** What no structure may hold, checked before anything is computed from it. */
final class Refusals {

    /** Largest substrate handled, heavy atoms. */
    static final int MOST_HEAVY_ATOMS = 250;
    static final int MOST_ATOMS = 1500;

    private Refusals() {}

    /** @throws MoleculeException for whatever is not one definite closed-shell structure of handy size */
    static void check(IAtomContainer read) throws MoleculeException {
        if (read.isEmpty()) {
            throw new MoleculeException("there is no atom in it");
        }
        if (read.getAtomCount() > MOST_ATOMS) {
            throw tooLarge(read.getAtomCount());
        }
        for (IBond bond : read.bonds()) {
            check(bond);
        }
        for (IAtom atom : read.atoms()) {
            check(atom);
        }
        if (read.getSingleElectronCount() > 0) {
            IAtom atom = read.getSingleElectron(0).getAtom();
            throw new MoleculeException(name(atom) + " is a radical; radicals cannot be judged", InputNumbers.of(atom));
        }
    }

    static MoleculeException tooLarge(int heavyAtoms) {
        return new MoleculeException("there are " + heavyAtoms + " atoms in it; at most " + MOST_HEAVY_ATOMS
                + " heavy atoms are handled");
    }

    /** @throws MoleculeException for an atom that is no element */
    static void checkElement(IAtom atom) throws MoleculeException {
        if (atom instanceof IPseudoAtom pseudo) {
            throw new MoleculeException("atom " + InputNumbers.of(atom) + " is a placeholder (" + pseudo.getLabel()
                    + "), not an element: draw the whole structure", InputNumbers.of(atom));
        }
        if (atom.getAtomicNumber() == null || atom.getAtomicNumber() < 1 || atom instanceof IQueryAtom) {
            throw new MoleculeException("atom " + InputNumbers.of(atom)
                    + " is a query, not an element: draw one definite structure", InputNumbers.of(atom));
        }
    }

    private static void check(IAtom atom) throws MoleculeException {
        checkElement(atom);
        if (atom.getFormalCharge() == null) {
            atom.setFormalCharge(0);
        }
        if (atom.getImplicitHydrogenCount() == null) {
            throw new MoleculeException("the hydrogens of " + name(atom) + " are not settled: draw its bonds as single,"
                    + " double or triple", InputNumbers.of(atom));
        }
    }

    private static void check(IBond bond) throws MoleculeException {
        boolean order = bond.getOrder() != null && bond.getOrder().numeric() >= 1 && bond.getOrder().numeric() <= 3;
        if (bond instanceof IQueryBond || !order || bond.getAtomCount() != 2) {
            throw new MoleculeException("the bond between " + name(bond.getBegin()) + " and " + name(bond.getEnd())
                    + " is not single, double, triple or aromatic", InputNumbers.of(bond.getBegin()));
        }
    }

    private static String name(IAtom atom) {
        return InputNumbers.label(atom);
    }
}
