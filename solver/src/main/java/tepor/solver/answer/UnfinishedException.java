package tepor.solver.answer;

/** The computation could not be finished; the message says why, for the user. */
public final class UnfinishedException extends RuntimeException {
    public UnfinishedException(String message) {
        super(message);
    }
}
