package lyate.acidity;

import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;
import java.util.stream.Collectors;
import lyate.stock.Medium;

/**
 * Stated pKa values beside measured ones; made by {@link AccuracyCheck}.
 *
 * @param comparisons rows that could be compared, in file order
 * @param badRows     rows that could not, with the reason
 */
public record AccuracyReport(List<Comparison> comparisons, List<BadRow> badRows) {

    private static final int WORST_SHOWN = 15;

    /**
     * One value compared.
     *
     * @param line        1-based line in the file
     * @param smiles      structure as given
     * @param site        label of the site
     * @param siteClass   name of its class
     * @param measured    pKa in the file
     * @param stated      what the program says, in the medium of the row
     * @param roleGuessed whether the row gives no role and the site could have both
     */
    public record Comparison(long line, String smiles, String site, String siteClass, double measured, Acidity stated,
                             boolean roleGuessed) {

        /** Stated minus measured, pKa units. */
        public double error() {
            return stated.pKa() - measured;
        }

        Medium medium() {
            return stated.medium();
        }
    }

    /**
     * A row that could not be used.
     *
     * @param line   1-based line in the file
     * @param text   the row as read
     * @param reason what is wrong with it
     */
    public record BadRow(long line, String text, String reason) {}

    public AccuracyReport {
        comparisons = List.copyOf(comparisons);
        badRows = List.copyOf(badRows);
    }

    /** Statistics of all comparisons; empty where there is none. */
    public Optional<AccuracyStatistics> overall() {
        return comparisons.isEmpty() ? Optional.empty() : Optional.of(AccuracyStatistics.of(comparisons));
    }

    /** Statistics by name of the site class. */
    public Map<String, AccuracyStatistics> bySiteClass() {
        return by(Comparison::siteClass);
    }

    /** Statistics by id of the medium. */
    public Map<String, AccuracyStatistics> byMedium() {
        return by(row -> row.medium().id());
    }

    /** The rows that are furthest off, worst first. */
    public List<Comparison> worst(int count) {
        return comparisons.stream().sorted(Comparator.comparingDouble((Comparison row) -> -Math.abs(row.error())))
                .limit(count).toList();
    }

    /** The report as plain text. */
    public String text() {
        StringBuilder text = new StringBuilder();
        overall().ifPresent(all -> text.append(AccuracyStatistics.HEADER).append('\n').append(all.line("all")).append('\n'));
        byMedium().forEach((medium, part) -> text.append(part.line("in " + medium)).append('\n'));
        bySiteClass().forEach((name, part) -> text.append(part.line("  " + name)).append('\n'));
        long guessed = comparisons.stream().filter(Comparison::roleGuessed).count();
        if (guessed > 0) {
            text.append(guessed).append(" rows give no role; each was compared with the nearer of its acid and its base value\n");
        }
        if (!comparisons.isEmpty()) {
            text.append("furthest off:\n");
        }
        for (Comparison row : worst(WORST_SHOWN)) {
            text.append(String.format(Locale.ROOT, "  line %d: %s %s in %s (%s): measured %.2f, stated %.2f +/- %.2f (%s)%n",
                    row.line(), row.smiles(), row.site(), row.medium().id(), row.siteClass(), row.measured(),
                    row.stated().pKa(), row.stated().sigma(), row.stated().basis().word()));
        }
        for (BadRow row : badRows) {
            text.append(String.format(Locale.ROOT, "not used, line %d: %s: %s%n", row.line(), row.reason(), row.text()));
        }
        return text.toString();
    }

    private Map<String, AccuracyStatistics> by(Function<Comparison, String> key) {
        Map<String, AccuracyStatistics> parts = new TreeMap<>();
        comparisons.stream().collect(Collectors.groupingBy(key))
                .forEach((name, rows) -> parts.put(name, AccuracyStatistics.of(rows)));
        return parts;
    }
}
