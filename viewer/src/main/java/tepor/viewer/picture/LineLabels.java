package tepor.viewer.picture;

import java.awt.Font;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.IntFunction;
import tepor.viewer.picture.contour.Isotherm;
import tepor.viewer.picture.drawing.OccupancyGrid;
import tepor.viewer.picture.drawing.PictureFont;

/**
 * Finds places for the figures on isotherms: along stretches that hardly turn, upright, with a gap in the line, clear of
 * each other, of other isotherms and of the outline. Where there is no such place an isotherm gets no figure.
 */
final class LineLabels {
    /**
     * A figure on a line.
     *
     * @param line number of the line
     * @param level number of its isotherm
     * @param text the figure
     * @param from where the gap begins, px along the line
     * @param to where the gap ends; may exceed a closed line's length
     * @param x centre
     * @param y centre
     * @param angle to be read at, radians, clockwise on the page, within ±90°
     */
    record Label(int line, int level, String text, double from, double to, double x, double y, double angle) {
        /** Whether a point is nearer to the figure than a distance. */
        boolean covers(double px, double py, double distance) {
            double along = (px - x) * Math.cos(angle) + (py - y) * Math.sin(angle);
            double across = (py - y) * Math.cos(angle) - (px - x) * Math.sin(angle);
            return Math.abs(along) < 0.5 * (to - from) + distance && Math.abs(across) < 0.25 * (to - from) + distance;
        }
    }

    /** Farthest that a line may stray from the middle of its figure, as part of the figure's height. */
    private static final double STRAY = 0.16;
    /** A further figure on the same line every so many heights of text. */
    private static final double SPACING = 34;

    private final Font font;
    private final OccupancyGrid grid;
    private final IntFunction<String> text;

    LineLabels(Font font, OccupancyGrid grid, IntFunction<String> text) {
        this.font = font;
        this.grid = grid;
        this.text = text;
    }

    /**
     * Places figures.
     *
     * @param lines in pixels, longest first served
     */
    List<Label> place(List<Isotherm> lines) {
        Integer[] order = new Integer[lines.size()];
        double[][] along = new double[lines.size()][];
        for (int i = 0; i < order.length; i++) {
            order[i] = i;
            along[i] = lengths(lines.get(i));
        }
        Arrays.sort(order, (a, b) -> Double.compare(end(along[b]), end(along[a])));
        List<Label> labels = new ArrayList<>();
        int rounds = order.length == 0 ? 0 : 1 + (int) (end(along[order[0]]) / (SPACING * font.getSize2D()));
        for (int round = 0; round < Math.min(3, rounds); round++) {
            for (int i : order) {
                if (round == 0 || end(along[i]) > round * SPACING * font.getSize2D()) {
                    best(i, lines.get(i), along[i], labels);
                }
            }
        }
        return labels;
    }

    private static double end(double[] along) {
        return along[along.length - 1];
    }

    private void best(int iLine, Isotherm line, double[] along, List<Label> labels) {
        String figure = text.apply(line.level());
        double height = font.getSize2D();
        double width = PictureFont.width(figure, font);
        double gap = width + 0.5 * height;
        double total = end(along);
        double margin = line.closed() ? 0 : 0.8 * height;
        if (total < (line.closed() ? 2.2 * gap : gap + 2 * margin)) {
            return;
        }
        Label best = null;
        double least = Double.POSITIVE_INFINITY;
        double last = line.closed() ? total : total - margin - gap;
        double step = Math.max(0.25 * height, total / 2000);
        for (double from = margin; from <= last; from += step) {
            double[] a = pointAt(line, along, from);
            double[] b = pointAt(line, along, from + gap);
            double chord = Math.hypot(b[0] - a[0], b[1] - a[1]);
            double stray = chord < 0.97 * gap ? 1 : stray(line, along, from, gap, a, b) / height;
            double angle = Math.atan2(b[1] - a[1], b[0] - a[0]);
            angle -= Math.PI * Math.rint(angle / Math.PI);
            double x = 0.5 * (a[0] + b[0]);
            double y = 0.5 * (a[1] + b[1]);
            double fromMiddle = line.closed() ? 0 : Math.abs(2 * (from + gap / 2) / total - 1);
            double cost =
                    stray + 0.12 * Math.abs(angle) + 0.15 * fromMiddle * fromMiddle + crowding(iLine, labels, x, y);
            if (stray < STRAY && cost < least && grid.isFree(x, y, 0.5 * gap, 0.55 * height, angle, line.level())) {
                least = cost;
                best = new Label(iLine, line.level(), figure, from, from + gap, x, y, angle);
            }
        }
        if (best != null) {
            labels.add(best);
            grid.take(best.x(), best.y(), 0.5 * gap + 0.3 * height, 0.7 * height, best.angle());
        }
    }

    /** Grows as figures come near, much more so for those of the same line; +∞ where too near for that. */
    private double crowding(int iLine, List<Label> labels, double x, double y) {
        double sum = 0;
        for (Label other : labels) {
            double d = Math.hypot(other.x() - x, other.y() - y) / font.getSize2D();
            if (other.line() == iLine && d < 0.45 * SPACING) {
                return Double.POSITIVE_INFINITY;
            }
            sum += 1 / (1 + d * d);
        }
        return sum;
    }

    private static double stray(Isotherm line, double[] along, double from, double gap, double[] a, double[] b) {
        double most = 0;
        double nx = -(b[1] - a[1]);
        double ny = b[0] - a[0];
        double norm = Math.hypot(nx, ny);
        for (int i = 1; i < 6; i++) {
            double[] p = pointAt(line, along, from + gap * i / 6);
            most = Math.max(most, Math.abs((p[0] - a[0]) * nx + (p[1] - a[1]) * ny) / norm);
        }
        return most;
    }

    /** Length from the first point to each point; a closed line has one entry more, its whole length. */
    static double[] lengths(Isotherm line) {
        int n = line.pointCount();
        double[] along = new double[line.closed() ? n + 1 : n];
        double[] xy = line.xy();
        for (int i = 1; i < along.length; i++) {
            int p = i % n;
            along[i] = along[i - 1] + Math.hypot(xy[2 * p] - xy[2 * i - 2], xy[2 * p + 1] - xy[2 * i - 1]);
        }
        return along;
    }

    private static double[] pointAt(Isotherm line, double[] along, double distance) {
        double total = end(along);
        double s = line.closed() && distance >= total ? distance - total : Math.min(distance, total);
        int i = Arrays.binarySearch(along, s);
        i = Math.min(i >= 0 ? i : -i - 2, along.length - 2);
        int next = (i + 1) % line.pointCount();
        double span = along[i + 1] - along[i];
        double t = span == 0 ? 0 : (s - along[i]) / span;
        double[] xy = line.xy();
        return new double[] {
            xy[2 * i] + t * (xy[2 * next] - xy[2 * i]), xy[2 * i + 1] + t * (xy[2 * next + 1] - xy[2 * i + 1])
        };
    }

    /** What is left of a line between its figures: open lines, px. */
    static List<double[]> cut(Isotherm line, List<Label> onLine) {
        double[] along = lengths(line);
        double total = end(along);
        if (onLine.isEmpty()) {
            return List.of();
        }
        List<Label> sorted = new ArrayList<>(onLine);
        sorted.sort((a, b) -> Double.compare(a.from(), b.from()));
        List<double[]> parts = new ArrayList<>();
        for (int i = 0; i < sorted.size(); i++) {
            double from = sorted.get(i).to();
            boolean last = i == sorted.size() - 1;
            if (line.closed()) {
                parts.add(part(
                        line,
                        along,
                        from,
                        last ? sorted.get(0).from() + total : sorted.get(i + 1).from()));
            } else {
                parts.add(
                        part(line, along, from, last ? total : sorted.get(i + 1).from()));
            }
        }
        if (!line.closed()) {
            parts.add(part(line, along, 0, sorted.get(0).from()));
        }
        return parts;
    }

    private static double[] part(Isotherm line, double[] along, double from, double to) {
        double total = end(along);
        int n = line.pointCount();
        double[] xy = new double[2 * (2 * n + 4)];
        int k = 0;
        double[] p = pointAt(line, along, from);
        xy[k++] = p[0];
        xy[k++] = p[1];
        for (int i = 0; i < (line.closed() ? 2 * n : n); i++) {
            double s = along[i % n] + (i >= n ? total : 0);
            if (s > from && s < to) {
                xy[k++] = line.xy()[2 * (i % n)];
                xy[k++] = line.xy()[2 * (i % n) + 1];
            }
        }
        p = pointAt(line, along, to);
        xy[k++] = p[0];
        xy[k++] = p[1];
        return Arrays.copyOf(xy, k);
    }
}
