package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.BitSet;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.PathBuilder;

/** Edges along arcs: a tube of radii 1 and 2 about (5 3), in a plate. */
class ArcEdgeTest {
    private static final GeometryFactory FACTORY = new GeometryFactory();
    private static final Circle OUTER = new Circle(5, 3, 2);

    private static Geometry disc(double r) {
        return FACTORY.createPolygon(PathBuilder.ring(new Circle(5, 3, r), FACTORY));
    }

    private static Section tube(Coordinate... splits) {
        Drawn drawn = new Drawn()
                .region("plate", Drawn.box(0, 0, 10, 6))
                .add("tube", disc(2), false)
                .add("bore", disc(1), true);
        for (Coordinate c : splits) {
            drawn.split(c.x, c.y);
        }
        return drawn.build();
    }

    private static Coordinate at(double radius, double angleDeg) {
        double angle = Math.toRadians(angleDeg);
        return new Coordinate(5 + radius * Math.cos(angle), 3 + radius * Math.sin(angle));
    }

    private static LineString arc(Circle circle, Coordinate from, Coordinate to, boolean counterClockwise) {
        return new PathBuilder(from).arcTo(circle, to, counterClockwise).line(FACTORY);
    }

    private static EdgePieces find(Section section, Where where) {
        return new EdgeFinder(section).find(where, new BitSet());
    }

    @Test
    void arcsUnderADrawnArcAreFoundInItsDirection() {
        LineString line = arc(OUTER, at(2, 40), at(2, 200), true);
        Section section = tube(line.getCoordinates());
        EdgePieces pieces = find(section, new Where.OnLine(line));
        assertThat(pieces.length(section)).isCloseTo(2 * Math.toRadians(160), within(1e-12));
        int tube = 1;
        for (int i = 0; i < pieces.segments().length; i++) {
            int s = pieces.segments()[i];
            // Counter-clockwise, the tube is on the left of the line: flow from left to right leaves it.
            assertThat(section.left(s) == tube ? 1 : -1).isEqualTo(pieces.signs()[i]);
        }
        EdgePieces back = find(section, new Where.OnLine(line.reverse()));
        assertThat(back.segments()).isEqualTo(pieces.segments());
        assertThat(back.signs()[0]).isEqualTo(-pieces.signs()[0]);
    }

    @Test
    void theSameArcDrawnThroughThreeRoundedPointsIsFoundWithinSnap() {
        double snap = 1e-7 * Math.hypot(10, 6);
        Coordinate from = at(2, 0);
        Coordinate to = at(2, 90);
        Coordinate through = new Coordinate(at(2 + 0.4 * snap, 40));
        LineString line = new PathBuilder(from).arcThrough(through, to).line(FACTORY);
        Section section = tube(line.getCoordinates());
        assertThat(find(section, new Where.OnLine(line)).length(section)).isCloseTo(Math.PI, within(1e-6));
        LineString off =
                new PathBuilder(from).arcThrough(at(2 + 40 * snap, 45), to).line(FACTORY);
        assertThat(find(section, new Where.OnLine(off)).isEmpty()).isTrue();
    }

    @Test
    void chordsAndOtherCirclesDoNotLieOnAnArc() {
        Section section = tube();
        LineString chords = FACTORY.createLineString(disc(2).getCoordinates());
        assertThat(find(section, new Where.OnLine(chords)).isEmpty()).isTrue();
        LineString far = arc(new Circle(5, 3, 1.5), at(1.5, 0), at(1.5, 180), true);
        assertThat(find(section, new Where.OnLine(far)).isEmpty()).isTrue();
        LineString bore = PathBuilder.ring(new Circle(5, 3, 1), FACTORY);
        assertThat(find(section, new Where.OnLine(bore)).length(section)).isCloseTo(2 * Math.PI, within(1e-12));
    }

    @Test
    void insideTakesArcsOfThePolygonAndOfTheSection() {
        Section section = tube();
        assertThat(find(section, new Where.Inside(disc(1))).length(section)).isCloseTo(2 * Math.PI, within(1e-12));
        assertThat(find(section, new Where.Inside(disc(1.01))).length(section)).isCloseTo(2 * Math.PI, within(1e-12));
        assertThat(find(section, new Where.Inside(disc(0.99))).isEmpty()).isTrue();
    }

    @Test
    void theNearestPieceIsMeasuredToTheArc() {
        Section section = new Drawn()
                .add(
                        "cap",
                        FACTORY.createPolygon(new PathBuilder(new Coordinate(2, 0))
                                .arcTo(new Circle(0, 0, 2), new Coordinate(-2, 0), true)
                                .lineTo(new Coordinate(2, 0))
                                .ring(FACTORY)),
                        false)
                .build();
        // Nearer to the base than to the arc, but nearer to the chords of the arc than to the arc.
        EdgePieces base = find(section, new Where.Nearest(0.1, 0.97));
        assertThat(base.length(section)).isCloseTo(4, within(1e-12));
        EdgePieces arc = find(section, new Where.Nearest(0.1, 1.03));
        assertThat(arc.length(section)).isCloseTo(2 * Math.PI, within(1e-12));
    }

    @Test
    void aSideIsStraight() {
        // A notch that is bent inwards between two corners on the left side.
        Section section = new Drawn()
                .add(
                        "part",
                        FACTORY.createPolygon(new PathBuilder(new Coordinate(0, 0))
                                .lineTo(new Coordinate(3, 0))
                                .lineTo(new Coordinate(3, 3))
                                .lineTo(new Coordinate(0, 3))
                                .lineTo(new Coordinate(0, 2))
                                .arcThrough(new Coordinate(0.1, 1.5), new Coordinate(0, 1))
                                .lineTo(new Coordinate(0, 0))
                                .ring(FACTORY)),
                        false)
                .build();
        assertThat(find(section, new Where.OnSide(Where.Side.LEFT)).length(section))
                .isCloseTo(2, within(1e-12));
    }
}
