package lyate.molecule;

import org.openscience.cdk.isomorphism.matchers.Expr;

/** What a pattern asks of one atom, ready to be answered from {@link AtomFacts}. */
@FunctionalInterface
interface AtomTest {

    boolean fits(Molecule molecule, int atom);

    /** The test a query atom stands for; what is rare is left to the toolkit. */
    static AtomTest of(Expr expression) {
        int value = expression.value();
        return switch (expression.type()) {
            case TRUE -> (molecule, atom) -> true;
            case FALSE -> (molecule, atom) -> false;
            case AND -> both(of(expression.left()), of(expression.right()));
            case OR -> either(of(expression.left()), of(expression.right()));
            case NOT -> not(of(expression.left()));
            case RECURSIVE -> nested(expression);
            case ELEMENT -> (molecule, atom) -> molecule.facts().elements[atom] == value;
            case ALIPHATIC_ELEMENT -> (molecule, atom) -> molecule.facts().elements[atom] == value && !molecule.facts().aromatic[atom];
            case AROMATIC_ELEMENT -> (molecule, atom) -> molecule.facts().elements[atom] == value && molecule.facts().aromatic[atom];
            case IS_AROMATIC -> (molecule, atom) -> molecule.facts().aromatic[atom];
            case IS_ALIPHATIC -> (molecule, atom) -> !molecule.facts().aromatic[atom];
            case TOTAL_H_COUNT, IMPL_H_COUNT -> (molecule, atom) -> molecule.facts().hydrogens[atom] == value;
            case HAS_IMPLICIT_HYDROGEN -> (molecule, atom) -> molecule.facts().hydrogens[atom] > 0;
            case DEGREE, HEAVY_DEGREE -> (molecule, atom) -> molecule.facts().neighbours[atom].length == value;
            case TOTAL_DEGREE -> (molecule, atom) -> molecule.facts().neighbours[atom].length + molecule.facts().hydrogens[atom] == value;
            case VALENCE -> (molecule, atom) -> molecule.facts().valences[atom] == value;
            case FORMAL_CHARGE -> (molecule, atom) -> molecule.facts().charges[atom] == value;
            case IS_IN_RING -> (molecule, atom) -> molecule.facts().ringBonds[atom] > 0;
            case IS_IN_CHAIN -> (molecule, atom) -> molecule.facts().ringBonds[atom] == 0;
            case RING_BOND_COUNT -> (molecule, atom) -> molecule.facts().ringBonds[atom] > 0 && molecule.facts().ringBonds[atom] == value;
            case RING_SMALLEST -> (molecule, atom) -> molecule.facts().ringBonds[atom] > 0 && molecule.facts().smallestRing(atom) == value;
            default -> (molecule, atom) -> expression.matches(molecule.container().getAtom(atom));
        };
    }

    private static AtomTest both(AtomTest one, AtomTest other) {
        return (molecule, atom) -> one.fits(molecule, atom) && other.fits(molecule, atom);
    }

    private static AtomTest either(AtomTest one, AtomTest other) {
        return (molecule, atom) -> one.fits(molecule, atom) || other.fits(molecule, atom);
    }

    private static AtomTest not(AtomTest test) {
        return (molecule, atom) -> !test.fits(molecule, atom);
    }

    private static AtomTest nested(Expr expression) {
        return PatternPlan.of(expression.subquery()).<AtomTest>map(plan -> plan::matches).orElseGet(() -> {
            NestedPatterns.compile(expression);
            return (molecule, atom) -> expression.matches(molecule.container().getAtom(atom));
        });
    }
}
