package lyate.acidity;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Looks for a one-to-one map of atoms that keeps colours and bonds; the proton's atoms have colours of their own. */
final class SkeletonMatch {

    private final ProtonSkeleton left;
    private final ProtonSkeleton right;
    private final int[] image;
    private final boolean[] taken;
    private final List<Integer> order;

    SkeletonMatch(ProtonSkeleton left, ProtonSkeleton right) {
        this.left = left;
        this.right = right;
        this.image = new int[left.size()];
        this.taken = new boolean[right.size()];
        this.order = outwardsFromTheProton(left);
        Arrays.fill(image, -1);
    }

    boolean exists() {
        return extend(0);
    }

    private boolean extend(int depth) {
        if (depth == order.size()) {
            return true;
        }
        int atom = order.get(depth);
        for (int candidate = 0; candidate < right.size(); candidate++) {
            if (fits(atom, candidate)) {
                image[atom] = candidate;
                taken[candidate] = true;
                if (extend(depth + 1)) {
                    return true;
                }
                image[atom] = -1;
                taken[candidate] = false;
            }
        }
        return false;
    }

    private boolean fits(int atom, int candidate) {
        return !taken[candidate] && left.colour(atom) == right.colour(candidate)
                && left.marked(atom) == right.marked(candidate)
                && left.neighboursOf(atom).length == right.neighboursOf(candidate).length
                && Arrays.stream(left.neighboursOf(atom)).map(neighbour -> image[neighbour]).filter(mapped -> mapped >= 0)
                .allMatch(mapped -> contains(right.neighboursOf(candidate), mapped));
    }

    private static boolean contains(int[] atoms, int atom) {
        return Arrays.stream(atoms).anyMatch(other -> other == atom);
    }

    /** Every atom but the first follows one of its neighbours, so that few candidates fit. */
    private static List<Integer> outwardsFromTheProton(ProtonSkeleton place) {
        boolean[] seen = new boolean[place.size()];
        List<Integer> order = new ArrayList<>(List.of(place.start()));
        seen[place.start()] = true;
        for (int next = 0; next < order.size(); next++) {
            for (int neighbour : place.neighboursOf(order.get(next))) {
                if (!seen[neighbour]) {
                    seen[neighbour] = true;
                    order.add(neighbour);
                }
            }
        }
        return order;
    }
}
