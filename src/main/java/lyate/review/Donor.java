package lyate.review;

import lyate.flask.Flask;
import lyate.flask.TransferThermodynamics;
import lyate.site.ProtonSite;

/**
 * A proton site of the substrate set against the working base.
 *
 * @param site       the site
 * @param label      its name, for example {@code C3}
 * @param comparison its pKa against the base's, on the scale that decides
 * @param transfer   the transfer at the temperature of the step
 * @param advantage  log10 units by which kinetic control favours it over its rivals; 0 where equilibrium decides
 */
record Donor(ProtonSite site, String label, Comparison comparison, TransferThermodynamics transfer, double advantage) {

    /** log10 K at the temperature of the step. */
    double logK() {
        return transfer.logK();
    }

    /** Standard uncertainty of log K at the temperature of the step. */
    double sigmaLogK() {
        return comparison.sigmaLogK() * Flask.ROOM_KELVIN / transfer.temperatureKelvin();
    }

    /** Whether the proton sits on carbon and so moves slowly. */
    boolean isCarbonAcid() {
        String family = site.siteClass().family();
        return family.startsWith("ch-acid") || family.equals("hydrocarbon");
    }

    /** Protons that go one after the other: one for each equivalent atom, since several on one carbon hardly ever do. */
    int protons() {
        return isCarbonAcid() ? 1 : site.equivalent().size();
    }

    Donor withAdvantage(double other) {
        return new Donor(site, label, comparison, transfer, other);
    }

    /** log10 K with the kinetic advantage: what decides whose proton goes first. */
    double effectiveLogK() {
        return logK() + advantage;
    }

    /** The same by the scale that does not decide, where there is one. */
    double effectiveLogKOnOtherScale() {
        return comparison.other().map(other -> other.logK() * Flask.ROOM_KELVIN / transfer.temperatureKelvin() + advantage)
                .orElseGet(this::effectiveLogK);
    }
}
