package tepor.viewer.export;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/** Writes a file whole or not at all: under another name in the same folder, moved into place when it is complete. */
final class WholeFile {
    /** Writes the contents. */
    @FunctionalInterface
    interface Contents {
        void writeTo(OutputStream out) throws IOException;
    }

    private WholeFile() {}

    /** Writes a file, in place of an older one of that name. */
    static void write(Path file, Contents contents) throws IOException {
        Path target = file.toAbsolutePath();
        // Not a temporary file of the JDK: that could be read by its owner alone, also once it is in place.
        Path part = target.resolveSibling(
                "." + target.getFileName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(part), 1 << 16)) {
                contents.writeTo(out);
            }
            move(part, target);
        } finally {
            Files.deleteIfExists(part);
        }
    }

    private static void move(Path part, Path target) throws IOException {
        try {
            Files.move(part, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(part, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
