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

/** {@code inspect --repair}, with the solver itself. */
class RepairTest {
    private static final String CASE = """
            format = 1
            [outline]
            unit = "mm"
            file = "plate.wkt"
            [[region]]
            name = "plate"
            material = "steel"
            [[region]]
            name = "bar"
            material = "steel"
            [material.steel]
            k = "15 W/(m.K)"
            [[edge]]
            name = "skin"
            where = "outside"
            temperature = "20 degC"
            [[ask]]
            name = "mean"
            mean = "plate"
            """;
    private static final String SOUND = "plate: POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0))\n"
            + "bar: POLYGON ((100 0, 200 0, 200 100, 100 100, 100 0))\n";
    private static final String CROSSED = "plate: POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0))\n"
            + "bar: POLYGON ((100.01 0, 200 0, 300 100, 300 0, 200 100, 100.01 100, 100.01 0))\n"
            + "mark: POINT (5 5)\n";

    @TempDir
    Path folder;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private int run(String wkt, String... more) throws IOException {
        Files.writeString(folder.resolve("plate.wkt"), wkt);
        Path file = Files.writeString(folder.resolve("plate.toml"), CASE);
        String[] args = new String[more.length + 2];
        args[0] = "inspect";
        args[1] = file.toString();
        System.arraycopy(more, 0, args, 2, more.length);
        Terminal terminal = new Terminal(
                new PrintStream(out, true, StandardCharsets.UTF_8),
                new PrintStream(err, true, StandardCharsets.UTF_8),
                false);
        return new CommandRun(Calculation.SOLVER, terminal, () -> false)
                .run(args)
                .code();
    }

    private String mended() {
        return folder.resolve("mended.wkt").toString();
    }

    @Test
    void aFaultyCaseStaysFaultyButIsMendedAndTheMendedOnePasses() throws IOException {
        assertThat(run(CROSSED, "--repair", mended())).isEqualTo(3);
        assertThat(out.toString(StandardCharsets.UTF_8))
                .contains("region 'bar' crosses itself at (250 50) mm")
                .contains("(the non-zero rule)", "the gap between regions 'plate' and 'bar'", "2 changes; written to");
        assertThat(err.toString(StandardCharsets.UTF_8))
                .contains("error: region 'bar' crosses itself", "save the mended outline, in ");
        String text = Files.readString(Path.of(mended()));
        assertThat(text).contains("# region 'bar' crosses itself at (250 50) mm", "mark: POINT (5 5)");

        out.reset();
        err.reset();
        assertThat(run(text, "--json")).isZero();
        JsonNode json = new ObjectMapper().readTree(out.toString(StandardCharsets.UTF_8));
        assertThat(json.at("/area").asDouble()).isEqualTo(0.025, within(1e-9));
        assertThat(json.at("/warnings")).extracting(w -> w.at("/code").asText()).containsExactly("unused-record");
    }

    @Test
    void aSoundOutlineIsWrittenAsItIs() throws IOException {
        assertThat(run(
                        SOUND,
                        "--repair",
                        mended(),
                        "--out",
                        folder.resolve("o.svg").toString()))
                .isZero();
        assertThat(out.toString(StandardCharsets.UTF_8)).contains("Nothing was to be mended; written to");
        assertThat(Files.readAllLines(Path.of(mended())).stream().filter(l -> !l.startsWith("#")))
                .containsExactlyElementsOf(SOUND.lines().toList());
    }

    @Test
    void jsonHoldsTheChanges() throws IOException {
        assertThat(run(CROSSED, "--json", "--repair", mended())).isEqualTo(3);
        JsonNode repair = new ObjectMapper()
                .readTree(out.toString(StandardCharsets.UTF_8))
                .at("/repair");
        assertThat(repair.at("/changes"))
                .extracting(c -> c.at("/code").asText())
                .containsExactly("mended-self-crossing", "gap-closed");
        assertThat(repair.at("/changes/1/size").asDouble()).isEqualTo(1e-5, within(1e-9));
        assertThat(repair.at("/remaining")).isEmpty();
    }

    @Test
    void noFileOfTheCaseIsOverwritten() throws IOException {
        String input = folder.resolve("plate.wkt").toString();
        assertThat(run(CROSSED, "--repair", input)).isEqualTo(64);
        assertThat(err.toString(StandardCharsets.UTF_8)).contains("is a file of the case; name another");
        assertThat(Files.readString(Path.of(input))).isEqualTo(CROSSED);
        assertThat(run(CROSSED, "--repair", folder.resolve("mended.dxf").toString()))
                .isEqualTo(64);
        assertThat(err.toString(StandardCharsets.UTF_8)).contains("must end in .wkt");
    }
}
