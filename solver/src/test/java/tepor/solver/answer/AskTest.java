package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import tepor.solver.CaseText;
import tepor.solver.quantity.Dimension;

/** Every kind of ask on walls whose answer is known in closed form (series resistances, ISO 6946:2017, 6.7.1). */
class AskTest {
    private static final double ZERO_CELSIUS = 273.15;

    /** 0.2 m of 0.5 W/(m·K) inside, 0.1 m of 0.04 outside, 1 m high; room 20 degC and 0.125, outdoors 0 degC and 0.025. */
    private static final String WALL = """
            format = 1
            title = "wall"
            [outline]
            unit = "m"
            [[region]]
            name = "brick"
            outline = "POLYGON ((0.1 0, 0.3 0, 0.3 1, 0.1 1, 0.1 0))"
            material = "brick"
            [[region]]
            name = "foam"
            outline = "POLYGON ((0 0, 0.1 0, 0.1 1, 0 1, 0 0))"
            material = "foam"
            [material.brick]
            k = "0.5 W/(m.K)"
            [material.foam]
            k = "0.04 W/(m.K)"
            [air.room]
            temperature = "20 degC"
            film = "8 W/(m2.K)"
            [air.outdoors]
            temperature = "0 degC"
            [[edge]]
            name = "inner"
            where = "right"
            air = "room"
            [[edge]]
            name = "outer"
            where = "left"
            air = "outdoors"
            resistance = "0.025 m2.K/W"
            """;

    private static final double RESISTANCE = 0.125 + 0.2 / 0.5 + 0.1 / 0.04 + 0.025;
    private static final double FLUX = 20 / RESISTANCE;

    private static AskAnswer ask(String ask) {
        Answer answer = CaseText.answer(WALL + ask);
        assertThat(answer.ledger().imbalance()).isLessThan(1e-12);
        return answer.asks().get(answer.asks().size() - 1);
    }

    private static double celsius(String ask) {
        AskAnswer answer = ask(ask);
        assertThat(answer.dimension()).isEqualTo(Dimension.TEMPERATURE);
        return answer.value() - ZERO_CELSIUS;
    }

    @Test
    void flowThroughAnEdgeAndIntoAnAir() {
        assertThat(ask("[[ask]]\nname = \"Q\"\nflow = \"outer\"\n").value()).isCloseTo(FLUX, within(1e-9));
        assertThat(ask("[[ask]]\nname = \"Q\"\nflow = \"inner\"\n").value()).isCloseTo(-FLUX, within(1e-9));
        assertThat(ask("[[ask]]\nname = \"Q\"\nflow = \"outdoors\"\n").value()).isCloseTo(FLUX, within(1e-9));
    }

    @Test
    void flowBetweenRegionsIsCountedFromTheFirstToTheSecond() {
        String edge = "[[edge]]\nname = \"joint\"\nwhere = { between = [\"%s\", \"%s\"] }\n";
        String ask = "[[ask]]\nname = \"Q\"\nflow = \"joint\"\n";
        assertThat(ask(String.format(edge, "brick", "foam") + ask).value()).isCloseTo(FLUX, within(1e-9));
        assertThat(ask(String.format(edge, "foam", "brick") + ask).value()).isCloseTo(-FLUX, within(1e-9));
    }

    @Test
    void flowThroughAPartOfAnInterfaceIsCountedFromLeftToRightOfTheDrawnLine() {
        String edge = "[[edge]]\nname = \"part\"\nwhere = { line = \"LINESTRING (0.1 %s, 0.1 %s)\" }\n";
        String ask = "[[ask]]\nname = \"Q\"\nflow = \"part\"\n";
        // drawn upwards, left is the foam: heat comes from the right
        assertThat(ask(String.format(edge, "0.25", "0.65") + ask).value()).isCloseTo(-0.4 * FLUX, within(1e-9));
        assertThat(ask(String.format(edge, "0.65", "0.25") + ask).value()).isCloseTo(0.4 * FLUX, within(1e-9));
    }

    @Test
    void temperaturesAtPointsAndOverRegionsAndEdges() {
        double joint = FLUX * (0.025 + 2.5);
        double inner = 20 - FLUX * 0.125;
        double outer = FLUX * 0.025;
        assertThat(celsius("[[ask]]\nname = \"T\"\nat = \"POINT (0.1 0.3)\"\n")).isCloseTo(joint, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\nat = \"POINT (0.2 0.77)\"\n"))
                .isCloseTo((joint + inner) / 2, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\npeak = \"everything\"\n")).isCloseTo(inner, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\npeak = \"foam\"\n")).isCloseTo(joint, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\nlowest = \"brick\"\n")).isCloseTo(joint, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\nlowest = \"outer\"\n")).isCloseTo(outer, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\nmean = \"foam\"\n")).isCloseTo((outer + joint) / 2, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\nmean = \"inner\"\n")).isCloseTo(inner, within(1e-9));
        assertThat(celsius("[[ask]]\nname = \"T\"\nmean = \"everything\"\n"))
                .isCloseTo((0.1 * (outer + joint) / 2 + 0.2 * (joint + inner) / 2) / 0.3, within(1e-9));
    }

    @Test
    void couplingTransmittanceAndFactor() {
        AskAnswer coupling = ask("[[ask]]\nname = \"L\"\ncoupling = [\"room\", \"outdoors\"]\n");
        assertThat(coupling.value()).isCloseTo(1 / RESISTANCE, within(1e-12));
        assertThat(coupling.dimension()).isEqualTo(Dimension.COUPLING);
        assertThat(ask("[[ask]]\nname = \"psi\"\ntransmittance = [\"room\", \"outdoors\"]\n"
                                + "less = [{ u = \"0.3 W/(m2.K)\", length = \"0.6 m\" }, { u = \"0.1 W/(m2.K)\","
                                + " length = \"50 cm\" }]\n")
                        .value())
                .isCloseTo(1 / RESISTANCE - 0.18 - 0.05, within(1e-12));
        AskAnswer factor = ask("[[ask]]\nname = \"f\"\nfactor = \"inner\"\ninner = \"room\"\nouter = \"outdoors\"\n");
        assertThat(factor.value()).isCloseTo(1 - 0.125 / RESISTANCE, within(1e-12));
        assertThat(factor.dimension()).isEqualTo(Dimension.NUMBER);
    }

    @Test
    void withOtherValuesForOneAskOnly() {
        Answer answer = CaseText.answer(WALL
                + "[[ask]]\nname = \"as stated\"\nflow = \"outer\"\n"
                + "[[ask]]\nname = \"other\"\nflow = \"outer\"\n"
                + "with = { \"edge.outer.resistance\" = \"0.1 m2.K/W\", \"air.room.temperature\" = \"30 degC\" }\n"
                + "[[ask]]\nname = \"change\"\ndifference = [\"other\", \"as stated\"]\n");
        Map<String, AskAnswer> answers = CaseText.byName(answer);
        double other = 30 / (RESISTANCE + 0.075);
        assertThat(answers.get("as stated").value()).isCloseTo(FLUX, within(1e-9));
        assertThat(answers.get("other").value()).isCloseTo(other, within(1e-9));
        assertThat(answers.get("change").value()).isCloseTo(other - FLUX, within(1e-9));
        assertThat(answer.ledger().rows()).extracting(Ledger.Row::name).containsExactly("inner", "outer");
        assertThat(answer.ledger().rows().get(0).in()).isCloseTo(FLUX, within(1e-9));
    }

    @Test
    void limitsAreBrokenOrUndecidedWhileSpreadsDoNotCount() {
        assertThat(ask("[[ask]]\nname = \"T\"\npeak = \"inner\"\nlimit = \"<= 19 degC\"\n")
                        .verdict())
                .isEqualTo(Verdict.BROKEN);
        assertThat(ask("[[ask]]\nname = \"T\"\npeak = \"inner\"\nlimit = \"<= 30 degC\"\n")
                        .verdict())
                .isEqualTo(Verdict.UNDECIDED);
        assertThat(ask("[[ask]]\nname = \"T\"\nlowest = \"inner\"\nlimit = \">= 19.5 degC\"\n")
                        .verdict())
                .isEqualTo(Verdict.BROKEN);
        assertThat(ask("[[ask]]\nname = \"T\"\nlowest = \"inner\"\n").verdict()).isNull();
    }

    @Test
    void handCheckStandsBesideTheFlow() {
        HandCheck check = ask("[[ask]]\nname = \"Q\"\nflow = \"outer\"\n").handCheck();
        assertThat(check.low()).isCloseTo(FLUX, within(1e-9));
        assertThat(check.high()).isCloseTo(FLUX, within(1e-9));
        assertThat(check.inside()).isTrue();
        assertThat(check.working()).isNotEmpty();
    }
}
