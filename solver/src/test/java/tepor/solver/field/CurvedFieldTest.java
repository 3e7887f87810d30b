package tepor.solver.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleBinaryOperator;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.Mesher;
import tepor.mesher.mesh.TriangleFinder;
import tepor.mesher.mesh.TriangleMap;
import tepor.solver.CaseText;
import tepor.solver.CurvedMesh;
import tepor.solver.model.Case;

/** Fields on a ring of radii 1 and 2, whose outer sides bulge out of their triangles and whose inner ones into them. */
class CurvedFieldTest {
    private static final Case RING =
            CaseText.read("""
            format = 1
            title = "ring"
            [outline]
            unit = "m"
            [[region]]
            name = "ring"
            outline = "POLYGON (%s)"
            material = "plain"
            [[region]]
            name = "bore"
            outline = "POLYGON (%s)"
            material = "nothing"
            [material.plain]
            k = "1 W/(m.K)"
            [[edge]]
            name = "outer"
            where = "outside"
            temperature = "0 degC"
            """.formatted(CaseText.ring(0, 0, 2, 24), CaseText.ring(0, 0, 1, 24)));

    private static final Mesh MESH = CurvedMesh.about(
            Mesher.mesh(RING.section(), new MeshOptions(Math.toRadians(28), (x, y) -> 0.6, 1_000_000, 6), () -> false)
                    .mesh(),
            0,
            0,
            1,
            2);

    private static TemperatureField field(DoubleBinaryOperator f) {
        double[] kelvin = new double[MESH.nodeCount()];
        for (int i = 0; i < kelvin.length; i++) {
            kelvin[i] = f.applyAsDouble(MESH.x(i), MESH.y(i));
        }
        return new TemperatureField(MESH, kelvin);
    }

    @Test
    void aLinearFieldIsItselfEverywhereUpToTheCurvedSides() {
        DoubleBinaryOperator plane = (x, y) -> 300 + 2 * x - 5 * y;
        TemperatureField field = field(plane);
        TriangleFinder finder = new TriangleFinder(MESH);
        // 1e-5 of the extent inside the circles; between the chords' middles at 2·cos(7.5°) = 1.983 and 2 as well
        for (double radius : new double[] {1.00006, 1.004, 1.5, 1.99, 1.99994}) {
            for (int i = 0; i < 1000; i++) {
                double x = radius * Math.cos(i);
                double y = radius * Math.sin(i);
                assertThat(field.at(x, y, finder)).isCloseTo(plane.applyAsDouble(x, y), within(1e-12 * 300));
            }
        }
    }

    @Test
    void theGradientIsTheSlopeOfTheField() {
        TemperatureField field = field((x, y) -> 300 + x * x - 3 * x * y + Math.sin(2 * y));
        FieldGradient gradient = new FieldGradient(field);
        TriangleMap map = new TriangleMap(MESH);
        double[] g = new double[2];
        double[] l = new double[3];
        double step = 1e-5;
        for (int t = 0; t < MESH.triangleCount(); t++) {
            map.moveTo(t);
            double x = map.x(0.5, 0.2, 0.3);
            double y = map.y(0.5, 0.2, 0.3);
            gradient.at(t, 0.5, 0.2, 0.3, g);
            double[] slope = new double[4];
            for (int i = 0; i < 4; i++) {
                assertThat(map.locate(
                                x + (i == 0 ? step : i == 1 ? -step : 0), y + (i == 2 ? step : i == 3 ? -step : 0), l))
                        .isTrue();
                slope[i] = field.inside(t, l[0], l[1], l[2]);
            }
            assertThat(g[0]).isCloseTo((slope[0] - slope[1]) / (2 * step), within(1e-7));
            assertThat(g[1]).isCloseTo((slope[2] - slope[3]) / (2 * step), within(1e-7));
        }
    }

    /** Distance from a point: on the circle's nodes alone it would be least at a node. */
    @Test
    void theExtremesOnACurvedSideAreOnTheCircle() {
        double angle = 0.05; // between the first node, at 0, and the first middle node, at 7.5°
        TemperatureField field = field((x, y) -> 300 + x * Math.cos(angle) + y * Math.sin(angle));
        for (boolean everywhere : new boolean[] {true, false}) {
            Extreme peak = everywhere
                    ? ExtremeFinder.overTriangles(field, t -> true, true)
                    : ExtremeFinder.overFacets(field, facets(), true);
            // the parabola is off the circle by up to Rφ⁴/32 = 1.8e-5
            assertThat(peak.kelvin()).isCloseTo(302, within(2e-5));
            assertThat(peak.x()).isCloseTo(2 * Math.cos(angle), within(5e-4));
            assertThat(peak.y()).isCloseTo(2 * Math.sin(angle), within(5e-3));
            assertThat(Math.hypot(peak.x(), peak.y())).isCloseTo(2, within(2e-5));
            assertThat(field.at(peak.x(), peak.y(), new TriangleFinder(MESH))).isCloseTo(peak.kelvin(), within(1e-10));
        }
    }

    private static int[] facets() {
        return java.util.stream.IntStream.range(0, MESH.facetCount()).toArray();
    }

    @Test
    void thePeakInsideACurvedTriangleIsWhereTheFieldHasIt() {
        TriangleMap map = new TriangleMap(MESH);
        int found = 0;
        for (int t = 0; t < MESH.triangleCount(); t++) {
            if (!MESH.isCurved(t)) {
                continue;
            }
            map.moveTo(t);
            double x = map.x(0.3, 0.4, 0.3);
            double y = map.y(0.3, 0.4, 0.3);
            TemperatureField field = field((px, py) -> 300 - (px - x) * (px - x) - (py - y) * (py - y));
            int triangle = t;
            Extreme peak = ExtremeFinder.overTriangles(field, i -> i == triangle, true);
            assertThat(Math.hypot(peak.x() - x, peak.y() - y)).isLessThan(0.01);
            assertThat(field.at(peak.x(), peak.y(), new TriangleFinder(MESH))).isCloseTo(peak.kelvin(), within(1e-10));
            found++;
        }
        assertThat(found).isGreaterThanOrEqualTo(48);
    }

    /** Means over the ring: of x, nothing; of r², (r₁² + r₂²)/2. Along the circles r² is what it is. */
    @Test
    void meansCountTrueAreasAndLengths() {
        TemperatureField square = field((x, y) -> 300 + x * x + y * y);
        assertThat(FieldMean.overTriangles(square, t -> true)).isCloseTo(302.5, within(2e-4));
        assertThat(FieldMean.overTriangles(field((x, y) -> 300 + x), t -> true)).isCloseTo(300, within(1e-4));
        assertThat(FieldMean.overTriangles(field((x, y) -> 300), t -> true)).isEqualTo(300);
        // 2π·2 at 304 K and 2π·1 at 301 K
        assertThat(FieldMean.overFacets(square, facets())).isCloseTo(303, within(1e-5));
    }
}
