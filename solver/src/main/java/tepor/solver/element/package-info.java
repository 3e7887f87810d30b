/**
 * Linear and quadratic triangles and their sides: shape functions, gradients, quadrature.
 *
 * <p>May not know of conductivities, conditions or matrices.
 */
package tepor.solver.element;
