package lyate.acidity.lfer;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import lyate.acidity.Acidity.Effect;

/**
 * Groups on the site that take up the charge of its anion, strongest first.
 *
 * <p>Each further group finds less left to do, the less the stronger the first one is: the second counts with
 * {@code 1.05 - 0.018 s1}, later ones with a fifth of their strength, and more beside linear groups, which leave them room to turn into
 * the plane (read off the series CH3X, CH2XY, CHXYZ of Bordwell, Acc. Chem. Res. 1988, 21, 456).
 */
final class AnionTerms {

    private static final double SECOND = 1.05;
    private static final double SATURATION = 0.018;
    private static final double LATER = 0.2;
    /** Read off phenylmalononitrile, ethyl phenylcyanoacetate and diphenylacetonitrile (the same source, from memory). */
    private static final double LATER_PER_LINEAR = 0.17;
    /** Lowering by a cyclopentadienide ring (cyclopentadiene, DMSO), and what each fused benzo ring takes away. */
    private static final double CYCLOPENTADIENIDE = 38;
    private static final double BENZO = 2.3;
    /** Lowering by an aromatic ring, and the share of remote help that counts for a second ring (nitrophenylmethanes). */
    private static final double ARYL = 13;
    private static final double SECOND_RING = 0.3;

    private record Stabiliser(double strength, int atom, String name) {}

    private AnionTerms() {}

    static void add(Facts facts, int site, Terms terms) {
        Topology t = facts.topology();
        if (t.aromatic[site]) {
            return;
        }
        List<Stabiliser> groups = stabilisers(facts, site);
        groups.sort(Comparator.comparingDouble(group -> -group.strength()));
        double total = 0;
        double later = LATER + LATER_PER_LINEAR * linear(t, site);
        for (int i = 0; i < groups.size(); i++) {
            Stabiliser group = i == 0 ? groups.get(0) : afterOthers(t, groups.get(0), groups.get(i));
            double share = i == 0 ? 1 : i == 1 ? SECOND - SATURATION * groups.get(0).strength() : later;
            total += share * group.strength();
            terms.add("anion.total", Effect.RESONANCE, share * group.strength() / 10, group.atom(), group.name());
            if (i > 0) {
                terms.add(i == 1 ? "anion.second" : "anion.later", Effect.RESONANCE, group.strength() / 10, group.atom(), group.name());
            }
        }
        addFluorine(t, site, terms);
        addRings(t, site, terms);
        terms.add("anion.square", Effect.RESONANCE, total * total / 1000, site);
    }

    /** The lone pairs of fluorine repel the charge of a flat carbanion (Adolph & Kamlet, J. Am. Chem. Soc. 1966, 88, 4761). */
    private static void addFluorine(Topology t, int site, Terms terms) {
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            if (t.element[site] == 6 && t.element[t.child[branch]] == 9) {
                terms.add("anion.fluorine", Effect.RESONANCE, 1, t.child[branch]);
            }
        }
    }

    private static int linear(Topology t, int site) {
        int count = 0;
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            count += t.element[t.child[branch]] == 6 && BindingState.of(t, branch).equals("sp") ? 1 : 0;
        }
        return count;
    }

    /** A second aromatic ring cannot turn into the plane as well: what helps it from afar helps little. */
    private static Stabiliser afterOthers(Topology t, Stabiliser first, Stabiliser group) {
        boolean both = t.aromatic[first.atom()] && t.aromatic[group.atom()] && first.strength() > ARYL && group.strength() > ARYL;
        return both ? new Stabiliser(ARYL + SECOND_RING * (group.strength() - ARYL), group.atom(), group.name()) : group;
    }

    private static List<Stabiliser> stabilisers(Facts facts, int site) {
        Topology t = facts.topology();
        List<Stabiliser> groups = new ArrayList<>();
        int[] ring = t.element[site] == 6 ? CyclopentadienideRing.around(t, site) : new int[0];
        if (ring.length == 5) {
            groups.add(new Stabiliser(CYCLOPENTADIENIDE - BENZO * CyclopentadienideRing.fusedBenzo(t, ring), ring[1], "cyclopentadienide ring"));
        }
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            int child = t.child[branch];
            boolean counted = ring.length == 5 && (child == ring[1] || child == ring[4]);
            if (!counted) {
                Substituent group = facts.constants()[branch];
                groups.add(new Stabiliser(group.carbanion(), child, group.name()));
            }
        }
        return groups;
    }

    /** Lactones and lactams, whose acyl group cannot turn away, and rings that the loss of the proton makes aromatic. */
    private static void addRings(Topology t, int site, Terms terms) {
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            String state = BindingState.of(t, branch);
            if (t.ringBond[branch] && (state.equals("ester") || state.equals("amide"))) {
                terms.add("anion.lactone", Effect.ORBITAL, 1, t.child[branch]);
            }
            // in a ring the substituent of an enolate lies in the plane already and does not crowd
            if (t.ringBond[branch] && state.equals("acyl") && t.degree(site) == 3) {
                terms.add("anion.ring-tertiary", Effect.STERICS, 1, t.child[branch]);
            }
        }
        if (t.element[site] == 6 && t.inRing[site]) {
            for (int[] ring : SixRing.around(t, site)) {
                int unsaturated = 0;
                int carbonyl = -1;
                for (int atom : ring) {
                    unsaturated += atom != site && t.unsaturated(atom) ? 1 : 0;
                    carbonyl = t.oxo(atom) && !t.aromatic[atom] ? atom : carbonyl;
                }
                if (unsaturated == 5 && carbonyl >= 0) {
                    terms.add("anion.aromatic", Effect.RESONANCE, 1, carbonyl);
                    return;
                }
            }
        }
    }
}
