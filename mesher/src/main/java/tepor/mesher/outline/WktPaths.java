package tepor.mesher.outline;

import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import tepor.mesher.outline.WktScanner.Token;
import tepor.mesher.outline.WktSyntax.Lost;

/**
 * Reads the lines and rings of well-known text, straight or with arcs.
 *
 * <p>A CIRCULARSTRING (ISO/IEC 13249-3:2016, 7.3) has three, five, seven … points: begin, a point on the arc, end, which is
 * where the next arc begins. An arc that ends where it begins is a whole circle, and its middle point lies opposite. The
 * parts of a COMPOUNDCURVE follow on each other end to end.
 */
final class WktPaths {
    /** Ends that are closer than this, relative to the size of what they end, are one point. */
    private static final double NEARLY = 1e-7;

    private final WktSyntax syntax;
    private final GeometryFactory factory;

    /** The points of a path or of a part of it, each with the token where it stands. */
    private record Stretch(boolean arcs, List<Coordinate> points, List<Token> tokens) {
        Coordinate first() {
            return points.get(0);
        }

        Coordinate last() {
            return points.get(points.size() - 1);
        }

        Token lastToken() {
            return tokens.get(tokens.size() - 1);
        }

        void addTo(PathBuilder path) {
            for (int i = 1; i < points.size(); i += arcs ? 2 : 1) {
                if (arcs) {
                    path.arcThrough(points.get(i), points.get(i + 1));
                } else {
                    path.lineTo(points.get(i));
                }
            }
        }
    }

    WktPaths(WktSyntax syntax, GeometryFactory factory) {
        this.syntax = syntax;
        this.factory = factory;
    }

    /** A LINESTRING, CIRCULARSTRING or COMPOUNDCURVE behind its tag; empty where something was wrong, and was reported. */
    LineString line(WktKind kind) throws Lost {
        Token bracket = syntax.peek();
        List<Stretch> stretches = stretches(kind);
        if (!syntax.isSound()) {
            return factory.createLineString();
        }
        PathBuilder path = path(stretches);
        if (path.pieceCount() == 0) {
            boolean single = count(stretches) < 2;
            syntax.fault(
                    "too-few-points",
                    bracket,
                    single ? "a line of one point has no length" : "all points of this line are the same",
                    "give a line at least two different points, or use POINT");
            return factory.createLineString();
        }
        return kind == WktKind.LINESTRING ? factory.createLineString(asWritten(stretches.get(0))) : path.line(factory);
    }

    /** A ring of one of these kinds behind its tag; empty where something was wrong, and was reported. */
    LinearRing ring(WktKind kind) throws Lost {
        Token bracket = syntax.peek();
        List<Stretch> stretches = stretches(kind);
        if (stretches.isEmpty()) {
            return factory.createLinearRing();
        }
        Stretch end = stretches.get(stretches.size() - 1);
        boolean closed = stretches.get(0).first().equals2D(end.last());
        int count = count(stretches);
        boolean straight = stretches.stream().noneMatch(Stretch::arcs);
        if (straight && count < (closed ? 4 : 3)) {
            syntax.fault(
                    "too-few-points",
                    bracket,
                    "a ring of " + count + (count == 1 ? " point" : " points") + " encloses nothing",
                    "give a ring at least three different points, and the first one again at its end");
        } else if (!closed) {
            closeRing(stretches, end);
        }
        if (!syntax.isSound()) {
            return factory.createLinearRing();
        }
        if (kind == WktKind.LINESTRING) {
            return factory.createLinearRing(asWritten(end));
        }
        PathBuilder path = path(stretches);
        if (path.pieceCount() < 3) {
            syntax.fault(
                    "too-few-points",
                    bracket,
                    "this ring encloses nothing",
                    "give a ring an area; a whole circle is CIRCULARSTRING (a, b, a) with b opposite of a");
            return factory.createLinearRing();
        }
        return path.ring(factory);
    }

    /** Points that are repeated are kept, to be reported where the outline is checked. */
    private static Coordinate[] asWritten(Stretch stretch) {
        return stretch.points().toArray(new Coordinate[0]);
    }

    private static PathBuilder path(List<Stretch> stretches) {
        PathBuilder path = new PathBuilder(stretches.get(0).first());
        stretches.forEach(s -> s.addTo(path));
        return path;
    }

    private static int count(List<Stretch> stretches) {
        return stretches.stream().mapToInt(s -> s.points().size()).sum();
    }

    private List<Stretch> stretches(WktKind kind) throws Lost {
        if (kind != WktKind.COMPOUNDCURVE) {
            return List.of(stretch(kind));
        }
        List<Stretch> stretches = new ArrayList<>();
        syntax.list(() -> {
            Stretch next = stretch(syntax.tag(WktKind.LINESTRING, WktKind.LINESTRING, WktKind.CIRCULARSTRING));
            if (!stretches.isEmpty()) {
                join(stretches.get(stretches.size() - 1), next);
            }
            if (next.points().size() < 2) {
                syntax.fault(
                        "too-few-points",
                        next.lastToken(),
                        "this part of the compound curve has one point only",
                        "give each part at least two points, or leave it out");
            }
            stretches.add(next);
            return next;
        });
        return stretches;
    }

    private Stretch stretch(WktKind kind) throws Lost {
        boolean arcs = kind == WktKind.CIRCULARSTRING;
        Token bracket = syntax.peek();
        List<Token> tokens = new ArrayList<>();
        List<Coordinate> points = new ArrayList<>(syntax.list(() -> {
            tokens.add(syntax.peek());
            return syntax.coordinate();
        }));
        if (arcs && (points.size() < 3 || points.size() % 2 == 0)) {
            syntax.fault(
                    "arc-points",
                    points.size() < 3 ? bracket : tokens.get(tokens.size() - 1),
                    "a CIRCULARSTRING has 3, 5, 7 … points (begin, a point on the arc, end, which begins the next arc);"
                            + " this one has " + points.size(),
                    "give every arc its middle point and its end");
        }
        return new Stretch(arcs, points, tokens);
    }

    /** Moves the beginning of a part onto the end of the one before, if it is near; reports the gap if it is not. */
    private void join(Stretch before, Stretch next) {
        Coordinate from = before.last();
        Coordinate to = next.first();
        if (from.equals2D(to)) {
            return;
        }
        String ends = "this part begins at " + point(to) + ", but the part before it ends at " + point(from)
                + ", a gap of " + syntax.unit().length(from.distance(to));
        double size = Math.max(size(before.points()), size(next.points()));
        if (from.distance(to) <= NEARLY * size) {
            next.points().set(0, from.copy());
            syntax.warning(
                    "parts-nearly-meet",
                    next.tokens().get(0),
                    ends,
                    "its beginning is moved there; repeat the point exactly");
        } else {
            syntax.fault(
                    "parts-do-not-meet",
                    next.tokens().get(0),
                    ends,
                    "begin each part of a compound curve where the one before it ends");
        }
    }

    private void closeRing(List<Stretch> stretches, Stretch end) {
        Coordinate first = stretches.get(0).first();
        Coordinate last = end.last();
        double size = stretches.stream()
                .mapToDouble(s ->
                        s.points().stream().mapToDouble(first::distance).max().orElse(0))
                .max()
                .orElse(0);
        String ends = "the ring does not close: it begins at " + point(first) + " and ends at " + point(last);
        if (first.distance(last) <= NEARLY * size) {
            end.points().set(end.points().size() - 1, first.copy());
            syntax.warning(
                    "ring-nearly-closed",
                    end.lastToken(),
                    ends + ", a gap of " + syntax.unit().length(first.distance(last)),
                    "its end is moved to its beginning; repeat the first point exactly at the end");
        } else {
            syntax.fault("unclosed-ring", end.lastToken(), ends, "repeat the first point at the end of the ring");
        }
    }

    private static double size(List<Coordinate> points) {
        return points.stream().mapToDouble(points.get(0)::distance).max().orElse(0);
    }

    private String point(Coordinate c) {
        return syntax.unit().point(c.x, c.y);
    }
}
