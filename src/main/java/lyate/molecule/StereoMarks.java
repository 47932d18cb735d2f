package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.interfaces.IStereoElement;

/** Configurations stated where there can be none: the toolkit reads them, but stumbles over them later. */
final class StereoMarks {

    private StereoMarks() {}

    /** Forgets a centre with two hydrogens (one may have been an isotope) and an axis that is no cumulated double bond. */
    @SuppressWarnings("rawtypes") // the toolkit asks for a list of the raw type
    static void forgetMeaningless(IAtomContainer molecule) {
        if (!molecule.stereoElements().iterator().hasNext()) {
            return;
        }
        List<IStereoElement> kept = new ArrayList<>();
        molecule.stereoElements().forEach(element -> {
            if (!(element.getFocus() instanceof IAtom focus) || canHold(element, focus)) {
                kept.add(element);
            }
        });
        molecule.setStereoElements(kept);
    }

    private static boolean canHold(IStereoElement<?, ?> element, IAtom focus) {
        return element.getConfigClass() == IStereoElement.Allenal ? doubleBonds(focus) == 2 : focus.getImplicitHydrogenCount() < 2;
    }

    private static int doubleBonds(IAtom atom) {
        int count = 0;
        for (IBond bond : atom.bonds()) {
            count += bond.getOrder() == IBond.Order.DOUBLE ? 1 : 0;
        }
        return count;
    }
}
