/**
 * The temperature field: the steady solution, its fluxes, and its values at points, along lines and inside elements.
 *
 * <p>May not know what is asked.
 */
package tepor.solver.field;
