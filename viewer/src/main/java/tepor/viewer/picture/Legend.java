package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import tepor.viewer.picture.contour.TemperatureScale;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.PictureFont;

/**
 * The scale of temperatures: one rectangle for each band with the isotherms' figures between, and the lowest and highest
 * temperature at its ends. Nothing is clipped: the bands cover every temperature of the field.
 */
final class Legend {
    private static final double BAR = 1.5; // heights of text
    private static final double END_LEAST = 0.25; // of a whole band

    private final TemperatureScale scale;
    private final Font font;
    /** Share of a band's full length that each band has: 1 but at the ends, where the range ends within it. */
    private final double[] share;

    private final int endDecimals;

    Legend(TemperatureScale scale, Font font) {
        this.scale = scale;
        this.font = font;
        share = new double[scale.bandCount()];
        Arrays.fill(share, 1);
        int n = scale.count();
        if (n > 0) {
            share[0] = Math.max(END_LEAST, (scale.kelvin(0) - scale.range().lowest()) / scale.step());
            share[n] = Math.max(END_LEAST, (scale.range().highest() - scale.kelvin(n - 1)) / scale.step());
        }
        endDecimals = scale.decimals() + 1;
    }

    /** What stands beside the scale: "Temperature in °C". */
    static String heading() {
        return "Temperature in °C";
    }

    /** What is said of a uniform field, else how far apart isotherms are. */
    String remark() {
        return scale.count() == 0
                ? "uniform " + FigureText.number(scale.range().highest() - TemperatureScale.ZERO_CELSIUS, 1) + " °C"
                : "isotherms every " + FigureText.number(scale.step(), scale.decimals()) + " K";
    }

    private String lowest() {
        return FigureText.number(scale.range().lowest() - TemperatureScale.ZERO_CELSIUS, endDecimals);
    }

    private String highest() {
        return FigureText.number(scale.range().highest() - TemperatureScale.ZERO_CELSIUS, endDecimals);
    }

    private double units() {
        double sum = 0;
        for (double s : share) {
            sum += s;
        }
        return sum;
    }

    /** Height it wants when it stands upright. */
    double uprightHeight() {
        double text = font.getSize2D();
        return scale.count() == 0
                ? 5 * text
                : 3.2 * text + 1.4 * text + Math.min(units(), 12) * 1.9 * text + 1.4 * text;
    }

    /** Height it takes when it lies. */
    double flatHeight() {
        return 4.9 * font.getSize2D();
    }

    /** Warmest above. */
    void paintUpright(Graphics2D g, double x, double y, double height) {
        double text = font.getSize2D();
        Ink.text(g, heading(), x, y + text, font, Ink.DARK);
        Ink.text(g, remark(), x, y + 2.3 * text, font, Ink.MUTED);
        double top = y + 3.2 * text;
        if (scale.count() == 0) {
            paintBand(g, 0, x, top, BAR * text, BAR * text);
            return;
        }
        double end = 1.4 * text;
        double bar = height - (top - y) - 2 * end;
        double per = bar / units();
        Ink.text(g, highest() + " highest", x, top + 0.9 * text, font, Ink.MUTED);
        double at = top + end;
        double lastFigure = Double.NEGATIVE_INFINITY;
        for (int band = scale.count(); band >= 0; band--) {
            double h = share[band] * per;
            paintBand(g, band, x, at, BAR * text, h);
            at += h;
            if (band > 0 && at - lastFigure > 1.15 * text) {
                lastFigure = at;
                Ink.draw(g, new Line2D.Double(x + BAR * text, at, x + (BAR + 0.35) * text, at), Ink.DARK, 0.05 * text);
                Ink.text(g, figure(band - 1), x + (BAR + 0.6) * text, at + 0.36 * text, font, Ink.DARK);
            }
        }
        Ink.draw(g, new Rectangle2D.Double(x, top + end, BAR * text, bar), Ink.DARK, 0.05 * text);
        Ink.text(g, lowest() + " lowest", x, at + 1.15 * text, font, Ink.MUTED);
    }

    /** Warmest at the right. */
    void paintFlat(Graphics2D g, double x, double y, double width) {
        double text = font.getSize2D();
        Ink.text(g, heading() + ", " + remark(), x, y + text, font, Ink.DARK);
        double top = y + 1.7 * text;
        if (scale.count() == 0) {
            paintBand(g, 0, x, top, 4 * text, BAR * text);
            return;
        }
        String low = "lowest " + lowest() + " ";
        String high = " " + highest() + " highest";
        double left = x + PictureFont.width(low, font) + 0.3 * text;
        double bar = x + width - PictureFont.width(high, font) - 0.3 * text - left;
        double per = bar / units();
        Ink.text(g, low, x, top + 1.1 * text, font, Ink.MUTED);
        double at = left;
        double lastFigure = Double.NEGATIVE_INFINITY;
        for (int band = 0; band <= scale.count(); band++) {
            double w = share[band] * per;
            paintBand(g, band, at, top, w, BAR * text);
            at += w;
            String figure = band < scale.count() ? figure(band) : "";
            double half = 0.5 * PictureFont.width(figure, font);
            if (band < scale.count() && at - half > lastFigure) {
                lastFigure = at + half + 0.4 * text;
                Ink.draw(
                        g,
                        new Line2D.Double(at, top + BAR * text, at, top + (BAR + 0.3) * text),
                        Ink.DARK,
                        0.05 * text);
                Ink.text(g, figure, at - half, top + (BAR + 1.35) * text, font, Ink.DARK);
            }
        }
        Ink.draw(g, new Rectangle2D.Double(left, top, bar, BAR * text), Ink.DARK, 0.05 * text);
        Ink.text(g, high, left + bar + 0.3 * text, top + 1.1 * text, font, Ink.MUTED);
    }

    private String figure(int isotherm) {
        return FigureText.number(scale.celsius(isotherm), scale.decimals());
    }

    private void paintBand(Graphics2D g, int band, double x, double y, double w, double h) {
        Ink.fill(g, new Rectangle2D.Double(x, y, w, h), ColourMap.ofBand(band, scale.bandCount()));
    }
}
