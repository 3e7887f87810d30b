package tepor.viewer.export;

import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * A folder of output files that appears only once all of them are complete.
 *
 * <p>Files are written into a passing folder beside the target. {@link #publish} renames that folder, or, where the target
 * is there already, moves each file into it: every file is then the old one or the new one, never a part. Closing without
 * publishing leaves nothing behind.
 */
public final class OutputFolder implements AutoCloseable {
    private final Path target;
    private final Path passing;
    private final List<String> names = new ArrayList<>();

    private OutputFolder(Path target, Path passing) {
        this.target = target;
        this.passing = passing;
    }

    /**
     * Begins an output folder.
     *
     * @throws IOException if the place cannot be written to
     */
    public static OutputFolder begin(Path folder) throws IOException {
        Path target = folder.toAbsolutePath().normalize();
        if (Files.exists(target) && !Files.isDirectory(target)) {
            throw new FileAlreadyExistsException(folder.toString(), null, "a file of this name is in the way");
        }
        if (target.getParent() == null) {
            throw new FileAlreadyExistsException(folder.toString(), null, "it has no folder above it");
        }
        Files.createDirectories(target.getParent());
        return new OutputFolder(target, Files.createDirectory(WholeFile.passingName(target)));
    }

    /** Writes one file of the folder. */
    public void write(String name, FileContent content) throws IOException {
        WholeFile.fill(passing.resolve(name), content);
        names.add(name);
    }

    /** Where a file of the folder may be written by its path; it is published with the others. */
    public Path reserve(String name) {
        names.add(name);
        return passing.resolve(name);
    }

    /** Names of the files in the order written. */
    public List<String> names() {
        return List.copyOf(names);
    }

    /** Makes the files appear in the target. */
    public void publish() throws IOException {
        if (!Files.exists(target)) {
            WholeFile.replace(passing, target);
            return;
        }
        for (String name : names) {
            if (Files.isDirectory(target.resolve(name))) {
                throw new FileAlreadyExistsException(
                        target.resolve(name).toString(), null, "a folder of this name is in the way");
            }
        }
        for (String name : names) {
            WholeFile.replace(passing.resolve(name), target.resolve(name));
        }
    }

    /** Removes what was not published. */
    @Override
    public void close() throws IOException {
        if (!Files.exists(passing)) {
            return;
        }
        for (String name : names) {
            Files.deleteIfExists(passing.resolve(name));
        }
        try (var left = Files.list(passing)) {
            for (Path file : left.toList()) {
                Files.deleteIfExists(file);
            }
        }
        Files.deleteIfExists(passing);
    }
}
