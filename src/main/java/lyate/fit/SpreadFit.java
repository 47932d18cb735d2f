package lyate.fit;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import lyate.acidity.lfer.Spread;
import lyate.acidity.lfer.Spread.Curve;
import lyate.fit.CrossValidation.Outcome;
import lyate.stock.Medium;

/**
 * Finds the uncertainty of the estimates of one medium from how far cross-validation missed.
 *
 * <p>The logarithm of the error grows with the distance of the nearest relatives and with their own misfit (one slope each for the
 * medium) and has a level for every line, drawn towards that of the medium where the line has few values. The common factor is
 * then set so that {@value #WITHIN_ONE} of the errors lie within one standard uncertainty: more than for a normal distribution,
 * because these errors have longer tails.
 */
final class SpreadFit {

    private static final double WITHIN_ONE = 0.745;
    /** Values that count as much as the common level. */
    private static final double SHRINKAGE = 12;
    /** An error smaller than this says no more than this, pKa units. */
    private static final double SMALLEST = 0.05;
    private static final double SMALLEST_SIGMA = 0.1;
    private static final double STEEPEST = 3;
    /** What a part described roughly multiplies the uncertainty by at least. */
    private static final double ROUGH = 1.25;
    /** A line that cross-validation has not seen is taken to be this much worse than the others (natural logarithm). */
    private static final double UNSEEN_LINE = 0.3;

    private final List<Outcome> outcomes;
    private final double widening;
    private final double misfitPower;
    private final double perMissing;

    private SpreadFit(List<Outcome> outcomes) {
        this.outcomes = outcomes;
        double[] slopes = slopes();
        this.widening = Math.max(0, Math.min(STEEPEST, slopes[0]));
        this.misfitPower = Math.max(0, Math.min(1, slopes[1]));
        this.perMissing = perMissing();
    }

    /** Curves by scope: {@link Spread#ANY} and every line that has values. */
    static Map<String, Curve> of(List<Outcome> outcomes) {
        return new SpreadFit(outcomes).curves();
    }

    private Map<String, Curve> curves() {
        double common = level(outcomes);
        Map<String, Double> levels = new TreeMap<>();
        lines().forEach((line, own) -> levels.put(line,
                (own.size() * level(own) + SHRINKAGE * common) / (own.size() + SHRINKAGE)));
        double[] ratios = outcomes.stream()
                .mapToDouble(outcome -> Math.abs(outcome.error()) / sigma(curve(levels.get(line(outcome)), 1), outcome)).sorted().toArray();
        double factor = ratios[(int) (WITHIN_ONE * (ratios.length - 1))];
        Map<String, Curve> curves = new LinkedHashMap<>();
        curves.put(Spread.ANY, curve(common + UNSEEN_LINE, factor));
        levels.forEach((line, level) -> curves.put(line, curve(level, factor)));
        return curves;
    }

    private Curve curve(double level, double factor) {
        return new Curve(Math.max(SMALLEST_SIGMA, factor * Math.exp(level)), widening, misfitPower, perMissing);
    }

    private static double sigma(Curve curve, Outcome outcome) {
        return curve.sigma(outcome.distance(), outcome.misfit(), outcome.missing() > 0);
    }

    /** Slopes of the logarithm of the error against distance and misfit, each about the means of its line. */
    private double[] slopes() {
        double xx = 0;
        double xz = 0;
        double zz = 0;
        double xy = 0;
        double zy = 0;
        for (List<Outcome> line : lines().values()) {
            double meanX = mean(line, Outcome::distance);
            double meanZ = mean(line, SpreadFit::logMisfit);
            double meanY = mean(line, SpreadFit::logError);
            for (Outcome outcome : line) {
                double x = outcome.distance() - meanX;
                double z = logMisfit(outcome) - meanZ;
                double y = logError(outcome) - meanY;
                xx += x * x;
                xz += x * z;
                zz += z * z;
                xy += x * y;
                zy += z * y;
            }
        }
        double determinant = xx * zz - xz * xz;
        return determinant <= 0 ? new double[] {0, 0}
                : new double[] {(xy * zz - zy * xz) / determinant, (zy * xx - xy * xz) / determinant};
    }

    private double perMissing() {
        List<Outcome> rough = outcomes.stream().filter(outcome -> outcome.missing() > 0).toList();
        List<Outcome> plain = outcomes.stream().filter(outcome -> outcome.missing() == 0).toList();
        return rough.isEmpty() || plain.isEmpty() ? ROUGH
                : Math.max(ROUGH, Math.exp(mean(rough, this::unexplained) - mean(plain, this::unexplained)));
    }

    /** What distance and misfit leave of the logarithm of the error. */
    private double unexplained(Outcome outcome) {
        return logError(outcome) - widening * outcome.distance() - misfitPower * logMisfit(outcome);
    }

    private double level(List<Outcome> some) {
        return mean(some, outcome -> unexplained(outcome) - (outcome.missing() > 0 ? Math.log(perMissing) : 0));
    }

    private static double mean(List<Outcome> outcomes, ToDoubleFunction<Outcome> value) {
        return outcomes.stream().mapToDouble(value).average().orElseThrow();
    }

    private static double logError(Outcome outcome) {
        return Math.log(Math.max(SMALLEST, Math.abs(outcome.error())));
    }

    private static double logMisfit(Outcome outcome) {
        return Math.log(Curve.misfitRatio(outcome.misfit()));
    }

    private Map<String, List<Outcome>> lines() {
        return outcomes.stream().collect(Collectors.groupingBy(SpreadFit::line, TreeMap::new, Collectors.toList()));
    }

    private static String line(Outcome outcome) {
        return outcome.row().site().series().line();
    }

    /** Which share of the errors lies within {@code sigmas} standard uncertainties. */
    static double coverage(Map<String, Curve> curves, List<Outcome> outcomes, double sigmas) {
        return outcomes.stream().filter(outcome -> Math.abs(outcome.error())
                <= sigmas * sigma(curves.getOrDefault(line(outcome), curves.get(Spread.ANY)), outcome)).count() / (double) outcomes.size();
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
