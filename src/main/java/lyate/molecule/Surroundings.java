package lyate.molecule;

import java.util.Arrays;
import org.openscience.cdk.graph.GraphUtil;
import org.openscience.cdk.interfaces.IAtomContainer;
import org.openscience.cdk.isomorphism.matchers.Expr;
import org.openscience.cdk.isomorphism.matchers.QueryAtom;

/**
 * What stands around an atom, as one number: which kinds of atoms within one, two and three bonds, then the atom's own
 * charge, number of connections and ring membership. A pattern asks for some of these bits; where one lacks, the pattern
 * cannot fit and need not be tried. What this says is only ever "cannot"; what it cannot express it leaves open.
 */
final class Surroundings {

    private static final int KINDS = 16;
    private static final int FARTHEST = 3;
    private static final int AROMATIC_C = 0;
    private static final int C = 1;
    private static final int C_X3 = 2;
    private static final int C_X2 = 3;
    private static final int N = 4;
    private static final int AROMATIC_N = 5;
    private static final int N_X3 = 6;
    private static final int N_X2 = 7;
    private static final int O = 8;
    private static final int O_X1 = 9;
    private static final int CHALCOGEN = 10;
    private static final int PNICTOGEN = 11;
    private static final int HALOGEN = 12;
    private static final int OTHER = 13;
    private static final int PLUS = 14;
    private static final int MINUS = 15;

    private static final int OWN_CHARGE = FARTHEST * KINDS;
    private static final int OWN_CONNECTIONS = OWN_CHARGE + 3;
    private static final int MOST_CONNECTIONS = 4;
    private static final int OWN_RING = OWN_CONNECTIONS + MOST_CONNECTIONS + 1;
    /** While a pattern atom is read: its connections, until it is known of which element it is. */
    private static final int CONNECTIONS = OWN_RING + 1;
    private static final long WHILE_READING = -1L << CONNECTIONS;

    private Surroundings() {}

    /** The bits of every atom. */
    static long[] of(AtomFacts facts) {
        int[] kinds = new int[facts.elements.length];
        Arrays.setAll(kinds, atom -> kinds(facts, atom));
        long[] bits = new long[kinds.length];
        int[] within = new int[kinds.length];
        for (int distance = 1; distance <= FARTHEST; distance++) {
            within = spread(facts, kinds, within);
            for (int atom = 0; atom < bits.length; atom++) {
                bits[atom] |= (long) within[atom] << (distance - 1) * KINDS;
            }
        }
        for (int atom = 0; atom < bits.length; atom++) {
            int connections = Math.min(facts.neighbours[atom].length + facts.hydrogens[atom], MOST_CONNECTIONS);
            bits[atom] |= charge(facts.charges[atom]) | 1L << OWN_CONNECTIONS + connections
                    | (facts.ringBonds[atom] > 0 ? 1L << OWN_RING : 0);
        }
        return bits;
    }

    private static int[] spread(AtomFacts facts, int[] kinds, int[] within) {
        int[] wider = new int[kinds.length];
        for (int atom = 0; atom < kinds.length; atom++) {
            for (int neighbour : facts.neighbours[atom]) {
                wider[atom] |= kinds[neighbour] | within[neighbour];
            }
        }
        return wider;
    }

    private static int kinds(AtomFacts facts, int atom) {
        int kinds = elementKinds(facts.elements[atom], facts.aromatic[atom]) | chargeKind(facts.charges[atom]);
        return kinds | connectedKind(kinds, facts.neighbours[atom].length + facts.hydrogens[atom]);
    }

    private static int elementKinds(int element, boolean aromatic) {
        return switch (element) {
            case 6 -> aromatic ? 1 << AROMATIC_C : 1 << C;
            case 7 -> aromatic ? 1 << N | 1 << AROMATIC_N : 1 << N;
            case 8 -> 1 << O;
            case 16, 34, 52 -> 1 << CHALCOGEN;
            case 15, 33, 51 -> 1 << PNICTOGEN;
            case 9, 17, 35, 53 -> 1 << HALOGEN;
            default -> 1 << OTHER;
        };
    }

    private static int chargeKind(int charge) {
        return charge == 0 ? 0 : 1 << (charge > 0 ? PLUS : MINUS);
    }

    private static int connectedKind(int kinds, int connections) {
        if ((kinds & 1 << C) != 0) {
            return connections == 3 ? 1 << C_X3 : connections == 2 ? 1 << C_X2 : 0;
        }
        if ((kinds & 1 << N) != 0) {
            return connections == 3 ? 1 << N_X3 : connections == 2 ? 1 << N_X2 : 0;
        }
        return (kinds & 1 << O) != 0 && connections == 1 ? 1 << O_X1 : 0;
    }

    private static long charge(int charge) {
        return 1L << OWN_CHARGE + 1 + Integer.signum(charge);
    }

    /** Sets of bits of which a pattern asks for at least one whole set at its first atom. */
    static long[] askedBy(IAtomContainer query) {
        return askedBy(query, 0).sets();
    }

    /** @param offset bonds from the atom at which the whole pattern is tried to the first atom of {@code query} */
    private static Asked askedBy(IAtomContainer query, int offset) {
        int[] distances = Paths.distances(GraphUtil.toAdjList(query), 0);
        Asked asked = Asked.NOTHING;
        for (int i = 0; i < distances.length; i++) {
            if (distances[i] >= 0 && offset + distances[i] <= FARTHEST) {
                int distance = offset + distances[i];
                Expr expression = ((QueryAtom) query.getAtom(i)).getExpression();
                asked = asked.and(askedBy(expression, distance).map(bits -> connected(bits, distance)));
            }
        }
        return asked;
    }

    private static Asked askedBy(Expr expression, int distance) {
        return switch (expression.type()) {
            case AND -> askedBy(expression.left(), distance).and(askedBy(expression.right(), distance));
            case OR -> askedBy(expression.left(), distance).or(askedBy(expression.right(), distance));
            case RECURSIVE -> askedBy(expression.subquery(), distance);
            default -> Asked.of(distance == 0 ? askedOfItself(expression) : askedWithin(expression, distance));
        };
    }

    private static long askedOfItself(Expr expression) {
        return switch (expression.type()) {
            case FORMAL_CHARGE -> charge(expression.value());
            case TOTAL_DEGREE -> 1L << OWN_CONNECTIONS + Math.min(expression.value(), MOST_CONNECTIONS);
            case IS_IN_RING -> 1L << OWN_RING;
            case RING_SMALLEST, RING_BOND_COUNT -> expression.value() > 0 ? 1L << OWN_RING : 0;
            default -> 0;
        };
    }

    private static long askedWithin(Expr expression, int distance) {
        int shift = (distance - 1) * KINDS;
        int value = expression.value();
        return switch (expression.type()) {
            case ALIPHATIC_ELEMENT -> (long) elementKinds(value, false) << shift;
            case AROMATIC_ELEMENT -> (long) elementKinds(value, true) << shift;
            case ELEMENT -> value == 6 ? 0 : (long) elementKinds(value, false) << shift;
            case FORMAL_CHARGE -> (long) chargeKind(value) << shift;
            case TOTAL_DEGREE -> value > 3 ? 0 : 1L << CONNECTIONS + value;
            default -> 0;
        };
    }

    /** Element and connections of one pattern atom together. */
    private static long connected(long bits, int distance) {
        long joined = bits & ~WHILE_READING;
        for (int connections = 1; distance > 0 && connections <= 3; connections++) {
            if ((bits & 1L << CONNECTIONS + connections) != 0) {
                int kinds = (int) (bits >>> (distance - 1) * KINDS) & (1 << KINDS) - 1;
                joined |= (long) connectedKind(kinds, connections) << (distance - 1) * KINDS;
            }
        }
        return joined;
    }
}
