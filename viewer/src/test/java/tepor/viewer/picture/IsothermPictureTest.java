package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Set;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import tepor.mesher.outline.DrawingUnit;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Verdict;
import tepor.viewer.export.PngWriter;
import tepor.viewer.export.SvgWriter;
import tepor.viewer.picture.PictureOptions.Layer;

class IsothermPictureTest {
    private static final Path PICTURES = Path.of("target", "pictures");

    private static BufferedImage write(String name, Answer answer, PictureOptions options) throws Exception {
        Files.createDirectories(PICTURES);
        IsothermPicture picture = new IsothermPicture(answer, options);
        Path file = PICTURES.resolve(name + ".png");
        PngWriter.write(picture, file);
        SvgWriter.write(picture, PICTURES.resolve(name + ".svg"));
        BufferedImage image = ImageIO.read(file.toFile());
        assertThat(image.getWidth()).isEqualTo(picture.width());
        assertThat(image.getHeight()).isEqualTo(picture.height());
        return image;
    }

    private static String svg(String name) throws Exception {
        return Files.readString(PICTURES.resolve(name + ".svg"), StandardCharsets.UTF_8);
    }

    private static int coloursIn(BufferedImage image) {
        Set<Integer> colours = new HashSet<>();
        for (int y = 0; y < image.getHeight(); y += 3) {
            for (int x = 0; x < image.getWidth(); x += 3) {
                colours.add(image.getRGB(x, y));
            }
        }
        return colours.size();
    }

    /** A bar of 90 °C in a layered block with a narrow gap of nothing. */
    private static SampleAnswers block() {
        PatternedGrid grid = PatternedGrid.rectangle(
                0.24,
                0.16,
                96,
                64,
                (i, j) -> {
                    if (i >= 30 && i < 44 && j >= 20 && j < 44) {
                        return 1;
                    }
                    if (i >= 60 && i < 76 && j >= 28 && j < 36) {
                        return 2;
                    }
                    return j == 63 ? 3 : 0;
                },
                "resin",
                "bar",
                "nothing inside",
                "coat");
        return new SampleAnswers("Bar in a resin block with a duct beside it", grid)
                .peak("hottest bar", 92.31, 0.04, 105, Verdict.MET, 0.0925, 0.08)
                .lowest("coldest skin", 21.4, 0.21, 0.24, 0.16)
                .at("sensor pocket", 48.2, 0.013, 0.15, 0.06)
                .peak("skin where hands may touch it", 64.3, 0.6, 60, Verdict.BROKEN, 0.0925, 0.16)
                .flow("heat to the room", 42.0, 0.12)
                .insulated((x, y) -> y < 1e-6 && x > 0.12);
    }

    private static double warmth(double x, double y) {
        double d = Math.hypot((x - 0.0925) / 0.9, y - 0.08);
        return 21 + 71 * Math.exp(-Math.pow(d / 0.075, 2)) + 14 * Math.exp(-Math.pow((x - 0.22) / 0.03, 2)) * y / 0.16;
    }

    @Test
    void showsABlockWithABarADuctAndACoat() throws Exception {
        Answer answer = block().answer(6, IsothermPictureTest::warmth);
        assertThat(coloursIn(write("block", answer, PictureOptions.standard()))).isGreaterThan(50);
        assertThat(svg("block"))
                .contains(">Bar in a resin block with a duct beside it</text")
                .contains(">92.310 ± 0.040 °C</text", ">≤ 105 °C: met</text", ">≤ 60 °C: broken</text")
                .contains(">42.00 ± 0.12 W/m</text", ">nothing stated, taken as insulated: 120 mm</text");
        write("block-mesh", answer, PictureOptions.standard().with(Layer.MESH));
        write("block-flux", answer, PictureOptions.standard().with(Layer.FLUX));
        assertThat(svg("block-flux")).contains(" W/m²</text");
    }

    @Test
    void showsALongThinSection() throws Exception {
        PatternedGrid grid = PatternedGrid.rectangle(
                3, 0.1, 300, 10, (i, j) -> j == 9 ? 1 : j < 3 ? 2 : 0, "core", "thin facing", "plaster");
        Answer answer = new SampleAnswers("Long panel between two rooms, warm along one end", grid)
                .peak("warm end", 61, 0.02, Double.NaN, null, 0, 0.1)
                .lowest("cold end", 12.2, 0.02, 3, 0.0)
                .flow("heat to the cold room", 17.3, 0.05)
                .unit(new DrawingUnit("m", 1))
                .answer(6, (x, y) -> 12 + 50 * Math.exp(-x) + 60 * (y - 0.05) * Math.exp(-x / 2));
        BufferedImage image = write("long", answer, PictureOptions.standard());
        assertThat(image.getHeight()).as("a long section makes a low picture").isLessThan(image.getWidth() / 2);
    }

    @Test
    void showsATallThinSection() throws Exception {
        PatternedGrid grid = PatternedGrid.rectangle(0.05, 1.2, 10, 240, (i, j) -> i == 9 ? 1 : 0, "core", "skin");
        Answer answer = new SampleAnswers("Tall panel", grid)
                .peak("warm end", 61, 0.02, 70, Verdict.UNDECIDED, 0, 1.2)
                .answer(6, (x, y) -> 12 + 50 * Math.exp(-(1.2 - y) * 2) + 200 * x);
        write("tall", answer, PictureOptions.standard());
    }

    @Test
    void showsATinySection() throws Exception {
        Answer answer = new SampleAnswers("Strand", PatternedGrid.ring(2e-5, 5e-5, 48, 8))
                .peak("inner wall", 80, 0, Double.NaN, null, 2e-5, 0)
                .answer(6, (x, y) -> 80 - 60 * Math.log(Math.hypot(x, y) / 2e-5));
        write("tiny", answer, PictureOptions.standard());
        assertThat(svg("tiny")).contains(" µm</text");
    }

    @Test
    void showsManyAsks() throws Exception {
        SampleAnswers sample = block();
        for (int i = 0; i < 28; i++) {
            double x = 0.02 + 0.025 * (i % 9);
            double y = 0.02 + 0.03 * (i / 9);
            sample.at("point " + (char) ('A' + i % 26) + i, warmth(x, y), 0.02, x, y);
        }
        write("many", sample.answer(6, IsothermPictureTest::warmth), PictureOptions.standard());
        for (int i = 1; i <= 33; i++) {
            assertThat(svg("many")).contains(">" + i + "</text");
        }
    }

    @Test
    void keepsToTheSizeAskedFor() throws Exception {
        Answer answer = block().answer(6, IsothermPictureTest::warmth);
        BufferedImage image = write(
                "sized",
                answer,
                new PictureOptions(1000, 700, PictureOptions.standard().layers()));
        assertThat(new int[] {image.getWidth(), image.getHeight()}).containsExactly(1000, 700);
    }

    @Test
    void showsAUniformTemperature() throws Exception {
        Answer answer = block().answer(6, (x, y) -> 20.0);
        write("uniform", answer, PictureOptions.standard());
        assertThat(svg("uniform")).contains(">uniform 20.0 °C</text");
    }

    @Test
    void bandsReadInGreyscale() throws Exception {
        Answer answer = block().answer(6, (x, y) -> 20 + 300 * x);
        BufferedImage image = write("grey", answer, new PictureOptions(1600, 0, Set.of(Layer.BANDS)));
        SectionBox box = SectionBox.of(image);
        double before = 0;
        for (int k = 1; k < 20; k++) {
            int x = box.left() + k * (box.right() - box.left()) / 20;
            double lightness = ColourMap.lightness(new java.awt.Color(image.getRGB(x, box.bottom() - 40)));
            assertThat(lightness).as("at %d of 20 from cold to warm", k).isGreaterThan(before - 1);
            before = Math.max(before, lightness);
        }
        assertThat(before).isGreaterThan(80);
    }

    /** Where the first coloured pixels of a picture lie, seen along the row in the middle of its upper half. */
    private record SectionBox(int left, int right, int bottom) {
        static SectionBox of(BufferedImage image) {
            int y = image.getHeight() / 3;
            int left = 0;
            while (image.getRGB(left, y) == 0xffffffff) {
                left++;
            }
            int right = left;
            while (right < image.getWidth() - 1 && image.getRGB(right, y) != 0xffffffff) {
                right++;
            }
            return new SectionBox(left + 8, right - 8, y + 40);
        }
    }
}
