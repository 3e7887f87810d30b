package tepor.solver.answer;

import java.util.ArrayList;
import java.util.List;
import tepor.solver.model.Ask;
import tepor.solver.model.Case;
import tepor.solver.model.Within;
import tepor.solver.quantity.Dimension;
import tepor.solver.trust.Convergence;

/** Follows every ask of a case over the rounds of refinement. */
final class AskConvergence {
    /** What is left at least of the errors of two terms in their difference. */
    private static final double CANCELLED = 0.1;

    private final Case subject;
    private final List<Convergence> convergences = new ArrayList<>();
    private final List<Double> last = new ArrayList<>();
    private final List<Double> within = new ArrayList<>();
    private final List<double[]> places = new ArrayList<>();
    private int rounds;

    AskConvergence(Case subject) {
        this.subject = subject;
        for (int i = 0; i < subject.asks().size(); i++) {
            convergences.add(new Convergence());
            last.add(Double.NaN);
            within.add(Double.NaN);
        }
    }

    /** Takes what a further mesh says. */
    void add(AskEvaluator evaluator, int triangles) {
        rounds++;
        places.clear();
        for (int i = 0; i < convergences.size(); i++) {
            Ask ask = subject.asks().get(i);
            AskValue value = evaluator.evaluate(ask);
            double tolerance = ask.head().within() instanceof Within.Fraction fraction
                    ? fraction.value() * value.reference()
                    : ((Within.Absolute) ask.head().within()).value();
            last.set(i, value.value());
            within.set(i, tolerance);
            convergences.get(i).add(value.value(), tolerance, triangles);
            if (value.where() != null) {
                places.add(value.where());
            }
        }
    }

    /** Places (x and y, metres) of the asks that look at a point, as the last mesh has them. */
    List<double[]> places() {
        return List.copyOf(places);
    }

    boolean settled() {
        for (int i = 0; i < convergences.size(); i++) {
            if (!reached(i)) {
                return false;
            }
        }
        return true;
    }

    /** Mesh error of the ask that is worst off, relative to its tolerance; NaN after a single round or without asks. */
    double widestRelative() {
        double widest = Double.NaN;
        for (int i = 0; i < convergences.size() && rounds > 1; i++) {
            double relative = halfWidth(i) / within.get(i);
            widest = Double.isNaN(widest) ? relative : Math.max(widest, relative);
        }
        return widest;
    }

    MeshError error(int i) {
        double error = halfWidth(i);
        return new MeshError(-error, error, MeshError.Kind.ESTIMATE, within.get(i), reached(i));
    }

    private boolean reached(int i) {
        return convergences.get(i).settled() && halfWidth(i) <= within.get(i);
    }

    /**
     * Half-width of an error interval. A difference may stand still while both its terms move alike; that their errors
     * cancel is trusted to a tenth only.
     */
    private double halfWidth(int i) {
        double own = convergences.get(i).error();
        if (subject.asks().get(i) instanceof Ask.Difference difference) {
            double terms = halfWidth(subject.asks().indexOf(difference.first()))
                    + halfWidth(subject.asks().indexOf(difference.second()));
            return Math.max(own, CANCELLED * terms);
        }
        return own;
    }

    Answer.Round round(int triangles) {
        List<MeshError> errors = new ArrayList<>();
        for (int i = 0; i < convergences.size(); i++) {
            errors.add(rounds < 2 ? null : error(i));
        }
        return new Answer.Round(rounds, triangles, last, errors);
    }

    List<AskAnswer> answers(AskEvaluator evaluator) {
        List<AskAnswer> answers = new ArrayList<>();
        for (int i = 0; i < convergences.size(); i++) {
            Ask ask = subject.asks().get(i);
            AskValue value = evaluator.evaluate(ask);
            Dimension dimension = dimension(ask);
            String unit = ask.head().limit() == null
                    ? dimension.unit()
                    : ask.head().limit().quantity().unit();
            answers.add(new AskAnswer(
                    ask,
                    value.value(),
                    dimension,
                    unit,
                    value.where(),
                    error(i),
                    verdict(ask, value.value()),
                    handCheck(ask, value.value(), halfWidth(i))));
        }
        return answers;
    }

    /**
     * A bracket narrower than the mesh error is not left by a value that is off by no more than that. An error that is not
     * known excuses nothing: else the check could never fail.
     */
    private HandCheck handCheck(Ask ask, double value, double error) {
        HandCheck check = HandChecker.check(subject, AskValues.of(subject, ask), ask, value)
                .orElse(null);
        if (check == null || check.inside() || !Double.isFinite(error)) {
            return check;
        }
        boolean inside = value + error >= check.low() && value - error <= check.high();
        return new HandCheck(check.low(), check.high(), inside, check.working());
    }

    /**
     * Until the inputs' spreads count, a limit that the nominal value keeps is undecided: nobody has said yet how far off
     * the inputs make it.
     */
    private static Verdict verdict(Ask ask, double value) {
        if (ask.head().limit() == null) {
            return null;
        }
        return ask.head().limit().margin(value) < 0 ? Verdict.BROKEN : Verdict.UNDECIDED;
    }

    private static Dimension dimension(Ask ask) {
        if (ask instanceof Ask.Flow) {
            return Dimension.HEAT_PER_LENGTH;
        }
        if (ask instanceof Ask.Coupling || ask instanceof Ask.Transmittance) {
            return Dimension.COUPLING;
        }
        if (ask instanceof Ask.Factor) {
            return Dimension.NUMBER;
        }
        if (ask instanceof Ask.Difference difference) {
            Dimension of = dimension(difference.first());
            return of == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : of;
        }
        return Dimension.TEMPERATURE;
    }
}
