package tepor.solver.answer;

/**
 * What one mesh says to an ask.
 *
 * @param value SI
 * @param where place in metres, x and y; null where there is none
 * @param reference what a tolerance in percent refers to, SI
 */
record AskValue(double value, double[] where, double reference) {}
