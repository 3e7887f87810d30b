package tepor.mesher.outline;

import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.GeometryFactory;
import org.locationtech.jts.geom.LineString;
import org.locationtech.jts.geom.LinearRing;
import org.locationtech.jts.geom.Point;
import org.locationtech.jts.geom.Polygon;
import tepor.mesher.outline.WktScanner.Token;
import tepor.mesher.outline.WktScanner.TokenKind;
import tepor.mesher.outline.WktSyntax.Lost;

/**
 * Reads one geometry of well-known text (OGC 06-103r4, chapter 7; the curved kinds: ISO/IEC 13249-3:2016, 5.1) from a
 * scanner. JTS's own reader is not used, since it knows no columns and no arcs, takes numbers that are none, and does not
 * look beyond the geometry.
 */
final class WktParser {
    private final WktSyntax syntax;
    private final WktPaths paths;
    private final GeometryFactory factory = new GeometryFactory();

    WktParser(WktScanner scanner, DrawingUnit unit, WktFaults faults) {
        syntax = new WktSyntax(scanner, unit, faults);
        paths = new WktPaths(syntax, factory);
    }

    /**
     * Reads one geometry; the scanner then stands behind it, or where it could not be followed any further.
     *
     * @return empty where something was wrong, and was reported
     */
    Optional<Geometry> parse() {
        try {
            Geometry geometry = geometry();
            return syntax.isSound() ? Optional.of(geometry) : Optional.empty();
        } catch (Lost lost) {
            return Optional.empty();
        }
    }

    private Geometry geometry() throws Lost {
        Token word = syntax.take();
        if (word.kind() != TokenKind.CHUNK) {
            throw syntax.lost("no-geometry", word, "a geometry is missing before " + word.shown(), WktKind.REMEDY);
        }
        WktKind.Tag tag = WktKind.tag(word.text());
        if (tag.kind() == WktKind.OTHER) {
            WktKind.Refusal refusal = WktKind.refusal(word.text());
            throw syntax.lost(refusal.code(), word, refusal.what(), refusal.remedy());
        }
        syntax.setDimension(tag.dimension());
        if (syntax.peek().kind() == TokenKind.CHUNK && tag.dimension() == WktKind.Dimension.XY) {
            Optional<WktKind.Dimension> apart =
                    WktKind.Dimension.of(syntax.peek().text());
            if (apart.isPresent()) {
                syntax.take();
                syntax.setDimension(apart.get());
            }
        }
        if (syntax.dimension() != WktKind.Dimension.XY) {
            syntax.warning(
                    "third-coordinate",
                    word,
                    "only x and y of this geometry are read",
                    "leave out its other coordinates");
        }
        return body(tag.kind());
    }

    private Geometry body(WktKind kind) throws Lost {
        return switch (kind) {
            case POINT -> point();
            case MULTIPOINT ->
                factory.createMultiPoint(syntax.list(this::pointOfMany).toArray(new Point[0]));
            case LINESTRING, CIRCULARSTRING, COMPOUNDCURVE -> paths.line(kind);
            case MULTILINESTRING ->
                factory.createMultiLineString(
                        syntax.list(() -> paths.line(WktKind.LINESTRING)).toArray(new LineString[0]));
            case MULTICURVE ->
                factory.createMultiLineString(syntax.list(this::lineOfMany).toArray(new LineString[0]));
            case POLYGON -> polygon(false);
            case CURVEPOLYGON -> polygon(true);
            case MULTIPOLYGON ->
                factory.createMultiPolygon(syntax.list(() -> polygon(false)).toArray(new Polygon[0]));
            case MULTISURFACE ->
                factory.createMultiPolygon(syntax.list(this::polygonOfMany).toArray(new Polygon[0]));
            case OTHER -> throw new AssertionError("refused before");
        };
    }

    private Point point() throws Lost {
        syntax.open();
        Coordinate c = syntax.coordinate();
        Token token = syntax.take();
        if (token.kind() == TokenKind.COMMA) {
            throw syntax.lost(
                    "several-points", token, "a POINT holds one point only", "use MULTIPOINT, or a record for each");
        }
        syntax.close(token, "')'");
        return factory.createPoint(c);
    }

    private Point pointOfMany() throws Lost {
        return syntax.peek().kind() == TokenKind.OPEN ? point() : factory.createPoint(syntax.coordinate());
    }

    private LineString lineOfMany() throws Lost {
        return paths.line(
                syntax.tag(WktKind.LINESTRING, WktKind.LINESTRING, WktKind.CIRCULARSTRING, WktKind.COMPOUNDCURVE));
    }

    private Polygon polygonOfMany() throws Lost {
        return polygon(syntax.tag(WktKind.POLYGON, WktKind.POLYGON, WktKind.CURVEPOLYGON) == WktKind.CURVEPOLYGON);
    }

    private Polygon polygon(boolean curved) throws Lost {
        List<LinearRing> rings = syntax.list(() -> paths.ring(curved ? ringKind() : WktKind.LINESTRING));
        if (!syntax.isSound()) {
            return factory.createPolygon();
        }
        return factory.createPolygon(
                rings.get(0), rings.subList(1, rings.size()).toArray(new LinearRing[0]));
    }

    private WktKind ringKind() throws Lost {
        return syntax.tag(WktKind.LINESTRING, WktKind.LINESTRING, WktKind.CIRCULARSTRING, WktKind.COMPOUNDCURVE);
    }
}
