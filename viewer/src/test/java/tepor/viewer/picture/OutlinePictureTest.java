package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.solver.answer.Inspection;
import tepor.solver.answer.Progress;
import tepor.solver.answer.Solver;
import tepor.solver.casefile.CaseReader;
import tepor.viewer.export.InspectionJson;
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

    @Test
    void aHoleOpenToTheOutsideIsDrawn(@TempDir Path folder) throws Exception {
        Path file = Files.writeString(folder.resolve("notch.toml"), """
                format = 1
                [outline]
                unit = "mm"
                [[region]]
                name = "plate"
                outline = "POLYGON ((0 0, 200 0, 200 100, 0 100, 0 0))"
                material = "steel"
                [[region]]
                name = "notch"
                outline = "POLYGON ((80 60, 120 60, 120 140, 80 140, 80 60))"
                material = "nothing"
                [material.steel]
                k = "15 W/(m.K)"
                [[edge]]
                name = "hot"
                where = "left"
                temperature = "60 degC"
                """);
        Inspection inspection = Solver.inspect(CaseReader.read(file), Progress.NONE);
        Path png = folder.resolve("notch.png");
        PngWriter.write(new OutlinePicture(inspection, PictureOptions.standard()), png);
        BufferedImage image = ImageIO.read(png.toFile());
        assertThat(image.getWidth()).isEqualTo(1600);
        ByteArrayOutputStream json = new ByteArrayOutputStream();
        InspectionJson.write(inspection, json);
        assertThat(json.toString(StandardCharsets.UTF_8)).contains("\"area\" : null");
    }
}
