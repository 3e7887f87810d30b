package tepor.viewer.report;

import java.io.IOException;
import java.util.List;

/** What the model leaves out, and who decides. */
final class Cautions {
    private static final List<String> LEFT_OUT = List.of(
            "The ends: the part is taken as endlessly long and the same all along. Supports, joints, bends and the last few "
                    + "thicknesses before an end are hotter or colder than calculated.",
            "Time: every temperature is the one that is reached when nothing changes any more. Starting, short circuits, "
                    + "daily swings and duty cycles are not covered.",
            "Temperature dependence: conductivities, films and heat sources do not change with temperature.",
            "Radiation: only as far as it is part of a stated film coefficient.",
            "Air and moisture: no air moves within the section, nothing condenses, dries, freezes or evaporates, and no "
                    + "material conducts better for being damp.",
            "Contact: neighbouring regions touch perfectly.",
            "The outline: it is taken as drawn, without the tolerances of manufacture.");

    private final HtmlText html;

    Cautions(HtmlText html) {
        this.html = html;
    }

    void write() throws IOException {
        html.section("What this calculation leaves out", () -> {
            html.element("ul", () -> {
                for (String text : LEFT_OUT) {
                    html.element("li", text);
                }
            });
            html.element(
                    "p",
                    "This is a calculation on the inputs stated above, and no better than they are. Too hot a surface burns; "
                            + "too hot an insulation ages, fails and can catch fire; too cold a surface grows mould. Whether "
                            + "a design is safe is decided by the local codes and by the judgement of a licensed engineer, "
                            + "which this report does not replace.");
        });
    }
}
