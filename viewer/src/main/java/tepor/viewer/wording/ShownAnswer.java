package tepor.viewer.wording;

import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;
import tepor.solver.answer.HandCheck;
import tepor.solver.answer.MeshError;
import tepor.solver.answer.Verdict;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Limit;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Units;

/**
 * The answer to one ask in the unit in which it is read.
 *
 * @param source the answer it shows
 * @param value in the answer's unit
 * @param deviation how far off the mesh may be, in the answer's unit; null where nothing is said
 * @param limit null where the ask has none
 * @param forDepth watts for the depth of the case; null where the answer is no heat flow, or the case has no depth
 */
public record ShownAnswer(AskAnswer source, double value, Deviation deviation, ShownLimit limit, Double forDepth) {
    /**
     * The interval in which (true − value) lies as far as the mesh is concerned, in the answer's unit.
     *
     * @param low lower end; may be infinite
     * @param high upper end; may be infinite
     * @param within what was asked
     */
    public record Deviation(double low, double high, double within) {
        /** The larger of both ends, as an absolute value. */
        public double halfWidth() {
            return Math.max(Math.abs(low), Math.abs(high));
        }
    }

    /**
     * A limit in its own unit.
     *
     * @param relation how the answer must stand to it
     * @param value in its unit
     * @param unit as the user gave it
     * @param margin distance from the answer to the limit, positive where it is kept; of a temperature, in degrees of the
     *     unit
     * @param marginUnit unit of the margin
     * @param verdict whether it holds
     */
    public record ShownLimit(
            Limit.Relation relation, double value, String unit, double margin, String marginUnit, Verdict verdict) {}

    /** Shows an answer to an ask of the case. */
    public static ShownAnswer of(AskAnswer answer, Case subject) {
        String unit = answer.unit();
        Dimension dimension = answer.dimension();
        double value = Units.fromSi(answer.value(), unit, dimension);
        return new ShownAnswer(
                answer,
                value,
                deviation(answer.meshError(), unit, dimension),
                limit(answer),
                dimension == Dimension.HEAT_PER_LENGTH && subject.depth() != null
                        ? Double.valueOf(
                                answer.value() * subject.depth().quantity().value())
                        : null);
    }

    /** The error that one round of the history states for this answer, in its unit; null where it states none. */
    public Deviation deviationOf(Answer.Round round, int iAsk) {
        return deviation(round.errors().get(iAsk), source.unit(), source.dimension());
    }

    /** The value of one round of the history, in the answer's unit. */
    public double valueOf(Answer.Round round, int iAsk) {
        return Units.fromSi(round.values().get(iAsk), source.unit(), source.dimension());
    }

    public Ask ask() {
        return source.ask();
    }

    public String name() {
        return source.ask().name();
    }

    public String unit() {
        return source.unit();
    }

    /** Lower end of the value's interval; NaN where no error is said. */
    public double low() {
        return deviation == null ? Double.NaN : value + deviation.low();
    }

    /** Upper end of the value's interval; NaN where no error is said. */
    public double high() {
        return deviation == null ? Double.NaN : value + deviation.high();
    }

    /** Lower bracket of the hand check in the answer's unit. */
    public double handLow() {
        return inUnit(source.handCheck().low());
    }

    /** Upper bracket of the hand check in the answer's unit. */
    public double handHigh() {
        return inUnit(source.handCheck().high());
    }

    public HandCheck handCheck() {
        return source.handCheck();
    }

    private double inUnit(double si) {
        return Double.isFinite(si) ? Units.fromSi(si, source.unit(), source.dimension()) : si;
    }

    private static Deviation deviation(MeshError error, String unit, Dimension dimension) {
        return error == null
                ? null
                : new Deviation(
                        difference(error.low(), unit, dimension),
                        difference(error.high(), unit, dimension),
                        difference(error.within(), unit, dimension));
    }

    private static ShownLimit limit(AskAnswer answer) {
        Limit limit = answer.ask().head().limit();
        if (limit == null) {
            return null;
        }
        String unit = limit.quantity().unit();
        Dimension dimension = limit.quantity().dimension();
        return new ShownLimit(
                limit.relation(),
                Units.fromSi(limit.quantity().value(), unit, dimension),
                unit,
                difference(limit.margin(answer.value()), unit, dimension),
                dimension == Dimension.TEMPERATURE && unit.equals("degC") ? "K" : unit,
                answer.verdict());
    }

    /** A difference of two values: of temperatures, one on no scale. */
    private static double difference(double si, String unit, Dimension dimension) {
        if (!Double.isFinite(si)) {
            return si;
        }
        return Units.fromSi(
                si, unit, dimension == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : dimension);
    }
}
