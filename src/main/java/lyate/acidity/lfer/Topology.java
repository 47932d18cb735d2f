package lyate.acidity.lfer;

import java.util.Arrays;
import lyate.molecule.Molecule;

/**
 * What all sites of one molecule share: atoms, bonds, and a number for every bond direction.
 *
 * <p>A <em>branch</em> is a bond with a direction, {@code parent(b)} to {@code child(b)}, and stands for everything that lies
 * beyond the child. Branches are numbered from 0; those that leave an atom {@code a} are {@code firstBranch(a)} to
 * {@code firstBranch(a + 1) - 1}.
 */
final class Topology {

    /** {@link #order} of an aromatic bond. */
    static final int AROMATIC = 4;

    final int atoms;
    final int[] element;
    final int[] hydrogens;
    final int[] charge;
    final boolean[] aromatic;
    final boolean[] inRing;
    final int[] first;
    final int[] parent;
    final int[] child;
    final int[] order;
    final boolean[] ringBond;
    final int[] reverse;

    private Topology(Molecule molecule) {
        atoms = molecule.atomCount();
        element = new int[atoms];
        hydrogens = new int[atoms];
        charge = new int[atoms];
        aromatic = new boolean[atoms];
        inRing = new boolean[atoms];
        first = new int[atoms + 1];
        int[][] neighbours = new int[atoms][];
        for (int atom = 0; atom < atoms; atom++) {
            element[atom] = molecule.atomicNumber(atom);
            hydrogens[atom] = molecule.hydrogens(atom);
            charge[atom] = molecule.charge(atom);
            aromatic[atom] = molecule.aromatic(atom);
            inRing[atom] = molecule.inRing(atom);
            neighbours[atom] = molecule.neighbours(atom);
            first[atom + 1] = first[atom] + neighbours[atom].length;
        }
        int branches = first[atoms];
        parent = new int[branches];
        child = new int[branches];
        order = new int[branches];
        ringBond = new boolean[branches];
        reverse = new int[branches];
        for (int atom = 0; atom < atoms; atom++) {
            for (int i = 0; i < neighbours[atom].length; i++) {
                int branch = first[atom] + i;
                parent[branch] = atom;
                child[branch] = neighbours[atom][i];
            }
        }
        for (int branch = 0; branch < branches; branch++) {
            reverse[branch] = branchBetween(child[branch], parent[branch]);
            if (parent[branch] < child[branch]) {
                boolean aromaticBond = aromatic[parent[branch]] && aromatic[child[branch]]
                        && molecule.aromaticBond(parent[branch], child[branch]);
                order[branch] = aromaticBond ? AROMATIC : molecule.bondOrder(parent[branch], child[branch]);
                ringBond[branch] = inRing[parent[branch]] && inRing[child[branch]]
                        && molecule.ringBond(parent[branch], child[branch]);
            }
        }
        for (int branch = 0; branch < branches; branch++) {
            if (parent[branch] > child[branch]) {
                order[branch] = order[reverse[branch]];
                ringBond[branch] = ringBond[reverse[branch]];
            }
        }
    }

    static Topology of(Molecule molecule) {
        return new Topology(molecule);
    }

    int branches() {
        return parent.length;
    }

    int degree(int atom) {
        return first[atom + 1] - first[atom];
    }

    /** The branch from one atom to a neighbour, or -1. */
    int branchBetween(int from, int to) {
        for (int branch = first[from]; branch < first[from + 1]; branch++) {
            if (child[branch] == to) {
                return branch;
            }
        }
        return -1;
    }

    /** Bonds between {@code from} and every atom; {@link Integer#MAX_VALUE} where there is no path. */
    int[] distances(int from) {
        int[] distance = new int[atoms];
        Arrays.fill(distance, Integer.MAX_VALUE);
        int[] queue = new int[atoms];
        int tail = 0;
        distance[from] = 0;
        queue[tail++] = from;
        for (int head = 0; head < tail; head++) {
            int atom = queue[head];
            for (int branch = first[atom]; branch < first[atom + 1]; branch++) {
                if (distance[child[branch]] == Integer.MAX_VALUE) {
                    distance[child[branch]] = distance[atom] + 1;
                    queue[tail++] = child[branch];
                }
            }
        }
        return distance;
    }

    /** Whether the atom takes part in a double, triple or aromatic bond. */
    boolean unsaturated(int atom) {
        for (int branch = first[atom]; branch < first[atom + 1]; branch++) {
            if (order[branch] > 1) {
                return true;
            }
        }
        return false;
    }

    /** Whether the atom is bound by a double bond to an oxygen, sulfur or nitrogen. */
    boolean oxo(int atom) {
        for (int branch = first[atom]; branch < first[atom + 1]; branch++) {
            if (order[branch] == 2 && element[child[branch]] != 6) {
                return true;
            }
        }
        return false;
    }

    /** Size of the smallest ring through a bond, 0 where it is in none of at most 8 atoms. */
    int smallestRing(int branch) {
        if (!ringBond[branch]) {
            return 0;
        }
        int[] distance = new int[atoms];
        Arrays.fill(distance, -1);
        int[] queue = new int[atoms];
        int tail = 0;
        distance[parent[branch]] = 0;
        queue[tail++] = parent[branch];
        for (int head = 0; head < tail; head++) {
            int atom = queue[head];
            if (distance[atom] > 6) {
                return 0;
            }
            for (int next = first[atom]; next < first[atom + 1]; next++) {
                if (next != branch && distance[child[next]] < 0) {
                    distance[child[next]] = distance[atom] + 1;
                    if (child[next] == child[branch]) {
                        return distance[child[next]] + 1;
                    }
                    queue[tail++] = child[next];
                }
            }
        }
        return 0;
    }
}
