package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Verdict;
import tepor.viewer.wording.ShownAnswer;

class FigureTextTest {
    private static final Answer ANSWER = new SampleAnswers("t", PatternedGrid.ring(1, 2, 12, 2))
            .peak("p", 96.3712, 0.0432, 105, Verdict.MET, 1, 0)
            .peak("q", 61.25, 0.6, 60, Verdict.BROKEN, 1, 0)
            .at("exact", 20, 0, 1, 0)
            .flow("f", -42.0213, 0.001)
            .answer(6, (x, y) -> 20.0);

    private static ShownAnswer shown(int i) {
        return ShownAnswer.of(ANSWER.asks().get(i), ANSWER.subject());
    }

    private static String value(int i) {
        return FigureText.value(shown(i));
    }

    @Test
    void valuesHaveTheDigitsTheirErrorDeserves() {
        assertThat(value(0)).isEqualTo("96.371 ± 0.044 °C");
        assertThat(value(1)).isEqualTo("61.25 ± 0.60 °C");
        assertThat(value(2)).isEqualTo("20 °C");
        assertThat(value(3)).isEqualTo("−42.0213 ± 0.0010 W/m");
    }

    @Test
    void verdictsNameTheLimit() {
        assertThat(FigureText.verdict(shown(0))).isEqualTo("≤ 105 °C: met");
        assertThat(FigureText.verdict(shown(1))).isEqualTo("≤ 60 °C: broken");
        assertThat(FigureText.verdict(shown(2))).isEmpty();
    }

    @Test
    void numbersHaveNoNegativeZero() {
        assertThat(FigureText.number(-0.004, 2)).isEqualTo("0.00");
        assertThat(FigureText.number(-12.5, 1)).isEqualTo("−12.5");
        assertThat(FigureText.significant(2500, 2)).isEqualTo("2500");
        assertThat(FigureText.significant(0.050, 2)).isEqualTo("0.05");
    }
}
