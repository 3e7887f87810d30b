package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import tepor.mesher.mesh.Mesh;
import tepor.mesher.mesh.TriangleMap;
import tepor.solver.assembly.Tensor;
import tepor.solver.field.FieldGradient;
import tepor.solver.field.TemperatureField;
import tepor.solver.model.Case;
import tepor.solver.model.Values;
import tepor.viewer.picture.drawing.Ink;

/**
 * Arrows along the heat flux q = −k ∇T, one for each point of an even pattern. Their length goes with the square root of
 * the flux, so that good and poor conductors can be read in one picture; the key shows two of them with their values.
 */
final class FluxArrows {
    private record Arrow(double x, double y, double qx, double qy) {}

    private final List<Arrow> arrows = new ArrayList<>();
    private final double spacing;
    private double greatest;

    /** @param spacing of the arrows, px */
    FluxArrows(TemperatureField field, Case subject, SectionView view, double spacing) {
        this.spacing = spacing;
        Mesh mesh = field.mesh();
        Tensor[] k = conductivities(subject);
        FieldGradient gradient = new FieldGradient(field);
        double[] q = new double[2];
        double[] l = new double[3];
        TriangleMap map = new TriangleMap(mesh);
        double rowHeight = spacing * Math.sqrt(0.75);
        for (int t = 0; t < mesh.triangleCount(); t++) {
            Rectangle2D box = box(mesh, t, view);
            map.moveTo(t);
            int lastRow = (int) Math.floor(box.getMaxY() / rowHeight);
            for (int row = (int) Math.ceil(box.getMinY() / rowHeight); row <= lastRow; row++) {
                double shift = Math.floorMod(row, 2) * 0.5;
                int last = (int) Math.floor(box.getMaxX() / spacing - shift);
                for (int column = (int) Math.ceil(box.getMinX() / spacing - shift); column <= last; column++) {
                    double px = (column + shift) * spacing;
                    double py = row * rowHeight;
                    if (isIn(map, view.metresX(px), view.metresY(py), l)) {
                        flux(gradient, t, k[mesh.region(t)], l, q);
                        arrows.add(new Arrow(px, py, q[0], q[1]));
                    }
                }
            }
        }
        greatest = arrows.stream()
                .mapToDouble(a -> Math.hypot(a.qx(), a.qy()))
                .max()
                .orElse(0);
    }

    /** Box around a triangle, px; a curved side lies within its ends and the point twice as far off as its middle. */
    private static Rectangle2D box(Mesh mesh, int t, SectionView view) {
        Rectangle2D box =
                new Rectangle2D.Double(view.x(mesh.x(mesh.node(t, 0))), view.y(mesh.y(mesh.node(t, 0))), 0, 0);
        for (int i = 0; i < 3; i++) {
            int a = mesh.node(t, i);
            box.add(view.x(mesh.x(a)), view.y(mesh.y(a)));
            if (mesh.isCurved(t)) {
                int b = mesh.node(t, (i + 1) % 3);
                int m = mesh.node(t, 3 + (i + 2) % 3);
                box.add(
                        view.x(2 * mesh.x(m) - 0.5 * (mesh.x(a) + mesh.x(b))),
                        view.y(2 * mesh.y(m) - 0.5 * (mesh.y(a) + mesh.y(b))));
            }
        }
        return box;
    }

    /** Whether a point is in a triangle; one on a side that triangles share is in one of them. */
    static boolean isIn(TriangleMap map, double x, double y, double[] l) {
        return map.locate(x, y, l) && l[1] >= 0 && l[2] >= 0 && l[1] + l[2] < 1;
    }

    /** Of each region; null for those of nothing. */
    private static Tensor[] conductivities(Case subject) {
        Values values = subject.inputs().nominal();
        return subject.regions().stream()
                .map(r -> r.isHole() ? null : Tensor.of(r.material().conductivity(), values))
                .toArray(Tensor[]::new);
    }

    /** Puts the flux at barycentric coordinates of a triangle into q, W/m², y upwards. */
    static void flux(FieldGradient gradient, int t, Tensor k, double[] l, double[] q) {
        gradient.at(t, l[0], l[1], l[2], q);
        double gx = q[0];
        double gy = q[1];
        q[0] = -(k.xx() * gx + k.xy() * gy);
        q[1] = -(k.xy() * gx + k.yy() * gy);
    }

    /** The same arrows at the scale of others, whose values stand in the key. */
    FluxArrows atScaleOf(FluxArrows others) {
        greatest = others.greatest;
        return this;
    }

    /** Draws the arrows but for those that would cross a figure. */
    void paint(Graphics2D g, List<LineLabels.Label> labels) {
        Path2D path = new Path2D.Double();
        for (Arrow a : arrows) {
            double q = Math.hypot(a.qx(), a.qy());
            double length = length(q);
            if (length > 0.12 * spacing && labels.stream().noneMatch(l -> l.covers(a.x(), a.y(), 0.35 * spacing))) {
                append(path, a.x(), a.y(), a.qx() / q, -a.qy() / q, length);
            }
        }
        Ink.draw(g, path, Ink.PAPER, 0.09 * spacing);
        Ink.draw(g, path, Ink.DARK, 0.042 * spacing);
    }

    private double length(double q) {
        return greatest == 0 ? 0 : 1.1 * spacing * Math.sqrt(q / greatest);
    }

    /** An arrow about its middle. */
    private void append(Path2D path, double x, double y, double ux, double uy, double length) {
        double tipX = x + 0.5 * length * ux;
        double tipY = y + 0.5 * length * uy;
        double head = Math.min(0.24 * spacing, 0.5 * length);
        path.moveTo(x - 0.5 * length * ux, y - 0.5 * length * uy);
        path.lineTo(tipX, tipY);
        path.moveTo(tipX - head * (0.87 * ux - 0.45 * uy), tipY - head * (0.87 * uy + 0.45 * ux));
        path.lineTo(tipX, tipY);
        path.lineTo(tipX - head * (0.87 * ux + 0.45 * uy), tipY - head * (0.87 * uy - 0.45 * ux));
    }

    /** Adds two arrows with their values to the key. */
    void addTo(KeyRow keys, Font font) {
        if (greatest == 0) {
            return;
        }
        double round = roundDown(greatest);
        for (double q : new double[] {round, round / 10}) {
            keys.add(length(q), FigureText.significant(q, 2) + " W/m²", (g, x, y) -> {
                Path2D path = new Path2D.Double();
                append(path, x + 0.5 * length(q), y, 1, 0, length(q));
                Ink.draw(g, path, Ink.DARK, 0.042 * spacing);
            });
        }
    }

    private static double roundDown(double value) {
        double power = Math.pow(10, Math.floor(Math.log10(value)));
        double mantissa = value / power;
        return (mantissa >= 5 ? 5 : mantissa >= 2 ? 2 : 1) * power;
    }
}
