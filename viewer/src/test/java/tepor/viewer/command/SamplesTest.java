package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every sample is answered as closely as it asks for, and its heat adds up. */
class SamplesTest {
    @TempDir
    Path place;

    @ParameterizedTest
    @ValueSource(strings = {"01-slab-edge", "02-busbar-duct", "03-cable-trench"})
    void aSampleIsAnswered(String name) throws IOException {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(
                new PrintStream(new ByteArrayOutputStream(), true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                false);
        Path out = place.resolve("out");
        Status status = new CommandRun(Calculation.SOLVER, terminal, () -> false)
                .run("answer", Path.of("..", "samples", name).toString(), "--out", out.toString());
        // kept or not, no limit is met while spreads do not count
        assertThat(status).as(err.toString(StandardCharsets.UTF_8)).isIn(Status.UNDECIDED, Status.BROKEN);
        JsonNode json = new ObjectMapper().readTree(out.resolve("answers.json").toFile());
        assertThat(json.at("/ledger/imbalance").asDouble()).isLessThan(1e-9);
        assertThat(json.at("/insulated/by_default").asDouble()).isZero();
        assertThat(json.at("/answers"))
                .isNotEmpty()
                .allSatisfy(
                        answer -> assertThat(answer.at("/mesh_error/reached").asBoolean())
                                .as(answer.at("/name").asText())
                                .isTrue());
        double in = 0;
        for (JsonNode row : json.at("/ledger/rows")) {
            in += row.at("/in").asDouble();
        }
        assertThat(in).isEqualTo(0, within(1e-7));
    }
}
