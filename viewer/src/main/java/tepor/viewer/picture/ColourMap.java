package tepor.viewer.picture;

import java.awt.Color;

/**
 * The colour map of temperatures: {@code cividis}, from dark blue (cold) to yellow (warm). Perceptually uniform, even in
 * lightness, so that it reads in greyscale, and nearly the same for readers with a colour vision deficiency.
 *
 * <p>Source: Nuñez, Anderton and Renslow 2018, PLoS ONE 13(7) e0199239; the polynomial fit is that of d3-scale-chromatic
 * 3.1.1 (ISC licence, in {@code cividis-LICENSE.txt} beside this class in the jar).
 */
public final class ColourMap {
    private static final double[] RED = {-4.54, -35.34, 2381.73, -6402.7, 7024.72, -2710.57};
    private static final double[] GREEN = {32.49, 170.73, 52.82, -131.46, 176.58, -67.37};
    private static final double[] BLUE = {81.24, 442.36, -2482.43, 6167.24, -6614.94, 2475.67};

    private ColourMap() {}

    /** Colour at t from 0 (cold) to 1 (warm). */
    public static Color at(double t) {
        return new Color(channel(RED, t), channel(GREEN, t), channel(BLUE, t));
    }

    /** Bands begin here: the map's darkest blues leave neither lines nor ink room to show. */
    private static final double COLDEST = 0.16;

    /** Colour of a band among so many. */
    public static Color ofBand(int band, int bandCount) {
        return at(bandCount == 1 ? 0.75 : COLDEST + (1 - COLDEST) * band / (bandCount - 1.0));
    }

    /** CIELAB lightness L* of a colour (sRGB, white D65), 0 to 100. CIE 15:2004, 8.2.1; IEC 61966-2-1. */
    public static double lightness(Color colour) {
        double y = 0.2126 * linear(colour.getRed())
                + 0.7152 * linear(colour.getGreen())
                + 0.0722 * linear(colour.getBlue());
        return y > 216.0 / 24389 ? 116 * Math.cbrt(y) - 16 : y * 24389 / 27;
    }

    private static double linear(int channel) {
        double c = channel / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    private static int channel(double[] coefficient, double t) {
        double sum = 0;
        for (int i = coefficient.length - 1; i >= 0; i--) {
            sum = sum * t + coefficient[i];
        }
        return (int) Math.max(0, Math.min(255, Math.round(sum)));
    }
}
