package tepor.mesher.mesh;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LinearRing;
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

/**
 * Discs, half discs, plates with rounded corners, thin and thick rings and sectors, many of them on a grid, so that they
 * touch, lie over each other and share centres. Each mesh is audited, however far from the origin, large or turned.
 */
class ArcStressTest {
    private static final GeometryFactory FACTORY = new GeometryFactory();
    /** What may stop refinement on such outlines. */
    private static final Set<Reason> EXPECTED = Set.of(Reason.IMPOSED_BY_OUTLINE, Reason.ARC_LEFT_STRAIGHT);

    /** How drawn coordinates become metres. */
    private record View(double scale, double shift, double turn) {
        Coordinate at(double x, double y) {
            double cos = Math.cos(turn);
            double sin = Math.sin(turn);
            return new Coordinate(scale * (shift + cos * x - sin * y), scale * (-0.7 * shift + sin * x + cos * y));
        }

        Circle circle(double x, double y, double r) {
            Coordinate c = at(x, y);
            return new Circle(c.x, c.y, scale * r);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "0, 150, 1, 0, 0",
        "150, 190, 1e-9, 0, 0",
        "150, 190, 1e9, 0, 0",
        "150, 190, 1, 4e6, 0",
        "150, 190, 1, 0, 0.7531",
        "190, 210, 1e-9, 4e6, 1.1"
    })
    void everyMeshIsSound(int from, int to, double scale, double shift, double turn) {
        View view = new View(scale, shift, turn);
        for (int seed = from; seed < to; seed++) {
            Random random = new Random(seed);
            List<RegionShape> shapes = shapes(random, view);
            Optional<Section> section = SectionBuilder.build(
                    shapes, List.of(), List.of(), Double.NaN, new DrawingUnit("m", 1), new Findings());
            if (section.isPresent()) {
                check(section.get(), random.nextInt(4) == 0 ? 3 : 6, "seed " + seed);
            }
        }
    }

    private static void check(Section section, int nodes, String seed) {
        MeshResult result = Mesher.mesh(
                section,
                new MeshOptions(Math.toRadians(28), (x, y) -> Double.POSITIVE_INFINITY, 300_000, nodes),
                () -> false);
        assertThat(MeshCheck.problems(result.mesh(), section)).as(seed).isEmpty();
        assertThat(result.report().stops()).as(seed).allMatch(s -> EXPECTED.contains(s.reason()));
        assertThat(result.quality().smallestAngleMade())
                .as(seed)
                .isGreaterThanOrEqualTo(Math.toRadians(28) * (1 - 1e-9));
    }

    private static List<RegionShape> shapes(Random random, View view) {
        List<RegionShape> shapes = new ArrayList<>();
        lay(shapes, polygon(view.at(-1, -1), view.at(2, -1), view.at(2, 2), view.at(-1, 2)), false);
        int count = 2 + random.nextInt(8);
        for (int i = 0; i < count; i++) {
            boolean grid = random.nextInt(3) > 0;
            double x = grid ? random.nextInt(9) * 0.125 : random.nextDouble();
            double y = grid ? random.nextInt(9) * 0.125 : random.nextDouble();
            double r = grid ? 0.0625 * (1 + random.nextInt(8)) : 0.02 + 0.5 * random.nextDouble();
            Polygon polygon = switch (random.nextInt(6)) {
                case 0, 1 -> FACTORY.createPolygon(PathBuilder.ring(view.circle(x, y, r), FACTORY));
                case 2 -> sector(view, x, y, r, 0, Math.PI);
                case 3 -> rounded(view, x, y, 2 * r, r, r / 4);
                case 4 -> ring(view, x, y, r, random.nextInt(3) == 0 ? 0.995 * r : 0.8 * r);
                default ->
                    sector(
                            view,
                            x,
                            y,
                            r,
                            random.nextInt(4) * Math.PI / 4,
                            Math.PI + random.nextInt(3) * Math.PI / 4 + (random.nextInt(4) == 0 ? 0.02 : 0));
            };
            lay(shapes, polygon, random.nextInt(4) == 0);
        }
        return shapes;
    }

    private static void lay(List<RegionShape> shapes, Polygon polygon, boolean hole) {
        shapes.add(new RegionShape("r" + shapes.size(), polygon, hole, new Place("test", 1, 1)));
    }

    private static Polygon polygon(Coordinate a, Coordinate b, Coordinate c, Coordinate d) {
        return FACTORY.createPolygon(new Coordinate[] {a, b, c, d, a});
    }

    private static Polygon sector(View view, double x, double y, double r, double from, double to) {
        Coordinate start = view.at(x + r * Math.cos(from), y + r * Math.sin(from));
        Coordinate end = view.at(x + r * Math.cos(to), y + r * Math.sin(to));
        return FACTORY.createPolygon(new PathBuilder(view.at(x, y))
                .lineTo(start)
                .arcTo(view.circle(x, y, r), end, true)
                .lineTo(view.at(x, y))
                .ring(FACTORY));
    }

    private static Polygon ring(View view, double x, double y, double outer, double inner) {
        return FACTORY.createPolygon(
                PathBuilder.ring(view.circle(x, y, outer), FACTORY),
                new LinearRing[] {PathBuilder.ring(view.circle(x, y, inner), FACTORY)});
    }

    private static Polygon rounded(View view, double x, double y, double w, double h, double r) {
        double[][] corner = {{x + w - r, y + r}, {x + w - r, y + h - r}, {x + r, y + h - r}, {x + r, y + r}};
        PathBuilder path = new PathBuilder(view.at(x + r, y));
        for (int i = 0; i < 4; i++) {
            double from = (i - 1) * Math.PI / 2;
            double to = i * Math.PI / 2;
            path.lineTo(view.at(corner[i][0] + r * Math.cos(from), corner[i][1] + r * Math.sin(from)));
            path.arcTo(
                    view.circle(corner[i][0], corner[i][1], r),
                    view.at(corner[i][0] + r * Math.cos(to), corner[i][1] + r * Math.sin(to)),
                    true);
        }
        return FACTORY.createPolygon(path.lineTo(view.at(x + r, y)).ring(FACTORY));
    }
}
