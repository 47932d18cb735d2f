package lyate.acidity;

import static lyate.table.Column.number;
import static lyate.table.Column.text;

import java.util.Locale;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Schema;

/**
 * A straight line between the pKa scales of two media, for acids of one family: a row of {@code media-transfer.csv}.
 *
 * @param from          medium of the known value
 * @param to            medium of the wanted value
 * @param family        acids it was fitted on; {@code any} for all
 * @param slope         pKa units per pKa unit
 * @param intercept     pKa units
 * @param standardError residual standard deviation in the {@code to} medium, pKa units
 * @param pairs         number of acids measured in both media it rests on
 * @param validFrom     lowest pKa in the {@code from} medium it was fitted on
 * @param validTo       highest pKa in the {@code from} medium it was fitted on
 * @param source        citation or method
 */
public record MediaRelation(Medium from, Medium to, String family, double slope, double intercept,
                            double standardError, int pairs, double validFrom, double validTo, String source) {

    /** The family whose relation serves every acid that has none of its own. */
    public static final String ANY = "any";

    /** What {@code media-transfer.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("media-transfer.csv",
            text("id"), text("from"), text("to"), text("family"), number("slope"), number("intercept"),
            number("standard_error"), number("n"), number("valid_from"), number("valid_to"), text("source"));

    /** No slope is known better than this (assumption). */
    private static final double LEAST_SLOPE_ERROR = 0.05;

    /** The relation a row of the table states. */
    public static MediaRelation of(Row row) {
        return new MediaRelation(new Medium(row.text("from")), new Medium(row.text("to")), row.text("family"),
                value(row, "slope"), value(row, "intercept"), value(row, "standard_error"), (int) value(row, "n"),
                value(row, "valid_from"), value(row, "valid_to"), row.text("source"));
    }

    private static double value(Row row, String column) {
        return row.number(column).getAsDouble();
    }

    /** The same line read the other way. */
    public MediaRelation inverse() {
        double low = convert(validFrom);
        double high = convert(validTo);
        return new MediaRelation(to, from, family, 1 / slope, -intercept / slope, standardError / Math.abs(slope), pairs,
                Math.min(low, high), Math.max(low, high), source);
    }

    /** The pKa in the {@code to} medium. */
    public double convert(double pKa) {
        return slope * pKa + intercept;
    }

    /** Standard uncertainty of {@link #convert} for an exact pKa: the residual spread, more outside the fitted range. */
    public double error(double pKa) {
        return Math.hypot(standardError, slopeError() * distanceOutside(pKa));
    }

    /** Standard error of the slope, as it is for points spread evenly over the range. */
    private double slopeError() {
        double range = validTo - validFrom;
        return Math.max(LEAST_SLOPE_ERROR * Math.abs(slope), Math.sqrt(12.0 / Math.max(1, pairs)) * standardError / range);
    }

    /** How far outside the fitted range a pKa lies; 0 within. */
    public double distanceOutside(double pKa) {
        return Math.max(0, Math.max(validFrom - pKa, pKa - validTo));
    }

    /** For example {@code DMSO = 1.62 x water + 4.8 (carboxylic-acid, +/- 0.5, n = 21)}. */
    @Override
    public String toString() {
        return String.format(Locale.ROOT, "%s = %.2f x %s %s %.1f (%s, +/- %.1f, n = %d)", to.symbol(), slope, from.symbol(),
                intercept < 0 ? "-" : "+", Math.abs(intercept), family, standardError, pairs);
    }
}
