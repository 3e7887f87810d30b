package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import tepor.mesher.outline.DrawingUnit;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.PictureFont;

/** The row beneath a section: scale bar, then a sample and words for each sign used. */
final class KeyRow {
    private record Key(double sampleWidth, String words, Sample sample) {}

    /** Draws a sample in a box of the key's width, vertically centred on y. */
    @FunctionalInterface
    interface Sample {
        void paint(Graphics2D g, double x, double y);
    }

    private final Font font;
    private final List<Key> keys = new ArrayList<>();

    KeyRow(Font font) {
        this.font = font;
    }

    void add(double sampleWidth, String words, Sample sample) {
        keys.add(new Key(sampleWidth, words, sample));
    }

    /** Adds a scale bar of a round length. */
    void addScaleBar(double pixelsPerMetre, double widthAtMost, DrawingUnit unit) {
        double metresPerUnit = unit.metres();
        String symbol = unit.symbol();
        double most = widthAtMost / pixelsPerMetre;
        if (most / metresPerUnit < 0.1 || most / metresPerUnit >= 1000) {
            double[] metres = {1e3, 1, 1e-3, 1e-6, 1e-9};
            String[] symbols = {"km", "m", "mm", "µm", "nm"};
            for (int i = 0; i < metres.length; i++) {
                metresPerUnit = metres[i];
                symbol = symbols[i];
                if (most / metresPerUnit >= 1) {
                    break;
                }
            }
        }
        double power = Math.pow(10, Math.floor(Math.log10(most / metresPerUnit)));
        double mantissa = most / metresPerUnit / power;
        double length = (mantissa >= 5 ? 5 : mantissa >= 2 ? 2 : 1) * power;
        double px = length * metresPerUnit * pixelsPerMetre;
        keys.add(0, new Key(px, FigureText.significant(length, 3) + " " + symbol, (g, x, y) -> {
            double h = 0.36 * font.getSize2D();
            for (int i = 0; i < 4; i++) {
                Ink.fill(
                        g,
                        new Rectangle2D.Double(x + i * px / 4, y - h / 2, px / 4, h),
                        i % 2 == 0 ? Ink.DARK : Ink.PAPER);
            }
            Ink.draw(g, new Rectangle2D.Double(x, y - h / 2, px, h), Ink.DARK, 0.06 * font.getSize2D());
        }));
    }

    /** Adds the sign for boundary on which nothing was stated. */
    void addInsulated(double metres, DrawingUnit unit) {
        double text = font.getSize2D();
        double width = 4 * text;
        add(width, "nothing stated, taken as insulated: " + length(metres, unit), (g, x, y) -> {
            Path2D path = new Path2D.Double();
            path.append(new Line2D.Double(x, y + 0.25 * text, x + width, y + 0.25 * text), false);
            for (double at = x + 0.4 * text; at < x + width - 0.3 * text; at += 0.68 * text) {
                path.append(new Line2D.Double(at, y + 0.25 * text, at + 0.36 * text, y - 0.23 * text), false);
            }
            Ink.draw(g, path, Ink.WARNING, 0.11 * text);
        });
    }

    private static String length(double metres, DrawingUnit unit) {
        return FigureText.significant(metres / unit.metres(), 4) + " " + unit.symbol();
    }

    double height(double width) {
        return flow(null, 0, 0, width);
    }

    void paint(Graphics2D g, double x, double y, double width) {
        flow(g, x, y, width);
    }

    private double flow(Graphics2D g, double x, double y, double width) {
        double text = font.getSize2D();
        double at = x;
        double row = 0;
        for (Key key : keys) {
            double w = key.sampleWidth() + 0.6 * text + PictureFont.width(key.words(), font);
            if (at > x && at + w > x + width) {
                at = x;
                row += 1.6 * text;
            }
            if (g != null) {
                key.sample().paint(g, at, y + row + 0.75 * text);
                Ink.text(g, key.words(), at + key.sampleWidth() + 0.6 * text, y + row + 1.1 * text, font, Ink.DARK);
            }
            at += w + 2 * text;
        }
        return row + 1.6 * text;
    }
}
