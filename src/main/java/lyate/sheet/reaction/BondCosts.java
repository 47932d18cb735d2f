package lyate.sheet.reaction;

/**
 * What an assignment of atoms costs: a reaction is taken to make and break as few bonds as it can, and those that break most
 * easily. The figures only order assignments; they are no energies.
 */
final class BondCosts {

    static final int FORMED = 10;
    /** Per unit of bond order. */
    static final int ORDER = 3;
    /** Per hydrogen or unit of charge an atom has more or less. */
    static final int HYDROGEN = 1;
    /** An atom of the product that comes from nowhere. */
    static final int UNEXPLAINED = 30;
    /** No broken bond costs less. */
    static final int LEAST_BROKEN = 9;

    private static final int CARBON = 6;

    private BondCosts() {}

    /** A bond that breaks: to halogen easiest, between carbons hardest, from an aromatic ring harder than from a chain. */
    static int broken(AtomGraph graph, int one, int other) {
        int low = Math.min(graph.element[one], graph.element[other]);
        int high = Math.max(graph.element[one], graph.element[other]);
        if (isHalogen(low) || isHalogen(high)) {
            return LEAST_BROKEN;
        }
        if (low == CARBON && high == CARBON) {
            return 13;
        }
        boolean activated = isCentre(graph, one) || isCentre(graph, other);
        return activated ? 10 : isAromatic(graph, one) || isAromatic(graph, other) ? 12 : 11;
    }

    /** Whether an atom is what nucleophiles attack in acyl, sulfonyl, silyl and boryl compounds. */
    private static boolean isCentre(AtomGraph graph, int atom) {
        int element = graph.element[atom];
        if (element != CARBON) {
            return element == 5 || element > 12 && !isHalogen(element);
        }
        for (int k = 0; k < graph.neighbours[atom].length; k++) {
            boolean hetero = graph.element[graph.neighbours[atom][k]] != CARBON;
            if (hetero && (graph.bonds[atom][k] == 2 || graph.bonds[atom][k] == 3)) {
                return true;
            }
        }
        return false;
    }

    private static boolean isAromatic(AtomGraph graph, int atom) {
        for (int bond : graph.bonds[atom]) {
            if (bond == AtomGraph.AROMATIC) {
                return true;
            }
        }
        return false;
    }

    private static boolean isHalogen(int element) {
        return element == 9 || element == 17 || element == 35 || element == 53;
    }

    /** A bond kept, perhaps with another order; aromatic counts as between single and double. */
    static int kept(int before, int after) {
        if (before == after) {
            return 0;
        }
        if (before == AtomGraph.AROMATIC || after == AtomGraph.AROMATIC) {
            return ORDER / 2;
        }
        return ORDER * Math.abs(before - after);
    }

    /** What becomes of an atom's hydrogens and charge. */
    static int atom(AtomGraph before, int source, AtomGraph after, int atom) {
        return HYDROGEN * (Math.abs(before.hydrogens(source) - after.hydrogens(atom)) + Math.abs(before.isotopes[source] - after.isotopes[atom])
                + Math.abs(before.charge[source] - after.charge[atom]));
    }
}
