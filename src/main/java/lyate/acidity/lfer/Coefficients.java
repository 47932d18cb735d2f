package lyate.acidity.lfer;

import static lyate.table.Column.number;
import static lyate.table.Column.text;
import static lyate.table.Column.word;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Schema;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;

/**
 * The fitted coefficients of {@code estimate-coefficients.csv} on top of the published ones. A line without a row of its own
 * for a descriptor moves with its pool.
 */
public final class Coefficients {

    /** What {@code estimate-coefficients.csv} looks like. */
    public static final Schema SCHEMA = Schema.of("estimate-coefficients.csv", text("id"), word("medium", "water", "dmso"),
            text("scope"), text("descriptor"), number("published"), number("fitted"), number("standard_error"), number("n"),
            text("source"));

    private final Published published;
    private final Map<String, Map<String, Change>> scopes = new HashMap<>();

    /**
     * What the fit did to a coefficient.
     *
     * @param medium     the medium
     * @param scope      a line, or {@code pool:NAME}
     * @param descriptor the descriptor, or {@link Published#BASE}
     * @param value      fitted less published, pKa units per unit of the descriptor
     * @param n          training values that speak of it
     */
    public record Change(Medium medium, String scope, String descriptor, double value, int n) {}

    public Coefficients(Published published, List<Change> changes) {
        this.published = published;
        changes.forEach(change -> scopes.computeIfAbsent(change.medium().id() + " " + change.scope(), key -> new HashMap<>())
                .put(change.descriptor(), change));
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell
     */
    static Coefficients load(TableFolders folders, Published published) {
        List<Change> changes = new ArrayList<>();
        for (Row row : Table.read(SCHEMA, folders).rows()) {
            double change = row.number("fitted").getAsDouble() - row.number("published").getAsDouble();
            changes.add(new Change(new Medium(row.text("medium")), row.text("scope"), row.text("descriptor"), change,
                    (int) row.number("n").getAsDouble()));
        }
        return new Coefficients(published, changes);
    }

    /**
     * The coefficients of one series in one pool.
     *
     * @param published what the literature says
     * @param line      what the fit did for the line
     * @param pool      what the fit did for the pool
     */
    public record Line(Published.Line published, Map<String, Change> line, Map<String, Change> pool) {

        /** The coefficient of a descriptor. */
        public double value(String descriptor) {
            Change change = line.get(descriptor);
            if (change == null) {
                change = pool.get(descriptor);
            }
            return published.value(descriptor) + (change == null ? 0 : change.value());
        }

        /** Whether the base value is published for the line itself, or fitted on at least so many values. */
        boolean known(int enough) {
            Change base = line.get(Published.BASE);
            return base != null && base.n() >= enough || published.line().containsKey(Published.BASE);
        }
    }

    Line of(Pool pool, Series series) {
        String medium = pool.medium().id();
        return new Line(published.of(pool.medium(), series), scopes.getOrDefault(medium + " " + series.line(), Map.of()),
                scopes.getOrDefault(medium + " pool:" + pool.name(), Map.of()));
    }
}
