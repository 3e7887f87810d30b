package tepor.mesher.dxf;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;

/** Whole drawings: blocks, layers, loops of many pieces, releases, code pages. */
class DrawingTest {
    /** A D of area 2 + π/2, its straight side from (0 −1) to (0 1), bulging to the right by 2. */
    private static final String D =
            "BLOCK;8 0;2 D;70 0;10 0;20 0;LWPOLYLINE;8 0;90 4;70 1;10 0;20 -1;10 1;20 -1;42 1;10 1;20 1;10 0;20 1;ENDBLK";

    private static final double AREA_OF_D = 2 + Math.PI / 2;

    @Test
    void blocksAreLaidWithScaleTurnAndBasePointOnTheLayerOfTheirInsert() {
        String blocks = D.replace("2 D;70 0;10 0;20 0", "2 D;70 0;10 1;20 0");
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("", blocks, "INSERT;8 bars;2 d;10 10;20 20;41 3;42 3;50 90"))
                .sound();
        assertThat(drawn.area("bars")).isCloseTo(9 * AREA_OF_D, within(1e-12));
        // The base point, middle of the arc's chord, comes to lie at (10 20); the arc bulges upwards by 3.
        assertThat(drawn.regions("bars").get(0).getEnvelopeInternal().getMaxY()).isCloseTo(23, within(1e-12));
        assertThat(drawn.regions("bars").get(0).getEnvelopeInternal().getMinY()).isCloseTo(17, within(1e-12));
        assertThat(drawn.regions("bars").get(0).getEnvelopeInternal().getMinX()).isCloseTo(7, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                // scales, extrusion | area in D's | lowest and highest x
                "41 -1;42 1          | 1  | -2 | 0",
                "41 1;42 -1          | 1  | 0  | 2",
                "41 -2;42 -2         | 4  | -4 | 0",
                "50 180              | 1  | -2 | 0",
                "210 0;220 0;230 -1  | 1  | -2 | 0",
                "41 -1;230 -1        | 1  | 0  | 2",
                "50 -180;41 -1       | 1  | 0  | 2",
            })
    void mirroredBlocksAreMirrored(String how, double times, double low, double high) {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("", D, "INSERT;8 a;2 D;10 0;20 0;" + how))
                .sound();
        assertThat(drawn.area("a")).isCloseTo(times * AREA_OF_D, within(1e-12));
        assertThat(drawn.regions("a").get(0).getEnvelopeInternal().getMinX()).isCloseTo(low, within(1e-12));
        assertThat(drawn.regions("a").get(0).getEnvelopeInternal().getMaxX()).isCloseTo(high, within(1e-12));
    }

    @Test
    void unequalScalesMakeEllipses() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("", D, "INSERT;8 a;2 D;10 0;20 0;41 -3;42 2;50 30"))
                .sound();
        assertThat(drawn.area("a")).isCloseTo(6 * AREA_OF_D, within(6 * AREA_OF_D * 2e-5));
        String blocks = "BLOCK;2 O;10 0;20 0;CIRCLE;8 0;10 0;20 0;40 1;ELLIPSE;8 e;10 5;20 0;11 0;21 2;40 0.5;ENDBLK;";
        DrawnDxf round = DrawnDxf.read(DrawnDxf.file("", blocks, "INSERT;8 a;2 O;10 0;20 0;41 2;42 1"))
                .sound();
        assertThat(round.area("a")).isCloseTo(2 * Math.PI, within(1e-4));
        // The ellipse becomes a circle of radius 2, and is one exactly.
        assertThat(round.area("e")).isCloseTo(4 * Math.PI, within(1e-13));
        assertThat(round.regions("e").get(0).getNumPoints()).isEqualTo(13);
    }

    @Test
    void arraysOfBlocksAndBlocksInBlocks() {
        String blocks = D + ";BLOCK;2 pair;10 0;20 0;INSERT;8 0;2 D;10 0;20 0;INSERT;8 own;2 D;10 10;20 0;ENDBLK";
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(
                        "", blocks, "INSERT;8 a;2 pair;10 100;20 0;50 90;70 3;71 2;44 20;45 5;41 0.5;42 0.5"))
                .sound();
        assertThat(drawn.regions("a")).hasSize(6);
        assertThat(drawn.regions("own")).hasSize(6);
        assertThat(drawn.area("a")).isCloseTo(6 * AREA_OF_D / 4, within(1e-12));
        double top = drawn.regions("a").stream()
                .mapToDouble(g -> g.getEnvelopeInternal().getMaxY())
                .max()
                .orElse(0);
        double left = drawn.regions("a").stream()
                .mapToDouble(g -> g.getEnvelopeInternal().getMinX())
                .min()
                .orElse(0);
        // Columns run upwards, rows to the left, with their spacing unscaled.
        assertThat(top).isCloseTo(2 * 20 + 1, within(1e-12));
        assertThat(left).isCloseTo(100 - 5 - 0.5, within(1e-12));
    }

    @Test
    void whatIsPassedOverIsCountedAndListedOnce() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(
                "LAYER;2 hidden;70 1;62 7;LAYER;2 OFF;70 0;62 -3;LAYER;2 plain;70 4;62 1",
                D + ";BLOCK;2 tag;10 0;20 0;TEXT;8 notes;1 x;LINE;8 0;10 0;20 0;11 1;21 0;ENDBLK",
                """
                CIRCLE;8 plain;10 0;20 0;40 1
                TEXT;8 notes;10 0;20 0;1 hello
                TEXT;8 notes;10 0;20 0;1 hello
                MTEXT;8 notes;1 hello
                HATCH;8 plain;10 0;20 0
                DIMENSION;8 dims;10 0
                LINE;8 hidden;10 0;20 0;11 1;21 1
                LINE;8 off;10 0;20 0;11 1;21 1
                LINE;8 plain;67 1;10 0;20 0;11 1;21 1
                LINE;8 plain;60 1;10 0;20 0;11 1;21 1
                CIRCLE;8 plain;10 0;20 0;40 1;210 1;220 0;230 0
                SPLINE;8 plain;71 3;11 0;21 0;11 1;21 1
                POLYLINE;8 plain;70 64;VERTEX;10 0;20 0;SEQEND
                LINE;8 plain;10 4;20 4;11 4;21 4
                INSERT;8 hidden;2 tag;10 0;20 0
                INSERT;8 off;2 tag;10 0;20 0
                INSERT;8 plain;2 tag;66 1;10 5;20 5;ATTRIB;8 plain;SEQEND
                """));
        Finding finding = drawn.finding();
        assertThat(finding.severity()).isEqualTo(Finding.Severity.WARNING);
        assertThat(finding.what())
                .startsWith("17 entities are passed over: 4 TEXT on layer 'notes', 1 MTEXT on layer 'notes',"
                        + " 1 HATCH on layer 'plain', 1 DIMENSION on layer 'dims' (kinds that draw no outline)")
                .contains(
                        "1 LINE on layer 'hidden', 2 LINE on layer 'OFF', 1 INSERT on layer 'hidden' (on layers that are off")
                .contains("1 LINE on layer 'plain' (marked as invisible)")
                .contains("1 LINE on layer 'plain' (in paper space)")
                .contains("1 CIRCLE on layer 'plain' (drawn in a plane")
                .contains("1 POLYLINE on layer 'plain' (meshes")
                .contains("1 SPLINE on layer 'plain' (given by fit points only")
                .contains("1 LINE on layer 'plain' (without length)");
        assertThat(drawn.area("plain")).isCloseTo(Math.PI, within(1e-14));
        assertThat(drawn.length("plain")).isEqualTo(1);
    }

    @Test
    void heightsAndWidthsAreLeftOutWithANote() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                POLYLINE;8 a;66 1;70 9;10 0;20 0;30 0;VERTEX;10 0;20 0;30 5;VERTEX;10 2;20 0;30 5;VERTEX;10 2;20 2;30 5;SEQEND
                LINE;8 b;10 0;20 0;30 0;11 3;21 4;31 12
                LWPOLYLINE;8 c;90 2;43 0.5;38 7;10 0;20 9;10 1;20 9
                """));
        assertThat(drawn.findings.all())
                .extracting(Finding::code)
                .containsExactlyInAnyOrder("heights", "polyline-width");
        assertThat(drawn.findings.all()).anyMatch(f -> f.what().startsWith("3 entities lie at a height"));
        assertThat(drawn.area("a")).isEqualTo(2);
        assertThat(drawn.length("b")).isEqualTo(5);
    }

    @Test
    void namesOfLayersKeepBlanksUmlautsAndEscapes() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("LAYER;2 Träger 1;70 0;62 7", "", """
                CIRCLE;8 TRÄGER 1;10 0;20 0;40 1
                CIRCLE;8 D\\U+00E4mmung %%d;10 0;20 0;40 2
                CIRCLE;8 100%%% fett;10 0;20 0;40 3
                """))
                .sound();
        assertThat(drawn.area("Träger 1")).isCloseTo(Math.PI, within(1e-14));
        assertThat(drawn.area("Dämmung °")).isCloseTo(4 * Math.PI, within(1e-13));
        assertThat(drawn.area("100% fett")).isCloseTo(9 * Math.PI, within(1e-13));
    }

    @ParameterizedTest
    @CsvSource({
        "AC1015, ANSI_1252, windows-1252",
        "AC1018, ansi_1250, windows-1250",
        "AC1009, dos850, IBM850",
        "AC1032, ANSI_1252, UTF-8",
        "AC1021, ANSI_1252, UTF-8"
    })
    void codePagesOfOldAndNewReleases(String version, String page, String charset) {
        String text = DrawnDxf.file("CIRCLE;8 Träger;10 0;20 0;40 1")
                .replace("AC1032\n", version + "\n  9\n$DWGCODEPAGE\n  3\n" + page + "\n");
        DrawnDxf drawn = DrawnDxf.read(text.getBytes(Charset.forName(charset)), Optional.empty(), Double.NaN)
                .sound();
        assertThat(drawn.regions("Träger")).hasSize(1);
    }

    @Test
    void aByteOrderMarkCountsForMoreThanTheCodePage() {
        String text = "\uFEFF"
                + DrawnDxf.file("CIRCLE;8 Träger;10 0;20 0;40 1")
                        .replace("AC1032\n", "AC1015\n  9\n$DWGCODEPAGE\n  3\nANSI_1252\n");
        assertThat(DrawnDxf.read(text).sound().regions("Träger")).hasSize(1);
    }

    @Test
    void anUnknownCodePageIsSaid() {
        String text = DrawnDxf.file("CIRCLE;8 Träger;10 0;20 0;40 1")
                .replace("AC1032\n", "AC1015\n  9\n$DWGCODEPAGE\n  3\nANSI_77\n");
        DrawnDxf drawn = DrawnDxf.read(text.getBytes(Charset.forName("windows-1252")), Optional.empty(), Double.NaN);
        assertThat(drawn.finding().what()).contains("'ANSI_77'", "windows-1252");
        assertThat(drawn.regions("Träger")).hasSize(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"\n", "\r\n", "\r"})
    void anyLineEndsTrailingBlanksAndCommentsWillDo(String end) {
        String text = DrawnDxf.pairs("999 saved by hand") + DrawnDxf.file("CIRCLE;8 a b;999 comment;10 0;20 0;40 1");
        DrawnDxf drawn = DrawnDxf.read("\uFEFF" + text.replace("\n", " \t" + end) + end + end)
                .sound();
        assertThat(drawn.area("a b")).isCloseTo(Math.PI, within(1e-14));
    }

    @Test
    void aDrawingOfReleaseTwelveNeedsNoHeaderTablesOrHandles() {
        String text = DrawnDxf.pairs(
                "SECTION;2 ENTITIES;LINE;8 0;10 0.0;20 0.0;11 2.0;21 0.0;LINE;8 0;10 2.0;20 0.0;11 2.0;21 1.0;"
                        + "POLYLINE;8 0;66 1;70 0;10 0.0;20 0.0;30 0.0;VERTEX;8 0;10 2.0;20 1.0;VERTEX;8 0;10 0.0;20 1.0;"
                        + "VERTEX;8 0;10 0.0;20 0.0;SEQEND;8 0;ENDSEC;EOF");
        DrawnDxf drawn = DrawnDxf.read(
                        text.getBytes(StandardCharsets.US_ASCII), Optional.of(new DrawingUnit("cm", 0.01)), Double.NaN)
                .sound();
        assertThat(drawn.area("0")).isCloseTo(2e-4, within(1e-19));
    }

    @ParameterizedTest
    @CsvSource({"1, 0.0254", "2, 0.3048", "4, 1e-3", "5, 1e-2", "6, 1", "13, 1e-6", "14, 0.1", "9, 2.54e-5"})
    void unitsOfTheHeader(int number, double metres) {
        String text = DrawnDxf.file("LINE;8 a;10 0;20 0;11 3;21 0").replace(" 70\n6\n", " 70\n     " + number + "\n");
        DrawnDxf drawn = DrawnDxf.read(text).sound();
        assertThat(drawn.length("a")).isCloseTo(3 * metres, within(1e-15));
        assertThat(drawn.outline.unit().metres()).isEqualTo(metres);
    }

    @Test
    void theUnitOfTheCaseGoesBefore() {
        byte[] text = DrawnDxf.file("LINE;8 a;10 0;20 0;11 3;21 0").getBytes(StandardCharsets.UTF_8);
        DrawnDxf drawn = DrawnDxf.read(text, Optional.of(new DrawingUnit("mm", 1e-3)), Double.NaN);
        assertThat(drawn.length("a")).isEqualTo(0.003);
        assertThat(drawn.finding().code()).isEqualTo("unit-differs");
        DrawnDxf same = DrawnDxf.read(text, Optional.of(new DrawingUnit("m", 1)), Double.NaN);
        same.sound();
    }

    @Test
    void loopsThatDoNotCloseAreReportedWithPlaceAndWidthOfTheGap() {
        String entities = """
                LINE;8 a;10 0;20 0;11 2;21 0
                LINE;8 a;10 2;20 0.01;11 2;21 2
                LINE;8 a;10 2;20 2;11 0;21 2
                LINE;8 a;10 0;20 2;11 0;21 0.0000001
                """;
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(entities));
        Finding gap = drawn.finding();
        assertThat(gap.code()).isEqualTo("loop-not-closed");
        assertThat(gap.what()).contains("'a'", "(2 0) m", "(2 0.01) m", "gap of 0.01 m");
        assertThat(gap.remedy()).contains("snap");
        assertThat(drawn.regions("a")).isEmpty();
        assertThat(drawn.lines("a")).hasSize(1);
        DrawnDxf closed = DrawnDxf.read(DrawnDxf.file(entities), 0.02).sound();
        assertThat(closed.regions("a")).hasSize(1);
        assertThat(closed.area("a")).isCloseTo(4, within(0.02));
    }

    @Test
    void aLoopOfOneChainAndOneOfTwoMayFailToClose() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LWPOLYLINE;8 a;90 4;10 0;20 0;10 2;20 0;10 2;20 2;10 0;20 0.05
                ARC;8 b;10 0;20 0;40 5;50 0.5;51 180
                ARC;8 b;10 0;20 0;40 5;50 181;51 359
                LINE;8 c;10 0;20 0;11 9;21 0
                """));
        assertThat(drawn.findings.all()).hasSize(3).allMatch(f -> f.code().equals("loop-not-closed"));
        assertThat(drawn.findings.all().get(0).what()).contains("gap of 0.05 m");
    }

    @Test
    void whatIsDrawnTwiceIsTakenOnce() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LINE;8 a;10 0;20 0;11 2;21 0
                LINE;8 a;10 2;20 0;11 0;21 0
                LINE;8 a;10 0.5;20 0;11 1.5;21 0
                LINE;8 a;10 2;20 0;11 2;21 2
                LINE;8 a;10 2;20 1;11 2;21 2
                ARC;8 a;10 1;20 2;40 1;50 0;51 180
                ARC;8 a;10 1;20 2;40 1;50 20;51 120
                LINE;8 a;10 0;20 2;11 0;21 0
                CIRCLE;8 b;10 0;20 0;40 1
                ARC;8 b;10 0;20 0;40 1;50 10;51 190
                ARC;8 b;10 0;20 0;40 1;50 190;51 10
                LWPOLYLINE;8 b;90 2;70 1;10 0;20 1;42 1;10 0;20 -1;42 1
                """));
        assertThat(drawn.findings.all()).hasSize(2).allMatch(f -> f.code().equals("drawn-twice"));
        assertThat(drawn.findings.all().get(0).what()).contains("'a' 4 entities");
        assertThat(drawn.findings.all().get(1).what()).contains("'b' 2 entities");
        assertThat(drawn.area("a")).isCloseTo(4 + Math.PI / 2, within(1e-13));
        assertThat(drawn.lines("a")).isEmpty();
        assertThat(drawn.regions("b")).hasSize(1);
        assertThat(drawn.area("b")).isCloseTo(Math.PI, within(1e-14));
    }

    @Test
    void segmentsThatOverlapBecomeOneLine() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LINE;8 a;10 0;20 0;11 2;21 0
                LINE;8 a;10 3;20 0;11 1;21 0
                LINE;8 a;10 2.5;20 0;11 5;21 0
                """));
        assertThat(drawn.finding().code()).isEqualTo("drawn-twice");
        assertThat(drawn.lines("a")).hasSize(1);
        assertThat(drawn.length("a")).isCloseTo(5, within(1e-15));
    }

    @Test
    void loopsThatBranchAreTakenOneByOneWithANote() {
        // A square with a middle wall between its sides' middles, which are points of theirs; and a stray end.
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LWPOLYLINE;8 a;90 4;10 1;20 0;10 0;20 0;10 0;20 2;10 1;20 2
                LWPOLYLINE;8 a;90 4;10 1;20 0;10 2;20 0;10 2;20 2;10 1;20 2
                LINE;8 a;10 1;20 0;11 1;21 2
                LINE;8 a;10 1;20 0;11 1;21 -1
                """));
        Finding finding = drawn.finding();
        assertThat(finding.code()).isEqualTo("loops-branch");
        assertThat(finding.what()).contains("(1 0) m, (1 2) m".substring(0, 7));
        assertThat(drawn.regions("a")).hasSize(2);
        assertThat(drawn.area("a")).isEqualTo(4);
        assertThat(drawn.length("a")).isEqualTo(1);
    }

    @Test
    void loopsThatTouchInACornerAreTwo() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LINE;8 a;10 0;20 0;11 1;21 0
                LINE;8 a;10 1;20 0;11 1;21 1
                LINE;8 a;10 1;20 1;11 0;21 1
                LINE;8 a;10 0;20 1;11 0;21 0
                LINE;8 a;10 1;20 1;11 2;21 1
                LINE;8 a;10 2;20 1;11 2;21 2
                LINE;8 a;10 2;20 2;11 1;21 2
                LINE;8 a;10 1;20 2;11 1;21 1
                """)).sound();
        assertThat(drawn.regions("a")).hasSize(2);
        assertThat(drawn.area("a")).isEqualTo(2);
    }

    @Test
    void aLoopWithinThatTouchesIsAHole() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LWPOLYLINE;8 a;90 5;10 0;20 0;10 4;20 0;10 4;20 4;10 0;20 4;10 0;20 0
                LWPOLYLINE;8 a;90 4;10 0;20 0;10 2;20 1;10 1;20 2;10 0;20 0
                """)).sound();
        assertThat(drawn.regions("a")).hasSize(1);
        assertThat(drawn.area("a")).isCloseTo(16 - 1.5, within(1e-13));
    }

    @Test
    void endsOfArcsStandForTheEndsThatMeetThem() {
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file("""
                LINE;8 a;10 -2.0000002;20 0.0000001;11 2.0000001;21 -0.0000002
                ARC;8 a;10 0;20 0;40 2;50 0;51 180
                """)).sound();
        Geometry half = drawn.regions("a").get(0);
        for (Coordinate c : half.getCoordinates()) {
            assertThat(Math.hypot(c.x, c.y)).isCloseTo(2, within(1e-15));
        }
    }

    @Test
    void aThousandCirclesOnALayerAreAThousandAreas() {
        StringBuilder text =
                new StringBuilder("LWPOLYLINE;8 plate;90 4;70 1;10 -1;20 -1;10 100;20 -1;10 100;20 100;10 -1;20 100\n");
        for (int i = 0; i < 1000; i++) {
            text.append("CIRCLE;8 plate;10 %d;20 %d;40 0.4\n".formatted(3 * (i % 32), 3 * (i / 32)));
        }
        DrawnDxf drawn = DrawnDxf.read(DrawnDxf.file(text.toString())).sound();
        assertThat(drawn.regions("plate")).hasSize(1);
        assertThat(drawn.area("plate")).isCloseTo(101 * 101 - 1000 * Math.PI * 0.16, within(1e-9));
    }
}
