package lyate.molecule;

import java.util.ArrayList;
import java.util.List;
import org.openscience.cdk.config.Elements;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.interfaces.IStereoElement;

/** Metals drawn with bonds: those of groups 1 and 2 are read as ions, the others are refused. */
final class Metals {

    private Metals() {}

    /**
     * Splits the bonds of alkali and alkaline earth metals into ions.
     *
     * @throws MoleculeException for a bond to any other metal
     */
    static void split(IAtomContainer molecule, List<String> warnings) throws MoleculeException {
        List<IBond> ionic = new ArrayList<>();
        for (IBond bond : molecule.bonds()) {
            refuse(bond.getBegin());
            refuse(bond.getEnd());
            if (saltForming(bond.getBegin()) != saltForming(bond.getEnd())) {
                ionic.add(bond);
            }
        }
        for (IBond bond : ionic) {
            IAtom metal = saltForming(bond.getBegin()) ? bond.getBegin() : bond.getEnd();
            IAtom other = bond.getOther(metal);
            warnings.add("the bond between " + InputNumbers.label(metal) + " and " + InputNumbers.label(other) + " is read as ionic");
            breakBond(molecule, bond, metal, other);
        }
    }

    @SuppressWarnings("rawtypes") // the toolkit asks for a list of the raw type
    private static void breakBond(IAtomContainer molecule, IBond bond, IAtom metal, IAtom other) {
        List<IStereoElement> kept = new ArrayList<>();
        molecule.stereoElements().forEach(element -> {
            if (!element.contains(metal)) {
                kept.add(element);
            }
        });
        int order = bond.getOrder().numeric();
        molecule.removeBond(bond);
        metal.setFormalCharge(metal.getFormalCharge() + order);
        other.setFormalCharge(other.getFormalCharge() - order);
        molecule.setStereoElements(kept);
    }

    private static void refuse(IAtom atom) throws MoleculeException {
        if (covalentMetal(atom)) {
            throw new MoleculeException(InputNumbers.label(atom) + " is a metal with covalent bonds, which cannot be judged;"
                    + " give the organic part alone, or draw the metal as an ion", InputNumbers.of(atom));
        }
    }

    /** The transition metals, lanthanides, actinides and the metals under boron; tin, lead and the like stay substituents. */
    private static boolean covalentMetal(IAtom atom) {
        int group = Elements.ofNumber(atom.getAtomicNumber()).group();
        boolean underBoron = group == 13 && atom.getAtomicNumber() != 5;
        return group == 0 || group > 2 && group < 13 || underBoron;
    }

    /** Whether the element is a metal of any kind. */
    static boolean isMetal(IAtom atom) {
        return saltForming(atom) || covalentMetal(atom);
    }

    private static boolean saltForming(IAtom atom) {
        int number = atom.getAtomicNumber();
        int group = Elements.ofNumber(number).group();
        return number > 2 && (group == 1 || group == 2);
    }
}
