package lyate.acidity;

import java.util.List;
import java.util.Optional;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClass;
import lyate.site.SiteClass.ClassValue;

/** Molecules and sites for tests, independent of the table of site classes. */
final class Sites {

    private Sites() {}

    static Molecule molecule(String text) {
        try {
            return new MoleculeReader().read(text);
        } catch (MoleculeException e) {
            throw new IllegalArgumentException(text + ": " + e.getMessage(), e);
        }
    }

    /** A site of a made-up class of the given transfer family, class value 8 in water only. */
    static ProtonSite site(Molecule molecule, String label, Role role, String family) {
        int atom = molecule.atomLabelled(label).orElseThrow();
        return new ProtonSite(role, atom, List.of(atom), Math.max(1, molecule.hydrogens(atom)), siteClass(role, family));
    }

    static ProtonSite site(Molecule molecule, String label, Role role) {
        return site(molecule, label, role, "carboxylic-acid");
    }

    private static SiteClass siteClass(Role role, String family) {
        return siteClass(role, family, Optional.of(new ClassValue(8, 1, "made up")), Optional.empty());
    }

    /** A made-up class of the given transfer family and class values. */
    static SiteClass siteClass(Role role, String family, Optional<ClassValue> water, Optional<ClassValue> dmso) {
        try {
            return new SiteClass("made-up", "made up for a test", role, AtomPattern.compile("[*]"), family, water, dmso, "C", "C");
        } catch (MoleculeException e) {
            throw new IllegalStateException(e);
        }
    }
}
