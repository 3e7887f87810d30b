package tepor.solver.quantity;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tepor.solver.quantity.Spread.Distribution;

/**
 * What stands after the number of a quantity, taken apart: the unit, and the spread with its own unit.
 *
 * @param number the value
 * @param unit the unit's text; empty where there is none
 * @param spread the number of the spread; null where none is stated
 * @param percent whether the spread is in percent of the value
 * @param spreadUnit the unit's text that stands after the spread; empty where there is none
 * @param distribution what the text says of the values within
 * @param coverageFactor k of a normal distribution, else 1
 */
record SpreadText(
        NumberText number,
        String unit,
        NumberText spread,
        boolean percent,
        String spreadUnit,
        Distribution distribution,
        double coverageFactor) {
    private static final Pattern SIGN = Pattern.compile("±|\\+ ?/? ?-|∓|-\\+");
    private static final Pattern NOTE = Pattern.compile("\\(([^()]*)\\)\\s*$");
    private static final Pattern NORMAL = Pattern.compile("normal\\s*[,;]?\\s*k\\s*=\\s*(.+)");
    private static final String DISTRIBUTIONS =
            "write (rectangular), (triangular), (normal, k=1) or (normal, k=2) after the spread";

    /**
     * Takes a quantity's text apart.
     *
     * @param text in which minus signs are hyphens and spaces are blanks
     */
    static SpreadText of(String text) throws QuantityException {
        Matcher sign = SIGN.matcher(text);
        if (!sign.find()) {
            if (noteOf(text) != null) {
                throw new QuantityException(
                        "'" + text + "' states a distribution, but no spread",
                        "state the spread before" + " it, such as 0.65 W/(m.K) ± 10 % (normal, k=2)");
            }
            NumberText number = NumberText.begin(text);
            return new SpreadText(number, number.rest(), null, false, "", Distribution.RECTANGULAR, 1);
        }
        if (sign.start() == 0) {
            throw new QuantityException(
                    "'" + text + "' has no value before its spread", "write such as 0.65 W/(m.K) ± 10 %");
        }
        NumberText number = NumberText.begin(text.substring(0, sign.start()));
        String after = text.substring(sign.end()).strip();
        if (SIGN.matcher(after).find()) {
            throw new QuantityException(
                    "'" + text + "' has more than one spread", "write one, such as 0.65 W/(m.K) ± 10 %");
        }
        String note = noteOf(after);
        Distribution distribution = Distribution.RECTANGULAR;
        double coverageFactor = 1;
        if (note != null) {
            after = after.substring(0, after.lastIndexOf('(')).strip();
            String word = note.strip().toLowerCase(Locale.ROOT);
            switch (word) {
                case "rectangular" -> distribution = Distribution.RECTANGULAR;
                case "triangular" -> distribution = Distribution.TRIANGULAR;
                default -> {
                    distribution = Distribution.NORMAL;
                    coverageFactor = coverageFactor(note, word);
                }
            }
        }
        if (after.isEmpty()) {
            throw new QuantityException(
                    "'" + text + "' has no spread after its ±", "write such as 0.65 W/(m.K) ± 10 %");
        }
        NumberText spread = NumberText.begin(after);
        if (spread.value() < 0) {
            throw new QuantityException("the spread " + spread.digits() + " is negative", "write it without a sign");
        }
        boolean percent = spread.rest().startsWith("%") && !spread.rest().startsWith("%/");
        String spreadUnit = percent ? spread.rest().substring(1).strip() : spread.rest();
        return new SpreadText(number, number.rest(), spread, percent, spreadUnit, distribution, coverageFactor);
    }

    /** The words in brackets at the end, where they speak of a distribution; null where there are none. */
    private static String noteOf(String text) {
        Matcher note = NOTE.matcher(text);
        // A bracket at the end may belong to the unit. A note stands apart from it, and a unit never follows a
        // percentage.
        boolean speaks = note.find()
                && (note.group(1).contains("=")
                        || note.group(1).contains(",")
                        || note.group(1).strip().matches("(?i)[a-z]{5,}.*"));
        return speaks ? note.group(1) : null;
    }

    private static double coverageFactor(String note, String word) throws QuantityException {
        if (word.equals("normal")) {
            throw new QuantityException(
                    "'(" + note + ")' does not say its coverage factor",
                    "write (normal, k=1) for a standard uncertainty, (normal, k=2) for an expanded one");
        }
        Matcher normal = NORMAL.matcher(word);
        if (!normal.matches()) {
            throw new QuantityException("'(" + note + ")' is no distribution", DISTRIBUTIONS);
        }
        NumberText factor = NumberText.begin(normal.group(1));
        if (!(factor.value() > 0) || !factor.rest().isEmpty()) {
            throw new QuantityException(
                    "'(" + note + ")' has no coverage factor above zero", "write (normal, k=1) or (normal, k=2)");
        }
        return factor.value();
    }
}
