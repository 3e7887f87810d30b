package tepor.viewer;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** Whatever the jar bundles, it bundles with its licence. The build writes what is bundled to target/bundled.txt. */
class LicencesTest {
    private static List<String[]> listed() throws IOException {
        return text("list.tsv")
                .lines()
                .filter(line -> !line.startsWith("#"))
                .map(line -> line.split("\t", -1))
                .toList();
    }

    private static String text(String name) throws IOException {
        try (InputStream in = LicencesTest.class.getResourceAsStream("/licences/" + name)) {
            assertThat(in).as("licences/" + name).isNotNull();
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    /** Lines such as "   org.tomlj:tomlj:jar:2.2.0:compile -- module org.tomlj". */
    private static Set<String> bundled() throws IOException {
        return Files.readAllLines(Path.of("target", "bundled.txt")).stream()
                .map(String::strip)
                .filter(line -> line.contains(":jar:"))
                .map(line -> line.split(" ")[0].split(":"))
                .map(part -> part[0] + ":" + part[1] + ":" + part[3])
                .collect(Collectors.toCollection(TreeSet::new));
    }

    @Test
    void everyBundledLibraryIsListedAndNoOther() throws IOException {
        Set<String> listed = listed().stream().map(row -> row[0]).collect(Collectors.toCollection(TreeSet::new));
        assertThat(listed).isEqualTo(bundled());
    }

    @Test
    void everyListedLibraryHasItsTexts() throws IOException {
        for (String[] row : listed()) {
            assertThat(row).as(String.join(" ", row)).hasSize(3);
            assertThat(row[1]).as("licence of " + row[0]).isNotBlank();
            for (String name : row[2].split(",")) {
                assertThat(text(name)).as(row[0] + ": " + name).hasSizeGreaterThan(100);
            }
        }
    }
}
