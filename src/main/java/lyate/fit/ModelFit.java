package lyate.fit;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import lyate.acidity.lfer.Anchor;
import lyate.acidity.lfer.Coefficients;
import lyate.acidity.lfer.EstimateModel;
import lyate.acidity.lfer.Pool;
import lyate.acidity.lfer.Pools;
import lyate.acidity.lfer.Published;
import lyate.acidity.lfer.SiteDescriber;

/**
 * The fit of all pools to a set of rows.
 *
 * @param pools what was fitted, one entry per pool that has rows
 * @param model the relationships that came out, as an estimate uses them
 */
record ModelFit(List<PoolFit> pools, EstimateModel model) {

    /** What every fit starts from. */
    record Start(Pools pools, Published published, SiteDescriber describer, MeasuredRows measured) {}

    /**
     * Fits rows with named sites, then once more together with the rows whose site that first fit can tell.
     */
    static ModelFit of(Start start, List<TrainingRow> named, List<UnplacedRow> unplaced) {
        SiteAssignment assignment = new SiteAssignment(start.describer(), of(start, named).model());
        List<TrainingRow> found = unplaced.stream().flatMap(row -> assignment.assign(row).stream()).toList();
        return of(start, Stream.concat(named.stream(), found.stream()).toList());
    }

    private static ModelFit of(Start start, List<TrainingRow> rows) {
        List<PoolFit> fits = start.pools().all().parallelStream().filter(pool -> !rowsOf(pool, rows).isEmpty())
                .map(pool -> new PoolFit(pool, rowsOf(pool, rows), start.published())).toList();
        List<Coefficients.Change> changes = new ArrayList<>();
        Map<Pool, List<Anchor>> anchors = new HashMap<>();
        for (PoolFit fit : fits) {
            fit.changes().forEach(change -> changes.add(change.change()));
            anchors.put(fit.pool, fit.anchors(start.measured()));
        }
        return new ModelFit(fits, new EstimateModel(start.pools(), new Coefficients(start.published(), changes),
                pool -> anchors.getOrDefault(pool, List.of())));
    }

    private static List<TrainingRow> rowsOf(Pool pool, List<TrainingRow> rows) {
        return rows.stream().filter(TrainingRow::plausible).filter(row -> row.medium().equals(pool.medium())
                && pool.groups().contains(row.site().series().group())).toList();
    }
}
