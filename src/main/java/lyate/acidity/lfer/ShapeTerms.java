package lyate.acidity.lfer;

import lyate.acidity.Acidity.Effect;

/** Ring strain, crowding, hydrogen bonds and charges around a site. */
final class ShapeTerms {

    private ShapeTerms() {}

    static void add(Facts facts, int site, Terms terms) {
        Topology t = facts.topology();
        int[] distance = t.distances(site);
        addRings(t, site, terms);
        addCrowding(t, site, distance, terms);
        addHydrogenBonds(facts, distance, terms);
        addCharges(t, site, distance, terms);
    }

    private static void addRings(Topology t, int site, Terms terms) {
        int smallest = 0;
        int ringBonds = 0;
        int alphaRing = 0;
        int cyclopropyl = 0;
        int heldAryls = 0;
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            int size = t.smallestRing(branch);
            ringBonds += t.ringBond[branch] ? 1 : 0;
            heldAryls += size == 6 && t.aromatic[t.child[branch]] ? 1 : 0;
            if (size > 0 && (smallest == 0 || size < smallest)) {
                smallest = size;
            }
            if (!t.ringBond[branch] && t.inRing[t.child[branch]] && !t.aromatic[t.child[branch]]) {
                alphaRing++;
                cyclopropyl += threeRing(t, t.child[branch]) ? 1 : 0;
            }
        }
        if (ringBonds > 0 && !t.aromatic[site]) {
            terms.add("shape.ring-" + (smallest == 0 ? "large" : smallest), Effect.ORBITAL, 1, site);
            terms.add("shape.bridgehead", Effect.STERICS, Math.max(0, ringBonds - 2), site);
        }
        if (!t.aromatic[site] && terms.value("anion.aromatic") == 0) {
            terms.add("shape.held-aryls", Effect.RESONANCE, Math.max(0, heldAryls - 1), site, "two aryl groups held in one plane by a six-membered ring");
        }
        terms.add("shape.on-ring", Effect.STERICS, alphaRing, site);
        terms.add("shape.on-cyclopropane", Effect.ORBITAL, cyclopropyl, site);
    }

    private static boolean threeRing(Topology t, int atom) {
        for (int branch = t.first[atom]; branch < t.first[atom + 1]; branch++) {
            if (t.ringBond[branch] && t.smallestRing(branch) == 3) {
                return true;
            }
        }
        return false;
    }

    private static void addCrowding(Topology t, int site, int[] distance, Terms terms) {
        int[] shell = new int[5];
        for (int atom = 0; atom < t.atoms; atom++) {
            if (distance[atom] < 5) {
                shell[distance[atom]]++;
            }
        }
        terms.add("shape.degree", Effect.STERICS, shell[1], site);
        terms.add("shape.hydrogens", Effect.STERICS, t.hydrogens[site], site);
        terms.add("shape.second-shell", Effect.STERICS, shell[2], site);
        terms.add("shape.third-shell", Effect.STERICS, shell[3], site);
        terms.add("shape.fourth-shell", Effect.STERICS, shell[4], site);
        double twist = terms.value("ring.ortho.count") * Math.max(0, t.degree(site) - 1);
        terms.add("shape.twist", Effect.STERICS, twist, site);
        terms.add("shape.both-ortho", Effect.STERICS, Math.max(0, terms.value("ring.ortho.count") - 1), site);
        terms.add("shape.head-both-ortho", Effect.STERICS, Math.max(0, terms.value("head-ring.ortho.count") - 1), site);
    }

    private static void addHydrogenBonds(Facts facts, int[] distance, Terms terms) {
        Topology t = facts.topology();
        boolean[] seen = new boolean[4];
        for (int atom = 0; atom < t.atoms; atom++) {
            int d = distance[atom];
            boolean polar = t.element[atom] == 8 || t.element[atom] == 7;
            if (!polar || d < 3 || d > 4) {
                continue;
            }
            boolean donor = t.hydrogens[atom] > 0;
            boolean acceptor = t.element[atom] == 8 || !donor && t.charge[atom] <= 0 && t.degree(atom) < 3;
            if (acceptor && !seen[d - 3]) {
                seen[d - 3] = true;
                terms.add("hydrogen-bond.acceptor-" + (d + 2), Effect.HYDROGEN_BOND, 1, atom);
            }
            if (donor && !seen[d - 1]) {
                seen[d - 1] = true;
                terms.add("hydrogen-bond.donor-" + (d + 2), Effect.HYDROGEN_BOND, 1, atom);
            }
        }
    }

    private static void addCharges(Topology t, int site, int[] distance, Terms terms) {
        for (int atom = 0; atom < t.atoms; atom++) {
            if (atom != site && charged(t, atom)) {
                terms.add(t.charge[atom] > 0 ? "charge.positive" : "charge.negative", Effect.CHARGE,
                        t.charge[atom] / (double) distance[atom], atom);
            }
        }
    }

    /** Whether the atom carries a charge of its own, not one half of a charge-separated group. */
    static boolean charged(Topology t, int atom) {
        return t.charge[atom] != 0 && !balanced(t, atom);
    }

    /** Whether a neighbour carries the opposite charge, as in a nitro group or an N-oxide. */
    private static boolean balanced(Topology t, int atom) {
        for (int branch = t.first[atom]; branch < t.first[atom + 1]; branch++) {
            if (t.charge[t.child[branch]] * t.charge[atom] < 0) {
                return true;
            }
        }
        return false;
    }
}
