package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.MeshOptions;
import tepor.mesher.mesh.Mesher;
import tepor.solver.CaseText;
import tepor.solver.CurvedMesh;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.trust.ErrorIndicator;

/** Rings and discs on meshes with curved sides against their closed forms (H. S. Carslaw, J. C. Jaeger 1959, 7.2). */
class CurvedAnswerTest {
    private static final double X = 0.3;
    private static final double Y = -0.2;

    private static final String HEAD = """
            format = 1
            title = "round"
            [outline]
            unit = "m"
            [material.plain]
            k = "1 W/(m.K)"
            [material.good]
            k = "4 W/(m.K)"
            [air.room]
            temperature = "20 degC"
            """;

    private static String region(String name, double radius, int corners, String material) {
        return "[[region]]\nname = \"" + name + "\"\noutline = \"POLYGON (" + CaseText.ring(X, Y, radius, corners)
                + ")\"\nmaterial = \"" + material + "\"\n";
    }

    private static String edge(String name, String where, String condition) {
        return "[[edge]]\nname = \"" + name + "\"\nwhere = " + where + "\n" + condition + "\n";
    }

    private static String ask(String name, String what) {
        return "[[ask]]\nname = \"" + name + "\"\n" + what + "\n";
    }

    /** A ring of radii 1 and 2, as polygons. */
    private static Case ring(int corners) {
        return CaseText.read(HEAD
                + region("ring", 2, corners, "plain")
                + region("bore", 1, corners, "nothing")
                + edge("inner", "\"holes\"", "temperature = \"1 degC\"")
                + edge("outer", "\"outside\"", "temperature = \"0 degC\"")
                + ask("through", "flow = \"outer\"")
                + ask("on the circle", "at = \"POINT (" + (X + 1.5) + " " + Y + ")\""));
    }

    private static Mesh mesh(Case subject, double size, double... radii) {
        Mesh straight = Mesher.mesh(
                        subject.section(),
                        new MeshOptions(Math.toRadians(28), (x, y) -> size, 1_000_000, 6),
                        () -> false)
                .mesh();
        return CurvedMesh.about(straight, X, Y, radii);
    }

    private static CaseSolutions solutions(Case subject, Mesh mesh) {
        return new CaseSolutions(subject, mesh, () -> false);
    }

    private static AskEvaluator evaluator(Case subject, Mesh mesh) {
        return new AskEvaluator(solutions(subject, mesh));
    }

    private static double imbalance(Case subject, Mesh mesh) {
        return LedgerBuilder.build(solutions(subject, mesh), subject.inputs().nominal())
                .imbalance();
    }

    private static double value(AskEvaluator evaluator, Case subject, String name) {
        Ask ask = subject.asks().stream()
                .filter(a -> a.name().equals(name))
                .findFirst()
                .orElseThrow();
        return evaluator.evaluate(ask).value();
    }

    /** Q/ΔT = 2πk/ln(r₂/r₁), T = ln(r₂/r)/ln(r₂/r₁). */
    @Test
    void theErrorOfARingFallsSixteenfoldWithEveryHalving() {
        Case subject = ring(12);
        Mesh mesh = mesh(subject, 1.1, 1, 2);
        double flow = 2 * Math.PI / Math.log(2);
        double kelvin = 273.15 + Math.log(2 / 1.5) / Math.log(2);
        double[] error = new double[5];
        for (int round = 0; round < 5; round++) {
            AskEvaluator evaluator = evaluator(subject, mesh);
            error[round] = value(evaluator, subject, "through") - flow;
            assertThat(value(evaluator, subject, "on the circle"))
                    .isCloseTo(kelvin, within(Math.pow(0.25, round) * 1e-2));
            mesh = CurvedMesh.about(CurvedMesh.halved(mesh), X, Y, 1, 2);
        }
        assertThat(error[2] / error[3]).isBetween(14.0, 17.0);
        assertThat(error[3] / error[4]).isBetween(15.0, 17.0);
        assertThat(error[4] / flow).isBetween(0.0, 1e-7);
    }

    /** T − Tₐ = qR/2h + q(R² − r²)/4k. */
    @Test
    void aHeatedDiscInAFilmIsAParaboloid() {
        double q = 30;
        double h = 5;
        double radius = 2;
        Case subject = CaseText.read(HEAD
                + region("disc", radius, 48, "plain") + "heat = \"30 W/m3\"\n"
                + edge("rim", "\"outside\"", "air = \"room\"\nfilm = \"5 W/(m2.K)\"")
                + ask("peak", "peak = \"everything\"")
                + ask("mean", "mean = \"everything\"")
                + ask("rim", "mean = \"rim\"")
                + ask("out", "flow = \"rim\"")
                + ask("into the air", "flow = \"room\""));
        Mesh mesh = mesh(subject, 0.3, radius);
        AskEvaluator evaluator = evaluator(subject, mesh);
        double rim = 293.15 + q * radius / (2 * h);
        double scale = q * radius * radius / 4;
        assertThat(value(evaluator, subject, "peak")).isCloseTo(rim + scale, within(1e-5 * scale));
        assertThat(value(evaluator, subject, "mean")).isCloseTo(rim + scale / 2, within(1e-5 * scale));
        assertThat(value(evaluator, subject, "rim")).isCloseTo(rim, within(1e-6 * scale));
        double out = value(evaluator, subject, "out");
        assertThat(out).isCloseTo(q * Math.PI * radius * radius, within(1e-6 * out));
        assertThat(value(evaluator, subject, "into the air")).isEqualTo(out);
        assertThat(imbalance(subject, mesh)).isLessThan(1e-12);
    }

    @Test
    void totalsAreWhatWasStatedToTheLastDigit() {
        Case subject = CaseText.read(HEAD
                + region("disc", 2, 24, "plain") + "heat = \"7 W/m\"\n"
                + region("bore", 1, 24, "nothing")
                + edge("rim", "\"outside\"", "air = \"room\"\nfilm = \"5 W/(m2.K)\"")
                + edge("wall", "\"holes\"", "inflow = \"4 W/m\"")
                + ask("out", "flow = \"rim\""));
        Mesh mesh = mesh(subject, 0.5, 1, 2);
        assertThat(value(evaluator(subject, mesh), subject, "out")).isCloseTo(11, within(1e-11));
        assertThat(imbalance(subject, mesh)).isLessThan(1e-12);
    }

    /** R = ln(r₂/r₁)/2πk₁ + ln(r₃/r₂)/2πk₂ + 1/2πr₃h. */
    @Test
    void theSameHeatPassesTheCurvedBorderBetweenTwoRings() {
        Case subject = CaseText.read(HEAD
                + region("shell", 2, 48, "plain")
                + region("pipe", 1.5, 48, "good")
                + region("bore", 1, 48, "nothing")
                + edge("inner", "\"holes\"", "temperature = \"80 degC\"")
                + edge("outer", "\"outside\"", "air = \"room\"\nfilm = \"5 W/(m2.K)\"")
                + edge("between", "{ between = [\"pipe\", \"shell\"] }", "")
                + ask("inner", "flow = \"inner\"")
                + ask("between", "flow = \"between\"")
                + ask("outer", "flow = \"outer\""));
        Mesh mesh = mesh(subject, 0.3, 1, 1.5, 2);
        AskEvaluator evaluator = evaluator(subject, mesh);
        double resistance = Math.log(1.5) / 4 + Math.log(2 / 1.5) + 1.0 / (2 * 5);
        double exact = 60 * 2 * Math.PI / resistance;
        double outer = value(evaluator, subject, "outer");
        assertThat(outer).isCloseTo(exact, within(1e-5 * exact));
        assertThat(value(evaluator, subject, "between")).isCloseTo(outer, within(1e-11 * exact));
        assertThat(value(evaluator, subject, "inner")).isCloseTo(-outer, within(1e-11 * exact));
        assertThat(imbalance(subject, mesh)).isLessThan(1e-12);
    }

    /** Rounds refine the arcs with everything else, and what they say of their error holds. */
    @Test
    void refinementOfTrueArcsKeepsItsWord() {
        Case polygons = CaseText.read(HEAD
                + region("ring", 2, 12, "plain")
                + region("bore", 1, 12, "nothing")
                + edge("inner", "\"holes\"", "temperature = \"1 degC\"")
                + edge("outer", "\"outside\"", "temperature = \"0 degC\"")
                + ask("through", "flow = \"outer\"\nwithin = \"0.001 %\""));
        Case subject = CurvedMesh.arcs(polygons, X, Y, 1, 2);
        Answer answer = Solver.answer(subject, Progress.NONE);
        double flow = 2 * Math.PI / Math.log(2);
        AskAnswer through = answer.asks().get(0);
        assertThat(through.meshError().reached()).isTrue();
        assertThat(Math.abs(through.value() - flow))
                .isLessThan(through.meshError().high());
        assertThat(answer.ledger().imbalance()).isLessThan(1e-12);
        Mesh mesh = answer.mesh().mesh();
        assertThat(mesh.facetCount()).isGreaterThan(2 * 2 * 24);
        for (int f = 0; f < mesh.facetCount(); f++) {
            assertThat(mesh.isCurvedFacet(f)).isTrue();
        }
        // strips, planes, rays and circles take segments for straight
        assertThat(through.handCheck()).isNull();
        assertThat(Solver.answer(polygons, Progress.NONE).asks().get(0).handCheck())
                .isNotNull();
    }

    /** Halving the triangles divides the squared indicator by 16, as it does the energy of the error. */
    @Test
    void theIndicatorFallsAsTheEnergyOfTheErrorDoes() {
        Case subject = CurvedMesh.arcs(ring(12), X, Y, 1, 2);
        CaseSolutions coarse = solutions(subject, mesh(subject, 1.1, 1, 2));
        double[] squared = ErrorIndicator.squared(
                coarse.nominal().balance(), coarse.nominal().field());
        double all = Arrays.stream(squared).sum();
        CaseSolutions fine = solutions(
                subject,
                CurvedMesh.about(
                        CurvedMesh.halved(CurvedMesh.about(CurvedMesh.halved(coarse.mesh()), X, Y, 1, 2)), X, Y, 1, 2));
        double less = Arrays.stream(ErrorIndicator.squared(
                        fine.nominal().balance(), fine.nominal().field()))
                .sum();
        assertThat(all / less).isBetween(100.0, 350.0);
    }
}
