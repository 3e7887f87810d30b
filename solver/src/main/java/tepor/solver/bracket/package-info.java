/**
 * One-dimensional resistances that bracket the heat flow between two surroundings, with nothing taken from the
 * finite-element solution.
 *
 * <p>Adiabatic cuts can only lower a conductance, perfectly conducting sheets only raise it (Rayleigh's monotonicity; the
 * upper and lower limits of ISO 6946:2017, 6.7.2 are these two for plane components). May not know of meshes or fields.
 */
package tepor.solver.bracket;
