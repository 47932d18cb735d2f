package lyate.acidity.lfer;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import lyate.acidity.Acidity;
import lyate.molecule.AtomPattern;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteClass;
import lyate.stock.Medium;
import lyate.table.TableFolders;

/** Asks the packaged relationships for single sites, without the table of site classes. */
final class Estimates {

    static final LinearFreeEnergyEstimate RELATIONSHIPS = LinearFreeEnergyEstimate.load(TableFolders.packaged());

    private Estimates() {}

    static Molecule molecule(String smiles) {
        try {
            return new MoleculeReader().read(smiles);
        } catch (MoleculeException e) {
            throw new IllegalArgumentException(smiles + ": " + e.getMessage(), e);
        }
    }

    static ProtonSite site(Molecule molecule, Role role, int atom) {
        List<Integer> equivalent = IntStream.range(0, molecule.atomCount())
                .filter(other -> molecule.symmetryClass(other) == molecule.symmetryClass(atom)).boxed().toList();
        return new ProtonSite(role, atom, equivalent, Math.max(1, molecule.hydrogens(atom)), anyClass(role));
    }

    private static SiteClass anyClass(Role role) {
        try {
            return new SiteClass("any", "made up for a test", role, AtomPattern.compile("[*]"), "any", Optional.empty(),
                    Optional.empty(), "C", "C");
        } catch (MoleculeException e) {
            throw new IllegalStateException(e);
        }
    }

    static Optional<Acidity> estimate(Molecule molecule, int atom, Role role, Medium medium) {
        return RELATIONSHIPS.estimate(molecule, site(molecule, role, atom), medium);
    }

    /** The estimate for the atom with a label; fails where there is none. */
    static Acidity of(String smiles, String label, Role role, Medium medium) {
        Molecule molecule = molecule(smiles);
        return estimate(molecule, molecule.atomLabelled(label).orElseThrow(), role, medium).orElseThrow();
    }

    static double acid(String smiles, String label) {
        return of(smiles, label, Role.ACID, Medium.WATER).pKa();
    }

    static double base(String smiles, String label) {
        return of(smiles, label, Role.BASE, Medium.WATER).pKa();
    }
}
