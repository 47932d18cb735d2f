package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lyate.review.VerdictRule.World;

/** Puts what is known about a step into the words and numbers of a {@link Review}. */
final class ReviewWriter {

    private final Situation situation;
    private final World world;
    private final Map<Verdict, Double> probabilities;
    private final List<Transfer> transfers;
    private final Map<Verdict, Double> onOtherScale;

    ReviewWriter(Situation situation, World world, Map<Verdict, Double> probabilities, List<Transfer> transfers,
                 Map<Verdict, Double> onOtherScale) {
        this.situation = situation;
        this.world = world;
        this.probabilities = probabilities;
        this.transfers = transfers;
        this.onOtherScale = onOtherScale;
    }

    Review write(List<Finding> findings) {
        Donor intended = situation.intended();
        double probability = probabilities.getOrDefault(situation.verdict(),
                probabilities.values().stream().mapToDouble(Double::doubleValue).max().orElse(0));
        return new Review(situation.step(), situation.verdict(), probability, probabilities, intended.label(), firstSite(findings),
                situation.workingBase().name(), intended.logK(), situation.shares().percentTaken(intended),
                highestOther(), transfers, findings, explanation(), Assumptions.of(situation), onOtherScale);
    }

    private String firstSite(List<Finding> findings) {
        if (situation.verdict() == Verdict.LEVELLED) {
            return "solvent";
        }
        if (situation.verdict() == Verdict.INCOMPATIBLE && findings.stream().anyMatch(ReviewWriter::takesNoProton)) {
            return "none";
        }
        Donor first = situation.donors().get(0);
        return situation.verdict() == Verdict.TOO_WEAK || first.effectiveLogK() <= VerdictRule.NONE ? "none" : first.label();
    }

    /** Whether the base adds or exchanges instead of taking a proton. */
    private static boolean takesNoProton(Finding finding) {
        return finding.severity() == Finding.Severity.STOP && (finding.kind() == FindingKind.NUCLEOPHILIC_ADDITION
                || finding.kind() == FindingKind.HALOGEN_EXCHANGE);
    }

    private double highestOther() {
        return situation.donors().stream().filter(donor -> donor != situation.intended())
                .mapToDouble(situation.shares()::percentTaken).max().orElse(0);
    }

    private List<String> explanation() {
        List<String> lines = new ArrayList<>();
        Donor intended = situation.intended();
        lines.add(String.format(Locale.ROOT, "%s: pKa %.1f ± %.1f against %.1f ± %.1f for %s, log K = %.1f (%s)", intended.label(),
                intended.comparison().donor().pKa(), intended.comparison().donor().sigma(),
                intended.comparison().acceptor().pKa(), intended.comparison().acceptor().sigma(),
                situation.workingBase().name(), intended.logK(), intended.comparison().reason()));
        lines.add("Rule: " + VerdictRule.reason(situation.verdict()));
        VerdictMargin.sentence(world, intended.label()).ifPresent(lines::add);
        return lines;
    }
}
