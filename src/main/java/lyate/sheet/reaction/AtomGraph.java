package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import lyate.molecule.Molecule;

/**
 * The heavy atoms of one side of a reaction as one graph. Atoms stand in an order that does not depend on how they were
 * numbered, equivalent ones apart, so that whatever is computed from it does not either.
 */
final class AtomGraph {

    /** Bond code of an aromatic bond; other bonds have their order. */
    static final int AROMATIC = 4;

    final List<Molecule> molecules;
    /** Index in {@link #molecules} of the molecule each atom belongs to. */
    final int[] part;
    /** Index of each atom in its molecule. */
    final int[] atom;
    final int[] element;
    /** Hydrogens without deuterium and tritium. */
    final int[] protium;
    final int[] isotopes;
    final int[] charge;
    final int[] map;
    final int[][] neighbours;
    final int[][] bonds;
    /** Equal for atoms that cannot be told apart, counted from 0 in an order that does not depend on the numbering. */
    final int[] colour;

    /** @param mapped how many of the molecules, from the first, keep their atom map */
    AtomGraph(List<Molecule> molecules, int mapped) {
        this(molecules, mapped, null);
    }

    private AtomGraph(List<Molecule> molecules, int mapped, AtomGraph unsorted) {
        this.molecules = List.copyOf(molecules);
        List<int[]> places = unsorted == null ? inInputOrder(molecules) : inCanonicalOrder(unsorted);
        int size = places.size();
        part = new int[size];
        atom = new int[size];
        element = new int[size];
        protium = new int[size];
        isotopes = new int[size];
        charge = new int[size];
        map = new int[size];
        neighbours = new int[size][];
        bonds = new int[size][];
        int[][] index = new int[molecules.size()][];
        for (int m = 0; m < index.length; m++) {
            index[m] = new int[molecules.get(m).atomCount()];
        }
        for (int i = 0; i < size; i++) {
            part[i] = places.get(i)[0];
            atom[i] = places.get(i)[1];
            index[part[i]][atom[i]] = i;
        }
        for (int i = 0; i < size; i++) {
            describe(i, molecules.get(part[i]), index[part[i]]);
            map[i] = part[i] < mapped ? molecules.get(part[i]).mapNumber(atom[i]) : 0;
        }
        int[] start = new int[size];
        for (int i = 0; i < size; i++) {
            start[i] = Arrays.hashCode(new int[] {element[i], protium[i], isotopes[i], charge[i]});
        }
        colour = Colours.refine(this, start);
    }

    /** The graph in its canonical order. */
    static AtomGraph of(List<Molecule> molecules, int mapped) {
        return new AtomGraph(molecules, mapped, new AtomGraph(molecules, mapped));
    }

    private void describe(int i, Molecule molecule, int[] index) {
        int own = atom[i];
        element[i] = molecule.atomicNumber(own);
        isotopes[i] = molecule.isotopicHydrogens(own);
        protium[i] = molecule.hydrogens(own) - isotopes[i];
        charge[i] = molecule.charge(own);
        int[] bonded = molecule.neighbours(own);
        neighbours[i] = IntStream.of(bonded).map(other -> index[other]).toArray();
        bonds[i] = IntStream.of(bonded).map(other -> molecule.aromaticBond(own, other) ? AROMATIC : molecule.bondOrder(own, other)).toArray();
    }

    private static List<int[]> inInputOrder(List<Molecule> molecules) {
        List<int[]> places = new ArrayList<>();
        for (int m = 0; m < molecules.size(); m++) {
            for (int a = 0; a < molecules.get(m).atomCount(); a++) {
                places.add(new int[] {m, a});
            }
        }
        return places;
    }

    private static List<int[]> inCanonicalOrder(AtomGraph unsorted) {
        return IntStream.range(0, unsorted.size()).boxed()
                .sorted(Comparator.<Integer>comparingInt(i -> unsorted.colour[i]).thenComparingInt(i -> unsorted.part[i])
                        .thenComparingInt(i -> unsorted.atom[i]))
                .map(i -> new int[] {unsorted.part[i], unsorted.atom[i]}).toList();
    }

    int size() {
        return element.length;
    }

    int hydrogens(int i) {
        return protium[i] + isotopes[i];
    }

    /** Code of the bond between two atoms, or 0 where there is none. */
    int bond(int one, int other) {
        for (int k = 0; k < neighbours[one].length; k++) {
            if (neighbours[one][k] == other) {
                return bonds[one][k];
            }
        }
        return 0;
    }

    Molecule molecule(int i) {
        return molecules.get(part[i]);
    }
}
