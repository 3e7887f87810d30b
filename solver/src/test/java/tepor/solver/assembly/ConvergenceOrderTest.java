package tepor.solver.assembly;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.Mesher;
import tepor.solver.CaseText;
import tepor.solver.field.Solution;
import tepor.solver.model.Case;

/**
 * Manufactured solutions: the orders of P. G. Ciarlet, The Finite Element Method for Elliptic Problems (1978), theorems
 * 3.2.2 and 3.2.5, and polynomials reproduced exactly, on unstructured meshes.
 */
class ConvergenceOrderTest {
    /** k = 2 along the x axis, 0.5 across, turned by 20°. */
    private static final double ANGLE = Math.toRadians(20);

    private static final double C = Math.cos(ANGLE);
    private static final double S = Math.sin(ANGLE);
    private static final double XX = 2 * C * C + 0.5 * S * S;
    private static final double XY = 1.5 * C * S;
    private static final double YY = 2 * S * S + 0.5 * C * C;

    private static final Case SUBJECT = CaseText.read("""
            format = 1
            title = "square with a bite"
            [outline]
            unit = "m"
            [[region]]
            name = "body"
            outline = "POLYGON ((0 0, 1 0, 1 1, 0.4 1, 0 0.7, 0 0))"
            material = "grained"
            [material.grained]
            k = { along = "2 W/(m.K)", across = "0.5 W/(m.K)", angle = "20 deg" }
            [[edge]]
            name = "all"
            where = "outside"
            temperature = "0 degC"
            """);

    // The size varies, lest equal triangles in the midst of the finer meshes make them better than the orders of
    // theory.
    private static Mesh mesh(int nodesPerTriangle, double size) {
        return Mesher.mesh(
                        SUBJECT.section(),
                        new MeshOptions(
                                Math.toRadians(28), (x, y) -> size * (1 + 0.2 * x), 1_000_000, nodesPerTriangle),
                        () -> false)
                .mesh();
    }

    @ParameterizedTest
    @CsvSource({"3, 2, 1", "6, 3, 2"})
    void convergesWithTheOrdersOfTheory(int nodesPerTriangle, double orderOfValue, double orderOfSlope) {
        TestProblem wave = new TestProblem(
                (x, y) -> Math.sin(3 * x) * Math.exp(y),
                (x, y) -> 3 * Math.cos(3 * x) * Math.exp(y),
                (x, y) -> Math.sin(3 * x) * Math.exp(y),
                (x, y) -> -(-9 * XX * Math.sin(3 * x) + 6 * XY * Math.cos(3 * x) + YY * Math.sin(3 * x)) * Math.exp(y));
        double[] last = null;
        double lastH = 0;
        for (double size : new double[] {0.08, 0.04, 0.02}) {
            Mesh mesh = mesh(nodesPerTriangle, size);
            double h = Math.sqrt(1.0 / mesh.triangleCount());
            double[] errors = wave.errors(wave.solve(SUBJECT, mesh).field());
            if (last != null) {
                double step = Math.log(lastH / h);
                assertThat(Math.log(last[0] / errors[0]) / step)
                        .as("order of the temperature at size %s", size)
                        .isBetween(orderOfValue - 0.15, orderOfValue + 0.25);
                assertThat(Math.log(last[1] / errors[1]) / step)
                        .as("order of the gradient at size %s", size)
                        .isBetween(orderOfSlope - 0.12, orderOfSlope + 0.2);
            }
            last = errors;
            lastH = h;
        }
    }

    @Test
    void linearTrianglesReproduceLinearTemperatures() {
        TestProblem plane = new TestProblem((x, y) -> 300 + 2 * x - 5 * y, (x, y) -> 2, (x, y) -> -5, (x, y) -> 0);
        assertExact(plane, 3);
        assertExact(plane, 6);
    }

    @Test
    void quadraticTrianglesReproduceQuadraticTemperatures() {
        TestProblem bowl = new TestProblem(
                (x, y) -> 300 + x * x - 3 * x * y + 2 * y * y - y,
                (x, y) -> 2 * x - 3 * y,
                (x, y) -> -3 * x + 4 * y - 1,
                (x, y) -> -(2 * XX - 6 * XY + 4 * YY));
        assertExact(bowl, 6);
        Solution rough = bowl.solve(SUBJECT, mesh(3, 0.1));
        assertThat(bowl.errors(rough.field())[0]).isGreaterThan(1e-4);
    }

    private static void assertExact(TestProblem problem, int nodesPerTriangle) {
        Solution solution = problem.solve(SUBJECT, mesh(nodesPerTriangle, 0.1));
        double[] errors = problem.errors(solution.field());
        assertThat(errors[0]).isLessThan(1e-11);
        assertThat(errors[1]).isLessThan(1e-9);
    }
}
