package tepor.mesher.refinement;

import java.util.ArrayList;
import java.util.List;
import tepor.mesher.triangulation.Triangulation;

/** Finds the triangles that stayed worse than asked once refinement has ended, and says why. */
final class StopFinder {
    private StopFinder() {}

    /** @param limited whether refinement ended at the greatest number of triangles */
    static RefinementReport find(
            Triangulation mesh, Vertices vertices, TriangleRule rule, SmallAngles smallAngles, boolean limited) {
        List<RefinementReport.Stop> stops = new ArrayList<>();
        for (int t = 0; t < mesh.triangleCount(); t++) {
            rule.examine(t);
            if (!rule.isSharp() && !rule.isLarge()) {
                continue;
            }
            RefinementReport.Reason reason = !rule.isLarge() && isImposed(mesh, vertices, rule, smallAngles, t)
                    ? RefinementReport.Reason.IMPOSED_BY_OUTLINE
                    : limited ? RefinementReport.Reason.ELEMENT_LIMIT : RefinementReport.Reason.SIZE_FLOOR;
            stops.add(new RefinementReport.Stop(reason, centroid(mesh, t, 0), centroid(mesh, t, 1)));
        }
        return new RefinementReport(stops);
    }

    /**
     * Whether the outline imposes the smallest angle of the triangle that the rule examined last: the angle lies between two
     * segments, or the shortest side joins two shells.
     */
    static boolean isImposed(
            Triangulation mesh, Vertices vertices, TriangleRule rule, SmallAngles smallAngles, int triangle) {
        int shortest = rule.shortest();
        if (mesh.constraint(Triangulation.next(shortest)) >= 0
                && mesh.constraint(Triangulation.previous(shortest)) >= 0) {
            return true;
        }
        return smallAngles.joinsShells(vertices, mesh.origin(shortest), mesh.destination(shortest));
    }

    private static double centroid(Triangulation mesh, int t, int axis) {
        double sum = 0;
        for (int s = 3 * t; s < 3 * t + 3; s++) {
            sum += axis == 0 ? mesh.x(mesh.apex(s)) : mesh.y(mesh.apex(s));
        }
        return sum / 3;
    }
}
