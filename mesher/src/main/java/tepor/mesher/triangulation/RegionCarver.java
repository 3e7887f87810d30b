package tepor.mesher.triangulation;

import java.util.Arrays;
import tepor.mesher.section.Section;

/** Gives each triangle the region of the section that it lies in, and removes those in holes and outside. */
final class RegionCarver {
    private static final int UNKNOWN = -2;

    private RegionCarver() {}

    /**
     * Carves the section out of a triangulation with ghost triangles whose constraint codes tell the section's segments.
     *
     * @throws IllegalArgumentException if the section's segments contradict each other
     */
    static void carve(Triangulation mesh, Section section) {
        int[] region = mesh.region;
        int count = mesh.triangleCount();
        Arrays.fill(region, 0, count, UNKNOWN);
        int[] stack = new int[count];
        int depth = 0;
        for (int t = 0; t < count; t++) {
            int stated = statedRegion(mesh, section, t);
            if (stated != UNKNOWN) {
                region[t] = stated;
                stack[depth++] = t;
            }
        }
        while (depth > 0) {
            int t = stack[--depth];
            for (int side = 3 * t; side < 3 * t + 3; side++) {
                int across = mesh.twin[side] / 3;
                if (mesh.constraint[side] >= 0) {
                    continue;
                }
                if (region[across] == UNKNOWN) {
                    region[across] = region[t];
                    stack[depth++] = across;
                } else if (region[across] != region[t]) {
                    throw contradiction(mesh, side, region[t], region[across]);
                }
            }
        }
        boolean[] keep = new boolean[count];
        for (int t = 0; t < count; t++) {
            keep[t] = !mesh.isGhost(t) && region[t] >= 0;
        }
        mesh.retain(keep);
    }

    // What the triangle's constrained sides, or its being a ghost, say of its region.
    private static int statedRegion(Triangulation mesh, Section section, int triangle) {
        int stated = mesh.isGhost(triangle) ? Triangulation.NONE : UNKNOWN;
        for (int side = 3 * triangle; side < 3 * triangle + 3; side++) {
            int code = mesh.constraint[side];
            if (code < 0) {
                continue;
            }
            int beside = code % 2 == 0 ? section.left(code / 2) : section.right(code / 2);
            // All emptiness is one: a section has no segments between a region of nothing and the outside.
            int says = beside >= 0 && section.isHole(beside) ? Triangulation.NONE : beside;
            if (stated != UNKNOWN && stated != says) {
                throw contradiction(mesh, side, stated, says);
            }
            stated = says;
        }
        return stated;
    }

    private static IllegalArgumentException contradiction(Triangulation mesh, int side, int one, int other) {
        int v = Math.max(mesh.origin(side), mesh.destination(side));
        return new IllegalArgumentException("segments contradict each other: the same place near (" + mesh.x(v) + " "
                + mesh.y(v) + ") lies in region " + one + " and in region " + other);
    }
}
