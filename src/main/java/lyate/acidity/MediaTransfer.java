package lyate.acidity;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Collectors;
import java.util.stream.Stream;
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

    public MediaTransfer(List<MediaRelation> relations) {
        this.relations = Stream.concat(relations.stream(), relations.stream().map(MediaRelation::inverse)).toList();
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
        return values.stream().flatMap(value -> ways(value, family, to)).min(Way.BEST_FIRST).map(Way::arrived);
    }

    /** A value that has arrived, and how many of its steps were not of the acid's own family. */
    private record Way(Acidity arrived, long makeshifts) {

        static final Comparator<Way> BEST_FIRST = Comparator.comparingLong(Way::makeshifts)
                .thenComparingDouble(way -> way.arrived().sigma());
    }

    private Stream<Way> ways(Acidity value, String family, Medium to) {
        if (value.medium().equals(to)) {
            return Stream.of(new Way(value, 0));
        }
        return routes(value.medium(), to, family).stream().map(route -> new Way(carry(value, route),
                route.stream().filter(step -> step.family().equals(MediaRelation.ANY)).count()));
    }

    /** Slope of the family's own line between two media; empty where it has none. */
    OptionalDouble slope(Medium from, Medium to, String family) {
        return relations.stream().filter(row -> row.from().equals(from) && row.to().equals(to) && row.family().equals(family))
                .mapToDouble(MediaRelation::slope).findFirst();
    }

    private List<List<MediaRelation>> routes(Medium from, Medium to, String family) {
        List<List<MediaRelation>> routes = new ArrayList<>();
        step(from, to, family).ifPresent(step -> routes.add(List.of(step)));
        for (Medium hub : HUBS) {
            if (!hub.equals(from) && !hub.equals(to)) {
                step(from, hub, family).ifPresent(first ->
                        step(hub, to, family).ifPresent(second -> routes.add(List.of(first, second))));
            }
        }
        return routes;
    }

    /** The family's own relation, else the one for any acid. */
    private Optional<MediaRelation> step(Medium from, Medium to, String family) {
        return relations.stream()
                .filter(row -> row.from().equals(from) && row.to().equals(to))
                .filter(row -> row.family().equals(family) || row.family().equals(MediaRelation.ANY))
                .min(Comparator.comparing(row -> row.family().equals(MediaRelation.ANY)));
    }

    private static Acidity carry(Acidity acidity, List<MediaRelation> route) {
        double pKa = acidity.pKa();
        double sigma = acidity.sigma();
        List<String> missing = new ArrayList<>(acidity.missing());
        for (MediaRelation step : route) {
            if (step.distanceOutside(pKa) > 0) {
                missing.add("the relation " + step + " is used outside the range it was fitted on");
            }
            sigma = Math.hypot(step.slope() * sigma, step.error(pKa));
            pKa = step.convert(pKa);
        }
        String path = route.stream().map(MediaRelation::toString).collect(Collectors.joining(", then "));
        return Carried.of(acidity, pKa, sigma, route.get(route.size() - 1).to(), path, missing);
    }
}
