package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.outline.FaultyInputException;
import tepor.solver.CaseText;

/** Flows through interfaces balance with all others, in the nodes where they meet fixed temperatures and each other. */
class FlowBalanceTest {
    private static final String HEAD = """
            format = 1
            title = "balance"
            [outline]
            unit = "m"
            [material.poor]
            k = "1 W/(m.K)"
            [material.good]
            k = "10 W/(m.K)"
            """;

    private static String region(String name, String ring, String material) {
        return "[[region]]\nname = \"" + name + "\"\noutline = \"POLYGON (" + ring + ")\"\nmaterial = \"" + material
                + "\"\n";
    }

    private static String edge(String name, String where, String condition) {
        return "[[edge]]\nname = \"" + name + "\"\nwhere = " + where + "\n" + condition + "\n";
    }

    private static String flow(String... names) {
        StringBuilder asks = new StringBuilder();
        for (String name : names) {
            asks.append("[[ask]]\nname = \"" + name + "\"\nflow = \"" + name + "\"\n");
        }
        return asks.toString();
    }

    private static double flow(Map<String, AskAnswer> answers, String name) {
        return answers.get(name).value();
    }

    @ParameterizedTest
    @ValueSource(strings = {"linear", "quadratic"})
    void theLedgerClosesWhereASlantedInterfaceMeetsAFixedTemperature(String element) {
        Answer answer = CaseText.answer(HEAD
                + region("a", "(0 0, 1 0, 1 0.5, 0 0.2, 0 0)", "poor")
                + region("b", "(0 0.2, 1 0.5, 1 1, 0 1, 0 0.2)", "good")
                + edge("plate", "[\"left\", \"top\"]", "temperature = \"0 degC\"")
                + edge("hot", "{ line = \"LINESTRING (1 0, 1 0.3)\" }", "air = \"20 degC\"\nfilm = \"10 W/(m2.K)\"")
                + "[mesh]\nelement = \"" + element + "\"\n[accuracy]\nadapt = false\n");
        assertThat(answer.ledger().imbalance()).isLessThan(1e-11);
    }

    @Test
    void whatLeavesARegionEntersItsNeighboursWhereThreeMeet() {
        Map<String, AskAnswer> answers = CaseText.byName(CaseText.answer(HEAD
                + region("a", "(0 0, 1 0, 1.2 1, 0.8 2, 0 2, 0 0)", "poor")
                + region("b", "(1 0, 2 0, 2 0.7, 1.2 1, 1 0)", "good")
                + region("c", "(1.2 1, 2 0.7, 2 2, 0.8 2, 1.2 1)", "poor")
                + edge("warm", "\"left\"", "air = \"20 degC\"\nfilm = \"5 W/(m2.K)\"")
                + edge("cold", "\"right\"", "temperature = \"0 degC\"")
                + edge("a to b", "{ between = [\"a\", \"b\"] }", "")
                + edge("a to c", "{ between = [\"a\", \"c\"] }", "")
                + edge("c to a", "{ between = [\"c\", \"a\"] }", "")
                + edge("b to c", "{ between = [\"b\", \"c\"] }", "")
                + edge("out of b", "{ line = \"LINESTRING (2 0, 2 0.7)\" }", "")
                + flow("warm", "cold", "a to b", "a to c", "c to a", "b to c", "out of b")
                + "[accuracy]\nadapt = false\n"));
        double through = flow(answers, "cold");
        assertThat(through).isGreaterThan(1);
        assertThat(flow(answers, "warm")).isCloseTo(-through, within(1e-10));
        assertThat(flow(answers, "a to b") + flow(answers, "a to c")).isCloseTo(through, within(1e-10));
        assertThat(flow(answers, "c to a")).isCloseTo(-flow(answers, "a to c"), within(1e-10));
        assertThat(flow(answers, "a to b"))
                .isCloseTo(flow(answers, "b to c") + flow(answers, "out of b"), within(1e-10));
    }

    @Test
    void whereTwoFixedTemperaturesMeetOnlyFlowsThatTurnAsOftenBothWaysHaveALimit() {
        String corner = HEAD
                + region("a", "(0 0, 1 0, 1 1, 0 1, 0 0)", "poor")
                + region("b", "(0 0, 1 0, 1 1, 0 0)", "good")
                + edge("hot", "\"left\"", "temperature = \"1 degC\"")
                + edge("cold", "\"bottom\"", "temperature = \"0 degC\"")
                + edge("joint", "{ between = [\"a\", \"b\"] }", "")
                + edge("around b", "{ of = \"b\" }", "")
                + "[accuracy]\nadapt = false\n";
        assertThatThrownBy(() -> CaseText.answer(corner + flow("joint")))
                .isInstanceOf(FaultyInputException.class)
                .hasMessageContaining("'joint'")
                .hasMessageContaining("no limit");
        Answer answer = CaseText.answer(corner + flow("around b"));
        assertThat(answer.asks().get(0).value()).isCloseTo(0, within(1e-10));
        assertThat(answer.ledger().imbalance()).isLessThan(1e-11);
    }

    @Test
    void aMeshErrorThatIsNotKnownDoesNotExcuseALeftBracket() {
        String tube = HEAD
                + region("tube", CaseText.ring(0, 0, 1, 180), "poor")
                + region("bore", CaseText.ring(0, 0, 0.4, 180), "nothing")
                + edge("inner", "\"holes\"", "temperature = \"1 degC\"")
                + edge("outer", "\"outside\"", "temperature = \"0 degC\"")
                + "[mesh]\nelement = \"linear\"\n[accuracy]\nadapt = false\n"
                + flow("outer");
        AskAnswer answer = CaseText.answer(tube).asks().get(0);
        // linear triangles conduct too well: their temperature is not the one of least energy
        assertThat(answer.value()).isGreaterThan(answer.handCheck().high());
        assertThat(answer.handCheck().inside()).isFalse();
    }
}
