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
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Every sample is answered, its ledger closes, and its figures stay what they were on meshes ten times as fine. */
class SamplesTest {
    private static final Path SAMPLES = Path.of("..", "samples");

    @TempDir
    Path place;

    private JsonNode answer(String sample) throws IOException {
        Path file = SAMPLES.resolve(sample).resolve("case.toml");
        assertThat(Files.readAllLines(file).subList(0, 3)).allMatch(line -> line.startsWith("# "));
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(
                new PrintStream(new ByteArrayOutputStream(), true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                false);
        Path out = place.resolve(sample);
        Status status = new CommandRun(Calculation.SOLVER, terminal, () -> false)
                .run("answer", SAMPLES.resolve(sample).toString(), "--out", out.toString(), "--mesh", "--flux");
        assertThat(status).as(err.toString(StandardCharsets.UTF_8)).isEqualTo(Status.UNDECIDED);
        for (String name : new String[] {"answers.json", "report.html", "isotherms.png", "isotherms.svg"}) {
            assertThat(out.resolve(name)).isNotEmptyFile();
        }
        JsonNode json = new ObjectMapper().readTree(out.resolve("answers.json").toFile());
        assertThat(json.at("/ledger/imbalance").asDouble()).isLessThan(1e-9);
        assertThat(json.at("/insulated/by_default").asDouble()).isZero();
        assertThat(json.at("/mesh/smallest_angle_made_deg").asDouble()).isGreaterThan(28);
        assertThat(json.get("case").asText()).isEqualTo(sample);
        return json;
    }

    private static void holds(JsonNode json, String name, double expected) {
        for (JsonNode answer : json.get("answers")) {
            if (answer.get("name").asText().equals(name)) {
                double error = answer.at("/mesh_error/high").asDouble();
                assertThat(answer.get("value").asDouble()).as(name).isCloseTo(expected, within(error));
                assertThat(error).as(name).isLessThan(2e-3 * Math.abs(expected));
                assertThat(answer.at("/mesh_error/reached").asBoolean()).isTrue();
                return;
            }
        }
        throw new AssertionError("no answer " + name);
    }

    @Test
    void slabEdge() throws IOException {
        JsonNode json = answer("01-slab-edge");
        holds(json, "psi of the joint", 0.875696);
        holds(json, "heat to outdoors", 34.0904);
        holds(json, "temperature factor", 0.767144);
        holds(json, "coldest inner surface", 14.1786);
        // the flow is the coupling at 25 K, and the coupling is psi and the wall's 0.2033 on 2.4 m
        assertThat(34.0904 / 25).isCloseTo(0.875696 + 2.4 * 0.2033, within(1e-4));
    }

    @Test
    void busbarDuct() throws IOException {
        JsonNode json = answer("02-busbar-duct");
        holds(json, "hottest bar", 81.52801);
        holds(json, "warmest skin", 64.95404);
        holds(json, "heat to the room", 150);
        holds(json, "heat out of the bars", 150);
        assertThat(json.at("/answers/2/for_depth/value").asDouble()).isCloseTo(375, within(1e-6));
    }

    @Test
    void cableTrench() throws IOException {
        JsonNode json = answer("03-cable-trench");
        holds(json, "large conductor", 76.19425);
        holds(json, "medium conductor", 72.77057);
        holds(json, "small conductor", 63.83374);
        holds(json, "large above medium", 3.423681);
        assertThat(json.at("/answers/4/value").asDouble()
                        + json.at("/answers/5/value").asDouble())
                .isCloseTo(34 + 24 + 15, within(1e-6));
    }

    /** Reads a drawing in DXF. The values are this program's own. */
    @Test
    void pipeSupport() throws IOException {
        JsonNode json = answer("04-pipe-support");
        holds(json, "touch", 37.1811);
        holds(json, "loss", -63.2505);
        holds(json, "into the beam", 7.0611);
        // The pipe alone in its wool, without the saddle: resistances of a layer and a surface in series.
        double wool = Math.log(107.15 / 57.15) / (2 * Math.PI * 0.045);
        double surface = 1 / (9 * 2 * Math.PI * 0.10715);
        assertThat((180 - 25) / (wool + surface)).isCloseTo(63.2505, within(0.05 * 63.25));
    }
}
