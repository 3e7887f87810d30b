package tepor.mesher.outline;

/**
 * One thing found in what a user wrote: what is wrong, where, and what would be right.
 *
 * @param severity whether the case can be answered all the same
 * @param code short stable identifier in lower case with hyphens, such as {@code unknown-key}
 * @param place where in the user's file
 * @param what what is wrong, as a sentence without a full stop, with the value that was found
 * @param remedy what would be right, as a sentence without a full stop; empty only for warnings that ask for nothing
 */
public record Finding(Severity severity, String code, Place place, String what, String remedy) {
    /** An error refuses the case; a warning goes along with the answer. */
    public enum Severity {
        ERROR,
        WARNING
    }

    /** The finding as one line of text: {@code case.toml:12:3: error: what; remedy}. */
    @Override
    public String toString() {
        String kind = severity == Severity.ERROR ? "error" : "warning";
        return place + ": " + kind + ": " + what + (remedy.isEmpty() ? "" : "; " + remedy);
    }
}
