package tepor.mesher.section;

/** Disjoint sets of the numbers from 0, with path halving (Tarjan and van Leeuwen 1984). */
final class DisjointSets {
    private final int[] parent;

    DisjointSets(int count) {
        parent = new int[count];
        for (int i = 0; i < count; i++) {
            parent[i] = i;
        }
    }

    /** The number by which the set of i is known. */
    int find(int i) {
        int at = i;
        while (parent[at] != at) {
            parent[at] = parent[parent[at]];
            at = parent[at];
        }
        return at;
    }

    /** Makes the sets of i and j one, known by the smaller of their names. */
    void join(int i, int j) {
        int a = find(i);
        int b = find(j);
        parent[Math.max(a, b)] = Math.min(a, b);
    }
}
