package lyate.window;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BooleanSupplier;
import lyate.review.Review;
import lyate.review.ReviewException;
import lyate.review.Reviewer;
import lyate.review.Step;
import lyate.review.Transfer;

/**
 * What becomes of every donor as more base goes in: the step reviewed at equivalents from 0 to at least 3.
 *
 * @param equivalents moles of base per mole of substrate
 * @param percentTaken share of protons taken, by donor, one value per entry of {@code equivalents}
 */
record DoseSweep(List<Double> equivalents, Map<String, List<Double>> percentTaken) {

    private static final double LEAST_SPAN = 3;
    private static final int POINTS = 61;

    /**
     * Reviews the step at every dose.
     *
     * @param goOn asked before each dose; the sweep ends early, and incomplete, once it says no
     */
    static DoseSweep of(Step step, Reviewer reviewer, BooleanSupplier goOn) throws ReviewException {
        double span = span(step);
        List<Double> equivalents = new ArrayList<>();
        Map<String, List<Double>> taken = new LinkedHashMap<>();
        for (int i = 0; i < POINTS && goOn.getAsBoolean(); i++) {
            double dose = span * i / (POINTS - 1);
            Review review = reviewer.review(at(step, dose));
            equivalents.add(dose);
            for (Transfer transfer : review.transfers()) {
                taken.computeIfAbsent(transfer.donor(), donor -> new ArrayList<>()).add(transfer.percentTaken());
            }
        }
        return new DoseSweep(equivalents, taken);
    }

    /** Equivalents the sweep of a step runs up to. */
    static double span(Step step) {
        return Math.max(LEAST_SPAN, Math.ceil(step.equivalents() * 1.2));
    }

    private static Step at(Step step, double equivalents) {
        return new Step(step.id(), step.substrate(), step.intendedSite(), step.base(), equivalents, step.solvent(),
                step.temperatureCelsius(), step.concentrationMolar(), step.waterPpm(), step.partner());
    }
}
