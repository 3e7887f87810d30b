package tepor.mesher.section;

import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import java.util.function.IntConsumer;

/**
 * Which region owns each face: the last one in order that covers it.
 *
 * <p>Walks from the far outside, where no region is, from face to face, and keeps the winding numbers of all regions as
 * borders are crossed. No point is ever tested against a polygon, so that nothing depends on round-off.
 */
final class FaceOwners {
    private final List<RegionShape> shapes;
    private final List<Border> borders;
    private final Faces faces;
    private final int[] owner; // by face; Section.NONE where no region covers it
    private final boolean[] cuts; // by region of nothing: whether it takes material away anywhere
    private final int[] winding; // by region, where the walk is now
    private final BitSet covering = new BitSet(); // regions with a positive winding number there
    private final int[] halfEdge; // by face
    private final int[] halfEdgeStart; // faceCount + 1

    FaceOwners(List<RegionShape> shapes, List<Border> borders, Faces faces) {
        this.shapes = shapes;
        this.borders = borders;
        this.faces = faces;
        owner = new int[faces.faceCount()];
        cuts = new boolean[shapes.size()];
        winding = new int[shapes.size()];
        halfEdgeStart = new int[faces.faceCount() + 1];
        halfEdge = new int[2 * borders.size()];
        groupHalfEdges();
        walk(this::own);
    }

    /** The region that owns the face on the left of a half-edge, or {@link Section#NONE}. */
    int owner(int halfEdge) {
        return owner[faces.face(halfEdge)];
    }

    /** Whether a region of nothing takes material away from those under it. */
    boolean cuts(int region) {
        return cuts[region];
    }

    /** Regions that own some face. */
    BitSet visible() {
        BitSet visible = new BitSet();
        for (int region : owner) {
            if (region != Section.NONE) {
                visible.set(region);
            }
        }
        return visible;
    }

    /** The owners of the faces which a region covers. */
    BitSet ownersOver(int region) {
        BitSet over = new BitSet();
        walk(face -> {
            if (covering.get(region)) {
                over.set(owner[face]);
            }
        });
        return over;
    }

    private void groupHalfEdges() {
        for (int h = 0; h < halfEdge.length; h++) {
            halfEdgeStart[faces.face(h) + 1]++;
        }
        for (int f = 0; f < faces.faceCount(); f++) {
            halfEdgeStart[f + 1] += halfEdgeStart[f];
        }
        int[] fill = halfEdgeStart.clone();
        for (int h = 0; h < halfEdge.length; h++) {
            halfEdge[fill[faces.face(h)]++] = h;
        }
    }

    private void own(int face) {
        int last = covering.length() - 1;
        owner[face] = last < 0 ? Section.NONE : last;
        if (last >= 0 && shapes.get(last).hole()) {
            int under = last == 0 ? -1 : covering.previousSetBit(last - 1);
            cuts[last] |= under >= 0 && !shapes.get(under).hole();
        }
    }

    /** Visits every face once, with {@link #covering} as it is there. */
    private void walk(IntConsumer visit) {
        boolean[] seen = new boolean[faces.faceCount()];
        int[] next = Arrays.copyOf(halfEdgeStart, faces.faceCount());
        int[] path = new int[faces.faceCount()]; // half-edges crossed on the way, each left behind on its left
        int depth = 0;
        int at = Faces.OUTSIDE;
        seen[at] = true;
        visit.accept(at);
        while (true) {
            if (next[at] < halfEdgeStart[at + 1]) {
                int h = halfEdge[next[at]++];
                int beyond = faces.face(h ^ 1);
                if (!seen[beyond]) {
                    crossOver(h);
                    path[depth++] = h;
                    at = beyond;
                    seen[at] = true;
                    visit.accept(at);
                }
            } else if (depth > 0) {
                int h = path[--depth];
                crossOver(h ^ 1);
                at = faces.face(h);
            } else {
                return;
            }
        }
    }

    /** Takes the winding numbers from the left of a half-edge to its right. */
    private void crossOver(int h) {
        Border border = borders.get(h >> 1);
        int sign = (h & 1) == 0 ? -1 : 1;
        for (int i = 0; i < border.region.length; i++) {
            int region = border.region[i];
            winding[region] += sign * border.change[i];
            covering.set(region, winding[region] > 0);
        }
    }
}
