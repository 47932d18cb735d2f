package lyate.review;

import java.util.List;
import java.util.Map;

/**
 * What becomes of a step, and why.
 *
 * @param step            what was asked
 * @param verdict         the answer
 * @param probability     probability of that verdict, 0 to 1
 * @param probabilities   probability of every verdict that is possible
 * @param intendedSite    label of the site judged
 * @param firstSite       label of the site whose proton goes first; {@code solvent}, {@code water} or {@code none}
 * @param workingBase     the base that is really in the flask, in words
 * @param logK            log10 K at the intended site against the working base
 * @param intendedPercent share of the intended protons taken at equilibrium, any side reaction left aside
 * @param otherPercent    highest share taken at any other site of the substrate, likewise
 * @param transfers       every donor, most acidic first
 * @param findings        most severe first
 * @param explanation     which numbers and which rule gave the verdict, and what would change it
 * @param assumptions     what was assumed where the step said nothing
 * @param onOtherScale    probability of every verdict if the scale that does not decide were right; empty where the scales
 *                        agree
 */
public record Review(Step step, Verdict verdict, double probability, Map<Verdict, Double> probabilities,
                     String intendedSite, String firstSite, String workingBase, double logK,
                     double intendedPercent, double otherPercent, List<Transfer> transfers,
                     List<Finding> findings, List<String> explanation, List<String> assumptions,
                     Map<Verdict, Double> onOtherScale)
        implements Judgement {

    public Review {
        probabilities = Map.copyOf(probabilities);
        transfers = List.copyOf(transfers);
        findings = List.copyOf(findings);
        explanation = List.copyOf(explanation);
        assumptions = List.copyOf(assumptions);
        onOtherScale = Map.copyOf(onOtherScale);
    }

    /** A review whose scales agree. */
    public Review(Step step, Verdict verdict, double probability, Map<Verdict, Double> probabilities, String intendedSite,
                  String firstSite, String workingBase, double logK, double intendedPercent, double otherPercent,
                  List<Transfer> transfers, List<Finding> findings, List<String> explanation, List<String> assumptions) {
        this(step, verdict, probability, probabilities, intendedSite, firstSite, workingBase, logK, intendedPercent, otherPercent,
                transfers, findings, explanation, assumptions, Map.of());
    }

    /** Probability of a verdict with both scales given the same weight where they disagree; what a ranking goes by. */
    public double onEitherScale(Verdict asked) {
        double deciding = probabilities.getOrDefault(asked, 0.0);
        return onOtherScale.isEmpty() ? deciding : (deciding + onOtherScale.getOrDefault(asked, 0.0)) / 2;
    }

    /** What the verdict means here, in words: a selective base may go on to a further proton. */
    public String meaning() {
        boolean goesOn = verdict == Verdict.SELECTIVE && findings.stream().anyMatch(finding ->
                finding.kind() == FindingKind.UNINTENDED_DEPROTONATION && finding.severity() != Finding.Severity.NOTE);
        return goesOn ? "the intended proton is taken, but not it alone" : verdict.meaning();
    }

    /** Whether the solvent leaves nothing of the base that could take a proton; log K is that of the base as it was. */
    public boolean baseDestroyed() {
        return workingBase.startsWith(WorkingBase.NOTHING);
    }

    /** Whether a side reaction wins, so that the shares taken are what would be, were it left aside. */
    public boolean sideReactionWins() {
        return verdict == Verdict.INCOMPATIBLE;
    }
}
