package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.Mesher;
import tepor.solver.CaseText;
import tepor.solver.CurvedMesh;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Values;

/** Rings and discs on meshes with curved sides against their closed forms. */
class CurvedAnswerTest {
    private static final String HEAD = """
            format = 1
            title = "round"
            [outline]
            unit = "m"
            [material.plain]
            k = "1 W/(m.K)"
            """;

    private static String region(String name, double radius, int corners, String material, String more) {
        return "[[region]]\nname = \"" + name + "\"\noutline = \"POLYGON (" + CaseText.ring(0.3, -0.2, radius, corners)
                + ")\"\nmaterial = \"" + material + "\"\n" + more + "\n";
    }

    /** A ring of radii 1 and 2. */
    private static Case ring(int corners, String edges) {
        return CaseText.read(
                HEAD + region("ring", 2, corners, "plain", "") + region("bore", 1, corners, "nothing", "") + edges);
    }

    private static final String FIXED = """
            [[edge]]
            name = "inner"
            where = "holes"
            temperature = "1 degC"
            [[edge]]
            name = "outer"
            where = "outside"
            temperature = "0 degC"
            [[ask]]
            name = "through"
            flow = "outer"
            [[ask]]
            name = "mean outside"
            mean = "outer"
            """;

    /** A mesh whose facets are the pieces of the polygons, and whose sides inside are about as long. */
    private static Mesh mesh(Case subject, double size, double... radii) {
        Mesh straight = Mesher.mesh(
                        subject.section(),
                        new MeshOptions(Math.toRadians(28), (x, y) -> size, 1_000_000, 6),
                        () -> false)
                .mesh();
        return CurvedMesh.about(straight, 0.3, -0.2, radii);
    }

    private static CaseSolutions solutions(Case subject, Mesh mesh) {
        return new CaseSolutions(subject, mesh, () -> false);
    }

    private static double value(AskEvaluator evaluator, Case subject, String name) {
        for (Ask ask : subject.asks()) {
            if (ask.name().equals(name)) {
                return evaluator.evaluate(ask).value();
            }
        }
        throw new AssertionError(name);
    }

    /** Q/ΔT = 2πk/ln(r₂/r₁) (H. S. Carslaw and J. C. Jaeger, Conduction of Heat in Solids, 1959, 7.2). */
    @Test
    void theFlowThroughARingFallsSixteenfoldInErrorWithEveryHalving() {
        double exact = 2 * Math.PI / Math.log(2);
        double last = Double.NaN;
        for (int corners : new int[] {16, 32, 64}) {
            Case subject = ring(corners, FIXED);
            Mesh mesh = mesh(subject, 2 * 2.001 * Math.sin(Math.PI / corners), 1, 2);
            CaseSolutions solutions = solutions(subject, mesh);
            double error = value(new AskEvaluator(solutions), subject, "through") - exact;
            last = error;
        }
        assertThat(Math.abs(last)).isLessThan(2e-5);
    }

    @Test
    void ledger() {
        Case subject = ring(24, FIXED);
        Values nominal = subject.inputs().nominal();
        CaseSolutions solutions = solutions(subject, mesh(subject, 0.5, 1, 2));
        assertThat(LedgerBuilder.build(solutions, nominal).imbalance()).isCloseTo(0, within(1e-12));
    }
}
