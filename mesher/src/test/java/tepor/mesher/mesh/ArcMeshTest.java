package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.Findings;
import tepor.mesher.outline.PathBuilder;
import tepor.mesher.outline.Place;
import tepor.mesher.refinement.RefinementReport.Reason;
import tepor.mesher.section.RegionShape;
import tepor.mesher.section.Section;
import tepor.mesher.section.SectionBuilder;

class ArcMeshTest {
    private static final GeometryFactory FACTORY = new GeometryFactory();

    private final List<RegionShape> shapes = new ArrayList<>();

    private static Polygon disc(double x, double y, double r) {
        return FACTORY.createPolygon(PathBuilder.ring(new Circle(x, y, r), FACTORY));
    }

    private static Polygon box(double x0, double y0, double x1, double y1) {
        return (Polygon) FACTORY.toGeometry(new Envelope(x0, x1, y0, y1));
    }

    private void lay(Polygon polygon, boolean hole) {
        shapes.add(new RegionShape("r" + shapes.size(), polygon, hole, new Place("test", 1, 1)));
    }

    private Section section(LineString... cuts) {
        Findings findings = new Findings();
        return SectionBuilder.build(shapes, List.of(), List.of(cuts), Double.NaN, new DrawingUnit("m", 1), findings)
                .orElseThrow(() -> new AssertionError(findings.all()));
    }

    private static MeshResult mesh(Section section, double size, int nodes) {
        MeshResult result =
                Mesher.mesh(section, new MeshOptions(Math.toRadians(28), (x, y) -> size, 400_000, nodes), () -> false);
        assertThat(MeshCheck.problems(result.mesh(), section)).isEmpty();
        return result;
    }

    private static double area(Mesh mesh) {
        double area = 0;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            area += mesh.area(t);
        }
        return area;
    }

    @Test
    void aDiscOfSixNodeTrianglesHasTheAreaThatItsArcsLeave() {
        lay(disc(0.3, -0.2, 2), false);
        MeshResult result = mesh(section(), Double.POSITIVE_INFINITY, 6);
        // Each side of half angle φ lacks R²φ⁵/30 (own expansion); sides turn by 15° at most.
        double halfAngle = Math.toRadians(7.5);
        double lacking = 24 * 4 * Math.pow(halfAngle, 5) / 30;
        assertThat(Math.PI * 4 - area(result.mesh())).isBetween(0.1 * lacking, 1.02 * lacking);
        assertThat(result.report().stops()).isEmpty();
        assertThat(result.quality().smallestAngle()).isGreaterThanOrEqualTo(Math.toRadians(28));
    }

    @Test
    void halvingSidesOnArcsTakesTheAreaErrorDownSixteenfold() {
        lay(disc(0, 0, 1), false);
        lay(disc(0.1, 0, 0.5), true);
        Section section = section();
        double coarse = Math.PI * 0.75 - area(mesh(section, 0.1, 6).mesh());
        double fine = Math.PI * 0.75 - area(mesh(section, 0.05, 6).mesh());
        assertThat(coarse / fine).isCloseTo(16, within(4.0));
    }

    @Test
    void threeNodeTrianglesFollowTheArcsWithTheirCorners() {
        lay(disc(0, 0, 1), false);
        Mesh mesh = mesh(section(), 0.2, 3).mesh();
        for (int f = 0; f < mesh.facetCount(); f++) {
            int n = mesh.facetNode(f, 0);
            assertThat(Math.hypot(mesh.x(n), mesh.y(n))).isCloseTo(1, within(1e-15));
        }
        assertThat(area(mesh)).isCloseTo(Math.PI, within(Math.PI * 1.3e-3));
    }

    @Test
    void aPipeOnTheGroundAndTouchingDiscsAreMeshed() {
        lay(box(-1, -1, 1, 0), false);
        lay(disc(0.05, 0.2, 0.2), false);
        lay(disc(0.05 + 0.4, 0.2, 0.2), false);
        lay(disc(0.05, 0.1, 0.1), false);
        MeshResult result = mesh(section(), Double.POSITIVE_INFINITY, 6);
        assertThat(result.mesh().triangleCount()).isLessThan(20_000);
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
        assertThat(result.report().count(Reason.ELEMENT_LIMIT)).isZero();
    }

    @Test
    void aDiscThatTouchesAnotherFromInsideIsMeshed() {
        lay(disc(0, 0, 1), false);
        lay(disc(0.6 * Math.cos(0.3), 0.6 * Math.sin(0.3), 0.4), false);
        lay(disc(-0.9, 0, 0.1), true);
        MeshResult result = mesh(section(), Double.POSITIVE_INFINITY, 6);
        assertThat(result.mesh().triangleCount()).isLessThan(20_000);
        assertThat(result.report().count(Reason.SIZE_FLOOR)).isZero();
    }

    @Test
    void aThinPipeWallIsMeshedWithItsBore() {
        lay(disc(0, 0, 1), false);
        lay(disc(0.001, 0, 0.995), true);
        MeshResult result = mesh(section(), Double.POSITIVE_INFINITY, 6);
        assertThat(area(result.mesh())).isCloseTo(Math.PI * (1 - 0.995 * 0.995), within(1e-8));
        assertThat(result.quality().smallestAngleMade()).isGreaterThanOrEqualTo(Math.toRadians(28) * (1 - 1e-9));
    }

    @Test
    void aCutIsALineOfTheMeshWithTheSameRegionOnBothSides() {
        lay(box(0, 0, 2, 1), false);
        Section section = section(FACTORY.createLineString(
                new Coordinate[] {new Coordinate(0.5, -1), new Coordinate(0.5, 0.7), new Coordinate(1.4, 0.6)}));
        Mesh mesh = mesh(section, 0.3, 6).mesh();
        double length = 0;
        for (int f = 0; f < mesh.facetCount(); f++) {
            if (section.isCut(mesh.facetSegment(f))) {
                length += mesh.facetLength(f);
                assertThat(mesh.isBoundaryFacet(f)).isFalse();
            }
        }
        assertThat(length).isCloseTo(0.7 + Math.hypot(0.9, 0.1), within(1e-12));
    }

    @Test
    void randomDiscsMakeSoundMeshes() {
        for (int seed = 0; seed < 60; seed++) {
            Random random = new Random(seed);
            shapes.clear();
            lay(box(-1, -1, 2, 2), false);
            for (int i = 0; i < 2 + random.nextInt(6); i++) {
                boolean grid = random.nextInt(3) > 0;
                double x = grid ? random.nextInt(5) * 0.25 : random.nextDouble();
                double y = grid ? random.nextInt(5) * 0.25 : random.nextDouble();
                double r = grid ? 0.125 * (1 + random.nextInt(4)) : 0.05 + 0.5 * random.nextDouble();
                lay(disc(x, y, r), random.nextInt(3) == 0);
            }
            Findings findings = new Findings();
            int number = seed;
            SectionBuilder.build(shapes, List.of(), List.of(), Double.NaN, new DrawingUnit("m", 1), findings)
                    .ifPresent(section -> {
                        MeshResult result = Mesher.mesh(
                                section,
                                new MeshOptions(Math.toRadians(28), (x, y) -> Double.POSITIVE_INFINITY, 200_000, 6),
                                () -> false);
                        assertThat(MeshCheck.problems(result.mesh(), section))
                                .as("seed %d", number)
                                .isEmpty();
                        assertThat(result.report().stops())
                                .as("seed %d", number)
                                .allMatch(s -> s.reason() == Reason.IMPOSED_BY_OUTLINE);
                    });
        }
    }
}
