package lyate.flask;

import java.util.Arrays;

/**
 * The microstates of one cluster of coupled places, summed by the number of protons they hold.
 *
 * <p>A microstate that has lost the protons of the set D weighs 10^(Σ (p − pKa_i) − Σ w_ij), i and j in D, against the
 * fully protonated one (binding polynomial: Wyman and Gill, Binding and Linkage, 1990; from memory). Everything is kept
 * as natural logarithms, so that weights 10^±600 apart do no harm.
 */
final class BindingPolynomial {

    static final double LN10 = Math.log(10);

    private final int[] members;
    private final double[] pKas;
    private final double[][] raise;
    private final int[] mustLoseFirst;
    private final double[] lnWeight;
    private final double[][] heldShare;
    private final double[][] lostShare;

    private BindingPolynomial(int[] members, double[] pKas, double[][] raise, int[] mustLoseFirst) {
        int count = members.length;
        this.members = members;
        this.pKas = pKas;
        this.raise = raise;
        this.mustLoseFirst = mustLoseFirst;
        this.lnWeight = new double[count + 1];
        this.heldShare = new double[count][count + 1];
        this.lostShare = new double[count][count + 1];
    }

    /**
     * Counts out the microstates of some places of a holder.
     *
     * @param members      indices of the places within the holder
     * @param pKasOfHolder pKa of every place of the holder
     */
    static BindingPolynomial of(ProtonHolder holder, int[] members, double[] pKasOfHolder) {
        int count = members.length;
        int[] local = new int[pKasOfHolder.length];
        Arrays.fill(local, -1);
        double[] pKas = new double[count];
        for (int member = 0; member < count; member++) {
            local[members[member]] = member;
            pKas[member] = pKasOfHolder[members[member]];
        }
        double[][] raise = new double[count][count];
        for (Coupling coupling : holder.couplings()) {
            int first = local[coupling.first()];
            int second = local[coupling.second()];
            if (first >= 0 && second >= 0) {
                raise[first][second] += coupling.raise();
                raise[second][first] += coupling.raise();
            }
        }
        int[] mustLoseFirst = new int[count];
        for (int member = 0; member < count; member++) {
            int after = holder.places().get(members[member]).after();
            mustLoseFirst[member] = after == ProtonPlace.ANY_ORDER ? 0 : 1 << local[after];
        }
        BindingPolynomial polynomial = new BindingPolynomial(members, pKas, raise, mustLoseFirst);
        polynomial.countMicrostates();
        return polynomial;
    }

    private void countMicrostates() {
        int count = members.length;
        if (count == 1) {
            lnWeight[0] = -pKas[0] * LN10;
            heldShare[0][1] = 1;
            lostShare[0][0] = 1;
            return;
        }
        double[] weight = lnWeightsAtLevelZero();
        double[] largest = new double[count + 1];
        Arrays.fill(largest, Double.NEGATIVE_INFINITY);
        for (int lost = 0; lost < weight.length; lost++) {
            int held = count - Integer.bitCount(lost);
            largest[held] = Math.max(largest[held], weight[lost]);
        }
        double[] sum = new double[count + 1];
        for (int lost = 0; lost < weight.length; lost++) {
            if (weight[lost] == Double.NEGATIVE_INFINITY) {
                continue;
            }
            int held = count - Integer.bitCount(lost);
            double share = Math.exp(weight[lost] - largest[held]);
            sum[held] += share;
            for (int member = 0; member < count; member++) {
                ((lost >> member & 1) == 0 ? heldShare : lostShare)[member][held] += share;
            }
        }
        for (int held = 0; held <= count; held++) {
            lnWeight[held] = largest[held] + Math.log(sum[held]);
            for (int member = 0; member < count; member++) {
                heldShare[member][held] /= sum[held];
                lostShare[member][held] /= sum[held];
            }
        }
    }

    /** By set of lost protons; minus infinity for a set that breaks an order of stages. */
    private double[] lnWeightsAtLevelZero() {
        double[] weight = new double[1 << members.length];
        for (int lost = 1; lost < weight.length; lost++) {
            int last = Integer.numberOfTrailingZeros(lost);
            double difference = pKas[last];
            for (int rest = lost & lost - 1; rest != 0; rest &= rest - 1) {
                difference += raise[last][Integer.numberOfTrailingZeros(rest)];
            }
            weight[lost] = weight[lost & lost - 1] - difference * LN10;
        }
        for (int lost = 1; lost < weight.length; lost++) {
            if (!possible(lost)) {
                weight[lost] = Double.NEGATIVE_INFINITY;
            }
        }
        return weight;
    }

    private boolean possible(int lost) {
        for (int rest = lost; rest != 0; rest &= rest - 1) {
            int first = mustLoseFirst[Integer.numberOfTrailingZeros(rest)];
            if ((lost & first) != first) {
                return false;
            }
        }
        return true;
    }

    /** Most protons the cluster can hold. */
    int capacity() {
        return members.length;
    }

    /** Index within the holder of each place of the cluster; not to be changed. */
    int[] members() {
        return members;
    }

    /** Proton level at which the states with {@code few} and {@code many} protons weigh the same. */
    double levelBetween(int few, int many) {
        return (lnWeight[many] - lnWeight[few]) / (LN10 * (many - few));
    }

    /** Natural logarithm of the weight of all states with that many protons at a proton level. */
    double lnWeight(int held, double level) {
        return lnWeight[held] + (members.length - held) * LN10 * level;
    }

    /** Share of each number of protons at a proton level, which may be infinite; written into {@code shares}. */
    void sharesAt(double level, double[] shares) {
        int count = members.length;
        if (Double.isInfinite(level)) {
            Arrays.fill(shares, 0, count + 1, 0);
            shares[level > 0 ? 0 : count] = 1;
            return;
        }
        double largest = Double.NEGATIVE_INFINITY;
        for (int held = 0; held <= count; held++) {
            shares[held] = lnWeight(held, level);
            largest = Math.max(largest, shares[held]);
        }
        double sum = 0;
        for (int held = 0; held <= count; held++) {
            shares[held] = shares[held] == largest ? 1 : Math.exp(shares[held] - largest);
            sum += shares[held];
        }
        for (int held = 0; held <= count; held++) {
            shares[held] /= sum;
        }
    }

    /** Share of the molecules whose place holds its proton, given the shares of each number of protons. */
    double held(int member, double[] shares) {
        return weighted(heldShare[member], shares);
    }

    /** Share of the molecules whose place has lost its proton; as exact as {@link #held} where it is tiny. */
    double lost(int member, double[] shares) {
        return weighted(lostShare[member], shares);
    }

    /** Index within the holder of the place that changes most between two numbers of protons. */
    int mostChanged(int few, int many) {
        int most = 0;
        for (int member = 1; member < members.length; member++) {
            if (heldShare[member][many] - heldShare[member][few] > heldShare[most][many] - heldShare[most][few]) {
                most = member;
            }
        }
        return members[most];
    }

    private double weighted(double[] conditional, double[] shares) {
        double sum = 0;
        for (int held = 0; held <= members.length; held++) {
            sum += conditional[held] * shares[held];
        }
        return sum;
    }

    /**
     * Natural logarithm of the weight of one microstate at a finite proton level.
     *
     * @param lost set of members that have lost their protons, one bit each
     */
    double lnMicrostate(int lost, double level) {
        if (!possible(lost)) {
            return Double.NEGATIVE_INFINITY;
        }
        double exponent = 0;
        for (int rest = lost; rest != 0; rest &= rest - 1) {
            int member = Integer.numberOfTrailingZeros(rest);
            exponent += level - pKas[member];
            for (int other = rest & rest - 1; other != 0; other &= other - 1) {
                exponent -= raise[member][Integer.numberOfTrailingZeros(other)];
            }
        }
        return exponent * LN10;
    }
}
