package tepor.mesher.outline;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;

/** Curved kinds of well-known text are true arcs; areas and lengths are known in closed form. */
class WktCurveTest {
    private static final DrawingUnit MM = new DrawingUnit("mm", 1e-3);
    private static final DrawingUnit METRE = new DrawingUnit("m", 1);

    private static Geometry one(String text, DrawingUnit unit) {
        Findings findings = new Findings();
        Outline outline = WktReader.read("part.wkt", text, unit, findings);
        assertThat(findings.all()).isEmpty();
        assertThat(outline.elements()).hasSize(1);
        return outline.elements().get(0).shape();
    }

    /** Area as a multiple of π, and the rest of it. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "4    | 0  | CURVEPOLYGON (CIRCULARSTRING (2 0, -2 0, 2 0))",
                "4    | 0  | CURVEPOLYGON (CIRCULARSTRING (2 0, 0 2, -2 0, 0 -2, 2 0))",
                "3    | 0  | CURVEPOLYGON (CIRCULARSTRING (2 0, -2 0, 2 0), CIRCULARSTRING (1 0, 0 1, -1 0, 0 -1, 1 0))",
                "0.5  | 4  | curvepolygon (COMPOUNDCURVE ((0 2, 0 0, 2 0, 2 2), CIRCULARSTRING (2 2, 1 3, 0 2)))",
                "-0.5 | 4  | CURVEPOLYGON (COMPOUNDCURVE (LINESTRING (0 2, 0 0, 2 0, 2 2), CIRCULARSTRING (2 2, 1 1, 0 2)))",
                "-1   | 16 | CURVEPOLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), CIRCULARSTRING (1 2, 3 2, 1 2))",
                "1    | 2  | MULTISURFACE (CURVEPOLYGON (CIRCULARSTRING (1 0, -1 0, 1 0)), POLYGON ((5 0, 7 0, 7 1, 5 1, 5 0)))",
                "1    | 2  | MULTISURFACE (((5 0, 7 0, 7 1, 5 1, 5 0)), CURVEPOLYGON (CIRCULARSTRING (1 0, -1 0, 1 0)))",
                "4    | 0  | CURVEPOLYGON Z (CIRCULARSTRING (2 0 1, -2 0 1, 2 0 1))",
            })
    void areasAreExact(double timesPi, double rest, String text) {
        Findings findings = new Findings();
        Geometry shape = WktReader.read("part.wkt", text, METRE, findings)
                .elements()
                .get(0)
                .shape();
        assertThat(findings.hasErrors()).isFalse();
        assertThat(CurveArea.of(shape)).isCloseTo(timesPi * Math.PI + rest, within(1e-13));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1 | 0 | CIRCULARSTRING (0 0, 1 1, 2 0)",
                "2 | 0 | CIRCULARSTRING (0 0, 1 1, 2 0, 3 -1, 4 0)",
                "2 | 0 | CIRCULARSTRING (1 0, -1 0, 1 0)",
                "1 | 3 | COMPOUNDCURVE (CIRCULARSTRING (0 0, 1 1, 2 0), (2 0, 5 0))",
                "1 | 5 | MULTICURVE ((0 7, 5 7), CIRCULARSTRING (0 0, 1 1, 2 0))",
                "1 | 4 | MULTICURVE (COMPOUNDCURVE ((0 0, 2 0), CIRCULARSTRING (2 0, 3 1, 4 0)), LINESTRING (0 9, 2 9))",
                "0 | 4 | CIRCULARSTRING (0 0, 1 0, 4 0)",
            })
    void lengthsAreExact(double timesPi, double rest, String text) {
        Geometry shape = one(text, METRE);
        assertThat(CurveArea.length(shape)).isCloseTo(timesPi * Math.PI + rest, within(1e-14));
    }

    @Test
    void allPiecesOfAnArcShareItsCircleAndTurnByThirtyDegreesAtMost() {
        Polygon disc = (Polygon) one("CURVEPOLYGON (CIRCULARSTRING (140 70, 100 30, 60 70, 100 110, 140 70))", MM);
        LineString ring = disc.getExteriorRing();
        assertThat(ring.getNumPoints()).isEqualTo(13);
        assertThat(ring.isClosed()).isTrue();
        Circle first = Arcs.circle(ring, 0);
        assertThat(List.of(first.x(), first.y())).isEqualTo(List.of(0.1, 0.07));
        assertThat(first.radius()).isCloseTo(0.04, within(1e-16));
        for (int i = 0; i < 12; i++) {
            assertThat(Arcs.circle(ring, i)).isEqualTo(first);
            assertThat(first.offset(ring.getCoordinateN(i).x, ring.getCoordinateN(i).y))
                    .isCloseTo(0, within(1e-16));
        }
    }

    @Test
    void namesAndKindsAreThoseOfTheStraightKinds() {
        Findings findings = new Findings();
        Outline outline = WktReader.read(
                "part.wkt",
                "tube: CURVEPOLYGON (CIRCULARSTRING (2 0, -2 0, 2 0))\nrim: CIRCULARSTRING (2 0, 0 2, -2 0)\n"
                        + "both: MULTICURVE ((0 0, 1 1), CIRCULARSTRING (2 0, 0 2, -2 0))\n",
                MM,
                findings);
        assertThat(findings.all()).isEmpty();
        assertThat(outline.find("tube", OutlineElement.Kind.REGION)).hasSize(1);
        assertThat(outline.find("rim", OutlineElement.Kind.LINE)).hasSize(1);
        assertThat(outline.find("both", OutlineElement.Kind.LINE)).hasSize(1);
    }

    @Test
    void partsThatNearlyMeetAreJoinedWithAWarning() {
        Findings findings = new Findings();
        Outline outline = WktReader.read(
                "part.wkt", "COMPOUNDCURVE (CIRCULARSTRING (0 0, 1 1, 2 0),\n (2 1e-9, 5 0))", METRE, findings);
        assertThat(findings.all()).singleElement().satisfies(f -> {
            assertThat(f.severity()).isEqualTo(Finding.Severity.WARNING);
            assertThat(f.code()).isEqualTo("parts-nearly-meet");
            assertThat(f.place()).isEqualTo(new Place("part.wkt", 2, 3));
            assertThat(f.what()).contains("1e-09 m");
        });
        assertThat(outline.elements()).hasSize(1);
    }

    @Test
    void damagedCurvesNeverHangOrEscape() {
        String sound = "a: CURVEPOLYGON (COMPOUNDCURVE ((0 2, 0 0, 2 0, 2 2), CIRCULARSTRING (2 2, 1 3, 0 2)),\n"
                + " CIRCULARSTRING (1 1, 1.5 1, 1 1))\nb: MULTISURFACE (CURVEPOLYGON (CIRCULARSTRING (1 0, -1 0, 1 0)))\n"
                + "c: MULTICURVE ((0 0, 1 1), COMPOUNDCURVE (CIRCULARSTRING (2 0, 0 2, -2 0), (-2 0, 3 3)))\n";
        String[] shards = {"(", ")", ",", ":", "\n", " ", "EMPTY", "Z", "1e99", "nan", "0", "CIRCULARSTRING", "\0"};
        Random random = new Random(7);
        for (int round = 0; round < 6_000; round++) {
            StringBuilder text = new StringBuilder(sound);
            for (int k = random.nextInt(4); k >= 0; k--) {
                int at = random.nextInt(text.length());
                int until = Math.min(text.length(), at + random.nextInt(5));
                text.replace(at, until, random.nextBoolean() ? shards[random.nextInt(shards.length)] : "");
            }
            Findings findings = new Findings();
            Outline outline = WktReader.read("part.wkt", text.toString(), METRE, findings);
            assertThat(outline.elements().size() + findings.all().size()).isPositive();
        }
    }
}
