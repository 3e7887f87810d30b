package tepor.mesher.mending;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.operation.overlayng.OverlayNGRobust;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Finding.Severity;
import tepor.mesher.section.RegionShape;

/** Faulty outlines: what is said of each (code, place, size, remedy), and that the mended one is sound. */
class FaultyOutlineTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                // code | place | size | remedy | area after mending, mm² | drawing, mm
                "self-crossing | (50 50) mm | crosses itself | do not cross | 5000"
                        + "| POLYGON ((0 0, 100 100, 100 0, 0 100, 0 0))",
                "self-crossing | (10 5) mm | crosses itself | do not cross | 300"
                        + "| POLYGON ((0 0, 20 10, 20 0, 0 10, 0 40, -10 40, 0 0))",
                "self-touching | (50 0) mm | touches itself | a hole of its own | 5000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 50 0, 0 100, 0 0))",
                "self-touching | (2 2) mm | touches itself | a hole of its own | 12.5"
                        + "| POLYGON ((0 0, 4 0, 4 4, 2 2, 3 3.5, 1 3.5, 2 2, 0 4, 0 0))",
                "spike | (9 0) mm | over 5 mm | take the spike's point out | 16"
                        + "| POLYGON ((0 0, 9 0, 4 0, 4 4, 0 4, 0 0))",
                "spike | (0 9) mm | over 5 mm | take the spike's point out | 16"
                        + "| POLYGON ((0 0, 4 0, 4 4, 0 4, 0 9, 0 0))",
                "needle | (150 0) mm | 50 mm long and 0.005 mm wide | take its point out | 10000"
                        + "| POLYGON ((0 0, 100 0, 150 0, 100 0.005, 100 100, 0 100, 0 0))",
                "needle | (50 50) mm | 50 mm long and 0.005 mm wide | take its point out | 10000"
                        + "| POLYGON ((0 0, 100 0, 100 50, 50 50, 100 50.005, 100 100, 0 100, 0 0))",
                "self-overlap | (40 0) mm, (20 0) mm | over 20 mm | draw each side once | 1600"
                        + "| POLYGON ((0 0, 60 0, 60 40, 40 40, 40 0, 20 0, 20 40, 0 40, 0 0))",
                "hole-outside | (307.5 5) mm | with 50 mm² | keep holes within | 10000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0), (300 0, 310 0, 310 10, 300 0))",
                "hole-outside | (110 50) mm | with 400 mm² | draw the notch | 9800"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0), (90 40, 120 40, 120 60, 90 60, 90 40))",
                "ring-order | (0 0) mm | outer ring | outer ring first | 9600"
                        + "| POLYGON ((40 40, 60 40, 60 60, 40 60, 40 40), (0 0, 100 0, 100 100, 0 100, 0 0))",
                "hole-overlap | (35 35) mm | with 100 mm² | join them | 9300"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0), (20 20, 40 20, 40 40, 20 40, 20 20),"
                        + " (30 30, 50 30, 50 50, 30 50, 30 30))",
                "hole-overlap | (35 35) mm | with 100 mm² | join them | 9100"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0), (20 20, 50 20, 50 50, 20 50, 20 20),"
                        + " (30 30, 40 30, 40 40, 30 40, 30 30))",
                "hole-at-side | (10 0) mm | shares a side | draw the notch | 9900"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0), (10 0, 20 0, 20 10, 10 10, 10 0))",
                "falls-apart | mm | cut in parts | pieces of a MULTIPOLYGON | 8"
                        + "| POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (2 0, 4 2, 2 4, 0 2, 2 0))",
                "piece-overlap | (75 75) mm | with 2500 mm² | join them to one | 17500"
                        + "| MULTIPOLYGON (((0 0, 100 0, 100 100, 0 100, 0 0)),"
                        + " ((50 50, 150 50, 150 150, 50 150, 50 50)))",
                "piece-nested | (50 50) mm | with 400 mm² | draw it as a hole | 10000"
                        + "| MULTIPOLYGON (((0 0, 100 0, 100 100, 0 100, 0 0)), ((40 40, 60 40, 60 60, 40 60, 40 40)))",
                "repeated-point | (100 0) mm | repeated points | write each point once | 10000"
                        + "| POLYGON ((0 0, 100 0, 100 0, 100 100, 0 100, 0 0))",
                "near-points | (100 0) mm | 5e-05 mm apart | draw one point | 10000"
                        + "| POLYGON ((0 0, 100 0, 100.00005 0, 100.00005 100, 0 100, 0 0))",
                "gap | (100.005 50) mm | 0.01 mm wide over a length of 100 mm | state snap | 20000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((100.01 0, 200 0, 200 100, 100.01 100, 100.01 0))",
                "gap | (100.00005 50) mm | 0.0001 mm wide over a length of 100 mm | draw them touching | 20000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((100.0001 0, 200 0, 200 100, 100.0001 100, 100.0001 0))",
                "gap | mm | 0.01 mm wide over a length of 100 mm | draw them touching | 24000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((100.01 -20, 200 -20, 200 120, 100.01 120, 100.01 -20))",
                "sliver | (99.995 50) mm | 0.01 mm wide over a length of 100 mm | draw them touching | 20000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((99.99 0, 200 0, 200 100, 99.99 100, 99.99 0))",
                "sliver | mm | to 0.005 mm wide over a length of 99.5... mm | draw them touching | 20000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((100 0, 200 0, 200 100, 100 100, 99.995 50, 100 0))",
                "strip | (100 0.00025) mm | 0.0005 mm wide over a length of 100 mm | draw them touching | 20000"
                        + "| POLYGON ((0 0, 200 0, 200 100, 0 100, 0 0));"
                        + " POLYGON ((50 0.0005, 150 0.0005, 150 50, 50 50, 50 0.0005))",
                "slit | (100.0025 50) mm | 0.005 mm wide over a length of 100 mm | a region of nothing | 20000"
                        + "| MULTIPOLYGON (((0 0, 100 0, 100 100, 0 100, 0 0)),"
                        + " ((100.005 0, 200 0, 200 100, 100.005 100, 100.005 0)))",
                "near-miss | (100.0001 50) mm | within 0.0001 mm of each other | touching, or farther apart | 12500"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((100.0001 50, 150 0, 150 100, 100.0001 50))",
                "drawn-twice | 'a' and 'b' | of 10000 mm² | leave one of them out | 10000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0)); POLYGON ((100 0, 100 100, 0 100, 0 0, 100 0))",
                "region-covered | 'b' | nothing is left of region 'a' | leave it out | 40000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0));"
                        + " POLYGON ((-50 -50, 150 -50, 150 150, -50 150, -50 -50))",
                "zero-area | (0 0) mm | without area | give it a width | -" + "| POLYGON ((0 0, 50 0, 100 0, 0 0))",
                "zero-area | (20 20) mm | without area | leave it out | 10000"
                        + "| POLYGON ((0 0, 100 0, 100 100, 0 100, 0 0), (20 20, 30 30, 40 40, 20 20))",
            })
    void isFoundAndMended(String code, String place, String size, String remedy, String area, String drawing) {
        List<RegionShape> shapes = Drawing.of(drawing);
        List<Finding> found = Drawing.check(shapes);
        assertThat(found)
                .filteredOn(f -> f.code().equals(code))
                .isNotEmpty()
                .first()
                .satisfies(f -> {
                    assertThat(f.what()).contains(place).containsPattern(size.replace("'", "\\'"));
                    assertThat(f.remedy()).contains(remedy);
                    assertThat(f.place().file()).isEqualTo("drawing.wkt");
                });

        MendedOutline mended = Drawing.mend(shapes);
        if (area.equals("-")) {
            assertThat(mended.remaining()).extracting(Finding::code).contains(code);
            assertThat(mended.changes()).isEmpty();
            return;
        }
        boolean mendable = !code.equals("drawn-twice") && !code.equals("region-covered");
        assertThat(mended.changes().isEmpty()).isEqualTo(!mendable);
        if (mendable) {
            assertThat(Drawing.check(mended.shapes()))
                    .filteredOn(f -> f.severity() != Severity.NOTE)
                    .isEmpty();
        }
        double covered = OverlayNGRobust.union(mended.shapes().stream()
                                .map(RegionShape::polygons)
                                .toList())
                        .getArea()
                * 1e6;
        assertThat(covered).isBetween(Double.parseDouble(area) - 2, Double.parseDouble(area) + 2);
        assertThat(Drawing.mend(mended.shapes()).changes()).isEmpty();
    }
}
