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
 * as the nearest measured relative gets less alike and with every part of the molecule that could only be described roughly.
 */
public final class Spread {

    /** The scope of a line without a row of its own. */
    public static final String ANY = "all";

    /** What {@code estimate-spread.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("estimate-spread.csv", text("id"), word("medium", "water", "dmso"),
            text("scope"), number("sigma_alike"), number("widening"), number("per_missing"), number("n"), text("source"));

    private final Map<String, Curve> curves;

    /**
     * How the uncertainty of one line grows.
     *
     * @param alike      standard uncertainty beside a relative with the same surroundings, pKa units
     * @param widening   natural logarithm of the factor for each unit of {@link Anchors.Comparison#distance}
     * @param perMissing factor for the first part described roughly
     */
    public record Curve(double alike, double widening, double perMissing) {

        /** The standard uncertainty at a distance from the nearest anchors. */
        public double sigma(double distance, boolean missing) {
            return alike * Math.exp(widening * distance) * (missing ? perMissing : 1);
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
                    row.number("widening").getAsDouble(), row.number("per_missing").getAsDouble()));
        }
        return new Spread(curves);
    }

    /** The curve of a line; that of all lines where it has none. */
    public Curve curve(Medium medium, Series series) {
        Curve own = curves.get(medium.id() + " " + series.line());
        return own == null ? curves.get(medium.id() + " " + ANY) : own;
    }
}
