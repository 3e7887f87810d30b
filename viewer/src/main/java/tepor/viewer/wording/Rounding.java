package tepor.viewer.wording;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Figures as text, with as many digits as their error deserves. */
public final class Rounding {
    private static final int DIGITS_WITHOUT_ERROR = 6;
    private static final int SURE_DIGITS = 9;
    private static final int MOST_DIGITS = 7;

    private Rounding() {}

    /** A value, rounded to the second significant digit of its error (JCGM 100:2008, 7.2.6). */
    public static String value(double value, double error) {
        return fixed(value, decimals(value, error));
    }

    /** An error with its two significant digits, rounded up: it is never said to be smaller than it is. */
    public static String error(double error) {
        if (!Double.isFinite(error)) {
            return "unknown";
        }
        // What conversion did to the last bits is not to be rounded up.
        BigDecimal figure = new BigDecimal(Math.abs(error)).round(new MathContext(SURE_DIGITS));
        return plainOrPower(figure.setScale(figure.scale() + SURE_DIGITS).round(new MathContext(2, RoundingMode.UP)));
    }

    /** A figure with at most so many significant digits and no idle zeros. */
    public static String significant(double value, int digits) {
        if (!Double.isFinite(value)) {
            return "unknown";
        }
        return plainOrPower(new BigDecimal(value)
                .round(new MathContext(digits, RoundingMode.HALF_EVEN))
                .stripTrailingZeros());
    }

    /** Decimals that a value of this error is shown with. */
    public static int decimals(double value, double error) {
        int most = MOST_DIGITS - 1 - magnitude(value);
        if (!Double.isFinite(error) || error == 0) {
            return Math.max(0, Math.min(most, DIGITS_WITHOUT_ERROR - 1 - magnitude(value)));
        }
        return Math.max(0, Math.min(most, 1 - magnitude(error)));
    }

    private static String fixed(double value, int decimals) {
        if (!Double.isFinite(value)) {
            return "unknown";
        }
        BigDecimal rounded = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_EVEN);
        int exponent = magnitude(value);
        if (rounded.signum() != 0 && (exponent < -4 || exponent > 9)) {
            return plainOrPower(new BigDecimal(value).round(new MathContext(DIGITS_WITHOUT_ERROR)));
        }
        return rounded.signum() == 0 ? rounded.abs().toPlainString() : rounded.toPlainString();
    }

    private static int magnitude(double value) {
        return value == 0 || !Double.isFinite(value) ? 0 : (int) Math.floor(Math.log10(Math.abs(value)));
    }

    private static String plainOrPower(BigDecimal value) {
        if (value.signum() == 0) {
            return "0";
        }
        int exponent = value.precision() - value.scale() - 1;
        if (exponent >= -4 && exponent <= 9) {
            return value.toPlainString();
        }
        return value.scaleByPowerOfTen(-exponent).toPlainString() + "e" + exponent;
    }
}
