package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static tepor.mesher.section.Drawn.wkt;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.util.AffineTransformation;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

class OutlineCheckTest {
    private static final Place PLACE = new Place("case.toml", 7, 1);
    private static final DrawingUnit MILLIMETRE = new DrawingUnit("mm", 0.001);

    /** Checks a drawing in millimetres. */
    private static List<Finding> check(String drawing, boolean sound) {
        Geometry metres = AffineTransformation.scaleInstance(0.001, 0.001).transform(wkt(drawing));
        Findings findings = new Findings();
        assertThat(OutlineCheck.check("bar", metres, PLACE, MILLIMETRE, findings))
                .isEqualTo(sound);
        assertThat(findings.hasErrors()).isEqualTo(!sound);
        assertThat(findings.all()).allSatisfy(f -> {
            assertThat(f.place()).isEqualTo(PLACE);
            assertThat(f.what()).contains("region 'bar'");
            assertThat(f.remedy()).isNotEmpty();
        });
        return findings.all();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "self-crossing  | (2 2) mm          | POLYGON ((0 0, 4 4, 4 0, 0 4, 0 0))",
                "self-crossing  | (10 0) mm         | POLYGON ((0 0, 10 0, 14 4, 14 -4, 10 0, 0 3, 0 0))",
                "self-touching  | (2 0) mm          | POLYGON ((0 0, 4 0, 4 4, 2 0, 0 4, 0 0))",
                "self-touching  | (2 2) mm          | POLYGON ((0 0, 4 0, 4 4, 2 2, 3 3.5, 1 3.5, 2 2, 0 4, 0 0))",
                "self-touching  | (10 0) mm         | POLYGON ((0 0, 10 0, 14 4, 14 -4, 10 0, 0 -3, 0 0))",
                "spike          | (9 0) mm          | POLYGON ((0 0, 9 0, 4 0, 4 4, 0 4, 0 0))",
                "spike          | (0 0) mm          | POLYGON ((0 0, 4 0, 4 4, 2 4, 2 0, 0 0))",
                "self-overlap   | (4 0) mm, (2 0) mm | POLYGON ((0 0, 6 0, 6 4, 4 4, 4 0, 2 0, 2 4, 0 4, 0 0))",
                "zero-area      | (1 1) mm          | POLYGON ((1 1, 2 2, 3 3, 1 1))",
                "zero-area      | (0 0) mm          | POLYGON ((0 0, 1 0, 2 0, 0 0))",
                "hole-outside   | wholly            | POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (5 5, 6 5, 6 6, 5 5))",
                "hole-outside   | partly            | POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (3 3, 6 3, 6 3.5, 3 3))",
                "hole-overlap   | overlap           | POLYGON ((0 0, 9 0, 9 9, 0 9, 0 0), (1 1, 4 1, 4 4, 1 1), (2 1, 5 1, 5 4, 2 1))",
                "hole-overlap   | overlap           | POLYGON ((0 0, 9 0, 9 9, 0 9, 0 0), (1 1, 8 1, 8 8, 1 1), (4 2, 5 2, 5 3, 4 2))",
                "hole-at-side   | a side            | POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (1 0, 3 0, 2 2, 1 0))",
                "falls-apart    | MULTIPOLYGON      | POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (2 0, 3 2, 2 4, 1 2, 2 0))",
                "piece-overlap  | overlap           | MULTIPOLYGON (((0 0, 4 0, 4 4, 0 4, 0 0)), ((3 3, 6 3, 6 6, 3 6, 3 3)))",
                "piece-nested   | 9 mm², at         | MULTIPOLYGON (((0 0, 9 0, 9 9, 0 9, 0 0)), ((3 3, 6 3, 6 6, 3 6, 3 3)))",
                "no-polygon     | encloses no area  | LINESTRING (0 0, 1 1)",
                "no-polygon     | encloses no area  | POLYGON EMPTY",
                "no-polygon     | has no outline    | MULTIPOLYGON EMPTY",
            })
    void faultsAreFoundAndPlaced(String code, String words, String drawing) {
        assertThat(check(drawing, false)).singleElement().satisfies(f -> {
            assertThat(f.code()).isEqualTo(code);
            assertThat(f.what() + f.remedy()).contains(words);
        });
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0))",
                "POLYGON ((0 0, 0 4, 4 4, 4 0, 0 0))",
                "POLYGON ((0 0, 2 0, 4 0, 4 4, 0 4, 0 0))",
                "POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (2 0, 1 1, 3 1, 2 0))",
                "POLYGON ((0 0, 1000000 0, 1000000 0.1, 0 0.1, 0 0))",
                "MULTIPOLYGON (((0 0, 4 0, 4 4, 0 4, 0 0)), ((4 4, 6 4, 6 6, 4 6, 4 4)))",
                "MULTIPOLYGON (((0 0, 4 0, 4 4, 0 4, 0 0)), ((4 1, 6 1, 6 3, 4 3, 4 1)))",
                "MULTIPOLYGON (((0 0, 9 0, 9 9, 0 9, 0 0), (2 2, 7 2, 7 7, 2 7, 2 2)), ((3 3, 6 3, 6 6, 3 6, 3 3)))",
            })
    void soundOutlinesPass(String drawing) {
        assertThat(check(drawing, true)).isEmpty();
    }

    @Test
    void repeatedPointsAreAWarning() {
        assertThat(check("POLYGON ((0 0, 4 0, 4 0, 4 4, 0 4, 0 0))", true))
                .singleElement()
                .satisfies(f -> {
                    assertThat(f.code()).isEqualTo("repeated-point");
                    assertThat(f.what()).contains("(4 0) mm");
                });
    }

    @Test
    void allFaultsOfAllRingsAreFoundAtOnce() {
        List<Finding> found = check(
                "MULTIPOLYGON (((0 0, 4 4, 4 0, 0 4, 0 0)),"
                        + " ((20 0, 30 0, 30 9, 20 9, 20 0), (21 1, 24 4, 24 1, 21 4, 21 1), (25 5, 26 6, 27 7, 25 5)))",
                false);
        assertThat(found).extracting(Finding::code).containsExactly("self-crossing", "self-crossing", "zero-area");
    }

    @Test
    void aPolygonThatCrossesItselfTwiceNamesBothPlaces() {
        assertThat(check("POLYGON ((0 0, 12 0, 12 4, 9 -2, 6 4, 0 4, 0 0))", false))
                .singleElement()
                .satisfies(f -> assertThat(f.what()).contains("(10 0) mm", "(8 0) mm"));
    }
}
