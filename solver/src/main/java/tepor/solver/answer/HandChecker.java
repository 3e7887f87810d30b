package tepor.solver.answer;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import tepor.solver.bracket.Bracket;
import tepor.solver.bracket.BracketFinder;
import tepor.solver.bracket.Surroundings;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Target;
import tepor.solver.model.Values;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Units;

/**
 * Checks a heat flow or a coupling by one-dimensional resistances in series and parallel, which bracket it.
 *
 * <p>There is a check where heat flows between two surroundings and nowhere else: two temperatures (or the two airs of a
 * coupling), no heat produced, everything else insulated, and the ask takes in all that one of them holds.
 */
public final class HandChecker {
    /** How far outside its bracket rounding may put a value, relative. */
    private static final double ROUNDING = 1e-9;

    private HandChecker() {}

    /**
     * Brackets an ask.
     *
     * @param subject the case
     * @param values of its inputs, SI
     * @param ask a flow or a coupling; for others there is no check
     * @param computed what it is compared with: W/m, positive out of the section, or W/(m·K)
     * @return the check; empty where the section allows none
     */
    public static Optional<HandCheck> check(Case subject, Values values, Ask ask, double computed) {
        if (ask instanceof Ask.Coupling coupling) {
            return Surroundings.ofAirs(subject, values, coupling.from(), coupling.to())
                    .flatMap(s -> BracketFinder.between(subject, values, s)
                            .map(bracket -> verdict(bracket.low(), bracket.high(), computed, opening(s), bracket)));
        }
        if (ask instanceof Ask.Flow flow) {
            return Surroundings.byTemperature(subject, values).flatMap(s -> flow(subject, values, s, flow, computed));
        }
        return Optional.empty();
    }

    private static Optional<HandCheck> flow(
            Case subject, Values values, Surroundings surroundings, Ask.Flow ask, double computed) {
        int held = surroundings.heldBy(segments(subject, ask.target()));
        if (held < 0) {
            return Optional.empty();
        }
        return BracketFinder.between(subject, values, surroundings).map(bracket -> {
            double difference = surroundings.temperature(1 - held) - surroundings.temperature(held);
            double one = bracket.low() * difference;
            double other = bracket.high() * difference;
            List<String> lines = new ArrayList<>();
            lines.add(opening(surroundings) + " (" + temperature(surroundings, 0) + " and "
                    + temperature(surroundings, 1) + ")");
            lines.addAll(bracket.working());
            lines.add("times " + Units.format(Math.abs(difference), "K", Dimension.TEMPERATURE_DIFFERENCE) + ", "
                    + (difference < 0 ? "into" : "out of") + " the section: "
                    + Units.format(Math.abs(one), "W/m", Dimension.HEAT_PER_LENGTH) + " to "
                    + Units.format(Math.abs(other), "W/m", Dimension.HEAT_PER_LENGTH));
            return verdict(Math.min(one, other), Math.max(one, other), computed, lines);
        });
    }

    private static int[] segments(Case subject, Target target) {
        if (target instanceof Target.OfEdge edge) {
            return edge.edge().pieces().segments();
        }
        if (target instanceof Target.OfAir air) {
            return subject.edges().stream()
                    .filter(edge -> edge.conditions().stream().anyMatch(c -> Surroundings.isIn(c, air.air())))
                    .flatMapToInt(edge -> Arrays.stream(edge.pieces().segments()))
                    .distinct()
                    .toArray();
        }
        return new int[0];
    }

    private static HandCheck verdict(double low, double high, double computed, String opening, Bracket bracket) {
        List<String> lines = new ArrayList<>();
        lines.add(opening);
        lines.addAll(bracket.working());
        return verdict(low, high, computed, lines);
    }

    private static HandCheck verdict(double low, double high, double computed, List<String> lines) {
        double rounding = ROUNDING * Math.max(Math.abs(low), Math.abs(high));
        boolean inside = computed >= low - rounding && computed <= high + rounding;
        return new HandCheck(low, high, inside, lines);
    }

    private static String opening(Surroundings surroundings) {
        return "between " + surroundings.name(0) + " and " + surroundings.name(1) + ", per metre of depth";
    }

    private static String temperature(Surroundings surroundings, int which) {
        return Units.format(surroundings.temperature(which), "degC", Dimension.TEMPERATURE);
    }
}
