package lyate.acidity.lfer;

import java.util.Arrays;

/**
 * The surroundings of a site as a set of weighted features, so that two sites can be compared.
 *
 * @param codes   feature codes, ascending, each once
 * @param weights how much each counts: more often and closer to the site counts more
 * @param total   sum of the weights
 */
public record Environment(long[] codes, double[] weights, double total) {

    private static final int REACH = 7;
    /** 0.72 to the power of the distance. */
    private static final double[] FALL_OFF = {1, 0.72, 0.5184, 0.3732, 0.2687, 0.1935, 0.1393, 0.1003};

    static Environment of(Facts facts, int site) {
        Topology t = facts.topology();
        int[] distance = t.distances(site);
        int[] nodes = new int[t.atoms];
        for (int atom = 0; atom < t.atoms; atom++) {
            nodes[atom] = Math.min(t.element[atom], 60) * 8 + (t.aromatic[atom] ? 4 : 0) + (t.unsaturated(atom) ? 2 : 0) + (t.charge[atom] > 0 ? 1 : 0);
        }
        long[] codes = new long[3 * t.atoms + t.branches() + 8];
        double[] weights = new double[codes.length];
        int n = 0;
        for (int atom = 0; atom < t.atoms; atom++) {
            int d = distance[atom];
            if (d > REACH) {
                continue;
            }
            double weight = FALL_OFF[d];
            long place = BranchKeys.mix(d, nodes[atom]);
            codes[n] = place;
            weights[n++] = weight;
            codes[n] = BranchKeys.mix(place, t.hydrogens[atom] * 100L + t.degree(atom) * 10L + (t.inRing[atom] ? 1 : 0));
            weights[n++] = weight;
            long around = 0;
            for (int branch = t.first[atom]; branch < t.first[atom + 1]; branch++) {
                int child = t.child[branch];
                around += BranchKeys.mix(nodes[child] * 16L + t.order[branch], distance[child] - d);
                if (distance[child] == d + 1) {
                    codes[n] = BranchKeys.mix(place, nodes[child] + 7919L * t.order[branch]);
                    weights[n++] = weight * 0.5;
                }
            }
            codes[n] = BranchKeys.mix(BranchKeys.mix(place, t.hydrogens[atom]), around);
            weights[n++] = weight;
        }
        return packed(codes, weights, n);
    }

    /** Sorts by code (an in-place heap sort, so that nothing is boxed) and adds up equal codes. */
    private static Environment packed(long[] codes, double[] weights, int n) {
        for (int start = n / 2 - 1; start >= 0; start--) {
            sink(codes, weights, start, n);
        }
        for (int end = n - 1; end > 0; end--) {
            swap(codes, weights, 0, end);
            sink(codes, weights, 0, end);
        }
        int m = -1;
        for (int i = 0; i < n; i++) {
            if (m < 0 || codes[m] != codes[i]) {
                codes[++m] = codes[i];
                weights[m] = weights[i];
            } else {
                weights[m] += weights[i];
            }
        }
        double total = 0;
        for (int i = 0; i <= m; i++) {
            total += weights[i];
        }
        return new Environment(Arrays.copyOf(codes, m + 1), Arrays.copyOf(weights, m + 1), total);
    }

    private static void sink(long[] codes, double[] weights, int from, int end) {
        int root = from;
        while (2 * root + 1 < end) {
            int child = 2 * root + 1;
            if (child + 1 < end && codes[child] < codes[child + 1]) {
                child++;
            }
            if (codes[root] >= codes[child]) {
                return;
            }
            swap(codes, weights, root, child);
            root = child;
        }
    }

    private static void swap(long[] codes, double[] weights, int i, int j) {
        long code = codes[i];
        codes[i] = codes[j];
        codes[j] = code;
        double weight = weights[i];
        weights[i] = weights[j];
        weights[j] = weight;
    }

    /** 1 for the same surroundings, 0 for nothing in common: shared weight over joint weight. */
    public double similarity(Environment other) {
        double shared = 0;
        int i = 0;
        int j = 0;
        while (i < codes.length && j < other.codes.length) {
            if (codes[i] == other.codes[j]) {
                shared += Math.min(weights[i++], other.weights[j++]);
            } else if (codes[i] < other.codes[j]) {
                i++;
            } else {
                j++;
            }
        }
        return shared / (total + other.total - shared);
    }
}
