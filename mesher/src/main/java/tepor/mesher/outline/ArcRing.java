package tepor.mesher.outline;

import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;

/** A ring some of whose pieces are arcs. To JTS it is the ring of their chords. */
public final class ArcRing extends LinearRing implements Arcs {
    private static final long serialVersionUID = 1;

    private final transient Circle[] circle;

    /**
     * @param points n + 1 points, the last the same as the first
     * @param circle the circle of each of the n pieces between them; null where the piece is straight
     */
    public ArcRing(Coordinate[] points, Circle[] circle, GeometryFactory factory) {
        super(factory.getCoordinateSequenceFactory().create(points), factory);
        this.circle = Arcs.checked(points, circle);
    }

    @Override
    public Circle circle(int piece) {
        return circle[piece];
    }

    @Override
    protected ArcRing copyInternal() {
        return new ArcRing(getCoordinateSequence().copy().toCoordinateArray(), circle, getFactory());
    }

    @Override
    public LinearRing reverseInternal() {
        return new ArcRing(super.reverseInternal().getCoordinates(), Arcs.reversed(circle), getFactory());
    }
}
