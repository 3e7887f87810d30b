/**
 * The asks answered, the ledger, the hand check, and the one entry point {@code Solver}.
 *
 * <p>May not know how answers are shown.
 */
package tepor.solver.answer;
