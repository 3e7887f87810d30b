package tepor.solver.assembly;

import tepor.mesher.mesh.Mesh;
import tepor.solver.element.ShapeIntegrals;
import tepor.solver.model.Input;
import tepor.solver.model.Region;

/** Heat produced evenly in a region: −∫ q Nᵢ. */
public final class RegionHeat implements Contribution {
    private final Mesh mesh;
    private final Region region;
    private final double density;
    private final double densityPerAmount;
    private final Input depth;
    private final double depthValue;

    /**
     * @param density W/m³
     * @param densityPerAmount d(density)/d(amount), in 1 over the unit of the amount times W/m³
     * @param depth the depth through which a total was made a density; null where none was
     * @param depthValue its value, m
     */
    public RegionHeat(
            Mesh mesh, Region region, double density, double densityPerAmount, Input depth, double depthValue) {
        this.mesh = mesh;
        this.region = region;
        this.density = density;
        this.densityPerAmount = densityPerAmount;
        this.depth = depth;
        this.depthValue = depthValue;
    }

    /** Number of the region. */
    public int region() {
        return region.index();
    }

    /** W/m³. */
    public double density() {
        return density;
    }

    @Override
    public String owner() {
        return region.name();
    }

    @Override
    public String kind() {
        return "heat";
    }

    @Override
    public void addResidual(double[] kelvin, double[] residual) {
        add(-density, residual);
    }

    @Override
    public void addTangent(double[] kelvin, TangentSink sink) {
        // the heat does not depend on the temperature
    }

    @Override
    public void addDerivative(double[] kelvin, Input input, double[] derivative) {
        if (input.equals(region.heat().amount())) {
            add(-densityPerAmount, derivative);
        } else if (input.equals(depth)) {
            add(density / depthValue, derivative);
        }
    }

    private void add(double q, double[] residual) {
        int n = mesh.nodesPerTriangle();
        ShapeIntegrals integrals = new ShapeIntegrals(mesh);
        double[] area = new double[n];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            if (mesh.region(t) == region.index()) {
                integrals.overTriangle(t, area);
                for (int i = 0; i < n; i++) {
                    residual[n * t + i] += q * area[i];
                }
            }
        }
    }
}
