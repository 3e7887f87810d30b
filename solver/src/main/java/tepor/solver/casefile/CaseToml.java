package tepor.solver.casefile;

import java.util.Optional;
import org.tomlj.Toml;
import org.tomlj.TomlParseError;
import org.tomlj.TomlParseResult;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/** Parses the text of a case file as TOML 1.0. */
final class CaseToml {
    private CaseToml() {}

    /**
     * Parses.
     *
     * @param file the file's name in messages
     * @param text what is in it
     * @param findings takes every syntax error
     * @return the top-level table; empty where there is a syntax error, since keys may then be missing for no other reason
     */
    static Optional<KeyTable> parse(String file, String text, Findings findings) {
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
        for (TomlParseError error : result.errors()) {
            Place place =
                    new Place(file, error.position().line(), error.position().column());
            String message = error.getMessage();
            findings.error("toml-syntax", place, "this is not TOML: " + message, remedy(message));
        }
        return result.hasErrors()
                ? Optional.empty()
                : Optional.of(new KeyTable(result, "the case file", "the case", new Place(file, 1, 1), findings));
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
