package tepor.viewer.export;

import java.io.IOException;
import java.util.List;
import java.util.Locale;
import tepor.mesher.mesh.MeshResult;
import tepor.mesher.outline.Finding;
import tepor.mesher.refinement.RefinementReport;
import tepor.mesher.section.Section;
import tepor.solver.answer.Insulated;
import tepor.solver.model.Case;
import tepor.viewer.wording.InsulatedRun;

/** What {@code answers.json} and the JSON of an inspection have in common. */
final class CommonJson {
    /** Places told of each reason why refinement stopped short. */
    private static final int PLACES_AT_MOST = 20;

    private final JsonText json;

    CommonJson(JsonText json) {
        this.json = json;
    }

    void heading(Case subject) throws IOException {
        json.whole("format", 1);
        json.text("case", subject.name());
        json.text("title", subject.title());
        json.text("tepor", Version.text());
        json.text("inputs_sha256", InputsDigest.of(subject.files()));
    }

    void meshFigures(MeshResult result) throws IOException {
        json.whole("triangles", result.mesh().triangleCount());
        json.whole("nodes", result.mesh().nodeCount());
        json.number("smallest_angle_deg", Math.toDegrees(result.quality().smallestAngle()));
        json.number("smallest_angle_made_deg", Math.toDegrees(result.quality().smallestAngleMade()));
    }

    void refused(RefinementReport report) throws IOException {
        json.object("refused", () -> {
            for (RefinementReport.Reason reason : RefinementReport.Reason.values()) {
                json.whole(word(reason), report.count(reason));
            }
        });
        json.array("refused_places", () -> {
            for (RefinementReport.Reason reason : RefinementReport.Reason.values()) {
                for (RefinementReport.Stop stop : report.first(reason, PLACES_AT_MOST)) {
                    json.object(() -> {
                        json.text("reason", word(reason));
                        point("at", stop.x(), stop.y());
                    });
                }
            }
        });
    }

    private static String word(RefinementReport.Reason reason) {
        return reason.name().toLowerCase(Locale.ROOT);
    }

    void insulated(Insulated insulated, Section section) throws IOException {
        json.object("insulated", () -> {
            json.number("stated", insulated.stated());
            json.number("by_default", insulated.byDefault());
            json.text("unit", "m");
            json.array("runs", () -> {
                for (InsulatedRun run : InsulatedRun.of(insulated, section)) {
                    json.object(() -> {
                        json.number("length", run.length());
                        point("from", run.x1(), run.y1());
                        point("to", run.x2(), run.y2());
                    });
                }
            });
        });
    }

    void warnings(List<Finding> warnings) throws IOException {
        findings("warnings", warnings);
    }

    void findings(String name, List<Finding> findings) throws IOException {
        json.array(name, () -> {
            for (Finding finding : findings) {
                json.object(() -> {
                    json.text("code", finding.code());
                    json.text("severity", finding.severity().word());
                    json.text(
                            "text",
                            finding.remedy().isEmpty() ? finding.what() : finding.what() + "; " + finding.remedy());
                    json.text("file", finding.place().file());
                    position("line", finding.place().line());
                    position("column", finding.place().column());
                });
            }
        });
    }

    /** A line or a column; null where none is known. */
    private void position(String name, int count) throws IOException {
        if (count > 0) {
            json.whole(name, count);
        } else {
            json.nothing(name);
        }
    }

    /** A point in metres. */
    void point(String name, double x, double y) throws IOException {
        json.array(name, () -> {
            json.number(x);
            json.number(y);
        });
    }
}
