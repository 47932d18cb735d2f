package lyate.molecule;

import java.util.List;
import org.openscience.cdk.aromaticity.Aromaticity;
import org.openscience.cdk.graph.Cycles;
import org.openscience.cdk.graph.invariant.Canon;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;

/**
 * The facts that follow from a normalised molecule.
 *
 * @param container       heavy atoms only, rings and aromaticity flagged
 * @param facts           what is asked of its atoms most often
 * @param inputNumbers    1-based input number of each heavy atom
 * @param symmetryClasses same number for constitutionally equivalent atoms
 */
record Perception(IAtomContainer container, AtomFacts facts, int[] inputNumbers, long[] symmetryClasses) {

    /** Flags rings and aromaticity; false where the ring system is too large to decide. */
    static boolean markRings(IAtomContainer molecule) {
        Cycles.markRingAtomsAndBonds(molecule);
        return Aromaticity.apply(Aromaticity.Model.Daylight, molecule);
    }

    static Perception of(IAtomContainer normalised, List<String> warnings) {
        if (!markRings(normalised)) {
            warnings.add("the ring system is too large to decide on its aromaticity; it is read as drawn");
        }
        int[] inputNumbers = new int[normalised.getAtomCount()];
        for (IAtom atom : normalised.atoms()) {
            inputNumbers[atom.getIndex()] = InputNumbers.of(atom);
        }
        AtomFacts facts = new AtomFacts(normalised);
        return new Perception(normalised, facts, inputNumbers, Canon.symmetry(normalised, facts.neighbours));
    }
}
