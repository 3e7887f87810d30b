package tepor.mesher.outline;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.locationtech.jts.geom.Coordinate;
import tepor.mesher.outline.WktScanner.Token;
import tepor.mesher.outline.WktScanner.TokenKind;

/** Brackets, lists, numbers and points of well-known text, and the faults in them. */
final class WktSyntax {
    /** Larger coordinates (metres) would overflow when they are multiplied. */
    private static final double LARGEST = 1e100;

    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");
    private static final Pattern NOT_FINITE = Pattern.compile("[+-]?(nan|inf|infinity)", Pattern.CASE_INSENSITIVE);

    /** The text cannot be followed any further; it has been reported. */
    static final class Lost extends Exception {
        private static final long serialVersionUID = 1;

        private Lost() {
            super(null, null, false, false);
        }
    }

    private final WktScanner scanner;
    private final DrawingUnit unit;
    private final WktFaults faults;
    private final Deque<Token> open = new ArrayDeque<>();
    private boolean sound = true;
    private WktKind.Dimension dimension = WktKind.Dimension.XY;

    WktSyntax(WktScanner scanner, DrawingUnit unit, WktFaults faults) {
        this.scanner = scanner;
        this.unit = unit;
        this.faults = faults;
    }

    /** Whether nothing was wrong so far. */
    boolean isSound() {
        return sound;
    }

    DrawingUnit unit() {
        return unit;
    }

    /** How many numbers the points from here on have. */
    void setDimension(WktKind.Dimension wanted) {
        dimension = wanted;
    }

    WktKind.Dimension dimension() {
        return dimension;
    }

    Token peek() {
        return scanner.peek();
    }

    Token take() {
        return scanner.take();
    }

    void warning(String code, Token token, String what, String remedy) {
        faults.add(Finding.Severity.WARNING, code, token.offset(), what, remedy);
    }

    interface Part<T> {
        T read() throws Lost;
    }

    /** A bracket with one or more parts between commas. */
    <T> List<T> list(Part<T> part) throws Lost {
        open();
        List<T> parts = new ArrayList<>();
        do {
            parts.add(part.read());
        } while (commaNotClose());
        return parts;
    }

    /**
     * Takes the tag before a part of a curved geometry.
     *
     * @param untagged what a part without a tag is
     * @param allowed what may stand here
     */
    WktKind tag(WktKind untagged, WktKind... allowed) throws Lost {
        Token word = scanner.peek();
        if (word.kind() != TokenKind.CHUNK || word.text().equalsIgnoreCase("EMPTY")) {
            return untagged;
        }
        WktKind kind = WktKind.tag(word.text()).kind();
        if (!Arrays.asList(allowed).contains(kind)) {
            String kinds = Arrays.stream(allowed).map(Enum::name).collect(Collectors.joining(", "));
            if (kind == WktKind.OTHER && !Character.isLetter(word.text().charAt(0))) {
                throw lost("missing-bracket", word, "'(' is missing before " + word.shown(), "write " + kinds + " (…)");
            }
            throw lost(
                    "wrong-part",
                    word,
                    word.shown() + " cannot stand within this geometry",
                    "one of these can: " + kinds);
        }
        scanner.take();
        if (WktKind.Dimension.of(scanner.peek().text()).isPresent()) {
            scanner.take();
        }
        return kind;
    }

    /** A point, metres. */
    Coordinate coordinate() throws Lost {
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
            boolean geometry = WktKind.isKind(text);
            throw lost(
                    "no-number",
                    token,
                    "a number is wanted, not " + token.shown(),
                    geometry ? unclosed() : "write numbers as 12, -3.5 or 1.2e3; or " + unclosed());
        } else {
            fault("no-number", token, token.shown() + " is no number", "write numbers as 12, -3.5 or 1.2e3");
        }
        return 0;
    }

    void open() throws Lost {
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

    void close(Token token, String wanted) throws Lost {
        if (token.kind() != TokenKind.CLOSE) {
            throw lost("missing-bracket", token, wanted + " is missing before " + token.shown(), unclosed());
        }
        open.pop();
    }

    private String unclosed() {
        return "close the bracket opened at "
                + faults.whereabouts(open.element().offset());
    }

    /** Adds an error; reading goes on. */
    void fault(String code, Token token, String what, String remedy) {
        sound = false;
        faults.add(Finding.Severity.ERROR, code, token.offset(), what, remedy);
    }

    /** Adds an error after which the text cannot be followed. */
    Lost lost(String code, Token token, String what, String remedy) {
        fault(code, token, what, remedy);
        scanner.moveTo(token.offset());
        return new Lost();
    }
}
