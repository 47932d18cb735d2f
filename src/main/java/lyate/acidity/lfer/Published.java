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

/** The rows of {@code estimate-published.csv}: coefficients as they stand in the literature, before any fit. */
public final class Published {

    /** The descriptor that every site has once: its coefficient is the base value of the line. */
    public static final String BASE = "base";

    static final Schema SCHEMA = Schema.of("estimate-published.csv", text("id"), word("medium", "water", "dmso"),
            text("scope"), text("descriptor"), number("value"), text("source"));

    private final Map<String, Map<String, Double>> scopes = new HashMap<>();

    private Published() {}

    /**
     * The published coefficients of one series in one medium; the narrowest scope that names a descriptor decides.
     *
     * @param line  those of its line
     * @param group those of its group
     * @param all   those of every series
     */
    public record Line(Map<String, Double> line, Map<String, Double> group, Map<String, Double> all) {

        /** The coefficient of a descriptor, 0 where nothing is published. */
        double value(String descriptor) {
            Double value = line.get(descriptor);
            if (value == null) {
                value = group.get(descriptor);
            }
            if (value == null) {
                value = all.get(descriptor);
            }
            return value == null ? 0 : value;
        }
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    public static Published load(TableFolders folders) {
        Published published = new Published();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            published.scopes.computeIfAbsent(row.text("medium") + " " + row.text("scope"), key -> new HashMap<>())
                    .put(row.text("descriptor"), row.number("value").getAsDouble());
        }
        return published;
    }

    Line of(Medium medium, Series series) {
        return new Line(scope(medium, series.line()), scope(medium, "group:" + series.group()), scope(medium, "all"));
    }

    private Map<String, Double> scope(Medium medium, String name) {
        return scopes.getOrDefault(medium.id() + " " + name, Map.of());
    }

    /** The published coefficient of a descriptor for a series, 0 where there is none. */
    public double value(Medium medium, Series series, String descriptor) {
        return of(medium, series).value(descriptor);
    }

    /** What the published relationships alone make of a site, statistical factor left out. */
    public double estimate(Medium medium, SiteDescription site) {
        Line line = of(medium, site.series());
        double sum = line.value(BASE);
        for (Term term : site.terms()) {
            sum += line.value(term.name()) * term.value();
        }
        return sum;
    }
}
