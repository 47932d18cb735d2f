package lyate.review;

import java.util.List;

/**
 * Everything that is known about a step once the numbers are in; what the finding rules look at.
 *
 * @param step            what was asked
 * @param workingBase     the base that is really in the flask
 * @param donors          substrate sites, the one whose proton goes first in front
 * @param intended        the one meant, an element of {@code donors}
 * @param shares          how the protons are shared out at equilibrium
 * @param orders          which of two C–H sites goes first, where the tables know
 * @param verdict         the verdict from the equilibria
 */
record Situation(Step step, WorkingBase workingBase, List<Donor> donors, Donor intended, ProtonShares shares,
                 List<KineticControl.Order> orders, Verdict verdict) {

    Situation {
        donors = List.copyOf(donors);
        orders = List.copyOf(orders);
    }

    /** Sites of the substrate that the base reaches before the intended one. */
    List<Donor> before() {
        return donors.stream().filter(donor -> donor != intended && donor.effectiveLogK() >= 0
                && donor.effectiveLogK() > intended.effectiveLogK()).toList();
    }

    /** Whether the base meets a proton it takes: of the substrate, the solvent or moisture. */
    boolean baseTakesProtons() {
        return workingBase.levelled() || verdict == Verdict.SELECTIVE || verdict == Verdict.WRONG_SITE
                || donors.stream().anyMatch(donor -> donor.logK() >= VerdictRule.COMPLETE);
    }

    /** Protons that go before the intended one. */
    int protonsBefore() {
        return before().stream().mapToInt(Donor::protons).sum();
    }

    /** Whether the base weighed in pays for every proton that goes first and for the one meant, and what is left reaches it. */
    boolean paysForAll() {
        return protonEquivalents() >= protonsBefore() + 1 - VerdictRule.DOSE_TOLERANCE && verdict != Verdict.WRONG_SITE;
    }

    /** Protons the base takes per mole that was weighed in. */
    double protonEquivalents() {
        return step.equivalents() * step.base().protonsPerFormula();
    }
}
