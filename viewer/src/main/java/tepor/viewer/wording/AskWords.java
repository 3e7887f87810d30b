package tepor.viewer.wording;

import java.util.Comparator;
import java.util.Map;
import java.util.stream.Collectors;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Input;
import tepor.solver.model.Limit;
import tepor.solver.model.Target;
import tepor.solver.quantity.Units;

/** What an ask asks, in words. */
public final class AskWords {
    private final Case subject;

    public AskWords(Case subject) {
        this.subject = subject;
    }

    /** Such as "highest temperature, bars". */
    public String of(Ask ask) {
        String with = with(ask.head().with());
        return what(ask) + (with.isEmpty() ? "" : ", with " + with);
    }

    /** Such as "<= 105 degC"; empty where there is no limit. */
    public static String limit(Ask ask) {
        Limit limit = ask.head().limit();
        if (limit == null) {
            return "";
        }
        String unit = limit.quantity().unit();
        double value =
                Units.fromSi(limit.quantity().value(), unit, limit.quantity().dimension());
        return limit.relation().sign() + " " + Rounding.significant(value, 9) + (unit.isEmpty() ? "" : " " + unit);
    }

    private String what(Ask ask) {
        if (ask instanceof Ask.Peak peak) {
            return "highest temperature, " + peak.target().name();
        } else if (ask instanceof Ask.Lowest lowest) {
            return "lowest temperature, " + lowest.target().name();
        } else if (ask instanceof Ask.Mean mean) {
            return "mean temperature, " + mean.target().name();
        } else if (ask instanceof Ask.At at) {
            return "temperature at " + subject.unit().point(at.x(), at.y());
        } else if (ask instanceof Ask.Flow flow) {
            return flow(flow);
        } else if (ask instanceof Ask.Coupling coupling) {
            return "thermal coupling coefficient, " + coupling.from().name() + " to "
                    + coupling.to().name();
        } else if (ask instanceof Ask.Transmittance psi) {
            return "linear thermal transmittance, " + psi.from().name() + " to "
                    + psi.to().name();
        } else if (ask instanceof Ask.Factor factor) {
            return "surface temperature factor, " + factor.edge().name();
        } else if (ask instanceof Ask.Difference difference) {
            return difference.first().name() + " less " + difference.second().name();
        }
        return ask.kind();
    }

    private String flow(Ask.Flow flow) {
        String direction = FlowDirection.words(flow, subject.section());
        String through = flow.target() instanceof Target.OfAir ? "heat flow to " : "heat flow through ";
        return through + flow.target().name() + (direction.equals("out") ? ", out of the section" : ", " + direction);
    }

    private static String with(Map<Input, Double> values) {
        return values.entrySet().stream()
                .sorted(Comparator.comparing(e -> e.getKey().path()))
                .map(e -> e.getKey().path() + " = " + value(e.getKey(), e.getValue()))
                .collect(Collectors.joining(", "));
    }

    private static String value(Input input, double si) {
        String unit = input.quantity().unit();
        double value = Units.fromSi(si, unit, input.quantity().dimension());
        return Rounding.significant(value, 9) + (unit.isEmpty() ? "" : " " + unit);
    }
}
