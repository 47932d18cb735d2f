package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lyate.stock.Base;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;

/**
 * Ranks the whole stockroom for one deprotonation: by the probability that the base does just that, then by whether it
 * dissolves and by what speaks against it, then by how little stronger than needed it is.
 */
public final class BaseChoice {

    /** Probabilities closer than this count as the same. */
    private static final double SAME_PROBABILITY = 0.1;

    private final Reviewer reviewer;
    private final Stockroom stockroom;

    public BaseChoice(Reviewer reviewer, Stockroom stockroom) {
        this.reviewer = reviewer;
        this.stockroom = stockroom;
    }

    /**
     * Every base that can be judged, best first.
     *
     * @param step the deprotonation; its base is replaced by each of the stockroom
     * @throws ReviewException where the step itself cannot be judged, whatever the base
     */
    public List<RankedBase> rank(Step step) throws ReviewException {
        List<RankedBase> ranked = new ArrayList<>();
        Optional<ReviewException> refusal = Optional.empty();
        for (Base base : stockroom.bases()) {
            try {
                Review review = reviewer.review(step.withBase(base));
                ranked.add(new RankedBase(base, review, why(review)));
            } catch (ReviewException e) {
                refusal = Optional.of(e);
            }
        }
        if (ranked.isEmpty() && refusal.isPresent()) {
            throw refusal.get();
        }
        ranked.sort(Comparator.comparing(RankedBase::suits).reversed().thenComparing(RankedBase::isSlow)
                .thenComparing(Comparator.comparingLong((RankedBase choice) -> Math.round(selective(choice) / SAME_PROBABILITY)).reversed())
                .thenComparing(RankedBase::stops).thenComparing(RankedBase::cautions)
                .thenComparing(choice -> choice.review().logK()));
        return ranked;
    }

    /**
     * A solvent in which the base of the step would do the job, where its own solvent is the problem; the step's other
     * conditions stay.
     */
    public Optional<Solvent> betterSolvent(Step step) throws ReviewException {
        if (reviewer.review(step).verdict() != Verdict.LEVELLED) {
            return Optional.empty();
        }
        for (Solvent solvent : stockroom.solvents()) {
            if (isLiquid(solvent, step.temperatureCelsius())) {
                Review review = reviewer.review(step.withSolvent(solvent));
                if (new RankedBase(step.base(), review, "").suits()) {
                    return Optional.of(solvent);
                }
            }
        }
        return Optional.empty();
    }

    private static boolean isLiquid(Solvent solvent, double celsius) {
        return celsius < solvent.boilingPoint() && celsius > solvent.meltingPoint().orElse(Double.NEGATIVE_INFINITY);
    }

    private static double selective(RankedBase choice) {
        return choice.review().probabilities().getOrDefault(Verdict.SELECTIVE, 0.0);
    }

    private static String why(Review review) {
        String numbers = String.format(Locale.ROOT, "log K %.1f at %s, probability %.0f %%", review.logK(), review.intendedSite(),
                100 * review.probability());
        String against = review.findings().stream()
                .filter(finding -> finding.severity() != Finding.Severity.NOTE || finding.kind() == FindingKind.SLOW_TRANSFER).findFirst()
                .map(finding -> finding.sentence() + " ").orElse("");
        return against + Character.toUpperCase(review.verdict().meaning().charAt(0)) + review.verdict().meaning().substring(1) + " (" + numbers + ").";
    }
}
