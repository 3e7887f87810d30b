package tepor.solver.assembly;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.mesh.Mesh;
import tepor.solver.CaseText;
import tepor.solver.CurvedMesh;
import tepor.solver.answer.Progress;
import tepor.solver.answer.Solver;
import tepor.solver.model.Case;
import tepor.solver.model.Input;
import tepor.solver.model.Values;

/** Holds every contribution to central differences: its tangent by the temperatures, its derivative by every input. */
class ContributionTest {
    private static final double TOLERANCE = 1e-6;

    private static Case subject(String element) {
        return CaseText.read("""
                format = 1
                title = "every effect at once"
                depth = "2 m"
                [outline]
                unit = "m"
                [[region]]
                name = "block"
                outline = "POLYGON ((0 0, 2 0, 2 1, 0 1, 0 0))"
                material = "plain"
                heat = "5 W"
                [[region]]
                name = "bar"
                outline = "POLYGON ((0.5 0, 1 0, 1 0.5, 0.5 0.5, 0.5 0))"
                material = "grained"
                heat = "7 W/m"
                [[region]]
                name = "core"
                outline = "POLYGON ((1.3 0.3, 1.7 0.3, 1.5 0.7, 1.3 0.3))"
                material = "plain"
                heat = "11 W/m3"
                [material.plain]
                k = "2 W/(m.K)"
                [material.grained]
                k = { along = "0.9 W/(m.K)", across = "0.3 W/(m.K)", angle = "30 deg" }
                [air.room]
                temperature = "20 degC"
                film = "8 W/(m2.K)"
                [[edge]]
                name = "left side"
                where = "left"
                air = "room"
                inflow = "3 W/m2"
                [[edge]]
                name = "right side"
                where = "right"
                air = "5 degC"
                resistance = "0.13 m2.K/W"
                [[edge]]
                name = "top side"
                where = "top"
                inflow = "4 W/m"
                [[edge]]
                name = "bottom side"
                where = "bottom"
                temperature = "12 degC"
                [mesh]
                element = "ELEMENT"
                size = "0.4 m"
                """.replace("ELEMENT", element.equals("linear") ? "linear" : "quadratic"));
    }

    /** The mesh of a kind of element; "curved" makes every facet a parabola. */
    private static Mesh mesh(Case subject, String element) {
        Mesh mesh = Solver.inspect(subject, Progress.NONE).mesh().mesh();
        return element.equals("curved") ? CurvedMesh.bulged(mesh, 0.05) : mesh;
    }

    @ParameterizedTest
    @ValueSource(strings = {"linear", "quadratic", "curved"})
    void tangentIsTheDerivativeOfTheResidual(String element) {
        Case subject = subject(element);
        Mesh mesh = mesh(subject, element);
        HeatBalance balance = balance(subject, mesh, subject.inputs().nominal());
        double[] kelvin = randomTemperatures(mesh);
        double[] direction = randomTemperatures(mesh);
        assertThat(balance.contributions()).hasSize(1 + 3 + 4);
        for (Contribution c : balance.contributions()) {
            double[] up = residual(c, mesh, moved(kelvin, direction, 1e-3));
            double[] down = residual(c, mesh, moved(kelvin, direction, -1e-3));
            double[] difference = new double[mesh.nodeCount()];
            for (int t = 0; t < mesh.triangleCount(); t++) {
                for (int i = 0; i < mesh.nodesPerTriangle(); i++) {
                    int slot = mesh.nodesPerTriangle() * t + i;
                    difference[mesh.node(t, i)] += (up[slot] - down[slot]) / 2e-3;
                }
            }
            double[] product = new double[mesh.nodeCount()];
            c.addTangent(kelvin, new Product(mesh, direction, product));
            assertClose(product, difference, c.kind() + " of " + c.owner());
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"linear", "quadratic", "curved"})
    void derivativeByEachInputIsThatOfTheResidual(String element) {
        Case subject = subject(element);
        Mesh mesh = mesh(subject, element);
        Values nominal = subject.inputs().nominal();
        double[] kelvin = randomTemperatures(mesh);
        int moved = 0;
        for (Input input : subject.inputs().all()) {
            double value = nominal.of(input);
            double step = 1e-5 * Math.abs(value);
            HeatBalance up = balance(subject, mesh, nominal.with(input, value + step));
            HeatBalance down = balance(subject, mesh, nominal.with(input, value - step));
            HeatBalance here = balance(subject, mesh, nominal);
            for (int c = 0; c < here.contributions().size(); c++) {
                double[] plus = residual(up.contributions().get(c), mesh, kelvin);
                double[] minus = residual(down.contributions().get(c), mesh, kelvin);
                double[] difference = new double[plus.length];
                for (int i = 0; i < plus.length; i++) {
                    difference[i] = (plus[i] - minus[i]) / (2 * step);
                }
                double[] derivative = new double[plus.length];
                here.contributions().get(c).addDerivative(kelvin, input, derivative);
                assertClose(derivative, difference, input.path());
                moved += largest(derivative) > 0 ? 1 : 0;
            }
        }
        // k; along, across, angle; 3 heats and the depth; 2 films with their airs; 2 inflows
        assertThat(moved).isEqualTo(1 + 3 + 3 + 1 + 4 + 2);
    }

    private static HeatBalance balance(Case subject, Mesh mesh, Values values) {
        FacetIndex index = new FacetIndex(mesh, subject.section().segmentCount());
        return new HeatBalance(subject, mesh, index, values);
    }

    private static double[] randomTemperatures(Mesh mesh) {
        Random random = new Random(7);
        double[] kelvin = new double[mesh.nodeCount()];
        Arrays.setAll(kelvin, i -> 280 + 20 * random.nextDouble());
        return kelvin;
    }

    private static double[] moved(double[] from, double[] direction, double step) {
        double[] to = from.clone();
        Arrays.setAll(to, i -> from[i] + step * direction[i]);
        return to;
    }

    private static double[] residual(Contribution c, Mesh mesh, double[] kelvin) {
        double[] residual = new double[mesh.nodesPerTriangle() * mesh.triangleCount()];
        c.addResidual(kelvin, residual);
        return residual;
    }

    private static void assertClose(double[] found, double[] expected, String what) {
        double scale = Math.max(largest(expected), 1e-9);
        for (int i = 0; i < found.length; i++) {
            assertThat(found[i]).as(what).isCloseTo(expected[i], within(TOLERANCE * scale));
        }
    }

    private static double largest(double[] v) {
        return Arrays.stream(v).map(Math::abs).max().orElse(0);
    }

    /** Multiplies element matrices with a direction. */
    private record Product(Mesh mesh, double[] direction, double[] product) implements TangentSink {
        @Override
        public void addTriangle(int triangle, double[] entries) {
            int n = mesh.nodesPerTriangle();
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    product[mesh.node(triangle, i)] += entries[n * i + j] * direction[mesh.node(triangle, j)];
                }
            }
        }

        @Override
        public void addFacet(int facet, double[] entries) {
            int m = mesh.nodesPerTriangle() == 3 ? 2 : 3;
            for (int i = 0; i < m; i++) {
                for (int j = 0; j < m; j++) {
                    product[mesh.facetNode(facet, i)] += entries[m * i + j] * direction[mesh.facetNode(facet, j)];
                }
            }
        }
    }
}
