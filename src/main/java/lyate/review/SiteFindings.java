package lyate.review;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lyate.review.Finding.Severity;
import lyate.review.KineticPreference.Control;
import lyate.site.ProtonSite;

/** Findings about which of several C–H sites reacts, and what becomes of its configuration. */
final class SiteFindings {

    /** log10 K above which slow exchange is a matter of minutes to hours rather than of long heating. */
    private static final double NOTABLE_EXCHANGE = -6;

    private SiteFindings() {}

    /** Every rule of this kind. */
    static List<FindingRule> rules() {
        return List.of(SiteFindings::kineticSite, SiteFindings::epimerisation);
    }

    private static List<Finding> kineticSite(Situation situation) {
        String intended = situation.intended().label();
        return situation.orders().stream()
                .filter(order -> order.winner().equals(intended) || order.loser().equals(intended))
                .map(order -> kineticSite(situation, order)).distinct().toList();
    }

    private static Finding kineticSite(Situation situation, KineticControl.Order order) {
        boolean wanted = order.winner().equals(situation.intended().label());
        boolean paid = situation.paysForAll() && situation.before().stream().anyMatch(donor -> donor.label().equals(order.winner()));
        String how = order.rule().control() == Control.RATE ? "goes first" : "prevails at equilibrium";
        String sentence = String.format(Locale.ROOT, "%s %s over %s: %s.", order.winner(), how, order.loser(), order.rule().sentence());
        return new Finding(wanted || paid ? Severity.NOTE : Severity.STOP, FindingKind.KINETIC_SITE, sentence,
                List.of("rule " + order.rule().id()), situation.intended().site().equivalent(), order.rule().source());
    }

    private static List<Finding> epimerisation(Situation situation) {
        Map<ProtonSite, Double> logK = new LinkedHashMap<>();
        situation.donors().stream().filter(donor -> !situation.workingBase().destroyed())
                .forEach(donor -> logK.put(donor.site(), donor.logK()));
        return Epimerisation.of(situation.step().substrate(), logK).stream()
                .map(centre -> epimerisation(situation, centre)).toList();
    }

    private static Finding epimerisation(Situation situation, Epimerisation centre) {
        String label = situation.step().substrate().label(centre.atom());
        boolean full = centre.extent() == Epimerisation.Extent.FULL;
        String sentence = full
                ? label + " loses its proton and with it the configuration stated."
                : label + " exchanges its proton through a little of the anion: its configuration may be lost with time.";
        Severity severity = full || centre.logK() > NOTABLE_EXCHANGE ? Severity.CAUTION : Severity.NOTE;
        return new Finding(severity, FindingKind.EPIMERISATION, sentence,
                List.of(String.format(Locale.ROOT, "log K %.1f at %s", centre.logK(), label)), List.of(centre.atom()),
                "log K of this step; the thresholds are explained in the guide to the science");
    }
}
