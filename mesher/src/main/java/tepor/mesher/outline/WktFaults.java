package tepor.mesher.outline;

/** Takes what is wrong with a piece of well-known text, by the offset where it is wrong. */
interface WktFaults {
    /** Where an offset lies, in words for a message about something else: {@code line 3, column 7}. */
    String whereabouts(int offset);

    /** See {@link Finding}; the offset counts from the beginning of the text. */
    void add(Finding.Severity severity, String code, int offset, String what, String remedy);

    /** Faults in a file: each gets its line and column. */
    record InFile(String fileName, WktScanner scanner, Findings findings) implements WktFaults {
        Place place(int offset) {
            return new Place(fileName, scanner.line(offset), scanner.column(offset));
        }

        @Override
        public String whereabouts(int offset) {
            return "line " + scanner.line(offset) + ", column " + scanner.column(offset);
        }

        @Override
        public void add(Finding.Severity severity, String code, int offset, String what, String remedy) {
            findings.add(new Finding(severity, code, place(offset), what, remedy));
        }
    }

    /** Faults in a geometry written inside another file: all get its place, and say at which character. */
    record InText(Place place, WktScanner scanner, Findings findings) implements WktFaults {
        private static final int SHOWN_BEFORE = 18;
        private static final int SHOWN_AFTER = 22;

        @Override
        public String whereabouts(int offset) {
            return "character " + (offset + 1);
        }

        @Override
        public void add(Finding.Severity severity, String code, int offset, String what, String remedy) {
            int from = Math.max(0, offset - SHOWN_BEFORE);
            int to = Math.min(scanner.length(), offset + SHOWN_AFTER);
            String part = (from > 0 ? "…" : "")
                    + scanner.between(from, to).replaceAll("\\s+", " ")
                    + (to < scanner.length() ? "…" : "");
            String located = what + " (" + whereabouts(offset) + " of the geometry, in \"" + part + "\")";
            findings.add(new Finding(severity, code, place, located, remedy));
        }
    }
}
