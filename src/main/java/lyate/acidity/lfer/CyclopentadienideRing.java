package lyate.acidity.lfer;

/** The five-membered ring of unsaturated carbon atoms that makes a carbon acid's anion a cyclopentadienide. */
final class CyclopentadienideRing {

    private CyclopentadienideRing() {}

    /** The ring as site, neighbour, next, next, other neighbour; empty where there is none. */
    static int[] around(Topology t, int site) {
        for (int a = t.first[site]; a < t.first[site + 1]; a++) {
            for (int b = a + 1; b < t.first[site + 1]; b++) {
                int first = t.child[a];
                int last = t.child[b];
                if (!fits(t, first) || !fits(t, last)) {
                    continue;
                }
                for (int c = t.first[first]; c < t.first[first + 1]; c++) {
                    for (int d = t.first[last]; d < t.first[last + 1]; d++) {
                        int second = t.child[c];
                        int third = t.child[d];
                        if (second != site && third != site && second != third && fits(t, second) && fits(t, third)
                                && t.branchBetween(second, third) >= 0) {
                            return new int[] {site, first, second, third, last};
                        }
                    }
                }
            }
        }
        return new int[0];
    }

    private static boolean fits(Topology t, int atom) {
        return t.element[atom] == 6 && t.unsaturated(atom) && !t.oxo(atom);
    }

    /** Benzo rings fused to the ring. */
    static int fusedBenzo(Topology t, int[] ring) {
        int aromatic = 0;
        for (int atom : ring) {
            aromatic += t.aromatic[atom] ? 1 : 0;
        }
        return aromatic / 2;
    }
}
