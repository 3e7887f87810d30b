package tepor.solver.assembly;

import java.util.Arrays;
import java.util.List;
import tepor.mesher.mesh.Mesh;
import tepor.solver.element.TriangleGeometry;
import tepor.solver.element.TriangleQuadrature;
import tepor.solver.element.TriangleShape;
import tepor.solver.element.TriangleShapes;
import tepor.solver.model.Input;
import tepor.solver.model.Region;
import tepor.solver.model.Values;

/** Conduction in every region: ∫ ∇Nᵢ · k∇T. */
public final class Conduction implements Contribution {
    /** In curved triangles the integrand is rational. Degree 2 would keep the order; this makes the quadrature's error small. */
    private static final TriangleQuadrature CURVED = TriangleQuadrature.ofDegree(6);

    private final Mesh mesh;
    private final List<Region> regions;
    private final Values values;
    private final Tensor[] tensor;
    private final TriangleShape shape;
    private final TriangleQuadrature straight;

    public Conduction(Mesh mesh, List<Region> regions, Values values) {
        this.mesh = mesh;
        this.regions = regions;
        this.values = values;
        tensor = new Tensor[regions.size()];
        for (Region region : regions) {
            tensor[region.index()] =
                    region.isHole() ? null : Tensor.of(region.material().conductivity(), values);
        }
        shape = TriangleShapes.of(mesh.nodesPerTriangle());
        straight = TriangleQuadrature.ofDegree(shape.stiffnessDegree());
    }

    /** Conductivity of a region, W/(m·K). */
    public Tensor tensor(int region) {
        return tensor[region];
    }

    public int regionCount() {
        return tensor.length;
    }

    @Override
    public String owner() {
        return "";
    }

    @Override
    public String kind() {
        return "conduction";
    }

    @Override
    public void addResidual(double[] kelvin, double[] residual) {
        addFluxResidual(kelvin, tensor, residual);
    }

    @Override
    public void addDerivative(double[] kelvin, Input input, double[] derivative) {
        Tensor[] slope = new Tensor[regions.size()];
        boolean any = false;
        for (Region region : regions) {
            if (!region.isHole()) {
                slope[region.index()] = Tensor.derivative(region.material().conductivity(), values, input);
                any |= slope[region.index()] != null;
            }
        }
        if (any) {
            addFluxResidual(kelvin, slope, derivative);
        }
    }

    private TriangleQuadrature quadrature(int triangle) {
        return mesh.isCurved(triangle) ? CURVED : straight;
    }

    /** Adds ∫ ∇Nᵢ · k∇T with the given tensors; a region whose tensor is null adds nothing. */
    private void addFluxResidual(double[] kelvin, Tensor[] k, double[] residual) {
        int n = shape.nodeCount();
        TriangleGeometry geometry = new TriangleGeometry(mesh);
        double[] slopes = new double[3 * n];
        double[] gx = new double[n];
        double[] gy = new double[n];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            Tensor kt = k[mesh.region(t)];
            if (kt == null) {
                continue;
            }
            geometry.moveTo(t);
            TriangleQuadrature quadrature = quadrature(t);
            // Differences to one node: a uniform temperature leaves exactly nothing, whatever its level.
            double level = kelvin[mesh.node(t, 0)];
            for (int p = 0; p < quadrature.pointCount(); p++) {
                shape.slopes(quadrature.l0()[p], quadrature.l1()[p], quadrature.l2()[p], slopes);
                geometry.gradients(slopes, n, gx, gy);
                double tx = 0;
                double ty = 0;
                for (int j = 0; j < n; j++) {
                    double u = kelvin[mesh.node(t, j)] - level;
                    tx += u * gx[j];
                    ty += u * gy[j];
                }
                double weight = quadrature.weight()[p] * geometry.areaElement();
                double fx = weight * (kt.xx() * tx + kt.xy() * ty);
                double fy = weight * (kt.xy() * tx + kt.yy() * ty);
                for (int i = 0; i < n; i++) {
                    residual[n * t + i] += gx[i] * fx + gy[i] * fy;
                }
            }
        }
    }

    @Override
    public void addTangent(double[] kelvin, TangentSink sink) {
        int n = shape.nodeCount();
        TriangleGeometry geometry = new TriangleGeometry(mesh);
        double[] slopes = new double[3 * n];
        double[] gx = new double[n];
        double[] gy = new double[n];
        double[] entries = new double[n * n];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            Tensor kt = tensor[mesh.region(t)];
            geometry.moveTo(t);
            TriangleQuadrature quadrature = quadrature(t);
            Arrays.fill(entries, 0);
            for (int p = 0; p < quadrature.pointCount(); p++) {
                shape.slopes(quadrature.l0()[p], quadrature.l1()[p], quadrature.l2()[p], slopes);
                geometry.gradients(slopes, n, gx, gy);
                double weight = quadrature.weight()[p] * geometry.areaElement();
                for (int j = 0; j < n; j++) {
                    double fx = weight * (kt.xx() * gx[j] + kt.xy() * gy[j]);
                    double fy = weight * (kt.xy() * gx[j] + kt.yy() * gy[j]);
                    for (int i = 0; i <= j; i++) {
                        entries[n * i + j] += gx[i] * fx + gy[i] * fy;
                    }
                }
            }
            for (int j = 0; j < n; j++) {
                for (int i = 0; i < j; i++) {
                    entries[n * j + i] = entries[n * i + j];
                }
            }
            sink.addTriangle(t, entries);
        }
    }
}
