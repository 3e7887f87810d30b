package tepor.solver.assembly;

import tepor.mesher.mesh.Mesh;
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
        return flux * mesh.facetLength(facet);
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
        for (int facet : facets) {
            double heat = q * mesh.facetLength(facet);
            for (int i = 0; i < shape.nodeCount(); i++) {
                double share = 0;
                for (int p = 0; p < shape.pointCount(); p++) {
                    share += shape.weight(p) * shape.value(p, i);
                }
                residual[slot(mesh, facet, i)] += heat * share;
            }
        }
    }
}
