package tepor.solver.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Converts between SI and the units people read, and writes quantities as text. */
public final class Units {
    private static final int DIGITS = 6;

    private Units() {}

    /**
     * A value in a unit.
     *
     * @param si SI value
     * @param unit as in {@link Quantity#unit()}
     * @param dimension what it measures; decides whether a temperature is one on a scale or a difference
     * @throws IllegalArgumentException if the unit is none of this dimension
     */
    public static double fromSi(double si, String unit, Dimension dimension) {
        if (!Double.isFinite(si)) {
            return si;
        }
        return expression(unit).fromSi(si, dimension);
    }

    /**
     * The SI value of a value in a unit.
     *
     * @throws IllegalArgumentException if the unit is none of this dimension
     */
    public static double toSi(double value, String unit, Dimension dimension) {
        if (!Double.isFinite(value)) {
            return value;
        }
        return expression(unit).toSi(value, dimension);
    }

    /** The unit in which answers and messages give a dimension when nobody asked for another. */
    public static String defaultUnit(Dimension dimension) {
        return dimension.unit();
    }

    /** A value as text with its unit, to six digits and without idle zeros: {@code 0.65 W/(m.K)}. */
    public static String format(double si, String unit, Dimension dimension) {
        return withUnit(number(fromSi(si, unit, dimension)), unit);
    }

    /**
     * A value as text with its unit, to as many decimals as it is known.
     *
     * @param si SI value
     * @param unit as in {@link Quantity#unit()}
     * @param dimension what it measures
     * @param resolution SI, above zero: the last decimal shown is worth at most this, and more than a tenth of it
     */
    public static String format(double si, String unit, Dimension dimension, double resolution) {
        double value = fromSi(si, unit, dimension);
        Dimension difference = dimension == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : dimension;
        double step = fromSi(resolution, unit, difference);
        if (!Double.isFinite(value) || !(step > 0) || Double.isInfinite(step)) {
            return withUnit(number(value), unit);
        }
        // The small addition keeps a step of 0.001 at three decimals, whatever its conversion did to the last bit.
        int decimals = (int) Math.ceil(-Math.log10(step) - 1e-9);
        return withUnit(text(new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN)), unit);
    }

    /** A number as text, to six digits and without idle zeros. */
    static String number(double value) {
        if (!Double.isFinite(value)) {
            return Double.isNaN(value) ? "not a number" : value > 0 ? "∞" : "-∞";
        }
        BigDecimal rounded = new BigDecimal(value).round(new MathContext(DIGITS, RoundingMode.HALF_EVEN));
        return text(rounded.stripTrailingZeros());
    }

    private static String text(BigDecimal number) {
        if (number.signum() == 0) {
            return number.scale() > 0 && number.scale() < 12 ? number.toPlainString() : "0";
        }
        int exponent = number.precision() - number.scale() - 1;
        if (exponent >= -4 && exponent <= 6) {
            return number.toPlainString();
        }
        BigDecimal mantissa = number.movePointLeft(exponent);
        return mantissa.setScale(Math.max(0, number.precision() - 1), RoundingMode.UNNECESSARY)
                        .toPlainString()
                + "e" + exponent;
    }

    private static String withUnit(String number, String unit) {
        return unit.isEmpty() ? number : number + " " + unit;
    }

    private static UnitExpression expression(String unit) {
        try {
            return UnitExpression.of(unit);
        } catch (QuantityException e) {
            throw new IllegalArgumentException(e.getMessage(), e);
        }
    }
}
