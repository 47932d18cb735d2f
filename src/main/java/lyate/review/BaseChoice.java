package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import lyate.stock.Base;
import lyate.stock.BaseFamily;
import lyate.stock.Solvent;
import lyate.stock.Stockroom;

/**
 * Ranks the whole stockroom for one deprotonation: by the probability that the base does just that (in full, or as a partial
 * equilibrium that the electrophile named draws to its end), then by whether it dissolves and by what speaks against it, then by
 * how little stronger than needed it is. Where two pKa scales disagree the probability counts both alike, so that a base that is
 * strong enough on one of them alone does not come first.
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
     * A kind of bases of which none would do.
     *
     * @param family the kind
     * @param count  how many of it were judged
     * @param best   the one that comes nearest
     */
    public record Rejected(BaseFamily family, int count, RankedBase best) {

        /** Why, in one line. */
        public String why() {
            Review review = best.review();
            return String.format(Locale.ROOT, "%s with %s, log K %.1f%s", review.verdict().code(), best.base().name(), review.logK(),
                    against(review).map(finding -> ": " + finding.sentence()).orElse(""));
        }
    }

    /**
     * A solvent in which a base would do that its own solvent spoils.
     *
     * @param solvent the solvent
     * @param base    the base, judged in it
     */
    public record BetterSolvent(Solvent solvent, RankedBase base) {}

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
                ranked.add(judged(step.withBase(base)));
            } catch (ReviewException e) {
                refusal = Optional.of(e);
            }
        }
        if (ranked.isEmpty() && refusal.isPresent()) {
            throw refusal.get();
        }
        ranked.sort(bestFirst());
        return ranked;
    }

    private static Comparator<RankedBase> bestFirst() {
        return Comparator.comparing(RankedBase::suits).reversed().thenComparing(RankedBase::isSlow)
                .thenComparing(Comparator.comparingLong((RankedBase choice) -> Math.round(choice.probability() / SAME_PROBABILITY)).reversed())
                .thenComparing(RankedBase::stops).thenComparing(RankedBase::cautions)
                .thenComparing(choice -> choice.review().logK());
    }

    /** The kinds of bases of which none would do, in the order in which the best of each stands in the ranking. */
    public static List<Rejected> rejected(List<RankedBase> ranked) {
        Map<BaseFamily, List<RankedBase>> byFamily = new LinkedHashMap<>();
        ranked.forEach(choice -> byFamily.computeIfAbsent(choice.base().family(), family -> new ArrayList<>()).add(choice));
        return byFamily.entrySet().stream().filter(entry -> entry.getValue().stream().noneMatch(RankedBase::suits))
                .map(entry -> new Rejected(entry.getKey(), entry.getValue().size(), entry.getValue().get(0))).toList();
    }

    /**
     * A solvent in which the base of the step would do the job, where its own solvent is the problem; the step's other
     * conditions stay.
     */
    public Optional<Solvent> betterSolvent(Step step) throws ReviewException {
        RankedBase asked = judged(step);
        return spoiltBySolvent(asked) ? elsewhere(asked).map(BetterSolvent::solvent) : Optional.empty();
    }

    /**
     * A solvent in which some base would do the job, where none does in the solvent asked for and the solvent is why. Of each
     * kind of bases the best is tried.
     *
     * @param ranked the stockroom in the solvent asked for
     */
    public Optional<BetterSolvent> betterSolvent(List<RankedBase> ranked) throws ReviewException {
        if (ranked.stream().anyMatch(RankedBase::suits)) {
            return Optional.empty();
        }
        List<BetterSolvent> found = new ArrayList<>();
        for (Rejected family : rejected(ranked)) {
            if (spoiltBySolvent(family.best())) {
                elsewhere(family.best()).ifPresent(found::add);
            }
        }
        return found.stream().min(Comparator.comparing(BetterSolvent::base, bestFirst()));
    }

    private static boolean spoiltBySolvent(RankedBase choice) {
        return choice.review().verdict() == Verdict.LEVELLED;
    }

    private Optional<BetterSolvent> elsewhere(RankedBase choice) throws ReviewException {
        Step step = choice.review().step();
        for (Solvent solvent : stockroom.solvents()) {
            if (isLiquid(solvent, step.temperatureCelsius())) {
                RankedBase there = judged(step.withSolvent(solvent));
                if (there.suits()) {
                    return Optional.of(new BetterSolvent(solvent, there));
                }
            }
        }
        return Optional.empty();
    }

    private RankedBase judged(Step step) throws ReviewException {
        Review review = reviewer.review(step);
        return new RankedBase(step.base(), review, why(review));
    }

    private static boolean isLiquid(Solvent solvent, double celsius) {
        return celsius < solvent.boilingPoint() && celsius > solvent.meltingPoint().orElse(Double.NEGATIVE_INFINITY);
    }

    private static String why(Review review) {
        String numbers = String.format(Locale.ROOT, "log K %.1f at %s, probability %s", review.logK(), review.intendedSite(),
                review.probabilityInWords());
        String against = against(review).map(finding -> finding.sentence() + " ").orElse("");
        String meaning = review.findings().stream().filter(finding -> finding.kind() == FindingKind.TRAPPING).findFirst()
                .map(drawn -> drawn.sentence().replaceFirst("\\.$", "")).orElse(review.meaning());
        return against + RuleCells.capital(meaning) + " (" + numbers + ").";
    }

    /** What speaks most against a base. */
    static Optional<Finding> against(Review review) {
        return review.findings().stream().filter(finding -> finding.severity() != Finding.Severity.NOTE
                || finding.kind() == FindingKind.SLOW_TRANSFER || finding.kind() == FindingKind.SCALES_DISAGREE).findFirst();
    }
}
