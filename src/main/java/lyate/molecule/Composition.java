package lyate.molecule;

import java.util.Map;
import java.util.TreeMap;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.tools.manipulator.AtomContainerManipulator;

/** Sum formula and molar mass. */
final class Composition {

    private Composition() {}

    /** In the order of Hill: carbon, hydrogen, then the others by symbol; the charge at the end, for example {@code C2H3O2-}. */
    static String formula(IAtomContainer molecule) {
        Map<String, Integer> counts = new TreeMap<>();
        int charge = 0;
        for (IAtom atom : molecule.atoms()) {
            counts.merge(atom.getSymbol(), 1, Integer::sum);
            if (atom.getImplicitHydrogenCount() > 0) {
                counts.merge("H", atom.getImplicitHydrogenCount(), Integer::sum);
            }
            charge += atom.getFormalCharge();
        }
        StringBuilder formula = new StringBuilder();
        if (counts.containsKey("C")) {
            append(formula, "C", counts.remove("C"));
            append(formula, "H", counts.getOrDefault("H", 0));
            counts.remove("H");
        }
        counts.forEach((symbol, count) -> append(formula, symbol, count));
        return formula + charge(charge);
    }

    private static void append(StringBuilder formula, String symbol, int count) {
        if (count > 0) {
            formula.append(symbol).append(count > 1 ? Integer.toString(count) : "");
        }
    }

    private static String charge(int charge) {
        String size = Math.abs(charge) > 1 ? Integer.toString(Math.abs(charge)) : "";
        return charge == 0 ? "" : size + (charge > 0 ? "+" : "-");
    }

    /** g/mol, natural isotopes throughout. */
    static double molarMass(IAtomContainer molecule) {
        return AtomContainerManipulator.getMass(molecule, AtomContainerManipulator.MolWeightIgnoreSpecified);
    }
}
