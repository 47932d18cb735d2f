package lyate.fit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import lyate.acidity.lfer.EstimateModel;
import lyate.acidity.lfer.SiteDescriber;
import lyate.acidity.lfer.SiteDescription;
import lyate.molecule.Molecule;
import lyate.site.Role;
import lyate.stock.Medium;

/**
 * Finds the site of a value measured in water without one, and drops the value where more than one reading makes sense.
 *
 * <p>Kept are molecules that are neutral before the step, whose most acidic (most basic) site stands apart from the next by
 * {@value #GAP} and is estimated within {@value #RELIABLE} ({@value #UNCERTAIN} for uncertain values) of what was measured.
 */
final class SiteAssignment {

    private static final double GAP = 1.5;
    private static final double RELIABLE = 3;
    private static final double UNCERTAIN = 1.5;
    /** A group of the other role this close would be charged already. */
    private static final double CHARGED = 1;

    private final SiteDescriber describer;
    private final EstimateModel model;

    private record Candidate(int atom, SiteDescription site, double pKa) {}

    SiteAssignment(SiteDescriber describer, EstimateModel model) {
        this.describer = describer;
        this.model = model;
    }

    /** The row with its site, or empty. */
    Optional<TrainingRow> assign(UnplacedRow row) {
        List<Candidate> acids = candidates(row.molecule(), Role.ACID);
        List<Candidate> bases = candidates(row.molecule(), Role.BASE);
        acids.sort(Comparator.comparingDouble(Candidate::pKa));
        bases.sort(Comparator.comparingDouble(candidate -> -candidate.pKa()));
        boolean acid = row.role() == Role.ACID;
        List<Candidate> own = acid ? acids : bases;
        List<Candidate> other = acid ? bases : acids;
        double sign = acid ? 1 : -1;
        if (own.isEmpty() || !other.isEmpty() && sign * (row.pKa() - other.get(0).pKa()) < CHARGED) {
            return Optional.empty();
        }
        if (own.size() > 1 && sign * (own.get(1).pKa() - own.get(0).pKa()) < GAP) {
            return Optional.empty();
        }
        Candidate site = own.get(0);
        if (Math.abs(site.pKa() - row.pKa()) > (row.noise() > 1 ? UNCERTAIN : RELIABLE)) {
            return Optional.empty();
        }
        return Optional.of(new TrainingRow(row.place(), row.molecule().input(), row.molecule().label(site.atom()),
                row.molecule().canonicalKey(), "", false, Medium.WATER, site.site(), row.pKa(), row.noise()));
    }

    private List<Candidate> candidates(Molecule molecule, Role role) {
        List<Candidate> candidates = new ArrayList<>();
        Set<Long> seen = new HashSet<>();
        for (int atom = 0; atom < molecule.atomCount(); atom++) {
            boolean possible = role == Role.ACID ? molecule.hydrogens(atom) > 0 : molecule.atomicNumber(atom) != 6;
            if (possible && seen.add(molecule.symmetryClass(atom))) {
                int here = atom;
                describer.describe(molecule, role, atom).ifPresent(site -> model.predict(Medium.WATER, site)
                        .ifPresent(found -> candidates.add(new Candidate(here, site, found.pKa() + site.statistics()))));
            }
        }
        return candidates;
    }
}
