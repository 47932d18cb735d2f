package lyate.acidity;

import java.util.Arrays;
import lyate.molecule.Molecule;
import lyate.site.Role;

/**
 * A proton and the molecule it sits on, described without bond orders and without saying which atom bears the charge.
 *
 * <p>What remains is the skeleton, the hydrogens on each atom, the total charge and the atom that holds the proton in
 * question. Two drawings of one acid (charge-separated or hypervalent nitro, another resonance form, stereo left out,
 * isotopes) give the same place, and so do an acid's proton and the one its drawn conjugate base would take up.
 * Protons that move freely ({@link MobileProtons}) are counted for their atoms together. Immutable.
 */
public final class ProtonSkeleton {

    private static final int ROUNDS = 6;
    private static final int SHARED = 99;

    private final int[] kinds;
    private final int[][] neighbours;
    private final long[] colours;
    private final int start;
    private final long formula;
    private final long hash;

    private ProtonSkeleton(Molecule molecule, Role role, int site) {
        int count = molecule.atomCount();
        this.start = site;
        this.kinds = new int[count];
        this.neighbours = new int[count][];
        MobileProtons mobile = MobileProtons.of(molecule);
        boolean exchanges = exchanges(molecule, role, site) && mobile.shared(site);
        for (int atom = 0; atom < count; atom++) {
            neighbours[atom] = molecule.neighbours(atom);
            int hydrogens = molecule.hydrogens(atom) + (role == Role.BASE && atom == site ? 1 : 0);
            boolean marked = atom == site || exchanges && mobile.together(atom, site);
            kinds[atom] = (molecule.atomicNumber(atom) * 100 + (mobile.shared(atom) ? SHARED : hydrogens)) * 2 + (marked ? 1 : 0);
        }
        this.formula = formula(molecule, role);
        this.colours = refine();
        this.hash = mix(Arrays.stream(colours).map(ProtonSkeleton::mix).sum() + formula);
    }

    /** The place of a site's proton: the one that leaves, or the one that arrives. */
    public static ProtonSkeleton of(Molecule molecule, Role role, int atom) {
        return new ProtonSkeleton(molecule, role, atom);
    }

    /** A number that is the same for equal elemental composition and charge of the acid; quick to get. */
    static long formula(Molecule molecule, Role role) {
        int proton = role == Role.BASE ? 1 : 0;
        long hydrogens = proton;
        long charge = proton;
        long heavy = 0;
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            hydrogens += molecule.hydrogens(atom);
            charge += molecule.charge(atom);
            heavy += mix(molecule.atomicNumber(atom));
        }
        return mix(heavy + mix(1000 + hydrogens) + 31 * mix(5000 + charge));
    }

    /** Equal for equal elemental composition and charge of the acid. */
    long formula() {
        return formula;
    }

    /** Equal places have equal hashes; unequal ones nearly always differ. */
    public long hash() {
        return hash;
    }

    /** Whether both are the same proton of the same acid. */
    public boolean sameAs(ProtonSkeleton other) {
        return hash == other.hash && formula == other.formula && kinds.length == other.kinds.length
                && new SkeletonMatch(this, other).exists();
    }

    /** A vinyl C-H of an enol and the amino nitrogen of an amidine do not take part in the exchange. */
    private static boolean exchanges(Molecule molecule, Role role, int site) {
        boolean doubleBond = Arrays.stream(molecule.neighbours(site)).anyMatch(other -> molecule.bondOrder(site, other) == 2);
        if (molecule.aromatic(site)) {
            return true;
        }
        return switch (molecule.atomicNumber(site)) {
            case 6 -> role == Role.BASE || !doubleBond;
            case 7 -> role == Role.ACID || doubleBond || molecule.charge(site) < 0;
            default -> true;
        };
    }

    private long[] refine() {
        long[] current = Arrays.stream(kinds).mapToLong(ProtonSkeleton::mix).toArray();
        for (int round = 0; round < Math.min(ROUNDS, kinds.length); round++) {
            long[] next = new long[kinds.length];
            for (int atom = 0; atom < kinds.length; atom++) {
                long around = 0;
                for (int neighbour : neighbours[atom]) {
                    around += mix(current[neighbour]);
                }
                next[atom] = mix(current[atom] * 31 + around);
            }
            current = next;
        }
        return current;
    }

    int size() {
        return kinds.length;
    }

    int start() {
        return start;
    }

    boolean marked(int atom) {
        return kinds[atom] % 2 == 1;
    }

    long colour(int atom) {
        return colours[atom];
    }

    int[] neighboursOf(int atom) {
        return neighbours[atom];
    }

    /** The finaliser of SplitMix64: spreads every bit over the word. */
    private static long mix(long value) {
        long z = value + 0x9E3779B97F4A7C15L;
        z = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
        z = (z ^ (z >>> 27)) * 0x94D049BB133111EBL;
        return z ^ (z >>> 31);
    }
}
