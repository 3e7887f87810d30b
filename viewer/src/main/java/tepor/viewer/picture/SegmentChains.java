package tepor.viewer.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntPredicate;
import tepor.mesher.section.Section;

/** Joins segments of a section to long lines, so that they are drawn in one stroke. */
final class SegmentChains {
    /**
     * A line along segments.
     *
     * @param vertices in order; a closed line does not repeat the first
     * @param segments between them, in order
     * @param closed whether the last segment leads back to the first vertex
     */
    record Chain(int[] vertices, int[] segments, boolean closed) {}

    private SegmentChains() {}

    /**
     * Loops with the chosen side on their left, as seen with y upwards.
     *
     * @param left whether a region number (or {@link Section#NONE}) belongs to what is encircled
     */
    static List<Chain> loops(Section section, IntPredicate left) {
        int n = section.segmentCount();
        int[] from = new int[n];
        int[] to = new int[n];
        int[] segment = new int[n];
        int count = 0;
        for (int s = 0; s < n; s++) {
            boolean onLeft = left.test(section.left(s));
            if (onLeft != left.test(section.right(s))) {
                from[count] = onLeft ? section.start(s) : section.end(s);
                to[count] = onLeft ? section.end(s) : section.start(s);
                segment[count++] = s;
            }
        }
        return join(section, from, to, segment, count, true);
    }

    /**
     * Lines along these segments; they end where more than two meet. Material lies on their left, on a border the region of
     * the lower number.
     */
    static List<Chain> lines(Section section, int[] segments) {
        int[] from = new int[segments.length];
        int[] to = new int[segments.length];
        for (int i = 0; i < segments.length; i++) {
            int s = segments[i];
            boolean kept = section.isBoundary(s) ? section.solidLeft(s) : section.left(s) < section.right(s);
            from[i] = kept ? section.start(s) : section.end(s);
            to[i] = kept ? section.end(s) : section.start(s);
        }
        return join(section, from, to, segments, segments.length, false);
    }

    private static List<Chain> join(
            Section section, int[] from, int[] to, int[] segment, int count, boolean throughJunctions) {
        // Entries leaving each vertex, as linked lists.
        int[] head = new int[section.vertexCount()];
        Arrays.fill(head, -1);
        int[] next = new int[count];
        int[] arriving = new int[section.vertexCount()];
        int[] leaving = new int[section.vertexCount()];
        for (int i = count - 1; i >= 0; i--) {
            next[i] = head[from[i]];
            head[from[i]] = i;
            leaving[from[i]]++;
            arriving[to[i]]++;
        }
        boolean[] used = new boolean[count];
        List<Chain> chains = new ArrayList<>();
        for (int pass = 0; pass < 2; pass++) { // open lines first, from their ends
            for (int start = 0; start < count; start++) {
                int v = from[start];
                boolean passable = leaving[v] == 1 && arriving[v] == 1;
                if (used[start] || (pass == 0 && (throughJunctions || passable))) {
                    continue;
                }
                int[] vertices = new int[count + 1];
                int[] segments = new int[count];
                int length = 0;
                int i = start;
                while (i >= 0) {
                    used[i] = true;
                    vertices[length] = from[i];
                    segments[length++] = segment[i];
                    int end = to[i];
                    vertices[length] = end;
                    i = end == v || (!throughJunctions && (leaving[end] != 1 || arriving[end] != 1)) ? -1 : head[end];
                    while (i >= 0 && used[i]) {
                        i = next[i];
                    }
                }
                boolean closed = vertices[length] == v;
                chains.add(new Chain(
                        Arrays.copyOf(vertices, closed ? length : length + 1),
                        Arrays.copyOf(segments, length),
                        closed));
            }
        }
        return chains;
    }
}
