package tepor.viewer.command;

import static org.assertj.core.api.Assertions.assertThat;
import static tepor.viewer.command.CommandFixture.caseFile;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class InspectCommandTest {
    @TempDir
    Path place;

    private final CommandFixture fixture = new CommandFixture();

    @Test
    void printsWhatTheCaseConsistsOf() throws IOException {
        Path picture = place.resolve("outline.svg");
        assertThat(fixture.run("inspect", caseFile(place, "duct"), "--out", picture))
                .isZero();
        assertThat(fixture.out())
                .containsPattern("bars +0\\.0016 +copper +42 W/m")
                .containsPattern("all material +0\\.024")
                .containsPattern("resin +0\\.65 W/\\(m\\.K\\) +supplier's data sheet")
                .containsPattern("outer skin +0\\.2 +film 8 W/\\(m2\\.K\\) ± 20 % to room")
                .contains("Insulated because nothing was stated: 440 mm")
                .contains("Mesh: 120 triangles, 273 nodes", "smallest angle 27 deg")
                .contains("stopped short in 1 place: imposed by outline, at (10 10) mm");
        assertThat(Files.readString(picture)).contains("<svg");
    }

    @Test
    void printsOneJsonObjectAloneAndDrawsNothing() throws IOException {
        assertThat(fixture.run("inspect", "--json", caseFile(place, "duct"))).isZero();
        JsonNode json = new ObjectMapper().readTree(fixture.out());
        assertThat(json.at("/mesh/triangles").asInt()).isEqualTo(120);
        assertThat(json.at("/mesh/refused/imposed_by_outline").asInt()).isEqualTo(1);
        assertThat(json.at("/mesh/refused_places/0/reason").asText()).isEqualTo("imposed_by_outline");
        assertThat(json.at("/mesh/refused_places/0/at/0").asDouble()).isEqualTo(0.01);
        assertThat(fixture.out()).startsWith("{").endsWith("}\n");
        try (var files = Files.list(place)) {
            assertThat(files).hasSize(1);
        }
    }

    @Test
    void refusesAPictureOfUnknownKind() throws IOException {
        assertThat(fixture.run("inspect", caseFile(place, "duct"), "--out", "outline.gif"))
                .isEqualTo(64);
        assertThat(fixture.err()).contains("outline.gif must end in .png or .svg");
    }
}
