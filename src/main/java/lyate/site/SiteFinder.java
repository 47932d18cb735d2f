package lyate.site;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.molecule.Molecule;

/** Finds the proton sites of a molecule. Immutable; safe to share between threads. */
public final class SiteFinder {

    private final List<SiteClass> acids;
    private final List<SiteClass> bases;

    public SiteFinder(SiteClasses classes) {
        this.acids = classes.rows().stream().filter(row -> row.role() == Role.ACID).toList();
        this.bases = classes.rows().stream().filter(row -> row.role() == Role.BASE).toList();
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
        List<ProtonSite> sites = new ArrayList<>();
        for (List<Integer> atoms : equivalents.values()) {
            classOf(molecule, atoms.get(0), role).ifPresent(row -> sites.add(site(molecule, role, atoms, row)));
        }
        return sites;
    }

    private static ProtonSite site(Molecule molecule, Role role, List<Integer> atoms, SiteClass row) {
        int hydrogens = role == Role.BASE ? atoms.size() : atoms.stream().mapToInt(molecule::hydrogens).sum();
        return new ProtonSite(role, atoms.get(0), atoms, hydrogens, row);
    }

    /** The last row that matches. */
    private Optional<SiteClass> classOf(Molecule molecule, int atom, Role role) {
        List<SiteClass> rows = role == Role.ACID ? acids : bases;
        for (int i = rows.size() - 1; i >= 0; i--) {
            if (rows.get(i).pattern().matches(molecule, atom)) {
                return Optional.of(rows.get(i));
            }
        }
        return Optional.empty();
    }
}
