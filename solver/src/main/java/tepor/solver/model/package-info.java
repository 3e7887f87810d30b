/**
 * The physical statement: materials, airs, edges and their conditions, asks; every quantity is an {@link
 * tepor.solver.model.Input} with a path.
 *
 * <p>May not know how a case is written, nor how it is solved.
 */
package tepor.solver.model;
