package tepor.viewer.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.awt.Graphics2D;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.w3c.dom.Document;
import org.w3c.dom.NodeList;
import tepor.viewer.picture.IsothermPicture;
import tepor.viewer.picture.PatternedGrid;
import tepor.viewer.picture.Picture;
import tepor.viewer.picture.PictureOptions;
import tepor.viewer.picture.PictureOptions.Layer;
import tepor.viewer.picture.SampleAnswers;

class PictureWritersTest {
    @TempDir
    private Path folder;

    private static Picture ring(int columns, int rows, PictureOptions options) {
        return new IsothermPicture(
                new SampleAnswers("Pipe & lagging <inside>", PatternedGrid.ring(0.03, 0.06, columns, rows))
                        .peak("hottest", 80, 0.02, Double.NaN, null, 0.03, 0)
                        .answer(6, (x, y) -> 80 - 60 * Math.log(Math.hypot(x, y) / 0.03) / Math.log(2)),
                options);
    }

    @Test
    void svgIsXmlWithTextAsText() throws Exception {
        Path file = folder.resolve("ring.svg");
        SvgWriter.write(ring(48, 8, PictureOptions.standard()), file);
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
        Document document = factory.newDocumentBuilder().parse(file.toFile());
        assertThat(document.getDocumentElement().getTagName()).isEqualTo("svg");
        NodeList texts = document.getElementsByTagName("text");
        StringBuilder all = new StringBuilder();
        for (int i = 0; i < texts.getLength(); i++) {
            all.append(texts.item(i).getTextContent()).append('\n');
        }
        assertThat(all.toString())
                .contains("Pipe & lagging <inside>", "Temperature in °C", "hottest", "80.000 ± 0.020 °C");
    }

    @Test
    void pngIsAPicture() throws Exception {
        Path file = folder.resolve("ring.png");
        Picture picture = ring(48, 8, PictureOptions.standard());
        PngWriter.write(picture, file);
        var image = ImageIO.read(file.toFile());
        assertThat(image.getWidth()).isEqualTo(picture.width());
        int inner = image.getRGB(0, 0);
        long coloured = 0;
        for (int y = 0; y < image.getHeight(); y += 4) {
            for (int x = 0; x < image.getWidth(); x += 4) {
                coloured += image.getRGB(x, y) != inner ? 1 : 0;
            }
        }
        assertThat(coloured).isGreaterThan(image.getWidth() * (long) image.getHeight() / 16 / 10);
    }

    @Test
    void sameAnswerGivesSameBytes() throws Exception {
        for (int i = 0; i < 2; i++) {
            Picture picture = ring(48, 8, PictureOptions.standard().with(Layer.FLUX));
            PngWriter.write(picture, folder.resolve(i + ".png"));
            SvgWriter.write(picture, folder.resolve(i + ".svg"));
        }
        assertThat(Files.mismatch(folder.resolve("0.png"), folder.resolve("1.png")))
                .isEqualTo(-1);
        assertThat(Files.mismatch(folder.resolve("0.svg"), folder.resolve("1.svg")))
                .isEqualTo(-1);
    }

    @Test
    void aFineMeshStaysASmallFile() throws Exception {
        Picture picture = ring(200, 50, PictureOptions.standard());
        SvgWriter.write(picture, folder.resolve("fine.svg"));
        assertThat(Files.size(folder.resolve("fine.svg")))
                .as("20,000 triangles")
                .isLessThan(600_000);
    }

    @Test
    void aPictureThatFailsLeavesNothingBehind() throws Exception {
        Path file = folder.resolve("old.svg");
        Files.writeString(file, "old", StandardCharsets.UTF_8);
        Picture failing = new Picture() {
            @Override
            public int width() {
                return 500;
            }

            @Override
            public int height() {
                return 400;
            }

            @Override
            public String description() {
                return "fails";
            }

            @Override
            public void paint(Graphics2D g) {
                throw new IllegalArgumentException("no picture");
            }
        };
        assertThatThrownBy(() -> SvgWriter.write(failing, file)).hasMessage("no picture");
        assertThatThrownBy(() -> PngWriter.write(failing, folder.resolve("new.png")))
                .hasMessage("no picture");
        try (Stream<Path> files = Files.list(folder)) {
            assertThat(files).containsExactly(file);
        }
        assertThat(Files.readString(file, StandardCharsets.UTF_8)).isEqualTo("old");
    }
}
