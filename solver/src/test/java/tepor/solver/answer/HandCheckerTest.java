package tepor.solver.answer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tepor.solver.answer.CheckedCase.box;
import static tepor.solver.answer.CheckedCase.material;
import static tepor.solver.answer.CheckedCase.region;

import java.nio.file.Path;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Strips and planes. */
class HandCheckerTest {
    @TempDir
    Path folder;

    private Optional<HandCheck> check(String text, double computed) {
        return new CheckedCase(folder).check(text, computed);
    }

    private static final String WALL = "[outline]\nunit = \"mm\"\n"
            + region("concrete", box(0, 0, 200, 1000))
            + region("wool", box(200, 0, 320, 1000))
            + material("concrete", 1.35)
            + material("wool", 0.04)
            + """
            [air.room]
            temperature = "20 degC"
            film = "8 W/(m2.K)"
            [air.outdoors]
            temperature = "-5 degC"
            [[edge]]
            name = "inner"
            where = "left"
            air = "room"
            [[edge]]
            name = "outer"
            where = "right"
            resistance = "0.04 m2.K/W"
            air = "outdoors"
            """;

    /** Resistances in series (ISO 6946:2017, 6.7.1): both bounds are the closed form. */
    @Test
    void aLayeredWallLeavesNothingOpen() {
        double flow = 25 / (1 / 8.0 + 0.2 / 1.35 + 0.12 / 0.04 + 0.04);
        HandCheck out =
                check(WALL + "[[ask]]\nname = \"a\"\nflow = \"outer\"\n", flow).orElseThrow();
        assertThat(out.low()).isCloseTo(flow, within(1e-12));
        assertThat(out.high()).isCloseTo(flow, within(1e-12));
        assertThat(out.inside()).isTrue();
        HandCheck in =
                check(WALL + "[[ask]]\nname = \"a\"\nflow = \"room\"\n", flow).orElseThrow();
        assertThat(in.low()).isCloseTo(-flow, within(1e-12));
        assertThat(in.inside()).isFalse();
        assertThat(String.join("\n", out.working()))
                .contains("between room and outdoors")
                .contains("20 degC and -5 degC")
                .contains("strip y = 0 to 1000 mm: R = 1/8 W/(m2.K) + 0.2 m/1.35 W/(m.K) (concrete)"
                        + " + 0.12 m/0.04 W/(m.K) (wool) + 1/25 W/(m2.K) = 3.31315 m2.K/W")
                .contains("times 25 K, out of the section");
    }

    @Test
    void aCouplingIsBracketedLikewise() {
        double conductance = 1 / (1 / 8.0 + 0.2 / 1.35 + 0.12 / 0.04 + 0.04);
        HandCheck check = check(WALL + "[[ask]]\nname = \"a\"\ncoupling = [\"outdoors\", \"room\"]\n", conductance)
                .orElseThrow();
        assertThat(check.low()).isCloseTo(conductance, within(1e-13));
        assertThat(check.high()).isCloseTo(conductance, within(1e-13));
        assertThat(check.inside()).isTrue();
    }

    /** Upper and lower limit of a component with a stud, by the formulas of ISO 6946:2017, 6.7.2, worked by hand. */
    @Test
    void aStudGivesTheTwoLimitsOfTheCombinedMethod() {
        String text = WALL
                + region("stud", box(200, 300, 320, 400))
                + material("stud", 0.13)
                + "[[ask]]\nname = \"a\"\nflow = \"outer\"\n";
        double wool = 1 / 8.0 + 0.2 / 1.35 + 0.12 / 0.04 + 0.04;
        double stud = 1 / 8.0 + 0.2 / 1.35 + 0.12 / 0.13 + 0.04;
        double low = 25 * (0.9 / wool + 0.1 / stud);
        double high = 25 / (1 / 8.0 + 0.2 / 1.35 + 1 / (0.9 * 0.04 / 0.12 + 0.1 * 0.13 / 0.12) + 0.04);
        HandCheck check = check(text, 0.5 * (low + high)).orElseThrow();
        assertThat(check.low()).isCloseTo(low, within(1e-12));
        assertThat(check.high()).isCloseTo(high, within(1e-12));
        assertThat(check.inside()).isTrue();
        assertThat(String.join("\n", check.working())).contains("strip y = 0 to 300 mm, 400 to 1000 mm");
    }

    /**
     * ISO 10211:2017, annex C, test case 2 (geometry from memory, confirmed by its nine published temperatures): 9.4914 W/m
     * by an independent finite-element computation with graded high orders; 9.5 published.
     */
    @Test
    void thePublishedSecondTestCaseLiesInside() {
        String text = "[outline]\nunit = \"mm\"\n"
                + region("insulation", box(0, 0, 500, 41.5))
                + region("concrete", box(0, 41.5, 500, 47.5))
                + region("wood", box(0, 36.5, 15, 41.5))
                + region("aluminium", "POLYGON ((0 0, 500 0, 500 1.5, 1.5 1.5, 1.5 35, 15 35, 15 36.5, 0 36.5, 0 0))")
                + material("insulation", 0.029)
                + material("concrete", 1.15)
                + material("wood", 0.12)
                + material("aluminium", 230)
                + """
                [air.outside]
                temperature = "0 degC"
                [air.inside]
                temperature = "20 degC"
                [[edge]]
                name = "upper"
                where = "top"
                resistance = "0.06 m2.K/W"
                air = "outside"
                [[edge]]
                name = "lower"
                where = "bottom"
                resistance = "0.11 m2.K/W"
                air = "inside"
                [[ask]]
                name = "a"
                flow = "upper"
                """;
        HandCheck check = check(text, 9.49144778).orElseThrow();
        assertThat(check.inside()).isTrue();
        // Strips by hand: aluminium web, flange and wood, insulation; see the working.
        double films = 0.06 + 0.11;
        double web = films + 0.006 / 1.15 + 0.005 / 0.12 + 0.0365 / 230;
        double flange = films + 0.006 / 1.15 + 0.005 / 0.12 + 0.003 / 230 + 0.0335 / 0.029;
        double plain = films + 0.006 / 1.15 + 0.0015 / 230 + 0.04 / 0.029;
        assertThat(check.low()).isCloseTo(20 * (0.0015 / web + 0.0135 / flange + 0.485 / plain), within(1e-10));
        assertThat(check.high()).isBetween(9.49144778, 40.0);
    }

    /** A square cut by its diagonal: R and ∫k run linearly, so that both bounds are a logarithm. */
    @Test
    void anObliqueBorderIsIntegratedExactly() {
        String text = "[outline]\nunit = \"m\"\n"
                + region("a", "POLYGON ((0 0, 1 0, 1 1, 0 0))")
                + region("b", "POLYGON ((0 0, 1 1, 0 1, 0 0))")
                + material("a", 1)
                + material("b", 3)
                + fixed("bottom", 0, "top", 10)
                + "[[ask]]\nname = \"a\"\nflow = \"bottom\"\n";
        HandCheck check = check(text, 19).orElseThrow();
        assertThat(check.low()).isCloseTo(10 * Math.log(1 / (1 / 3.0)) / (1 - 1 / 3.0), within(1e-11));
        assertThat(check.high()).isCloseTo(10 * 2 / Math.log(3), within(1e-11));
    }

    private static String fixed(String first, double firstDegC, String second, double secondDegC) {
        return "[[edge]]\nname = \"" + first + "\"\nwhere = \"" + first + "\"\ntemperature = \"" + firstDegC
                + " degC\"\n[[edge]]\nname = \"" + second + "\"\nwhere = \"" + second + "\"\ntemperature = \""
                + secondDegC + " degC\"\n";
    }

    /** A tensor at an angle: K_yy above, 1/(K⁻¹)_yy below. */
    @Test
    void aDirectionalConductivityAtAnAngle() {
        String text = "[outline]\nunit = \"m\"\n"
                + region("wood", box(0, 0, 1, 1))
                + "[material.wood]\nk = { along = \"0.4 W/(m.K)\", across = \"0.1 W/(m.K)\", angle = \"30 deg\" }\n"
                + fixed("bottom", 0, "top", 1)
                + "[[ask]]\nname = \"a\"\nflow = \"bottom\"\n";
        HandCheck check = check(text, 0.16).orElseThrow();
        assertThat(check.low()).isCloseTo(1 / (0.25 / 0.4 + 0.75 / 0.1), within(1e-13));
        assertThat(check.high()).isCloseTo(0.25 * 0.4 + 0.75 * 0.1, within(1e-13));
    }

    @Test
    void aHoleStopsItsStrips() {
        String text = "[outline]\nunit = \"m\"\n"
                + region("a", box(0, 0, 1, 1))
                + "[[region]]\nname = \"void\"\nmaterial = \"nothing\"\noutline = \"" + box(0.2, 0.4, 0.5, 0.6) + "\"\n"
                + material("a", 2)
                + fixed("bottom", 0, "top", 1)
                + "[[ask]]\nname = \"a\"\nflow = \"bottom\"\n";
        HandCheck check = check(text, 1.5).orElseThrow();
        assertThat(check.low()).isCloseTo(2 * 0.7, within(1e-12));
        assertThat(check.high()).isCloseTo(2 / (0.8 + 0.2 / 0.7), within(1e-12));
        assertThat(check.inside()).isTrue();
    }

    /** A slab through a wall: the inner air is not on one side alone, but all of it lies beyond the wall. */
    @Test
    void aSlabThroughAWallIsBracketed() {
        String text = "[outline]\nunit = \"mm\"\n"
                + region("wool", box(0, 0, 100, 1200))
                + region("brick", box(100, 0, 300, 1200))
                + region("slab", box(-500, 500, 1300, 700))
                + material("wool", 0.04)
                + material("brick", 0.8)
                + material("slab", 2)
                + """
                [air.room]
                temperature = "20 degC"
                film = "7.7 W/(m2.K)"
                [air.outdoors]
                temperature = "-5 degC"
                film = "25 W/(m2.K)"
                [[edge]]
                name = "inner"
                where = [ { line = "LINESTRING (300 0, 300 500, 1300 500)" }, { line = "LINESTRING (1300 700, 300 700, 300 1200)" } ]
                air = "room"
                [[edge]]
                name = "outer"
                where = [ { line = "LINESTRING (0 0, 0 500, -500 500, -500 700, 0 700, 0 1200)" } ]
                air = "outdoors"
                [[ask]]
                name = "a"
                coupling = ["room", "outdoors"]
                """;
        HandCheck check = check(text, 0.9).orElseThrow();
        double wall = 1 / (1 / 7.7 + 0.1 / 0.04 + 0.2 / 0.8 + 0.04);
        assertThat(check.low()).isCloseTo(wall, within(1e-12));
        double layers = 0.1 / (1.0 * 0.04 + 0.2 * 2) + 0.2 / (1.0 * 0.8 + 0.2 * 2);
        assertThat(check.high()).isCloseTo(1 / (1 / (7.7 * 3.0) + layers + 1 / (25 * 2.2)), within(1e-12));
    }

    @Test
    void isLeftOutWhereHeatFlowsOtherwise() {
        String ask = "[[ask]]\nname = \"a\"\nflow = \"outer\"\n";
        assertThat(check(WALL.replace("material = \"wool\"\n", "material = \"wool\"\nheat = \"5 W/m\"\n") + ask, 1))
                .isEmpty();
        String third = "[[edge]]\nname = \"third\"\nwhere = \"top\"\ntemperature = \"7 degC\"\n";
        assertThat(check(WALL + third + ask, 1)).isEmpty();
        String inflow = "[[edge]]\nname = \"third\"\nwhere = \"top\"\ninflow = \"7 W/m2\"\n";
        assertThat(check(WALL + inflow + ask, 1)).isEmpty();
        assertThat(check(WALL + "[[ask]]\nname = \"a\"\npeak = \"wool\"\n", 1)).isEmpty();
        String part = WALL.replace("where = \"right\"", "where = { line = \"LINESTRING (320 0, 320 400)\" }")
                + "[[edge]]\nname = \"more\"\nwhere = { line = \"LINESTRING (320 400, 320 1000)\" }\n"
                + "resistance = \"0.04 m2.K/W\"\nair = \"outdoors\"\n";
        assertThat(check(part + ask, 1)).isEmpty();
        assertThat(check(part + "[[ask]]\nname = \"a\"\nflow = \"outdoors\"\n", 1))
                .isPresent();
        String half = WALL.replace("where = \"left\"", "where = { line = \"LINESTRING (0 0, 0 400)\" }")
                + "[[edge]]\nname = \"more\"\nwhere = { line = \"LINESTRING (0 400, 0 1000)\" }\nair = \"room\"\n";
        assertThat(check(half + "[[ask]]\nname = \"a\"\nflow = \"inner\"\n", 1)).isEmpty();
        String alike = WALL.replace("-5 degC", "20 degC");
        assertThat(check(alike + ask, 0)).isEmpty();
    }

    /** With heat off, a coupling does not mind what is produced. */
    @Test
    void aCouplingIsAskedWithHeatOff() {
        String heated = WALL.replace("material = \"wool\"\n", "material = \"wool\"\nheat = \"5 W/m\"\n");
        assertThat(check(heated + "[[ask]]\nname = \"a\"\ncoupling = [\"room\", \"outdoors\"]\n", 0.3))
                .isPresent();
    }
}
