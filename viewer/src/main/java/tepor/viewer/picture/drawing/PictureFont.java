package tepor.viewer.picture.drawing;

import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.font.FontRenderContext;
import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/**
 * The one font of all pictures, DejaVu Sans, bundled, so that a picture is the same on every machine.
 *
 * <p>Where a Linux machine has no font at all, the JDK refuses to draw text even with a font of one's own, unless it is told
 * of a font configuration before its first use of fonts. The first use of this class does so; it must come before any
 * other drawing of text in the process.
 */
public final class PictureFont {
    private static final String CONFIGURATION = "sun.awt.fontconfig";

    /** Text is measured as it is drawn: smoothed, with fractional advances. */
    private static final FontRenderContext MEASURE = new FontRenderContext(null, true, true);

    private static final Font FONT = load();

    private PictureFont() {}

    /** The font in a size in pixels. */
    public static Font size(double pixels) {
        return FONT.deriveFont((float) pixels);
    }

    /** Width of a text in pixels. */
    public static double width(String text, Font font) {
        return font.getStringBounds(text, MEASURE).getWidth();
    }

    private static Font load() {
        boolean needed = System.getProperty("os.name").toLowerCase(Locale.ROOT).contains("linux")
                && System.getProperty(CONFIGURATION) == null;
        try {
            if (!needed) {
                return read();
            }
            Path file = Files.createTempFile("tepor-font", ".properties");
            try {
                Files.write(file, "version=1\nsequence.allfonts=default\n".getBytes(StandardCharsets.ISO_8859_1));
                System.setProperty(CONFIGURATION, file.toString());
                Font font = read();
                font.getStringBounds("0", MEASURE); // makes the JDK read the configuration now
                return font;
            } finally {
                Files.deleteIfExists(file);
            }
        } catch (IOException e) {
            throw new UncheckedIOException("the font of the pictures cannot be read", e);
        }
    }

    private static Font read() throws IOException {
        try (InputStream in = PictureFont.class.getResourceAsStream("DejaVuSans.ttf")) {
            if (in == null) {
                throw new IOException("DejaVuSans.ttf is missing");
            }
            return Font.createFont(Font.TRUETYPE_FONT, new BufferedInputStream(in));
        } catch (FontFormatException e) {
            throw new IOException("DejaVuSans.ttf is damaged", e);
        }
    }
}
