package lyate.molecule;

import java.util.Arrays;

/** Shortest ways through the bonds, on adjacency lists. */
final class Paths {

    private Paths() {}

    /** Bonds from one atom to every atom. */
    static int[] distances(int[][] neighbours, int from) {
        int[] distances = new int[neighbours.length];
        Arrays.fill(distances, -1);
        distances[from] = 0;
        int[] queue = new int[neighbours.length];
        int reached = 0;
        queue[reached++] = from;
        for (int i = 0; i < reached; i++) {
            for (int neighbour : neighbours[queue[i]]) {
                if (distances[neighbour] < 0) {
                    distances[neighbour] = distances[queue[i]] + 1;
                    queue[reached++] = neighbour;
                }
            }
        }
        return distances;
    }

    /**
     * Size of the smallest ring through a ring atom: the first bond that joins the parts reached through two different
     * neighbours of it. Looks no farther than it must.
     */
    static int smallestRing(int[][] neighbours, int atom) {
        int[] distance = new int[neighbours.length];
        int[] branch = new int[neighbours.length];
        int[] queue = new int[neighbours.length];
        int reached = 0;
        for (int neighbour : neighbours[atom]) {
            distance[neighbour] = 1;
            branch[neighbour] = neighbour;
            queue[reached++] = neighbour;
        }
        int smallest = Integer.MAX_VALUE;
        for (int i = 0; i < reached && 2 * distance[queue[i]] + 1 < smallest; i++) {
            int here = queue[i];
            for (int next : neighbours[here]) {
                if (next != atom && distance[next] == 0) {
                    distance[next] = distance[here] + 1;
                    branch[next] = branch[here];
                    queue[reached++] = next;
                } else if (next != atom && branch[next] != branch[here]) {
                    smallest = Math.min(smallest, distance[here] + distance[next] + 1);
                }
            }
        }
        return smallest == Integer.MAX_VALUE ? 0 : smallest;
    }
}
