package lyate.molecule;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.interfaces.IStereoElement;

/** Which groups of double bonds lie on one side, where the input says so. */
final class DoubleBondSides {

    private DoubleBondSides() {}

    /** Whether {@code onFirst} and {@code onSecond} lie on one side of the double bond; empty where the input leaves it open. */
    static Optional<Boolean> together(IAtomContainer container, int first, int second, int onFirst, int onSecond) {
        for (IStereoElement<?, ?> element : container.stereoElements()) {
            if (element.getConfigClass() == IStereoElement.CT && element.getFocus() instanceof IBond bond) {
                int begin = bond.getBegin().getIndex();
                int end = bond.getEnd().getIndex();
                if (begin == first && end == second) {
                    return Optional.of(together(element, begin, end, onFirst, onSecond));
                }
                if (begin == second && end == first) {
                    return Optional.of(together(element, begin, end, onSecond, onFirst));
                }
            }
        }
        return Optional.empty();
    }

    private static boolean together(IStereoElement<?, ?> element, int begin, int end, int onBegin, int onEnd) {
        List<?> carriers = element.getCarriers();
        boolean together = element.getConfigOrder() == IStereoElement.TOGETHER;
        boolean sameAtBegin = other((IBond) carriers.get(0), begin) == onBegin;
        boolean sameAtEnd = other((IBond) carriers.get(1), end) == onEnd;
        return together == (sameAtBegin == sameAtEnd);
    }

    private static int other(IBond bond, int atom) {
        return bond.getBegin().getIndex() == atom ? bond.getEnd().getIndex() : bond.getBegin().getIndex();
    }

    /** For every stated double bond whether its heavier groups lie on one side; in a fixed order. */
    static List<String> marks(IAtomContainer container) {
        List<String> marks = new ArrayList<>();
        for (IStereoElement<?, ?> element : container.stereoElements()) {
            if (element.getConfigClass() == IStereoElement.CT && element.getFocus() instanceof IBond bond) {
                int begin = heavier(bond.getBegin(), bond);
                int end = heavier(bond.getEnd(), bond);
                if (begin >= 0 && end >= 0) {
                    marks.add(together(element, bond.getBegin().getIndex(), bond.getEnd().getIndex(), begin, end) ? "cis" : "trans");
                }
            }
        }
        Collections.sort(marks);
        return List.copyOf(marks);
    }

    /** The neighbour with the most protons, then the most neighbours; -1 where two are alike in that. */
    private static int heavier(IAtom atom, IBond doubleBond) {
        int best = -1;
        int weight = -1;
        for (IBond bond : atom.bonds()) {
            IAtom neighbour = bond.getOther(atom);
            if (bond != doubleBond) {
                int own = 100 * neighbour.getAtomicNumber() + neighbour.getBondCount();
                best = own == weight ? -1 : own > weight ? neighbour.getIndex() : best;
                weight = Math.max(weight, own);
            }
        }
        return best;
    }
}
