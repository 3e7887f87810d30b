package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Map;
import org.junit.jupiter.api.Test;
import tepor.mesher.outline.FaultyInputException;
import tepor.solver.CaseText;

/** Flows and temperatures on lines through the inside of regions; exact values from one-dimensional conduction. */
class CutTest {
    private static final String SLAB = """
            format = 1
            [outline]
            unit = "mm"
            [[region]]
            name = "slab"
            outline = "POLYGON ((0 0, 200 0, 200 100, 0 100, 0 0))"
            material = "concrete"
            [material.concrete]
            k = "2 W/(m.K)"
            [[edge]]
            name = "warm"
            where = "left"
            temperature = "20 degC"
            [[edge]]
            name = "cold"
            where = "right"
            temperature = "0 degC"
            """;

    private static double value(Map<String, AskAnswer> answers, String name) {
        return answers.get(name).value();
    }

    @Test
    void theFlowThroughAPartOfASlabIsItsShare() {
        var answers = CaseText.byName(CaseText.answer(SLAB + """
                [[edge]]
                name = "whole"
                where = { cut = "LINESTRING (70 -10, 90 110)" }
                [[edge]]
                name = "part"
                where = { cut = "LINESTRING (40 20, 60 50)" }
                [[edge]]
                name = "back"
                where = { cut = "LINESTRING (120 80, 120 30)" }
                [[ask]]
                name = "whole"
                flow = "whole"
                [[ask]]
                name = "part"
                flow = "part"
                [[ask]]
                name = "back"
                flow = "back"
                [[ask]]
                name = "mean"
                mean = "back"
                """));
        // 2 W/(m.K) · 20 K / 0.2 m = 200 W/m2 through each height.
        // A line drawn upwards has the cold end on its right: heat flows from its left to its right.
        assertThat(value(answers, "whole")).isCloseTo(20, within(1e-9));
        assertThat(value(answers, "part")).isCloseTo(6, within(1e-9));
        assertThat(value(answers, "back")).isCloseTo(-10, within(1e-9));
        assertThat(value(answers, "mean")).isCloseTo(281.15, within(1e-9));
    }

    @Test
    void aClosedCutAboutASourceTakesAllItsHeat() {
        var answers = CaseText.byName(CaseText.answer("""
                format = 1
                [outline]
                unit = "mm"
                [[region]]
                name = "resin"
                outline = "POLYGON ((0 0, 200 0, 200 120, 0 120, 0 0))"
                material = "resin"
                [[region]]
                name = "bar"
                outline = "CURVEPOLYGON (CIRCULARSTRING (70 60, 50 80, 30 60, 50 40, 70 60))"
                material = "copper"
                heat = "42 W/m"
                [material.resin]
                k = "0.65 W/(m.K)"
                [material.copper]
                k = "380 W/(m.K)"
                [[edge]]
                name = "skin"
                where = "outside"
                film = "8 W/(m2.K)"
                air = "20 degC"
                [[edge]]
                name = "round"
                where = { cut = "CIRCULARSTRING (80 60, 50 90, 20 60, 50 30, 80 60)" }
                [[edge]]
                name = "across"
                where = { cut = "LINESTRING (50 -1, 50 121)" }
                [[ask]]
                name = "round"
                flow = "round"
                [[ask]]
                name = "across"
                flow = "across"
                """));
        // The circle runs counter-clockwise, so that its right is outside.
        assertThat(value(answers, "round")).isCloseTo(42, within(1e-7));
        assertThat(value(answers, "across")).isBetween(-5.0, 20.0);
    }

    @Test
    void noConditionHoldsOnACut() {
        assertThatThrownBy(() -> CaseText.read(SLAB + """
                        [[edge]]
                        name = "saw"
                        where = { cut = "LINESTRING (50 -1, 50 121)" }
                        temperature = "20 degC"
                        [[ask]]
                        name = "mean"
                        mean = "slab"
                        """))
                .isInstanceOf(FaultyInputException.class)
                .hasMessageContaining("a cut through region 'slab', where temperature cannot hold");
    }

    @Test
    void aCutThatMissesTheSectionIsAnError() {
        assertThatThrownBy(() -> CaseText.read(SLAB + """
                        [[edge]]
                        name = "saw"
                        where = { cut = "LINESTRING (300 -1, 300 121)" }
                        [[ask]]
                        name = "flow"
                        flow = "saw"
                        """))
                .isInstanceOf(FaultyInputException.class)
                .hasMessageContaining("runs through no region");
    }
}
