package tepor.mesher.section;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.List;

/**
 * Runs of boundary segments: pieces of boundary between corners over 30° or junctions, a junction being a vertex where an
 * interface meets the boundary, or where the boundary touches itself.
 */
public final class BoundaryRuns {
    private static final double CORNER_COSINE = Math.cos(Math.toRadians(30));
    private static final int NOTHING = -1;
    private static final int JUNCTION = -2;

    private final Section section;
    private final int[] next; // by segment: the one that follows with material on the left; NOTHING where the run ends
    private final BitSet chosen;

    private BoundaryRuns(Section section, BitSet segments) {
        this.section = section;
        chosen = new BitSet();
        for (int s = segments.nextSetBit(0); s >= 0; s = segments.nextSetBit(s + 1)) {
            chosen.set(s, section.isBoundary(s));
        }
        next = new int[section.segmentCount()];
        link();
    }

    /**
     * Joins boundary segments to runs.
     *
     * @param section the section
     * @param segments segments to take; those that are not of the boundary are left out
     * @return segment numbers of each run in order along the boundary, material on the left; runs in the order of their
     *     smallest numbers
     */
    public static List<int[]> of(Section section, BitSet segments) {
        return new BoundaryRuns(section, segments).runs();
    }

    private int first(int segment) {
        return section.solidLeft(segment) ? section.start(segment) : section.end(segment);
    }

    private int last(int segment) {
        return section.solidLeft(segment) ? section.end(segment) : section.start(segment);
    }

    private void link() {
        int[] leaves = new int[section.vertexCount()]; // the one boundary segment that leaves a vertex
        Arrays.fill(leaves, NOTHING);
        for (int s = 0; s < section.segmentCount(); s++) {
            if (section.isBoundary(s)) {
                leaves[first(s)] = leaves[first(s)] == NOTHING ? s : JUNCTION;
            }
        }
        for (int s = 0; s < section.segmentCount(); s++) {
            if (!section.isBoundary(s) && !section.isCut(s)) {
                leaves[section.start(s)] = JUNCTION;
                leaves[section.end(s)] = JUNCTION;
            }
        }
        for (int s = 0; s < next.length; s++) {
            int follower = section.isBoundary(s) ? leaves[last(s)] : NOTHING;
            boolean joins = follower >= 0 && chosen.get(s) && chosen.get(follower) && isSmooth(s, follower);
            next[s] = joins ? follower : NOTHING;
        }
    }

    private boolean isSmooth(int s, int t) {
        boolean startsAtStart = section.solidLeft(t);
        boolean endsAtEnd = section.solidLeft(s);
        // Both as seen from the vertex between them.
        double onward = SegmentCurve.direction(section, t, startsAtStart);
        double back = SegmentCurve.direction(section, s, !endsAtEnd);
        return -Math.cos(onward - back) >= CORNER_COSINE * (1 - 1e-12);
    }

    private List<int[]> runs() {
        int[] previous = new int[next.length];
        Arrays.fill(previous, NOTHING);
        for (int s = 0; s < next.length; s++) {
            if (next[s] >= 0) {
                previous[next[s]] = s;
            }
        }
        List<int[]> runs = new ArrayList<>();
        BitSet done = new BitSet();
        for (int s = chosen.nextSetBit(0); s >= 0; s = chosen.nextSetBit(s + 1)) {
            if (!done.get(s)) {
                int begin = s;
                while (previous[begin] >= 0 && previous[begin] != s) {
                    begin = previous[begin];
                }
                begin = previous[begin] == s ? s : begin; // closed without a corner: begins at its smallest number
                List<Integer> run = new ArrayList<>();
                for (int t = begin; t >= 0 && !done.get(t); t = next[t]) {
                    done.set(t);
                    run.add(t);
                }
                runs.add(run.stream().mapToInt(Integer::intValue).toArray());
            }
        }
        return runs;
    }
}
