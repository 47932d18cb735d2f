package lyate.molecule;

import java.util.Arrays;
import java.util.function.LongUnaryOperator;
import java.util.stream.LongStream;

/**
 * Alternative sets of bits; one of them must be there in full. No set holds another.
 *
 * @param sets at least one; an empty set asks for nothing
 */
record Asked(long[] sets) {

    static final Asked NOTHING = of(0);

    /** More alternatives cost more to look at than they save. */
    private static final int MOST = 12;

    static Asked of(long bits) {
        return new Asked(new long[] {bits});
    }

    /** Both. */
    Asked and(Asked other) {
        return smallest(Arrays.stream(sets).flatMap(one -> Arrays.stream(other.sets).map(two -> one | two)));
    }

    /** Either. */
    Asked or(Asked other) {
        return smallest(LongStream.concat(Arrays.stream(sets), Arrays.stream(other.sets)));
    }

    Asked map(LongUnaryOperator change) {
        return smallest(Arrays.stream(sets).map(change));
    }

    private static Asked smallest(LongStream all) {
        long[] distinct = all.distinct().toArray();
        long[] kept = Arrays.stream(distinct)
                .filter(set -> Arrays.stream(distinct).noneMatch(other -> other != set && (other & ~set) == 0)).toArray();
        return kept.length <= MOST ? new Asked(kept) : of(Arrays.stream(kept).reduce(-1L, (one, two) -> one & two));
    }

    /** Whether bits answer what is asked. */
    static boolean answered(long[] sets, long bits) {
        for (long set : sets) {
            if ((set & ~bits) == 0) {
                return true;
            }
        }
        return false;
    }
}
