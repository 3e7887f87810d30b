package tepor.solver.quantity;

/** A text is not a quantity of the dimension wanted. */
public final class QuantityException extends Exception {
    private final String remedy;

    /**
     * @param what what is wrong, with the text found
     * @param remedy what would be right
     */
    public QuantityException(String what, String remedy) {
        super(what);
        this.remedy = remedy;
    }

    /** What would be right, as a sentence without a full stop. */
    public String remedy() {
        return remedy;
    }
}
