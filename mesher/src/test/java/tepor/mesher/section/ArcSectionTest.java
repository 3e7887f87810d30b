package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.PathBuilder;

class ArcSectionTest {
    private static final GeometryFactory FACTORY = new GeometryFactory();

    private static Polygon disc(double x, double y, double r) {
        return FACTORY.createPolygon(PathBuilder.ring(new Circle(x, y, r), FACTORY));
    }

    private static Polygon halfDisc(double x, double y, double r) {
        Coordinate left = new Coordinate(x - r, y);
        return FACTORY.createPolygon(new PathBuilder(new Coordinate(x + r, y))
                .arcTo(new Circle(x, y, r), left, true)
                .lineTo(new Coordinate(x + r, y))
                .ring(FACTORY));
    }

    /** Common area of two discs: a textbook formula of plane geometry. */
    private static double commonArea(double r, double s, double d) {
        double a = Math.acos((d * d + r * r - s * s) / (2 * d * r));
        double b = Math.acos((d * d + s * s - r * r) / (2 * d * s));
        return r * r * (a - Math.sin(2 * a) / 2) + s * s * (b - Math.sin(2 * b) / 2);
    }

    @Test
    void areasOfADiscInAPlateAreExact() {
        Section section = new Drawn()
                .region("plate", Drawn.box(0, 0, 3, 2))
                .add("disc", disc(1.5, 1, 0.5), false)
                .build();
        assertThat(section.area(1)).isCloseTo(Math.PI / 4, within(1e-14));
        assertThat(section.area(0)).isCloseTo(6 - Math.PI / 4, within(1e-14));
        assertThat(section.hasArcs()).isTrue();
    }

    @Test
    void arcsOfThreeRegionsLaidOverEachOtherKeepTheirCircles() {
        Circle first = new Circle(0.1, 0.2, 1.0 / 3);
        Circle second = new Circle(0.4, 0.3, 0.31);
        Circle third = new Circle(0.2, 0.5, 0.2999);
        Drawn drawn = new Drawn();
        for (Circle c : List.of(first, second, third)) {
            drawn.add("disc " + c.x(), FACTORY.createPolygon(PathBuilder.ring(c, FACTORY)), false);
        }
        Section section = drawn.build();
        Set<Circle> found = new HashSet<>();
        for (int s = 0; s < section.segmentCount(); s++) {
            Circle c = section.circle(s);
            assertThat(c).isIn(first, second, third);
            found.add(c);
            for (int v : new int[] {section.start(s), section.end(s)}) {
                assertThat(c.offset(section.x(v), section.y(v))).isCloseTo(0, within(section.snap()));
            }
        }
        assertThat(found).containsExactlyInAnyOrder(first, second, third);
        assertThat(section.area(2)).isCloseTo(Math.PI * 0.2999 * 0.2999, within(1e-9));
        double d = Math.hypot(0.2, 0.2);
        assertThat(section.area(1)).isCloseTo(Math.PI * 0.31 * 0.31 - commonArea(0.31, 0.2999, d), within(1e-9));
    }

    @Test
    void aDiscThatRestsOnALineTouchesItInOneVertex() {
        Section section = new Drawn()
                .region("ground", Drawn.box(-1, -1, 1, 0))
                .add("pipe", disc(0.05, 0.2, 0.2), false)
                .build();
        int touching = vertexAt(section, 0.05, 0);
        assertThat(degree(section, touching)).isEqualTo(4);
        assertThat(section.area(0)).isCloseTo(2, within(1e-9));
        assertThat(section.area(1)).isCloseTo(Math.PI * 0.04, within(1e-9));
    }

    @Test
    void discsThatTouchFromOutsideAndInsideShareOneVertex() {
        Section section = new Drawn()
                .add("large", disc(0, 0, 1), false)
                .add("inner", disc(0.6 * Math.cos(0.3), 0.6 * Math.sin(0.3), 0.4), false)
                .add("outer", disc(1.25 * Math.cos(2), 1.25 * Math.sin(2), 0.25), false)
                .build();
        assertThat(degree(section, vertexAt(section, Math.cos(0.3), Math.sin(0.3))))
                .isEqualTo(4);
        assertThat(degree(section, vertexAt(section, Math.cos(2), Math.sin(2)))).isEqualTo(4);
        assertThat(section.area(0)).isCloseTo(Math.PI * (1 - 0.16), within(1e-9));
        assertThat(section.area(1)).isCloseTo(Math.PI * 0.16, within(1e-9));
        assertThat(section.area(2)).isCloseTo(Math.PI * 0.0625, within(1e-9));
    }

    @Test
    void theSameCircleDrawnTwiceIsOneBorder() {
        Section section = new Drawn()
                .region("plate", Drawn.box(-1, -1, 1, 1))
                .add("hole", disc(0.1, 0.1, 0.5), true)
                .add("plug", disc(0.1 + 1e-9, 0.1, 0.5 - 1e-9), false)
                .snap(1e-7)
                .build();
        assertThat(section.segmentCount()).isEqualTo(4 + 12);
        assertThat(section.area(1)).isZero();
        assertThat(section.area(2)).isCloseTo(Math.PI * 0.25, within(1e-8));
    }

    @Test
    void aThinPipeWallThatItsChordsWouldCrossIsClear() {
        double angle = 0.1; // the inner circle begins where the outer chords sag most
        Coordinate start = new Coordinate(0.995 * Math.cos(angle), 0.995 * Math.sin(angle));
        Polygon inner = FACTORY.createPolygon(new PathBuilder(start)
                .arcTo(new Circle(0, 0, 0.995), start, true)
                .ring(FACTORY));
        Section section = new Drawn()
                .add("wall", disc(0, 0, 1), false)
                .add("bore", inner, true)
                .build();
        assertThat(section.area(0)).isCloseTo(Math.PI * (1 - 0.995 * 0.995), within(1e-12));
        assertLensesAreClear(section);
    }

    @Test
    void anArcAndItsChordAreTwoBorders() {
        double r = 2;
        double half = Math.toRadians(10);
        Coordinate a = new Coordinate(r * Math.cos(-half), r * Math.sin(-half));
        Coordinate b = new Coordinate(r * Math.cos(half), r * Math.sin(half));
        Polygon cap = FACTORY.createPolygon(
                new PathBuilder(a).arcTo(new Circle(0, 0, r), b, true).lineTo(a).ring(FACTORY));
        Section section = new Drawn().add("cap", cap, false).build();
        assertThat(section.area(0)).isCloseTo(r * r * (half - Math.sin(half) * Math.cos(half)), within(1e-13));
    }

    @Test
    void randomDiscsAndHalfDiscsHaveTheAreasOfFinePolygons() {
        for (int seed = 0; seed < 120; seed++) {
            Random random = new Random(seed);
            Drawn drawn = new Drawn();
            List<Geometry> fine = new ArrayList<>();
            int count = 2 + random.nextInt(7);
            for (int i = 0; i < count; i++) {
                boolean grid = random.nextBoolean(); // places on a grid make circles touch and centres coincide
                double x = grid ? random.nextInt(5) * 0.25 : random.nextDouble();
                double y = grid ? random.nextInt(5) * 0.25 : random.nextDouble();
                double r = grid ? 0.125 * (1 + random.nextInt(4)) : 0.05 + 0.5 * random.nextDouble();
                boolean half = random.nextInt(3) == 0;
                drawn.add("r" + i, half ? halfDisc(x, y, r) : disc(x, y, r), false);
                Geometry shape = finePolygon(x, y, r, half);
                for (int k = 0; k < fine.size(); k++) {
                    fine.set(k, fine.get(k).difference(shape));
                }
                fine.add(shape);
            }
            var tried = drawn.tryBuild();
            if (tried.isEmpty()) {
                assertThat(drawn.findings.all())
                        .as("seed %d", seed)
                        .anyMatch(f -> f.code().equals("region-covered"));
                continue;
            }
            Section section = tried.get();
            for (int r = 0; r < count; r++) {
                assertThat(section.area(r))
                        .as("seed %d, region %d", seed, r)
                        .isCloseTo(fine.get(r).getArea(), within(2e-5));
            }
            assertLensesAreClear(section);
        }
    }

    private static Geometry finePolygon(double x, double y, double r, boolean half) {
        int n = 2000;
        Coordinate[] points = new Coordinate[n + 1];
        for (int i = 0; i < n; i++) {
            double angle = (half ? Math.PI * i / (n - 1) : 2 * Math.PI * i / n);
            points[i] = new Coordinate(x + r * Math.cos(angle), y + r * Math.sin(angle));
        }
        points[n] = points[0].copy();
        return FACTORY.createPolygon(points);
    }

    private static int vertexAt(Section section, double x, double y) {
        for (int v = 0; v < section.vertexCount(); v++) {
            if (Math.hypot(section.x(v) - x, section.y(v) - y) < 2 * section.snap()) {
                return v;
            }
        }
        throw new AssertionError("no vertex at (" + x + " " + y + ")");
    }

    private static int degree(Section section, int vertex) {
        int degree = 0;
        for (int s = 0; s < section.segmentCount(); s++) {
            degree += section.start(s) == vertex || section.end(s) == vertex ? 1 : 0;
        }
        return degree;
    }

    /** No vertex in a lens thicker than snap, and chords that meet only at vertices. */
    private static void assertLensesAreClear(Section section) {
        for (int s = 0; s < section.segmentCount(); s++) {
            Circle c = section.circle(s);
            if (c == null || c.sagitta(section.chord(s)) <= section.snap()) {
                continue;
            }
            double ax = section.x(section.start(s));
            double ay = section.y(section.start(s));
            double dx = section.x(section.end(s)) - ax;
            double dy = section.y(section.end(s)) - ay;
            double bulge = Math.signum(c.turn(ax, ay, ax + dx, ay + dy));
            for (int v = 0; v < section.vertexCount(); v++) {
                double off = bulge * (dy * (section.x(v) - ax) - dx * (section.y(v) - ay)) / section.chord(s);
                boolean own = v == section.start(s) || v == section.end(s);
                assertThat(!own && off > 0 && c.offset(section.x(v), section.y(v)) < 0)
                        .as("vertex %d in the lens of segment %d", v, s)
                        .isFalse();
            }
        }
    }
}
