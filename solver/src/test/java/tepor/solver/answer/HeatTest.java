package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tepor.mesher.outline.FaultyInputException;
import tepor.solver.CaseText;
import tepor.solver.model.Case;

/** Cases with heat produced in them, and cases that have no answer. */
class HeatTest {
    private static final double ZERO_CELSIUS = 273.15;

    private static String slab(String heat, String more) {
        return """
                format = 1
                title = "slab"
                depth = "2 m"
                [outline]
                unit = "m"
                [[region]]
                name = "slab"
                outline = "POLYGON ((0 0, 0.4 0, 0.4 0.3, 0 0.3, 0 0))"
                material = "steel"
                heat = "HEAT"
                [material.steel]
                k = "50 W/(m.K)"
                """.replace("HEAT", heat) + more;
    }

    private static final String COLD_SIDES = """
            [[edge]]
            name = "sides"
            where = ["left", "right"]
            temperature = "20 degC"
            """;

    /** Plane wall with even heat: T = T₀ + q L²/(8k) in the middle (H. S. Carslaw and J. C. Jaeger, 1959, section 3.14). */
    @ParameterizedTest
    @CsvSource({"1e5 W/m3", "12 kW/m", "24 kW"})
    void peakOfASlabByTheThreeUnitsOfHeat(String heat) {
        Answer answer = CaseText.answer(slab(
                heat,
                COLD_SIDES
                        + "[[ask]]\nname = \"middle\"\npeak = \"slab\"\n[[ask]]\nname = \"out\"\nflow = \"sides\"\n"));
        Map<String, AskAnswer> answers = CaseText.byName(answer);
        assertThat(answers.get("middle").value() - ZERO_CELSIUS).isCloseTo(20 + 1e5 * 0.16 / 400, within(1e-8));
        assertThat(answers.get("middle").where()[0]).isCloseTo(0.2, within(1e-6));
        assertThat(answers.get("out").value()).isCloseTo(12000, within(1e-7));
        assertThat(answer.ledger().rows()).extracting(Ledger.Row::kind).containsExactly("heat", "temperature");
        assertThat(answer.ledger().imbalance()).isLessThan(1e-11);
    }

    @ParameterizedTest
    @CsvSource({"500 W/m2", "150 W/m"})
    void inflowByAreaAndByEdge(String inflow) {
        Answer answer = CaseText.answer("""
                format = 1
                title = "plate"
                [outline]
                unit = "mm"
                [[region]]
                name = "plate"
                outline = "POLYGON ((0 0, 300 0, 300 20, 0 20, 0 0))"
                material = "steel"
                [material.steel]
                k = "50 W/(m.K)"
                [[edge]]
                name = "heated"
                where = "bottom"
                inflow = "INFLOW"
                [[edge]]
                name = "cooled"
                where = "top"
                air = "10 degC"
                film = "25 W/(m2.K)"
                [[ask]]
                name = "hot side"
                mean = "heated"
                """.replace("INFLOW", inflow));
        assertThat(answer.asks().get(0).value() - ZERO_CELSIUS)
                .isCloseTo(10 + 500 / 25.0 + 500 * 0.02 / 50, within(1e-9));
        assertThat(answer.ledger().rows().get(0).in()).isCloseTo(150, within(1e-9));
        assertThat(answer.insulated().byDefault()).isCloseTo(0.04, within(1e-12));
        assertThat(answer.insulated().pieces()).hasSize(2);
    }

    /** Grain at an angle: a strip insulated on both long sides conducts by k_along·k_across/k_normal along itself. */
    @Test
    void directionalConductivity() {
        Answer answer = CaseText.answer("""
                format = 1
                title = "long strip"
                [outline]
                unit = "m"
                [[region]]
                name = "strip"
                outline = "POLYGON ((0 0, 40 0, 40 1, 0 1, 0 0))"
                material = "wood"
                [material.wood]
                k = { along = "0.4 W/(m.K)", across = "0.1 W/(m.K)", angle = "30 deg" }
                [[edge]]
                name = "warm"
                where = "left"
                temperature = "20 degC"
                [[edge]]
                name = "cold"
                where = "right"
                temperature = "0 degC"
                [[ask]]
                name = "T1"
                mean = "line 1"
                [[ask]]
                name = "Q"
                flow = "cold"
                within = "0.01 %"
                [[edge]]
                name = "line 1"
                where = "top"
                """);
        // far from the ends the flow is along x only: q = −(kxx − kxy²/kyy) dT/dx
        double c2 = Math.pow(Math.cos(Math.toRadians(30)), 2);
        double kyy = 0.4 * (1 - c2) + 0.1 * c2;
        double effective = 0.4 * 0.1 / kyy;
        double flow = CaseText.byName(answer).get("Q").value();
        // the ends disturb over about their height on 40 m: a few per cent
        assertThat(flow).isCloseTo(effective * 20 / 40, within(0.02 * flow));
        double alongX = 0.4 * c2 + 0.1 * (1 - c2);
        assertThat(flow).isLessThan(0.9 * alongX * 20 / 40);
    }

    @ParameterizedTest
    @ValueSource(strings = {"linear", "quadratic"})
    void aUniformTemperatureStaysUniformAndNothingFlows(String element) {
        Answer answer = CaseText.answer(slab(
                "0 W/m3",
                COLD_SIDES + "[mesh]\nelement = \"" + element + "\"\n[[ask]]\nname = \"peak\"\npeak = \"slab\"\n"));
        assertThat(answer.asks().get(0).value()).isCloseTo(293.15, within(1e-12));
        assertThat(answer.ledger().imbalance()).isEqualTo(0);
    }

    @Test
    void aPartThatNothingTiesToATemperatureIsNamed() {
        assertThatThrownBy(() -> CaseText.answer(slab(
                                "1 W/m3",
                                COLD_SIDES
                                        + "[[region]]\nname = \"island\"\n"
                                        + "outline = \"POLYGON ((1 0, 2 0, 2 1, 1 1, 1 0))\"\nmaterial = \"steel\"\n"
                                        + "[[ask]]\nname = \"peak\"\npeak = \"slab\"\n")
                        .replace("where = [\"left\", \"right\"]", "where = \"left\"")))
                .isInstanceOf(FaultyInputException.class)
                .hasMessageContaining("'island'")
                .hasMessageContaining("nothing ties")
                .hasMessageContaining("case.toml:");
    }

    @Test
    void aFlowWhereTwoFixedTemperaturesMeetIsRefusedButTemperaturesAreAnswered() {
        String two = slab("0 W/m3", "") + "[[edge]]\nname = \"hot\"\nwhere = \"left\"\ntemperature = \"50 degC\"\n"
                + "[[edge]]\nname = \"cold\"\nwhere = \"bottom\"\ntemperature = \"10 degC\"\n"
                + "[[edge]]\nname = \"both\"\nwhere = [\"left\", \"bottom\"]\n";
        assertThatThrownBy(() -> CaseText.answer(two + "[[ask]]\nname = \"Q\"\nflow = \"hot\"\n"))
                .isInstanceOf(FaultyInputException.class)
                .hasMessageContaining("'hot'")
                .hasMessageContaining("no limit")
                .hasMessageContaining("(0 0) m");
        Answer answer = CaseText.answer(two + "[[ask]]\nname = \"T\"\nat = \"POINT (0.2 0.15)\"\n"
                + "[[ask]]\nname = \"sum\"\nflow = \"both\"\n");
        assertThat(answer.ledger().rows()).extracting(Ledger.Row::dependsOnMesh).contains(true, true);
        assertThat(answer.asks().get(0).meshError().reached()).isTrue();
        assertThat(CaseText.byName(answer).get("sum").value()).isCloseTo(0, within(1e-9));
    }

    @Test
    void aStoppedComputationThrows() {
        Case subject = CaseText.read(slab("1 W/m3", COLD_SIDES + "[[ask]]\nname = \"peak\"\npeak = \"slab\"\n"));
        Progress stop = new Progress() {
            @Override
            public void round(int round, int triangles, double widestRelativeToWithin) {}

            @Override
            public void stage(String what) {}

            @Override
            public boolean stopped() {
                return true;
            }
        };
        assertThatThrownBy(() -> Solver.answer(subject, stop)).isInstanceOf(CancellationException.class);
    }

    @Test
    void oneMeshAloneStatesNoMeshError() {
        Answer answer = CaseText.answer(
                slab("1 W/m3", COLD_SIDES + "[accuracy]\nadapt = false\n[[ask]]\nname = \"peak\"\npeak = \"slab\"\n"));
        assertThat(answer.history()).hasSize(1);
        assertThat(answer.asks().get(0).meshError().high()).isInfinite();
        assertThat(answer.asks().get(0).meshError().reached()).isFalse();
        assertThat(answer.warnings()).extracting(w -> w.code()).contains("mesh-error-unknown");
    }

    @Test
    void theElementLimitEndsTheRoundsAndIsSaid() {
        Answer answer = CaseText.answer(slab(
                "1e5 W/m3",
                COLD_SIDES
                        + "[mesh]\nelement = \"linear\"\nelements_at_most = 3000\n"
                        + "[[ask]]\nname = \"peak\"\npeak = \"slab\"\nwithin = \"1e-6 K\"\n"));
        assertThat(answer.mesh().mesh().triangleCount()).isLessThanOrEqualTo(3000);
        assertThat(answer.asks().get(0).meshError().reached()).isFalse();
        assertThat(answer.warnings()).extracting(w -> w.code()).contains("tolerance-missed");
    }

    @ParameterizedTest
    @CsvSource({"20, 0.1, true", "2, 0.1, false"})
    void aCheckerboardOfConductorsIsWarnedOf(String good, String poor, boolean warned) {
        StringBuilder toml = new StringBuilder("format = 1\ntitle = \"checkerboard\"\n[outline]\nunit = \"m\"\n");
        for (int i = 0; i < 4; i++) {
            int x = i % 2;
            int y = i / 2;
            toml.append(String.format(
                    "[[region]]\nname = \"r%d\"\nmaterial = \"%s\"\noutline = \"POLYGON ((%d %d, %d %d, %d %d, %d %d,"
                            + " %d %d))\"\n",
                    i, x == y ? "good" : "poor", x, y, x + 1, y, x + 1, y + 1, x, y + 1, x, y));
        }
        toml.append("[material.good]\nk = \"" + good + " W/(m.K)\"\n[material.poor]\nk = \"" + poor + " W/(m.K)\"\n"
                + "[[edge]]\nname = \"warm\"\nwhere = \"left\"\ntemperature = \"1 degC\"\n"
                + "[[edge]]\nname = \"cold\"\nwhere = \"right\"\ntemperature = \"0 degC\"\n");
        assertThat(Solver.inspect(CaseText.read(toml.toString()), Progress.NONE).warnings())
                .filteredOn(w -> w.code().equals("checkerboard"))
                .hasSize(warned ? 1 : 0)
                .allMatch(w -> w.what().contains("(1 1) m"));
    }
}
