package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.PictureFont;

/**
 * An enlargement set into the picture, where the asks' places crowd together in a small part of a large section: cables in
 * much soil, say.
 *
 * @param window what is enlarged: least x, least y, greatest x, greatest y, metres
 * @param frame where it stands in the picture, px
 */
record CloseUp(double[] window, Rectangle2D frame) {
    /** Places nearer to each other than this would have overlapping markers and tags. */
    private static final double CROWDED = 70;
    /** The window is this many times as large as the places' box. */
    private static final double ROOM = 2.4;
    /** An enlargement of less is not worth its room. */
    private static final double LEAST = 2.5;

    /**
     * Whether and where an enlargement helps.
     *
     * @param view of the whole section
     * @param places metres
     * @return null where none is needed, or there is no room
     */
    static CloseUp of(SectionView view, List<double[]> places, double unit) {
        double nearest = Double.POSITIVE_INFINITY;
        double[] box = {
            Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY
        };
        for (double[] p : places) {
            for (double[] q : places) {
                double d = view.scale() * Math.hypot(p[0] - q[0], p[1] - q[1]);
                nearest = d > 4 * unit ? Math.min(nearest, d) : nearest;
            }
            box[0] = Math.min(box[0], p[0]);
            box[1] = Math.min(box[1], p[1]);
            box[2] = Math.max(box[2], p[0]);
            box[3] = Math.max(box[3], p[1]);
        }
        if (nearest > CROWDED * unit) {
            return null;
        }
        Rectangle2D whole = view.box();
        double width = 0.46 * whole.getWidth();
        double height = Math.min(0.58 * whole.getHeight(), 0.75 * width);
        double metres = Math.max((box[2] - box[0]) * ROOM, (box[3] - box[1]) * ROOM * width / height);
        if (width / view.scale() / metres < LEAST) {
            return null;
        }
        double x = 0.5 * (box[0] + box[2]);
        double y = 0.5 * (box[1] + box[3]);
        double halfWidth = 0.5 * metres;
        double halfHeight = halfWidth * height / width;
        double[] window = {x - halfWidth, y - halfHeight, x + halfWidth, y + halfHeight};

        // In the corner farthest from what is enlarged.
        double margin = 14 * unit;
        boolean right = view.x(x) <= whole.getCenterX();
        boolean below = view.y(y) <= whole.getCenterY();
        Rectangle2D frame = new Rectangle2D.Double(
                right ? whole.getMaxX() - width - margin : whole.getMinX() + margin,
                below ? whole.getMaxY() - height - margin : whole.getMinY() + margin,
                width,
                height);
        CloseUp closeUp = new CloseUp(window, frame);
        Rectangle2D source = closeUp.source(view);
        source.add(source.getMinX() - 3 * margin, source.getMinY() - 3 * margin);
        source.add(source.getMaxX() + 3 * margin, source.getMaxY() + 3 * margin);
        return source.intersects(frame) ? null : closeUp;
    }

    /** The window as it stands in the view of the whole section, px. */
    Rectangle2D source(SectionView view) {
        double x = view.x(window[0]);
        double y = view.y(window[3]);
        return new Rectangle2D.Double(x, y, view.x(window[2]) - x, view.y(window[1]) - y);
    }

    /** Frames the part of the whole section that is enlarged. */
    void paintSource(Graphics2D g, SectionView whole, double unit) {
        Ink.draw(g, source(whole), Ink.PAPER, 4.5 * unit);
        Ink.draw(g, source(whole), Ink.DARK, 2 * unit);
    }

    /** Frames the enlargement, and says how many times larger it is. */
    void paintFrame(Graphics2D g, SectionView whole, Font font, double unit) {
        Ink.draw(g, frame, Ink.PAPER, 9 * unit);
        Ink.draw(g, frame, Ink.DARK, 2 * unit);
        String text = "enlarged " + FigureText.significant(magnification(whole), 2) + "×";
        double width = PictureFont.width(text, font) + font.getSize2D();
        double height = 1.45 * font.getSize2D();
        Ink.fill(g, new Rectangle2D.Double(frame.getX(), frame.getMaxY() - height, width, height), Ink.PAPER);
        Ink.text(
                g,
                text,
                frame.getX() + 0.5 * font.getSize2D(),
                frame.getMaxY() - 0.38 * font.getSize2D(),
                font,
                Ink.DARK);
        Ink.draw(g, frame, Ink.DARK, 2 * unit);
    }

    /** Room of the words, for what must keep clear of it: the frame's lower left corner. */
    Rectangle2D words(Font font) {
        return new Rectangle2D.Double(
                frame.getX(), frame.getMaxY() - 1.7 * font.getSize2D(), 9 * font.getSize2D(), 1.7 * font.getSize2D());
    }

    private double magnification(SectionView whole) {
        return frame.getWidth() / source(whole).getWidth();
    }
}
