package lyate.molecule;

import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;

/** What is asked of the atoms of a molecule most often, in arrays by atom index. Never changed after it is made. */
final class AtomFacts {

    final int[] elements;
    final int[] hydrogens;
    final int[] charges;
    final boolean[] aromatic;
    /** Bond orders with hydrogens, in the Kekule form. */
    final int[] valences;
    final int[] ringBonds;
    final int[] rootCodes;
    final int[][] neighbours;
    /** {@link #bondCode} of the bond to each neighbour. */
    final int[][] bondCodes;
    /** Made when first asked for; volatile, so that another thread sees it complete or not at all. */
    private volatile int[] smallestRings;
    /** See {@link Surroundings}. */
    final long[] surroundings;

    AtomFacts(IAtomContainer perceived) {
        int count = perceived.getAtomCount();
        elements = new int[count];
        hydrogens = new int[count];
        charges = new int[count];
        aromatic = new boolean[count];
        valences = new int[count];
        ringBonds = new int[count];
        rootCodes = new int[count];
        neighbours = new int[count][];
        bondCodes = new int[count][];
        for (IAtom atom : perceived.atoms()) {
            int index = atom.getIndex();
            elements[index] = atom.getAtomicNumber();
            hydrogens[index] = atom.getImplicitHydrogenCount();
            charges[index] = atom.getFormalCharge();
            aromatic[index] = atom.isAromatic();
            valences[index] = hydrogens[index];
            rootCodes[index] = RootFilter.code(elements[index], aromatic[index], hydrogens[index]);
            neighbours[index] = new int[atom.getBondCount()];
            bondCodes[index] = new int[atom.getBondCount()];
        }
        int[] filled = new int[count];
        for (IBond bond : perceived.bonds()) {
            int begin = bond.getBegin().getIndex();
            int end = bond.getEnd().getIndex();
            add(filled, begin, end, bond);
            add(filled, end, begin, bond);
        }
        surroundings = Surroundings.of(this);
    }

    private void add(int[] filled, int atom, int neighbour, IBond bond) {
        neighbours[atom][filled[atom]] = neighbour;
        bondCodes[atom][filled[atom]++] = bondCode(bond.getOrder().numeric(), bond.isAromatic(), bond.isInRing());
        valences[atom] += bond.getOrder().numeric();
        ringBonds[atom] += bond.isInRing() ? 1 : 0;
    }

    /** Order (1 to 3), aromaticity and ring membership of a bond as one number. */
    static int bondCode(int order, boolean aromatic, boolean inRing) {
        return (order - 1) * 4 + (aromatic ? 2 : 0) + (inRing ? 1 : 0);
    }

    static int order(int bondCode) {
        return (bondCode >> 2) + 1;
    }

    static boolean isAromatic(int bondCode) {
        return (bondCode & 2) != 0;
    }

    static boolean isInRing(int bondCode) {
        return (bondCode & 1) != 0;
    }

    /** Size of the smallest ring through an atom; 0 where it is in none. */
    int smallestRing(int atom) {
        if (ringBonds[atom] == 0) {
            return 0;
        }
        int[] sizes = smallestRings;
        if (sizes == null) {
            sizes = new int[elements.length];
            for (int i = 0; i < sizes.length; i++) {
                sizes[i] = ringBonds[i] == 0 ? 0 : Paths.smallestRing(neighbours, i);
            }
            smallestRings = sizes;
        }
        return sizes[atom];
    }

    /** Code of the bond between two atoms, or -1 where there is none. */
    int bondCode(int first, int second) {
        for (int i = 0; i < neighbours[first].length; i++) {
            if (neighbours[first][i] == second) {
                return bondCodes[first][i];
            }
        }
        return -1;
    }
}
