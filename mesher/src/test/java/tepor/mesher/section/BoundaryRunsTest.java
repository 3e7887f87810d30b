package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static tepor.mesher.section.Drawn.box;

import java.util.BitSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.PathBuilder;

class BoundaryRunsTest {
    private static BitSet all(Section section) {
        BitSet all = new BitSet();
        all.set(0, section.segmentCount());
        return all;
    }

    private static String polygon(int sides) {
        StringBuilder text = new StringBuilder("POLYGON ((");
        for (int i = 0; i <= sides; i++) {
            double angle = 2 * Math.PI * (i % sides) / sides;
            text.append(Math.cos(angle)).append(' ').append(Math.sin(angle)).append(i < sides ? ", " : "))");
        }
        return text.toString();
    }

    /** Each segment begins where the one before it ends, with material on the left. */
    private static void isConnected(Section section, int[] run) {
        for (int i = 1; i < run.length; i++) {
            int before = section.solidLeft(run[i - 1]) ? section.end(run[i - 1]) : section.start(run[i - 1]);
            int after = section.solidLeft(run[i]) ? section.start(run[i]) : section.end(run[i]);
            assertThat(after).isEqualTo(before);
        }
    }

    @Test
    void cornersOverThirtyDegreesCut() {
        Section twelve = new Drawn().region("a", polygon(12)).build(); // turns by exactly 30°
        assertThat(BoundaryRuns.of(twelve, all(twelve))).singleElement().satisfies(run -> {
            assertThat(run).hasSize(12);
            assertThat(run[0]).isZero();
            isConnected(twelve, run);
        });
        Section eleven = new Drawn().region("a", polygon(11)).build();
        assertThat(BoundaryRuns.of(eleven, all(eleven))).hasSize(11);
    }

    @Test
    void anArcGoesOnWhereItsTangentDoes() {
        // A stadium: two sides that go over into half circles.
        GeometryFactory factory = new GeometryFactory();
        Coordinate a = new Coordinate(0, 0);
        Polygon stadium = factory.createPolygon(new PathBuilder(a)
                .lineTo(new Coordinate(4, 0))
                .arcTo(new Circle(4, 1, 1), new Coordinate(4, 2), true)
                .lineTo(new Coordinate(0, 2))
                .arcTo(new Circle(0, 1, 1), a, true)
                .ring(factory));
        Section smooth = new Drawn().add("stadium", stadium, false).build();
        assertThat(BoundaryRuns.of(smooth, all(smooth))).hasSize(1);
        // An arc that leaves a side at 35° and turns back by 30°, so that its chord leaves the side at 20°.
        double angle = Math.toRadians(35);
        Circle circle = new Circle(4 + 4 * Math.sin(angle), -4 * Math.cos(angle), 4);
        Coordinate end = new Coordinate(
                circle.x() - 4 * Math.sin(Math.toRadians(5)), circle.y() + 4 * Math.cos(Math.toRadians(5)));
        Polygon cornered = factory.createPolygon(new PathBuilder(a)
                .lineTo(new Coordinate(4, 0))
                .arcTo(circle, end, false)
                .lineTo(new Coordinate(end.x, 5))
                .lineTo(new Coordinate(0, 5))
                .lineTo(a)
                .ring(factory));
        Section section = new Drawn().add("cornered", cornered, false).build();
        assertThat(BoundaryRuns.of(section, all(section))).hasSize(5);
    }

    @Test
    void aCutIsNoJunction() {
        Section section = new Drawn()
                .region("a", box(0, 0, 1, 1))
                .cut(new Coordinate(0.5, -1), new Coordinate(0.5, 2))
                .tryBuild()
                .orElseThrow();
        assertThat(BoundaryRuns.of(section, all(section))).hasSize(4);
    }

    @Test
    void junctionsCutAndInterfacesAreLeftOut() {
        Section section = new Drawn()
                .region("a", box(0, 0, 1, 1))
                .region("b", box(1, 0, 2, 1))
                .build();
        List<int[]> runs = BoundaryRuns.of(section, all(section));
        assertThat(runs).hasSize(6).allSatisfy(run -> assertThat(run).hasSize(1));
    }

    @Test
    void aPointWhereTheBoundaryTouchesItselfCuts() {
        Section section = new Drawn()
                .region("a", "POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (2 0, 1 1, 3 1, 2 0))")
                .build();
        assertThat(BoundaryRuns.of(section, all(section))).hasSize(8);
    }

    @Test
    void onlyChosenSegmentsAreJoined() {
        Section section = new Drawn()
                .region("a", box(0, 0, 4, 1))
                .split(1, 0)
                .split(2, 0)
                .split(3, 0)
                .build();
        BitSet bottom = new BitSet();
        for (int s = 0; s < section.segmentCount(); s++) {
            double middle = 0.5 * (section.x(section.start(s)) + section.x(section.end(s)));
            boolean low = section.y(section.start(s)) == 0 && section.y(section.end(s)) == 0;
            bottom.set(s, low && middle != 2.5);
        }
        List<int[]> runs = BoundaryRuns.of(section, bottom);
        assertThat(runs).extracting(run -> run.length).containsExactlyInAnyOrder(2, 1);
        runs.forEach(run -> isConnected(section, run));
    }
}
