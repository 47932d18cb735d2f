package lyate.molecule;

import java.util.ArrayList;
import java.util.List;

/**
 * Patterns in an order that matters: of all that fit an atom the last one decides. Immutable; safe to share between
 * threads. Patterns that cannot fit by element and surroundings are passed over without being tried.
 */
public final class LastMatch {

    private final List<AtomPattern> patterns;
    /** By root code: the patterns that admit it, last first. */
    private final int[][] candidates;

    /** @param patterns general ones first */
    public LastMatch(List<AtomPattern> patterns) {
        this.patterns = List.copyOf(patterns);
        this.candidates = new int[RootFilter.CODES][];
        for (int code = 0; code < candidates.length; code++) {
            candidates[code] = admitting(code);
        }
    }

    private int[] admitting(int code) {
        List<Integer> admitting = new ArrayList<>();
        for (int i = patterns.size() - 1; i >= 0; i--) {
            if (patterns.get(i).admits(code)) {
                admitting.add(i);
            }
        }
        return admitting.stream().mapToInt(Integer::intValue).toArray();
    }

    /** Index of the last pattern that fits with its first atom on {@code atom}, or -1. */
    public int index(Molecule molecule, int atom) {
        for (int candidate : candidates[molecule.facts().rootCodes[atom]]) {
            if (patterns.get(candidate).matches(molecule, atom)) {
                return candidate;
            }
        }
        return -1;
    }
}
