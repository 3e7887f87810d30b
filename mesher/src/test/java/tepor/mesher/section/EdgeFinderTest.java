package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tepor.mesher.section.Drawn.box;
import static tepor.mesher.section.Drawn.wkt;

import java.util.Arrays;
import java.util.BitSet;
import java.util.List;
import org.junit.jupiter.api.Test;

class EdgeFinderTest {
    /** A wall of two leaves, 0.1 m and 0.3 m thick, 2 m high; a duct of nothing in the thick one. */
    private static final Section WALL = new Drawn()
            .region("thin", box(0, 0, 0.1, 2))
            .region("thick", box(0.1, 0, 0.4, 2))
            .nothing("duct", box(0.2, 0.5, 0.3, 0.7))
            .split(0, 0.25)
            .split(0, 1.75)
            .build();

    private static EdgePieces find(Where where) {
        return new EdgeFinder(WALL).find(where, new BitSet());
    }

    /** Sum over pieces of sign times the integral of a constant flux vector across them: what passes in its positive sense. */
    private static double flow(Section section, EdgePieces pieces, double qx, double qy) {
        double sum = 0;
        for (int i = 0; i < pieces.segments().length; i++) {
            int s = pieces.segments()[i];
            double dx = section.x(section.end(s)) - section.x(section.start(s));
            double dy = section.y(section.end(s)) - section.y(section.start(s));
            sum += pieces.signs()[i] * (qx * dy - qy * dx); // from left to right of the segment
        }
        return sum;
    }

    private static void isAscending(EdgePieces pieces) {
        assertThat(pieces.signs()).hasSameSizeAs(pieces.segments());
        for (int i = 1; i < pieces.segments().length; i++) {
            assertThat(pieces.segments()[i]).isGreaterThan(pieces.segments()[i - 1]);
        }
    }

    @Test
    void sidesLieOnTheBoundingBoxAndCountOutOfTheMaterial() {
        EdgePieces left = find(new Where.OnSide(Where.Side.LEFT));
        isAscending(left);
        assertThat(left.segments()).hasSize(3);
        assertThat(left.length(WALL)).isCloseTo(2, within(1e-12));
        assertThat(flow(WALL, left, -1, 0)).isCloseTo(2, within(1e-12));
        assertThat(flow(WALL, find(new Where.OnSide(Where.Side.RIGHT)), 1, 0)).isCloseTo(2, within(1e-12));
        assertThat(flow(WALL, find(new Where.OnSide(Where.Side.BOTTOM)), 0, -1)).isCloseTo(0.4, within(1e-12));
        EdgePieces top = find(new Where.OnSide(Where.Side.TOP));
        assertThat(top.segments()).hasSize(2);
        assertThat(flow(WALL, top, 0, 1)).isCloseTo(0.4, within(1e-12));
    }

    @Test
    void outsideHolesAndRestShareTheBoundary() {
        EdgePieces outside = find(new Where.Outside());
        EdgePieces holes = find(new Where.Holes());
        assertThat(outside.length(WALL)).isCloseTo(4.8, within(1e-12));
        assertThat(holes.length(WALL)).isCloseTo(0.6, within(1e-12));
        BitSet conditioned = new BitSet();
        Arrays.stream(outside.segments()).forEach(conditioned::set);
        EdgePieces rest = new EdgeFinder(WALL).find(new Where.Rest(), conditioned);
        assertThat(rest.segments()).containsExactly(holes.segments());
        assertThat(rest.signs()).containsExactly(holes.signs());
    }

    @Test
    void flowOutOfClosedBordersSumsToNothing() {
        for (Where where : List.of(new Where.Outside(), new Where.Holes(), new Where.OfRegion(0))) {
            assertThat(flow(WALL, find(where), 3, -7)).isCloseTo(0, within(1e-12));
        }
    }

    @Test
    void betweenCountsFromTheFirstToTheSecond() {
        EdgePieces pieces = find(new Where.Between(0, 1));
        assertThat(flow(WALL, pieces, 1, 0)).isCloseTo(2, within(1e-12));
        assertThat(flow(WALL, find(new Where.Between(1, 0)), 1, 0)).isCloseTo(-2, within(1e-12));
        assertThat(find(new Where.Between(0, 2)).isEmpty()).isTrue();
    }

    @Test
    void betweenARegionAndNothingIsBoundaryAndCountsOutOfTheMaterial() {
        EdgePieces pieces = find(new Where.Between(1, 2));
        EdgePieces reversed = find(new Where.Between(2, 1));
        assertThat(pieces.length(WALL)).isCloseTo(0.6, within(1e-12));
        assertThat(reversed.signs()).containsExactly(pieces.signs());
        for (int i = 0; i < pieces.segments().length; i++) {
            assertThat(pieces.signs()[i]).isEqualTo(WALL.solidLeft(pieces.segments()[i]) ? 1 : -1);
        }
    }

    @Test
    void theBorderOfARegionCountsOutOfIt() {
        EdgePieces thin = find(new Where.OfRegion(0));
        assertThat(thin.length(WALL)).isCloseTo(4.2, within(1e-12));
        for (int i = 0; i < thin.segments().length; i++) {
            assertThat(thin.signs()[i]).isEqualTo(WALL.left(thin.segments()[i]) == 0 ? 1 : -1);
        }
        EdgePieces thick = find(new Where.OfRegion(1));
        for (int i = 0; i < thick.segments().length; i++) {
            assertThat(thick.signs()[i]).isEqualTo(WALL.left(thick.segments()[i]) == 1 ? 1 : -1);
        }
        EdgePieces duct = find(new Where.OfRegion(2));
        assertThat(duct.segments()).containsExactly(find(new Where.Holes()).segments());
        assertThat(duct.signs()).containsExactly(find(new Where.Holes()).signs());
    }

    @Test
    void aLineFindsBoundaryAndInterfaceBetweenItsEnds() {
        EdgePieces boundary = find(new Where.OnLine(wkt("LINESTRING (0 0.25, 0 1.75)")));
        assertThat(boundary.segments()).hasSize(1);
        assertThat(boundary.length(WALL)).isCloseTo(1.5, within(1e-12));
        assertThat(flow(WALL, boundary, -1, 0)).isCloseTo(1.5, within(1e-12));
        EdgePieces up = find(new Where.OnLine(wkt("LINESTRING (0.1 -1, 0.1 0.3, 0.1 5)")));
        // Upwards, left is towards −x: positive is towards +x.
        assertThat(flow(WALL, up, 1, 0)).isCloseTo(2, within(1e-12));
        assertThat(flow(WALL, find(new Where.OnLine(wkt("LINESTRING (0.1 2, 0.1 0)"))), 1, 0))
                .isCloseTo(-2, within(1e-12));
        assertThat(find(new Where.OnLine(wkt("LINESTRING (0 0.5, 0 1.5)"))).isEmpty())
                .isTrue();
        assertThat(find(new Where.OnLine(wkt("LINESTRING (0 1, 0.4 1)"))).isEmpty())
                .isTrue();
    }

    @Test
    void aLineThatLeavesASegmentInItsMiddleDoesNotLieUnderIt() {
        Where detour = new Where.OnLine(wkt("LINESTRING (0.4 0, 0.4 0.9, 1 0.95, 0.4 1, 1 1.05, 0.4 1.1, 0.4 2)"));
        assertThat(find(detour).isEmpty()).isTrue();
        Where closed = new Where.OnLine(wkt("LINESTRING (0.2 0.5, 0.3 0.5, 0.3 0.7, 0.2 0.7, 0.2 0.5)"));
        assertThat(find(closed).length(WALL)).isCloseTo(0.6, within(1e-12));
        Where several = new Where.OnLine(wkt("MULTILINESTRING ((0.4 0, 0.4 1), (0.4 2, 0.4 1))"));
        assertThat(find(several).length(WALL)).isCloseTo(2, within(1e-12));
    }

    @Test
    void lieWithinSnap() {
        Section coarse = new Drawn().region("a", box(0, 0, 1, 1)).snap(1e-3).build();
        EdgeFinder finder = new EdgeFinder(coarse);
        BitSet none = new BitSet();
        Where near = new Where.OnLine(wkt("LINESTRING (1.001 0, 0.9995 1)"));
        assertThat(finder.find(near, none).segments()).hasSize(1);
        Where off = new Where.OnLine(wkt("LINESTRING (1.0011 0, 1.0011 1)"));
        assertThat(finder.find(off, none).isEmpty()).isTrue();
        Where inside = new Where.Inside(wkt(box(0.0011, -1, 2, 2)));
        assertThat(finder.find(inside, none).segments()).hasSize(1);
        Where nearlyAll = new Where.Inside(wkt(box(0.0007, 0.0007, 0.9993, 0.9993)));
        assertThat(finder.find(nearlyAll, none).length(coarse)).isCloseTo(4, within(1e-12));
        Where fewer = new Where.Inside(wkt(box(0.0011, 0.0007, 1.1, 1.1)));
        assertThat(finder.find(fewer, none).length(coarse)).isCloseTo(1, within(1e-12));
    }

    @Test
    void insideTakesBoundaryThatIsWhollyWithin() {
        EdgePieces pieces = find(new Where.Inside(wkt(box(0.15, 0.4, 0.5, 0.8))));
        assertThat(pieces.segments()).containsExactly(find(new Where.Holes()).segments());
        assertThat(find(new Where.Inside(wkt(box(0.05, 0.05, 0.15, 1.9)))).isEmpty())
                .isTrue(); // the interface is no boundary
        Where withHole = new Where.Inside(
                wkt("POLYGON ((-1 -1, 1 -1, 1 3, -1 3, -1 -1), (0.15 0.4, 0.35 0.4, 0.35 0.8, 0.15 0.8, 0.15 0.4))"));
        assertThat(find(withHole).segments())
                .containsExactly(find(new Where.Outside()).segments());
    }

    @Test
    void nearestTakesTheRunBetweenCornersAndJunctions() {
        EdgePieces left = find(new Where.Nearest(-1, 1));
        assertThat(left.segments())
                .containsExactly(find(new Where.OnSide(Where.Side.LEFT)).segments());
        EdgePieces topOfThick = find(new Where.Nearest(0.3, 2.1)); // the interface ends at the top
        assertThat(topOfThick.length(WALL)).isCloseTo(0.3, within(1e-12));
        assertThat(find(new Where.Nearest(0.25, 0.52)).length(WALL)).isCloseTo(0.1, within(1e-12));
    }

    @Test
    void unionTakesEachSegmentOnceWithItsFirstSign() {
        Where up = new Where.OnLine(wkt("LINESTRING (0.1 0, 0.1 2)"));
        Where union = new Where.Union(List.of(up, new Where.Between(1, 0), new Where.Outside()));
        EdgePieces pieces = find(union);
        isAscending(pieces);
        assertThat(pieces.length(WALL)).isCloseTo(6.8, within(1e-12));
        assertThat(flow(WALL, pieces, 1, 0)).isCloseTo(2, within(1e-12)); // the closed outside adds nothing
        Where reversed = new Where.Union(List.of(new Where.Between(1, 0), up, new Where.Outside()));
        assertThat(flow(WALL, find(reversed), 1, 0)).isCloseTo(-2, within(1e-12));
    }
}
