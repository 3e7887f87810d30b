/**
 * How far an answer may be trusted: size fields from what the section shows and from the last solution, and when an
 * answer has settled.
 *
 * <p>May not know the single kinds of asks.
 */
package tepor.solver.trust;
