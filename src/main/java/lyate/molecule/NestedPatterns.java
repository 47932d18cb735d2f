package lyate.molecule;

import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.isomorphism.matchers.Expr;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;
import org.openscience.cdk.silent.SilentChemObjectBuilder;

/** The toolkit compiles {@code $(...)} on first use; done beforehand, a pattern never changes while threads share it. */
final class NestedPatterns {

    private NestedPatterns() {}

    /** Compiles every nested pattern of a query. */
    static void compile(IAtomContainer query) {
        for (IAtom atom : query.atoms()) {
            compile(((QueryAtom) atom).getExpression());
        }
    }

    /** Compiles every nested pattern of what one atom is asked. */
    static void compile(Expr expression) {
        switch (expression.type()) {
            case AND, OR -> {
                compile(expression.left());
                compile(expression.right());
            }
            case NOT -> compile(expression.left());
            case RECURSIVE -> {
                compile(expression.subquery());
                expression.matches(SilentChemObjectBuilder.getInstance().newAtomContainer().newAtom(6, 4));
            }
            default -> { }
        }
    }
}
