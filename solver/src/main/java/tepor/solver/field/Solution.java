package tepor.solver.field;

import tepor.solver.assembly.HeatBalance;

/**
 * A steady solution and what it took.
 *
 * @param balance the equations
 * @param field the temperatures
 * @param unknowns number of free nodes
 * @param iterations of conjugate gradients
 * @param residual |b − Kx| / |b|, recomputed from the final temperatures by the balance itself
 * @param secondsAssembly making the matrix
 * @param secondsLinear solving
 */
public record Solution(
        HeatBalance balance,
        TemperatureField field,
        int unknowns,
        int iterations,
        double residual,
        double secondsAssembly,
        double secondsLinear) {}
