package lyate.review;

import lyate.stock.Base;
import lyate.stock.Named;

/**
 * A base of the stockroom, judged for a step.
 *
 * @param base   the base
 * @param review what it would do
 * @param why    one line: why it stands where it stands
 */
public record RankedBase(Base base, Review review, String why) implements Ranked {

    @Override
    public Named reagent() {
        return base;
    }

    @Override
    public Judgement judgement() {
        return review;
    }

    /** Whether it would do the job: in full, or as far as an electrophile that cannot be undone draws it. */
    @Override
    public boolean suits() {
        return (review.verdict() == Verdict.SELECTIVE || isDrawn()) && stops() == 0;
    }

    /** The probability of doing the job, both pKa scales counted alike. */
    double probability() {
        double full = review.onEitherScale(Verdict.SELECTIVE);
        return isDrawn() ? full + review.onEitherScale(Verdict.PARTIAL) : full;
    }

    private boolean isDrawn() {
        return review.verdict() == Verdict.PARTIAL && raises(FindingKind.TRAPPING);
    }

    /** Number of findings that speak against it outright. */
    public long stops() {
        return count(Finding.Severity.STOP);
    }

    /** Number of findings that call for care. */
    public long cautions() {
        return count(Finding.Severity.CAUTION);
    }

    /** Whether the tables say that the base hardly reacts there, for example because it does not dissolve. */
    public boolean isSlow() {
        return raises(FindingKind.SLOW_TRANSFER);
    }

    private boolean raises(FindingKind kind) {
        return review.findings().stream().anyMatch(finding -> finding.kind() == kind);
    }

    private long count(Finding.Severity severity) {
        return review.findings().stream().filter(finding -> finding.severity() == severity).count();
    }
}
