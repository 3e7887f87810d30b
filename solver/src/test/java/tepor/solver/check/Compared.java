package tepor.solver.check;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import tepor.solver.CaseText;
import tepor.solver.answer.Answer;
import tepor.solver.answer.AskAnswer;

/** Answers of a case beside values found by other means. */
final class Compared {
    private static final double ZERO_CELSIUS = 273.15;

    private final Map<String, AskAnswer> answers;

    private Compared(Answer answer) {
        answers = CaseText.byName(answer);
    }

    /** Answers a case; its ledger balances. */
    static Compared answer(String toml) {
        Answer answer = CaseText.answer(toml);
        assertThat(answer.ledger().imbalance()).isLessThan(1e-9);
        return new Compared(answer);
    }

    /** The interval holds the exact value, and the answer is within a share of the scale of it. */
    Compared holds(String ask, double exact, double share, double scale) {
        AskAnswer found = answers.get(ask);
        double error = exact - found.value();
        assertThat(error)
                .as(ask)
                .isBetween(found.meshError().low(), found.meshError().high());
        assertThat(error).as(ask).isCloseTo(0, within(share * scale));
        return this;
    }

    /** As {@link #holds}, for a temperature in degC. */
    Compared holdsCelsius(String ask, double exact, double share, double scale) {
        return holds(ask, exact + ZERO_CELSIUS, share, scale);
    }
}
