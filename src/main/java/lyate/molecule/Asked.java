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
        if (sets.length == 1 && other.sets.length == 1) {
            return of(sets[0] | other.sets[0]);
        }
        return smallest(Arrays.stream(sets).flatMap(one -> Arrays.stream(other.sets).map(two -> one | two)));
    }

    /** Either. */
    Asked or(Asked other) {
        return smallest(LongStream.concat(Arrays.stream(sets), Arrays.stream(other.sets)));
    }

    Asked map(LongUnaryOperator change) {
        if (sets.length == 1) {
            return of(change.applyAsLong(sets[0]));
        }
        return smallest(Arrays.stream(sets).map(change));
    }

    private static Asked smallest(LongStream all) {
        long[] sets = all.toArray();
        long common = -1;
        int kept = 0;
        for (int i = 0; i < sets.length; i++) {
            if (!covered(sets, i)) {
                common &= sets[i];
                kept++;
            }
        }
        if (kept > MOST) {
            return of(common);
        }
        long[] least = new long[kept];
        for (int i = sets.length - 1; i >= 0; i--) {
            if (!covered(sets, i)) {
                least[--kept] = sets[i];
            }
        }
        return new Asked(least);
    }

    /** Whether another set asks for less, or an earlier one for the same. */
    private static boolean covered(long[] sets, int which) {
        for (int other = 0; other < sets.length; other++) {
            boolean within = (sets[other] & ~sets[which]) == 0;
            if (within && (sets[other] != sets[which] || other < which)) {
                return true;
            }
        }
        return false;
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
