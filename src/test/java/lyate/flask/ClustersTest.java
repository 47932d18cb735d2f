package lyate.flask;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class ClustersTest {

    @Test
    void placesThatDoNotFeelOneAnotherAreCountedOutApart() {
        ProtonHolder holder = chain(20, 0, 1);
        assertEquals(20, Clusters.of(holder).size());
    }

    @Test
    void twelveCoupledPlacesStayTogether() {
        assertEquals(1, Clusters.of(chain(12, 2, 1)).size());
        assertEquals(2, Clusters.of(chain(13, 2, 1)).size());
    }

    /** The weakest link of a chain of 16 is cut. */
    @Test
    void beyondTwelveTheStrongestCouplingsAreKept() {
        List<Coupling> couplings = new ArrayList<>(chain(16, 3, 1).couplings());
        couplings.set(7, new Coupling(7, 8, 0.4));
        ProtonHolder holder = new ProtonHolder("chain", 1, chain(16, 3, 1).places(), couplings, 8);
        List<BindingPolynomial> clusters = Clusters.of(holder);
        assertEquals(2, clusters.size());
        assertEquals(8, clusters.get(0).capacity());
    }

    /** Fourteen places in a row, pKa values four apart, against all 2^14 microstates. */
    @Test
    void aCutCouplingCostsLittleWhereThePKaValuesLieApart() {
        ProtonHolder chain = chain(14, 1.5, 4);
        for (double level = -1; level < 56; level += 0.5) {
            double[] exact = heldAt(level, chain);
            double[] found = clusteredAt(level, chain);
            for (int place = 0; place < 14; place++) {
                assertEquals(exact[place], found[place], 0.003, "place " + place + " at level " + level);
            }
        }
    }

    /** Equal places, one weak link among strong ones: every apparent pKa is right to within the link that was cut. */
    @Test
    void aCutCouplingMisplacesAPKaByAtMostItsOwnSize() {
        ProtonHolder strong = chain(14, 3, 0);
        List<Coupling> couplings = new ArrayList<>(strong.couplings());
        couplings.set(6, new Coupling(6, 7, 0.3));
        ProtonHolder chain = new ProtonHolder("chain", 1, strong.places(), couplings, 7);
        double largest = 0;
        for (double level = -4; level < 10; level += 0.25) {
            double[] exact = heldAt(level, chain);
            double[] found = clusteredAt(level, chain);
            for (int place = 0; place < 14; place++) {
                largest = Math.max(largest, Math.abs(logOdds(exact[place]) - logOdds(found[place])));
            }
        }
        assertTrue(largest <= 0.3 + 1e-9 && largest > 0.1, "off by " + largest);
    }

    /**
     * Sixteen equal places, each feeling each other: the exact mean follows from the number of ways to lose k protons. All
     * together the clusters hold the right number of protons to within one; a single place can be far off.
     */
    @Test
    void whereAllFeelAllTheSumIsRightToWithinAProtonButNoSinglePlaceIs() {
        int n = 16;
        double raise = 0.6;
        List<ProtonPlace> places = new ArrayList<>();
        List<Coupling> couplings = new ArrayList<>();
        for (int place = 0; place < n; place++) {
            places.add(new ProtonPlace("O" + place, 10));
            for (int other = 0; other < place; other++) {
                couplings.add(new Coupling(other, place, raise));
            }
        }
        ProtonHolder holder = new ProtonHolder("all with all", 1, places, couplings, n);
        double worstSum = 0;
        double worstPlace = 0;
        for (double level = 5; level < 25; level += 0.25) {
            double exact = meanHeld(n, 10, raise, level);
            HolderState state = HolderState.at(holder, level);
            worstSum = Math.max(worstSum, Math.abs(exact - state.meanProtons()));
            for (int place = 0; place < n; place++) {
                worstPlace = Math.max(worstPlace, Math.abs(exact / n - state.protonated(place)));
            }
        }
        assertTrue(worstSum < 0.8 && worstSum > 0.5, "protons off by " + worstSum);
        assertTrue(worstPlace > 0.3, "a place off by " + worstPlace);
    }

    private static double meanHeld(int n, double pKa, double raise, double level) {
        double all = 0;
        double held = 0;
        double lnWays = 0;
        for (int lost = 0; lost <= n; lost++) {
            double weight = Math.exp(lnWays + Math.log(10) * (lost * (level - pKa) - raise * lost * (lost - 1) / 2));
            all += weight;
            held += (n - lost) * weight;
            lnWays += Math.log((n - lost) / (lost + 1.0));
        }
        return held / all;
    }

    private static double logOdds(double held) {
        return Math.log10(held / (1 - held));
    }

    private static double[] clusteredAt(double level, ProtonHolder chain) {
        HolderState state = new HolderState(chain, Clusters.of(chain), level);
        return IntStream.range(0, 14).mapToDouble(state::protonated).toArray();
    }

    private static double[] heldAt(double level, ProtonHolder chain) {
        double[] exponents = IntStream.range(0, 1 << 14).mapToDouble(lost -> exponent(lost, level, chain)).toArray();
        double largest = Arrays.stream(exponents).max().orElseThrow();
        double all = Arrays.stream(exponents).map(exponent -> Math.pow(10, exponent - largest)).sum();
        return IntStream.range(0, 14).mapToDouble(place -> IntStream.range(0, 1 << 14)
                .filter(lost -> (lost >> place & 1) == 0)
                .mapToDouble(lost -> Math.pow(10, exponents[lost] - largest)).sum() / all).toArray();
    }

    private static double exponent(int lost, double level, ProtonHolder chain) {
        double exponent = 0;
        for (int place = 0; place < 14; place++) {
            exponent += (lost >> place & 1) * (level - chain.places().get(place).pKa());
        }
        for (Coupling coupling : chain.couplings()) {
            exponent -= (lost >> coupling.first() & lost >> coupling.second() & 1) * coupling.raise();
        }
        return exponent;
    }

    @Test
    void stagesOfOneAtomAreNeverParted() {
        List<ProtonPlace> places = new ArrayList<>(chain(14, 0, 1).places());
        places.set(13, new ProtonPlace("N14", 30, 0));
        ProtonHolder holder = new ProtonHolder("molecule", 1, places, chain(14, 2, 1).couplings(), 7);
        assertTrue(Clusters.of(holder).stream().map(BindingPolynomial::members)
                .anyMatch(members -> contains(members, 0) && contains(members, 13)));
    }

    private static boolean contains(int[] members, int place) {
        return Arrays.stream(members).anyMatch(member -> member == place);
    }

    /** Places in a row, each coupled to the next, pKa values a step apart. */
    static ProtonHolder chain(int length, double raise, double step) {
        List<ProtonPlace> places = new ArrayList<>();
        List<Coupling> couplings = new ArrayList<>();
        for (int place = 0; place < length; place++) {
            places.add(new ProtonPlace("C" + (place + 1), step * place));
            if (place > 0 && raise != 0) {
                couplings.add(new Coupling(place - 1, place, raise));
            }
        }
        return new ProtonHolder("chain", 1, places, couplings, 0);
    }
}
