package tepor.solver.assembly;

import tepor.mesher.mesh.Mesh;
import tepor.solver.element.FacetGeometry;
import tepor.solver.element.ShapeIntegrals;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Input;

/** A stated heat flow into the section through an edge: −∫ q Nᵢ. */
public final class EdgeInflow extends FacetEffect {
    private final EdgeCondition.Inflow condition;
    private final double flux;
    private final double fluxPerAmount;

    /**
     * @param flux W/m²
     * @param fluxPerAmount d(flux)/d(amount)
     */
    EdgeInflow(
            Mesh mesh, int[] facets, String owner, EdgeCondition.Inflow condition, double flux, double fluxPerAmount) {
        super(mesh, facets, owner, condition.word());
        this.condition = condition;
        this.flux = flux;
        this.fluxPerAmount = fluxPerAmount;
    }

    @Override
    public double outwardFlux(double kelvin) {
        return -flux;
    }

    @Override
    public double heatIn(double[] kelvin, int facet) {
        FacetGeometry geometry = new FacetGeometry(mesh);
        geometry.moveTo(facet);
        return flux * geometry.length();
    }

    @Override
    public void addResidual(double[] kelvin, double[] residual) {
        add(-flux, residual);
    }

    @Override
    public void addTangent(double[] kelvin, TangentSink sink) {
        // the inflow does not depend on the temperature
    }

    @Override
    public void addDerivative(double[] kelvin, Input input, double[] derivative) {
        if (input.equals(condition.amount())) {
            add(-fluxPerAmount, derivative);
        }
    }

    private void add(double q, double[] residual) {
        ShapeIntegrals integrals = new ShapeIntegrals(mesh);
        double[] length = new double[nodesPerFacet];
        for (int facet : facets) {
            integrals.overFacet(facet, length);
            for (int i = 0; i < nodesPerFacet; i++) {
                residual[slot(mesh, facet, i)] += q * length[i];
            }
        }
    }
}
