package tepor.mesher.triangulation;

import java.util.Arrays;
import tepor.mesher.section.Section;

/** Makes the constrained Delaunay triangulation of a section. */
public final class SectionTriangulator {
    private SectionTriangulator() {}

    /**
     * The constrained Delaunay triangulation of a section's vertices and segments, carved out: no triangle lies in a hole or
     * outside, and each knows its region. Vertices keep their numbers; those on no segment with material beside it are in no
     * triangle.
     *
     * @throws IllegalArgumentException if the section breaks its contract: segments cross, vertices coincide, or the regions
     *     beside segments contradict each other; also if there is no material at all
     */
    public static Triangulation triangulate(Section section, Predicates predicates) {
        double[] xy = new double[2 * section.vertexCount()];
        for (int v = 0; v < section.vertexCount(); v++) {
            xy[2 * v] = section.x(v);
            xy[2 * v + 1] = section.y(v);
        }
        boolean[] isUsed = usedVertices(section);
        int[] order =
                Arrays.stream(HilbertOrder.inRounds(xy)).filter(v -> isUsed[v]).toArray();
        Triangulation mesh = DelaunayBuilder.build(xy, order, predicates);
        SegmentRecovery recovery = new SegmentRecovery(mesh, predicates);
        for (int s = 0; s < section.segmentCount(); s++) {
            if (isSolid(section, s)) {
                recovery.recover(section.start(s), section.end(s), 2 * s);
            }
        }
        RegionCarver.carve(mesh, section);
        return mesh;
    }

    private static boolean isSolid(Section section, int segment) {
        return section.solidLeft(segment) || section.solidRight(segment);
    }

    private static boolean[] usedVertices(Section section) {
        boolean[] isUsed = new boolean[section.vertexCount()];
        for (int s = 0; s < section.segmentCount(); s++) {
            if (isSolid(section, s)) {
                isUsed[section.start(s)] = true;
                isUsed[section.end(s)] = true;
            }
        }
        return isUsed;
    }
}
