package tepor.viewer.report;

import java.io.IOException;
import java.util.List;
import tepor.viewer.wording.Rounding;
import tepor.viewer.wording.ShownAnswer;
import tepor.viewer.wording.UnitWords;

/** The one-dimensional reckoning that a checker can follow with a pencil, beside each answer that has one. */
final class HandChecks {
    private static final int DIGITS = 5;

    private final List<ShownAnswer> checked;
    private final HtmlText html;

    HandChecks(List<ShownAnswer> shown, HtmlText html) {
        this.checked = shown.stream().filter(a -> a.handCheck() != null).toList();
        this.html = html;
    }

    void write() throws IOException {
        if (checked.isEmpty()) {
            return;
        }
        html.section("Hand check", () -> {
            html.element(
                    "p",
                    "Resistances in series and in parallel bracket the heat flow. They use neither the mesh nor the "
                            + "equations above.");
            for (ShownAnswer one : checked) {
                html.element("h3", one.name());
                String unit = UnitWords.after(one.unit());
                html.element(
                        "p",
                        "Between " + Rounding.significant(one.handLow(), DIGITS) + " and "
                                + Rounding.significant(one.handHigh(), DIGITS) + unit + "; computed "
                                + Rounding.significant(one.value(), DIGITS) + unit + ": "
                                + (one.handCheck().inside() ? "inside." : "outside; find out why before using it."));
                html.element("div", List.of("class", "working"), () -> {
                    for (String line : one.handCheck().working()) {
                        html.element("p", line);
                    }
                });
            }
        });
    }
}
