package tepor.solver.quantity;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import javax.measure.IncommensurableException;
import javax.measure.Unit;
import javax.measure.UnitConverter;

/**
 * A unit text that was understood.
 *
 * @param text its one spelling, such as {@code W/(m2.K)}; empty for pure numbers
 * @param unit a temperature in it is a difference
 * @param scale the unit as a temperature on a scale; null where it is none
 * @param angle whether it is an angle on its own
 */
record UnitExpression(String text, Unit<?> unit, Unit<?> scale, boolean angle) {
    private static final Map<String, UnitExpression> PARSED = new ConcurrentHashMap<>();

    /**
     * Understands a unit text. Each text is parsed once.
     *
     * @throws QuantityException if it is no unit
     */
    static UnitExpression of(String text) throws QuantityException {
        UnitExpression known = PARSED.get(text);
        if (known == null) {
            known = new UnitParser(text).parse();
            PARSED.put(text, known);
        }
        return known;
    }

    /** The unit in which a dimension is given by default. */
    static UnitExpression of(Dimension dimension) {
        try {
            return of(dimension.unit());
        } catch (QuantityException e) {
            throw new IllegalStateException("the default unit of " + dimension, e);
        }
    }

    /** Whether values in this unit measure the dimension. */
    boolean measures(Dimension dimension) {
        return switch (dimension) {
            case NUMBER -> text.isEmpty() || text.equals("%") || text.equals("1");
            case ANGLE -> angle;
            case TEMPERATURE -> scale != null || isAlike(dimension);
            case TEMPERATURE_DIFFERENCE -> scale == null && isAlike(dimension);
            default -> isAlike(dimension);
        };
    }

    private boolean isAlike(Dimension dimension) {
        return !text.isEmpty() && unit.isCompatible(of(dimension).unit());
    }

    /** From this unit to SI. A unit that is no temperature scale converts alike for values and differences. */
    UnitConverter toSi(Dimension dimension) {
        return converter(from(dimension), of(dimension).unit().getSystemUnit());
    }

    /** From SI to this unit. */
    UnitConverter fromSi(Dimension dimension) {
        return converter(of(dimension).unit().getSystemUnit(), from(dimension));
    }

    private Unit<?> from(Dimension dimension) {
        return dimension == Dimension.TEMPERATURE && scale != null ? scale : unit;
    }

    private static UnitConverter converter(Unit<?> from, Unit<?> to) {
        try {
            return from.getConverterToAny(to);
        } catch (IncommensurableException e) {
            throw new IllegalArgumentException(from + " and " + to + " measure different things", e);
        }
    }
}
