package tepor.viewer.command;

import java.io.Console;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Locale;

/**
 * Where a run prints.
 *
 * @param out answers
 * @param err messages, warnings and progress
 * @param interactive whether somebody watches, so that a line may be drawn over
 */
public record Terminal(PrintStream out, PrintStream err, boolean interactive) {
    /**
     * The terminal of the process. Text is UTF-8, whatever the locale, except on a Windows console, which says what it
     * reads.
     */
    static Terminal ofProcess() {
        Console console = console();
        boolean windows =
                System.getProperty("os.name", "").toLowerCase(Locale.ROOT).startsWith("windows");
        Charset charset = console != null && windows ? console.charset() : StandardCharsets.UTF_8;
        return new Terminal(
                new PrintStream(new FileOutputStream(FileDescriptor.out), false, charset),
                new PrintStream(new FileOutputStream(FileDescriptor.err), true, charset),
                console != null);
    }

    /** The console if somebody sits at it, else null. */
    @SuppressWarnings("SystemConsoleNull") // What the warning is about, is dealt with below.
    private static Console console() {
        Console console = System.console();
        if (console == null || Runtime.version().feature() < 22) {
            return console;
        }
        try {
            // Since Java 22 there is a console even without a terminal; this method, new there, tells which.
            return Boolean.TRUE.equals(Console.class.getMethod("isTerminal").invoke(console)) ? console : null;
        } catch (ReflectiveOperationException e) {
            return null;
        }
    }
}
