package tepor.solver.assembly;

import tepor.solver.model.Input;

/**
 * One effect in the heat balance: its residual on its own (the ledger), its tangent, and its derivative by each of its
 * inputs (the budget).
 *
 * <p>Residuals are kept by element: entry n·t + i is what the effect takes out of the balance of local node i of triangle
 * t, W per metre of depth. Their sum over all triangles around a node that is free is zero at the solution (Hughes, Engel,
 * Mazzei &amp; Larson 2000, The continuous Galerkin method is locally conservative, J. Comput. Phys. 163, 467–488).
 */
public interface Contribution {
    /** Region or edge to which the effect belongs; empty for conduction. */
    String owner();

    /** The word by which the ledger calls the effect. */
    String kind();

    /**
     * Adds the residual.
     *
     * @param kelvin nodeCount temperatures
     * @param residual n·triangleCount entries, W/m
     */
    void addResidual(double[] kelvin, double[] residual);

    /**
     * Adds the derivative of the residual by the temperatures.
     *
     * @param kelvin nodeCount temperatures about which it is taken
     */
    void addTangent(double[] kelvin, TangentSink sink);

    /**
     * Adds the derivative of the residual by one input; nothing where the effect does not depend on it.
     *
     * @param kelvin nodeCount temperatures
     * @param derivative n·triangleCount entries, W/m per SI unit of the input
     */
    void addDerivative(double[] kelvin, Input input, double[] derivative);
}
