package tepor.solver.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Finding.Severity;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;

/** Cases whose outlines are drawn in DXF, or have names of lines in a file of well-known text. */
class DrawnCaseTest {
    private static final String CASE = """
            format = 1
            [outline]
            file = "plate.dxf"
            [[region]]
            name = "plate"
            material = "steel"
            [[region]]
            name = "Bohrung groß"
            material = "nothing"
            [material.steel]
            k = "15 W/(m.K)"
            [[edge]]
            name = "warm"
            where = { layer = "warm side" }
            temperature = "90 degC"
            [[edge]]
            name = "cold"
            where = "left"
            temperature = "20 degC"
            [[ask]]
            name = "heat"
            flow = "cold"
            """;

    @TempDir
    Path temp;

    private CaseFolder folder;

    /** A plate of 100 mm by 50 mm of four lines, a bore of 20 mm, and the upper half of the right side as a line. */
    private static String drawing(int insunits, String more) {
        String plate = "LINE;8 plate;10 0;20 0;11 100;21 0;LINE;8 plate;10 100;20 0;11 100;21 50;"
                + "LINE;8 plate;10 100;20 50;11 0;21 50;LINE;8 plate;10 0;20 50;11 0;21 0;";
        String rest = "CIRCLE;8 Bohrung groß;10 50;20 25;40 10;LINE;8 warm side;10 100;20 25;11 100;21 50;";
        String all = "SECTION;2 HEADER;9 $ACADVER;1 AC1032;9 $INSUNITS;70 " + insunits + ";ENDSEC;SECTION;2 ENTITIES;"
                + plate + rest + more + "ENDSEC;EOF";
        return List.of(all.split(";")).stream()
                .map(p -> Character.isDigit(p.charAt(0)) ? p.replaceFirst(" ", "\n") : "0\n" + p)
                .collect(Collectors.joining("\n"));
    }

    @BeforeEach
    void write() {
        folder = new CaseFolder(temp);
        folder.write("plate.dxf", drawing(4, ""));
    }

    private static double length(Case subject, String edge) {
        Edge found = subject.edges().stream()
                .filter(e -> e.name().equals(edge))
                .findFirst()
                .orElseThrow();
        return found.pieces().length(subject.section());
    }

    @Test
    void layersAreRegionsAndOpenLinesAreEdges() {
        Case subject = folder.read(CASE);
        assertThat(subject.warnings()).isEmpty();
        assertThat(subject.unit().symbol()).isEqualTo("mm");
        assertThat(subject.section().bounds()).containsExactly(0, 0, 0.1, 0.05);
        assertThat(length(subject, "warm")).isCloseTo(0.025, within(1e-12));
        assertThat(subject.files()).extracting("name").containsExactly("plate.toml", "plate.dxf");
    }

    @Test
    void theUnitOfTheCaseGoesBeforeThatOfTheDrawing() {
        Case subject = folder.read(CASE.replace("[outline]\n", "[outline]\nunit = \"cm\"\n"));
        assertThat(subject.section().bounds()).containsExactly(0, 0, 1, 0.5);
        assertThat(subject.warnings()).singleElement().satisfies(w -> {
            assertThat(w.code()).isEqualTo("unit-differs");
            assertThat(w.what()).contains("mm", "cm");
            assertThat(w.place().file()).endsWith("plate.dxf");
            assertThat(w.place().line()).isEqualTo(12);
        });
    }

    @Test
    void withoutAnyUnitTheCaseIsRefused() {
        folder.write("plate.dxf", drawing(0, ""));
        List<Finding> errors = errors(CASE);
        assertThat(errors).extracting(Finding::code).containsExactly("unit-missing");
        assertThat(errors.get(0).remedy()).contains("[outline]");
        assertThat(folder.read(CASE.replace("[outline]\n", "[outline]\nunit = \"mm\"\n"))
                        .warnings())
                .isEmpty();
    }

    @Test
    void coordinatesInTheCaseAreInTheUnitOfTheDrawing() {
        Case subject = folder.read(CASE.replace(
                "where = { layer = \"warm side\" }",
                "where = [{ layer = \"warm side\" }, { line = \"LINESTRING (100 0, 100 10)\" }]"));
        assertThat(length(subject, "warm")).isCloseTo(0.035, within(1e-12));
    }

    @Test
    void namesThatAreNoLayersAreAnsweredWithTheNearest() {
        List<Finding> errors =
                errors(CASE.replace("name = \"plate\"", "name = \"Plate\"").replace("\"warm side\"", "\"warm-side\""));
        assertThat(errors).extracting(Finding::code).containsExactlyInAnyOrder("outline-missing", "layer-missing");
        assertThat(errors).anySatisfy(e -> assertThat(e.remedy()).isEqualTo("did you mean 'plate'"));
        assertThat(errors).anySatisfy(e -> assertThat(e.remedy()).isEqualTo("did you mean 'warm side'"));
    }

    @Test
    void aLayerOfLoopsIsNoEdgeAndALayerOfLinesNoRegion() {
        List<Finding> errors = errors(CASE.replace("name = \"plate\"", "name = \"warm side\"")
                .replace("{ layer = \"warm side\" }", "{ layer = \"plate\" }"));
        assertThat(errors).anySatisfy(e -> {
            assertThat(e.what()).contains("no closed loop", "(100 25) mm", "(100 50) mm", "gap of 25 mm");
            assertThat(e.remedy()).contains("snap");
        });
        assertThat(errors).anySatisfy(e -> {
            assertThat(e.what()).contains("'plate'", "closed loops only");
            assertThat(e.remedy()).contains("{ of = \"plate\" }");
        });
    }

    @Test
    void whatNothingUsesIsListedOnce() {
        folder.write(
                "plate.dxf",
                drawing(
                        4,
                        "CIRCLE;8 a;10 9;20 9;40 1;POINT;8 b;10 9;20 9;LINE;8 b;10 9;20 9;11 1;21 1;LINE;8 b;10 19;20 9;11 1;21 2;"));
        assertThat(folder.read(CASE).warnings()).singleElement().satisfies(w -> {
            assertThat(w.code()).isEqualTo("unused-layers");
            assertThat(w.what()).contains("'a' (1 closed loop)", "'b' (2 open lines, 1 point)");
        });
    }

    @Test
    void faultsOfTheDrawingAreThoseOfTheCase() {
        folder.write("plate.dxf", drawing(4, "CIRCLE;8 plate;10 9;20 9;40 x;"));
        assertThat(errors(CASE)).singleElement().satisfies(e -> {
            assertThat(e.code()).isEqualTo("no-number");
            assertThat(e.place().file()).isEqualTo(folder.file("plate.dxf").toString());
        });
    }

    @Test
    void aGapIsClosedBySnap() {
        folder.write("plate.dxf", drawing(4, "").replace("8\nplate\n10\n0\n20\n50", "8\nplate\n10\n0.02\n20\n50"));
        assertThat(folder.all(CASE)).anySatisfy(f -> assertThat(f.what()).contains("gap of 0.02 mm"));
        assertThat(folder.read(CASE.replace("[outline]\n", "[outline]\nsnap = \"0.05 mm\"\n"))
                        .warnings())
                .isEmpty();
    }

    @Test
    void recordsOfWellKnownTextAreLayersToo() {
        folder.write("plate.wkt", """
                plate: CURVEPOLYGON (COMPOUNDCURVE ((100 50, 0 50, 0 0, 100 0), CIRCULARSTRING (100 0, 125 25, 100 50)))
                Bohrung groß: CURVEPOLYGON (CIRCULARSTRING (60 25, 40 25, 60 25))
                warm side: LINESTRING (10 50, 30 50)
                warm side: MULTILINESTRING ((40 50, 50 50), (60 50, 70 50))
                """);
        Case subject = folder.read(CASE.replace("file = \"plate.dxf\"", "file = \"plate.wkt\"\nunit = \"mm\""));
        assertThat(subject.warnings()).isEmpty();
        assertThat(length(subject, "warm")).isCloseTo(0.04, within(1e-12));
    }

    private List<Finding> errors(String toml) {
        return folder.all(toml).stream()
                .filter(f -> f.severity() == Severity.ERROR)
                .toList();
    }
}
