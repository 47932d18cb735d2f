package lyate.acidity.lfer;

import java.util.Arrays;

/**
 * By how much ring nitrogens and substituents help an aromatic ring, or the far end of a double bond, to take up the charge of an
 * anion next to it, pKa units. Read off toluene, picolines, benzylpyridines and arylacetonitriles in DMSO (Bordwell, Acc. Chem. Res. 1988, 21, 456,
 * from memory).
 */
final class RemoteHelp {

    private static final int REACH = 4;
    private static final double PER_SIGMA = 15;
    /** Share of what a group that takes up the charge does next to it that is left across a benzene ring, across a double bond. */
    private static final double PHENYLOGOUS = 0.52;
    private static final double VINYLOGOUS = 0.6;
    /** A group that lowers the pKa of CH3-X by this much takes up the charge itself. */
    private static final double ACCEPTOR = 20;
    private static final double AZA_CONJUGATED = 7;
    private static final double AZA_OTHER = 3;
    private static final double ONIUM = 8;
    private static final double ARYL_AT_END = 5;

    private RemoteHelp() {}

    static double help(Topology t, int branch, Substituent[] constants) {
        int[] distance = new int[t.atoms];
        Arrays.fill(distance, -1);
        int[] queue = new int[t.atoms];
        int tail = 0;
        int root = t.child[branch];
        distance[root] = 0;
        queue[tail++] = root;
        double help = 0;
        for (int head = 0; head < tail; head++) {
            int atom = queue[head];
            boolean conjugated = distance[atom] % 2 == 1;
            if (atom != root && t.element[atom] == 7) {
                help += t.charge[atom] > 0 ? ONIUM : t.degree(atom) == 2 && t.hydrogens[atom] == 0 ? (conjugated ? AZA_CONJUGATED : AZA_OTHER) : 0;
            }
            for (int next = t.first[atom]; next < t.first[atom + 1]; next++) {
                int child = t.child[next];
                if (t.order[next] == Topology.AROMATIC && distance[child] < 0 && distance[atom] < REACH) {
                    distance[child] = distance[atom] + 1;
                    queue[tail++] = child;
                } else if (t.order[next] == 1 && atom != root && t.charge[atom] == 0 && constants[next] != null) {
                    Substituent s = constants[next];
                    help += conjugated ? conjugated(s, PHENYLOGOUS) : PER_SIGMA * (s.induction() + 0.35 * s.resonance());
                }
            }
        }
        return help;
    }

    private static double conjugated(Substituent s, double share) {
        return s.carbanion() >= ACCEPTOR && s.acceptance() > 0 ? share * s.carbanion()
                : PER_SIGMA * (s.induction() + s.resonance() + s.acceptance());
    }

    /** The same for a carbon-carbon double or triple bond: what stands at its far end. */
    static double helpAlongMultipleBond(Topology t, int branch, Substituent[] constants) {
        double help = 0;
        int root = t.child[branch];
        for (int b = t.first[root]; b < t.first[root + 1]; b++) {
            int end = t.child[b];
            for (int c = t.first[end]; (t.order[b] == 2 || t.order[b] == 3) && c < t.first[end + 1]; c++) {
                if (t.child[c] != root && constants[c] != null) {
                    help += t.aromatic[t.child[c]] ? ARYL_AT_END : conjugated(constants[c], VINYLOGOUS);
                }
            }
        }
        return help;
    }
}
