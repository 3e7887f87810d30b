package tepor.viewer.command;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.util.concurrent.CancellationException;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.solver.answer.UnfinishedException;
import tepor.viewer.export.Version;

/** Tells the user, in plain words, why something did not work. */
final class FailureReport {
    private static final String WHERE_TO_REPORT =
            "This is a fault in Tepor, not in your case. Please report it to those who keep this copy of Tepor "
                    + "(DEVELOPERS.md says how), with the case and the text that TEPOR_DEBUG=1 adds.";

    private final PrintStream err;
    private boolean traces;

    FailureReport(PrintStream err) {
        this.err = err;
    }

    /** Whether an unexpected failure shows its stack trace. */
    void showTraces(boolean show) {
        this.traces = show;
    }

    /** Says what went wrong with a case, and how bad that is. */
    Status of(String what, Throwable failure) {
        if (failure instanceof FaultyInputException faulty) {
            return faulty(faulty);
        }
        if (failure instanceof UnfinishedException) {
            err.println(what + ": not finished: " + failure.getMessage());
        } else if (failure instanceof CancellationException) {
            err.println(what + ": stopped; nothing was written");
        } else if (failure instanceof OutOfMemoryError) {
            err.println(
                    what + ": not finished: the " + (Runtime.getRuntime().maxMemory() >> 20)
                            + " MB of memory were not enough; give Java more (java -Xmx4g -jar ...), or lower elements_at_most");
        } else if (failure instanceof IOException io) {
            err.println(what + ": error: " + words(io));
            trace(failure);
        } else {
            return unexpected(failure);
        }
        return Status.UNFINISHED;
    }

    /** Says that something happened which should not. */
    Status unexpected(Throwable failure) {
        String message = failure.getMessage();
        err.println("tepor " + Version.text() + ": unexpected failure: "
                + failure.getClass().getSimpleName() + (message == null ? "" : ": " + message));
        err.println(WHERE_TO_REPORT);
        trace(failure);
        return Status.UNFINISHED;
    }

    private Status faulty(FaultyInputException faulty) {
        long errors = 0;
        for (Finding finding : faulty.findings()) {
            err.println(finding);
            errors += finding.severity() == Finding.Severity.ERROR ? 1 : 0;
        }
        err.println((errors == 1 ? "1 error" : errors + " errors") + "; nothing was written");
        return Status.FAULTY;
    }

    private void trace(Throwable failure) {
        if (traces) {
            failure.printStackTrace(err);
        }
    }

    /** A failed reading or writing in plain words. */
    static String words(IOException failure) {
        if (failure instanceof FileSystemException at) {
            String reason = at.getReason();
            if (failure instanceof AccessDeniedException) {
                reason = "no permission to write here";
            } else if (failure instanceof NoSuchFileException) {
                reason = "there is no such file or folder";
            } else if (failure instanceof NotDirectoryException) {
                reason = "this is not a folder";
            }
            return "cannot write " + at.getFile() + (reason == null ? "" : ": " + reason);
        }
        return "cannot write the output: " + failure.getMessage();
    }
}
