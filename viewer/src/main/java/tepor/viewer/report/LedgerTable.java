package tepor.viewer.report;

import java.io.IOException;
import java.util.List;
import tepor.solver.answer.Answer;
import tepor.solver.answer.Ledger;
import tepor.viewer.wording.Rounding;

/** One row for each source and each effect on an edge. */
final class LedgerTable {
    private static final int DIGITS = 6;

    private final Ledger ledger;
    private final HtmlText html;

    LedgerTable(Answer answer, HtmlText html) {
        this.ledger = answer.ledger();
        this.html = html;
    }

    void write() throws IOException {
        html.element("table", () -> {
            html.tableHead(List.of("Where", "By", "#In, W/m", "#Out, W/m"));
            html.element("tbody", () -> {
                double in = 0;
                double out = 0;
                for (Ledger.Row row : ledger.rows()) {
                    in += Math.max(0, row.in());
                    out += Math.max(0, -row.in());
                    row(row);
                }
                total(in, out);
            });
        });
        html.element(
                "p",
                "note",
                "Flows are taken from the balance equations that were solved. What goes in and what comes out differ by "
                        + Rounding.significant(ledger.imbalance(), 2) + " of the heat passing through.");
        if (ledger.rows().stream().anyMatch(Ledger.Row::dependsOnMesh)) {
            html.element(
                    "p",
                    "Rows marked * have no limit as the mesh is refined: two different fixed temperatures meet there. "
                            + "Their figures say nothing.");
        }
    }

    private void row(Ledger.Row row) throws IOException {
        html.element("tr", () -> {
            html.element("td", row.name() + (row.dependsOnMesh() ? " *" : ""));
            html.element("td", row.kind());
            html.element("td", "figure", row.in() >= 0 ? Rounding.significant(row.in(), DIGITS) : "");
            html.element("td", "figure", row.in() < 0 ? Rounding.significant(-row.in(), DIGITS) : "");
        });
    }

    private void total(double in, double out) throws IOException {
        html.element("tr", () -> {
            html.element("th", List.of("scope", "row", "class", "total"), () -> html.text("Together"));
            html.element("td", "total", "");
            html.element("td", "figure total", Rounding.significant(in, DIGITS));
            html.element("td", "figure total", Rounding.significant(out, DIGITS));
        });
    }
}
