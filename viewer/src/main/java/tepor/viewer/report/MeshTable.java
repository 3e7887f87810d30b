package tepor.viewer.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import tepor.solver.answer.Answer;
import tepor.viewer.wording.Rounding;
import tepor.viewer.wording.ShownAnswer;
import tepor.viewer.wording.UnitWords;

/** The mesh, and how every answer moved from round to round. */
final class MeshTable {
    private static final int ROUNDS_SHOWN = 5;

    private final Answer answer;
    private final List<ShownAnswer> shown;
    private final HtmlText html;

    MeshTable(Answer answer, List<ShownAnswer> shown, HtmlText html) {
        this.answer = answer;
        this.shown = shown;
        this.html = html;
    }

    void write() throws IOException {
        var mesh = answer.mesh().mesh();
        var quality = answer.mesh().quality();
        html.element(
                "p",
                mesh.triangleCount() + (mesh.nodesPerTriangle() == 6 ? " quadratic" : " linear") + " triangles, "
                        + mesh.nodeCount() + " nodes. Smallest angle "
                        + degrees(quality.smallestAngle()) + ", smallest that the outline does not impose "
                        + degrees(quality.smallestAngleMade()) + ". "
                        + answer.figures().unknowns()
                        + " unknowns, " + answer.figures().iterations()
                        + " iterations; the equations are left with a residual of "
                        + Rounding.significant(answer.figures().residual(), 2) + ".");
        int first = Math.max(0, answer.history().size() - ROUNDS_SHOWN);
        List<Answer.Round> rounds =
                answer.history().subList(first, answer.history().size());
        if (rounds.isEmpty() || shown.isEmpty()) {
            return;
        }
        html.element(
                "div",
                List.of("class", "scroll"),
                () -> html.element("table", () -> {
                    html.element(
                            "caption",
                            first == 0
                                    ? "Rounds of refinement"
                                    : "The last " + ROUNDS_SHOWN + " of "
                                            + answer.history().size() + " rounds of refinement");
                    List<String> headings = new ArrayList<>(List.of("Answer"));
                    for (Answer.Round round : rounds) {
                        headings.add("#" + round.round() + ": " + round.triangles() + " triangles");
                    }
                    html.tableHead(headings);
                    html.element("tbody", () -> {
                        for (int i = 0; i < shown.size(); i++) {
                            int iAsk = i;
                            html.element("tr", () -> row(rounds, iAsk));
                        }
                    });
                }));
    }

    private void row(List<Answer.Round> rounds, int iAsk) throws IOException {
        ShownAnswer one = shown.get(iAsk);
        html.element("td", one.name() + (one.unit().isEmpty() ? "" : "," + UnitWords.after(one.unit())));
        for (Answer.Round round : rounds) {
            ShownAnswer.Deviation deviation = one.deviationOf(round, iAsk);
            double last = one.deviation() == null ? Double.NaN : one.deviation().halfWidth();
            html.element("td", List.of("class", "figure"), () -> {
                html.text(Rounding.value(one.valueOf(round, iAsk), last));
                if (deviation != null && Double.isFinite(deviation.halfWidth())) {
                    html.empty("br", List.of());
                    html.element("span", "place", "± " + Rounding.error(deviation.halfWidth()));
                }
            });
        }
    }

    private static String degrees(double radians) {
        return Rounding.significant(Math.toDegrees(radians), 3) + "°";
    }
}
