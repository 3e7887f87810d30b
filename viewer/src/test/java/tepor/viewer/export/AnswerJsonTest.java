package tepor.viewer.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import tepor.solver.answer.Verdict;
import tepor.viewer.BusbarSample;

class AnswerJsonTest {
    private static JsonNode json(BusbarSample sample) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        AnswerJson.write(sample.answer(), out);
        return new ObjectMapper().readTree(out.toString(StandardCharsets.UTF_8));
    }

    @Test
    void saysWhatWasComputedFromWhat() throws IOException {
        JsonNode json = json(new BusbarSample());
        assertThat(json.at("/format").asInt()).isEqualTo(1);
        assertThat(json.at("/case").asText()).isEqualTo("busbar-duct");
        assertThat(json.at("/title").asText()).isEqualTo("Busbar duct in a pump house");
        assertThat(json.at("/tepor").asText()).matches("\\d+\\.\\d+\\.\\d+.*");
        assertThat(json.at("/report/project").asText()).isEqualTo("Pump house 3");
        // printf '%s\n%s\n' FIRST SECOND | sha256sum
        assertThat(json.at("/inputs_sha256").asText())
                .isEqualTo("7a689f7e58428b7b3d257f9750ef83881b07ecc1630f2515e762db9c454009af");
    }

    @Test
    void givesMeshAndSolveFigures() throws IOException {
        JsonNode json = json(new BusbarSample());
        assertThat(json.at("/mesh/element").asText()).isEqualTo("quadratic");
        assertThat(json.at("/mesh/triangles").asInt()).isEqualTo(120);
        assertThat(json.at("/mesh/nodes").asInt()).isEqualTo(273);
        assertThat(json.at("/mesh/smallest_angle_deg").asDouble()).isEqualTo(27, within(1e-9));
        assertThat(json.at("/mesh/smallest_angle_made_deg").asDouble()).isEqualTo(30, within(1e-9));
        assertThat(json.at("/mesh/rounds").asInt()).isEqualTo(2);
        assertThat(json.at("/solve/unknowns").asInt()).isEqualTo(150);
        assertThat(json.at("/solve/seconds_all").asDouble()).isEqualTo(0.31);
    }

    @Test
    void givesAnAnswerInItsUnitWithItsInterval() throws IOException {
        JsonNode peak = json(new BusbarSample()).at("/answers/0");
        assertThat(peak.at("/name").asText()).isEqualTo("hottest bar");
        assertThat(peak.at("/kind").asText()).isEqualTo("peak");
        assertThat(peak.at("/value").asDouble()).isEqualTo(96.37, within(1e-9));
        assertThat(peak.at("/unit").asText()).isEqualTo("degC");
        assertThat(peak.at("/where/0").asDouble()).isEqualTo(0.1);
        assertThat(peak.at("/where/1").asDouble()).isEqualTo(0.06);
        assertThat(peak.at("/mesh_error/low").asDouble()).isEqualTo(-0.05, within(1e-9));
        assertThat(peak.at("/mesh_error/high").asDouble()).isEqualTo(0.05, within(1e-9));
        assertThat(peak.at("/mesh_error/kind").asText()).isEqualTo("estimate");
        assertThat(peak.at("/mesh_error/within").asDouble()).isEqualTo(0.2, within(1e-9));
        assertThat(peak.at("/mesh_error/reached").asBoolean()).isTrue();
        assertThat(peak.at("/interval/0").asDouble()).isEqualTo(96.32, within(1e-9));
        assertThat(peak.at("/interval/1").asDouble()).isEqualTo(96.42, within(1e-9));
        assertThat(peak.at("/confidence").asDouble()).isEqualTo(0.95);
        assertThat(peak.has("for_depth")).isFalse();
        assertThat(peak.has("input_uncertainty")).isFalse();
    }

    @Test
    void givesTheLimitWithMarginAndVerdict() throws IOException {
        JsonNode limit = json(new BusbarSample().verdict(Verdict.UNDECIDED)).at("/answers/0/limit");
        assertThat(limit.at("/relation").asText()).isEqualTo("<=");
        assertThat(limit.at("/value").asDouble()).isEqualTo(105, within(1e-9));
        assertThat(limit.at("/unit").asText()).isEqualTo("degC");
        assertThat(limit.at("/margin").asDouble()).isEqualTo(8.63, within(1e-9));
        assertThat(limit.at("/verdict").asText()).isEqualTo("undecided");
        assertThat(json(new BusbarSample()).at("/answers/1").has("limit")).isFalse();
    }

    @Test
    void givesFlowsForTheDepthToo() throws IOException {
        JsonNode flow = json(new BusbarSample()).at("/answers/1");
        assertThat(flow.at("/positive").asText()).isEqualTo("out");
        assertThat(flow.at("/for_depth/value").asDouble()).isEqualTo(105, within(1e-9));
        assertThat(flow.at("/for_depth/unit").asText()).isEqualTo("W");
        assertThat(flow.at("/hand_check/low").asDouble()).isEqualTo(40, within(1e-9));
        assertThat(flow.at("/hand_check/high").asDouble()).isEqualTo(43.5, within(1e-9));
        assertThat(flow.at("/hand_check/inside").asBoolean()).isTrue();
        assertThat(flow.at("/hand_check/working/1").asText()).isEqualTo("flow < 43.5 W/m");
        assertThat(json(new BusbarSample().withoutDepth()).at("/answers/1").has("for_depth"))
                .isFalse();
    }

    @Test
    void givesLedgerInsulationHistoryAndWarnings() throws IOException {
        JsonNode json = json(new BusbarSample());
        assertThat(json.at("/ledger/unit").asText()).isEqualTo("W/m");
        assertThat(json.at("/ledger/rows/1/name").asText()).isEqualTo("outer skin");
        assertThat(json.at("/ledger/rows/1/kind").asText()).isEqualTo("film");
        assertThat(json.at("/ledger/rows/1/in").asDouble()).isEqualTo(-42);
        assertThat(json.at("/ledger/imbalance").asDouble()).isEqualTo(3.1e-13);
        assertThat(json.at("/insulated/by_default").asDouble()).isEqualTo(0.44);
        assertThat(json.at("/insulated/unit").asText()).isEqualTo("m");
        assertThat(json.at("/insulated/runs/0/length").asDouble()).isEqualTo(0.44, within(1e-9));
        assertThat(json.at("/history/0/answers/0/value").asDouble()).isEqualTo(95.9, within(1e-9));
        assertThat(json.at("/history/0/answers/0/low").isNull()).isTrue();
        assertThat(json.at("/history/1/answers/0/high").asDouble()).isEqualTo(0.05, within(1e-9));
        assertThat(json.at("/warnings/0/code").asText()).isEqualTo("spreads-not-counted");
        assertThat(json.at("/warnings/0/text").asText()).isEqualTo("2 inputs state a spread <b>; nothing to do");
        assertThat(json.at("/warnings/0/line").asInt()).isEqualTo(12);
    }

    @Test
    void turnsWhatIsNotFiniteIntoNull() throws IOException {
        JsonNode json = json(new BusbarSample().error(Double.POSITIVE_INFINITY).imbalance(Double.NaN));
        assertThat(json.at("/answers/0/mesh_error/low").isNull()).isTrue();
        assertThat(json.at("/answers/0/interval/1").isNull()).isTrue();
        assertThat(json.at("/ledger/imbalance").isNull()).isTrue();
    }
}
