package tepor.mesher.mending;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.algorithm.Orientation;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.PathBuilder;
import tepor.mesher.section.ArcCutter;
import tepor.mesher.section.RegionShape;

/** Arcs: faults of the arcs are found, those that only the chords have are not, and mended arcs keep their circles. */
class ArcMendingTest {
    private static final double EPS = 1e-12;

    private static Polygon pipe(double outer, double inner, double shift) {
        return Drawing.FACTORY.createPolygon(Drawing.circle(0, 0, outer), new LinearRing[] {turned(shift, inner)});
    }

    /** A circle about (shift, 0) whose points lie between those of one about the origin. */
    private static LinearRing turned(double shift, double radius) {
        Circle circle = new Circle(shift, 0, radius);
        double angle = Math.toRadians(15);
        Coordinate start = new Coordinate(shift + radius * Math.cos(angle), radius * Math.sin(angle));
        return new PathBuilder(start).arcTo(circle, start, true).ring(Drawing.FACTORY);
    }

    private static Set<Circle> circles(Geometry polygons) {
        Set<Circle> circles = new HashSet<>();
        ArcCutter.forEachRing(polygons, ring -> {
            for (int i = 0; i + 1 < ring.getNumPoints(); i++) {
                circles.add(Arcs.circle(ring, i));
            }
            return ring;
        });
        return circles;
    }

    /** Area within the arcs, m²: the chords' area and the lenses. */
    private static double area(Geometry polygons) {
        double[] sum = {polygons.getArea()};
        for (int i = 0; i < polygons.getNumGeometries(); i++) {
            Polygon polygon = (Polygon) polygons.getGeometryN(i);
            ArcCutter.forEachRing(polygon, ring -> {
                boolean shell = ring.equalsExact(polygon.getExteriorRing());
                boolean ccw = Orientation.isCCW(ring.getCoordinates());
                for (int k = 0; k + 1 < ring.getNumPoints(); k++) {
                    Circle circle = Arcs.circle(ring, k);
                    if (circle != null) {
                        Coordinate a = ring.getCoordinateN(k);
                        Coordinate b = ring.getCoordinateN(k + 1);
                        double turn = circle.turn(a.x, a.y, b.x, b.y);
                        double lens = 0.5 * circle.radius() * circle.radius() * (turn - Math.sin(turn));
                        sum[0] += (ccw == shell) ? lens : -lens;
                    }
                }
                return ring;
            });
        }
        return sum[0];
    }

    @Test
    void aWallThinnerThanTheLensesOfItsArcsIsSound() {
        // The chords of the outer circle come to 0.966 of its radius: within the hole's circle.
        List<Finding> found = Drawing.check(Drawing.of(pipe(0.05, 0.049, 0)));
        assertThat(found).isEmpty();
    }

    @Test
    void aHoleThatOnlyCrossesBetweenTheArcsIsFound() {
        // The chords next to the side x = 0.05 come to 0.0485 only; the arc between reaches to 0.0502.
        Polygon plate = Drawing.FACTORY.createPolygon(
                Drawing.FACTORY.createLinearRing(new Coordinate[] {
                    new Coordinate(-0.2, -0.2),
                    new Coordinate(0.05, -0.2),
                    new Coordinate(0.05, 0.2),
                    new Coordinate(-0.2, 0.2),
                    new Coordinate(-0.2, -0.2)
                }),
                new LinearRing[] {turned(0, 0.0502)});
        assertThat(plate.isValid()).isTrue();
        assertThat(Drawing.check(Drawing.of(plate))).singleElement().satisfies(f -> {
            assertThat(f.code()).isEqualTo("hole-outside");
            // A segment of a circle, r² (φ − sin φ cos φ) with φ = acos(0.05/0.0502): 1.1941 mm², here by short chords.
            assertThat(f.what()).contains("partly", "with 1.193", " mm²", "(50.09");
        });
    }

    @Test
    void aThinWallOfArcsIsNotedWithItsTrueWidth() {
        List<Finding> found = Drawing.check(Drawing.of(pipe(0.05, 0.049995, 0)));
        assertThat(found).singleElement().satisfies(f -> {
            assertThat(f.severity()).isEqualTo(Finding.Severity.NOTE);
            assertThat(f.what()).contains("thin layer, 0.005 mm wide over a length of 314.");
        });
    }

    @Test
    void neighboursThatShareACircleWithOtherPointsTouch() {
        Polygon disc = Drawing.FACTORY.createPolygon(turned(0, 0.03));
        Polygon ring = Drawing.FACTORY.createPolygon(
                Drawing.circle(0, 0, 0.05), new LinearRing[] {Drawing.circle(0, 0, 0.03)});
        List<RegionShape> shapes = Drawing.of(ring, disc);
        assertThat(Drawing.check(shapes).stream().filter(f -> !f.code().equals("thin-layer")))
                .isEmpty();
        assertThat(Drawing.mend(shapes).changes()).isEmpty();
    }

    @Test
    void mendedArcsKeepTheirCircles() {
        Circle right = new Circle(0.03, 0, 0.05);
        Polygon one = Drawing.FACTORY.createPolygon(Drawing.circle(0, 0, 0.05));
        Polygon two = Drawing.FACTORY.createPolygon(PathBuilder.ring(right, Drawing.FACTORY));
        MendedOutline mended =
                Drawing.mend(Drawing.of((Geometry) Drawing.FACTORY.createMultiPolygon(new Polygon[] {one, two})));
        assertThat(mended.changes())
                .singleElement()
                .satisfies(c -> assertThat(c.code()).isEqualTo("mended-piece-overlap"));
        assertThat(mended.remaining()).isEmpty();
        Geometry joined = mended.shapes().get(0).polygons();
        assertThat(circles(joined)).containsExactlyInAnyOrder(new Circle(0, 0, 0.05), right);
        // Two circles of one radius less the lens between them.
        double half = Math.acos(0.015 / 0.05);
        double common = 2 * 0.05 * 0.05 * (half - Math.sin(half) * Math.cos(half));
        assertThat(area(joined)).isCloseTo(2 * Math.PI * 0.0025 - common, within(1e-9));
    }

    @Test
    void aGapBetweenArcsIsClosedOntoTheNeighboursCircle() {
        Polygon disc = Drawing.FACTORY.createPolygon(Drawing.circle(0, 0, 0.03));
        Polygon collar =
                Drawing.FACTORY.createPolygon(Drawing.circle(0, 0, 0.05), new LinearRing[] {turned(0, 0.030004)});
        List<RegionShape> shapes = Drawing.of(disc, collar);
        assertThat(Drawing.check(shapes)).singleElement().satisfies(f -> {
            assertThat(f.code()).isEqualTo("gap");
            assertThat(f.what()).contains("0.004 mm wide over a length of 188.");
        });
        MendedOutline mended = Drawing.mend(shapes);
        assertThat(mended.remaining()).isEmpty();
        assertThat(circles(mended.shapes().get(1).polygons()))
                .containsExactlyInAnyOrder(new Circle(0, 0, 0.03), new Circle(0, 0, 0.05));
    }

    @Test
    void writtenArcsReadBackToTheSameCircles() {
        Circle[] drawn = {
            new Circle(0.0123456789, -0.2, 0.05), new Circle(1 / 3.0, 2 / 7.0, Math.PI / 100), new Circle(5, 7, 0.001)
        };
        List<Circle> read = new ArrayList<>();
        for (Circle circle : drawn) {
            String text = new OutlineText(Drawing.MILLIMETRE)
                    .record("a", Drawing.FACTORY.createPolygon(PathBuilder.ring(circle, Drawing.FACTORY)))
                    .toString();
            assertThat(text).startsWith("a: CURVEPOLYGON (CIRCULARSTRING (").doesNotContain("COMPOUND");
            read.add(Arcs.circle(arc(text), 0));
        }
        for (int i = 0; i < drawn.length; i++) {
            assertThat(read.get(i).x()).isCloseTo(drawn[i].x(), within(4 * Math.ulp(drawn[i].x())));
            assertThat(read.get(i).radius()).isCloseTo(drawn[i].radius(), within(4 * Math.ulp(drawn[i].x())));
        }
    }

    @Test
    void anArcBetweenStraightSidesIsWrittenWhole() {
        Circle circle = new Circle(0.1, 0, 0.05);
        LinearRing half = new PathBuilder(new Coordinate(0.15, 0))
                .arcTo(circle, new Coordinate(0.05, 0), true)
                .lineTo(new Coordinate(0.15, 0))
                .ring(Drawing.FACTORY);
        String text = new OutlineText(Drawing.MILLIMETRE)
                .record("half disc", Drawing.FACTORY.createPolygon(half))
                .toString();
        assertThat(text).startsWith("half disc: CURVEPOLYGON (COMPOUNDCURVE (CIRCULARSTRING (150 0, ");
        assertThat(text).endsWith(", 50 0), (50 0, 150 0)))\n");
        Circle read = Arcs.circle(arc(text), 0);
        assertThat(read.x()).isCloseTo(0.1, within(EPS));
        assertThat(read.y()).isCloseTo(0, within(EPS));
        assertThat(read.radius()).isCloseTo(0.05, within(EPS));
    }

    /** The first circular string of a text, read as three points. */
    private static LineString arc(String text) {
        MatchResult found = Pattern.compile("CIRCULARSTRING \\(([^)]*)\\)")
                .matcher(text)
                .results()
                .findFirst()
                .orElseThrow();
        List<Coordinate> points = new ArrayList<>();
        for (String point : found.group(1).split(", ")) {
            String[] xy = point.split(" ");
            points.add(new Coordinate(
                    Drawing.MILLIMETRE.toMetres(Double.parseDouble(xy[0])),
                    Drawing.MILLIMETRE.toMetres(Double.parseDouble(xy[1]))));
        }
        return new PathBuilder(points.get(0))
                .arcThrough(points.get(1), points.get(2))
                .line(Drawing.FACTORY);
    }
}
