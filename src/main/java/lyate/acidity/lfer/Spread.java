package lyate.acidity.lfer;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.HashMap;
import java.util.Map;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * The standard uncertainty of an estimate, from {@code estimate-spread.csv}: what cross-validation found for the line, growing
 * as the nearest measured relatives get less alike or fit less well themselves, and with every part of the molecule that could only be described roughly.
 */
public final class Spread {

    /** The scope of a line without a row of its own. */
    public static final String ANY = "all";

    /** What {@code estimate-spread.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("estimate-spread.csv", text("id"), word("medium", "water", "dmso"),
            text("scope"), number("sigma_alike"), number("widening"),
            number("misfit_power"), number("per_missing"), number("n"), text("source"));

    private final Map<String, Curve> curves;

    /**
     * How the uncertainty of one line grows.
     *
     * @param alike      standard uncertainty beside a relative with the same surroundings, pKa units
     * @param widening   natural logarithm of the factor for each unit of {@link Anchors.Comparison#distance}
     * @param misfitPower power of {@link #misfitRatio}
     * @param perMissing factor for the first part described roughly
     */
    public record Curve(double alike, double widening, double misfitPower, double perMissing) {

        private static final double USUAL_MISFIT = 0.2;
        private static final double SMALLEST_MISFIT = 0.1;

        /** The standard uncertainty of a site compared with its nearest anchors. */
        public double sigma(double distance, double misfit, boolean missing) {
            return alike * Math.exp(widening * distance) * Math.pow(misfitRatio(misfit), misfitPower) * (missing ? perMissing : 1);
        }

        /** 1 where the nearest anchors fit their own estimates as usual, more where they do not. */
        public static double misfitRatio(double misfit) {
            return (SMALLEST_MISFIT + misfit) / (SMALLEST_MISFIT + USUAL_MISFIT);
        }
    }

    /** @param curves by {@code medium scope} */
    public Spread(Map<String, Curve> curves) {
        this.curves = Map.copyOf(curves);
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    static Spread load(TableFolders folders) {
        Map<String, Curve> curves = new HashMap<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            curves.put(row.text("medium") + " " + row.text("scope"), new Curve(row.number("sigma_alike").getAsDouble(),
                    row.number("widening").getAsDouble(), row.number("misfit_power").getAsDouble(),
                    row.number("per_missing").getAsDouble()));
        }
        return new Spread(curves);
    }

    /** The curve of a line; that of all lines where it has none. */
    public Curve curve(Medium medium, Series series) {
        Curve own = curves.get(medium.id() + " " + series.line());
        return own == null ? curves.get(medium.id() + " " + ANY) : own;
    }
}
