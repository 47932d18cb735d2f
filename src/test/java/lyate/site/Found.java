package lyate.site;

import java.util.List;
import java.util.stream.Collectors;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.molecule.NumberedSmiles;
import lyate.table.TableFolders;

/** The sites of one molecule, for tests. */
record Found(Molecule molecule, List<ProtonSite> sites) {

    static final SiteClasses CLASSES = SiteClasses.load(TableFolders.packaged());
    static final SiteFinder FINDER = new SiteFinder(CLASSES);
    private static final MoleculeReader READER = new MoleculeReader();

    static Molecule read(String text) {
        try {
            return READER.read(text);
        } catch (MoleculeException e) {
            throw new IllegalArgumentException(text + ": " + e.getMessage(), e);
        }
    }

    static Found in(String text, Role role) {
        Molecule molecule = read(text);
        return new Found(molecule, FINDER.sites(molecule, role));
    }

    /** Class of the site that has this atom, or empty text where it is no site. */
    String classAt(String label) {
        int atom = molecule.atomLabelled(label).orElseThrow();
        return sites.stream().filter(site -> site.equivalent().contains(atom)).map(site -> site.siteClass().id())
                .findFirst().orElse("");
    }

    boolean has(String classId) {
        return sites.stream().anyMatch(site -> site.siteClass().id().equals(classId));
    }

    /** Every site as a SMILES in which it is atom 1, with the class it ended in. */
    String inWords() {
        return sites.stream().map(site -> NumberedSmiles.of(molecule, site.atom()) + " is " + site.siteClass().id())
                .collect(Collectors.joining(", "));
    }
}
