package lyate.sheet.reaction;

import java.util.Arrays;

/** The order in which product atoms are decided: always next to what is decided, each new part from its rarest atom. */
final class VisitingOrder {

    private final AtomGraph after;
    private final int[] rarity;

    VisitingOrder(AtomGraph before, AtomGraph after) {
        this.after = after;
        this.rarity = new int[after.size()];
        for (int p = 0; p < rarity.length; p++) {
            for (int r = 0; r < before.size(); r++) {
                boolean alike = before.element[r] == after.element[p] && before.neighbours[r].length == after.neighbours[p].length;
                rarity[p] += before.element[r] == after.element[p] ? alike ? 2 : 1 : 0;
            }
        }
    }

    /** Every undecided atom once. */
    int[] order(int[] source, int undecided) {
        boolean[] seen = new boolean[source.length];
        int left = 0;
        for (int p = 0; p < source.length; p++) {
            seen[p] = source[p] != undecided;
            left += seen[p] ? 0 : 1;
        }
        int[] order = new int[left];
        for (int i = 0; i < left; i++) {
            order[i] = next(seen);
            seen[order[i]] = true;
        }
        return order;
    }

    private int next(boolean[] seen) {
        int best = -1;
        for (int p = 0; p < seen.length; p++) {
            if (!seen[p] && (best < 0 || better(p, best, seen))) {
                best = p;
            }
        }
        return best;
    }

    private boolean better(int p, int best, boolean[] seen) {
        int bonds = bondsToSeen(p, seen);
        int other = bondsToSeen(best, seen);
        if (bonds != other) {
            return bonds > other;
        }
        return rarity[p] < rarity[best];
    }

    private int bondsToSeen(int p, boolean[] seen) {
        return (int) Arrays.stream(after.neighbours[p]).filter(q -> seen[q]).count();
    }
}
