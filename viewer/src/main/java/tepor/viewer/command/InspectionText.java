package tepor.viewer.command;

import java.io.PrintStream;
import java.util.Locale;
import java.util.stream.Collectors;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.refinement.RefinementReport;
import tepor.solver.answer.Inspection;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.Material;
import tepor.solver.model.Region;
import tepor.viewer.export.InspectionJson;
import tepor.viewer.wording.ConditionWords;
import tepor.viewer.wording.Rounding;

/** An inspection as text for a terminal. */
final class InspectionText {
    private static final int PLACES_AT_MOST = 3;

    private static final int DIGITS = 6;

    private final Inspection inspection;
    private final Case subject;
    private final PrintStream out;

    InspectionText(Inspection inspection, PrintStream out) {
        this.inspection = inspection;
        this.subject = inspection.subject();
        this.out = out;
    }

    void print() {
        out.println(subject.title().isEmpty() ? subject.name() : subject.name() + ": " + subject.title());
        out.println();
        regions();
        materials();
        edges();
        AnswerText.insulated(inspection.insulated(), subject, out);
        mesh();
    }

    private void regions() {
        TextTable table = new TextTable("region", "#area, m2", "material", "heat");
        for (Region region : subject.regions()) {
            table.row(
                    region.name(),
                    Rounding.significant(subject.section().area(region.index()), DIGITS),
                    region.isHole() ? "nothing" : region.material().name(),
                    region.heat() == null
                            ? ""
                            : region.heat().amount().quantity().text());
        }
        table.row("all material", Rounding.significant(InspectionJson.area(subject.section()), DIGITS), "", "");
        table.lines().forEach(out::println);
    }

    private void materials() {
        TextTable table = new TextTable("material", "conductivity", "source");
        for (Material material : subject.materials()) {
            table.row(material.name(), ConditionWords.of(material.conductivity()), material.source());
        }
        out.println();
        table.lines().forEach(out::println);
    }

    private void edges() {
        TextTable table = new TextTable("edge", "#length, m", "what holds on it");
        for (Edge edge : subject.edges()) {
            table.row(
                    edge.name(),
                    Rounding.significant(edge.pieces().length(subject.section()), DIGITS),
                    ConditionWords.of(edge));
        }
        out.println();
        table.lines().forEach(out::println);
    }

    private void mesh() {
        MeshResult result = inspection.mesh();
        out.println();
        out.println("Mesh: " + result.mesh().triangleCount() + " triangles, "
                + result.mesh().nodeCount() + " nodes, made in "
                + Rounding.significant(inspection.secondsMesh(), 2) + " s; smallest angle "
                + degrees(result.quality().smallestAngle()) + ", smallest that the outline does not impose "
                + degrees(result.quality().smallestAngleMade()));
        for (RefinementReport.Reason reason : RefinementReport.Reason.values()) {
            long count = result.report().count(reason);
            if (count > 0) {
                String places = result.report().first(reason, PLACES_AT_MOST).stream()
                        .map(stop -> subject.unit().point(stop.x(), stop.y()))
                        .collect(Collectors.joining(", "));
                out.println("  stopped short in " + count + (count == 1 ? " place: " : " places: ")
                        + reason.name().toLowerCase(Locale.ROOT).replace('_', ' ') + ", at " + places
                        + (count > PLACES_AT_MOST ? " and elsewhere" : ""));
            }
        }
    }

    private static String degrees(double radians) {
        return Rounding.significant(Math.toDegrees(radians), 3) + " deg";
    }
}
