package lyate.sheet.reaction;

import java.util.Arrays;

/**
 * Colour refinement: atoms get the same colour where neither they nor their surroundings, however far, can be told apart.
 * (Weisfeiler and Lehman's procedure of 1968; it tells apart all but a few exotic cages.)
 */
final class Colours {

    private Colours() {}

    /**
     * Refines a colouring until it is stable.
     *
     * @param start colour of each atom to begin with
     * @return colours from 0, in an order that depends on the structure alone
     */
    static int[] refine(AtomGraph graph, int[] start) {
        return refined(graph, start).of();
    }

    /**
     * A stable colouring.
     *
     * @param of     colour of each atom
     * @param rounds how often all atoms were looked at
     */
    record Stable(int[] of, int rounds) {}

    /** As {@link #refine}, with what it took. */
    static Stable refined(AtomGraph graph, int[] start) {
        int size = start.length;
        long[] signature = new long[size];
        for (int i = 0; i < size; i++) {
            signature[i] = mix(start[i]);
        }
        int[] colour = ranks(signature);
        int classes = count(colour);
        int rounds = 1;
        while (classes < size) {
            for (int i = 0; i < size; i++) {
                long around = 0;
                for (int k = 0; k < graph.neighbours[i].length; k++) {
                    around += mix(colour[graph.neighbours[i][k]] * 8L + graph.bonds[i][k]);
                }
                signature[i] = mix(around * 31 + mix(colour[i] + 1L) * 17);
            }
            colour = ranks(signature);
            rounds++;
            int now = count(colour);
            if (now == classes) {
                break;
            }
            classes = now;
        }
        return new Stable(colour, rounds);
    }

    private static int[] ranks(long[] signature) {
        long[] sorted = signature.clone();
        Arrays.sort(sorted);
        int distinct = 0;
        for (int i = 0; i < sorted.length; i++) {
            if (i == 0 || sorted[i] != sorted[distinct - 1]) {
                sorted[distinct++] = sorted[i];
            }
        }
        int[] ranks = new int[signature.length];
        for (int i = 0; i < ranks.length; i++) {
            ranks[i] = Arrays.binarySearch(sorted, 0, distinct, signature[i]);
        }
        return ranks;
    }

    private static int count(int[] ranks) {
        int highest = -1;
        for (int rank : ranks) {
            highest = Math.max(highest, rank);
        }
        return highest + 1;
    }

    /** Spreads the bits of a number (the finaliser of MurmurHash3, in the public domain). */
    static long mix(long value) {
        long z = (value ^ (value >>> 33)) * 0xff51afd7ed558ccdL;
        z = (z ^ (z >>> 33)) * 0xc4ceb9fe1a85ec53L;
        return z ^ (z >>> 33);
    }
}
