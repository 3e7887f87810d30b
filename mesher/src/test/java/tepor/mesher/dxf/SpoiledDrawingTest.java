package tepor.mesher.dxf;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tepor.mesher.outline.Finding;

/** Spoiled files are answered by place and remedy. « marks the line where a fault is expected, × a line that is missing. */
class SpoiledDrawingTest {
    private static final String SOUND = "CIRCLE;8 sound;10 50;20 50;40 1";

    private static Arguments entity(String words, String brief) {
        return Arguments.of(words, DrawnDxf.file(brief + ";" + SOUND));
    }

    private static Arguments block(String words, String blocks, String entities) {
        return Arguments.of(words, DrawnDxf.file("", blocks, entities + ";" + SOUND));
    }

    static Stream<Arguments> entities() {
        return Stream.of(
                entity("'1,5' is no number; decimals take a point", "LINE;8 a;10 «1,5;20 0;11 1;21 1"),
                entity("'abc' is no number; LINE; finite", "LINE;8 a;10 0;20 0;11 «abc;21 1"),
                entity("'NaN' is no number", "CIRCLE;8 a;10 0;20 «NaN;40 1"),
                entity("'1e999' is too large", "CIRCLE;8 a;10 «1e999;20 0;40 1"),
                entity("'1e200' is too large for a coordinate", "CIRCLE;8 a;10 «1e200;20 0;40 1"),
                entity("'' is no number", "CIRCLE;8 a;10 «;20 0;40 1"),
                entity("no y of its end; group 21; delete", "«LINE;8 a;10 0;20 0;11 1"),
                entity("no radius; group 40", "«CIRCLE;8 a;10 0;20 0"),
                entity("radius of 0; greater than zero", "CIRCLE;8 a;10 0;20 0;40 «0"),
                entity("radius of -2; greater than zero", "ARC;8 a;10 0;20 0;40 «-2;50 0;51 90"),
                entity("no end angle; group 51", "«ARC;8 a;10 0;20 0;40 2;50 0"),
                entity("same angle", "«ARC;8 a;10 0;20 0;40 2;50 30;51 30"),
                entity("ratio of axes of 0", "ELLIPSE;8 a;10 0;20 0;11 2;21 0;40 «0;41 0;42 6"),
                entity("major axis without length", "ELLIPSE;8 a;10 0;20 0;11 «0;21 0;40 0.5"),
                entity(
                        "5 vertices, but has 4; correct the number",
                        "LWPOLYLINE;8 a;90 «5;10 0;20 0;10 1;20 0;10 1;20 1;10 0;20 1"),
                entity("3 x and 2 y", "«LWPOLYLINE;8 a;90 3;10 0;20 0;10 1;10 1;20 1"),
                entity("has 1 vertex", "«LWPOLYLINE;8 a;90 1;10 0;20 0"),
                entity("has 0 vertices", "«POLYLINE;8 a;66 1;SEQEND"),
                entity("'x' is no number; group 42", "LWPOLYLINE;8 a;90 2;10 0;20 0;42 «x;10 1;20 0"),
                entity("VERTEX has no y", "POLYLINE;8 a;66 1;VERTEX;10 0;20 0;«VERTEX;10 1;SEQEND"),
                entity("belongs to no POLYLINE", "«VERTEX;8 a;10 0;20 0"),
                entity(
                        "not ended by SEQEND before this LINE; save",
                        "POLYLINE;8 a;66 1;VERTEX;10 0;20 0;VERTEX;10 1;20 0;«LINE;8 a;10 7;20 7;11 8;21 8"),
                entity("'half' is no number", "LWPOLYLINE;8 a;90 2;70 «half;10 0;20 0;10 1;20 0"),
                entity("'1.5' is no whole number", "LWPOLYLINE;8 a;90 2;70 «1.5;10 0;20 0;10 1;20 0"),
                entity(
                        "5 knots, where 3 control points and degree 2 make 6",
                        "«SPLINE;8 a;71 2;40 0;40 0;40 0;40 1;40 1;10 0;20 0;10 1;20 2;10 2;20 0"),
                entity(
                        "knots that go down",
                        "«SPLINE;8 a;71 2;40 0;40 0;40 1;40 0;40 1;40 1;10 0;20 0;10 1;20 2;10 2;20 0"),
                entity(
                        "knots are all 0",
                        "«SPLINE;8 a;71 2;40 0;40 0;40 0;40 0;40 0;40 0;10 0;20 0;10 1;20 2;10 2;20 0"),
                entity("2 control points, too few", "«SPLINE;8 a;71 2;40 0;40 0;40 0;40 1;40 1;10 0;20 0;10 1;20 2"),
                entity("a weight of 0.0", "«SPLINE;8 a;71 1;40 0;40 0;40 1;40 1;41 1;41 0;10 0;20 0;10 1;20 2"),
                entity("1 weights for 2", "«SPLINE;8 a;71 1;40 0;40 0;40 1;40 1;41 1;10 0;20 0;10 1;20 2"),
                entity("degree 0", "«SPLINE;8 a;71 0;40 0;40 1;40 1;10 0;20 0;10 1;20 2"),
                entity("POINT has no y", "«POINT;8 a;10 0"),
                Arguments.of(
                        "a group code is wanted; 'ARC'; one too many above; save",
                        DrawnDxf.file("LINE;8 a;10 0;20 0;11 1;21 1;ARC;8 a;10 0;20 0;40 1;50 0;51 9;" + SOUND)
                                .replace("  0\nARC", "«ARC")),
                entity("a group code is wanted; '0.5'", "CIRCLE;8 a;10 0;20 0;40 ×;40 «0.5"),
                Arguments.of(
                        "a group code is wanted; '1072'",
                        DrawnDxf.file("CIRCLE;8 a;10 0;20 0;40 1;1072 3;" + SOUND)
                                .replace("1072\n", "«1072\n")),
                block("inserts the block 'bolt', which the file does not have", "", "«INSERT;8 a;2 bolt;10 0;20 0"),
                block(
                        "inserts the block 'bolt' into itself; take it out",
                        "BLOCK;2 bolt;10 0;20 0;LINE;8 a;10 0;20 0;11 1;21 0;«INSERT;2 bolt;10 1;20 1;ENDBLK",
                        "INSERT;8 a;2 bolt;10 0;20 0"),
                block(
                        "scaled by 0 and 1",
                        "BLOCK;2 bolt;10 0;20 0;LINE;8 a;10 0;20 0;11 1;21 0;ENDBLK",
                        "«INSERT;8 a;2 bolt;10 0;20 0;41 0"),
                block("no y", "BLOCK;2 bolt;10 0;20 0;LINE;8 a;10 0;20 0;11 1;21 0;ENDBLK", "«INSERT;8 a;2 bolt;10 0"),
                block(
                        "'x' is no number",
                        "BLOCK;2 bolt;10 «x;20 0;LINE;8 a;10 0;20 0;11 1;21 0;ENDBLK",
                        "INSERT;8 a;2 bolt;10 0;20 0"));
    }

    /** What is sound besides must be read all the same. */
    @ParameterizedTest
    @MethodSource
    void entities(String words, String marked) {
        DrawnDxf drawn = check(words, marked);
        assertThat(drawn.area("sound")).isEqualTo(drawn.area("sound")).isGreaterThan(3);
    }

    static Stream<Arguments> files() {
        String good = DrawnDxf.file(SOUND);
        return Stream.of(
                Arguments.of("the file is empty; text form", "«"),
                Arguments.of("a group code is wanted", "«hello\nworld\n"),
                Arguments.of("not a DXF file; SECTION", " 10\n«5\n"),
                Arguments.of("not a DXF file; SECTION", "0\n«LINE\n8\na\n"),
                Arguments.of("binary DXF; text form", "«AutoCAD Binary DXF\r\n\u001a\0"),
                Arguments.of("DWG file, named .dxf; text form", "«AC1032\0\0\0\0\0"),
                Arguments.of("NUL character", good.replace("sound", "«so\0und")),
                Arguments.of(
                        "ends within its section ENTITIES; save or copy",
                        good.substring(0, good.indexOf("\n1\n  0\nENDSEC", good.indexOf("CIRCLE"))) + "\n«1"),
                Arguments.of(
                        "ends within its section ENTITIES; save or copy",
                        good.substring(0, good.indexOf(" 20\n", good.indexOf("CIRCLE"))) + "« 20"),
                Arguments.of(
                        "not ended by SEQEND before this ENDSEC; save",
                        DrawnDxf.pairs("SECTION;2 HEADER;9 $INSUNITS;70 6;ENDSEC;SECTION;2 ENTITIES;" + SOUND
                                + ";POLYLINE;8 a;66 1;VERTEX;10 0;20 0;VERTEX;10 1;20 0;«ENDSEC;EOF")),
                Arguments.of("no section ENTITIES", DrawnDxf.pairs("SECTION;2 HEADER;9 $INSUNITS;70 6;ENDSEC;«EOF")),
                Arguments.of("neither the drawing; nor the case; never guessed", good.replace(" 70\n6\n", " 70\n«0\n")),
                Arguments.of(
                        "neither the drawing; nor the case",
                        DrawnDxf.pairs("«SECTION;2 ENTITIES;" + SOUND + ";ENDSEC;EOF")
                                .replace("«SECTION", "SECTION")
                                .replaceFirst("^", "«")),
                Arguments.of("'18'; no unit of a cross-section", good.replace(" 70\n6\n", " 70\n«18\n")),
                Arguments.of("holds nothing that makes an outline; model space", "«" + DrawnDxf.file("999 empty")),
                Arguments.of(
                        "does not end with 0, EOF",
                        good.replaceFirst("  0\nEOF\n", "").replaceFirst("ENDSEC\n$", "«ENDSEC\n")));
    }

    @ParameterizedTest
    @MethodSource
    void files(String words, String marked) {
        check(words, marked);
    }

    private static DrawnDxf check(String words, String marked) {
        List<String> lines = new ArrayList<>(List.of(marked.split("\n", -1)));
        lines.removeIf(l -> l.contains("×"));
        int line = 1;
        while (!lines.get(line - 1).contains("«")) {
            line++;
        }
        byte[] bytes = String.join("\n", lines).replace("«", "").getBytes(StandardCharsets.UTF_8);
        DrawnDxf drawn = DrawnDxf.read(bytes, Optional.empty(), Double.NaN);
        Finding finding = drawn.finding();
        assertThat(finding.place().file()).isEqualTo("part.dxf");
        assertThat(finding.place().line()).as("line of %s", finding).isEqualTo(line);
        assertThat(finding.place().column()).isEqualTo(1);
        assertThat(finding.remedy()).isNotBlank().doesNotEndWith(".");
        for (String word : words.split("; ?")) {
            assertThat(finding.what() + "; " + finding.remedy()).contains(word.strip());
        }
        return drawn;
    }

    @Test
    void allFaultsAreFoundAtOnceButNotWithoutEnd() {
        StringBuilder many = new StringBuilder();
        for (int i = 0; i < 5000; i++) {
            many.append("CIRCLE;8 a;10 x;20 0;40 1\n");
        }
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(many.toString()));
        assertThat(drawn.findings.all()).hasSize(101);
        assertThat(drawn.findings.all().get(100).what()).contains("more faults");
    }

    @Test
    void blocksWithinBlocksDoNotGrowWithoutEnd() {
        StringBuilder blocks = new StringBuilder("BLOCK;2 b0;10 0;20 0;LINE;8 a;10 0;20 0;11 1;21 0;ENDBLK\n");
        for (int i = 1; i < 30; i++) {
            blocks.append("BLOCK;2 b%d;10 0;20 0;INSERT;2 b%d;10 0;20 0;70 100;71 100;44 1;45 1;ENDBLK\n"
                    .formatted(i, i - 1));
        }
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("", blocks.toString(), "INSERT;8 a;2 b29;10 0;20 0"));
        assertThat(drawn.findings.all()).anyMatch(f -> f.code().equals("too-many-entities"));
    }
}
