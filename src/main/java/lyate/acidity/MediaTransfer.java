package lyate.acidity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import lyate.acidity.MediaRoute.Step;
import lyate.stock.Medium;
import lyate.table.Row;
import lyate.table.Table;
import lyate.table.TableException;
import lyate.table.TableFolders;
import lyate.table.TableProblem;

/**
 * Carries pKa values from one medium to another along the straight lines of {@code media-transfer.csv}.
 *
 * <p>A value goes straight or in two steps that meet in DMSO or water: relations of the acid's own family before those
 * for any acid, then the way that adds the least error. Each line serves both directions. Immutable; safe to share between threads.
 */
public final class MediaTransfer {

    private static final List<Medium> HUBS = List.of(Medium.DMSO, Medium.WATER);

    private final List<MediaRelation> relations;
    private final Map<Line, Step> lines = new HashMap<>();

    /** What a relation is looked up by. */
    private record Line(Medium from, Medium to, String family) {}

    /** Of two relations between the same media for the same family the later one holds. */
    public MediaTransfer(List<MediaRelation> relations) {
        this.relations = Stream.concat(relations.stream(), relations.stream().map(MediaRelation::inverse)).toList();
        this.relations.forEach(row -> lines.put(new Line(row.from(), row.to(), row.family()), Step.of(row)));
    }

    /**
     * Loads the table.
     *
     * @throws TableException for a bad cell, or a line that is flat or has no spread
     */
    public static MediaTransfer load(TableFolders folders) {
        List<TableProblem> problems = new ArrayList<>();
        List<MediaRelation> relations = new ArrayList<>();
        for (Row row : Table.read(MediaRelation.SCHEMA, folders).rows()) {
            MediaRelation relation = MediaRelation.of(row);
            if (relation.slope() <= 0) {
                problems.add(row.problem("slope", "a number above zero: acids keep their order"));
            } else if (relation.standardError() <= 0) {
                problems.add(row.problem("standard_error", "a number above zero"));
            } else if (relation.validFrom() >= relation.validTo()) {
                problems.add(row.problem("valid_to", "a number above valid_from"));
            }
            relations.add(relation);
        }
        if (!problems.isEmpty()) {
            throw new TableException(problems);
        }
        return new MediaTransfer(relations);
    }

    /** Every relation, each in both directions. */
    public List<MediaRelation> relations() {
        return relations;
    }

    /**
     * The value in another medium: error of the relation added in quadrature, basis {@code TRANSFERRED}, and one
     * contribution that says by which relation. Empty where no relation exists; the value itself where it is there already.
     */
    public Optional<Acidity> carry(Acidity acidity, String family, Medium to) {
        return carry(List.of(acidity), family, to);
    }

    /** The best of several values of one site, each in a medium of its own, in the wanted medium. */
    Optional<Acidity> carry(List<Acidity> values, String family, Medium to) {
        return values.stream().flatMap(value -> routes(value, to, family)).min(MediaRoute.BEST_FIRST).map(MediaRoute::arrived);
    }

    /** Slope of the family's own line between two media; empty where it has none. */
    OptionalDouble slope(Medium from, Medium to, String family) {
        Step own = lines.get(new Line(from, to, family));
        return own == null ? OptionalDouble.empty() : OptionalDouble.of(own.line().slope());
    }

    private Stream<MediaRoute> routes(Acidity start, Medium to, String family) {
        Medium from = start.medium();
        if (from.equals(to)) {
            return Stream.of(MediaRoute.of(start, List.of()));
        }
        List<MediaRoute> routes = new ArrayList<>();
        step(from, to, family).ifPresent(step -> routes.add(MediaRoute.of(start, List.of(step))));
        for (Medium hub : HUBS) {
            if (!hub.equals(from) && !hub.equals(to)) {
                step(from, hub, family).ifPresent(first -> step(hub, to, family)
                        .ifPresent(second -> routes.add(MediaRoute.of(start, List.of(first, second)))));
            }
        }
        return routes.stream();
    }

    /** The family's own relation, else the one for any acid. */
    private Optional<Step> step(Medium from, Medium to, String family) {
        Step own = lines.get(new Line(from, to, family));
        return Optional.ofNullable(own != null ? own : lines.get(new Line(from, to, MediaRelation.ANY)));
    }
}
