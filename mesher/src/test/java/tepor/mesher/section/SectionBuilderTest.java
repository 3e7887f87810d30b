package tepor.mesher.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static tepor.mesher.section.Drawn.box;

import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import tepor.mesher.outline.Finding;

class SectionBuilderTest {
    private static double length(Section section, IntPredicate which) {
        return IntStream.range(0, section.segmentCount())
                .filter(which)
                .mapToDouble(section::length)
                .sum();
    }

    private static int vertexAt(Section section, double x, double y) {
        return IntStream.range(0, section.vertexCount())
                .filter(v -> section.x(v) == x && section.y(v) == y)
                .findFirst()
                .orElse(-1);
    }

    @Test
    void aSquareKeepsItsFourSides() {
        Section section = new Drawn().region("a", box(0, 0, 2, 1)).build();
        assertThat(section.vertexCount()).isEqualTo(4);
        assertThat(section.segmentCount()).isEqualTo(4);
        assertThat(section.area(0)).isEqualTo(2);
        assertThat(IntStream.range(0, 4).allMatch(section::isOuter)).isTrue();
        assertThat(section.snap()).isCloseTo(1e-7 * Math.hypot(2, 1), within(1e-15));
    }

    @Test
    void theDirectionOfARingDoesNotMatter() {
        Section section =
                new Drawn().region("a", "POLYGON ((0 0, 0 1, 2 1, 2 0, 0 0))").build();
        assertThat(section.area(0)).isEqualTo(2);
    }

    @Test
    void aLaterRegionCutsAnEarlierOne() {
        Section section = new Drawn()
                .region("under", box(0, 0, 4, 4))
                .region("over", box(3, 1, 6, 2))
                .build();
        assertThat(section.area(0)).isCloseTo(15, within(1e-12));
        assertThat(section.area(1)).isCloseTo(3, within(1e-12));
        assertThat(length(section, s -> !section.isBoundary(s))).isCloseTo(3, within(1e-12));
        assertThat(vertexAt(section, 4, 1)).isNotNegative();
    }

    @Test
    void sharedBordersStandOnceAndTJunctionsConform() {
        Section section = new Drawn()
                .region("wide", box(0, 0, 4, 1))
                .region("left", box(0, 1, 1.5, 2))
                .region("right", box(1.5, 1, 4, 2))
                .build();
        // The upper side of "wide" is split where the upper two meet.
        assertThat(section.vertexCount()).isEqualTo(8);
        assertThat(section.segmentCount()).isEqualTo(10);
        assertThat(length(section, s -> !section.isBoundary(s))).isCloseTo(5, within(1e-12));
        assertThat(length(section, section::isOuter)).isCloseTo(12, within(1e-12));
    }

    @Test
    void aGapBelowSnapClosesAndOneAboveSnapStays() {
        Section closed = new Drawn()
                .region("a", box(0, 0, 1, 1))
                .region("b", box(1.0009, 0, 2, 1))
                .snap(1e-3)
                .build();
        assertThat(length(closed, s -> !closed.isBoundary(s))).isEqualTo(1);
        assertThat(closed.area(0)).isEqualTo(1);
        assertThat(closed.area(1)).isCloseTo(1, within(1e-12)); // its left side has come to the right side of a
        Section open = new Drawn()
                .region("a", box(0, 0, 1, 1))
                .region("b", box(1.0011, 0, 2, 1))
                .snap(1e-3)
                .build();
        assertThat(length(open, s -> !open.isBoundary(s))).isZero();
        assertThat(open.segmentCount()).isEqualTo(8);
    }

    @Test
    void anOverlapThinnerThanSnapVanishes() {
        Section section = new Drawn()
                .region("a", box(0, 0, 1, 1))
                .region("b", box(0.9995, -1, 2, 3))
                .snap(1e-3)
                .build();
        assertThat(section.area(0)).isCloseTo(1, within(1.1e-3));
        assertThat(section.segmentCount()).isEqualTo(9);
        assertThat(section.vertexCount()).isEqualTo(8);
    }

    @Test
    void aVertexNearAnotherSideLiesOnIt() {
        Section section = new Drawn()
                .region("a", box(0, 0, 4, 1))
                .region("b", "POLYGON ((1 1.00095, 3 1.00095, 2 2, 1 1.00095))")
                .snap(1e-3)
                .build();
        assertThat(length(section, s -> !section.isBoundary(s))).isCloseTo(2, within(1e-6));
        assertThat(vertexAt(section, 1, 1.00095)).isNotNegative();
        Section apart = new Drawn()
                .region("a", box(0, 0, 4, 1))
                .region("b", "POLYGON ((1 1.00105, 3 1.00105, 2 2, 1 1.00105))")
                .snap(1e-3)
                .build();
        assertThat(length(apart, s -> !apart.isBoundary(s))).isZero();
    }

    @Test
    void holesAreBoundaryButNotOuter() {
        Section section = new Drawn()
                .region("a", box(0, 0, 4, 4))
                .nothing("void", box(1, 1, 2, 2))
                .build();
        assertThat(section.area(0)).isCloseTo(15, within(1e-12));
        assertThat(length(section, section::isOuter)).isCloseTo(16, within(1e-12));
        assertThat(length(section, s -> section.isBoundary(s) && !section.isOuter(s)))
                .isCloseTo(4, within(1e-12));
    }

    @Test
    void aNotchOfNothingIsOuter() {
        Section section = new Drawn()
                .region("a", box(0, 0, 4, 4))
                .nothing("notch", box(1, 3, 2, 4))
                .build();
        assertThat(length(section, section::isOuter)).isCloseTo(18, within(1e-12));
        assertThat(section.area(1)).as("open to the outside").isNaN();
    }

    @Test
    void aChannelOfNothingJoinsAHoleToTheOutside() {
        Section section = new Drawn()
                .region("a", "POLYGON ((0 0, 5 0, 5 5, 0 5, 0 0), (1 1, 1 4, 4 4, 4 1, 1 1))")
                .nothing("channel", box(2, 4, 3, 6))
                .build();
        assertThat(IntStream.range(0, section.segmentCount()).allMatch(section::isOuter))
                .isTrue();
        assertThat(section.area(0)).isCloseTo(15, within(1e-12));
    }

    @Test
    void anIslandInAHoleIsNotOuterAndTouchingInAPointJoinsNothing() {
        Section section = new Drawn()
                .region("a", "POLYGON ((0 0, 6 0, 6 6, 0 6, 0 0), (1 1, 1 5, 5 5, 5 1, 1 1))")
                .region("island", box(2, 2, 3, 3))
                .region("touching", "POLYGON ((6 6, 8 6, 8 8, 6 8, 6 6))")
                .build();
        assertThat(length(section, section::isOuter)).isCloseTo(32, within(1e-12));
        assertThat(length(section, s -> !section.isOuter(s))).isCloseTo(20, within(1e-12));
        assertThat(section.vertexCount()).isEqualTo(4 + 4 + 4 + 3);
    }

    @Test
    void aHoleThatTouchesTheOutsideInAPointIsNotOuter() {
        Section section = new Drawn()
                .region("a", "POLYGON ((0 0, 4 0, 4 4, 0 4, 0 0), (2 0, 1 1, 3 1, 2 0))")
                .build();
        assertThat(section.area(0)).isCloseTo(15, within(1e-12));
        assertThat(length(section, section::isOuter)).isCloseTo(16, within(1e-12));
        assertThat(vertexAt(section, 2, 0)).isNotNegative();
    }

    @Test
    void piecesOfOneRegionThatShareASideAreOne() {
        Section section = new Drawn()
                .region("a", "MULTIPOLYGON (((0 0, 1 0, 1 1, 0 1, 0 0)), ((1 0, 2 0, 2 1, 1 1, 1 0)))")
                .build();
        assertThat(section.area(0)).isEqualTo(2);
        assertThat(section.segmentCount()).isEqualTo(6);
    }

    @Test
    void coordinatesStayBitForBit() {
        double x = 0.1 + 0.2; // not 0.3
        Section section = new Drawn()
                .region("a", box(x, 1.0 / 3, 7.0 / 3, Math.PI))
                .region("b", box(7.0 / 3, 1.0 / 3, 5, Math.PI))
                .build();
        assertThat(vertexAt(section, x, 1.0 / 3)).isNotNegative();
        assertThat(vertexAt(section, 7.0 / 3, Math.PI)).isNotNegative();
        assertThat(section.vertexCount()).isEqualTo(6);
    }

    @Test
    void farFromTheOriginNothingChanges() {
        double far = 1e6;
        Section section = new Drawn()
                .region("a", box(far, far, far + 1, far + 1))
                .region("b", box(far + 0.25, far + 0.25, far + 0.5, far + 0.5))
                .region("c", box(far + 1, far, far + 2, far + 1))
                .build();
        assertThat(section.area(0)).isCloseTo(1 - 0.0625, within(1e-12));
        assertThat(section.area(1)).isCloseTo(0.0625, within(1e-12));
        assertThat(section.segmentCount()).isEqualTo(11);
    }

    @Test
    void collinearPointsOfTheDrawingStayAndHiddenCrossingsGo() {
        Section section = new Drawn()
                .region("hidden", box(1, 1, 3, 3))
                .region("over", box(0, 0, 4, 4))
                .region("kept", "POLYGON ((2 0.5, 2.5 0.5, 3.5 0.5, 3.5 3.5, 2 3.5, 2 0.5))")
                .tryBuild()
                .orElse(null);
        assertThat(section).isNull(); // nothing is left of "hidden"
        Section visible = new Drawn()
                .region("hidden", box(1, 1, 5, 3))
                .region("over", box(0, 0, 4, 4))
                .region("kept", "POLYGON ((2 0.5, 2.5 0.5, 3.5 0.5, 3.5 3.5, 2 3.5, 2 0.5))")
                .build();
        assertThat(vertexAt(visible, 2.5, 0.5)).isNotNegative();
        assertThat(vertexAt(visible, 2, 1)).isNegative();
        assertThat(vertexAt(visible, 4, 1)).isNotNegative();
    }

    @Test
    void segmentsAreSplitWhereAsked() {
        Section section = new Drawn()
                .region("a", box(0, 0, 4, 1))
                .snap(1e-3)
                .split(1, 0.0005)
                .split(1.0005, 0)
                .split(3, 0)
                .split(2, 0.5)
                .split(4.0005, 0)
                .split(0.0005, 0)
                .build();
        assertThat(section.segmentCount()).isEqualTo(6);
        assertThat(vertexAt(section, 1, 0)).isNotNegative();
        assertThat(vertexAt(section, 3, 0)).isNotNegative();
    }

    @Test
    void aSplitPointWithinTheBoxOfASlopingSideButOffItSplitsNothing() {
        Drawn drawn = new Drawn().region("a", "POLYGON ((0 0, 4 0, 0 3, 0 0))").snap(1e-3);
        assertThat(drawn.split(2, 1.6).build().segmentCount()).isEqualTo(3);
        Section split = drawn.split(2, 1.5).build();
        assertThat(split.segmentCount()).isEqualTo(4);
        assertThat(vertexAt(split, 2, 1.5)).isNotNegative();
    }

    @Test
    void aSnapBelowRoundOffIsRaisedToIt() {
        double turn = Math.sin(0.3);
        double along = Math.cos(0.3);
        double far = 1e6;
        Drawn drawn = new Drawn().snap(0);
        for (int i = 0; i < 30; i++) {
            for (int j = 0; j < 4; j++) {
                StringBuilder text = new StringBuilder("POLYGON ((");
                for (int[] corner : new int[][] {{i, j}, {i + 1, j}, {i + 1, j + 1}, {i, j + 1}, {i, j}}) {
                    double u = corner[0] / 7.0;
                    double v = corner[1] / 7.0 + 1e-10 * ((i * 31 + j * 17) % 3);
                    text.append(far + along * u - turn * v)
                            .append(' ')
                            .append(turn * u + along * v)
                            .append(", ");
                }
                drawn.region(i + "," + j, text.substring(0, text.length() - 2) + "))");
            }
        }
        Section section = drawn.build();
        assertThat(section.snap()).isBetween(1e-9, 1e-8);
        assertThat(section.segmentCount()).isEqualTo(30 * 5 + 31 * 4);
    }

    @Test
    void aCoveredRegionIsAnErrorThatNamesWhatCoversIt() {
        Drawn drawn = new Drawn()
                .region("lost", box(1, 1, 3, 2))
                .region("left half", box(0, 0, 2, 4))
                .region("right half", box(2, 0, 4, 4))
                .region("elsewhere", box(8, 8, 9, 9));
        assertThat(drawn.tryBuild()).isEmpty();
        assertThat(drawn.findings.all()).singleElement().satisfies(f -> {
            assertThat(f.severity()).isEqualTo(Finding.Severity.ERROR);
            assertThat(f.place().line()).isEqualTo(1);
            assertThat(f.what())
                    .contains("'lost'", "'left half'", "'right half'")
                    .doesNotContain("elsewhere");
        });
    }

    @Test
    void aRegionThinnerThanSnapIsAnError() {
        Drawn drawn = new Drawn()
                .region("a", box(0, 0, 1, 1))
                .region("foil", box(2, 0, 2.0005, 1))
                .snap(1e-3);
        assertThat(drawn.tryBuild()).isEmpty();
        assertThat(drawn.findings.all())
                .singleElement()
                .satisfies(f -> assertThat(f.what()).contains("'foil'", "thicker than snap", "0.001 m"));
    }

    @Test
    void nothingThatCutsNothingIsAWarning() {
        Drawn drawn = new Drawn()
                .nothing("too early", box(0, 0, 1, 1))
                .region("a", box(0, 0, 4, 4))
                .nothing("cuts", box(2, 2, 3, 3))
                .nothing("cuts nothing more", box(2.5, 2.5, 3, 3))
                .nothing("aside", box(9, 9, 10, 10));
        assertThat(drawn.build().area(1)).isCloseTo(15, within(1e-12));
        assertThat(drawn.findings.all())
                .allSatisfy(f -> assertThat(f.severity()).isEqualTo(Finding.Severity.WARNING))
                .extracting(f -> f.what().split("'")[1])
                .containsExactly("too early", "cuts nothing more", "aside");
    }

    @Test
    void aSectionOfNothingIsAnError() {
        Drawn drawn = new Drawn().nothing("void", box(0, 0, 1, 1));
        assertThat(drawn.tryBuild()).isEmpty();
        assertThat(drawn.findings.all()).extracting(Finding::code).containsExactly("no-material");
        Drawn none = new Drawn();
        assertThat(none.tryBuild()).isEmpty();
        assertThat(none.findings.all()).extracting(Finding::code).containsExactly("no-material");
    }

    @Test
    void tenThousandSquaresShareTheirSides() {
        Drawn drawn = new Drawn();
        int n = 100;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                drawn.region(i + "," + j, box(0.1 * i, 0.1 * j, 0.1 * (i + 1), 0.1 * (j + 1)));
            }
        }
        Section section = drawn.tryBuild().orElseThrow();
        assertThat(section.vertexCount()).isEqualTo((n + 1) * (n + 1));
        assertThat(section.segmentCount()).isEqualTo(2 * n * (n + 1));
        assertThat(section.area(n + 1)).isCloseTo(0.01, within(1e-12));
    }

    @Test
    void aHoleHasAnAreaOnlyWhereMaterialLiesAllAround() {
        Section inside = new Drawn()
                .region("a", box(0, 0, 4, 4))
                .nothing("hole", box(1, 1, 2, 3))
                .build();
        assertThat(inside.area(1)).isCloseTo(2, within(1e-12));
        Section open = new Drawn()
                .region("a", box(0, 0, 4, 4))
                .nothing("notch", box(1, 3, 2, 5))
                .build();
        assertThat(open.area(0)).isCloseTo(15, within(1e-12));
        assertThat(open.area(1)).isNaN();
    }
}
