package lyate.acidity;

import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.site.ProtonSite;
import lyate.stock.Medium;

/** Estimates the pKa of a site within the media it was fitted for. Pure; safe to share between threads. */
public interface SiteEstimate {

    /** The estimate, or empty where the method has nothing to say for this site in this medium. */
    Optional<Acidity> estimate(Molecule molecule, ProtonSite site, Medium medium);
}
