package tepor.mesher.dxf;

import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import tepor.mesher.curve.EllipseCurve;
import tepor.mesher.curve.Placement;
import tepor.mesher.dxf.DxfFaults.Fault;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.PathBuilder;

/** Draws single entities as lines with arcs, where a placement lays them. */
final class EntityDrawer {
    /** What is followed by arcs, ellipses and splines, is left by no more than this share of its extent. */
    static final double TOLERANCE = 1e-5;

    /** The kinds that are drawn. */
    static final List<String> KINDS = List.of("LINE", "ARC", "CIRCLE", "ELLIPSE", "LWPOLYLINE", "POLYLINE", "SPLINE");

    private static final double STRAIGHT_UP = 1e-9;

    private final DrawingUnit unit;
    private final PolylineDrawer polylines;
    private final SplineDrawer splines;
    private final GeometryFactory factory = new GeometryFactory();

    EntityDrawer(DrawingUnit unit) {
        this.unit = unit;
        polylines = new PolylineDrawer(unit);
        splines = new SplineDrawer(unit);
    }

    /** Which way the extrusion points: +1 up, −1 down, 0 aslant. */
    static int facing(DxfRecord record) throws Fault {
        double x = record.number(210, 0);
        double y = record.number(220, 0);
        double z = record.number(230, 1);
        double length = Math.sqrt(x * x + y * y + z * z);
        if (!(Math.abs(x) <= STRAIGHT_UP * length) || !(Math.abs(y) <= STRAIGHT_UP * length)) {
            return 0;
        }
        return z > 0 ? 1 : -1;
    }

    /** Where the plane of the entity lies: below a downward extrusion x runs the other way. */
    static Placement plane(DxfRecord record, Placement placement) throws Fault {
        return facing(record) < 0 ? Placement.MIRROR_X.then(placement) : placement;
    }

    /**
     * The entity as a line, closed where its ends are the same; empty where it has no length.
     *
     * @param record of one of {@link #KINDS}
     */
    Optional<LineString> draw(DxfRecord record, Placement placement) throws Fault {
        Optional<PathBuilder> path = switch (record.type()) {
            case "LINE" -> line(record, placement);
            case "CIRCLE" -> circle(record, plane(record, placement));
            case "ARC" -> arc(record, plane(record, placement));
            case "ELLIPSE" -> ellipse(record, placement);
            case "SPLINE" -> splines.draw(record, placement);
            case "LWPOLYLINE" -> polylines.drawLight(record, plane(record, placement));
            default -> polylines.drawOld(record, plane(record, placement));
        };
        Optional<LineString> drawn = path.filter(p -> p.pieceCount() > 0).map(p -> p.line(factory));
        if (drawn.isPresent() && !isFinite(drawn.get())) {
            throw new Fault(
                    "number-too-large",
                    record.line(),
                    "this " + record.type() + " has points that are not finite once it is placed",
                    "check its coordinates, and scale and place of the blocks it is in");
        }
        return drawn;
    }

    private static boolean isFinite(LineString line) {
        for (int i = 0; i < line.getNumPoints(); i++) {
            Coordinate c = line.getCoordinateN(i);
            if (!(Math.abs(c.x) < 1e100) || !(Math.abs(c.y) < 1e100)) {
                return false;
            }
            Circle circle = i == 0 ? null : Arcs.circle(line, i - 1);
            if (circle != null && !(circle.radius() < 1e140)) {
                return false;
            }
        }
        return true;
    }

    private Optional<PathBuilder> line(DxfRecord record, Placement placement) throws Fault {
        Coordinate from = placement.apply(
                record.requiredLength(10, "x of its start", unit), record.requiredLength(20, "y of its start", unit));
        Coordinate to = placement.apply(
                record.requiredLength(11, "x of its end", unit), record.requiredLength(21, "y of its end", unit));
        return Optional.of(new PathBuilder(from).lineTo(to));
    }

    private Optional<PathBuilder> circle(DxfRecord record, Placement placement) throws Fault {
        return follow(round(record, 0, 2 * Math.PI), placement);
    }

    private Optional<PathBuilder> arc(DxfRecord record, Placement placement) throws Fault {
        double from = Math.toRadians(record.required(50, "start angle"));
        double to = Math.toRadians(record.required(51, "end angle"));
        return follow(round(record, from, end(record, from, to)), placement);
    }

    /** The angle of the end, beyond that of the start by more than nothing, and a whole turn at most. */
    private static double end(DxfRecord record, double from, double to) throws Fault {
        double turn = to - from;
        double within = turn - 2 * Math.PI * Math.floor(turn / (2 * Math.PI));
        if (turn == 0 || !Double.isFinite(within)) {
            throw new Fault(
                    "arc-without-turn",
                    record.line(),
                    "this " + record.type() + " ends where it starts, at the same angle",
                    "give it its end angle, or draw a whole circle");
        }
        return from + (within < 1e-9 ? 2 * Math.PI : within);
    }

    private EllipseCurve round(DxfRecord record, double from, double to) throws Fault {
        double x = record.requiredLength(10, "x of its centre", unit);
        double y = record.requiredLength(20, "y of its centre", unit);
        double radius = record.requiredLength(40, "radius", unit);
        if (!(radius > 0)) {
            throw new Fault(
                    "radius",
                    record.group(40).orElseThrow().line(),
                    "this " + record.type() + " has a radius of " + record.text(40, ""),
                    "give it a radius greater than zero, or delete it");
        }
        return EllipseCurve.circular(x, y, radius, from, to);
    }

    private Optional<PathBuilder> ellipse(DxfRecord record, Placement placement) throws Fault {
        double x = record.requiredLength(10, "x of its centre", unit);
        double y = record.requiredLength(20, "y of its centre", unit);
        double ux = record.requiredLength(11, "x of its major axis", unit);
        double uy = record.requiredLength(21, "y of its major axis", unit);
        double ratio = record.required(40, "ratio of its axes");
        if (!(ratio > 0) || (ux == 0 && uy == 0)) {
            throw new Fault(
                    "ellipse-axes",
                    record.group(ratio > 0 ? 11 : 40).orElseThrow().line(),
                    "this ELLIPSE has "
                            + (ratio > 0 ? "a major axis without length" : "a ratio of axes of " + record.text(40, "")),
                    "give it axes longer than zero, or delete it");
        }
        double from = record.number(41, 0);
        double to = end(record, from, record.number(42, 2 * Math.PI));
        double side = facing(record) < 0 ? -ratio : ratio;
        return follow(new EllipseCurve(x, y, ux, uy, -uy * side, ux * side, from, to), placement);
    }

    private static Optional<PathBuilder> follow(EllipseCurve curve, Placement placement) {
        EllipseCurve placed = curve.placed(placement);
        PathBuilder path = new PathBuilder(placed.start());
        placed.follow(path, TOLERANCE * placed.extent());
        return Optional.of(path);
    }
}
