package tepor.mesher.section;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.index.hprtree.HPRtree;

/** Tells which straight pieces lie wholly on a drawn line, and in which direction the line runs there. */
final class LineCover {
    private final double tolerance;
    private final List<Coordinate[]> parts = new ArrayList<>();
    private final HPRtree index = new HPRtree();

    /**
     * @param line line strings
     * @param tolerance how far from the line a piece still lies on it
     */
    LineCover(Geometry line, double tolerance) {
        this.tolerance = tolerance;
        for (int i = 0; i < line.getNumGeometries(); i++) {
            Coordinate[] points = line.getGeometryN(i).getCoordinates();
            for (int k = 1; k < points.length; k++) {
                if (!points[k].equals2D(points[k - 1])) {
                    index.insert(new Envelope(points[k - 1], points[k]), parts.size());
                    parts.add(new Coordinate[] {points[k - 1], points[k]});
                }
            }
        }
    }

    /** +1 where the piece lies on the line and runs its way, −1 where it runs against it, 0 where it does not lie on it. */
    int direction(double x0, double y0, double x1, double y1) {
        double length = Math.hypot(x1 - x0, y1 - y0);
        double ux = (x1 - x0) / length;
        double uy = (y1 - y0) / length;
        Envelope reach = new Envelope(x0, x1, y0, y1);
        reach.expandBy(tolerance);
        List<double[]> covered = new ArrayList<>(); // from, to, direction
        index.query(reach, item -> {
            Coordinate[] part = parts.get((Integer) item);
            addCovered(covered, part[0].x - x0, part[0].y - y0, part[1].x - x0, part[1].y - y0, ux, uy);
        });
        covered.sort((a, b) -> Double.compare(a[0], b[0]));
        double end = 0;
        double along = 0;
        for (double[] span : covered) {
            if (span[0] > end + tolerance) {
                return 0;
            }
            along += span[2] * Math.max(0, Math.min(span[1], length) - Math.max(span[0], 0));
            end = Math.max(end, span[1]);
        }
        if (covered.isEmpty() || end < length - tolerance) {
            return 0;
        }
        return along >= 0 ? 1 : -1;
    }

    /** Adds the span of the piece (distances from its start) that a part of the line covers. */
    private void addCovered(List<double[]> covered, double px, double py, double qx, double qy, double ux, double uy) {
        double tp = px * ux + py * uy; // along the piece
        double tq = qx * ux + qy * uy;
        double dp = ux * py - uy * px; // across it
        double dq = ux * qy - uy * qx;
        double from = 0; // the share of the part within tolerance
        double to = 1;
        if (dp == dq) {
            if (Math.abs(dp) > tolerance) {
                return;
            }
        } else {
            double a = (-tolerance - dp) / (dq - dp);
            double b = (tolerance - dp) / (dq - dp);
            from = Math.max(from, Math.min(a, b));
            to = Math.min(to, Math.max(a, b));
        }
        if (from <= to) {
            double a = tp + from * (tq - tp);
            double b = tp + to * (tq - tp);
            covered.add(new double[] {Math.min(a, b), Math.max(a, b), Math.signum(tq - tp)});
        }
    }
}
