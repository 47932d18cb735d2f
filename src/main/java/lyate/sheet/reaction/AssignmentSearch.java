package lyate.sheet.reaction;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Finds where the atoms of the products come from: every assignment of product atoms to reactant atoms of the same element that
 * changes as little as possible ({@link BondCosts}), by branch and bound with a rising limit. Of reactant atoms that cannot be
 * told apart given what is assigned already, one is tried. The work is bounded by a count, not by a clock, so that the answer
 * does not depend on the machine.
 */
final class AssignmentSearch {

    /** A product atom that comes from nowhere. */
    static final int NOWHERE = -1;
    private static final int UNDECIDED = -2;
    /** Atoms looked at before the search gives up: well under a second. */
    private static final long MOST_WORK = 20_000_000;
    /** Telling an atom's colour costs as much as looking at so many. */
    private static final int WORK_OF_A_COLOUR = 20;
    private static final int MOST_SOLUTIONS = 64;
    private static final int[] LIMITS = {14, 26, 38, 50, 64, 80, 100, 130, 170};

    private final AtomGraph before;
    private final AtomGraph after;
    private final int[] source;
    private final int[] use;
    private final int[] order;
    private final int anchored;
    /** Product atoms of each element that may come from nowhere. */
    private final Map<Integer, Integer> spare = new HashMap<>();
    private long work;
    private int limit;
    private final List<int[]> found = new ArrayList<>();

    /** @param anchors reactant atom of every product atom that is known beforehand, else {@link #NOWHERE} */
    AssignmentSearch(AtomGraph before, AtomGraph after, int[] anchors) {
        this.before = before;
        this.after = after;
        this.source = new int[after.size()];
        this.use = new int[before.size()];
        Arrays.fill(source, UNDECIDED);
        Arrays.fill(use, UNDECIDED);
        int known = 0;
        for (int p = 0; p < anchors.length; p++) {
            if (anchors[p] >= 0) {
                source[p] = anchors[p];
                use[anchors[p]] = p;
                known++;
            }
        }
        this.anchored = known;
        this.order = new VisitingOrder(before, after).order(source, UNDECIDED);
        for (int p = 0; p < after.size(); p++) {
            spare.merge(after.element[p], 1, Integer::sum);
        }
        for (int r = 0; r < before.size(); r++) {
            spare.computeIfPresent(before.element[r], (element, count) -> count - 1);
        }
        spare.replaceAll((element, count) -> Math.max(0, count));
    }

    /** The assignments that cost least; none where the work was too much or nothing fits within the highest limit. */
    Assignments run() {
        int unexplained = spare.values().stream().mapToInt(Integer::intValue).sum();
        int start = anchoredCost();
        for (int step : LIMITS) {
            limit = step + start + unexplained * BondCosts.UNEXPLAINED;
            descend(0, start);
            if (work > MOST_WORK) {
                return new Assignments(List.of(), 0, false);
            }
            if (!found.isEmpty()) {
                return new Assignments(List.copyOf(found), limit - unexplained * BondCosts.UNEXPLAINED, true);
            }
        }
        return new Assignments(List.of(), 0, true);
    }

    /** What the atoms known beforehand cost among themselves. */
    private int anchoredCost() {
        int cost = 0;
        int[] decided = source.clone();
        for (int p = 0; p < decided.length && anchored > 0; p++) {
            source[p] = UNDECIDED;
        }
        for (int p = 0; p < decided.length && anchored > 0; p++) {
            if (decided[p] >= 0) {
                cost += cost(p, decided[p]);
                source[p] = decided[p];
            }
        }
        return cost;
    }

    private void descend(int depth, int cost) {
        if (depth == order.length) {
            complete(cost + leftBroken());
            return;
        }
        int p = order[depth];
        for (Candidate candidate : candidates(p, limit - cost)) {
            if (work > MOST_WORK) {
                return;
            }
            int now = cost + candidate.cost();
            if (now > limit) {
                continue;
            }
            place(p, candidate.source());
            if (now + bound() <= limit) {
                descend(depth + 1, now);
            }
            remove(p, candidate.source());
        }
    }

    private void complete(int cost) {
        if (cost > limit) {
            return;
        }
        if (cost < limit) {
            found.clear();
            limit = cost;
        }
        if (found.size() < MOST_SOLUTIONS) {
            found.add(source.clone());
        }
    }

    private record Candidate(int source, int cost) {}

    /** What may be the source of a product atom within some cost, cheapest first. */
    private List<Candidate> candidates(int p, int most) {
        List<Candidate> candidates = new ArrayList<>();
        for (int r = 0; r < before.size(); r++) {
            work++;
            if (use[r] == UNDECIDED && before.element[r] == after.element[p]) {
                add(candidates, p, r, most);
            }
        }
        withoutRepeats(candidates);
        if (spare.getOrDefault(after.element[p], 0) > 0) {
            add(candidates, p, NOWHERE, most);
        }
        candidates.sort(Comparator.comparingInt(Candidate::cost));
        return candidates;
    }

    private void add(List<Candidate> candidates, int p, int r, int most) {
        int cost = cost(p, r);
        if (cost <= most) {
            candidates.add(new Candidate(r, cost));
        }
    }

    /** Leaves one of those that cannot be told apart; what cannot be told apart costs the same. */
    private void withoutRepeats(List<Candidate> candidates) {
        Set<Integer> seen = new HashSet<>();
        candidates.forEach(candidate -> seen.add(before.colour[candidate.source()]));
        if (seen.size() < candidates.size()) {
            int[] colour = refined();
            Set<Integer> tried = new HashSet<>();
            candidates.removeIf(candidate -> !tried.add(colour[candidate.source()]));
        }
    }

    /** Colours of the reactant atoms once those in use are told apart. */
    private int[] refined() {
        int[] start = new int[before.size()];
        for (int r = 0; r < start.length; r++) {
            start[r] = use[r] == UNDECIDED ? before.colour[r] : before.size() + use[r];
        }
        Colours.Stable stable = Colours.refined(before, start);
        work += (long) WORK_OF_A_COLOUR * stable.rounds() * start.length;
        return stable.of();
    }

    /** What placing {@code p} on {@code r} adds, seen from the product atoms decided so far. */
    private int cost(int p, int r) {
        int cost = r == NOWHERE ? BondCosts.UNEXPLAINED : BondCosts.atom(before, r, after, p);
        for (int k = 0; k < after.neighbours[p].length; k++) {
            int q = after.neighbours[p][k];
            if (source[q] == UNDECIDED) {
                continue;
            }
            int bond = r == NOWHERE || source[q] == NOWHERE ? 0 : before.bond(r, source[q]);
            boolean bothNew = r == NOWHERE && source[q] == NOWHERE;
            cost += bothNew ? 0 : bond == 0 ? BondCosts.FORMED : BondCosts.kept(bond, after.bonds[p][k]);
        }
        if (r == NOWHERE) {
            return cost;
        }
        for (int s : before.neighbours[r]) {
            if (use[s] != UNDECIDED && source[use[s]] == s && after.bond(p, use[s]) == 0) {
                cost += BondCosts.broken(before, r, s);
            }
        }
        return cost;
    }

    /** Bonds to reactant atoms that found no place: broken once everything is decided. */
    private int leftBroken() {
        int cost = 0;
        for (int r = 0; r < before.size(); r++) {
            if (use[r] != UNDECIDED) {
                for (int s : before.neighbours[r]) {
                    cost += use[s] == UNDECIDED ? BondCosts.broken(before, r, s) : 0;
                }
            }
        }
        return cost;
    }

    /** The least that the undecided atoms must still cost: around each decided atom, element by element. */
    private int bound() {
        int bound = spare.values().stream().mapToInt(Integer::intValue).sum() * BondCosts.UNEXPLAINED;
        for (int p = 0; p < source.length; p++) {
            work++;
            if (source[p] >= 0) {
                bound += around(p);
            }
        }
        return bound;
    }

    private int around(int p) {
        int[] open = after.neighbours[p];
        int[] free = before.neighbours[source[p]];
        int formed = 0;
        int broken = 0;
        for (int q : open) {
            formed += source[q] == UNDECIDED ? 1 : 0;
        }
        int taken = 0;
        for (int s : free) {
            if (use[s] == UNDECIDED) {
                broken++;
            }
        }
        if (formed == 0 && broken == 0) {
            return 0;
        }
        boolean[] matched = new boolean[open.length];
        for (int s : free) {
            for (int k = 0; k < open.length && use[s] == UNDECIDED; k++) {
                if (!matched[k] && source[open[k]] == UNDECIDED && after.element[open[k]] == before.element[s]) {
                    matched[k] = true;
                    taken++;
                    break;
                }
            }
        }
        return (formed - taken) * BondCosts.FORMED + (broken - taken) * BondCosts.LEAST_BROKEN;
    }

    private void place(int p, int r) {
        source[p] = r;
        if (r == NOWHERE) {
            spare.merge(after.element[p], -1, Integer::sum);
        } else {
            use[r] = p;
        }
    }

    private void remove(int p, int r) {
        source[p] = UNDECIDED;
        if (r == NOWHERE) {
            spare.merge(after.element[p], 1, Integer::sum);
        } else {
            use[r] = UNDECIDED;
        }
    }
}
