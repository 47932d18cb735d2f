package lyate.review;

import static lyate.review.Finding.Severity.CAUTION;
import static lyate.review.Finding.Severity.NOTE;
import static lyate.review.Finding.Severity.STOP;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import lyate.review.BasicSites.BasicSite;
import lyate.review.Finding.Severity;
import lyate.site.ProtonSite;

/** What the equilibria of a protonation say, in words. */
final class ProtonationFindings {

    private static final double LEFT_ALONE_PERCENT = 5;
    private static final double TAKEN_PERCENT = 95;
    private static final double NOTABLE_EXCESS = 0.5;
    private static final double ROOM_CELSIUS = 25;
    private static final String RULE = "proton balance of this step, aqueous pKa values";
    private static final String SALT_RULE =
            "rule of practice of salt selection: Cruz-Cabeza, CrystEngComm 2012, 14, 6362 (from memory)";

    private ProtonationFindings() {}

    static List<Finding> of(ProtonationSituation situation, Verdict verdict) {
        List<Finding> findings = new ArrayList<>();
        BasicSite intended = situation.intended();
        String acid = situation.step().acid().name();
        if (verdict == Verdict.TOO_WEAK) {
            findings.add(finding(STOP, FindingKind.TOO_WEAK, intended, say("%s does not reach %s: the pKa differ by %.1f, the rule of"
                    + " practice asks for 3.", acid, intended.label(), situation.logK(intended)), situation, SALT_RULE));
        }
        if (situation.acid().levelled()) {
            findings.add(finding(verdict == Verdict.LEVELLED ? STOP : NOTE, FindingKind.LEVELLED, intended, say("%s gives its proton to"
                    + " %s first; what works afterwards is the protonated solvent.", acid, situation.step().solvent().name()), situation, RULE));
        }
        findings.addAll(elsewhere(situation, verdict));
        if (verdict == Verdict.SELECTIVE && situation.percent(intended) < TAKEN_PERCENT) {
            findings.add(finding(CAUTION, FindingKind.DOSE_SHORT, intended, say("%.2f equivalents protonate %.0f %% of %s; there could be"
                    + " more.", situation.step().equivalents(), situation.percent(intended), intended.label()), situation, RULE));
        }
        double excess = situation.protonEquivalents() - situation.protonsBefore() - 1;
        if (verdict == Verdict.SELECTIVE && excess >= NOTABLE_EXCESS) {
            findings.add(finding(NOTE, FindingKind.EXCESS_ACID, intended, say("%s brings %.1f protons more than %s needs: they stay"
                    + " acidic or make an acid salt.", acid, excess, intended.label()), situation, RULE));
        }
        return findings;
    }

    /** Protons that go somewhere else than meant; where no site was named, only as a remark. */
    private static List<Finding> elsewhere(ProtonationSituation situation, Verdict verdict) {
        boolean named = situation.step().intendedSite().isPresent();
        List<BasicSite> before = situation.before();
        if (verdict == Verdict.WRONG_SITE && !before.isEmpty()) {
            String names = before.stream().map(BasicSite::label).collect(Collectors.joining(", "));
            return List.of(finding(STOP, FindingKind.UNINTENDED_PROTONATION, situation.intended(), say("%s takes the proton first;"
                    + " protonating %s as well needs %d equivalents, there are %.2f.", names, situation.intended().label(),
                    situation.protonsBefore() + 1, situation.protonEquivalents()), situation, RULE));
        }
        return situation.sites().all().stream().filter(site -> site != situation.intended() && situation.percent(site) > LEFT_ALONE_PERCENT)
                .map(site -> finding(named && !before.contains(site) ? CAUTION : NOTE, FindingKind.UNINTENDED_PROTONATION, site,
                        say("%s (%s) holds a proton in %.0f %% of the molecules as well.", site.label(), site.site().siteClass().name(),
                                situation.percent(site)), situation, RULE)).toList();
    }

    static Finding internalSalt(ProtonationSituation situation, ProtonSite acid) {
        String label = situation.step().substrate().label(acid.atom());
        return finding(NOTE, FindingKind.INTERNAL_SALT, situation.intended(), say("%s (%s) of the same molecule already gives %s its"
                + " proton: the acid added protonates the anion of this internal salt.", label, acid.siteClass().name(),
                situation.intended().label()), situation, RULE);
    }

    static List<String> explanation(ProtonationSituation situation, Verdict verdict) {
        BasicSite intended = situation.intended();
        List<String> lines = new ArrayList<>();
        lines.add(compared(situation, intended));
        lines.add("Rule: " + switch (verdict) {
            case SELECTIVE -> "a difference of 3 or more makes a salt (" + SALT_RULE + ")";
            case PARTIAL -> "a difference between -1 and 3 may give a salt, a co-crystal or a mixture (" + SALT_RULE + ")";
            case TOO_WEAK -> "a difference of -1 or less makes no salt (" + SALT_RULE + ")";
            case WRONG_SITE -> "a more basic site takes the proton, and there is not enough acid for both";
            case LEVELLED -> "the protonated solvent is too weak for the site meant";
            case INCOMPATIBLE -> VerdictRule.reason(verdict);
            case UNDECIDED -> "no verdict reaches 60 %";
        });
        if (situation.protonsToGive() > 1) {
            lines.add(say("%s has %d protons acidic enough: 1/%d of an equivalent is enough for one site.", situation.step().acid().name(),
                    situation.protonsToGive(), situation.protonsToGive()));
        }
        return lines;
    }

    static List<String> assumptions(ProtonationSituation situation) {
        AcidStep step = situation.step();
        List<String> lines = new ArrayList<>();
        lines.add(say("aqueous pKa values decide, as is usual for salts; %s may shift them, and whether the salt crystallises is not said",
                step.solvent().name()));
        if (Math.abs(step.temperatureCelsius() - ROOM_CELSIUS) >= 1) {
            lines.add("pKa values of 25 degrees C");
        }
        return lines;
    }

    private static String compared(ProtonationSituation situation, BasicSite site) {
        return say("%s: pKa %.1f ± %.1f of the protonated form against %.1f ± %.1f for %s, difference %.1f (water)", site.label(),
                site.acidity().pKa(), site.acidity().sigma(), situation.acid().pKa(), situation.acid().sigma(),
                situation.acid().levelled() ? "protonated " + situation.step().solvent().name() : situation.step().acid().name(),
                situation.logK(site));
    }

    private static Finding finding(Severity severity, FindingKind kind, BasicSite site, String sentence, ProtonationSituation situation,
                                   String source) {
        return new Finding(severity, kind, RuleCells.capital(sentence), List.of(compared(situation, site)), site.site().equivalent(), source);
    }

    private static String say(String format, Object... values) {
        return String.format(Locale.ROOT, format, values);
    }
}
