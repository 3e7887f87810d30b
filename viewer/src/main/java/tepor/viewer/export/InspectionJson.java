package tepor.viewer.export;

import java.io.IOException;
import java.io.OutputStream;
import java.util.Optional;
import tepor.mesher.section.Section;
import tepor.solver.answer.Inspection;
import tepor.solver.model.Case;
import tepor.solver.model.Edge;
import tepor.solver.model.EdgeCondition;
import tepor.solver.model.Material;
import tepor.solver.model.Region;
import tepor.viewer.wording.ConditionWords;

/** Writes an inspection as one JSON object: areas in m², lengths in m. */
public final class InspectionJson {
    private final Inspection inspection;
    private final Case subject;
    private final JsonText json;

    private final Optional<Repair> repair;

    private InspectionJson(Inspection inspection, Optional<Repair> repair, JsonText json) {
        this.repair = repair;
        this.inspection = inspection;
        this.subject = inspection.subject();
        this.json = json;
    }

    /** Writes an inspection as UTF-8; leaves the stream open. */
    public static void write(Inspection inspection, OutputStream out) throws IOException {
        write(inspection, Optional.empty(), out);
    }

    /** Writes an inspection, and what was mended, as UTF-8; leaves the stream open. */
    public static void write(Inspection inspection, Optional<Repair> repair, OutputStream out) throws IOException {
        try (JsonText json = new JsonText(out)) {
            new InspectionJson(inspection, repair, json).write();
        }
    }

    /** Area of all material of a section, m². */
    public static double area(Section section) {
        double sum = 0;
        for (int i = 0; i < section.regionCount(); i++) {
            sum += section.isHole(i) ? 0 : section.area(i);
        }
        return sum;
    }

    private void write() throws IOException {
        CommonJson common = new CommonJson(json);
        json.object(() -> {
            common.heading(subject);
            json.number("area", area(subject.section()));
            json.array("regions", () -> {
                for (Region region : subject.regions()) {
                    json.object(() -> region(region));
                }
            });
            json.array("materials", () -> {
                for (Material material : subject.materials()) {
                    json.object(() -> {
                        json.text("name", material.name());
                        json.text("k", ConditionWords.of(material.conductivity()));
                    });
                }
            });
            json.array("edges", () -> {
                for (Edge edge : subject.edges()) {
                    json.object(() -> edge(edge));
                }
            });
            common.insulated(inspection.insulated(), subject.section());
            json.object("mesh", () -> {
                common.meshFigures(inspection.mesh());
                common.refused(inspection.mesh().report());
                json.number("seconds", inspection.secondsMesh());
            });
            common.warnings(inspection.warnings());
            if (repair.isPresent()) {
                repair.get().write(json);
            }
        });
    }

    private void region(Region region) throws IOException {
        json.text("name", region.name());
        json.text("material", region.isHole() ? "nothing" : region.material().name());
        json.number("area", subject.section().area(region.index()));
        if (region.heat() != null) {
            json.text("heat", region.heat().amount().quantity().text());
        }
    }

    private void edge(Edge edge) throws IOException {
        json.text("name", edge.name());
        json.number("length", edge.pieces().length(subject.section()));
        json.array("conditions", () -> {
            for (EdgeCondition condition : edge.conditions()) {
                json.object(() -> {
                    json.text("kind", condition.word());
                    json.text("text", ConditionWords.of(condition));
                });
            }
        });
        if (!edge.insulated().isEmpty()) {
            json.text("insulated", edge.insulated());
        }
    }
}
