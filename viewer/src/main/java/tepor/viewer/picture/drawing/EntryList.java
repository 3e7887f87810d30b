package tepor.viewer.picture.drawing;

import java.awt.Font;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;

/** A list of entries, each a symbol and a few lines of text, set in columns. */
public final class EntryList {
    /** Draws a symbol within a box whose middle is the point. */
    @FunctionalInterface
    public interface Symbol {
        void paint(Graphics2D g, double x, double y);
    }

    /**
     * One entry.
     *
     * @param symbol what stands before it
     * @param name its first lines; wrapped
     * @param details further lines; wrapped, in the muted ink
     * @param warning last line in the warning ink; empty for none
     */
    public record Entry(Symbol symbol, String name, List<String> details, String warning) {
        public Entry {
            details = List.copyOf(details);
        }
    }

    private final String heading;
    private final List<Entry> entries;
    private final Font font;
    private final double indent;

    /**
     * @param heading above the list; empty for none
     * @param font of all text
     * @param indent room for symbols
     */
    public EntryList(String heading, List<Entry> entries, Font font, double indent) {
        this.heading = heading;
        this.entries = List.copyOf(entries);
        this.font = font;
        this.indent = indent;
    }

    public boolean isEmpty() {
        return entries.isEmpty();
    }

    /** Height of the list in so many columns of a width. */
    public double height(double columnWidth, int columns) {
        return isEmpty() ? 0 : flow(null, 0, 0, columnWidth, 0, columns);
    }

    /** Paints the list; columns are filled one after the other, about evenly. */
    public void paint(Graphics2D g, double x, double y, double columnWidth, double gap, int columns) {
        if (!isEmpty()) {
            flow(g, x, y, columnWidth, gap, columns);
        }
    }

    private double flow(Graphics2D g, double x, double y, double columnWidth, double gap, int columns) {
        double line = 1.28 * font.getSize2D();
        double between = 0.5 * line;
        double top = heading.isEmpty() ? 0 : 1.6 * line;
        if (g != null && !heading.isEmpty()) {
            Ink.text(g, heading, x, y + font.getSize2D(), font, Ink.MUTED);
        }
        double total = 0;
        double tallest = 0;
        for (Entry entry : entries) {
            double h = lines(entry, columnWidth).size() * line + between;
            total += h;
            tallest = Math.max(tallest, h);
        }
        // Entries are not split, so a column may need up to one entry more than its even share.
        double share = Math.max(total / columns, tallest);
        double reached = 0;
        double used = 0;
        double passed = 0;
        int column = 0;
        for (Entry entry : entries) {
            List<String[]> lines = lines(entry, columnWidth);
            double h = lines.size() * line + between;
            if (used > 0 && column < columns - 1 && passed + 0.5 * h > share * (column + 1)) {
                column++;
                used = 0;
            }
            if (g != null) {
                double left = x + column * (columnWidth + gap);
                double at = y + top + used;
                entry.symbol().paint(g, left + indent / 2, at + 0.64 * font.getSize2D());
                for (String[] text : lines) {
                    at += line;
                    Ink.text(
                            g,
                            text[0],
                            left + indent,
                            at - 0.28 * font.getSize2D(),
                            font,
                            text[1].equals("warning") ? Ink.WARNING : text[1].equals("name") ? Ink.DARK : Ink.MUTED);
                }
            }
            used += h;
            passed += h;
            reached = Math.max(reached, used);
        }
        return top + reached - between;
    }

    private List<String[]> lines(Entry entry, double columnWidth) {
        List<String[]> lines = new ArrayList<>();
        wrap(entry.name(), columnWidth - indent, 2).forEach(s -> lines.add(new String[] {s, "name"}));
        for (String detail : entry.details()) {
            wrap(detail, columnWidth - indent, 3).forEach(s -> lines.add(new String[] {s, "detail"}));
        }
        if (!entry.warning().isEmpty()) {
            wrap(entry.warning(), columnWidth - indent, 2).forEach(s -> lines.add(new String[] {s, "warning"}));
        }
        return lines;
    }

    private List<String> wrap(String text, double width, int linesAtMost) {
        return wrap(text, font, width, linesAtMost);
    }

    /** Breaks a text between words into lines of a width; what does not fit ends in "…". */
    public static List<String> wrap(String text, Font font, double width, int linesAtMost) {
        List<String> lines = new ArrayList<>();
        String current = "";
        for (String word : text.strip().split("\\s+")) {
            String longer = current.isEmpty() ? word : current + " " + word;
            if (current.isEmpty() || PictureFont.width(longer, font) <= width) {
                current = longer;
            } else if (lines.size() == linesAtMost - 1) {
                current = longer; // too long for the last line: cut below
                break;
            } else {
                lines.add(current);
                current = word;
            }
        }
        lines.add(current);
        lines.replaceAll(line -> fit(line, font, width));
        return lines;
    }

    private static String fit(String line, Font font, double width) {
        String text = line;
        int end = line.length();
        while (end > 1 && PictureFont.width(text, font) > width) {
            end = line.offsetByCodePoints(end, -1);
            text = line.substring(0, end).stripTrailing() + "…";
        }
        return text;
    }
}
