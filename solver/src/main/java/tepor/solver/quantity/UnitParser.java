package tepor.solver.quantity;

import java.util.ArrayList;
import java.util.List;
import javax.measure.Unit;
import tech.units.indriya.AbstractUnit;

/**
 * Parses a unit text: symbols with powers ({@code m2}, {@code m²}, {@code m^-1}), products with {@code .}, {@code ·}, a
 * space or nothing where that is clear ({@code m2K/W}), quotients with {@code /} from left to right, brackets.
 *
 * <p>A product after a quotient without brackets ({@code W/m.K}, {@code W/mK}, {@code W/m2K}) is refused with a question: by
 * the rules it would be read as (W/m)·K, and that is hardly ever what was meant.
 */
final class UnitParser {
    private static final String PRODUCT_SIGNS = ".·⋅∙*×";
    private static final String QUOTIENT_SIGNS = "/∕⁄";
    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final int GREATEST_POWER = 9;
    private static final int DEEPEST_BRACKET = 20;

    private final String text;
    private int at;

    /** The only symbol, where the text is one symbol to the power of 1. */
    private UnitSymbol single;

    private int factors;

    UnitParser(String text) {
        this.text = text;
    }

    /** A part of the text: its unit and its one spelling. */
    private record Part(Unit<?> unit, String spelling) {}

    /**
     * What a unit text means.
     *
     * @param spelling its one spelling; empty for pure numbers
     * @param unit a temperature in it is a difference
     * @param zero as of {@link UnitSymbol}
     * @param angle whether it is an angle on its own
     */
    record Parsed(String spelling, Unit<?> unit, double zero, boolean angle) {}

    Parsed parse() throws QuantityException {
        skipSpaces();
        if (at == text.length()) {
            return new Parsed("", AbstractUnit.ONE, 0, false);
        }
        Part whole = product(false, 0);
        if (at < text.length()) {
            throw new QuantityException(
                    "'" + text.substring(at) + "' in the unit '" + text + "' cannot be read",
                    "end the unit before it, or write a product with a point and a quotient with a slash: W/(m2.K)");
        }
        boolean alone = factors == 1 && single != null;
        return new Parsed(whole.spelling(), whole.unit(), alone ? single.zero() : 0, alone && single.angle());
    }

    private Part product(boolean below, int depth) throws QuantityException {
        List<String> above = new ArrayList<>();
        List<String> denominators = new ArrayList<>();
        Unit<?> unit;
        skipSpaces();
        if (at < text.length() && isOneOf(QUOTIENT_SIGNS)) {
            unit = AbstractUnit.ONE;
            above.add("1");
        } else {
            Part first = factor(below, depth);
            unit = first.unit();
            above.add(first.spelling());
        }
        while (true) {
            boolean spaced = skipSpaces();
            if (at == text.length() || text.charAt(at) == ')') {
                break;
            }
            boolean quotient = isOneOf(QUOTIENT_SIGNS);
            boolean signed = quotient || isOneOf(PRODUCT_SIGNS);
            if (signed) {
                at++;
            } else if (!spaced && !startsFactor()) {
                break;
            }
            skipSpaces();
            boolean askBrackets = !quotient && !denominators.isEmpty();
            Part next = factor(below || quotient || askBrackets, depth);
            if (askBrackets) {
                denominators.add(next.spelling());
                throw ambiguous(above, denominators);
            }
            if (quotient) {
                unit = unit.divide(next.unit());
                denominators.add(next.spelling());
            } else {
                unit = unit.multiply(next.unit());
                above.add(next.spelling());
            }
        }
        String spelling = String.join(".", above);
        return new Part(unit, denominators.isEmpty() ? spelling : spelling + "/" + String.join("/", denominators));
    }

    private QuantityException ambiguous(List<String> above, List<String> denominators) {
        return new QuantityException(
                "'" + text + "' can be read in two ways",
                "is " + String.join(".", above) + "/(" + String.join(".", denominators)
                        + ") meant? Put all that is divided by into brackets");
    }

    private Part factor(boolean below, int depth) throws QuantityException {
        if (at == text.length()) {
            throw new QuantityException(
                    "the unit '" + text + "' stops where another symbol should follow",
                    "complete it, such as W/(m2.K)");
        }
        factors++;
        char c = text.charAt(at);
        if (c == '(') {
            return bracket(below, depth);
        }
        if (c >= '0' && c <= '9') {
            return one();
        }
        int begin = at;
        while (at < text.length() && isLetter(text.charAt(at))) {
            at++;
        }
        if (at == begin) {
            throw new QuantityException(
                    "'" + text.substring(begin) + "' in the unit '" + text + "' cannot be read",
                    "write a product with a point and a quotient with a slash: W/(m2.K)");
        }
        String spelling = text.substring(begin, at);
        UnitSymbol symbol = UnitSymbol.find(spelling);
        if (symbol == null) {
            throw unknown(spelling);
        }
        int power = power();
        if (below && symbol.name().equals("mK")) {
            String before = text.substring(0, begin);
            String rest = text.substring(at);
            String brackets = before.endsWith("(") ? before + "m.K" + rest : before + "(m.K)" + rest;
            throw new QuantityException(
                    "'" + text + "' can be read in two ways: mK is a thousandth of a kelvin, too",
                    "is " + brackets + " meant? Put a point between metre and kelvin");
        }
        single = power == 1 ? symbol : null;
        return powered(symbol.unit(), symbol.name(), power);
    }

    private static Part powered(Unit<?> unit, String spelling, int power) {
        return new Part(power == 1 ? unit : unit.pow(power), power == 1 ? spelling : spelling + power);
    }

    private Part bracket(boolean below, int depth) throws QuantityException {
        int begin = at;
        at++;
        // A bracket is no factor of its own: (degC) is degC.
        factors--;
        if (depth == DEEPEST_BRACKET) {
            throw new QuantityException("the unit has brackets within brackets too deep", "write it as W/(m2.K)");
        }
        int before = factors;
        Part inner = product(below, depth + 1);
        if (at == text.length()) {
            throw new QuantityException(
                    "the bracket in '" + text + "' is not closed",
                    "close it: " + text.substring(0, begin)
                            + text.substring(begin).strip() + ")");
        }
        at++;
        int power = power();
        boolean many = factors > before + 1 || inner.spelling().contains("/");
        if (power != 1) {
            single = null;
        }
        return powered(inner.unit(), many || power != 1 ? "(" + inner.spelling() + ")" : inner.spelling(), power);
    }

    private Part one() throws QuantityException {
        int begin = at;
        while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
            at++;
        }
        String digits = text.substring(begin, at);
        if (!digits.equals("1") || begin > 0 && !text.substring(0, begin).isBlank()) {
            throw new QuantityException(
                    "the number " + digits + " stands inside the unit '" + text + "'",
                    "leave numbers out of the unit, save for powers (m2) and 1 above a slash (1/K)");
        }
        single = null;
        return new Part(AbstractUnit.ONE, "1");
    }

    private QuantityException unknown(String spelling) {
        String meant = UnitSymbol.meant(spelling);
        return new QuantityException(
                "the unit '" + spelling + "' is not known",
                meant == null
                        ? "use SI units with prefixes, degC, degF, h, min, in, ft, lb or Btu, such as W/(m2.K)"
                        : "is " + meant + " meant?");
    }

    /** Reads a power: a whole number after {@code ^} or straight after the symbol, or in superscripts; 1 where none. */
    private int power() throws QuantityException {
        int begin = at;
        StringBuilder digits = new StringBuilder();
        if (at < text.length() && (SUPERSCRIPTS.indexOf(text.charAt(at)) >= 0 || text.charAt(at) == '⁻')) {
            while (at < text.length() && (SUPERSCRIPTS.indexOf(text.charAt(at)) >= 0 || text.charAt(at) == '⁻')) {
                int digit = SUPERSCRIPTS.indexOf(text.charAt(at++));
                digits.append(digit < 0 ? "-" : String.valueOf(digit));
            }
        } else {
            if (at < text.length() && text.charAt(at) == '^') {
                at++;
            }
            if (at < text.length() && "-−+".indexOf(text.charAt(at)) >= 0) {
                digits.append(text.charAt(at++) == '+' ? "" : "-");
            }
            while (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
                digits.append(text.charAt(at++));
            }
        }
        if (at == begin) {
            return 1;
        }
        try {
            int power = Integer.parseInt(digits.toString());
            if (power != 0 && Math.abs(power) <= GREATEST_POWER) {
                return power;
            }
        } catch (NumberFormatException e) {
            // Told below, as for a power out of range.
        }
        throw new QuantityException(
                "'" + text.substring(begin, at) + "' in the unit '" + text + "' is no power",
                "write powers as whole numbers from -9 to 9, such as m2, m^2 or m-1");
    }

    private boolean isOneOf(String signs) {
        return signs.indexOf(text.charAt(at)) >= 0;
    }

    private boolean startsFactor() {
        char c = text.charAt(at);
        return c == '(' || isLetter(c);
    }

    private static boolean isLetter(char c) {
        return Character.isLetter(c) || c == '°' || c == '%' || c == '\'' || c == '"' || c == '_';
    }

    private boolean skipSpaces() {
        int begin = at;
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
        return at > begin;
    }
}
