package lyate.molecule;

import java.util.List;
import org.openscience.cdk.aromaticity.Aromaticity;
import org.openscience.cdk.graph.Cycles;
import org.openscience.cdk.graph.GraphUtil;
import org.openscience.cdk.graph.invariant.Canon;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;

/**
 * The facts that follow from a normalised molecule.
 *
 * @param container       heavy atoms only, rings and aromaticity flagged
 * @param inputNumbers    1-based input number of each heavy atom
 * @param symmetryClasses same number for constitutionally equivalent atoms
 * @param neighbours      adjacency by atom index
 * @param rootCodes       see {@link RootFilter#code(IAtom)}
 * @param quickHash       see {@link Molecule#quickHash()}
 */
record Perception(IAtomContainer container, int[] inputNumbers, long[] symmetryClasses, int[][] neighbours,
                  int[] rootCodes, long quickHash) {

    static Perception of(IAtomContainer normalised, List<String> warnings) {
        Cycles.markRingAtomsAndBonds(normalised);
        if (!Aromaticity.apply(Aromaticity.Model.Daylight, normalised)) {
            warnings.add("the ring system is too large to decide on its aromaticity; it is read as drawn");
        }
        int[] inputNumbers = new int[normalised.getAtomCount()];
        int[] rootCodes = new int[inputNumbers.length];
        for (IAtom atom : normalised.atoms()) {
            rootCodes[atom.getIndex()] = RootFilter.code(atom);
            inputNumbers[atom.getIndex()] = InputNumbers.of(atom);
        }
        int[][] neighbours = GraphUtil.toAdjList(normalised);
        return new Perception(normalised, inputNumbers, Canon.symmetry(normalised, neighbours), neighbours,
                rootCodes, quickHash(normalised, neighbours));
    }

    /** Two rounds of neighbourhood hashing: order of atoms, configuration and isotopes do not matter. */
    private static long quickHash(IAtomContainer molecule, int[][] neighbours) {
        long[] values = new long[neighbours.length];
        for (IAtom atom : molecule.atoms()) {
            int facts = atom.getAtomicNumber() << 16 | neighbours[atom.getIndex()].length << 12
                    | atom.getImplicitHydrogenCount() << 8 | atom.getFormalCharge() + 8 << 1 | (atom.isAromatic() ? 1 : 0);
            values[atom.getIndex()] = mix(facts);
        }
        for (int round = 0; round < 2; round++) {
            values = withNeighbours(values, neighbours);
        }
        long sum = 0;
        for (long value : values) {
            sum += value;
        }
        return sum;
    }

    private static long[] withNeighbours(long[] values, int[][] neighbours) {
        long[] next = new long[values.length];
        for (int atom = 0; atom < values.length; atom++) {
            long sum = 3 * values[atom];
            for (int neighbour : neighbours[atom]) {
                sum += mix(values[neighbour]);
            }
            next[atom] = mix(sum);
        }
        return next;
    }

    /** The finaliser of MurmurHash3 (Appleby, public domain). */
    private static long mix(long value) {
        long mixed = value;
        mixed = (mixed ^ mixed >>> 33) * 0xff51afd7ed558ccdL;
        mixed = (mixed ^ mixed >>> 33) * 0xc4ceb9fe1a85ec53L;
        return mixed ^ mixed >>> 33;
    }
}
