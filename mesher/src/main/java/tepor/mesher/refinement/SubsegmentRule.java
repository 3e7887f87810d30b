package tepor.mesher.refinement;

import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.Circle;
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
    private final Section section;
    private final SmallAngles smallAngles;
    private final ArcRule arcRule;
    private final double shellUnit;
    private final double shortestPiece;
    private double x;
    private double y;

    /**
     * @param shortestPiece no piece becomes shorter than this, metres
     * @param greatestTurn no piece of an arc turns by more than this, radians
     */
    SubsegmentRule(
            Triangulation mesh,
            Vertices vertices,
            SizeField field,
            Section section,
            SmallAngles smallAngles,
            double shortestPiece,
            double greatestTurn) {
        this.mesh = mesh;
        this.vertices = vertices;
        this.field = field;
        this.section = section;
        this.smallAngles = smallAngles;
        arcRule = new ArcRule(mesh, section, greatestTurn);
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

    /** Whether a subsegment must be split: it is too long or too bent, or the apex of a triangle at it encroaches. */
    boolean isBad(int side) {
        int other = mesh.twin(side);
        if (isEncroachedByVertex(side, mesh.apex(side))
                || (other >= 0 && isEncroachedByVertex(side, mesh.apex(other)))) {
            return true;
        }
        return isLong(side) || arcRule.turnsTooFar(side);
    }

    /** Whether a subsegment must be split for the sake of curved triangles; see {@link ArcRule#bowsTooFar}. */
    boolean bowsTooFar(int side) {
        return arcRule.bowsTooFar(side);
    }

    /** Whether a subsegment is a piece of an arc, so that it is split off its chord. */
    boolean isArc(int side) {
        return section.circle(mesh.constraint(side) / 2) != null;
    }

    // In the narrow between an arc and a line that touches it, vertices of one always come close to the other; there
    // only
    // those count that lie between chord and arc.
    private boolean isEncroachedByVertex(int side, int vertex) {
        double x = mesh.x(vertex);
        double y = mesh.y(vertex);
        if (!isEncroachedBy(side, x, y)) {
            return false;
        }
        int segment = mesh.constraint(side) / 2;
        return !smallAngles.isBesideBend(vertices, segment, vertex) || arcRule.isInLens(side, x, y);
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
        Circle circle = section.circle(mesh.constraint(side) / 2);
        if (circle == null) {
            x = mesh.x(a) + part * (mesh.x(b) - mesh.x(a));
            y = mesh.y(a) + part * (mesh.y(b) - mesh.y(a));
        } else {
            placeOn(circle, a, b, part);
        }
        return true;
    }

    private void placeOn(Circle circle, int a, int b, double part) {
        Coordinate at = part == 0.5
                ? circle.middle(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b))
                : circle.at(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), part);
        x = at.x;
        y = at.y;
    }

    private double turn(Circle circle, int a, int b) {
        return circle.turn(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b));
    }

    // The part of the length, of an arc that of the turn.
    private double part(int side, int a, int b, double length) {
        int segment = mesh.constraint(side) / 2;
        boolean atA = smallAngles.isApex(segment, a);
        boolean atB = smallAngles.isApex(segment, b);
        if (atA != atB) {
            return shellPart(segment, a, b, atA, length);
        }
        double part = smallAngles.isSharp(segment) ? Double.NaN : evenPart(a, b, length);
        if (!Double.isNaN(part)) {
            return part;
        }
        boolean cornerAtA = smallAngles.isCorner(segment, a);
        return cornerAtA != smallAngles.isCorner(segment, b) ? shellPart(segment, a, b, cornerAtA, length) : 0.5;
    }

    // The power of two that falls into the middle third.
    private double shellPart(int segment, int a, int b, boolean fromA, double length) {
        double shell = shellUnit * Math.scalb(1.0, Math.getExponent(length / 1.5 / shellUnit));
        Circle circle = section.circle(segment);
        double part = circle == null
                ? shell / length
                : 2 * Math.asin(0.5 * shell / circle.radius()) / Math.abs(turn(circle, a, b));
        return fromA ? part : 1 - part;
    }

    // Where the size is even, cuts so that all pieces come out equal in the end, rather than halves of halves; NaN
    // where it is not, or the subsegment not too long.
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
