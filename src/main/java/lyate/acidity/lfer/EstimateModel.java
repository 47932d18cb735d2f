package lyate.acidity.lfer;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Function;
import lyate.stock.Medium;

/**
 * The fitted relationships: coefficients, then what measured relatives add. Answers never change; safe to share between threads.
 */
public final class EstimateModel {

    /** Relatives that an estimate names. */
    private static final int RELATIVES = 3;

    private final Pools pools;
    private final Coefficients coefficients;
    private final Function<Pool, List<Anchor>> source;
    /** Filled pool by pool when first needed: reading thousands of structures for one molecule would be waste. */
    private final Map<Pool, Anchors> anchors = new ConcurrentHashMap<>();

    /**
     * What the model makes of a site.
     *
     * @param pKa        of one of the equivalent places; {@link SiteDescription#statistics} not yet added
     * @param pool       the pool it was estimated in
     * @param line       the coefficients used
     * @param comparison its nearest anchors and what they add
     */
    public record Prediction(double pKa, Pool pool, Coefficients.Line line, Anchors.Comparison comparison) {}

    /** @param anchors the anchors of a pool, asked for once; a pool without anchors relies on its coefficients */
    public EstimateModel(Pools pools, Coefficients coefficients, Function<Pool, List<Anchor>> anchors) {
        this.pools = pools;
        this.coefficients = coefficients;
        this.source = anchors;
    }

    /** The prediction, or empty where the series has no pool in that medium. */
    public Optional<Prediction> predict(Medium medium, SiteDescription site) {
        return pools.of(medium, site.series().group()).map(pool -> {
            Coefficients.Line line = coefficients.of(pool, site.series());
            double sum = line.value(Published.BASE);
            for (Term term : site.terms()) {
                sum += line.value(term.name()) * term.value();
            }
            Anchors.Comparison comparison = anchors(pool).compare(site, RELATIVES);
            return new Prediction(sum + comparison.correction(), pool, line, comparison);
        });
    }

    /** The anchors of a pool. */
    public Anchors anchors(Pool pool) {
        return anchors.computeIfAbsent(pool, key -> new Anchors(key, source.apply(key)));
    }
}
