package lyate.acidity;

import java.util.List;
import java.util.Locale;

/**
 * How far stated pKa values lie from measured ones.
 *
 * @param n              number of values
 * @param rmse           root mean square error, pKa units
 * @param meanAbsolute   mean absolute error, pKa units
 * @param medianAbsolute median absolute error, pKa units
 * @param withinOneSigma fraction of errors no larger than the stated standard uncertainty
 * @param withinTwoSigma fraction of errors no larger than twice that
 */
public record AccuracyStatistics(int n, double rmse, double meanAbsolute, double medianAbsolute,
                                 double withinOneSigma, double withinTwoSigma) {

    /**
     * Statistics of at least one comparison.
     *
     * @throws IllegalArgumentException for none
     */
    static AccuracyStatistics of(List<AccuracyReport.Comparison> comparisons) {
        if (comparisons.isEmpty()) {
            throw new IllegalArgumentException("no values to compare");
        }
        double[] errors = comparisons.stream().mapToDouble(row -> Math.abs(row.error())).sorted().toArray();
        int n = errors.length;
        double squares = 0;
        double sum = 0;
        for (double error : errors) {
            squares += error * error;
            sum += error;
        }
        double median = n % 2 == 1 ? errors[n / 2] : (errors[n / 2 - 1] + errors[n / 2]) / 2;
        return new AccuracyStatistics(n, Math.sqrt(squares / n), sum / n, median,
                covered(comparisons, 1), covered(comparisons, 2));
    }

    private static double covered(List<AccuracyReport.Comparison> comparisons, int sigmas) {
        long inside = comparisons.stream()
                .filter(row -> Math.abs(row.error()) <= sigmas * row.stated().sigma()).count();
        return (double) inside / comparisons.size();
    }

    /** One line of fixed columns, under {@link #HEADER}. */
    String line(String label) {
        return String.format(Locale.ROOT, "%-34s %6d %7.2f %7.2f %7.2f %6.0f %% %6.0f %%", label, n, rmse, meanAbsolute,
                medianAbsolute, 100 * withinOneSigma, 100 * withinTwoSigma);
    }

    static final String HEADER = String.format(Locale.ROOT, "%-34s %6s %7s %7s %7s %8s %8s", "", "n", "RMSE", "mean",
            "median", "in 1 s", "in 2 s");
}
