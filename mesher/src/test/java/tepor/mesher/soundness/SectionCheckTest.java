package tepor.mesher.soundness;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.geom.util.AffineTransformation;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Finding;
import tepor.mesher.outline.Finding.Severity;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.PathBuilder;
import tepor.mesher.outline.Place;
import tepor.mesher.section.RegionShape;

class SectionCheckTest {
    private static final DrawingUnit METRE = new DrawingUnit("m", 1);
    private static final GeometryFactory FACTORY = new GeometryFactory();

    private final List<RegionShape> shapes = new ArrayList<>();

    private static Geometry box(double x0, double y0, double x1, double y1) {
        return FACTORY.createPolygon(new Coordinate[] {
            new Coordinate(x0, y0),
            new Coordinate(x1, y0),
            new Coordinate(x1, y1),
            new Coordinate(x0, y1),
            new Coordinate(x0, y0)
        });
    }

    private SectionCheckTest draw(Geometry polygons) {
        return draw(polygons, false);
    }

    private SectionCheckTest draw(Geometry polygons, boolean hole) {
        String name = String.valueOf((char) ('a' + shapes.size()));
        shapes.add(new RegionShape(name, polygons, hole, new Place("case.toml", shapes.size() + 1, 1)));
        return this;
    }

    private List<Finding> check() {
        return check(Double.NaN);
    }

    private List<Finding> check(double snap) {
        Findings findings = new Findings();
        SectionCheck.check(shapes, Closeness.of(shapes, snap), METRE, findings);
        return findings.all();
    }

    private static void only(List<Finding> found, Severity severity, String code, String words) {
        assertThat(found).singleElement().satisfies(f -> {
            assertThat(f.severity()).isEqualTo(severity);
            assertThat(f.code()).isEqualTo(code);
            assertThat(f.what()).contains(words);
        });
    }

    @Test
    void neighboursThatTouchAreSound() {
        draw(box(0, 0, 1, 1)).draw(box(1, 0, 2, 1)).draw(box(0, 1, 2, 2)).draw(box(0.2, 0.2, 0.8, 0.8));
        assertThat(check()).isEmpty();
    }

    @Test
    void aGapThatTakesAHugeMeshIsAnErrorWhereMaterialLiesInIt() {
        draw(box(-1, -1, 3, 2)).draw(box(0, 0, 1, 1)).draw(box(1.000005, 0, 2, 1));
        only(check(), Severity.ERROR, "gap", "meshing it takes about 1,600,000 triangles");
        assertThat(check().get(0).remedy()).contains("snap = \"7.5e-06 m\"");
    }

    @Test
    void theSnapOfTheRemedyTakesTheGapAway() {
        draw(box(-1, -1, 3, 2)).draw(box(0, 0, 1, 1)).draw(box(1.000005, 0, 2, 1));
        assertThat(check(7.5e-6)).isEmpty();
    }

    @Test
    void aGapWithNothingInItCostsNothingButLetsNoHeatPass() {
        draw(box(0, 0, 1, 1)).draw(box(1.000001, 0, 2, 1));
        only(check(), Severity.WARNING, "gap", "nothing is in it, so that no heat passes");
    }

    @Test
    void aFoilOfItsOwnIsOnlyNoted() {
        draw(box(0, 0, 1, 1)).draw(box(1, 0, 1.00001, 1)).draw(box(1.00001, 0, 2, 1));
        only(check(), Severity.NOTE, "thin-layer", "region 'b' is a thin layer, 1e-05 m wide over a length of 1 m");
    }

    @Test
    void aStackOfFoilsIsOnlyNoted() {
        draw(box(0, 0, 1, 1));
        for (int i = 0; i < 4; i++) {
            draw(box(1 + i * 1e-5, 0, 1 + (i + 1) * 1e-5, 1));
        }
        draw(box(1.00004, 0, 2, 1));
        assertThat(check()).hasSize(4).extracting(Finding::severity).containsOnly(Severity.NOTE);
    }

    @Test
    void aFoilLaidOverAPlateIsOnlyNoted() {
        draw(box(0, 0, 2, 1)).draw(box(0.5, 0, 1.5, 2e-5));
        only(check(), Severity.NOTE, "thin-layer", "region 'b' is a thin layer");
    }

    @Test
    void aCoatAllAroundIsOnlyNoted() {
        draw(box(0, 0, 1, 1)).draw(box(1e-5, 1e-5, 1 - 1e-5, 1 - 1e-5));
        only(check(), Severity.NOTE, "thin-layer", "one within the other, a thin layer is left, 1e-05 m wide");
    }

    @Test
    void regionsThatOverlapInPartAreNotedAndWholeOnesAreNot() {
        draw(box(0, 0, 1, 1)).draw(box(0.5, 0.5, 2, 2)).draw(box(1.2, 1.2, 1.4, 1.4));
        only(check(), Severity.NOTE, "partial-overlap", "regions 'a' and 'b' overlap in part, with 0.25 m² in common");
    }

    @Test
    void aCornerThatMissesASideByAFewSnapsIsReported() {
        draw(box(0, 0, 1, 1)).draw(FACTORY.createPolygon(new Coordinate[] {
            new Coordinate(1 - 5e-7, 0.5), new Coordinate(2, 0), new Coordinate(2, 1), new Coordinate(1 - 5e-7, 0.5)
        }));
        only(check(), Severity.WARNING, "near-miss", "come within 5e-07 m of each other at (0.9999995 0.5) m");
    }

    @Test
    void sidesThatPartAtAnAngleAreNoFault() {
        draw(box(0, 0, 1, 1)).draw(FACTORY.createPolygon(new Coordinate[] {
            new Coordinate(1, 0), new Coordinate(2, 0), new Coordinate(1.1, 1), new Coordinate(1, 0)
        }));
        assertThat(check()).isEmpty();
    }

    private static Polygon disc(double x, double y, double radius) {
        return FACTORY.createPolygon(PathBuilder.ring(new Circle(x, y, radius), FACTORY));
    }

    @Test
    void circlesThatTouchAreNoFault() {
        draw(box(-3, -1, 5, 3)).draw(disc(0, 0, 1)).draw(disc(2, 0, 1)).draw(disc(1, Math.sqrt(3), 1));
        draw(disc(2.5, 0, 0.5)); // from inside
        assertThat(check()).isEmpty();
    }

    @Test
    void areasInCommonAreThoseOfTheArcs() {
        draw(disc(0, 0, 1)).draw(disc(1, 0, 1));
        // two discs of radius 1 at a distance of 1: 2π/3 − √3/2, plane geometry
        assertThat(2 * Math.PI / 3 - Math.sqrt(3) / 2).isBetween(1.2283695, 1.2283705);
        only(check(), Severity.NOTE, "partial-overlap", "1.2283");
    }

    @Test
    void aThinRingIsNotedWithItsCost() {
        draw(disc(0, 0, 1)).draw(disc(0, 0, 0.99995));
        only(check(), Severity.NOTE, "thin-layer", "meshing it takes about 1,");
    }

    @Test
    void everythingScalesAndMovesWithTheDrawing() {
        draw(box(-1, -1, 3, 2))
                .draw(box(0, 0, 1, 1))
                .draw(box(1.00001, 0, 2, 1))
                .draw(box(0.5, -0.5, 0.7, 0.5));
        List<String> codes = check().stream().map(Finding::code).toList();
        assertThat(codes).containsExactlyInAnyOrder("gap", "partial-overlap");
        List<RegionShape> drawn = List.copyOf(shapes);
        for (double scale : new double[] {1e-9, 1e9}) {
            shapes.clear();
            AffineTransformation change = AffineTransformation.rotationInstance(0.3);
            change.translate(100, -300).scale(scale, scale);
            drawn.forEach(s -> draw(change.transform(s.polygons())));
            assertThat(check().stream().map(Finding::code)).containsExactlyInAnyOrderElementsOf(codes);
        }
    }

    @Test
    void ofThousandsOfFindingsTheGravestAreToldAndTheOthersCounted() {
        draw(box(0, 0, 1000, 2));
        for (int i = 0; i < 30; i++) {
            draw(box(10 * i, 1, 10 * i + 5, 3 + i));
        }
        List<Finding> found = check();
        assertThat(found).hasSize(11);
        assertThat(found)
                .filteredOn(f -> f.what().startsWith("20 more findings of this kind"))
                .hasSize(1);
    }

    @Test
    void aHoleCountsAsARegion() {
        draw(box(0, 0, 2, 1)).draw(box(0.5, 5e-5, 1.5, 0.5), true);
        only(check(), Severity.WARNING, "strip", "5e-05 m wide over a length of 1 m");
    }
}
