package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The first case of the README does what the README says. */
class ReadmeTest {
    private static final Path README = Path.of("..", "README.md");

    @TempDir
    Path place;

    @Test
    void theFirstCaseIsAnswered() throws IOException {
        Matcher block = Pattern.compile("```toml\n(.*?)```", Pattern.DOTALL).matcher(Files.readString(README));
        assertThat(block.find()).isTrue();
        Path wall = Files.writeString(place.resolve("wall.toml"), block.group(1));
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(
                new PrintStream(new ByteArrayOutputStream(), true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                false);
        Path out = place.resolve("out");
        Status status = new CommandRun(Calculation.SOLVER, terminal, () -> false)
                .run("answer", wall.toString(), "--out", out.toString());
        assertThat(status).as(err.toString(StandardCharsets.UTF_8)).isEqualTo(Status.UNDECIDED);
        JsonNode json = new ObjectMapper().readTree(out.resolve("answers.json").toFile());
        // Layers one after the other, by hand: R = 0.13 + 0.24/0.8 + 0.1/0.036 + 0.04 m²·K/W, 25 K, 0.5 m high.
        double r = 0.13 + 0.24 / 0.8 + 0.1 / 0.036 + 0.04;
        assertThat(json.at("/answers/0/value").asDouble()).isEqualTo(20 - 25 * 0.13 / r, within(1e-6));
        assertThat(json.at("/answers/1/value").asDouble()).isEqualTo(25 / r * 0.5, within(1e-6));
        assertThat(json.at("/answers/1/hand_check/inside").asBoolean()).isTrue();
        assertThat(json.at("/ledger/imbalance").asDouble()).isLessThan(1e-9);
        assertThat(json.at("/insulated/by_default").asDouble()).isZero();
        assertThat(json.at("/insulated/stated").asDouble()).isEqualTo(0.68, within(1e-9));
    }

    @Test
    void everyFileItNamesIsThere() throws IOException {
        Matcher link = Pattern.compile("\\]\\(([^)#:]+)\\)").matcher(Files.readString(README));
        int count = 0;
        while (link.find()) {
            assertThat(README.resolveSibling(link.group(1))).exists();
            count++;
        }
        assertThat(count).isGreaterThan(3);
    }
}
