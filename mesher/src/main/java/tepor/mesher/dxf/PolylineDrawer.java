package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.curve.EllipseCurve;
import tepor.mesher.curve.Placement;
import tepor.mesher.dxf.DxfFaults.Fault;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.PathBuilder;

/** Draws LWPOLYLINE and POLYLINE, with the bulges of their pieces. */
final class PolylineDrawer {
    private static final int CLOSED = 1;
    private static final int NET = 16 | 64; // polygon meshes and polyface meshes
    private static final int FRAME = 16; // vertex of the frame of a spline, not on it
    /** An arc this flat leaves its chord by less than the last digits of its ends. */
    private static final double FLAT = 1e-10;

    private final DrawingUnit unit;

    PolylineDrawer(DrawingUnit unit) {
        this.unit = unit;
    }

    private record Vertex(double x, double y, double bulge) {}

    /** Whether a POLYLINE is a net of faces, and no line. */
    static boolean isNet(DxfRecord record) throws Fault {
        return record.type().equals("POLYLINE") && (record.integer(70, 0) & NET) != 0;
    }

    Optional<PathBuilder> drawLight(DxfRecord record, Placement placement) throws Fault {
        List<Double> x = new ArrayList<>();
        List<Double> y = new ArrayList<>();
        List<Double> bulge = new ArrayList<>();
        for (DxfRecord.Group group : record.groups()) {
            switch (group.code()) {
                case 10 -> x.add(DxfRecord.length(group, record.type(), unit));
                case 20 -> y.add(DxfRecord.length(group, record.type(), unit));
                case 42 -> {
                    int vertex = Math.max(x.size(), y.size()) - 1;
                    while (bulge.size() < vertex) {
                        bulge.add(0.0);
                    }
                    if (vertex >= 0 && bulge.size() == vertex) {
                        bulge.add(DxfRecord.number(group, record.type()));
                    }
                }
                default -> {
                    // Widths, heights and handles do not move the line.
                }
            }
        }
        if (x.size() != y.size()) {
            throw new Fault(
                    "vertex-coordinates",
                    record.line(),
                    "this LWPOLYLINE has " + x.size() + " x and " + y.size() + " y coordinates",
                    "give every vertex both (groups 10 and 20), or draw it again");
        }
        int stated = record.integer(90, x.size());
        if (stated != x.size()) {
            throw new Fault(
                    "vertex-count",
                    record.group(90).orElseThrow().line(),
                    "this LWPOLYLINE says that it has " + stated + " vertices, but has " + x.size(),
                    "vertices are missing or too many: draw it again, or correct the number");
        }
        List<Vertex> vertices = new ArrayList<>();
        for (int i = 0; i < x.size(); i++) {
            vertices.add(new Vertex(x.get(i), y.get(i), i < bulge.size() ? bulge.get(i) : 0));
        }
        return draw(record, vertices, placement);
    }

    Optional<PathBuilder> drawOld(DxfRecord record, Placement placement) throws Fault {
        List<Vertex> vertices = new ArrayList<>();
        for (DxfRecord vertex : record.children()) {
            if ((vertex.integer(70, 0) & FRAME) == 0) {
                vertices.add(new Vertex(
                        vertex.requiredLength(10, "x", unit),
                        vertex.requiredLength(20, "y", unit),
                        vertex.number(42, 0)));
            }
        }
        return draw(record, vertices, placement);
    }

    private Optional<PathBuilder> draw(DxfRecord record, List<Vertex> vertices, Placement placement) throws Fault {
        if (vertices.size() < 2) {
            throw new Fault(
                    "too-few-vertices",
                    record.line(),
                    "this " + record.type() + " has " + vertices.size()
                            + (vertices.size() == 1 ? " vertex" : " vertices"),
                    "draw it again, or delete it");
        }
        boolean closed = (record.integer(70, 0) & CLOSED) != 0;
        PathBuilder path = new PathBuilder(placed(vertices.get(0), placement));
        for (int i = 0; i < (closed ? vertices.size() : vertices.size() - 1); i++) {
            goTo(path, vertices.get(i), vertices.get((i + 1) % vertices.size()), placement);
        }
        return Optional.of(path);
    }

    private static void goTo(PathBuilder path, Vertex from, Vertex to, Placement placement) {
        double bulge = from.bulge();
        Coordinate end = placed(to, placement);
        if (Math.abs(bulge) <= FLAT || path.end().equals2D(end)) {
            path.lineTo(end);
        } else if (placement.keepsShape()) {
            path.bulgeTo(placement.mirrors() ? -bulge : bulge, end);
        } else {
            EllipseCurve arc = arc(from, to).placed(placement);
            arc.follow(path, EntityDrawer.TOLERANCE * arc.extent(), end);
        }
    }

    /** The arc between two vertices: the bulge is the tangent of a quarter of its turn, positive counter-clockwise. */
    private static EllipseCurve arc(Vertex from, Vertex to) {
        double bulge = from.bulge();
        double dx = to.x() - from.x();
        double dy = to.y() - from.y();
        double toCentre = (1 - bulge * bulge) / (4 * bulge);
        double x = 0.5 * (from.x() + to.x()) - toCentre * dy;
        double y = 0.5 * (from.y() + to.y()) + toCentre * dx;
        double radius = Math.hypot(dx, dy) * (1 + bulge * bulge) / (4 * Math.abs(bulge));
        double start = Math.atan2(from.y() - y, from.x() - x);
        double turn = 4 * Math.atan(Math.abs(bulge));
        return bulge > 0
                ? EllipseCurve.circular(x, y, radius, start, start + turn)
                : new EllipseCurve(x, y, radius, 0, 0, -radius, -start, -start + turn);
    }

    private static Coordinate placed(Vertex vertex, Placement placement) {
        return placement.apply(vertex.x(), vertex.y());
    }
}
