package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tepor.mesher.outline.Finding;

/** One thing wrong at a time in asks and the mesh; « marks where the error is to be. */
class FaultyAskAndMeshTest {
    private static final String HOT = "peak = 'bar'";
    private static final String FACTOR = "factor = 'skin'\ninner = 'room'\nouter = 'cellar'";

    @TempDir
    Path temp;

    static Stream<Arguments> kinds() {
        return Stream.of(
                fault(
                        "[[ask]]\nname = 'hot'\n",
                        "«[[ask]]\nname = 'hot'\n#",
                        "ask 'hot' does not say what is asked",
                        "peak"),
                fault("[[ask]]\nname = 'hot'", "«[[ask]]", "has no 'name'", "name ="),
                fault(HOT, "peak = 'bar'\n«mean = 'bar'", "asks peak and mean;exactly one", "each"),
                fault(HOT, "«peek = 'bar'\nat = 'POINT (1 1)'", "unknown key 'peek' in [[ask]]", "'peak'"),
                fault(
                        HOT,
                        "peak = 'bar'\n[[ask]]\n«name = 'hot'\nlowest = 'bar'",
                        "'hot' is taken: an ask;:40:1",
                        "another"),
                fault(
                        HOT,
                        "peak = 'bar'\n«less = []",
                        "'less' stands in ask 'hot', which asks peak;transmittance",
                        "leave it out"),
                fault(HOT, "peak = 'bar'\n«inner = 'room'", "'inner';factor", "leave it out"),
                fault(HOT, "«largest = 'region.bar.heat'", "'largest' in [[ask]];does not do it yet", "several values"),
                fault(HOT, "«smallest = 'material.steel.k'", "'smallest';does not do it yet", "several values"),
                fault(HOT, "peak = 'bar'\n«keeps = 'hot'", "'keeps';does not do it yet", "several values"),
                fault(HOT, "peak = 'bar'\n«in = 'plate'", "'in';does not do it yet", "leave it out"));
    }

    static Stream<Arguments> targets() {
        return Stream.of(
                fault(HOT, "«peak = 'bra'", "'peak' of ask 'hot' names 'bra'", "did you mean 'bar'"),
                fault(HOT, "«peak = 'room'", "'room', which is an air;a region or an edge", "name an edge"),
                fault(HOT, "«lowest = 'void'", "'void', which is of nothing", "{ of = \"void\" }"),
                fault(HOT, "«mean = 4", "number 4;text", "quotes"),
                fault(HOT, "«flow = 'bar'", "'bar', which is a region", "where = { of = \"bar\" }"),
                fault(HOT, "«flow = 'skim'", "'skim'", "'skin'"),
                fault(HOT, "«flow = 5", "number 5", "quotes"),
                fault(HOT, "«at = 'POINT (110 10)'", "(110 10) mm, lies off the section by 10 mm", "(100 10) mm"),
                fault(HOT, "«at = 'POINT (70 20)'", "off the section by 10 mm", "nearest point"),
                fault(HOT, "«at = 'POINT (100.002 10)'", "off the section by 0.002 mm", "(100 10) mm"),
                fault(HOT, "«at = 'LINESTRING (0 0, 1 1)'", "LINESTRING;a point", "POINT"),
                fault(HOT, "«at = 'middle'", "middle", ""),
                fault(HOT, "«coupling = 'room'", "'coupling';array of two airs", "[\"air A\", \"air B\"]"),
                fault(HOT, "«coupling = ['room']", "1 elements;two airs", "[\"air A\", \"air B\"]"),
                fault(HOT, "«coupling = ['room', 'room']", "'room' twice", "different"),
                fault(HOT, "coupling = ['room', «'celler']", "'celler'", "'cellar'"),
                fault(
                        HOT,
                        "coupling = [«'skin', 'cellar']",
                        "'skin', which is an edge;an air is wanted",
                        "known: 'room'"),
                fault(HOT, "«factor = 'bar'\ninner = 'room'\nouter = 'cellar'", "'bar', which is a region", "'skin'"),
                fault(
                        "[[ask]]\nname = 'hot'\n" + HOT,
                        "«[[ask]]\nname = 'hot'\nfactor = 'skin'\nouter = 'cellar'",
                        "no 'inner'",
                        "inner side"),
                fault(HOT, "factor = 'skin'\ninner = 'room'\n«outer = 'room'", "both name air 'room'", "different"),
                fault(
                        HOT,
                        "factor = 'skin'\n«inner = 'room'\nouter = 'cellar'\nwith = { 'air.room.temperature' = '10 degC' }",
                        "same temperature",
                        "two different"),
                fault(
                        HOT,
                        "«flow = 'attic'\n[air.attic]\ntemperature = '3 degC'",
                        "air 'attic', in which no edge is",
                        "air = \"attic\""));
    }

    static Stream<Arguments> lessAndDifference() {
        String psi = "transmittance = ['room', 'cellar']\n";
        return Stream.of(
                fault(HOT, psi + "«less = '0.25 W/(m2.K)'", "'less' of ask 'hot';array", "u ="),
                fault(HOT, psi + "less = [«'0.25 W/(m2.K)']", "element 1 of 'less';table", "u ="),
                fault(HOT, psi + "less = [«{ u = '0.25 W/(m2.K)' }]", "no 'length'", "length ="),
                fault(HOT, psi + "less = [«{ length = '1 m' }]", "no 'u'", "u ="),
                fault(
                        HOT,
                        psi + "less = [{ u = '1 W/(m2.K)', «len = '1 m', length = '2 m' }]",
                        "'len'",
                        "'u', 'length'"),
                fault(HOT, psi + "less = [{ u = '1 W/(m2.K)', «length = '0 m' }]", "greater than zero", "above 0"),
                fault(
                        HOT,
                        psi + "less = [{ «u = '1 W/(m.K)', length = '2 m' }]",
                        "'u' of element 1",
                        "a film coefficient"),
                fault(
                        HOT,
                        HOT + "\n[[ask]]\nname = 'd'\n«difference = 'hot'",
                        "array of two asks",
                        "[\"ask A\", \"ask B\"]"),
                fault(HOT, HOT + "\n[[ask]]\nname = 'd'\n«difference = ['hot']", "1 elements;two asks", "[\"ask A\""),
                fault(HOT, HOT + "\n[[ask]]\nname = 'd'\ndifference = ['hot', «'hut']", "'hut', but no ask", "'hot'"),
                fault(
                        HOT,
                        HOT + "\n[[ask]]\nname = 'd'\n«difference = ['hot', 'd']",
                        "depends on itself: d → d",
                        "on their own"),
                fault(
                        HOT,
                        HOT + "\n[[ask]]\nname = 'd'\ndifference = ['hot', 'e']\n[[ask]]\nname = 'e'\n"
                                + "«difference = ['hot', 'f']\n[[ask]]\nname = 'f'\ndifference = ['e', 'hot']",
                        "depends on itself: e → f → e",
                        "on their own"),
                fault(
                        HOT,
                        HOT + "\n[[ask]]\nname = 'q'\nflow = 'skin'\n[[ask]]\nname = 'd'\n«difference = ['hot', 'q']",
                        "a heat flow per metre of depth ('q') from a temperature ('hot')",
                        "same unit"),
                fault(
                        HOT,
                        HOT
                                + "\n[[ask]]\nname = 'd'\ndifference = ['hot', 'hot']\n«with = { 'air.room.film' = '9 W/(m2.K)' }",
                        "'with' stands in ask 'd', which is a difference",
                        "subtracted"));
    }

    static Stream<Arguments> limitWithinAndWith() {
        return Stream.of(
                fault(HOT, HOT + "\n«limit = 105", "'limit' of ask 'hot';number 105", "<= 105 degC"),
                fault(HOT, HOT + "\n«limit = '105 degC'", "neither <= nor >=", "\"<= 105 degC\""),
                fault(HOT, HOT + "\n«limit = '< 105 degC'", "neither <= nor >=", "\">= 105 degC\""),
                fault(HOT, HOT + "\n«limit = '<= 105'", "'limit' of ask 'hot';105", "degC"),
                fault(HOT, HOT + "\n«limit = '<= 105 W/m'", "'limit' of ask 'hot'", "a temperature"),
                fault(
                        HOT,
                        HOT + "\n«limit = '<= 105 ± 2 degC'",
                        "with a spread, but a limit is exact",
                        "leave the spread out"),
                fault(HOT, HOT + "\n«within = 0.2", "'within' of ask 'hot';number 0.2", "K"),
                fault(HOT, HOT + "\n«within = '0.2 degC'", "'within' of ask 'hot'", "K"),
                fault(HOT, HOT + "\n«within = '0 K'", "greater than zero", "above 0"),
                fault(HOT, HOT + "\n«within = '0 %'", "0 %;greater than zero", "1 %"),
                fault(HOT, HOT + "\n«within = '-1 %'", "-1 %", "1 %"),
                fault(HOT, HOT + "\n«within = 'x %'", "x %", "1 %"),
                fault(HOT, HOT + "\n«within = '0.2 ± 0.1 K'", "a tolerance is exact", "leave the spread out"),
                fault(HOT, "flow = 'skin'\n«within = '0.2 K'", "'within' of ask 'hot'", "W/m"),
                fault(HOT, "flow = 'skin'\n«limit = '<= 20 degC'", "'limit' of ask 'hot'", "W/m"),
                fault(HOT, FACTOR + "\n«limit = '>= 0.7 K'", "'limit' of ask 'hot'", ""),
                fault(HOT, "coupling = ['room', 'cellar']\n«limit = '<= 0.3 W/m'", "'limit' of ask 'hot'", "W/(m.K)"),
                fault(
                        HOT,
                        HOT + "\n[[ask]]\nname = 'd'\ndifference = ['hot', 'hot']\n«limit = '<= 20 degC'",
                        "'limit' of ask 'd';20 degC",
                        "K"),
                fault(HOT, HOT + "\n«with = '3'", "'with' of ask 'hot';table", "PATH"),
                fault(HOT, HOT + "\nwith = { «'air.rome.film' = '9 W/(m2.K)' }", "'air.rome.film'", "'air.room.film'"),
                fault(
                        HOT,
                        HOT + "\nwith = { «'air.room.film' = '9 W/(m.K)' }",
                        "'air.room.film'",
                        "a film coefficient"),
                fault(HOT, HOT + "\nwith = { «'air.room.film' = '0 W/(m2.K)' }", "greater than zero", "above 0"),
                fault(
                        HOT,
                        HOT + "\nwith = { «'air.room.film' = '9 ± 1 W/(m2.K)' }",
                        "the spread stays",
                        "leave the spread out"),
                fault(
                        HOT,
                        HOT + "\nwith = { 'air.room.film' = '9 W/(m2.K)', «air.room.film = '8 W/(m2.K)' }",
                        "'air.room.film' twice",
                        "once"));
    }

    static Stream<Arguments> mesh() {
        return Stream.of(
                fault("[air.room]", "[mesh]\n«elment = 'linear'\n[air.room]", "'elment' in [mesh]", "'element'"),
                fault("[air.room]", "[mesh]\n«element = 'cubic'\n[air.room]", "\"cubic\"", "\"quadratic\""),
                fault("[air.room]", "[mesh]\n«element = 2\n[air.room]", "number 2", "quotes"),
                fault(
                        "[air.room]",
                        "[mesh]\n«angle = '34 deg'\n[air.room]",
                        "34 deg;0 deg and 33 deg",
                        "without an end"),
                fault("[air.room]", "[mesh]\n«angle = '-1 deg'\n[air.room]", "-1 deg;0 deg and 33 deg", "28 deg"),
                fault(
                        "[air.room]",
                        "[mesh]\n«angle = '28 ± 1 deg'\n[air.room]",
                        "with a spread",
                        "leave the spread out"),
                fault("[air.room]", "[mesh]\n«angle = 28\n[air.room]", "number 28", "28 deg"),
                fault(
                        "[air.room]",
                        "[mesh]\n«size = '0 mm'\n[air.room]",
                        "'size' of [mesh];greater than zero",
                        "above 0"),
                fault(
                        "[air.room]",
                        "[mesh]\n«size = '1 ± 0.1 mm'\n[air.room]",
                        "with a spread",
                        "leave the spread out"),
                fault("[air.room]", "[mesh]\n«elements_at_most = 99\n[air.room]", "99;100 and", "2000000"),
                fault("[air.room]", "[mesh]\n«elements_at_most = 3000000000\n[air.room]", "3000000000", "2000000"),
                fault("[air.room]", "[mesh]\n«elements_at_most = 1e5\n[air.room]", "whole number", "2000000"),
                fault(
                        "[air.room]",
                        "[mesh]\n«refine = { near = 'bar', size = '1 mm' }\n[air.room]",
                        "an array",
                        "[{ near"),
                fault("[air.room]", "[mesh]\nrefine = [«{ near = 'bar' }]\n[air.room]", "no 'size'", "1 mm"),
                fault("[air.room]", "[mesh]\nrefine = [«{ size = '1 mm' }]\n[air.room]", "no 'near'", "WKT"),
                fault(
                        "[air.room]",
                        "[mesh]\nrefine = [{ «nera = 'bar', near = 'bar', size = '1 mm' }]\n[air.room]",
                        "'nera'",
                        "'near'"),
                fault(
                        "[air.room]",
                        "[mesh]\nrefine = [{ «near = 'bra', size = '1 mm' }]\n[air.room]",
                        "'bra'",
                        "'bar'"),
                fault(
                        "[air.room]",
                        "[mesh]\nrefine = [{ «near = 'room', size = '1 mm' }]\n[air.room]",
                        "an air",
                        "known"),
                fault("[air.room]", "[mesh]\nrefine = [{ «near = 'POINT (1 b)', size = '1 mm' }]\n[air.room]", "b", ""),
                fault(
                        "[air.room]",
                        "[mesh]\nrefine = [{ near = 'bar', «size = '-1 mm' }]\n[air.room]",
                        "greater than zero",
                        "above"));
    }

    private static Arguments fault(String old, String replacement, String what, String remedy) {
        return Arguments.of(old, replacement, what, remedy);
    }

    @ParameterizedTest
    @MethodSource({"kinds", "targets", "lessAndDifference", "limitWithinAndWith", "mesh"})
    void isReportedOnceAtItsPlace(String old, String replacement, String what, String remedy) {
        new CaseFolder(temp).fault(old, replacement, what, remedy);
    }

    @Test
    void whatDependsOnSomethingBrokenIsNotReportedAgain() {
        String toml = CaseFolder.sound("k = \"15 W/(m.K)\"", "«k = \"15\"")
                .replace("temperature = \"20 degC\"", "«temperature = \"20\"")
                .replace("POLYGON ((20 10, 40 10, 40 30", "POLYGON ((20 10, 40 x, 40 30")
                .replace("outline = \"POLYGON ((20 10", "«outline = \"POLYGON ((20 10");
        List<Finding> errors = new CaseFolder(temp).errors(toml + """
                        with = { "material.steel.k" = "3 W/(m.K)", "air.room.temperature" = "3 degC" }
                        [[ask]]
                        name = "c"
                        coupling = ["room", "cellar"]
                        [[ask]]
                        name = "d"
                        difference = ["hot", "e"]
                        [[ask]]
                        «name = "hot"
                        peak = "plate"
                        [[ask]]
                        name = "e"
                        at = "POINT (500 500)"
                        [[edge]]
                        name = "b"
                        where = { between = ["bar", "plate"] }
                        """);
        assertThat(errors).hasSize(4);
    }

    @Test
    void anAskWithoutNameOrKindIsReadAllTheSame() {
        String asks = """
                «[[ask]]
                «lowest = "bra"
                «limit = ">= 5"
                «[[ask]]
                name = "what"
                with = { «"air.room.fil" = "3 W/(m2.K)" }
                """;
        assertThat(new CaseFolder(temp).errors(CaseFolder.SOUND + asks)).hasSize(5);
    }
}
