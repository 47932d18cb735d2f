package lyate.review;

import static lyate.review.Finding.Severity.CAUTION;
import static lyate.review.Finding.Severity.NOTE;
import static lyate.review.Finding.Severity.STOP;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import lyate.review.Finding.Severity;
import lyate.stock.Solvent;

/** Findings that follow from the equilibria alone. */
final class EquilibriumFindings {

    /** Above this share a proton that should stay counts as taken. */
    private static final double LEFT_ALONE_PERCENT = 5;
    private static final double TAKEN_PERCENT = 95;
    /** Equivalents above what the protons meant need, from which an excess is worth a word. */
    private static final double NOTABLE_EXCESS = 0.5;
    private static final double NOTABLE_MOISTURE_PERCENT = 5;
    private static final String RULE = "proton balance of this step";

    private EquilibriumFindings() {}

    /** Every rule of this kind. */
    static List<FindingRule> rules() {
        return List.of(EquilibriumFindings::unintended, EquilibriumFindings::secondEquivalent,
                EquilibriumFindings::doseShort, EquilibriumFindings::excess, EquilibriumFindings::tooWeak,
                EquilibriumFindings::levelled, EquilibriumFindings::moisture, EquilibriumFindings::partner, EquilibriumFindings::slow);
    }

    private static List<Finding> unintended(Situation situation) {
        return situation.donors().stream().filter(donor -> donor != situation.intended())
                .filter(donor -> situation.shares().percentTaken(donor) > LEFT_ALONE_PERCENT + smallExcess(situation))
                .map(donor -> finding(severityOfLoss(situation, donor),
                        FindingKind.UNINTENDED_DEPROTONATION, donor,
                        say("%s (%s) loses %.0f %% of its protons as well.", donor.label(),
                                donor.site().siteClass().name(), situation.shares().percentTaken(donor)),
                        List.of(compared(donor), compared(situation.intended()))))
                .toList();
    }

    /** Percent of a further proton that the usual small excess of base takes whatever one does. */
    private static double smallExcess(Situation situation) {
        double excess = situation.protonEquivalents() - situation.protonsBefore() - 1;
        return excess > 0 && excess < NOTABLE_EXCESS ? 100 * excess : 0;
    }

    /** A proton that goes first is a stop, unless enough base was weighed in to take it and the one meant. */
    private static Severity severityOfLoss(Situation situation, Donor donor) {
        if (!situation.before().contains(donor)) {
            return CAUTION;
        }
        return situation.paysForAll() ? NOTE : STOP;
    }

    private static List<Finding> secondEquivalent(Situation situation) {
        List<Donor> before = situation.before();
        boolean reachable = situation.intended().effectiveLogK() > VerdictRule.NONE;
        if (before.isEmpty() || !reachable || situation.verdict() == Verdict.LEVELLED) {
            return List.of();
        }
        String names = before.stream().map(Donor::label).collect(Collectors.joining(", "));
        return List.of(finding(situation.paysForAll() ? NOTE : STOP, FindingKind.SECOND_EQUIVALENT_NEEDED, situation.intended(),
                say("%s goes first; taking %s as well needs %d equivalents, there are %.2f.", names,
                        situation.intended().label(), situation.protonsBefore() + 1, situation.protonEquivalents()),
                before.stream().map(EquilibriumFindings::compared).toList()));
    }

    private static List<Finding> doseShort(Situation situation) {
        double taken = situation.shares().percentTaken(situation.intended());
        if (situation.verdict() != Verdict.SELECTIVE || taken >= TAKEN_PERCENT) {
            return List.of();
        }
        // A tenth of an equivalent is meant as a catalyst; a protic solvent's back reaction is the nature of the system.
        boolean meant = situation.protonEquivalents() < 0.5 || situation.step().solvent().kind() == Solvent.Kind.PROTIC;
        return List.of(finding(meant ? NOTE : CAUTION, FindingKind.DOSE_SHORT, situation.intended(),
                say("%.2f equivalents take %.0f %% of %s; the equilibrium would allow more.",
                        situation.protonEquivalents(), taken, situation.intended().label()),
                List.of(compared(situation.intended()))));
    }

    private static List<Finding> excess(Situation situation) {
        double excess = situation.protonEquivalents() - situation.protonsBefore() - 1;
        if (excess < NOTABLE_EXCESS || situation.verdict() != Verdict.SELECTIVE) {
            return List.of();
        }
        return List.of(finding(NOTE, FindingKind.EXCESS_BASE, situation.intended(),
                say("%.2f equivalents of base stay over once %s is gone; they react with whatever comes next.",
                        excess, situation.intended().label()), List.of()));
    }

    private static List<Finding> tooWeak(Situation situation) {
        if (situation.verdict() != Verdict.TOO_WEAK) {
            return List.of();
        }
        return List.of(finding(STOP, FindingKind.TOO_WEAK, situation.intended(),
                say("%s does not reach %s: log K is %.1f.", RuleCells.capital(situation.step().base().name()), situation.intended().label(),
                        situation.intended().logK()),
                List.of(compared(situation.intended()), situation.intended().comparison().reason())));
    }

    private static List<Finding> levelled(Situation situation) {
        if (!situation.workingBase().levelled()) {
            return List.of();
        }
        Severity severity = situation.verdict() == Verdict.LEVELLED ? STOP : NOTE;
        String logK = situation.workingBase().logKSolvent().map(value -> say("log K against the solvent %.1f", value))
                .orElse("the solvent destroys it");
        return List.of(finding(severity, FindingKind.LEVELLED, situation.intended(),
                say("%s meets %s first; what works afterwards is %s.", RuleCells.capital(situation.step().base().name()),
                        situation.step().solvent().name(), situation.workingBase().name()), List.of(logK)));
    }

    private static List<Finding> moisture(Situation situation) {
        double spent = situation.shares().percentOfBaseSpentOnWater();
        if (spent < NOTABLE_MOISTURE_PERCENT) {
            return List.of();
        }
        return List.of(finding(spent > 50 ? STOP : CAUTION, FindingKind.MOISTURE, situation.intended(),
                say("%.0f ppm of water in %s use up %.0f %% of the base.", situation.step().waterPpm(),
                        situation.step().solvent().name(), spent),
                List.of(say("substrate at %.3g mol/L", situation.step().concentrationMolar()))));
    }

    private static List<Finding> partner(Situation situation) {
        double taken = situation.shares().percentOfPartnerTaken();
        if (taken <= LEFT_ALONE_PERCENT + smallExcess(situation) || situation.workingBase().levelled()) {
            return List.of();
        }
        return List.of(finding(CAUTION, FindingKind.PARTNER_CONSUMED, situation.intended(),
                say("The partner has acidic protons of its own: %.0f %% of it loses one if it is there while the base is.", taken),
                List.of("as much of it as of the substrate")));
    }

    private static List<Finding> slow(Situation situation) {
        boolean carbon = situation.intended().isCarbonAcid();
        boolean takes = situation.intended().logK() >= VerdictRule.COMPLETE;
        if (!carbon || !takes || situation.workingBase().levelled() || !situation.step().base().family().insoluble()) {
            return List.of();
        }
        return List.of(finding(NOTE, FindingKind.SLOW_TRANSFER, situation.intended(),
                say("%s is a solid and %s a C-H: the proton moves slowly, give it time and stirring.",
                        RuleCells.capital(situation.step().base().name()), situation.intended().label()), List.of(compared(situation.intended()))));
    }

    private static String compared(Donor donor) {
        return say("%s: pKa %.1f ± %.1f in %s against %.1f, log K %.1f", donor.label(), donor.comparison().donor().pKa(),
                donor.comparison().donor().sigma(), donor.comparison().donor().medium().symbol(),
                donor.comparison().acceptor().pKa(), donor.logK());
    }

    private static Finding finding(Severity severity, FindingKind kind, Donor donor, String sentence, List<String> evidence) {
        return new Finding(severity, kind, sentence, evidence, donor.site().equivalent(), RULE);
    }

    private static String say(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
