package tepor.viewer.command;

/** How a run ended, from the best to the worst. */
public enum Status {
    /** Everything is answered, and no limit is broken or left undecided. */
    ANSWERED(0),
    /** A limit is undecided. */
    UNDECIDED(2),
    /** A limit is broken. */
    BROKEN(1),
    /** The computation could not be finished. */
    UNFINISHED(4),
    /** The case is wrong; nothing was written. */
    FAULTY(3),
    /** The command line is wrong; nothing was done. */
    USAGE(64);

    private final int code;

    Status(int code) {
        this.code = code;
    }

    /** Exit status of the process. */
    public int code() {
        return code;
    }

    /** The worse of two. */
    public Status or(Status other) {
        return compareTo(other) >= 0 ? this : other;
    }
}
