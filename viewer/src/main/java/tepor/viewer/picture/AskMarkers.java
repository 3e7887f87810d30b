package tepor.viewer.picture;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import tepor.solver.answer.Verdict;
import tepor.solver.model.Ask;
import tepor.viewer.picture.drawing.EntryList;
import tepor.viewer.picture.drawing.Ink;
import tepor.viewer.picture.drawing.OccupancyGrid;
import tepor.viewer.picture.drawing.TagPlacer;
import tepor.viewer.wording.ShownAnswer;

/** Asks in a picture: a marker at each place, a numbered tag on a leader line, and the list of all with their values. */
final class AskMarkers {
    private final List<ShownAnswer> asks;
    private final Font font;
    private final List<Spot> spots = new ArrayList<>();

    /** Asks at one place, by their numbers from 0. */
    private record Spot(double x, double y, List<Integer> asks, double[] tag) {
        String text() {
            StringBuilder text = new StringBuilder();
            for (int i = 0; i < asks.size(); i++) {
                boolean inRun = i > 0 && i + 1 < asks.size() && asks.get(i + 1) == asks.get(i - 1) + 2;
                if (!inRun) {
                    char last = text.isEmpty() ? ' ' : text.charAt(text.length() - 1);
                    text.append(text.isEmpty() || last == '–' ? "" : ", ").append(asks.get(i) + 1);
                } else if (text.charAt(text.length() - 1) != '–') {
                    text.append('–');
                }
            }
            return text.toString();
        }
    }

    AskMarkers(List<ShownAnswer> asks, Font font) {
        this.asks = asks;
        this.font = font;
    }

    private double radius() {
        return 0.42 * font.getSize2D();
    }

    /** Where asks have their places, metres. */
    List<double[]> places() {
        return asks.stream()
                .map(answer -> answer.source().where())
                .filter(where -> where != null)
                .toList();
    }

    /** Finds places for the tags. */
    void place(SectionView view, Rectangle2D frame) {
        for (int i = 0; i < asks.size(); i++) {
            double[] where = asks.get(i).source().where();
            if (where == null) {
                continue;
            }
            double x = view.x(where[0]);
            double y = view.y(where[1]);
            Spot same = spots.stream()
                    .filter(s -> Math.hypot(s.x() - x, s.y() - y) < 0.5 * radius())
                    .findFirst()
                    .orElse(null);
            if (same == null) {
                spots.add(new Spot(x, y, new ArrayList<>(List.of(i)), new double[2]));
            } else {
                same.asks().add(i);
            }
        }
        TagPlacer placer = new TagPlacer(frame, Ink.tagHeight(font));
        spots.forEach(s -> placer.keepClear(s.x(), s.y()));
        for (Spot s : spots) {
            double[] tag = placer.place(s.x(), s.y(), Ink.tagWidth(s.text(), font), Double.NaN);
            s.tag()[0] = tag[0];
            s.tag()[1] = tag[1];
        }
    }

    /** Takes the room of markers, leaders and tags. */
    void take(OccupancyGrid grid) {
        double r = 1.4 * radius();
        for (Spot s : spots) {
            double w = Ink.tagWidth(s.text(), font) / 2 + 3;
            double h = Ink.tagHeight(font) / 2 + 3;
            grid.takeBox(s.x() - r, s.y() - r, s.x() + r, s.y() + r);
            grid.takeBox(s.tag()[0] - w, s.tag()[1] - h, s.tag()[0] + w, s.tag()[1] + h);
            grid.takeLine(s.x(), s.y(), s.tag()[0], s.tag()[1]);
        }
    }

    void paint(Graphics2D g) {
        double text = font.getSize2D();
        for (Spot s : spots) {
            Line2D leader = new Line2D.Double(s.x(), s.y(), s.tag()[0], s.tag()[1]);
            Ink.draw(g, leader, Ink.PAPER, 0.2 * text);
            Ink.draw(g, leader, Ink.DARK, 0.08 * text);
        }
        for (Spot s : spots) {
            paintMarker(g, asks.get(s.asks().get(0)).ask(), s.x(), s.y());
            Ink.tag(g, s.text(), s.tag()[0], s.tag()[1], font, false);
        }
    }

    private void paintMarker(Graphics2D g, Ask ask, double x, double y) {
        Shape shape = marker(ask, x, y);
        Ink.fill(g, shape, Ink.PAPER);
        Ink.draw(g, shape, Ink.DARK, 0.1 * font.getSize2D());
        double dot = 0.07 * font.getSize2D();
        Ink.fill(g, new Ellipse2D.Double(x - dot, y - dot, 2 * dot, 2 * dot), Ink.DARK);
    }

    /** A peak's marker points up, a lowest value's down, a point's is round; their middle is the place. */
    private Shape marker(Ask ask, double x, double y) {
        double r = radius();
        if (ask instanceof Ask.Peak || ask instanceof Ask.Lowest || ask instanceof Ask.Factor) {
            double up = ask instanceof Ask.Peak ? -1 : 1;
            Path2D path = new Path2D.Double();
            path.moveTo(x, y + up * 1.15 * r);
            path.lineTo(x + r, y - up * 0.65 * r);
            path.lineTo(x - r, y - up * 0.65 * r);
            path.closePath();
            return path;
        }
        double a = 0.85 * r;
        return new Ellipse2D.Double(x - a, y - a, 2 * a, 2 * a);
    }

    private double widestTag() {
        return Ink.tagWidth(String.valueOf(asks.size()), font);
    }

    /** Room for a tag and a marker. */
    private double indent() {
        return widestTag() + 1.8 * font.getSize2D();
    }

    /** The list of all asks. */
    EntryList list() {
        List<EntryList.Entry> entries = new ArrayList<>();
        for (int i = 0; i < asks.size(); i++) {
            ShownAnswer answer = asks.get(i);
            String number = String.valueOf(i + 1);
            String verdict = FigureText.verdict(answer);
            Verdict judged = answer.source().verdict();
            boolean bad = judged == Verdict.BROKEN || judged == Verdict.UNDECIDED;
            List<String> details = new ArrayList<>();
            details.add(FigureText.value(answer));
            if (!verdict.isEmpty() && !bad) {
                details.add(verdict);
            }
            entries.add(new EntryList.Entry(
                    (g, x, y) -> {
                        Ink.tag(g, number, x - (indent() - widestTag()) / 2 + 0.1 * font.getSize2D(), y, font, false);
                        if (answer.source().where() != null) {
                            paintMarker(g, answer.ask(), x + indent() / 2 - 0.75 * font.getSize2D(), y);
                        }
                    },
                    answer.name(),
                    details,
                    bad ? verdict : ""));
        }
        return new EntryList("", entries, font, indent());
    }
}
