package tepor.viewer.picture.contour;

/**
 * The temperatures at which isotherms are drawn: whole multiples of a 1–2–5 step on the Celsius scale.
 *
 * @param step K; 0 where the field is uniform
 * @param first the lowest isotherm is this multiple of the step
 * @param count number of isotherms
 * @param range of the field
 */
public record TemperatureScale(double step, long first, int count, TemperatureRange range) {
    /** Zero of the Celsius scale, K. */
    public static final double ZERO_CELSIUS = 273.15;

    /**
     * The finest 1–2–5 step that gives at most so many bands.
     *
     * @param bandsAtMost at least 3
     */
    public static TemperatureScale of(TemperatureRange range, int bandsAtMost) {
        if (range.isUniform()) {
            return new TemperatureScale(0, 0, 0, range);
        }
        double low = range.lowest() - ZERO_CELSIUS;
        double high = range.highest() - ZERO_CELSIUS;
        int exponent = (int) Math.floor(Math.log10(range.spread() / bandsAtMost)) - 1;
        for (int i = 0; ; i++) {
            double step = step(exponent + Math.floorDiv(i, 3), i % 3);
            long first = (long) Math.floor(low / step) + 1; // isotherms lie above the lowest …
            long last = (long) Math.ceil(high / step) - 1; // … and below the highest temperature
            if (last - first + 2 <= bandsAtMost) {
                return new TemperatureScale(step, first, (int) Math.max(0, last - first + 1), range);
            }
        }
    }

    private static double step(int exponent, int third) {
        // Dividing by a power of ten rounds once, multiplying by a negative one twice.
        double mantissa = third == 0 ? 1 : third == 1 ? 2 : 5;
        return exponent < 0 ? mantissa / Math.pow(10, -exponent) : mantissa * Math.pow(10, exponent);
    }

    /** One more than there are isotherms. */
    public int bandCount() {
        return count + 1;
    }

    /** Temperature of isotherm i, °C. */
    public double celsius(int i) {
        int decimals = decimals();
        double power = Math.pow(10, decimals);
        return Math.rint((first + i) * step * power) / power;
    }

    /** Temperature of isotherm i, K. */
    public double kelvin(int i) {
        return celsius(i) + ZERO_CELSIUS;
    }

    /** Decimals with which every isotherm is written exactly. */
    public int decimals() {
        return step == 0 ? 0 : (int) Math.max(0, -Math.floor(Math.log10(step * 1.0001)));
    }
}
