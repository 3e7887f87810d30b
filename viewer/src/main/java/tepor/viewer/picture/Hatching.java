package tepor.viewer.picture;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import tepor.viewer.picture.drawing.Ink;

/** Fills that tell regions apart in colour and in greyscale: a pale tint, and a pattern of lines or dots. */
final class Hatching {
    private static final Color[] TINTS = {
        new Color(0xEC, 0xE6, 0xD6),
        new Color(0xD3, 0xDF, 0xE6),
        new Color(0xF3, 0xEF, 0xE9),
        new Color(0xD4, 0xDD, 0xCC),
        new Color(0xE9, 0xD6, 0xD0),
        new Color(0xDA, 0xD6, 0xE2),
        new Color(0xC9, 0xCC, 0xCF)
    };
    /** Angles of the lines of each pattern, degrees; none: plain. */
    private static final double[][] ANGLES = {{}, {45}, {}, {-45}, {0}, {45, -45}, {90}, {0, 90}};
    /** Patterns of dots. */
    private static final int DOTS = 2;

    private static final Color LINE = new Color(0x6A, 0x70, 0x78);

    private Hatching() {}

    /** Fills a shape with pattern i; patterns repeat with other tints. */
    static void fill(Graphics2D g, Shape shape, int i, double unit) {
        Ink.fill(g, shape, TINTS[i % TINTS.length]);
        int pattern = i % ANGLES.length;
        Shape before = g.getClip();
        g.clip(shape);
        Rectangle2D box = shape.getBounds2D();
        double spacing = 13 * unit;
        if (pattern == DOTS) {
            Ink.fill(g, dots(box, spacing, 1.5 * unit), LINE);
        } else {
            for (double angle : ANGLES[pattern]) {
                Ink.draw(g, lines(box, Math.toRadians(angle), spacing), LINE, 0.9 * unit);
            }
        }
        g.setClip(before);
    }

    /** Lines that cover a box; they hang on the page, so that pieces of one region go on across gaps. */
    private static Path2D lines(Rectangle2D box, double angle, double spacing) {
        Path2D path = new Path2D.Double();
        double ux = Math.cos(angle);
        double uy = -Math.sin(angle);
        double reach = 0.5 * Math.hypot(box.getWidth(), box.getHeight());
        double along = box.getCenterX() * ux + box.getCenterY() * uy;
        double across = -box.getCenterX() * uy + box.getCenterY() * ux;
        for (double k = Math.ceil((across - reach) / spacing); k * spacing <= across + reach; k++) {
            double c = k * spacing;
            path.append(
                    new Line2D.Double(
                            (along - reach) * ux - c * uy,
                            (along - reach) * uy + c * ux,
                            (along + reach) * ux - c * uy,
                            (along + reach) * uy + c * ux),
                    false);
        }
        return path;
    }

    private static Path2D dots(Rectangle2D box, double spacing, double radius) {
        Path2D path = new Path2D.Double();
        for (double row = Math.floor(box.getMinY() / spacing); row * spacing <= box.getMaxY() + radius; row++) {
            double shift = Math.floorMod((long) row, 2) * 0.5;
            for (double column = Math.floor(box.getMinX() / spacing) - 1;
                    column * spacing <= box.getMaxX() + radius;
                    column++) {
                double x = (column + shift) * spacing;
                path.append(new Ellipse2D.Double(x - radius, row * spacing - radius, 2 * radius, 2 * radius), false);
            }
        }
        return path;
    }
}
