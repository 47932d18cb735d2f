package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.openscience.cdk.config.Elements;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;

/**
 * How many bonds an atom has and may have. A charged atom counts like the neutral one with as many valence electrons
 * (Langmuir's isosteres): N+ like carbon, O− like fluorine. From the third period on, pairs of further bonds are possible
 * up to one per valence electron.
 */
final class Valence {

    private Valence() {}

    /** Bonds with their orders, hydrogens counted. */
    private static int of(IAtom atom) {
        int sum = atom.getImplicitHydrogenCount();
        for (IBond bond : atom.bonds()) {
            sum += bond.getOrder().numeric();
        }
        return sum;
    }

    /** The atoms that are charged or have other than their lowest valence; all the others are sound. */
    static List<IAtom> oddAtoms(IAtomContainer molecule) {
        int[] bonds = new int[molecule.getAtomCount()];
        for (IBond bond : molecule.bonds()) {
            int order = bond.getOrder().numeric();
            bonds[bond.getBegin().getIndex()] += order;
            bonds[bond.getEnd().getIndex()] += order;
        }
        List<IAtom> odd = new ArrayList<>();
        for (IAtom atom : molecule.atoms()) {
            int valence = bonds[atom.getIndex()] + atom.getImplicitHydrogenCount();
            if (atom.getFormalCharge() != 0 || valence != lowest(valenceElectrons(atom))) {
                odd.add(atom);
            }
        }
        return odd;
    }

    /**
     * Refuses an atom that no closed-shell molecule holds. Metals are not judged.
     *
     * @throws MoleculeException that names the atom, the bonds it has and the bonds it could have
     */
    static void check(IAtom atom) throws MoleculeException {
        int electrons = valenceElectrons(atom);
        int bonds = of(atom);
        if (electrons < 3 || possible(atom, electrons, bonds)) {
            return;
        }
        int most = IntStream.rangeClosed(0, 8).filter(count -> possible(atom, electrons, count)).max().orElse(0);
        String found = InputNumbers.label(atom) + charge(atom) + " has " + bonds + (bonds == 1 ? " bond" : " bonds") + ", hydrogens counted";
        if (bonds < most && possible(atom, electrons, bonds + 1)) {
            throw new MoleculeException(found + ", where " + (bonds + 1) + " belong: radicals cannot be judged", InputNumbers.of(atom));
        }
        String expected = bonds > most ? ", but at most " + most + " are possible"
                : ", where " + lowest(electrons) + " belong: an open valence cannot be judged";
        throw new MoleculeException(found + expected, InputNumbers.of(atom));
    }

    private static boolean possible(IAtom atom, int electrons, int bonds) {
        int period = Elements.ofNumber(atom.getAtomicNumber()).period();
        int lowest = lowest(electrons);
        boolean expanded = period > 2 && electrons > 4 && bonds > lowest && bonds <= electrons && (bonds - lowest) % 2 == 0;
        boolean inertPair = period > 3 && electrons == 4 && bonds == 2;
        return bonds == lowest || expanded || inertPair;
    }

    private static int lowest(int electrons) {
        return electrons <= 4 ? electrons : Math.abs(8 - electrons);
    }

    /** Electrons of the outer shell; 0 for metals outside the main groups. */
    private static int valenceElectrons(IAtom atom) {
        int group = Elements.ofNumber(atom.getAtomicNumber()).group();
        if (group > 2 && group < 13) {
            return 0;
        }
        return (group > 12 ? group - 10 : group) - atom.getFormalCharge();
    }

    private static String charge(IAtom atom) {
        int charge = atom.getFormalCharge();
        if (charge == 0) {
            return "";
        }
        return " (charge " + (charge > 0 ? "+" : "−") + Math.abs(charge) + ")";
    }
}
