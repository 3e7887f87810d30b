package tepor.viewer.picture.drawing;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;

/** Inks and strokes shared by all pictures. */
public final class Ink {
    public static final Color PAPER = Color.WHITE;
    /** Lines and text. */
    public static final Color DARK = new Color(0x1F, 0x24, 0x2B);
    /** Text of second rank. */
    public static final Color MUTED = new Color(0x5B, 0x63, 0x6E);
    /** Lines and text on dark ground. */
    public static final Color LIGHT = new Color(0xF4, 0xF1, 0xE6);
    /** What the reader must not miss; a shape always says the same. */
    public static final Color WARNING = new Color(0xA8, 0x2F, 0x1C);

    private Ink() {}

    /** Sets a canvas up: smooth, exact, white. */
    public static void prepare(Graphics2D g, int width, int height) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
        g.setColor(PAPER);
        g.fillRect(0, 0, width, height);
    }

    public static BasicStroke stroke(double width) {
        return new BasicStroke((float) width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    }

    public static void draw(Graphics2D g, Shape shape, Color colour, double width) {
        g.setColor(colour);
        g.setStroke(stroke(width));
        g.draw(shape);
    }

    public static void fill(Graphics2D g, Shape shape, Color colour) {
        g.setColor(colour);
        g.fill(shape);
    }

    /** Text with its baseline starting at a point. */
    public static void text(Graphics2D g, String text, double x, double baseline, Font font, Color colour) {
        g.setColor(colour);
        g.setFont(font);
        g.drawString(text, (float) x, (float) baseline);
    }

    /** Text centred on a point, both ways. */
    public static void centred(Graphics2D g, String text, double x, double y, Font font, Color colour) {
        text(g, text, x - PictureFont.width(text, font) / 2, y + 0.36 * font.getSize2D(), font, colour);
    }

    /** A line from point to point, from x and y in turn. */
    public static Path2D path(double[] xy, boolean closed) {
        Path2D.Double path = new Path2D.Double(Path2D.WIND_EVEN_ODD, xy.length / 2 + 1);
        append(path, xy, closed);
        return path;
    }

    /** Adds a line to a path. */
    public static void append(Path2D path, double[] xy, boolean closed) {
        if (xy.length < 4) {
            return;
        }
        path.moveTo(xy[0], xy[1]);
        for (int i = 2; i + 1 < xy.length; i += 2) {
            path.lineTo(xy[i], xy[i + 1]);
        }
        if (closed) {
            path.closePath();
        }
    }

    /** Width of a tag around a text. */
    public static double tagWidth(String text, Font font) {
        return Math.max(PictureFont.width(text, font), 0.75 * font.getSize2D()) + 0.6 * font.getSize2D();
    }

    public static double tagHeight(Font font) {
        return 1.3 * font.getSize2D();
    }

    /** A tag centred on a point: dark text on paper in a frame; round or with blunt corners. */
    public static void tag(Graphics2D g, String text, double x, double y, Font font, boolean round) {
        double w = tagWidth(text, font);
        double h = tagHeight(font);
        double arc = round ? h : 0.35 * h;
        Shape frame = new RoundRectangle2D.Double(x - w / 2, y - h / 2, w, h, arc, arc);
        fill(g, frame, PAPER);
        draw(g, frame, DARK, 0.07 * font.getSize2D());
        centred(g, text, x, y, font, DARK);
    }
}
