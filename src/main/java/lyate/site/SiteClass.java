package lyate.site;

import java.util.Optional;
import lyate.molecule.AtomPattern;

/**
 * A kind of proton site: a row of {@code site-classes.csv}.
 *
 * @param id      stable name, for example {@code phenol-oh}
 * @param name    what a chemist calls it
 * @param role    whether it loses or gains the proton
 * @param pattern SMARTS whose first atom is the site
 * @param family  the line of {@code media-transfer.csv} its values are carried over with, for example {@code phenol}
 * @param water   class value in water, if one is known
 * @param dmso    class value in DMSO, if one is known
 * @param hit     SMILES of an example that must end in this class
 * @param miss    SMILES of an example that must not
 */
public record SiteClass(String id, String name, Role role, AtomPattern pattern, String family,
                        Optional<ClassValue> water, Optional<ClassValue> dmso, String hit, String miss) {

    /**
     * The pKa typical of the class in one medium.
     *
     * @param pKa    pKa of one site, statistical factors not removed
     * @param sigma  spread of the class, one standard deviation
     * @param source where it comes from
     */
    public record ClassValue(double pKa, double sigma, String source) {}
}
