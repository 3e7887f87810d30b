package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** One thing wrong at a time in the head of a case, its materials and its airs; « marks where the error is to be. */
class FaultyKeyTest {
    @TempDir
    Path temp;

    static Stream<Arguments> head() {
        return Stream.of(
                fault("format = 1\n", "«", "the case has no 'format'", "format = 1"),
                fault("format = 1", "«format = 2", "format 2", "format = 1"),
                fault("format = 1", "«format = '1'", "text \"1\";whole number", "format = 1"),
                fault("title =", "«title = 5 #", "'title' of the case;number 5;text", "double quotes"),
                fault("title =", "«titel =", "unknown key 'titel' in the case file", "'title'"),
                fault("title =", "«wherever =", "unknown key 'wherever'", "'symmetry', 'depth'"),
                fault("title =", "«symmetry = 'axial' #", "axial;does not do it yet", "planar"),
                fault("title =", "«symmetry = 'round' #", "\"round\"", "planar"),
                fault("title =", "«depth = '0 m' #", "'depth' of the case;greater than zero", "above 0"),
                fault("title =", "«depth = '1 ± 1 m' #", "'depth';reaches zero", "smaller"),
                fault("title =", "«depth = inf #", "'depth';Infinity", "\"1 m\""),
                fault("unit = 'mm'", "unit = 'mm'\n«depth = '2 m'", "'depth' in [outline]", "before the first table"),
                fault("title =", "«depth = '2 kg' #", "'depth';2 kg", "a length"),
                fault("title =", "«depth = 2 #", "'depth';number 2;unit", "\"2 m\""),
                fault("title =", "«report = 'x' #", "'report';table", "[report]"),
                fault("[outline]", "[report]\n«auther = 'x'\n[outline]", "'auther' in [report]", "project"),
                fault("[outline]", "[report]\n«chekced = 'x'\n[outline]", "'chekced'", "'checked'"),
                fault("[outline]", "[report]\n«checked = 4\n[outline]", "'checked' of [report];number 4", "quotes"),
                fault("[outline]", "[accuracy]\n«adopt = true\n[outline]", "'adopt'", "'adapt'"),
                fault("[outline]", "[accuracy]\n«adapt = 'yes'\n[outline]", "'adapt';true or false", "without quotes"),
                fault("[outline]", "[accuracy]\n«confidence = 95\n[outline]", "95;between 0 and 1", "\"95 %\""),
                fault("[outline]", "[accuracy]\n«confidence = '100 %'\n[outline]", "100 %;between 0 and 1", "95 %"),
                fault("[outline]", "[accuracy]\n«confidence = 'high'\n[outline]", "high", "95 %"),
                fault("[outline]", "[accuracy]\n«confidence = false\n[outline]", "bare word false", "quotes"));
    }

    static Stream<Arguments> outline() {
        return Stream.of(
                fault("[outline]\nunit = 'mm'", "«[outline]", "in which unit", "never guessed"),
                fault("unit = 'mm'", "«unit = 'kg'", "\"kg\";not a unit of length", "unit = \"mm\""),
                fault("unit = 'mm'", "«unit = '2 mm'", "\"2 mm\"", "unit = \"mm\""),
                fault("unit = 'mm'", "«unit = 'mm ± 1 mm'", "mm ± 1 mm", "unit = \"mm\""),
                fault("unit = 'mm'", "«unit = 5", "number 5;text", "quotes"),
                fault("unit = 'mm'", "unit = 'mm'\n«snap = '0 mm'", "'snap' of [outline];greater than zero", "above 0"),
                fault(
                        "unit = 'mm'",
                        "unit = 'mm'\n«snap = '1 ± 0.1 mm'",
                        "'snap';with a spread",
                        "leave the spread out"),
                fault("unit = 'mm'", "unit = 'mm'\n«snap = '1 s'", "'snap'", "a length"),
                fault("unit = 'mm'", "unit = 'mm'\n«fiel = 'x.wkt'", "'fiel' in [outline]", "'file'"),
                fault("unit = 'mm'", "unit = 'mm'\n«file = 'a\\u0000.wkt'", "not a file name", "exists"),
                fault("unit = 'mm'", "unit = 'mm'\n«file = 7", "'file';number 7", "quotes"));
    }

    static Stream<Arguments> materials() {
        return Stream.of(
                fault(
                        "[material.copper]\nk = '380 W/(m.K)'",
                        "«[material.copper]",
                        "material 'copper' has no 'k'",
                        "k ="),
                fault(
                        "k = '15 W/(m.K)'",
                        "«k = 15",
                        "'k' of material 'steel';number 15;conductivity",
                        "\"15 W/(m.K)\""),
                fault("k = '15 W/(m.K)'", "«k = 'about 15'", "'k' of material 'steel';about 15", ""),
                fault("k = '15 W/(m.K)'", "«k = '15 W/mK'", "'k' of material 'steel';W/mK", "W/(m.K)"),
                fault("k = '15 W/(m.K)'", "«k = '15 W/m'", "'k' of material 'steel'", "a conductivity"),
                fault("k = '15 W/(m.K)'", "«k = '0 W/(m.K)'", "greater than zero", "above 0 W/(m.K)"),
                fault("k = '15 W/(m.K)'", "«k = '-15 W/(m.K)'", "\"-15 W/(m.K)\";greater than zero", "above 0"),
                fault("k = '15 W/(m.K)'", "«k = '15 W/(m.K) ± 100 %'", "spread;reach zero", "smaller"),
                fault("k = '15 W/(m.K)'", "«k = nan", "bare number NaN", "W/(m.K)"),
                fault("k = '15 W/(m.K)'", "«k = true", "bare word true", "W/(m.K)"),
                fault(
                        "k = '15 W/(m.K)'",
                        "«k = [['20 degC', '15 W/(m.K)'], ['90 degC', '16 W/(m.K)']]",
                        "'k' of material 'steel' by temperature;does not do it yet",
                        "one value"),
                fault("k = '15 W/(m.K)'", "k = { «cavity = 'x' }", "'cavity';does not do it yet", "equivalent"),
                fault(
                        "k = '15 W/(m.K)'",
                        "k = { along = '9 W/(m.K)', «accross = '2 W/(m.K)', across = '2 W/(m.K)', angle = '0 deg' }",
                        "unknown key 'accross'",
                        "'across'"),
                fault("k = '15 W/(m.K)'", "«k = { along = '9 W/(m.K)', angle = '0 deg' }", "no 'across'", "across ="),
                fault(
                        "k = '15 W/(m.K)'",
                        "«k = { along = '9 W/(m.K)', across = '2 W/(m.K)' }",
                        "no 'angle'",
                        "from +x"),
                fault(
                        "k = '15 W/(m.K)'",
                        "k = { along = '9 W/(m.K)', across = '2 W/(m.K)', «angle = '1 m' }",
                        "'angle' of k of material 'steel'",
                        "an angle"),
                fault(
                        "k = '15 W/(m.K)'",
                        "k = { «along = [['1 degC', '9 W/(m.K)']], across = '2 W/(m.K)', angle = '3 deg' }",
                        "by temperature;does not do it yet",
                        "one value"),
                fault(
                        "k = '15 W/(m.K)'",
                        "k = '15 W/(m.K)'\n«lambda = '1'",
                        "'lambda' in [material.steel]",
                        "'density'"),
                fault(
                        "k = '15 W/(m.K)'",
                        "k = '15 W/(m.K)'\n«density = '0 kg/m3'",
                        "'density';greater than zero",
                        "above"),
                fault(
                        "k = '15 W/(m.K)'",
                        "k = '15 W/(m.K)'\n«heat_capacity = '-1 J/(kg.K)'",
                        "'heat_capacity'",
                        "above"),
                fault("k = '15 W/(m.K)'", "k = '15 W/(m.K)'\n«source = 3", "'source'", "quotes"),
                fault(
                        "[material.copper]",
                        "[material]\n«kopper = 'x'\n[material.copper]",
                        "'kopper' in [material]",
                        "material.NAME"),
                fault(
                        "[material.copper]",
                        "«[material.nothing]\nk = '1 W/(m.K)'\n[material.copper]",
                        "'nothing';word for a hole",
                        "another name"));
    }

    static Stream<Arguments> airs() {
        return Stream.of(
                fault(
                        "[air.cellar]\ntemperature = '10 degC'",
                        "«[air.cellar]",
                        "air 'cellar' has no 'temperature'",
                        "20 degC"),
                fault(
                        "temperature = '10 degC'",
                        "«temperature = '-300 degC'",
                        "'temperature' of air 'cellar'",
                        "-273.15"),
                fault("temperature = '10 degC'", "«temperature = '10 degC ± 5 %'", "percent", "degrees"),
                fault("temperature = '10 degC'", "«temperature = 10", "number 10", "10 degC"),
                fault(
                        "temperature = '10 degC'",
                        "temperature = '10 degC'\n«flim = '8 W/(m2.K)'",
                        "'flim' in [air.cellar]",
                        "'film'"),
                fault(
                        "film = '8 W/(m2.K)'",
                        "«film = '0 W/(m2.K)'",
                        "'film' of air 'room';greater than zero",
                        "above 0"),
                fault("film = '8 W/(m2.K)'", "«film = '8 W/(m.K)'", "'film' of air 'room'", "a film coefficient"));
    }

    private static Arguments fault(String old, String replacement, String what, String remedy) {
        return Arguments.of(old, replacement, what, remedy);
    }

    @ParameterizedTest
    @MethodSource({"head", "outline", "materials", "airs"})
    void isReportedOnceAtItsPlace(String old, String replacement, String what, String remedy) {
        new CaseFolder(temp).fault(old, replacement, what, remedy);
    }

    @Test
    void theUnitIsMissingWithItsTable() {
        String toml = "«" + CaseFolder.sound("[outline]\nunit = \"mm\"\n", "");
        assertThat(new CaseFolder(temp).errors(toml).get(0).what()).contains("in which unit");
    }
}
