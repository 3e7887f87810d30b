package tepor.mesher.outline;

import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;

/**
 * The circle of which an arc is a piece. All pieces of one arc share the same circle, to the bit, whatever is laid over
 * them.
 *
 * <p>Between two points on it, the <em>shorter arc</em> is meant: pieces turn by less than 180°.
 *
 * @param x centre, metres
 * @param y centre, metres
 * @param radius metres
 */
public record Circle(double x, double y, double radius) {
    /** By how much the shorter arc from a to b turns, radians: positive counter-clockwise. */
    public double turn(double ax, double ay, double bx, double by) {
        double ux = ax - x;
        double uy = ay - y;
        double vx = bx - x;
        double vy = by - y;
        return Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy);
    }

    /** Middle of the shorter arc from a to b, metres: on the circle, and as far from a as from b. */
    public Coordinate middle(double ax, double ay, double bx, double by) {
        double chord = Math.hypot(bx - ax, by - ay);
        double ux = (bx - ax) / chord;
        double uy = (by - ay) / chord;
        double mx = 0.5 * (ax - x + bx - x);
        double my = 0.5 * (ay - y + by - y);
        // From the middle of the chord along its bisector, away from the centre. The ends may lie a little off the
        // circle;
        // then the bisector passes by the centre.
        double across = mx * uy - my * ux;
        double nx = across >= 0 ? uy : -uy;
        double ny = across >= 0 ? -ux : ux;
        double aside = mx * ux + my * uy;
        double reach = Math.sqrt(Math.max(0, (radius - aside) * (radius + aside))) - Math.abs(across);
        return new Coordinate(x + mx + reach * nx, y + my + reach * ny);
    }

    /** Point at a part (0 to 1) of the shorter arc from a to b, metres. */
    public Coordinate at(double ax, double ay, double bx, double by, double part) {
        double angle = Math.atan2(ay - y, ax - x) + part * turn(ax, ay, bx, by);
        return new Coordinate(x + radius * Math.cos(angle), y + radius * Math.sin(angle));
    }

    /** Whether a place, seen from the centre, lies between the ends a and b of the shorter arc. */
    public boolean spans(double ax, double ay, double bx, double by, double px, double py) {
        double turn = turn(ax, ay, bx, by);
        double toPlace = turn(ax, ay, px, py);
        return toPlace * turn > 0 && Math.abs(toPlace) < Math.abs(turn);
    }

    /** Greatest distance of the shorter arc from its chord, metres, for a chord of this length (metres). */
    public double sagitta(double chord) {
        double half = Math.min(0.5 * chord, radius);
        return half * half / (radius + Math.sqrt((radius - half) * (radius + half)));
    }

    /** Length of the shorter arc over a chord of this length, metres. */
    public double arcLength(double chord) {
        return 2 * radius * Math.asin(Math.min(1, 0.5 * chord / radius));
    }

    /** Area between the shorter arc from a to b and its chord, m²: positive where the arc lies on the right of the chord. */
    public double lens(double ax, double ay, double bx, double by) {
        return 0.5 * radius * radius * lessSine(turn(ax, ay, bx, by));
    }

    /** φ − sin φ, without loss of digits where φ is small. */
    private static double lessSine(double turn) {
        double square = turn * turn;
        return Math.abs(turn) > 0.1
                ? turn - Math.sin(turn)
                : turn * square / 6 * (1 - square / 20 * (1 - square / 42 * (1 - square / 72)));
    }

    /** Point of the circle nearest to a place, metres; undefined for the centre itself. */
    public Coordinate nearest(double px, double py) {
        double dx = px - x;
        double dy = py - y;
        double scale = radius / Math.hypot(dx, dy);
        return new Coordinate(x + scale * dx, y + scale * dy);
    }

    /** Signed distance of a place from the circle, metres: positive outside. */
    public double offset(double px, double py) {
        return Math.hypot(px - x, py - y) - radius;
    }

    /** Bounding box of the shorter arc from a to b, metres. */
    public Envelope envelope(double ax, double ay, double bx, double by) {
        Envelope box = new Envelope(ax, bx, ay, by);
        for (int i = 0; i < 4; i++) {
            double px = x + (i == 0 ? radius : i == 1 ? -radius : 0);
            double py = y + (i == 2 ? radius : i == 3 ? -radius : 0);
            if (spans(ax, ay, bx, by, px, py)) {
                box.expandToInclude(px, py);
            }
        }
        return box;
    }
}
