package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.StringJoiner;
import org.openscience.cdk.graph.ConnectivityChecker;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;

/**
 * A salt or mixture taken apart.
 *
 * @param substrate   the organic component with most heavy atoms that is no usual counter-ion; the first of equals
 * @param counterIons the others, in input order
 */
record Components(IAtomContainer substrate, List<IAtomContainer> counterIons) {

    /** @throws MoleculeException where no component could be a substrate */
    static Components of(IAtomContainer molecule, CounterIons usual) throws MoleculeException {
        if (connected(molecule) && !loneIon(molecule)) {
            return new Components(molecule, List.of());
        }
        List<IAtomContainer> parts = new ArrayList<>();
        ConnectivityChecker.partitionIntoMolecules(molecule).atomContainers().forEach(parts::add);
        IAtomContainer substrate = null;
        for (IAtomContainer part : parts) {
            if (!loneIon(part) && (substrate == null || rank(part, usual) > rank(substrate, usual))) {
                substrate = part;
            }
        }
        if (substrate == null) {
            throw new MoleculeException(describe(parts));
        }
        parts.remove(substrate);
        return new Components(substrate, List.copyOf(parts));
    }

    private static boolean connected(IAtomContainer molecule) {
        // A molecule with fewer bonds than a tree has falls apart; only the others need a walk.
        return molecule.getBondCount() >= molecule.getAtomCount() - 1 && ConnectivityChecker.isConnected(molecule);
    }

    /** A single atom that is charged and bare, or a metal, or hydrogen: never the molecule the user asks about. */
    private static boolean loneIon(IAtomContainer part) {
        IAtom atom = part.getAtom(0);
        boolean bareIon = atom.getFormalCharge() != 0 && atom.getImplicitHydrogenCount() == 0;
        return hydrogen(part) || part.getAtomCount() == 1 && (bareIon || Metals.isMetal(atom));
    }

    private static boolean hydrogen(IAtomContainer part) {
        for (IAtom atom : part.atoms()) {
            if (atom.getAtomicNumber() != 1) {
                return false;
            }
        }
        return true;
    }

    /** What has carbon and is no usual counter-ion comes first; then size decides. */
    private static int rank(IAtomContainer part, CounterIons usual) {
        int size = part.getAtomCount();
        if (usual.contains(part)) {
            return size;
        }
        for (IAtom atom : part.atoms()) {
            if (atom.getAtomicNumber() == 6) {
                return size + 20 * Refusals.MOST_ATOMS;
            }
        }
        return size;
    }

    private static String describe(List<IAtomContainer> parts) {
        if (parts.stream().allMatch(Components::hydrogen)) {
            return "there is no atom other than hydrogen in it";
        }
        StringJoiner ions = new StringJoiner(", ");
        parts.forEach(Perception::markRings);
        parts.forEach(part -> ions.add(SmilesWriter.full(part)));
        return "there are only counter-ions in it (" + ions + "), no substrate";
    }
}
