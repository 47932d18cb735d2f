package lyate.molecule;

import java.util.Set;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.interfaces.IStereoElement;
import org.openscience.cdk.isomorphism.matchers.Expr;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;

/** Refuses patterns that the toolkit reads but that nothing can match, or that it would never finish matching. */
final class PatternCheck {

    private PatternCheck() {}

    private static final Set<Integer> KNOWN_CONFIGURATIONS =
            Set.of(IStereoElement.Tetrahedral, IStereoElement.CisTrans, IStereoElement.Allenal);

    /** @throws MoleculeException for an empty pattern, also a nested one, an atom bound to itself, and a configuration of metals */
    static void check(IAtomContainer query) throws MoleculeException {
        if (query.isEmpty()) {
            throw new MoleculeException("the pattern, or one nested in it, is empty");
        }
        for (IBond bond : query.bonds()) {
            if (bond.getBegin().equals(bond.getEnd())) {
                throw new MoleculeException("the pattern has a ring bond from an atom to itself");
            }
        }
        for (IStereoElement<?, ?> element : query.stereoElements()) {
            if (!KNOWN_CONFIGURATIONS.contains(element.getConfigClass())) {
                throw new MoleculeException("the pattern has a configuration other than that of a tetrahedral atom or a double bond (@, @@, /, \\)");
            }
        }
        for (IAtom atom : query.atoms()) {
            checkNested(((QueryAtom) atom).getExpression());
        }
    }

    private static void checkNested(Expr expression) throws MoleculeException {
        switch (expression.type()) {
            case AND, OR -> {
                checkNested(expression.left());
                checkNested(expression.right());
            }
            case NOT -> checkNested(expression.left());
            case RECURSIVE -> check(expression.subquery());
            default -> { }
        }
    }
}
