package tepor.mesher.outline;

import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;

/** A line string some of whose pieces are arcs. To JTS it is the line of their chords. */
public final class ArcLine extends LineString implements Arcs {
    private static final long serialVersionUID = 1;

    private final transient Circle[] circle;

    /**
     * @param points n + 1 points
     * @param circle the circle of each of the n pieces between them; null where the piece is straight
     */
    public ArcLine(Coordinate[] points, Circle[] circle, GeometryFactory factory) {
        super(factory.getCoordinateSequenceFactory().create(points), factory);
        this.circle = Arcs.checked(points, circle);
    }

    @Override
    public Circle circle(int piece) {
        return circle[piece];
    }

    @Override
    protected ArcLine copyInternal() {
        return new ArcLine(getCoordinateSequence().copy().toCoordinateArray(), circle, getFactory());
    }

    @Override
    protected LineString reverseInternal() {
        return new ArcLine(super.reverseInternal().getCoordinates(), Arcs.reversed(circle), getFactory());
    }
}
