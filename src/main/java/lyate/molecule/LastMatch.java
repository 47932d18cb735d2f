package lyate.molecule;

import java.util.List;
import java.util.concurrent.atomic.AtomicReferenceArray;
import java.util.stream.IntStream;

/**
 * Patterns in an order that matters: of all that fit an atom the last one decides. Immutable; safe to share between
 * threads. Patterns that cannot fit by element and surroundings are passed over without being tried.
 */
public final class LastMatch {

    private final AtomPattern[] patterns;
    /** By root code: the patterns that admit it, last first; filled where molecules have such atoms. */
    private final AtomicReferenceArray<Candidates> byRootCode = new AtomicReferenceArray<>(RootFilter.CODES);

    /**
     * Patterns to try.
     *
     * @param indices last first
     * @param needed  bits that each cannot do without, see {@link Surroundings}
     */
    private record Candidates(int[] indices, long[] needed) {}

    /** @param patterns general ones first */
    public LastMatch(List<AtomPattern> patterns) {
        this.patterns = patterns.toArray(AtomPattern[]::new);
    }

    private Candidates admitting(int code) {
        Candidates known = byRootCode.get(code);
        if (known == null) {
            known = select(code);
            byRootCode.set(code, known);
        }
        return known;
    }

    private Candidates select(int code) {
        int[] indices = IntStream.range(0, patterns.length).map(i -> patterns.length - 1 - i)
                .filter(i -> patterns[i].admits(code)).toArray();
        return new Candidates(indices, IntStream.of(indices).mapToLong(i -> patterns[i].needed()).toArray());
    }

    /** Index of the last pattern that fits with its first atom on {@code atom}, or -1. */
    public int index(Molecule molecule, int atom) {
        AtomFacts facts = molecule.facts();
        Candidates candidates = admitting(facts.rootCodes[atom]);
        long missing = ~facts.surroundings[atom];
        long[] needed = candidates.needed();
        for (int i = 0; i < needed.length; i++) {
            if ((needed[i] & missing) == 0 && patterns[candidates.indices()[i]].matches(molecule, atom)) {
                return candidates.indices()[i];
            }
        }
        return -1;
    }
}
