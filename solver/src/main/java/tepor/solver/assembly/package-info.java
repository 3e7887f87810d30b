/**
 * The heat balance as a sum of contributions, each one class: its element matrix and load, and its residual on its own.
 *
 * <p>May not know how the equations are solved.
 */
package tepor.solver.assembly;
