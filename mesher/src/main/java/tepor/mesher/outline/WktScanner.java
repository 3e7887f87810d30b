package tepor.mesher.outline;

import java.util.Arrays;

/**
 * Walks a text that holds well-known text, token by token: brackets, commas, and the chunks between them. White space and
 * comments (from {@code #} to the end of the line) are passed over. Lines end with LF, CR or CR LF; a byte order mark at
 * the beginning is not counted.
 */
final class WktScanner {
    /** What a token is. A chunk is a word or a number, as yet unjudged. */
    enum TokenKind {
        OPEN,
        CLOSE,
        COMMA,
        CHUNK,
        END
    }

    /**
     * A token.
     *
     * @param kind what it is
     * @param text as written; empty at the end
     * @param offset where it begins, in UTF-16 units from the beginning of the text
     */
    record Token(TokenKind kind, String text, int offset) {
        /** The token as a message shows it. */
        String shown() {
            return kind == TokenKind.END ? "the end of the text" : quote(text);
        }
    }

    private static final int SHOWN_AT_MOST = 30;

    private final String text;
    private final int[] lineStart;
    private int next;

    WktScanner(String text) {
        this.text = text;
        int[] starts = new int[16];
        int count = 1;
        int first = text.startsWith("\uFEFF") ? 1 : 0;
        starts[0] = first;
        for (int i = first; i < text.length(); i++) {
            char c = text.charAt(i);
            boolean endsLine = c == '\n' || (c == '\r' && !(i + 1 < text.length() && text.charAt(i + 1) == '\n'));
            if (endsLine) {
                if (count == starts.length) {
                    starts = Arrays.copyOf(starts, 2 * count);
                }
                starts[count++] = i + 1;
            }
        }
        lineStart = Arrays.copyOf(starts, count);
        next = first;
    }

    /** Text in quotation marks, shortened where it is long, characters that cannot be seen by their number. */
    static String quote(String piece) {
        StringBuilder shown = new StringBuilder("'");
        int end = Math.min(piece.length(), SHOWN_AT_MOST);
        for (int i = 0; i < end; i++) {
            char c = piece.charAt(i);
            boolean unseen = Character.isISOControl(c) || Character.getType(c) == Character.FORMAT;
            shown.append(unseen ? String.format("U+%04X", (int) c) : String.valueOf(c));
        }
        return shown.append(end < piece.length() ? "…'" : "'").toString();
    }

    /** Takes the next token. */
    Token take() {
        Token token = peek();
        next = token.offset() + token.text().length();
        return token;
    }

    /** The next token, not taken. */
    Token peek() {
        int i = skipBlank(next, text.length());
        if (i == text.length()) {
            return new Token(TokenKind.END, "", i);
        }
        TokenKind kind = kindOf(text.charAt(i));
        int end = i + 1;
        while (kind == TokenKind.CHUNK && end < text.length() && inChunk(text.charAt(end))) {
            end++;
        }
        return new Token(kind, text.substring(i, end), i);
    }

    private static TokenKind kindOf(char c) {
        return switch (c) {
            case '(' -> TokenKind.OPEN;
            case ')' -> TokenKind.CLOSE;
            case ',' -> TokenKind.COMMA;
            default -> TokenKind.CHUNK;
        };
    }

    private static boolean inChunk(char c) {
        return kindOf(c) == TokenKind.CHUNK && !isBlank(c) && c != '#';
    }

    static boolean isBlank(char c) {
        return Character.isWhitespace(c) || Character.isSpaceChar(c);
    }

    private int skipBlank(int from, int to) {
        int i = from;
        while (i < to) {
            char c = text.charAt(i);
            if (c == '#') {
                i = Math.min(to, lineEnd(i));
            } else if (isBlank(c)) {
                i++;
            } else {
                break;
            }
        }
        return i;
    }

    /** Where the next token begins. */
    int offset() {
        return next;
    }

    /** Goes on from here. */
    void moveTo(int offset) {
        next = offset;
    }

    int length() {
        return text.length();
    }

    /** What stands between two offsets. */
    String between(int from, int to) {
        return text.substring(from, to);
    }

    /** Number of the line, from 1, in which an offset lies. */
    int line(int offset) {
        int found = Arrays.binarySearch(lineStart, offset);
        return found >= 0 ? found + 1 : Math.max(1, -found - 1);
    }

    /** Column of an offset in its line, from 1. */
    int column(int offset) {
        return offset - lineStart[line(offset) - 1] + 1;
    }

    int lineCount() {
        return lineStart.length;
    }

    /** Where a line (from 1) begins. */
    int startOfLine(int line) {
        return lineStart[line - 1];
    }

    /** Where the line of an offset ends, its line break not counted. */
    int lineEnd(int offset) {
        int line = line(offset);
        int end = line < lineStart.length ? lineStart[line] : text.length();
        while (end > lineStart[line - 1] && (text.charAt(end - 1) == '\n' || text.charAt(end - 1) == '\r')) {
            end--;
        }
        return end;
    }

    /** Where what counts in the line of an offset ends: at its comment, or at its end. */
    int contentEnd(int offset) {
        int end = lineEnd(offset);
        int comment = text.indexOf('#', offset);
        return comment >= 0 && comment < end ? comment : end;
    }
}
