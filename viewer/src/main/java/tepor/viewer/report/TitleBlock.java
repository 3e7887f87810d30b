package tepor.viewer.report;

import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tepor.solver.model.Case;

/** Title, what the calculation belongs to, and the places for signatures. */
final class TitleBlock {
    private static final List<String> SIGNATURES = List.of("prepared", "checked", "approved");

    private final Case subject;
    private final HtmlText html;

    TitleBlock(Case subject, HtmlText html) {
        this.subject = subject;
        this.html = html;
    }

    void write() throws IOException {
        html.element("header", () -> {
            html.element("h1", subject.title().isEmpty() ? subject.name() : subject.title());
            html.element("p", "kicker", "Steady heat conduction in a cross-section, two-dimensional");
            facts();
            signatures();
        });
    }

    private void facts() throws IOException {
        Map<String, String> facts = new LinkedHashMap<>();
        facts.put("case", subject.name());
        subject.reportFields().forEach((key, text) -> {
            if (!SIGNATURES.contains(key)) {
                facts.put(key, text);
            }
        });
        if (subject.depth() != null) {
            facts.put("depth", subject.depth().quantity().text());
        }
        html.element(
                "table",
                List.of("class", "facts"),
                () -> html.element("tbody", () -> {
                    for (Map.Entry<String, String> fact : facts.entrySet()) {
                        html.element("tr", () -> {
                            html.element("th", List.of("scope", "row"), () -> html.text(capital(fact.getKey())));
                            html.element("td", fact.getValue());
                        });
                    }
                }));
    }

    private void signatures() throws IOException {
        html.element("table", List.of("class", "signatures"), () -> {
            html.tableHead(List.of("", "Name", "Signature", "Date"));
            html.element("tbody", () -> {
                for (String role : SIGNATURES) {
                    html.element("tr", () -> {
                        html.element("th", List.of("scope", "row"), () -> html.text(capital(role)));
                        html.element("td", subject.reportFields().getOrDefault(role, ""));
                        html.element("td", "");
                        html.element("td", "");
                    });
                }
            });
        });
    }

    private static String capital(String word) {
        return word.isEmpty() ? word : word.substring(0, 1).toUpperCase(java.util.Locale.ROOT) + word.substring(1);
    }
}
