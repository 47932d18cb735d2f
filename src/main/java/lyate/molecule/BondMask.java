package lyate.molecule;

import java.util.OptionalInt;
import org.openscience.cdk.BondRef;
import org.openscience.cdk.interfaces.IBond;
import org.openscience.cdk.isomorphism.matchers.Expr;
import org.openscience.cdk.isomorphism.matchers.QueryBond;

/** What a pattern asks of one bond, as a bit per {@link AtomFacts#bondCode}. */
final class BondMask {

    private BondMask() {}

    /** The codes of the bonds that fit, or empty where the pattern asks for more than a code tells. */
    static OptionalInt of(IBond queryBond) {
        Expr expression = ((QueryBond) BondRef.deref(queryBond)).getExpression();
        int mask = 0;
        for (int order = 1; order <= 3; order++) {
            for (int flags = 0; flags < 4; flags++) {
                boolean aromatic = flags > 1;
                boolean inRing = flags % 2 == 1;
                if (!known(expression)) {
                    return OptionalInt.empty();
                }
                mask |= fits(expression, order, aromatic, inRing) ? 1 << AtomFacts.bondCode(order, aromatic, inRing) : 0;
            }
        }
        return OptionalInt.of(mask);
    }

    private static boolean known(Expr expression) {
        return switch (expression.type()) {
            case AND, OR -> known(expression.left()) && known(expression.right());
            case NOT -> known(expression.left());
            case TRUE, FALSE, ALIPHATIC_ORDER, ORDER, IS_AROMATIC, IS_ALIPHATIC, IS_IN_RING, IS_IN_CHAIN, SINGLE_OR_AROMATIC,
                 DOUBLE_OR_AROMATIC, SINGLE_OR_DOUBLE -> true;
            default -> false;
        };
    }

    private static boolean fits(Expr expression, int order, boolean aromatic, boolean inRing) {
        return switch (expression.type()) {
            case TRUE -> true;
            case AND -> fits(expression.left(), order, aromatic, inRing) && fits(expression.right(), order, aromatic, inRing);
            case OR -> fits(expression.left(), order, aromatic, inRing) || fits(expression.right(), order, aromatic, inRing);
            case NOT -> !fits(expression.left(), order, aromatic, inRing);
            case ALIPHATIC_ORDER -> !aromatic && order == expression.value();
            case ORDER -> order == expression.value();
            case IS_AROMATIC -> aromatic;
            case IS_ALIPHATIC -> !aromatic;
            case IS_IN_RING -> inRing;
            case IS_IN_CHAIN -> !inRing;
            case SINGLE_OR_AROMATIC -> aromatic || order == 1;
            case DOUBLE_OR_AROMATIC -> aromatic || order == 2;
            case SINGLE_OR_DOUBLE -> order == 1 || order == 2;
            default -> false;
        };
    }
}
