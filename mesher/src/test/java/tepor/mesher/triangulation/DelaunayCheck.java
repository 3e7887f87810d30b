package tepor.mesher.triangulation;

import java.util.ArrayList;
import java.util.List;

/** Audits a triangulation: links, orientation, and the constrained Delaunay property, all by exact predicates. */
public final class DelaunayCheck {
    private DelaunayCheck() {}

    /** What is wrong; empty if nothing is. */
    public static List<String> problems(Triangulation mesh) {
        List<String> problems = new ArrayList<>();
        Predicates predicates = new Predicates();
        for (int side = 0; side < 3 * mesh.triangleCount(); side++) {
            checkLink(mesh, side, problems);
            if (side % 3 == 0 && !mesh.isGhost(side / 3)) {
                checkOrientation(mesh, side, predicates, problems);
            }
            int twin = mesh.twin(side);
            if (twin >= 0 && mesh.constraint(side) < 0) {
                checkCircle(mesh, side, twin, predicates, problems);
            }
        }
        return problems;
    }

    private static void checkLink(Triangulation mesh, int side, List<String> problems) {
        int twin = mesh.twin(side);
        int code = mesh.constraint(side);
        if (twin < 0) {
            if (code < 0) {
                problems.add("side " + side + " has neither twin nor constraint");
            }
        } else if (mesh.twin(twin) != side
                || mesh.origin(side) != mesh.destination(twin)
                || mesh.destination(side) != mesh.origin(twin)
                || mesh.constraint(twin) != (code < 0 ? code : code ^ 1)) {
            problems.add("side " + side + " and its twin " + twin + " do not match");
        }
    }

    private static void checkOrientation(Triangulation mesh, int side, Predicates predicates, List<String> problems) {
        int a = mesh.apex(side);
        int b = mesh.apex(side + 1);
        int c = mesh.apex(side + 2);
        if (!(predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c)) > 0)) {
            problems.add("triangle " + side / 3 + " is flat or turned over");
        }
    }

    private static void checkCircle(
            Triangulation mesh, int side, int twin, Predicates predicates, List<String> problems) {
        int a = mesh.apex(side);
        int b = mesh.origin(side);
        int c = mesh.destination(side);
        int d = mesh.apex(twin);
        if ((a | b | c | d) < 0) {
            // Seen from the ghosts' side the hull runs clockwise: a, b, d must not turn left.
            if (d < 0 || a < 0 || b < 0) {
                return;
            }
            if (predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(d), mesh.y(d)) > 0) {
                problems.add("the hull is not convex at vertex " + b);
            }
            return;
        }
        double inside = predicates.inCircle(
                mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c), mesh.x(d), mesh.y(d));
        if (inside > 0) {
            problems.add("vertex " + d + " lies in the circle of triangle " + side / 3);
        }
    }
}
