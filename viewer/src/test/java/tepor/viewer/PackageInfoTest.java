package tepor.viewer;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every package says what it is for. */
class PackageInfoTest {
    @ParameterizedTest
    @ValueSource(strings = {"mesher", "solver", "viewer"})
    void everyPackageSaysWhatItIsFor(String module) throws IOException {
        Path sources = Path.of("..", module, "src", "main", "java");
        TreeSet<Path> packages = new TreeSet<>();
        try (Stream<Path> files = Files.walk(sources)) {
            files.filter(f -> f.toString().endsWith(".java"))
                    .map(Path::getParent)
                    .forEach(packages::add);
        }
        assertThat(packages).isNotEmpty().allSatisfy(folder -> {
            Path info = folder.resolve("package-info.java");
            assertThat(info).exists();
            assertThat(Files.readString(info)).contains("/**").contains("package ");
        });
    }
}
