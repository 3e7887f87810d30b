package tepor.solver.model;

import tepor.solver.quantity.Quantity;

/**
 * A limit which an answer has to keep.
 *
 * @param relation how the answer must stand to the value
 * @param quantity the value; its unit is the one in which margins are given
 */
public record Limit(Relation relation, Quantity quantity) {
    /** How an answer must stand to its limit. */
    public enum Relation {
        AT_MOST("<="),
        AT_LEAST(">=");

        private final String sign;

        Relation(String sign) {
            this.sign = sign;
        }

        public String sign() {
            return sign;
        }
    }

    /** Distance from a value (SI) to the limit, SI; positive where the limit is kept. */
    public double margin(double value) {
        return relation == Relation.AT_MOST ? quantity.value() - value : value - quantity.value();
    }
}
