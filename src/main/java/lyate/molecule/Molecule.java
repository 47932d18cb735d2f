package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;

/**
 * One molecule, perceived once and never changed: rings, aromaticity, hydrogens and symmetry are settled.
 *
 * <p>Atoms are heavy atoms, addressed by a 0-based index; {@link #label(int)} gives the name users see, the element
 * symbol and the 1-based number in the order of the input (explicit hydrogens and counter-ions count there).
 * Safe to share between threads.
 */
public final class Molecule {

    private final String input;
    private final IAtomContainer container;
    private final int[] inputNumbers;
    private final long[] symmetryClasses;
    private final int[][] neighbours;
    private final List<String> counterIons;
    private final List<String> warnings;

    Molecule(String input, Perception perceived, List<String> counterIons, List<String> warnings) {
        this.input = input;
        this.container = perceived.container();
        this.inputNumbers = perceived.inputNumbers();
        this.symmetryClasses = perceived.symmetryClasses();
        this.neighbours = perceived.neighbours();
        this.counterIons = List.copyOf(counterIons);
        this.warnings = List.copyOf(warnings);
    }

    /** What the user gave. */
    public String input() {
        return input;
    }

    /** Number of heavy atoms. */
    public int atomCount() {
        return inputNumbers.length;
    }

    /** Atomic number. */
    public int atomicNumber(int atom) {
        return container.getAtom(atom).getAtomicNumber();
    }

    /** Element symbol. */
    public String symbol(int atom) {
        return container.getAtom(atom).getSymbol();
    }

    /** Hydrogens bound to the atom, deuterium included. */
    public int hydrogens(int atom) {
        return container.getAtom(atom).getImplicitHydrogenCount();
    }

    /** Formal charge. */
    public int charge(int atom) {
        return container.getAtom(atom).getFormalCharge();
    }

    /** Whether the atom belongs to an aromatic ring (Daylight model). */
    public boolean aromatic(int atom) {
        return container.getAtom(atom).isAromatic();
    }

    /** Whether the atom belongs to any ring. */
    public boolean inRing(int atom) {
        return container.getAtom(atom).isInRing();
    }

    /** Indices of the bonded heavy atoms; a copy. */
    public int[] neighbours(int atom) {
        return neighbours[atom].clone();
    }

    /** Bond order 1, 2 or 3 in the Kekule form, or 0 where the atoms are not bonded. */
    public int bondOrder(int first, int second) {
        IBond bond = container.getBond(container.getAtom(first), container.getAtom(second));
        return bond == null ? 0 : bond.getOrder().numeric();
    }

    /** Whether the bond belongs to an aromatic ring. */
    public boolean aromaticBond(int first, int second) {
        IBond bond = container.getBond(container.getAtom(first), container.getAtom(second));
        return bond != null && bond.isAromatic();
    }

    /** Whether the bond belongs to any ring. */
    public boolean ringBond(int first, int second) {
        IBond bond = container.getBond(container.getAtom(first), container.getAtom(second));
        return bond != null && bond.isInRing();
    }

    /** Constitutionally equivalent atoms share this number. */
    public long symmetryClass(int atom) {
        return symmetryClasses[atom];
    }

    /** The name users see, for example {@code C3}. */
    public String label(int atom) {
        return symbol(atom) + inputNumbers[atom];
    }

    /** 1-based number in the order of the input. */
    public int inputNumber(int atom) {
        return inputNumbers[atom];
    }

    /** The atom that carries a label, compared without regard to case. */
    public OptionalInt atomLabelled(String label) {
        for (int atom = 0; atom < atomCount(); atom++) {
            if (label(atom).equalsIgnoreCase(label.strip())) {
                return OptionalInt.of(atom);
            }
        }
        return OptionalInt.empty();
    }

    /** Indices of tetrahedral atoms whose configuration the input states. */
    public List<Integer> stereocentres() {
        List<Integer> centres = new ArrayList<>();
        container.stereoElements().forEach(element -> {
            if (element.getFocus() instanceof IAtom focus) {
                centres.add(focus.getIndex());
            }
        });
        return centres.stream().sorted().toList();
    }

    /** SMILES of the components that are not the substrate, in input order. */
    public List<String> counterIons() {
        return counterIons;
    }

    /** What was changed or assumed while reading, in words. */
    public List<String> warnings() {
        return warnings;
    }

    /** The prepared toolkit molecule, for this package alone; nobody may change it. */
    IAtomContainer container() {
        return container;
    }
}
