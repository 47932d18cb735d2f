package lyate.sheet.reaction;

import java.util.List;

/**
 * What a search for the origin of the product atoms came to.
 *
 * @param sources  for every assignment that costs least the reactant atom of each product atom, or
 *                 {@link AssignmentSearch#NOWHERE}
 * @param cost     of each, atoms that must come from nowhere not counted
 * @param complete whether the search came to its end
 */
record Assignments(List<int[]> sources, int cost, boolean complete) {

    /** Product atoms that come from nowhere. */
    int unexplained() {
        int count = 0;
        for (int source : sources.isEmpty() ? new int[0] : sources.get(0)) {
            count += source == AssignmentSearch.NOWHERE ? 1 : 0;
        }
        return count;
    }
}
