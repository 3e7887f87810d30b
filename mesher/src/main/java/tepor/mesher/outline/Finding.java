package tepor.mesher.outline;

import java.util.Locale;

/**
 * One thing found in what a user wrote: what is wrong, where, and what would be right.
 *
 * @param severity whether the case can be answered all the same
 * @param code short stable identifier in lower case with hyphens, such as {@code unknown-key}
 * @param place where in the user's file
 * @param what what is wrong, as a sentence without a full stop, with the value that was found
 * @param remedy what would be right, as a sentence without a full stop; empty only where nothing is asked for
 */
public record Finding(Severity severity, String code, Place place, String what, String remedy) {
    /**
     * An error refuses the case; a warning goes along with the answer, and asks to be looked at; a note says what may well
     * be meant so.
     */
    public enum Severity {
        ERROR,
        WARNING,
        NOTE;

        /** The word in messages and in JSON. */
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** The finding as one line of text: {@code case.toml:12:3: error: what; remedy}. */
    @Override
    public String toString() {
        return place + ": " + severity.word() + ": " + what + (remedy.isEmpty() ? "" : "; " + remedy);
    }
}
