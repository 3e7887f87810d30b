package tepor.viewer.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import tepor.viewer.picture.drawing.Ink;

/** How a named edge is drawn: a strong line in an ink and a dash of its own, on a seam of paper. */
final class EdgeStyle {
    private static final Color[] INKS = {
        new Color(0x1B, 0x4A, 0x72),
        new Color(0x8A, 0x4B, 0x12),
        new Color(0x2F, 0x6B, 0x3C),
        new Color(0x6B, 0x2F, 0x72),
        new Color(0x3C, 0x3F, 0x44)
    };
    /** Lengths of strokes and gaps in line widths. */
    private static final float[][] DASHES = {{}, {4, 2}, {1, 1.2f}, {6, 1.5f, 1.5f, 1.5f}, {2.2f, 1.1f}, {8, 2.5f}};

    private EdgeStyle() {}

    /** Draws a line in style i. */
    static void draw(Graphics2D g, Shape line, int i, double width) {
        draw(g, line, i, width, width);
    }

    /** Draws a line in style i of which the material will cover the inner half. */
    static void drawHalf(Graphics2D g, Shape line, int i, double width) {
        draw(g, line, i, 2 * width, width);
    }

    private static void draw(Graphics2D g, Shape line, int i, double width, double dashUnit) {
        g.setColor(Ink.PAPER);
        g.setStroke(new BasicStroke((float) (1.7 * width), BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND));
        g.draw(line);
        float[] dash = DASHES[i % DASHES.length].clone();
        for (int k = 0; k < dash.length; k++) {
            dash[k] *= (float) dashUnit;
        }
        g.setColor(INKS[i % INKS.length]);
        g.setStroke(new BasicStroke(
                (float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dash.length == 0 ? null : dash, 0));
        g.draw(line);
    }
}
