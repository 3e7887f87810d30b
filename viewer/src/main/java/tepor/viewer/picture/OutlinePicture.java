package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleMap;
import tepor.mesher.section.Section;
import tepor.solver.answer.Inspection;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.Region;
import tepor.viewer.picture.PictureOptions.Layer;
import tepor.viewer.picture.SegmentChains.Chain;
import tepor.viewer.picture.drawing.EntryList;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.OccupancyGrid;
import tepor.viewer.picture.drawing.PictureFont;
import tepor.viewer.picture.drawing.TagPlacer;

/** The outline of an inspected case: regions with their names, named edges, and the boundary that nobody named. */
public final class OutlinePicture implements Picture {
    private static final double EDGE = 5;
    /** Lines whose lengths differ by no more than this are as long as each other. */
    private static final double ROUNDING = 1e-9;

    private final Case subject;
    private final Mesh mesh;
    private final List<int[]> insulated;
    private final PictureOptions options;
    private final Font font;
    private final Sheet sheet;
    private final SectionView view;
    private final KeyRow keys;
    private final EntryList list;
    private final List<Name> names = new ArrayList<>();

    /** A region's name or an edge's number, and the point it belongs to where a leader line goes there. */
    private record Name(String text, double x, double y, double angle, double[] leader, boolean edge) {}

    /** Lays the picture out; of the options' layers only MESH counts. */
    public OutlinePicture(Inspection inspection, PictureOptions options) {
        subject = inspection.subject();
        mesh = inspection.mesh().mesh();
        insulated = inspection.insulated().pieces();
        this.options = options;
        font = Sheet.font(options);
        double unit = Sheet.unit(options);
        list = list(unit);
        double[] box = subject.section().bounds();
        double aspect = (box[2] - box[0]) / (box[3] - box[1]);
        Sheet draft = sheet(aspect, keys(inspection, 1e3, unit));
        keys = keys(inspection, new SectionView(subject.section(), draft.view, unit).scale(), unit);
        sheet = sheet(aspect, keys);
        view = new SectionView(subject.section(), sheet.view, unit);
        placeNames();
    }

    private Sheet sheet(double aspect, KeyRow row) {
        return new Sheet(options, subject.title(), aspect, 0, 0, row, list);
    }

    private KeyRow keys(Inspection inspection, double pixelsPerMetre, double unit) {
        KeyRow row = new KeyRow(font);
        row.addScaleBar(pixelsPerMetre, 260 * unit, subject.unit());
        if (inspection.insulated().byDefault() > 0) {
            row.addInsulated(inspection.insulated().byDefault(), subject.unit());
        }
        return row;
    }

    private EntryList list(double unit) {
        List<EntryList.Entry> entries = new ArrayList<>();
        double text = font.getSize2D();
        for (Region region : subject.regions()) {
            int i = region.index();
            entries.add(new EntryList.Entry(
                    (g, x, y) -> {
                        Rectangle2D swatch =
                                new Rectangle2D.Double(x - 1.5 * text, y - 0.55 * text, 2.7 * text, 1.25 * text);
                        if (!region.isHole()) {
                            Hatching.fill(g, swatch, i, unit);
                        }
                        Ink.draw(g, swatch, Ink.DARK, 1.2 * unit);
                    },
                    region.name(),
                    ConditionText.of(region),
                    ""));
        }
        for (int e = 0; e < subject.edges().size(); e++) {
            Edge edge = subject.edges().get(e);
            int i = e;
            entries.add(new EntryList.Entry(
                    (g, x, y) -> {
                        EdgeStyle.draw(g, new Line2D.Double(x - 1.7 * text, y, x + 1.5 * text, y), i, EDGE * unit);
                        Ink.tag(g, String.valueOf(i + 1), x - 0.1 * text, y, font, true);
                    },
                    edge.name(),
                    ConditionText.of(edge),
                    ""));
        }
        return new EntryList("", entries, font, 3.9 * text);
    }

    private void placeNames() {
        Section section = subject.section();
        TagPlacer placer = new TagPlacer(sheet.frame, Ink.tagHeight(font));
        List<double[]> anchors = new ArrayList<>();
        for (Edge edge : subject.edges()) {
            double[] anchor = anchor(section, edge);
            anchors.add(anchor);
            placer.keepClear(anchor[0], anchor[1]);
        }
        OccupancyGrid grid = new OccupancyGrid(sheet.width, sheet.height, 4 * sheet.unit);
        for (int e = 0; e < anchors.size(); e++) {
            double[] a = anchors.get(e);
            String number = String.valueOf(e + 1);
            double width = Ink.tagWidth(number, font);
            double[] at = placer.place(a[0], a[1], width, a[2]);
            names.add(new Name(number, at[0], at[1], 0, new double[] {a[0], a[1]}, true));
            double h = Ink.tagHeight(font) / 2 + 3;
            grid.takeBox(at[0] - width / 2 - 3, at[1] - h, at[0] + width / 2 + 3, at[1] + h);
            grid.takeLine(a[0], a[1], at[0], at[1]);
        }
        view.takeBorders(grid);
        for (Region region : subject.regions()) {
            if (!region.isHole() && section.area(region.index()) > 0) {
                Name inside = roomFor(region, grid);
                if (inside == null) {
                    double[] p = middleOfLargestTriangle(region.index());
                    double[] at = placer.place(p[0], p[1], Ink.tagWidth(region.name(), font), Double.NaN);
                    inside = new Name(region.name(), at[0], at[1], 0, p, false);
                }
                names.add(inside);
                double half = PictureFont.width(region.name(), font) / 2 + 0.5 * font.getSize2D();
                grid.take(inside.x(), inside.y(), half, 0.8 * font.getSize2D(), inside.angle());
                placer.keepClear(inside.x(), inside.y());
            }
        }
    }

    /** The middle of the edge's longest line, and the direction away from the material on its left. */
    private double[] anchor(Section section, Edge edge) {
        double[] best = {view.box().getCenterX(), view.box().getCenterY(), Double.NaN};
        double longest = -1;
        for (Chain chain : SegmentChains.lines(section, edge.pieces().segments())) {
            double[] xy = view.points(chain);
            int count = chain.closed() ? xy.length / 2 : xy.length / 2 - 1;
            double[] lengths = new double[count];
            for (int k = 0; k < count; k++) {
                lengths[k] = Math.hypot(dx(xy, k), dy(xy, k));
            }
            double total = Arrays.stream(lengths).sum();
            if (total > longest * (1 + ROUNDING)) {
                longest = total;
                double left = 0.5 * total;
                int k = 0;
                while (k < count - 1 && left > lengths[k]) {
                    left -= lengths[k++];
                }
                double t = left / lengths[k];
                best = new double[] {
                    xy[2 * k] + t * dx(xy, k), xy[2 * k + 1] + t * dy(xy, k), Math.atan2(dx(xy, k), -dy(xy, k))
                };
            }
        }
        return best;
    }

    private static double dx(double[] xy, int k) {
        return xy[(2 * k + 2) % xy.length] - xy[2 * k];
    }

    private static double dy(double[] xy, int k) {
        return xy[(2 * k + 3) % xy.length] - xy[2 * k + 1];
    }

    /** A place for the region's name inside it, level or upright, nearest to the middle of its box; null if none. */
    private Name roomFor(Region region, OccupancyGrid taken) {
        Path2D shape = view.shape(r -> r == region.index());
        Rectangle2D box = shape.getBounds2D();
        double half = PictureFont.width(region.name(), font) / 2 + 0.4 * font.getSize2D();
        double height = 0.7 * font.getSize2D();
        OccupancyGrid grid = taken.copy();
        grid.takeOutside(shape);
        Name best = null;
        double least = Double.POSITIVE_INFINITY;
        for (double angle : new double[] {0, -Math.PI / 2}) {
            double step = Math.max(height, Math.min(box.getWidth(), box.getHeight()) / 40);
            for (double y = box.getMinY() + step / 2; y < box.getMaxY(); y += step) {
                for (double x = box.getMinX() + step / 2; x < box.getMaxX(); x += step) {
                    double d = Math.hypot(x - box.getCenterX(), y - box.getCenterY());
                    if (d < least && grid.isFree(x, y, half, height, angle)) {
                        least = d;
                        best = new Name(region.name(), x, y, angle, null, false);
                    }
                }
            }
            if (best != null) {
                break;
            }
        }
        return best;
    }

    private double[] middleOfLargestTriangle(int region) {
        double[] at = {view.box().getCenterX(), view.box().getCenterY()};
        double largest = 0;
        TriangleMap map = new TriangleMap(mesh);
        double third = 1.0 / 3;
        for (int t = 0; t < mesh.triangleCount(); t++) {
            if (mesh.region(t) == region && mesh.area(t) > largest) {
                largest = mesh.area(t);
                map.moveTo(t);
                at[0] = view.x(map.x(third, third, third));
                at[1] = view.y(map.y(third, third, third));
            }
        }
        return at;
    }

    @Override
    public int width() {
        return sheet.width;
    }

    @Override
    public int height() {
        return sheet.height;
    }

    @Override
    public String description() {
        return subject.title() + ": outline, regions and edges";
    }

    @Override
    public void paint(Graphics2D g) {
        Ink.prepare(g, sheet.width, sheet.height);
        sheet.paintTitle(g);
        view.paintOutline(g);
        paintEdges(g, true);
        for (Region region : subject.regions()) {
            if (!region.isHole()) {
                Hatching.fill(g, view.shape(r -> r == region.index()), region.index(), sheet.unit);
            }
        }
        if (options.has(Layer.MESH)) {
            view.paintMesh(g, mesh, Ink.DARK, (a, b) -> true);
        }
        view.paintBorders(g);
        paintEdges(g, false);
        view.paintInsulated(g, insulated);
        names.forEach(name -> paintName(g, name));
        sheet.paintBelowTitle(g, keys, list);
    }

    /** Edges on the boundary are painted before the regions, which cover their inner half, so that they hide no layer. */
    private void paintEdges(Graphics2D g, boolean onBoundary) {
        for (int e = 0; e < subject.edges().size(); e++) {
            int[] segments = Arrays.stream(subject.edges().get(e).pieces().segments())
                    .filter(s -> subject.section().isBoundary(s) == onBoundary)
                    .toArray();
            Path2D path = new Path2D.Double();
            for (Chain chain : SegmentChains.lines(subject.section(), segments)) {
                Ink.append(path, view.points(chain), chain.closed());
            }
            if (onBoundary) {
                EdgeStyle.drawHalf(g, path, e, EDGE * sheet.unit);
            } else {
                EdgeStyle.draw(g, path, e, 0.8 * EDGE * sheet.unit);
            }
        }
    }

    private void paintName(Graphics2D g, Name name) {
        if (name.leader() != null) {
            Line2D line = new Line2D.Double(name.leader()[0], name.leader()[1], name.x(), name.y());
            Ink.draw(g, line, Ink.PAPER, 4.5 * sheet.unit);
            Ink.draw(g, line, Ink.DARK, 1.7 * sheet.unit);
            Ink.tag(g, name.text(), name.x(), name.y(), font, name.edge());
            return;
        }
        var before = g.getTransform();
        g.rotate(name.angle(), name.x(), name.y());
        double w = PictureFont.width(name.text(), font) + 0.6 * font.getSize2D();
        double h = 1.25 * font.getSize2D();
        Ink.fill(g, new Rectangle2D.Double(name.x() - w / 2, name.y() - h / 2, w, h), Ink.PAPER);
        Ink.centred(g, name.text(), name.x(), name.y(), font, Ink.DARK);
        g.setTransform(before);
    }
}
