package lyate.acidity.lfer;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The anchors of one pool, indexed so that a site is compared with all of them in one pass. Immutable. */
public final class Anchors {

    private final Pool pool;
    private final List<Anchor> anchors;
    private final Map<Long, Posting> byCode = new HashMap<>();
    private final Map<String, Posting> byDescriptor = new HashMap<>();
    private final double[] squares;

    /** Which anchors have a feature, and how much of it. */
    private record Posting(int[] anchors, double[] amounts) {

        static Posting of(List<double[]> entries) {
            return new Posting(entries.stream().mapToInt(entry -> (int) entry[0]).toArray(),
                    entries.stream().mapToDouble(entry -> entry[1]).toArray());
        }
    }

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
        this.squares = new double[anchors.size()];
        Map<Long, List<double[]>> codes = new HashMap<>();
        Map<String, List<double[]>> descriptors = new HashMap<>();
        for (int i = 0; i < anchors.size(); i++) {
            int anchor = i;
            SiteDescription site = anchors.get(i).site();
            Environment environment = site.environment();
            for (int k = 0; k < environment.codes().length; k++) {
                codes.computeIfAbsent(environment.codes()[k], key -> new ArrayList<>())
                        .add(new double[] {anchor, environment.weights()[k]});
            }
            site.scaled().forEach((name, value) -> {
                squares[anchor] += value * value;
                descriptors.computeIfAbsent(name, key -> new ArrayList<>()).add(new double[] {anchor, value});
            });
        }
        codes.forEach((code, entries) -> byCode.put(code, Posting.of(entries)));
        descriptors.forEach((name, entries) -> byDescriptor.put(name, Posting.of(entries)));
    }

    /** The anchors, in the order of their indices. */
    public List<Anchor> all() {
        return anchors;
    }

    /** Compares a site with every anchor; names the {@code count} most similar ones. */
    public Comparison compare(SiteDescription site, int count) {
        double[] similarity = similarities(site.environment());
        double[] distances = squaredDistances(site.scaled());
        double correction = 0;
        for (int i = 0; i < similarity.length; i++) {
            correction += anchors.get(i).weight() * pool.residual(similarity[i], distances[i]);
        }
        List<Integer> nearest = nearest(similarity, count);
        return new Comparison(correction, nearest, similarity, novelty(site.environment()), misfit(nearest, similarity));
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

    private double novelty(Environment site) {
        double unseen = 0;
        for (int k = 0; k < site.codes().length; k++) {
            unseen += byCode.containsKey(site.codes()[k]) ? 0 : site.weights()[k];
        }
        return unseen / site.total();
    }

    private double[] similarities(Environment site) {
        double[] shared = new double[anchors.size()];
        for (int k = 0; k < site.codes().length; k++) {
            Posting posting = byCode.get(site.codes()[k]);
            if (posting != null) {
                double own = site.weights()[k];
                for (int j = 0; j < posting.anchors().length; j++) {
                    shared[posting.anchors()[j]] += Math.min(own, posting.amounts()[j]);
                }
            }
        }
        for (int i = 0; i < shared.length; i++) {
            shared[i] /= site.total() + anchors.get(i).site().environment().total() - shared[i];
        }
        return shared;
    }

    private double[] squaredDistances(Map<String, Double> site) {
        double[] distances = squares.clone();
        double own = 0;
        for (Map.Entry<String, Double> descriptor : site.entrySet()) {
            double value = descriptor.getValue();
            own += value * value;
            Posting posting = byDescriptor.get(descriptor.getKey());
            if (posting != null) {
                for (int j = 0; j < posting.anchors().length; j++) {
                    distances[posting.anchors()[j]] -= 2 * value * posting.amounts()[j];
                }
            }
        }
        for (int i = 0; i < distances.length; i++) {
            distances[i] = Math.max(0, distances[i] + own);
        }
        return distances;
    }
}
