package tepor.mesher.outline;

import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.LineString;

/**
 * Pieces end to end between points, some of them arcs. An arc piece turns by at most {@link #GREATEST_TURN}; longer arcs
 * are cut into equal pieces when they are read.
 */
public interface Arcs {
    /** By how much one piece turns at most, radians. */
    double GREATEST_TURN = Math.toRadians(30) * (1 + 1e-9);

    /** Circle of the piece from point i to point i + 1; null where it is straight. */
    Circle circle(int piece);

    /** Circle of a piece of any line string or ring; null where it is straight. */
    static Circle circle(LineString line, int piece) {
        return line instanceof Arcs arcs ? arcs.circle(piece) : null;
    }

    /** The circles, after a look whether each piece has one or null. */
    static Circle[] checked(Coordinate[] points, Circle[] circle) {
        if (circle.length != Math.max(0, points.length - 1)) {
            throw new IllegalArgumentException(
                    points.length + " points make " + (points.length - 1) + " pieces, got " + circle.length);
        }
        return circle.clone();
    }

    /** The circles in opposite order. */
    static Circle[] reversed(Circle[] circle) {
        Circle[] reversed = new Circle[circle.length];
        for (int i = 0; i < circle.length; i++) {
            reversed[i] = circle[circle.length - 1 - i];
        }
        return reversed;
    }
}
