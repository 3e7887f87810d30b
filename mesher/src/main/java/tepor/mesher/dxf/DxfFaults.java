package tepor.mesher.dxf;

import tepor.mesher.outline.Findings;
import tepor.mesher.outline.Place;

/** Takes what is wrong in a DXF file, by the line where it is wrong; a file that is all wrong is not listed in full. */
final class DxfFaults {
    private static final int MOST = 100;

    private final String file;
    private final Findings findings;
    private int count;

    DxfFaults(String file, Findings findings) {
        this.file = file;
        this.findings = findings;
    }

    /** A record that cannot be read: what is wrong, and what would be right. */
    static final class Fault extends Exception {
        private static final long serialVersionUID = 1;

        private final String code;
        private final int line;
        private final String remedy;

        Fault(String code, int line, String what, String remedy) {
            super(what, null, false, false);
            this.code = code;
            this.line = line;
            this.remedy = remedy;
        }
    }

    Place place(int line) {
        return new Place(file, line, 1);
    }

    void error(String code, int line, String what, String remedy) {
        if (++count <= MOST) {
            findings.error(code, place(line), what, remedy);
        } else if (count == MOST + 1) {
            findings.error(
                    "more-faults", place(line), "there are more faults from here on", "correct those before first");
        }
    }

    void error(Fault fault) {
        error(fault.code, fault.line, fault.getMessage(), fault.remedy);
    }

    void warning(String code, int line, String what, String remedy) {
        findings.warning(code, place(line), what, remedy);
    }

    /** Whether nothing was wrong so far. */
    boolean isEmpty() {
        return count == 0;
    }

    /** Whether so much is wrong that reading on is of no use. */
    boolean isHopeless() {
        return count > MOST;
    }

    /** Text in quotation marks, shortened where it is long. */
    static String quote(String text) {
        String shown = text.length() > 30 ? text.substring(0, 30) + "…" : text;
        StringBuilder plain = new StringBuilder("'");
        for (int i = 0; i < shown.length(); i++) {
            char c = shown.charAt(i);
            boolean unseen = Character.isISOControl(c) || Character.getType(c) == Character.FORMAT;
            plain.append(unseen ? String.format("U+%04X", (int) c) : String.valueOf(c));
        }
        return plain.append('\'').toString();
    }
}
