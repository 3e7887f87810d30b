package tepor.viewer.picture;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tepor.viewer.wording.AskWords;
import tepor.viewer.wording.Rounding;
import tepor.viewer.wording.ShownAnswer;
import tepor.viewer.wording.UnitWords;

/** Figures as text in a picture: rounded as everywhere else, with a true minus sign. */
public final class FigureText {
    private static final int DIGITS_WITHOUT_ERROR = 6;

    private FigureText() {}

    /** A number with so many decimals; never "−0". */
    public static String number(double value, int decimals) {
        BigDecimal rounded = new BigDecimal(value).setScale(Math.max(0, decimals), RoundingMode.HALF_EVEN);
        return (rounded.signum() < 0 ? "−" : "") + rounded.abs().toPlainString();
    }

    /** A number with at most so many significant digits, without trailing zeros. */
    public static String significant(double value, int digits) {
        return trueMinus(Rounding.significant(value, digits));
    }

    /** Value, mesh error and unit of an answer: "96.371 ± 0.044 °C". */
    public static String value(ShownAnswer answer) {
        double error =
                answer.deviation() == null ? Double.NaN : answer.deviation().halfWidth();
        String unit = answer.unit().isEmpty() ? "" : " " + UnitWords.pretty(answer.unit());
        if (!Double.isFinite(error) || error == 0) {
            return significant(answer.value(), DIGITS_WITHOUT_ERROR) + unit;
        }
        // A value is shown with seven digits at most; an error that these cannot show is left out.
        boolean seen = error >= 0.5 * Math.pow(10, -Rounding.decimals(answer.value(), error));
        return trueMinus(Rounding.value(answer.value(), error)) + (seen ? " ± " + Rounding.error(error) : "") + unit;
    }

    /** Limit and verdict of an answer in words: "≤ 105 °C: met"; empty where it has no limit. */
    public static String verdict(ShownAnswer answer) {
        return answer.limit() == null || answer.limit().verdict() == null
                ? ""
                : trueMinus(UnitWords.pretty(AskWords.limit(answer.ask())))
                        + ": "
                        + answer.limit().verdict().word();
    }

    private static String trueMinus(String figure) {
        return figure.replace('-', '−');
    }
}
