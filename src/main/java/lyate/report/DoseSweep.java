package lyate.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Reviewer;
import lyate.review.Step;
import lyate.review.Transfer;

/**
 * What becomes of every donor as more base goes in: the step reviewed at doses from 0 to at least 3 equivalents.
 *
 * @param equivalents  moles of base per mole of substrate
 * @param percentTaken share of protons taken, by donor, one value per entry of {@code equivalents}
 */
record DoseSweep(List<Double> equivalents, Map<String, List<Double>> percentTaken) {

    private static final double LEAST_SPAN = 3;
    /** Whole equivalents, where curves bend, fall on points. */
    private static final int POINTS_PER_EQUIVALENT = 12;
    private static final double MOST_POINTS = 61;

    static DoseSweep of(Step step, Reviewer reviewer) throws ReviewException {
        double span = Math.max(LEAST_SPAN, Math.ceil(step.equivalents() * 1.2));
        int points = (int) Math.min(MOST_POINTS, span * POINTS_PER_EQUIVALENT + 1);
        List<Double> equivalents = new ArrayList<>();
        Map<String, List<Double>> taken = new LinkedHashMap<>();
        for (int i = 0; i < points; i++) {
            double dose = span * i / (points - 1);
            Review review = reviewer.review(step.withEquivalents(dose));
            equivalents.add(dose);
            for (Transfer transfer : review.transfers()) {
                taken.computeIfAbsent(transfer.donor(), donor -> new ArrayList<>()).add(transfer.percentTaken());
            }
        }
        taken.values().removeIf(shares -> shares.size() != points);
        return new DoseSweep(equivalents, taken);
    }

    double span() {
        return equivalents.get(equivalents.size() - 1);
    }
}
