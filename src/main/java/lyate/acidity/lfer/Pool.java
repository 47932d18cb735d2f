package lyate.acidity.lfer;

import java.util.List;
import lyate.stock.Medium;

/**
 * A row of {@code estimate-pools.csv}: groups of series that are fitted together in one medium, and how much each part of the
 * model may move. All standard deviations in pKa units, of coefficients per typical step of the descriptor ({@link Scales}).
 *
 * @param medium     the medium
 * @param name       name of the pool
 * @param groups     the groups in it
 * @param basePool   of the base value common to the pool
 * @param baseLine   of the base value of a line
 * @param slopePool  of a coefficient common to the pool
 * @param slopeLine  of a coefficient of a line
 * @param similarity of what sites in like surroundings share beyond the coefficients
 * @param form       of what sites with like descriptors share beyond the coefficients
 * @param noise      of a reliable measured value
 */
public record Pool(Medium medium, String name, List<String> groups, double basePool, double baseLine, double slopePool,
                   double slopeLine, double similarity, double form, double noise) {

    /** Distance in scaled descriptors over which {@link #form} reaches. */
    private static final double REACH = 5;

    public Pool {
        groups = List.copyOf(groups);
    }

    /** Pools are keys of maps asked for every site; their names tell them apart. */
    @Override
    public int hashCode() {
        return name.hashCode();
    }

    /** Covariance of what is left of two sites beyond the coefficients. */
    public double residual(double similarityOfSurroundings, double squaredDistance) {
        return similarity * similarity * similarityOfSurroundings
                + form * form * Math.exp(-squaredDistance / (2 * REACH * REACH));
    }
}
