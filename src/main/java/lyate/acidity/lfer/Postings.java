package lyate.acidity.lfer;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * Which anchors have a feature, and how much of it: all features of a pool side by side, so that a site is compared with
 * every anchor in one pass over plain arrays. Immutable.
 *
 * @param <K> what a feature is known by
 */
final class Postings<K> {

    private final Map<K, Integer> numbers = new HashMap<>();
    /** Entries of feature {@code n} are {@code first[n]} to {@code first[n + 1] - 1}. */
    private final int[] first;
    private final int[] anchors;
    private final double[] amounts;

    private Postings(Map<K, List<Entry>> byFeature) {
        int entries = byFeature.values().stream().mapToInt(List::size).sum();
        this.first = new int[byFeature.size() + 1];
        this.anchors = new int[entries];
        this.amounts = new double[entries];
        int filled = 0;
        for (Map.Entry<K, List<Entry>> feature : byFeature.entrySet()) {
            int number = numbers.size();
            numbers.put(feature.getKey(), number);
            for (Entry entry : feature.getValue()) {
                anchors[filled] = entry.anchor();
                amounts[filled++] = entry.amount();
            }
            first[number + 1] = filled;
        }
    }

    private record Entry(int anchor, double amount) {}

    /** Collects the features anchor by anchor. */
    static final class Builder<K> {

        private final Map<K, List<Entry>> byFeature = new HashMap<>();

        void add(K feature, int anchor, double amount) {
            byFeature.computeIfAbsent(feature, key -> new ArrayList<>()).add(new Entry(anchor, amount));
        }

        Postings<K> build() {
            return new Postings<>(byFeature);
        }
    }

    /** Adds what every anchor shares of {@code amount} of a feature: the smaller of the two. False where no anchor has it. */
    boolean addShared(K feature, double amount, double[] shared) {
        Integer number = numbers.get(feature);
        if (number == null) {
            return false;
        }
        for (int i = first[number]; i < first[number + 1]; i++) {
            shared[anchors[i]] += Math.min(amount, amounts[i]);
        }
        return true;
    }

    /** Adds {@code factor} times the amount of a feature that every anchor has. */
    void addProduct(K feature, double factor, double[] sums) {
        Integer number = numbers.get(feature);
        if (number != null) {
            for (int i = first[number]; i < first[number + 1]; i++) {
                sums[anchors[i]] += factor * amounts[i];
            }
        }
    }
}
