package tepor.viewer.picture.drawing;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Font;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PictureFontTest {
    /** Draws text in a process of its own and tells how wide it is. */
    static final class Drawing {
        private Drawing() {}

        @SuppressWarnings("SystemOut") // the text goes back to the test
        public static void main(String[] arguments) {
            Font font = PictureFont.size(22);
            java.awt.image.BufferedImage image =
                    new java.awt.image.BufferedImage(200, 40, java.awt.image.BufferedImage.TYPE_INT_RGB);
            java.awt.Graphics2D g = image.createGraphics();
            Ink.prepare(g, 200, 40);
            Ink.text(g, "96.37 °C", 5, 30, font, Ink.DARK);
            long sum = 0;
            for (int y = 0; y < 40; y++) {
                for (int x = 0; x < 200; x++) {
                    sum = 31 * sum + image.getRGB(x, y);
                }
            }
            System.out.print(PictureFont.width("96.37 °C", font) + " " + sum);
        }
    }

    private static String draw(Path folder, boolean withoutFonts) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>(List.of(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-Djava.awt.headless=true",
                "-Duser.home=" + folder, // where the JDK keeps what it found out about fonts
                "-cp",
                System.getProperty("java.class.path"),
                Drawing.class.getName()));
        ProcessBuilder builder = new ProcessBuilder(command);
        if (withoutFonts) {
            Path none = folder.resolve("fonts.conf");
            Files.writeString(
                    none,
                    "<?xml version=\"1.0\"?><fontconfig><cachedir>" + folder + "/cache</cachedir></fontconfig>",
                    StandardCharsets.UTF_8);
            builder.environment().put("FONTCONFIG_FILE", none.toString());
        }
        Path out = folder.resolve("out");
        builder.redirectErrorStream(true).redirectOutput(out.toFile());
        assertThat(builder.start().waitFor()).as(() -> read(out)).isZero();
        return read(out);
    }

    private static String read(Path file) {
        try {
            return Files.readString(file, StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    @Test
    void drawsTheSameTextOnAMachineWithoutAnyFont(@TempDir Path folder) throws Exception {
        assertThat(draw(folder, true)).isEqualTo(draw(folder, false)).contains(" ");
    }

    @Test
    void everySignOfThePicturesHasAGlyph() {
        assertThat(PictureFont.size(20).canDisplayUpTo("°C ± − ≤ ≥ ² ³ · – … µ Σ λ α Å ß ñ 0123"))
                .isEqualTo(-1);
    }
}
