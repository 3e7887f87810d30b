package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.ShrinkingMode;
import net.jqwik.api.constraints.IntRange;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.util.AffineTransformation;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;

/** Random regions laid over each other, against areas from JTS's overlay. */
class SectionPropertyTest {
    private static final GeometryFactory FACTORY = new GeometryFactory();

    private static Geometry polygon(Coordinate... corners) {
        Coordinate[] ring = new Coordinate[corners.length + 1];
        System.arraycopy(corners, 0, ring, 0, corners.length);
        ring[corners.length] = corners[0].copy();
        return FACTORY.createPolygon(ring);
    }

    private static Geometry rectangle(double x0, double y0, double x1, double y1) {
        return polygon(new Coordinate(x0, y0), new Coordinate(x1, y0), new Coordinate(x1, y1), new Coordinate(x0, y1));
    }

    /** A star-shaped polygon around a random centre, so that it is simple whatever the radii. */
    private static Geometry star(Random random, int corners) {
        double cx = random.nextDouble() * 10;
        double cy = random.nextDouble() * 10;
        Coordinate[] points = new Coordinate[corners];
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * (i + 0.8 * random.nextDouble()) / corners;
            double radius = 0.5 + 4 * random.nextDouble();
            points[i] = new Coordinate(cx + radius * Math.cos(angle), cy + radius * Math.sin(angle));
        }
        return polygon(points);
    }

    /** What is left of each shape under the later ones, m². */
    private static double[] areasLeft(List<Geometry> shapes) {
        double[] areas = new double[shapes.size()];
        double over = 0;
        for (int r = areas.length - 1; r >= 0; r--) {
            double all = OverlayNGRobust.union(shapes.subList(r, areas.length)).getArea();
            areas[r] = all - over;
            over = all;
        }
        return areas;
    }

    /** Builds, audits, and compares areas with what JTS leaves of each region. */
    private static void check(List<Geometry> drawnShapes, double snap, double areaTolerance) {
        List<Geometry> shapes = new ArrayList<>(drawnShapes);
        double[] areas = areasLeft(shapes);
        // A region of which nothing is left would be refused; without it, others may show that were hidden.
        for (int r = shapes.size() - 1; r >= 0; r--) {
            if (areas[r] < 0.05) {
                shapes.remove(r);
                areas = areasLeft(shapes);
            }
        }
        Drawn drawn = new Drawn().snap(snap);
        for (int r = 0; r < shapes.size(); r++) {
            drawn.add("r" + r, shapes.get(r), false);
        }
        Section section = drawn.build();
        double sum = 0;
        for (int r = 0; r < shapes.size(); r++) {
            assertThat(section.area(r)).isCloseTo(areas[r], within(areaTolerance));
            sum += section.area(r);
        }
        assertThat(sum).isCloseTo(OverlayNGRobust.union(shapes).getArea(), within(areaTolerance * shapes.size()));
    }

    @Property(tries = 30)
    void rectanglesOnACoarseGrid(@ForAll long seed, @ForAll @IntRange(min = 1, max = 12) int count) {
        Random random = new Random(seed);
        List<Geometry> shapes = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            int x = random.nextInt(8);
            int y = random.nextInt(8);
            shapes.add(rectangle(x, y, x + 1 + random.nextInt(4), y + 1 + random.nextInt(4)));
        }
        check(shapes, Double.NaN, 1e-9);
    }

    @Property(tries = 30)
    void starsAnywhere(@ForAll long seed, @ForAll @IntRange(min = 1, max = 8) int count) {
        Random random = new Random(seed);
        List<Geometry> shapes = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            shapes.add(star(random, 3 + random.nextInt(12)));
        }
        // JTS leaves out slivers by nothing; ours may lose some snap in breadth along all borders.
        check(shapes, 1e-9, 1e-6);
    }

    @Property(tries = 30, shrinking = ShrinkingMode.OFF)
    void carelesslyDrawnRectanglesFallTogether(@ForAll long seed, @ForAll @IntRange(min = 2, max = 14) int count) {
        Random random = new Random(seed);
        double snap = 1e-3;
        List<Geometry> shapes = new ArrayList<>();
        List<Geometry> exact = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            int x = random.nextInt(6);
            int y = random.nextInt(6);
            int w = 1 + random.nextInt(4);
            int h = 1 + random.nextInt(4);
            exact.add(rectangle(x, y, x + w, y + h));
            Coordinate[] corners = exact.get(i).getCoordinates();
            for (int c = 0; c < 4; c++) {
                corners[c].x += 0.35 * snap * (2 * random.nextDouble() - 1);
                corners[c].y += 0.35 * snap * (2 * random.nextDouble() - 1);
            }
            shapes.add(polygon(corners[0], corners[1], corners[2], corners[3]));
        }
        check(shapes, snap, 0.05);
    }

    @Property(tries = 20, shrinking = ShrinkingMode.OFF)
    void starsWithASnapThatMatters(@ForAll long seed, @ForAll @IntRange(min = 2, max = 8) int count) {
        Random random = new Random(seed);
        List<Geometry> shapes = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            shapes.add(star(random, 3 + random.nextInt(20)));
        }
        check(shapes, 0.01, 2.0);
    }

    @Property(tries = 20)
    void turnedAndMovedFarAway(@ForAll long seed, @ForAll @IntRange(min = 1, max = 8) int count) {
        Random random = new Random(seed);
        AffineTransformation far = AffineTransformation.rotationInstance(random.nextDouble() * 6)
                .translate(1e5 * random.nextDouble(), -1e5 * random.nextDouble());
        List<Geometry> shapes = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            int x = random.nextInt(8);
            int y = random.nextInt(8);
            shapes.add(far.transform(rectangle(x, y, x + 1 + random.nextInt(4), y + 1 + random.nextInt(4))));
        }
        check(shapes, 1e-6, 1e-4);
    }
}
