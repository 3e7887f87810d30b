package tepor.viewer.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OutputFolderTest {
    @TempDir
    Path place;

    private static FileContent text(String text) {
        return out -> out.write(text.getBytes(StandardCharsets.UTF_8));
    }

    private List<String> names() throws IOException {
        try (var files = Files.walk(place)) {
            return files.filter(f -> !f.equals(place))
                    .map(f -> place.relativize(f).toString())
                    .sorted()
                    .toList();
        }
    }

    @Test
    void appearsWithAllItsFiles() throws IOException {
        try (OutputFolder folder = OutputFolder.begin(place.resolve("deep/answer"))) {
            folder.write("a.txt", text("a"));
            assertThat(place.resolve("deep/answer")).doesNotExist();
            Files.writeString(folder.reserve("b.txt"), "b");
            folder.publish();
        }
        assertThat(names()).containsExactly("deep", "deep/answer", "deep/answer/a.txt", "deep/answer/b.txt");
    }

    @Test
    void leavesNothingWhenAFileFailsMidway() throws IOException {
        assertThatThrownBy(() -> {
                    try (OutputFolder folder = OutputFolder.begin(place.resolve("answer"))) {
                        folder.write("a.txt", text("a"));
                        folder.write("b.txt", out -> {
                            out.write(new byte[100_000]);
                            throw new IOException("no space left");
                        });
                        folder.publish();
                    }
                })
                .hasMessage("no space left");
        assertThat(names()).isEmpty();
    }

    @Test
    void keepsTheOldFilesWhenTheNewOnesFail() throws IOException {
        Path target = Files.createDirectory(place.resolve("answer"));
        Files.writeString(target.resolve("a.txt"), "old");
        Files.writeString(target.resolve("mine.txt"), "mine");
        assertThatThrownBy(() -> {
                    try (OutputFolder folder = OutputFolder.begin(target)) {
                        folder.write("a.txt", text("new"));
                        throw new IllegalStateException("stopped");
                    }
                })
                .hasMessage("stopped");
        assertThat(target.resolve("a.txt")).hasContent("old");
        assertThat(names()).containsExactly("answer", "answer/a.txt", "answer/mine.txt");
    }

    @Test
    void replacesOldFilesAndLeavesOthersAlone() throws IOException {
        Path target = Files.createDirectory(place.resolve("answer"));
        Files.writeString(target.resolve("a.txt"), "old");
        Files.writeString(target.resolve("mine.txt"), "mine");
        try (OutputFolder folder = OutputFolder.begin(target)) {
            folder.write("a.txt", text("new"));
            folder.publish();
        }
        assertThat(target.resolve("a.txt")).hasContent("new");
        assertThat(target.resolve("mine.txt")).hasContent("mine");
        assertThat(names()).containsExactly("answer", "answer/a.txt", "answer/mine.txt");
    }

    @Test
    void replacesNothingWhereAFolderIsInTheWayOfOneFile() throws IOException {
        Path target = Files.createDirectory(place.resolve("answer"));
        Files.writeString(target.resolve("a.txt"), "old");
        Files.createDirectory(target.resolve("b.txt"));
        assertThatThrownBy(() -> {
                    try (OutputFolder folder = OutputFolder.begin(target)) {
                        folder.write("a.txt", text("new"));
                        folder.write("b.txt", text("new"));
                        folder.publish();
                    }
                })
                .isInstanceOf(FileAlreadyExistsException.class);
        assertThat(target.resolve("a.txt")).hasContent("old");
        assertThat(names()).containsExactly("answer", "answer/a.txt", "answer/b.txt");
    }

    @Test
    void refusesAFileInItsPlace() throws IOException {
        Path file = Files.writeString(place.resolve("answer"), "a file");
        assertThatThrownBy(() -> OutputFolder.begin(file)).isInstanceOf(FileAlreadyExistsException.class);
        assertThat(file).hasContent("a file");
    }

    @Test
    void writesASingleFileWholeOrNotAtAll() throws IOException {
        Path file = Files.writeString(place.resolve("one.txt"), "old");
        assertThatThrownBy(() -> WholeFile.write(file, out -> {
                    out.write(new byte[100_000]);
                    throw new IOException("no space left");
                }))
                .hasMessage("no space left");
        assertThat(file).hasContent("old");
        WholeFile.write(file, text("new"));
        assertThat(file).hasContent("new");
        assertThat(names()).containsExactly("one.txt");
    }
}
