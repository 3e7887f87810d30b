package tepor.solver.quantity;

import java.util.Arrays;
import java.util.stream.Collectors;
import tepor.solver.quantity.Spread.Distribution;

/** Reads a quantity as the trade writes it: {@code 0.65 W/(m.K) ± 10 %}. */
public final class QuantityReader {
    private static final String BLANKS = "\t\u00a0\u2007\u2009\u202f\u2002\u2003\u200a";

    private QuantityReader() {}

    /**
     * Reads a quantity.
     *
     * @param text what the user wrote
     * @param allowed the dimensions that would be right here, the most likely first
     * @return SI value with its unit and spread
     * @throws QuantityException if it is none of these
     */
    public static Quantity read(String text, Dimension... allowed) throws QuantityException {
        String plain = plain(text);
        if (plain.isEmpty()) {
            throw new QuantityException("the text is empty", "give " + wanted(allowed));
        }
        SpreadText parts = SpreadText.of(plain);
        String unitText = unitText(parts, plain);
        UnitExpression unit = UnitExpression.of(unitText);
        Dimension dimension = dimension(plain, parts.number(), unit, allowed);
        double value = inRange(
                unit.toSi(parts.number().value(), dimension), parts.number().value(), plain);
        if (dimension == Dimension.TEMPERATURE && value < 0) {
            throw new QuantityException(
                    "'" + plain + "' lies below absolute zero",
                    "give a temperature above -273.15 degC (0 K, -459.67 degF)");
        }
        Spread spread = parts.spread() == null ? null : spread(plain, parts, unit, dimension, value);
        return new Quantity(value, dimension, unit.text(), spread, text.strip());
    }

    /**
     * Reads a percentage of something known: {@code 1 %} gives 0.01.
     *
     * @throws QuantityException if it is no finite percentage
     */
    public static double readFraction(String text) throws QuantityException {
        String plain = plain(text);
        NumberText number = NumberText.begin(plain);
        if (!number.rest().equals("%")) {
            throw new QuantityException("'" + plain + "' is not a percentage", "give one, such as 1 %");
        }
        return number.value() / 100;
    }

    /** The text with one kind of minus, one kind of blank, and one kind of degree sign. */
    private static String plain(String text) {
        StringBuilder plain = new StringBuilder(text.length());
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            switch (c) {
                case '\u2212', '\u2010', '\u2011' -> plain.append('-');
                case '\u00ba', '\u02da' -> plain.append('°');
                case '℃' -> plain.append("°C");
                case '℉' -> plain.append("°F");
                case '\u212a' -> plain.append('K');
                default -> plain.append(BLANKS.indexOf(c) >= 0 ? ' ' : c);
            }
        }
        return plain.toString().strip();
    }

    private static String unitText(SpreadText parts, String plain) throws QuantityException {
        if (parts.spread() == null || parts.percent() && parts.spreadUnit().isEmpty()) {
            return parts.unit();
        }
        if (parts.unit().isEmpty()) {
            return parts.spreadUnit();
        }
        if (parts.spreadUnit().isEmpty()) {
            String value = parts.number().digits();
            String spread = parts.spread().digits();
            throw new QuantityException(
                    "the spread " + spread + " in '" + plain + "' has no unit",
                    "write " + value + " ± " + spread + " " + parts.unit() + ", or ± " + spread + " %");
        }
        if (parts.percent()) {
            throw new QuantityException(
                    "'" + parts.spreadUnit() + "' stands after the spread in '" + plain + "'",
                    "write nothing after it but a distribution, such as (normal, k=2)");
        }
        return parts.unit();
    }

    private static Dimension dimension(String plain, NumberText number, UnitExpression unit, Dimension[] allowed)
            throws QuantityException {
        for (Dimension dimension : allowed) {
            if (unit.measures(dimension)) {
                return dimension;
            }
        }
        if (unit.text().isEmpty()) {
            throw new QuantityException(
                    "'" + plain + "' has no unit",
                    "give " + wanted(allowed) + ": " + number.digits() + " " + allowed[0].unit() + "?");
        }
        if (unit.isScale() && Arrays.asList(allowed).contains(Dimension.TEMPERATURE_DIFFERENCE)) {
            double kelvin = unit.toSi(number.value(), Dimension.TEMPERATURE_DIFFERENCE);
            throw new QuantityException(
                    "'" + plain + "' is a temperature on a scale, where a temperature difference is wanted",
                    "give it in K: " + Units.number(kelvin) + " K");
        }
        String is = Arrays.stream(Dimension.values())
                .filter(unit::measures)
                .findFirst()
                .map(d -> "is " + d.words())
                .orElse("measures something else");
        throw new QuantityException("'" + plain + "' " + is, "give " + wanted(allowed));
    }

    /** What would be right, in words: "a conductivity, such as 0.65 W/(m.K)". */
    private static String wanted(Dimension[] allowed) {
        return Arrays.stream(allowed)
                .map(d -> d.words() + ", such as " + example(d))
                .collect(Collectors.joining("; or "));
    }

    private static String example(Dimension dimension) {
        String number = switch (dimension) {
            case TEMPERATURE -> "20";
            case TEMPERATURE_DIFFERENCE -> "0.2";
            case LENGTH -> "0.05";
            case AREA -> "0.012";
            case ANGLE -> "30";
            case CONDUCTIVITY -> "0.65";
            case FILM -> "8";
            case RESISTANCE -> "0.13";
            case HEAT -> "90";
            case HEAT_PER_LENGTH -> "42";
            case HEAT_PER_AREA -> "150";
            case HEAT_PER_VOLUME -> "1.2e6";
            case COUPLING -> "0.35";
            case DENSITY -> "1700";
            case HEAT_CAPACITY -> "1000";
            case PER_KELVIN -> "0.00393";
            case NUMBER -> "0.9";
        };
        return (number + " " + dimension.unit()).strip();
    }

    private static double inRange(double si, double given, String plain) throws QuantityException {
        if (Double.isInfinite(si) || Double.isNaN(si)) {
            throw new QuantityException("'" + plain + "' is too large for a number", "give a finite value");
        }
        if (si == 0 && given != 0 && Math.abs(given) < 1e-200) {
            throw new QuantityException("'" + plain + "' is too small for a number", "give 0, or a larger value");
        }
        return si;
    }

    private static Spread spread(String plain, SpreadText parts, UnitExpression unit, Dimension dimension, double value)
            throws QuantityException {
        double halfWidth = inRange(halfWidth(plain, parts, unit, dimension, value), 1, plain);
        if (halfWidth == 0) {
            return null;
        }
        // A normal distribution reaches anywhere; what counts is the interval of about 95 %, at the least.
        double reach = parts.distribution() == Distribution.NORMAL
                ? halfWidth * Math.max(1, 2 / parts.coverageFactor())
                : halfWidth;
        boolean positive = switch (dimension) {
            case CONDUCTIVITY, FILM, RESISTANCE, DENSITY, HEAT_CAPACITY -> true;
            default -> false;
        };
        if (positive && value - reach <= value * 1e-12) {
            throw new QuantityException(
                    "the spread of '" + plain + "' lets " + dimension.words() + " reach zero",
                    "state a spread smaller than the value");
        }
        if (dimension == Dimension.TEMPERATURE && value - reach < 0) {
            throw new QuantityException(
                    "the spread of '" + plain + "' reaches below absolute zero", "state a smaller spread");
        }
        return new Spread(parts.distribution(), halfWidth, parts.coverageFactor());
    }

    private static double halfWidth(
            String plain, SpreadText parts, UnitExpression unit, Dimension dimension, double value)
            throws QuantityException {
        double stated = parts.spread().value();
        if (parts.percent()) {
            if (dimension == Dimension.TEMPERATURE && unit.isScale()) {
                throw new QuantityException(
                        "'" + plain + "' has a spread in percent of " + unit.text() + ", which has an arbitrary zero",
                        "state it in degrees, such as " + parts.number().digits() + " ± 2 " + unit.text());
            }
            if (unit.text().equals("%")) {
                throw new QuantityException(
                        "'" + plain + "' can be read in two ways: percent of the value, or of the whole",
                        "write the number and its spread without percent, such as 0.9 ± 0.02");
            }
            return Math.abs(value) * stated / 100;
        }
        UnitExpression own = parts.spreadUnit().isEmpty() ? unit : UnitExpression.of(parts.spreadUnit());
        Dimension difference = dimension == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : dimension;
        if (!own.measures(dimension)) {
            throw new QuantityException(
                    "the spread of '" + plain + "' is in '" + own.text() + "', which does not measure "
                            + dimension.words(),
                    "state it in percent or in " + unit.text());
        }
        return own.toSi(stated, difference);
    }
}
