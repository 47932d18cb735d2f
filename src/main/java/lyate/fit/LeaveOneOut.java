package lyate.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lyate.fit.LineFit.Point;

/**
 * How well a line predicts points it was not fitted on: each is left out in turn.
 *
 * @param n              number of points
 * @param rmse           root mean square error, pKa units
 * @param withinOneSigma fraction of errors no larger than the stated standard error
 * @param withinTwoSigma fraction of errors no larger than twice that
 */
record LeaveOneOut(int n, double rmse, double withinOneSigma, double withinTwoSigma) {

    /** Leaves every point out once; at least three. */
    static LeaveOneOut of(List<Point> points, double expectedSlope, double slopeSpread) {
        double squares = 0;
        int one = 0;
        int two = 0;
        for (int i = 0; i < points.size(); i++) {
            List<Point> others = new ArrayList<>(points);
            Point left = others.remove(i);
            LineFit fit = LineFit.through(others, expectedSlope, slopeSpread);
            double error = Math.abs(left.y() - fit.slope() * left.x() - fit.intercept());
            squares += error * error;
            one += error <= fit.standardError() ? 1 : 0;
            two += error <= 2 * fit.standardError() ? 1 : 0;
        }
        double n = points.size();
        return new LeaveOneOut(points.size(), Math.sqrt(squares / n), one / n, two / n);
    }

    /** Both together, as if their points had been left out in one run. */
    LeaveOneOut and(LeaveOneOut other) {
        double both = n + other.n;
        return new LeaveOneOut(n + other.n, Math.sqrt((n * rmse * rmse + other.n * other.rmse * other.rmse) / both),
                (n * withinOneSigma + other.n * other.withinOneSigma) / both,
                (n * withinTwoSigma + other.n * other.withinTwoSigma) / both);
    }

    @Override
    public String toString() {
        return String.format(Locale.ROOT, "n %3d, RMSE %.2f, %3.0f %% within 1 s, %3.0f %% within 2 s", n, rmse,
                100 * withinOneSigma, 100 * withinTwoSigma);
    }
}
