package tepor.viewer.report;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import tepor.solver.answer.MeshError;
import tepor.solver.model.Case;
import tepor.viewer.wording.AskWords;
import tepor.viewer.wording.Rounding;
import tepor.viewer.wording.ShownAnswer;
import tepor.viewer.wording.UnitWords;
import tepor.viewer.wording.VerdictWords;

/** The asks, each with its value, the mesh's interval, limit and verdict. */
final class AnswerTable {
    private final Case subject;
    private final List<ShownAnswer> shown;
    private final HtmlText html;
    private final AskWords asks;
    private final VerdictWords verdicts;

    AnswerTable(Case subject, List<ShownAnswer> shown, HtmlText html) {
        this.subject = subject;
        this.shown = shown;
        this.html = html;
        this.asks = new AskWords(subject);
        this.verdicts = new VerdictWords(subject);
    }

    void write() throws IOException {
        html.section("Answers", () -> {
            if (shown.isEmpty()) {
                html.element("p", "The case asks for nothing.");
                return;
            }
            html.element(
                    "div",
                    List.of("class", "scroll"),
                    () -> html.element("table", List.of("class", "answers"), () -> {
                        html.tableHead(List.of("Asked", "#Value", "#Mesh error", "Limit", "Verdict"));
                        html.element("tbody", () -> {
                            for (ShownAnswer one : shown) {
                                html.element("tr", () -> row(one));
                            }
                        });
                    }));
            html.element(
                    "p",
                    "note",
                    "The mesh error is the interval in which the true value less the stated one lies as far as the mesh "
                            + "is concerned. An estimate comes from how far the value moved as the mesh was refined; "
                            + "it is not guaranteed. How far off the inputs may be is not part of it.");
        });
    }

    private void row(ShownAnswer one) throws IOException {
        ShownAnswer.Deviation deviation = one.deviation();
        double halfWidth = deviation == null ? Double.NaN : deviation.halfWidth();
        html.element("td", () -> {
            html.element("strong", one.name());
            html.empty("br", List.of());
            html.text(asks.of(one.ask()));
            double[] where = one.source().where();
            if (where != null) {
                html.text(" ");
                html.element("span", "place", "at " + subject.unit().point(rounded(where[0]), rounded(where[1])));
            }
        });
        html.element("td", List.of("class", "figure"), () -> {
            html.text(Rounding.value(one.value(), halfWidth) + UnitWords.after(one.unit()));
            if (one.forDepth() != null) {
                html.empty("br", List.of());
                html.text(Rounding.significant(one.forDepth(), 5) + " W for "
                        + subject.depth().quantity().text());
            }
        });
        html.element("td", List.of("class", "figure"), () -> {
            html.text("± " + Rounding.error(halfWidth));
            if (deviation != null) {
                MeshError error = one.source().meshError();
                html.empty("br", List.of());
                html.element(
                        "span",
                        "place",
                        (error.kind() == MeshError.Kind.BOUND ? "guaranteed" : "estimate")
                                + (error.reached() ? ", within " : ", not within ")
                                + Rounding.significant(deviation.within(), 2));
            }
        });
        html.element("td", "keep", UnitWords.pretty(AskWords.limit(one.ask())));
        html.element("td", () -> {
            String words = verdicts.of(one);
            int end = words.isEmpty() ? 0 : one.limit().verdict().word().length();
            html.element("span", "verdict", words.substring(0, end));
            html.text(words.substring(end));
        });
    }

    /** To a ten-thousandth of the section or finer: closer than that nobody can point. */
    private double rounded(double metres) {
        double step =
                Math.pow(10, Math.floor(Math.log10(1e-4 * subject.section().extent())));
        return BigDecimal.valueOf(metres)
                .divide(BigDecimal.valueOf(step), 0, RoundingMode.HALF_EVEN)
                .multiply(BigDecimal.valueOf(step))
                .doubleValue();
    }
}
