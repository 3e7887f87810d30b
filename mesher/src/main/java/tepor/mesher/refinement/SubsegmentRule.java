package tepor.mesher.refinement;

import tepor.mesher.section.Section;
import tepor.mesher.triangulation.Triangulation;

/** Judges subsegments, that is constrained sides, and chooses where to split one. */
final class SubsegmentRule {
    private static final double COARSER = 1 + 1e-9;
    /** A vertex encroaches when it lies inside the diametral circle by more than this part, beyond round-off. */
    private static final double INSIDE = 1e-10;
    /** Sizes at a subsegment that differ by no more than this factor count as even. */
    private static final double EVEN = 1.3;

    private final Triangulation mesh;
    private final Vertices vertices;
    private final SizeField field;
    private final SmallAngles smallAngles;
    private final double shellUnit;
    private final double shortestPiece;
    private double x;
    private double y;

    /**
     * @param shortestPiece no piece becomes shorter than this, metres
     */
    SubsegmentRule(
            Triangulation mesh,
            Vertices vertices,
            SizeField field,
            Section section,
            SmallAngles smallAngles,
            double shortestPiece) {
        this.mesh = mesh;
        this.vertices = vertices;
        this.field = field;
        this.smallAngles = smallAngles;
        shellUnit = section.extent();
        this.shortestPiece = shortestPiece;
    }

    /** Whether a place encroaches on a subsegment: it lies inside the circle that has the subsegment for its diameter. */
    boolean isEncroachedBy(int side, double px, double py) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        double ax = mesh.x(a);
        double ay = mesh.y(a);
        double bx = mesh.x(b);
        double by = mesh.y(b);
        double dot = (ax - px) * (bx - px) + (ay - py) * (by - py);
        double dx = bx - ax;
        double dy = by - ay;
        return dot < -INSIDE * (dx * dx + dy * dy);
    }

    /** Whether a subsegment must be split: it is too long, or the apex of a triangle at it encroaches. */
    boolean isBad(int side) {
        int apex = mesh.apex(side);
        if (isEncroachedBy(side, mesh.x(apex), mesh.y(apex))) {
            return true;
        }
        int other = mesh.twin(side);
        if (other >= 0) {
            apex = mesh.apex(other);
            if (isEncroachedBy(side, mesh.x(apex), mesh.y(apex))) {
                return true;
            }
        }
        return isLong(side);
    }

    /** Whether a subsegment is longer than the size wanted at its ends or its middle. */
    boolean isLong(int side) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        double length = vertices.distance(a, b) / COARSER;
        return length > vertices.size(a) || length > vertices.size(b) || length > sizeInMiddle(a, b);
    }

    private double sizeInMiddle(int a, int b) {
        return field.at(0.5 * (mesh.x(a) + mesh.x(b)), 0.5 * (mesh.y(a) + mesh.y(b)));
    }

    /**
     * Places a vertex on a subsegment.
     *
     * @return false if a piece would fall below the smallest length
     */
    boolean place(int side) {
        int a = mesh.origin(side);
        int b = mesh.destination(side);
        double length = vertices.distance(a, b);
        double part = part(side, a, b, length);
        if (Math.min(part, 1 - part) * length < shortestPiece) {
            return false;
        }
        x = mesh.x(a) + part * (mesh.x(b) - mesh.x(a));
        y = mesh.y(a) + part * (mesh.y(b) - mesh.y(a));
        return true;
    }

    private double part(int side, int a, int b, double length) {
        int segment = mesh.constraint(side) / 2;
        boolean atA = smallAngles.isApex(segment, a);
        boolean atB = smallAngles.isApex(segment, b);
        if (atA != atB) {
            return shellPart(atA, length);
        }
        double part = smallAngles.isSharp(segment) ? Double.NaN : evenPart(a, b, length);
        if (!Double.isNaN(part)) {
            return part;
        }
        boolean cornerAtA = smallAngles.isCorner(segment, a);
        // Halved towards a corner of about 100°, two segments can encroach on each other without end.
        return cornerAtA != smallAngles.isCorner(segment, b) ? shellPart(cornerAtA, length) : 0.5;
    }

    // The power of two that falls into the middle third.
    private double shellPart(boolean fromA, double length) {
        double shell = shellUnit * Math.scalb(1.0, Math.getExponent(length / 1.5 / shellUnit));
        return fromA ? shell / length : 1 - shell / length;
    }

    // Where the size is even, cuts so that all pieces come out equal in the end, rather than halves of halves; NaN
    // where
    // it is not, or the subsegment not too long.
    private double evenPart(int a, int b, double length) {
        double middle = sizeInMiddle(a, b);
        double least = Math.min(middle, Math.min(vertices.size(a), vertices.size(b)));
        double greatest = Math.max(middle, Math.max(vertices.size(a), vertices.size(b)));
        double pieces = Math.ceil(length / COARSER / least);
        if (greatest > EVEN * least || !(pieces >= 2 && pieces < 1e6)) {
            return Double.NaN;
        }
        return Math.floor(0.5 * pieces) / pieces;
    }

    /** Where {@link #place} put the vertex, metres. */
    double x() {
        return x;
    }

    /** Where {@link #place} put the vertex, metres. */
    double y() {
        return y;
    }
}
