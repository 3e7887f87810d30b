package tepor.viewer.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Place;

/** The CASE argument: a case file, or a folder that holds one named case.toml. */
final class CasePath {
    private static final String IN_FOLDER = "case.toml";

    private CasePath() {}

    /**
     * The case file that an argument means.
     *
     * @throws FaultyInputException if there is none
     */
    static Path file(Path argument) {
        if (Files.isDirectory(argument)) {
            Path inside = argument.resolve(IN_FOLDER);
            if (!Files.isRegularFile(inside)) {
                throw missing(argument, "the folder holds no " + IN_FOLDER, instead(argument));
            }
            return inside;
        }
        if (!Files.exists(argument)) {
            Path folder = argument.toAbsolutePath().getParent();
            boolean folderThere = folder != null && Files.isDirectory(folder);
            throw missing(
                    argument,
                    "there is no such file",
                    folderThere ? instead(folder) : "the folder " + folder + " is not there either");
        }
        return argument;
    }

    /** The name that a case file gives its case: its stem, or its folder's name when the stem is "case". */
    static String name(Path argument) {
        Path file = Files.isDirectory(argument) ? argument.resolve(IN_FOLDER) : argument;
        Path absolute = file.toAbsolutePath().normalize();
        String name = String.valueOf(absolute.getFileName());
        int dot = name.lastIndexOf('.');
        String stem = dot > 0 ? name.substring(0, dot) : name;
        Path folder = absolute.getParent();
        return stem.equals("case") && folder != null && folder.getFileName() != null
                ? folder.getFileName().toString()
                : stem;
    }

    private static String instead(Path folder) {
        try (var files = Files.list(folder)) {
            List<String> found = files.map(p -> String.valueOf(p.getFileName()))
                    .filter(n -> n.endsWith(".toml"))
                    .sorted()
                    .limit(5)
                    .toList();
            return found.isEmpty()
                    ? "name a case file that ends in .toml, or a folder with a " + IN_FOLDER
                    : "there is " + String.join(", ", found);
        } catch (IOException e) {
            return "name a case file that ends in .toml, or a folder with a " + IN_FOLDER;
        }
    }

    private static FaultyInputException missing(Path argument, String what, String remedy) {
        return new FaultyInputException(List.of(new Finding(
                Finding.Severity.ERROR, "no-case-file", new Place(argument.toString(), 0, 0), what, remedy)));
    }
}
