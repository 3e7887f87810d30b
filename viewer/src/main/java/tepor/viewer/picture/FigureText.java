package tepor.viewer.picture;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;
import tepor.solver.answer.AskAnswer;
import tepor.solver.answer.MeshError;
import tepor.solver.model.Limit;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Units;

/** Figures as text in a picture. */
public final class FigureText {
    private FigureText() {}

    /** A number with so many decimals and a true minus sign; never "−0". */
    public static String number(double value, int decimals) {
        BigDecimal rounded = new BigDecimal(value).setScale(Math.max(0, decimals), RoundingMode.HALF_EVEN);
        return (rounded.signum() < 0 ? "−" : "") + rounded.abs().toPlainString();
    }

    /** A number with so many significant digits, without trailing zeros. */
    public static String significant(double value, int digits) {
        if (value == 0 || !Double.isFinite(value)) {
            return value == 0 ? "0" : String.valueOf(value);
        }
        int magnitude = (int) Math.floor(Math.log10(Math.abs(value)));
        if (magnitude > 6 || magnitude < -4) {
            return String.format(Locale.ROOT, "%." + (digits - 1) + "e", value).replace('-', '−');
        }
        String text = number(value, digits - 1 - magnitude);
        return text.contains(".") ? text.replaceAll("0+$", "").replaceAll("\\.$", "") : text;
    }

    /** A unit as it is printed: {@code W/(m2.K)} becomes W/(m²·K). */
    public static String unit(String unit) {
        return unit.replace("deg", "°")
                .replaceAll("\\.(?=[A-Za-z(])", "·")
                .replace("m2", "m²")
                .replace("m3", "m³");
    }

    /** Value, mesh error and unit of an answer: "96.37 ± 0.05 °C". */
    public static String value(AskAnswer answer) {
        double value = Units.fromSi(answer.value(), answer.unit(), answer.dimension());
        double error = halfWidth(answer);
        String unit = answer.unit().isEmpty() ? "" : " " + unit(answer.unit());
        if (!Double.isFinite(error) || error == 0) {
            return significant(value, 6) + unit;
        }
        int decimals = decimals(error, value);
        double shown = Math.ceil(error * Math.pow(10, decimals) - 1e-9) / Math.pow(10, decimals);
        boolean seen = error >= 0.5 * Math.pow(10, -decimals); // else the value is as exact as it is written
        return number(value, decimals) + (seen ? " ± " + number(shown, decimals) : "") + unit;
    }

    /** Limit and verdict of an answer in words: "≤ 105 °C: met"; empty where it has no limit. */
    public static String verdict(AskAnswer answer) {
        Limit limit = answer.ask().head().limit();
        if (limit == null || answer.verdict() == null) {
            return "";
        }
        double value = Units.fromSi(
                limit.quantity().value(),
                limit.quantity().unit(),
                limit.quantity().dimension());
        return (limit.relation() == Limit.Relation.AT_MOST ? "≤ " : "≥ ")
                + significant(value, 6)
                + (limit.quantity().unit().isEmpty()
                        ? ""
                        : " " + unit(limit.quantity().unit()))
                + ": "
                + answer.verdict().word();
    }

    private static double halfWidth(AskAnswer answer) {
        MeshError error = answer.meshError();
        if (error == null) {
            return Double.NaN;
        }
        Dimension dimension =
                answer.dimension() == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : answer.dimension();
        double si = Math.max(Math.abs(error.low()), Math.abs(error.high()));
        return Double.isFinite(si) ? Math.abs(Units.fromSi(si, answer.unit(), dimension)) : si;
    }

    /** Two significant digits of an error (JCGM 100:2008, 7.2.6); at most seven digits of the value. */
    private static int decimals(double error, double value) {
        int most = 6 - (int) Math.floor(Math.log10(Math.max(Math.abs(value), 1e-6)));
        int magnitude = (int) Math.floor(Math.log10(error));

        return Math.max(0, Math.min(most, 1 - magnitude));
    }
}
