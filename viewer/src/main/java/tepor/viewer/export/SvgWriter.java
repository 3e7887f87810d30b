package tepor.viewer.export;

import java.awt.Dimension;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.apache.batik.dom.GenericDOMImplementation;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import tepor.viewer.picture.Picture;

/** Writes pictures as SVG 1.1, text as text. */
public final class SvgWriter {
    private static final String NAMESPACE = "http://www.w3.org/2000/svg";
    /** Decimals of a coordinate: hundredths of a pixel. */
    private static final int DECIMALS = 2;

    private SvgWriter() {}

    /** Writes a picture, whole or not at all. */
    public static void write(Picture picture, Path file) throws IOException {
        WholeFile.write(file, out -> write(picture, out));
    }

    /** A picture as a file of this name, ready to be written or set into a report. */
    public static PictureFile file(Picture picture, String name) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream(1 << 17);
        write(picture, out);
        return new PictureFile(name, "image/svg+xml", picture.description(), out.toByteArray());
    }

    private static void write(Picture picture, OutputStream out) throws IOException {
        Document document = GenericDOMImplementation.getDOMImplementation().createDocument(NAMESPACE, "svg", null);
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setPrecision(DECIMALS);
        context.setComment("Tepor");
        SVGGraphics2D g = new SVGGraphics2D(context, false);
        g.setSVGCanvasSize(new Dimension(picture.width(), picture.height()));
        picture.paint(g);
        Element root = g.getRoot();
        root.setAttributeNS(null, "viewBox", "0 0 " + picture.width() + " " + picture.height());
        Element title = document.createElementNS(NAMESPACE, "title");
        title.appendChild(document.createTextNode(picture.description()));
        root.insertBefore(title, root.getFirstChild());
        Writer writer = new OutputStreamWriter(out, StandardCharsets.UTF_8);
        g.stream(root, writer, true, false);
        writer.flush();
    }
}
