package lyate.fit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import lyate.acidity.lfer.Spread;
import lyate.acidity.lfer.Spread.Curve;
import lyate.fit.CrossValidation.Outcome;
import lyate.stock.Medium;

/**
 * Finds the uncertainty of the estimates of one medium from how far cross-validation missed.
 *
 * <p>The logarithm of the error grows with the distance of the nearest relative (one slope for the medium) and has a level for
 * every line, drawn towards that of the medium where the line has few values. The common factor is then set so that
 * {@value #WITHIN_ONE} of the errors lie within one standard uncertainty: a little more than for a normal distribution,
 * because these errors have longer tails.
 */
final class SpreadFit {

    private static final double WITHIN_ONE = 0.74;
    /** Values that count as much as the common level. */
    private static final double SHRINKAGE = 12;
    /** An error smaller than this says no more than this, pKa units. */
    private static final double SMALLEST = 0.05;
    private static final double SMALLEST_SIGMA = 0.12;
    private static final double STEEPEST = 3;
    /** What a part described roughly multiplies the uncertainty by at least. */
    private static final double ROUGH = 1.25;

    private SpreadFit() {}

    /** Curves by scope: {@link Spread#ANY} and every line that has values. */
    static Map<String, Curve> of(List<Outcome> outcomes) {
        double widening = Math.max(0, Math.min(STEEPEST, slope(outcomes)));
        double perMissing = perMissing(outcomes, widening);
        double common = level(outcomes, widening, perMissing);
        Map<String, Double> levels = new TreeMap<>();
        lines(outcomes).forEach((line, own) -> levels.put(line,
                (own.size() * level(own, widening, perMissing) + SHRINKAGE * common) / (own.size() + SHRINKAGE)));
        double[] ratios = outcomes.stream().mapToDouble(outcome -> Math.abs(outcome.error())
                / curve(levels.get(line(outcome)), widening, perMissing, 1).sigma(outcome.distance(), outcome.missing() > 0)).sorted().toArray();
        double factor = ratios[(int) (WITHIN_ONE * (ratios.length - 1))];
        Map<String, Curve> curves = new LinkedHashMap<>();
        curves.put(Spread.ANY, curve(common + 0.3, widening, perMissing, factor));
        levels.forEach((line, level) -> curves.put(line, curve(level, widening, perMissing, factor)));
        return curves;
    }

    private static Curve curve(double level, double widening, double perMissing, double factor) {
        return new Curve(Math.max(SMALLEST_SIGMA, factor * Math.exp(level)), widening, perMissing);
    }

    /** Slope of the logarithm of the error against distance, each about the mean of its line. */
    private static double slope(List<Outcome> outcomes) {
        double top = 0;
        double bottom = 0;
        for (List<Outcome> line : lines(outcomes).values()) {
            double x = line.stream().mapToDouble(outcome -> outcome.distance()).average().orElseThrow();
            double y = line.stream().mapToDouble(SpreadFit::logError).average().orElseThrow();
            for (Outcome outcome : line) {
                top += (outcome.distance() - x) * (logError(outcome) - y);
                bottom += (outcome.distance() - x) * (outcome.distance() - x);
            }
        }
        return bottom == 0 ? 0 : top / bottom;
    }

    private static double perMissing(List<Outcome> outcomes, double widening) {
        double rough = mean(outcomes.stream().filter(outcome -> outcome.missing() > 0).toList(), widening);
        double plain = mean(outcomes.stream().filter(outcome -> outcome.missing() == 0).toList(), widening);
        return Double.isNaN(rough) ? ROUGH : Math.max(ROUGH, Math.exp(rough - plain));
    }

    private static double mean(List<Outcome> outcomes, double widening) {
        return outcomes.stream().mapToDouble(outcome -> logError(outcome) - widening * outcome.distance()).average().orElse(Double.NaN);
    }

    private static double level(List<Outcome> outcomes, double widening, double perMissing) {
        return outcomes.stream().mapToDouble(outcome -> logError(outcome) - widening * outcome.distance()
                - (outcome.missing() > 0 ? Math.log(perMissing) : 0)).average().orElseThrow();
    }

    private static double logError(Outcome outcome) {
        return Math.log(Math.max(SMALLEST, Math.abs(outcome.error())));
    }

    private static Map<String, List<Outcome>> lines(List<Outcome> outcomes) {
        return outcomes.stream().collect(Collectors.groupingBy(SpreadFit::line, TreeMap::new, Collectors.toList()));
    }

    private static String line(Outcome outcome) {
        return outcome.row().site().series().line();
    }

    /** Which share of the errors lies within {@code sigmas} standard uncertainties. */
    static double coverage(Map<String, Curve> curves, List<Outcome> outcomes, double sigmas) {
        return outcomes.stream().filter(outcome -> Math.abs(outcome.error()) <= sigmas * curves.getOrDefault(line(outcome),
                curves.get(Spread.ANY)).sigma(outcome.distance(), outcome.missing() > 0)).count() / (double) outcomes.size();
    }

    static List<Outcome> in(Medium medium, List<Outcome> outcomes) {
        return outcomes.stream().filter(outcome -> outcome.row().medium().equals(medium)).toList();
    }

    static double rootMeanSquare(List<Outcome> outcomes) {
        return Math.sqrt(outcomes.stream().mapToDouble(outcome -> outcome.error() * outcome.error()).average().orElse(0));
    }

    static double medianError(List<Outcome> outcomes) {
        return PoolFit.median(outcomes.stream().mapToDouble(outcome -> Math.abs(outcome.error())).toArray());
    }
}
