package tepor.solver.quantity;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import javax.measure.IncommensurableException;
import javax.measure.Unit;

/** A unit text that was understood. */
final class UnitExpression {
    private static final Map<String, UnitExpression> PARSED = new ConcurrentHashMap<>();

    private final String text;
    private final Unit<?> unit;
    private final double zero;
    private final boolean angle;

    /** As JSR 385 names it; comparing these is many times quicker than asking whether two units are compatible. */
    private javax.measure.Dimension measured;

    /** SI per unit is {@code times / over}, one of which is 1: most units divide exactly where they do not multiply so. */
    private double times;

    private double over;

    /**
     * @param text its one spelling, such as {@code W/(m2.K)}; empty for pure numbers
     * @param unit a temperature in it is a difference
     * @param zero as of {@link UnitSymbol}
     * @param angle whether it is an angle on its own
     */
    UnitExpression(String text, Unit<?> unit, double zero, boolean angle) {
        this.text = text;
        this.unit = unit;
        this.zero = zero;
        this.angle = angle;
    }

    /**
     * Understands a unit text. Each text is parsed once.
     *
     * @throws QuantityException if it is no unit
     */
    static UnitExpression of(String text) throws QuantityException {
        UnitExpression known = PARSED.get(text);
        if (known == null) {
            UnitParser.Parsed parsed = new UnitParser(text).parse();
            known = new UnitExpression(parsed.spelling(), parsed.unit(), parsed.zero(), parsed.angle());
            known.prepare();
            PARSED.put(text, known);
        }
        return known;
    }

    private void prepare() {
        measured = unit.getDimension();
        double factor;
        try {
            factor = unit.getConverterToAny(unit.getSystemUnit()).convert(1.0);
        } catch (IncommensurableException e) {
            throw new IllegalStateException(unit + " and its own system unit", e);
        }
        double inverse = Math.rint(1 / factor);
        boolean divides = factor < 1 && Math.abs(inverse * factor - 1) < 1e-14;
        times = divides ? 1 : factor;
        over = divides ? inverse : 1;
    }

    /** Its one spelling, such as {@code W/(m2.K)}; empty for pure numbers. */
    String text() {
        return text;
    }

    /** Whether it counts temperatures from a zero of its own. */
    boolean isScale() {
        return zero != 0;
    }

    /** Whether values in this unit measure the dimension. */
    boolean measures(Dimension dimension) {
        return switch (dimension) {
            case NUMBER -> text.isEmpty() || text.equals("%") || text.equals("1");
            case ANGLE -> angle;
            case TEMPERATURE_DIFFERENCE -> !isScale() && isAlike(dimension);
            default -> isAlike(dimension);
        };
    }

    private boolean isAlike(Dimension dimension) {
        return !text.isEmpty() && !angle && measured.equals(defaultOf(dimension).measured);
    }

    /**
     * From this unit to SI.
     *
     * @param dimension decides whether a temperature is one on a scale or a difference
     * @throws IllegalArgumentException if the unit is none of this dimension
     */
    double toSi(double value, Dimension dimension) {
        return (value + zero(dimension)) * times / over;
    }

    /** From SI to this unit. */
    double fromSi(double si, Dimension dimension) {
        return si * over / times - zero(dimension);
    }

    private static UnitExpression defaultOf(Dimension dimension) {
        try {
            return of(dimension.unit());
        } catch (QuantityException e) {
            throw new IllegalStateException("the default unit of " + dimension, e);
        }
    }

    private double zero(Dimension dimension) {
        if (!measured.equals(defaultOf(dimension).measured)) {
            throw new IllegalArgumentException("'" + text + "' does not measure " + dimension.words());
        }
        return dimension == Dimension.TEMPERATURE ? zero : 0;
    }
}
