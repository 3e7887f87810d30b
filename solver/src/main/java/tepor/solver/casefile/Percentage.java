package tepor.solver.casefile;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tepor.solver.casefile.KeyTable.Value;

/** Reads fractions that may be written in percent. */
final class Percentage {
    private static final Pattern PERCENT =
            Pattern.compile("\\s*([+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d+)?)\\s*%\\s*");
    private static final Pattern NUMBER = Pattern.compile("\\s*([+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d+)?)\\s*");

    private Percentage() {}

    /** Whether the text is a percentage. */
    static boolean is(String text) {
        return PERCENT.matcher(text).matches();
    }

    /** The fraction: of a text in percent, or of a number; empty where it is neither. */
    static Optional<Double> read(Value value) {
        if (value.raw() instanceof Number number) {
            return Optional.of(number.doubleValue());
        }
        if (!(value.raw() instanceof String text)) {
            return Optional.empty();
        }
        Matcher percent = PERCENT.matcher(text);
        if (percent.matches()) {
            return Optional.of(Double.parseDouble(percent.group(1)) / 100);
        }
        Matcher number = NUMBER.matcher(text);
        return number.matches() ? Optional.of(Double.parseDouble(number.group(1))) : Optional.empty();
    }
}
