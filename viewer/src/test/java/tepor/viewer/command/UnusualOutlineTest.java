package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whole runs, pictures and all, on outlines out of the ordinary. */
class UnusualOutlineTest {
    @TempDir
    Path place;

    /** A region of nothing that only touches the material has a border in the section, but encloses nothing there. */
    @Test
    void aRegionOfNothingBesideTheMaterialIsDrawn() throws IOException {
        Path file = place.resolve("beside.toml");
        Files.writeString(file, """
                format = 1
                [outline]
                unit = "mm"
                [[region]]
                name = "plate"
                outline = "POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0))"
                material = "steel"
                [[region]]
                name = "beside"
                outline = "POLYGON ((100 0, 200 0, 200 50, 100 50, 100 0))"
                material = "nothing"
                [material.steel]
                k = "15 W/(m.K)"
                [[edge]]
                name = "left side"
                where = "left"
                temperature = "1 degC"
                [[edge]]
                name = "right side"
                where = "right"
                temperature = "0 degC"
                [[ask]]
                name = "flow"
                flow = "right side"
                """);
        Path out = place.resolve("out");
        ByteArrayOutputStream printed = new ByteArrayOutputStream();
        PrintStream stream = new PrintStream(printed, true, StandardCharsets.UTF_8);
        Status status = new CommandRun(Calculation.SOLVER, new Terminal(stream, stream, false), () -> false)
                .run("answer", file.toString(), "--out", out.toString());
        assertThat(status).as(printed.toString(StandardCharsets.UTF_8)).isEqualTo(Status.ANSWERED);
        assertThat(out.resolve("isotherms.svg")).exists();
    }
}
