package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.hipparchus.distribution.continuous.NormalDistribution;
import org.junit.jupiter.api.Test;

class UncertaintyPropagationTest {

    private static final double PROMISED = 0.015;
    private final UncertaintyPropagation propagation = new UncertaintyPropagation();
    private final NormalDistribution normal = new NormalDistribution();

    /** One value 1.2 above a limit with σ 0.8: the normal integral up to 1.5. */
    @Test
    void oneErrorGivesTheNormalIntegral() {
        Map<Boolean, Double> above = propagation.probabilities(PKaErrors.independent(0.8), shift -> 1.2 + shift[0] > 0);
        assertEquals(normal.cumulativeProbability(1.5), above.get(true), PROMISED);
        assertEquals(1, above.values().stream().mapToDouble(share -> share).sum(), 1e-15);
    }

    /** Every coordinate meets every cell of equal probability once: mean 0 and, to the cell width, variance 1. */
    @Test
    void everyErrorHasItsOwnMeanAndVariance() {
        double[] sigmas = {2, 1, 0.5, 3, 0.1, 1.5};
        double[] sum = new double[6];
        double[] squares = new double[6];
        propagation.probabilities(PKaErrors.independent(sigmas), shift -> {
            for (int value = 0; value < 6; value++) {
                sum[value] += shift[value] / UncertaintyPropagation.DEFAULT_POINTS;
                squares[value] += shift[value] * shift[value] / UncertaintyPropagation.DEFAULT_POINTS;
            }
            return true;
        });
        for (int value = 0; value < 6; value++) {
            assertEquals(0, sum[value], 1e-12);
            assertEquals(sigmas[value] * sigmas[value], squares[value], 0.01 * sigmas[value] * sigmas[value]);
        }
    }

    /** A difference of two independent values has √(σ1² + σ2²). */
    @Test
    void independentErrorsAddInQuadrature() {
        for (double gap = -3; gap <= 3; gap += 0.25) {
            double difference = gap;
            Map<Boolean, Double> above = propagation.probabilities(PKaErrors.independent(1.5, 0.7),
                    shift -> difference + shift[0] - shift[1] > 0);
            assertEquals(normal.cumulativeProbability(gap / Math.hypot(1.5, 0.7)), above.getOrDefault(true, 0.0), PROMISED,
                    "gap " + gap);
        }
    }

    /** What two values share drops out of their difference: two sites carried over by one transfer. */
    @Test
    void aSharedErrorDropsOutOfADifference() {
        PKaErrors errors = new PKaErrors(List.of(0.3, 0.4), List.of(new PKaErrors.Shared(List.of(2.0, 2.0))));
        Map<Boolean, Double> above = propagation.probabilities(errors, shift -> 0.4 + shift[0] - shift[1] > 0);
        assertEquals(normal.cumulativeProbability(0.4 / 0.5), above.get(true), PROMISED);
        Map<Boolean, Double> one = propagation.probabilities(errors, shift -> 1 + shift[0] > 0);
        assertEquals(normal.cumulativeProbability(1 / Math.hypot(2.0, 0.3)), one.get(true), PROMISED);
    }

    /** Of ten equal independent values each is the lowest equally often. */
    @Test
    void tenDimensionsAreFilledEvenly() {
        double[] sigmas = new double[10];
        Arrays.fill(sigmas, 1);
        Map<Integer, Double> lowest = propagation.probabilities(PKaErrors.independent(sigmas), shift ->
                IntStream.range(0, 10).boxed().min(java.util.Comparator.comparingDouble(value -> shift[value])).orElseThrow());
        assertEquals(10, lowest.size());
        lowest.forEach((value, share) -> assertEquals(0.1, share, 0.025, "value " + value));
    }

    @Test
    void anErrorOfZeroMovesNothingAndCertaintyIsCertain() {
        PKaErrors errors = PKaErrors.independent(0, 1.5);
        assertEquals(Map.of("never", 1.0), propagation.probabilities(errors, shift -> shift[0] == 0 ? "never" : "moved"));
        assertEquals(Map.of(0.0, 1.0), propagation.probabilities(PKaErrors.independent(0, 0), shift -> shift[1]));
    }

    @Test
    void theAnswerIsTheSameOnEveryThread() {
        PKaErrors errors = new PKaErrors(List.of(0.3, 0.9, 1.4), List.of(new PKaErrors.Shared(List.of(1.0, 0.0, 1.0))));
        List<Map<Long, Double>> answers = IntStream.range(0, 64).parallel()
                .mapToObj(run -> propagation.probabilities(errors, shift -> Math.round(shift[0] + shift[1] - shift[2]))).toList();
        answers.forEach(answer -> assertEquals(answers.get(0), answer));
        assertTrue(answers.get(0).size() > 4);
    }

    @Test
    void outcomesComeMostProbableFirst() {
        Map<Boolean, Double> shares = propagation.probabilities(PKaErrors.independent(1), shift -> shift[0] > -0.5);
        assertEquals(List.of(true, false), List.copyOf(shares.keySet()));
    }

    @Test
    void nonsenseIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> PKaErrors.independent(-1));
        assertThrows(IllegalArgumentException.class, () -> new UncertaintyPropagation(100));
        assertThrows(IllegalArgumentException.class,
                () -> new PKaErrors(List.of(1.0), List.of(new PKaErrors.Shared(List.of(1.0, 1.0)))));
    }
}
