package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import tepor.mesher.outline.FaultyInputException;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Finding.Severity;
import tepor.solver.model.Case;

/** A folder with a case file, for tests. A « in a case file marks the place where a finding is expected. */
final class CaseFolder {
    /** A small sound case. Tests change one thing of it. */
    static final String SOUND = """
            format = 1
            title = "Plate"
            [outline]
            unit = "mm"
            [[region]]
            name = "plate"
            outline = "POLYGON ((0 0, 100 0, 100 50, 0 50, 0 0))"
            material = "steel"
            [[region]]
            name = "bar"
            outline = "POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))"
            material = "copper"
            heat = "42 W/m"
            [[region]]
            name = "void"
            outline = "POLYGON ((60 10, 80 10, 80 30, 60 30, 60 10))"
            material = "nothing"
            [material.steel]
            k = "15 W/(m.K)"
            [material.copper]
            k = "380 W/(m.K)"
            [air.room]
            temperature = "20 degC"
            film = "8 W/(m2.K)"
            [air.cellar]
            temperature = "10 degC"
            [[edge]]
            name = "skin"
            where = "top"
            air = "room"
            [[edge]]
            name = "sole"
            where = "bottom"
            air = "cellar"
            resistance = "0.1 m2.K/W"
            [[edge]]
            name = "bar skin"
            where = { of = "bar" }
            [[ask]]
            name = "hot"
            peak = "bar"
            """;

    private final Path folder;

    CaseFolder(Path folder) {
        this.folder = folder;
    }

    Path file(String name) {
        return folder.resolve(name);
    }

    void write(String name, String text) {
        try {
            Files.writeString(file(name), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    Case read(String toml) {
        write("plate.toml", toml);
        return CaseReader.read(file("plate.toml"));
    }

    /** The sound case with one text in it replaced. */
    static String sound(String old, String replacement) {
        assertThat(SOUND).contains(old);
        int at = SOUND.indexOf(old);
        return SOUND.substring(0, at) + replacement + SOUND.substring(at + old.length());
    }

    /** Reads a faulty case and checks that its errors are exactly those at the marks; gives them in that order. */
    List<Finding> errors(String marked) {
        List<String> places = new ArrayList<>();
        String toml = unmarked(marked, places);
        List<Finding> errors =
                all(toml).stream().filter(f -> f.severity() == Severity.ERROR).toList();
        assertThat(errors.stream().map(CaseFolder::place).toList())
                .as("%s", errors)
                .isEqualTo(places);
        for (Finding error : errors) {
            assertThat(error.place().file()).isEqualTo(file("plate.toml").toString());
            assertThat(error.what()).isNotBlank().doesNotEndWith(".");
            assertThat(error.remedy()).isNotBlank().doesNotEndWith(".");
        }
        return errors;
    }

    /**
     * Replaces one text of the sound case and checks that the one error is at the mark in the replacement.
     *
     * @param old a text of the sound case; single quotes stand for double ones, here and in the replacement
     * @param what words of the message, separated by semicolons
     * @param remedy words of the remedy, separated by semicolons
     */
    void fault(String old, String replacement, String what, String remedy) {
        List<Finding> errors = errors(sound(old.replace('\'', '"'), replacement.replace('\'', '"')));
        assertThat(errors).hasSize(1);
        for (String words : what.split(";")) {
            assertThat(errors.get(0).what()).contains(words.strip());
        }
        for (String words : remedy.split(";")) {
            assertThat(errors.get(0).remedy()).contains(words.strip());
        }
    }

    /** Reads a sound case and checks that its warnings are exactly those at the marks; gives them in that order. */
    List<Finding> warnings(String marked) {
        List<String> places = new ArrayList<>();
        List<Finding> warnings = read(unmarked(marked, places)).warnings();
        assertThat(warnings.stream().map(CaseFolder::place).toList())
                .as("%s", warnings)
                .isEqualTo(places);
        assertThat(warnings).allMatch(w -> w.severity() == Severity.WARNING);
        return warnings;
    }

    /** Everything found in a case. */
    List<Finding> all(String toml) {
        try {
            return read(toml).warnings();
        } catch (FaultyInputException e) {
            return e.findings();
        }
    }

    private static String place(Finding finding) {
        return finding.place().line() + ":" + finding.place().column();
    }

    private static String unmarked(String marked, List<String> places) {
        StringBuilder plain = new StringBuilder();
        int line = 1;
        int column = 1;
        for (int i = 0; i < marked.length(); i++) {
            char c = marked.charAt(i);
            if (c == '«') {
                places.add(line + ":" + column);
                continue;
            }
            plain.append(c);
            line += c == '\n' ? 1 : 0;
            column = c == '\n' ? 1 : column + 1;
        }
        return plain.toString();
    }
}
