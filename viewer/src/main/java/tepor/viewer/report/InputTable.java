package tepor.viewer.report;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.Input;
import tepor.solver.model.Material;
import tepor.solver.model.Region;
import tepor.solver.quantity.Dimension;
import tepor.solver.quantity.Quantity;
import tepor.solver.quantity.Spread;
import tepor.solver.quantity.Units;
import tepor.viewer.export.wording.ConditionWords;
import tepor.viewer.export.wording.Rounding;
import tepor.viewer.export.wording.UnitWords;

/** What was put in: regions, edges, and every quantity with its spread and where it is from. */
final class InputTable {
    private final Case subject;
    private final HtmlText html;

    InputTable(Case subject, HtmlText html) {
        this.subject = subject;
        this.html = html;
    }

    /** Nothing for a region of nothing that is open to the outside: it has no area of its own in the section. */
    private static String area(double area) {
        return area > 0 ? Rounding.significant(area, 5) : "";
    }

    void write() throws IOException {
        table("Regions", List.of("Region", "Material", "Heat", "#Area, m²"), () -> {
            for (Region region : subject.regions()) {
                row(
                        region.name(),
                        region.isHole() ? "nothing (a hole)" : region.material().name(),
                        region.heat() == null
                                ? ""
                                : region.heat().amount().quantity().text(),
                        area(subject.section().area(region.index())));
            }
        });
        table("Edges", List.of("Edge", "What holds on it", "", "#Length, m"), () -> {
            for (Edge edge : subject.edges()) {
                row(
                        edge.name(),
                        ConditionWords.of(edge),
                        "",
                        Rounding.significant(edge.pieces().length(subject.section()), 5));
            }
        });
        table("Quantities", List.of("Input", "As stated", "Spread and source", "#Line"), () -> {
            for (Input input : subject.inputs().all()) {
                row(
                        input.path(),
                        UnitWords.pretty(input.quantity().text()),
                        spreadAndSource(input),
                        input.place().line() == 0
                                ? ""
                                : String.valueOf(input.place().line()));
            }
        });
        html.element(
                "p",
                "note",
                "Every quantity is taken as exact: spreads are recorded here, but this version does not count them in any "
                        + "answer. A bare spread is the half-width of a rectangular distribution (JCGM 100:2008, 4.3.7).");
    }

    private void table(String caption, List<String> headings, HtmlText.Part rows) throws IOException {
        html.element(
                "div",
                List.of("class", "scroll"),
                () -> html.element("table", () -> {
                    html.element("caption", caption);
                    html.tableHead(headings);
                    html.element("tbody", rows);
                }));
    }

    private void row(String first, String second, String third, String figure) throws IOException {
        html.element("tr", () -> {
            html.element("td", first);
            html.element("td", second);
            html.element("td", third);
            html.element("td", "figure", figure);
        });
    }

    private String spreadAndSource(Input input) {
        String spread = spread(input.quantity());
        String source = subject.materials().stream()
                .filter(m -> belongsTo(input, m))
                .map(Material::source)
                .filter(s -> !s.isEmpty())
                .findFirst()
                .orElse("");
        return spread.isEmpty() || source.isEmpty() ? spread + source : spread + "; " + source;
    }

    private static boolean belongsTo(Input input, Material material) {
        return input.path().startsWith("material." + material.name() + ".")
                || input.path().startsWith("material.\"" + material.name() + "\".");
    }

    private static String spread(Quantity quantity) {
        if (!quantity.hasSpread()) {
            return "";
        }
        Spread spread = quantity.spread();
        Dimension dimension =
                quantity.dimension() == Dimension.TEMPERATURE ? Dimension.TEMPERATURE_DIFFERENCE : quantity.dimension();
        double half = Units.fromSi(spread.halfWidth(), quantity.unit(), dimension);
        String unit = quantity.unit().equals("degC") ? "K" : quantity.unit();
        return "± " + Rounding.significant(half, 3) + UnitWords.after(unit) + ", "
                + spread.distribution().name().toLowerCase(Locale.ROOT)
                + (spread.distribution() == Spread.Distribution.NORMAL
                        ? ", k = " + Rounding.significant(spread.coverageFactor(), 3)
                        : "");
    }
}
