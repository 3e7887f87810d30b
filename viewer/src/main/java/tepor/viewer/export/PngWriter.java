package tepor.viewer.export;

import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import tepor.viewer.picture.Picture;

/** Writes pictures as PNG. */
public final class PngWriter {
    private PngWriter() {}

    /** Writes a picture, whole or not at all. */
    public static void write(Picture picture, Path file) throws IOException {
        WholeFile.write(file, out -> write(picture, out));
    }

    static void write(Picture picture, OutputStream out) throws IOException {
        BufferedImage image = new BufferedImage(picture.width(), picture.height(), BufferedImage.TYPE_INT_RGB);
        Graphics2D g = image.createGraphics();
        try {
            picture.paint(g);
        } finally {
            g.dispose();
        }
        ImageIO.setUseCache(false); // else each picture goes through a temporary file
        if (!ImageIO.write(image, "png", out)) {
            throw new IOException("this Java cannot write PNG");
        }
    }
}
