package tepor.viewer.export;

import java.awt.Dimension;
import java.io.IOException;
import java.io.OutputStream;
import java.io.StringWriter;
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

    static void write(Picture picture, OutputStream out) throws IOException {
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
        StringWriter text = new StringWriter();
        g.stream(root, text, true, false);
        out.write(finish(text.toString()).getBytes(StandardCharsets.UTF_8));
    }

    /**
     * Leaves out the document type, for which some readers would go to the network, and names a substitute where the font
     * of the pictures is not at hand.
     */
    private static String finish(String svg) {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
                + svg.substring(svg.indexOf("<svg"))
                        .replace("font-family:'DejaVu Sans';", "font-family:'DejaVu Sans', sans-serif;");
    }
}
