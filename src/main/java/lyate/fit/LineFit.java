package lyate.fit;

import java.util.Arrays;
import java.util.List;

/**
 * A straight line through points, fitted so that single wrong values hardly move it (Huber's M-estimate, iteratively
 * reweighted) and with a slope held near an expected one as long as the points do not say otherwise.
 *
 * @param slope         of the line
 * @param intercept     of the line
 * @param standardError standard deviation of a further point about the line, the error of the line itself included
 * @param points        number of points
 */
record LineFit(double slope, double intercept, double standardError, int points) {

    /** A point: pKa in one medium and in the other. */
    record Point(double x, double y) {}

    /** Huber's constant: 95 % efficiency for normal errors (Huber, Robust Statistics, 1981). */
    private static final double HUBER = 1.345;
    /** Standard deviation of a normal distribution per median absolute deviation. */
    private static final double MAD_TO_SIGMA = 1.4826;
    /** No two laboratories agree better than this on average, pKa units. */
    private static final double LEAST_ERROR = 0.3;
    private static final int ROUNDS = 60;

    /**
     * Fits a line.
     *
     * @param points        at least two
     * @param expectedSlope where the slope lies before looking at the points
     * @param slopeSpread   how sure that is, one standard deviation
     */
    static LineFit through(List<Point> points, double expectedSlope, double slopeSpread) {
        double[] weights = new double[points.size()];
        Arrays.fill(weights, 1);
        double scale = 1;
        double slope = expectedSlope;
        double intercept = 0;
        for (int round = 0; round < ROUNDS; round++) {
            double meanX = mean(points.stream().mapToDouble(Point::x).toArray(), weights);
            double meanY = mean(points.stream().mapToDouble(Point::y).toArray(), weights);
            double pull = scale * scale / (slopeSpread * slopeSpread);
            double xx = pull;
            double xy = pull * expectedSlope;
            for (int i = 0; i < weights.length; i++) {
                double dx = points.get(i).x() - meanX;
                xx += weights[i] * dx * dx;
                xy += weights[i] * dx * (points.get(i).y() - meanY);
            }
            slope = xy / xx;
            intercept = meanY - slope * meanX;
            double[] residuals = residuals(points, slope, intercept);
            scale = Math.max(LEAST_ERROR, MAD_TO_SIGMA * median(Arrays.stream(residuals).map(Math::abs).toArray()));
            for (int i = 0; i < weights.length; i++) {
                double size = Math.abs(residuals[i]) / (HUBER * scale);
                weights[i] = size <= 1 ? 1 : 1 / size;
            }
        }
        return new LineFit(slope, intercept, spread(residuals(points, slope, intercept), weights), points.size());
    }

    /**
     * Spread of a further point: the line itself is uncertain, and few points tell little of their spread. Outliers
     * count more than in the line: odd acids will be met again.
     */
    private static double spread(double[] residuals, double[] weights) {
        double squares = 0;
        double weight = 0;
        for (int i = 0; i < residuals.length; i++) {
            squares += Math.sqrt(weights[i]) * residuals[i] * residuals[i];
            weight += weights[i];
        }
        double freedom = Math.max(1, weight - 1.5);
        double few = Math.sqrt(1 + 1.5 / residuals.length) * (1 + 0.5 / freedom);
        return Math.max(LEAST_ERROR, few * Math.sqrt(squares / freedom));
    }

    private static double[] residuals(List<Point> points, double slope, double intercept) {
        return points.stream().mapToDouble(point -> point.y() - slope * point.x() - intercept).toArray();
    }

    private static double mean(double[] values, double[] weights) {
        double sum = 0;
        double weight = 0;
        for (int i = 0; i < values.length; i++) {
            sum += weights[i] * values[i];
            weight += weights[i];
        }
        return sum / weight;
    }

    private static double median(double[] values) {
        double[] sorted = values.clone();
        Arrays.sort(sorted);
        int middle = sorted.length / 2;
        return sorted.length % 2 == 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
    }
}
