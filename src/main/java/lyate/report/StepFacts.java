package lyate.report;

import java.util.List;
import java.util.Optional;
import lyate.bench.Amounts;
import lyate.bench.Batch;
import lyate.bench.GasAndHeat;
import lyate.review.DoseResponse;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.sheet.ReviewedRow;
import lyate.sheet.StepScale;

/**
 * Everything a report says about one judged step.
 *
 * @param row       the row it came from
 * @param review    the judgement
 * @param sites     the substrate's sites under their letters
 * @param doses     what other amounts of base would do; empty where the step cannot be judged at other doses
 * @param amounts   for what the row states, else for {@link ReportContext#MILLIMOLE} of substrate
 * @param gasAndHeat for the same amounts
 */
record StepFacts(ReviewedRow row, Review review, List<LetteredSite> sites, Optional<DoseResponse> doses, Amounts amounts,
                 GasAndHeat gasAndHeat) {

    static StepFacts of(ReviewedRow row, Review review, ReportContext context) {
        StepScale scale = StepScale.of(row.row(), review.step().substrate());
        Batch batch = scale.batch().orElseGet(() -> Batch.ofMilliMole(review.step().substrate(), ReportContext.MILLIMOLE));
        Amounts amounts = Amounts.of(review, batch, scale.titrated());
        return new StepFacts(row, review, LetteredSite.of(review), doses(review, context), amounts,
                GasAndHeat.of(review, amounts, context.enthalpies()));
    }

    private static Optional<DoseResponse> doses(Review review, ReportContext context) {
        try {
            return Optional.of(context.reviewer().doseResponse(review.step(), DoseResponse.span(review.step())));
        } catch (ReviewException e) {
            return Optional.empty();
        }
    }

    /** The intended site, or the first there is. */
    Optional<LetteredSite> anchor() {
        return sites.stream().filter(LetteredSite::intended).findFirst().or(() -> sites.stream().findFirst());
    }
}
