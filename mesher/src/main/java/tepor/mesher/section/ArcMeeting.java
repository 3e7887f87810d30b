package tepor.mesher.section;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.algorithm.CGAlgorithmsDD;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;

/**
 * How two pieces meet of which one at least is an arc.
 *
 * <p>A piece is <em>bent</em> if it is an arc that leaves its chord by more than a part of snap; an arc flatter than that is
 * taken for its chord. Pieces that come closer than snap without crossing, as a circle that rests on a line, touch.
 */
final class ArcMeeting {
    /** An arc that stays this close to its chord, in snaps, is as good as straight. */
    private static final double FLAT = 0.25;

    private final VertexGrid vertices;
    private final double snap;

    ArcMeeting(VertexGrid vertices, double snap) {
        this.vertices = vertices;
        this.snap = snap;
    }

    boolean isBent(Border p) {
        return p.circle != null && sagitta(p) > FLAT * snap;
    }

    double sagitta(Border p) {
        return p.circle == null ? 0 : p.circle.sagitta(distance(p.a, p.b));
    }

    Coordinate middle(Border p) {
        return p.circle.middle(vertices.x(p.a), vertices.y(p.a), vertices.x(p.b), vertices.y(p.b));
    }

    /** Whether two pieces with the same ends lie over each other within snap. */
    boolean isSame(Border p, Border q) {
        boolean bentP = isBent(p);
        boolean bentQ = isBent(q);
        if (!bentP && !bentQ) {
            return true;
        }
        Coordinate m = bentP ? middle(p) : middleOfChord(p);
        Coordinate n = bentQ ? middle(q) : middleOfChord(q);
        return m.distance(n) <= snap;
    }

    private Coordinate middleOfChord(Border p) {
        return new Coordinate(0.5 * (vertices.x(p.a) + vertices.x(p.b)), 0.5 * (vertices.y(p.a) + vertices.y(p.b)));
    }

    private double distance(int u, int v) {
        return Math.hypot(vertices.x(v) - vertices.x(u), vertices.y(v) - vertices.y(u));
    }

    /** Whether a place lies within snap of a bent piece, between its ends. */
    boolean liesOn(double x, double y, Border bent) {
        return Math.abs(bent.circle.offset(x, y)) <= snap && isInSpan(x, y, bent);
    }

    /** Whether a place near a bent piece's circle lies between the piece's ends. */
    private boolean isInSpan(double x, double y, Border bent) {
        return bent.circle.spans(vertices.x(bent.a), vertices.y(bent.a), vertices.x(bent.b), vertices.y(bent.b), x, y);
    }

    private double turn(Border p) {
        return p.circle.turn(vertices.x(p.a), vertices.y(p.a), vertices.x(p.b), vertices.y(p.b));
    }

    /** Whether a vertex lies in the lens between a bent piece and its chord, or on the chord. */
    boolean isInLens(int vertex, Border bent) {
        double x = vertices.x(vertex);
        double y = vertices.y(vertex);
        if (bent.circle.offset(x, y) >= 0) {
            return false;
        }
        int side = side(bent, x, y);
        return side == 0 ? isInSpan(x, y, bent) : side > 0 == turn(bent) < 0;
    }

    private int side(Border p, double x, double y) {
        return CGAlgorithmsDD.orientationIndex(
                vertices.x(p.a), vertices.y(p.a), vertices.x(p.b), vertices.y(p.b), x, y);
    }

    /** Whether one piece enters the lens of the other through its chord, so that lenses or chords are not separate. */
    boolean areTangled(Border p, Border q) {
        boolean bentP = isBent(p);
        boolean bentQ = isBent(q);
        return (bentP && (isInLensAway(q.a, p, q) || isInLensAway(q.b, p, q)))
                || (bentQ && (isInLensAway(p.a, q, p) || isInLensAway(p.b, q, p)))
                || chordsCross(p, q)
                || (bentQ && !share(p, q) && !arcAndLine(q, p).isEmpty())
                || (bentP && !share(p, q) && !arcAndLine(p, q).isEmpty());
    }

    private boolean isInLensAway(int vertex, Border bent, Border owner) {
        return vertex != bent.a
                && vertex != bent.b
                && (vertex == owner.a || vertex == owner.b)
                && isInLens(vertex, bent);
    }

    private static boolean share(Border p, Border q) {
        return p.a == q.a || p.a == q.b || p.b == q.a || p.b == q.b;
    }

    private boolean chordsCross(Border p, Border q) {
        return !share(p, q)
                && side(p, vertices.x(q.a), vertices.y(q.a)) * side(p, vertices.x(q.b), vertices.y(q.b)) < 0
                && side(q, vertices.x(p.a), vertices.y(p.a)) * side(q, vertices.x(p.b), vertices.y(p.b)) < 0;
    }

    /** Where two pieces cross or touch, away from a common end, metres; one of them at least is bent. */
    List<Coordinate> meetings(Border p, Border q) {
        boolean bentP = isBent(p);
        boolean bentQ = isBent(q);
        List<Coordinate> found = bentP && bentQ ? arcAndArc(p, q) : bentP ? arcAndLine(p, q) : arcAndLine(q, p);
        if (share(p, q)) {
            int end = p.a == q.a || p.a == q.b ? p.a : p.b;
            found.removeIf(at -> isAlongside(p, q, end, at));
        }
        return found;
    }

    /** Whether two pieces run within snap of each other from a common end to a place. */
    private boolean isAlongside(Border p, Border q, int end, Coordinate at) {
        double chord = Math.hypot(at.x - vertices.x(end), at.y - vertices.y(end));
        return Math.abs(bow(p, end, at, chord) - bow(q, end, at, chord)) <= snap;
    }

    // Signed distance of the middle of the part of a piece between its end and a place on it from the chord between.
    private double bow(Border p, int end, Coordinate at, double chord) {
        if (p.circle == null) {
            return 0;
        }
        double turn = p.circle.turn(vertices.x(end), vertices.y(end), at.x, at.y);
        return Math.copySign(p.circle.sagitta(chord), turn);
    }

    /** Where an arc meets the chord of another piece, within both. */
    private List<Coordinate> arcAndLine(Border arc, Border line) {
        Circle c = arc.circle;
        double ax = vertices.x(line.a);
        double ay = vertices.y(line.a);
        double dx = vertices.x(line.b) - ax;
        double dy = vertices.y(line.b) - ay;
        double length = Math.hypot(dx, dy);
        double ux = dx / length;
        double uy = dy / length;
        double foot = (c.x() - ax) * ux + (c.y() - ay) * uy;
        double height = (c.x() - ax) * uy - (c.y() - ay) * ux;
        List<Coordinate> found = new ArrayList<>(2);
        double over = Math.abs(height) - c.radius();
        if (over > snap) {
            return found;
        }
        double half = over >= -snap ? 0 : Math.sqrt((c.radius() - height) * (c.radius() + height));
        for (int sign = -1; sign <= 1; sign += 2) {
            double t = foot + sign * half;
            Coordinate at = new Coordinate(ax + t * ux, ay + t * uy);
            if (t > 0 && t < length && isInSpan(at.x, at.y, arc) && !(half == 0 && sign > 0)) {
                found.add(at);
            }
        }
        return found;
    }

    private List<Coordinate> arcAndArc(Border p, Border q) {
        Circle c = p.circle;
        Circle d = q.circle;
        double dx = d.x() - c.x();
        double dy = d.y() - c.y();
        double distance = Math.hypot(dx, dy);
        double r = c.radius();
        double s = d.radius();
        List<Coordinate> found = new ArrayList<>(2);
        if (distance + Math.abs(r - s) <= snap || distance == 0) {
            return found; // the same circle, or one about the other
        }
        double outer = distance - (r + s);
        double inner = Math.abs(r - s) - distance;
        if (outer > snap || inner > snap) {
            return found;
        }
        double ux = dx / distance;
        double uy = dy / distance;
        double along = 0.5 * (distance + (r - s) * (r + s) / distance);
        boolean touch = Math.abs(outer) <= snap || Math.abs(inner) <= snap;
        double half = touch ? 0 : Math.sqrt(Math.max(0, (r - along) * (r + along)));
        if (touch) {
            along = Math.abs(inner) <= snap && r < s ? -r : r;
        }
        for (int sign = -1; sign <= 1; sign += 2) {
            Coordinate at =
                    new Coordinate(c.x() + along * ux - sign * half * uy, c.y() + along * uy + sign * half * ux);
            if (isInSpan(at.x, at.y, p) && isInSpan(at.x, at.y, q) && !(half == 0 && sign > 0)) {
                found.add(at);
            }
        }
        return found;
    }
}
