package lyate.review;

import lyate.site.ProtonSite;

/**
 * A proton site of the substrate set against the working base.
 *
 * @param site       the site
 * @param label      its name, for example {@code C3}
 * @param comparison its pKa against the base's, on the scale that decides
 * @param advantage  pKa units by which kinetic control favours it over its rivals; 0 where equilibrium decides
 */
record Donor(ProtonSite site, String label, Comparison comparison, double advantage) {

    /** log10 K at 25 degrees C, kinetic advantage included. */
    double effectiveLogK() {
        return comparison.logK() + advantage;
    }
}
