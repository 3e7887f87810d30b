package tepor.mesher.outline;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.locationtech.jts.geom.Geometry;
import tepor.mesher.outline.WktScanner.Token;
import tepor.mesher.outline.WktScanner.TokenKind;

/**
 * Reads outlines written in OGC well-known text.
 *
 * <p>A record is an optional name, which ends with a colon and stands on one line, and a geometry over as many lines as it
 * needs; the next record begins on a new line. A name may hold anything but a line break and {@code #}. Words are read in
 * capitals or small letters. Curved kinds are read with their arcs ({@link Arcs}). Coordinates beyond x and y, in geometries tagged {@code Z}, {@code M} or {@code ZM}, are left
 * out with a warning. After a fault, reading goes on at the next line that begins a record.
 */
public final class WktReader {
    private final WktScanner scanner;
    private final DrawingUnit unit;
    private final WktFaults.InFile faults;
    private final List<OutlineElement> elements = new ArrayList<>();

    private WktReader(WktScanner scanner, DrawingUnit unit, WktFaults.InFile faults) {
        this.scanner = scanner;
        this.unit = unit;
        this.faults = faults;
    }

    /**
     * Reads a whole file: records of an optional {@code name:} and one geometry, {@code #} starts a comment.
     *
     * @param fileName the file as the user named it, for messages
     * @param text what is in it
     * @param unit the unit of its coordinates
     * @param findings takes what is wrong
     * @return what could be read; elements in metres
     */
    public static Outline read(String fileName, String text, DrawingUnit unit, Findings findings) {
        WktScanner scanner = new WktScanner(text);
        WktReader reader = new WktReader(scanner, unit, new WktFaults.InFile(fileName, scanner, findings));
        if (scanner.peek().kind() == TokenKind.END) {
            findings.error("empty-outline", new Place(fileName, 1, 1), "the file holds no geometry", WktKind.REMEDY);
        }
        reader.readRecords();
        return new Outline(reader.elements, unit);
    }

    /**
     * Reads one geometry written inside a case file.
     *
     * @param text the geometry
     * @param place where it stands, for messages
     * @param unit the unit of its coordinates
     * @param findings takes what is wrong
     * @return the geometry in metres; empty where something was wrong
     */
    public static Optional<Geometry> readGeometry(String text, Place place, DrawingUnit unit, Findings findings) {
        WktScanner scanner = new WktScanner(text);
        WktFaults faults = new WktFaults.InText(place, scanner, findings);
        Optional<Geometry> geometry = new WktParser(scanner, unit, faults).parse();
        Token rest = scanner.peek();
        if (geometry.isPresent() && rest.kind() != TokenKind.END) {
            faults.add(
                    Finding.Severity.ERROR,
                    "text-after-geometry",
                    rest.offset(),
                    rest.shown() + " stands after the end of the geometry",
                    "write one geometry only");
            return Optional.empty();
        }
        return geometry;
    }

    private void readRecords() {
        while (scanner.peek().kind() != TokenKind.END) {
            int start = scanner.peek().offset();
            Optional<String> name = readName(start);
            int before = scanner.peek().offset();
            Optional<Geometry> geometry = new WktParser(scanner, unit, faults).parse();
            if (geometry.isPresent()) {
                OutlineElement.Kind kind =
                        WktKind.tag(geometry.get().getGeometryType()).kind().element();
                elements.add(new OutlineElement(name.orElse(""), kind, geometry.get(), faults.place(start)));
            }
            if (!endsCleanly(geometry.isPresent())) {
                recover(start, before);
            }
        }
    }

    /** Takes the name of a record, and its colon, where it has one. */
    private Optional<String> readName(int start) {
        int end = scanner.contentEnd(start);
        int colon = colonOfName(start, end);
        if (colon < 0) {
            return Optional.empty();
        }
        scanner.moveTo(colon + 1);
        String name = scanner.between(start, colon).strip();
        if (name.isEmpty()) {
            faults.add(
                    Finding.Severity.ERROR,
                    "empty-name",
                    start,
                    "no name stands before this colon",
                    "write a name before it, or leave out the colon");
        }
        return Optional.of(name);
    }

    /** The first colon followed by a geometry or by nothing else in its line; else the first before any bracket; else −1. */
    private int colonOfName(int start, int end) {
        String head = scanner.between(start, end);
        for (int c = head.indexOf(':'); c >= 0; c = head.indexOf(':', c + 1)) {
            if (head.substring(c + 1).isBlank() || beginsGeometry(head.substring(c + 1))) {
                return start + c;
            }
        }
        int first = head.indexOf(':');
        int bracket = head.indexOf('(');
        return first >= 0 && (bracket < 0 || first < bracket) ? start + first : -1;
    }

    private static boolean beginsGeometry(String text) {
        WktScanner words = new WktScanner(text);
        Token word = words.take();
        if (word.kind() != TokenKind.CHUNK || !WktKind.isKind(word.text())) {
            return false;
        }
        Token next = words.peek();
        return next.kind() == TokenKind.OPEN
                || next.kind() == TokenKind.END
                || next.text().equalsIgnoreCase("EMPTY")
                || WktKind.Dimension.of(next.text()).isPresent();
    }

    /** Whether nothing stands behind the geometry in its line; reports it where something does. */
    private boolean endsCleanly(boolean geometryRead) {
        Token rest = scanner.peek();
        boolean clean = rest.kind() == TokenKind.END
                || (geometryWasLeft() && scanner.line(rest.offset()) > scanner.line(scanner.offset() - 1));
        if (!clean && geometryRead) {
            faults.add(
                    Finding.Severity.ERROR,
                    "text-after-geometry",
                    rest.offset(),
                    rest.shown() + " stands after the end of the geometry",
                    "begin the next record on a new line, and a comment with #");
        }
        return clean;
    }

    private boolean geometryWasLeft() {
        return scanner.offset() > 0
                && scanner.between(scanner.offset() - 1, scanner.offset()).equals(")");
    }

    /** Goes on at the next line that begins a record. */
    private void recover(int start, int geometryStart) {
        int line = Math.max(scanner.line(scanner.offset()), scanner.line(start) + 1);
        if (scanner.line(scanner.offset()) == scanner.line(geometryStart)) {
            line = Math.max(line, scanner.line(geometryStart) + 1);
        }
        for (; line <= scanner.lineCount(); line++) {
            int from = scanner.startOfLine(line);
            scanner.moveTo(from);
            int first = scanner.peek().offset();
            if (first < scanner.length() && scanner.line(first) == line) {
                int end = scanner.contentEnd(first);
                if (beginsGeometry(scanner.between(first, end)) || colonOfName(first, end) >= 0) {
                    return;
                }
            }
        }
        scanner.moveTo(scanner.length());
    }
}
