package tepor.solver.assembly;

import tepor.mesher.mesh.Mesh;

/** Finds the facets of a mesh by the section segment on which they lie. */
public final class FacetIndex {
    private final int[] start;
    private final int[] facet;

    /** @param segmentCount number of segments of the section */
    public FacetIndex(Mesh mesh, int segmentCount) {
        start = new int[segmentCount + 1];
        for (int f = 0; f < mesh.facetCount(); f++) {
            start[mesh.facetSegment(f) + 1]++;
        }
        for (int s = 0; s < segmentCount; s++) {
            start[s + 1] += start[s];
        }
        int[] next = start.clone();
        facet = new int[mesh.facetCount()];
        for (int f = 0; f < mesh.facetCount(); f++) {
            facet[next[mesh.facetSegment(f)]++] = f;
        }
    }

    /** The facets on these segments, segment by segment. */
    public int[] on(int... segments) {
        int count = 0;
        for (int s : segments) {
            count += start[s + 1] - start[s];
        }
        int[] found = new int[count];
        int n = 0;
        for (int s : segments) {
            for (int i = start[s]; i < start[s + 1]; i++) {
                found[n++] = facet[i];
            }
        }
        return found;
    }
}
