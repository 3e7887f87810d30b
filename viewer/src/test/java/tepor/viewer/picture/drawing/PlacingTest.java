package tepor.viewer.picture.drawing;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Font;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class PlacingTest {
    @Test
    void tagsAndLeadersKeepClearOfEachOther() {
        TagPlacer placer = new TagPlacer(new Rectangle2D.Double(0, 0, 1000, 700), 28);
        List<double[]> points = new ArrayList<>();
        for (int i = 0; i < 12; i++) {
            points.add(new double[] {400 + 33 * (i % 4), 300 + 36 * (i / 4)});
        }
        points.forEach(p -> placer.keepClear(p[0], p[1]));
        List<Rectangle2D> tags = new ArrayList<>();
        List<Line2D> leaders = new ArrayList<>();
        for (double[] p : points) {
            double[] at = placer.place(p[0], p[1], 40, Double.NaN);
            tags.add(new Rectangle2D.Double(at[0] - 20, at[1] - 14, 40, 28));
            leaders.add(new Line2D.Double(p[0], p[1], at[0], at[1]));
        }
        for (int i = 0; i < tags.size(); i++) {
            for (int j = 0; j < i; j++) {
                assertThat(tags.get(i).intersects(tags.get(j)))
                        .as("tags %d and %d", i, j)
                        .isFalse();
                assertThat(leaders.get(i).intersectsLine(leaders.get(j)))
                        .as("leaders %d and %d", i, j)
                        .isFalse();
            }
        }
    }

    @Test
    void takenCellsAreFreeForNobodyAndLinesForTheirOwner() {
        OccupancyGrid grid = new OccupancyGrid(200, 100, 4);
        grid.takeLine(0, 50, 200, 50, 3);
        assertThat(grid.isFree(100, 50, 20, 8, 0, 3)).isTrue();
        assertThat(grid.isFree(100, 50, 20, 8, 0, 4)).isFalse();
        assertThat(grid.isFree(100, 50, 20, 8, 0)).isFalse();
        grid.takeLine(100, 0, 100, 100, 4);
        assertThat(grid.isFree(100, 50, 20, 8, 0, 3)).as("where two cross").isFalse();
        assertThat(grid.isFree(100, 50, 20, 8, 0, 4)).as("where two cross").isFalse();
        assertThat(grid.isFree(102, 50, 0.5, 0.5, 0, 4)).as("where two cross").isFalse();
        assertThat(grid.isFree(50, 20, 20, 8, 0)).isTrue();
        grid.take(50, 20, 20, 8, 0.3);
        assertThat(grid.isFree(55, 22, 2, 2, 0)).isFalse();
        assertThat(grid.isFree(195, 20, 20, 8, 0)).as("beyond the edge").isFalse();
    }

    @Test
    void textIsBrokenBetweenWordsAndCutWithAnEllipsis() {
        Font font = PictureFont.size(20);
        double width = PictureFont.width("heat through the", font) + 1;
        assertThat(EntryList.wrap("heat through the inner wall", font, width, 2))
                .containsExactly("heat through the", "inner wall");
        List<String> cut = EntryList.wrap("heat through the inner wall and the floor below it", font, width, 2);
        assertThat(cut)
                .hasSize(2)
                .allSatisfy(line -> assertThat(PictureFont.width(line, font)).isLessThan(width));
        assertThat(cut.get(1)).startsWith("inner wall").endsWith("…");
    }

    @Test
    void columnsShareEntriesAboutEvenly() {
        List<EntryList.Entry> entries = new ArrayList<>();
        for (int i = 0; i < 9; i++) {
            entries.add(new EntryList.Entry((g, x, y) -> {}, "ask " + i, List.of("1 W"), ""));
        }
        EntryList list = new EntryList("", entries, PictureFont.size(20), 40);
        assertThat(list.height(300, 3)).isLessThan(0.4 * list.height(300, 1));
    }
}
