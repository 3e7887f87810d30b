package tepor.viewer.export;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.UUID;

/** Writes a file whole or not at all: under a passing name beside it, then renamed. */
public final class WholeFile {
    private WholeFile() {}

    /**
     * Writes a file; one that is there already is replaced only once the new one is complete.
     *
     * @throws IOException if it cannot be written; nothing is left behind then
     */
    public static void write(Path file, FileContent content) throws IOException {
        if (Files.isDirectory(file)) {
            throw new FileAlreadyExistsException(file.toString(), null, "a folder of this name is in the way");
        }
        Path target = file.toAbsolutePath();
        Files.createDirectories(target.getParent());
        Path passing = passingName(target);
        try {
            fill(passing, content);
            replace(passing, target);
        } finally {
            Files.deleteIfExists(passing);
        }
    }

    /** A name beside a file or folder which nothing else has. */
    static Path passingName(Path target) {
        return target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".part");
    }

    static void fill(Path file, FileContent content) throws IOException {
        try (OutputStream out =
                new BufferedOutputStream(Files.newOutputStream(file, StandardOpenOption.CREATE_NEW), 1 << 16)) {
            content.writeTo(out);
        }
    }

    static void replace(Path passing, Path target) throws IOException {
        try {
            Files.move(passing, target, StandardCopyOption.ATOMIC_MOVE);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(passing, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
