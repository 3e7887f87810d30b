/**
 * Symmetric sparse matrix, preconditioner and conjugate gradients behind the interfaces of MTJ.
 *
 * <p>May not know where the equations come from.
 */
package tepor.solver.linear;
