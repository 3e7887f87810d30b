package tepor.viewer.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import tepor.viewer.picture.LineLabels.Label;
import tepor.viewer.picture.contour.Isotherm;
import tepor.viewer.picture.drawing.OccupancyGrid;
import tepor.viewer.picture.drawing.PictureFont;

class LineLabelsTest {
    private static Isotherm circle(int level, double radius) {
        double[] xy = new double[2 * 180];
        for (int i = 0; i < 180; i++) {
            xy[2 * i] = 500 + radius * Math.cos(2 * Math.PI * i / 180);
            xy[2 * i + 1] = 500 + radius * Math.sin(2 * Math.PI * i / 180);
        }
        return new Isotherm(level, xy, true);
    }

    private static List<Isotherm> circles(double from, double spacing, int count) {
        List<Isotherm> lines = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            lines.add(circle(i, from + spacing * i));
        }
        return lines;
    }

    private static List<Label> place(List<Isotherm> lines) {
        OccupancyGrid grid = new OccupancyGrid(1000, 1000, 4);
        for (Isotherm line : lines) {
            double[] xy = line.xy();
            for (int i = 0; i + 3 < xy.length; i += 2) {
                grid.takeLine(xy[i], xy[i + 1], xy[i + 2], xy[i + 3], line.level());
            }
        }
        return new LineLabels(PictureFont.size(22), grid, i -> String.valueOf(20 + 5 * i)).place(lines);
    }

    @Test
    void figuresAreUprightOnTheirLineAndApart() {
        List<Label> labels = place(circles(120, 45, 8));
        assertThat(labels.stream().map(Label::level).distinct())
                .as("each isotherm has a figure")
                .hasSize(8);
        for (Label label : labels) {
            double radius = 120 + 45 * label.level();
            assertThat(Math.hypot(label.x() - 500, label.y() - 500)).isCloseTo(radius, within(4.0));
            assertThat(Math.abs(label.angle())).isLessThanOrEqualTo(Math.PI / 2);
            for (Label other : labels) {
                if (other != label) {
                    assertThat(Math.hypot(label.x() - other.x(), label.y() - other.y()))
                            .isGreaterThan(30);
                }
            }
        }
    }

    @Test
    void whereLinesStandTooCloseThereIsNoFigure() {
        assertThat(place(circles(200, 9, 12)).stream().map(Label::level)).doesNotContain(2, 5, 8);
    }

    @Test
    void theLineIsCutAtItsFiguresAndNowhereElse() {
        for (Isotherm line :
                List.of(circle(0, 300), new Isotherm(0, new double[] {20, 500, 400, 480, 980, 500}, false))) {
            List<Label> labels = place(List.of(line));
            assertThat(labels).isNotEmpty();
            double[] along = LineLabels.lengths(line);
            double whole = along[along.length - 1];
            double gaps = labels.stream().mapToDouble(l -> l.to() - l.from()).sum();
            double left = 0;
            for (double[] part : LineLabels.cut(line, labels)) {
                for (int i = 0; i + 3 < part.length; i += 2) {
                    left += Math.hypot(part[i + 2] - part[i], part[i + 3] - part[i + 1]);
                }
            }
            assertThat(left).isCloseTo(whole - gaps, within(1e-6 * whole));
        }
    }
}
