package lyate.molecule;

import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;

/** Shortest ways through the bonds, on adjacency lists. */
final class Paths {

    private Paths() {}

    /** Bonds from one atom to every atom. */
    static int[] distances(int[][] neighbours, int from) {
        int[] distances = new int[neighbours.length];
        Arrays.fill(distances, -1);
        distances[from] = 0;
        Deque<Integer> waiting = new ArrayDeque<>();
        waiting.add(from);
        while (!waiting.isEmpty()) {
            int atom = waiting.remove();
            for (int neighbour : neighbours[atom]) {
                if (distances[neighbour] < 0) {
                    distances[neighbour] = distances[atom] + 1;
                    waiting.add(neighbour);
                }
            }
        }
        return distances;
    }

    /**
     * Size of the smallest ring through a ring atom: the first bond that joins the parts reached through two different
     * neighbours of it.
     */
    static int smallestRing(int[][] neighbours, int atom) {
        int[] distances = distances(neighbours, atom);
        int[] branch = new int[neighbours.length];
        Arrays.fill(branch, -1);
        Deque<Integer> waiting = new ArrayDeque<>();
        for (int neighbour : neighbours[atom]) {
            branch[neighbour] = neighbour;
            waiting.add(neighbour);
        }
        int smallest = Integer.MAX_VALUE;
        while (!waiting.isEmpty()) {
            int here = waiting.remove();
            for (int next : neighbours[here]) {
                if (next == atom) {
                    continue;
                }
                if (branch[next] < 0) {
                    branch[next] = branch[here];
                    waiting.add(next);
                } else if (branch[next] != branch[here]) {
                    smallest = Math.min(smallest, distances[here] + distances[next] + 1);
                }
            }
        }
        return smallest == Integer.MAX_VALUE ? 0 : smallest;
    }
}
