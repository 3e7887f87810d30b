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
    /** Tolerance of a thousand chords to 30°, relative to the radius. */
    private static final double FINEST = 3e-8;

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
        // However fine the tolerance, an arc of 30° takes no more chords than are of use.
        double least = circle == null ? tolerance : Math.max(tolerance, FINEST * circle.radius());
        double[] xy = SegmentCurve.points(circle, from.x, from.y, to.x, to.y, least);
        for (int k = 2; k < xy.length - 2; k += 2) {
            points.add(new Coordinate(xy[k], xy[k + 1]));
        }
        points.add(to);
    }
}
