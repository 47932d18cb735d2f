package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IStereoElement;

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
    private final AtomFacts facts;
    private final long quickHash;
    private final List<IAtomContainer> others;
    private final List<String> counterIons;
    private final List<String> warnings;
    /** Written when first asked for; threads that meet here write the same text twice, which does no harm. */
    private String canonicalKey;

    Molecule(String input, Perception perceived, List<IAtomContainer> others, List<String> warnings) {
        this.input = input;
        this.container = perceived.container();
        this.inputNumbers = perceived.inputNumbers();
        this.symmetryClasses = perceived.symmetryClasses();
        this.facts = perceived.facts();
        this.quickHash = QuickHash.of(facts);
        this.others = List.copyOf(others);
        this.counterIons = others.stream().map(SmilesWriter::full).toList();
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
        return facts.elements[atom];
    }

    /** Element symbol. */
    public String symbol(int atom) {
        return container.getAtom(atom).getSymbol();
    }

    /** Hydrogens bound to the atom, deuterium included. */
    public int hydrogens(int atom) {
        return facts.hydrogens[atom];
    }

    /** How many of the hydrogens bound to the atom are deuterium or tritium. */
    public int isotopicHydrogens(int atom) {
        return Hydrogens.isotopes(container.getAtom(atom));
    }

    /** The number that ties an atom to its place on the other side of a reaction; 0 where the input gives none. */
    public int mapNumber(int atom) {
        return container.getAtom(atom).getMapIdx();
    }

    /** Formal charge. */
    public int charge(int atom) {
        return facts.charges[atom];
    }

    /** Whether the atom belongs to an aromatic ring (Daylight model). */
    public boolean aromatic(int atom) {
        return facts.aromatic[atom];
    }

    /** Whether the atom belongs to any ring. */
    public boolean inRing(int atom) {
        return facts.ringBonds[atom] > 0;
    }

    /** Indices of the bonded heavy atoms; a copy. */
    public int[] neighbours(int atom) {
        return facts.neighbours[atom].clone();
    }

    /** Bond order 1, 2 or 3 in the Kekule form, or 0 where the atoms are not bonded. */
    public int bondOrder(int first, int second) {
        int code = facts.bondCode(first, second);
        return code < 0 ? 0 : AtomFacts.order(code);
    }

    /** Whether the bond belongs to an aromatic ring. */
    public boolean aromaticBond(int first, int second) {
        int code = facts.bondCode(first, second);
        return code >= 0 && AtomFacts.isAromatic(code);
    }

    /** Whether the bond belongs to any ring. */
    public boolean ringBond(int first, int second) {
        int code = facts.bondCode(first, second);
        return code >= 0 && AtomFacts.isInRing(code);
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
            if (element.getConfigClass() == IStereoElement.Tetrahedral) {
                centres.add(((IAtom) element.getFocus()).getIndex());
            }
        });
        return centres.stream().sorted().toList();
    }

    /** Whether two groups lie on one side of the double bond between {@code first} and {@code second}; empty where the input leaves it open. */
    public Optional<Boolean> together(int first, int second, int onFirst, int onSecond) {
        return DoubleBondSides.together(container, first, second, onFirst, onSecond);
    }

    /** {@code cis} or {@code trans} for every double bond whose configuration the input states, sorted; empty where it states none. */
    public List<String> doubleBondConfigurations() {
        return DoubleBondSides.marks(container);
    }

    /** Bonds on the shortest path between two atoms. */
    public int distance(int from, int to) {
        return distances(from)[to];
    }

    /** Bonds on the shortest path from one atom to every atom, by index. */
    public int[] distances(int from) {
        return Paths.distances(facts.neighbours, from);
    }

    /** Size of the smallest ring through the atom; 0 where it is in none. */
    public int smallestRing(int atom) {
        return facts.smallestRing(atom);
    }

    /**
     * SMILES of the substrate, atoms in canonical order, configuration and isotopes included; reading it gives the same
     * molecule. To compare molecules ask {@link #canonicalKey()}.
     */
    public String smiles() {
        return SmilesWriter.full(container);
    }

    /** Canonical SMILES of the substrate without configuration and isotopes: equal for equal constitutions. */
    public String canonicalKey() {
        if (canonicalKey == null) {
            canonicalKey = SmilesWriter.constitution(container);
        }
        return canonicalKey;
    }

    /** A number that is equal wherever {@link #canonicalKey()} is, and rarely elsewhere; costs nothing to ask for. */
    public long quickHash() {
        return quickHash;
    }

    /** Whether two substrates have the same constitution; configuration and isotopes do not count. */
    public boolean sameConstitution(Molecule other) {
        return quickHash == other.quickHash && canonicalKey().equals(other.canonicalKey());
    }

    /** Sum formula of the substrate in the order of Hill, its charge at the end. */
    public String formula() {
        return Composition.formula(container);
    }

    /** g/mol of the substrate alone, natural isotopes. */
    public double molarMass() {
        return Composition.molarMass(container);
    }

    /** g/mol of everything that was given: what is weighed. */
    public double molarMassWithCounterIons() {
        return molarMass() + others.stream().mapToDouble(Composition::molarMass).sum();
    }

    /** SMILES of the components that are not the substrate, in input order. */
    public List<String> counterIons() {
        return counterIons;
    }

    /** What was changed or assumed while reading, in words. */
    public List<String> warnings() {
        return warnings;
    }

    /** What patterns ask, for this package alone; nobody may change it. */
    AtomFacts facts() {
        return facts;
    }

    /** The prepared toolkit molecule, for this package alone; nobody may change it. */
    IAtomContainer container() {
        return container;
    }
}
