package tepor.solver.casefile;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.tomlj.Toml;
import org.tomlj.TomlParseError;
import org.tomlj.TomlParseResult;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;
import tepor.solver.model.SourceFile;

/** Reads the files of a case and keeps the digest of each. */
final class CaseFiles {
    private final Path caseFile;
    private final Findings findings;
    private final List<SourceFile> read = new ArrayList<>();

    /**
     * @param caseFile the TOML file; other files are found relative to it
     * @param findings takes what cannot be read
     */
    CaseFiles(Path caseFile, Findings findings) {
        this.caseFile = caseFile;
        this.findings = findings;
    }

    /** The case file's name in messages: as the user named it. */
    String caseName() {
        return caseFile.toString();
    }

    /** The stem of the case file, or the name of its folder when the stem is {@code case}. */
    String stem() {
        String file = String.valueOf(caseFile.getFileName());
        int dot = file.lastIndexOf('.');
        String stem = dot > 0 ? file.substring(0, dot) : file;
        Path folder = caseFile.toAbsolutePath().normalize().getParent();
        boolean named = folder != null && folder.getFileName() != null;
        return stem.equals("case") && named ? folder.getFileName().toString() : stem;
    }

    /** The case file as TOML 1.0; empty where it cannot be read, or is not TOML: keys may then be missing for no other reason. */
    Optional<KeyTable> readCase() {
        return text(caseFile, String.valueOf(caseFile.getFileName()), new Place(caseName(), 0, 0))
                .flatMap(this::parse);
    }

    /**
     * The text of a file that the case names, relative to the case file; empty where it cannot be read.
     *
     * @param name as the user named it
     * @param place where it is named
     */
    Optional<String> read(String name, Place place) {
        return resolve(name, place).flatMap(file -> text(file, name, place));
    }

    /**
     * A file that the case names, relative to the case file, as it is; empty where it cannot be read.
     *
     * @param name as the user named it
     * @param place where it is named
     */
    Optional<byte[]> readBytes(String name, Place place) {
        return resolve(name, place).flatMap(file -> bytes(file, name, place));
    }

    /** How messages call a file that the case names: so that it can be found from where the program was started. */
    String nameInMessages(String name) {
        return caseFile.resolveSibling(name).toString();
    }

    /** Every file read so far, the case file first. */
    List<SourceFile> files() {
        return List.copyOf(read);
    }

    private Optional<Path> resolve(String name, Place place) {
        try {
            return Optional.of(caseFile.resolveSibling(name));
        } catch (InvalidPathException e) {
            findings.error("file-unreadable", place, "'" + name + "' is not a file name", "name a file that exists");
            return Optional.empty();
        }
    }

    private Optional<String> text(Path file, String name, Place place) {
        return bytes(file, name, place).flatMap(bytes -> decode(bytes, file, place));
    }

    private Optional<byte[]> bytes(Path file, String name, Place place) {
        if (!Files.exists(file)) {
            findings.error(
                    "file-missing",
                    place,
                    "there is no file " + file,
                    file.equals(caseFile)
                            ? "name a case file that exists"
                            : "file names are relative to the case file; check folder and spelling");
            return Optional.empty();
        }
        if (Files.isDirectory(file)) {
            findings.error("file-unreadable", place, file + " is a folder", "name a file in it");
            return Optional.empty();
        }
        byte[] bytes;
        try {
            bytes = Files.readAllBytes(file);
        } catch (IOException e) {
            findings.error(
                    "file-unreadable",
                    place,
                    "the file " + file + " cannot be read (" + e.getMessage() + ")",
                    "check that it may be read");
            return Optional.empty();
        }
        read.add(new SourceFile(name, sha256(bytes)));
        return Optional.of(bytes);
    }

    private Optional<String> decode(byte[] bytes, Path file, Place place) {
        ByteBuffer buffer = ByteBuffer.wrap(bytes);
        try {
            String text = StandardCharsets.UTF_8.newDecoder().decode(buffer).toString();
            // Some editors put a byte order mark before UTF-8 text; TOML has no place for it.
            return Optional.of(text.startsWith("\uFEFF") ? text.substring(1) : text);
        } catch (CharacterCodingException e) {
            int line = 1;
            for (int i = 0; i < buffer.position(); i++) {
                line += bytes[i] == '\n' ? 1 : 0;
            }
            int value = buffer.hasRemaining() ? buffer.get(buffer.position()) & 0xFF : 0;
            Place where = file.equals(caseFile) ? new Place(caseName(), line, 0) : place;
            findings.error(
                    "not-utf8",
                    where,
                    "the file " + file + " is not UTF-8 text: byte 0x" + Integer.toHexString(value) + " in line "
                            + line,
                    "save it with the encoding UTF-8");
            return Optional.empty();
        }
    }

    private static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    private Optional<KeyTable> parse(String text) {
        String file = caseName();
        int nul = text.indexOf('\0');
        if (nul >= 0) {
            int line =
                    (int) text.substring(0, nul).chars().filter(c -> c == '\n').count() + 1;
            int column = nul - text.lastIndexOf('\n', nul);
            findings.error(
                    "toml-syntax",
                    new Place(file, line, column),
                    "there is a NUL character in the file",
                    "a case file is plain text in TOML 1.0");
            return Optional.empty();
        }
        TomlParseResult result = Toml.parse(text);
        List<String> lines = text.lines().toList();
        Set<String> notArrays = new HashSet<>();
        Set<Integer> faultyHeaders = new HashSet<>();
        for (TomlParseError error : result.errors()) {
            if (error.getMessage().contains("is not an array")) {
                // Every [[region]] after one [region] is the same fault, and so is every key below it.
                faultyHeaders.add(error.position().line());
                if (!notArrays.add(error.getMessage())) {
                    continue;
                }
            } else if (error.getMessage().contains("previously defined")
                    && faultyHeaders.contains(headerLine(lines, error.position().line()))) {
                continue;
            }
            Place place =
                    new Place(file, error.position().line(), error.position().column());
            String message = error.getMessage();
            findings.error("toml-syntax", place, "this is not TOML: " + message, remedy(message));
        }
        return result.hasErrors()
                ? Optional.empty()
                : Optional.of(new KeyTable(result, "the case file", "the case", new Place(file, 1, 1), findings));
    }

    /** The line, counted from 1, of the table header above a line; 0 where there is none. */
    private static int headerLine(List<String> lines, int line) {
        int header = Math.min(line, lines.size());
        while (header > 0 && !lines.get(header - 1).stripLeading().startsWith("[")) {
            header--;
        }
        return header;
    }

    private static String remedy(String message) {
        if (message.contains("previously defined")) {
            return "a key or table stands once; [[region]], [[edge]] and [[ask]] have double brackets";
        }
        if (message.contains("expected \"") || message.contains("end of line")) {
            return "texts stand in \"double quotes\" and end on their line; quantities are texts, too";
        }
        return "correct the line; a case file is plain text in TOML 1.0: key = value, texts in \"double quotes\"";
    }
}
