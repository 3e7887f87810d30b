package tepor.solver.assembly;

import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleBinaryOperator;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleMap;
import tepor.solver.element.TriangleGeometry;
import tepor.solver.element.TriangleQuadrature;
import tepor.solver.element.TriangleShape;
import tepor.solver.element.TriangleShapes;
import tepor.solver.field.FieldGradient;
import tepor.solver.field.Solution;
import tepor.solver.field.SteadySolver;
import tepor.solver.field.TemperatureField;
import tepor.solver.model.Case;
import tepor.solver.model.Input;

/**
 * A manufactured problem: an exact temperature, its gradient, and the heat that makes it the solution; the temperature is
 * fixed on the whole boundary.
 *
 * @param exact temperature, K
 * @param exactX its derivative by x
 * @param exactY its derivative by y
 * @param heat −div(k grad T), W/m³
 */
record TestProblem(
        DoubleBinaryOperator exact,
        DoubleBinaryOperator exactX,
        DoubleBinaryOperator exactY,
        DoubleBinaryOperator heat) {

    Solution solve(Case subject, Mesh mesh) {
        double[] fixed = new double[mesh.nodeCount()];
        Arrays.fill(fixed, Double.NaN);
        for (int f = 0; f < mesh.facetCount(); f++) {
            for (int i = 0; i < (mesh.nodesPerTriangle() == 3 ? 2 : 3) && mesh.isBoundaryFacet(f); i++) {
                int node = mesh.facetNode(f, i);
                fixed[node] = exact.applyAsDouble(mesh.x(node), mesh.y(node));
            }
        }
        FixedTemperatures temperatures = new FixedTemperatures(mesh, fixed);
        HeatBalance balance = new HeatBalance(
                mesh, subject.regions(), subject.inputs().nominal(), List.of(new Load(mesh, heat)), temperatures);
        return new SteadySolver(mesh, temperatures).solve(balance, () -> false);
    }

    /** Errors of a field: in the L2 norm, and of the gradient. */
    double[] errors(TemperatureField field) {
        Mesh mesh = field.mesh();
        TriangleQuadrature rule = TriangleQuadrature.ofDegree(6);
        FieldGradient gradient = new FieldGradient(field);
        double[] g = new double[2];
        double value = 0;
        double slope = 0;
        TriangleShape shape = TriangleShapes.of(mesh.nodesPerTriangle());
        TriangleMap map = new TriangleMap(mesh);
        TriangleGeometry geometry = new TriangleGeometry(mesh);
        int n = shape.nodeCount();
        double[] slopes = new double[3 * n];
        double[] gx = new double[n];
        double[] gy = new double[n];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            map.moveTo(t);
            geometry.moveTo(t);
            for (int p = 0; p < rule.pointCount(); p++) {
                double[] l = {rule.l0()[p], rule.l1()[p], rule.l2()[p]};
                double x = map.x(l[0], l[1], l[2]);
                double y = map.y(l[0], l[1], l[2]);
                shape.slopes(l[0], l[1], l[2], slopes);
                geometry.gradients(slopes, n, gx, gy);
                double weight = rule.weight()[p] * geometry.areaElement();
                double e = field.inside(t, l[0], l[1], l[2]) - exact.applyAsDouble(x, y);
                gradient.at(t, l[0], l[1], l[2], g);
                double ex = g[0] - exactX.applyAsDouble(x, y);
                double ey = g[1] - exactY.applyAsDouble(x, y);
                value += weight * e * e;
                slope += weight * (ex * ex + ey * ey);
            }
        }
        return new double[] {Math.sqrt(value), Math.sqrt(slope)};
    }

    /** The load of a heat that varies from place to place. */
    private record Load(Mesh mesh, DoubleBinaryOperator heat) implements Contribution {
        @Override
        public String owner() {
            return "manufactured";
        }

        @Override
        public String kind() {
            return "heat";
        }

        @Override
        public void addResidual(double[] kelvin, double[] residual) {
            TriangleShape shape = TriangleShapes.of(mesh.nodesPerTriangle());
            TriangleQuadrature rule = TriangleQuadrature.ofDegree(6);
            TriangleGeometry geometry = new TriangleGeometry(mesh);
            int n = shape.nodeCount();
            double[] value = new double[n];
            double[] slopes = new double[3 * n];
            double[] gx = new double[n];
            double[] gy = new double[n];
            TriangleMap map = new TriangleMap(mesh);
            for (int t = 0; t < mesh.triangleCount(); t++) {
                geometry.moveTo(t);
                map.moveTo(t);
                for (int p = 0; p < rule.pointCount(); p++) {
                    double[] l = {rule.l0()[p], rule.l1()[p], rule.l2()[p]};
                    shape.values(l[0], l[1], l[2], value);
                    shape.slopes(l[0], l[1], l[2], slopes);
                    geometry.gradients(slopes, n, gx, gy);
                    double x = map.x(l[0], l[1], l[2]);
                    double y = map.y(l[0], l[1], l[2]);
                    double q = rule.weight()[p] * geometry.areaElement() * heat.applyAsDouble(x, y);
                    for (int i = 0; i < n; i++) {
                        residual[n * t + i] -= q * value[i];
                    }
                }
            }
        }

        @Override
        public void addTangent(double[] kelvin, TangentSink sink) {
            // does not depend on the temperature
        }

        @Override
        public void addDerivative(double[] kelvin, Input input, double[] derivative) {
            // has no input
        }
    }
}
