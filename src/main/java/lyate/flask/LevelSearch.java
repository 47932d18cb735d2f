package lyate.flask;

import java.util.List;

/**
 * Finds the proton level at which as many protons have come down from the ground state as have gone up. Both counts are
 * sums of positive terms, one rising and one falling with the level, so the logarithm of their ratio has one root:
 * Newton's method on it, kept inside a bracket that bisection shrinks whenever a step does not help.
 */
final class LevelSearch {

    private static final double STEP_SMALL_ENOUGH = 1e-11;
    private static final int MOST_ITERATIONS = 500;

    private final List<Species> species;
    private final GroundState ground;
    private final double[] shares;
    private double lnRatio;
    private double slope;
    private double imbalance;
    private int iterations;

    LevelSearch(List<Species> species, GroundState ground) {
        this.species = species;
        this.ground = ground;
        this.shares = new double[Clusters.LARGEST + 1];
    }

    /** The proton level. */
    double find() {
        double level = ground.guess();
        double low = Double.NEGATIVE_INFINITY;
        double high = Double.POSITIVE_INFINITY;
        double reach = 2;
        double lastSize = Double.POSITIVE_INFINITY;
        while (true) {
            evaluate(level);
            if (lnRatio == 0) {
                return level;
            }
            low = lnRatio < 0 ? level : low;
            high = lnRatio > 0 ? level : high;
            double next = level - lnRatio / slope;
            boolean helps = Math.abs(lnRatio) < 0.7 * lastSize;
            lastSize = Math.abs(lnRatio);
            if (helps && Math.abs(next - level) < STEP_SMALL_ENOUGH * Math.max(1, Math.abs(level))) {
                evaluate(next);
                return next;
            }
            if (!(helps && next > low && next < high)) {
                reach *= 2;
                next = Double.isInfinite(low) ? high - reach : Double.isInfinite(high) ? low + reach : (low + high) / 2;
                lastSize = Double.POSITIVE_INFINITY;
            }
            if (next == level || next == low || next == high) {
                return level;
            }
            if (iterations > MOST_ITERATIONS) {
                throw new IllegalStateException("no proton level found between " + low + " and " + high);
            }
            level = next;
        }
    }

    /** Evaluations of the balance so far. */
    int iterations() {
        return iterations;
    }

    /** Protons too many (positive) or too few at the last level tried. */
    double imbalance() {
        return imbalance;
    }

    /** ln(lost / gained) against the ground state, and its derivative by the level. */
    private void evaluate(double level) {
        iterations++;
        double lost = Math.max(ground.excess(), 0);
        double gained = Math.max(-ground.excess(), 0);
        double lostSlope = 0;
        double gainedSlope = 0;
        for (int index = 0; index < species.size(); index++) {
            BindingPolynomial polynomial = species.get(index).polynomial();
            double amount = species.get(index).amount();
            int reference = ground.held()[index];
            polynomial.sharesAt(level, shares);
            double down = 0;
            double up = 0;
            for (int held = 0; held <= polynomial.capacity(); held++) {
                down += held < reference ? (reference - held) * shares[held] : 0;
                up += held > reference ? (held - reference) * shares[held] : 0;
            }
            double mean = up - down;
            for (int held = 0; held <= polynomial.capacity(); held++) {
                int moved = held - reference;
                double change = -BindingPolynomial.LN10 * (moved - mean) * shares[held];
                lostSlope += moved < 0 ? -moved * change * amount : 0;
                gainedSlope += moved > 0 ? moved * change * amount : 0;
            }
            lost += down * amount;
            gained += up * amount;
        }
        lnRatio = Math.log(lost) - Math.log(gained);
        slope = lostSlope / lost - gainedSlope / gained;
        imbalance = gained - lost;
    }
}
