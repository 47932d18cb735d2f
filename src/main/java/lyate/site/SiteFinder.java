package lyate.site;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.molecule.LastMatch;
import lyate.molecule.Molecule;

/** Finds the proton sites of a molecule. Immutable; safe to share between threads. */
public final class SiteFinder {

    private final Rows acids;
    private final Rows bases;

    /** The rows of one role. */
    private record Rows(List<SiteClass> classes, LastMatch patterns) {

        static Rows of(SiteClasses classes, Role role) {
            List<SiteClass> rows = classes.rows().stream().filter(row -> row.role() == role).toList();
            return new Rows(rows, new LastMatch(rows.stream().map(SiteClass::pattern).toList()));
        }

        Optional<SiteClass> classOf(Molecule molecule, int atom) {
            int row = patterns.index(molecule, atom);
            return row < 0 ? Optional.empty() : Optional.of(classes.get(row));
        }
    }

    public SiteFinder(SiteClasses classes) {
        this.acids = Rows.of(classes, Role.ACID);
        this.bases = Rows.of(classes, Role.BASE);
    }

    /** Every site, acids before bases, each in the order of its lowest atom. */
    public List<ProtonSite> sites(Molecule molecule) {
        List<ProtonSite> sites = new ArrayList<>(sites(molecule, Role.ACID));
        sites.addAll(sites(molecule, Role.BASE));
        return sites;
    }

    /** The sites of one role. */
    public List<ProtonSite> sites(Molecule molecule, Role role) {
        Map<Long, List<Integer>> equivalents = new LinkedHashMap<>();
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            if (role == Role.BASE || molecule.hydrogens(atom) > 0) {
                equivalents.computeIfAbsent(molecule.symmetryClass(atom), key -> new ArrayList<>()).add(atom);
            }
        }
        Rows rows = role == Role.ACID ? acids : bases;
        List<ProtonSite> sites = new ArrayList<>();
        for (List<Integer> atoms : equivalents.values()) {
            rows.classOf(molecule, atoms.get(0)).ifPresent(row -> sites.add(site(molecule, role, atoms, row)));
        }
        return sites;
    }

    private static ProtonSite site(Molecule molecule, Role role, List<Integer> atoms, SiteClass row) {
        int hydrogens = role == Role.BASE ? atoms.size() : atoms.stream().mapToInt(molecule::hydrogens).sum();
        return new ProtonSite(role, atoms.get(0), atoms, hydrogens, row);
    }
}
