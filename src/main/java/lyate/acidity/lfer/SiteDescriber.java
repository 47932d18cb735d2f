package lyate.acidity.lfer;

import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import lyate.molecule.Molecule;
import lyate.site.Role;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * Describes proton sites by the terms of the linear free-energy relationships. Safe to share between threads; what the sites
 * of one molecule share is kept for the next site of the same molecule.
 */
public final class SiteDescriber {

    private final SeriesTable series;
    private final Substituents substituents;
    private final AtomicReference<Facts> latest = new AtomicReference<>();

    private SiteDescriber(SeriesTable series, Substituents substituents) {
        this.series = series;
        this.substituents = substituents;
    }

    /**
     * Loads the series and the substituent constants.
     *
     * @throws TableException for a bad cell, pattern or group
     */
    public static SiteDescriber load(TableFolders folders) {
        return new SiteDescriber(SeriesTable.load(folders), Substituents.load(folders));
    }

    /** The series a site belongs to, or empty where there is none. */
    public Optional<Series> series(Molecule molecule, Role role, int atom) {
        return series.of(molecule, role, atom);
    }

    /** The description of a site, or empty where it belongs to no series. */
    public Optional<SiteDescription> describe(Molecule molecule, Role role, int atom) {
        return series.of(molecule, role, atom).map(row -> {
            Facts facts = facts(molecule);
            Terms terms = Descriptors.of(facts, atom);
            return new SiteDescription(row, equivalent(molecule, atom), terms.list(), Environment.of(facts, atom), terms.missing());
        });
    }

    private Facts facts(Molecule molecule) {
        Facts known = latest.get();
        if (known == null || known.molecule() != molecule) {
            known = Facts.of(molecule, substituents);
            latest.set(known);
        }
        return known;
    }

    private static int equivalent(Molecule molecule, int atom) {
        int count = 0;
        for (int other = 0; other < molecule.atomCount(); other++) {
            count += molecule.symmetryClass(other) == molecule.symmetryClass(atom) ? 1 : 0;
        }
        return count;
    }
}
