package lyate.molecule;

import org.openscience.cdk.aromaticity.Aromaticity;
import org.openscience.cdk.graph.Cycles;
import org.openscience.cdk.graph.GraphUtil;
import org.openscience.cdk.graph.invariant.Canon;
import org.openscience.cdk.interfaces.IAtomContainer;

/**
 * The facts that follow from a normalised molecule.
 *
 * @param container       heavy atoms only, rings and aromaticity flagged
 * @param inputNumbers    1-based input number of each heavy atom
 * @param symmetryClasses same number for constitutionally equivalent atoms
 * @param neighbours      adjacency by atom index
 */
record Perception(IAtomContainer container, int[] inputNumbers, long[] symmetryClasses, int[][] neighbours) {

    static Perception of(IAtomContainer normalised, int[] inputNumbers) {
        Cycles.markRingAtomsAndBonds(normalised);
        Aromaticity.apply(Aromaticity.Model.Daylight, normalised);
        int[][] neighbours = GraphUtil.toAdjList(normalised);
        return new Perception(normalised, inputNumbers, Canon.symmetry(normalised, neighbours), neighbours);
    }
}
