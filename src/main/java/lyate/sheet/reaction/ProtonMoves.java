package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;

/**
 * What one assignment says of protons.
 *
 * @param donors     reactant atoms that lost one, what most likely is meant first
 * @param acceptors  reactant atoms that gained one together with positive charge
 * @param oxidised   whether two neighbours lost hydrogen and drew closer: hydrogen left, but not as a proton
 * @param coupled    whether both ends of a new bond lost hydrogen
 * @param changes    heavy-atom bonds made and broken
 */
record ProtonMoves(List<Donor> donors, List<Integer> acceptors, boolean oxidised, boolean coupled, int changes) {

    /** What became of an atom that lost a proton, plainest first. */
    enum Fate {
        /** It made a new bond, kept the electrons, or took up deuterium. */
        REACTED,
        /** It moved closer to a neighbour that something left or was put on: an enolate, an elimination. */
        UNSATURATED,
        /** Nothing else happened to it: the hydrogen moved inside the molecule. */
        UNCHANGED
    }

    /**
     * A reactant atom that lost a proton.
     *
     * @param atom of the reactants
     */
    record Donor(int atom, Fate fate) {}

    static ProtonMoves of(AtomGraph before, AtomGraph after, int[] source) {
        int[] use = new int[before.size()];
        Arrays.fill(use, -1);
        for (int p = 0; p < source.length; p++) {
            if (source[p] >= 0) {
                use[source[p]] = p;
            }
        }
        return new Reading(before, after, source, use).moves();
    }

    /** One reading of one assignment. */
    private record Reading(AtomGraph before, AtomGraph after, int[] source, int[] use) {

        ProtonMoves moves() {
            List<Donor> donors = new ArrayList<>();
            List<Integer> acceptors = new ArrayList<>();
            boolean oxidised = false;
            for (int r = 0; r < use.length; r++) {
                if (lost(r) && lostBesideAnother(r)) {
                    oxidised = true;
                } else if (lost(r)) {
                    donors.add(new Donor(r, fate(r)));
                } else if (use[r] >= 0 && before.hydrogens(r) < after.hydrogens(use[r]) && chargeRises(r)) {
                    acceptors.add(r);
                }
            }
            donors.sort(Comparator.comparing(Donor::fate).thenComparing(donor -> before.element[donor.atom()])
                    .thenComparing(donor -> before.colour[donor.atom()]));
            return new ProtonMoves(List.copyOf(donors), List.copyOf(acceptors), oxidised, donors.stream().anyMatch(donor -> joinedToAnother(donor.atom())), changes());
        }

        private boolean lost(int r) {
            return use[r] >= 0 && before.protium[r] > after.protium[use[r]];
        }

        private boolean lostBesideAnother(int r) {
            for (int s : before.neighbours[r]) {
                if (lost(s) && order(after.bond(use[r], use[s])) > order(before.bond(r, s))) {
                    return true;
                }
            }
            return false;
        }

        private boolean joinedToAnother(int r) {
            for (int q : after.neighbours[use[r]]) {
                if (source[q] >= 0 && before.bond(r, source[q]) == 0 && lost(source[q])) {
                    return true;
                }
            }
            return false;
        }

        private Fate fate(int r) {
            int p = use[r];
            boolean kept = after.charge[p] < before.charge[r] || after.isotopes[p] > before.isotopes[r];
            if (kept || madeBond(r)) {
                return Fate.REACTED;
            }
            for (int s : before.neighbours[r]) {
                if (use[s] >= 0 && order(after.bond(p, use[s])) > order(before.bond(r, s))) {
                    return Fate.UNSATURATED;
                }
            }
            return Fate.UNCHANGED;
        }

        private boolean madeBond(int r) {
            for (int q : after.neighbours[use[r]]) {
                if (source[q] < 0 || before.bond(r, source[q]) == 0) {
                    return true;
                }
            }
            return false;
        }

        /** Its own charge, or that of the end of a double bond it gives up: an enolate is protonated on carbon. */
        private boolean chargeRises(int r) {
            if (after.charge[use[r]] > before.charge[r]) {
                return true;
            }
            for (int s : before.neighbours[r]) {
                for (int t : before.neighbours[s]) {
                    boolean allyl = t != r && use[s] >= 0 && use[t] >= 0 && order(before.bond(r, s)) > order(after.bond(use[r], use[s]));
                    if (allyl && after.charge[use[t]] > before.charge[t]) {
                        return true;
                    }
                }
            }
            return false;
        }

        private int changes() {
            int changes = 0;
            for (int p = 0; p < source.length; p++) {
                for (int q : after.neighbours[p]) {
                    boolean made = source[p] < 0 != source[q] < 0 || source[p] >= 0 && source[q] >= 0 && before.bond(source[p], source[q]) == 0;
                    changes += p < q && made ? 1 : 0;
                }
            }
            for (int r = 0; r < use.length; r++) {
                for (int s : before.neighbours[r]) {
                    boolean once = r < s || use[s] < 0;
                    boolean broken = use[r] >= 0 && once && (use[s] < 0 || after.bond(use[r], use[s]) == 0);
                    changes += broken ? 1 : 0;
                }
            }
            return changes;
        }

        /** Bond order times two; 0 for no bond. */
        private static int order(int bond) {
            return bond == AtomGraph.AROMATIC ? 3 : 2 * bond;
        }
    }
}
