package tepor.mesher.dxf;

/**
 * Walks the pairs of a DXF text: a line with a group code, and a line with its value. Lines end with LF, CR or CR LF, blanks
 * around them do not count, and comments (group 999) are passed over.
 */
final class DxfScanner {
    private static final int COMMENT = 999;
    private static final String REMEDY =
            "a DXF file is pairs of lines, group code and value; a line is missing or one too many above: save the drawing"
                    + " as DXF again";

    private final String text;
    private final DxfFaults faults;
    private int at;
    private int line; // of the last line taken
    private int code;
    private String value = "";
    private boolean damaged;

    DxfScanner(String text, DxfFaults faults) {
        this.text = text;
        this.faults = faults;
    }

    /** Goes to the next pair; false at the end of the text. */
    boolean next() {
        damaged = false;
        do {
            if (at >= text.length()) {
                return false;
            }
            String head = takeLine();
            int number = parseCode(head);
            if (number < 0) {
                if (at >= text.length() && head.isEmpty()) {
                    return false;
                }
                faults.error(
                        "group-code",
                        line,
                        "a group code is wanted here, a whole number from 0 to 1071, not " + DxfFaults.quote(head),
                        REMEDY);
                damaged = true;
                if (faults.isHopeless() || !findRecord()) {
                    return false;
                }
                continue;
            }
            code = number;
            if (at >= text.length()) {
                return false; // a code without its value: the file is cut off
            }
            value = takeLine();
        } while (code == COMMENT);
        return true;
    }

    int code() {
        return code;
    }

    String value() {
        return value;
    }

    /** Line of the value, from 1. */
    int line() {
        return line;
    }

    /** Whether something before this pair could not be read, so that the record before it is not whole. */
    boolean isDamaged() {
        return damaged;
    }

    /** Goes on before the next line that says 0 and is followed by what may be the name of a record. */
    private boolean findRecord() {
        int before = at;
        int lineBefore = line;
        boolean zero = false;
        while (at < text.length()) {
            int start = at;
            int startLine = line;
            String next = takeLine();
            if (zero && isName(next)) {
                at = before;
                line = lineBefore;
                code = COMMENT;
                return true;
            }
            zero = next.equals("0");
            before = start;
            lineBefore = startLine;
        }
        return false;
    }

    private static boolean isName(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (!(c >= 'A' && c <= 'Z' || i > 0 && (c >= '0' && c <= '9' || c == '_'))) {
                return false;
            }
        }
        return text.length() > 1;
    }

    private static int parseCode(String text) {
        int number = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c < '0' || c > '9' || i > 3) {
                // Negative codes are used within programs only.
                return -1;
            }
            number = 10 * number + (c - '0');
        }
        return text.isEmpty() || number > 1071 ? -1 : number;
    }

    private String takeLine() {
        int end = at;
        while (end < text.length() && text.charAt(end) != '\n' && text.charAt(end) != '\r') {
            end++;
        }
        String taken = text.substring(at, end).strip();
        at = end;
        if (at < text.length()) {
            boolean two = text.charAt(at) == '\r' && at + 1 < text.length() && text.charAt(at + 1) == '\n';
            at += two ? 2 : 1;
        }
        line++;
        return taken;
    }
}
