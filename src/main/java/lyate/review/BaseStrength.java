package lyate.review;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lyate.acidity.Acidity;
import lyate.acidity.AcidityEstimator;
import lyate.molecule.Molecule;
import lyate.molecule.MoleculeException;
import lyate.molecule.MoleculeReader;
import lyate.site.ProtonSite;
import lyate.site.Role;
import lyate.site.SiteFinder;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** How strong a base is in a medium: from the table, else from its conjugate acid's structure. */
final class BaseStrength {

    private final SiteFinder finder;
    private final AcidityEstimator acidity;

    BaseStrength(SiteFinder finder, AcidityEstimator acidity) {
        this.finder = finder;
        this.acidity = acidity;
    }

    /** pKa of the base's conjugate acid in a medium, or empty where nothing is known. */
    Optional<KnownPKa> pKa(Base base, Medium medium) {
        Optional<KnownPKa> known = base.pKa(medium);
        if (known.isPresent()) {
            return known;
        }
        if (medium.equals(Medium.DMSO) && base.pKa(Medium.THF).isPresent() && base.family().strong()) {
            // Common practice: lithium amide values in THF are set against DMSO values of the acids.
            return base.pKa(Medium.THF);
        }
        return estimated(base, medium);
    }

    /** The most acidic proton of the conjugate acid. */
    private Optional<KnownPKa> estimated(Base base, Medium medium) {
        try {
            Molecule conjugateAcid = new MoleculeReader().read(base.conjugateAcid());
            List<ProtonSite> sites = finder.sites(conjugateAcid, Role.ACID);
            return sites.stream().map(site -> acidity.acidity(conjugateAcid, site, medium)).flatMap(Optional::stream)
                    .min(Comparator.comparingDouble(Acidity::pKa))
                    .map(value -> new KnownPKa(value.pKa(), value.sigma(), "from the structure of its conjugate acid: " + value.source()));
        } catch (MoleculeException e) {
            // Hydrogen and the like have no structure the reader accepts as a substrate; then the table alone counts.
            return Optional.empty();
        }
    }
}
