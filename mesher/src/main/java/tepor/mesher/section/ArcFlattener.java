package tepor.mesher.section;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.CoordinateSequence;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.util.GeometryTransformer;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;

/** Puts short chords in place of arcs, for questions that JTS answers for straight pieces only. */
public final class ArcFlattener {
    /** However fine the tolerance, an arc of 30° takes no more chords. */
    private static final int MOST = 1024;

    private final double tolerance;
    private final GeometryFactory factory = new GeometryFactory();

    /** @param tolerance greatest distance of a chord from its arc, metres */
    public ArcFlattener(double tolerance) {
        this.tolerance = tolerance;
    }

    /** A geometry of straight pieces in the place of one with arcs. */
    public Geometry flatten(Geometry geometry) {
        return new GeometryTransformer() {
            @Override
            protected CoordinateSequence transformCoordinates(CoordinateSequence coordinates, Geometry parent) {
                return parent instanceof Arcs ? createCoordinateSequence(points((LineString) parent)) : coordinates;
            }
        }.transform(geometry);
    }

    private Coordinate[] points(LineString line) {
        List<Coordinate> points = new ArrayList<>();
        points.add(line.getCoordinateN(0));
        for (int i = 0; i + 1 < line.getNumPoints(); i++) {
            append(points, line.getCoordinateN(i + 1), Arcs.circle(line, i));
        }
        return points.toArray(new Coordinate[0]);
    }

    /** One piece as a line; straight where the circle is null. */
    LineString piece(Coordinate from, Coordinate to, Circle circle) {
        List<Coordinate> points = new ArrayList<>();
        points.add(from);
        append(points, to, circle);
        return factory.createLineString(points.toArray(new Coordinate[0]));
    }

    private void append(List<Coordinate> points, Coordinate to, Circle circle) {
        Coordinate from = points.get(points.size() - 1);
        if (circle != null) {
            double turn = circle.turn(from.x, from.y, to.x, to.y);
            // A chord that turns by a is off its arc by r (1 - cos(a/2)), about r a²/8.
            double step = Math.sqrt(8 * tolerance / circle.radius());
            int count = (int) Math.min(MOST, Math.ceil(Math.abs(turn) / step));
            double start = Math.atan2(from.y - circle.y(), from.x - circle.x());
            for (int i = 1; i < count; i++) {
                double angle = start + turn * i / count;
                points.add(new Coordinate(
                        circle.x() + circle.radius() * Math.cos(angle),
                        circle.y() + circle.radius() * Math.sin(angle)));
            }
        }
        points.add(to);
    }
}
