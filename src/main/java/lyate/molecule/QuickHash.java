package lyate.molecule;

/** A number for a constitution: order of atoms, configuration and isotopes do not matter. */
final class QuickHash {

    private QuickHash() {}

    /** Two rounds of neighbourhood hashing, summed over the atoms. */
    static long of(AtomFacts facts) {
        long[] values = new long[facts.elements.length];
        for (int atom = 0; atom < values.length; atom++) {
            values[atom] = mix(facts.elements[atom] << 16 | facts.neighbours[atom].length << 12 | facts.hydrogens[atom] << 8
                    | facts.charges[atom] + 8 << 1 | (facts.aromatic[atom] ? 1 : 0));
        }
        for (int round = 0; round < 2; round++) {
            values = withNeighbours(values, facts.neighbours);
        }
        long sum = 0;
        for (long value : values) {
            sum += value;
        }
        return sum;
    }

    private static long[] withNeighbours(long[] values, int[][] neighbours) {
        long[] next = new long[values.length];
        for (int atom = 0; atom < values.length; atom++) {
            long sum = 3 * values[atom];
            for (int neighbour : neighbours[atom]) {
                sum += mix(values[neighbour]);
            }
            next[atom] = mix(sum);
        }
        return next;
    }

    /** The finaliser of MurmurHash3 (Appleby, public domain). */
    private static long mix(long value) {
        long mixed = value;
        mixed = (mixed ^ mixed >>> 33) * 0xff51afd7ed558ccdL;
        mixed = (mixed ^ mixed >>> 33) * 0xc4ceb9fe1a85ec53L;
        return mixed ^ mixed >>> 33;
    }
}
