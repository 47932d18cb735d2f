package lyate.review;

import lyate.site.ProtonSite;

/**
 * A proton site of the substrate set against the working base.
 *
 * @param site       the site
 * @param label      its name, for example {@code C3}
 * @param comparison its pKa against the base's, on the scale that decides
 * @param toTemperature 298.15 K divided by the temperature of the step: the isocoulombic factor on log K
 * @param advantage  log10 units by which kinetic control favours it over its rivals; 0 where equilibrium decides
 */
record Donor(ProtonSite site, String label, Comparison comparison, double toTemperature, double advantage) {

    /** log10 K at the temperature of the step. */
    double logK() {
        return comparison.logK() * toTemperature;
    }

    Donor withAdvantage(double other) {
        return new Donor(site, label, comparison, toTemperature, other);
    }

    /** log10 K with the kinetic advantage: what decides whose proton goes first. */
    double effectiveLogK() {
        return logK() + advantage;
    }
}
