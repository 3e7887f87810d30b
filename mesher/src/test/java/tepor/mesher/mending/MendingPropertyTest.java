package tepor.mesher.mending;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import java.util.function.BiFunction;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.MultiPolygon;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.util.AffineTransformation;
import org.locationtech.jts.operation.overlayng.OverlayNG;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Finding.Severity;
import tepor.mesher.section.RegionShape;
import tepor.mesher.soundness.Closeness;

/** Random polygons, spoiled in known ways: the fault is found, mended, and the area stays within what is claimed. */
class MendingPropertyTest {
    private static final int CASES = 150;

    /** A spoiled outline, and the area that it means. */
    private record Spoiled(List<Geometry> outlines, double area) {}

    /** A polygon that its centre sees whole, of 5 to 40 points, about 100 mm across. */
    private static Coordinate[] star(Random random) {
        int count = 5 + random.nextInt(36);
        Coordinate[] points = new Coordinate[count + 1];
        for (int i = 0; i < count; i++) {
            double angle = 2 * Math.PI * (i + 0.6 * random.nextDouble()) / count;
            double radius = 0.03 + 0.02 * random.nextDouble();
            points[i] = new Coordinate(radius * Math.cos(angle), radius * Math.sin(angle));
        }
        points[count] = points[0].copy();
        return points;
    }

    private static Polygon polygon(List<Coordinate> points) {
        return Drawing.FACTORY.createPolygon(points.toArray(new Coordinate[0]));
    }

    private static Spoiled withSpike(Random random, Coordinate[] star) {
        List<Coordinate> points = new ArrayList<>(List.of(star));
        int i = 1 + random.nextInt(star.length - 2);
        double reach = 1.2 + random.nextDouble();
        Coordinate tip = new Coordinate(reach * star[i].x, reach * star[i].y);
        points.add(i + 1, tip);
        points.add(i + 2, star[i].copy());
        return new Spoiled(List.of(polygon(points)), polygon(List.of(star)).getArea());
    }

    private static Spoiled withCrowdedPoints(Random random, Coordinate[] star) {
        List<Coordinate> points = new ArrayList<>(List.of(star));
        int i = 1 + random.nextInt(star.length - 2);
        // Snap is about 1.3e-8 m here.
        double off = random.nextBoolean() ? 0 : 2e-8 + 3e-8 * random.nextDouble();
        points.add(i + 1, new Coordinate(star[i].x + off, star[i].y - off));
        return new Spoiled(List.of(polygon(points)), polygon(List.of(star)).getArea());
    }

    private static Spoiled withSwappedPoints(Random random, Coordinate[] star) {
        LinearRing ring = null;
        int first = random.nextInt(star.length - 3);
        for (int k = 0; ring == null || ring.isSimple(); k++) {
            // Now and then two points may change places without a crossing.
            List<Coordinate> points = new ArrayList<>(List.of(star));
            int i = 1 + (first + k) % (star.length - 3);
            points.set(i, star[i + 1]);
            points.set(i + 1, star[i]);
            ring = Drawing.FACTORY.createLinearRing(points.toArray(new Coordinate[0]));
        }
        // All winding numbers of a swap are 0, 1, −1 or 2: the non-zero rule by an independent count over rows.
        return new Spoiled(List.of(Drawing.FACTORY.createPolygon(ring)), rasterArea(ring));
    }

    /** Area of winding not zero, from the lengths of 2000 rows, m². */
    private static double rasterArea(LinearRing ring) {
        Coordinate[] points = ring.getCoordinates();
        int rows = 2000;
        double height = 0.1 / rows;
        double area = 0;
        for (int row = 0; row < rows; row++) {
            double y = -0.05 + (row + 0.5) * height;
            List<double[]> crossings = new ArrayList<>(); // x, and how the winding number changes
            for (int i = 0; i + 1 < points.length; i++) {
                Coordinate a = points[i];
                Coordinate b = points[i + 1];
                if ((a.y <= y) != (b.y <= y)) {
                    crossings.add(new double[] {a.x + (y - a.y) / (b.y - a.y) * (b.x - a.x), a.y <= y ? 1 : -1});
                }
            }
            crossings.sort(Comparator.comparingDouble(c -> c[0]));
            int winding = 0;
            for (int i = 0; i + 1 < crossings.size(); i++) {
                winding += (int) crossings.get(i)[1];
                area += winding != 0
                        ? height * (crossings.get(i + 1)[0] - crossings.get(i)[0])
                        : 0;
            }
        }
        return area;
    }

    private static Spoiled withHoleOutside(Random random, Coordinate[] star) {
        Polygon shell = polygon(List.of(star));
        Coordinate[] small = new Coordinate[star.length];
        double angle = 2 * Math.PI * random.nextDouble();
        for (int i = 0; i < star.length; i++) {
            small[i] =
                    new Coordinate(0.2 * star[i].x + 0.04 * Math.cos(angle), 0.2 * star[i].y + 0.04 * Math.sin(angle));
        }
        Polygon hole = Drawing.FACTORY.createPolygon(small);
        double area = OverlayNGRobust.overlay(shell, hole, OverlayNG.DIFFERENCE).getArea();
        Polygon spoiled =
                Drawing.FACTORY.createPolygon(shell.getExteriorRing(), new LinearRing[] {hole.getExteriorRing()});
        return new Spoiled(List.of(spoiled), area);
    }

    private static Spoiled withOverlappingPieces(Random random, Coordinate[] star) {
        Polygon one = polygon(List.of(star));
        Geometry two = AffineTransformation.translationInstance(0.01 + 0.05 * random.nextDouble(), 0.01)
                .transform(one);
        MultiPolygon both = Drawing.FACTORY.createMultiPolygon(new Polygon[] {one, (Polygon) two});
        return new Spoiled(
                List.of(both),
                OverlayNGRobust.overlay(one, two, OverlayNG.UNION).getArea());
    }

    /** The star is cut along a line through its centre, and one half is moved off, or over the other. */
    private static Spoiled withGap(Random random, Coordinate[] star) {
        Polygon whole = polygon(List.of(star));
        double angle = 2 * Math.PI * random.nextDouble();
        Coordinate along = new Coordinate(Math.cos(angle), Math.sin(angle));
        Coordinate across = new Coordinate(-Math.sin(angle), Math.cos(angle));
        Geometry half = Drawing.FACTORY.createPolygon(new Coordinate[] {
            new Coordinate(-along.x, -along.y),
            new Coordinate(along.x, along.y),
            new Coordinate(along.x + across.x, along.y + across.y),
            new Coordinate(across.x - along.x, across.y - along.y),
            new Coordinate(-along.x, -along.y)
        });
        Geometry left = OverlayNGRobust.overlay(whole, half, OverlayNG.INTERSECTION);
        Geometry right = OverlayNGRobust.overlay(whole, half, OverlayNG.DIFFERENCE);
        double gap = (random.nextBoolean() ? 1 : -1) * (1e-6 + 5e-6 * random.nextDouble());
        Geometry moved = AffineTransformation.translationInstance(gap * across.x, gap * across.y)
                .transform(left);
        return new Spoiled(List.of(right, moved), whole.getArea());
    }

    @TestFactory
    List<DynamicTest> spoiledOutlinesAreMended() {
        return List.of(
                property("spike", MendingPropertyTest::withSpike, 0),
                property("crowded points", MendingPropertyTest::withCrowdedPoints, 0),
                property("swapped points", MendingPropertyTest::withSwappedPoints, 2e-6),
                property("hole outside", MendingPropertyTest::withHoleOutside, 0),
                property("overlapping pieces", MendingPropertyTest::withOverlappingPieces, 0),
                property("gap or sliver", MendingPropertyTest::withGap, 0));
    }

    private static DynamicTest property(
            String name, BiFunction<Random, Coordinate[], Spoiled> spoil, double rasterError) {
        return DynamicTest.dynamicTest(name, () -> {
            for (int seed = 0; seed < CASES; seed++) {
                Random random = new Random(seed);
                Spoiled spoiled = spoil.apply(random, star(random));
                List<RegionShape> shapes = Drawing.of(spoiled.outlines().toArray(new Geometry[0]));
                assertThat(faults(Drawing.check(shapes)))
                        .as("%s, seed %d: found", name, seed)
                        .isNotEmpty();
                MendedOutline mended = Drawing.mend(shapes);
                assertThat(mended.changes()).as("%s, seed %d: told", name, seed).isNotEmpty();
                assertThat(faults(Drawing.check(mended.shapes())))
                        .as("%s, seed %d: mended", name, seed)
                        .isEmpty();
                Closeness closeness = Closeness.of(shapes, Double.NaN);
                Geometry all = OverlayNGRobust.union(
                        mended.shapes().stream().map(RegionShape::polygons).toList());
                double bound = shapes.size() == 1 ? 10 * closeness.snap() : closeness.gap();
                assertThat(Math.abs(all.getArea() - spoiled.area()))
                        .as("%s, seed %d: area", name, seed)
                        .isLessThanOrEqualTo(bound * all.getLength() + rasterError);
            }
        });
    }

    private static List<Finding> faults(List<Finding> findings) {
        return findings.stream().filter(f -> f.severity() != Severity.NOTE).toList();
    }

    @Test
    void soundOutlinesAreLeftAsTheyAre() {
        for (int seed = 0; seed < CASES; seed++) {
            Polygon polygon = polygon(List.of(star(new Random(seed))));
            List<RegionShape> shapes = Drawing.of(polygon);
            MendedOutline mended = Drawing.mend(shapes);
            assertThat(mended.changes()).isEmpty();
            assertThat(mended.shapes().get(0).polygons().equalsExact(polygon)).isTrue();
        }
    }
}
