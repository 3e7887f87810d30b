package tepor.solver.quantity;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A decimal number at the beginning of a text, and what follows it.
 *
 * @param value the number
 * @param digits as it stood in the text
 * @param rest what follows, without spaces around it
 */
record NumberText(double value, String digits, String rest) {
    private static final Pattern NUMBER =
            Pattern.compile("[+\\-]?(?:[0-9]+(?:\\.[0-9]*)?|\\.[0-9]+)(?:[eE][+\\-]?[0-9]+)?");
    private static final Pattern GROUPED = Pattern.compile("([+\\-]?[0-9]{1,3})((?:[, '’_][0-9]{3})+)(?![0-9])(.*)");
    private static final Pattern COMMA = Pattern.compile("([+\\-]?[0-9]*),([0-9]+)(.*)");
    private static final Pattern TIMES_TEN = Pattern.compile("[·×*⋅.] ?10.*");
    private static final Pattern RANGE = Pattern.compile("(?:[–—…]|\\.\\.|- ?[0-9]|to ).*");

    /**
     * Reads the number at the beginning of a text.
     *
     * @param text in which minus signs are hyphens and spaces are blanks
     * @throws QuantityException if there is none, or one that cannot be represented
     */
    static NumberText begin(String text) throws QuantityException {
        String found = text.strip();
        if (found.isEmpty()) {
            throw new QuantityException("there is no number", "write a number with its unit, such as 0.65 W/(m.K)");
        }
        Matcher grouped = GROUPED.matcher(found);
        Matcher comma = COMMA.matcher(found);
        if (grouped.matches()
                && !(grouped.group(2).startsWith(",") && grouped.group(2).length() == 4)) {
            throw new QuantityException(
                    "'" + found + "' groups its digits",
                    "write it without separators: " + grouped.group(1)
                            + grouped.group(2).replaceAll("[^0-9]", "") + grouped.group(3));
        }
        if (comma.matches()) {
            String whole = comma.group(1).matches("[+\\-]?") ? comma.group(1) + "0" : comma.group(1);
            throw new QuantityException(
                    "'" + found + "' has a comma in its number",
                    "write decimals with a point, and nothing between thousands: " + whole + "." + comma.group(2)
                            + comma.group(3));
        }
        Matcher number = NUMBER.matcher(found);
        if (!number.lookingAt()) {
            throw notANumber(found);
        }
        String digits = number.group();
        String rest = found.substring(number.end());
        refuseOddities(found, digits, rest.strip());
        return new NumberText(value(digits), digits, rest.strip());
    }

    private static QuantityException notANumber(String found) {
        String word = found.replaceFirst("^[+\\-]", "").toLowerCase(Locale.ROOT);
        if (word.startsWith("nan") || word.startsWith("inf") || word.startsWith("∞")) {
            return new QuantityException("'" + found + "' is not a finite number", "write a finite decimal number");
        }
        return new QuantityException(
                "'" + found + "' does not begin with a number",
                "write the number first, then its unit, such as 0.65 W/(m.K)");
    }

    private static void refuseOddities(String found, String digits, String rest) throws QuantityException {
        if (digits.matches("[+\\-]?0") && rest.matches("[xX][0-9a-fA-F.].*")) {
            throw new QuantityException("'" + found + "' is a hexadecimal number", "write a decimal number");
        }
        if (TIMES_TEN.matcher(rest).matches()) {
            throw new QuantityException(
                    "'" + found + "' writes a power of ten in full", "write it with an e, such as 2e-4 for 2·10⁻⁴");
        }
        if (RANGE.matcher(rest).matches()) {
            throw new QuantityException(
                    "'" + found + "' is a range", "write the middle and half its width, such as 25 ± 5 W/m");
        }
        if (rest.startsWith(".") || rest.matches("[eE][+\\-]?(?:[^a-zA-Z].*)?")) {
            throw new QuantityException("'" + found + "' is no decimal number", "write it such as 0.65 or 6.5e-1");
        }
    }

    private static double value(String digits) throws QuantityException {
        double value = Double.parseDouble(digits);
        if (Double.isInfinite(value)) {
            throw new QuantityException("'" + digits + "' is too large for a number", "write a finite decimal number");
        }
        boolean zero = digits.replaceFirst("[eE].*", "").matches("[+\\-]?[0.]*");
        if (value == 0 && !zero) {
            throw new QuantityException(
                    "'" + digits + "' is too small for a number", "write 0, or a number above 1e-300");
        }
        return value;
    }
}
