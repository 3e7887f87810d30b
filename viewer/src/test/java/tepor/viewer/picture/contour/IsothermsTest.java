package tepor.viewer.picture.contour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.section.Section;
import tepor.solver.field.TemperatureField;
import tepor.viewer.picture.PatternedGrid;

class IsothermsTest {
    private static final double INNER = 0.05;
    private static final double OUTER = 0.10;

    /** Conduction through a ring: T = 80 − 60 ln(r/r1)/ln(r2/r1) (Incropera et al., Fundamentals, ch. 3.3). */
    private static double ringTemperature(double x, double y) {
        return 80 - 60 * Math.log(Math.hypot(x, y) / INNER) / Math.log(OUTER / INNER);
    }

    private static double ringRadius(double celsius) {
        return INNER * Math.pow(OUTER / INNER, (80 - celsius) / 60);
    }

    private static Isotherms isotherms(TemperatureField field) {
        return IsothermTracer.trace(field, TemperatureScale.of(TemperatureRange.of(field), 16), 0);
    }

    private static Isotherms ring(int nodesPerTriangle, int columns, int rows) {
        Mesh mesh = PatternedGrid.ring(INNER, OUTER, columns, rows).mesh(nodesPerTriangle);
        return isotherms(PatternedGrid.field(mesh, IsothermsTest::ringTemperature));
    }

    /** Greatest distance of an isotherm's points from its circle, m. */
    private static double deviation(Isotherms isotherms) {
        double most = 0;
        for (Isotherm line : isotherms.lines()) {
            double r = ringRadius(isotherms.scale().celsius(line.level()));
            for (int i = 0; i < line.xy().length; i += 2) {
                most = Math.max(most, Math.abs(Math.hypot(line.xy()[i], line.xy()[i + 1]) - r));
            }
        }
        return most;
    }

    @Test
    void isothermsOfARingAreCirclesAsCloseAsItsInterpolationAllows() {
        // The error of quadratic interpolation is of third order: halving the triangles divides it by eight.
        double coarse = deviation(ring(6, 64, 8));
        double fine = deviation(ring(6, 128, 16));
        assertThat(coarse).isLessThan(2e-3 * (OUTER - INNER));
        assertThat(Math.log(coarse / fine) / Math.log(2)).isBetween(2.7, 3.4);
    }

    @Test
    void eachIsothermOfARingIsOneClosedLine() {
        for (int nodes : new int[] {3, 6}) {
            Isotherms isotherms = ring(nodes, 96, 12);
            assertThat(isotherms.scale().count()).isBetween(9, 15);
            assertThat(isotherms.lines()).hasSize(isotherms.scale().count()).allMatch(Isotherm::closed);
            assertThat(isotherms.lines().stream().map(Isotherm::level).distinct())
                    .hasSize(isotherms.scale().count());
        }
    }

    @Test
    void areasOfARingAreThoseOfCircles() {
        Isotherms isotherms = ring(6, 256, 24);
        double whole = Isotherms.area(isotherms.section());
        assertThat(whole).isCloseTo(Math.PI * (OUTER * OUTER - INNER * INNER), within(4e-4 * whole));
        double hole = Math.PI * INNER * INNER;
        for (int i = 0; i < isotherms.areas().size(); i++) {
            double r = ringRadius(isotherms.scale().celsius(i));
            assertThat(Isotherms.area(isotherms.areas().get(i)))
                    .as("area within isotherm " + i)
                    .isCloseTo(Math.PI * r * r - hole, within(2e-4 * Math.PI * r * r));
        }
    }

    /** Where the ring is 500 px in radius, 0.1 px are 2e-5 m. */
    @Test
    void isothermsAndRimOfARoundRingAreCirclesToATenthOfAPixel() {
        Mesh mesh = PatternedGrid.ring(INNER, OUTER, 48, 8).rounded().mesh(6);
        Isotherms isotherms = isotherms(PatternedGrid.field(mesh, IsothermsTest::ringTemperature));
        assertThat(deviation(isotherms)).isLessThan(2e-5);
        for (double[] rim : isotherms.section()) {
            for (int i = 0; i < rim.length; i += 2) {
                int j = (i + 2) % rim.length;
                double at = Math.hypot(rim[i], rim[i + 1]);
                double between = Math.hypot(0.5 * (rim[i] + rim[j]), 0.5 * (rim[i + 1] + rim[j + 1]));
                double radius = at < 0.075 ? INNER : OUTER;
                assertThat(at).isCloseTo(radius, within(1e-7));
                assertThat(between).isCloseTo(radius, within(2e-5));
            }
        }
        double whole = Math.PI * (OUTER * OUTER - INNER * INNER);
        assertThat(Isotherms.area(isotherms.section())).isCloseTo(whole, within(1e-4 * whole));
    }

    @Test
    void openLinesEndOnTheBoundaryAndAreasFollowIt() {
        // T = 100 xy on the unit square: isotherms are hyperbolas xy = c from side to side, which a quadratic field
        // holds exactly; the area at or above c is 1 − c + c ln c.
        Mesh mesh = PatternedGrid.rectangle(1, 1, 24, 24, (i, j) -> 0, "square").mesh(6);
        Isotherms isotherms = isotherms(PatternedGrid.field(mesh, (x, y) -> 100 * x * y));
        assertThat(isotherms.lines()).hasSize(isotherms.scale().count()).noneMatch(Isotherm::closed);
        for (Isotherm line : isotherms.lines()) {
            double[] xy = line.xy();
            for (int end : new int[] {0, xy.length - 2}) {
                assertThat(Math.max(xy[end], xy[end + 1]))
                        .as("an open end lies on the boundary")
                        .isCloseTo(1, within(1e-12));
            }
            for (int i = 0; i < xy.length; i += 2) {
                assertThat(100 * xy[i] * xy[i + 1]).isCloseTo(isotherms.scale().celsius(line.level()), within(1e-9));
            }
        }
        for (int i = 0; i < isotherms.areas().size(); i++) {
            double c = isotherms.scale().celsius(i) / 100;
            assertThat(Isotherms.area(isotherms.areas().get(i))).isCloseTo(1 - c + c * Math.log(c), within(2e-4));
        }
    }

    @Test
    void warmerSideLiesOnTheLeft() {
        Mesh mesh = PatternedGrid.rectangle(1, 1, 4, 4, (i, j) -> 0, "square").mesh(6);
        for (Isotherm line :
                isotherms(PatternedGrid.field(mesh, (x, y) -> 37 * x)).lines()) {
            assertThat(line.xy()[1])
                    .as("the line runs downwards, warmth to the right of the page")
                    .isCloseTo(1, within(1e-12));
        }
    }

    @Test
    void nodesExactlyAtAnIsothermsTemperatureLeaveNoGap() {
        // Every column of nodes lies on an isotherm.
        Mesh mesh = PatternedGrid.rectangle(1, 1, 10, 10, (i, j) -> 0, "square").mesh(3);
        Isotherms isotherms = isotherms(PatternedGrid.field(mesh, (x, y) -> Math.rint(10 * x)));
        assertThat(isotherms.scale().step()).isEqualTo(1);
        assertThat(isotherms.lines()).hasSize(9);
        for (Isotherm line : isotherms.lines()) {
            assertThat(Math.abs(line.xy()[1] - line.xy()[line.xy().length - 1])).isEqualTo(1);
        }
        for (int i = 0; i < 9; i++) {
            assertThat(Isotherms.area(isotherms.areas().get(i))).isCloseTo(1 - (i + 1) / 10.0, within(1e-6));
        }
    }

    @Test
    void holesAndSeparatePartsAreEncircledEachOnItsOwn() {
        PatternedGrid grid = PatternedGrid.rectangle(
                4,
                1,
                40,
                10,
                (i, j) -> i >= 18 && i < 22 ? 1 : i > 4 && i < 8 && j > 3 && j < 7 ? 1 : 0,
                "two",
                "nothing");
        Section section = grid.section();
        Isotherms isotherms =
                isotherms(PatternedGrid.field(grid.mesh(6), (x, y) -> 20 + 60 * Math.exp(-x * x - y * y)));
        assertThat(isotherms.section()).as("two parts, one hole").hasSize(3);
        assertThat(Isotherms.area(isotherms.section())).isCloseTo(section.area(0), within(1e-9));
        double before = section.area(0);
        for (List<double[]> area : isotherms.areas()) {
            assertThat(Isotherms.area(area)).isPositive().isLessThan(before);
            before = Isotherms.area(area);
        }
    }

    @Test
    void simplifyingMovesNoLineFartherThanAllowed() {
        Mesh mesh = PatternedGrid.ring(INNER, OUTER, 96, 12).mesh(6);
        TemperatureField field = PatternedGrid.field(mesh, IsothermsTest::ringTemperature);
        TemperatureScale scale = TemperatureScale.of(TemperatureRange.of(field), 16);
        double tolerance = 2e-5;
        Isotherms all = IsothermTracer.trace(field, scale, 0);
        Isotherms few = IsothermTracer.trace(field, scale, tolerance);
        for (int i = 0; i < all.lines().size(); i++) {
            assertThat(few.lines().get(i).pointCount())
                    .isLessThan(all.lines().get(i).pointCount() / 4);
        }
        for (int i = 0; i < all.areas().size(); i++) {
            double r = ringRadius(scale.celsius(i));
            assertThat(Isotherms.area(few.areas().get(i)))
                    .isCloseTo(Isotherms.area(all.areas().get(i)), within(2 * Math.PI * r * tolerance));
        }
    }

    @Test
    void aUniformFieldHasOneBandAndNoLines() {
        Mesh mesh = PatternedGrid.ring(INNER, OUTER, 24, 3).mesh(6);
        Isotherms isotherms = isotherms(PatternedGrid.field(mesh, (x, y) -> 20.0));
        assertThat(isotherms.scale().bandCount()).isEqualTo(1);
        assertThat(isotherms.lines()).isEqualTo(new ArrayList<>());
    }
}
