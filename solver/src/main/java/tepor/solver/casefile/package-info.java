/**
 * The case file: TOML and outline files to the model, with place, reason and remedy for everything wrong.
 *
 * <p>May not know how a case is solved.
 */
package tepor.solver.casefile;
