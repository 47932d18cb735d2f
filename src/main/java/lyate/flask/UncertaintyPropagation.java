package lyate.flask;

import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.hipparchus.random.SobolSequenceGenerator;

/**
 * Carries the uncertainty of pKa values to whatever is concluded from them: the conclusion is drawn again at a fixed set
 * of points that fill the space of possible errors evenly (Sobol points through the normal quantile), and the shares of
 * the answers are their probabilities. Same answer on every run, machine and thread.
 */
public final class UncertaintyPropagation {

    /** Points that settle a probability to about 0.01. */
    public static final int DEFAULT_POINTS = 512;

    private final int points;
    /** Normal deviate in the middle of each of the equally probable cells that a coordinate visits once each. */
    private final double[] deviates;
    /** Deviates by coordinate and point, as many coordinates as were ever asked for: how many there are changes none of them. */
    private volatile double[][] spread = {};

    /** With {@link #DEFAULT_POINTS} points. */
    public UncertaintyPropagation() {
        this(DEFAULT_POINTS);
    }

    /**
     * With that many points.
     *
     * @param points a power of two, for the points to lie evenly
     */
    public UncertaintyPropagation(int points) {
        if (Integer.bitCount(points) != 1 || points < 1) {
            throw new IllegalArgumentException(points + " points, expected a power of two");
        }
        this.points = points;
        NormalDistribution normal = new NormalDistribution();
        this.deviates = IntStream.range(0, points)
                .mapToDouble(cell -> normal.inverseCumulativeProbability((cell + 0.5) / points)).toArray();
    }

    /**
     * The probability of every outcome.
     *
     * @param outcome what is concluded if every pKa is shifted by the given amounts; called once per point
     * @return outcomes that occur, most probable first; sums to 1
     */
    public <L> Map<L, Double> probabilities(PKaErrors errors, Function<double[], L> outcome) {
        double[] sizes = errors.sizes();
        int[] largestFirst = IntStream.range(0, sizes.length).filter(source -> sizes[source] > 0).boxed()
                .sorted(Comparator.comparingDouble(source -> -sizes[source])).mapToInt(source -> source).toArray();
        if (largestFirst.length == 0) {
            return Map.of(outcome.apply(new double[errors.own().size()]), 1.0);
        }
        // The first Sobol coordinates are the most even ones: they go to the largest errors.
        double[][] coordinates = spread(largestFirst.length);
        Map<L, Integer> counts = new LinkedHashMap<>();
        for (int point = 0; point < points; point++) {
            double[] deviations = new double[sizes.length];
            for (int coordinate = 0; coordinate < largestFirst.length; coordinate++) {
                deviations[largestFirst[coordinate]] = coordinates[coordinate][point];
            }
            counts.merge(outcome.apply(errors.shifts(deviations)), 1, Integer::sum);
        }
        return shares(counts);
    }

    private double[][] spread(int coordinates) {
        double[][] known = spread;
        if (known.length < coordinates) {
            known = new double[coordinates][points];
            SobolSequenceGenerator sobol = new SobolSequenceGenerator(coordinates);
            for (int point = 0; point < points; point++) {
                double[] even = sobol.nextVector();
                for (int coordinate = 0; coordinate < coordinates; coordinate++) {
                    known[coordinate][point] = deviates[(int) (even[coordinate] * points)];
                }
            }
            spread = known;
        }
        return known;
    }

    private <L> Map<L, Double> shares(Map<L, Integer> counts) {
        Map<L, Double> shares = new LinkedHashMap<>();
        counts.entrySet().stream().sorted(Map.Entry.<L, Integer>comparingByValue().reversed())
                .forEach(entry -> shares.put(entry.getKey(), entry.getValue() / (double) points));
        return shares;
    }
}
