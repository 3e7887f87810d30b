package tepor.viewer.picture;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntPredicate;
import java.util.stream.IntStream;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.section.Section;
import tepor.mesher.section.SegmentCurve;
import tepor.viewer.picture.SegmentChains.Chain;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.OccupancyGrid;

/** A section as it stands in a picture: metres to pixels, its outline, borders, mesh and insulated boundary. */
final class SectionView {
    private static final double OUTLINE = 3.4;
    private static final double BORDER = 1.7;
    /** The lines that stand for an arc are this close to it, px. */
    private static final double ARC_TOLERANCE = 0.05;

    private static final double TICK_SPACING = 15;
    private static final double TICK = 13;
    /** A line covers at most this part of the layer it bounds. */
    private static final double SHARE_OF_LAYER = 0.22;

    private final Section section;
    private final double unit;
    private final double scale;
    private final double left;
    private final double top;
    private final double[] bounds;
    /**
     * Of each region: area over half its border's length, px; the thickness of a long strip. Infinite where a region of
     * nothing has no area of its own, being open to the outside: it narrows no line.
     */
    private final double[] thickness;

    /**
     * @param section what is shown
     * @param frame in which it is centred, as large as it will go, px
     * @param unit px for which line widths are meant
     */
    SectionView(Section section, Rectangle2D frame, double unit) {
        this(section, section.bounds(), frame, unit);
    }

    /**
     * @param window what of the section is to fill the frame: least x, least y, greatest x, greatest y, metres
     */
    SectionView(Section section, double[] window, Rectangle2D frame, double unit) {
        this.section = section;
        this.unit = unit;
        bounds = window.clone();
        double width = bounds[2] - bounds[0];
        double height = bounds[3] - bounds[1];
        scale = Math.min(frame.getWidth() / width, frame.getHeight() / height);
        left = frame.getCenterX() - 0.5 * scale * width;
        top = frame.getCenterY() - 0.5 * scale * height;
        thickness = thickness();
    }

    private double[] thickness() {
        double[] border = new double[section.regionCount()];
        for (int s = 0; s < section.segmentCount(); s++) {
            for (int r : new int[] {section.left(s), section.right(s)}) {
                if (r != Section.NONE) {
                    border[r] += section.length(s);
                }
            }
        }
        double[] result = new double[border.length];
        for (int r = 0; r < border.length; r++) {
            double area = section.area(r);
            result[r] = area > 0 ? 2 * area / border[r] * scale : Double.POSITIVE_INFINITY;
        }
        return result;
    }

    /** Pixels per metre. */
    double scale() {
        return scale;
    }

    double x(double metres) {
        return left + scale * (metres - bounds[0]);
    }

    double y(double metres) {
        return top + scale * (bounds[3] - metres);
    }

    /** The x in metres that stands at x in pixels. */
    double metresX(double px) {
        return bounds[0] + (px - left) / scale;
    }

    /** The y in metres that stands at y in pixels. */
    double metresY(double px) {
        return bounds[3] - (px - top) / scale;
    }

    /** The material's bounding box, or the window, px. */
    Rectangle2D box() {
        return new Rectangle2D.Double(left, top, scale * (bounds[2] - bounds[0]), scale * (bounds[3] - bounds[1]));
    }

    /** Points in metres, x and y in turn, as points in pixels. */
    double[] toPixels(double[] metres) {
        double[] px = new double[metres.length];
        for (int i = 0; i < px.length; i += 2) {
            px[i] = x(metres[i]);
            px[i + 1] = y(metres[i + 1]);
        }
        return px;
    }

    /** Loops in metres as one shape in pixels. */
    Path2D shape(List<double[]> loops) {
        Path2D path = new Path2D.Double(Path2D.WIND_EVEN_ODD);
        loops.forEach(loop -> Ink.append(path, toPixels(loop), true));
        return path;
    }

    /** The shape of some regions together, pixels. */
    Path2D shape(IntPredicate regions) {
        Path2D path = new Path2D.Double(Path2D.WIND_EVEN_ODD);
        SegmentChains.loops(section, regions).forEach(chain -> Ink.append(path, points(chain), true));
        return path;
    }

    /** The shape of all material, pixels. */
    Path2D material() {
        return shape(this::isSolid);
    }

    private boolean isSolid(int region) {
        return region != Section.NONE && !section.isHole(region);
    }

    /** A chain as points in pixels, arcs as many short lines; a closed one does not repeat the first. */
    double[] points(Chain chain) {
        double[] px = new double[2 * chain.segments().length + 2];
        int count = 0;
        for (int i = 0; i < chain.segments().length; i++) {
            int s = chain.segments()[i];
            double[] along = points(s, chain.vertices()[i] == section.start(s));
            int rest = 2 * (chain.segments().length - i);
            px = px.length < count + along.length + rest ? Arrays.copyOf(px, 2 * (count + along.length + rest)) : px;
            System.arraycopy(along, 0, px, count, along.length);
            count += along.length - 2; // the last point is the next segment's first
        }
        return Arrays.copyOf(px, chain.closed() ? count : count + 2);
    }

    /** Points along a segment in pixels, both ends among them. */
    private double[] points(int segment, boolean fromStart) {
        return toPixels(SegmentCurve.points(section, segment, fromStart, ARC_TOLERANCE / scale));
    }

    /**
     * Draws the outline. What is filled later covers its inner half, so that the bold line hides nothing of the material,
     * however thin that is; a narrow hole makes it narrower.
     */
    void paintOutline(Graphics2D g) {
        for (Chain chain : SegmentChains.loops(section, this::isSolid)) {
            double width = OUTLINE * unit;
            for (int s : chain.segments()) {
                int beside = isSolid(section.left(s)) ? section.right(s) : section.left(s);
                if (beside != Section.NONE) {
                    width = Math.min(width, SHARE_OF_LAYER * thickness[beside]);
                }
            }
            Ink.draw(g, Ink.path(points(chain), true), Ink.DARK, 2 * width);
        }
    }

    /** Draws where regions meet, more thinly where a layer is thin. */
    void paintBorders(Graphics2D g) {
        Map<Long, int[]> byPair = new LinkedHashMap<>();
        for (int s = 0; s < section.segmentCount(); s++) {
            int a = Math.min(section.left(s), section.right(s));
            int b = Math.max(section.left(s), section.right(s));
            if (isSolid(a) && isSolid(b) && a != b) {
                byPair.merge(((long) a << 32) | b, new int[] {s}, SectionView::concatenate);
            }
        }
        byPair.forEach((pair, segments) -> {
            double thinner = Math.min(thickness[(int) (pair >>> 32)], thickness[pair.intValue()]);
            double width = Math.max(0.25 * unit, Math.min(BORDER * unit, SHARE_OF_LAYER * thinner));
            Path2D path = new Path2D.Double();
            for (Chain chain : SegmentChains.lines(section, segments)) {
                Ink.append(path, points(chain), chain.closed());
            }
            if (thinner > 14 * unit) { // a pale seam makes the line stand out from dark bands
                Ink.draw(g, path, new Color(0xF4, 0xF1, 0xE6, 110), width + 2.2 * unit);
            }
            Ink.draw(g, path, Ink.DARK, width);
        });
    }

    /** Draws cuts through regions: thin and dashed, as nothing is there in truth. */
    void paintCuts(Graphics2D g) {
        int[] cuts = IntStream.range(0, section.segmentCount())
                .filter(s -> section.isCut(s) && isSolid(section.left(s)))
                .toArray();
        Path2D path = new Path2D.Double();
        for (Chain chain : SegmentChains.lines(section, cuts)) {
            Ink.append(path, points(chain), chain.closed());
        }
        Ink.draw(g, path, new Color(0xF4, 0xF1, 0xE6, 150), 3 * unit);
        g.setColor(Ink.DARK);
        g.setStroke(new BasicStroke(
                (float) (1.3 * unit),
                BasicStroke.CAP_BUTT,
                BasicStroke.JOIN_ROUND,
                10,
                new float[] {(float) (7 * unit), (float) (4 * unit)},
                0));
        g.draw(path);
    }

    private static int[] concatenate(int[] a, int[] b) {
        int[] both = Arrays.copyOf(a, a.length + b.length);
        System.arraycopy(b, 0, both, a.length, b.length);
        return both;
    }

    /** Takes the room of all borders between regions. */
    void takeBorders(OccupancyGrid grid) {
        for (int s = 0; s < section.segmentCount(); s++) {
            if (section.solidLeft(s) || section.solidRight(s)) {
                double[] xy = points(s, true);
                for (int i = 0; i + 3 < xy.length; i += 2) {
                    grid.takeLine(xy[i], xy[i + 1], xy[i + 2], xy[i + 3]);
                }
            }
        }
    }

    /** Draws a boundary on which nothing was stated: a line in the warning ink with slanted ticks on its outer side. */
    void paintInsulated(Graphics2D g, List<int[]> runs) {
        Path2D ticks = new Path2D.Double();
        Path2D line = new Path2D.Double();
        for (int[] run : runs) {
            double next = 0.5 * TICK_SPACING * unit;
            for (int s : run) {
                double[] xy = points(s, section.solidLeft(s));
                line.append(Ink.path(xy, false), false);
                for (int i = 0; i + 3 < xy.length; i += 2) {
                    double dx = xy[i + 2] - xy[i];
                    double dy = xy[i + 3] - xy[i + 1];
                    double length = Math.hypot(dx, dy);
                    for (; next <= length; next += TICK_SPACING * unit) {
                        appendTick(ticks, xy[i] + dx * next / length, xy[i + 1] + dy * next / length, dx, dy);
                    }
                    next -= length;
                }
            }
        }
        Ink.draw(g, line, Ink.WARNING, 2.6 * unit);
        Ink.draw(g, ticks, Ink.WARNING, 2.2 * unit);
    }

    /** A tick at a point, to the right of a direction on the page as seen with y upwards. */
    private void appendTick(Path2D ticks, double x, double y, double dx, double dy) {
        double length = Math.hypot(dx, dy);
        double ux = dx / length;
        double uy = dy / length;
        // The material lies on the left of (ux, uy) seen with y upwards; on the page the outside is at (−uy, ux).
        double outX = -uy;
        double outY = ux;
        ticks.append(
                new Line2D.Double(
                        x, y, x + TICK * unit * (0.8 * outX + 0.6 * ux), y + TICK * unit * (0.8 * outY + 0.6 * uy)),
                false);
    }

    /** Chooses sides of a mesh by the nodes at their ends. */
    @FunctionalInterface
    interface Sides {
        boolean has(int nodeA, int nodeB);
    }

    /** Draws the chosen sides of a mesh, each once. */
    void paintMesh(Graphics2D g, Mesh mesh, Color colour, Sides chosen) {
        Path2D path = new Path2D.Double();
        for (int t = 0; t < mesh.triangleCount(); t++) {
            for (int i = 0; i < 3; i++) {
                if (mesh.neighbour(t, i) < t) {
                    int a = mesh.node(t, (i + 1) % 3);
                    int b = mesh.node(t, (i + 2) % 3);
                    if (chosen.has(a, b)) {
                        path.moveTo(x(mesh.x(a)), y(mesh.y(a)));
                        if (mesh.isCurved(t)) {
                            int m = mesh.node(t, 3 + i);
                            path.quadTo(
                                    x(2 * mesh.x(m) - 0.5 * (mesh.x(a) + mesh.x(b))),
                                    y(2 * mesh.y(m) - 0.5 * (mesh.y(a) + mesh.y(b))),
                                    x(mesh.x(b)),
                                    y(mesh.y(b)));
                        } else {
                            path.lineTo(x(mesh.x(b)), y(mesh.y(b)));
                        }
                    }
                }
            }
        }
        double typical = Math.sqrt(2 * area() / Math.max(1, mesh.triangleCount()));
        Color pale = new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), 105);
        Ink.draw(g, path, pale, Math.min(0.9 * unit, 0.06 * typical));
    }

    /** Of the material, px². */
    private double area() {
        double sum = 0;
        for (int r = 0; r < section.regionCount(); r++) {
            sum += section.isHole(r) ? 0 : section.area(r);
        }
        return sum * scale * scale;
    }
}
