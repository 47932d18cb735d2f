package lyate.acidity.lfer;

import java.util.ArrayList;
import java.util.List;

/** Six-membered rings through one atom. */
final class SixRing {

    private SixRing() {}

    /** Every ring of six atoms that holds {@code start}, each listed once, {@code start} first. */
    static List<int[]> around(Topology t, int start) {
        List<int[]> rings = new ArrayList<>();
        int[] path = new int[6];
        path[0] = start;
        extend(t, path, 1, rings);
        return rings;
    }

    private static void extend(Topology t, int[] path, int length, List<int[]> rings) {
        int last = path[length - 1];
        for (int branch = t.first[last]; branch < t.first[last + 1]; branch++) {
            int next = t.child[branch];
            if (!t.ringBond[branch] || contains(path, length, next)) {
                continue;
            }
            path[length] = next;
            if (length < 5) {
                extend(t, path, length + 1, rings);
            } else if (path[1] < next && t.branchBetween(next, path[0]) >= 0) {
                rings.add(path.clone());
            }
        }
    }

    private static boolean contains(int[] path, int length, int atom) {
        for (int i = 0; i < length; i++) {
            if (path[i] == atom) {
                return true;
            }
        }
        return false;
    }
}
