package tepor.solver.assembly;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.Mesher;
import tepor.solver.CaseText;
import tepor.solver.CurvedMesh;
import tepor.solver.element.FacetGeometry;
import tepor.solver.element.ShapeIntegrals;
import tepor.solver.model.Case;

/** Isoparametric triangles (P. G. Ciarlet and P.-A. Raviart 1972): linear fields exactly, orders, areas and lengths. */
class CurvedElementTest {
    private static final Case SUBJECT =
            CaseText.read("""
            format = 1
            title = "ring in a disc"
            [outline]
            unit = "m"
            [[region]]
            name = "disc"
            outline = "POLYGON (%s)"
            material = "grained"
            [[region]]
            name = "core"
            outline = "POLYGON (%s)"
            material = "grained"
            [material.grained]
            k = { along = "2 W/(m.K)", across = "0.5 W/(m.K)", angle = "20 deg" }
            [[edge]]
            name = "all"
            where = "outside"
            temperature = "0 degC"
            """.formatted(CaseText.ring(0, 0, 1, 12), CaseText.ring(0, 0, 0.5, 12)));

    private static final Mesh COARSE = CurvedMesh.about(straight(), 0, 0, 0.5, 1);

    private static Mesh straight() {
        return Mesher.mesh(
                        SUBJECT.section(),
                        new MeshOptions(Math.toRadians(28), (x, y) -> 0.53, 1_000_000, 6),
                        () -> false)
                .mesh();
    }

    private static Mesh halved(Mesh mesh) {
        return CurvedMesh.about(CurvedMesh.halved(mesh), 0, 0, 0.5, 1);
    }

    private static long curvedTriangles(Mesh mesh) {
        return java.util.stream.IntStream.range(0, mesh.triangleCount())
                .filter(mesh::isCurved)
                .count();
    }

    @Test
    void linearTemperaturesAreReproducedExactly() {
        assertThat(curvedTriangles(COARSE)).isGreaterThan(30);
        TestProblem plane = new TestProblem((x, y) -> 300 + 2 * x - 5 * y, (x, y) -> 2, (x, y) -> -5, (x, y) -> 0);
        double[] errors = plane.errors(plane.solve(SUBJECT, COARSE).field());
        assertThat(errors[0]).isLessThan(1e-12);
        assertThat(errors[1]).isLessThan(1e-11);
    }

    @Test
    void aUniformTemperatureLeavesNothing() {
        double[] kelvin = new double[COARSE.nodeCount()];
        Arrays.fill(kelvin, 1234.5);
        double[] residual = new double[6 * COARSE.triangleCount()];
        new Conduction(COARSE, SUBJECT.regions(), SUBJECT.inputs().nominal()).addResidual(kelvin, residual);
        assertThat(residual).containsOnly(0.0);
    }

    /** Orders 3 and 2 are kept on curved triangles (Ciarlet and Raviart, theorem 5 and its remarks). */
    @Test
    void convergesWithTheOrdersOfStraightTriangles() {
        double c = Math.cos(Math.toRadians(20));
        double s = Math.sin(Math.toRadians(20));
        double xx = 2 * c * c + 0.5 * s * s;
        double xy = 1.5 * c * s;
        double yy = 2 * s * s + 0.5 * c * c;
        TestProblem wave = new TestProblem(
                (x, y) -> Math.sin(3 * x) * Math.exp(y),
                (x, y) -> 3 * Math.cos(3 * x) * Math.exp(y),
                (x, y) -> Math.sin(3 * x) * Math.exp(y),
                (x, y) -> -(-9 * xx * Math.sin(3 * x) + 6 * xy * Math.cos(3 * x) + yy * Math.sin(3 * x)) * Math.exp(y));
        Mesh mesh = halved(COARSE);
        double[] last = wave.errors(wave.solve(SUBJECT, mesh).field());
        for (int round = 0; round < 2; round++) {
            mesh = halved(mesh);
            double[] errors = wave.errors(wave.solve(SUBJECT, mesh).field());
            assertThat(last[0] / errors[0]).isBetween(7.2, 9.0);
            assertThat(last[1] / errors[1]).isBetween(3.7, 4.4);
            last = errors;
        }
    }

    /**
     * Area between chord and parabola 2/3·c·s (Archimedes); a circle in n parabolas lacks n·R²φ⁵/30, φ = π/n, to first
     * order: sin φ cos φ + (4/3) sin φ (1 − cos φ) = φ − φ⁵/30 + ….
     */
    @Test
    void shapeIntegralsAddUpToAreasAndLengths() {
        ShapeIntegrals integrals = new ShapeIntegrals(COARSE);
        double[] part = new double[6];
        double disc = 0;
        for (int t = 0; t < COARSE.triangleCount(); t++) {
            integrals.overTriangle(t, part);
            double area = Arrays.stream(part).sum();
            assertThat(area).isCloseTo(COARSE.area(t), within(1e-15));
            disc += area;
        }
        double phi = Math.PI / boundaryFacets(COARSE);
        double exact = Math.PI / phi * (Math.sin(phi) * Math.cos(phi) + 4.0 / 3 * Math.sin(phi) * (1 - Math.cos(phi)));
        assertThat(disc).isCloseTo(exact, within(1e-13));
        assertThat(Math.PI - disc).isCloseTo(Math.PI * Math.pow(phi, 4) / 30, within(2e-2 * (Math.PI - disc)));
        double[] along = new double[3];
        double round = 0;
        for (int f = 0; f < COARSE.facetCount(); f++) {
            integrals.overFacet(f, along);
            FacetGeometry geometry = new FacetGeometry(COARSE);
            geometry.moveTo(f);
            double length = Arrays.stream(along).sum();
            assertThat(length).isCloseTo(geometry.length(), within(1e-15));
            assertThat(length).isCloseTo(parabola(COARSE, f), within(1e-8 * length));
            round += COARSE.isBoundaryFacet(f) ? length : 0;
        }
        assertThat(round).isCloseTo(2 * Math.PI, within(2e-4 * 2 * Math.PI));
    }

    private static long boundaryFacets(Mesh mesh) {
        return java.util.stream.IntStream.range(0, mesh.facetCount())
                .filter(mesh::isBoundaryFacet)
                .count();
    }

    /** Length of the parabola of chord c and sagitta s: ½√(c² + 16s²) + c²/8s · asinh(4s/c). */
    private static double parabola(Mesh mesh, int f) {
        int a = mesh.facetNode(f, 0);
        int b = mesh.facetNode(f, 1);
        int m = mesh.facetNode(f, 2);
        double c = mesh.facetLength(f);
        double s = Math.hypot(mesh.x(m) - 0.5 * (mesh.x(a) + mesh.x(b)), mesh.y(m) - 0.5 * (mesh.y(a) + mesh.y(b)));
        double x = 4 * s / c;
        return 0.5 * Math.hypot(c, 4 * s) + c * c / (8 * s) * Math.log(x + Math.sqrt(x * x + 1));
    }
}
