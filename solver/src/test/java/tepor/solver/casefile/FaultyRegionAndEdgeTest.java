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

/** One thing wrong at a time in regions and edges; « marks where the error is to be. */
class FaultyRegionAndEdgeTest {
    private static final String SKIN = "where = 'top'\nair = 'room'";

    @TempDir
    Path temp;

    static Stream<Arguments> names() {
        return Stream.of(
                fault("name = 'void'", "«name = 'plate'", "'plate' is taken: a region;plate.toml:6:1", "another"),
                fault("name = 'skin'", "«name = 'room'", "'room' is taken;an air", "give this edge another"),
                fault("name = 'skin'", "«name = 'void'", "'void' is taken;a region", "another"),
                fault(
                        "[air.cellar]",
                        "«[air.bar]\ntemperature = '1 degC'\nfilm = '2 W/(m2.K)'\n[air.cellar]",
                        "'bar' is taken",
                        "this air"),
                fault("name = 'skin'", "«name = ''", "'name';empty", "name ="),
                fault("[[edge]]\nname = 'skin'", "«[[edge]]", "has no 'name'", "name ="));
    }

    static Stream<Arguments> regions() {
        return Stream.of(
                fault(
                        "material = 'nothing'",
                        "«materail = 'nothing'\nmaterial = 'nothing'",
                        "'materail' in [[region]]",
                        "'material'"),
                fault("[[region]]\nname = 'void'", "«[[region]]\n#", "has no 'name'", "name ="),
                fault(
                        "[[region]]\nname = 'void'\noutline = 'POLYGON ((60 10, 80 10, 80 30, 60 30, 60 10))'\nmaterial = 'nothing'",
                        "«[[region]]\nname = 'void'\noutline = 'POLYGON ((60 10, 80 10, 80 30, 60 30, 60 10))'",
                        "region 'void' has no 'material'",
                        "nothing"),
                fault("material = 'steel'", "«material = 'steal'", "'steal';no material", "'steel'"),
                fault("material = 'steel'", "«material = 'glass wool'", "'glass wool'", "[material.\"glass wool\"]"),
                fault(
                        "material = 'nothing'",
                        "material = 'nothing'\n«heat = '1 W/m'",
                        "region 'void';of nothing;heat",
                        "leave the heat out"),
                fault("heat = '42 W/m'", "«heat = '42 W'", "\"42 W\";no depth", "depth ="),
                fault("heat = '42 W/m'", "«heat = '42 W/m2'", "'heat' of region 'bar'", "a heat flow per metre"),
                fault("heat = '42 W/m'", "«heat = 42", "'heat' of region 'bar';number 42", "42 W/m"),
                fault(
                        "heat = '42 W/m'",
                        "«heat = { is = '42 W/m', at = '20 degC', rise = '0.004 1/K' }",
                        "'heat' of region 'bar' as a table;does not do it yet",
                        "one value"),
                fault(
                        "outline = 'POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))'",
                        "«outline = 'LINESTRING (20 10, 40 10)'",
                        "'outline' of region 'bar';LINESTRING;area",
                        "POLYGON"),
                fault(
                        "outline = 'POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))'",
                        "«outline = 'POLYGON ((20 10, 40 10, 40 30, 20 30))'",
                        "",
                        ""),
                fault(
                        "outline = 'POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))'",
                        "«outline = 'POLYGON ((20 10, 40 30, 40 10, 20 30, 20 10))'",
                        "region 'bar';crosses itself;(30 20) mm",
                        "cross"),
                fault(
                        "outline = 'POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))'",
                        "«outline = 'CURVEPOLYGON (CIRCULARSTRING (20 10, 40 10, 40 30))'",
                        "does not close;(20 10) mm;(40 30) mm",
                        "repeat"),
                fault(
                        "outline = 'POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))'",
                        "«outline = 3",
                        "number 3;text",
                        "quotes"),
                fault(
                        "[[region]]\nname = 'bar'\noutline = 'POLYGON ((20 10, 40 10, 40 30, 20 30, 20 10))'",
                        "«[[region]]\nname = 'bar'",
                        "region 'bar' has no outline;no outline file",
                        "[outline]"),
                fault(
                        "POLYGON ((60 10, 80 10, 80 30, 60 30, 60 10))'\nmaterial = 'nothing'",
                        "POLYGON ((60 10, 80 10, 80 30, 60 30, 60 10))'\nmaterial = 'nothing'\n[[region]]\nname = 'lid'\n«outline = 'POLYGON ((0 0, 1 0, 1 1, 0 1, 0 0))'\nmaterial = 'steel'\n[[region]]\nname = 'over'\noutline = 'POLYGON ((0 0, 1 0, 1 1, 0 1, 0 0))'\nmaterial = 'steel'",
                        "region 'lid';under 'over'",
                        ""));
    }

    static Stream<Arguments> places() {
        return Stream.of(
                fault(
                        "[[edge]]\nname = 'skin'\nwhere = 'top'",
                        "«[[edge]]\nname = 'skin'",
                        "edge 'skin' has no 'where'",
                        "where ="),
                fault("where = 'top'", "«where = 'topp'", "'where' of edge 'skin';\"topp\"", "\"top\""),
                fault("where = 'top'", "«where = 'bar'", "the name of a region", "{ of = \"bar\" }"),
                fault("where = 'top'", "«where = 'sole'", "the name of an edge", "left, right"),
                fault("where = 'top'", "«where = 5", "number 5", "outside"),
                fault("where = 'top'", "«where = []", "empty", "outside"),
                fault("where = 'top'", "where = ['top', «'botom']", "element 2 of 'where';\"botom\"", "\"bottom\""),
                fault("where = 'top'", "«where = { of = 'bar', line = 'LINESTRING (0 0, 1 0)' }", "2 keys", "union"),
                fault("where = 'top'", "where = { «lien = 'LINESTRING (0 0, 1 0)' }", "unknown key 'lien'", "'line'"),
                fault("where = 'top'", "where = { «layer = 'x' }", "'layer';'x';no outline file", "LINESTRING"),
                fault("where = 'top'", "where = { «cut = 'POINT (0 0)' }", "'cut';POINT;a line", "LINESTRING"),
                fault("where = 'top'", "where = { «line = 'POINT (0 0)' }", "'line';POINT;a line", "LINESTRING"),
                fault("where = 'top'", "where = { «line = 'LINESTRING (0 50, 100 y)' }", "y", ""),
                fault("where = 'top'", "where = { «inside = 'POINT (0 0)' }", "'inside';POINT;an area", "POLYGON"),
                fault(
                        "where = 'top'",
                        "where = { «inside = 'POLYGON ((0 0, 9 9, 9 0, 0 9, 0 0))' }",
                        "'inside' of 'where' of edge 'skin';crosses itself",
                        ""),
                fault("where = 'top'", "where = { «nearest = 'LINESTRING (0 0, 1 0)' }", "'nearest';a point", "POINT"),
                fault("where = 'top'", "where = { «of = 'bra' }", "'of';names 'bra';no region", "'bar'"),
                fault(
                        "where = 'top'",
                        "where = { «of = 'cellar' }",
                        "'cellar';an air;a region is wanted",
                        "known: 'plate'"),
                fault("where = 'top'", "where = { «between = 'bar' }", "'between';array", "[\"A\", \"B\"]"),
                fault("where = 'top'", "where = { «between = ['bar'] }", "1 elements;two regions", "[\"A\", \"B\"]"),
                fault("where = 'top'", "where = { «between = ['bar', 'bar'] }", "'bar' twice", "different"),
                fault("where = 'top'", "where = { between = ['bar', «'plait'] }", "'plait'", "'plate'"));
    }

    static Stream<Arguments> notFound() {
        return Stream.of(
                fault(
                        "where = 'top'",
                        "«where = { line = 'LINESTRING (0 60, 100 60)' }",
                        "edge 'skin' finds nothing;from (0 60) mm to (100 60) mm;nearest is 10 mm away",
                        "from (0 0) mm to (100 50) mm"),
                fault(
                        "where = 'top'",
                        "«where = { inside = 'POLYGON ((200 0, 300 0, 300 100, 200 100, 200 0))' }",
                        "finds nothing;inside the polygon;nearest is 100 mm away",
                        "reaches from"),
                fault(
                        "where = { of = 'bar' }",
                        "«where = { between = ['bar', 'void'] }",
                        "'bar' and 'void' do not meet",
                        "border"),
                fault(
                        "where = { of = 'bar' }",
                        "«where = 'rest'\n[[edge]]\nname = 'all'\nwhere = ['left', 'right', 'holes']\ninflow = '1 W/m2'",
                        "edge 'bar skin' finds nothing;every piece",
                        "leave the edge out"));
    }

    static Stream<Arguments> conditions() {
        return Stream.of(
                fault(
                        "where = 'top'\n",
                        "where = 'top'\n«fiml = '8 W/(m2.K)'\n",
                        "unknown key 'fiml' in [[edge]]",
                        "'film'"),
                fault(
                        SKIN,
                        "where = 'top'\n«temperature = '90 degC'\nair = 'room'",
                        "temperature together with air",
                        "alone"),
                fault(
                        SKIN,
                        "where = 'top'\n«temperature = '90 degC'\nfilm = '3 W/(m2.K)'\ninflow = '3 W/m'",
                        "temperature together with film, inflow",
                        "alone"),
                fault(
                        "air = 'cellar'\nresistance = '0.1 m2.K/W'",
                        "«air = 'cellar'",
                        "edge 'sole';neither;film",
                        "[air.NAME]"),
                fault(
                        "air = 'cellar'\nresistance = '0.1 m2.K/W'",
                        "«air = '3 degC'",
                        "edge 'sole';neither;film",
                        "film ="),
                fault(SKIN, "where = 'top'\n«film = '8 W/(m2.K)'", "edge 'skin' states a film, but no air", "air ="),
                fault(SKIN, "where = 'top'\n«resistance = '8 m2.K/W'", "states a resistance, but no air", "air ="),
                fault("air = 'room'", "«air = 'rum'", "'air' of edge 'skin' names 'rum'", "did you mean 'room'"),
                fault("air = 'room'", "«air = 'bar'", "'bar', which is a region;an air is wanted", "20 degC"),
                fault("air = 'room'", "film = '3 W/(m2.K)'\n«air = '35 K/W'", "'air' of edge 'skin'", "a temperature"),
                fault("air = 'room'", "film = '3 W/(m2.K)'\n«air = 35", "number 35", "20 degC"),
                fault(
                        "air = 'room'",
                        "air = 'room'\n«film = '-3 W/(m2.K)'",
                        "'film' of edge 'skin';greater than zero",
                        "above"),
                fault("'0.1 m2.K/W'", "'0.1 m2.K/W'\n«inflow = '3 W'", "'inflow' of edge 'sole'", "W/m2"),
                fault("resistance = '0.1 m2.K/W'", "«resistance = '0 m2.K/W'", "greater than zero", "above"),
                fault(
                        "air = 'room'",
                        "air = 'room'\n«insulated = 'symmetry'",
                        "is insulated, but states air too",
                        "one or the other"),
                fault(SKIN, "where = 'top'\n«insulated = true", "'insulated';bare word true;reason", "symmetry plane"),
                fault(SKIN, "where = 'top'\n«insulated = ''", "'insulated';reason", "symmetry plane"),
                fault(
                        SKIN,
                        "where = 'top'\n«contact = '1 m2.K/W'",
                        "'contact' in [[edge]];does not do it yet",
                        "thin region"),
                fault(
                        SKIN,
                        "where = 'top'\n«sheet = { k = '1', thickness = '2' }",
                        "'sheet';does not do it yet",
                        "thin region"),
                fault(SKIN, "where = 'top'\n«emissivity = 0.9", "'emissivity';does not do it yet", "film"),
                fault(
                        "air = 'room'",
                        "air = 'room'\n«surroundings = '2 degC'",
                        "'surroundings';does not do it yet",
                        "film"));
    }

    static Stream<Arguments> onTheSection() {
        return Stream.of(
                fault(
                        "where = { of = 'bar' }",
                        "where = { of = 'bar' }\n«temperature = '90 degC'",
                        "edge 'bar skin';80 mm between regions;'plate';'bar';temperature cannot hold",
                        "\"nothing\""),
                fault(
                        "where = { of = 'bar' }",
                        "where = { of = 'bar' }\n«insulated = 'tape'",
                        "insulated cannot hold",
                        "\"nothing\""),
                fault(
                        "where = { of = 'bar' }",
                        "where = { of = 'bar' }\n«inflow = '90 W/m2'",
                        "edge 'bar skin';inflow there;does not do it yet",
                        "thin region"),
                fault(
                        "where = 'bottom'",
                        "«where = ['bottom', { line = 'LINESTRING (70 50, 100 50)' }]",
                        "edges 'skin' (;plate.toml:29:1;and 'sole';same 30 mm;(100 50) mm",
                        "once"),
                fault(
                        "where = 'top'\nair = 'room'",
                        "where = 'rest'\nair = 'room'\n[[edge]]\nname = 'more'\n«where = 'rest'\ninflow = '1 W/m2'",
                        "edges 'skin' (;and 'more';the rest",
                        "say where"));
    }

    private static Arguments fault(String old, String replacement, String what, String remedy) {
        return Arguments.of(old, replacement, what, remedy);
    }

    @ParameterizedTest
    @MethodSource({"names", "regions", "places", "notFound", "conditions", "onTheSection"})
    void isReportedOnceAtItsPlace(String old, String replacement, String what, String remedy) {
        new CaseFolder(temp).fault(old, replacement, what, remedy);
    }

    @Test
    void insulationCountsAsACondition() {
        String edges = """
                [[edge]]
                name = "foam"
                where = "right"
                insulated = "foam"
                [[edge]]
                name = "warm"
                «where = ["right", "left"]
                temperature = "3 degC"
                """;
        Finding error = new CaseFolder(temp).errors(CaseFolder.SOUND + edges).get(0);
        assertThat(error.what()).contains("'foam'", "'warm'", "same 50 mm", "from (100 0) mm to (100 50) mm");
    }

    @Test
    void nothingTiesTheSectionToATemperature() {
        String toml = CaseFolder.sound(
                CaseFolder.SOUND.substring(CaseFolder.SOUND.indexOf("[[edge]]")),
                "«[[edge]]\nname = \"skin\"\nwhere = \"top\"\ninflow = \"3 W/m2\"\n");
        List<Finding> errors = new CaseFolder(temp).errors(toml);
        assertThat(errors.get(0).what()).contains("no edge states a temperature, film or resistance");
        assertThat(errors.get(0).remedy()).contains("[[edge]]");
    }

    @Test
    void singleBracketsWhereDoubleOnesBelong() {
        String toml = CaseFolder.SOUND.substring(0, CaseFolder.SOUND.indexOf("[[edge]]")) + "«[edge]\nname = \"x\"\n";
        List<Finding> errors = new CaseFolder(temp).errors(toml);
        assertThat(errors.get(0).remedy()).contains("[[edge]]");
    }

    @Test
    void aRegionWithoutNameIsReadAllTheSame() {
        String region = """
                «[[region]]
                «outline = "POLYGON ((0 0, 9 9, 9 0, 0 9, 0 0))"
                «material = "steal"
                «heat = 5
                """;
        assertThat(new CaseFolder(temp).errors(CaseFolder.SOUND + region)).hasSize(4);
    }

    @Test
    void aNameThatStandsTwiceIsNoOtherError() {
        String more = """
                [[edge]]
                «name = "bar"
                where = "left"
                [[ask]]
                name = "q"
                flow = "bar"
                """;
        assertThat(new CaseFolder(temp).errors(CaseFolder.SOUND + more)).hasSize(1);
    }

    @Test
    void aRegionWithoutMaterialMayHaveMeantAnyOfThem() {
        List<Finding> found = new CaseFolder(temp).all(CaseFolder.sound("material = \"steel\"\n", ""));
        assertThat(found).extracting(Finding::code).containsExactly("missing-key");
    }
}
