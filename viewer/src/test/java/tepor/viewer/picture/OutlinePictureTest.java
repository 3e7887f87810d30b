package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import tepor.viewer.export.PngWriter;
import tepor.viewer.export.SvgWriter;

class OutlinePictureTest {
    private static final Path PICTURES = Path.of("target", "pictures");

    @Test
    void showsRegionsEdgesAndWhatNobodyNamed() throws Exception {
        Files.createDirectories(PICTURES);
        PatternedGrid grid = PatternedGrid.rectangle(
                0.24,
                0.16,
                48,
                32,
                (i, j) -> i >= 8 && i < 16 && j >= 8 && j < 22
                        ? 1
                        : i >= 28 && i < 36 && j >= 14 && j < 18 ? 2 : j == 31 ? 3 : i >= 40 && j < 10 ? 4 : 0,
                "resin",
                "bar",
                "nothing inside",
                "coat",
                "foot");
        OutlinePicture picture = new OutlinePicture(
                new SampleAnswers("Resin block as it was drawn", grid)
                        .edge("skin", (x, y) -> x < 1e-6 || y > 0.16 - 1e-6)
                        .edge("duct wall", (x, y) -> x > 0.135 && x < 0.185 && y > 0.065 && y < 0.095)
                        .edge("base", (x, y) -> y < 1e-6 && x < 0.2)
                        .insulated((x, y) -> x > 0.24 - 1e-6)
                        .inspection(),
                PictureOptions.standard());
        PngWriter.write(picture, PICTURES.resolve("outline.png"));
        Path svg = PICTURES.resolve("outline.svg");
        SvgWriter.write(picture, svg);
        assertThat(Files.readString(svg, StandardCharsets.UTF_8))
                .contains(">resin</text", ">bar</text", ">coat</text", ">foot</text", ">skin</text", ">duct wall</text")
                .contains(">nothing: cut out</text", ">material 0, 0.1 W/(m·K)</text")
                .contains(">nothing stated, taken as insulated: 160 mm</text");
    }
}
