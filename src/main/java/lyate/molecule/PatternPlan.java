package lyate.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.openscience.cdk.AtomRef;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;
import org.openscience.cdk.silent.SilentChemObjectBuilder;

/**
 * A pattern laid out as a walk from its first atom: at each step one more bond, to an atom not yet placed or back to one
 * that is. The toolkit's matcher gives the same answers; this one sets nothing up per question, which counts when
 * hundreds of patterns are tried on every atom. Immutable.
 */
final class PatternPlan {

    private final AtomTest[] atoms;
    private final Step[] steps;

    /**
     * One bond of the walk.
     *
     * @param from  query atom already placed
     * @param to    query atom at the other end
     * @param bonds the bond codes that fit
     * @param back  whether the other end is placed already, that is, a ring closes
     */
    private record Step(int from, int to, int bonds, boolean back) {}

    private PatternPlan(AtomTest[] atoms, Step[] steps) {
        this.atoms = atoms;
        this.steps = steps;
    }

    /** The plan, or empty where only the toolkit can answer: stereochemistry, several components, bonds of no definite kind. */
    static Optional<PatternPlan> of(IAtomContainer parsed) {
        // Only in a container of this kind do the atoms of a query know their bonds and their place.
        IAtomContainer query = SilentChemObjectBuilder.getInstance().newInstance(IAtomContainer.class, parsed);
        boolean plain = !query.isEmpty() && !query.stereoElements().iterator().hasNext();
        List<Step> steps = new ArrayList<>();
        boolean[] placed = new boolean[query.getAtomCount()];
        if (!plain || !walk(query.getAtom(0), null, placed, steps) || !all(placed)) {
            return Optional.empty();
        }
        AtomTest[] tests = new AtomTest[query.getAtomCount()];
        for (IAtom atom : query.atoms()) {
            tests[atom.getIndex()] = AtomTest.of(((QueryAtom) AtomRef.deref(atom)).getExpression());
        }
        return Optional.of(new PatternPlan(tests, steps.toArray(Step[]::new)));
    }

    private static boolean walk(IAtom atom, IBond arrived, boolean[] placed, List<Step> steps) {
        placed[atom.getIndex()] = true;
        for (IBond bond : atom.bonds()) {
            IAtom other = bond.getOther(atom);
            boolean done = bond.equals(arrived) || steps.stream().anyMatch(step -> joins(step, atom, other));
            if (done) {
                continue;
            }
            OptionalInt mask = BondMask.of(bond);
            if (mask.isEmpty()) {
                return false;
            }
            boolean back = placed[other.getIndex()];
            steps.add(new Step(atom.getIndex(), other.getIndex(), mask.getAsInt(), back));
            if (!back && !walk(other, bond, placed, steps)) {
                return false;
            }
        }
        return true;
    }

    private static boolean joins(Step step, IAtom one, IAtom other) {
        return step.from() == one.getIndex() && step.to() == other.getIndex()
                || step.from() == other.getIndex() && step.to() == one.getIndex();
    }

    private static boolean all(boolean[] placed) {
        for (boolean atom : placed) {
            if (!atom) {
                return false;
            }
        }
        return true;
    }

    /** Whether the pattern fits with its first atom on {@code atom}. */
    boolean matches(Molecule molecule, int atom) {
        if (!atoms[0].fits(molecule, atom)) {
            return false;
        }
        if (steps.length == 0) {
            return true;
        }
        int[] places = new int[atoms.length];
        Arrays.fill(places, -1);
        places[0] = atom;
        return from(0, molecule, places);
    }

    private boolean from(int index, Molecule molecule, int[] places) {
        if (index == steps.length) {
            return true;
        }
        Step step = steps[index];
        AtomFacts facts = molecule.facts();
        int here = places[step.from()];
        if (step.back()) {
            int code = facts.bondCode(here, places[step.to()]);
            return code >= 0 && (step.bonds() >> code & 1) == 1 && from(index + 1, molecule, places);
        }
        int[] neighbours = facts.neighbours[here];
        int[] codes = facts.bondCodes[here];
        for (int i = 0; i < neighbours.length; i++) {
            boolean fits = (step.bonds() >> codes[i] & 1) == 1 && free(neighbours[i], places)
                    && atoms[step.to()].fits(molecule, neighbours[i]);
            if (fits) {
                places[step.to()] = neighbours[i];
                if (from(index + 1, molecule, places)) {
                    return true;
                }
                places[step.to()] = -1;
            }
        }
        return false;
    }

    private static boolean free(int atom, int[] places) {
        for (int place : places) {
            if (place == atom) {
                return false;
            }
        }
        return true;
    }
}
