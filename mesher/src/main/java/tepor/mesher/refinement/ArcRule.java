package tepor.mesher.refinement;

import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;
import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Triangulation;

/** Judges pieces of arcs: whether they turn too far, or bow too far for a six-node triangle beside them to be valid. */
final class ArcRule {
    /**
     * Least Jacobian wanted of a six-node triangle, relative to that of its corners' triangle (Johnen, Remacle & Geuzaine
     * 2013, J. Comput. Phys. 233:359–376, for the bound).
     */
    private static final double LEAST_JACOBIAN = 0.2;
    /** Arcs that turn by less are not split for a triangle's sake: in a cusp no triangle would ever be valid. */
    private static final double LEAST_TURN = Math.toRadians(1);

    private final Triangulation mesh;
    private final Section section;
    private final double greatestTurn;
    private final double[] node = new double[12];

    /** @param greatestTurn no piece turns by more than this, radians */
    ArcRule(Triangulation mesh, Section section, double greatestTurn) {
        this.mesh = mesh;
        this.section = section;
        this.greatestTurn = greatestTurn * (1 + 1e-9);
    }

    /** Whether a subsegment is a piece of an arc that turns too far. */
    boolean turnsTooFar(int side) {
        Circle circle = circle(side);
        return circle != null && turn(circle, side) > greatestTurn;
    }

    /**
     * Whether a subsegment is a piece of an arc that bows too far for a triangle beside it. To be asked only once angles are
     * as wanted: a flat triangle between two pieces of one arc is never valid, and goes away for its angles' sake.
     */
    boolean bowsTooFar(int side) {
        Circle circle = circle(side);
        if (circle == null || turn(circle, side) <= LEAST_TURN) {
            return false;
        }
        int other = mesh.twin(side);
        return isTooBent(side / 3) || (other >= 0 && isTooBent(other / 3));
    }

    private double turn(Circle circle, int side) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        return Math.abs(circle.turn(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b)));
    }

    /** Whether a place lies between a subsegment and the arc for which it stands. */
    boolean isInLens(int side, double x, double y) {
        Circle circle = circle(side);
        if (circle == null || circle.offset(x, y) >= 0) {
            return false;
        }
        double ax = mesh.x(mesh.origin(side));
        double ay = mesh.y(mesh.origin(side));
        double bx = mesh.x(mesh.destination(side));
        double by = mesh.y(mesh.destination(side));
        double right = (x - ax) * (by - ay) - (y - ay) * (bx - ax);
        return circle.turn(ax, ay, bx, by) > 0 ? right >= 0 : right <= 0;
    }

    private Circle circle(int side) {
        return mesh.constraint(side) < 0 ? null : section.circle(mesh.constraint(side) / 2);
    }

    private boolean isTooBent(int triangle) {
        for (int i = 0; i < 3; i++) {
            int side = 3 * triangle + i;
            node[2 * i] = mesh.x(mesh.apex(side));
            node[2 * i + 1] = mesh.y(mesh.apex(side));
            int a = mesh.origin(side);
            int b = mesh.destination(side);
            Circle circle = circle(side);
            if (circle == null) {
                node[6 + 2 * i] = 0.5 * (mesh.x(a) + mesh.x(b));
                node[7 + 2 * i] = 0.5 * (mesh.y(a) + mesh.y(b));
            } else {
                Coordinate middle = circle.middle(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b));
                node[6 + 2 * i] = middle.x;
                node[7 + 2 * i] = middle.y;
            }
        }
        return !(CurvedTriangle.leastJacobian(node) >= LEAST_JACOBIAN);
    }
}
