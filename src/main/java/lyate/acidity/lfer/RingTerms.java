package lyate.acidity.lfer;

import java.util.Arrays;
import lyate.acidity.Acidity.Effect;

/**
 * Hammett terms of one aromatic system: every substituent, ring heteroatom and fused ring by its position to the anchor.
 *
 * <p>Positions: ortho, meta and para within a ring of the anchor ({@code cross} where only a ring carbonyl group or a nitrogen with three
 * neighbours leads to the para atom, so that nothing is conjugated); peri across a fusion atom; beyond that {@code far} where an
 * alternating system carries the site's charge to the atom (odd distance) and {@code away} where it does not.
 */
final class RingTerms {

    private static final int LARGEST_RING = 7;

    private final Facts facts;
    private final Topology t;
    private final String prefix;
    private final int anchor;
    private final Terms terms;
    private final int[] distance;
    private final int[] conjugated;
    private final boolean[] sharesRing;
    private int smallestRing;
    private double inductionSum;
    private double inductionSquares;
    /** Whether the site hangs on the ring by a ring bond: a neighbour in that ring holds it in the plane rather than crowds it. */
    private boolean tiedBack;

    private RingTerms(Facts facts, String prefix, int anchor, Terms terms) {
        this.facts = facts;
        this.t = facts.topology();
        this.prefix = prefix;
        this.anchor = anchor;
        this.terms = terms;
        this.distance = walk(anchor, -1);
        this.conjugated = conjugatedDistances();
        this.sharesRing = new boolean[t.atoms];
        markRings();
    }

    /**
     * Adds the terms of the aromatic system around {@code anchor}.
     *
     * @param anchor the ring atom that is the proton site or carries it
     * @param from the atom outside the system through which the site is reached, or -1
     */
    static void add(Facts facts, String prefix, int anchor, int from, Terms terms) {
        new RingTerms(facts, prefix, anchor, terms).addAll(from);
    }

    private void addAll(int from) {
        int bond = from < 0 ? -1 : t.branchBetween(anchor, from);
        tiedBack = bond >= 0 && t.ringBond[bond];
        if (smallestRing == 5) {
            terms.add(prefix + ".five-membered", Effect.ORBITAL, 1, anchor);
        }
        for (int atom = 0; atom < t.atoms; atom++) {
            if (distance[atom] == Integer.MAX_VALUE) {
                continue;
            }
            String place = prefix + "." + position(atom);
            if (atom != anchor) {
                addRingAtom(place, atom);
            }
            for (int branch = t.first[atom]; branch < t.first[atom + 1]; branch++) {
                int child = t.child[branch];
                if (distance[child] == Integer.MAX_VALUE && child != from) {
                    addSubstituent(place, branch);
                }
            }
        }
        // each further group finds less charge to act on: the sum over pairs is 0 for a single substituent
        terms.add(prefix + ".pairs", Effect.INDUCTION, (inductionSum * inductionSum - inductionSquares) / 2, anchor);
    }

    private void addRingAtom(String place, int atom) {
        int degree = t.degree(atom);
        if (t.element[atom] == 6) {
            int ringBonds = 0;
            for (int branch = t.first[atom]; branch < t.first[atom + 1]; branch++) {
                ringBonds += distance[t.child[branch]] == Integer.MAX_VALUE ? 0 : 1;
            }
            if (ringBonds > 2) {
                terms.add(place + ".fused", Effect.RESONANCE, 1, atom, "fused ring");
            }
        } else if (t.element[atom] == 7 && t.charge[atom] == 0 && t.hydrogens[atom] == 0 && degree == 2) {
            terms.add(place + ".aza", Effect.ATOM, 1, atom, "ring nitrogen");
        } else if (t.charge[atom] > 0) {
            terms.add(place + ".onium", Effect.CHARGE, 1, atom, "charged ring atom");
        } else if (t.element[atom] == 7) {
            terms.add(place + ".azole-n", Effect.ATOM, 1, atom, "ring NH or NR");
        } else {
            terms.add(place + (t.element[atom] == 8 ? ".oxa" : ".thia"), Effect.ATOM, 1, atom, "ring heteroatom");
        }
    }

    private void addSubstituent(String place, int branch) {
        Substituent s = facts.constants()[branch];
        int child = t.child[branch];
        String who = s.name();
        if (t.order[branch] == 2) {
            terms.add(place + doubleBonded(t.element[child]), Effect.RESONANCE, 1, child, who);
            return;
        }
        if (!s.listed() && !(t.element[child] == 6 && !t.unsaturated(child))) {
            terms.miss("substituent constants of the group at " + facts.molecule().label(child) + ", taken from its atoms");
        }
        inductionSum += s.induction();
        inductionSquares += s.induction() * s.induction();
        terms.add(place + ".induction", Effect.INDUCTION, s.induction(), child, who);
        terms.add(place + ".resonance", Effect.RESONANCE, s.resonance(), child, who);
        terms.add(place + ".acceptance", Effect.RESONANCE, s.acceptance(), child, who);
        terms.add(place + ".donation", Effect.RESONANCE, s.donation(), child, who);
        boolean crowding = !t.ringBond[branch] || !tiedBack;
        if (crowding && (place.endsWith("ortho") || place.endsWith("peri"))) {
            terms.add(place + ".count", Effect.STERICS, 1, child, who);
            terms.add(place + ".bulk", Effect.STERICS, t.degree(child) - 1, child, who);
        }
    }

    private static String doubleBonded(int element) {
        return switch (element) {
            case 6 -> ".ylidene";
            case 7 -> ".imino";
            case 16 -> ".thioxo";
            default -> ".oxo";
        };
    }

    private String position(int atom) {
        int d = distance[atom];
        if (d == 0) {
            return "ipso";
        }
        if (sharesRing[atom]) {
            return d == 1 ? "ortho" : d == 2 ? "meta" : conjugated[atom] == d ? "para" : "cross";
        }
        return d == 2 ? "peri" : d % 2 == 1 ? "far" : "away";
    }

    /** Marks the atoms of the rings of at most seven atoms that the anchor belongs to. */
    private void markRings() {
        for (int a = t.first[anchor]; a < t.first[anchor + 1]; a++) {
            for (int b = a + 1; b < t.first[anchor + 1]; b++) {
                if (t.order[a] == Topology.AROMATIC && t.order[b] == Topology.AROMATIC) {
                    markRing(t.child[a], t.child[b]);
                }
            }
        }
    }

    private void markRing(int from, int to) {
        int[] back = walk(to, anchor);
        if (back[from] > LARGEST_RING - 2) {
            return;
        }
        smallestRing = smallestRing == 0 ? back[from] + 2 : Math.min(smallestRing, back[from] + 2);
        int atom = from;
        sharesRing[atom] = true;
        while (atom != to) {
            int here = atom;
            for (int branch = t.first[here]; branch < t.first[here + 1]; branch++) {
                if (t.order[branch] == Topology.AROMATIC && back[t.child[branch]] == back[here] - 1) {
                    atom = t.child[branch];
                }
            }
            sharesRing[atom] = true;
        }
    }

    /** Distances over aromatic bonds, but not through ring carbonyl groups and nitrogen atoms with three neighbours. */
    private int[] conjugatedDistances() {
        boolean[] ends = new boolean[t.atoms];
        boolean any = false;
        for (int atom = 0; atom < t.atoms; atom++) {
            if (distance[atom] > 0 && distance[atom] < LARGEST_RING) {
                boolean pyrrolic = t.element[atom] == 7 && t.charge[atom] == 0 && t.degree(atom) + t.hydrogens[atom] == 3;
                ends[atom] = pyrrolic || t.element[atom] == 6 && t.oxo(atom);
                any |= ends[atom];
            }
        }
        return any ? walk(anchor, -1, ends) : distance;
    }

    private int[] walk(int from, int barred) {
        return walk(from, barred, new boolean[t.atoms]);
    }

    /** Distances over aromatic bonds, not through {@code barred} and not beyond the atoms in {@code ends}. */
    private int[] walk(int from, int barred, boolean[] ends) {
        int[] steps = new int[t.atoms];
        Arrays.fill(steps, Integer.MAX_VALUE);
        int[] queue = new int[t.atoms];
        int tail = 0;
        steps[from] = 0;
        queue[tail++] = from;
        for (int head = 0; head < tail; head++) {
            int atom = queue[head];
            for (int branch = t.first[atom]; !ends[atom] && branch < t.first[atom + 1]; branch++) {
                int child = t.child[branch];
                if (t.order[branch] == Topology.AROMATIC && child != barred && steps[child] == Integer.MAX_VALUE) {
                    steps[child] = steps[atom] + 1;
                    queue[tail++] = child;
                }
            }
        }
        return steps;
    }
}
