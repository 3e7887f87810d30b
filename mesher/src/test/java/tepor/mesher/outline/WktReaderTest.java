package tepor.mesher.outline;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;

class WktReaderTest {
    private static final DrawingUnit METRE = new DrawingUnit("m", 1);
    private static final DrawingUnit MILLIMETRE = new DrawingUnit("mm", 0.001);

    private static Outline read(String text) {
        Findings findings = new Findings();
        Outline outline = WktReader.read("part.wkt", text, METRE, findings);
        assertThat(findings.all()).isEmpty();
        return outline;
    }

    @Test
    void recordsHaveNamesKindsAndPlaces() {
        Outline outline = read("""
                # a duct
                resin: POLYGON ((0 0, 4 0, 4 3, 0 0))   # the body

                  bars:
                    MULTIPOLYGON (((0 0, 1 0, 1 1, 0 0)),
                      # the second one
                      ((2 0, 3 0,
                        3 1, 2 0)))
                LineString(0 0,1 1)
                probe : point ( 1.5 -2e-1 )
                probes: MULTIPOINT ((0 0), (1 1))
                more: MULTIPOINT (0 0, 1 1)
                both: MULTILINESTRING ((0 0, 1 1), (2 2, 3 3))
                """);
        assertThat(outline.elements())
                .extracting(OutlineElement::name)
                .containsExactly("resin", "bars", "", "probe", "probes", "more", "both");
        assertThat(outline.elements())
                .extracting(OutlineElement::kind)
                .containsExactly(
                        OutlineElement.Kind.REGION,
                        OutlineElement.Kind.REGION,
                        OutlineElement.Kind.LINE,
                        OutlineElement.Kind.POINT,
                        OutlineElement.Kind.POINT,
                        OutlineElement.Kind.POINT,
                        OutlineElement.Kind.LINE);
        assertThat(outline.elements().get(1).place()).isEqualTo(new Place("part.wkt", 4, 3));
        assertThat(outline.elements().get(1).shape().getArea()).isEqualTo(1);
        assertThat(outline.elements().get(3).shape().getCoordinate()).isEqualTo(new Coordinate(1.5, -0.2));
        assertThat(outline.elements().get(5).shape().getNumGeometries()).isEqualTo(2);
    }

    @Test
    void namesMayHoldNearlyAnything() {
        Outline outline = read("""
                "outer skin" of d.c. bar: POINT (0 0)
                Wärmedämmung – äußere (neu): POINT (0 0)
                point: POINT (0 0)
                polygon (old): POINT (0 0)
                a: b: POINT (0 0)
                1: POINT (0 0)
                """);
        assertThat(outline.elements())
                .extracting(OutlineElement::name)
                .containsExactly(
                        "\"outer skin\" of d.c. bar",
                        "Wärmedämmung – äußere (neu)",
                        "point",
                        "polygon (old)",
                        "a: b",
                        "1");
    }

    @Test
    void lineEndsAndByteOrderMarkAreHarmless() {
        for (String end : List.of("\n", "\r\n", "\r")) {
            Outline outline = read("\uFEFFa:" + end + "POINT (1" + end + "2)" + end + end + "b: POINT (3 4)" + end);
            assertThat(outline.elements())
                    .extracting(OutlineElement::place)
                    .containsExactly(new Place("part.wkt", 1, 1), new Place("part.wkt", 5, 1));
        }
    }

    @Test
    void namesMayRepeat() {
        Outline outline = read("a: POINT (0 0)\na: POINT (1 1)\na: LINESTRING (0 0, 1 1)");
        assertThat(outline.find("a", OutlineElement.Kind.POINT)).hasSize(2);
        assertThat(outline.find("a", OutlineElement.Kind.REGION)).isEmpty();
    }

    @Test
    void coordinatesBecomeMetres() {
        Findings findings = new Findings();
        Coordinate[] points = WktReader.readGeometry(
                        "LINESTRING (200 0.1, 57 -1e3, 1.1 33.25)", new Place("case.toml", 3, 1), MILLIMETRE, findings)
                .orElseThrow()
                .getCoordinates();
        assertThat(points)
                .containsExactly(new Coordinate(0.2, 1e-4), new Coordinate(0.057, -1), new Coordinate(1.1e-3, 0.03325));
        DrawingUnit inch = new DrawingUnit("in", 0.0254);
        assertThat(inch.toMetres(10)).isEqualTo(0.254);
        assertThat(MILLIMETRE.toMetres(43)).isEqualTo(0.043); // 43 * 0.001 is not
        assertThat(43 * 0.001).isNotEqualTo(0.043);
    }

    @Test
    void noNegativeZeroComesOut() {
        Coordinate at = read("POINT (-0 -0.0)").elements().get(0).shape().getCoordinate();
        assertThat(Double.doubleToRawLongBits(at.x)).isZero();
        assertThat(Double.doubleToRawLongBits(at.y)).isZero();
    }

    @Test
    void furtherCoordinatesAreLeftOutWithAWarning() {
        for (String text : List.of(
                "POINT Z (1 2 3)", "POINTZ (1 2 3)", "POINT M (1 2 3)", "POINT ZM (1 2 3 4)", "point z(1 2 3)")) {
            Findings findings = new Findings();
            Outline outline = WktReader.read("part.wkt", text, METRE, findings);
            assertThat(outline.elements().get(0).shape().getCoordinate()).isEqualTo(new Coordinate(1, 2));
            assertThat(findings.all()).singleElement().satisfies(f -> {
                assertThat(f.severity()).isEqualTo(Finding.Severity.WARNING);
                assertThat(f.what()).contains("only x and y");
            });
        }
    }

    @Test
    void aRingThatClosesButForRoundOffIsClosedWithAWarning() {
        Findings findings = new Findings();
        Outline outline = WktReader.read("part.wkt", "POLYGON ((0 0, 4 0, 4 3, 1e-8 0))", METRE, findings);
        Coordinate[] ring = outline.elements().get(0).shape().getCoordinates();
        assertThat(ring[3]).isEqualTo(new Coordinate(0, 0));
        assertThat(findings.all()).extracting(Finding::code).containsExactly("ring-nearly-closed");
        assertThat(findings.hasErrors()).isFalse();
    }

    @Test
    void allFaultsOfAFileAreReportedAndTheRestIsRead() {
        Findings findings = new Findings();
        Outline outline = WktReader.read("part.wkt", """
                a: POLYGON ((0 0, 4 0, 4 3, 0 1))
                b: POINT (1 1)
                c: POLYGN ((0 0, 1 0,
                   1 1, 0 0))
                d: LINESTRING (0 nan, 1 1e400)
                e: POLYGON ((0 0, 1 0, 1 1, 0 0)
                f: POINT (2 2)
                g: POINT (3 3) and more
                h: POINT (4 4)
                """, METRE, findings);
        assertThat(outline.elements()).extracting(OutlineElement::name).containsExactly("b", "f", "g", "h");
        assertThat(findings.all())
                .extracting(Finding::place)
                .containsExactly(
                        new Place("part.wkt", 1, 29),
                        new Place("part.wkt", 3, 4),
                        new Place("part.wkt", 5, 18),
                        new Place("part.wkt", 5, 25),
                        new Place("part.wkt", 7, 1),
                        new Place("part.wkt", 8, 16));
    }

    @Test
    void aGeometryInACaseSaysWhichPartIsWrong() {
        Findings findings = new Findings();
        Place place = new Place("case.toml", 12, 1);
        assertThat(WktReader.readGeometry("POLYGON ((0 0, 4 0, 4 x, 0 0))", place, METRE, findings))
                .isEmpty();
        assertThat(findings.all()).singleElement().satisfies(f -> {
            assertThat(f.place()).isEqualTo(place);
            assertThat(f.what()).contains("'x'", "character 23", "4 0, 4 x, 0 0");
        });
        Findings more = new Findings();
        assertThat(WktReader.readGeometry("POINT (1 1) POINT (2 2)", place, METRE, more))
                .isEmpty();
        assertThat(more.all()).extracting(Finding::code).containsExactly("text-after-geometry");
        Findings none = new Findings();
        assertThat(WktReader.readGeometry(" ", place, METRE, none)).isEmpty();
        assertThat(none.all()).extracting(Finding::code).containsExactly("no-geometry");
        Findings fine = new Findings();
        assertThat(WktReader.readGeometry("\n POINT (1 1)\n", place, METRE, fine))
                .isPresent();
    }
}
