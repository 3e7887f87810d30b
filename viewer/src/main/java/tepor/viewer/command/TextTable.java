package tepor.viewer.command;

import java.util.ArrayList;
import java.util.List;

/** A table in plain text: columns as wide as their widest cell, figures to the right. */
final class TextTable {
    private final boolean[] toTheRight;
    private final List<String[]> rows = new ArrayList<>();

    /** @param headings one for each column; a column whose heading begins with {@code #} holds figures */
    TextTable(String... headings) {
        toTheRight = new boolean[headings.length];
        String[] first = new String[headings.length];
        for (int i = 0; i < headings.length; i++) {
            toTheRight[i] = headings[i].startsWith("#");
            first[i] = toTheRight[i] ? headings[i].substring(1) : headings[i];
        }
        rows.add(first);
    }

    void row(String... cells) {
        rows.add(cells.clone());
    }

    /** The lines of the table, each indented by two spaces, without blanks at their end. */
    List<String> lines() {
        int[] width = new int[toTheRight.length];
        for (String[] row : rows) {
            for (int i = 0; i < width.length; i++) {
                width[i] = Math.max(width[i], length(row[i]));
            }
        }
        return rows.stream().map(row -> line(row, width)).toList();
    }

    private String line(String[] row, int[] width) {
        StringBuilder line = new StringBuilder("  ");
        for (int i = 0; i < width.length; i++) {
            String blanks = " ".repeat(width[i] - length(row[i]));
            line.append(i == 0 ? "" : "  ").append(toTheRight[i] ? blanks + row[i] : row[i] + blanks);
        }
        return line.toString().stripTrailing();
    }

    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }
}
