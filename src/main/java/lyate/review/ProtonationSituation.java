package lyate.review;

import java.util.List;
import lyate.review.BasicSites.BasicSite;
import lyate.review.Protonation.Uptake;

/**
 * Everything that is known about a protonation once the numbers are in.
 *
 * @param step          what was asked
 * @param sites         basic sites of the substrate
 * @param intended      the one meant
 * @param acid          the acid that is really in the flask
 * @param uptakes       the sites in the same order, with their shares
 * @param protonsToGive protons of one mole of acid that the intended site takes
 */
record ProtonationSituation(AcidStep step, BasicSites sites, BasicSite intended, WorkingAcid acid, List<Uptake> uptakes,
                            int protonsToGive) {

    double logK(BasicSite site) {
        return site.acidity().pKa() - acid.pKa();
    }

    double percent(BasicSite site) {
        return uptakes.get(sites.all().indexOf(site)).percentProtonated();
    }

    double highestOther() {
        return sites.all().stream().filter(site -> site != intended).mapToDouble(this::percent).max().orElse(0);
    }

    /** Sites that take the proton before the one meant. */
    List<BasicSite> before() {
        return sites.all().stream().takeWhile(site -> site != intended).filter(site -> logK(site) >= 0).toList();
    }

    int protonsBefore() {
        return before().stream().mapToInt(site -> site.site().equivalent().size()).sum();
    }

    /** Protons given per mole of substrate; an acid too weak for the rule still counts as one. */
    double protonEquivalents() {
        return step.equivalents() * Math.max(1, protonsToGive);
    }

    String firstSite(Verdict verdict) {
        if (verdict == Verdict.LEVELLED) {
            return "solvent";
        }
        BasicSite first = sites.all().get(0);
        return logK(first) <= VerdictRule.NONE ? "none" : first.label();
    }
}
