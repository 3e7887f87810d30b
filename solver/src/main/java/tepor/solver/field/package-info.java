/**
 * The temperature field: the steady solution, its fluxes, and its values at points, along edges and inside elements, and the heat flow through
 * every facet.
 *
 * <p>May not know what is asked.
 */
package tepor.solver.field;
