package lyate.acidity.lfer;

import java.util.Arrays;

/**
 * The surroundings of a site as a set of weighted features, so that two sites can be compared.
 *
 * @param codes   feature codes, ascending, each once
 * @param weights how much each counts: more often and closer to the site counts more
 * @param total   sum of the weights
 */
record Environment(long[] codes, double[] weights, double total) {

    private static final int REACH = 7;
    private static final double FALL_OFF = 0.72;

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
            double weight = Math.pow(FALL_OFF, d);
            long place = BranchKeys.mix(d, nodes[atom]);
            codes[n] = place;
            weights[n++] = weight;
            codes[n] = BranchKeys.mix(place, t.hydrogens[atom] * 100 + t.degree(atom) * 10L + (t.inRing[atom] ? 1 : 0));
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

    private static Environment packed(long[] codes, double[] weights, int n) {
        Integer[] by = new Integer[n];
        for (int i = 0; i < n; i++) {
            by[i] = i;
        }
        Arrays.sort(by, (a, b) -> Long.compare(codes[a], codes[b]));
        long[] packedCodes = new long[n];
        double[] packedWeights = new double[n];
        int m = -1;
        double total = 0;
        for (int i = 0; i < n; i++) {
            if (m < 0 || packedCodes[m] != codes[by[i]]) {
                packedCodes[++m] = codes[by[i]];
            }
            packedWeights[m] += weights[by[i]];
            total += weights[by[i]];
        }
        return new Environment(Arrays.copyOf(packedCodes, m + 1), Arrays.copyOf(packedWeights, m + 1), total);
    }

    /** 1 for the same surroundings, 0 for nothing in common: shared weight over joint weight. */
    double similarity(Environment other) {
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
