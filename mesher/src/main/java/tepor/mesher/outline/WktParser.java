package tepor.mesher.outline;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Point;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.WktScanner.Token;
import tepor.mesher.outline.WktScanner.TokenKind;

/**
 * Reads one geometry of OGC well-known text (OGC 06-103r4, chapter 7) from a scanner. JTS's own reader is not used, since
 * it knows no columns, takes numbers that are none, and does not look beyond the geometry.
 */
final class WktParser {
    /** Larger coordinates (metres) would overflow when they are multiplied. */
    private static final double LARGEST = 1e100;
    /** A ring whose ends are closer than this, relative to its size, is closed. */
    private static final double NEARLY_CLOSED = 1e-7;

    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");
    private static final Pattern NOT_FINITE = Pattern.compile("[+-]?(nan|inf|infinity)", Pattern.CASE_INSENSITIVE);

    /** The text cannot be followed any further; it has been reported. */
    private static final class Lost extends Exception {
        private static final long serialVersionUID = 1;

        private Lost() {
            super(null, null, false, false);
        }
    }

    private final WktScanner scanner;
    private final DrawingUnit unit;
    private final WktFaults faults;
    private final GeometryFactory factory = new GeometryFactory();
    private final Deque<Token> open = new ArrayDeque<>();
    private boolean sound = true;
    private WktKind.Dimension dimension = WktKind.Dimension.XY;

    WktParser(WktScanner scanner, DrawingUnit unit, WktFaults faults) {
        this.scanner = scanner;
        this.unit = unit;
        this.faults = faults;
    }

    /**
     * Reads one geometry; the scanner then stands behind it, or where it could not be followed any further.
     *
     * @return empty where something was wrong, and was reported
     */
    Optional<Geometry> parse() {
        try {
            Geometry geometry = geometry();
            return sound ? Optional.of(geometry) : Optional.empty();
        } catch (Lost lost) {
            return Optional.empty();
        }
    }

    private Geometry geometry() throws Lost {
        Token word = scanner.take();
        if (word.kind() != TokenKind.CHUNK) {
            throw lost("no-geometry", word, "a geometry is missing before " + word.shown(), WktKind.REMEDY);
        }
        WktKind.Tag tag = WktKind.tag(word.text());
        if (tag.kind() == WktKind.OTHER) {
            WktKind.Refusal refusal = WktKind.refusal(word.text());
            throw lost(refusal.code(), word, refusal.what(), refusal.remedy());
        }
        dimension = tag.dimension();
        if (scanner.peek().kind() == TokenKind.CHUNK && dimension == WktKind.Dimension.XY) {
            Optional<WktKind.Dimension> apart =
                    WktKind.Dimension.of(scanner.peek().text());
            if (apart.isPresent()) {
                scanner.take();
                dimension = apart.get();
            }
        }
        if (dimension != WktKind.Dimension.XY) {
            faults.add(
                    Finding.Severity.WARNING,
                    "third-coordinate",
                    word.offset(),
                    "only x and y of this geometry are read",
                    "leave out its other coordinates");
        }
        return body(tag.kind());
    }

    private Geometry body(WktKind kind) throws Lost {
        return switch (kind) {
            case POINT -> point();
            case MULTIPOINT -> factory.createMultiPoint(list(this::pointOfMany).toArray(new Point[0]));
            case LINESTRING -> line();
            case MULTILINESTRING ->
                factory.createMultiLineString(list(this::line).toArray(new LineString[0]));
            case POLYGON -> polygon();
            case MULTIPOLYGON -> factory.createMultiPolygon(list(this::polygon).toArray(new Polygon[0]));
            case OTHER -> throw new AssertionError("refused before");
        };
    }

    private interface Part<T> {
        T read() throws Lost;
    }

    /** A bracket with one or more parts between commas. */
    private <T> List<T> list(Part<T> part) throws Lost {
        open();
        List<T> parts = new ArrayList<>();
        do {
            parts.add(part.read());
        } while (commaNotClose());
        return parts;
    }

    private Point point() throws Lost {
        open();
        Coordinate c = coordinate();
        Token token = scanner.take();
        if (token.kind() == TokenKind.COMMA) {
            throw lost("several-points", token, "a POINT holds one point only", "use MULTIPOINT, or a record for each");
        }
        close(token, "')'");
        return factory.createPoint(c);
    }

    private Point pointOfMany() throws Lost {
        return scanner.peek().kind() == TokenKind.OPEN ? point() : factory.createPoint(coordinate());
    }

    private LineString line() throws Lost {
        Token first = scanner.peek();
        List<Coordinate> points = list(this::coordinate);
        boolean still = points.stream().allMatch(points.get(0)::equals2D);
        if (points.size() < 2 || still) {
            fault(
                    "too-few-points",
                    first,
                    points.size() < 2 ? "a line of one point has no length" : "all points of this line are the same",
                    "give a line at least two different points, or use POINT");
            return factory.createLineString();
        }
        return factory.createLineString(points.toArray(new Coordinate[0]));
    }

    private Polygon polygon() throws Lost {
        List<LinearRing> rings = list(this::ring);
        if (!sound) {
            return factory.createPolygon();
        }
        return factory.createPolygon(
                rings.get(0), rings.subList(1, rings.size()).toArray(new LinearRing[0]));
    }

    private LinearRing ring() throws Lost {
        Token bracket = scanner.peek();
        List<Token> firstNumbers = new ArrayList<>();
        List<Coordinate> points = list(() -> {
            firstNumbers.add(scanner.peek());
            return coordinate();
        });
        Coordinate first = points.get(0);
        Coordinate last = points.get(points.size() - 1);
        boolean closed = first.equals2D(last);
        if (points.size() < (closed ? 4 : 3)) {
            fault(
                    "too-few-points",
                    bracket,
                    "a ring of " + points.size() + (points.size() == 1 ? " point" : " points") + " encloses nothing",
                    "give a ring at least three different points, and the first one again at its end");
        } else if (!closed) {
            closeRing(points, firstNumbers.get(points.size() - 1));
        }
        return sound ? factory.createLinearRing(points.toArray(new Coordinate[0])) : factory.createLinearRing();
    }

    private void closeRing(List<Coordinate> points, Token lastToken) {
        Coordinate first = points.get(0);
        Coordinate last = points.get(points.size() - 1);
        double size = points.stream().mapToDouble(first::distance).max().orElse(0);
        String ends = "the ring does not close: it begins at " + unit.point(first.x, first.y) + " and ends at "
                + unit.point(last.x, last.y);
        if (first.distance(last) <= NEARLY_CLOSED * size) {
            points.set(points.size() - 1, first.copy());
            String gap = ends + ", a gap of " + unit.length(first.distance(last));
            faults.add(
                    Finding.Severity.WARNING,
                    "ring-nearly-closed",
                    lastToken.offset(),
                    gap,
                    "its end is moved to its beginning; repeat the first point exactly at the end");
        } else {
            fault("unclosed-ring", lastToken, ends, "repeat the first point at the end of the ring");
        }
    }

    private Coordinate coordinate() throws Lost {
        Token first = scanner.peek();
        double x = number("x");
        if (scanner.peek().kind() != TokenKind.CHUNK) {
            Token found = scanner.peek();
            throw lost(
                    "one-number",
                    found,
                    "the point beginning with " + first.shown() + " has no y: " + found.shown()
                            + " stands where y should",
                    "write a point as x, blank, y; decimals take a point, not a comma");
        }
        double y = number("y");
        for (int i = 2; i < dimension.numbers(); i++) {
            number("a third coordinate");
        }
        if (scanner.peek().kind() == TokenKind.CHUNK
                && NUMBER.matcher(scanner.peek().text()).matches()) {
            Token surplus = scanner.peek();
            throw lost(
                    "surplus-number",
                    surplus,
                    "the point beginning with " + first.shown() + " has more numbers than "
                            + (dimension == WktKind.Dimension.XY ? "x and y" : "its kind says") + ": "
                            + surplus.shown(),
                    "put a comma between points; a geometry with heights is tagged, as in POLYGON Z");
        }
        return new Coordinate(x, y);
    }

    /** A number, as metres. A chunk that is none is reported, and reading goes on. */
    private double number(String what) throws Lost {
        Token token = scanner.peek();
        if (token.kind() != TokenKind.CHUNK) {
            throw lost(
                    "no-number", token, "a number (" + what + ") is missing before " + token.shown(), "write x and y");
        }
        scanner.take();
        String text = token.text();
        if (NUMBER.matcher(text).matches()) {
            double metres = unit.toMetres(Double.parseDouble(text));
            if (Math.abs(metres) <= LARGEST) {
                return metres + 0.0; // no negative zero
            }
            fault("number-too-large", token, token.shown() + " is too large for a coordinate", "write a finite length");
        } else if (NOT_FINITE.matcher(text).matches()) {
            fault("not-finite", token, token.shown() + " is no coordinate", "write a finite number");
        } else if (text.equalsIgnoreCase("EMPTY")) {
            throw empty(token);
        } else if (Character.isLetter(text.charAt(0))) {
            // A word here most often means that the brackets before it do not close: nothing behind it can be trusted.
            throw lost("no-number", token, "a number is wanted, not " + token.shown(), unclosed());
        } else {
            fault("no-number", token, token.shown() + " is no number", "write numbers as 12, -3.5 or 1.2e3");
        }
        return 0;
    }

    private void open() throws Lost {
        Token token = scanner.take();
        if (token.text().equalsIgnoreCase("EMPTY")) {
            throw empty(token);
        }
        if (token.kind() != TokenKind.OPEN) {
            throw lost("missing-bracket", token, "'(' is missing before " + token.shown(), WktKind.REMEDY);
        }
        open.push(token);
    }

    private Lost empty(Token token) {
        return lost("empty-geometry", token, "the geometry is empty", "give it points, or leave it out");
    }

    private boolean commaNotClose() throws Lost {
        Token token = scanner.take();
        if (token.kind() == TokenKind.COMMA) {
            return true;
        }
        close(token, "',' or ')'");
        return false;
    }

    private void close(Token token, String wanted) throws Lost {
        if (token.kind() != TokenKind.CLOSE) {
            throw lost("missing-bracket", token, wanted + " is missing before " + token.shown(), unclosed());
        }
        open.pop();
    }

    private String unclosed() {
        return "close the bracket opened at "
                + faults.whereabouts(open.element().offset());
    }

    private void fault(String code, Token token, String what, String remedy) {
        sound = false;
        faults.add(Finding.Severity.ERROR, code, token.offset(), what, remedy);
    }

    private Lost lost(String code, Token token, String what, String remedy) {
        fault(code, token, what, remedy);
        scanner.moveTo(token.offset());
        return new Lost();
    }
}
