package lyate.review;

import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.stock.Base;
import lyate.stock.Solvent;

/**
 * One row of {@code kinetic-preferences.csv}: of two C-H positions, which one loses its proton first.
 *
 * @param id           stable name
 * @param control      whether the rate or the equilibrium decides
 * @param base         bases it is about
 * @param surroundings solvents and temperatures in which it holds
 * @param prefers      SMARTS whose first atom is the favoured position
 * @param over         SMARTS whose first atom is the other one
 * @param sentence     what the user is told
 * @param source       citation
 * @param hit          an example that must end in this row
 * @param miss         an example that must not
 */
record KineticPreference(String id, Control control, BaseCondition base, Surroundings surroundings, AtomPattern prefers,
                         AtomPattern over, String sentence, String source, String hit, String miss) {

    /** What decides between the two positions. */
    enum Control {
        /** The proton is taken once and for all. */
        RATE,
        /** The anion is made reversibly. */
        EQUILIBRIUM
    }

    boolean holds(Molecule molecule, int preferredAtom, int otherAtom, Base taking, double celsius, Solvent solvent) {
        return base.holdsFor(taking) && surroundings.holdFor(solvent, celsius)
                && prefers.matches(molecule, preferredAtom) && over.matches(molecule, otherAtom);
    }
}
