package tepor.mesher.mesh;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;
import tepor.mesher.refinement.CurvedTriangle;
import tepor.mesher.refinement.RefinementReport;
import tepor.mesher.refinement.RefinementReport.Stop;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Triangulation;

/**
 * Decides which sides on arcs are curved: all but those that no valid six-node triangle can have, as in the cusp between two
 * arcs that touch.
 */
final class ArcSides {
    private final Triangulation mesh;
    private final Section section;
    private final boolean[] straight; // by side
    private final List<Stop> leftStraight = new ArrayList<>();
    private final double[] node = new double[12];

    ArcSides(Triangulation mesh, Section section) {
        this.mesh = mesh;
        this.section = section;
        straight = new boolean[3 * mesh.triangleCount()];
        if (section.hasArcs()) {
            boolean changed = true;
            while (changed) {
                changed = false;
                for (int t = 0; t < mesh.triangleCount(); t++) {
                    changed |= straighten(t);
                }
            }
        }
    }

    /** Where sides were left straight. */
    List<Stop> leftStraight() {
        return List.copyOf(leftStraight);
    }

    /** Node in the middle of a side, metres. */
    Coordinate middle(int side) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        return isArc(side)
                ? section.circle(mesh.constraint(side) / 2).middle(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b))
                : new Coordinate(0.5 * (mesh.x(a) + mesh.x(b)), 0.5 * (mesh.y(a) + mesh.y(b)));
    }

    private boolean isArc(int side) {
        if (straight[side] || mesh.constraint(side) < 0) {
            return false;
        }
        Circle circle = section.circle(mesh.constraint(side) / 2);
        return circle != null;
    }

    /** Makes the arcs of a triangle straight if it is not valid with them; whether it did. */
    private boolean straighten(int t) {
        boolean bent = false;
        for (int side = 3 * t; side < 3 * t + 3; side++) {
            bent |= isArc(side);
        }
        if (!bent) {
            return false;
        }
        for (int i = 0; i < 3; i++) {
            Coordinate middle = middle(3 * t + i);
            node[2 * i] = mesh.x(mesh.apex(3 * t + i));
            node[2 * i + 1] = mesh.y(mesh.apex(3 * t + i));
            node[6 + 2 * i] = middle.x;
            node[7 + 2 * i] = middle.y;
        }
        if (CurvedTriangle.leastJacobian(node) > CurvedTriangle.ROUND_OFF) {
            return false;
        }
        for (int side = 3 * t; side < 3 * t + 3; side++) {
            if (isArc(side)) {
                Coordinate at = middle(side);
                leftStraight.add(new Stop(RefinementReport.Reason.ARC_LEFT_STRAIGHT, at.x, at.y));
                straight[side] = true;
                if (mesh.twin(side) >= 0) {
                    straight[mesh.twin(side)] = true;
                }
            }
        }
        return true;
    }
}
