package lyate.acidity;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import lyate.table.Lazy;

/**
 * A value and the lines it may be carried along; no line where it is where it should be already.
 *
 * @param start      the value to carry
 * @param steps      the lines, in order
 * @param pKa        where it arrives
 * @param sigma      with which uncertainty
 * @param makeshifts how many of the lines are not of the acid's own family
 */
record MediaRoute(Acidity start, List<Step> steps, double pKa, double sigma, long makeshifts) {

    /** A line and the words for it, which are put together only once. */
    record Step(MediaRelation line, Lazy<String> inWords) {

        static Step of(MediaRelation line) {
            return new Step(line, Lazy.of(line::toString));
        }

        String words() {
            return inWords.get();
        }
    }

    /** Lines of the acid's own family first, then the least uncertainty. */
    static final Comparator<MediaRoute> BEST_FIRST = Comparator.comparingLong(MediaRoute::makeshifts)
            .thenComparingDouble(MediaRoute::sigma);

    static MediaRoute of(Acidity start, List<Step> steps) {
        double pKa = start.pKa();
        double sigma = start.sigma();
        for (Step step : steps) {
            sigma = Math.hypot(step.line().slope() * sigma, step.line().error(pKa));
            pKa = step.line().convert(pKa);
        }
        long makeshifts = steps.stream().filter(step -> step.line().family().equals(MediaRelation.ANY)).count();
        return new MediaRoute(start, steps, pKa, sigma, makeshifts);
    }

    /** The value at the end of the route, which it names. */
    Acidity arrived() {
        if (steps.isEmpty()) {
            return start;
        }
        List<String> missing = new ArrayList<>(start.missing());
        double value = start.pKa();
        for (Step step : steps) {
            if (step.line().distanceOutside(value) > 0) {
                missing.add("the relation " + step.words() + " is used outside the range it was fitted on");
            }
            value = step.line().convert(value);
        }
        String path = steps.stream().map(Step::words).collect(Collectors.joining(", then "));
        return Carried.of(start, pKa, sigma, steps.get(steps.size() - 1).line().to(), path, missing);
    }
}
