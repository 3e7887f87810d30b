package tepor.mesher.mending;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.Arcs;
import tepor.mesher.outline.Circle;
import tepor.mesher.outline.DrawingUnit;
import tepor.mesher.outline.PathBuilder;

/**
 * Writes outlines as records of well-known text, in the drawing's unit: numbers that read back to the very same
 * coordinates, arcs as CIRCULARSTRING through three points of their circle.
 */
public final class OutlineText {
    /** So many middles of an arc are tried for one that reads back to the very circle. */
    private static final int MIDDLES = 64;

    private final DrawingUnit unit;
    private final StringBuilder text = new StringBuilder();

    /** @param unit the unit to write coordinates in */
    public OutlineText(DrawingUnit unit) {
        this.unit = unit;
    }

    /** Adds a line of comment. */
    public OutlineText comment(String line) {
        text.append("# ").append(line.replaceAll("\\R", " ")).append('\n');
        return this;
    }

    /** Whether a name can stand before a record. */
    public static boolean isWritable(String name) {
        return name.equals(name.strip()) && name.indexOf('#') < 0 && !name.matches("(?s).*\\R.*");
    }

    /**
     * Adds records: one for each polygon, line or point.
     *
     * @param name their name; empty for none
     * @param geometry metres
     */
    public OutlineText record(String name, Geometry geometry) {
        for (int i = 0; i < geometry.getNumGeometries(); i++) {
            Geometry part = geometry.getGeometryN(i);
            text.append(name.isEmpty() ? "" : name + ": ");
            if (part instanceof Polygon polygon) {
                polygon(polygon);
            } else if (part instanceof LineString line) {
                String drawn = path(line);
                text.append(drawn.startsWith("(") ? "LINESTRING " + drawn : drawn);
            } else {
                text.append("POINT (").append(point(part.getCoordinate())).append(')');
            }
            text.append('\n');
        }
        return this;
    }

    private void polygon(Polygon polygon) {
        List<String> rings = new ArrayList<>();
        boolean curved = polygon.getExteriorRing() instanceof Arcs;
        rings.add(path(polygon.getExteriorRing()));
        for (int h = 0; h < polygon.getNumInteriorRing(); h++) {
            curved |= polygon.getInteriorRingN(h) instanceof Arcs;
            rings.add(path(polygon.getInteriorRingN(h)));
        }
        text.append(curved ? "CURVEPOLYGON (" : "POLYGON (")
                .append(String.join(", ", rings))
                .append(')');
    }

    /** A line or ring: bare points where it is straight. */
    private String path(LineString line) {
        Coordinate[] points = line.getCoordinates();
        int from = runStart(line, points.length - 1);
        if (from > 0) {
            return path(rotated((LinearRing) line, from));
        }
        List<String> parts = new ArrayList<>();
        int i = 0;
        while (i + 1 < points.length) {
            Circle circle = Arcs.circle(line, i);
            int end = i + 1;
            while (end + 1 < points.length && same(Arcs.circle(line, end), circle)) {
                end++;
            }
            parts.add(circle == null ? straight(points, i, end) : arc(points, i, end, circle));
            i = end;
        }
        if (parts.size() == 1) {
            return parts.get(0);
        }
        return "COMPOUNDCURVE (" + String.join(", ", parts) + ")";
    }

    /** Where a ring is best begun, so that no arc is cut in two by its beginning; 0 where it begins well. */
    private static int runStart(LineString line, int pieces) {
        if (!(line instanceof LinearRing) || !same(Arcs.circle(line, 0), Arcs.circle(line, pieces - 1))) {
            return 0;
        }
        for (int i = 1; i < pieces; i++) {
            if (!same(Arcs.circle(line, i), Arcs.circle(line, i - 1))) {
                return i;
            }
        }
        return 0;
    }

    private static LineString rotated(LinearRing ring, int from) {
        RingPath path = new RingPath(ring);
        RingPath turned = new RingPath();
        for (int k = 0; k < path.size(); k++) {
            int i = (from + k) % path.size();
            turned.add(path.point(i), path.circle(i));
        }
        return turned.ring(ring.getFactory());
    }

    private static boolean same(Circle one, Circle other) {
        return one == null ? other == null : one.equals(other);
    }

    private String straight(Coordinate[] points, int from, int to) {
        List<String> texts = new ArrayList<>();
        for (int i = from; i <= to; i++) {
            texts.add(point(points[i]));
        }
        return "(" + String.join(", ", texts) + ")";
    }

    private String arc(Coordinate[] points, int from, int to, Circle circle) {
        Coordinate a = points[from];
        Coordinate b = points[to];
        double turn = 0;
        for (int i = from; i < to; i++) {
            turn += circle.turn(points[i].x, points[i].y, points[i + 1].x, points[i + 1].y);
        }
        Coordinate through = a.equals2D(b)
                ? read(new Coordinate(2 * circle.x() - a.x, 2 * circle.y() - a.y))
                : middle(a, b, circle, turn);
        return "CIRCULARSTRING (" + point(a) + ", " + point(through) + ", " + point(b) + ")";
    }

    /** A point near the arc's middle from which, if possible, the very circle is read back; else the nearest to it. */
    private Coordinate middle(Coordinate a, Coordinate b, Circle circle, double turn) {
        double start = Math.atan2(a.y - circle.y(), a.x - circle.x());
        Coordinate best = null;
        double least = Double.POSITIVE_INFINITY;
        for (int k = 0; k < MIDDLES && least > 0; k++) {
            double angle = start + turn * (0.5 + 0.002 * k);
            Coordinate through = read(new Coordinate(
                    circle.x() + circle.radius() * Math.cos(angle), circle.y() + circle.radius() * Math.sin(angle)));
            Circle back = PathBuilder.circle(a, through, b).orElse(null);
            double off = back == null
                    ? Double.MAX_VALUE
                    : Math.hypot(back.x() - circle.x(), back.y() - circle.y())
                            + Math.abs(back.radius() - circle.radius());
            if (off < least) {
                least = off;
                best = through;
            }
        }
        return best;
    }

    /** A point as it will be read. */
    private Coordinate read(Coordinate c) {
        return new Coordinate(
                unit.toMetres(Double.parseDouble(number(c.x))), unit.toMetres(Double.parseDouble(number(c.y))));
    }

    private String point(Coordinate c) {
        return number(c.x) + " " + number(c.y);
    }

    /** The shortest number that reads back to the same metres. */
    private String number(double metres) {
        double value = metres / unit.metres();
        for (int digits = 12; digits <= 17; digits++) {
            String shown = plain(new BigDecimal(value).round(new MathContext(digits)));
            if (unit.toMetres(Double.parseDouble(shown)) == metres) {
                return shown;
            }
        }
        for (double near : new double[] {Math.nextUp(value), Math.nextDown(value)}) {
            if (unit.toMetres(near) == metres) {
                return plain(BigDecimal.valueOf(near));
            }
        }
        return plain(BigDecimal.valueOf(value));
    }

    private static String plain(BigDecimal number) {
        if (number.signum() == 0) {
            return "0";
        }
        BigDecimal stripped = number.stripTrailingZeros();
        String plain = stripped.toPlainString();
        return plain.length() <= 24 ? plain : stripped.toString();
    }

    /** The whole text so far. */
    @Override
    public String toString() {
        return text.toString();
    }
}
