package lyate.acidity.lfer;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.site.Role;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * Describes proton sites by the terms of the linear free-energy relationships. Safe to share between threads; each keeps
 * what it last worked out, since the sites of one molecule are asked for one after another, and once for each medium.
 */
public final class SiteDescriber {

    private final SeriesTable series;
    private final Substituents substituents;
    private final ThreadLocal<Latest> latest = new ThreadLocal<>();

    /** A molecule and the descriptions of its sites so far. */
    private record Latest(Facts facts, Map<Site, Optional<SiteDescription>> described) {}

    private record Site(Role role, int atom) {}

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
        Latest known = latest.get();
        if (known == null || known.facts().molecule() != molecule) {
            known = new Latest(Facts.of(molecule, substituents), new HashMap<>());
            latest.set(known);
        }
        Facts facts = known.facts();
        return known.described().computeIfAbsent(new Site(role, atom), site -> describe(facts, role, atom));
    }

    private Optional<SiteDescription> describe(Facts facts, Role role, int atom) {
        return series.of(facts.molecule(), role, atom).map(row -> {
            Terms terms = Descriptors.of(facts, atom);
            return new SiteDescription(row, equivalent(facts.molecule(), atom), terms.list(), Environment.of(facts, atom), terms.missing());
        });
    }

    private static int equivalent(Molecule molecule, int atom) {
        int count = 0;
        for (int other = 0; other < molecule.atomCount(); other++) {
            count += molecule.symmetryClass(other) == molecule.symmetryClass(atom) ? 1 : 0;
        }
        return count;
    }
}
