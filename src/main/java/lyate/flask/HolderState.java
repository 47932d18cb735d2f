package lyate.flask;

import java.util.List;

/**
 * How the protons of one holder are spread over its places at equilibrium. Fractions are exact to about 1e-12 of
 * themselves, however small.
 */
public final class HolderState {

    private final ProtonHolder holder;
    private final List<BindingPolynomial> clusters;
    private final double level;
    private final double[] protonated;
    private final double[] deprotonated;

    HolderState(ProtonHolder holder, List<BindingPolynomial> clusters, double level) {
        this.holder = holder;
        this.clusters = clusters;
        this.level = level;
        this.protonated = new double[holder.places().size()];
        this.deprotonated = new double[holder.places().size()];
        double[] shares = new double[Clusters.LARGEST + 1];
        for (BindingPolynomial cluster : clusters) {
            cluster.sharesAt(level, shares);
            for (int member = 0; member < cluster.capacity(); member++) {
                protonated[cluster.members()[member]] = cluster.held(member, shares);
                deprotonated[cluster.members()[member]] = cluster.lost(member, shares);
            }
        }
    }

    /** A holder at a proton level that something else sets: a buffer, the pH of a work-up. */
    public static HolderState at(ProtonHolder holder, double level) {
        return new HolderState(holder, holder.clusters(), level);
    }

    /** What this is the state of. */
    public ProtonHolder holder() {
        return holder;
    }

    /** Fraction of the molecules whose place, by index, holds its proton. */
    public double protonated(int place) {
        return protonated[place];
    }

    /** Fraction of the molecules whose place, by index, has lost its proton; no difference from 1, so exact when tiny. */
    public double deprotonated(int place) {
        return deprotonated[place];
    }

    /** Protons per molecule, on average. */
    public double meanProtons() {
        double sum = 0;
        for (double fraction : protonated) {
            sum += fraction;
        }
        return sum;
    }

    /**
     * Fraction of the molecules by number of protons they hold, 0 to all places.
     *
     * @return a new array, one longer than the number of places
     */
    public double[] shareByProtons() {
        double[] all = {1};
        double[] shares = new double[Clusters.LARGEST + 1];
        for (BindingPolynomial cluster : clusters) {
            cluster.sharesAt(level, shares);
            double[] combined = new double[all.length + cluster.capacity()];
            for (int before = 0; before < all.length; before++) {
                for (int here = 0; here <= cluster.capacity(); here++) {
                    combined[before + here] += all[before] * shares[here];
                }
            }
            all = combined;
        }
        return all;
    }

    /**
     * Fraction of the molecules in one microstate.
     *
     * @param protonatedPlaces bit {@code i} set: place {@code i} holds its proton; of at most 63 places
     */
    public double microstate(long protonatedPlaces) {
        double fraction = 1;
        double[] shares = new double[Clusters.LARGEST + 1];
        for (BindingPolynomial cluster : clusters) {
            int lost = 0;
            for (int member = 0; member < cluster.capacity(); member++) {
                lost |= (protonatedPlaces >> cluster.members()[member] & 1) == 0 ? 1 << member : 0;
            }
            cluster.sharesAt(level, shares);
            int held = cluster.capacity() - Integer.bitCount(lost);
            fraction *= Double.isInfinite(level) ? shares[held]
                    : shares[held] * Math.exp(cluster.lnMicrostate(lost, level) - cluster.lnWeight(held, level));
        }
        return fraction;
    }
}
