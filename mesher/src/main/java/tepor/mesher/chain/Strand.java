package tepor.mesher.chain;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Objects;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import tepor.mesher.outline.ArcLine;
import tepor.mesher.outline.ArcRing;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;

/**
 * Pieces end to end as they were drawn in one go.
 *
 * @param points n + 1 points, metres
 * @param circles of each of the n pieces between them; null where it is straight
 * @param source number of the line of the file in which it was drawn
 */
public record Strand(List<Coordinate> points, List<Circle> circles, int source) {
    /** A strand along a line string or ring. */
    public static Strand of(LineString line, int source) {
        List<Circle> circles = new ArrayList<>();
        for (int i = 0; i + 1 < line.getNumPoints(); i++) {
            circles.add(Arcs.circle(line, i));
        }
        return new Strand(List.of(line.getCoordinates()), circles, source);
    }

    int pieceCount() {
        return circles.size();
    }

    Coordinate first() {
        return points.get(0);
    }

    Coordinate last() {
        return points.get(points.size() - 1);
    }

    Strand reversed() {
        List<Coordinate> backPoints = new ArrayList<>(points);
        List<Circle> backCircles = new ArrayList<>(circles);
        Collections.reverse(backPoints);
        Collections.reverse(backCircles);
        return new Strand(backPoints, backCircles, source);
    }

    /** The same with other ends. */
    Strand withEnds(Coordinate first, Coordinate last) {
        List<Coordinate> moved = new ArrayList<>(points);
        moved.set(0, first);
        moved.set(moved.size() - 1, last);
        return new Strand(moved, circles, source);
    }

    /** Length of the chords, metres. */
    double length() {
        double sum = 0;
        for (int i = 1; i < points.size(); i++) {
            sum += points.get(i).distance(points.get(i - 1));
        }
        return sum;
    }

    /** The box around all pieces, arcs with what they bulge. */
    public Envelope box() {
        Envelope box = new Envelope();
        for (int i = 0; i < circles.size(); i++) {
            box.expandToInclude(box(points.get(i), points.get(i + 1), circles.get(i)));
        }
        return box;
    }

    /** The box around one piece. */
    static Envelope box(Coordinate a, Coordinate b, Circle circle) {
        Envelope box = new Envelope(a, b);
        if (circle != null) {
            box.expandBy(circle.sagitta(a.distance(b)));
        }
        return box;
    }

    /** Middle of a piece, on its arc. */
    static Coordinate middle(Coordinate a, Coordinate b, Circle circle) {
        return circle == null || a.equals2D(b)
                ? new Coordinate(0.5 * (a.x + b.x), 0.5 * (a.y + b.y))
                : circle.middle(a.x, a.y, b.x, b.y);
    }

    LineString line(GeometryFactory factory) {
        Coordinate[] xy = points.toArray(new Coordinate[0]);
        return isStraight() ? factory.createLineString(xy) : new ArcLine(xy, circles.toArray(new Circle[0]), factory);
    }

    LinearRing ring(GeometryFactory factory) {
        Coordinate[] xy = points.toArray(new Coordinate[0]);
        return isStraight() ? factory.createLinearRing(xy) : new ArcRing(xy, circles.toArray(new Circle[0]), factory);
    }

    private boolean isStraight() {
        return circles.stream().allMatch(Objects::isNull);
    }
}
