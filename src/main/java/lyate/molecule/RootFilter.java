package lyate.molecule;

import java.util.BitSet;
import org.openscience.cdk.isomorphism.matchers.Expr;

/**
 * Rules out, by a look at one bit, atoms that the first atom of a pattern cannot fit: by element, aromaticity and
 * hydrogen count. What the pattern says beyond these is left open here.
 */
final class RootFilter {

    private static final int MOST_HYDROGENS = 5;
    private static final int ELEMENTS = 119;
    private static final int NO_ELEMENT = 0;

    /** Codes lie below this number. */
    static final int CODES = ELEMENTS * (MOST_HYDROGENS + 1) * 2;

    /** Three answers, ordered so that minimum is "and" and maximum is "or". */
    private static final int NO = -1;
    private static final int OPEN = 0;
    private static final int YES = 1;

    private final BitSet admitted;

    private RootFilter(BitSet admitted) {
        this.admitted = admitted;
    }

    static RootFilter of(Expr root) {
        BitSet named = new BitSet();
        nameElements(root, named);
        BitSet admitted = new BitSet();
        BitSet unnamed = new BitSet();
        admit(root, NO_ELEMENT, unnamed);
        for (int element = 1; element < ELEMENTS; element++) {
            if (named.get(element)) {
                admit(root, element, admitted);
            } else {
                int shift = code(element, false, 0);
                unnamed.stream().forEach(code -> admitted.set(code + shift));
            }
        }
        return new RootFilter(admitted);
    }

    /** Elements that an expression does not name all get the same answer. */
    private static void nameElements(Expr expression, BitSet named) {
        switch (expression.type()) {
            case AND, OR -> {
                nameElements(expression.left(), named);
                nameElements(expression.right(), named);
            }
            case NOT -> nameElements(expression.left(), named);
            case ELEMENT, ALIPHATIC_ELEMENT, AROMATIC_ELEMENT -> named.set(expression.value());
            default -> { }
        }
    }

    private static void admit(Expr root, int element, BitSet admitted) {
        for (int hydrogens = 0; hydrogens <= MOST_HYDROGENS; hydrogens++) {
            for (int aromatic = 0; aromatic < 2; aromatic++) {
                if (answer(root, element, aromatic == 1, hydrogens) != NO) {
                    admitted.set(code(element, aromatic == 1, hydrogens));
                }
            }
        }
    }

    boolean admits(int code) {
        return admitted.get(code);
    }

    /** What the filter looks at, as one number. */
    static int code(int element, boolean aromatic, int hydrogens) {
        return (element * (MOST_HYDROGENS + 1) + Math.min(hydrogens, MOST_HYDROGENS)) * 2 + (aromatic ? 1 : 0);
    }

    private static int answer(Expr expression, int element, boolean aromatic, int hydrogens) {
        return switch (expression.type()) {
            case TRUE -> YES;
            case FALSE -> NO;
            case AND -> Math.min(answer(expression.left(), element, aromatic, hydrogens),
                    answer(expression.right(), element, aromatic, hydrogens));
            case OR -> Math.max(answer(expression.left(), element, aromatic, hydrogens),
                    answer(expression.right(), element, aromatic, hydrogens));
            case NOT -> -answer(expression.left(), element, aromatic, hydrogens);
            case ELEMENT -> of(element == expression.value());
            case ALIPHATIC_ELEMENT -> of(!aromatic && element == expression.value());
            case AROMATIC_ELEMENT -> of(aromatic && element == expression.value());
            case IS_AROMATIC -> of(aromatic);
            case IS_ALIPHATIC -> of(!aromatic);
            case HAS_IMPLICIT_HYDROGEN -> of(hydrogens > 0);
            case IMPL_H_COUNT, TOTAL_H_COUNT -> expression.value() >= MOST_HYDROGENS && hydrogens == MOST_HYDROGENS
                    ? OPEN : of(hydrogens == expression.value());
            default -> OPEN;
        };
    }

    private static int of(boolean fits) {
        return fits ? YES : NO;
    }
}
