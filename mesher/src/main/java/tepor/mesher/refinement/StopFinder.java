package tepor.mesher.refinement;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import tepor.mesher.refinement.RefinementReport.Reason;
import tepor.mesher.triangulation.Triangulation;

/** Finds the triangles that stayed worse than asked once refinement has ended, and says why. */
final class StopFinder {
    private StopFinder() {}

    /** All triangles that stayed worse than asked, where refinement ended at the greatest number of triangles. */
    static RefinementReport ofAll(Triangulation mesh, Vertices vertices, TriangleRule rule, SmallAngles smallAngles) {
        return find(mesh, vertices, rule, smallAngles, IntStream.range(0, mesh.triangleCount()), Reason.ELEMENT_LIMIT);
    }

    /**
     * Those that stayed worse than asked of the triangles left alone.
     *
     * @param leftAlone numbers of all triangles that refinement gave up, some perhaps bettered since
     */
    static RefinementReport of(
            Triangulation mesh, Vertices vertices, TriangleRule rule, SmallAngles smallAngles, IntStream leftAlone) {
        return find(mesh, vertices, rule, smallAngles, leftAlone.sorted().distinct(), Reason.SIZE_FLOOR);
    }

    private static RefinementReport find(
            Triangulation mesh,
            Vertices vertices,
            TriangleRule rule,
            SmallAngles smallAngles,
            IntStream triangles,
            Reason unlessImposed) {
        List<RefinementReport.Stop> stops = new ArrayList<>();
        triangles.forEach(t -> {
            rule.examine(t);
            if (rule.isSharp() || rule.isLarge()) {
                boolean imposed = !rule.isLarge() && isImposed(mesh, vertices, rule, smallAngles, t);
                Reason reason = imposed ? Reason.IMPOSED_BY_OUTLINE : unlessImposed;
                stops.add(new RefinementReport.Stop(reason, centroid(mesh, t, 0), centroid(mesh, t, 1)));
            }
        });
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
