package lyate.acidity.lfer;

/** A number for the structure of every branch, seen from its root down to a given depth. */
final class BranchKeys {

    /** Deepest level computed. */
    static final int DEPTH = 7;

    private final long[][] keys;

    private BranchKeys(long[][] keys) {
        this.keys = keys;
    }

    static BranchKeys of(Topology t) {
        long[] label = new long[t.atoms];
        for (int atom = 0; atom < t.atoms; atom++) {
            label[atom] = label(t, atom, t.hydrogens[atom], t.degree(atom));
        }
        long[][] keys = new long[DEPTH + 1][t.branches()];
        for (int branch = 0; branch < t.branches(); branch++) {
            keys[1][branch] = mix(label[t.child[branch]], bond(t.order[branch]));
        }
        for (int level = 2; level <= DEPTH; level++) {
            for (int branch = 0; branch < t.branches(); branch++) {
                long sum = 0;
                int root = t.child[branch];
                for (int next = t.first[root]; next < t.first[root + 1]; next++) {
                    if (next != t.reverse[branch]) {
                        sum += mix(keys[level - 1][next], 17);
                    }
                }
                keys[level][branch] = mix(keys[1][branch], sum);
            }
        }
        return new BranchKeys(keys);
    }

    /** Key of a branch to a depth of 1 (its root alone) to {@link #DEPTH}. */
    long key(int branch, int depth) {
        return keys[depth][branch];
    }

    /**
     * Key of the branch that arises when one hydrogen of {@code root} is replaced by a single bond to the rest.
     *
     * @param t a molecule that holds just the group and that hydrogen
     */
    static long ofGroup(Topology t, BranchKeys keys, int root, int depth) {
        long sum = 0;
        for (int next = t.first[root]; depth > 1 && next < t.first[root + 1]; next++) {
            sum += mix(keys.key(next, depth - 1), 17);
        }
        long own = mix(label(t, root, t.hydrogens[root] - 1, t.degree(root) + 1), bond(1));
        return depth > 1 ? mix(own, sum) : own;
    }

    private static long label(Topology t, int atom, int hydrogens, int degree) {
        return ((t.element[atom] * 16L + hydrogens) * 16 + t.charge[atom] + 8) * 32 + degree * 2L + (t.aromatic[atom] ? 1 : 0);
    }

    private static long bond(int order) {
        return order + 101L;
    }

    /** A well-spread number from two (the finaliser of SplitMix64). */
    static long mix(long a, long b) {
        long z = a * 0x9E3779B97F4A7C15L + b + 0x632BE59BD9B4E019L;
        z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
        z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
        return z ^ (z >>> 31);
    }
}
