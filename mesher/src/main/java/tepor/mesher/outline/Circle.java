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

    /** Middle of the shorter arc from a to b, metres; on the circle even where a and b are a little off it. */
    public Coordinate middle(double ax, double ay, double bx, double by) {
        double chordX = bx - ax;
        double chordY = by - ay;
        double chord = Math.hypot(chordX, chordY);
        // The bisector of the chord, on the side of the chord that lies away from the centre.
        double nx = chordY / chord;
        double ny = -chordX / chord;
        double side = nx * (0.5 * (ax + bx) - x) + ny * (0.5 * (ay + by) - y) >= 0 ? radius : -radius;
        // Where both ends are on the circle its bisector runs through the centre.
        return new Coordinate(x + side * nx, y + side * ny);
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
        double turn = turn(ax, ay, bx, by);
        for (int i = 0; i < 4; i++) {
            double px = x + (i == 0 ? radius : i == 1 ? -radius : 0);
            double py = y + (i == 2 ? radius : i == 3 ? -radius : 0);
            double toPoint = turn(ax, ay, px, py);
            if (toPoint * turn > 0 && Math.abs(toPoint) < Math.abs(turn)) {
                box.expandToInclude(px, py);
            }
        }
        return box;
    }
}
