package tepor.viewer.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import tepor.viewer.BusbarSample;

class InspectionJsonTest {
    @Test
    void givesAreaRegionsEdgesInsulationAndMesh() throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        InspectionJson.write(new BusbarSample().inspection(), out);
        JsonNode json = new ObjectMapper().readTree(out.toString(StandardCharsets.UTF_8));
        assertThat(json.at("/area").asDouble()).isEqualTo(0.2 * 0.12, within(1e-12));
        assertThat(json.at("/regions/1/name").asText()).isEqualTo("bars");
        assertThat(json.at("/regions/1/area").asDouble()).isEqualTo(0.04 * 0.04, within(1e-12));
        assertThat(json.at("/regions/1/material").asText()).isEqualTo("copper");
        assertThat(json.at("/edges/0/name").asText()).isEqualTo("outer skin");
        assertThat(json.at("/edges/0/length").asDouble()).isEqualTo(0.2, within(1e-12));
        assertThat(json.at("/edges/0/conditions/0/kind").asText()).isEqualTo("film");
        assertThat(json.at("/insulated/by_default").asDouble()).isEqualTo(0.44);
        assertThat(json.at("/mesh/triangles").asInt()).isEqualTo(120);
        assertThat(json.at("/mesh/refused/imposed_by_outline").asInt()).isEqualTo(1);
        assertThat(json.at("/mesh/refused/element_limit").asInt()).isZero();
        assertThat(json.at("/mesh/seconds").asDouble()).isEqualTo(0.04);
    }
}
