package lyate.flask;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;

/**
 * Parts the places of a holder into clusters that do not feel one another, each small enough to count out all its
 * microstates.
 *
 * <p>Up to {@value #LARGEST} coupled places nothing is lost. Beyond that the most strongly coupled places stay together
 * and a weaker coupling that crosses clusters is charged in full to the less acidic of its two places: it loses its
 * proton second and so meets the charge the first one left. That is exact where the two pKa values lie far apart; where
 * they do not, a cut coupling misplaces a pKa by about its own size; in long chains of strongly coupled places of like pKa the
 * fractions themselves can be far off.
 */
final class Clusters {

    /** Most places whose microstates are counted out together. */
    static final int LARGEST = 12;

    private final ProtonHolder holder;
    private final int[] clusterOf;

    private Clusters(ProtonHolder holder) {
        this.holder = holder;
        this.clusterOf = new int[holder.places().size()];
        Arrays.setAll(clusterOf, place -> place);
    }

    /** One binding polynomial per cluster; together they cover every place once. */
    static List<BindingPolynomial> of(ProtonHolder holder) {
        if (holder.couplings().isEmpty() && holder.places().size() == 1) {
            return List.of(BindingPolynomial.of(holder, new int[] {0}, pKas(holder)));
        }
        Clusters clusters = new Clusters(holder);
        clusters.joinStages();
        clusters.joinStrongestFirst();
        return clusters.polynomials();
    }

    private void joinStages() {
        for (int place = 0; place < clusterOf.length; place++) {
            int after = holder.places().get(place).after();
            if (after != ProtonPlace.ANY_ORDER && !join(place, after)) {
                throw new IllegalArgumentException(holder.name() + ": more than " + LARGEST
                        + " places that follow one another, expected at most " + LARGEST);
            }
        }
    }

    private void joinStrongestFirst() {
        List<Coupling> strongestFirst = new ArrayList<>(holder.couplings());
        strongestFirst.sort(Comparator.comparingDouble(coupling -> -Math.abs(coupling.raise())));
        for (Coupling coupling : strongestFirst) {
            if (coupling.raise() != 0) {
                join(coupling.first(), coupling.second());
            }
        }
    }

    private boolean join(int first, int second) {
        int kept = clusterOf[first];
        int gone = clusterOf[second];
        if (kept == gone) {
            return true;
        }
        long size = Arrays.stream(clusterOf).filter(cluster -> cluster == kept || cluster == gone).count();
        if (size > LARGEST) {
            return false;
        }
        Arrays.setAll(clusterOf, place -> clusterOf[place] == gone ? kept : clusterOf[place]);
        return true;
    }

    private List<BindingPolynomial> polynomials() {
        double[] pKas = pKas(holder);
        chargeCutCouplings(pKas);
        List<BindingPolynomial> polynomials = new ArrayList<>();
        for (int cluster = 0; cluster < clusterOf.length; cluster++) {
            int wanted = cluster;
            int[] members = IntStream.range(0, clusterOf.length).filter(place -> clusterOf[place] == wanted).toArray();
            if (members.length > 0) {
                polynomials.add(BindingPolynomial.of(holder, members, pKas));
            }
        }
        return List.copyOf(polynomials);
    }

    private void chargeCutCouplings(double[] pKas) {
        double[] own = pKas.clone();
        for (Coupling coupling : holder.couplings()) {
            if (clusterOf[coupling.first()] != clusterOf[coupling.second()]) {
                boolean firstIsWeaker = own[coupling.first()] > own[coupling.second()];
                pKas[firstIsWeaker ? coupling.first() : coupling.second()] += coupling.raise();
            }
        }
    }

    private static double[] pKas(ProtonHolder holder) {
        double[] pKas = new double[holder.places().size()];
        for (int place = 0; place < pKas.length; place++) {
            pKas[place] = holder.places().get(place).pKa();
        }
        return pKas;
    }
}
