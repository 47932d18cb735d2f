package lyate.acidity;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.stock.Medium;
import lyate.table.Table;
import lyate.table.TableFolders;

/**
 * How much the loss of one proton raises the pKa of another site of the same molecule, from
 * {@code site-couplings.csv}: by the bonds between them, conjugation, the charges that come about, and the medium. It is
 * the same whichever of the two goes first, as the thermodynamic cycle demands, and never negative. Immutable; safe to
 * share between threads.
 */
public final class SiteCoupling {

    /** Families whose acids are cations. */
    private static final Set<String> CATIONS = Set.of("ammonium", "tertiary-ammonium", "anilinium", "pyridinium", "amidinium",
            "oxonium", "phosphonium");
    private static final int CARBON = 6;
    private static final double LEAST_SIGMA = 0.15;

    private final List<CouplingRow> rows;
    private final Set<String> namedMedia;

    private SiteCoupling(List<CouplingRow> rows) {
        this.rows = rows;
        this.namedMedia = rows.stream().flatMap(row -> row.media().stream()).collect(Collectors.toUnmodifiableSet());
    }

    /** Loads the table. */
    public static SiteCoupling load(TableFolders folders) {
        return new SiteCoupling(Table.read(CouplingRow.SCHEMA, folders).rows().stream().map(CouplingRow::of).toList());
    }

    /**
     * A raise of the pKa.
     *
     * @param pKa    pKa units, at least 0
     * @param sigma  one standard uncertainty, pKa units
     * @param source where it comes from
     */
    public record Shift(double pKa, double sigma, String source) {}

    /**
     * By how much removal of the proton at {@code ionised} raises the pKa of {@code other}, pKa units, at least 0. For a
     * base site the proton meant is the one it takes up: a carboxylate raises the pKa of an amine. Of equivalent atoms
     * the nearest two count; a site with itself means two of its equivalent atoms, or one atom that has no equivalent.
     */
    public double shift(Molecule molecule, ProtonSite ionised, ProtonSite other, Medium medium) {
        return between(molecule, ionised, other, medium).pKa();
    }

    /** The same with its uncertainty and source. */
    public Shift between(Molecule molecule, ProtonSite one, ProtonSite other, Medium medium) {
        int atom = one.atom();
        int otherAtom = other.atom();
        int nearest = Integer.MAX_VALUE;
        for (int first : one.equivalent()) {
            int[] distances = molecule.distances(first);
            for (int second : other.equivalent()) {
                if (first != second && distances[second] < nearest) {
                    atom = first;
                    otherAtom = second;
                    nearest = distances[second];
                }
            }
        }
        return between(molecule, one, atom, other, otherAtom, medium);
    }

    /**
     * The coupling of two definite atoms.
     *
     * @param atom      one of the equivalent atoms of {@code one}
     * @param otherAtom one of the equivalent atoms of {@code other}
     */
    public Shift between(Molecule molecule, ProtonSite one, int atom, ProtonSite other, int otherAtom, Medium medium) {
        CouplingPath path = CouplingPath.between(molecule, atom, otherAtom);
        String charge = charge(molecule, one, other);
        String key = namedMedia.contains(medium.id()) ? medium.id() : CouplingRow.OTHER_MEDIA;
        return shift(key, charge, path).or(() -> elsewhere(charge, path))
                .orElseThrow(() -> new IllegalStateException("no coupling for " + charge + " " + path));
    }

    private static String charge(Molecule molecule, ProtonSite one, ProtonSite other) {
        if (molecule.atomicNumber(one.atom()) == CARBON || molecule.atomicNumber(other.atom()) == CARBON) {
            return "carbon";
        }
        boolean cation = CATIONS.contains(one.siteClass().family());
        boolean otherCation = CATIONS.contains(other.siteClass().family());
        return cation != otherCation ? "opposite" : cation ? "cations" : "anions";
    }

    private Optional<Shift> shift(String medium, String charge, CouplingPath path) {
        List<CouplingRow> group = rows.stream().filter(row -> row.serves(charge, path.kind()))
                .filter(row -> row.media().contains(medium) || row.media().contains(CouplingRow.ANY)).toList();
        Optional<CouplingRow> row = group.stream().filter(candidate -> candidate.reaches(path))
                .max(Comparator.comparingInt(CouplingRow::bonds).thenComparingInt(CouplingRow::ways));
        if (row.isEmpty() && path.kind() != path.kind().plain()) {
            return shift(medium, charge, new CouplingPath(path.kind().plain(), path.bonds(), path.ways()));
        }
        return row.or(() -> group.stream().min(Comparator.comparingInt(CouplingRow::bonds).thenComparingInt(CouplingRow::ways)))
                .map(found -> along(found, path));
    }

    private static Shift along(CouplingRow row, CouplingPath path) {
        double factor = Math.pow(row.perFurtherBond(), Math.max(0, path.bonds() - row.bonds()));
        return new Shift(row.raise() * factor, Math.max(LEAST_SIGMA, row.sigma() * factor), row.source());
    }

    /** No pair is known in such a medium: what holds in water, with twice the uncertainty. */
    private Optional<Shift> elsewhere(String charge, CouplingPath path) {
        return shift(Medium.WATER.id(), charge, path)
                .map(shift -> new Shift(shift.pKa(), 2 * shift.sigma(), shift.source() + "; taken over from water"));
    }
}
