package tepor.viewer.wording;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import tepor.mesher.section.EdgePieces;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Verdict;
import tepor.solver.model.Ask;
import tepor.solver.model.Edge;
import tepor.solver.model.Target;
import tepor.viewer.BusbarSample;

class WordsTest {
    private static String verdict(BusbarSample sample) {
        Answer answer = sample.answer();
        return new VerdictWords(answer.subject())
                .of(ShownAnswer.of(answer.asks().get(0), answer.subject()));
    }

    @Test
    void aVerdictIsSaidWithWhatItRestsOn() {
        assertThat(verdict(new BusbarSample())).isEqualTo("met, by 8.630 K; 6 inputs taken as exact");
        assertThat(verdict(new BusbarSample().verdict(Verdict.BROKEN))).startsWith("broken, by ");
        assertThat(verdict(new BusbarSample().verdict(Verdict.BROKEN).error(9)))
                .endsWith(", less than the mesh error; 6 inputs taken as exact");
        assertThat(verdict(new BusbarSample().verdict(Verdict.UNDECIDED)))
                .isEqualTo("undecided: kept by 8.630 K at the stated values, but the spreads of 2 of 6 inputs are not "
                        + "counted yet");
        assertThat(verdict(new BusbarSample().verdict(Verdict.UNDECIDED).error(9)))
                .isEqualTo("undecided: the limit lies within the mesh interval");
        assertThat(verdict(new BusbarSample().verdict(null))).isEmpty();
    }

    @Test
    void aRunOfBoundaryIsNamedByItsEnds() {
        Answer answer = new BusbarSample().answer();
        List<InsulatedRun> runs =
                InsulatedRun.of(answer.insulated(), answer.subject().section());
        assertThat(runs).hasSize(1);
        assertThat(runs.get(0).words(answer.subject().unit())).isEqualTo("440 mm from (0 120) mm to (200 120) mm");
    }

    @Test
    void aFlowOnAnInterfaceSaysFromWhereToWhere() {
        var section = new BusbarSample().subject().section();
        int[] border = java.util.stream.IntStream.range(0, section.segmentCount())
                .filter(s -> !section.isBoundary(s))
                .toArray();
        int[] signs = java.util.Arrays.stream(border)
                .map(s -> section.left(s) == 1 ? 1 : -1)
                .toArray();
        Edge edge = new Edge("border", new EdgePieces(border, signs), List.of(), "", null);
        Ask.Flow ask = new Ask.Flow(null, new Target.OfEdge(edge));
        assertThat(FlowDirection.words(ask, section)).isEqualTo("from bars to resin");
    }

    @Test
    void unitsArePrintedAsTheTradePrintsThem() {
        assertThat(UnitWords.pretty("8 W/(m2.K) ± 20 %")).isEqualTo("8 W/(m²·K) ± 20 %");
        assertThat(UnitWords.pretty("<= 105.5 degC")).isEqualTo("≤ 105.5 °C");
        assertThat(UnitWords.pretty("1.2e6 W/m3")).isEqualTo("1.2e6 W/m³");
        assertThat(UnitWords.after("")).isEmpty();
    }
}
