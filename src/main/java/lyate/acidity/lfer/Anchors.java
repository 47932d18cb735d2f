package lyate.acidity.lfer;

import java.util.Arrays;
import java.util.List;

/** The anchors of one pool, indexed so that a site is compared with all of them in one pass. Immutable. */
public final class Anchors {

    private final Pool pool;
    private final List<Anchor> anchors;
    private final Postings<Long> byCode;
    private final Postings<String> byDescriptor;
    private final double[] totals;
    private final double[] squares;
    private final double[] weights;

    /**
     * A site compared with the anchors.
     *
     * @param correction what the anchors add to its estimate, pKa units
     * @param nearest    indices of the anchors, most similar first
     * @param similarity similarity of each anchor, by index
     * @param novelty    share of the surroundings, 0 to 1, that no anchor has
     * @param misfit     how far the nearest anchors themselves are from their own estimates, pKa units
     */
    public record Comparison(double correction, List<Integer> nearest, double[] similarity, double novelty, double misfit) {

        private static final double NOVELTY = 2.5;

        /** 0 beside an anchor with the same surroundings; grows as they differ and hold what no anchor has. */
        public double distance() {
            return 1 - closeness() + NOVELTY * novelty;
        }

        /** Similarity of the nearest anchor, 0 where there is none. */
        public double closeness() {
            return nearest.isEmpty() ? 0 : similarity[nearest.get(0)];
        }
    }

    public Anchors(Pool pool, List<Anchor> anchors) {
        this.pool = pool;
        this.anchors = List.copyOf(anchors);
        this.totals = anchors.stream().mapToDouble(anchor -> anchor.site().environment().total()).toArray();
        this.squares = new double[anchors.size()];
        this.weights = anchors.stream().mapToDouble(Anchor::weight).toArray();
        Postings.Builder<Long> codes = new Postings.Builder<>();
        Postings.Builder<String> descriptors = new Postings.Builder<>();
        for (int i = 0; i < anchors.size(); i++) {
            Environment environment = anchors.get(i).site().environment();
            for (int k = 0; k < environment.codes().length; k++) {
                codes.add(environment.codes()[k], i, environment.weights()[k]);
            }
            for (Term term : anchors.get(i).site().terms()) {
                double scaled = term.scaled();
                squares[i] += scaled * scaled;
                descriptors.add(term.name(), i, scaled);
            }
        }
        this.byCode = codes.build();
        this.byDescriptor = descriptors.build();
    }

    /** The anchors, in the order of their indices. */
    public List<Anchor> all() {
        return anchors;
    }

    /** Compares a site with every anchor; names the {@code count} most similar ones. */
    public Comparison compare(SiteDescription site, int count) {
        double[] shared = new double[weights.length];
        Environment environment = site.environment();
        double unseen = 0;
        for (int k = 0; k < environment.codes().length; k++) {
            boolean seen = byCode.addShared(environment.codes()[k], environment.weights()[k], shared);
            unseen += seen ? 0 : environment.weights()[k];
        }
        double[] distances = squaredDistances(site.terms());
        double correction = 0;
        double[] similarity = new double[shared.length];
        for (int i = 0; i < similarity.length; i++) {
            similarity[i] = shared[i] / (environment.total() + totals[i] - shared[i]);
            correction += weights[i] * pool.residual(similarity[i], distances[i]);
        }
        List<Integer> nearest = nearest(similarity, count);
        return new Comparison(correction, nearest, similarity, unseen / environment.total(), misfit(nearest, similarity));
    }

    private double[] squaredDistances(List<Term> site) {
        double[] distances = squares.clone();
        double own = 0;
        for (Term term : site) {
            double scaled = term.scaled();
            own += scaled * scaled;
            byDescriptor.addProduct(term.name(), -2 * scaled, distances);
        }
        for (int i = 0; i < distances.length; i++) {
            distances[i] = Math.max(0, distances[i] + own);
        }
        return distances;
    }

    /** Indices of the highest similarities, highest first. */
    private static List<Integer> nearest(double[] similarity, int count) {
        int[] best = new int[Math.min(count, similarity.length)];
        Arrays.fill(best, -1);
        for (int i = 0; i < similarity.length; i++) {
            int candidate = i;
            for (int place = 0; place < best.length; place++) {
                if (best[place] < 0 || similarity[candidate] > similarity[best[place]]) {
                    int displaced = best[place];
                    best[place] = candidate;
                    candidate = displaced;
                    if (candidate < 0) {
                        break;
                    }
                }
            }
        }
        return Arrays.stream(best).boxed().toList();
    }

    private double misfit(List<Integer> nearest, double[] similarity) {
        double weighted = 0;
        double total = 0;
        for (int anchor : nearest) {
            weighted += similarity[anchor] * anchors.get(anchor).misfit();
            total += similarity[anchor];
        }
        return total == 0 ? 0 : weighted / total;
    }
}
