package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lyate.stock.Acid;
import lyate.stock.Stockroom;

/**
 * Ranks the acids of the stockroom for protonating one basic site: by the probability of a salt under the rule that the
 * pKa differ by 3 or more, then by what speaks against the acid, then by how little stronger than needed it is. Acids that
 * would hurt another group of the substrate go behind those that would not.
 */
public final class AcidChoice {

    /** Probabilities closer than this count as the same. */
    private static final double SAME_PROBABILITY = 0.1;

    private final ProtonationReviewer reviewer;
    private final Stockroom stockroom;

    public AcidChoice(ProtonationReviewer reviewer, Stockroom stockroom) {
        this.reviewer = reviewer;
        this.stockroom = stockroom;
    }

    /**
     * Every acid that can be judged, best first.
     *
     * @param step the protonation; its acid is replaced by each of the stockroom
     * @throws ReviewException where the step itself cannot be judged, whatever the acid
     */
    public List<RankedAcid> rank(AcidStep step) throws ReviewException {
        List<RankedAcid> ranked = new ArrayList<>();
        for (Acid acid : stockroom.acids()) {
            Protonation protonation = reviewer.review(step.withAcid(acid));
            ranked.add(new RankedAcid(acid, protonation, why(protonation)));
        }
        ranked.sort(Comparator.comparing(RankedAcid::suits).reversed()
                .thenComparing(Comparator.comparingLong((RankedAcid choice) -> Math.round(salt(choice) / SAME_PROBABILITY)).reversed())
                .thenComparing(choice -> !choice.isUsual())
                .thenComparing(RankedAcid::harms).thenComparing(RankedAcid::stops).thenComparing(RankedAcid::cautions)
                .thenComparing(choice -> choice.protonation().logK()));
        return ranked;
    }

    private static double salt(RankedAcid choice) {
        return choice.protonation().probabilities().getOrDefault(Verdict.SELECTIVE, 0.0);
    }

    /** Verdict and numbers, then what speaks against it: harm to the substrate before the hazards of handling. */
    private static String why(Protonation protonation) {
        String numbers = String.format(Locale.ROOT, "pKa difference %.1f at %s, probability %s", protonation.logK(),
                protonation.intendedSite(), protonation.probabilityInWords());
        List<Finding> notable = protonation.findings().stream().filter(finding -> finding.severity() != Finding.Severity.NOTE).toList();
        Optional<Finding> first = notable.stream().filter(RankedAcid::harm).findFirst().or(() -> notable.stream().findFirst());
        String unusual = protonation.step().acid().uses().contains("salt") ? "" : "Not an acid usually made salts with. ";
        String against = first.map(finding -> finding.sentence() + " ").orElse("");
        return against + unusual + Character.toUpperCase(protonation.meaning().charAt(0)) + protonation.meaning().substring(1)
                + " (" + numbers + ").";
    }
}
