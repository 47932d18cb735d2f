package lyate.sheet.reaction;

import java.util.HashMap;
import java.util.Map;

/**
 * Product atoms whose surroundings, several bonds far, occur once on each side: they are taken to be the same atom. Used for
 * reactions too large to search in full.
 */
final class Landmarks {

    private static final int BONDS = 4;

    private final long[] left;
    private final long[] right;

    Landmarks(AtomGraph before, AtomGraph after) {
        this.left = surroundings(before);
        this.right = surroundings(after);
    }

    /** The anchors with landmarks added where neither side is taken. */
    int[] added(int[] anchors) {
        Map<Long, Integer> here = once(left);
        int[] more = anchors.clone();
        once(right).forEach((around, p) -> {
            Integer r = here.get(around);
            boolean free = p >= 0 && r != null && r >= 0 && more[p] < 0;
            for (int other : anchors) {
                free &= r == null || other != r;
            }
            if (free) {
                more[p] = r;
            }
        });
        return more;
    }

    private static Map<Long, Integer> once(long[] surroundings) {
        Map<Long, Integer> atoms = new HashMap<>();
        for (int i = 0; i < surroundings.length; i++) {
            atoms.merge(surroundings[i], i, (one, other) -> -1);
        }
        return atoms;
    }

    private static long[] surroundings(AtomGraph graph) {
        long[] around = new long[graph.size()];
        for (int i = 0; i < around.length; i++) {
            around[i] = Colours.mix(graph.element[i] * 64L + graph.hydrogens(i));
        }
        for (int round = 0; round < BONDS; round++) {
            long[] wider = new long[around.length];
            for (int i = 0; i < around.length; i++) {
                long sum = around[i] * 31;
                for (int k = 0; k < graph.neighbours[i].length; k++) {
                    sum += Colours.mix(around[graph.neighbours[i][k]] + graph.bonds[i][k]);
                }
                wider[i] = Colours.mix(sum);
            }
            around = wider;
        }
        return around;
    }
}
