package tepor.mesher.dxf;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.CurveArea;

/** Every kind of entity by drawings whose area or length is known in closed form. */
class EntityAreaTest {
    private static final String SQUARE = "LINE;8 a;10 0;20 0;11 2;21 0\nLINE;8 a;10 2;20 0;11 2;21 2\n"
            + "LINE;8 a;10 2;20 2;11 0;21 2\nLINE;8 a;10 0;20 2;11 0;21 0";

    /** Area as a multiple of π, and the rest of it. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "4     | 0  | CIRCLE;8 a;10 5;20 7;40 2",
                "4     | 0  | ARC;8 a;10 5;20 7;40 2;50 30;51 390",
                "2     | 0  | ARC;8 a;10 0;20 0;40 2;50 0;51 180;LINE;8 a;10 -2;20 0;11 2;21 0",
                "4     | 0  | ARC;8 a;10 0;20 0;40 2;50 90;51 270;ARC;8 a;10 0;20 0;40 2;50 270;51 90",
                "1     | 0  | ARC;8 a;10 0;20 0;40 2;50 350;51 80;LINE;8 a;10 0;20 0;11 1.969615506024416;21 -0.34729635533386066;LINE;8 a;10 0;20 0;11 0.34729635533386066;21 1.969615506024416",
                "1     | 0  | LWPOLYLINE;8 a;90 2;70 1;10 -1;20 0;42 1;10 1;20 0;42 1",
                "1     | 0  | LWPOLYLINE;8 a;90 2;70 1;10 -1;20 0;42 -1;10 1;20 0;42 -1",
                "0.5   | 4  | LWPOLYLINE;8 a;90 4;70 1;10 0;20 0;10 2;20 0;10 2;20 2;42 1;10 0;20 2",
                "-0.5  | 4  | LWPOLYLINE;8 a;90 4;70 1;10 0;20 0;10 2;20 0;10 2;20 2;42 -1;10 0;20 2",
                "-0.5  | 4  | LWPOLYLINE;8 a;90 4;70 1;210 0;220 0;230 -1;10 0;20 0;10 2;20 0;10 2;20 2;42 -1;10 0;20 2",
                "0.5   | 4  | POLYLINE;8 a;66 1;70 1;10 0;20 0;30 0;VERTEX;8 a;10 0;20 0;VERTEX;8 a;10 2;20 0;VERTEX;8 a;10 2;20 2;42 1;VERTEX;8 a;10 0;20 2;SEQEND;8 a",
                "0     | 4  | POLYLINE;8 a;70 5;66 1;VERTEX;70 16;10 9;20 9;VERTEX;70 8;10 0;20 0;VERTEX;70 8;10 2;20 0;VERTEX;70 8;10 2;20 2;VERTEX;70 8;10 0;20 2;SEQEND",
                "0     | 4  | LWPOLYLINE;8 a;90 5;10 0;20 0;10 2;20 0;10 2;20 2;10 0;20 2;10 0;20 0",
                "0     | 4  | LINE;8 a;10 0;20 0;11 2;21 0;LINE;8 a;10 2;20 2;11 2;21 0;LWPOLYLINE;8 a;90 3;10 2;20 2;10 0;20 2;10 0;20 0",
                "4     | 0  | ELLIPSE;8 a;10 1;20 1;11 0;21 2;40 1",
                "2     | 0  | ELLIPSE;8 a;10 1;20 1;11 2;21 0;40 1;41 0;42 3.141592653589793;LINE;8 a;10 -1;20 1;11 3;21 1",
                "0     | 2.6666666666666665 | SPLINE;8 a;70 8;71 1;40 0;40 0;40 1;40 2;40 2;10 0;20 0;10 1;20 2.6666666666666665;10 2;20 0;LINE;8 a;10 0;20 0;11 2;21 0",
            })
    void straightAndCircularShapesAreExact(double timesPi, double rest, String entities) {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(entities)).sound();
        assertThat(drawn.regions("a")).hasSize(1);
        assertThat(drawn.lines("a")).isEmpty();
        assertThat(drawn.area("a")).isCloseTo(timesPi * Math.PI + rest, within(1e-13));
    }

    /** Followed by arcs that leave the curve by 1e-5 of its extent, to one side and the other. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                // π a b
                "6.283185307179586  | ELLIPSE;8 a;10 1;20 1;11 2;21 0;40 0.5",
                "6.283185307179586  | ELLIPSE;8 a;10 1;20 1;11 1.2;21 1.6;40 0.5;210 0;220 0;230 -1",
                "3.141592653589793  | ELLIPSE;8 a;10 1;20 1;11 0;21 2;40 0.25",
                // a quarter of it
                "1.5707963267948966 | ELLIPSE;8 a;10 0;20 0;11 2;21 0;40 0.5;41 0;42 1.5707963267948966;LINE;8 a;10 0;20 0;11 2;21 0;LINE;8 a;10 0;20 0;11 0;21 1",
                // the rest, from the end of the axis on, clockwise about z
                "4.71238898038469   | ELLIPSE;8 a;10 0;20 0;11 2;21 0;40 0.5;41 1.5707963267948966;42 6.283185307179586;LINE;8 a;10 0;20 0;11 2;21 0;LINE;8 a;10 0;20 0;11 0;21 1",
                "4.71238898038469   | ELLIPSE;8 a;10 0;20 0;11 2;21 0;40 0.5;41 1.5707963267948966;42 6.283185307179586;210 0;220 0;230 -1;LINE;8 a;10 0;20 0;11 2;21 0;LINE;8 a;10 0;20 0;11 0;21 -1",
                // a parabola over its chord: two thirds of chord times height
                "1.3333333333333333 | SPLINE;8 a;70 8;71 2;72 6;73 3;40 0;40 0;40 0;40 1;40 1;40 1;10 0;20 0;10 1;20 2;10 2;20 0;LINE;8 a;10 0;20 0;11 2;21 0",
                // a Bézier cubic (0,0) (0,1) (1,1) (1,0): 3/5
                "0.6                | SPLINE;8 a;71 3;40 0;40 0;40 0;40 0;40 1;40 1;40 1;40 1;10 0;20 0;10 0;20 1;10 1;20 1;10 1;20 0;LINE;8 a;10 0;20 0;11 1;21 0",
                // a circle of radius 1 as a rational quadratic of four quarters
                "3.141592653589793  | SPLINE;8 a;70 11;71 2;40 0;40 0;40 0;40 1;40 1;40 2;40 2;40 3;40 3;40 4;40 4;40 4;41 1;41 0.7071067811865476;41 1;41 0.7071067811865476;41 1;41 0.7071067811865476;41 1;41 0.7071067811865476;41 1;10 1;20 0;10 1;20 1;10 0;20 1;10 -1;20 1;10 -1;20 0;10 -1;20 -1;10 0;20 -1;10 1;20 -1;10 1;20 0",
                // degree 5: y = 16 x (1 - x) as a Bézier curve raised in degree three times: 16/6
                "2.6666666666666665 | SPLINE;8 a;71 5;40 0;40 0;40 0;40 0;40 0;40 0;40 1;40 1;40 1;40 1;40 1;40 1;10 0;20 0;10 0.2;20 3.2;10 0.4;20 4.8;10 0.6;20 4.8;10 0.8;20 3.2;10 1;20 0;LINE;8 a;10 0;20 0;11 1;21 0",
                // a periodic uniform quadratic over the corners of a square of side 2: 4 less 4 corners of 1/6
                "3.3333333333333335 | SPLINE;8 a;70 3;71 2;40 -2;40 -1;40 0;40 1;40 2;40 3;40 4;40 5;40 6;10 0;20 0;10 2;20 0;10 2;20 2;10 0;20 2;10 0;20 0;10 2;20 0",
            })
    void curvesAreFollowedToTheirTolerance(double area, String entities) {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(entities)).sound();
        assertThat(drawn.regions("a")).hasSize(1);
        Geometry shape = drawn.regions("a").get(0);
        double bound = EntityDrawer.TOLERANCE * 5 * shape.getLength();
        assertThat(drawn.area("a")).isCloseTo(area, within(bound));
        assertThat(drawn.area("a")).isCloseTo(area, within(2e-5 * area));
        assertThat(shape.getNumPoints()).isLessThan(150);
    }

    @Test
    void arcsKeepCentreAndRadiusToTheBitAlsoThroughTheUnit() {
        String text = DrawnDxf.file("CIRCLE;8 a;10 140.3;20 70.1;40 40.7").replace(" 70\n6\n", " 70\n4\n");
        LineString ring = ((Polygon) DrawnDxf.read(text).sound().regions("a").get(0)).getExteriorRing();
        assertThat(ring.getNumPoints()).isEqualTo(13);
        for (int i = 0; i < 12; i++) {
            assertThat(Arcs.circle(ring, i)).isEqualTo(new Circle(140.3 / 1000, 70.1 / 1000, 40.7 / 1000));
        }
    }

    @Test
    void openEntitiesAreLinesOfTheirLength() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LINE;8 wire 1;10 0;20 0;11 3;21 4
                ARC;8 rim;10 0;20 0;40 2;50 0;51 90
                LWPOLYLINE;8 path;90 3;10 0;20 0;10 1;20 0;42 1;10 1;20 2
                ELLIPSE;8 bow;10 0;20 0;11 2;21 0;40 1;41 0;42 1
                POINT;8 probe;10 1;20 2
                POINT;8 probe;10 3;20 2
                """)).sound();
        assertThat(drawn.length("wire 1")).isCloseTo(5, within(1e-15));
        assertThat(drawn.length("rim")).isCloseTo(Math.PI, within(1e-14));
        assertThat(drawn.length("path")).isCloseTo(1 + Math.PI, within(1e-14));
        assertThat(drawn.length("bow")).isCloseTo(2, within(1e-14));
        assertThat(drawn.points("probe")).hasSize(2);
        assertThat(drawn.points("probe").get(1).getCoordinate().x).isEqualTo(3);
    }

    @Test
    void loopsWithinLoopsAreHolesAndLoopsInHolesAreAreasAgain() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                CIRCLE;8 a;10 0;20 0;40 1
                CIRCLE;8 a;10 0;20 0;40 10
                ARC;8 a;10 0;20 0;40 9.9;50 15;51 375
                CIRCLE;8 a;10 6;20 0;40 2
                CIRCLE;8 a;10 6;20 0;40 1
                """)).sound();
        List<Geometry> regions = drawn.regions("a");
        assertThat(regions).hasSize(3);
        assertThat(regions.stream().map(g -> ((Polygon) g).getNumInteriorRing()))
                .containsExactly(0, 1, 1);
        assertThat(drawn.area("a")).isCloseTo(Math.PI * (1 + 100 - 98.01 + 4 - 1), within(1e-12));
        assertThat(CurveArea.of(regions.get(1))).isCloseTo(Math.PI * 1.99, within(1e-12));
    }

    @Test
    void theOrderOfTheSidesOfALoopAndOfTheGroupsOfAnEntityDoesNotMatter() {
        String[] lines = SQUARE.split("\n");
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(String.join("\n", lines[2], lines[0], lines[3], lines[1])));
        assertThat(drawn.sound().area("a")).isEqualTo(4);
        DrawnDxf odd = DrawnDxf.read(DrawnDxf.file("""
                LINE;21 0;10 0;11 2;20 0;8 a
                LINE;11 2;21 2;10 2;20 0;100 AcDbEntity;8 a;100 AcDbLine
                LWPOLYLINE;20 2;10 2;20 2;10 0;42 0;20 0;10 0;70 0;8 a;90 3;5 AF
                """));
        assertThat(odd.sound().area("a")).isEqualTo(4);
    }
}
