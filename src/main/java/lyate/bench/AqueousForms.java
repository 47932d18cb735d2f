package lyate.bench;

import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.site.SiteFinder;

/** Finds what molecules are like in water. Immutable; safe to share between threads. */
public record AqueousForms(SiteFinder finder, AcidityEstimator acidity) {

    /** A molecule in water. */
    public AqueousForm of(String name, Molecule molecule) {
        return AqueousForm.of(name, molecule, finder, acidity);
    }
}
