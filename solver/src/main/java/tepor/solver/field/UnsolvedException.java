package tepor.solver.field;

/** The equations could not be solved; the message says why, for the user. */
public final class UnsolvedException extends RuntimeException {
    public UnsolvedException(String message) {
        super(message);
    }
}
