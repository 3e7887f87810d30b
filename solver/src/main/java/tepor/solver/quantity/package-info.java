/**
 * Numbers with unit and spread, read from text and written as text: SI inside, units only at the border.
 *
 * <p>JSR 385 behind it, the trade's spellings normalised in front of it. May not know what a quantity is used for.
 */
package tepor.solver.quantity;
