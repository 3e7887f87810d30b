package tepor.mesher.outline;

import java.util.Locale;

/**
 * The unit in which a drawing gives its coordinates. Inside, every length is in metres.
 *
 * @param symbol the unit as the user wrote it, such as {@code mm}
 * @param metres metres per unit
 */
public record DrawingUnit(String symbol, double metres) {
    /**
     * A number of this unit in metres. Where a metre is a whole number of units, it divides, so that 200 mm are exactly
     * the double nearest to 0.2 m.
     */
    public double toMetres(double value) {
        double unitsPerMetre = 1 / metres;
        return unitsPerMetre > 1 && unitsPerMetre == Math.rint(unitsPerMetre) ? value / unitsPerMetre : value * metres;
    }

    /** A point given in metres, as text in this unit, for messages. */
    public String point(double x, double y) {
        // More digits than a length has: drawings lie far from their origin.
        return "(" + number(x, 10) + " " + number(y, 10) + ") " + symbol;
    }

    /** A length given in metres, as text in this unit, for messages. */
    public String length(double length) {
        return number(length, 6) + " " + symbol;
    }

    /** An area given in square metres, as text in the square of this unit, for messages. */
    public String area(double area) {
        return number(area / metres, 6) + " " + symbol + "²";
    }

    private String number(double inMetres, int digits) {
        String text = String.format(Locale.ROOT, "%." + digits + "g", inMetres / metres);
        return text.replaceFirst("(\\.\\d*?)0+(?=e|$)", "$1").replaceFirst("\\.(?=e|$)", "");
    }
}
